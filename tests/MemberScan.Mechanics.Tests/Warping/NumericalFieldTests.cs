using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Tests.Warping;

public sealed class NumericalFieldTests
{
    private static readonly SectionForces s_mixed = new(0, 1, 2, 0.01, 0, 0);

    // A box whose corners meet is a round tube, for which the closed form is known.
    [Theory]
    [InlineData(0.0)]
    [InlineData(0.3)]
    public void A_box_that_is_a_tube_has_the_tubes_stresses(double poisson)
    {
        var box = Samples.Field(new Box(0.06, 0.06, 0.006, 0.03, 0.024), ShearModel.Elasticity, poisson);
        var tube = Samples.Field(new Tube(0.03, 0.006), ShearModel.Elasticity, poisson);

        Agree(box, tube, 2e-6);
        Assert.Equal(1, box.Properties.J!.Value / tube.Properties.J!.Value, 1e-10);
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(0.3)]
    public void A_square_rounded_to_a_circle_has_the_round_bars_stresses(double poisson)
    {
        var rounded = Samples.Field(new RoundedRectangle(0.04, 0.04, 0.02), ShearModel.Elasticity, poisson);
        var bar = Samples.Field(new Round(0.02), ShearModel.Elasticity, poisson);

        Agree(rounded, bar, 2e-6);
        Assert.Equal(1, rounded.Properties.J!.Value / bar.Properties.J!.Value, 1e-10);
    }

    // Away from the corner; series of the same source as the published table of rectangles.
    [Theory]
    [InlineData(0.04, 0.08)]
    [InlineData(0.12, 0.01)]
    public void A_rectangle_with_hardly_rounded_corners_has_the_rectangles_stresses(double width, double depth)
    {
        var radius = 1e-3 * Math.Min(width, depth);
        var rounded = Samples.Field(new RoundedRectangle(width, depth, radius), ShearModel.Elasticity);
        var sharp = Samples.Field(new Rectangle(width, depth), ShearModel.Elasticity);

        Agree(rounded, sharp, 2e-3);
        Assert.Equal(1, rounded.Properties.J!.Value / sharp.Properties.J!.Value, 1e-6);
        Assert.Equal(1, rounded.Properties.Wt!.Value / sharp.Properties.Wt!.Value, 1e-4);
    }

    [Theory]
    [InlineData(0.060, 0.060, 0.006, 0.012, 0.006)]
    [InlineData(0.050, 0.100, 0.005, 0.010, 0.005)]
    [InlineData(0.050, 0.040, 0.008, 0.012, 0.004)]
    public void The_torsion_constant_of_a_box_lies_just_above_the_lower_bound_of_a_stress_function(
        double width, double depth, double wall, double outer, double inner)
    {
        var box = new Box(width, depth, wall, outer, inner);
        var upper = SolvedSections.TryOf(box)!.J;

        var lower = StressFunction.J(box, 240, 16);

        Assert.InRange(upper / lower, 1, 1.0005);
    }

    // Within 0.5 % of the largest stress in the walls, within 1 % of the peak at the fillet.
    [Theory]
    [InlineData(0.060, 0.060, 0.006, 0.012, 0.006)]
    [InlineData(0.040, 0.060, 0.006, 0.009, 0.003)]
    public void A_box_agrees_with_a_boundary_integral_in_the_walls_and_at_the_fillet(double width, double depth, double wall, double outer, double inner)
    {
        const double Poisson = 0.3;

        var box = new Box(width, depth, wall, outer, inner);
        var field = Samples.Field(box, ShearModel.Elasticity, Poisson);
        var p = field.Properties;
        var edge = Edges(box);
        (SectionForces Forces, Func<double, double, (double XY, double XZ)> Stress)[] cases =
        [
            (new SectionForces(0, 0, 0, p.J!.Value, 0, 0), edge.Twist()),
            (new SectionForces(0, p.Iz, 0, 0, 0, 0), edge.Flexure(1, 0, Poisson)),
            (new SectionForces(0, 0, p.Iy, 0, 0, 0), edge.Flexure(0, 1, Poisson)),
        ];
        foreach (var (forces, stress) in cases)
        {
            var largest = field.Govern(forces, StressMeasure.Tau).Value;
            var peak = field.FilletPeak(forces, StressMeasure.Tau)!.Value.Value;
            foreach (var (y, z, isAtFillet) in Places(box))
            {
                var (xy, xz) = stress(y, z);
                var state = field.At(forces, y, z);
                var difference = double.Hypot(state.TauXY - xy, state.TauXZ - xz);

                Assert.True(difference <= (isAtFillet ? 0.01 * peak : 0.005 * largest), $"{forces} at {y}, {z}: {state.TauXY}, {state.TauXZ} against {xy}, {xz}");
            }
        }
    }

    [Fact]
    public void No_shear_stress_crosses_an_edge_of_a_box()
    {
        var box = new Box(0.05, 0.1, 0.005, 0.01, 0.005);
        var field = Samples.Field(box, ShearModel.Elasticity);
        var largest = field.Govern(s_mixed, StressMeasure.Tau).Value;

        for (var share = -0.75; share <= 0.75; share += 0.05)
        {
            Assert.True(Math.Abs(field.At(s_mixed, 0.025, share * 0.05).TauXY) <= 1e-3 * largest);
            Assert.True(Math.Abs(field.At(s_mixed, -0.020, share * 0.05).TauXY) <= 1e-3 * largest);
            Assert.True(Math.Abs(field.At(s_mixed, share * 0.02, 0.05).TauXZ) <= 1e-3 * largest);
        }
    }

    [Fact]
    public void Points_near_a_sharp_or_rounded_inner_corner_do_not_decide()
    {
        var sharp = Samples.Field(new Box(0.06, 0.06, 0.006), ShearModel.Elasticity);
        var rounded = Samples.Field(new Box(0.06, 0.06, 0.006, 0.012, 0.006), ShearModel.Elasticity);

        Assert.False(sharp.Decides(0.024, 0.024));
        Assert.False(sharp.Decides(0.024 - 0.0029, 0.024));
        Assert.True(sharp.Decides(0.024 - 0.0031, 0.024));
        Assert.True(sharp.Decides(0.03, 0.03));
        Assert.False(rounded.Decides(0.018 + 0.006 * Math.Sqrt(0.5), 0.018 + 0.006 * Math.Sqrt(0.5)));
        Assert.True(rounded.Decides(0.018 + 0.012 * Math.Sqrt(0.5), 0.018 + 0.012 * Math.Sqrt(0.5)));
        Assert.True(Samples.Field(new Box(0.06, 0.06, 0.006), ShearModel.Elementary).Decides(0.024, 0.024));
    }

    [Fact]
    public void The_peak_at_a_fillet_is_told_apart_and_exceeds_the_governing_value_under_torsion()
    {
        var field = Samples.Field(new Box(0.06, 0.06, 0.006, 0.009, 0.003), ShearModel.Elasticity);
        var torsion = new SectionForces(0, 0, 0, 500, 0, 0);

        var governing = field.Govern(torsion, StressMeasure.Tau);
        var peak = field.FilletPeak(torsion, StressMeasure.Tau);

        Assert.NotNull(peak);
        Assert.InRange(peak.Value.Value / governing.Value, 1.2, 2);
        Assert.StartsWith("inner corner", peak.Value.Place, StringComparison.Ordinal);
        Assert.Null(Samples.Field(new Box(0.06, 0.06, 0.006), ShearModel.Elasticity).FilletPeak(torsion, StressMeasure.Tau));
        Assert.Null(Samples.Field(new Box(0.06, 0.06, 0.006, 0.009, 0.003), ShearModel.Elementary).FilletPeak(torsion, StressMeasure.Tau));
    }

    // As the hole vanishes the torsion constant becomes the solid rectangle's; the stress at the hole does not.
    [Fact]
    public void A_box_with_a_vanishing_hole_has_the_rectangles_torsion_constant()
    {
        var box = SectionProperties.Of(new Box(0.04, 0.06, 0.0199, 0.0001, 0.00002));
        var rectangle = SectionProperties.Of(new Rectangle(0.04, 0.06));

        Assert.Equal(1, box.J!.Value / rectangle.J!.Value, 2e-3);
    }

    [Fact]
    public void Sections_of_one_to_a_thousand_are_solved_and_those_beyond_reason_are_refused()
    {
        foreach (var section in new CrossSection[] { new RoundedRectangle(1, 0.001, 0.0001), new Box(1, 1, 0.001), new Box(10, 0.01, 0.0001, 0.0002, 0.0001) })
            Assert.True(Samples.Field(section, ShearModel.Elasticity).Closure.LargestError <= 1e-3, section.Designation);

        foreach (var section in new CrossSection[] { new RoundedRectangle(1e9, 1e-9, 1e-10), new Box(1e9, 1e-9, 1e-10), new OpenProfile(OpenShape.U, 1e6, 1, 1e-6, 1e-6) })
        {
            Assert.False(StressField.TryCreate(section, ShearModel.Elasticity, 0.3, out _, out var whyNot));
            Assert.EndsWith("are too far apart for a numerical field", whyNot, StringComparison.Ordinal);
            Assert.Null(SectionProperties.Of(section).J);
        }
    }

    [Fact]
    public void A_section_is_solved_once()
    {
        var box = new Box(0.05, 0.07, 0.004, 0.008, 0.004);

        Assert.Same(SolvedSections.TryOf(box), SolvedSections.TryOf(new Box(0.05, 0.07, 0.004, 0.008, 0.004)));
    }

    private static void Agree(StressField field, StressField reference, double tolerance)
    {
        var largest = reference.Govern(s_mixed, StressMeasure.Tau).Value;
        foreach (var (y, z) in Samples.Points(field, new Random(11), 400))
        {
            var (one, other) = (field.At(s_mixed, y, z), reference.At(s_mixed, y, z));
            var difference = double.Hypot(one.TauXY - other.TauXY, one.TauXZ - other.TauXZ);

            Assert.True(difference <= tolerance * largest, $"at {y}, {z}: {difference / largest:E1}");
        }
    }

    // The corner +y +z is in the middle of a fine stretch; elsewhere the density is smooth at the scale of the wall.
    private static BoundaryIntegral Edges(Box box)
    {
        var edge = new BoundaryIntegral();
        var (coarse, fine) = (box.Wall, 0.14 * box.Wall);
        Loop(edge, box.Width / 2, box.Depth / 2, box.OuterRadius, 1, coarse, fine, 2 * box.Wall);
        Loop(edge, box.Width / 2 - box.Wall, box.Depth / 2 - box.Wall, box.InnerRadius, -1, coarse, 0.5 * fine, 2 * box.Wall);
        return edge;
    }

    private static void Loop(BoundaryIntegral edge, double halfY, double halfZ, double radius, int turn, double coarse, double fine, double reach)
    {
        for (var corner = 0; corner < 4; corner++)
        {
            var (signY, signZ) = (corner is 0 or 3 ? 1 : -1, corner < 2 ? 1 : -1);
            var (from, sweep) = turn > 0 ? (corner * Math.PI / 2, Math.PI / 2) : ((corner + 1) * Math.PI / 2, -Math.PI / 2);
            edge.Arc(signY * (halfY - radius), signZ * (halfZ - radius), radius, from, sweep, corner == 0 ? fine : Math.Min(coarse, 0.6 * radius));
        }

        var (flatY, flatZ) = (halfY - radius, halfZ - radius);
        void Straight(double y0, double z0, double y1, double z1, double panel)
        {
            if (turn > 0) edge.Line(y0, z0, y1, z1, panel);
            else edge.Line(y1, z1, y0, z0, panel);
        }

        Straight(flatY, halfZ, flatY - reach, halfZ, fine);
        Straight(flatY - reach, halfZ, -flatY, halfZ, coarse);
        Straight(-halfY, flatZ, -halfY, -flatZ, coarse);
        Straight(-flatY, -halfZ, flatY, -halfZ, coarse);
        Straight(halfY, -flatZ, halfY, flatZ - reach, coarse);
        Straight(halfY, flatZ - reach, halfY, flatZ, fine);
    }

    private static IEnumerable<(double Y, double Z, bool IsAtFillet)> Places(Box box)
    {
        var (centreY, centreZ, t) = (box.Width / 2 - box.Wall - box.InnerRadius, box.Depth / 2 - box.Wall - box.InnerRadius, box.Wall);
        for (var angle = 0.05; angle < 1.55; angle += 0.1)
        {
            var (sin, cos) = Math.SinCos(angle);
            var near = box.InnerRadius + 0.05 * t;
            yield return (centreY + near * cos, centreZ + near * sin, true);
            var far = box.InnerRadius + 0.6 * t;
            yield return (centreY + far * cos, centreZ + far * sin, false);
        }

        for (var back = 0.1; back < 1.5; back += 0.2)
        {
            foreach (var depth in new[] { 0.15, 0.5, 0.85 })
            {
                yield return (box.Width / 2 - depth * t, centreZ - back * t, depth > 0.5 && back < 0.6);
                yield return (centreY - back * t, box.Depth / 2 - depth * t, depth > 0.5 && back < 0.6);
            }
        }

        yield return (box.Width / 2 - t / 2, 0.001, false);
        yield return (-0.001, -box.Depth / 2 + t / 2, false);
    }
}
