namespace MemberScan.Checks.Aisc360.Sections;

/// <summary>AISC 360-22, H1.1 and H1.2 axial force with bending, H3.2 with shear and torsion in hollow sections.</summary>
/// <remarks>From memory. Of round sections the resultant moment counts.</remarks>
public static class CombinedStrength
{
    /// <summary>Axial force and bending.</summary>
    public static Clause Clause { get; } = StrengthFactor.Clause("H1.1", "(H1-1)");

    /// <summary>With torsion beyond one fifth of its strength.</summary>
    public static Clause TorsionClause { get; } = StrengthFactor.Clause("H3.2", "(H3-6)");

    /// <summary>Share of the torsional strength up to which torsion is left out of the interaction [-].</summary>
    public const double NeglectedTorsion = 0.2;

    /// <summary>Left side of the interaction of axial force and bending [-].</summary>
    /// <param name="p">P_r/P_c [-].</param>
    /// <param name="m">M_rx/M_cx + M_ry/M_cy [-].</param>
    public static double AxialAndBending(double p, double m) => p >= 0.2
        ? p + 8.0 / 9 * m                                                           // (H1-1a)
        : p / 2 + m;                                                                // (H1-1b)

    /// <summary>Left side with torsion and shear [-].</summary>
    /// <param name="p">P_r/P_c [-].</param>
    /// <param name="m">M_r/M_c, both axes added [-].</param>
    /// <param name="v">V_r/V_c [-].</param>
    /// <param name="t">T_r/T_c [-].</param>
    public static double WithTorsion(double p, double m, double v, double t) => t <= NeglectedTorsion
        ? AxialAndBending(p, m)
        : p + m + (v + t) * (v + t);                                                // (H3-6)

    /// <summary>The interaction of the shares of strength at one station.</summary>
    /// <param name="p">P_r/P_c [-], ≥ 0.</param>
    /// <param name="my">Share of the moment about y, of round sections of the resultant [-], ≥ 0.</param>
    /// <param name="mz">Share of the moment about z [-], ≥ 0.</param>
    /// <param name="v">V_r/V_c, the larger of the axes [-], ≥ 0.</param>
    /// <param name="t">T_r/T_c [-], ≥ 0; 0 for solid bars.</param>
    internal static CheckResult.Evaluated Check(double p, double my, double mz, double v, double t)
    {
        var isTorsional = t > NeglectedTorsion;
        var m = my + mz;
        var words = isTorsional
            ? $"P_r/P_c + M_r/M_c + (V_r/V_c + T_r/T_c)² = {Shown.Number(p)} + {Shown.Number(m)} + ({Shown.Number(v)} + {Shown.Number(t)})²"
            : p >= 0.2 ? $"P_r/P_c + 8/9·ΣM_r/M_c = {Shown.Number(p)} + 8/9·{Shown.Number(m)}" : $"P_r/(2P_c) + ΣM_r/M_c = {Shown.Number(p)}/2 + {Shown.Number(m)}";
        return new Calculation(isTorsional ? TorsionClause : Clause)
            .Given("P_r/P_c", p, "-", "D2 or E3")
            .Given("M_ry/M_cy", my, "-", "F7, F8 or F11, about y, of round sections the resultant")
            .Given("M_rz/M_cz", mz, "-", "F7, F8 or F11, about z")
            .Given("V_r/V_c", v, "-", "G4 or G5; counts with torsion alone")
            .Given("T_r/T_c", t, "-", t <= NeglectedTorsion ? "H3.1; left out up to 0.2" : "H3.1")
            .RootOf(words, s => WithTorsion(s * p, s * m, s * v, s * t));
    }
}
