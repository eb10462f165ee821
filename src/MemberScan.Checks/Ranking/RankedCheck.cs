namespace MemberScan.Checks.Ranking;

/// <summary>A check with the place where it was made.</summary>
/// <param name="Check">The check.</param>
/// <param name="Situation">Name of the situation.</param>
/// <param name="Station">Distance from the member's start [m]; null for a check of the whole member.</param>
public sealed record RankedCheck(NamedCheck Check, string Situation, double? Station);
