namespace MemberScan.Mechanics.Properties;

/// <summary>Elastic moduli at the extreme fibres: second moment over distance from the centroid.</summary>
/// <param name="YTop">Iy over the distance of the fibre farthest towards +z [m³].</param>
/// <param name="YBottom">Iy over the distance of the fibre farthest towards −z [m³].</param>
/// <param name="ZRight">Iz over the distance of the fibre farthest towards +y [m³].</param>
/// <param name="ZLeft">Iz over the distance of the fibre farthest towards −y [m³].</param>
public readonly record struct ExtremeModuli(double YTop, double YBottom, double ZRight, double ZLeft);
