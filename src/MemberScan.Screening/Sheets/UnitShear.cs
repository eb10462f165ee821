namespace MemberScan.Screening.Sheets;

/// <summary>The shear stresses of one point under unit forces, each alone.</summary>
/// <param name="VyXY">τxy of Vy = 1 N [Pa/N].</param>
/// <param name="VyXZ">τxz of Vy = 1 N [Pa/N].</param>
/// <param name="VzXY">τxy of Vz = 1 N [Pa/N].</param>
/// <param name="VzXZ">τxz of Vz = 1 N [Pa/N].</param>
/// <param name="TXY">τxy of T = 1 N·m [Pa/(N·m)].</param>
/// <param name="TXZ">τxz of T = 1 N·m [Pa/(N·m)].</param>
public readonly record struct UnitShear(double VyXY, double VyXZ, double VzXY, double VzXZ, double TXY, double TXZ);
