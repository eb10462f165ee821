using System.Collections.Immutable;
using MemberScan.Checks;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Record.Lines;

/// <summary>One check of a candidate, in the situation and at the station where it is worst.</summary>
public sealed record CheckLine
{
    /// <summary>Stable key, such as <c>en-6.2.5-y</c>; by it the check is switched off.</summary>
    public required string Key { get; init; }

    /// <summary>What is held against what, in words.</summary>
    public required string Name { get; init; }

    /// <summary>Whether it decides; otherwise it is information beside the verdict.</summary>
    public required bool Decides { get; init; }

    /// <summary>Standard, edition and clause; marked where from memory.</summary>
    public required string Clause { get; init; }

    /// <summary>Name of the situation.</summary>
    public required string Situation { get; init; }

    /// <summary>"service", "design" or "unknown".</summary>
    public required string Kind { get; init; }

    /// <summary>Distance from the member's start [m]; null for a check of the whole member.</summary>
    public required double? Station { get; init; }

    /// <summary>Utilization in root form [-]; null when the check was not made.</summary>
    public required double? Utilization { get; init; }

    /// <summary>Why the check was not made; null when it was.</summary>
    public required Reason? Reason { get; init; }

    /// <summary>The calculation line by line; empty when the check was not made, and for checks of members within their limit.</summary>
    public required ImmutableArray<TraceLine> Trace { get; init; }
}
