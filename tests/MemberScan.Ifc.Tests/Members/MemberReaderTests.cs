using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Members;
using MemberScan.Ifc.Tests.Analysis;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Members;

public sealed class MemberReaderTests
{
    private static readonly Rectangle s_plate = new(0.1, 0.1);

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Beams_columns_members_and_railings_are_candidates_in_file_order(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "rail", Bars.Rail, 2, keyword: "IFCRAILING");
        Bars.Add(model, "mast", Bars.Rail, 2, keyword: "IFCCOLUMN");
        model.Element("IFCPLATE", "deck", null, null);
        model.Element("IFCMEMBER", "bodiless", null, null);
        Bars.Add(model, "girder", Bars.Rail, 2, keyword: "IFCBEAM");

        var reading = Reading.Of(model);

        Assert.Equal(["rail", "mast", "bodiless", "girder"], reading.Catalog.Members.Select(m => m.Element.Name));
        Assert.Equal(["IfcRailing", "IfcColumn", "IfcMember", "IfcBeam"], reading.Catalog.Members.Select(m => m.Element.Class));
        Assert.All(reading.Catalog.Members, m => Assert.Equal((m.Element.GlobalId, 0, 1), (m.Key, m.ItemNumber, m.ItemCount)));
        Assert.Equal(ReasonCode.NoSection, Reading.Why(reading.Named("bodiless").Section).Code);
        Assert.Empty(reading.Catalog.PassedOver);
    }

    [Theory]
    [InlineData("IFCBEAMSTANDARDCASE", "IfcBeamStandardCase")]
    [InlineData("IFCCOLUMNSTANDARDCASE", "IfcColumnStandardCase")]
    [InlineData("IFCMEMBERSTANDARDCASE", "IfcMemberStandardCase")]
    public void Standard_case_forms_follow_their_class(string keyword, string expected)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", Bars.Rail, 2, keyword: keyword);

        Assert.Equal(expected, Reading.Of(model).Only.Element.Class);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Conditional_classes_need_a_bar_forces_or_a_name_in_a_table(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "bar", Bars.Rail, 2, keyword: "IFCBUILDINGELEMENTPROXY");
        Bars.Add(model, "block", model.Bodies.FacetedBlock(0.1, 0.1, 2), keyword: "IFCBUILDINGELEMENTPROXY");
        Bars.Add(model, "stub", s_plate, 0.299, keyword: "IFCBUILDINGELEMENTPROXY");
        Bars.Add(model, "just a bar", s_plate, 0.301, keyword: "IFCDISCRETEACCESSORY");
        Bars.Add(model, "named", model.Bodies.FacetedBlock(0.1, 0.1, 2), keyword: "IFCMECHANICALFASTENER");
        var forced = Bars.Add(model, "forced", model.Bodies.FacetedBlock(0.1, 0.1, 2), keyword: "IFCFLOWSEGMENT");
        model.StartAnalysis("A", Transform3.Identity).Link(forced, Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, Vector3.UnitX), Vector3.UnitZ));
        model.Element("IFCDISCRETEACCESSORY", "nothing", null, null);

        var reading = Reading.Of(model, isNamed: e => e.Name == "named");

        Assert.Equal(["bar", "just a bar", "named", "forced"], reading.Catalog.Members.Select(m => m.Element.Name));
        Assert.Equal(
            [("IfcBuildingElementProxy", 2), ("IfcDiscreteAccessory", 1), ("IfcStructuralCurveMember", 1)],
            reading.Catalog.PassedOver.Select(p => (p.Class, p.Count)));
    }

    [Fact]
    public void A_sweep_that_cannot_be_read_to_its_end_is_not_passed_over()
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "wall", model.Bodies.Extrusion(model.Add("IFCCIRCLEHOLLOWPROFILEDEF", ".AREA.", "$", "$", "10.", "10."), 2), keyword: "IFCPIPESEGMENT");
        Bars.Add(model, "line", model.Add("IFCSWEPTDISKSOLID", "#999999", "10.", "$", "$", "$"), keyword: "IFCBUILDINGELEMENTPROXY");

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.WallOverRadius, Reading.Why(reading.Named("wall").Section).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("line").Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Classes_follow_the_settings_without_regard_to_case(Release release)
    {
        var rules = new ReadingRules { Candidates = new CandidateRules(["IFCplate"], ["ifcbeam"]) };
        var model = Bars.Model(release);
        Bars.Add(model, "flat", Bars.Flat, 2, keyword: "IFCPLATE");
        Bars.Add(model, "beam", Bars.Rail, 2, keyword: "IFCBEAM");
        Bars.Add(model, "lump", model.Bodies.FacetedBlock(1, 1, 1), keyword: "IFCBEAM");
        Bars.Add(model, "member", Bars.Rail, 2);

        var reading = Reading.Of(model, rules);

        Assert.Equal(["flat", "beam"], reading.Catalog.Members.Select(m => m.Element.Name));
        Assert.Equal(new ClassCount("IfcBeam", 1, "no bar-like body of a covered section, and no forces"), Assert.Single(reading.Catalog.PassedOver));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Parts_of_a_railing_are_candidates_and_the_bodiless_railing_is_counted(Release release)
    {
        var model = Bars.Model(release);
        var railing = model.Element("IFCRAILING", "railing", null, null);
        var inner = new ElementOptions { IsContained = false };
        var infill = Bars.Add(model, "infill", Bars.Flat, 2, keyword: "IFCPLATE", options: inner);
        var post = Bars.Add(model, "post", Bars.Rail, 1, keyword: "IFCMEMBER", options: inner);
        model.Aggregate(railing, infill, post);

        var reading = Reading.Of(model);

        Assert.Equal(["infill", "post"], reading.Catalog.Members.Select(m => m.Element.Name));
        Assert.Equal(new ClassCount("IfcRailing", 1, "its parts are the candidates"), Assert.Single(reading.Catalog.PassedOver));
        Assert.Equal("Gangway level", reading.Named("post").Element.Storey);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Several_bars_of_an_element_are_items_in_body_order(Release release)
    {
        var model = Bars.Model(release);
        int[] solids =
        [
            model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 1), model.Bodies.FacetedBlock(0.1, 0.1, 0.1), model.Bodies.Extrusion(model.Profiles.Of(Bars.Flat), 2),
            model.Bodies.SweptDisk([Vector3.Zero, Vector3.UnitX], 0.008),
        ];
        model.Element("IFCRAILING", "railing", null, model.Bodies.Shape("SweptSolid", solids));

        var members = Reading.Of(model).Catalog.Members;

        var globalId = members[0].Element.GlobalId;
        Assert.Equal([$"{globalId}/1", $"{globalId}/2", $"{globalId}/3"], members.Select(m => m.Key));
        Assert.Equal([(1, 3), (2, 3), (3, 3)], members.Select(m => (m.ItemNumber, m.ItemCount)));
        Assert.Equal(["tube", "rectangle", "round"], members.Select(m => Reading.Shape(m).Kind));
        Assert.All(members, m => Assert.Contains(m.Notes, n => n.Contains("1 further bodies", StringComparison.Ordinal)));
    }

    [Fact]
    public void A_base_plate_beside_a_post_is_no_item()
    {
        var model = Bars.Model(Release.Ifc4);
        var plate = model.Bodies.Extrusion(model.Profiles.Of(s_plate), 0.010);
        model.Element("IFCRAILING", "post", null, model.Bodies.Shape("SweptSolid", plate, model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 1)));

        var member = Reading.Of(model).Only;

        Assert.Equal((member.Element.GlobalId, 0, 1), (member.Key, member.ItemNumber, member.ItemCount));
        Assert.IsType<Tube>(Reading.Shape(member));
        Assert.Contains(member.Notes, n => n.Contains("1 further bodies", StringComparison.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_profile_set_that_differs_from_the_body_is_kept_beside_it(Release release)
    {
        var model = Bars.Model(release);
        var steel = model.Materials.Material("S235");
        void Add(string name, CrossSection body, CrossSection set) => model.Associate(
            model.Materials.ProfileSetUsage(model.Materials.ProfileSet(name, steel, model.Profiles.Of(set))), Bars.Add(model, name, body, 2));
        Add("differs", Bars.Rail, new Tube(0.02415, 0.0026));
        Add("agrees", Bars.Rail, Bars.Rail);

        var reading = Reading.Of(model);

        var shapes = Reading.Value(reading.Named("differs").Section).Shapes;
        Assert.Equal([0.0032, 0.0026], shapes.Select(s => Math.Round(((Tube)s).Wall, 9)));
        Assert.Contains(reading.Named("differs").Notes, n => n.Contains("less favourable decides", StringComparison.Ordinal));
        Assert.IsType<Tube>(Reading.Shape(reading.Named("agrees")));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Without_a_readable_body_the_profile_set_gives_the_section_and_the_analytical_line_the_rest(Release release)
    {
        var model = Bars.Model(release);
        var usage = model.Materials.ProfileSetUsage(model.Materials.ProfileSet("rail", model.Materials.Material("S235"), model.Profiles.Of(Bars.Rail)));
        var bodiless = model.Element("IFCMEMBER", "bodiless", null, null);
        var mesh = Bars.Add(model, "mesh", model.Bodies.FacetedBlock(0.05, 0.05, 2));
        model.Associate(usage, bodiless, mesh);
        var analysis = model.StartAnalysis("A", Bars.Askew);
        analysis.Link(bodiless, analysis.CurveMember("L", Vector3.Zero, new Vector3(0, 3, 0), Vector3.UnitX));

        var reading = Reading.Of(model);

        Assert.IsType<Tube>(Reading.Shape(reading.Named("bodiless")));
        Reading.AssertNear(3, Reading.Value(reading.Named("bodiless").Length));
        Near.Vector(Bars.Askew.Direction(Vector3.UnitX), Reading.Value(reading.Named("bodiless").Axes).Z);
        Assert.IsType<Tube>(Reading.Shape(reading.Named("mesh")));
        Assert.Contains(reading.Named("mesh").Notes, n => n.Contains("the material profile set does", StringComparison.Ordinal));
        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(reading.Named("mesh").Length).Code);
    }

    [Fact]
    public void A_profile_set_that_tapers_to_another_kind_or_has_several_profiles_gives_no_section()
    {
        var model = Bars.Model(Release.Ifc4);
        var steel = model.Materials.Material("S235");
        var one = model.Materials.ProfileSet("one", steel, model.Profiles.Of(Bars.Rail));
        var parts = new[] { Bars.Rail, new Tube(0.03, 0.003) }.Select(s => model.Add("IFCMATERIALPROFILE", "$", "$", Bars.Ref(steel), Bars.Ref(model.Profiles.Of(s)), "$", "$")).ToArray();
        model.Associate(model.Add("IFCMATERIALPROFILESETUSAGETAPERING", Bars.Ref(one), "10", "$", Bars.Ref(model.Materials.ProfileSet("other", steel, model.Profiles.Of(Bars.Flat))), "10"), model.Element("IFCMEMBER", "taper", null, null));
        model.Associate(model.Add("IFCMATERIALPROFILESET", "$", "$", Bars.Refs(parts), "$"), model.Element("IFCMEMBER", "two", null, null));

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("taper").Section).Code);
        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("two").Section).Code);
    }

    [Fact]
    public void A_profile_turned_by_its_position_is_not_used_without_a_body_that_shows_the_turn()
    {
        var model = Bars.Model(Release.Ifc4);
        var turned = model.Add("IFCAXIS2PLACEMENT2D", Bars.Ref(model.Add("IFCCARTESIANPOINT", "(0.,0.)")), Bars.Ref(model.Add("IFCDIRECTION", "(0.,1.)")));
        var profile = model.Add("IFCRECTANGLEPROFILEDEF", ".AREA.", "$", Bars.Ref(turned), "60.", "12.");
        var analytical = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, Vector3.UnitX), Vector3.UnitZ);
        model.Associate(model.Materials.ProfileSetUsage(model.Materials.ProfileSet("flat", model.Materials.Material("S235"), profile)), analytical);

        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(Reading.Of(model).Only.Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_member_knows_its_containers_its_assembly_and_its_layer(Release release)
    {
        var model = Bars.Model(release);
        string[] spatial = ["$", "$", "$", "$", ".ELEMENT.", "$"];
        var building = model.Rooted("IFCBUILDING", "pier", "Pier", [.. spatial, "$", "$"]);
        var storey = model.Rooted("IFCBUILDINGSTOREY", "deck", "Deck", spatial);
        var gangway = model.Rooted("IFCELEMENTASSEMBLY", "gangway", "Gangway", "$", "$", "$", "$", "$", ".NOTDEFINED.");
        var solid = model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 2);
        var rail = Bars.Add(model, "X-1", solid);
        model.Add("IFCPRESENTATIONLAYERASSIGNMENT", "'S-HANDRAIL'", "$", Bars.Refs(solid), "$");
        model.Aggregate(building, storey);
        model.Aggregate(gangway, rail);
        model.Rooted("IFCRELCONTAINEDINSPATIALSTRUCTURE", "in the deck", "in the deck", Bars.Refs(gangway), Bars.Ref(storey));

        var member = Reading.Of(model).Named("X-1");

        Assert.Equal("Gangway", member.Element.Assembly);
        Assert.Equal("S-HANDRAIL", member.Element.Layer);
        Assert.EndsWith(member.Element.Storey, member.Element.StoreyPath, StringComparison.Ordinal);
        Assert.NotEmpty(member.Element.Storey);

        // Neither name nor type nor assembly say what it is; its layer does.
        Assert.Equal("rail", member.Role);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_analytical_member_without_a_physical_one_is_a_candidate(Release release)
    {
        var model = Bars.Model(release);
        var alone = Lines.CurveMember(model, "alone", Lines.Edge(model, Vector3.Zero, new Vector3(0, 0, 4)), Vector3.UnitX);
        var slab = model.Element("IFCPLATE", "deck", null, null);
        var linked = Lines.CurveMember(model, "of the deck", Lines.Edge(model, Vector3.Zero, Vector3.UnitY), Vector3.UnitX);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        analysis.Link(slab, linked);
        Section(model, Bars.Flat, alone, linked);
        analysis.Link(Bars.Add(model, "rail", Bars.Rail, 2), Lines.CurveMember(model, "of the rail", Lines.Edge(model, Vector3.Zero, new Vector3(0, 0, 2)), Vector3.UnitX));

        var reading = Reading.Of(model);

        Assert.Equal(["alone", "of the deck", "rail"], reading.Catalog.Members.Select(m => m.Element.Name));
        var member = reading.Named("alone");
        ProfileOf(Bars.Flat, member);
        Reading.AssertNear(4, Reading.Value(member.Length));
        Near.Vector(Vector3.UnitX, Reading.Value(member.Axes).Z);
        Assert.Equal(new ClassCount("IfcStructuralCurveMember", 1, "its physical element is the candidate"), Assert.Single(reading.Catalog.PassedOver));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_varying_analytical_member_is_its_parts_or_not_covered(Release release)
    {
        var model = Bars.Model(release);
        string[] own = ["$", "$", "$", ".RIGID_JOINED_MEMBER.", Bars.Ref(model.Direction(Vector3.UnitZ))];
        var whole = model.Rooted("IFCSTRUCTURALCURVEMEMBERVARYING", "whole", "whole", own);
        model.Aggregate(whole, Lines.CurveMember(model, "part", Lines.Edge(model, Vector3.Zero, Vector3.UnitX), Vector3.UnitZ));
        model.Rooted("IFCSTRUCTURALCURVEMEMBERVARYING", "single", "single", own);

        var reading = Reading.Of(model);

        Assert.Equal(["part", "single"], reading.Catalog.Members.Select(m => m.Element.Name));
        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("single").Section).Code);
        Assert.Equal("IfcStructuralCurveMemberVarying", Assert.Single(reading.Catalog.PassedOver).Class);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_analytical_member_of_a_bodiless_railing_stays_a_candidate(Release release)
    {
        var model = Bars.Model(release);
        var railing = model.Element("IFCRAILING", "railing", null, null);
        model.Aggregate(railing, Bars.Add(model, "post", Bars.Rail, 1, options: new ElementOptions { IsContained = false }));
        model.StartAnalysis("A", Transform3.Identity).Link(railing, Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, Vector3.UnitX), Vector3.UnitZ));

        Assert.Equal(["L", "post"], Reading.Of(model).Catalog.Members.Select(m => m.Element.Name).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Two_elements_of_one_GlobalId_get_different_keys_and_it_is_told()
    {
        var reading = Reading.Of(Reading.Text(Release.Ifc4, "#5=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'a',$,$,$,$,$,$);", "#6=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'b',$,$,$,$,$,$);"));

        Assert.Equal(["2O2Fr$t4X7Zf8NOew3FLOH", "2O2Fr$t4X7Zf8NOew3FLOH#6"], reading.Catalog.Members.Select(m => m.Key));
        reading.AssertTold("IFC-0010", Severity.Warning, "same GlobalId");
    }

    [Fact]
    public void An_element_without_a_GlobalId_is_keyed_by_its_number()
    {
        var reading = Reading.Of(Reading.Text(Release.Ifc4, "#5=IFCMEMBER($,$,'a',$,$,$,$,$,$);", "#6=IFCMEMBER('',$,'b',$,$,$,$,$,$);"));

        Assert.Equal(["#5", "#6"], reading.Catalog.Members.Select(m => m.Key));
    }

    [Fact]
    public void A_second_instance_of_a_number_is_counted_and_not_read()
    {
        var reading = Reading.Of(Reading.Text(Release.Ifc4, "#5=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'a',$,$,$,$,$,$);", "#5=IFCMEMBER('0YvctVUKr0kugbFTf53O9L',$,'b',$,$,$,$,$,$);"));

        Assert.Equal("a", reading.Only.Element.Name);
        Assert.Equal(("IfcMember", 1), (reading.Catalog.PassedOver[0].Class, reading.Catalog.PassedOver[0].Count));
        Assert.True(reading.Model.File.HasDamage);
    }

    [Fact]
    public void A_damaged_element_is_a_candidate_with_that_reason()
    {
        var reading = Reading.Of(Reading.Text(Release.Ifc4, "#5=IFCMEMBER('2O2Fr$t4X7Zf8NOew3FLOH',$,'a' 'b',$,$,$,$,$,$);"));

        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Only.Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Storey_tag_type_and_predefined_type_are_found_over_their_relations(Release release)
    {
        var model = Bars.Model(release);
        var assembly = model.Element("IFCELEMENTASSEMBLY", "frame", null, null);
        var inner = model.Element("IFCELEMENTASSEMBLY", "bay", null, null, new ElementOptions { IsContained = false });
        var strut = Bars.Add(model, "S 1", Bars.Flat, 2, options: new ElementOptions { Tag = "T-1", IsContained = false });
        model.Aggregate(assembly, inner);
        model.Aggregate(inner, strut);
        model.TypeObject("IFCMEMBERTYPE", "Flat type", "STRUT", null, [strut]);

        var element = Reading.Of(model).Only.Element;

        Assert.Equal(("T-1", "Flat type", "STRUT", "Gangway level"), (element.Tag, element.TypeName, element.PredefinedType, element.Storey));
    }

    [Fact]
    public void The_predefined_type_of_the_occurrence_counts_unless_it_is_not_defined()
    {
        var model = Bars.Model(Release.Ifc4);
        var own = Bars.Add(model, "own", Bars.Flat, 2, options: new ElementOptions { PredefinedType = "BRACE" });
        var undefined = Bars.Add(model, "undefined", Bars.Flat, 2, options: new ElementOptions { PredefinedType = "NOTDEFINED" });
        model.TypeObject("IFCMEMBERTYPE", "T", "STRUT", null, [own, undefined]);

        var reading = Reading.Of(model);

        Assert.Equal("BRACE", reading.Named("own").Element.PredefinedType);
        Assert.Equal("STRUT", reading.Named("undefined").Element.PredefinedType);
    }

    [Fact]
    public void A_circle_of_assemblies_ends_without_a_storey()
    {
        var model = Bars.Model(Release.Ifc4);
        var rail = Bars.Add(model, "R", Bars.Rail, 2, options: new ElementOptions { IsContained = false });
        var assembly = model.Element("IFCELEMENTASSEMBLY", "frame", null, null, new ElementOptions { IsContained = false });
        model.Aggregate(assembly, rail);
        model.Aggregate(rail, assembly);

        Assert.Equal("", Reading.Of(model).Only.Element.Storey);
    }

    private static void ProfileOf(CrossSection expected, Model.Members.Member member) => Sections.ProfileReaderTests.AssertAlike(expected, Reading.Shape(member));

    // The section of analytical members: profile properties in IFC2X3, a profile set later.
    private static void Section(ModelWriter model, CrossSection section, params int[] members)
    {
        var profile = model.Profiles.Of(section);
        if (model.Schema == Release.Ifc2X3)
        {
            var properties = model.Add("IFCGENERALPROFILEPROPERTIES", "$", Bars.Ref(profile), "$", "$", "$", "$", "$");
            model.Rooted("IFCRELASSOCIATESPROFILEPROPERTIES", "section", null, Bars.Refs(members), Bars.Ref(properties), "$", Bars.Ref(model.Direction(Vector3.UnitX)));
            return;
        }

        model.Associate(model.Materials.ProfileSetUsage(model.Materials.ProfileSet("flat", model.Materials.Material("S235"), profile)), members);
    }

    [Fact]
    public void Openings_in_an_element_are_noted()
    {
        var model = Bars.Model(Release.Ifc4);
        var beam = Bars.Add(model, "beam", Bars.Flat, 2, keyword: "IFCBEAM");
        var opening = model.Rooted("IFCOPENINGELEMENT", "hole", "hole", "$", "$", "$", "$", "$");
        model.Rooted("IFCRELVOIDSELEMENT", "cut", null, Bars.Ref(beam), Bars.Ref(opening));

        Assert.Contains(Reading.Of(model).Only.Notes, note => note.Contains("openings are cut out", StringComparison.Ordinal));
    }
}
