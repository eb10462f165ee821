using System.Globalization;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Cli.Sections;

/// <summary>The result of the section command as plain lines: mm, kN, kN·m, MPa.</summary>
internal static class SectionPrint
{
    /// <summary>Writes it.</summary>
    public static void Write(TextWriter output, string designation, SectionResult result, StressField field)
    {
        void Line(FormattableString text) => output.WriteLine(text.ToString(CultureInfo.InvariantCulture));

        var p = result.Properties;
        Line($"{designation}{(designation.StartsWith("box", StringComparison.Ordinal) && !designation.Contains("ro", StringComparison.Ordinal) ? ", sharp corners" : "")}");
        Line($"A    {p.Area * 1e6:0.###} mm²");
        Line($"Iy   {p.Iy * 1e12:0.#} mm⁴    Iz   {p.Iz * 1e12:0.#} mm⁴    Iyz {p.Iyz * 1e12:0.#} mm⁴");
        if (p.Iyz != 0) Line($"principal axes: I {field.Properties.IMax * 1e12:0.#} and {field.Properties.IMin * 1e12:0.#} mm⁴, the larger one about an axis {field.Properties.PrincipalAngle * 180 / Math.PI:0.##}° from y towards z");
        if (p.ShearCentreY == 0 && p.ShearCentreZ == 0) Line($"shear centre in the centroid");
        if (p.ShearCentreY != 0 || p.ShearCentreZ != 0) Line($"shear centre y {p.ShearCentreY * 1e3:0.###} mm, z {p.ShearCentreZ * 1e3:0.###} mm from the centroid: Vy, Vz and T are taken there");
        Line($"WelY {p.WelY * 1e9:0.##} mm³    WelZ {p.WelZ * 1e9:0.##} mm³{Extremes(p.Extremes)}");
        Line($"WplY {p.WplY * 1e9:0.##} mm³    WplZ {p.WplZ * 1e9:0.##} mm³{(p.PlasticAxisY == 0 && p.PlasticAxisZ == 0 ? "" : string.Create(CultureInfo.InvariantCulture, $", axes of equal areas at z {p.PlasticAxisZ * 1e3:0.###} mm and y {p.PlasticAxisY * 1e3:0.###} mm"))}");
        Line($"first moments of the half sections QY {p.QY * 1e9:0.##} mm³    QZ {p.QZ * 1e9:0.##} mm³");
        Line($"shear areas by energy, {result.Shear}: y {p.ShearAreaY * 1e6:0.##} mm², z {p.ShearAreaZ * 1e6:0.##} mm²");
        Line($"J    {Or(p.J, 1e12, "0.#", "mm⁴")} ({p.JSource}){(p.JThinWall is { } thin ? $", thin wall {(thin * 1e12).ToString("0.#", CultureInfo.InvariantCulture)} mm⁴" : "")}    Wt {Or(p.Wt, 1e9, "0.##", "mm³")}{(p.WtThinWall is { } bredt ? $", thin wall {(bredt * 1e9).ToString("0.##", CultureInfo.InvariantCulture)} mm³" : "")}");
        Line($"shear model {result.Shear}{(field.Model == ShearModel.Elasticity ? string.Create(CultureInfo.InvariantCulture, $", ν = {result.Poisson:0.###}") : "")}; warping left out");

        var f = result.Forces;
        Line($"N {f.N / 1e3:0.####} kN, Vy {f.Vy / 1e3:0.####} kN, Vz {f.Vz / 1e3:0.####} kN, T {f.T / 1e3:0.#####} kN·m, My {f.My / 1e3:0.#####} kN·m, Mz {f.Mz / 1e3:0.#####} kN·m");
        if (result.Situations is { } situations)
        {
            foreach (var s in situations)
                Line($"situation {s.Number}: largest von Mises {s.VonMises.Value / 1e6:0.##} MPa ({s.VonMises.Place}){(s.Utilization is { } u ? string.Create(CultureInfo.InvariantCulture, $", utilization {u:0.000}") : "")}");
            Line($"below: situation {result.Situation}, the largest");
        }

        foreach (var point in result.Points)
        {
            Line($"at y {point.Y * 1e3:0.###} mm, z {point.Z * 1e3:0.###} mm: σ {point.Sigma / 1e6:0.##} MPa, τxy {point.TauXY / 1e6:0.##} MPa, τxz {point.TauXZ / 1e6:0.##} MPa, τ {point.Tau / 1e6:0.##} MPa, von Mises {point.VonMises / 1e6:0.##} MPa, Tresca {point.Tresca / 1e6:0.##} MPa, σ1 {point.Sigma1 / 1e6:0.##} MPa, σ3 {point.Sigma3 / 1e6:0.##} MPa");
        }

        var g = result.Governing;
        foreach (var (name, measure) in new[] { ("von Mises", g.VonMises), ("Tresca", g.Tresca), ("|σ|", g.AbsSigma), ("τ", g.Tau), ("σ1", g.Sigma1), ("σ3", g.Sigma3) })
            Line($"largest {name}: {measure.Value / 1e6:0.##} MPa at y {measure.Y * 1e3:0.###} mm, z {measure.Z * 1e3:0.###} mm ({measure.Place})");
        StatePrint.Write(output, result.GoverningState);
        if (result.Comparison is { } other)
        {
            var o = other.Governing;
            Line($"{result.Shear} against {other.Shear}: von Mises {g.VonMises.Value / 1e6:0.##} / {o.VonMises.Value / 1e6:0.##} MPa ({100 * other.Difference:+0.0;−0.0;0.0} %), τ {g.Tau.Value / 1e6:0.##} / {o.Tau.Value / 1e6:0.##} MPa, each at its own point");
            if (other.FilletVonMises is { } peak) Line($"peak at the re-entrant fillets (elasticity, does not decide): von Mises {peak / 1e6:0.##} MPa");
            if (other.StressChange is { } change) Line($"numerical field: shear stresses changed by at most {100 * change:0.##} % of the largest at the last refinement");
        }

        var c = result.Closure;
        Line($"closure: N {c.N:0.######}, Vy {c.Vy:0.######}, Vz {c.Vz:0.######}, T {c.T:0.######}, My {c.My:0.######}, Mz {c.Mz:0.######}");
        if (result.Utilization is { } utilization) Line($"utilization (von Mises / fy): {utilization:0.000}");
        if (result.Plastic is { } plastic && (plastic.My > 0 || plastic.Mz > 0)) Line($"moment over plastic moment Wpl·fy, for information: My {plastic.My:0.000}, Mz {plastic.Mz:0.000}");
        foreach (var size in result.SmallestSize ?? [])
        {
            if (size.Value is { } value) Line($"hint for the modeler, elementary model: smallest {size.Dimension}: {value * 1e3:0.##} mm ({size.Section})");
            else Line($"hint for the modeler, elementary model: no {size.Dimension} would do");
        }

        if (result.SmallestSize is { Count: 0 }) Line($"no smallest size is sought for this kind of section");
    }

    // Only where the two sides differ.
    private static string Extremes(SectionResult.Extremes e)
    {
        const double Same = 1e-9;

        var text = "";
        if (Math.Abs(e.YTop - e.YBottom) > Same * e.YTop) text += string.Create(CultureInfo.InvariantCulture, $"    WelY +z {e.YTop * 1e9:0.##}, −z {e.YBottom * 1e9:0.##} mm³");
        if (Math.Abs(e.ZRight - e.ZLeft) > Same * e.ZRight) text += string.Create(CultureInfo.InvariantCulture, $"    WelZ +y {e.ZRight * 1e9:0.##}, −y {e.ZLeft * 1e9:0.##} mm³");
        return text;
    }

    private static string Or(double? value, double factor, string format, string unit) =>
        value is { } v ? $"{(v * factor).ToString(format, CultureInfo.InvariantCulture)} {unit}" : "not available";
}
