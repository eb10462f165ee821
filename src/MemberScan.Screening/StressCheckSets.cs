using System.Globalization;
using MemberScan.Ifc.WriteBack;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening;

/// <summary>What the property set of each element says: one set per element, of several items the worst one's values.</summary>
internal static class StressCheckSets
{
    /// <summary>The sets in the order of the candidates.</summary>
    public static IEnumerable<StressCheckSet> From(ScreeningRecord record) =>
        record.Members.GroupBy(m => m.StepId).Select(items => Of(Worst(items), items.Count(), record));

    /// <summary>OVERSTRESSED before NOT CHECKED before WITHIN LIMIT, then the larger utilization, then body order.</summary>
    private static MemberResult Worst(IEnumerable<MemberResult> items) => items
        .OrderBy(m => m.Verdict switch { Verdict.Overstressed => 0, Verdict.NotChecked => 1, _ => 2 })
        .ThenByDescending(m => m.Governing?.Utilization ?? -1)
        .ThenBy(m => m.ItemNumber)
        .First();

    private static StressCheckSet Of(MemberResult member, int items, ScreeningRecord record)
    {
        var governing = member.Governing;
        return new StressCheckSet
        {
            ElementId = member.StepId,
            ElementKey = items > 1 ? member.Key[..member.Key.LastIndexOf('/')] : member.Key,
            Status = VerdictText.Of(member.Verdict),
            Reason = member.Reason is { } reason ? $"{reason.Code.Text()}: {reason.Message}" : null,
            Utilization = governing?.Utilization,
            Criterion = governing?.Criterion,
            StressLimit = governing?.Limit,
            EquivalentStress = governing?.Stress,
            NormalStress = governing?.Point.State.Sigma,
            ShearStress = governing?.Point.State.Tau,
            EquivalentStressText = governing is null ? null : string.Create(CultureInfo.InvariantCulture, $"{governing.Stress / 1e6:0.0} MPa"),
            Situation = governing?.Situation,
            Station = governing?.Station,
            PointY = governing?.Point.Y,
            PointZ = governing?.Point.Z,
            PointName = governing?.Point.Place,
            ForcesSource = governing?.ForcesSource,
            SectionSource = NullIfEmpty(member.SectionSource),
            ShearModel = governing?.ShearModel,
            Item = items > 1 ? member.Key : null,
            ItemCount = items > 1 ? items : null,
            RunId = record.RunId,
            Program = $"MemberScan {record.Version}",
            ReviewDecision = member.Decision?.Shown,
            ReviewNote = member.Decision?.ShownNote,
        };
    }

    private static string? NullIfEmpty(string text) => text.Length > 0 ? text : null;
}
