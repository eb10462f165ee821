namespace MemberScan.Mechanics.Stress;

/// <summary>How shear stresses are found.</summary>
public enum ShearModel
{
    /// <summary>The trade's hand calculation: <c>V·Q/(I·t)</c> for each shear force, plus torsion.</summary>
    Elementary,

    /// <summary>Saint-Venant flexure and torsion; depends on Poisson's ratio.</summary>
    Elasticity,
}
