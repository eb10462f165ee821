using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Geometry;
using MemberScan.Part21;

namespace MemberScan.Ifc.Meshes;

/// <summary>
/// Edge loops of faces that are planes, cylinders or other surfaces of parallel straight lines, arcs in chords: an edge gives the same chords
/// to both faces that it bounds. An edge that is a spline counts where it is a line or an arc.
/// </summary>
internal sealed class AdvancedFaceReader(Instances instances, PlacementReader placements, CurveReader curves)
{
    /// <summary>Chords of a full circle.</summary>
    public const int ChordsPerTurn = 48;

    private readonly Dictionary<ulong, List<Vector3>> _known = [];
    private readonly SplineEdge _splines = new(instances, placements);
    private readonly RuledSurface _ruled = new(instances, placements);

    /// <summary>Whether a face lies in a plane, on a cylinder or on another surface of parallel straight lines.</summary>
    public bool IsCovered(Part21Record face) => instances.TryFollow(face[1], out var surface)
        && (surface.Keyword is "IFCPLANE" or "IFCCYLINDRICALSURFACE" or "IFCSURFACEOFLINEAREXTRUSION" || _ruled.IsOfParallelLines(surface));

    /// <summary>Class and STEP id of the surface that a face lies on.</summary>
    public string SurfaceOf(Part21Record face) => instances.TryFollow(face[1], out var surface)
        ? string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{surface.Keyword} #{surface.Id}")
        : "a surface that is missing";

    /// <summary>Corners of an IfcEdgeLoop in order; null when an edge is damaged or neither straight nor circular.</summary>
    public List<Vector3>? Loop(Part21Record loop)
    {
        if (instances.FollowEach(loop[0]) is not { Count: > 0 } edges) return null;

        var points = new List<Vector3>();
        foreach (var edge in edges)
        {
            if (edge.Keyword != "IFCORIENTEDEDGE" || !instances.TryFollow(edge[2], out var element) || Edge(element) is not { } along) return null;

            // The last point of an edge is the first of the next one.
            var ordered = Instances.Literal(edge[3]) == "F" ? Enumerable.Reverse(along) : along;
            points.AddRange(ordered.SkipLast(1));
        }

        return points.Count >= 3 ? points : null;
    }

    private List<Vector3>? Edge(Part21Record edge)
    {
        if (_known.TryGetValue(edge.Id, out var known)) return known;
        if (Vertex(edge[0]) is not { } start || Vertex(edge[1]) is not { } end) return null;

        var points = edge.Keyword switch
        {
            "IFCEDGE" => [start, end],
            "IFCEDGECURVE" when instances.TryFollow(edge[2], out var curve) => OnCurve(curve, start, end, Instances.Literal(edge[3]) != "F"),
            _ => null,
        };
        if (points is not null) _known[edge.Id] = points;
        return points;
    }

    private List<Vector3>? OnCurve(Part21Record curve, Vector3 start, Vector3 end, bool isForward)
    {
        if (curve.Keyword == "IFCLINE" || (curve.Keyword == "IFCPOLYLINE" && curve[0].ItemCount == 2)) return [start, end];
        if (curve.Keyword == "IFCTRIMMEDCURVE" && instances.TryFollow(curve[0], out var basis)) return OnCurve(basis, start, end, isForward == (Instances.Literal(curve[3]) != "F"));
        if (curve.Keyword.StartsWith("IFCBSPLINECURVE", StringComparison.Ordinal) || curve.Keyword == "IFCRATIONALBSPLINECURVEWITHKNOTS")
            return _splines.Points(curve, start, end, isForward);
        if (curve.Keyword != "IFCCIRCLE" || curves.CircleOf(curve) is not { } circle) return null;

        var (axes, radius) = circle;
        double AngleOf(Vector3 p) => Math.Atan2((p - axes.Origin).Dot(axes.Y), (p - axes.Origin).Dot(axes.X));
        var from = AngleOf(start);
        var sweep = isForward ? AngleOf(end) - from : from - AngleOf(end);
        sweep -= 2 * Math.PI * Math.Floor(sweep / (2 * Math.PI));
        if (sweep < 1e-9) sweep = 2 * Math.PI;

        var chords = Math.Max(1, (int)Math.Round(ChordsPerTurn * sweep / (2 * Math.PI)));
        Vector3 At(double angle) => axes.Origin + radius * (Math.Cos(angle) * axes.X + Math.Sin(angle) * axes.Y);
        return [start, .. Enumerable.Range(1, chords - 1).Select(i => At(from + (isForward ? 1 : -1) * sweep * i / chords)), end];
    }

    private Vector3? Vertex(Part21Value value) =>
        instances.TryFollow(value, out var vertex) && vertex.Keyword == "IFCVERTEXPOINT" && instances.TryFollow(vertex[0], out var point) ? placements.Point(point) : null;
}
