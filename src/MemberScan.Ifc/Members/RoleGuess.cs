using System.Collections.Immutable;
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

    /// <summary>Names whose patterns are kept.</summary>
    private const int MostKept = 10_000;

    private readonly ImmutableArray<RoleRule> _rules;
    private readonly Dictionary<string, bool[]> _fitting = new(StringComparer.Ordinal);

    public RoleGuess(ImmutableArray<RoleRule> rules) => _rules = rules;

    /// <summary>The role in one word.</summary>
    /// <param name="element">The element.</param>
    /// <param name="axes">Its axes in project coordinates; null when they are not known.</param>
    /// <param name="slenderness">Length over largest extent of the section [-]; null when it is not known.</param>
    public string Of(ElementIdentity element, MemberAxes? axes, double? slenderness)
    {
        // The first of the element's own names that says something to any rule is the one that all rules search.
        string[] names = [Searched(element.Name), Searched(element.TypeName), Searched(element.Assembly), Searched(element.Layer)];
        var name = Array.Find(names, n => Array.Exists(Fitting(n), fits => fits)) ?? names[1];
        var fitting = Fitting(name);

        double? slope = axes is null ? null : Math.Asin(Math.Clamp(Math.Abs(axes.X.Z), 0, 1)) * 180 / Math.PI;
        for (var i = 0; i < _rules.Length; i++)
        {
            if (_rules[i].NamePattern.Length > 0 && !fitting[i]) continue;
            if (Fits(_rules[i], element, slope, slenderness)) return _rules[i].Role;
        }

        return Otherwise;
    }

    // Which patterns a name fits; models give many elements the same few names.
    private bool[] Fitting(string name)
    {
        if (_fitting.TryGetValue(name, out var known)) return known;

        var fits = _rules.Select(rule => rule.NamePattern.Length > 0 && GradePattern.IsIn(rule.NamePattern, name)).ToArray();
        if (_fitting.Count < MostKept) _fitting[name] = fits;
        return fits;
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
