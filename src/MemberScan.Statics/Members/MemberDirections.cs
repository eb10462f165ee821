using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Members;

/// <summary>The local axes of a member.</summary>
internal static class MemberDirections
{
    /// <summary>Axes by a z direction, or global +Z square to x and for an upright member global +X; null where z runs along x.</summary>
    public static MemberAxes? Of(Vector3 start, Vector3 along, Vector3? towardsZ) => towardsZ is { } z
        ? z.IsFinite ? MemberAxes.From(start, along, z) : null
        : MemberAxes.From(start, along, Vector3.UnitZ) ?? MemberAxes.From(start, along, Vector3.UnitX);
}
