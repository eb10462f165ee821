namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>What the records of a material say beyond E, ν and strength; null where they say nothing usable.</summary>
/// <param name="ShearModulus">G [Pa].</param>
/// <param name="Density">Mass per volume [kg/m³].</param>
/// <param name="Expansion">Thermal expansion [1/K].</param>
internal sealed record ElasticFacts(double? ShearModulus, double? Density, double? Expansion)
{
    /// <summary>Nothing known.</summary>
    public static ElasticFacts None { get; } = new(null, null, null);
}
