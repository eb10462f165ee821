using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using MemberScan.SampleModels.HandCalculation;

namespace MemberScan.SampleModels.Scenario;

/// <summary>The Markdown page beside a sample.</summary>
internal static class DescriptionPage
{
    /// <summary>Prose, then the intended verdict of every member with the calculation that gives it.</summary>
    public static ImmutableArray<byte> Write(string prose, IReadOnlyCollection<SampleMember> members)
    {
        var results = members.Select(m => (Member: m, Result: HandVerdict.Of(m))).ToArray();
        var page = new StringBuilder(prose.TrimEnd()).Append("\n\n## Intended verdicts\n\n");
        page.Append(CultureInfo.InvariantCulture, $"{members.Count} candidates: ");
        page.AppendJoin(", ", new[] { "OVERSTRESSED", "NOT CHECKED", "WITHIN LIMIT" }.Select(v =>
            string.Create(CultureInfo.InvariantCulture, $"{results.Count(r => r.Result.Verdict == v)} {v}")));
        page.Append("""
            .

            Stresses are elementary (N/A, M·z/I, V·Q/(I·t), T·r/J, T/Wt), searched over the section and along the member. Limits are the defaults:
            service σvM ≤ fy/1.67; design σvM ≤ fy/1.00 (EN 1993-1-1:2005, 6.2.1(5), γM0 = 1.00). Compression over 4 % of the Euler load with a buckling
            length of twice the member (6.3.1.2(4), from memory) is not checked. Utilization is σvM over its limit, the largest of both combinations.

            | name | tag | key | section | material | length [m] | verdict | utilization |
            |---|---|---|---|---|---|---|---|

            """);
        foreach (var (member, result) in results)
        {
            var verdict = result.ReasonCode is { } reason ? $"{result.Verdict}, {reason}" : result.Verdict;
            var utilization = result.Utilization?.ToString("0.000", CultureInfo.InvariantCulture) ?? "–";
            page.Append(CultureInfo.InvariantCulture,
                $"| {member.Name} | {member.Tag ?? "–"} | `{member.Key}` | {Section(member)} | {member.Material.Name} | {member.Length:0.###} | {verdict} | {utilization} |\n");
        }

        page.Append("\n## The calculation, member by member\n\n");
        foreach (var (member, result) in results) page.Append(CultureInfo.InvariantCulture, $"- `{member.Key}` {member.Name}: {result.Line}.\n");
        return [.. Encoding.UTF8.GetBytes(page.ToString())];
    }

    private static string Section(SampleMember member) =>
        member.Body == SampleBody.Brep ? "faceted boundary" : member.Section.Designation;
}
