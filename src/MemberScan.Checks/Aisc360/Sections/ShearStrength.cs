using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>AISC 360-22, G4 and G5 shear and H3.1 torsion of hollow sections: nominal strengths.</summary>
/// <remarks>
/// From memory. Of a tube the torsion constant C is the smaller of <c>π(D − t)²t/2</c> (user note) and 2J/D, which is cautious.
/// Solid bars are held to H3.3(b) by their stresses.
/// </remarks>
public static class ShearStrength
{
    /// <summary>Rectangular hollow sections.</summary>
    public static Clause BoxClause { get; } = StrengthFactor.Clause("G4", "(G4-1)");

    /// <summary>Round hollow sections.</summary>
    public static Clause TubeClause { get; } = StrengthFactor.Clause("G5", "(G5-1)");

    /// <summary>Torsion of hollow sections.</summary>
    public static Clause TorsionClause { get; } = StrengthFactor.Clause("H3.1", "(H3-1)");

    /// <summary>Web shear buckling coefficient C_v2 with k_v = 5 [-].</summary>
    /// <param name="slenderness">h/t [-].</param>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="F_y">Yield strength [Pa].</param>
    public static double C_v2(double slenderness, double E, double F_y)
    {
        var root = Math.Sqrt(5 * E / F_y);
        if (slenderness <= 1.10 * root) return 1;                                   // (G2-9)

        return slenderness <= 1.37 * root
            ? 1.10 * root / slenderness                                             // (G2-10)
            : 1.51 * 5 * E / (slenderness * slenderness * F_y);                     // (G2-11)
    }

    /// <summary>Shear strength of the two webs of a rectangular hollow section <c>0.6F_y·A_w·C_v2</c> [N].</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="h">Flat width of the web, side − 3t [m].</param>
    /// <param name="t">Wall [m].</param>
    /// <param name="E">Modulus [Pa].</param>
    public static double V_n_Box(double F_y, double h, double t, double E) => 0.6 * F_y * 2 * h * t * C_v2(h / t, E, F_y);   // (G4-1)

    /// <summary>Shear stress at which a round hollow section buckles or yields [Pa].</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="D">Outer diameter [m].</param>
    /// <param name="t">Wall [m].</param>
    /// <param name="L_v">Distance from the largest to no shear; the length of the member is cautious [m].</param>
    public static double F_cr_Shear(double F_y, double E, double D, double t, double L_v) => Math.Min(0.6 * F_y, Math.Max(
        1.60 * E / (Math.Sqrt(L_v / D) * Math.Pow(D / t, 1.25)),                    // (G5-2a)
        0.78 * E / Math.Pow(D / t, 1.5)));                                          // (G5-2b)

    /// <summary>Shear strength of a round hollow section <c>F_cr·A_g/2</c> [N].</summary>
    /// <param name="F_cr">Shear stress [Pa].</param>
    /// <param name="A_g">Area [m²].</param>
    public static double V_n_Tube(double F_cr, double A_g) => F_cr * A_g / 2;      // (G5-1)

    /// <summary>Torsional stress of a round hollow section [Pa].</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="D">Outer diameter [m].</param>
    /// <param name="t">Wall [m].</param>
    /// <param name="L">Length of the member [m].</param>
    public static double F_cr_TorsionTube(double F_y, double E, double D, double t, double L) => Math.Min(0.6 * F_y, Math.Max(
        1.23 * E / (Math.Sqrt(L / D) * Math.Pow(D / t, 1.25)),                      // (H3-2a)
        0.60 * E / Math.Pow(D / t, 1.5)));                                          // (H3-2b)

    /// <summary>Torsional stress of a rectangular hollow section [Pa]; null beyond h/t = 260.</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="slenderness">h/t of the longer side [-].</param>
    public static double? F_cr_TorsionBox(double F_y, double E, double slenderness)
    {
        var root = Math.Sqrt(E / F_y);
        if (slenderness <= 2.45 * root) return 0.6 * F_y;                           // (H3-3)
        if (slenderness <= 3.07 * root) return 0.6 * F_y * 2.45 * root / slenderness;   // (H3-4)

        return slenderness <= 260 ? 0.458 * Math.PI * Math.PI * E / (slenderness * slenderness) : null;   // (H3-5)
    }

    /// <summary>Torsion constant C of a hollow section [m³].</summary>
    /// <param name="section">Tube or box with its design wall.</param>
    /// <param name="J">Torsion constant of a tube [m⁴]; not used for a box.</param>
    public static double C(CrossSection section, double J) => section switch
    {
        Tube { OuterRadius: var r, Wall: var t } => Math.Min(Math.PI * (2 * r - t) * (2 * r - t) * t / 2, J / r),
        Box { Width: var b, Depth: var h, Wall: var t } => 2 * (b - t) * (h - t) * t - 4.5 * (4 - Math.PI) * t * t * t,
        _ => throw new ArgumentOutOfRangeException(nameof(section)),
    };

    /// <summary>Available shear strengths of a hollow section along y and z [N].</summary>
    internal static (double Y, double Z) Available(AiscCase c)
    {
        var (y, z) = Nominal(c);
        return (StrengthFactor.Member.Available(y, c.Method), StrengthFactor.Member.Available(z, c.Method));
    }

    internal static (double Y, double Z) Nominal(AiscCase c)
    {
        if (c.Section is Box box)
        {
            return (V_n_Box(c.Yield, Math.Max(0, box.Width - 3 * box.Wall), box.Wall, c.Modulus),
                V_n_Box(c.Yield, Math.Max(0, box.Depth - 3 * box.Wall), box.Wall, c.Modulus));
        }

        var tube = (Tube)c.Section;
        var nominal = V_n_Tube(F_cr_Shear(c.Yield, c.Modulus, 2 * tube.OuterRadius, tube.Wall, c.Length), c.Properties.Area);
        return (nominal, nominal);
    }

    /// <summary>Available torsional strength of a hollow section [N·m]; null beyond the scope of H3.1.</summary>
    internal static double? AvailableTorsion(AiscCase c)
    {
        var stress = c.Section switch
        {
            Tube tube => F_cr_TorsionTube(c.Yield, c.Modulus, 2 * tube.OuterRadius, tube.Wall, c.Length),
            Box box => F_cr_TorsionBox(c.Yield, c.Modulus, (Math.Max(box.Width, box.Depth) - 3 * box.Wall) / box.Wall),
            _ => throw new ArgumentException("H3.1 is for hollow sections", nameof(c)),
        };
        return stress is { } F_cr ? StrengthFactor.Member.Available(F_cr * C(c.Section, c.Properties.J ?? 0), c.Method) : null;
    }

    internal static CheckResult.Evaluated CheckShear(AiscCase c, bool isAlongY, double shear)
    {
        var clause = c.Section is Box ? BoxClause : TubeClause;
        var (nominal, available) = isAlongY ? (Nominal(c).Y, Available(c).Y) : (Nominal(c).Z, Available(c).Z);
        var words = c.Section is Box ? "0.6F_y·2ht·C_v2, h = side − 3t, k_v = 5" : $"F_cr·A_g/2, L_v = {Shown.Number(c.Length)} m (member length)";
        return new Calculation(clause)
            .Given("V_r", shear, "N", c.IsRound ? "√(Vy² + Vz²) of the section forces" : "section force, magnitude")
            .With(c.StrengthLines())
            .Found("V_n", words, nominal, "N")
            .Found("V_c", $"V_n{StrengthFactor.Member.Words(c.Method)}", available, "N", $"{clause}, {StrengthFactor.Name(c.Method)}")
            .Utilization($"V_r/V_c = {Shown.KN(shear)}/{Shown.KN(available)}", shear / available);
    }

    internal static CheckResult.Evaluated CheckTorsion(AiscCase c, double available)
    {
        var torsion = Math.Abs(c.Forces.T);
        return new Calculation(TorsionClause)
            .Given("T_r", torsion, "N·m", "section force, magnitude")
            .With(c.StrengthLines())
            .Given("C", C(c.Section, c.Properties.J ?? 0), "m³", c.Section is Box ? "2(b − t)(h − t)t − 4.5(4 − π)t³, H3.1 user note (from memory)" : "smaller of π(D − t)²t/2 and 2J/D (from memory)")
            .Found("T_c", $"F_cr·C{StrengthFactor.Member.Words(c.Method)}", available, "N·m", $"{TorsionClause}, {StrengthFactor.Name(c.Method)}")
            .Utilization($"T_r/T_c = {Shown.Number(torsion / 1e3)}/{Shown.Number(available / 1e3)}", torsion / available);
    }
}
