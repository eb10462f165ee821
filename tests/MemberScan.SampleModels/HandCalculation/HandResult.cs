namespace MemberScan.SampleModels.HandCalculation;

/// <summary>What the calculation by hand says of a member.</summary>
/// <param name="Verdict">WITHIN LIMIT, OVERSTRESSED or NOT CHECKED.</param>
/// <param name="ReasonCode">Why it is not checked, as spelled in the closed list; null otherwise.</param>
/// <param name="Utilization">Equivalent stress over its limit [-], the largest of all situations; null when there is none.</param>
/// <param name="Situation">Name of the governing situation; null when there is none.</param>
/// <param name="Station">Distance of the governing place from the member's start [m].</param>
/// <param name="Point">Stresses at the governing point.</param>
/// <param name="Line">The calculation in one line.</param>
public sealed record HandResult(
    string Verdict, string? ReasonCode, double? Utilization, string? Situation, double Station, HandPoint Point, string Line);
