using MemberScan.Foundation.Geometry;

namespace MemberScan.Screening.Presets;

/// <summary>An assumed load on a member, in its local axes.</summary>
/// <param name="Force">Force [N]; of a stretch per length [N/m].</param>
/// <param name="From">Where it begins [m]; of a point load its place.</param>
/// <param name="To">Where it ends [m]; the same as <paramref name="From"/> for a point load.</param>
internal readonly record struct AssumedLoad(Vector3 Force, double From, double To)
{
    /// <summary>Whether it acts at one place.</summary>
    public bool IsPoint => From.Equals(To);
}
