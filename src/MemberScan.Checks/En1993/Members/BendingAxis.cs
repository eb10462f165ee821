using MemberScan.Checks.Stability;

namespace MemberScan.Checks.En1993.Members;

/// <summary>What a member has about one of its principal axes.</summary>
/// <param name="Name">The member's own axis, y or z.</param>
/// <param name="I">Second moment [m⁴].</param>
/// <param name="Wel">Elastic modulus [m³].</param>
/// <param name="Wpl">Plastic modulus [m³].</param>
/// <param name="Length">Buckling length for bending about it.</param>
internal sealed record BendingAxis(string Name, double I, double Wel, double Wpl, BucklingLength Length);
