using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Frames.Loads;

/// <summary>A load at a point of a member's axis.</summary>
/// <param name="Member">Number of the member, from 0.</param>
/// <param name="At">Distance from the flexible start [m], from 0 to the flexible length.</param>
/// <param name="Force">Force [N].</param>
/// <param name="Moment">Moment [N·m], right-handed.</param>
/// <param name="Axes">Axes of both; projected is the same as global.</param>
public readonly record struct MemberPointLoad(int Member, double At, Vector3 Force, Vector3 Moment, LoadAxes Axes);
