using System.Collections.Immutable;
using System.Text.RegularExpressions;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;

namespace MemberScan.Ifc.Members;

/// <summary>Guesses what a member is for by a list of rules; only ever shown as a guess.</summary>
internal sealed class RoleGuess
{
    /// <summary>The role of a member that no rule fits.</summary>
    public const string Otherwise = "member";

    /// <summary>Longest name that patterns are searched in [characters].</summary>
    private const int LongestName = 1_000;

    // Patterns are matched in linear time; this only bounds what a settings file could ask for.
    private static readonly TimeSpan s_patience = TimeSpan.FromSeconds(10);

    private readonly ImmutableArray<(RoleRule Rule, Regex? Pattern)> _rules;

    public RoleGuess(ImmutableArray<RoleRule> rules) => _rules =
    [
        .. rules.Select(rule => (rule, rule.NamePattern.Length == 0 ? null : new Regex(
            rule.NamePattern, RegexOptions.IgnoreCase | RegexOptions.CultureInvariant | RegexOptions.NonBacktracking, s_patience))),
    ];

    /// <summary>The role in one word.</summary>
    /// <param name="element">The element.</param>
    /// <param name="axes">Its axes in project coordinates; null when they are not known.</param>
    /// <param name="slenderness">Length over largest extent of the section [-]; null when it is not known.</param>
    public string Of(ElementIdentity element, MemberAxes? axes, double? slenderness)
    {
        // The first of the element's own names that says something to any rule is the one that all rules search.
        string[] names = [Searched(element.Name), Searched(element.TypeName), Searched(element.Assembly), Searched(element.Layer)];
        var name = Array.Find(names, n => _rules.Any(r => r.Pattern?.IsMatch(n) == true)) ?? names[1];

        double? slope = axes is null ? null : Math.Asin(Math.Clamp(Math.Abs(axes.X.Z), 0, 1)) * 180 / Math.PI;
        foreach (var (rule, pattern) in _rules)
        {
            if (pattern is not null && !pattern.IsMatch(name)) continue;
            if (Fits(rule, element, slope, slenderness)) return rule.Role;
        }

        return Otherwise;
    }

    private static bool Fits(RoleRule rule, ElementIdentity element, double? slope, double? slenderness)
    {
        bool Is(string className) => string.Equals(className, element.Class, StringComparison.OrdinalIgnoreCase)
            || string.Equals(className + "StandardCase", element.Class, StringComparison.OrdinalIgnoreCase);

        return (rule.Classes.IsEmpty || rule.Classes.Any(Is))
            && (rule.PredefinedTypes.IsEmpty || rule.PredefinedTypes.Contains(element.PredefinedType, StringComparer.OrdinalIgnoreCase))
            && (rule.MinSlopeDegrees <= 0 || slope >= rule.MinSlopeDegrees - 1e-9)
            && (rule.MaxSlopeDegrees >= 90 || slope <= rule.MaxSlopeDegrees + 1e-9)
            && (rule.MinSlenderness <= 0 || slenderness >= rule.MinSlenderness);
    }

    private static string Searched(string text) => text.Length <= LongestName ? text : text[..LongestName];
}
