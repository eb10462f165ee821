using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Tests.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Ifc.Tests.Outlines;

/// <summary>Outlines that are drawn as curves; what a trim, a sense or an index means: IFC documentation of the curve entities.</summary>
public sealed class DrawnProfileTests
{
    // Turned by 20° and shifted; cos and sin of 20°.
    private static readonly Transform3 s_turned = new(
        new Vector3(0.031, -0.012, 0), new Vector3(0.9396926207859084, 0.3420201433256687, 0), new Vector3(-0.3420201433256687, 0.9396926207859084, 0), Vector3.UnitZ);

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_circle_is_a_round_bar_and_two_circles_are_a_tube(Release release)
    {
        var model = Bars.Model(release);
        var at = new Vector3(0.02, 0.01, 0);
        Add(model, "round", model.Outlines.Profile(model.Outlines.Circle(at, 0.008)));
        Add(model, "tube", model.Outlines.Profile(model.Outlines.Circle(at, 0.02415), [model.Outlines.Circle(at, 0.02095)], "48.3x3.2"));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(new Round(0.008), Reading.Shape(reading.Named("round")));
        var tube = reading.Named("tube");
        ProfileReaderTests.AssertAlike(new Tube(0.02415, 0.0032), Reading.Shape(tube));
        Assert.Equal("48.3x3.2", Reading.Value(tube.Section).Name);
        Assert.StartsWith("drawn outline IFCARBITRARYPROFILEDEFWITHVOIDS #", Source(tube), StringComparison.Ordinal);
        Assert.Contains(tube.Notes, n => n.Contains("recognised from its drawn outline", StringComparison.Ordinal));
        Near.Vector(Bars.Askew.Point(at), Reading.Value(tube.Axes).Origin);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_turned_polyline_rectangle_takes_the_member_axes_along(Release release)
    {
        var model = Bars.Model(release);
        var corners = OutlineWriter.Rectangle(s_turned, 0.060, 0.012);
        Add(model, "ahead", model.Outlines.Profile(model.Outlines.Polygon(corners)));
        Add(model, "back", model.Outlines.Profile(model.Outlines.Polygon([.. corners.Reverse()])));

        var reading = Reading.Of(model);

        foreach (var name in new[] { "ahead", "back" })
        {
            var member = reading.Named(name);
            ProfileReaderTests.AssertAlike(new Rectangle(0.060, 0.012), Reading.Shape(member), 1e-8);
            var axes = Reading.Value(member.Axes);
            Near.Vector(Bars.Askew.Point(s_turned.Origin), axes.Origin);
            Near.Vector(Bars.Askew.Direction(s_turned.X), axes.Y);
            Near.Vector(Bars.Askew.Direction(s_turned.Y), axes.Z);
            Assert.Contains(member.Notes, n => n.Contains("turned by 20°", StringComparison.Ordinal));
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_box_of_lines_and_arcs_keeps_both_corner_radii(Release release)
    {
        var model = Bars.Model(release);
        foreach (var byPoints in new[] { true, false })
        {
            var outer = model.Outlines.Rounded(s_turned, 0.100, 0.080, 0.015, byPoints);
            var inner = model.Outlines.Rounded(s_turned, 0.088, 0.068, 0.009, byPoints);
            Add(model, $"by points {byPoints}", model.Outlines.Profile(outer, [inner]));
        }

        foreach (var member in Reading.Of(model).Catalog.Members)
        {
            ProfileReaderTests.AssertAlike(new Box(0.100, 0.080, 0.006, 0.015, 0.009), Reading.Shape(member), 1e-8);
            Near.Vector(Bars.Askew.Direction(s_turned.X), Reading.Value(member.Axes).Y);
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void An_indexed_poly_curve_of_lines_and_arcs_is_a_rounded_rectangle(Release release)
    {
        var model = Bars.Model(release);
        Add(model, "R", model.Outlines.Profile(model.Outlines.RoundedIndexed(Transform3.Identity, 0.050, 0.020, 0.004)));

        var member = Reading.Of(model).Only;

        ProfileReaderTests.AssertAlike(new RoundedRectangle(0.050, 0.020, 0.004), Reading.Shape(member), 1e-8);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitX), Reading.Value(member.Axes).Y);
    }

    [Fact]
    public void Two_half_circles_and_two_lines_are_a_rectangle_rounded_by_half_its_depth()
    {
        var model = Bars.Model(Release.Ifc4);
        var list = model.Add("IFCCARTESIANPOINTLIST2D", "((-20.,-10.),(20.,-10.),(30.,0.),(20.,10.),(-20.,10.),(-30.,0.))");
        var curve = model.Add("IFCINDEXEDPOLYCURVE", Bars.Ref(list), "(IFCLINEINDEX((1,2)),IFCARCINDEX((2,3,4)),IFCLINEINDEX((4,5)),IFCARCINDEX((5,6,1)))", ".F.");
        Add(model, "R", model.Outlines.Profile(curve));

        ProfileReaderTests.AssertAlike(new RoundedRectangle(0.060, 0.020, 0.010), Reading.Shape(Reading.Of(model).Only), 1e-8);
    }

    [Theory]
    [InlineData(8, 0)]
    [InlineData(12, 0.3)]
    [InlineData(24, 0)]
    [InlineData(64, 1)]
    public void A_polygon_of_eight_or_more_equal_chords_is_its_circle_and_says_so(int sides, double firstAngle)
    {
        var model = Bars.Model(Release.Ifc4);
        var at = new Vector3(0.1, 0, 0);
        Add(model, "round", model.Outlines.Profile(model.Outlines.Polygon(at, 0.010, sides, firstAngle)));
        Add(model, "tube", model.Outlines.Profile(model.Outlines.Polygon(at, 0.030, sides, firstAngle), [model.Outlines.Polygon(at, 0.026, sides)]));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(new Round(0.010), Reading.Shape(reading.Named("round")), 1e-8);
        ProfileReaderTests.AssertAlike(new Tube(0.030, 0.004), Reading.Shape(reading.Named("tube")), 1e-7);
        Assert.Contains(reading.Named("round").Notes, n => n.Contains(FormattableString.Invariant($"drawn as {sides} equal chords"), StringComparison.Ordinal));
    }

    [Fact]
    public void The_note_of_a_polygon_tells_how_much_larger_its_circle_is()
    {
        // Regular polygon: area n/2·sin(2π/n)·R² against π·R²; an octagon 2√2·R², so the circle is 11.07 % larger.
        var model = Bars.Model(Release.Ifc4);
        Add(model, "R", model.Outlines.Profile(model.Outlines.Polygon(Vector3.Zero, 0.010, 8)));

        Assert.Contains(Reading.Of(model).Only.Notes, n => n.Contains("11.07 % larger", StringComparison.Ordinal));
    }

    [Fact]
    public void A_box_drawn_with_sharp_corners_is_read_like_one_whose_radii_are_absent()
    {
        var model = Bars.Model(Release.Ifc4);
        var (outer, inner) = (OutlineWriter.Rectangle(s_turned, 0.1, 0.06), OutlineWriter.Rectangle(s_turned, 0.092, 0.052));
        Add(model, "R", model.Outlines.Profile(model.Outlines.Polygon(outer), [model.Outlines.Polygon(inner)]));

        var section = Reading.Value(Reading.Of(model).Only.Section);

        ProfileReaderTests.AssertAlike(new Box(0.1, 0.06, 0.004), section.Shapes[0], 1e-8);
        ProfileReaderTests.AssertAlike(new Box(0.1, 0.06, 0.004, 0.008, 0.004), section.Shapes[1], 1e-8);
    }

    public static TheoryData<string, string, ReasonCode, string> Refused => new()
    {
        { "(-30.,-6.),(30.,-6.),(-30.,6.),(30.,6.)", "", ReasonCode.SectionInvalid, "encloses no area" },
        { "(-30.,-6.),(30.,-6.),(-25.,6.),(30.,6.)", "", ReasonCode.SectionInvalid, "crosses itself" },
        { "(0.,0.),(0.,0.),(0.,0.)", "", ReasonCode.SectionNotCovered, "which is not read or is damaged" },
        { "(0.,0.),(10.,0.),(20.,0.)", "", ReasonCode.SectionInvalid, "encloses no area" },
        { "(0.,0.),(60.,0.),(60.,12.),(0.,12.)", "(70.,2.),(80.,2.),(80.,8.),(70.,8.)", ReasonCode.SectionInvalid, "void 1 lies outside the outline" },
        { "(0.,0.),(60.,0.),(60.,12.),(0.,12.)", "(50.,2.),(80.,2.),(80.,8.),(50.,8.)", ReasonCode.SectionInvalid, "void 1 crosses the outline" },
    };

    public static TheoryData<string, string, string> Kept => new()
    {
        { "(0.,0.),(60.,0.),(60.,12.),(0.,12.)", "(10.,2.),(20.,2.),(20.,8.),(10.,8.)", "outline of 8 edges with a void 60x12 mm, 660 mm²" },
        { "(0.,0.),(50.,0.),(50.,5.),(5.,5.),(5.,40.),(0.,50.)", "", "outline of 6 edges 50x50 mm, 450 mm²" },
        { "(0.,0.),(60.,0.),(60.,12.3),(0.,12.)", "", "outline of 4 edges 60x12.3 mm, 729 mm²" },
        { "(5.,0.),(55.,0.),(60.,5.),(60.,25.),(55.,30.),(5.,30.),(0.,25.),(0.,5.)", "", "outline of 8 edges 60x30 mm, 1750 mm²" },
    };

    [Theory]
    [MemberData(nameof(Kept))]
    public void Outlines_that_stand_for_no_special_section_are_kept_as_they_are(string outer, string inner, string designation)
    {
        var model = Bars.Model(Release.Ifc4);
        Add(model, "R", model.Outlines.Profile(Line(model, outer), inner.Length > 0 ? [Line(model, inner)] : [], "gusset"));

        var member = Reading.Of(model).Only;

        Assert.Equal(designation, Reading.Shape(member).Designation);
        Assert.Equal("gusset", Reading.Value(member.Section).Name);
    }

    [Theory]
    [MemberData(nameof(Refused))]
    public void Outlines_that_bound_no_area_or_stand_for_no_section_end_with_their_reason(string outer, string inner, ReasonCode code, string words)
    {
        var model = Bars.Model(Release.Ifc4);
        Add(model, "R", model.Outlines.Profile(Line(model, outer), inner.Length > 0 ? [Line(model, inner)] : [], "gusset"));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(code, why.Code);
        Assert.Contains(words, why.Message, StringComparison.Ordinal);
        Assert.Contains("'gusset'", why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_outline_that_is_not_closed_says_how_far_apart_its_ends_are()
    {
        var model = Bars.Model(Release.Ifc4);
        var points = new[] { "(0.,0.)", "(60.,0.)", "(60.,12.)", "(0.,12.)" }.Select(p => model.Add("IFCCARTESIANPOINT", p)).ToArray();
        Add(model, "R", model.Outlines.Profile(model.Add("IFCPOLYLINE", Bars.Refs(points))));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(ReasonCode.SectionInvalid, why.Code);
        Assert.Contains("its ends are 12 mm apart", why.Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_ellipse_is_followed_by_arcs_within_a_distance_that_is_told(Release release)
    {
        var model = Bars.Model(release);
        var axes = model.Add("IFCAXIS2PLACEMENT2D", Bars.Ref(model.Add("IFCCARTESIANPOINT", "(5.,0.)")), "$");
        Add(model, "ellipse", model.Outlines.Profile(model.Add("IFCELLIPSE", Bars.Ref(axes), "30.", "10.")));
        Add(model, "round", model.Outlines.Profile(model.Add("IFCELLIPSE", Bars.Ref(axes), "10.", "10.")));

        var reading = Reading.Of(model);

        // π·30·10 mm².
        var member = reading.Named("ellipse");
        Assert.Matches("outline of [0-9]+ edges 60x20 mm, 942.[45] mm²", Reading.Shape(member).Designation);
        Assert.Contains(member.Notes, n => n.Contains("followed by arcs", StringComparison.Ordinal));
        ProfileReaderTests.AssertAlike(new Round(0.010), Reading.Shape(reading.Named("round")), 1e-8);
    }

    [Fact]
    public void A_rational_B_spline_of_four_quarters_is_a_circle_and_a_plain_one_of_degree_1_its_polygon()
    {
        // A circle of nine points with weights 1 and √½ (Piegl and Tiller, The NURBS Book, example 7.2).
        var model = Bars.Model(Release.Ifc4);
        string Points(params string[] places) => Bars.Refs([.. places.Select(p => model.Add("IFCCARTESIANPOINT", p))]);
        var w = "0.7071067811865476";
        var circle = model.Add("IFCRATIONALBSPLINECURVEWITHKNOTS", "2",
            Points("(10.,0.)", "(10.,10.)", "(0.,10.)", "(-10.,10.)", "(-10.,0.)", "(-10.,-10.)", "(0.,-10.)", "(10.,-10.)", "(10.,0.)"),
            ".UNSPECIFIED.", ".T.", ".F.", "(3,2,2,2,3)", "(0.,1.,2.,3.,4.)", ".UNSPECIFIED.", $"(1.,{w},1.,{w},1.,{w},1.,{w},1.)");
        var square = model.Add("IFCBSPLINECURVEWITHKNOTS", "1", Points("(0.,0.)", "(40.,0.)", "(40.,20.)", "(0.,20.)", "(0.,0.)"),
            ".POLYLINE_FORM.", ".T.", ".F.", "(2,1,1,1,2)", "(0.,1.,2.,3.,4.)", ".UNSPECIFIED.");
        Add(model, "circle", model.Outlines.Profile(circle));
        Add(model, "square", model.Outlines.Profile(square));

        var reading = Reading.Of(model);

        ProfileReaderTests.AssertAlike(new Round(0.010), Reading.Shape(reading.Named("circle")), 1e-6);
        ProfileReaderTests.AssertAlike(new Rectangle(0.040, 0.020), Reading.Shape(reading.Named("square")), 1e-8);
    }

    [Theory]
    [InlineData("IFCELLIPSE", "$,30.,-10.")]
    [InlineData("IFCOFFSETCURVE2D", "$,1.,.F.")]
    [InlineData("IFCBSPLINECURVEWITHKNOTS", "3,(),.UNSPECIFIED.,.T.,.F.,(2),(0.,1.),.UNSPECIFIED.")]
    [InlineData("IFCBSPLINECURVEWITHKNOTS", "2,(),.UNSPECIFIED.,.T.,.F.,(),(),.UNSPECIFIED.")]
    public void Curves_that_are_not_read_are_named(string keyword, string arguments)
    {
        var model = Bars.Model(Release.Ifc4);
        Add(model, "R", model.Outlines.Profile(model.Add(keyword, arguments)));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(ReasonCode.SectionNotCovered, why.Code);
        Assert.Contains(keyword, why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_outline_beyond_the_limit_of_edges_or_voids_is_refused()
    {
        var model = Bars.Model(Release.Ifc4);
        Add(model, "edges", model.Outlines.Profile(model.Outlines.Polygon(Vector3.Zero, 1, MemberScan.Ifc.Outlines.ClosedOutline.MaxEdges + 1)));
        var small = model.Outlines.Circle(Vector3.Zero, 0.001);
        Add(model, "voids", model.Outlines.Profile(model.Outlines.Circle(Vector3.Zero, 0.1), [.. Enumerable.Repeat(small, DrawnProfileReader.MaxVoids + 1)]));

        var reading = Reading.Of(model);

        Assert.Contains("more than 2000 edges", Reading.Why(reading.Named("edges").Section).Message, StringComparison.Ordinal);
        Assert.Contains("more than 64 voids", Reading.Why(reading.Named("voids").Section).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_tube_whose_bore_is_off_centre_is_no_tube()
    {
        var model = Bars.Model(Release.Ifc4);
        foreach (var off in new[] { 0.00001, 0.0002 })
            Add(model, FormattableString.Invariant($"{off * 1e3}"), model.Outlines.Profile(model.Outlines.Circle(Vector3.Zero, 0.03), [model.Outlines.Circle(new Vector3(off, 0, 0), 0.027)]));

        var reading = Reading.Of(model);

        Assert.IsType<Tube>(Reading.Shape(reading.Named("0.01")));
        Assert.StartsWith("outline of 2 edges with a void 60x60 mm", Reading.Shape(reading.Named("0.2")).Designation, StringComparison.Ordinal);
    }

    private static int Line(ModelWriter model, string corners) =>
        model.Add("IFCPOLYLINE", Bars.Refs([.. corners.Split("),(").Append(corners.Split("),(")[0]).Select(c => model.Add("IFCCARTESIANPOINT", $"({c.Trim('(', ')')})"))]));

    private static void Add(ModelWriter model, string name, int profile) => Bars.Add(model, name, model.Bodies.Extrusion(profile, 2), Bars.Askew);

    private static string Source(Member member) => ((MemberScan.Model.Finding<SectionFinding>.Found)member.Section).Source;
}
