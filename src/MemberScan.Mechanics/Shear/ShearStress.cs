namespace MemberScan.Mechanics.Shear;

/// <summary>The two shear stresses at a point of the cut face.</summary>
/// <param name="XY">τxy, along y on the face whose normal is +x [Pa].</param>
/// <param name="XZ">τxz, along z on the same face [Pa].</param>
internal readonly record struct ShearStress(double XY, double XZ);
