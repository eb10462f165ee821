using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>One row of a forces table, in SI, signs as the table has them (its convention is not applied here).</summary>
/// <param name="Line">Line of the file on which the row begins, from 1.</param>
/// <param name="Member">Key, GlobalId or Tag of the member, as written; not empty.</param>
/// <param name="Situation">Name of the situation, as written; not empty.</param>
/// <param name="Kind">Service or design; unknown where the table does not say.</param>
/// <param name="Station">Distance from the start [m], ≥ 0; or share of the length [-], in [0, 1].</param>
/// <param name="StationIsShare">Whether <paramref name="Station"/> is a share of the length.</param>
/// <param name="Forces">The six section forces; finite.</param>
public readonly record struct ForcesRow(
    int Line, string Member, string Situation, SituationKind Kind, double Station, bool StationIsShare, SectionForces Forces);
