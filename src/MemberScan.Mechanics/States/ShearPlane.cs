using MemberScan.Foundation.Geometry;

namespace MemberScan.Mechanics.States;

/// <summary>The face on which the shear stress of a point is largest.</summary>
/// <param name="Shear">The shear stress on it <c>(σ1 − σ3)/2</c> [Pa], ≥ 0.</param>
/// <param name="Normal">The normal stress on it σ/2 [Pa].</param>
/// <param name="Angle">Angle of the outward normal from x towards the direction of the section's shear stress [rad], in [−π/4, π/4]; the other such face stands square to it.</param>
/// <param name="Direction">The outward normal as a unit vector in the member's axes [-].</param>
public readonly record struct ShearPlane(double Shear, double Normal, double Angle, Vector3 Direction);
