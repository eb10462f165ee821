using System.Collections.Immutable;
using MemberScan.Model.Verdicts;

namespace MemberScan.Reporting.Page;

/// <summary>The candidates that were not checked for one reason.</summary>
/// <param name="Code">The reason.</param>
/// <param name="Members">The candidates, those of known utilization first.</param>
public sealed record ReasonGroup(ReasonCode Code, ImmutableArray<PlacedMember> Members);
