using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Tests.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Bodies;

/// <summary>Blocks, cylinders, revolved, tapered and fixed-reference solids: IFC documentation of the entities.</summary>
public sealed class OtherBodiesTests
{
    [Theory]
    [InlineData(2.0, 0.06, 0.012, 0.06, 0.012, "y", "z")]
    [InlineData(0.012, 2.0, 0.06, 0.06, 0.012, "z", "x")]
    [InlineData(0.06, 0.012, 2.0, 0.06, 0.012, "x", "y")]
    public void A_block_is_a_rectangle_along_its_longest_edge(double x, double y, double z, double width, double depth, string yAxis, string zAxis)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", model.Add("IFCBLOCK", Bars.Ref(model.AxisPlacement(Transform3.Identity)), Length(model, x), Length(model, y), Length(model, z)), Bars.Askew);

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(new Rectangle(width, depth), Reading.Shape(member));
        Reading.AssertNear(2, Reading.Value(member.Length));
        var axes = Reading.Value(member.Axes);
        Near.Vector(Bars.Askew.Direction(Unit(yAxis)), axes.Y);
        Near.Vector(Bars.Askew.Direction(Unit(zAxis)), axes.Z);
        Near.Vector(Bars.Askew.Point(new Vector3(x == 2 ? 0 : x / 2, y == 2 ? 0 : y / 2, z == 2 ? 0 : z / 2)), axes.Origin);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_cylinder_in_a_csg_tree_is_a_round_bar_and_says_that_it_is_cut(Release release)
    {
        var model = Bars.Model(release);
        var position = Bars.Ref(model.AxisPlacement(Transform3.Identity));
        var bar = model.Add("IFCRIGHTCIRCULARCYLINDER", position, Length(model, 3), Length(model, 0.008));
        var hole = model.Add("IFCRIGHTCIRCULARCYLINDER", position, Length(model, 0.01), Length(model, 0.002));
        var tree = model.Add("IFCCSGSOLID", Bars.Ref(model.Add("IFCBOOLEANRESULT", ".DIFFERENCE.", Bars.Ref(bar), Bars.Ref(hole))));
        Bars.Add(model, "R", tree);

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(new Round(0.008), Reading.Shape(member));
        Reading.AssertNear(3, Reading.Value(member.Length));
        Assert.Contains(member.Notes, n => n.StartsWith("cut", StringComparison.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_revolved_tube_is_a_bent_bar_with_its_length_at_the_centroid(Release release)
    {
        // A quarter turn of radius 0.5 m about an axis along −y at x = 0.5 m: the sweep starts along +z or −z of the profile.
        var model = Bars.Model(release);
        Bars.Add(model, "R", Revolved(model, model.Profiles.Of(Bars.Rail), new Vector3(0.5, 0, 0), new Vector3(0, 1, 0), Math.PI / 2));

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(Bars.Rail, Reading.Shape(member));
        Reading.AssertNear(0.5 * Math.PI / 2, Reading.Value(member.Length));
        Reading.AssertNear(0.5, Assert.Single(member.BendRadii));
        Assert.False(member.IsStraight);
        // d × (p − A) = (0,1,0) × (−0.5,0,0) = (0,0,0.5).
        Near.Vector(Vector3.UnitZ, Reading.Value(member.Axes).X);
    }

    [Theory]
    [InlineData(0.5, 0.0, 1.0, 1.0, "does not lie in the plane")]
    [InlineData(0.01, 1.0, 0.0, 1.0, "may reach its axis")]
    [InlineData(0.5, 1.0, 0.0, 6.283185307179586, "closed ring")]
    public void A_revolution_that_is_no_bent_bar_is_refused(double x, double axisY, double axisZ, double angle, string words)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", Revolved(model, model.Profiles.Of(Bars.Rail), new Vector3(x, 0, 0), new Vector3(0, axisY, axisZ), angle));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
        Assert.Contains(words, why.Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_tapered_extrusion_names_both_ends_and_one_that_does_not_taper_is_a_bar(Release release)
    {
        var model = Bars.Model(release);
        var (start, end) = (model.Profiles.Rectangle(0.06, 0.012, "foot"), model.Profiles.Rectangle(0.04, 0.012, "head"));
        Bars.Add(model, "taper", Tapered(model, start, end));
        Bars.Add(model, "even", Tapered(model, start, model.Profiles.Rectangle(0.06, 0.012, "other name")));
        Bars.Add(model, "shift", Tapered(model, start, model.Outlines.Derived(start, Transform3.Identity with { Origin = new Vector3(0.05, 0, 0) })));
        Bars.Add(model, "half read", Tapered(model, start, model.Profiles.IShape(0.1, 0.2, 0.006, 0.01)));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(Bars.Flat, Reading.Shape(reading.Named("even")));
        ProfileReaderTests.AssertAlike(Bars.Flat, Reading.Shape(reading.Named("taper")));
        ProfileReaderTests.AssertAlike(new Rectangle(0.04, 0.012), reading.Named("taper").EndSection!.Shape);
        Assert.Null(reading.Named("even").EndSection);
        Assert.Contains("shifted or turned", Reading.Why(reading.Named("shift").Section).Message, StringComparison.Ordinal);
        Assert.Contains("I 200x100x6x10 mm", Reading.Why(reading.Named("half read").Section).Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Ends_of_boxes_letters_and_outlines_taper_where_one_is_smaller_in_every_dimension(Release release)
    {
        var model = Bars.Model(release);
        int Triangle(double y, double z) => model.Outlines.Profile(model.Outlines.Polygon([new(-y, -z, 0), new(y, -z, 0), new(0, 2 * z, 0)]));
        var (box, beam) = (model.Profiles.RectangleHollow(0.1, 0.06, 0.005, 0.005, 0.01), model.Profiles.IShape(0.1, 0.2, 0.006, 0.01));
        Bars.Add(model, "box", Tapered(model, box, model.Profiles.RectangleHollow(0.06, 0.06, 0.004, 0.004, 0.008)));
        Bars.Add(model, "I", Tapered(model, beam, model.Profiles.IShape(0.1, 0.12, 0.006, 0.01)));
        Bars.Add(model, "outline", Tapered(model, Triangle(0.04, 0.03), Triangle(0.03, 0.015)));
        Bars.Add(model, "rounded", Tapered(model, model.Profiles.RoundedRectangle(0.04, 0.03, 0.005), model.Profiles.RoundedRectangle(0.03, 0.03, 0.004)));
        Bars.Add(model, "crossing", Tapered(model, box, model.Profiles.RectangleHollow(0.06, 0.08, 0.005, 0.005, 0.01)));
        Bars.Add(model, "thicker", Tapered(model, beam, model.Profiles.IShape(0.1, 0.12, 0.008, 0.01)));
        Bars.Add(model, "other shape", Tapered(model, Triangle(0.04, 0.03), model.Outlines.Profile(model.Outlines.Polygon([new(-0.02, 0, 0), new(-0.01, -0.02, 0), new(0.01, -0.02, 0), new(0.02, 0, 0), new(0.01, 0.02, 0), new(-0.01, 0.02, 0)]))));
        Bars.Add(model, "steep", Tapered(model, model.Profiles.IShape(0.1, 1.2, 0.006, 0.01), model.Profiles.IShape(0.1, 0.12, 0.006, 0.01)));

        var reading = Reading.Of(model);

        foreach (var name in new[] { "box", "I", "outline", "rounded" })
        {
            var end = reading.Named(name).EndSection;
            Assert.NotNull(end);
            Assert.Equal(Reading.Value(reading.Named(name).Section).Shape.Kind, end.Shape.Kind);
            Assert.True(end.Shape.ExtentY <= Reading.Value(reading.Named(name).Section).Shape.ExtentY);
        }

        foreach (var (name, words) in new[] { ("crossing", "smaller in every dimension"), ("thicker", "smaller in every dimension"), ("other shape", "smaller in every dimension"), ("steep", "its slope is 0.27") })
        {
            var why = Reading.Why(reading.Named(name).Section);
            Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
            Assert.Contains("tapers from", why.Message, StringComparison.Ordinal);
            Assert.Contains(words, why.Message, StringComparison.Ordinal);
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_fixed_reference_sweep_lays_profile_x_along_the_reference(Release release)
    {
        var model = Bars.Model(release);
        var line = Polyline(model, new Vector3(1, 0, 0), new Vector3(1, 4, 0));
        Bars.Add(model, "R", model.Add("IFCFIXEDREFERENCESWEPTAREASOLID", Bars.Ref(model.Profiles.Of(Bars.Flat)), "$", Bars.Ref(line), "$", "$", Bars.Ref(model.Direction(new Vector3(0, 1, 1)))), Bars.Askew);

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(Bars.Flat, Reading.Shape(member));
        Reading.AssertNear(4, Reading.Value(member.Length));
        var axes = Reading.Value(member.Axes);
        Near.Vector(Bars.Askew.Point(new Vector3(1, 0, 0)), axes.Origin);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitY), axes.X);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitZ), axes.Y);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitX), axes.Z);
    }

    [Fact]
    public void A_sweep_along_a_curve_is_held_by_a_plane_keeps_bends_and_tells_lengths_from_parameters()
    {
        var model = Bars.Model(Release.Ifc4X3);
        var plane = model.Add("IFCPLANE", Bars.Ref(model.AxisPlacement(Transform3.Identity)));
        var arc = model.Add("IFCINDEXEDPOLYCURVE", Bars.Ref(model.Add("IFCCARTESIANPOINTLIST3D", "((0.,0.,0.),(1000.,0.,0.),(1707.106781186547,292.893218813453,0.),(2000.,1000.,0.),(2000.,3000.,0.))")),
            "(IFCLINEINDEX((1,2)),IFCARCINDEX((2,3,4)),IFCLINEINDEX((4,5)))", "$");
        Bars.Add(model, "bent", model.Add("IFCSURFACECURVESWEPTAREASOLID", Bars.Ref(model.Profiles.Of(Bars.Rail)), "$", Bars.Ref(arc), "$", "$", Bars.Ref(plane)));
        var line = Polyline(model, Vector3.Zero, new Vector3(4, 0, 0));
        string up = Bars.Ref(model.Direction(Vector3.UnitZ)), profile = Bars.Ref(model.Profiles.Of(Bars.Rail));
        Bars.Add(model, "part", model.Add("IFCFIXEDREFERENCESWEPTAREASOLID", profile, "$", Bars.Ref(line), "IFCLENGTHMEASURE(1000.)", "IFCLENGTHMEASURE(2500.)", up));
        Bars.Add(model, "mixed", model.Add("IFCFIXEDREFERENCESWEPTAREASOLID", profile, "$", Bars.Ref(line), "IFCLENGTHMEASURE(0.)", "IFCPARAMETERVALUE(1.)", up));
        Bars.Add(model, "along", model.Add("IFCFIXEDREFERENCESWEPTAREASOLID", profile, "$", Bars.Ref(line), "$", "$", Bars.Ref(model.Direction(Vector3.UnitX))));

        var reading = Reading.Of(model);

        var bent = reading.Named("bent");
        Reading.AssertNear(1 + Math.PI / 2 + 2, Reading.Value(bent.Length), 1e-8);
        Reading.AssertNear(1, Assert.Single(bent.BendRadii), 1e-8);
        Near.Vector(Vector3.UnitZ, Reading.Value(bent.Axes).Y);
        Reading.AssertNear(1.5, Reading.Value(reading.Named("part").Length));
        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(reading.Named("mixed").Section).Code);
        Assert.Equal(ReasonCode.SectionInvalid, Reading.Why(reading.Named("along").Section).Code);
    }

    private static Vector3 Unit(string axis) => axis switch { "x" => Vector3.UnitX, "y" => Vector3.UnitY, _ => Vector3.UnitZ };

    private static string Length(ModelWriter model, double metres) => model.Units.LengthText(metres);

    private static int Polyline(ModelWriter model, params Vector3[] points) => model.Add("IFCPOLYLINE", Bars.Refs([.. points.Select(model.Point)]));

    private static int Revolved(ModelWriter model, int profile, Vector3 through, Vector3 about, double angle)
    {
        var axis = model.Add("IFCAXIS1PLACEMENT", Bars.Ref(model.Point(through)), Bars.Ref(model.Direction(about)));
        return model.Add("IFCREVOLVEDAREASOLID", Bars.Ref(profile), Bars.Ref(model.AxisPlacement(Transform3.Identity)), Bars.Ref(axis), Spelling.Real(angle));
    }

    private static int Tapered(ModelWriter model, int start, int end) =>
        model.Add("IFCEXTRUDEDAREASOLIDTAPERED", Bars.Ref(start), "$", Bars.Ref(model.Direction(Vector3.UnitZ)), "2000.", Bars.Ref(end));
}
