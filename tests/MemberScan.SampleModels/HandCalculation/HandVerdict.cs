using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.SampleModels.Scenario;

namespace MemberScan.SampleModels.HandCalculation;

/// <summary>The intended verdict of a sample member by a plain calculation of its own: elementary stresses against the default limits.</summary>
/// <remarks>
/// Service: σvM ≤ fy/1.67. Design: σvM ≤ fy/1.00 (EN 1993-1-1:2005, 6.2.1(5), γM0 = 1.00). Compression over 4 % of the Euler load with a buckling
/// length of twice the member is not checked (6.3.1.2(4), from memory).
/// </remarks>
public static class HandVerdict
{
    private const double Omega = 1.67;
    private const double LengthFactor = 2;
    private const double CompressionShare = 0.04;
    private const int StepsBetweenStations = 32;

    /// <summary>Calculates a member.</summary>
    public static HandResult Of(SampleMember member)
    {
        if (member.Body == SampleBody.Brep) return NotChecked("mesh-not-allowed", "the body is a faceted boundary, and recognition of meshes is not asked for");
        if (member.Situations.IsEmpty) return NotChecked("no-forces", "no source has forces of it");

        var sections = HandSection.Of(member.Section);
        var ways = sections.SelectMany(s => member.Situations.Select(situation => Governing(member, s, situation))).ToArray();
        if (member.Material.Strength is not { } fy)
        {
            var largest = ways.MaxBy(w => w.Point.VonMises);
            return NotChecked("no-strength", $"σvM = {MPa(largest.Point.VonMises)} MPa, but '{member.Material.Name}' names no strength");
        }

        var worst = ways.MaxBy(w => w.Point.VonMises / Limit(fy, w.Situation));
        var limit = Limit(fy, worst.Situation);
        var utilization = worst.Point.VonMises / limit;
        var line = Line(member, worst, fy, limit, utilization);
        var (share, shareLine) = Compression(member, sections);
        var (verdict, reason) = utilization > 1 + 1e-9 ? ("OVERSTRESSED", null)
            : share > CompressionShare ? ("NOT CHECKED", "stability-not-checked")
            : ("WITHIN LIMIT", (string?)null);
        return new HandResult(verdict, reason, utilization, worst.Situation.Name, worst.X, worst.Point, line + shareLine);
    }

    private static HandResult NotChecked(string reason, string why) => new("NOT CHECKED", reason, null, null, 0, default, why);

    private static double Limit(double fy, SampleSituation situation) => situation.IsService ? fy / Omega : fy;

    private static (SampleSituation Situation, double X, SectionForces Forces, HandPoint Point) Governing(
        SampleMember member, HandSection section, SampleSituation situation)
    {
        var worst = (situation, X: 0.0, situation.Stations[0].Forces, section.Worst(situation.Stations[0].Forces));
        foreach (var (x, forces) in Places(situation))
        {
            var point = section.Worst(forces);
            if (point.VonMises > worst.Item4.VonMises * (1 + 1e-12)) worst = (situation, x, forces, point);
        }

        return worst;
    }

    // Between two stations V runs straight and M follows by dMy/dx = Vz, dMz/dx = −Vy: exact for constant shear and for uniform loads.
    private static IEnumerable<(double X, SectionForces Forces)> Places(SampleSituation situation)
    {
        for (var i = 0; i + 1 < situation.Stations.Length; i++)
        {
            var (a, b) = (situation.Stations[i], situation.Stations[i + 1]);
            var length = b.X - a.X;
            if (length == 0) continue;

            var bends = a.Forces.Vy != b.Forces.Vy || a.Forces.Vz != b.Forces.Vz;
            for (var step = 0; step <= StepsBetweenStations; step += bends ? 1 : StepsBetweenStations)
            {
                var d = length * step / StepsBetweenStations;
                var straight = a.Forces + d / length * (b.Forces - a.Forces);
                yield return (a.X + d, straight with
                {
                    My = a.Forces.My + a.Forces.Vz * d + (b.Forces.Vz - a.Forces.Vz) * d * d / (2 * length),
                    Mz = a.Forces.Mz - a.Forces.Vy * d - (b.Forces.Vy - a.Forces.Vy) * d * d / (2 * length),
                });
            }
        }
    }

    private static (double Share, string Line) Compression(SampleMember member, IReadOnlyList<HandSection> sections)
    {
        var n = member.Situations.SelectMany(s => s.Stations).Min(s => s.Forces.N);
        if (n > -1e-9 || member.Material.Modulus is not { } modulus) return (0, "");

        var inertia = sections.Min(s => Math.Min(s.Iy, s.Iz));
        var euler = Math.PI * Math.PI * modulus * inertia / Math.Pow(LengthFactor * member.Length, 2);
        return (-n / euler, string.Create(CultureInfo.InvariantCulture,
            $"; N/Ncr = {-n / 1e3:0.###}/{euler / 1e3:0.###} = {-n / euler:0.0000} with Lcr = 2·{member.Length:0.###} m"));
    }

    private static string Line(
        SampleMember member, (SampleSituation Situation, double X, SectionForces Forces, HandPoint Point) worst, double fy, double limit, double utilization)
    {
        var f = worst.Forces;
        var divisor = worst.Situation.IsService ? Omega : 1;
        return $"{worst.Situation.Name}, x = {Text(worst.X, "0.###")} m: N {Text(f.N / 1e3)} kN, Vy {Text(f.Vy / 1e3)} kN, Vz {Text(f.Vz / 1e3)} kN, T {Text(f.T / 1e3)} kNm, "
            + $"My {Text(f.My / 1e3)} kNm, Mz {Text(f.Mz / 1e3)} kNm; at y {Text(worst.Point.Y * 1e3, "0.0#")} mm, z {Text(worst.Point.Z * 1e3, "0.0#")} mm σ = {MPa(worst.Point.Sigma)} MPa, "
            + $"τ = {MPa(worst.Point.Tau)} MPa, σvM = {MPa(worst.Point.VonMises)} MPa; fy/{Text(divisor, "0.00")} = {MPa(fy)}/{Text(divisor, "0.00")} = {MPa(limit)} MPa; "
            + $"{Text(utilization, "0.000")} ({member.Material.StrengthSource})";
    }

    private static string MPa(double pascals) => Text(pascals / 1e6, "0.00");

    private static string Text(double value, string format = "0.####")
    {
        var text = value.ToString(format, CultureInfo.InvariantCulture);
        return text.StartsWith('-') && text.All(c => c is '-' or '0' or '.') ? text[1..] : text;
    }
}
