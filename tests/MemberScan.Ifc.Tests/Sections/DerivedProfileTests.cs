using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Sections;

public sealed class DerivedProfileTests
{
    private static readonly Transform3 s_turned = new(new Vector3(0.01, 0.02, 0), new Vector3(0.6, 0.8, 0), new Vector3(-0.8, 0.6, 0), Vector3.UnitZ);

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_derived_profile_is_turned_shifted_and_scaled_as_its_operator_says(Release release)
    {
        var model = Bars.Model(release);
        Add(model, "R", model.Outlines.Derived(model.Profiles.Of(Bars.Flat, "flat"), s_turned, 1.5));

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(new Rectangle(0.090, 0.018), Reading.Shape(member));
        Assert.Equal("flat", Reading.Value(member.Section).Name);
        var axes = Reading.Value(member.Axes);
        Near.Vector(new Vector3(0.01, 0.02, 0), axes.Origin);
        Near.Vector(new Vector3(0.6, 0.8, 0), axes.Y);
        Near.Vector(new Vector3(-0.8, 0.6, 0), axes.Z);
    }

    [Fact]
    public void An_uneven_scale_makes_another_rectangle_and_refuses_a_round_bar()
    {
        var model = Bars.Model(Release.Ifc4);
        Add(model, "flat", model.Outlines.Derived(model.Profiles.Of(Bars.Flat), Transform3.Identity, 2, 3));
        Add(model, "round", model.Outlines.Derived(model.Profiles.Circle(0.008), Transform3.Identity, 2, 3));
        Add(model, "box", model.Outlines.Derived(model.Profiles.RectangleHollow(0.08, 0.04, 0.004, 0.004, 0.008), Transform3.Identity, 1, 2));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(new Rectangle(0.120, 0.036), Reading.Shape(reading.Named("flat")));
        foreach (var name in new[] { "round", "box" })
        {
            var why = Reading.Why(reading.Named(name).Section);
            Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
            Assert.Contains("stretches", why.Message, StringComparison.Ordinal);
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_mirrored_profile_keeps_its_section_and_right_handed_axes(Release release)
    {
        // Mirrored about its y axis: a flat at x = +10 mm comes to lie at x = −10 mm.
        var model = Bars.Model(release);
        var place = new Transform3(new Vector3(0.010, 0, 0), Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ);
        Add(model, "R", model.Outlines.Mirrored(model.Outlines.Derived(model.Profiles.Of(Bars.Flat), place)));

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(Bars.Flat, Reading.Shape(member));
        var axes = Reading.Value(member.Axes);
        Near.Vector(new Vector3(-0.010, 0, 0), axes.Origin);
        Near.Vector(axes.Z, axes.X.Cross(axes.Y));
        Near.Vector(Vector3.UnitY, axes.Z);
        Assert.Contains("the profile is mirrored", member.Notes);
    }

    [Fact]
    public void A_profile_composed_of_one_part_is_that_part_and_of_more_is_refused_by_name()
    {
        var model = Bars.Model(Release.Ifc4);
        var (a, b) = (model.Profiles.Circle(0.008, "left"), model.Profiles.Circle(0.009, "right"));
        Add(model, "one", model.Outlines.Composite(a));
        Add(model, "two", model.Outlines.Composite(a, b));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(new Round(0.008), Reading.Shape(reading.Named("one")));
        var why = Reading.Why(reading.Named("two").Section);
        Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
        Assert.Contains("'left'", why.Message, StringComparison.Ordinal);
        Assert.Contains("'right'", why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_profile_derived_from_itself_or_nested_beyond_the_limit_has_an_end()
    {
        var model = Bars.Model(Release.Ifc4);
        var op = model.Add("IFCCARTESIANTRANSFORMATIONOPERATOR2D", "$", "$", Bars.Ref(model.Add("IFCCARTESIANPOINT", "(0.,0.)")), "$");
        var self = model.Add("IFCMIRROREDPROFILEDEF", ".AREA.", "$", "$", "*", "$") + 1;
        _ = model.Add("IFCDERIVEDPROFILEDEF", ".AREA.", "$", Bars.Ref(self), Bars.Ref(op), "$");
        Add(model, "self", self);
        var nested = model.Profiles.Circle(0.008);
        for (var i = 0; i <= ProfileReader.MaxNesting; i++) nested = model.Outlines.Derived(nested, Transform3.Identity);
        Add(model, "nested", nested);

        var reading = Reading.Of(model);

        foreach (var name in new[] { "self", "nested" })
            Assert.Contains("without end", Reading.Why(reading.Named(name).Section).Message, StringComparison.Ordinal);
    }

    private static void Add(ModelWriter model, string name, int profile) => Bars.Add(model, name, model.Bodies.Extrusion(profile, 2));
}
