using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Frames;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Frames;

/// <summary>Sections of analytical members that are not one outline: tapers, stated constants, shear areas, lines beside the centroid.</summary>
public sealed class StiffnessTests
{
    private static readonly Vector3 s_end = new(2, 0, 0);

    /// <summary>b·h³/12 with b = 40 mm and h from 60 mm to 120 mm: 720,000 mm⁴ at the start, 2,430,000 mm⁴ in the middle (90 mm), 5,760,000 mm⁴ at the end.</summary>
    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_profile_set_that_tapers_gives_the_section_of_each_place(Release release)
    {
        var read = Tapering(release, 0.060, 0.120);

        var member = Assert.Single(read.Frame!.Members);
        Assert.Equal((0, 0.5, 1), (member.Taper[0].Share, member.Taper[32].Share, member.Taper[^1].Share));
        Reading.AssertNear(0.72e-6, member.Taper[0].Section.Iy);
        Reading.AssertNear(2.43e-6, member.Taper[32].Section.Iy);
        Reading.AssertNear(5.76e-6, member.Taper[^1].Section.Iy);
        Assert.Contains(read.Notes, n => n.Contains("'Strut'", StringComparison.Ordinal) && n.Contains("tapers", StringComparison.Ordinal));
    }

    [Fact]
    public void A_taper_goes_on_where_the_member_is_parted()
    {
        var members = Tapering(Release.Ifc4, 0.060, 0.120, middle: new Vector3(0.5, 0, 0)).Frame!.Members;

        // A quarter along the depth is 75 mm: 40·75³/12 = 1,406,250 mm⁴.
        Assert.Equal(2, members.Length);
        Reading.AssertNear(1.40625e-6, members[0].Taper[^1].Section.Iy);
        Reading.AssertNear(1.40625e-6, members[1].Taper[0].Section.Iy);
        Reading.AssertNear(5.76e-6, members[1].Taper[^1].Section.Iy);
    }

    [Fact]
    public void A_taper_between_sections_of_two_kinds_is_refused_by_name()
    {
        var model = Frames.Model(Release.Ifc4);
        var read = Taper(model, model.Profiles.Of(new Rectangle(0.040, 0.060)), model.Profiles.Of(Bars.Rail), null);

        Assert.Contains("'Strut'", Assert.Single(read.Refusals).Message, StringComparison.Ordinal);
        Assert.Contains("between which the section is not known", read.Refusals[0].Message, StringComparison.Ordinal);
    }

    /// <summary>A body that runs from its 60 mm at (2, 0, 0) to its 120 mm at the origin; the analytical member runs the other way.</summary>
    [Fact]
    public void A_member_that_takes_the_section_of_a_tapering_body_follows_it_from_its_own_start()
    {
        var model = Frames.Model(Release.Ifc4);
        var solid = model.Add("IFCEXTRUDEDAREASOLIDTAPERED", Bars.Ref(model.Profiles.Of(new Rectangle(0.040, 0.060))), Bars.Ref(model.AxisPlacement(Transform3.Identity)),
            Bars.Ref(model.Direction(Vector3.UnitZ)), "2000.", Bars.Ref(model.Profiles.Of(new Rectangle(0.040, 0.120))));
        var body = Bars.Add(model, "Strut", solid, Bars.Frame(s_end, -Vector3.UnitX, Vector3.UnitY));
        model.Associate(model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), body);
        var writer = new FrameWriter(model, "Landing");
        var line = writer.Member("Line", Vector3.Zero, s_end, Vector3.UnitZ);
        model.Rooted("IFCRELASSIGNSTOPRODUCT", "link", null, Bars.Refs(line), "$", Bars.Ref(body));
        writer.Finish();

        var member = Assert.Single(Frames.Read(model).Frame!.Members);

        Reading.AssertNear(5.76e-6, member.Taper[0].Section.Iy);
        Reading.AssertNear(0.72e-6, member.Taper[^1].Section.Iy);
    }

    /// <summary>A crane rail has no outline that is read; its properties state A, I and J, in IFC2X3 as attributes.</summary>
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Stated_constants_stand_in_for_an_outline_and_it_is_said(Release release)
    {
        var read = WithConstants(release, iy: "2.2E7", shear: true);

        Assert.Empty(read.Refusals);
        var (member, section) = (Assert.Single(read.Frame!.Members), read.Frame.Members[0].Section);
        Assert.Null(section.Shape);
        Reading.AssertNear(4475e-6, section.Area);
        Reading.AssertNear(2.2e-5, section.Iy);
        Reading.AssertNear(7.4e-6, section.Iz);
        Reading.AssertNear(1.8e-5, section.J);
        Assert.True(member.ShearFlexible);
        Reading.AssertNear(2500e-6, section.ShearAreaY);
        Reading.AssertNear(1500e-6, section.ShearAreaZ);
        Assert.Contains(read.Notes, n => n.Contains("stiffness by profile properties", StringComparison.Ordinal));
        Assert.Contains(read.Notes, n => n.Contains("flexible in shear", StringComparison.Ordinal));
    }

    /// <summary>2200 mm⁴ would be cm⁴: the polar second moment of a disc of 4475 mm² is 3.2e6 mm⁴, and no section has less.</summary>
    [Theory]
    [InlineData("2200.", "units are taken for a slip")]
    [InlineData("2.2E13", "units are taken for a slip")]
    [InlineData(null, "does not state area, both second moments")]
    public void Constants_that_belong_to_no_section_are_refused_by_name(string? iy, string words)
    {
        var read = WithConstants(Release.Ifc4, iy, shear: false, iz: iy == "2200." ? "740." : "7.4E6");

        Assert.Null(read.Frame);
        Assert.Contains("'Strut'", Assert.Single(read.Refusals).Message, StringComparison.Ordinal);
        Assert.Contains(words, read.Refusals[0].Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Several_profile_properties_mean_a_section_that_varies()
    {
        var model = Bars.Model(Release.Ifc2X3);
        var writer = new FrameWriter(model, "Landing");
        var bar = writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        writer.Section(model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), model.Profiles.Of(new Rectangle(0.040, 0.120)), bar);
        var thin = model.Add("IFCGENERALPROFILEPROPERTIES", "$", Bars.Ref(model.Profiles.Of(new Rectangle(0.040, 0.060))), "$", "$", "$", "$", "$");
        model.Rooted("IFCRELASSOCIATESPROFILEPROPERTIES", "thin", null, Bars.Refs(bar), Bars.Ref(thin), "$", "$");
        writer.Finish();

        Assert.Contains("varies along its length", Assert.Single(Frames.Read(model).Refusals).Message, StringComparison.Ordinal);
        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(Reading.Of(model).Only.Section).Code);
    }

    /// <summary>The origin of an unequal angle is the middle of its box, not its centroid.</summary>
    [Theory]
    [InlineData(null, true)]
    [InlineData(10, false)]
    public void A_line_beside_the_centroid_of_its_profile_has_its_axis_there_and_its_loads_on_the_line(int? cardinalPoint, bool isSaid)
    {
        var model = Frames.Model(Release.Ifc4);
        var writer = new FrameWriter(model, "Landing");
        var bar = writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        var angle = model.Add("IFCLSHAPEPROFILEDEF", ".AREA.", "'L'", "$", "80.", "60.", "8.", "$", "$", "$");
        var set = model.Materials.ProfileSet("set", model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), angle);
        model.Associate(model.Materials.ProfileSetUsage(set, cardinalPoint), bar);
        writer.LineAction(bar, writer.Case("Live"), new(0, 0, -100));
        writer.Finish();

        var read = Frames.Read(model);

        // L 80 × 60 × 8 by hand: A = 1056 mm²; centroid (80·8·4 + 52·8·34)/1056 = 15.82 mm and (80·8·40 + 52·8·4)/1056 = 25.82 mm from the backs of the legs, the
        // middle of the box 30 mm and 40 mm: it lies 14.18 mm and 14.18 mm from the line. y and z of the section are the profile's X and Y, here global Y and Z.
        var member = Assert.Single(read.Frame!.Members);
        var load = Assert.Single(Assert.Single(read.Frame.Situations).LineLoads);
        var aside = isSaid ? -0.0141818 : 0;
        Assert.Equal(aside, member.StartOffset.Y, 1e-6);
        Assert.Equal(aside, member.StartOffset.Z, 1e-6);
        Assert.Equal(aside, member.EndOffset.Y, 1e-6);
        // The arm leads from the axis to the line: (0, 14.18, 14.18) mm × (0, 0, −100) N/m.
        Assert.Equal(isSaid ? -1.41818 : 0, load.MomentFrom.X, 1e-4);
        Assert.Equal(isSaid, read.Notes.Any(n => n.Contains("the centroid of 'Strut'", StringComparison.Ordinal)));
    }

    private static AnalysisFrame Tapering(Release release, double first, double last, Vector3? middle = null)
    {
        var model = Frames.Model(release);
        return Taper(model, model.Profiles.Of(new Rectangle(0.040, first)), model.Profiles.Of(new Rectangle(0.040, last)), middle);
    }

    private static AnalysisFrame Taper(ModelWriter model, int first, int last, Vector3? middle)
    {
        var writer = new FrameWriter(model, "Landing");
        var bar = writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        if (middle is { } point) writer.Join(bar, writer.Node("Middle", point));
        var steel = model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3);
        var (start, end) = (model.Materials.ProfileSet("start", steel, first), model.Materials.ProfileSet("end", steel, last));
        model.Associate(model.Add("IFCMATERIALPROFILESETUSAGETAPERING", Bars.Ref(start), "10", "$", Bars.Ref(end), "10"), bar);
        writer.Finish();
        return Frames.Read(model);
    }

    private static AnalysisFrame WithConstants(Release release, string? iy, bool shear, string iz = "7.4E6")
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var bar = writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        var steel = model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3);
        var (asy, asz) = shear ? ("2500.", "1500.") : ("$", "$");
        if (release == Release.Ifc2X3)
        {
            var rail = model.Add("IFCCRANERAILASHAPEPROFILEDEF", [".AREA.", "'A 65'", "$", .. Enumerable.Repeat("10.", 12)]);
            var properties = model.Add("IFCSTRUCTURALPROFILEPROPERTIES", ["'A 65'", Bars.Ref(rail), "$", "$", "$", "$", "4475.", "1.8E7", "$", iy ?? "$", iz, "$", "$", "$", asz, asy, .. Enumerable.Repeat("$", 7)]);
            model.Associate(steel, bar);
            model.Rooted("IFCRELASSOCIATESPROFILEPROPERTIES", "P", null, Bars.Refs(bar), Bars.Ref(properties), "$", "$");
        }
        else
        {
            var rail = model.Add("IFCPROFILEDEF", ".AREA.", "'A 65'");
            int Value(string name, string measure, string value) => model.Add("IFCPROPERTYSINGLEVALUE", $"'{name}'", "$", Spelling.Typed(measure, value), "$");
            List<int> values =
            [
                Value("CrossSectionArea", "IFCAREAMEASURE", "4475."), Value("MomentOfInertiaZ", "IFCMOMENTOFINERTIAMEASURE", iz),
                Value("TorsionalConstantX", "IFCMOMENTOFINERTIAMEASURE", iy == "2200." ? "1000." : "1.8E7"),
            ];
            if (iy is not null) values.Add(Value("MomentOfInertiaY", "IFCMOMENTOFINERTIAMEASURE", iy));
            if (shear) values.AddRange([Value("ShearDeformationAreaY", "IFCAREAMEASURE", asy), Value("ShearDeformationAreaZ", "IFCAREAMEASURE", asz)]);
            model.Add("IFCPROFILEPROPERTIES", "'Pset_ProfileMechanical'", "$", Bars.Refs([.. values]), Bars.Ref(rail));
            model.Associate(model.Materials.ProfileSetUsage(model.Materials.ProfileSet("set", steel, rail)), bar);
        }

        writer.Finish();
        return Frames.Read(model);
    }
}
