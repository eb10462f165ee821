using System.Collections.Immutable;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Frames;

/// <summary>A load case or combination of an analysis model, in the order of the frame's situations.</summary>
/// <param name="Situation">The situation that results are given for.</param>
/// <param name="Group">STEP id of its load group.</param>
/// <param name="Unusable">Why its loads are not all known; null when they are.</param>
/// <param name="Notes">What a reader must know of its loads, one sentence each.</param>
public sealed record FrameCase(Situation Situation, ulong Group, Reason? Unusable, ImmutableArray<string> Notes);
