using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Flexural shear against Timoshenko and Goodier, Theory of Elasticity, arts. 122 and 124 (tables from memory).</summary>
public sealed class FlexuralShearTests
{
    private static readonly SectionForces s_vz = new(0, 0, 1, 0, 0, 0);
    private static readonly SectionForces s_vy = new(0, 1, 0, 0, 0, 0);

    // Art. 124, ν = 1/4, in units of 3V/(2A).
    [Theory]
    [InlineData(2, "0.983", "1.033")]
    [InlineData(1, "0.940", "1.126")]
    [InlineData(0.5, "0.856", "1.396")]
    [InlineData(0.25, "0.805", "1.988")]
    public void A_rectangle_has_the_tabulated_shear_at_its_centre_and_its_sides(double depthPerWidth, string centre, string side)
    {
        var field = Samples.Field(new Rectangle(1, depthPerWidth), ShearModel.Elasticity, 0.25);
        var unit = 1.5 / depthPerWidth;

        Printed.Agrees(centre, field.At(s_vz, 0, 0).TauXZ / unit, "centre");
        Printed.Agrees(side, field.At(s_vz, 0.5, 0).TauXZ / unit, "middle of the vertical side");
        Printed.Agrees(side, field.At(s_vz, -0.5, 0).TauXZ / unit, "the other side");
    }

    // The same table for a force along y.
    [Theory]
    [InlineData(2, "0.983", "1.033")]
    [InlineData(0.25, "0.805", "1.988")]
    public void A_rectangle_has_the_same_shear_along_its_other_axis(double widthPerDepth, string centre, string side)
    {
        var field = Samples.Field(new Rectangle(widthPerDepth, 1), ShearModel.Elasticity, 0.25);
        var unit = 1.5 / widthPerDepth;

        Printed.Agrees(centre, field.At(s_vy, 0, 0).TauXY / unit, "centre");
        Printed.Agrees(side, field.At(s_vy, 0, 0.5).TauXY / unit, "middle of the side");
    }

    // Art. 122: centre (3+2ν)/(2(1+ν)) V/A, ends of the neutral axis (1+2ν)/(1+ν) V/A; 1.385 and 1.231 at ν = 0.3.
    [Fact]
    public void A_round_bar_has_the_published_shear_at_its_centre_and_the_ends_of_its_neutral_axis()
    {
        var field = Samples.Field(new Round(0.5), ShearModel.Elasticity, 0.3);
        var area = field.Properties.Area;

        Printed.Agrees("1.385", field.At(s_vz, 0, 0).TauXZ * area, "centre");
        Printed.Agrees("1.231", field.At(s_vz, 0.5, 0).TauXZ * area, "end of the neutral axis");
    }

    [Fact]
    public void Elementary_shear_peaks_at_four_thirds_three_halves_and_nearly_twice_the_mean()
    {
        var round = Samples.Field(new Round(0.5), ShearModel.Elementary);
        var rectangle = Samples.Field(new Rectangle(0.4, 0.7), ShearModel.Elementary);
        var tube = Samples.Field(new Tube(0.5, 0.001), ShearModel.Elementary);

        Assert.Equal(4.0 / 3, round.Govern(s_vz, StressMeasure.Tau).Value * round.Properties.Area, 1e-12);
        Assert.Equal(1.5, rectangle.Govern(s_vz, StressMeasure.Tau).Value * rectangle.Properties.Area, 1e-12);
        Assert.Equal(2, tube.Govern(s_vz, StressMeasure.Tau).Value * tube.Properties.Area, 1e-5);
    }

    // V·Q/(I·b) with the first moment of the half section; for the circle Q = 2r³/3 gives 4/3.
    [Fact]
    public void A_fully_rounded_square_has_the_elementary_shear_of_a_circle()
    {
        var field = Samples.Field(new RoundedRectangle(1, 1, 0.5), ShearModel.Elementary);
        var bar = Samples.Field(new Round(0.5), ShearModel.Elementary);

        for (var z = -0.5; z <= 0.5; z += 0.0625)
            Assert.Equal(bar.At(s_vz, 0, z).TauXZ, field.At(s_vz, 0, z).TauXZ, 1e-9);
    }

    // Equilibrium along the member: ∂τxy/∂y + ∂τxz/∂z + Vz·z/Iy + Vy·y/Iz = 0.
    [Fact]
    public void Elasticity_is_in_equilibrium_along_the_member()
    {
        foreach (var field in Samples.Fields.Where(f => f.Model == ShearModel.Elasticity && f.NumericalError is null))
        {
            var random = new Random(7);
            var p = field.Properties;
            var step = 1e-4 * Math.Min(field.Section.ExtentY, field.Section.ExtentZ);
            foreach (var (y, z) in Samples.Points(field, random, 60).Where(at => IsWellInside(field, at.Y, at.Z, 300 * step)))
            {
                var forces = Samples.Forces(field, random);

                var residual = (field.At(forces, y + step, z).TauXY - field.At(forces, y - step, z).TauXY
                    + field.At(forces, y, z + step).TauXZ - field.At(forces, y, z - step).TauXZ) / (2 * step)
                    + forces.Vz * z / p.Iy + forces.Vy * y / p.Iz;

                var scale = field.Govern(forces, StressMeasure.Tau).Value / field.Section.ExtentZ;
                Assert.True(Math.Abs(residual) <= 1e-5 * scale, $"{Samples.Name(field)} at {y}, {z}: {residual / scale}");
            }
        }
    }

    // Beltrami and Michell, without body forces: ∇²τxz = −Vz/((1+ν)Iy), ∇²τxy = −Vy/((1+ν)Iz).
    [Theory]
    [InlineData(0.0)]
    [InlineData(0.3)]
    public void Elasticity_is_compatible(double poisson)
    {
        foreach (var section in Samples.Sections.Where(s => s is Round or Rectangle or Tube { InnerRadius: > 0.005 and < 0.015 }))
        {
            var field = Samples.Field(section, ShearModel.Elasticity, poisson);
            var step = 0.002 * Math.Min(section.ExtentY, section.ExtentZ);
            foreach (var (y, z) in Samples.Points(field, new Random(3), 40).Where(at => IsWellInside(field, at.Y, at.Z, 20 * step)))
            {
                var alongZ = Laplacian((u, v) => field.At(s_vz, u, v).TauXZ, y, z, step);
                var alongY = Laplacian((u, v) => field.At(s_vy, u, v).TauXY, y, z, step);

                Assert.Equal(-1, alongZ * (1 + poisson) * field.Properties.Iy, 2e-3);
                Assert.Equal(-1, alongY * (1 + poisson) * field.Properties.Iz, 2e-3);
            }
        }
    }

    [Fact]
    public void No_shear_stress_crosses_an_edge_in_elasticity()
    {
        var forces = new SectionForces(0, 3, 5, 0.02, 0, 0);
        foreach (var field in Samples.Fields.Where(f => f.Model == ShearModel.Elasticity && f.NumericalError is null))
        {
            var scale = field.Govern(forces, StressMeasure.Tau).Value;
            if (field.Section is Rectangle r)
            {
                for (var share = -1.0; share <= 1; share += 0.125)
                {
                    Assert.True(Math.Abs(field.At(forces, r.Width / 2, share * r.Depth / 2).TauXY) <= 1e-10 * scale);
                    Assert.True(Math.Abs(field.At(forces, share * r.Width / 2, -r.Depth / 2).TauXZ) <= 1e-10 * scale);
                }
            }
            else
            {
                foreach (var radius in field.Section is Tube t ? [t.InnerRadius, t.OuterRadius] : new[] { field.Section.ExtentY / 2 })
                {
                    for (var angle = 0.1; angle < 6; angle += 0.7)
                    {
                        var (sin, cos) = Math.SinCos(angle);
                        var state = field.At(forces, radius * cos, radius * sin);

                        Assert.True(Math.Abs(state.TauXY * cos + state.TauXZ * sin) <= 1e-10 * scale, Samples.Name(field));
                    }
                }
            }
        }
    }

    [Fact]
    public void Corners_of_a_rectangle_carry_no_shear_stress()
    {
        var forces = new SectionForces(0, 3, 5, 0.2, 0, 0);
        var field = Samples.Field(new Rectangle(0.04, 0.08), ShearModel.Elasticity);

        var corner = field.At(forces, 0.02, 0.04);

        Assert.True(corner.Tau <= 1e-10 * field.Govern(forces, StressMeasure.Tau).Value);
    }

    // What the two models make of a thick tube and of a flat bar loaded across its width (engineering practice against theory).
    [Fact]
    public void The_elementary_model_falls_short_in_a_thick_tube_and_a_flat_bar()
    {
        double Ratio(CrossSection section) => Samples.Field(section, ShearModel.Elasticity).Govern(s_vz, StressMeasure.Tau).Value
            / Samples.Field(section, ShearModel.Elementary).Govern(s_vz, StressMeasure.Tau).Value;

        Assert.True(Ratio(new Tube(0.03, 0.02)) > 1.3);
        Assert.True(Ratio(new Rectangle(0.08, 0.012)) > 2);
    }

    [Fact]
    public void A_vanishing_bore_leaves_the_solid_bar_and_twice_its_stress_at_the_bore()
    {
        var tube = Samples.Field(new Tube(1, 1 - 1e-4), ShearModel.Elasticity);
        var bar = Samples.Field(new Round(1), ShearModel.Elasticity);

        foreach (var (y, z) in new[] { (0.5, 0.1), (-0.3, 0.7), (0.9, -0.2) })
        {
            Assert.Equal(bar.At(s_vz, y, z).TauXZ, tube.At(s_vz, y, z).TauXZ, 1e-6);
            Assert.Equal(bar.At(s_vz, y, z).TauXY, tube.At(s_vz, y, z).TauXY, 1e-6);
        }

        Assert.Equal(2 * bar.At(s_vz, 0, 0).TauXZ, tube.At(s_vz, 1e-4, 0).TauXZ, 1e-6);
    }

    [Theory]
    [InlineData(ShearModel.Elementary)]
    [InlineData(ShearModel.Elasticity)]
    public void A_thin_tube_reaches_twice_the_mean_on_its_neutral_axis(ShearModel model)
    {
        var tube = Samples.Field(new Tube(1, 1e-5), model);

        Assert.Equal(2, tube.At(s_vz, 1, 0).TauXZ * tube.Properties.Area, 1e-4);
        Assert.Equal(0, tube.At(s_vz, 0, 1).Tau * tube.Properties.Area, 1e-4);
    }

    private static bool IsWellInside(StressField field, double y, double z, double distance) =>
        field.Contains(y + distance, z) && field.Contains(y - distance, z) && field.Contains(y, z + distance) && field.Contains(y, z - distance);

    private static double Laplacian(Func<double, double, double> f, double y, double z, double step) =>
        (f(y + step, z) + f(y - step, z) + f(y, z + step) + f(y, z - step) - 4 * f(y, z)) / (step * step);
}
