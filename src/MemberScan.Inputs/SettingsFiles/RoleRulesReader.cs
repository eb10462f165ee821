using System.Collections.Immutable;
using MemberScan.Inputs.Json;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>Reads the <c>roles</c> part of a settings file.</summary>
internal sealed class RoleRulesReader(JsonValues values)
{
    /// <summary>Most rules.</summary>
    public const int MostRules = 500;

    /// <summary>Reads the rules; wrong ones are errors and left out.</summary>
    public ImmutableArray<RoleRule> Read(JsonItem list)
    {
        var rules = ImmutableArray.CreateBuilder<RoleRule>();
        var number = 0;
        foreach (var item in values.List(list, "roles"))
        {
            if (++number > MostRules)
            {
                values.Fail(InputCodes.OutOfRange, item, $"roles has more than {MostRules} rules; join some of their patterns");
                break;
            }

            if (OfOne(item, $"roles[{number}]") is { } rule) rules.Add(rule);
        }

        return rules.ToImmutable();
    }

    private RoleRule? OfOne(JsonItem item, string path)
    {
        if (!values.Has(item, path, "role")) return null;

        var rule = new RoleRule("");
        foreach (var (key, _, value) in values.Object(item, path, SettingKeys.RoleEntry))
        {
            var at = $"{path}.{key}";
            rule = key switch
            {
                "role" => rule with { Role = Word(value, at) },
                "classes" => rule with { Classes = Texts(value, at) },
                "predefinedTypes" => rule with { PredefinedTypes = Texts(value, at) },
                "namePattern" => rule with { NamePattern = Pattern(value, at) },
                "minSlopeDegrees" => rule with { MinSlopeDegrees = Number(value, at, SettingKeys.Slope, 0) },
                "maxSlopeDegrees" => rule with { MaxSlopeDegrees = Number(value, at, SettingKeys.Slope, 90) },
                _ => rule with { MinSlenderness = Number(value, at, SettingKeys.Slenderness, 0) },
            };
        }

        if (rule.MinSlopeDegrees > rule.MaxSlopeDegrees)
            values.Fail(InputCodes.OutOfRange, item, $"{path} fits no slope: minSlopeDegrees is over maxSlopeDegrees");
        return rule;
    }

    private string Word(JsonItem item, string path)
    {
        if (values.Text(item, path) is not { } text) return "";
        if (text.Length <= 40 && text.All(letter => char.IsLetterOrDigit(letter) || letter is ' ' or '-')) return text;

        values.Fail(InputCodes.TextUnusable, item, $"{path} is {Excerpt.Of(text)}; give a word of letters, at most 40");
        return "";
    }

    private ImmutableArray<string> Texts(JsonItem list, string path) =>
        [.. values.List(list, path).Select(item => values.Text(item, path)).OfType<string>()];

    private string Pattern(JsonItem item, string path)
    {
        if (values.Text(item, path) is not { } pattern) return "";
        if (values.PatternFault(pattern) is not { } fault) return pattern;

        values.Fail(InputCodes.PatternUnusable, item, $"{path}: {fault}");
        return "";
    }

    private double Number(JsonItem item, string path, (double Least, double Most) range, double otherwise) =>
        values.Number(item, path, range.Least, range.Most) ?? otherwise;
}
