namespace MemberScan.Model.Frames;

/// <summary>A linear elastic material.</summary>
/// <param name="Name">Name, for messages.</param>
/// <param name="E">Modulus of elasticity [Pa], above zero.</param>
/// <param name="G">Shear modulus [Pa], above zero.</param>
/// <param name="UnitWeight">Weight per volume [N/m³], ≥ 0.</param>
/// <param name="Expansion">Thermal expansion [1/K].</param>
/// <param name="Yield">Yield strength fy [Pa], above zero; null where it is not known.</param>
public sealed record FrameMaterial(string Name, double E, double G, double UnitWeight = 0, double Expansion = 0, double? Yield = null);
