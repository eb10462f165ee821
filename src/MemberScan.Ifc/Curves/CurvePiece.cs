using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Curves;

/// <summary>A straight or circular piece of a curve, with its range of curve parameter, in curve order.</summary>
/// <param name="Start">Start [m].</param>
/// <param name="End">End [m].</param>
/// <param name="StartTangent">Direction at the start, a unit vector.</param>
/// <param name="EndTangent">Direction at the end, a unit vector.</param>
/// <param name="Length">Length along the piece [m].</param>
/// <param name="BendRadius">Radius [m]; 0 for a straight piece.</param>
/// <param name="ParameterSpan">How much of the curve's parameter it takes.</param>
internal readonly record struct CurvePiece(Vector3 Start, Vector3 End, Vector3 StartTangent, Vector3 EndTangent, double Length, double BendRadius, double ParameterSpan)
{
    /// <summary>Whether it is circular.</summary>
    public bool IsArc => BendRadius > 0;

    /// <summary>Angle of an arc [rad]; 0 for a straight piece.</summary>
    public double Sweep => IsArc ? Length / BendRadius : 0;

    /// <summary>The same piece run through the other way.</summary>
    public CurvePiece Reversed => new(End, Start, -EndTangent, -StartTangent, Length, BendRadius, ParameterSpan);

    /// <summary>A straight piece; null when its ends are one point.</summary>
    public static CurvePiece? Line(Vector3 start, Vector3 end, double span)
    {
        var along = end - start;
        return along.TryNormalize(out var unit) ? new CurvePiece(start, end, unit, unit, along.Length, 0, span) : null;
    }

    /// <summary>The arc through three points in this order; null when they lie on a line.</summary>
    public static CurvePiece? Arc(Vector3 start, Vector3 middle, Vector3 end)
    {
        // Centre of the circle through three points, by barycentric weights of the triangle.
        var (a, b) = (start - end, middle - end);
        var cross = a.Cross(b);
        var square = cross.Dot(cross);
        if (!(square > 1e-30)) return null;

        var centre = end + 1 / (2 * square) * (a.Dot(a) * b - b.Dot(b) * a).Cross(cross);
        var radius = (start - centre).Length;
        if (!(middle - start).Cross(end - middle).TryNormalize(out var normal)) return null;

        // Counter-clockwise about that normal the arc runs start, middle, end.
        var sweep = Math.Atan2((start - centre).Cross(end - centre).Dot(normal), (start - centre).Dot(end - centre));
        if (sweep <= 0) sweep += 2 * Math.PI;

        _ = normal.Cross(start - centre).TryNormalize(out var startTangent);
        _ = normal.Cross(end - centre).TryNormalize(out var endTangent);
        return new CurvePiece(start, end, startTangent, endTangent, radius * sweep, radius, 1);
    }
}
