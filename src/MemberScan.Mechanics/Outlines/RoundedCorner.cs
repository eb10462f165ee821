using System.Collections.Immutable;

namespace MemberScan.Mechanics.Outlines;

/// <summary>Geometry shared by the edges of rectangles with sharp or rounded corners, by half sides and corner radius [m].</summary>
internal static class RoundedCorner
{
    /// <summary>Straight pieces of an edge.</summary>
    public const int Sides = 4;

    /// <summary>All pieces of an edge: the sides, then the corners.</summary>
    public const int Pieces = 8;

    /// <summary>Nodes of a coarse search on a piece; odd, so that its middle is one.</summary>
    public const int NodesPerPiece = 17;

    /// <summary>Signs of the four quadrants.</summary>
    public static ImmutableArray<(int Y, int Z)> Quadrants { get; } = [(1, 1), (-1, 1), (-1, -1), (1, -1)];

    /// <summary>The point of a piece where sin p runs from −1 to 1; sides stop short of their corners by a length [m].</summary>
    public static (double Y, double Z) OnPiece(double halfWidth, double halfDepth, double radius, double shortBy, int piece, double p)
    {
        var share = Math.Sin(p);
        var (flatY, flatZ) = (halfWidth - radius - shortBy, halfDepth - radius - shortBy);
        switch (piece)
        {
            case 0: return (flatY * share, halfDepth);
            case 1: return (flatY * share, -halfDepth);
            case 2: return (halfWidth, flatZ * share);
            case 3: return (-halfWidth, flatZ * share);
            default:
                var (signY, signZ) = Quadrants[piece - Sides];
                var (sin, cos) = Math.SinCos(Math.PI / 4 * (1 + share));
                return (signY * (halfWidth - radius + radius * cos), signZ * (halfDepth - radius + radius * sin));
        }
    }

    /// <summary>Whether a point lies in the closed outline or within a tolerance of it.</summary>
    public static bool Contains(double halfWidth, double halfDepth, double radius, double y, double z, double tolerance) =>
        Beyond(halfWidth, halfDepth, radius, y, z) <= tolerance;

    /// <summary>How far a point lies outside [m]; negative inside.</summary>
    public static double Beyond(double halfWidth, double halfDepth, double radius, double y, double z)
    {
        var (overY, overZ) = (Math.Abs(y) - (halfWidth - radius), Math.Abs(z) - (halfDepth - radius));
        return overY > 0 && overZ > 0
            ? (radius > 0 ? double.Hypot(overY, overZ) - radius : Math.Max(overY, overZ))
            : Math.Max(overY, overZ) - radius;
    }

    /// <summary>The point farthest in a direction; the middle of a side where a whole side is.</summary>
    public static (double Y, double Z) Farthest(
        double halfWidth, double halfDepth, double radius, double directionY, double directionZ)
    {
        if (directionZ == 0) return (Math.CopySign(halfWidth, directionY), 0);
        if (directionY == 0) return (0, Math.CopySign(halfDepth, directionZ));

        var length = double.Hypot(directionY, directionZ);
        return (
            Math.CopySign(halfWidth - radius, directionY) + radius * directionY / length,
            Math.CopySign(halfDepth - radius, directionZ) + radius * directionZ / length);
    }

    /// <summary>0 at the middle of a side, 1 elsewhere on the edge, 3 inside.</summary>
    public static int Rank(double halfWidth, double halfDepth, double radius, double y, double z, double tolerance)
    {
        if (Beyond(halfWidth, halfDepth, radius, y, z) < -tolerance) return 3;

        return Math.Abs(y) <= tolerance || Math.Abs(z) <= tolerance ? 0 : 1;
    }
}
