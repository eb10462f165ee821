namespace MemberScan.Reporting.Space;

/// <summary>One step of the scale of utilization.</summary>
/// <param name="To">Largest utilization that it holds [-]; infinite for the last.</param>
/// <param name="Words">The range in words and numbers.</param>
/// <param name="Colour">Colour as <c>#rrggbb</c>.</param>
public sealed record ScaleStep(double To, string Words, string Colour);
