namespace MemberScan.Screening.Sheets;

/// <summary>A node of a sample grid. Beside the material σ goes on as the plane it is, and the shear stress is that of the nearest edge, so that contours reach it.</summary>
/// <param name="Y">From the centroid along y [m].</param>
/// <param name="Z">From the centroid along z [m].</param>
/// <param name="IsInside">Whether it lies in the material; only there the stresses are those of the field.</param>
/// <param name="Depth">Distance from the nearest edge [m], ≥ 0.</param>
/// <param name="ShearY">y of the point of the material whose shear stress it takes [m]; its own inside.</param>
/// <param name="ShearZ">z of that point [m].</param>
public readonly record struct SamplePoint(double Y, double Z, bool IsInside, double Depth, double ShearY, double ShearZ);
