using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes;

/// <summary>The two ends of a mesh along a direction.</summary>
/// <param name="Axis">Direction from start to end, a unit vector.</param>
/// <param name="IsEnd">For each point whether it belongs to the end; otherwise to the start.</param>
/// <param name="AtStart">Height of the start's middle along the axis [m].</param>
/// <param name="AtEnd">Height of the end's middle along the axis [m].</param>
/// <param name="Deviation">Largest distance of points from their plane, along the axis [m].</param>
/// <param name="IsOblique">Whether the planes may slope.</param>
internal sealed record EndPlanes(Vector3 Axis, ImmutableArray<bool> IsEnd, double AtStart, double AtEnd, double Deviation, bool IsOblique = false)
{
    /// <summary>Distance of the ends' middles [m].</summary>
    public double Length => AtEnd - AtStart;
}
