namespace MemberScan.Ifc.WriteBack;

/// <summary>One property of the results.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Measure">Its measure type, upper case.</param>
/// <param name="Text">Its text; empty for a number.</param>
/// <param name="Number">Its number in SI; null for a text, or where its unit is missing.</param>
public sealed record ElementResult(string Name, string Measure, string Text, double? Number);
