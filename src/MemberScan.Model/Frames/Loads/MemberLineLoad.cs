using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Frames.Loads;

/// <summary>A load along a stretch of a member's axis, changing linearly; a poly-linear one is several of them.</summary>
/// <param name="Member">Number of the member, from 0.</param>
/// <param name="From">Where it begins, distance from the flexible start [m]; null for the start.</param>
/// <param name="To">Where it ends, distance from the flexible start [m]; null for the end.</param>
/// <param name="ForceFrom">Force per length at its beginning [N/m].</param>
/// <param name="ForceTo">Force per length at its end [N/m].</param>
/// <param name="Axes">Axes of all components.</param>
public sealed record MemberLineLoad(int Member, double? From, double? To, Vector3 ForceFrom, Vector3 ForceTo, LoadAxes Axes)
{
    /// <summary>Moment per length at its beginning [N], right-handed.</summary>
    public Vector3 MomentFrom { get; init; }

    /// <summary>Moment per length at its end [N], right-handed.</summary>
    public Vector3 MomentTo { get; init; }
}
