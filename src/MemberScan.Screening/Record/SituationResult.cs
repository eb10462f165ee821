using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Screening.Record;

/// <summary>One situation on one candidate.</summary>
/// <param name="Situation">Name.</param>
/// <param name="Kind">"service", "design" or "unknown".</param>
/// <param name="ActsInFull">False for a single load case.</param>
/// <param name="Utilization">Largest utilization found [-]; null when none could be evaluated.</param>
/// <param name="Note">What bars a verdict in this situation, or what was inferred; empty if nothing.</param>
/// <param name="ForcesSource">File and lines, or STEP ids.</param>
/// <param name="Conversion">How the values were turned into local axes and convention; empty when they were so already.</param>
/// <param name="Stations">Section forces along the member, local axes, positive face.</param>
public sealed record SituationResult(
    string Situation, string Kind, bool ActsInFull, double? Utilization, string Note, string ForcesSource, string Conversion,
    ImmutableArray<ForceStation> Stations);
