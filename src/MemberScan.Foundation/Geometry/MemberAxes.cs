namespace MemberScan.Foundation.Geometry;

/// <summary>
/// The right-handed local axes of a member: x along it from start to end, y and z in its cross-section
/// (an IFC profile's X axis is the member's y, the profile's Y axis its z; neither is called strong).
/// </summary>
/// <param name="Origin">Start of the member in project coordinates [m].</param>
/// <param name="X">Unit vector along the member.</param>
/// <param name="Y">Unit vector, <c>z × x</c>.</param>
/// <param name="Z">Unit vector.</param>
public sealed record MemberAxes(Vector3 Origin, Vector3 X, Vector3 Y, Vector3 Z)
{
    /// <summary>Axes from the direction of the member and a vector on the side of z; null when the two are parallel.</summary>
    public static MemberAxes? From(Vector3 origin, Vector3 along, Vector3 towardsZ)
    {
        if (!along.TryNormalize(out var x)) return null;
        if (!towardsZ.TryNormalize(out var hint)) return null;

        var across = hint - hint.Dot(x) * x;
        if (across.Length < 1e-6) return null;

        _ = across.TryNormalize(out var z);
        return new MemberAxes(origin, x, z.Cross(x), z);
    }

    /// <summary>Components of a vector along these axes.</summary>
    public Vector3 Components(Vector3 global) => new(global.Dot(X), global.Dot(Y), global.Dot(Z));
}
