namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>An edge between two patches of a closed surface.</summary>
/// <param name="From">First point, as the left patch runs round.</param>
/// <param name="To">Second point.</param>
/// <param name="Left">Patch on whose left side of travel, seen from outside, the edge bounds.</param>
/// <param name="Right">The other patch.</param>
/// <param name="Bend">Sine of the angle between the patches' outward normals, positive where the edge sticks out [-].</param>
internal readonly record struct SurfaceEdge(int From, int To, int Left, int Right, double Bend);
