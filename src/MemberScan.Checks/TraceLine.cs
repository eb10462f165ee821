namespace MemberScan.Checks;

/// <summary>One line of a calculation: what a reader needs to follow it by hand.</summary>
/// <param name="Symbol">Symbol, such as <c>σvM</c>.</param>
/// <param name="Formula">How it is found, with numbers put in; empty for an input.</param>
/// <param name="Value">Value in SI.</param>
/// <param name="Unit">SI unit of the value: <c>m</c>, <c>m²</c>, <c>m³</c>, <c>m⁴</c>, <c>N</c>, <c>N·m</c>, <c>Pa</c>, <c>-</c>.</param>
/// <param name="Source">Clause, or where the input comes from.</param>
public sealed record TraceLine(string Symbol, string Formula, double Value, string Unit, string Source);
