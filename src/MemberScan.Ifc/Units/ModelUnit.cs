namespace MemberScan.Ifc.Units;

/// <summary>The unit in use for one unit type.</summary>
/// <param name="UnitType">Unit type, such as <c>LENGTHUNIT</c>.</param>
/// <param name="Text">The unit in words.</param>
/// <param name="Factor">One unit = factor × SI unit; null when it cannot be converted.</param>
/// <param name="Source">STEP id, or "settings".</param>
public sealed record ModelUnit(string UnitType, string Text, double? Factor, string Source);
