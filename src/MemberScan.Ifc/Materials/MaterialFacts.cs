using System.Collections.Immutable;

namespace MemberScan.Ifc.Materials;

/// <summary>What the records of one material say, before grades by name are tried.</summary>
/// <param name="Name">Name as written.</param>
/// <param name="Category">Category or structural grade as written; empty if none.</param>
/// <param name="Yield">Yield strength as found; null when no property names it.</param>
/// <param name="Modulus">Modulus as found; null when no property names it.</param>
/// <param name="Poisson">Poisson's ratio; null when no property names it.</param>
/// <param name="IsSteelByProperties">Whether properties of steel are given.</param>
/// <param name="IsConcreteByProperties">Whether properties of concrete are given.</param>
internal sealed record MaterialFacts(
    string Name, string Category, PropertyValue? Yield, PropertyValue? Modulus, PropertyValue? Poisson,
    bool IsSteelByProperties, bool IsConcreteByProperties)
{
    /// <summary>Density [kg/m³] as found; null when no property names it.</summary>
    public PropertyValue? Density { get; init; }

    /// <summary>Identifications and names of the classification references of the material.</summary>
    public ImmutableArray<string> Classifications { get; init; } = [];
}
