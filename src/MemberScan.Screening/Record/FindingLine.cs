using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Screening.Record;

/// <summary>A finding about an input.</summary>
/// <param name="Code">Stable code.</param>
/// <param name="Severity">How much it weighs.</param>
/// <param name="Message">One sentence.</param>
/// <param name="Place">Where the first was met, in words; empty for the whole input.</param>
/// <param name="Count">How often it was met.</param>
public sealed record FindingLine(string Code, Severity Severity, string Message, string Place, int Count);
