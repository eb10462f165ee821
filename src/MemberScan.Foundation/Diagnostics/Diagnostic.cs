namespace MemberScan.Foundation.Diagnostics;

/// <summary>One finding about an input: what, how bad, where.</summary>
/// <param name="Code">Stable code such as <c>P21-0007</c>; one row in DEVELOPERS.md and one test each.</param>
/// <param name="Severity">How much it weighs.</param>
/// <param name="Message">One sentence that says what was met and what was done about it.</param>
/// <param name="Span">Where; <see langword="null"/> when it concerns the whole input.</param>
public sealed record Diagnostic(string Code, Severity Severity, string Message, SourceSpan? Span);
