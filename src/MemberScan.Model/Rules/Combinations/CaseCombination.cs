using System.Collections.Immutable;
using MemberScan.Model.Forces;

namespace MemberScan.Model.Rules.Combinations;

/// <summary>A combination of load cases by their names.</summary>
/// <param name="Name">Name of the combination.</param>
/// <param name="Kind">Service or design.</param>
/// <param name="Factors">Its cases; each once.</param>
/// <param name="Rule">Where the factors come from, in words: the settings, or standard, clause and mark.</param>
public sealed record CaseCombination(string Name, SituationKind Kind, ImmutableArray<CaseFactor> Factors, string Rule);
