using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames.Loads;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Frames.Loading;

/// <summary>An action on a point connection as the model has it, without factors; SI.</summary>
/// <param name="Action">STEP id of the action.</param>
/// <param name="Node">Number of the node, from 0.</param>
/// <param name="Groups">STEP ids of the load groups that hold the action.</param>
/// <param name="Force">Force [N], project axes.</param>
/// <param name="Moment">Moment [N·m], project axes.</param>
/// <param name="Movements">Displacements forced upon the support.</param>
/// <param name="Source">Class and STEP id, in words.</param>
/// <param name="Unusable">Why it cannot be used; null when it can. It still acts.</param>
internal sealed record NodeAction(
    ulong Action, int Node, ImmutableArray<ulong> Groups, Vector3 Force, Vector3 Moment, ImmutableArray<SupportMovement> Movements, string Source, Reason? Unusable);
