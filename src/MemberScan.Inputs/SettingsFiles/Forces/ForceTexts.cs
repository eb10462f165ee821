using MemberScan.Model.Forces;
using MemberScan.Model.Rules;
using MemberScan.Model.Rules.Combinations;
using MemberScan.Model.Rules.PropertySets;

namespace MemberScan.Inputs.SettingsFiles.Forces;

/// <summary>Combinations and mappings as canonical text.</summary>
internal static class ForceTexts
{
    public static string Of(CaseCombination combination) =>
        $"{EffectiveSettings.Quoted(combination.Name)} {SettingKeys.Kinds.WordOf(combination.Kind)}: "
        + string.Join(" + ", combination.Factors.OrderBy(f => f.Case, StringComparer.Ordinal).Select(f => $"{EffectiveSettings.Number(f.Factor)} {EffectiveSettings.Quoted(f.Case)}"));

    public static string Of(PropertySetMapping mapping)
    {
        string[] parts =
        [
            EffectiveSettings.Quoted(mapping.Set),
            mapping.Situation is null ? "" : $"situation {EffectiveSettings.Quoted(mapping.Situation)}",
            mapping.Kind == SituationKind.Unknown ? "" : SettingKeys.Kinds.WordOf(mapping.Kind),
            mapping.IsLoadCase ? "load cases" : "",
            mapping.IsLinear ? "linear" : "",
            mapping.Convention == ForceConvention.PositiveFace ? "" : SettingKeys.StatedConventions.WordOf(mapping.Convention),
            .. mapping.Components.OrderBy(c => c.Component).Select(c => $"{c.Component} {EffectiveSettings.Quoted(c.Property)}{(c.Unit.Length == 0 ? "" : $" in {c.Unit}")}"),
            $"stations {ForceKeys.StationSources.WordOf(mapping.Stations)}",
            mapping.StationProperty.Length == 0 ? "" : $"of {EffectiveSettings.Quoted(mapping.StationProperty)}",
            mapping.StationFactor is { } factor ? $"in {EffectiveSettings.Number(factor)} {(mapping.StationIsShare ? "of the length" : "m")}" : "",
            .. mapping.StationWords.OrderBy(w => w.Key, StringComparer.Ordinal).Select(w => $"{EffectiveSettings.Quoted(w.Key)} at {EffectiveSettings.Number(w.Value)}"),
        ];
        return string.Join(", ", parts.Where(p => p.Length > 0));
    }
}
