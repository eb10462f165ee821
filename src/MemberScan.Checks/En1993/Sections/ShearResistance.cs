using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.En1993.Sections;

/// <summary>EN 1993-1-1:2005, 6.2.6 shear and 6.2.7 torsion, alone and together.</summary>
/// <remarks>
/// From memory. Solid bars have no shear area in 6.2.6(3): they are held to the elastic limit of (6.19) with the elementary shear stress,
/// which is cautious. (6.28) is given for hollow sections and used for solid bars too, as elastic superposition.
/// </remarks>
public static class ShearResistance
{
    /// <summary>Shear.</summary>
    public static Clause ShearClause { get; } = Clauses.Of("6.2.6", "(6.17), (6.18)");

    /// <summary>Shear of solid bars.</summary>
    public static Clause ElasticShearClause { get; } = Clauses.Of("6.2.6(4)", "(6.19)");

    /// <summary>Torsion.</summary>
    public static Clause TorsionClause { get; } = Clauses.Of("6.2.7", "(6.23)");

    /// <summary>Shear with torsion.</summary>
    public static Clause CombinedClause { get; } = Clauses.Of("6.2.7(9)", "(6.25), (6.28)");

    /// <summary>Plastic shear resistance <c>A_v·(f_y/√3)/γM0</c> [N].</summary>
    /// <param name="A_v">Shear area [m²].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M0">γM0 [-].</param>
    public static double V_pl_Rd(double A_v, double f_y, double gamma_M0) => A_v * (f_y / Math.Sqrt(3)) / gamma_M0;   // (6.18)

    /// <summary>Elastic torsional resistance <c>W_t·(f_y/√3)/γM0</c> [N·m].</summary>
    /// <param name="W_t">Torsion modulus [m³].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M0">γM0 [-].</param>
    public static double T_Rd(double W_t, double f_y, double gamma_M0) => W_t * (f_y / Math.Sqrt(3)) / gamma_M0;

    /// <summary>Shear resistance reduced by torsion, hollow sections [N].</summary>
    /// <param name="tau_t_Ed">Shear stress of torsion [Pa].</param>
    /// <param name="V_pl_Rd">Plastic shear resistance [N].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M0">γM0 [-].</param>
    /// <returns>The resistance, 0 where torsion leaves none.</returns>
    public static double V_pl_T_Rd(double tau_t_Ed, double V_pl_Rd, double f_y, double gamma_M0) =>
        Math.Max(0, 1 - tau_t_Ed / (f_y / Math.Sqrt(3) / gamma_M0)) * V_pl_Rd;       // (6.28)

    /// <summary>Shear areas along y and z [m²]: 6.2.6(3) (f) and (g); of solid bars the area over the elementary shape factor.</summary>
    /// <param name="section">Bar, tube or box.</param>
    /// <param name="A">Its area [m²].</param>
    public static (double Y, double Z) A_v(CrossSection section, double A) => section switch
    {
        Tube => (2 * A / Math.PI, 2 * A / Math.PI),                                 // (g)
        Box box => (A * box.Width / (box.Width + box.Depth), A * box.Depth / (box.Width + box.Depth)),   // (f)
        Round => (A * 3 / 4, A * 3 / 4),                                            // τ = 4/3·V/A
        Rectangle or RoundedRectangle => (A / 1.5, A / 1.5),                        // τ = 1.5·V/A
        _ => throw new ArgumentOutOfRangeException(nameof(section)),
    };

    /// <summary>Shares of the shear and torsional resistances that are used.</summary>
    /// <param name="c">The section.</param>
    /// <param name="forces">Section forces, those of the case or a multiple.</param>
    /// <returns>Shear [-] and torsion [-]; each linear in the load.</returns>
    internal static (double Shear, double Torsion) Used(SectionCase c, in SectionForces forces)
    {
        var (areaY, areaZ) = A_v(c.Section, c.Properties.Area);
        var y = Math.Abs(forces.Vy) / V_pl_Rd(areaY, c.Yield, c.GammaM0);
        var z = Math.Abs(forces.Vz) / V_pl_Rd(areaZ, c.Yield, c.GammaM0);
        var shear = c.Section is Box ? Math.Max(y, z) : double.Hypot(y, z);
        var torsion = forces.T == 0 ? 0 : Math.Abs(forces.T) / T_Rd(c.Properties.Wt!.Value, c.Yield, c.GammaM0);
        return (shear, torsion);
    }

    /// <summary>Shear along one axis, of round and solid sections the resultant; null without shear.</summary>
    /// <param name="c">The section and its forces.</param>
    /// <param name="isAlongY">Along y; else along z. Of use for boxes alone.</param>
    public static CheckResult.Evaluated? CheckShear(SectionCase c, bool isAlongY)
    {
        ArgumentNullException.ThrowIfNull(c);
        var isBox = c.Section is Box;
        var shear = isBox ? Math.Abs(isAlongY ? c.Forces.Vy : c.Forces.Vz) : double.Hypot(c.Forces.Vy, c.Forces.Vz);
        if (shear == 0 || (!isBox && isAlongY)) return null;

        var areas = A_v(c.Section, c.Properties.Area);
        var area = isAlongY ? areas.Y : areas.Z;
        var resistance = V_pl_Rd(area, c.Yield, c.GammaM0);
        return new Calculation(c.IsSolid ? ElasticShearClause : ShearClause)
            .Given("V_Ed", shear, "N", isBox ? "section force, magnitude" : "√(Vy² + Vz²) of the section forces")
            .Given("A", c.Properties.Area, "m²", "section, gross")
            .Found("A_v", AreaWords(c.Section, isAlongY), area, "m²")
            .With(c.StrengthLines())
            .Found("V_c,Rd", $"A_v·(f_y/√3)/γM0 = {Shown.Mm2(area)} mm²·{Shown.MPa(c.Yield)} MPa/√3/{Shown.Number(c.GammaM0)}", resistance, "N")
            .Utilization($"V_Ed/V_c,Rd = {Shown.KN(shear)}/{Shown.KN(resistance)}", shear / resistance);
    }

    /// <summary>Torsion; null without it.</summary>
    /// <param name="c">The section and its forces; its torsion modulus known.</param>
    public static CheckResult.Evaluated? CheckTorsion(SectionCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        if (c.Forces.T == 0) return null;

        var modulus = c.Properties.Wt!.Value;
        var resistance = T_Rd(modulus, c.Yield, c.GammaM0);
        var torsion = Math.Abs(c.Forces.T);
        return new Calculation(TorsionClause)
            .Given("T_Ed", torsion, "N·m", "section force, magnitude")
            .Given("W_t", modulus, "m³", "section")
            .With(c.StrengthLines())
            .Found("T_Rd", $"W_t·(f_y/√3)/γM0 = {Shown.Mm3(modulus)} mm³·{Shown.MPa(c.Yield)} MPa/√3/{Shown.Number(c.GammaM0)}", resistance, "N·m")
            .Utilization($"T_Ed/T_Rd = {Shown.Number(torsion / 1e3)}/{Shown.Number(resistance / 1e3)}", torsion / resistance);
    }

    /// <summary>Shear reduced by torsion; null unless both act.</summary>
    /// <param name="c">The section and its forces; its torsion modulus known.</param>
    public static CheckResult.Evaluated? CheckCombined(SectionCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        var (shear, torsion) = Used(c, c.Forces);
        if (shear == 0 || torsion == 0) return null;

        return new Calculation(CombinedClause)
            .Given("V_Ed/V_pl,Rd", shear, "-", "6.2.6, the larger of the axes of a box")
            .Given("τ_t,Ed/(f_y/√3/γM0)", torsion, "-", "6.2.7, T_Ed/T_Rd")
            .RootOf(
                $"V_Ed/V_pl,T,Rd = {Shown.Number(shear)}/(1 − {Shown.Number(torsion)})",
                s => s * torsion >= 1 ? double.PositiveInfinity : s * shear / (1 - s * torsion));
    }

    private static string AreaWords(CrossSection section, bool isAlongY) => section switch
    {
        Tube => "2A/π",
        Box when isAlongY => "A·b/(b + h)",
        Box => "A·h/(b + h)",
        Round => "A·3/4 (elastic, τ = 4V/(3A))",
        _ => "A/1.5 (elastic, τ = 1.5V/A)",
    };
}
