using MemberScan.Checks.Stability;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.En1993.Members;

/// <summary>EN 1993-1-1:2005, 6.3.3 with the interaction factors of Annex B: bending and compression together.</summary>
/// <remarks>
/// From memory. Equivalent moment factors C_m = 1.0, their largest values in Table B.3, whatever the shape of the moments. Round sections take their
/// resultant moment about one axis. Of solid rectangles the factors are the larger of the columns of Tables B.1 and B.2, with k_zy = 1.
/// </remarks>
public static class BucklingInteraction
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = Clauses.Of("6.3.3, Annex B", "(6.61), (6.62)");

    /// <summary>k_yy, and k_zz of hollow sections: Table B.1 with C_m = 1 [-].</summary>
    /// <param name="lambdaBar">λ̄ about the axis [-].</param>
    /// <param name="n">N_Ed over the buckling resistance about the axis [-].</param>
    /// <param name="isPlastic">Class 1 or 2; else 3.</param>
    public static double K(double lambdaBar, double n, bool isPlastic) => isPlastic
        ? 1 + Math.Min(lambdaBar - 0.2, 0.8) * n
        : 1 + Math.Min(0.6 * lambdaBar, 0.6) * n;

    /// <summary>k_zz of open sections, used for solid rectangles: Table B.1 with C_m = 1 [-].</summary>
    /// <param name="lambdaBar">λ̄ about the weaker axis [-].</param>
    /// <param name="n">N_Ed over the buckling resistance about the weaker axis [-].</param>
    public static double K_zz_Open(double lambdaBar, double n) => 1 + Math.Min(2 * lambdaBar - 0.6, 1.4) * n;

    /// <summary>The check; null unless compression and a moment act.</summary>
    internal static CheckResult.Evaluated? Check(MemberCase c, BendingAxis strong, BendingAxis weak, (double Strong, double Weak) moments, bool isPlastic)
    {
        if (c.Actions.Compression <= CompressionRule.NoCompression || (moments.Strong == 0 && moments.Weak == 0)) return null;

        var y = FlexuralBuckling.About(c, strong);
        var z = FlexuralBuckling.About(c, weak);
        var chiLT = LateralTorsionalBuckling.About(c, strong, weak, isPlastic ? strong.Wpl : strong.Wel).Chi;
        var (k, n) = (Factors(1), Shares(1));
        return new Calculation(Clause)
            .Given("λ̄_y", y.LambdaBar, "-", $"6.3.1, about {strong.Name}, the stronger axis")
            .Given("λ̄_z", z.LambdaBar, "-", $"6.3.1, about {weak.Name}, the weaker axis")
            .Given("χ_LT", chiLT, "-", "6.3.2")
            .Given("n_y", n.Y, "-", "N_Ed/(χ_y·N_Rk/γM1)")
            .Given("n_z", n.Z, "-", "N_Ed/(χ_z·N_Rk/γM1)")
            .Given("m_y", n.My, "-", "M_y,Ed/(χ_LT·M_y,Rk/γM1)")
            .Given("m_z", n.Mz, "-", "M_z,Ed/(M_z,Rk/γM1)")
            .Given("k_yy", k.yy, "-", "Annex B, C_m = 1.0 (from memory)")
            .Given("k_yz", k.yz, "-", "Annex B, C_m = 1.0 (from memory)")
            .Given("k_zy", k.zy, "-", "Annex B, C_m = 1.0 (from memory)")
            .Given("k_zz", k.zz, "-", "Annex B, C_m = 1.0 (from memory)")
            .RootOf(
                $"max(n_y + k_yy·m_y + k_yz·m_z, n_z + k_zy·m_y + k_zz·m_z) = max({Shown.Number(n.Y + k.yy * n.My + k.yz * n.Mz)}, {Shown.Number(n.Z + k.zy * n.My + k.zz * n.Mz)})",
                Left);

        (double Y, double Z, double My, double Mz) Shares(double multiple)
        {
            var N = multiple * c.Actions.Compression;
            return (
                N / FlexuralBuckling.N_b_Rd(y.Chi, c.Properties.Area, c.Yield, c.GammaM1), N / FlexuralBuckling.N_b_Rd(z.Chi, c.Properties.Area, c.Yield, c.GammaM1),
                multiple * moments.Strong / (chiLT * (isPlastic ? strong.Wpl : strong.Wel) * c.Yield / c.GammaM1),
                multiple * moments.Weak / ((isPlastic ? weak.Wpl : weak.Wel) * c.Yield / c.GammaM1));
        }

        (double yy, double yz, double zy, double zz) Factors(double multiple)
        {
            var shares = Shares(multiple);
            // Below λ̄ = 0.2 the factor of classes 1 and 2 would fall under 1; it is kept at 1.
            var yy = Math.Max(1, K(y.LambdaBar, shares.Y, isPlastic));
            var zz = Math.Max(1, K(z.LambdaBar, shares.Z, isPlastic));
            var isSolid = c.Section is Rectangle or RoundedRectangle;
            if (isSolid && isPlastic) zz = Math.Max(zz, K_zz_Open(z.LambdaBar, shares.Z));
            return isPlastic
                ? (yy, 0.6 * zz, isSolid ? 1 : 0.6 * yy, zz)
                : (yy, zz, isSolid ? 1 : 0.8 * yy, zz);
        }

        double Left(double multiple)
        {
            var (shares, factors) = (Shares(multiple), Factors(multiple));
            return Math.Max(
                shares.Y + factors.yy * shares.My + factors.yz * shares.Mz,         // (6.61)
                shares.Z + factors.zy * shares.My + factors.zz * shares.Mz);        // (6.62)
        }
    }
}
