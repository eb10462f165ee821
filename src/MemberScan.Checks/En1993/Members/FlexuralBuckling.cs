using MemberScan.Checks.Stability;

namespace MemberScan.Checks.En1993.Members;

/// <summary>EN 1993-1-1:2005, 6.3.1: flexural buckling of uniform members in compression, classes 1 to 3.</summary>
/// <remarks>From memory.</remarks>
public static class FlexuralBuckling
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = Clauses.Of("6.3.1", "(6.46), (6.47)");

    /// <summary>Non-dimensional slenderness <c>√(A·f_y/N_cr)</c> [-].</summary>
    /// <param name="A">Area [m²].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="N_cr">Elastic critical force [N], &gt; 0.</param>
    public static double LambdaBar(double A, double f_y, double N_cr) => Math.Sqrt(A * f_y / N_cr);   // 6.3.1.2(1)

    /// <summary>Reduction factor χ.</summary>
    /// <param name="lambdaBar">Slenderness λ̄ [-], ≥ 0.</param>
    /// <param name="alpha">Imperfection factor α of the curve [-].</param>
    /// <returns>χ [-], in (0, 1]; exactly 1 up to λ̄ = 0.2.</returns>
    public static double Chi(double lambdaBar, double alpha)
    {
        if (lambdaBar <= 0.2) return 1;                                             // 6.3.1.2(4)

        var phi = 0.5 * (1 + alpha * (lambdaBar - 0.2) + lambdaBar * lambdaBar);    // 6.3.1.2(1)
        return Math.Min(1, 1 / (phi + Math.Sqrt(phi * phi - lambdaBar * lambdaBar)));   // (6.49)
    }

    /// <summary>Buckling resistance <c>χ·A·f_y/γM1</c> [N].</summary>
    /// <param name="chi">χ [-].</param>
    /// <param name="A">Area [m²].</param>
    /// <param name="f_y">Yield strength [Pa].</param>
    /// <param name="gamma_M1">γM1 [-].</param>
    public static double N_b_Rd(double chi, double A, double f_y, double gamma_M1) => chi * A * f_y / gamma_M1;   // (6.47)

    /// <summary>Slenderness and χ about one axis.</summary>
    /// <param name="c">The member.</param>
    /// <param name="axis">The axis.</param>
    internal static (double N_cr, double LambdaBar, double Chi) About(MemberCase c, BendingAxis axis)
    {
        var critical = CompressionRule.EulerLoad(c.Modulus, axis.I, axis.Length.Value);
        var slenderness = LambdaBar(c.Properties.Area, c.Yield, critical);
        return (critical, slenderness, Chi(slenderness, c.Curve.Alpha));
    }

    /// <summary>The check about one axis.</summary>
    /// <param name="c">The member, compressed.</param>
    /// <param name="axis">The axis.</param>
    internal static CheckResult.Evaluated Check(MemberCase c, BendingAxis axis)
    {
        var (critical, slenderness, chi) = About(c, axis);
        var A = c.Properties.Area;
        var resistance = N_b_Rd(chi, A, c.Yield, c.GammaM1);
        var source = Clause.ToString();
        return new Calculation(Clause)
            .Given("N_Ed", -c.Actions.Compression, "N", "largest compression along the member, tension positive")
            .Given("E", c.Modulus, "Pa", "material of the member")
            .Given($"I_{axis.Name}", axis.I, "m⁴", "section")
            .Given("L_cr", axis.Length.Value, "m", axis.Length.Source)
            .Found("N_cr", $"π²·E·I/L_cr² = π²·{Shown.MPa(c.Modulus)}·{Shown.Number(axis.I * 1e12)}/{Shown.Mm(axis.Length.Value)}² N", critical, "N", "Euler load")
            .Given("A", A, "m²", "section, gross")
            .Given("f_y", c.Yield, "Pa", c.YieldSource)
            .Found("λ̄", $"√(A·f_y/N_cr) = √({Shown.Mm2(A)}·{Shown.MPa(c.Yield)} N/{Shown.KN(critical)} kN)", slenderness, "-", source)
            .Given("α", c.Curve.Alpha, "-", $"curve {c.Curve.Name}, {c.CurveSource}")
            .Found("χ", slenderness <= 0.2 ? "1 up to λ̄ = 0.2" : $"1/(Φ + √(Φ² − λ̄²)), Φ = ½(1 + α(λ̄ − 0.2) + λ̄²) = {Shown.Number(0.5 * (1 + c.Curve.Alpha * (slenderness - 0.2) + slenderness * slenderness))}", chi, "-", Clauses.Of("6.3.1.2", "(6.49)").ToString())
            .Given("γM1", c.GammaM1, "-", c.GammaSource)
            .Found("N_b,Rd", $"χ·A·f_y/γM1 = {Shown.Number(chi)}·{Shown.Mm2(A)} mm²·{Shown.MPa(c.Yield)} MPa/{Shown.Number(c.GammaM1)}", resistance, "N")
            .Utilization($"N_Ed/N_b,Rd = {Shown.KN(c.Actions.Compression)}/{Shown.KN(resistance)}", c.Actions.Compression / resistance);
    }
}
