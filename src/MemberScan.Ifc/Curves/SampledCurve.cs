using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Curves;

/// <summary>Curves that are neither lines nor arcs, followed by arcs through points of them.</summary>
internal static class SampledCurve
{
    /// <summary>Largest distance of the arcs from the curve, over its size, that is striven for [-].</summary>
    public const double Tolerance = 1e-4;

    /// <summary>Most arcs of a curve.</summary>
    public const int MostArcs = 192;

    /// <summary>Arcs that follow a curve; null when a point of it is not finite.</summary>
    /// <param name="at">Gives the point at a share of the curve, from 0 to 1.</param>
    /// <param name="breaks">Shares between which the curve is smooth, from 0 to 1, rising.</param>
    /// <param name="deviation">Largest distance found of the arcs from the curve [m].</param>
    public static List<CurvePiece>? Arcs(Func<double, Vector3> at, IReadOnlyList<double> breaks, out double deviation)
    {
        var perSpan = 1;
        while (true)
        {
            if (Follow(at, breaks, perSpan, out deviation, out var size) is not { } pieces) return null;
            if (deviation <= Tolerance * size || 2 * perSpan * (breaks.Count - 1) > MostArcs) return pieces;

            perSpan *= 2;
        }
    }

    private static List<CurvePiece>? Follow(Func<double, Vector3> at, IReadOnlyList<double> breaks, int perSpan, out double deviation, out double size)
    {
        (deviation, size) = (0, 0);
        var pieces = new List<CurvePiece>();
        var first = at(0);
        for (var i = 0; i < perSpan * (breaks.Count - 1); i++)
        {
            var (from, to) = (breaks[i / perSpan], breaks[i / perSpan + 1]);
            Vector3 Point(double part) => at(from + (to - from) * (i % perSpan + part) / perSpan);
            var (start, middle, end) = (Point(0), Point(0.5), Point(1));
            if (!start.IsFinite || !middle.IsFinite || !end.IsFinite) return null;

            size = Math.Max(size, (start - first).Length);
            if ((CurvePiece.Arc(start, middle, end) ?? CurvePiece.Line(start, end, 1)) is not { } piece) continue;

            pieces.Add(piece);
            foreach (var part in new[] { 0.25, 0.75 }) deviation = Math.Max(deviation, Off(piece, middle, Point(part)));
        }

        return pieces.Count > 0 ? pieces : null;
    }

    private static double Off(CurvePiece piece, Vector3 middle, Vector3 point)
    {
        if (!piece.IsArc) return (point - piece.Start - (point - piece.Start).Dot(piece.StartTangent) * piece.StartTangent).Length;

        // The centre lies on the line from the arc's middle through that of its chord.
        var chord = 0.5 * (piece.Start + piece.End);
        return (chord - middle).TryNormalize(out var inwards) ? Math.Abs((point - middle - piece.BendRadius * inwards).Length - piece.BendRadius) : 0;
    }
}
