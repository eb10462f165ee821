namespace MemberScan.Screening.Record.Lines;

/// <summary>A check in one situation, as it stands in the order of the worst.</summary>
/// <param name="Key">Key of the check.</param>
/// <param name="Name">What is held against what, in words.</param>
/// <param name="Situation">Name of the situation.</param>
/// <param name="Station">Distance from the member's start [m]; null for a check of the whole member.</param>
/// <param name="Utilization">Utilization [-].</param>
public sealed record RankedLine(string Key, string Name, string Situation, double? Station, double Utilization);
