namespace MemberScan.Foundation.Geometry;

/// <summary>An affine map of space: <c>p' = Origin + X·p.X + Y·p.Y + Z·p.Z</c>.</summary>
/// <param name="Origin">Image of the origin [m].</param>
/// <param name="X">Image of the x unit vector.</param>
/// <param name="Y">Image of the y unit vector.</param>
/// <param name="Z">Image of the z unit vector.</param>
public sealed record Transform3(Vector3 Origin, Vector3 X, Vector3 Y, Vector3 Z)
{
    /// <summary>The map that changes nothing.</summary>
    public static Transform3 Identity { get; } = new(Vector3.Zero, Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ);

    /// <summary>Volume factor; negative when the map mirrors.</summary>
    public double Determinant => X.Cross(Y).Dot(Z);

    /// <summary>Maps a point.</summary>
    public Vector3 Point(Vector3 p) => Origin + Direction(p);

    /// <summary>Maps a direction (no shift).</summary>
    public Vector3 Direction(Vector3 d) => d.X * X + d.Y * Y + d.Z * Z;

    /// <summary>The map "first <paramref name="inner"/>, then this".</summary>
    public Transform3 After(Transform3 inner)
    {
        ArgumentNullException.ThrowIfNull(inner);
        return new(Point(inner.Origin), Direction(inner.X), Direction(inner.Y), Direction(inner.Z));
    }
}
