namespace MemberScan.Screening.Record.Given;

/// <summary>One unit of the model.</summary>
/// <param name="UnitType">Unit type, such as <c>LENGTHUNIT</c>.</param>
/// <param name="Text">The unit in words, such as "millimetre" or "pound-force"; "missing" if none.</param>
/// <param name="Factor">One unit = factor × SI unit; 0 if missing.</param>
/// <param name="Source">STEP id, or "settings".</param>
public sealed record UnitLine(string UnitType, string Text, double Factor, string Source);
