using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics;

/// <summary>What a support does to the frame, its springs included.</summary>
/// <param name="Force">Force of the support on the frame [N], global axes.</param>
/// <param name="Moment">Moment of the support on the frame [N·m], global axes, right-handed.</param>
public readonly record struct SupportReaction(Vector3 Force, Vector3 Moment);
