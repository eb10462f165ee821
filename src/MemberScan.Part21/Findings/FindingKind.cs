using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Findings;

/// <summary>A kind of finding about the text of a file.</summary>
/// <param name="Code">Stable code.</param>
/// <param name="Severity">How much it weighs.</param>
/// <param name="Message">What was met and what was done; the place goes into the span, so that equal findings are counted together.</param>
/// <param name="IsDamage">Whether something was passed over or had to be repaired.</param>
/// <param name="EndsReading">Whether the file then counts as not read to its end.</param>
internal sealed record FindingKind(string Code, Severity Severity, string Message, bool IsDamage = true, bool EndsReading = false);
