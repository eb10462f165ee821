using System.Globalization;

namespace MemberScan.Cli.Sections;

/// <summary>The stress state of one point as plain lines: MPa and degrees.</summary>
internal static class StatePrint
{
    /// <summary>Writes it.</summary>
    public static void Write(TextWriter output, SectionResult.State state)
    {
        void Line(FormattableString text) => output.WriteLine(text.ToString(CultureInfo.InvariantCulture));

        var shear = state.LargestShear;
        Line($"state at the largest von Mises: σ {Mpa(state.Sigma)} MPa, τxy {Mpa(state.TauXY)} MPa, τxz {Mpa(state.TauXZ)} MPa");
        Line($"principal stresses σ1 {Mpa(state.Sigma1)}, σ2 0, σ3 {Mpa(state.Sigma3)} MPa; σ1 at {Degrees(state.Angle):0.##}° from x towards τ, direction {Vector(state.Direction1)}, σ3 {Vector(state.Direction3)} (x, y, z){(state.HasFreeDirections ? "; without shear other directions hold as well" : "")}");
        Line($"largest shear {Mpa(shear.Shear)} MPa with σ {Mpa(shear.Normal)} MPa, on the face {Degrees(shear.Angle):0.##}° from x towards τ, normal {Vector(shear.Direction)}");
        Line($"Mohr's circles: {string.Join("; ", state.Circles.Select(c => string.Create(CultureInfo.InvariantCulture, $"{c.Name} centre {Mpa(c.Centre)}, radius {Mpa(c.Radius)} MPa")))}");
        foreach (var element in state.Elements)
            Line($"stress element {element.Plane}: σx {Mpa(element.Sigma)}, τ{element.Plane} {Mpa(element.Tau)} MPa; in this plane {Mpa(element.Smallest)} to {Mpa(element.Largest)} MPa, the largest at {Degrees(element.Angle):0.##}°");
    }

    // Rounded before it is written: no -0.
    private static string Mpa(double stress) => (Math.Round(stress / 1e6, 2) + 0.0).ToString("0.##", CultureInfo.InvariantCulture);

    private static double Degrees(double angle) => angle * 180 / Math.PI;

    private static string Vector(IReadOnlyList<double> v) =>
        string.Create(CultureInfo.InvariantCulture, $"({Math.Round(v[0], 4) + 0.0:0.####}, {Math.Round(v[1], 4) + 0.0:0.####}, {Math.Round(v[2], 4) + 0.0:0.####})");
}
