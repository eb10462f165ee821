using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

public sealed class TorsionTests
{
    private static readonly SectionForces s_t = new(0, 0, 0, 1, 0, 0);

    // Timoshenko and Goodier, 3rd ed., art. 109: k = τmax/(Gθa), J = k1·b·a³, τmax = T/(k2·b·a²) (from memory).
    [Theory]
    [InlineData(1, "0.675", "0.1406", "0.208")]
    [InlineData(1.2, "0.759", "0.166", "0.219")]
    [InlineData(1.5, "0.848", "0.196", "0.231")]
    [InlineData(2, "0.930", "0.229", "0.246")]
    [InlineData(2.5, "0.968", "0.249", "0.258")]
    [InlineData(3, "0.985", "0.263", "0.267")]
    [InlineData(4, "0.997", "0.281", "0.282")]
    [InlineData(5, "0.999", "0.291", "0.291")]
    [InlineData(10, "1.000", "0.312", "0.312")]
    [InlineData(1e6, "1.000", "0.333", "0.333")]
    public void A_rectangle_has_the_tabulated_torsion(double ratio, string k, string k1, string k2)
    {
        var field = Samples.Field(new Rectangle(1, ratio), ShearModel.Elasticity);
        var (j, wt) = (field.Properties.J!.Value, field.Properties.Wt!.Value);

        var atLongSide = field.At(s_t, 0.5, 0).TauXZ;

        Printed.Agrees(k, atLongSide * j, "k");
        Printed.Agrees(k1, j / ratio, "k1");
        Printed.Agrees(k2, wt / ratio, "k2");
        Assert.Equal(1 / wt, atLongSide, 1e-9 / wt);
    }

    // Roark, 7th ed., Table 10.1 case 4, from memory; checked to be within 0.5 % (K) and 0.3 % (τ) of the series.
    [Theory]
    [InlineData(1)]
    [InlineData(1.3)]
    [InlineData(2)]
    [InlineData(5)]
    [InlineData(20)]
    public void A_rectangle_agrees_with_the_polynomial_formulas(double ratio)
    {
        var (a, b) = (ratio / 2, 0.5);
        var q = b / a;
        var p = SectionProperties.Of(new Rectangle(ratio, 1));

        var k = a * b * b * b * (16.0 / 3 - 3.36 * q * (1 - q * q * q * q / 12));
        var tau = 3 / (8 * a * b * b) * (1 + 0.6095 * q + 0.8865 * q * q - 1.8023 * q * q * q + 0.9100 * q * q * q * q);

        Assert.InRange(p.J!.Value / k, 0.995, 1.005);
        Assert.InRange(1 / p.Wt!.Value / tau, 0.997, 1.003);
    }

    [Fact]
    public void Round_bars_and_tubes_carry_torsion_in_proportion_to_the_radius()
    {
        var bar = Samples.Field(new Round(0.5), ShearModel.Elementary);
        var tube = Samples.Field(new Tube(0.5, 0.2), ShearModel.Elasticity);

        // τxz = T·y/J, τxy = −T·z/J: positive torsion turns y towards z.
        Assert.Equal(0.25 / bar.Properties.J!.Value, bar.At(s_t, 0.25, 0).TauXZ, 1e-12);
        Assert.Equal(-0.25 / bar.Properties.J!.Value, bar.At(s_t, 0, 0.25).TauXY, 1e-12);
        Assert.Equal(0.4 / tube.Properties.J!.Value, tube.At(s_t, 0.4, 0).TauXZ, 1e-9);
        Assert.Equal(0.3 / tube.Properties.J!.Value, tube.At(s_t, 0, -0.3).TauXY, 1e-9);
    }

    [Fact]
    public void A_box_carries_the_outer_face_value_around_its_wall_turning_y_towards_z()
    {
        var field = Samples.Field(new Box(0.05, 0.1, 0.005, 0.01, 0.005), ShearModel.Elementary);
        var tau = 1 / field.Properties.Wt!.Value;

        Assert.Equal((0, tau), (field.At(s_t, 0.0225, 0).TauXY, field.At(s_t, 0.0225, 0).TauXZ));
        Assert.Equal(-tau, field.At(s_t, -0.0225, 0.01).TauXZ);
        Assert.Equal(-tau, field.At(s_t, 0.001, 0.05).TauXY);
        Assert.Equal(tau, field.At(s_t, 0.001, -0.045).TauXY);
        Assert.Equal(tau, field.Govern(s_t, StressMeasure.Tau).Value, 1e-9 * tau);
    }

    // Bredt's value is low: about 2t/b for a square tube, 5 % at t/b = 0.025.
    [Fact]
    public void The_box_value_exceeds_the_thin_wall_one_by_about_twice_the_wall_over_the_width()
    {
        var p = SectionProperties.Of(new Box(1, 1, 0.025));

        var thinWall = 1 / (2 * 0.975 * 0.975 * 0.025);

        Assert.InRange(1 / p.Wt!.Value / thinWall, 1.02, 1.06);
    }
}
