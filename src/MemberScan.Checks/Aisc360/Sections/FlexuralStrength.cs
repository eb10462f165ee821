namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>AISC 360-22, F7 rectangular hollow sections, F8 round hollow sections, F11 rectangular bars and rounds: nominal moments.</summary>
/// <remarks>
/// From memory, C_b = 1 (uniform moment). F11: the cap on M_p is 1.5F_yS for all bars, the smaller of the values remembered for rounds
/// (1.5 and 1.6); rectangles never pass it. Slender flanges and webs of F7 are not evaluated.
/// </remarks>
public static class FlexuralStrength
{
    /// <summary>Rectangular hollow sections.</summary>
    public static Clause BoxClause { get; } = StrengthFactor.Clause("F7", "");

    /// <summary>Round hollow sections.</summary>
    public static Clause TubeClause { get; } = StrengthFactor.Clause("F8", "");

    /// <summary>Rectangular bars and rounds.</summary>
    public static Clause BarClause { get; } = StrengthFactor.Clause("F11", "");

    /// <summary>Plastic moment <c>F_y·Z</c> [N·m].</summary>
    public static double M_p(double F_y, double Z) => F_y * Z;                      // (F7-1), (F8-1)

    /// <summary>F7.2: flange local buckling of a section whose flange is noncompact [N·m].</summary>
    /// <param name="M_p">Plastic moment [N·m].</param>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="S">Elastic modulus [m³].</param>
    /// <param name="slenderness">b/t of the flange [-].</param>
    /// <param name="E">Modulus [Pa].</param>
    public static double M_n_Flange(double M_p, double F_y, double S, double slenderness, double E) =>
        Math.Min(M_p, M_p - (M_p - F_y * S) * (3.57 * slenderness * Math.Sqrt(F_y / E) - 4.0));      // (F7-2)

    /// <summary>F7.3: web local buckling of a section whose web is noncompact [N·m].</summary>
    /// <param name="M_p">Plastic moment [N·m].</param>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="S">Elastic modulus [m³].</param>
    /// <param name="slenderness">h/t of the web [-].</param>
    /// <param name="E">Modulus [Pa].</param>
    public static double M_n_Web(double M_p, double F_y, double S, double slenderness, double E) =>
        Math.Min(M_p, M_p - (M_p - F_y * S) * (0.305 * slenderness * Math.Sqrt(F_y / E) - 0.738));   // (F7-6)

    /// <summary>F7.4: limiting lengths of lateral-torsional buckling about the stronger axis [m].</summary>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="r_y">Radius of gyration about the weaker axis [m].</param>
    /// <param name="J">Torsion constant [m⁴].</param>
    /// <param name="A_g">Area [m²].</param>
    /// <param name="M_p">Plastic moment [N·m].</param>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="S_x">Elastic modulus about the stronger axis [m³].</param>
    /// <returns>L_p and L_r.</returns>
    public static (double L_p, double L_r) BoxLengths(double E, double r_y, double J, double A_g, double M_p, double F_y, double S_x) =>
        (0.13 * E * r_y * Math.Sqrt(J * A_g) / M_p, 2 * E * r_y * Math.Sqrt(J * A_g) / (0.7 * F_y * S_x));   // (F7-12), (F7-13)

    /// <summary>F7.4: lateral-torsional buckling with C_b = 1 [N·m].</summary>
    /// <param name="M_p">Plastic moment [N·m].</param>
    /// <param name="L_b">Unbraced length [m].</param>
    /// <param name="L_p">Limit of yielding [m].</param>
    /// <param name="L_r">Limit of inelastic buckling [m].</param>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="S_x">Elastic modulus about the stronger axis [m³].</param>
    public static double M_n_BoxLateral(double M_p, double L_b, double L_p, double L_r, double F_y, double S_x)
    {
        if (L_b <= L_p) return M_p;

        return L_b <= L_r
            ? Math.Min(M_p, M_p - (M_p - 0.7 * F_y * S_x) * (L_b - L_p) / (L_r - L_p))     // (F7-10)
            : Math.Min(M_p, 0.7 * F_y * S_x * L_r / L_b);                                  // (F7-11): 2E·√(J·A_g)/(L_b/r_y)
    }

    /// <summary>F8: nominal moment of a round hollow section [N·m]; null beyond D/t = 0.45E/F_y.</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="slenderness">D/t [-].</param>
    /// <param name="Z">Plastic modulus [m³].</param>
    /// <param name="S">Elastic modulus [m³].</param>
    public static double? M_n_Tube(double F_y, double E, double slenderness, double Z, double S)
    {
        if (slenderness >= 0.45 * E / F_y) return null;                             // F8, scope

        var (compact, slender) = WallLimits.RoundInFlexure(E, F_y);
        if (slenderness <= compact) return M_p(F_y, Z);                             // (F8-1)

        return Math.Min(M_p(F_y, Z), slenderness <= slender
            ? (0.021 * E / slenderness + F_y) * S                                   // (F8-2)
            : 0.33 * E / slenderness * S);                                          // (F8-3), (F8-4)
    }

    /// <summary>F11.1: yielding of a bar [N·m].</summary>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="Z">Plastic modulus [m³].</param>
    /// <param name="S">Elastic modulus [m³].</param>
    public static double M_n_Bar(double F_y, double Z, double S) => Math.Min(F_y * Z, 1.5 * F_y * S);   // (F11-1)

    /// <summary>F11.2: lateral-torsional buckling of a rectangular bar about its stronger axis, C_b = 1 [N·m].</summary>
    /// <param name="M_p">Nominal moment of yielding [N·m].</param>
    /// <param name="F_y">Yield strength [Pa].</param>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="S_x">Elastic modulus about the stronger axis [m³].</param>
    /// <param name="ratio"><c>L_b·d/t²</c> [-].</param>
    public static double M_n_BarLateral(double M_p, double F_y, double E, double S_x, double ratio)
    {
        if (ratio <= 0.08 * E / F_y) return M_p;                                    // F11.2(a)

        return Math.Min(M_p, ratio <= 1.9 * E / F_y
            ? (1.52 - 0.274 * ratio * F_y / E) * F_y * S_x                          // (F11-2)
            : 1.9 * E / ratio * S_x);                                               // (F11-3), (F11-4)
    }
}
