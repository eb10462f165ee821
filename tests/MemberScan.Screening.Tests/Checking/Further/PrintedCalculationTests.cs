using System.Globalization;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Scenario;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Checking.Further;

/// <summary>A reader who has the printed calculation alone, in four significant figures, gets the utilization.</summary>
/// <remarks>
/// Recomputed from the printed text by the formulas of engineering mechanics: σ = N/A + My·z/Iy − Mz·y/Iz, τ = √(τxy² + τxz²) of the parts by shear and torsion,
/// σvM = √(σ² + 3τ²), against fy/Ω or f_y/γM0.
/// </remarks>
public sealed class PrintedCalculationTests
{
    private const double Allowed = 0.005;

    [Theory]
    [InlineData(GangwayRails.Name, 6)]
    [InlineData(DeckHangers.Name, 2)]
    [InlineData(MastStays.Name, 1)]
    public void The_utilization_of_every_flagged_member_follows_from_the_printed_lines(string name, int flagged)
    {
        var members = ScreenerTests.Screen(name).Members.Where(m => m.Verdict == Verdict.Overstressed).ToArray();

        Assert.Equal(flagged, members.Length);
        Assert.All(members, member =>
        {
            var text = Printed(member.Governing!);
            Assert.Equal(1, Recomputed(text) / member.Governing!.Utilization, Allowed);
        });
    }

    private static string Printed(Governing governing) => string.Join('\n', governing.Trace.Select(line => string.Create(
        CultureInfo.InvariantCulture, $"{line.Symbol} = {line.Value.ToString("G4", CultureInfo.InvariantCulture)} {line.Unit}; {line.Formula}; {line.Source}")));

    private static double Recomputed(string text)
    {
        var values = new Dictionary<string, double>(StringComparer.Ordinal);
        foreach (var line in text.Split('\n'))
        {
            var (symbol, rest) = (line[..line.IndexOf(" = ", StringComparison.Ordinal)], line[(line.IndexOf(" = ", StringComparison.Ordinal) + 3)..]);
            values.TryAdd(symbol, double.Parse(rest[..rest.IndexOf(' ', StringComparison.Ordinal)], CultureInfo.InvariantCulture));
        }

        double Of(params ReadOnlySpan<string> symbols)
        {
            foreach (var symbol in symbols) if (values.TryGetValue(symbol, out var value)) return value;
            return 0;
        }

        var sigma = Of("N") / Of("A") + Of("My") * Of("z") / Of("Iy") - Of("Mz") * Of("y") / Of("Iz");
        var (xy, xz) = (Of("τxy(V)") + Of("τxy(T)"), Of("τxz(V)") + Of("τxz(T)"));
        return Math.Sqrt(sigma * sigma + 3 * (xy * xy + xz * xz)) / (Of("fy", "f_y") / Of("Ω", "γM0"));
    }
}
