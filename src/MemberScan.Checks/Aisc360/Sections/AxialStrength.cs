using MemberScan.Checks.Stability;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>AISC 360-22, D2 tension and E3 flexural buckling.</summary>
/// <remarks>
/// From memory. D2(a) yielding of the gross section alone: rupture (b) hangs on the connection and is not covered. E7 (slender walls) is not
/// evaluated. E4 does not govern closed and solid sections of two axes of symmetry.
/// </remarks>
public static class AxialStrength
{
    /// <summary>Tension.</summary>
    public static Clause TensionClause { get; } = StrengthFactor.Clause("D2(a)", "(D2-1)");

    /// <summary>Compression.</summary>
    public static Clause CompressionClause { get; } = StrengthFactor.Clause("E3", "(E3-1)");

    /// <summary>Nominal tensile strength of yielding <c>F_y·A_g</c> [N].</summary>
    public static double P_n_Tension(double F_y, double A_g) => F_y * A_g;         // (D2-1)

    /// <summary>Elastic buckling stress <c>π²E/(L_c/r)²</c> [Pa].</summary>
    public static double F_e(double E, double slenderness) => Math.PI * Math.PI * E / (slenderness * slenderness);   // (E3-4)

    /// <summary>Nominal stress of flexural buckling [Pa].</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="F_e">Elastic buckling stress [Pa].</param>
    public static double F_n(double F_y, double F_e) => F_y / F_e <= 2.25
        ? Math.Pow(0.658, F_y / F_e) * F_y                                          // (E3-2)
        : 0.877 * F_e;                                                              // (E3-3)

    /// <summary>Why the walls bar E3; null when they are not slender.</summary>
    internal static string? SlenderWall(AiscCase c)
    {
        var (slenderness, limit) = c.Section switch
        {
            Tube tube => (2 * tube.OuterRadius / tube.Wall, WallLimits.RoundInCompression(c.Modulus, c.Yield)),
            Box box => ((Math.Max(box.Width, box.Depth) - 3 * box.Wall) / box.Wall, WallLimits.FlatInCompression(c.Modulus, c.Yield)),
            _ => (0, 1),
        };
        return slenderness <= limit * (1 + 1e-9)
            ? null
            : $"The wall has a slenderness of {Shown.Number(slenderness)}, more than λr = {Shown.Number(limit)} of {WallLimits.Clause}; E7 is not evaluated.";
    }

    /// <summary>Available strength for the sign of an axial force [N].</summary>
    internal static double Available(AiscCase c, bool isTension, double slenderness)
    {
        var A_g = c.Properties.Area;
        var nominal = isTension ? P_n_Tension(c.Yield, A_g) : F_n(c.Yield, F_e(c.Modulus, slenderness)) * A_g;   // (E3-1)
        return StrengthFactor.Member.Available(nominal, c.Method);
    }

    /// <summary>Larger slenderness of the two axes.</summary>
    internal static (double Value, BucklingLength Length, string Axis) SlendernessOf(AiscCase c, BucklingLength y, BucklingLength z)
    {
        var aboutY = y.Value / Math.Sqrt(c.Properties.Iy / c.Properties.Area);
        var aboutZ = z.Value / Math.Sqrt(c.Properties.Iz / c.Properties.Area);
        return aboutY >= aboutZ ? (aboutY, y, "y") : (aboutZ, z, "z");
    }

    internal static CheckResult.Evaluated CheckTension(AiscCase c)
    {
        var available = Available(c, isTension: true, slenderness: 0);
        var nominal = P_n_Tension(c.Yield, c.Properties.Area);
        return new Calculation(TensionClause)
            .Given("P_r", c.Forces.N, "N", "section force, tension positive")
            .Given("A_g", c.Properties.Area, "m²", "section, gross")
            .With(c.StrengthLines())
            .Found("P_n", $"F_y·A_g = {Shown.MPa(c.Yield)} MPa·{Shown.Mm2(c.Properties.Area)} mm²", nominal, "N")
            .Found("P_c", $"P_n{StrengthFactor.Member.Words(c.Method)}", available, "N", $"{TensionClause}, {StrengthFactor.Name(c.Method)}")
            .Utilization($"P_r/P_c = {Shown.KN(c.Forces.N)}/{Shown.KN(available)}", c.Forces.N / available);
    }

    internal static CheckResult.Evaluated CheckCompression(AiscCase c, BucklingLength y, BucklingLength z)
    {
        var (slenderness, length, axis) = SlendernessOf(c, y, z);
        var elastic = F_e(c.Modulus, slenderness);
        var stress = F_n(c.Yield, elastic);
        var available = Available(c, isTension: false, slenderness);
        var words = c.Yield / elastic <= 2.25
            ? $"0.658^(F_y/F_e)·F_y, F_y/F_e = {Shown.Number(c.Yield / elastic)} ≤ 2.25"
            : $"0.877F_e, F_y/F_e = {Shown.Number(c.Yield / elastic)} > 2.25";
        return new Calculation(CompressionClause)
            .Given("P_r", c.Forces.N, "N", "section force, tension positive")
            .Given("A_g", c.Properties.Area, "m²", "section, gross")
            .Given("L_c", length.Value, "m", $"bending about {axis}; {length.Source}")
            .Found("L_c/r", $"L_c·√(A/I_{axis})", slenderness, "-", "slenderness, the larger of the two axes")
            .With(c.StrengthLines())
            .Found("F_e", $"π²E/(L_c/r)² = π²·{Shown.MPa(c.Modulus)}/{Shown.Number(slenderness)}² MPa", elastic, "Pa", StrengthFactor.Clause("E3", "(E3-4)").ToString())
            .Found("F_n", words, stress, "Pa", StrengthFactor.Clause("E3", c.Yield / elastic <= 2.25 ? "(E3-2)" : "(E3-3)").ToString())
            .Found("P_n", $"F_n·A_g = {Shown.MPa(stress)} MPa·{Shown.Mm2(c.Properties.Area)} mm²", stress * c.Properties.Area, "N")
            .Found("P_c", $"P_n{StrengthFactor.Member.Words(c.Method)}", available, "N", $"{CompressionClause}, {StrengthFactor.Name(c.Method)}")
            .Utilization($"P_r/P_c = {Shown.KN(-c.Forces.N)}/{Shown.KN(available)}", -c.Forces.N / available);
    }
}
