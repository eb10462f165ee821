using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Cases where a search goes wrong easily, each by its name.</summary>
public sealed class GoverningPointTests
{
    private static readonly Round s_rod = new(0.010);
    private static readonly Tube s_thickTube = new(0.030, 0.020);
    private static readonly Rectangle s_strut = new(0.040, 0.080);
    private static readonly Box s_rail = new(0.050, 0.100, 0.005, 0.010, 0.005);

    [Theory]
    [InlineData(ShearModel.Elementary)]
    [InlineData(ShearModel.Elasticity)]
    public void Pure_torsion_in_a_thick_tube_governs_at_the_outer_edge(ShearModel model)
    {
        var field = Samples.Field(s_thickTube, model);

        var point = field.Govern(new SectionForces(0, 0, 0, 1000, 0, 0), StressMeasure.VonMises);

        Assert.Equal(Math.Sqrt(3) * 1000 / field.Properties.Wt!.Value, point.Value, 1);
        Assert.Equal("outer edge, +z", point.Place);
        Assert.Equal((0, 0.030), (point.Y, point.Z));
    }

    [Fact]
    public void A_short_round_member_is_governed_at_its_centre_by_elasticity()
    {
        var field = Samples.Field(s_rod, ShearModel.Elasticity);

        var point = field.Govern(new SectionForces(0, 0, 10e3, 0, 0, 0), StressMeasure.VonMises);

        Assert.Equal((0, 0), (point.Y, point.Z));
        Assert.Equal("centre", point.Place);
        Assert.Equal(Math.Sqrt(3) * 3.6 / 2.6 * 10e3 / field.Properties.Area, point.Value, 1);
    }

    [Fact]
    public void A_short_rectangular_member_under_shear_both_ways_is_governed_at_its_centre()
    {
        var field = Samples.Field(s_strut, ShearModel.Elementary);

        var point = field.Govern(new SectionForces(0, 40e3, 60e3, 0, 0, 0), StressMeasure.Tau);

        Assert.Equal("centre", point.Place);
        Assert.Equal(1.5 * double.Hypot(40e3, 60e3) / 0.0032, point.Value, 1);
    }

    [Fact]
    public void A_short_member_with_some_bending_is_governed_between_centre_and_extreme_fibre()
    {
        var field = Samples.Field(s_strut, ShearModel.Elementary);

        // At the centre σ grows with z at once, τ falls only with z²: the maximum lies a little above it.
        var point = field.Govern(new SectionForces(20e3, 10e3, 60e3, 0, 1200, 0), StressMeasure.VonMises);

        Assert.InRange(point.Z, 0.001, 0.039);
        Assert.StartsWith("inside, towards", point.Place, StringComparison.Ordinal);
    }

    [Fact]
    public void Oblique_shear_on_a_round_bar_takes_the_resultant()
    {
        var field = Samples.Field(s_rod, ShearModel.Elementary);

        var point = field.Govern(new SectionForces(0, 3e3, 4e3, 0, 0, 0), StressMeasure.Tau);

        Assert.Equal(4.0 / 3 * 5e3 / field.Properties.Area, point.Value, 1e-3);
        // The ends of the neutral axis lie square to V = (3, 4): at (−4, 3)/5 and (4, −3)/5; the one with the larger z is taken.
        Assert.Equal(-0.008, point.Y, 1e-9);
        Assert.Equal(0.006, point.Z, 1e-9);
        Assert.Equal("neutral axis, direction 37° from −y towards +z", point.Place);
    }

    // σ = My·z/Iy − Mz·y/Iz, with a little N so that one of two opposite corners is the larger.
    [Theory]
    [InlineData(10, 100, 50, "corner −y +z")]
    [InlineData(10, 100, -50, "corner +y +z")]
    [InlineData(10, -100, 50, "corner −y −z")]
    [InlineData(-10, 100, 50, "corner +y −z")]
    public void Biaxial_bending_of_a_rectangle_governs_in_a_corner(double n, double my, double mz, string place)
    {
        var field = Samples.Field(s_strut, ShearModel.Elasticity);
        var p = field.Properties;

        var point = field.Govern(new SectionForces(n, 0, 0, 0, my, mz), StressMeasure.AbsoluteSigma);

        Assert.Equal(Math.Sign(n) * (10 / p.Area + 100 / p.WelY + 50 / p.WelZ), point.Value, 1e-3);
        Assert.Equal(place, point.Place);
    }

    // Vz > 0 shears both sides upwards; T < 0 shears the +y side downwards and the −y side upwards.
    [Theory]
    [InlineData(ShearModel.Elementary)]
    [InlineData(ShearModel.Elasticity)]
    public void Shear_and_torsion_that_cancel_on_one_side_add_on_the_other(ShearModel model)
    {
        var field = Samples.Field(new Tube(0.050, 0.002), model);
        var shear = new SectionForces(0, 0, 10e3, 0, 0, 0);
        var atSide = field.At(shear, 0.050, 0).TauXZ;

        var forces = shear with { T = -atSide * field.Properties.Wt!.Value };
        var point = field.Govern(forces, StressMeasure.Tau);

        Assert.Equal(0, field.At(forces, 0.050, 0).Tau, 1e-3);
        Assert.Equal(2 * atSide, point.Value, 1e-2 * atSide);
        Assert.EndsWith("neutral axis, −y side", point.Place, StringComparison.Ordinal);
    }

    [Fact]
    public void A_nearly_square_rectangle_in_torsion_governs_on_its_long_side()
    {
        var deep = Samples.Field(new Rectangle(0.050, 0.0501), ShearModel.Elasticity);
        var wide = Samples.Field(new Rectangle(0.0501, 0.050), ShearModel.Elasticity);
        var forces = new SectionForces(0, 0, 0, 100, 0, 0);

        Assert.Equal("middle of the long side, +y", deep.Govern(forces, StressMeasure.Tau).Place);
        Assert.Equal("middle of the long side, +z", wide.Govern(forces, StressMeasure.Tau).Place);
        Assert.Equal("middle of the side, +z", Samples.Field(new Rectangle(0.05, 0.05), ShearModel.Elementary).Govern(forces, StressMeasure.Tau).Place);
    }

    [Theory]
    [InlineData(ShearModel.Elementary)]
    [InlineData(ShearModel.Elasticity)]
    public void A_very_thin_tube_has_its_thin_wall_stresses(ShearModel model)
    {
        var field = Samples.Field(new Tube(0.1, 1e-7), model);
        var area = 2 * Math.PI * 0.1 * 1e-7;

        var shear = field.Govern(new SectionForces(0, 0, 1, 0, 0, 0), StressMeasure.Tau);
        var bending = field.Govern(new SectionForces(0, 0, 0, 0, 0, 1), StressMeasure.VonMises);

        Assert.Equal(2, shear.Value * area, 1e-4);
        Assert.EndsWith("neutral axis, +y side", shear.Place, StringComparison.Ordinal);
        Assert.Equal(2 / (area * 0.1), bending.Value, 1e-4 / area);
        Assert.Equal("extreme fibre, +y", bending.Place);
    }

    // At a sharp corner points turn from one wall to the other along its inner diagonal, where the shear stress has a crease; with N
    // against the bending σ grows inwards there.
    [Fact]
    public void A_crease_inside_a_sharp_corner_is_not_passed_over()
    {
        var field = Samples.Field(new Box(0.060, 0.060, 0.006), ShearModel.Elementary);
        var random = new Random(2);
        var inside = 0;
        for (var i = 0; i < 200; i++)
        {
            var forces = new SectionForces(
                100e3 + 100e3 * random.NextDouble(), -25e3, 25e3, 500 * random.NextDouble(),
                -300 * random.NextDouble(), 300 * random.NextDouble());

            var point = field.Govern(forces, StressMeasure.VonMises);

            for (var inset = 0.003; inset <= 0.006; inset += 0.0005)
                Assert.True(field.At(forces, 0.030 - inset, 0.030 - inset).VonMises <= point.Value * (1 + 1e-9));
            if (point.Place.StartsWith("inside the wall", StringComparison.Ordinal)) inside++;
        }

        Assert.True(inside > 0, "no state of this test is governed inside the wall");
    }

    [Fact]
    public void Axial_force_alone_is_uniform()
    {
        foreach (var field in Samples.Fields)
        {
            var point = field.Govern(new SectionForces(-5e3, 0, 0, 0, 0, 0), StressMeasure.Sigma3);

            Assert.Equal(-5e3 / field.Properties.Area, point.Value, 1e-3);
            Assert.Equal("uniform over the section", point.Place);
            Assert.Equal(0, field.Govern(new SectionForces(-5e3, 0, 0, 0, 0, 0), StressMeasure.Sigma1).Value, 1e-6);
        }
    }

    [Fact]
    public void One_shear_force_alone_governs_on_its_neutral_axis()
    {
        var forces = new SectionForces(0, 5e3, 0, 0, 0, 0);

        Assert.Equal("neutral axis, +z side", Samples.Field(s_rod, ShearModel.Elementary).Govern(forces, StressMeasure.Tau).Place);
        Assert.Equal("middle of the short side, +z", Samples.Field(s_strut, ShearModel.Elementary).Govern(forces, StressMeasure.Tau).Place);
        Assert.EndsWith("middle of the short side, +z", Samples.Field(s_rail, ShearModel.Elementary).Govern(forces, StressMeasure.Tau).Place, StringComparison.Ordinal);
    }

    [Fact]
    public void No_forces_give_zero_at_the_centroid_or_on_the_topmost_fibre_of_a_hollow_section()
    {
        foreach (var field in Samples.Fields)
        {
            var point = field.Govern(default, StressMeasure.VonMises);

            Assert.Equal((0, default(StressState)), (point.Value, point.State));
            Assert.True(field.Contains(point.Y, point.Z));
            Assert.Equal(field.Section is Tube or Box ? field.Section.ExtentZ / 2 : 0, point.Z);
            Assert.Equal(0, point.Y);
            Assert.Equal("unstressed", point.Place);
        }
    }

    [Theory]
    [InlineData(1000, 0, "extreme fibre, +z")]
    [InlineData(-1000, 0, "extreme fibre, +z")]
    [InlineData(0, 1000, "extreme fibre, +y")]
    public void Bending_about_one_axis_governs_at_the_extreme_fibre_of_every_section(double my, double mz, string place)
    {
        foreach (var field in Samples.Fields)
        {
            var point = field.Govern(new SectionForces(0, 0, 0, 0, my, mz), StressMeasure.VonMises);

            Assert.Equal(place, point.Place);
            Assert.Equal(1000 / (my != 0 ? field.Properties.WelY : field.Properties.WelZ), point.Value, 1e-6 * point.Value);
        }
    }

    [Fact]
    public void Bending_of_a_round_bar_about_an_oblique_axis_names_its_direction()
    {
        var field = Samples.Field(s_rod, ShearModel.Elementary);

        // σ grows towards (−Mz, My) = (4, 3).
        var point = field.Govern(new SectionForces(1e3, 0, 0, 0, 30, -40), StressMeasure.VonMises);

        Assert.Equal("extreme fibre, direction 37° from +y towards +z", point.Place);
        Assert.Equal(0.008, point.Y, 1e-9);
    }

    [Fact]
    public void Equal_places_are_told_apart_by_rule_and_not_by_rounding()
    {
        var field = Samples.Field(s_rail, ShearModel.Elementary);
        foreach (var factor in new[] { 1.0, 1.1, 0.7, 1e-3, 1234.5 })
        {
            var point = field.Govern(factor * new SectionForces(0, 0, 0, 0, 1000, 0), StressMeasure.VonMises);

            Assert.Equal((0, 0.050), (point.Y, point.Z));
        }
    }

    [Fact]
    public void Forces_that_are_not_finite_are_refused()
    {
        var field = Samples.Field(s_rod, ShearModel.Elementary);

        Assert.Throws<ArgumentException>(() => field.Govern(new SectionForces(double.NaN, 0, 0, 0, 0, 0), StressMeasure.Tau));
    }

    [Fact]
    public void A_search_allocates_nothing_when_the_place_has_a_constant_name()
    {
        var forces = new SectionForces(10e3, 1e3, 2e3, 0, 500, 0);
        foreach (var field in new[] { Samples.Field(s_strut, ShearModel.Elasticity), Samples.Field(s_rail, ShearModel.Elementary), Samples.Field(s_rail, ShearModel.Elasticity), Samples.Field(s_rod, ShearModel.Elasticity) })
        {
            for (var warm = 0; warm < 50; warm++) field.Govern(forces, StressMeasure.AbsoluteSigma);

            var before = GC.GetAllocatedBytesForCurrentThread();
            for (var i = 0; i < 20; i++)
            {
                field.Govern(forces, StressMeasure.AbsoluteSigma);
                field.At(forces, 0.001, 0.002);
            }

            Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
        }
    }
}
