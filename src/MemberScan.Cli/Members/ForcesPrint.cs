using System.Globalization;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Readiness;

namespace MemberScan.Cli.Members;

/// <summary>What was found of section forces, one line per candidate and situation: a dry run of tables and mappings.</summary>
internal static class ForcesPrint
{
    /// <summary>Writes the lines and their totals.</summary>
    public static void Write(TextWriter output, ReadinessRecord record)
    {
        foreach (var member in record.Members)
            foreach (var line in member.Forces)
                output.WriteLine(Line(member, line));

        var all = record.Members.SelectMany(m => m.Forces).ToList();
        var without = record.Members.Count(m => m.Forces.IsEmpty);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"{record.Model.FileName}: {all.Count(l => l.Unusable is null)} situations usable + {all.Count(l => l.Unusable is not null)} not = {all.Count} on {record.Members.Length - without} of {record.Members.Length} candidates"));
    }

    private static string Line(MemberReadiness member, ForcesLine line)
    {
        string[] parts =
        [
            line.Unusable is null ? "usable" : "not used", member.Key, $"'{Clean(member.Name)}'", $"'{Clean(line.Situation.Name)}'",
            line.Situation.Kind == SituationKind.Unknown ? "kind not stated" : $"{line.Situation.Kind.ToString().ToLowerInvariant()} ({Clean(line.Situation.KindSource)})",
            line.Situation.ActsInFull ? "acts in full" : "single load case",
            line.Unusable is { } why ? $"{why.Code.Text()}: {Clean(why.Message)}" : Values(line), Clean(line.Source), .. line.Conversion.Length > 0 ? new[] { Clean(line.Conversion) } : [],
        ];
        return string.Join(" | ", parts);
    }

    private static string Values(ForcesLine line) => string.Create(CultureInfo.InvariantCulture, $"{line.Stations} stations {line.From:0.###} to {line.To:0.###} m; ")
        + string.Join(", ", Range("N", line.Least.N, line.Largest.N, "kN"), Range("Vy", line.Least.Vy, line.Largest.Vy, "kN"), Range("Vz", line.Least.Vz, line.Largest.Vz, "kN"),
            Range("T", line.Least.T, line.Largest.T, "kNm"), Range("My", line.Least.My, line.Largest.My, "kNm"), Range("Mz", line.Least.Mz, line.Largest.Mz, "kNm"));

    private static string Range(string name, double least, double largest, string unit) => least.Equals(largest)
        ? string.Create(CultureInfo.InvariantCulture, $"{name} {least / 1e3:0.####} {unit}")
        : string.Create(CultureInfo.InvariantCulture, $"{name} {least / 1e3:0.####} to {largest / 1e3:0.####} {unit}");

    /// <summary>Model text on a terminal: control characters would be commands to it.</summary>
    private static string Clean(string text) => string.Concat(text.Select(c => char.IsControl(c) ? '\u00b7' : c));
}
