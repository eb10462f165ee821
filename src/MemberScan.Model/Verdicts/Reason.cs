namespace MemberScan.Model.Verdicts;

/// <summary>Why something could not be used or checked.</summary>
/// <param name="Code">The code from the closed list.</param>
/// <param name="Message">One sentence with what was met and where.</param>
public sealed record Reason(ReasonCode Code, string Message);
