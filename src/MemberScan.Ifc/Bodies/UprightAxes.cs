using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Bodies;

/// <summary>Axes of bars whose body shows no axes of its own: z = global +Z square to x, for an upright member global +X.</summary>
internal static class UprightAxes
{
    /// <summary>Axes at a start.</summary>
    /// <param name="start">Start in object coordinates [m].</param>
    /// <param name="tangent">Direction there.</param>
    /// <param name="toProject">From object to project coordinates.</param>
    public static MemberAxes At(Vector3 start, Vector3 tangent, Transform3 toProject) =>
        MemberAxes.From(start, tangent, TowardsZ(tangent, toProject))
        ?? MemberAxes.From(start, tangent, Math.Abs(tangent.X) < 0.9 * tangent.Length ? Vector3.UnitX : Vector3.UnitY)!;

    /// <summary>The direction, in object coordinates, that z is nearest to.</summary>
    public static Vector3 TowardsZ(Vector3 tangent, Transform3 toProject)
    {
        var (up, east) = (Up(toProject), new Vector3(toProject.X.X, toProject.Y.X, toProject.Z.X));
        _ = tangent.TryNormalize(out var x);
        return x.Cross(up).Length < 1e-3 ? east : up;
    }

    /// <summary>Global +Z as seen from the object: its placement is a rotation, so the transposed map turns it back.</summary>
    public static Vector3 Up(Transform3 toProject) => new(toProject.X.Z, toProject.Y.Z, toProject.Z.Z);
}
