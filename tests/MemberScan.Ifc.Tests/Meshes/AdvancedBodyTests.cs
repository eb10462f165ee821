using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Tests.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Meshes;

/// <summary>Bodies of curved faces: planes, cylinders and B-splines of prisms are recognised by their edges, other surfaces refused by name.</summary>
public sealed class AdvancedBodyTests
{
    private static readonly ReadingRules s_asked = new() { RecogniseMeshes = true };

    // A circle as a rational B-spline of degree 2: nine points on its square, weights 1 and √½ in turn, knots 0, ¼, ½, ¾, 1.
    private static readonly (double X, double Y, double Weight)[] s_net =
    [
        (1, 0, 1), (1, 1, Math.Sqrt(0.5)), (0, 1, 1), (-1, 1, Math.Sqrt(0.5)), (-1, 0, 1), (-1, -1, Math.Sqrt(0.5)), (0, -1, 1), (1, -1, Math.Sqrt(0.5)), (1, 0, 1),
    ];

    private const string Knots = "(3,2,2,2,3)", KnotPlaces = "(0.,0.25,0.5,0.75,1.)";

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_body_of_planes_and_cylinders_is_recognised_by_its_edges(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "tube", Body(model, 1.5, [0.02415, 0.02095], Circle, Cylinder));
        Bars.Add(model, "bar", Body(model, 0.8, [0.008], Circle, Cylinder));

        AssertRecognised(Reading.Of(model, s_asked));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_body_of_spline_surfaces_and_edges_is_recognised_where_they_are_those_of_a_prism(Release release)
    {
        var model = Bars.Model(release);
        Bars.Add(model, "tube", Body(model, 1.5, [0.02415, 0.02095], SplineCircle, (m, r, length) => SplineSurface(m, r, length, 1)));
        Bars.Add(model, "bar", Body(model, 0.8, [0.008], SplineCircle, Extruded));

        AssertRecognised(Reading.Of(model, s_asked));
    }

    [Fact]
    public void A_body_of_planes_and_quarter_cylinders_in_one_is_a_rounded_rectangle()
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", RoundedBody(model, 0.050, 0.020, 0.004, 1.2));

        var member = Reading.Of(model, s_asked).Only;

        var found = Assert.IsType<RoundedRectangle>(Reading.Shape(member));
        Assert.Equal([0.020, 0.050], new[] { found.Width, found.Depth }.Order(), (a, b) => Math.Abs(a - b) < 1e-7);
        Reading.AssertNear(0.004, found.CornerRadius, 1e-4);
        Reading.AssertNear(1.2, Reading.Value(member.Length), 1e-9);
    }

    [Theory]
    [InlineData("barrel", "IFCRATIONALBSPLINESURFACEWITHKNOTS #")]
    [InlineData("cone", "IFCCONICALSURFACE #")]
    [InlineData("wavy edge", "not bounded by straight or circular edges")]
    public void Other_curved_faces_and_edges_are_refused_by_name(string kind, string words)
    {
        var model = Bars.Model(Release.Ifc4);
        Bars.Add(model, "R", kind switch
        {
            "barrel" => Body(model, 1, [0.02], SplineCircle, (m, r, length) => SplineSurface(m, r, length, 1.1)),
            "cone" => Body(model, 1, [0.02], Circle, (m, r, _) => m.Add("IFCCONICALSURFACE", Bars.Ref(m.AxisPlacement(Transform3.Identity)), m.Units.LengthText(r), "0.1")),
            _ => Body(model, 1, [0.02], (m, r, z) => SplineCircle(m, r, z, (x, y) => new Vector3(x, (1 + 0.2 * x) * y, 0)), Cylinder),
        });

        var why = Reading.Why(Reading.Of(model, s_asked).Only.Section);

        Assert.Equal(ReasonCode.SectionNotParametric, why.Code);
        Assert.Contains(words, why.Message, StringComparison.Ordinal);
    }

    private static void AssertRecognised(Reading reading)
    {
        ProfileReaderTests.AssertAlike(new Tube(0.02415, 0.0032), Reading.Value(reading.Named("tube").Section).Shape, 1e-6);
        Reading.AssertNear(1.5, Reading.Value(reading.Named("tube").Length), 1e-9);
        ProfileReaderTests.AssertAlike(new Round(0.008), Reading.Value(reading.Named("bar").Section).Shape, 1e-6);
        Reading.AssertNear(0.8, Reading.Value(reading.Named("bar").Length), 1e-9);
    }

    private static int Circle(ModelWriter model, double radius, double z) =>
        model.Add("IFCCIRCLE", Bars.Ref(model.AxisPlacement(Transform3.Identity with { Origin = z * Vector3.UnitZ })), model.Units.LengthText(radius));

    private static int Cylinder(ModelWriter model, double radius, double length) =>
        model.Add("IFCCYLINDRICALSURFACE", Bars.Ref(model.AxisPlacement(Transform3.Identity)), model.Units.LengthText(radius));

    private static int SplineCircle(ModelWriter model, double radius, double z) => SplineCircle(model, radius, z, (x, y) => new Vector3(x, y, 0));

    private static int SplineCircle(ModelWriter model, double radius, double z, Func<double, double, Vector3> bent) => model.Add(
        "IFCRATIONALBSPLINECURVEWITHKNOTS", "2", Bars.Refs([.. s_net.Select(p => model.Point(radius * bent(p.X, p.Y) + z * Vector3.UnitZ))]),
        ".CIRCULAR_ARC.", ".T.", ".F.", Knots, KnotPlaces, ".UNSPECIFIED.", Weights());

    private static string Weights() => $"({string.Join(',', s_net.Select(p => Spelling.Real(p.Weight)))})";

    /// <summary>Degree 2 round the axis, degree 2 along it: three rings of control points, the middle one wider by a factor.</summary>
    private static int SplineSurface(ModelWriter model, double radius, double length, double middle)
    {
        string Row(double z, double r) => Bars.Refs([.. s_net.Select(p => model.Point(new Vector3(r * p.X, r * p.Y, z)))]);
        return model.Add(
            "IFCRATIONALBSPLINESURFACEWITHKNOTS", "2", "2", $"({Row(0, radius)},{Row(length / 2, middle * radius)},{Row(length, radius)})", ".UNSPECIFIED.", ".F.", ".T.", ".F.",
            "(3,3)", Knots, "(0.,1.)", KnotPlaces, ".UNSPECIFIED.", $"({Weights()},{Weights()},{Weights()})");
    }

    private static int Extruded(ModelWriter model, double radius, double length) => model.Add(
        "IFCSURFACEOFLINEAREXTRUSION", Bars.Ref(model.Add("IFCARBITRARYOPENPROFILEDEF", ".CURVE.", "$", Bars.Ref(Circle(model, radius, 0)))),
        Bars.Ref(model.AxisPlacement(Transform3.Identity)), Bars.Ref(model.Direction(Vector3.UnitZ)), model.Units.LengthText(length));

    private static int Oriented(ModelWriter model, int edge, bool forward) => model.Add("IFCORIENTEDEDGE", "*", "*", Bars.Ref(edge), forward ? ".T." : ".F.");

    private static int Bound(ModelWriter model, bool isOuter, params int[] edges) =>
        model.Add(isOuter ? "IFCFACEOUTERBOUND" : "IFCFACEBOUND", Bars.Ref(model.Add("IFCEDGELOOP", Bars.Refs(edges))), ".T.");

    private static int Vertex(ModelWriter model, Vector3 at) => model.Add("IFCVERTEXPOINT", Bars.Ref(model.Point(at)));

    private static int PlaneFace(ModelWriter model, params int[] bounds) =>
        model.Add("IFCADVANCEDFACE", Bars.Refs(bounds), Bars.Ref(model.Add("IFCPLANE", Bars.Ref(model.AxisPlacement(Transform3.Identity)))), ".T.");

    private static int Brep(ModelWriter model, List<int> faces) => model.Add("IFCADVANCEDBREP", Bars.Ref(model.Add("IFCCLOSEDSHELL", Bars.Refs([.. faces]))));

    /// <summary>Two plane ends and a side for each radius, whose seam runs up at angle 0.</summary>
    private static int Body(ModelWriter model, double length, double[] radii, Func<ModelWriter, double, double, int> circle, Func<ModelWriter, double, double, int> side)
    {
        var rings = new List<(int Low, int High)>();
        var faces = new List<int>();
        foreach (var radius in radii)
        {
            var (v0, v1) = (Vertex(model, new Vector3(radius, 0, 0)), Vertex(model, new Vector3(radius, 0, length)));
            int Ring(int vertex, double z) => model.Add("IFCEDGECURVE", Bars.Ref(vertex), Bars.Ref(vertex), Bars.Ref(circle(model, radius, z)), ".T.");
            var (low, high, seam) = (Ring(v0, 0), Ring(v1, length), model.Add("IFCEDGE", Bars.Ref(v0), Bars.Ref(v1)));
            rings.Add((low, high));
            var bound = Bound(model, true, Oriented(model, low, true), Oriented(model, seam, true), Oriented(model, high, false), Oriented(model, seam, false));
            faces.Add(model.Add("IFCADVANCEDFACE", Bars.Refs(bound), Bars.Ref(side(model, radius, length)), ".T."));
        }

        foreach (var end in new[] { rings.ConvertAll(r => r.Low), rings.ConvertAll(r => r.High) })
            faces.Add(PlaneFace(model, [.. end.Select((edge, i) => Bound(model, i == 0, Oriented(model, edge, true)))]));
        return Brep(model, faces);
    }

    private static int RoundedBody(ModelWriter model, double width, double depth, double radius, double length)
    {
        // Corners of the outline, counter-clockwise: a straight side from each even one, an arc from each odd one.
        var (x, y) = (width / 2, depth / 2);
        Vector3[] outline = [new(-x + radius, -y, 0), new(x - radius, -y, 0), new(x, -y + radius, 0), new(x, y - radius, 0), new(x - radius, y, 0), new(-x + radius, y, 0), new(-x, y - radius, 0), new(-x, -y + radius, 0)];
        Vector3[] centres = [new(x - radius, -y + radius, 0), new(x - radius, y - radius, 0), new(-x + radius, y - radius, 0), new(-x + radius, -y + radius, 0)];
        var up = length * Vector3.UnitZ;
        var vertices = outline.Select(p => (Low: Vertex(model, p), High: Vertex(model, p + up))).ToArray();
        var risers = vertices.Select(v => model.Add("IFCEDGE", Bars.Ref(v.Low), Bars.Ref(v.High))).ToArray();
        var (low, high, faces) = (new List<int>(), new List<int>(), new List<int>());
        for (var i = 0; i < 8; i++)
        {
            var next = (i + 1) % 8;
            var axes = Transform3.Identity with { Origin = i % 2 == 1 ? centres[i / 2] : Vector3.Zero };
            int Edge(int from, int to, Vector3 at) => i % 2 == 0
                ? model.Add("IFCEDGE", Bars.Ref(from), Bars.Ref(to))
                : model.Add("IFCEDGECURVE", Bars.Ref(from), Bars.Ref(to), Bars.Ref(model.Add("IFCCIRCLE", Bars.Ref(model.AxisPlacement(axes with { Origin = axes.Origin + at })), model.Units.LengthText(radius))), ".T.");
            low.Add(Edge(vertices[i].Low, vertices[next].Low, Vector3.Zero));
            high.Add(Edge(vertices[i].High, vertices[next].High, up));
            var bound = Bound(model, true, Oriented(model, low[i], true), Oriented(model, risers[next], true), Oriented(model, high[i], false), Oriented(model, risers[i], false));
            faces.Add(i % 2 == 0
                ? PlaneFace(model, bound)
                : model.Add("IFCADVANCEDFACE", Bars.Refs(bound), Bars.Ref(model.Add("IFCCYLINDRICALSURFACE", Bars.Ref(model.AxisPlacement(axes)), model.Units.LengthText(radius))), ".T."));
        }

        faces.Add(PlaneFace(model, Bound(model, true, [.. low.Select(e => Oriented(model, e, true))])));
        faces.Add(PlaneFace(model, Bound(model, true, [.. high.Select(e => Oriented(model, e, true))])));
        return Brep(model, faces);
    }
}
