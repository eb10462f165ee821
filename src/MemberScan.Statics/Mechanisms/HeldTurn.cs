using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Mechanisms;

/// <summary>A turn of a node that no member and no support resists: it is held, and must stay without load.</summary>
/// <param name="Node">Number of the node.</param>
/// <param name="Axis">Axis of the turn, in the axes of the node.</param>
internal readonly record struct HeldTurn(int Node, Vector3 Axis);
