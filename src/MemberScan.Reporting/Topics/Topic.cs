using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Topics;

/// <summary>Overstressed candidates of one cause: the same role, section, criterion and situation.</summary>
/// <param name="Role">Guess of the role.</param>
/// <param name="Section">Section that decides.</param>
/// <param name="Criterion">The criterion in words.</param>
/// <param name="Situation">The situation.</param>
/// <param name="Members">The candidates, worst first.</param>
public sealed record Topic(string Role, string Section, string Criterion, string Situation, ImmutableArray<MemberResult> Members)
{
    private const string Alphabet = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz_$";
    private const int GlobalIdLength = 22;

    /// <summary>The topics of a record, the one with the worst candidate first.</summary>
    public static ImmutableArray<Topic> Of(ScreeningRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        return
        [
            .. record.Members.Where(m => m.Verdict == Model.Verdicts.Verdict.Overstressed)
                .OrderByDescending(m => m.Governing!.Utilization)
                .GroupBy(m => (m.Role, m.Governing!.Section, m.Governing.Criterion, m.Governing.Situation))
                .Select(g => new Topic(g.Key.Role, g.Key.Section, g.Key.Criterion, g.Key.Situation, [.. g])),
        ];
    }

    /// <summary>GlobalIds of the elements, each once; malformed ones are left out, since the format has no place for them.</summary>
    public IEnumerable<string> Components => Members.Select(m => m.GlobalId).Where(IsWellFormed).Distinct(StringComparer.Ordinal);

    /// <summary>One line that names the cause.</summary>
    public string Title => ForeignText.Name(string.Create(CultureInfo.InvariantCulture, $"Overstressed: {Members.Length} × {Role}, {Section}, {Situation}"));

    /// <summary>What a modeler must know: the worst member, the criterion, what the picture lacks.</summary>
    public string Description(ScreeningRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        var worst = Members[0];
        var governing = worst.Governing!;
        var lines = new List<string>
        {
            string.Create(CultureInfo.InvariantCulture, $"{Members.Length} overstressed of role {Role} (a guess), section {Section}, in situation {Situation} ({governing.Kind}); criterion {Criterion}."),
            string.Create(CultureInfo.InvariantCulture, $"Worst: {(worst.Name.Length > 0 ? worst.Name : worst.Class)} ({worst.Key}), utilization {governing.Utilization:0.000}, {governing.Stress / 1e6:0.0} MPa against {governing.Limit / 1e6:0.0} MPa at {governing.Station:0.###} m from its start, {governing.Point.Place}."),
            $"Values of each member stand in its property set MemberScan_StressCheck. Run {record.RunId}, MemberScan {record.Version}.",
        };
        var malformed = Members.Count(m => !IsWellFormed(m.GlobalId));
        if (malformed > 0) lines.Add(string.Create(CultureInfo.InvariantCulture, $"{malformed} have a malformed GlobalId and cannot be selected."));
        var unplaced = Members.Count(m => m.Axes is null || m.Length is null);
        if (unplaced > 0) lines.Add(string.Create(CultureInfo.InvariantCulture, $"{unplaced} have no known axis and are not in the picture."));
        lines.AddRange(record.Cautions);
        return string.Join("\n", lines.Select(ForeignText.Sentence));
    }

    private static bool IsWellFormed(string globalId) => globalId.Length == GlobalIdLength && globalId.All(c => Alphabet.Contains(c, StringComparison.Ordinal));
}
