using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;

namespace MemberScan.Ifc.Outlines;

/// <summary>A closed line in a plane, run through counter-clockwise: straight and circular edges, each as long as it can be.</summary>
internal sealed class ClosedOutline
{
    /// <summary>Most edges that an outline may have.</summary>
    public const int MaxEdges = 2_000;

    /// <summary>Widest gap between neighbouring edges, over the outline's size [-].</summary>
    private const double JoinTolerance = 1e-4;

    /// <summary>Edges shorter than this share of the size [-] are points.</summary>
    private const double PointTolerance = 1e-7;

    /// <summary>Smallest turn between two straight edges that makes a corner [rad].</summary>
    private const double CornerTurn = 1e-3;

    private ClosedOutline(ImmutableArray<OutlineEdge> edges) => Edges = edges;

    /// <summary>The edges in order.</summary>
    public ImmutableArray<OutlineEdge> Edges { get; }

    /// <summary>Area within [m²], above zero.</summary>
    public double Area => SignedArea(Edges);

    /// <summary>Sum of all turns [rad], in edges and between them; 2π for a line that does not cross itself.</summary>
    public double TotalTurn
    {
        get
        {
            var sum = 0.0;
            for (var i = 0; i < Edges.Length; i++) sum += Edges[i].Turn + TurnAfter(i);
            return sum;
        }
    }

    /// <summary>Whether the line turns to the left everywhere, once round: it then encloses a convex area and does not cross itself.</summary>
    public bool IsConvex
    {
        get
        {
            for (var i = 0; i < Edges.Length; i++)
                if (Edges[i].Turn < 0 || TurnAfter(i) < -CornerTurn)
                    return false;
            return Math.Abs(TotalTurn - 2 * Math.PI) < 0.01;
        }
    }

    /// <summary>Joins edges to a closed outline.</summary>
    /// <param name="edges">Edges in order, either way round.</param>
    /// <param name="fault">What is wrong with them; empty when nothing is.</param>
    /// <returns>The outline; null when something is wrong.</returns>
    public static ClosedOutline? From(IEnumerable<OutlineEdge> edges, out string fault)
    {
        var all = edges.Take(MaxEdges + 1).ToList();
        fault = Fault(all);
        if (fault.Length > 0) return null;

        var size = Size(all);
        all.RemoveAll(e => e.Length <= PointTolerance * size);
        Close(all);
        Merge(all);
        var area = SignedArea(all);
        if (Math.Abs(area) < 1e-9 * size * size) fault = "the outline encloses no area";
        if (fault.Length > 0) return null;

        return new ClosedOutline(area > 0 ? [.. all] : [.. Enumerable.Reverse(all).Select(e => e.Reversed)]);
    }

    /// <summary>Joins the pieces of a curve in the plane to a closed outline.</summary>
    public static ClosedOutline? From(IReadOnlyList<CurvePiece> pieces, out string fault) => From(pieces.Select(OutlineEdge.From), out fault);

    /// <summary>Least and largest coordinates along two directions square to each other [m].</summary>
    public (double LeastU, double MostU, double LeastV, double MostV) Extents(Vector3 u)
    {
        var v = OutlineEdge.Left(u);
        var (leastU, mostU) = Range(u);
        var (leastV, mostV) = Range(v);
        return (leastU, mostU, leastV, mostV);
    }

    /// <summary>Corners of a polygon that follows the line, arcs in steps of at most 6°.</summary>
    public ImmutableArray<Vector3> Polygon()
    {
        var points = ImmutableArray.CreateBuilder<Vector3>();
        foreach (var edge in Edges)
        {
            var steps = edge.IsArc ? Math.Max(1, (int)Math.Ceiling(Math.Abs(edge.Turn) / (Math.PI / 30))) : 1;
            for (var i = 0; i < steps; i++) points.Add(edge.At((double)i / steps));
        }

        return points.ToImmutable();
    }

    private (double Least, double Most) Range(Vector3 direction)
    {
        var (least, most) = (double.PositiveInfinity, double.NegativeInfinity);
        foreach (var edge in Edges)
        {
            Take(edge.Start.Dot(direction));
            Take(edge.End.Dot(direction));
            if (!edge.IsArc) continue;

            // The arc reaches its extreme along the direction where its radius points that way, if that point is on it.
            foreach (var sign in new[] { 1, -1 })
                if (IsOnArc(edge, sign * direction))
                    Take(edge.Centre.Dot(direction) + sign * edge.Radius);
        }

        return (least, most);

        void Take(double value) => (least, most) = (Math.Min(least, value), Math.Max(most, value));
    }

    private static bool IsOnArc(OutlineEdge arc, Vector3 direction)
    {
        var from = arc.Start - arc.Centre;
        var angle = Math.Sign(arc.Turn) * Math.Atan2(OutlineEdge.Cross(from, direction), from.Dot(direction));
        if (angle < 0) angle += 2 * Math.PI;
        return angle <= Math.Abs(arc.Turn);
    }

    private double TurnAfter(int index)
    {
        if (Edges.Length == 1) return 0;

        var (a, b) = (Edges[index].EndTangent, Edges[(index + 1) % Edges.Length].StartTangent);
        return Math.Atan2(OutlineEdge.Cross(a, b), a.Dot(b));
    }

    private static string Fault(List<OutlineEdge> edges)
    {
        if (edges.Count > MaxEdges) return string.Create(CultureInfo.InvariantCulture, $"the outline has more than {MaxEdges} edges");
        if (edges.Count == 0 || !edges.TrueForAll(e => e.Start.IsFinite && e.End.IsFinite && double.IsFinite(e.Length))) return "the outline has no edges or no finite ones";

        var size = Size(edges);
        if (!(size > 0)) return "the outline has no size";
        for (var i = 0; i < edges.Count; i++)
        {
            var gap = (edges[(i + 1) % edges.Count].Start - edges[i].End).Length;
            if (gap <= JoinTolerance * size) continue;

            return i == edges.Count - 1
                ? string.Create(CultureInfo.InvariantCulture, $"the outline is not closed: its ends are {gap * 1e3:0.###} mm apart")
                : string.Create(CultureInfo.InvariantCulture, $"the outline jumps by {gap * 1e3:0.###} mm after its edge {i + 1}");
        }

        return "";
    }

    private static double Size(List<OutlineEdge> edges)
    {
        var points = edges.SelectMany(e => new[] { e.Start, e.At(0.5), e.End }).ToList();
        return Math.Max(points.Max(p => p.X) - points.Min(p => p.X), points.Max(p => p.Y) - points.Min(p => p.Y));
    }

    // Ends of straight edges are moved onto their neighbours, so that the line has no gaps.
    private static void Close(List<OutlineEdge> edges)
    {
        for (var i = 0; i < edges.Count; i++)
        {
            var next = (i + 1) % edges.Count;
            if (!edges[i].IsArc) edges[i] = edges[i] with { End = edges[next].Start };
            else if (!edges[next].IsArc) edges[next] = edges[next] with { Start = edges[i].End };
        }
    }

    private static void Merge(List<OutlineEdge> edges)
    {
        for (var i = 0; edges.Count > 1 && i < edges.Count;)
        {
            var next = (i + 1) % edges.Count;
            if (Joined(edges[i], edges[next]) is { } one)
            {
                edges[i] = one;
                edges.RemoveAt(next);
                if (next < i) i--;
            }
            else
            {
                i++;
            }
        }
    }

    private static OutlineEdge? Joined(OutlineEdge a, OutlineEdge b)
    {
        if (a.IsArc != b.IsArc) return null;

        if (a.IsArc)
        {
            var isSame = (a.Centre - b.Centre).Length < 1e-6 * a.Radius && Math.Abs(b.Radius / a.Radius - 1) < 1e-6 && Math.Sign(a.Turn) == Math.Sign(b.Turn);
            return isSame ? a with { End = b.End, Turn = a.Turn + b.Turn } : null;
        }

        var (along, on) = (a.StartTangent, b.StartTangent);
        return Math.Abs(OutlineEdge.Cross(along, on)) < CornerTurn && along.Dot(on) > 0 ? OutlineEdge.Straight(a.Start, b.End) : null;
    }

    private static double SignedArea(IReadOnlyList<OutlineEdge> edges)
    {
        if (edges.Count == 0) return 0;

        var origin = edges[0].Start;
        return edges.Sum(e => (OutlineEdge.Cross(e.Start - origin, e.End - origin) + e.Radius * e.Radius * (e.Turn - Math.Sin(e.Turn))) / 2);
    }
}
