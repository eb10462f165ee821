namespace MemberScan.Mechanics.Sections;

/// <summary>Why dimensions do not make a cross-section.</summary>
/// <param name="Kind">Which rule they break.</param>
/// <param name="Message">One sentence with the dimensions in mm.</param>
public sealed record SectionFault(SectionFaultKind Kind, string Message);
