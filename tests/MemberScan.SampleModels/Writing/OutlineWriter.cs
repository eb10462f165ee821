using MemberScan.Foundation.Geometry;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes profiles that are drawn as curves, and profiles derived from others; dimensions in metres.</summary>
public sealed class OutlineWriter
{
    private readonly ModelWriter _model;

    internal OutlineWriter(ModelWriter model) => _model = model;

    /// <summary>IfcArbitraryClosedProfileDef, with voids IfcArbitraryProfileDefWithVoids.</summary>
    public int Profile(int outer, IReadOnlyList<int>? voids = null, string? name = null) => voids is { Count: > 0 }
        ? _model.Add("IFCARBITRARYPROFILEDEFWITHVOIDS", Spelling.Literal("AREA"), Spelling.Text(name), Spelling.Reference(outer), Spelling.References(voids))
        : _model.Add("IFCARBITRARYCLOSEDPROFILEDEF", Spelling.Literal("AREA"), Spelling.Text(name), Spelling.Reference(outer));

    /// <summary>A polyline through points of the plane, back to the first.</summary>
    public int Polygon(IReadOnlyList<Vector3> corners)
    {
        var points = corners.Select(Point).ToList();
        return _model.Add("IFCPOLYLINE", Spelling.References([.. points, points[0]]));
    }

    /// <summary>A polygon with equal chords, its corners on a circle.</summary>
    public int Polygon(Vector3 centre, double radius, int sides, double firstAngle = 0) => Polygon(RegularPolygon(centre, radius, sides, firstAngle));

    /// <summary>IfcCircle.</summary>
    public int Circle(Vector3 centre, double radius) => _model.Add("IFCCIRCLE", Spelling.Reference(Axes(centre, Vector3.UnitX)), _model.Units.LengthText(radius));

    /// <summary>A rectangle with rounded corners as lines and trimmed quarter circles in a composite curve.</summary>
    /// <param name="frame">Its centre and directions in the plane.</param>
    /// <param name="width">Along the frame's X axis.</param>
    /// <param name="depth">Along the frame's Y axis.</param>
    /// <param name="radius">Of the corners.</param>
    /// <param name="byPoints">Whether arcs are trimmed by points instead of parameters.</param>
    public int Rounded(Transform3 frame, double width, double depth, double radius, bool byPoints)
    {
        var segments = new List<int>();
        for (var corner = 0; corner < 4; corner++)
        {
            var (centre, x) = Corner(frame, width, depth, radius, corner);
            var (_, left) = Corner(frame, width, depth, radius, (corner + 1) % 4);
            var next = Corner(frame, width, depth, radius, (corner + 1) % 4).Centre;
            var circle = _model.Add("IFCCIRCLE", Spelling.Reference(Axes(centre, x)), _model.Units.LengthText(radius));
            string First(double angle, Vector3 at) => byPoints ? Spelling.References([Point(at)]) : $"(IFCPARAMETERVALUE({Spelling.Real(angle)}))";
            var arc = _model.Add("IFCTRIMMEDCURVE", Spelling.Reference(circle), First(0, centre + radius * x), First(Math.PI / 2, centre + radius * left),
                Spelling.Boolean(true), Spelling.Literal(byPoints ? "CARTESIAN" : "PARAMETER"));
            segments.Add(Segment(arc));
            segments.Add(Segment(_model.Add("IFCPOLYLINE", Spelling.References([Point(centre + radius * left), Point(next + radius * left)]))));
        }

        return _model.Add("IFCCOMPOSITECURVE", Spelling.References(segments), Spelling.Boolean(false));
    }

    /// <summary>The same as an indexed poly-curve (not in IFC2X3).</summary>
    public int RoundedIndexed(Transform3 frame, double width, double depth, double radius)
    {
        var points = new List<string>();
        var segments = new List<string>();
        for (var corner = 0; corner < 4; corner++)
        {
            var (centre, x) = Corner(frame, width, depth, radius, corner);
            var (_, left) = Corner(frame, width, depth, radius, (corner + 1) % 4);
            _ = (x + left).TryNormalize(out var middle);
            foreach (var p in new[] { centre + radius * x, centre + radius * middle, centre + radius * left }) points.Add(Pair(p));
            var first = 3 * corner + 1;
            segments.Add(FormattableString.Invariant($"IFCARCINDEX(({first},{first + 1},{first + 2}))"));
            segments.Add(FormattableString.Invariant($"IFCLINEINDEX(({first + 2},{(first + 2) % 12 + 1}))"));
        }

        var list = _model.Add("IFCCARTESIANPOINTLIST2D", Spelling.List(points));
        return _model.Add("IFCINDEXEDPOLYCURVE", Spelling.Reference(list), Spelling.List(segments), Spelling.Boolean(false));
    }

    /// <summary>IfcDerivedProfileDef: the parent turned, moved and scaled; the second scale makes it uneven.</summary>
    public int Derived(int parent, Transform3 map, double scale = 1, double? scale2 = null, string? name = null)
    {
        string[] common = [Spelling.Reference(Direction(map.X)), Spelling.Reference(Direction(map.Y)), Spelling.Reference(Point(map.Origin)), Spelling.Real(scale)];
        var op = scale2 is { } other
            ? _model.Add("IFCCARTESIANTRANSFORMATIONOPERATOR2DNONUNIFORM", [.. common, Spelling.Real(other)])
            : _model.Add("IFCCARTESIANTRANSFORMATIONOPERATOR2D", common);
        return _model.Add("IFCDERIVEDPROFILEDEF", Spelling.Literal("AREA"), Spelling.Text(name), Spelling.Reference(parent), Spelling.Reference(op), Spelling.Unset);
    }

    /// <summary>IfcMirroredProfileDef (not in IFC2X3).</summary>
    public int Mirrored(int parent) =>
        _model.Add("IFCMIRROREDPROFILEDEF", Spelling.Literal("AREA"), Spelling.Unset, Spelling.Reference(parent), Spelling.Derived, Spelling.Unset);

    /// <summary>IfcCompositeProfileDef.</summary>
    public int Composite(params IEnumerable<int> parts) =>
        _model.Add("IFCCOMPOSITEPROFILEDEF", Spelling.Literal("AREA"), Spelling.Unset, Spelling.References(parts), Spelling.Unset);

    /// <summary>Corners of a regular polygon in the plane, counter-clockwise.</summary>
    public static IReadOnlyList<Vector3> RegularPolygon(Vector3 centre, double radius, int sides, double firstAngle = 0) =>
        [.. Enumerable.Range(0, sides).Select(i => firstAngle + 2 * Math.PI * i / sides).Select(a => centre + radius * new Vector3(Math.Cos(a), Math.Sin(a), 0))];

    /// <summary>Corners of a rectangle in the plane, counter-clockwise.</summary>
    public static IReadOnlyList<Vector3> Rectangle(Transform3 frame, double width, double depth) =>
        [.. new[] { (-1, -1), (1, -1), (1, 1), (-1, 1) }.Select(s => frame.Point(new Vector3(s.Item1 * width / 2, s.Item2 * depth / 2, 0)))];

    // Corner arcs run counter-clockwise from lower right; x points where the arc begins.
    private static (Vector3 Centre, Vector3 X) Corner(Transform3 frame, double width, double depth, double radius, int corner)
    {
        var (u, v) = (width / 2 - radius, depth / 2 - radius);
        return corner switch
        {
            0 => (frame.Point(new Vector3(u, -v, 0)), -frame.Y),
            1 => (frame.Point(new Vector3(u, v, 0)), frame.X),
            2 => (frame.Point(new Vector3(-u, v, 0)), frame.Y),
            _ => (frame.Point(new Vector3(-u, -v, 0)), -frame.X),
        };
    }

    private int Segment(int curve) =>
        _model.Add("IFCCOMPOSITECURVESEGMENT", Spelling.Literal("CONTINUOUS"), Spelling.Boolean(true), Spelling.Reference(curve));

    private int Axes(Vector3 origin, Vector3 x) => _model.Add("IFCAXIS2PLACEMENT2D", Spelling.Reference(Point(origin)), Spelling.Reference(Direction(x)));

    private string Pair(Vector3 p) => Spelling.List([_model.Units.LengthText(p.X), _model.Units.LengthText(p.Y)]);

    private int Point(Vector3 p) => _model.Add("IFCCARTESIANPOINT", Pair(p));

    private int Direction(Vector3 d) => _model.Add("IFCDIRECTION", Spelling.List([Spelling.Real(d.X), Spelling.Real(d.Y)]));
}
