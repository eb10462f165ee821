using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Sections;

/// <summary>Profiles that are no round, tube, rectangle or box: parametric ones of all letters, ellipses, trapezia and drawn outlines.</summary>
public sealed class GeneralSectionTests
{
    private static readonly Transform3 s_shifted = Transform3.Identity with { Origin = new Vector3(0.25, -0.5, 0) };

    // Own arguments in mm as IFC4 has them; areas in cm² of rolled sections from the tables of EN 10365 and EN 10056-1 (from memory), to the printed digit.
    public static TheoryData<string, string, string, double, double> Rolled => new()
    {
        { "IFCISHAPEPROFILEDEF", "100.,200.,5.6,8.5,12.,$,$", "IPE 200", 28.5, 0.05 },
        { "IFCISHAPEPROFILEDEF", "200.,190.,6.5,10.,18.,$,$", "HE 200 A", 53.8, 0.05 },
        { "IFCISHAPEPROFILEDEF", "90.,200.,7.5,11.3,7.5,4.5,0.13909594148207133", "I 200, slope 14 %", 33.4, 0.1 },
        { "IFCUSHAPEPROFILEDEF", "200.,75.,8.5,11.5,11.5,6.,0.07982998571223732", "U 200, slope 8 %", 32.2, 0.1 },
        { "IFCLSHAPEPROFILEDEF", "100.,100.,10.,12.,6.,$", "L 100x100x10", 19.2, 0.05 },
        { "IFCLSHAPEPROFILEDEF", "50.,$,5.,7.,3.5,$", "L 50x50x5", 4.80, 0.005 },
    };

    [Theory]
    [MemberData(nameof(Rolled))]
    public void Rolled_sections_have_the_areas_of_their_tables(string keyword, string own, string name, double area, double within)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, name, model.Bodies.Extrusion(model.Add(keyword, ".AREA.", $"'{name}'", "$", own), 2));

        var shape = Reading.Shape(Reading.Of(model).Only);

        Assert.InRange(AreaOf(shape) * 1e4, area - within, area + within);
    }

    // Class, own arguments in mm of IFC4 and of IFC2X3, expected area in mm² by plain sums, width, depth, centroid from the profile's origin.
    public static TheoryData<Release, string> Classes
    {
        get
        {
            var data = new TheoryData<Release, string>();
            foreach (var release in Enum.GetValues<Release>())
                foreach (var name in s_expected.Keys)
                    data.Add(release, name);
            return data;
        }
    }

    private sealed record Expected(string Keyword, string Own, string Own2X3, double Area, double Width, double Depth, double Y, double Z, Type Kind);

    private static readonly Dictionary<string, Expected> s_expected = new(StringComparer.Ordinal)
    {
        ["I"] = new("IFCISHAPEPROFILEDEF", "100.,200.,6.,10.,$,$,$", "100.,200.,6.,10.,$", 2 * 1000 + 180 * 6, 100, 200, 0, 0, typeof(OpenProfile)),

        // Flanges 100 × 10 below and 60 × 8 above, web 182 × 6: Σ A·z from the bottom over Σ A, less half the depth.
        ["asymmetric I"] = new(
            "IFCASYMMETRICISHAPEPROFILEDEF", "100.,200.,6.,10.,$,60.,8.,$,$,$,$,$", "100.,200.,6.,10.,$,60.,8.,$,$", 1000 + 480 + 182 * 6, 100, 200, 0,
            (1000.0 * 5 + 480.0 * 196 + 1092.0 * 101) / 2572 - 100, typeof(OutlineSection)),
        ["L"] = new("IFCLSHAPEPROFILEDEF", "80.,60.,8.,$,$,$", "80.,60.,8.,$,$,$,$,$", 8 * 80 + 52 * 8, 60, 80, (640.0 * 4 + 416 * 34) / 1056 - 30, (640.0 * 40 + 416 * 4) / 1056 - 40, typeof(OpenProfile)),
        ["U"] = new("IFCUSHAPEPROFILEDEF", "120.,50.,6.,8.,$,$,$", "120.,50.,6.,8.,$,$,$,$", 2 * 400 + 104 * 6, 50, 120, (800.0 * 25 + 624 * 3) / 1424 - 25, 0, typeof(OpenProfile)),
        ["T"] = new("IFCTSHAPEPROFILEDEF", "90.,80.,7.,9.,$,$,$,$,$", "90.,80.,7.,9.,$,$,$,$,$,$", 720 + 81 * 7, 80, 90, 0, (720 * 85.5 + 567 * 40.5) / 1287 - 45, typeof(OpenProfile)),

        // Bent strip without radii: web 100 × 3, flanges 47 × 3, lips 17 × 3.
        ["C"] = new("IFCCSHAPEPROFILEDEF", "100.,50.,3.,20.,$", "100.,50.,3.,20.,$,$", 300 + 2 * 141 + 2 * 51, 50, 100, (300 * 1.5 + 282 * 26.5 + 102 * 48.5) / 684 - 25, 0, typeof(OutlineSection)),
        ["Z"] = new("IFCZSHAPEPROFILEDEF", "150.,60.,5.,6.,$,$", "150.,60.,5.,6.,$,$", 2 * 360 + 138 * 5, 115, 150, 0, 0, typeof(OutlineSection)),
        ["ellipse"] = new("IFCELLIPSEPROFILEDEF", "30.,10.", "30.,10.", Math.PI * 300, 60, 20, 0, 0, typeof(OutlineSection)),

        // Bottom 60, top 40 from 10: symmetric; centroid of a trapezium h/3·(a + 2b)/(a + b) from the side a.
        ["trapezium"] = new("IFCTRAPEZIUMPROFILEDEF", "60.,40.,30.,10.", "60.,40.,30.,10.", 1500, 60, 30, 0, 30.0 / 3 * (60 + 80) / 100 - 15, typeof(OutlineSection)),
    };

    [Theory]
    [MemberData(nameof(Classes))]
    public void Each_class_of_profile_has_its_area_its_size_and_its_centroid_in_the_axis(Release release, string name)
    {
        var expected = s_expected[name];
        var model = Bars.Model(release);
        var profile = model.Add(expected.Keyword, ".AREA.", $"'{name}'", Position(model), release == Release.Ifc2X3 ? expected.Own2X3 : expected.Own);
        Bars.Add(model, name, model.Bodies.Extrusion(profile, 2));

        var member = Reading.Of(model).Only;

        var shape = Reading.Shape(member);
        Assert.IsType(expected.Kind, shape);
        Assert.Equal(name, Reading.Value(member.Section).Name);
        Reading.AssertNear(expected.Width * 1e-3, shape.ExtentY, 1e-7);
        Reading.AssertNear(expected.Depth * 1e-3, shape.ExtentZ, 1e-7);
        Reading.AssertNear(expected.Area * 1e-6, AreaOf(shape), name == "ellipse" ? 2e-3 : 1e-7);
        Near.Vector(new Vector3(expected.Y * 1e-3, expected.Z * 1e-3, 0), Reading.Value(member.Axes).Origin, 1e-8);
    }

    [Fact]
    public void An_I_of_plain_walls_has_an_elementary_model_and_one_with_rounded_toes_only_the_elastic_one()
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "plain", model.Bodies.Extrusion(model.Add("IFCISHAPEPROFILEDEF", ".AREA.", "$", "$", "100.,200.,6.,10.,12.,$,$"), 2));
        Bars.Add(model, "toes", model.Bodies.Extrusion(model.Add("IFCISHAPEPROFILEDEF", ".AREA.", "$", "$", "100.,200.,6.,10.,12.,4.,$"), 2));

        var reading = Reading.Of(model);

        Assert.Equal(new OpenProfile(OpenShape.I, 0.2, 0.1, 0.006, 0.01, 0.012), Reading.Shape(reading.Named("plain")));
        Assert.StartsWith("outline I 100x200 mm", Reading.Shape(reading.Named("toes")).Designation, StringComparison.Ordinal);
    }

    [Fact]
    public void A_sweep_against_the_normal_mirrors_an_angle()
    {
        // Seen along the sweep the angle's upright leg lies on the other side; y is the reversed profile X then.
        var model = Bars.Model(Release.Ifc4);
        var profile = model.Add("IFCLSHAPEPROFILEDEF", ".AREA.", "$", "$", "80.,60.,8.,$,$,$");
        Bars.Add(model, "along", model.Bodies.Extrusion(profile, 2));
        Bars.Add(model, "against", model.Add(
            "IFCEXTRUDEDAREASOLID", Bars.Ref(profile), Bars.Ref(model.AxisPlacement(Transform3.Identity)), Bars.Ref(model.Direction(-Vector3.UnitZ)), "2000."));

        var reading = Reading.Of(model);

        var (along, against) = (SectionProperties.Of(Reading.Shape(reading.Named("along"))), SectionProperties.Of(Reading.Shape(reading.Named("against"))));
        Assert.True(along.Iyz < 0);
        Reading.AssertNear(-along.Iyz, against.Iyz, 1e-6);
        Reading.AssertNear(along.Iy, against.Iy, 1e-6);
        Near.Vector(-Vector3.UnitX, Reading.Value(reading.Named("against").Axes).Y);
        Near.Vector(Reading.Value(reading.Named("along").Axes).Origin, Reading.Value(reading.Named("against").Axes).Origin);
    }

    [Fact]
    public void An_outline_is_one_value_wherever_it_is_drawn_and_scales_with_its_map()
    {
        var model = Bars.Model(Release.Ifc4);
        Vector3[] corners = [new(0, 0, 0), new(0.06, 0, 0), new(0.06, 0.02, 0), new(0.02, 0.05, 0), new(0, 0.05, 0)];
        Bars.Add(model, "here", model.Bodies.Extrusion(model.Outlines.Profile(model.Outlines.Polygon(corners)), 2));
        Bars.Add(model, "there", model.Bodies.Extrusion(model.Outlines.Profile(model.Outlines.Polygon([.. corners.Skip(2).Concat(corners.Take(2)).Select(s_shifted.Point)])), 2));
        Bars.Add(model, "double", model.Bodies.Extrusion(model.Outlines.Derived(model.Outlines.Profile(model.Outlines.Polygon(corners)), Transform3.Identity, 2), 2));

        var reading = Reading.Of(model);

        Assert.Equal(Reading.Shape(reading.Named("here")), Reading.Shape(reading.Named("there")));
        Assert.Equal("outline of 5 edges 60x50 mm, 2400 mm²", Reading.Shape(reading.Named("here")).Designation);
        Assert.Equal("outline of 5 edges 120x100 mm, 9600 mm²", Reading.Shape(reading.Named("double")).Designation);
    }

    public static TheoryData<string, OpenShape> Letters => new()
    {
        { "(0.,0.),(60.,0.),(60.,8.),(8.,8.),(8.,80.),(0.,80.)", OpenShape.L },
        { "(0.,0.),(50.,0.),(50.,8.),(6.,8.),(6.,112.),(50.,112.),(50.,120.),(0.,120.)", OpenShape.U },
        { "(30.,0.),(37.,0.),(37.,70.),(67.,70.),(67.,79.),(0.,79.),(0.,70.),(30.,70.)", OpenShape.T },
        { "(0.,0.),(60.,0.),(60.,8.),(33.,8.),(33.,92.),(60.,92.),(60.,100.),(0.,100.),(0.,92.),(27.,92.),(27.,8.),(0.,8.)", OpenShape.I },
    };

    [Theory]
    [MemberData(nameof(Letters))]
    public void A_drawn_letter_that_stands_upright_is_that_profile_and_one_lying_down_an_outline(string corners, OpenShape shape)
    {
        var model = Bars.Model(Release.Ifc4);
        Vector3[] points = [.. corners.Trim('(', ')').Split("),(").Select(p => p.Split(',')).Select(p => new Vector3(Mm(p[0]), Mm(p[1]), 0))];
        Bars.Add(model, "upright", model.Bodies.Extrusion(model.Outlines.Profile(model.Outlines.Polygon(points)), 2));
        Bars.Add(model, "lying", model.Bodies.Extrusion(model.Outlines.Profile(model.Outlines.Polygon([.. points.Select(p => new Vector3(-p.Y, p.X, 0))])), 2));

        var reading = Reading.Of(model);

        var profile = Assert.IsType<OpenProfile>(Reading.Shape(reading.Named("upright")));
        Assert.Equal(shape, profile.Shape);
        var lying = Assert.IsType<OutlineSection>(Reading.Shape(reading.Named("lying")));
        Assert.Equal(profile, LetterFit.Of(lying)!.Profile);
        Assert.Equal(1, LetterFit.Of(lying)!.QuarterTurns);
    }

    [Theory]
    [InlineData("IFCISHAPEPROFILEDEF", "100.,200.,100.,10.,$,$,$", ReasonCode.WallOverRadius)]
    [InlineData("IFCISHAPEPROFILEDEF", "100.,200.,6.,10.,60.,$,$", ReasonCode.SectionInvalid)]
    [InlineData("IFCISHAPEPROFILEDEF", "100.,200.,6.,10.,12.,30.,$", ReasonCode.SectionInvalid)]
    [InlineData("IFCLSHAPEPROFILEDEF", "80.,60.,8.,$,$,0.02", ReasonCode.SectionInvalid)]
    [InlineData("IFCLSHAPEPROFILEDEF", "80.,60.,60.,$,5.,$", ReasonCode.WallOverRadius)]
    [InlineData("IFCUSHAPEPROFILEDEF", "120.,50.,0.,8.,$,$,$", ReasonCode.SectionInvalid)]
    [InlineData("IFCTSHAPEPROFILEDEF", "90.,80.,7.,9.,$,$,$,0.02,$", ReasonCode.SectionInvalid)]
    [InlineData("IFCCSHAPEPROFILEDEF", "100.,50.,3.,2.,$", ReasonCode.WallOverRadius)]
    [InlineData("IFCZSHAPEPROFILEDEF", "150.,5.,5.,6.,$,$", ReasonCode.WallOverRadius)]
    [InlineData("IFCELLIPSEPROFILEDEF", "30.,0.", ReasonCode.SectionInvalid)]
    [InlineData("IFCTRAPEZIUMPROFILEDEF", "60.,40.,30.,$", ReasonCode.SectionInvalid)]
    [InlineData("IFCCENTERLINEPROFILEDEF", "5.", ReasonCode.SectionNotCovered)]
    public void Dimensions_that_make_no_section_end_with_their_reason(string keyword, string own, ReasonCode expected)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", model.Bodies.Extrusion(model.Add(keyword, ".AREA.", "'P 7'", "$", own), 2));

        var why = Reading.Why(Reading.Of(model).Only.Section);

        Assert.Equal(expected, why.Code);
        Assert.Contains($"{keyword} #", why.Message, StringComparison.Ordinal);
    }

    // Corners and chords of arcs, 24 to a quarter: short by 0.02 % of what the arcs enclose, of an ellipse by 0.2 %.
    private static double AreaOf(CrossSection shape)
    {
        var ring = Assert.Single(OutlineRings.Of(shape));
        return ring.Select((p, i) => (p.Y * ring[(i + 1) % ring.Length].Z - p.Z * ring[(i + 1) % ring.Length].Y) / 2).Sum();
    }

    private static double Mm(string text) => 1e-3 * double.Parse(text, System.Globalization.CultureInfo.InvariantCulture);

    private static string Position(ModelWriter model) => Bars.Ref(model.Add("IFCAXIS2PLACEMENT2D", Bars.Ref(model.Add("IFCCARTESIANPOINT", "(0.,0.)")), "$"));
}
