namespace MemberScan.Reporting.Drawing;

/// <summary>A contact in a sketch.</summary>
/// <param name="Letter">Its letter.</param>
/// <param name="At">Place along the member, from its start [m].</param>
/// <param name="Other">Key of the other member.</param>
/// <param name="Gap">Distance of the surfaces [m]; below zero where they overlap.</param>
/// <param name="IsCertain">Whether the gap is within the tolerance.</param>
public sealed record ContactMark(char Letter, double At, string Other, double Gap, bool IsCertain);
