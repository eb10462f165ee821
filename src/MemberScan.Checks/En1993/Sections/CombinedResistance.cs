using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.En1993.Sections;

/// <summary>EN 1993-1-1:2005, 6.2.8 to 6.2.10: bending with shear and axial force.</summary>
/// <remarks>
/// From memory. More cautious than the clauses in two ways: shear beyond half its resistance lowers the strength of the whole section,
/// not of its shear area alone, and torsion counts towards that half. 6.2.9.1 has no formula for round sections: the tube takes the
/// plastic interaction of a thin ring, <c>cos(πn/2)</c>, the bar <c>1 − n²</c>; both lie below the exact ones (plain mechanics).
/// </remarks>
public static class CombinedResistance
{
    /// <summary>Classes 1 and 2.</summary>
    public static Clause PlasticClause { get; } = Clauses.Of("6.2.8 to 6.2.10", "(6.31), (6.41)");

    /// <summary>Class 3.</summary>
    public static Clause ElasticClause { get; } = Clauses.Of("6.2.8 to 6.2.10", "(6.42)");

    /// <summary>Reduction ρ of the strength by shear.</summary>
    /// <param name="used">Share of the shear resistance that is used, torsion included [-].</param>
    /// <returns><c>(2·used − 1)²</c> [-] beyond one half, up to 1; else 0.</returns>
    public static double Rho(double used) => used <= 0.5 ? 0 : Math.Min(1, (2 * used - 1) * (2 * used - 1));   // (6.29), 6.2.8(2)

    /// <summary>Moment resistance of a solid rectangle under axial force over that without [-].</summary>
    /// <param name="n">N_Ed/N_pl,Rd [-], ≥ 0.</param>
    public static double RectangleShare(double n) => Math.Max(0, 1 - n * n);        // (6.32)

    /// <summary>Moment resistance of a rectangular hollow section under axial force over that without [-].</summary>
    /// <param name="n">N_Ed/N_pl,Rd [-], ≥ 0.</param>
    /// <param name="a">a_w for bending about y, a_f about z: share of the area in the walls along the moment's lever, at most 0.5 [-].</param>
    public static double BoxShare(double n, double a) => Math.Clamp((1 - n) / (1 - 0.5 * a), 0, 1);   // (6.39), (6.40)

    /// <summary>Moment resistance of a thin ring under axial force over that without [-].</summary>
    /// <param name="n">N_Ed/N_pl,Rd [-], ≥ 0.</param>
    public static double RingShare(double n) => n >= 1 ? 0 : Math.Cos(Math.PI * n / 2);

    /// <summary>Exponent α = β of a rectangular hollow section.</summary>
    /// <param name="n">N_Ed/N_pl,Rd [-], ≥ 0.</param>
    public static double BoxExponent(double n)
    {
        var rest = 1 - 1.13 * n * n;
        return rest <= 0 ? 6 : Math.Min(6, 1.66 / rest);                            // 6.2.9.1(6)
    }

    /// <summary>The interaction; null without a moment.</summary>
    /// <param name="c">The section and its forces.</param>
    /// <param name="section">Its class, 1 to 3.</param>
    public static CheckResult.Evaluated? Check(SectionCase c, SectionClass section)
    {
        ArgumentNullException.ThrowIfNull(c);
        ArgumentNullException.ThrowIfNull(section);
        var (my, mz) = SectionCase.Moments(c.IsRound, c.Forces);
        if (my == 0 && mz == 0) return null;

        var (shear, torsion) = ShearResistance.Used(c, c.Forces);
        var rho = Rho(shear + torsion);
        var isPlastic = section.Number <= 2;
        var (resistanceY, resistanceZ) = BendingResistance.M_c_Rd(c, section.Number);
        var n = Math.Abs(c.Forces.N) / AxialResistance.N_pl_Rd(c.Properties.Area, c.Yield, c.GammaM0);
        var calculation = new Calculation(isPlastic ? PlasticClause : ElasticClause)
            .Given("N_Ed/N_pl,Rd", n, "-", AxialResistance.TensionClause.ToString())
            .Given("M_y,Ed/M_y,Rd", my / resistanceY, "-", c.IsRound ? "6.2.5, resultant moment" : "6.2.5")
            .Given("M_z,Ed/M_z,Rd", mz / resistanceZ, "-", "6.2.5")
            .Given("V_Ed/V_pl,Rd + T_Ed/T_Rd", shear + torsion, "-", "6.2.6 and 6.2.7")
            .Found("ρ", shear + torsion <= 0.5 ? "0 up to one half" : $"(2·{Shown.Number(shear + torsion)} − 1)²", rho, "-", Clauses.Of("6.2.8", "(6.29)").ToString());
        return isPlastic
            ? calculation.RootOf(PlasticWords(c, n / (1 - Math.Min(rho, 0.999999))), s => PlasticLeft(c, s * c.Forces))
            : calculation.RootOf("(n + m_y + m_z)/(1 − ρ)", s => ElasticLeft(c, s * c.Forces));
    }

    private static double PlasticLeft(SectionCase c, in SectionForces forces)
    {
        var (remains, n, y, z) = Shares(c, forces, isPlastic: true);
        if (remains <= 0) return double.PositiveInfinity;

        var interaction = c.Section switch
        {
            Round => Over(y, RectangleShare(n)),
            Tube => Over(y, RingShare(n)),
            Rectangle or RoundedRectangle => Over(y, RectangleShare(n)) + Over(z, RectangleShare(n)),     // 6.2.9.1(6), α = β = 1
            Box box => Powers(Over(y, BoxShare(n, WebShare(box.Width, box.Wall, c.Properties.Area))), Over(z, BoxShare(n, WebShare(box.Depth, box.Wall, c.Properties.Area))), BoxExponent(n)),
            _ => throw new ArgumentException($"there is no interaction for a section of the kind {c.Section.Kind}", nameof(c)),
        };
        return Math.Max(n, interaction);
    }

    private static double ElasticLeft(SectionCase c, in SectionForces forces)
    {
        var (remains, n, y, z) = Shares(c, forces, isPlastic: false);
        return remains <= 0 ? double.PositiveInfinity : n + y + z;                     // (6.42): σ_x,Ed over f_y/γM0
    }

    /// <summary>What ρ leaves, and the shares of axial force and moments of what is left.</summary>
    private static (double Remains, double N, double Y, double Z) Shares(SectionCase c, in SectionForces forces, bool isPlastic)
    {
        var (shear, torsion) = ShearResistance.Used(c, forces);
        var rest = 1 - Rho(shear + torsion);
        var (my, mz) = SectionCase.Moments(c.IsRound, forces);
        var (resistanceY, resistanceZ) = BendingResistance.M_c_Rd(c, isPlastic ? 1 : 3);
        var n = Math.Abs(forces.N) / AxialResistance.N_pl_Rd(c.Properties.Area, c.Yield, c.GammaM0);
        return (rest, n / rest, my / resistanceY / rest, mz / resistanceZ / rest);
    }

    /// <summary>a_w or a_f: (A − 2·side·t)/A, at most 0.5.</summary>
    private static double WebShare(double flange, double wall, double area) => Math.Clamp((area - 2 * flange * wall) / area, 0, 0.5);

    private static double Over(double share, double left) => share == 0 ? 0 : left <= 0 ? double.PositiveInfinity : share / left;

    private static double Powers(double y, double z, double exponent)
    {
        // One axis alone stays linear; the exponent belongs to biaxial bending.
        if (z == 0) return y;
        if (y == 0) return z;
        return Math.Pow(y, exponent) + Math.Pow(z, exponent);                       // (6.41)
    }

    private static string PlasticWords(SectionCase c, double n) => c.Section switch
    {
        Round => $"m/((1 − ρ)·(1 − n²)), n = N_Ed/((1 − ρ)N_pl,Rd) = {Shown.Number(n)}",
        Tube => $"m/((1 − ρ)·cos(πn/2)), n = N_Ed/((1 − ρ)N_pl,Rd) = {Shown.Number(n)}",
        Box box => $"max(n, (m_y/((1 − ρ)·k_y))^α + (m_z/((1 − ρ)·k_z))^α), k = (1 − n)/(1 − 0.5a) ≤ 1 = {Shown.Number(BoxShare(n, WebShare(box.Width, box.Wall, c.Properties.Area)))} and "
            + $"{Shown.Number(BoxShare(n, WebShare(box.Depth, box.Wall, c.Properties.Area)))}, α = {Shown.Number(BoxExponent(n))} under two moments, n = {Shown.Number(n)}",
        _ => $"(m_y + m_z)/((1 − ρ)·(1 − n²)), n = N_Ed/((1 − ρ)N_pl,Rd) = {Shown.Number(n)}",
    };
}
