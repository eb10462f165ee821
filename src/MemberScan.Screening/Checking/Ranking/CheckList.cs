using System.Collections.Immutable;
using MemberScan.Checks;
using MemberScan.Checks.Allowable;
using MemberScan.Checks.Deflection;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;
using MemberScan.Screening.Record.Lines;

namespace MemberScan.Screening.Checking.Ranking;

/// <summary>The checks of a member over its situations: each where it is worst, and the order of the worst.</summary>
internal static class CheckList
{
    /// <summary>How many are kept beside the worst.</summary>
    public const int Kept = 3;

    /// <summary>Each check where it is worst: deciding ones first, by falling utilization, those not made after them, then what informs.</summary>
    /// <param name="findings">The situations.</param>
    /// <param name="stress">Largest stress; null when none was found.</param>
    /// <param name="withTraces">Whether the calculations are kept.</param>
    public static ImmutableArray<CheckLine> Of(IReadOnlyList<SituationFindings> findings, Found? stress, bool withTraces)
    {
        var lines = new List<CheckLine>();
        if (stress is not null) lines.AddRange(OfStress(findings[stress.Situation], stress, withTraces));
        foreach (var group in findings.SelectMany(f => f.Further.All.Select(c => (Finding: f, Check: c))).GroupBy(p => (p.Check.Check.Key, p.Check.Check.Name, IsMade: p.Check.Utilization is not null)))
        {
            var worst = group.MaxBy(p => p.Check.Utilization ?? 0);
            lines.Add(Line(worst.Finding, worst.Check.Check, worst.Check.Station, withTraces));
        }

        return [.. lines.OrderByDescending(l => l.Decides).ThenByDescending(l => l.Utilization is not null).ThenByDescending(l => l.Utilization ?? 0).ThenBy(l => l.Key, StringComparer.Ordinal)];
    }

    /// <summary>The next-worst deciding checks, each once in a situation, behind the one that governs.</summary>
    public static ImmutableArray<RankedLine> Next(IReadOnlyList<SituationFindings> findings, Governing? governing)
    {
        var all = findings.Where(f => f.Largest is not null)
            .Select(f => new RankedLine(Governing.StressKey, f.Largest!.Rule.Words, f.Forces.Situation.Name, f.Largest.X, f.Largest.Utilization))
            .Concat(findings.SelectMany(f => f.Further.All.Where(c => c is { Decides: true, Utilization: not null })
                .Select(c => new RankedLine(c.Check.Key, c.Check.Name, f.Forces.Situation.Name, c.Station, c.Utilization!.Value))));
        return [.. all.Where(l => (l.Key, l.Situation) != (governing?.Check, governing?.Situation)).OrderByDescending(l => l.Utilization).Take(Kept)];
    }

    /// <summary>A limit of deflection that is named for a role: sources of forces give no deflections, so it says that it is not evaluated.</summary>
    /// <param name="limits">The limits of the member.</param>
    /// <param name="role">Its role.</param>
    /// <param name="findings">The situations.</param>
    public static CheckLine? Deflection(LimitSet limits, string role, IReadOnlyList<SituationFindings> findings)
    {
        if (limits.Deflection.FirstOrDefault(l => string.Equals(l.Role, role, StringComparison.OrdinalIgnoreCase)) is not { } limit) return null;

        var situation = findings.Select(f => f.Forces.Situation).FirstOrDefault(s => s.Kind == SituationKind.Service);
        return new CheckLine
        {
            Key = DeflectionNote.Key,
            Name = $"deflection against {limit.Name}",
            Decides = false,
            Clause = $"deflection, {limit.Name}",
            Situation = situation?.Name ?? "",
            Kind = Word(SituationKind.Service),
            Station = null,
            Utilization = null,
            Reason = new Reason(ReasonCode.CheckNotEvaluated, situation is null ? "no service situation; a deflection limit is held against service situations alone" : "the source of the forces gives no deflections"),
            Trace = [],
        };
    }

    private static IEnumerable<CheckLine> OfStress(SituationFindings finding, Found stress, bool withTraces)
    {
        var situation = finding.Forces.Situation;
        yield return new CheckLine
        {
            Key = Governing.StressKey,
            Name = stress.Rule.Words,
            Decides = true,
            Clause = stress.Rule.Clause,
            Situation = situation.Name,
            Kind = Word(situation.Kind),
            Station = stress.X,
            Utilization = stress.Utilization,
            Reason = null,
            Trace = withTraces ? stress.Rule.Check(stress.Point).Trace : [],
        };
        if (stress.Field.Section is not (Round or Rectangle or RoundedRectangle or Tube or Box) || stress.Rule.RequiredYield(stress.Point) is null) yield break;

        var ratio = PlasticRatio.Of(stress.Field.Section, stress.Field.Properties, stress.Forces, stress.Rule.Allowed(stress.Point));
        yield return Line(finding, new NamedCheck("plastic", "ratio to the plastic resistances at the limit stress", CheckStanding.Informs, ratio), stress.X, withTraces);
    }

    private static CheckLine Line(SituationFindings finding, NamedCheck check, double? station, bool withTraces) => new()
    {
        Key = check.Key,
        Name = check.Name,
        Decides = check.Standing == CheckStanding.Decides,
        Clause = check.Result.Clause.ToString(),
        Situation = finding.Forces.Situation.Name,
        Kind = Word(finding.Forces.Situation.Kind),
        Station = station,
        Utilization = check.Utilization,
        Reason = (check.Result as CheckResult.NotEvaluated)?.Why,
        Trace = withTraces && check.Result is CheckResult.Evaluated made ? made.Trace : [],
    };

    internal static string Word(SituationKind kind) => kind.ToString().ToLowerInvariant();
}
