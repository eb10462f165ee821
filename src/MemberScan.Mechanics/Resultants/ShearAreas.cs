namespace MemberScan.Mechanics.Resultants;

/// <summary>Shear areas of a section by energy, <c>V²/∫τ² dA</c>: what a frame needs for shear deformation.</summary>
/// <remarks>
/// They belong to one shear model and, in the elasticity model, to one ν. Of a section whose axes are not principal the two directions are
/// coupled; the coupling is left out. Other definitions (Cowper 1966) differ by some per cent.
/// </remarks>
/// <param name="Y">For a shear force along y, through the shear centre [m²].</param>
/// <param name="Z">For one along z [m²].</param>
public readonly record struct ShearAreas(double Y, double Z);
