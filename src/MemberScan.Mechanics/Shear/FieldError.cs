namespace MemberScan.Mechanics.Shear;

/// <summary>The error that is left in a numerical field, by comparison of its last two refinements.</summary>
/// <param name="Torsion">Change of the torsion constant [-].</param>
/// <param name="Stress">Largest change of a shear stress against the largest of its load, sharp re-entrant corners left out [-].</param>
public readonly record struct FieldError(double Torsion, double Stress);
