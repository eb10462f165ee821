namespace MemberScan.Mechanics.Edges;

/// <summary>A re-entrant corner: a point where it is sharp, an arc where it is rounded.</summary>
/// <param name="Curve">The point or the arc.</param>
/// <param name="Reach">Half a wall [m]: what lies nearer does not decide.</param>
/// <param name="IsFillet">Whether it is rounded.</param>
internal readonly record struct ReentrantCorner(EdgeCurve Curve, double Reach, bool IsFillet)
{
    /// <summary>Distance of a point from the corner [m].</summary>
    public double Distance(double y, double z)
    {
        var at = Curve.At(Curve.Nearest(y, z));
        return double.Hypot(at.Y - y, at.Z - z);
    }
}
