using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Statics;

/// <summary>Section forces and displacement at one place of a member; two at the same place are a jump, first left and then right of it.</summary>
/// <param name="X">Distance from the flexible start [m].</param>
/// <param name="Forces">Section forces; T about the shear centre.</param>
/// <param name="Displacement">Displacement of the axis [m] in the member's axes, that of the nodes included.</param>
public readonly record struct MemberStation(double X, SectionForces Forces, Vector3 Displacement);
