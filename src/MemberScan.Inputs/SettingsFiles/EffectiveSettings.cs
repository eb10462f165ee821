using System.Collections.Immutable;
using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Materials;
using MemberScan.Inputs.SettingsFiles.Forces;
using MemberScan.Inputs.SettingsFiles.Limits;
using MemberScan.Model.Forces;
using MemberScan.Model.Presets;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>Lays settings out as lines of key and canonical text: numbers in shortest round-trip form, free text in quotes, maps in ordinal order.</summary>
internal static class EffectiveSettings
{
    private const string None = "none";

    public static ImmutableArray<EffectiveSetting> Of(Settings settings)
    {
        var lines = ImmutableArray.CreateBuilder<EffectiveSetting>();
        var forces = settings.Reading.Forces;
        foreach (var (key, value) in LimitLines.Basis(settings.Limits)) Add(key, value);
        Add("candidates.always", Listed(settings.Reading.Candidates.Always));
        Add("candidates.withBarBodyOrForces", Listed(settings.Reading.Candidates.WithBarBodyOrForces));
        Add("sections.recogniseMeshes", settings.Reading.RecogniseMeshes ? "true" : "false");
        if (settings.Reading.Roles.Select(OfRole).SequenceEqual(RoleRule.Default.Select(OfRole))) Add("roles", "the shipped rules");
        else AddAll("roles", settings.Reading.Roles.Select((rule, i) => ($"[{i + 1}]", OfRole(rule))));
        Add("forces.from", forces.From.SequenceEqual(ForceRules.AutomaticOrder) ? "auto" : Listed([.. forces.From.Select(SettingKeys.Sources.WordOf)]));
        Add("forces.convention", SettingKeys.Conventions.WordOf(forces.Convention));
        Add("forces.components", SettingKeys.Components.WordOf(forces.Components));
        Add("forces.turnDegrees", Number(forces.TurnDegrees));
        AddAll("forces.turnDegreesByMember", forces.TurnDegreesByMember.OrderBy(turn => turn.Key, StringComparer.Ordinal)
            .Select(turn => ($"[{Quoted(turn.Key)}]", Number(turn.Value))));
        Add("forces.missingComponents", SettingKeys.MissingComponents.WordOf(forces.MissingComponentsAreZero));
        Add("forces.unknownMembers", SettingKeys.UnknownMembers.WordOf(forces.ListUnknownMembers));
        AddAll("forces.kinds", forces.Kinds.Select((kind, i) => ($"[{i + 1}]", $"{Quoted(kind.Pattern)} {SettingKeys.Kinds.WordOf(kind.Kind)}")));
        Add("forces.torsion", ForceKeys.TorsionAxes.WordOf(forces.Torsion));
        Add("forces.missingCoefficients", ForceKeys.MissingCoefficients.WordOf(forces.MissingCoefficientsAreOne));
        Add("forces.caseCoefficients", ForceKeys.CaseCoefficientWords.WordOf(forces.CaseCoefficients));
        AddAll("forces.combinations", forces.Combinations.Select((combination, i) => ($"[{i + 1}]", ForceTexts.Of(combination))));
        Add("forces.combinationSets", Listed([.. forces.CombinationSets.Select(ForceKeys.Sets.WordOf)]));
        AddAll("forces.caseTags", forces.CaseTags.Select((tag, i) => ($"[{i + 1}]", $"{Quoted(tag.Pattern)} {ForceKeys.Tags.WordOf(tag.Tag)}")));
        AddAll("forces.propertySets", forces.PropertySets.Select((mapping, i) => ($"[{i + 1}]", ForceTexts.Of(mapping))));
        lines.Add(new EffectiveSetting("forces.kindOfAll", KindOfAll(forces.KindOfAll), forces.KindOfAll == SituationKind.Unknown));
        AddAll("loads.presets", settings.Loads.Presets.Select((use, i) => ($"[{i + 1}]", OfUse(use))));
        Add("loads.contactTolerance", $"{Number(settings.Loads.ContactTolerance)} m");
        foreach (var type in SettingKeys.UnitTypes)
            Add($"units.{type}", settings.Reading.MissingUnits.TryGetValue(type, out var factor) ? $"{Number(factor)} {SiUnit(type)}" : None);
        AddAll("materials.grades", settings.Reading.Grades.Where(grade => !GradeTable.Shipped.Grades.Contains(grade))
            .Select((grade, i) => ($"[{i + 1}]", OfGrade(grade))));
        Add("materials.poisson", Number(settings.Reading.DefaultPoisson));
        foreach (var (key, value) in LimitLines.Further(settings.Limits)) Add(key, value);
        AddAll("rules", settings.LimitRules.Select((rule, i) => ($"[{i + 1}]", LimitLines.Of(rule, settings.Limits))));
        Add("display", SettingKeys.Displays.WordOf(settings.Display));
        return lines.ToImmutable();

        void Add(string key, string value) => lines.Add(new EffectiveSetting(key, value, !settings.Given.Contains(key)));

        void AddAll(string key, IEnumerable<(string Suffix, string Value)> entries)
        {
            var count = lines.Count;
            foreach (var (suffix, value) in entries) lines.Add(new EffectiveSetting(key + suffix, value, !settings.Given.Contains(key)));
            if (lines.Count == count) Add(key, None);
        }
    }

    private static string OfGrade(Grade grade)
    {
        var yields = string.Join(", ", grade.Yields.Select(range =>
            (double.IsInfinity(range.UpTo) ? "" : $"up to {Number(range.UpTo)} m ") + $"{Number(range.Yield)} Pa"));
        return $"{Quoted(grade.Name)}, pattern {Quoted(grade.Pattern)}, {Quoted(grade.Standard)}, {yields}, E {Number(grade.Modulus)} Pa, "
            + $"ν {Number(grade.Poisson)}, {(grade.IsSteel ? "steel" : "no steel")}{(grade.FromMemory ? ", from memory" : "")}";
    }

    private static string OfUse(PresetUse use) => $"{Quoted(use.Preset.Name)} for {Quoted(use.Members)}"
        + (use.Pipe is { } pipe ? $", pipe {Quoted(pipe.Name)} schedule {Quoted(pipe.Schedule)}, {use.Contents}, spacing {Number(use.Spacing)} m" : "");

    private static string OfRole(RoleRule rule)
    {
        string[] parts =
        [
            Quoted(rule.Role), rule.Classes.IsEmpty ? "" : $"classes {string.Join(' ', rule.Classes.Select(Quoted))}",
            rule.PredefinedTypes.IsEmpty ? "" : $"predefined types {string.Join(' ', rule.PredefinedTypes.Select(Quoted))}",
            rule.NamePattern.Length == 0 ? "" : $"name {Quoted(rule.NamePattern)}",
            rule is { MinSlopeDegrees: <= 0, MaxSlopeDegrees: >= 90 } ? "" : $"slope {Number(rule.MinSlopeDegrees)} to {Number(rule.MaxSlopeDegrees)} degrees",
            rule.MinSlenderness <= 0 ? "" : $"slenderness from {Number(rule.MinSlenderness)}",
        ];
        return string.Join(", ", parts.Where(part => part.Length > 0));
    }

    private static string Listed(ImmutableArray<string> names) => names.IsEmpty ? None : string.Join(", ", names);

    private static string KindOfAll(SituationKind kind) => kind == SituationKind.Unknown ? None : SettingKeys.Kinds.WordOf(kind);

    private static string SiUnit(string type) => SettingKeys.UnitQuantities[type] switch
    {
        Quantity.Length => "m",
        Quantity.Force => "N",
        Quantity.Moment => "N·m",
        _ => "Pa",
    };

    internal static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    internal static string Quoted(string text) => $"\"{JsonEncodedText.Encode(text, JavaScriptEncoder.UnsafeRelaxedJsonEscaping)}\"";
}
