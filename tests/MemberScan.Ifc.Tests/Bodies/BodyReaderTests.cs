using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Bodies;
using MemberScan.Ifc.Tests.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Bodies;

public sealed class BodyReaderTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_extrusion_gives_length_and_axes_in_project_coordinates(Release release)
    {
        var model = Bars.Model(release);
        var inner = Bars.Frame(new Vector3(0.1, 0.2, 0.3), Vector3.UnitX, Vector3.UnitY);
        var outer = model.LocalPlacement(Bars.Askew);
        model.Element("IFCMEMBER", "R", model.LocalPlacement(new Transform3(new Vector3(0, 0, 2), Vector3.UnitY, -Vector3.UnitX, Vector3.UnitZ), outer),
            model.Bodies.Shape("SweptSolid", model.Bodies.Extrusion(model.Profiles.Of(Bars.Flat), 2.5, inner)));

        var member = Reading.Of(model).Only;

        // By hand: the solid's (x, y, z) are the object's (Y, Z, X); the object's X, Y are the outer frame's Y, −X.
        var axes = Reading.Value(member.Axes);
        Reading.AssertNear(2.5, Reading.Value(member.Length));
        Near.Vector(Bars.Askew.Point(new Vector3(-0.2, 0.1, 2.3)), axes.Origin);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitY), axes.X);
        Near.Vector(Bars.Askew.Direction(-Vector3.UnitX), axes.Y);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitZ), axes.Z);
        Assert.Empty(member.Notes);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_sweep_against_the_normal_of_its_profile_reverses_y_and_says_so(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "R", Extrusion(model, model.Profiles.Of(Bars.Flat), new Vector3(0, 0, -3), 2));

        var member = Reading.Of(model).Only;

        var axes = Reading.Value(member.Axes);
        Near.Vector(-Vector3.UnitZ, axes.X);
        Near.Vector(-Vector3.UnitX, axes.Y);
        Near.Vector(Vector3.UnitY, axes.Z);
        Reading.AssertNear(2, Reading.Value(member.Length));
        Assert.Contains(member.Notes, n => n.Contains("y is the reversed X axis", StringComparison.Ordinal));
    }

    [Fact]
    public void A_skewed_extrusion_is_refused_and_a_hair_of_skew_is_not()
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "skew", Extrusion(model, model.Profiles.Of(Bars.Flat), new Vector3(0.1, 0, 1), 2));
        Bars.Add(model, "hair", Extrusion(model, model.Profiles.Of(Bars.Flat), new Vector3(5e-4, 0, 1), 2));

        var reading = Reading.Of(model);

        var why = Reading.Why(reading.Named("skew").Section);
        Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
        Assert.Contains("at an angle", why.Message, StringComparison.Ordinal);
        Assert.True(reading.Named("hair").Section.TryGet(out _, out _));
    }

    [Theory]
    [InlineData("0.")]
    [InlineData("-2000.")]
    [InlineData("$")]
    public void A_depth_that_is_not_above_zero_is_invalid(string depth)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", model.Add("IFCEXTRUDEDAREASOLID", Bars.Ref(model.Profiles.Of(Bars.Flat)), "$", Bars.Ref(model.Direction(Vector3.UnitZ)), depth));

        Assert.Equal(ReasonCode.SectionInvalid, Reading.Why(Reading.Of(model).Only.Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_mapped_bar_with_one_scale_is_scaled_in_section_and_length(Release release)
    {
        var model = Bars.Model(release);
        var target = new Transform3(new Vector3(0, 0, 1), Vector3.UnitY, -Vector3.UnitX, Vector3.UnitZ);
        Mapped(model, "R", Map(model, Bars.Rail, 2), target, 1.5);

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(new Tube(1.5 * 0.02415, 1.5 * 0.0032), Reading.Shape(member));
        Reading.AssertNear(3, Reading.Value(member.Length));
        var axes = Reading.Value(member.Axes);
        Near.Vector(new Vector3(0, 0, 1), axes.Origin);
        Near.Vector(Vector3.UnitY, axes.Y);
    }

    [Fact]
    public void All_five_sections_and_a_swept_disk_are_scaled()
    {
        CrossSection[] sections = [new Round(0.008), new Tube(0.02, 0.003), new Rectangle(0.06, 0.012), new RoundedRectangle(0.05, 0.02, 0.004), new Box(0.08, 0.04, 0.004, 0.008, 0.004)];
        CrossSection[] doubled = [new Round(0.016), new Tube(0.04, 0.006), new Rectangle(0.12, 0.024), new RoundedRectangle(0.1, 0.04, 0.008), new Box(0.16, 0.08, 0.008, 0.016, 0.008)];
        var model = Bars.Model(Release.Ifc4);
        for (var i = 0; i < sections.Length; i++) Mapped(model, $"s{i}", Map(model, sections[i], 2), Transform3.Identity, 2);
        var disk = model.Bodies.SweptDisk([Vector3.Zero, new Vector3(1, 0, 0), new Vector3(1, 1, 0)], 0.02, 0.017);
        Mapped(model, "disk", model.Bodies.Map(model.Bodies.Representation("AdvancedSweptSolid", disk)), Transform3.Identity, 2);

        var reading = Reading.Of(model);

        for (var i = 0; i < sections.Length; i++) ProfileReaderTests.AssertAlike(doubled[i], Reading.Shape(reading.Named($"s{i}")));
        ProfileReaderTests.AssertAlike(new Tube(0.04, 0.006), Reading.Shape(reading.Named("disk")));
        Reading.AssertNear(4, Reading.Value(reading.Named("disk").Length));
    }

    [Fact]
    public void Unequal_scales_are_refused_for_extrusions_and_disks()
    {
        var model = Bars.Model(Release.Ifc4);
        var disk = model.Bodies.Map(model.Bodies.Representation("AdvancedSweptSolid", model.Bodies.SweptDisk([Vector3.Zero, Vector3.UnitX], 0.01)));
        foreach (var (name, map) in new[] { ("extrusion", Map(model, Bars.Rail, 2)), ("disk", disk) })
        {
            var op = model.Add("IFCCARTESIANTRANSFORMATIONOPERATOR3DNONUNIFORM", "$", "$", Bars.Ref(model.Point(Vector3.Zero)), "1.", "$", "1.", "2.");
            Add(model, name, model.Add("IFCMAPPEDITEM", Bars.Ref(map), Bars.Ref(op)));
        }

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(reading.Named("extrusion").Section).Code);
        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(reading.Named("disk").Section).Code);
    }

    [Fact]
    public void A_non_uniform_operator_with_three_equal_scales_is_read()
    {
        var model = Bars.Model(Release.Ifc4);
        var op = model.Add("IFCCARTESIANTRANSFORMATIONOPERATOR3DNONUNIFORM", "$", "$", Bars.Ref(model.Point(Vector3.Zero)), "2.", "$", "$", "2.");
        Add(model, "R", model.Add("IFCMAPPEDITEM", Bars.Ref(Map(model, Bars.Rail, 2)), Bars.Ref(op)));

        Reading.AssertNear(4, Reading.Value(Reading.Of(model).Only.Length));
    }

    [Fact]
    public void A_mapping_that_mirrors_keeps_the_axes_right_handed_and_says_so()
    {
        // Axis2 is not forced to Axis3 × Axis1, so an operator can mirror (IFC documentation of the operator).
        var model = Bars.Model(Release.Ifc4);
        Mapped(model, "R", Map(model, Bars.Flat, 2), new Transform3(Vector3.Zero, Vector3.UnitX, -Vector3.UnitY, Vector3.UnitZ), 1);

        var member = Reading.Of(model).Only;

        var axes = Reading.Value(member.Axes);
        Near.Vector(Vector3.UnitZ, axes.X);
        Near.Vector(-Vector3.UnitY, axes.Z);
        Near.Vector(axes.Z.Cross(axes.X), axes.Y);
        Assert.Contains(member.Notes, n => n.Contains("mirrors", StringComparison.Ordinal));
    }

    [Fact]
    public void Nested_mapped_items_multiply_their_maps_in_order()
    {
        var model = Bars.Model(Release.Ifc4);
        var first = model.Bodies.MappedItem(Map(model, Bars.Rail, 2), new Transform3(new Vector3(1, 0, 0), Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ), 2);
        var outer = model.Bodies.Map(model.Bodies.Representation("MappedRepresentation", first), new Transform3(new Vector3(0, 0.5, 0), Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ));
        Mapped(model, "R", outer, new Transform3(new Vector3(0, 0, 3), Vector3.UnitY, -Vector3.UnitX, Vector3.UnitZ), 1.5);

        var member = Reading.Of(model).Only;

        // By hand: (1, 0, 0) is moved by the origin to (1, 0.5, 0), scaled to (1.5, 0.75, 0), turned to (−0.75, 1.5, 0), moved up 3.
        Near.Vector(new Vector3(-0.75, 1.5, 3), Reading.Value(member.Axes).Origin);
        Reading.AssertNear(6, Reading.Value(member.Length));
        Reading.AssertNear(3 * 0.02415, Assert.IsType<Tube>(Reading.Shape(member)).OuterRadius);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_clipped_solid_keeps_its_full_section_and_says_cut(Release release)
    {
        var model = Bars.Model(release);
        var plane = model.Add("IFCPLANE", Bars.Ref(model.AxisPlacement(Transform3.Identity)));
        var half = model.Add("IFCHALFSPACESOLID", Bars.Ref(plane), ".F.");
        var once = model.Add("IFCBOOLEANCLIPPINGRESULT", ".DIFFERENCE.", Bars.Ref(model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 2)), Bars.Ref(half));
        Bars.Add(model, "R", model.Add("IFCBOOLEANRESULT", ".DIFFERENCE.", Bars.Ref(once), Bars.Ref(half)));

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(Bars.Rail, Reading.Shape(member));
        Assert.Contains(member.Notes, n => n.StartsWith("cut", StringComparison.Ordinal));
    }

    [Fact]
    public void A_union_and_a_sphere_are_not_covered()
    {
        var model = Bars.Model(Release.Ifc4);
        var solid = model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 2);
        Bars.Add(model, "union", model.Add("IFCBOOLEANRESULT", ".UNION.", Bars.Ref(solid), Bars.Ref(solid)));
        Bars.Add(model, "sphere", model.Add("IFCCSGSOLID", Bars.Ref(model.Add("IFCSPHERE", Bars.Ref(model.AxisPlacement(Transform3.Identity)), "9."))));

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("union").Section).Code);
        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("sphere").Section).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_faceted_body_has_no_parametric_section(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "R", model.Bodies.FacetedBlock(0.05, 0.05, 2));

        Assert.Equal(ReasonCode.SectionNotParametric, Reading.Why(Reading.Of(model).Only.Section).Code);
    }

    [Fact]
    public void Circles_of_mapped_items_and_operands_end_with_a_reason()
    {
        var model = Bars.Model(Release.Ifc4);
        var op = Bars.Ref(model.Add("IFCCARTESIANTRANSFORMATIONOPERATOR3D", "$", "$", Bars.Ref(model.Point(Vector3.Zero)), "$", "$"));
        var next = model.Add("IFCLABELHOLDER") + 1;
        model.Add("IFCMAPPEDITEM", Bars.Ref(next + 1), op);
        model.Add("IFCREPRESENTATIONMAP", Bars.Ref(model.AxisPlacement(Transform3.Identity)), Bars.Ref(next + 2));
        model.Add("IFCSHAPEREPRESENTATION", "$", "'Body'", "'MappedRepresentation'", Bars.Refs(next, next, next));
        Add(model, "mapped", next);
        var self = model.Add("IFCLABELHOLDER") + 1;
        model.Add("IFCBOOLEANRESULT", ".DIFFERENCE.", Bars.Ref(self), Bars.Ref(self));
        Add(model, "operand", self);

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("mapped").Section).Code);
        Assert.Equal(ReasonCode.SectionNotCovered, Reading.Why(reading.Named("operand").Section).Code);
    }

    [Fact]
    public void Mapped_items_that_multiply_end_at_the_limit_of_steps_and_say_so()
    {
        // 40 items per level: without the limit the second to last level alone would hold more than 10⁸.
        var model = Bars.Model(Release.Ifc4);
        var item = model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 2);
        for (var level = 0; level < 6; level++)
        {
            var map = model.Bodies.Map(model.Bodies.Representation("MappedRepresentation", Enumerable.Repeat(item, 40)));
            item = model.Bodies.MappedItem(map);
        }

        Add(model, "R", item);

        var reading = Reading.Of(model);

        Assert.Equal(BodyReader.MaxBodies, reading.Catalog.Members.Length);
        Assert.Contains(reading.Catalog.Members[0].Notes, n => n.Contains("nested references", StringComparison.Ordinal));
    }

    [Fact]
    public void Mapped_items_that_multiply_to_nothing_end_at_the_limit_of_steps_too()
    {
        // 40⁶ steps through maps whose innermost representation is empty: no body is ever found.
        var model = Bars.Model(Release.Ifc4);
        var item = model.Bodies.MappedItem(model.Bodies.Map(model.Bodies.Representation("MappedRepresentation")));
        for (var level = 0; level < 6; level++)
            item = model.Bodies.MappedItem(model.Bodies.Map(model.Bodies.Representation("MappedRepresentation", Enumerable.Repeat(item, 40))));
        Add(model, "R", item);

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
        Assert.Contains(FormattableString.Invariant($"{BodyReader.MaxSteps} nested references"), why.Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_swept_disk_is_a_rod_or_a_tube_with_z_up_across_it(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "rod", model.Bodies.SweptDisk([new Vector3(1, 0, 0), new Vector3(1, 2, 0)], 0.008), Bars.Frame(new Vector3(0, 0, 5), Vector3.UnitX, Vector3.UnitY));
        Bars.Add(model, "tube", model.Bodies.SweptDisk([Vector3.Zero, new Vector3(0, 0, 3)], 0.02, 0.016));

        var reading = Reading.Of(model);

        // The placement has x = Y, y = Z, z = X of the project: the rod runs along the project's Z.
        ProfileReaderTests.AssertAlike(new Round(0.008), Reading.Shape(reading.Named("rod")));
        ProfileReaderTests.AssertAlike(new Tube(0.02, 0.004), Reading.Shape(reading.Named("tube")));
        var rod = Reading.Value(reading.Named("rod").Axes);
        Near.Vector(new Vector3(0, 1, 5), rod.Origin);
        Near.Vector(Vector3.UnitZ, rod.X);
        Near.Vector(Vector3.UnitX, rod.Z);
        var tube = Reading.Value(reading.Named("tube").Axes);
        Near.Vector(Vector3.UnitX, tube.Z);
        Reading.AssertNear(3, Reading.Value(reading.Named("tube").Length));
    }

    [Theory]
    [InlineData("8.", "8.", ReasonCode.SectionInvalid)]
    [InlineData("8.", "9.", ReasonCode.SectionInvalid)]
    [InlineData("8.", "-2.", ReasonCode.SectionInvalid)]
    [InlineData("0.", "$", ReasonCode.SectionInvalid)]
    [InlineData("$", "$", ReasonCode.SectionInvalid)]
    public void Radii_of_a_swept_disk_that_make_no_section_are_invalid(string radius, string inner, ReasonCode expected)
    {
        var model = Bars.Model(Release.Ifc4);
        var line = model.Add("IFCPOLYLINE", Bars.Refs(model.Point(Vector3.Zero), model.Point(Vector3.UnitX)));
        Bars.Add(model, "R", model.Add("IFCSWEPTDISKSOLID", Bars.Ref(line), radius, inner, "$", "$"));

        Assert.Equal(expected, Reading.Why(Reading.Of(model).Only.Section).Code);
    }

    [Fact]
    public void The_body_is_chosen_before_the_axis_and_whatever_its_place_in_the_list()
    {
        var model = Bars.Model(Release.Ifc4);
        var axis = model.Add("IFCSHAPEREPRESENTATION", Bars.Ref(model.BodyContext), "'Axis'", "'Curve3D'", Bars.Refs(model.Add("IFCPOLYLINE", Bars.Refs(model.Point(Vector3.Zero), model.Point(Vector3.UnitX)))));
        var body = model.Add("IFCSHAPEREPRESENTATION", Bars.Ref(model.BodyContext), "'body'", "'SweptSolid'", Bars.Refs(model.Bodies.Extrusion(model.Profiles.Of(Bars.Rail), 2)));
        model.Element("IFCMEMBER", "both", null, model.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", Bars.Refs(axis, body)));
        model.Element("IFCMEMBER", "axis only", null, model.Add("IFCPRODUCTDEFINITIONSHAPE", "$", "$", Bars.Refs(axis)));

        var reading = Reading.Of(model);

        Reading.AssertNear(2, Reading.Value(reading.Named("both").Length));
        Assert.Equal(ReasonCode.NoSection, Reading.Why(reading.Named("axis only").Section).Code);
    }

    private static int Extrusion(ModelWriter model, int profile, Vector3 direction, double depth) => model.Add("IFCEXTRUDEDAREASOLID",
        Bars.Ref(profile), Bars.Ref(model.AxisPlacement(Transform3.Identity)), Bars.Ref(model.Direction(direction)), model.Units.LengthText(depth));

    private static int Map(ModelWriter model, CrossSection section, double length) =>
        model.Bodies.Map(model.Bodies.Representation("SweptSolid", model.Bodies.Extrusion(model.Profiles.Of(section), length)));

    private static void Mapped(ModelWriter model, string name, int map, Transform3 target, double scale) =>
        Add(model, name, model.Bodies.MappedItem(map, target, scale));

    private static void Add(ModelWriter model, string name, int item) =>
        model.Element("IFCMEMBER", name, model.LocalPlacement(Transform3.Identity), model.Bodies.Shape("MappedRepresentation", item));
}
