using MemberScan.Checks.Stability;
using MemberScan.Foundation.Units;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Stability;

public sealed class CompressionRuleTests
{
    // Tube 48.3 x 3.2 mm: I = 11.586 cm4 (EN 10210-2 table: 11.6, from memory); 3 m, E = 210 GPa.
    private static readonly double s_inertia = Si.Cm4(11.586);
    private static readonly double s_modulus = Si.GPa(210);

    [Fact]
    public void The_euler_load_of_a_guard_rail_tube_of_3_m_is_26_7_kN()
    {
        // π²·210000·115860/3000² = 26 681 N, by hand.
        var load = CompressionRule.EulerLoad(s_modulus, s_inertia, bucklingLength: 3);

        Assert.Equal(26.7, load / 1e3, 1);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(5000)]
    [InlineData(-1e-9)]
    public void Tension_and_rounding_need_no_rule(double axialForce)
    {
        Assert.Null(CompressionRule.Check(axialForce, null, "no modulus", s_inertia, 3, 1));
    }

    [Fact]
    public void Compression_up_to_4_percent_of_the_euler_load_is_evaluated()
    {
        var limit = 0.04 * CompressionRule.EulerLoad(s_modulus, s_inertia, 3);

        var result = CompressionRule.Check(-limit, s_modulus, "", s_inertia, 3, 1);

        var evaluated = Assert.IsType<CheckResult.Evaluated>(result);
        Assert.Equal(1, evaluated.Utilization, 9);
        Assert.Equal("EN 1993-1-1:2005 6.3.1.2(4) (from memory)", evaluated.Clause.ToString());
        Assert.Equal(["N_Ed", "E", "I_min", "L", "L_cr", "N_cr", "N_Ed/N_cr", "utilization"], evaluated.Trace.Select(line => line.Symbol));
        Assert.Equal("π²·E·I_min/L_cr² = π²·210000·115860/3000² N = 26.681 kN", evaluated.Trace[5].Formula);
    }

    [Fact]
    public void Compression_beyond_4_percent_is_not_evaluated_and_says_the_numbers()
    {
        var limit = 0.04 * CompressionRule.EulerLoad(s_modulus, s_inertia, 3);

        var result = CompressionRule.Check(-1.001 * limit, s_modulus, "", s_inertia, 3, 1);

        var notEvaluated = Assert.IsType<CheckResult.NotEvaluated>(result);
        Assert.Equal(ReasonCode.StabilityNotChecked, notEvaluated.Why.Code);
        Assert.Equal("The compression of 1.0683 kN is 4.004 % of the Euler load of 26.681 kN (buckling length 3 m), more than 4 %; "
            + "no stability check is made.", notEvaluated.Why.Message);
    }

    [Fact]
    public void The_length_factor_of_2_quarters_the_euler_load()
    {
        // Cantilever against hinged bar: L_cr = 2L, a quarter of the load (Euler's first case).
        var hinged = Assert.IsType<CheckResult.Evaluated>(CompressionRule.Check(-200, s_modulus, "", s_inertia, 3, 1));
        var cantilever = Assert.IsType<CheckResult.Evaluated>(CompressionRule.Check(-200, s_modulus, "", s_inertia, 3, 2));

        Assert.Equal(4 * hinged.Utilization, cantilever.Utilization, 12);
    }

    [Fact]
    public void Compression_without_a_modulus_is_not_evaluated_and_says_why()
    {
        var result = CompressionRule.Check(-1, null, "the material has no modulus", s_inertia, 3, 2);

        var notEvaluated = Assert.IsType<CheckResult.NotEvaluated>(result);
        Assert.Equal(ReasonCode.StabilityNotChecked, notEvaluated.Why.Code);
        Assert.Contains("the material has no modulus", notEvaluated.Why.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(double.NaN, 1, 1, 1)]
    [InlineData(-1, 0, 1, 1)]
    [InlineData(-1, 1, double.PositiveInfinity, 1)]
    [InlineData(-1, 1, 1, -2)]
    public void Values_out_of_range_are_refused(double axialForce, double inertia, double length, double factor)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => CompressionRule.Check(axialForce, s_modulus, "", inertia, length, factor));
    }
}
