namespace MemberScan.Ifc.Materials;

/// <summary>A number of a property in SI, or why its unit is not known.</summary>
/// <param name="Value">Value in SI; null when its unit is missing or it is no number.</param>
/// <param name="Source">Property, set and STEP id, in words.</param>
/// <param name="Fault">What is missing; empty when nothing is.</param>
/// <param name="Written">The number as it stands in the file, in its own unit.</param>
internal sealed record PropertyValue(double? Value, string Source, string Fault, double Written = double.NaN);
