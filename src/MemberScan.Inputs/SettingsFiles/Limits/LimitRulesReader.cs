using System.Collections.Immutable;
using MemberScan.Inputs.Json;
using MemberScan.Model.Limits;

namespace MemberScan.Inputs.SettingsFiles.Limits;

/// <summary>Reads the <c>rules</c> of a settings file: limits of some members in place of those of all.</summary>
internal sealed class LimitRulesReader(JsonValues values)
{
    /// <summary>Reads the rules.</summary>
    /// <param name="list">The list.</param>
    /// <param name="all">The limits of all members, with which each rule begins.</param>
    public ImmutableArray<LimitRule> Read(JsonItem list, LimitSet all)
    {
        var rules = ImmutableArray.CreateBuilder<LimitRule>();
        var number = 0;
        foreach (var item in values.List(list, "rules"))
        {
            var path = $"rules[{++number}]";
            if (number > LimitKeys.MostEntries)
            {
                values.Fail(InputCodes.OutOfRange, item, $"rules has more than {LimitKeys.MostEntries} entries; join some of their patterns");
                break;
            }

            if (values.Has(item, path, "when", "set")) rules.Add(OfOne(item, path, all));
        }

        return rules.ToImmutable();
    }

    private LimitRule OfOne(JsonItem item, string path, LimitSet set)
    {
        var when = new MemberSelector(null, null, null, null);
        foreach (var (key, _, value) in values.Object(item, path, LimitKeys.Rule))
        {
            if (key == "when") when = When(value, $"{path}.when");
            else set = Set(value, $"{path}.set", set);
        }

        return new LimitRule(when, set);
    }

    private MemberSelector When(JsonItem item, string path)
    {
        var when = new MemberSelector(null, null, null, null);
        foreach (var (key, _, value) in values.Object(item, path, LimitKeys.When))
        {
            var pattern = values.Text(value, $"{path}.{key}");
            when = key switch
            {
                "role" => when with { Role = pattern },
                "class" => when with { Class = pattern },
                "name" => when with { Name = pattern },
                _ => when with { Storey = pattern },
            };
        }

        if (when is { Role: null, Class: null, Name: null, Storey: null })
            values.Fail(InputCodes.KeyMissing, item, $"{path} names no members; give one of {string.Join(", ", LimitKeys.When)}");
        return when;
    }

    private LimitSet Set(JsonItem item, string path, LimitSet set)
    {
        var reader = new LimitSetReader(values, new HashSet<string>(StringComparer.Ordinal), $"{path}.");
        foreach (var (key, _, value) in values.Object(item, path, LimitKeys.Set))
        {
            set = key switch
            {
                "basis" => reader.Basis(value, set),
                "checks" => reader.Checks(value, set),
                "stability" => reader.Stability(value, set),
                "threads" => reader.Threads(value, set),
                "welds" => reader.Welds(value, $"{path}.welds", set),
                _ => reader.Deflection(value, $"{path}.deflection", set),
            };
        }

        return set;
    }
}
