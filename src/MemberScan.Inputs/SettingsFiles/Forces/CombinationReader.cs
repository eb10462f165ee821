using System.Collections.Immutable;
using MemberScan.Inputs.Json;
using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Inputs.SettingsFiles.Forces;

/// <summary>Reads combinations of load cases, tags of cases and the names of generated sets.</summary>
internal sealed class CombinationReader(JsonValues values)
{
    /// <summary>Most combinations in a settings file.</summary>
    public const int MostCombinations = 2000;

    /// <summary>Most cases of one combination.</summary>
    public const int MostCases = 100;

    /// <summary>Reads the combinations; wrong ones are errors and left out.</summary>
    public ImmutableArray<CaseCombination> Combinations(JsonItem list, string path)
    {
        var combinations = ImmutableArray.CreateBuilder<CaseCombination>();
        var names = new HashSet<string>(StringComparer.Ordinal);
        foreach (var (item, at) in Numbered(list, path, MostCombinations))
        {
            if (OfOne(item, at) is not { } combination) continue;
            if (names.Add(combination.Name)) combinations.Add(combination);
            else values.Fail(InputCodes.EntryDoubled, item, $"{at} has the name {Excerpt.Of(combination.Name)} of an earlier one; give each a name of its own");
        }

        return combinations.ToImmutable();
    }

    /// <summary>Reads the tags; wrong ones are errors and left out.</summary>
    public ImmutableArray<CaseTag> Tags(JsonItem list, string path)
    {
        var tags = ImmutableArray.CreateBuilder<CaseTag>();
        foreach (var (item, at) in Numbered(list, path, MostCombinations))
        {
            if (!values.Has(item, at, "pattern", "tag")) continue;

            string? pattern = null, tag = null;
            foreach (var (key, _, value) in values.Object(item, at, ForceKeys.Tag))
            {
                if (key == "pattern") pattern = values.Text(value, $"{at}.pattern");
                else tag = values.Word(value, $"{at}.tag", ForceKeys.Tags.Words);
            }

            if (pattern is null || tag is null) continue;
            if (tags.Any(earlier => string.Equals(earlier.Pattern, pattern, StringComparison.OrdinalIgnoreCase)))
                values.Fail(InputCodes.EntryDoubled, item, $"{at} has the pattern {Excerpt.Of(pattern)} of an earlier one; keep one of them");
            else
                tags.Add(new CaseTag(pattern, ForceKeys.Tags.Of(tag)));
        }

        return tags.ToImmutable();
    }

    /// <summary>Reads the names of sets; each once.</summary>
    public ImmutableArray<CombinationSet> Sets(JsonItem list, string path)
    {
        var sets = ImmutableArray.CreateBuilder<CombinationSet>();
        foreach (var (item, at) in Numbered(list, path, ForceKeys.Sets.Words.Length))
        {
            if (values.Word(item, at, ForceKeys.Sets.Words) is not { } word) continue;
            if (sets.Contains(ForceKeys.Sets.Of(word))) values.Fail(InputCodes.EntryDoubled, item, $"{at} stands in the list already; keep it once");
            else sets.Add(ForceKeys.Sets.Of(word));
        }

        return sets.ToImmutable();
    }

    private CaseCombination? OfOne(JsonItem item, string at)
    {
        if (!values.Has(item, at, "name", "kind", "factors")) return null;

        string? name = null, kind = null;
        var factors = ImmutableArray<CaseFactor>.Empty;
        foreach (var (key, _, value) in values.Object(item, at, ForceKeys.Combination))
        {
            switch (key)
            {
                case "name": name = values.Text(value, $"{at}.name"); break;
                case "kind": kind = values.Word(value, $"{at}.kind", SettingKeys.Kinds.Words); break;
                default: factors = Factors(value, $"{at}.factors"); break;
            }
        }

        return name is null || kind is null || factors.IsEmpty ? null : new CaseCombination(name, SettingKeys.Kinds.Of(kind), factors, "settings");
    }

    private ImmutableArray<CaseFactor> Factors(JsonItem item, string path)
    {
        var factors = ImmutableArray.CreateBuilder<CaseFactor>();
        foreach (var (key, _, value) in values.Object(item, path))
        {
            if (factors.Count == MostCases)
            {
                values.Fail(InputCodes.OutOfRange, value, $"{path} has more than {MostCases} cases; split the combination");
                break;
            }

            if (values.Number(value, $"{path}.{Excerpt.Of(key)}", ForceKeys.CaseFactor.Least, ForceKeys.CaseFactor.Most) is { } factor) factors.Add(new CaseFactor(key, factor));
        }

        if (factors.Count == 0 && item.Kind == System.Text.Json.JsonValueKind.Object && item.Entries.IsEmpty)
            values.Fail(InputCodes.KeyMissing, item, $"{path} names no case; give each case of the combination its factor, such as {{\"G\": 1.35}}");
        return factors.ToImmutable();
    }

    private IEnumerable<(JsonItem Item, string At)> Numbered(JsonItem list, string path, int most)
    {
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            if (++number > most)
            {
                values.Fail(InputCodes.OutOfRange, item, $"{path} has more than {most} entries; take some out");
                yield break;
            }

            yield return (item, $"{path}[{number}]");
        }
    }
}
