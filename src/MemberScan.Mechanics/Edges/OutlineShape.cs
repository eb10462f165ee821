using System.Collections.Immutable;

namespace MemberScan.Mechanics.Edges;

/// <summary>The edges of a section as something to ask: what lies inside, how thick the material is, where it has re-entrant corners.</summary>
internal sealed class OutlineShape
{
    // What turns further is a bore.
    private const double LargestFilletAngle = 0.75 * Math.PI;
    private readonly ImmutableArray<RisingPiece> _pieces;

    /// <summary>The shape within edges that have the material to their left.</summary>
    public OutlineShape(ImmutableArray<EdgeCurve> edges)
    {
        Edges = edges;
        var points = edges.SelectMany(edge => edge.Extremes()).ToArray();
        (LeastY, LargestY) = (points.Min(p => p.Y), points.Max(p => p.Y));
        (LeastZ, LargestZ) = (points.Min(p => p.Z), points.Max(p => p.Z));
        Extent = Math.Max(LargestY - LeastY, LargestZ - LeastZ);
        _pieces = Joined([.. edges.SelectMany(RisingPiece.Of)], 1e-12 * Extent);
        Next = FindNext();
        Corners = [.. FindCorners()];
    }

    /// <summary>The edges.</summary>
    public ImmutableArray<EdgeCurve> Edges { get; }

    /// <summary>For each edge the number of the one that follows it.</summary>
    public ImmutableArray<int> Next { get; }

    /// <summary>Re-entrant corners, sharp and rounded.</summary>
    public ImmutableArray<ReentrantCorner> Corners { get; }

    /// <summary>Largest extent [m].</summary>
    public double Extent { get; }

    /// <summary>Least y [m].</summary>
    public double LeastY { get; }

    /// <summary>Largest y [m].</summary>
    public double LargestY { get; }

    /// <summary>Least z [m].</summary>
    public double LeastZ { get; }

    /// <summary>Largest z [m].</summary>
    public double LargestZ { get; }

    /// <summary>Whether a point lies inside: a ray along +y crosses the edges an odd number of times.</summary>
    public bool Contains(double y, double z)
    {
        var inside = false;
        foreach (ref readonly var piece in _pieces.AsSpan())
            if (piece.IsCrossedBeyond(y, z)) inside = !inside;
        return inside;
    }

    /// <summary>The place on an edge nearest to a point, and how far away it is [m].</summary>
    public ((double Y, double Z) At, double Distance) NearestEdge(double y, double z)
    {
        var (best, least) = ((0.0, 0.0), double.PositiveInfinity);
        foreach (var edge in Edges)
        {
            var at = edge.At(edge.Nearest(y, z));
            var distance = double.Hypot(at.Y - y, at.Z - z);
            if (distance < least) (best, least) = (at, distance);
        }

        return (best, least);
    }

    /// <summary>Whether a point lies in the surroundings of a re-entrant corner that do not decide: nearer than half a wall, less a tolerance [m].</summary>
    public bool IsNearCorner(double y, double z, double tolerance)
    {
        foreach (var corner in Corners)
            if (corner.Distance(y, z) < corner.Reach - tolerance) return true;
        return false;
    }

    /// <summary>Length of the material square to an edge, from a share of it inwards [m].</summary>
    public double Thickness(EdgeCurve edge, double share)
    {
        var (at, (dy, dz)) = edge.WithSlope(share);
        var length = double.Hypot(dy, dz);
        return Ray(at, -dz / length, dy / length);
    }

    private double Ray((double Y, double Z) from, double dirY, double dirZ)
    {
        // Away from the edge it starts on by more than rounding.
        var (least, nearest) = (1e-7 * Extent, Extent * 2);
        foreach (var edge in Edges)
        {
            foreach (var hit in edge.Hits(from, dirY, dirZ))
                if (hit > least && hit < nearest) nearest = hit;
        }

        return nearest;
    }

    // Levels at which pieces meet are made equal: where rounding parts them, a ray at just that level would slip between two edges.
    private static ImmutableArray<RisingPiece> Joined(RisingPiece[] pieces, double rounding)
    {
        var levels = pieces.SelectMany(p => new[] { p.Low, p.High }).Order().ToArray();
        for (var i = 1; i < levels.Length; i++)
            if (levels[i] - levels[i - 1] <= rounding) levels[i] = levels[i - 1];
        return [.. pieces.Select(p => p with { Low = Level(p.Low), High = Level(p.High) })];

        double Level(double z)
        {
            var at = Array.BinarySearch(levels, z);
            if (at >= 0) return z;
            return levels[Math.Max(0, ~at - 1)];
        }
    }

    private ImmutableArray<int> FindNext()
    {
        var next = new int[Edges.Length];
        for (var (i, start) = (0, 0); i < next.Length; i++)
        {
            var (end, first) = (Edges[i].At(1), Edges[start].At(0));
            var closes = double.Hypot(end.Y - first.Y, end.Z - first.Z) <= 1e-9 * Extent;
            next[i] = closes ? start : i + 1;
            if (closes) start = i + 1;
        }

        return [.. next];
    }

    private IEnumerable<ReentrantCorner> FindCorners()
    {
        const double RightTurn = -0.01;

        for (var i = 0; i < Edges.Length; i++)
        {
            var edge = Edges[i];
            if (edge.IsArc && edge.Sweep < 0 && edge.Sweep > -LargestFilletAngle)
            {
                var wall = Math.Min(Thickness(edge, 1e-6), Thickness(edge, 1 - 1e-6));
                if (edge.Radius <= ReentrantZone.LargestFillet * wall) yield return new ReentrantCorner(edge, ReentrantZone.Reach * wall, true);
            }

            var (at, (dy, dz)) = edge.WithSlope(1);
            var (_, (ny, nz)) = Edges[Next[i]].WithSlope(0);
            var turn = Math.Atan2(dy * nz - dz * ny, dy * ny + dz * nz);
            if (turn >= RightTurn) continue;

            // The wall: how far either edge, continued, still runs through material.
            var (one, other) = (double.Hypot(dy, dz), double.Hypot(ny, nz));
            var thickness = Math.Min(Ray(at, dy / one, dz / one), Ray(at, -ny / other, -nz / other));
            yield return new ReentrantCorner(EdgeCurve.Line(at, at), ReentrantZone.Reach * thickness, false);
        }
    }
}
