using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Inputs.Decisions;

/// <summary>What a person decided about a member.</summary>
/// <param name="Member">Key or Tag of the member.</param>
/// <param name="Decision">The decision in that person's words.</param>
/// <param name="By">Who decided.</param>
/// <param name="Date">When, as <c>yyyy-MM-dd</c>.</param>
/// <param name="Note">Note; empty if none.</param>
/// <param name="Place">Where it stands in its file.</param>
public sealed record ReviewDecision(string Member, string Decision, string By, string Date, string Note, SourceSpan Place);
