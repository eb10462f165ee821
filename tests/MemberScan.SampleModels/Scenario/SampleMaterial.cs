namespace MemberScan.SampleModels.Scenario;

/// <summary>A material of a sample and what a reviewer may take from it.</summary>
/// <param name="Name">Name as in the model.</param>
/// <param name="Strength">Yield strength that holds [Pa]; null when the material gives none.</param>
/// <param name="Modulus">Modulus of elasticity that holds [Pa]; null when the material gives none.</param>
/// <param name="InProperties">Whether both stand in the model; otherwise they follow from the grade's name.</param>
public sealed record SampleMaterial(string Name, double? Strength, double? Modulus, bool InProperties)
{
    /// <summary>Where the strength comes from, in words.</summary>
    public string StrengthSource => Strength is null ? "none" : InProperties ? "material properties" : "grade by name";
}
