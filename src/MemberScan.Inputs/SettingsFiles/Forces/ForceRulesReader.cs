using System.Collections.Frozen;
using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Inputs.Json;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.SettingsFiles.Forces;

/// <summary>Reads the <c>forces</c> part of a settings file.</summary>
internal sealed class ForceRulesReader(JsonValues values, ISet<string> given)
{
    public ForceRules Read(JsonItem item, ForceRules rules)
    {
        foreach (var (key, _, value) in values.Object(item, "forces", SettingKeys.Forces))
        {
            var path = $"forces.{key}";
            given.Add(path);
            rules = key switch
            {
                "from" => rules with { From = Sources(value, path) },
                "convention" => rules with { Convention = Choose(value, path, SettingKeys.Conventions) },
                "components" => rules with { Components = Choose(value, path, SettingKeys.Components) },
                "turnDegrees" => rules with { TurnDegrees = Turn(value, path) },
                "turnDegreesByMember" => rules with { TurnDegreesByMember = Turns(value, path) },
                "missingComponents" => rules with { MissingComponentsAreZero = Choose(value, path, SettingKeys.MissingComponents) },
                "unknownMembers" => rules with { ListUnknownMembers = Choose(value, path, SettingKeys.UnknownMembers) },
                "torsion" => rules with { Torsion = Choose(value, path, ForceKeys.TorsionAxes) },
                "missingCoefficients" => rules with { MissingCoefficientsAreOne = Choose(value, path, ForceKeys.MissingCoefficients) },
                "caseCoefficients" => rules with { CaseCoefficients = Choose(value, path, ForceKeys.CaseCoefficientWords) },
                "combinations" => rules with { Combinations = new CombinationReader(values).Combinations(value, path) },
                "combinationSets" => rules with { CombinationSets = new CombinationReader(values).Sets(value, path) },
                "caseTags" => rules with { CaseTags = new CombinationReader(values).Tags(value, path) },
                "propertySets" => rules with { PropertySets = new PropertySetReader(values).Read(value, path) },
                _ => rules with { Kinds = Kinds(value, path) },
            };
        }

        return rules;
    }

    private FrozenDictionary<string, double> Turns(JsonItem item, string path) => values.Object(item, path)
        .ToDictionary(entry => entry.Key, entry => Turn(entry.Value, $"{path}.{Excerpt.Of(entry.Key)}"), StringComparer.Ordinal)
        .ToFrozenDictionary(StringComparer.Ordinal);

    private ImmutableArray<ForceSource> Sources(JsonItem item, string path)
    {
        if (item.Kind == JsonValueKind.String)
        {
            _ = values.Word(item, path, ["auto"]);
            return ForceRules.AutomaticOrder;
        }

        var sources = ImmutableArray.CreateBuilder<ForceSource>();
        foreach (var entry in values.List(item, path))
        {
            if (values.Word(entry, path, SettingKeys.Sources.Words) is not { } word) continue;
            if (sources.Contains(SettingKeys.Sources.Of(word))) values.Fail(InputCodes.EntryDoubled, entry, $"{path} names {Excerpt.Of(word)} twice; keep one of them");
            else sources.Add(SettingKeys.Sources.Of(word));
        }

        if (item.Kind == JsonValueKind.Array && item.Items.IsEmpty) values.Fail(InputCodes.WordUnknown, item, $"{path} names no source; give at least one, or \"auto\"");
        return sources.ToImmutable();
    }

    private ImmutableArray<KindPattern> Kinds(JsonItem list, string path)
    {
        var kinds = ImmutableArray.CreateBuilder<KindPattern>();
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            var at = $"{path}[{++number}]";
            if (!values.Has(item, at, "pattern", "kind")) continue;

            string? pattern = null, kind = null;
            foreach (var (key, _, value) in values.Object(item, at, SettingKeys.KindEntry))
            {
                if (key == "pattern") pattern = values.Text(value, $"{at}.pattern");
                else kind = values.Word(value, $"{at}.kind", SettingKeys.Kinds.Words);
            }

            if (pattern is null || kind is null) continue;
            if (kinds.Any(earlier => string.Equals(earlier.Pattern, pattern, StringComparison.OrdinalIgnoreCase)))
                values.Fail(InputCodes.EntryDoubled, item, $"{at} has the pattern {Excerpt.Of(pattern)} of an earlier one; keep one of them");
            else
                kinds.Add(new KindPattern(pattern, SettingKeys.Kinds.Of(kind)));
        }

        return kinds.ToImmutable();
    }

    private double Turn(JsonItem item, string path) => values.Number(item, path, SettingKeys.Turn.Least, SettingKeys.Turn.Most) ?? 0;

    private T Choose<T>(JsonItem item, string path, WordTable<T> table)
        where T : struct => values.Word(item, path, table.Words) is { } word ? table.Of(word) : default;
}
