using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Tests.Analysis;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Sections;

/// <summary>Material profile sets that taper: both ends are read, with a body and without.</summary>
public sealed class TaperingProfileSetTests
{
    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void An_analytical_member_has_the_sections_of_both_ends(Release release)
    {
        var model = Bars.Model(release);
        Associate(model, Line(model, "strut"), model.Profiles.Of(new Rectangle(0.06, 0.012)), model.Profiles.Of(new Rectangle(0.04, 0.012)));
        Associate(model, Line(model, "box"), model.Profiles.RectangleHollow(0.1, 0.06, 0.005, 0.005, 0.01), model.Profiles.RectangleHollow(0.06, 0.06, 0.005, 0.005, 0.01));
        Associate(model, Line(model, "even"), model.Profiles.Of(Bars.Rail), model.Profiles.Of(Bars.Rail));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(new Rectangle(0.06, 0.012), Reading.Shape(reading.Named("strut")));
        ProfileReaderTests.AssertAlike(new Rectangle(0.04, 0.012), reading.Named("strut").EndSection!.Shape);
        Assert.Contains(reading.Named("strut").Notes, n => n.Contains("tapers from rectangle 60x12 mm to rectangle 40x12 mm", StringComparison.Ordinal));
        ProfileReaderTests.AssertAlike(new Box(0.06, 0.06, 0.005, 0.01, 0.005), reading.Named("box").EndSection!.Shape);
        Assert.Null(reading.Named("even").EndSection);
        ProfileReaderTests.AssertAlike(Bars.Rail, Reading.Shape(reading.Named("even")));
    }

    [Fact]
    public void Ends_that_are_shifted_of_other_kinds_or_missing_are_refused_with_the_reason()
    {
        var model = Bars.Model(Release.Ifc4);
        var flat = model.Profiles.Of(Bars.Flat);
        Associate(model, Line(model, "kinds"), flat, model.Profiles.Of(Bars.Rail));
        Associate(model, Line(model, "shifted"), flat, model.Profiles.Of(new Rectangle(0.04, 0.012)), "2", "8");
        Associate(model, Line(model, "none"), flat, null);

        var reading = Reading.Of(model);

        foreach (var (name, words) in new[] { ("kinds", "only tapers of one kind"), ("shifted", "shifted from the member's line"), ("none", "to none, or to several") })
        {
            var why = Reading.Why(reading.Named(name).Section);
            Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
            Assert.Contains(words, why.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_body_of_one_section_is_held_against_both_ends_of_its_set()
    {
        var model = Bars.Model(Release.Ifc4);
        var bar = Bars.Add(model, "R", new Rectangle(0.06, 0.012), 2);
        Associate(model, bar, model.Profiles.Of(new Rectangle(0.06, 0.012)), model.Profiles.Of(new Rectangle(0.04, 0.012)));

        var member = Reading.Of(model).Only;

        Assert.Equal(["rectangle 60x12 mm", "rectangle 40x12 mm"], Reading.Value(member.Section).Shapes.Select(s => s.Designation));
        Assert.Contains(member.Notes, n => n.Contains("differ", StringComparison.Ordinal));
    }

    private static int Line(ModelWriter model, string name) => Lines.CurveMember(model, name, Lines.Edge(model, Vector3.Zero, new Vector3(2, 0, 0)), Vector3.UnitZ);

    private static void Associate(ModelWriter model, int member, int start, int? end, string cardinalPoint = "10", string cardinalEndPoint = "10")
    {
        int Set(int profile) => model.Materials.ProfileSet("set", model.Materials.Material("S235JR"), profile);
        var usage = model.Add("IFCMATERIALPROFILESETUSAGETAPERING", Bars.Ref(Set(start)), cardinalPoint, "$", end is { } last ? Bars.Ref(Set(last)) : "$", cardinalEndPoint);
        model.Rooted("IFCRELASSOCIATESMATERIAL", FormattableString.Invariant($"usage {member}"), null, Bars.Refs(member), Bars.Ref(usage));
    }
}
