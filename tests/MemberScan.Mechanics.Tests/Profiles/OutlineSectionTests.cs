using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Profiles;

public sealed class OutlineSectionTests
{
    private static readonly SectionForces s_mixed = new(1e3, 1e3, 2e3, 10, 20, 30);

    // Gere and Timoshenko, Mechanics of Materials, appendix (from memory): centroid 4r/3π, I of the axis along the diameter 0.1098 r⁴.
    [Fact]
    public void A_half_disc_has_the_textbook_values()
    {
        var section = new OutlineSection("half disc", [[new(-1, 0), new(1, 0, 1)]]);
        var p = SectionProperties.Of(section);

        Printed.Agrees("0.4244", section.GivenZ, "centroid");
        Printed.Agrees("0.1098", p.Iy, "I");
        Assert.Equal(Math.PI / 2, p.Area, 1e-12);
        Assert.Equal(Math.PI / 8, p.Iz, 1e-12);
        Assert.Equal(2.0 / 3 * 1, p.WplZ, 1e-9);                       // two quarter discs, each πr²/4 at 4r/3π: 2/3 r³
    }

    // Saint-Venant; Roark, Table 10.1 (from memory): J = √3·a⁴/80, τmax = 20T/a³ at the middle of the sides.
    [Fact]
    public void An_equilateral_triangle_has_the_known_torsion()
    {
        var section = new OutlineSection("triangle", [[new(0, 0), new(1, 0), new(0.5, Math.Sqrt(3) / 2)]]);
        var p = SectionProperties.Of(section);
        var field = Samples.Field(section, ShearModel.Elasticity);

        Assert.Equal(Math.Sqrt(3) / 80, p.J!.Value, 1e-9);
        Assert.Equal(20, field.Govern(new SectionForces(0, 0, 0, 1, 0, 0), StressMeasure.Tau).Value, 1e-3);
        Assert.Equal(20, 1 / p.Wt!.Value, 1e-3);
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(0.3)]
    public void Circle_ring_rectangle_and_box_as_outlines_are_what_they_are_by_name(double poisson)
    {
        (CrossSection Outline, CrossSection Named, double Tolerance)[] pairs =
        [
            (new OutlineSection("disc", [ProfileSamples.Circle(0.01, 0.02, 0.02)]), new Round(0.02), 1e-5),
            (new OutlineSection("ring", [ProfileSamples.Circle(0, 0, 0.03), ProfileSamples.Circle(0, 0, 0.02)]), new Tube(0.03, 0.01), 1e-4),
            (new OutlineSection("rectangle", [ProfileSamples.Rounded(0.04, 0.08, 0)]), new Rectangle(0.04, 0.08), 2e-3),
            (new OutlineSection("box", [ProfileSamples.Rounded(0.05, 0.1, 0.01), ProfileSamples.Rounded(0.04, 0.09, 0.005)]), new Box(0.05, 0.1, 0.005, 0.01, 0.005), 5e-3),
        ];
        foreach (var (outline, named, tolerance) in pairs)
        {
            var (one, other) = (Samples.Field(outline, ShearModel.Elasticity, poisson), Samples.Field(named, ShearModel.Elasticity, poisson));
            var (p, q) = (one.Properties, other.Properties);

            Assert.Equal(1, p.Area / q.Area, 1e-12);
            Assert.Equal(1, p.Iy / q.Iy, 1e-12);
            Assert.Equal(1, p.Iz / q.Iz, 1e-12);
            Assert.Equal(1, p.WelY / q.WelY, 1e-9);
            Assert.Equal(1, p.WplY / q.WplY, 1e-9);
            Assert.Equal(1, p.WplZ / q.WplZ, 1e-9);
            Assert.Equal(1, p.J!.Value / q.J!.Value, 1e-6);
            Assert.Equal((0, 0), (p.ShearCentreY, p.ShearCentreZ));
            var largest = other.Govern(s_mixed, StressMeasure.Tau).Value;
            foreach (var (y, z) in Samples.Points(one, new Random(4), 200).Where(at => other.Decides(at.Y, at.Z)))
            {
                var (a, b) = (one.At(s_mixed, y, z), other.At(s_mixed, y, z));
                Assert.Equal(a.Sigma, b.Sigma, 1e-6 * largest);
                Assert.True(double.Hypot(a.TauXY - b.TauXY, a.TauXZ - b.TauXZ) <= tolerance * largest, $"{named.Designation} at {y}, {z}: {a} against {b}");
            }

            foreach (var measure in Enum.GetValues<StressMeasure>())
                Assert.Equal(1, one.Govern(s_mixed, measure).Value / other.Govern(s_mixed, measure).Value, 1e-3);
        }
    }

    [Fact]
    public void An_outline_has_no_elementary_model_and_says_so()
    {
        Assert.False(StressField.TryCreate(ProfileSamples.All[5], ShearModel.Elementary, 0.3, out var field, out var whyNot));

        Assert.Null(field);
        Assert.Equal("there is no elementary rule for an outline; the elasticity model has it", whyNot);
    }

    [Fact]
    public void The_turn_and_the_place_of_the_rings_do_not_matter()
    {
        var one = new OutlineSection("plate", [ProfileSamples.Rounded(0.1, 0.06, 0.01), ProfileSamples.Circle(0.02, 0, 0.01)]);
        var other = new OutlineSection("plate",
        [
            [.. ProfileSamples.Rounded(0.1, 0.06, 0.01).Select(v => v with { Y = v.Y + 3, Z = v.Z - 2 })],
            [new(3.03, -2, -1), new(3.01, -2, -1)],
        ]);

        var (p, q) = (SectionProperties.Of(one), SectionProperties.Of(other));

        Assert.Equal(1, q.Area / p.Area, 1e-9);
        Assert.Equal(1, q.Iy / p.Iy, 1e-9);
        Assert.Equal(1, q.J!.Value / p.J!.Value, 1e-6);
        Assert.Equal(3, other.GivenY - one.GivenY, 1e-9);
    }

    [Fact]
    public void Equal_rings_make_equal_sections()
    {
        var one = new OutlineSection("a", [ProfileSamples.Rounded(1, 2, 0)]);
        var other = new OutlineSection("a", [ProfileSamples.Rounded(1, 2, 0)]);

        Assert.Equal(one, other);
        Assert.Equal(one.GetHashCode(), other.GetHashCode());
        Assert.NotEqual(one, new OutlineSection("a", [ProfileSamples.Rounded(1, 2.1, 0)]));
    }

    [Fact]
    public void Rings_that_make_no_section_are_refused()
    {
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([])!.Kind);
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([[new(0, 0)]])!.Kind);
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([[new(0, 0), new(1, 1), new(1, 0), new(0, 1)]])!.Kind);
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([ProfileSamples.Rounded(1, 1, 0), ProfileSamples.Circle(0.5, 0, 0.1)])!.Kind);
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([[new(0, 0), new(0, 0), new(1, 0), new(0, 1)]])!.Kind);
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([[new(0, 0), new(1, 0)]])!.Kind);
        Assert.Equal(SectionFaultKind.NotPositive, OutlineSection.Fault([[new(0, 0), new(double.NaN, 0), new(0, 1)]])!.Kind);
        Assert.Equal(SectionFaultKind.NotSimple, OutlineSection.Fault([[.. Enumerable.Range(0, 401).Select(i => new OutlineVertex(Math.Cos(i * 0.015), Math.Sin(i * 0.015)))]])!.Kind);
        Assert.Throws<ArgumentException>(() => new OutlineSection("x", [[new(0, 0), new(1, 1), new(1, 0), new(0, 1)]]));
    }
}
