using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Tests.Properties;

public sealed class SectionPropertiesTests
{
    // Gere and Timoshenko, Mechanics of Materials, appendix; Roark, Table A.1 (from memory).
    [Fact]
    public void A_round_bar_has_the_textbook_values()
    {
        var p = SectionProperties.Of(new Round(1));

        Printed.Agrees("3.1416", p.Area, "A");
        Printed.Agrees("0.7854", p.Iy, "I = πr⁴/4");
        Printed.Agrees("1.5708", p.J!.Value, "J = πr⁴/2");
        Printed.Agrees("1.6977", p.WplY / p.WelY, "shape factor 16/(3π)");
        Assert.Equal(4.0 / 3, p.WplY, 1e-12);
        Assert.Equal(p.Iy, p.Iz);
        Assert.Equal("exact", p.JSource);
        Assert.Null(p.JThinWall);
    }

    [Fact]
    public void A_tube_has_the_textbook_values()
    {
        var p = SectionProperties.Of(new Tube(2, 1));

        Assert.Equal(Math.PI * 3, p.Area, 1e-12);
        Assert.Equal(Math.PI / 4 * 15, p.Iz, 1e-12);
        Assert.Equal(4 * 7 / 3.0, p.WplY, 1e-12);                     // 4(ro³ − ri³)/3
        Assert.Equal(p.J!.Value / 2, p.Wt!.Value, 1e-12);
        Assert.Equal(2 * Math.PI * 1.5 * 1.5 * 1.5, p.JThinWall!.Value, 1e-12);
        Assert.Equal("exact", p.JSource);
    }

    [Fact]
    public void A_thin_tube_has_the_shape_factor_four_over_pi()
    {
        var p = SectionProperties.Of(new Tube(0.1, 1e-7));

        Assert.Equal(4 / Math.PI, p.WplY / p.WelY, 1e-5);
        Assert.Equal(2 * Math.PI * 1e-3 * 1e-7, p.J!.Value, 1e-15);
    }

    [Fact]
    public void A_rectangle_has_width_along_y_and_depth_along_z()
    {
        var p = SectionProperties.Of(new Rectangle(0.04, 0.08));

        Assert.Equal(0.04 * 0.08 * 0.08 * 0.08 / 12, p.Iy, 1e-18);
        Assert.Equal(0.08 * 0.04 * 0.04 * 0.04 / 12, p.Iz, 1e-18);
        Assert.Equal(1.5, p.WplY / p.WelY, 1e-12);
        Assert.Equal(1.5, p.WplZ / p.WelZ, 1e-12);
        Assert.Equal(p.Iz, p.IMin, 1e-18);
        Assert.Equal("Saint-Venant series", p.JSource);
    }

    // Spandrel: A = 0.2146 r², centroid 0.2234 r from the sides, I = 0.00755 r⁴ (textbook values, from memory).
    [Fact]
    public void The_corner_spandrel_has_the_textbook_values()
    {
        var corner = CornerSpandrel.Of(1);

        Printed.Agrees("0.2146", corner.Area, "area");
        Printed.Agrees("0.2234", corner.FromSide, "centroid");
        Printed.Agrees("0.00755", corner.OwnInertia, "own second moment");
    }

    [Fact]
    public void A_square_rounded_by_half_its_side_has_the_values_of_a_circle()
    {
        var circle = SectionProperties.Of(new Round(0.5));

        var rounded = SectionProperties.Of(new RoundedRectangle(1, 1, 0.5));

        Assert.Equal(circle.Area, rounded.Area, 1e-12);
        Assert.Equal(circle.Iy, rounded.Iy, 1e-12);
        Assert.Equal(circle.Iz, rounded.Iz, 1e-12);
        Assert.Equal(circle.WplY, rounded.WplY, 1e-12);
        Assert.Equal(circle.J!.Value, rounded.J!.Value, 1e-9);
        Assert.Equal(circle.Wt!.Value, rounded.Wt!.Value, 1e-7);
        Assert.StartsWith("numerical field", rounded.JSource, StringComparison.Ordinal);
    }

    [Fact]
    public void A_box_with_sharp_corners_is_one_rectangle_less_another()
    {
        var p = SectionProperties.Of(new Box(0.06, 0.1, 0.005));

        Assert.Equal(0.06 * 0.1 - 0.05 * 0.09, p.Area, 1e-15);
        Assert.Equal((0.06 * 1e-3 - 0.05 * 0.09 * 0.09 * 0.09) / 12, p.Iy, 1e-18);
        Assert.Equal((0.06 * 0.01 - 0.05 * 0.0081) / 4, p.WplY, 1e-15);
        Assert.StartsWith("numerical field", p.JSource, StringComparison.Ordinal);
        // Bredt: 4 Am² t/p with the middle line 55 × 95 mm.
        Assert.Equal(4 * Math.Pow(0.055 * 0.095, 2) * 0.005 / 0.3, p.JThinWall!.Value, 1e-15);
        Assert.True(p.J > p.JThinWall);
    }

    [Fact]
    public void Turning_a_section_by_a_right_angle_exchanges_its_axes()
    {
        var p = SectionProperties.Of(new Box(0.06, 0.1, 0.005, 0.01, 0.004));
        var turned = SectionProperties.Of(new Box(0.1, 0.06, 0.005, 0.01, 0.004));

        Assert.Equal(p.Iy, turned.Iz, 1e-18);
        Assert.Equal(p.WplY, turned.WplZ, 1e-18);
        Assert.Equal(p.J!.Value, turned.J!.Value, 1e-6 * p.J!.Value);
    }

    [Fact]
    public void Every_kind_is_doubly_symmetric_and_says_where_its_torsion_constant_comes_from()
    {
        foreach (var section in Samples.Sections)
        {
            var p = SectionProperties.Of(section);

            Assert.Equal((0, 0, 0), (p.Iyz, p.ShearCentreY, p.ShearCentreZ));
            Assert.NotEmpty(p.JSource);
            Assert.Equal(p.J is null, p.Wt is null);
        }
    }
}
