using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics;

/// <summary>How a node moves.</summary>
/// <param name="Shift">Shift [m], global axes.</param>
/// <param name="Turn">Small turn [rad], global axes, right-handed.</param>
public readonly record struct NodeDisplacement(Vector3 Shift, Vector3 Turn);
