namespace MemberScan.Model.Members;

/// <summary>The material of a member and its values, each with its source.</summary>
/// <param name="Name">Name as written; empty if none.</param>
/// <param name="Yield">Yield strength fy [Pa].</param>
/// <param name="Modulus">Modulus of elasticity E [Pa]; missing does not bar a stress check.</param>
/// <param name="Poisson">Poisson's ratio ν [-]; a default is marked so in its source.</param>
/// <param name="IsSteel">Whether slenderness limits of steel walls apply.</param>
public sealed record Material(
    string Name, Finding<double> Yield, Finding<double> Modulus, Finding<double> Poisson, bool IsSteel)
{
    /// <summary>Density [kg/m³]; null where the model gives none.</summary>
    public Finding<double>? Density { get; init; }
}
