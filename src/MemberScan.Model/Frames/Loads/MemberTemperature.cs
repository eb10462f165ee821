namespace MemberScan.Model.Frames.Loads;

/// <summary>A change of temperature over a member: <c>ΔT(y, z) = Uniform + GradientY·y + GradientZ·z</c>, y and z from the centroid.</summary>
/// <param name="Member">Number of the member, from 0.</param>
/// <param name="Uniform">At the axis [K].</param>
/// <param name="GradientY">Rise along local y [K/m].</param>
/// <param name="GradientZ">Rise along local z [K/m].</param>
public readonly record struct MemberTemperature(int Member, double Uniform, double GradientY, double GradientZ);
