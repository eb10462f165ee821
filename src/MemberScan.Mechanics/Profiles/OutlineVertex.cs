namespace MemberScan.Mechanics.Profiles;

/// <summary>A corner of an outline and the way from it to the next one: straight, or an arc.</summary>
/// <param name="Y">Place along y [m].</param>
/// <param name="Z">Place along z [m].</param>
/// <param name="Bulge">
/// Tangent of a quarter of the arc's angle [-]: 0 for a straight line, positive where the arc bends to the left of its way, 1 for a half circle.
/// </param>
public readonly record struct OutlineVertex(double Y, double Z, double Bulge = 0);
