namespace MemberScan.Checks.En1993.Members;

/// <summary>EN 1993-1-1:2005, 6.3.2: lateral-torsional buckling, general case (6.3.2.2).</summary>
/// <remarks>
/// From memory. Round and square sections and bending about the weaker axis are not susceptible (6.3.2.1(2)). Rectangles, solid or hollow,
/// about their stronger axis take curve d ("other sections") with the elastic critical moment of a member under uniform moment,
/// <c>π/L·√(E·I_z·G·I_t)</c> (plain mechanics, no warping); a load that acts above the shear centre lowers it and is not covered.
/// </remarks>
public static class LateralTorsionalBuckling
{
    private const double Alike = 1e-9;

    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = Clauses.Of("6.3.2.2", "(6.54), (6.55)");

    /// <summary>Elastic critical moment under uniform moment, warping left out [N·m].</summary>
    /// <param name="E">Modulus [Pa].</param>
    /// <param name="G">Shear modulus [Pa].</param>
    /// <param name="I_z">Second moment about the weaker axis [m⁴].</param>
    /// <param name="I_t">Torsion constant [m⁴].</param>
    /// <param name="L">Length between lateral restraints [m].</param>
    public static double M_cr(double E, double G, double I_z, double I_t, double L) => Math.PI / L * Math.Sqrt(E * I_z * G * I_t);

    /// <summary>Reduction factor χ_LT of the general case: the form of (6.49) with Φ of (6.56).</summary>
    /// <param name="lambdaBar_LT">Slenderness λ̄_LT [-], ≥ 0.</param>
    /// <param name="alpha_LT">Imperfection factor [-]; 0.76 of curve d.</param>
    public static double Chi_LT(double lambdaBar_LT, double alpha_LT) => FlexuralBuckling.Chi(lambdaBar_LT, alpha_LT);   // (6.56)

    /// <summary>Whether bending about the stronger axis may turn the member sideways.</summary>
    internal static bool IsSusceptible(MemberCase c, BendingAxis strong, BendingAxis weak) =>
        !c.IsRound && strong.I > weak.I * (1 + Alike);

    /// <summary>χ_LT for bending about the stronger axis; 1 where the section is not susceptible.</summary>
    internal static (double M_cr, double LambdaBar, double Chi) About(MemberCase c, BendingAxis strong, BendingAxis weak, double W)
    {
        if (!IsSusceptible(c, strong, weak)) return (double.PositiveInfinity, 0, 1);

        var torsion = c.Properties.JAnnex ?? c.Properties.J!.Value;
        var critical = M_cr(c.Modulus, c.Modulus / (2 * (1 + c.Poisson)), weak.I, torsion, LengthOf(strong, weak));
        var slenderness = Math.Sqrt(W * c.Yield / critical);
        return (critical, slenderness, Chi_LT(slenderness, BucklingCurve.D.Alpha));
    }

    /// <summary>The check for the largest moment about the stronger axis; null without one or where the section is not susceptible.</summary>
    internal static CheckResult.Evaluated? Check(MemberCase c, BendingAxis strong, BendingAxis weak, double moment, bool isPlastic)
    {
        if (moment == 0 || !IsSusceptible(c, strong, weak)) return null;

        var W = isPlastic ? strong.Wpl : strong.Wel;
        var (critical, slenderness, chi) = About(c, strong, weak, W);
        var resistance = chi * W * c.Yield / c.GammaM1;                             // (6.55)
        return new Calculation(Clause)
            .Given($"M_{strong.Name},Ed", moment, "N·m", "largest moment about the stronger axis, magnitude")
            .Given("L", LengthOf(strong, weak), "m", "the larger buckling length of the two axes")
            .Given("I_t", c.Properties.JAnnex ?? c.Properties.J!.Value, "m⁴", "section")
            .Given($"I_{weak.Name}", weak.I, "m⁴", "section")
            .Found("M_cr", $"π/L·√(E·I·G·I_t), E = {Shown.MPa(c.Modulus)} MPa, ν = {Shown.Number(c.Poisson)}", critical, "N·m", "uniform moment, load through the shear centre, plain mechanics")
            .Given("W", W, "m³", isPlastic ? "section, plastic modulus" : "section, elastic modulus")
            .Given("f_y", c.Yield, "Pa", c.YieldSource)
            .Found("λ̄_LT", $"√(W·f_y/M_cr) = √({Shown.Number(W * c.Yield / 1e3)}/{Shown.Number(critical / 1e3)})", slenderness, "-")
            .Found("χ_LT", slenderness <= 0.2 ? "1 up to 0.2" : "curve d, α = 0.76", chi, "-", Clauses.Of("6.3.2.2", "(6.56)").ToString())
            .Given("γM1", c.GammaM1, "-", c.GammaSource)
            .Found("M_b,Rd", $"χ_LT·W·f_y/γM1 = {Shown.Number(chi)}·{Shown.Mm3(W)} mm³·{Shown.MPa(c.Yield)} MPa/{Shown.Number(c.GammaM1)}", resistance, "N·m")
            .Utilization($"M_Ed/M_b,Rd = {Shown.Number(moment / 1e3)}/{Shown.Number(resistance / 1e3)}", moment / resistance);
    }

    private static double LengthOf(BendingAxis strong, BendingAxis weak) => Math.Max(strong.Length.Value, weak.Length.Value);
}
