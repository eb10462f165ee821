using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Frames;

/// <summary>What holds a node; at most one for each node.</summary>
/// <param name="Node">Number of the node in <see cref="Frame.Nodes"/>, from 0.</param>
/// <param name="Restraints">How it is held, in the axes of the support.</param>
public sealed record FrameSupport(int Node, Restraints Restraints)
{
    /// <summary>Direction of the support's x axis; global X unless the support is skewed.</summary>
    public Vector3 X { get; init; } = Vector3.UnitX;

    /// <summary>A direction on the side of the support's y axis, not along x; global Y unless the support is skewed. z is x × y.</summary>
    public Vector3 Y { get; init; } = Vector3.UnitY;
}
