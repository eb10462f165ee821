using System.Collections.Frozen;
using System.Collections.Immutable;
using MemberScan.Inputs.Json;
using MemberScan.Inputs.Materials;
using MemberScan.Inputs.Presets;
using MemberScan.Inputs.SettingsFiles.Forces;
using MemberScan.Inputs.SettingsFiles.Limits;
using MemberScan.Inputs.Values;
using MemberScan.Model.Limits;
using MemberScan.Model.Presets;
using MemberScan.Model.Rules;

namespace MemberScan.Inputs.SettingsFiles;

/// <summary>Turns the JSON of a settings file into settings, beginning with the defaults.</summary>
internal sealed class SettingsReader(JsonValues values)
{
    private readonly ImmutableHashSet<string>.Builder _given = ImmutableHashSet.CreateBuilder<string>(StringComparer.Ordinal);
    private LimitSet _limits = new();
    private ImmutableArray<LimitRule> _rules = [];
    private ReadingRules _reading = new() { Grades = GradeTable.Shipped.Grades };
    private LoadRules _loads = new();
    private DisplayUnits _display = DisplayUnits.Si;

    /// <summary>Reads the settings; of meaning only when no error was added.</summary>
    public Settings Read(JsonItem root)
    {
        var limits = new LimitSetReader(values, _given, "");
        JsonItem? rules = null;
        foreach (var (key, _, item) in values.Object(root, "", SettingKeys.Root))
        {
            switch (key)
            {
                case "$schema": _ = values.Text(item, key); break;
                case "basis": _limits = limits.Basis(item, _limits); break;
                case "candidates": ReadCandidates(item); break;
                case "sections": ReadSections(item); break;
                case "roles": ReadRoles(item); break;
                case "forces": _reading = _reading with { Forces = new ForceRulesReader(values, _given).Read(item, _reading.Forces) }; break;
                case "loads": _loads = new LoadRulesReader(values, _given).Read(item, _loads); break;
                case "units": ReadUnits(item); break;
                case "materials": ReadMaterials(item, limits); break;
                case "checks": _limits = limits.Checks(item, _limits); break;
                case "stability": _limits = limits.Stability(item, _limits); break;
                case "threads": _limits = limits.Threads(item, _limits); break;
                case "deflection": _limits = limits.Deflection(item, key, _limits); break;
                case "rules": rules = item; break;
                default: _display = Choose(item, key, SettingKeys.Displays, _display); break;
            }
        }

        // A rule begins with the limits of all, wherever it stands in the file.
        if (rules is not null) ReadRules(rules);
        return new Settings
        {
            Basis = _limits.Basis,
            LengthFactor = _limits.Stability.LengthFactor,
            Limits = _limits,
            LimitRules = _rules,
            Reading = _reading,
            Loads = _loads,
            Display = _display,
            Given = _given.ToImmutable(),
        };
    }

    private void ReadRules(JsonItem list)
    {
        _given.Add("rules");
        _rules = new LimitRulesReader(values).Read(list, _limits);
    }

    private void ReadCandidates(JsonItem item)
    {
        var seen = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);
        var rules = _reading.Candidates;
        foreach (var (key, _, list) in values.Object(item, "candidates", SettingKeys.Candidates))
        {
            var path = $"candidates.{key}";
            var names = ClassNames(list, path, seen);
            rules = key == "always" ? rules with { Always = names } : rules with { WithBarBodyOrForces = names };
            _given.Add(path);
        }

        // A class given in one list leaves the default of the other.
        if (!_given.Contains("candidates.always")) rules = rules with { Always = [.. rules.Always.Where(name => !seen.ContainsKey(name))] };
        if (!_given.Contains("candidates.withBarBodyOrForces"))
            rules = rules with { WithBarBodyOrForces = [.. rules.WithBarBodyOrForces.Where(name => !seen.ContainsKey(name))] };
        _reading = _reading with { Candidates = rules };
    }

    private ImmutableArray<string> ClassNames(JsonItem list, string path, Dictionary<string, string> seen)
    {
        var known = CandidateRules.Default.Always.Concat(CandidateRules.Default.WithBarBodyOrForces).ToArray();
        var names = ImmutableArray.CreateBuilder<string>();
        foreach (var item in values.List(list, path))
        {
            if (values.Text(item, path) is not { } name) continue;
            if (name.Length < 4 || !name.StartsWith("Ifc", StringComparison.OrdinalIgnoreCase) || !name.All(char.IsAsciiLetterOrDigit))
                values.Fail(InputCodes.WordUnknown, item, $"{Excerpt.Of(name)} in {path} is not a class name; {Near(name, known)}");
            else if (!seen.TryAdd(name, path))
                values.Fail(InputCodes.EntryDoubled, item, $"{Excerpt.Of(name)} stands in {seen[name]} already; keep it once");
            else
                names.Add(name);
        }

        return names.ToImmutable();
    }

    private static string Near(string name, string[] known) => NearestName.Of(name, known) is { } nearest
        ? $"did you mean '{nearest}'?"
        : "write it as the schema does, such as IfcMember";

    private void ReadSections(JsonItem item)
    {
        foreach (var (key, _, value) in values.Object(item, "sections", SettingKeys.Sections))
        {
            _given.Add($"sections.{key}");
            _reading = _reading with { RecogniseMeshes = values.Flag(value, $"sections.{key}") ?? false };
        }
    }

    // The list takes the place of the shipped rules.
    private void ReadRoles(JsonItem list)
    {
        _given.Add("roles");
        _reading = _reading with { Roles = new RoleRulesReader(values).Read(list) };
    }

    private void ReadUnits(JsonItem item)
    {
        var factors = new Dictionary<string, double>(StringComparer.Ordinal);
        foreach (var (key, _, value) in values.Object(item, "units", SettingKeys.UnitTypes))
        {
            if (values.Text(value, $"units.{key}") is not { } symbol) continue;
            if (UnitText.TryRead(symbol, SettingKeys.UnitQuantities[key], out var unit, out var error)) factors[key] = unit.Factor;
            else values.Fail(InputCodes.ValueUnit, value, $"units.{key}: {error}");
            _given.Add($"units.{key}");
        }

        _reading = _reading with { MissingUnits = factors.ToFrozenDictionary(StringComparer.Ordinal) };
    }

    private void ReadMaterials(JsonItem item, LimitSetReader limits)
    {
        foreach (var (key, _, value) in values.Object(item, "materials", SettingKeys.Materials))
        {
            var path = $"materials.{key}";
            if (key == "grades")
            {
                _reading = _reading with { Grades = [.. GradeReader.Read(value, path, values), .. GradeTable.Shipped.Grades] };
                _given.Add(path);
            }
            else if (key == "welds")
            {
                _limits = limits.Welds(value, path, _limits);
            }
            else
            {
                _reading = _reading with { DefaultPoisson = Number(value, path, (0, GradeReader.LargestPoisson), _reading.DefaultPoisson) };
            }
        }
    }

    private double Number(JsonItem item, string path, (double Least, double Most) range, double otherwise)
    {
        _given.Add(path);
        return values.Number(item, path, range.Least, range.Most) ?? otherwise;
    }

    private T Choose<T>(JsonItem item, string path, WordTable<T> table, T otherwise)
        where T : struct
    {
        _given.Add(path);
        return values.Word(item, path, table.Words) is { } word ? table.Of(word) : otherwise;
    }
}
