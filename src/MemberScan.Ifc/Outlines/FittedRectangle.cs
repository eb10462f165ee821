using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Outlines;

/// <summary>A rectangle, sharp or with four equal corner arcs, that an outline stands for.</summary>
/// <param name="Centre">Centre [m].</param>
/// <param name="U">Direction of its width, a unit vector, at most 45° from the plane's x axis.</param>
/// <param name="Width">Extent along U [m].</param>
/// <param name="Depth">Extent square to U [m].</param>
/// <param name="CornerRadius">Radius of the corners [m]; 0 for sharp ones.</param>
/// <param name="Deviation">Largest distance of the outline's own points and sides from the rectangle [m].</param>
/// <param name="HasChords">Whether chords stand for the corner arcs.</param>
internal sealed record FittedRectangle(
    Vector3 Centre, Vector3 U, double Width, double Depth, double CornerRadius, double Deviation, bool HasChords)
{
    /// <summary>Largest distance from the rectangle over its shorter side [-].</summary>
    public const double Tolerance = 1e-3;

    /// <summary>Largest angle that one chord of a corner may span [rad]: two chords a corner, as of the coarsest polygon that stands for a circle.</summary>
    private const double WidestChord = Math.PI / 4 * 1.05;

    /// <summary>The rectangle of an outline; null when it is none.</summary>
    public static FittedRectangle? Of(ClosedOutline outline)
    {
        if (!outline.IsConvex) return null;

        var longest = outline.Edges.Where(e => !e.IsArc).DefaultIfEmpty().MaxBy(e => (e.End - e.Start).Length);
        if (!(longest.End - longest.Start).TryNormalize(out var u)) return null;

        var (leastU, mostU, leastV, mostV) = outline.Extents(u);
        var (width, depth) = (mostU - leastU, mostV - leastV);
        var centre = (leastU + mostU) / 2 * u + (leastV + mostV) / 2 * OutlineEdge.Left(u);
        var fit = new Fit(u, centre, width, depth, Tolerance * Math.Min(width, depth));
        return fit.Of(outline.Edges)?.Upright();
    }

    /// <summary>The same rectangle with its width along the direction that is nearest to the plane's x axis.</summary>
    private FittedRectangle Upright()
    {
        var turned = Math.Abs(U.X) >= Math.Abs(U.Y) - 1e-9 ? this : this with { U = OutlineEdge.Left(U), Width = Depth, Depth = Width };
        return turned.U.X < 0 || (Math.Abs(turned.U.X) < 1e-9 && turned.U.Y < 0) ? turned with { U = -turned.U } : turned;
    }

    /// <summary>The bounding rectangle along the longest edge, and how well the edges fit it.</summary>
    private sealed class Fit(Vector3 u, Vector3 centre, double width, double depth, double tolerance)
    {
        private readonly double[] _gaps = new double[8];
        private double _deviation;

        public FittedRectangle? Of(ImmutableArray<OutlineEdge> edges)
        {
            // Each side of the rectangle is the longest edge that lies on it; what is left belongs to the corners.
            var rest = edges.ToList();
            for (var side = 0; side < 4; side++)
            {
                var on = edges.Where(e => !e.IsArc && IsOn(e, side)).ToList();
                if (on.Count == 0)
                {
                    _gaps[2 * side] = _gaps[2 * side + 1] = LengthOf(side) / 2;
                    continue;
                }

                var edge = on.MaxBy(e => e.Length);
                rest.Remove(edge);
                Measure(edge, side);
            }

            var radius = _gaps.Average();
            if (Array.Exists(_gaps, gap => Math.Abs(gap - radius) > tolerance)) return null;

            if (radius <= tolerance)
            {
                if (rest.Count > 0) return null;

                _deviation = Math.Max(_deviation, _gaps.Max());
                return Result(0, false);
            }

            _deviation = Math.Max(_deviation, _gaps.Max(gap => Math.Abs(gap - radius)));
            return rest.TrueForAll(e => FitsCorner(e, radius)) ? Result(radius, rest.Exists(e => !e.IsArc)) : null;
        }

        private FittedRectangle? Result(double radius, bool hasChords) =>
            _deviation <= tolerance ? new FittedRectangle(centre, u, width, depth, radius, _deviation, hasChords) : null;

        // Sides 0 and 2 run along u, below and above; sides 1 and 3 along v, right and left.
        private double LengthOf(int side) => side % 2 == 0 ? width : depth;

        private (double Along, double Off) Local(Vector3 point, int side)
        {
            var (pu, pv) = ((point - centre).Dot(u), (point - centre).Dot(OutlineEdge.Left(u)));
            return side switch
            {
                0 => (pu, -pv - depth / 2),
                1 => (pv, pu - width / 2),
                2 => (-pu, pv - depth / 2),
                _ => (-pv, -pu - width / 2),
            };
        }

        private bool IsOn(OutlineEdge edge, int side) =>
            Math.Abs(Local(edge.Start, side).Off) <= tolerance && Math.Abs(Local(edge.End, side).Off) <= tolerance;

        private void Measure(OutlineEdge edge, int side)
        {
            var (start, end) = (Local(edge.Start, side), Local(edge.End, side));
            _gaps[2 * side] = start.Along + LengthOf(side) / 2;
            _gaps[2 * side + 1] = LengthOf(side) / 2 - end.Along;
            _deviation = Math.Max(_deviation, Math.Max(Math.Abs(start.Off), Math.Abs(end.Off)));
        }

        private bool FitsCorner(OutlineEdge edge, double radius)
        {
            if (!edge.IsArc && edge.Length > radius * WidestChord) return false;
            if (edge.IsArc && Math.Abs(edge.Radius - radius) > tolerance) return false;

            return IsOnCorner(edge.Start, radius) && IsOnCorner(edge.End, radius) && (!edge.IsArc || IsOnCorner(edge.At(0.5), radius));
        }

        private bool IsOnCorner(Vector3 point, double radius)
        {
            var (pu, pv) = (Math.Abs((point - centre).Dot(u)), Math.Abs((point - centre).Dot(OutlineEdge.Left(u))));
            var (du, dv) = (pu - (width / 2 - radius), pv - (depth / 2 - radius));
            if (du < -tolerance || dv < -tolerance) return false;

            var off = Math.Abs(Math.Sqrt(du * du + dv * dv) - radius);
            _deviation = Math.Max(_deviation, off);
            return off <= tolerance;
        }
    }
}
