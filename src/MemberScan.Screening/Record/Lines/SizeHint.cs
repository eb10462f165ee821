namespace MemberScan.Screening.Record.Lines;

/// <summary>The nearest size at which the stress criterion holds under the same forces: a hint, no design.</summary>
/// <param name="Dimension">The dimension that is changed, in words.</param>
/// <param name="Value">Its value, rounded up to a hundredth of a millimetre [m].</param>
/// <param name="Section">The section of that size.</param>
public sealed record SizeHint(string Dimension, double Value, string Section);
