namespace MemberScan.Screening.Record.Given;

/// <summary>A limit in force.</summary>
/// <param name="Kind">"service" or "design".</param>
/// <param name="Text">The criterion in words with its factor, or "no limit".</param>
/// <param name="Clause">Standard, edition and clause; marked where from memory.</param>
/// <param name="IsDefault">Whether it is the default.</param>
public sealed record BasisLine(string Kind, string Text, string Clause, bool IsDefault);
