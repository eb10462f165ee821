using CsCheck;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Mechanics.Tests.Profiles;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Odd input gets an exact answer or a clear refusal; sections at the edge of their kind become their neighbours.</summary>
public sealed class OddInputTests
{
    [Fact]
    public void Dimensions_that_make_no_section_are_named()
    {
        Assert.Equal(SectionFaultKind.NotPositive, Round.Fault(0)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, Round.Fault(double.NaN)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, Rectangle.Fault(0.1, double.PositiveInfinity)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, Tube.Fault(-0.1, 0.01)!.Kind);
        // A wall of half the size or more leaves no hole.
        Assert.Equal(SectionFaultKind.WallOverRadius, Tube.Fault(0.02, 0.02)!.Kind);
        Assert.Equal(SectionFaultKind.WallOverRadius, Tube.Fault(0.02, 0.03)!.Kind);
        Assert.Equal(SectionFaultKind.WallOverRadius, Box.Fault(0.06, 0.04, 0.02)!.Kind);
        Assert.Equal(SectionFaultKind.WallOverRadius, Box.Fault(0.06, 0.04, 0.05)!.Kind);
        Assert.Null(Box.Fault(0.06, 0.04, 0.0199));
        // A radius of more than half the shorter side.
        Assert.Equal(SectionFaultKind.RadiusTooLarge, RoundedRectangle.Fault(0.06, 0.04, 0.0201)!.Kind);
        Assert.Null(RoundedRectangle.Fault(0.06, 0.04, 0.02));
        Assert.Equal(SectionFaultKind.RadiusTooLarge, Box.Fault(0.06, 0.04, 0.005, 0.0201, 0.01)!.Kind);
        Assert.Equal(SectionFaultKind.RadiusTooLarge, Box.Fault(0.06, 0.04, 0.005, 0.01, 0.0151)!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, Box.Fault(0.06, 0.04, 0.005, -0.001, 0)!.Kind);
        Assert.Throws<ArgumentException>(() => new Tube(0.02, 0.02));
    }

    [Theory]
    [InlineData(-1e-9)]
    [InlineData(0.5)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NaN)]
    public void A_poisson_ratio_out_of_range_is_refused_for_every_kind(double poisson)
    {
        foreach (var section in Samples.Sections.Concat(ProfileSamples.All))
            Assert.Throws<ArgumentOutOfRangeException>(() => StressField.TryCreate(section, ShearModel.Elasticity, poisson, out _, out _));
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void Each_force_that_is_not_finite_is_refused(double bad)
    {
        var field = Samples.Field(new Rectangle(0.04, 0.08), ShearModel.Elasticity);
        SectionForces[] all = [new(bad, 0, 0, 0, 0, 0), new(0, bad, 0, 0, 0, 0), new(0, 0, bad, 0, 0, 0), new(0, 0, 0, bad, 0, 0), new(0, 0, 0, 0, bad, 0), new(0, 0, 0, 0, 0, bad)];

        Assert.All(all, forces => Assert.Throws<ArgumentException>(() => field.Govern(forces, StressMeasure.VonMises)));
        Assert.All(all, forces => Assert.Throws<ArgumentException>(() => field.GovernAll([default, forces], new GoverningPoint[6], new int[6])));
    }

    // A plate strip of 1 m × 1 mm: torsion T/(b·t²/3) in its middle, bending 6M/bt².
    [Fact]
    public void A_rectangle_of_one_to_a_thousand_is_exact()
    {
        foreach (var model in Enum.GetValues<ShearModel>())
        {
            var field = Samples.Field(new Rectangle(0.001, 1), model);

            Assert.Equal(1 / (1e-6 / 3), field.Govern(new SectionForces(0, 0, 0, 1, 0, 0), StressMeasure.Tau).Value, 3e6 * 1e-3);
            Assert.Equal(6e6, field.Govern(new SectionForces(0, 0, 0, 0, 0, 1), StressMeasure.VonMises).Value, 1);
        }
    }

    // Legs of 1:100: J as Σbt³/3 by thin-wall theory (any text); all six forces come back. Legs of 1:1000 are refused: too few digits are left of J.
    [Theory]
    [InlineData(OpenShape.L)]
    [InlineData(OpenShape.U)]
    [InlineData(OpenShape.T)]
    [InlineData(OpenShape.I)]
    public void A_thin_open_profile_is_solved_and_one_of_one_to_a_thousand_is_refused(OpenShape shape)
    {
        var field = Samples.Field(new OpenProfile(shape, 1, 1, 0.01, 0.01), ShearModel.Elasticity);
        var p = field.Properties;

        Assert.Equal(1, p.J!.Value / p.JThinWall!.Value, 2e-2);
        Assert.True(field.Closure.LargestError <= 1e-3, $"{field.Closure}");

        foreach (var model in Enum.GetValues<ShearModel>())
        {
            Assert.False(StressField.TryCreate(new OpenProfile(shape, 1, 1, 0.001, 0.001), model, 0.3, out _, out var whyNot));
            Assert.EndsWith("are too far apart for a numerical field", whyNot, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_tube_whose_bore_vanishes_is_the_bar_in_bending_and_torsion() =>
        Gen.Select(Gen.Double[0.005, 0.1], Gen.Double[-1, 1].Array[2]).Sample((radius, s) =>
        {
            var (tube, bar) = (new Tube(radius, radius * (1 - 1e-4)), new Round(radius));
            foreach (var model in Enum.GetValues<ShearModel>())
            {
                var (one, other) = (Samples.Field(tube, model), Samples.Field(bar, model));
                var forces = new SectionForces(1e3 * s[0], 0, 0, 50 * s[1], 40 * s[0], 30 * s[1]);
                foreach (var measure in Enum.GetValues<StressMeasure>())
                {
                    var most = other.Govern(forces, StressMeasure.Tresca).Value;
                    Assert.Equal(other.Govern(forces, measure).Value, one.Govern(forces, measure).Value, 1e-6 * most);
                }
            }
        }, iter: 30);

    // Area and inertia: the hole that is left counts with its own; the torsion constant more slowly; the peak at the hole never.
    [Fact]
    public void A_box_whose_hole_vanishes_is_the_rectangle_in_area_and_inertia() =>
        Gen.Select(Gen.Double[0.02, 0.2], Gen.Double[0.02, 0.2], Gen.Double[1e-4, 1e-2]).Sample((b, h, share) =>
        {
            var wall = Math.Min(b, h) / 2 * (1 - share);
            var (box, rectangle) = (SectionProperties.Of(new Box(b, h, wall)), SectionProperties.Of(new Rectangle(b, h)));
            var (bi, hi) = (b - 2 * wall, h - 2 * wall);

            Assert.Equal(rectangle.Area - bi * hi, box.Area, 1e-12 * rectangle.Area);
            Assert.Equal(rectangle.Iy - bi * hi * hi * hi / 12, box.Iy, 1e-12 * rectangle.Iy);
            Assert.Equal(rectangle.Iz - hi * bi * bi * bi / 12, box.Iz, 1e-12 * rectangle.Iz);
        }, iter: 20);

    // Any box is its outline; properties exactly, stresses within the errors of both fields.
    [Fact]
    public void Boxes_are_their_outlines() =>
        Gen.Select(Gen.Double[0.03, 0.1], Gen.Double[0.03, 0.1], Gen.Double[0.08, 0.2], Gen.Double[1, 2]).Sample((b, h, share, ratio) =>
        {
            var wall = share * Math.Min(b, h);
            var (inner, outer) = (0.5 * wall, 0.5 * wall * (1 + ratio));
            var box = new Box(b, h, wall, outer, inner);
            var outline = new OutlineSection("box", [ProfileSamples.Rounded(b, h, outer), ProfileSamples.Rounded(b - 2 * wall, h - 2 * wall, inner)]);
            var (p, q) = (SectionProperties.Of(box), SectionProperties.Of(outline));

            Assert.Equal([p.Area, p.Iy, p.Iz, p.WplY, p.WplZ, p.QY], [q.Area, q.Iy, q.Iz, q.WplY, q.WplZ, q.QY], (x, y) => Math.Abs(x / y - 1) <= 1e-9);
            Assert.Equal(1, q.J!.Value / p.J!.Value, 1e-5);
            var forces = new SectionForces(1e3, 1e3, 2e3, 10, 20, 30);
            var (one, other) = (Samples.Field(box, ShearModel.Elasticity), Samples.Field(outline, ShearModel.Elasticity));
            Assert.Equal(1, other.Govern(forces, StressMeasure.VonMises).Value / one.Govern(forces, StressMeasure.VonMises).Value, 5e-3);
        }, iter: 4);
}
