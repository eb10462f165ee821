using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Checks.Combinations;

/// <summary>Generates the combinations of a standard from tagged load cases.</summary>
/// <remarks>
/// All permanent cases act together with one factor. Live cases are parts of one load: every choice of them is tried. Cases of any other
/// action are alternatives to each other, of which one acts at a time; a seismic case acts in both directions.
/// </remarks>
public static class CombinationRules
{
    /// <summary>Most combinations of one set.</summary>
    public const int MostCombinations = 2000;

    /// <summary>Most live cases of which every choice is tried; of more of them, all together and each alone.</summary>
    public const int MostLiveChoices = 6;

    /// <summary>The combinations of a set.</summary>
    /// <param name="set">The set.</param>
    /// <param name="cases">The cases, each once; those tagged <see cref="ActionTag.None"/> take no part.</param>
    public static GeneratedSet Generate(CombinationSet set, IReadOnlyList<TaggedCase> cases)
    {
        ArgumentNullException.ThrowIfNull(cases);
        var (rules, standard, remark, kind) = set switch
        {
            CombinationSet.En1990Eq610 => (En1990.Eq610(), En1990.Standard, En1990.Remark, SituationKind.Design),
            CombinationSet.En1990Eq610ab => (En1990.Eq610ab(), En1990.Standard, En1990.Remark, SituationKind.Design),
            CombinationSet.Asce7Strength => (Asce7.Strength(), Asce7.Standard, Asce7.Remark, SituationKind.Design),
            CombinationSet.Asce7Allowable => (Asce7.Allowable(), Asce7.Standard, Asce7.Remark, SituationKind.Service),
            _ => throw new ArgumentOutOfRangeException(nameof(set)),
        };

        var combinations = new Dictionary<string, CaseCombination>(StringComparer.Ordinal);
        foreach (var rule in rules)
            foreach (var factors in Factors(rule, cases))
            {
                if (combinations.Count >= MostCombinations) return new GeneratedSet([], [], IsTooLarge: true);

                var sum = string.Join(" + ", factors.Select(f => string.Create(CultureInfo.InvariantCulture, $"{f.Factor:0.######} {f.Case}")));
                _ = combinations.TryAdd(sum, new CaseCombination($"{standard} {rule.Equation}: {sum}", kind, factors, $"{standard} {rule.Equation}; {remark}"));
            }

        var used = combinations.Values.SelectMany(c => c.Factors).Select(f => f.Case).ToHashSet(StringComparer.Ordinal);
        return new GeneratedSet([.. combinations.Values], [.. cases.Where(c => !used.Contains(c.Name)).Select(c => c.Name)], IsTooLarge: false);
    }

    private static IEnumerable<ImmutableArray<CaseFactor>> Factors(CombinationRule rule, IReadOnlyList<TaggedCase> cases)
    {
        ImmutableArray<CaseFactor> permanent = [.. cases.Where(c => c.Tag == ActionTag.Permanent).Select(c => new CaseFactor(c.Name, rule.Permanent))];
        IEnumerable<ImmutableArray<CaseFactor>> sums = [permanent];
        foreach (var place in rule.Places)
        {
            var choices = Choices(place, cases).ToList();
            sums = sums.SelectMany(sum => choices.Select(choice => sum.AddRange(choice)));
        }

        return sums.Where(sum => !sum.IsEmpty);
    }

    private static IEnumerable<ImmutableArray<CaseFactor>> Choices(CombinationRule.Place place, IReadOnlyList<TaggedCase> cases)
    {
        if (!place.IsRequired) yield return [];

        foreach (var (tag, factor) in place.Choices)
        {
            var names = cases.Where(c => c.Tag == tag).Select(c => c.Name).ToList();
            foreach (var chosen in tag == ActionTag.Live ? Subsets(names) : names.Select(n => ImmutableArray.Create(n)))
            {
                yield return [.. chosen.Select(n => new CaseFactor(n, factor))];
                if (tag == ActionTag.Seismic) yield return [.. chosen.Select(n => new CaseFactor(n, -factor))];
            }
        }
    }

    private static IEnumerable<ImmutableArray<string>> Subsets(List<string> names)
    {
        if (names.Count > MostLiveChoices)
        {
            yield return [.. names];
            foreach (var name in names) yield return [name];
            yield break;
        }

        for (var mask = 1; mask < 1 << names.Count; mask++) yield return [.. names.Where((_, i) => (mask >> i & 1) == 1)];
    }
}
