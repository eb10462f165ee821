namespace MemberScan.Inputs.ForcesTables.Rows;

/// <summary>Where a field stands in the window of its row.</summary>
/// <param name="Start">First byte of its content, after the opening quote.</param>
/// <param name="Length">Bytes of its content, doubled quotes still doubled.</param>
/// <param name="IsQuoted">Whether it stands in quotes.</param>
internal readonly record struct CsvField(int Start, int Length, bool IsQuoted);
