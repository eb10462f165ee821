using MemberScan.Checks.Allowable;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Checks.Tests.Allowable;

public sealed class AllowableStressTests
{
    // 0.8 fy normal and 0.4 fy shear: √(0.64 + 3·0.16) = √1.12 = 1.058 and √(0.64 + 4·0.16) = √1.28 = 1.131, by hand.
    private static readonly double s_fy = Si.MPa(235);
    private static readonly StressState s_state = new(0.8 * Si.MPa(235), 0, 0.4 * Si.MPa(235));

    [Fact]
    public void Von_mises_of_0_8_fy_normal_and_0_4_fy_shear_is_1_058()
    {
        var result = AllowableStress.VonMises(s_state, s_fy, omega: 1);

        Assert.Equal(1.058, result.Utilization, 3);
    }

    [Fact]
    public void Tresca_of_0_8_fy_normal_and_0_4_fy_shear_is_1_131()
    {
        var result = AllowableStress.Tresca(s_state, s_fy, omega: 1);

        Assert.Equal(1.131, result.Utilization, 3);
    }

    [Fact]
    public void Pure_shear_yields_at_0_5774_fy_by_von_mises_and_at_half_fy_by_tresca()
    {
        // Yield in pure shear: fy/√3 = 0.5774 fy (von Mises), 0.5 fy (Tresca): any textbook of strength of materials.
        var byVonMises = AllowableStress.VonMises(new StressState(0, s_fy / Math.Sqrt(3), 0), s_fy, 1);
        var byTresca = AllowableStress.Tresca(new StressState(0, 0, -0.5 * s_fy), s_fy, 1);

        Assert.Equal(1, byVonMises.Utilization, 12);
        Assert.Equal(1, byTresca.Utilization, 12);
    }

    [Theory]
    [InlineData(140.7, true)]
    [InlineData(140.8, false)]
    public void The_limit_is_the_strength_over_the_factor(double stressMPa, bool within)
    {
        // 235 MPa / 1.67 = 140.72 MPa, by hand.
        var result = AllowableStress.VonMises(new StressState(-Si.MPa(stressMPa), 0, 0), s_fy, omega: 1.67);

        Assert.Equal(within, result.Utilization <= 1 + 1e-9);
    }

    [Fact]
    public void The_calculation_lists_every_quantity_with_unit_and_source()
    {
        var result = AllowableStress.VonMises(s_state, s_fy, omega: 1.67);

        Assert.Equal(["σ", "τxy", "τxz", "τ", "σvM", "fy", "Ω", "fy/Ω", "utilization"], result.Trace.Select(line => line.Symbol));
        Assert.Equal(["Pa", "Pa", "Pa", "Pa", "Pa", "Pa", "-", "Pa", "-"], result.Trace.Select(line => line.Unit));
        Assert.All(result.Trace, line => Assert.NotEmpty(line.Source));
        Assert.Equal(result.Utilization, result.Trace[^1].Value);
        Assert.Equal("√(σ² + 3τ²) = √(188² + 3·94²) MPa = 248.7 MPa", result.Trace[4].Formula);
        Assert.Equal("235 MPa / 1.67 = 140.72 MPa", result.Trace[7].Formula);
    }

    [Fact]
    public void A_negative_stress_stands_in_brackets_before_its_square()
    {
        var result = AllowableStress.Tresca(new StressState(Si.MPa(-12.5), 0, 0), s_fy, omega: 1);

        Assert.StartsWith("√(σ² + 4τ²) = √((-12.5)² + 4·0²)", result.Trace[4].Formula, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(double.NaN, 1.67)]
    [InlineData(0, 1.67)]
    [InlineData(235e6, 0.99)]
    [InlineData(235e6, double.PositiveInfinity)]
    public void A_strength_or_factor_out_of_range_is_refused(double fy, double omega)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => AllowableStress.VonMises(default, fy, omega));
        Assert.Throws<ArgumentOutOfRangeException>(() => AllowableStress.Tresca(default, fy, omega));
    }

    [Fact]
    public void A_stress_that_is_not_a_number_is_refused()
    {
        var state = new StressState(0, double.NaN, 0);

        Assert.Throws<ArgumentException>(() => AllowableStress.VonMises(state, s_fy, 1));
    }
}
