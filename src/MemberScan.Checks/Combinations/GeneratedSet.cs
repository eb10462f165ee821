using System.Collections.Immutable;
using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Checks.Combinations;

/// <summary>The combinations of a standard over given cases.</summary>
/// <param name="Combinations">The combinations, each once.</param>
/// <param name="LeftOut">Names of cases that no combination of the set holds.</param>
/// <param name="IsTooLarge">Whether there would be more than <see cref="CombinationRules.MostCombinations"/>; there are then none.</param>
public sealed record GeneratedSet(ImmutableArray<CaseCombination> Combinations, ImmutableArray<string> LeftOut, bool IsTooLarge);
