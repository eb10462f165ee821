using MemberScan.Checks.En1993;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Checks.Tests.En1993;

public sealed class ElasticVerificationTests
{
    private static readonly double s_fy = Si.MPa(355);

    [Fact]
    public void The_left_side_of_0_8_fy_and_0_4_fy_is_1_12_and_its_root_1_058()
    {
        // EN 1993-1-1:2005 (6.1), from memory: 0.8² + 3·0.4² = 1.12, by hand.
        var result = ElasticVerification.Check(new StressState(-0.8 * s_fy, 0.4 * s_fy, 0), s_fy, gamma_M0: 1.00);

        Assert.Equal(1.12, result.Trace.Single(line => line.Symbol == "left side").Value, 12);
        Assert.Equal(1.058, result.Utilization, 3);
    }

    [Fact]
    public void The_utilization_is_linear_in_the_load_and_the_left_side_is_not()
    {
        var once = ElasticVerification.Check(new StressState(1e8, 2e7, 3e7), s_fy, 1.1);
        var twice = ElasticVerification.Check(new StressState(2e8, 4e7, 6e7), s_fy, 1.1);

        Assert.Equal(2 * once.Utilization, twice.Utilization, 12);
        Assert.Equal(once.Utilization * once.Utilization, once.Trace.Single(line => line.Symbol == "left side").Value, 12);
    }

    [Theory]
    [InlineData(322.7, true)]
    [InlineData(322.8, false)]
    public void The_partial_factor_divides_the_strength(double stressMPa, bool within)
    {
        // 355 MPa / 1.10 = 322.73 MPa, by hand.
        var result = ElasticVerification.Check(new StressState(Si.MPa(stressMPa), 0, 0), s_fy, gamma_M0: 1.10);

        Assert.Equal(within, result.Utilization <= 1 + 1e-9);
    }

    [Fact]
    public void The_clause_is_named_and_marked_as_from_memory()
    {
        var result = ElasticVerification.Check(default, s_fy, 1);

        Assert.Equal("EN 1993-1-1:2005 6.2.1(5) (6.1) (from memory)", result.Clause.ToString());
        Assert.Equal(["σ", "τxy", "τxz", "τ", "f_y", "γM0", "f_y/γM0", "left side", "utilization"], result.Trace.Select(line => line.Symbol));
    }

    [Fact]
    public void A_partial_factor_below_1_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ElasticVerification.Check(default, s_fy, 0.9));
    }
}
