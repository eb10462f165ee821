using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Frames.Loads;

/// <summary>A load on a node.</summary>
/// <param name="Node">Number of the node, from 0.</param>
/// <param name="Force">Force [N], global axes.</param>
/// <param name="Moment">Moment [N·m], global axes, right-handed.</param>
public readonly record struct NodeLoad(int Node, Vector3 Force, Vector3 Moment);
