using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Rules;
using MemberScan.Part21;

namespace MemberScan.Ifc.Units;

/// <summary>The units of a model's numbers. A unit type that neither model nor settings name has no factor: such values are not used.</summary>
public sealed class ModelUnits
{
    private static readonly string[] s_reported =
        ["LENGTHUNIT", "FORCEUNIT", "TORQUEUNIT", "PRESSUREUNIT", "MODULUSOFELASTICITYUNIT", "PLANEANGLEUNIT"];

    private readonly Dictionary<string, ModelUnit> _units;

    private ModelUnits(Dictionary<string, ModelUnit> units) => _units = units;

    /// <summary>Length [m per unit]; null if missing.</summary>
    public double? Length => FactorOf("LENGTHUNIT");

    /// <summary>Force [N per unit]; null if missing.</summary>
    public double? Force => FactorOf("FORCEUNIT");

    /// <summary>Moment of a force [N·m per unit]; null if missing.</summary>
    public double? Torque => FactorOf("TORQUEUNIT");

    /// <summary>Stress and strength [Pa per unit]; null if missing.</summary>
    public double? Pressure => FactorOf("PRESSUREUNIT");

    /// <summary>Modulus of elasticity [Pa per unit]; null if missing.</summary>
    public double? Modulus => FactorOf("MODULUSOFELASTICITYUNIT");

    /// <summary>Plane angle [rad per unit]; radian where the model names none.</summary>
    public double Angle => FactorOf("PLANEANGLEUNIT") ?? 1;

    /// <summary>The units that matter here, missing ones included, in a fixed order.</summary>
    public ImmutableArray<ModelUnit> Reported => [.. s_reported.Select(type => _units.GetValueOrDefault(type)
        ?? (type == "PLANEANGLEUNIT" ? new ModelUnit(type, "radian, the default", 1, "default") : new ModelUnit(type, "missing", null, "")))];

    /// <summary>Factor of a unit type; null if missing or not convertible.</summary>
    public double? FactorOf(string unitType) => _units.GetValueOrDefault(unitType)?.Factor;

    /// <summary>Whether the model itself, not the settings, names a convertible unit of a type.</summary>
    public bool NamedByModel(string unitType) => _units.GetValueOrDefault(unitType) is { Factor: not null, Source: not "settings" };

    internal static ModelUnits Read(Instances instances, UnitReader reader, ReadingRules rules, DiagnosticList diagnostics)
    {
        var units = new Dictionary<string, ModelUnit>(StringComparer.Ordinal);
        var assignments = Assignments(instances, diagnostics);
        if (assignments.Count > 0)
            foreach (var unit in instances.FollowAll(assignments[0][0]))
                Add(units, unit, reader, diagnostics);
        foreach (var further in assignments.Skip(1)) LeaveOutOther(units, further, instances, reader, diagnostics);

        foreach (var (type, factor) in rules.MissingUnits.OrderBy(pair => pair.Key, StringComparer.Ordinal))
        {
            if (units.GetValueOrDefault(type)?.Factor is not null)
                diagnostics.Add("IFC-0005", Severity.Warning, $"The settings name a unit for {type}, but the model has its own; the model's counts.");
            else
                units[type] = new ModelUnit(type, string.Create(CultureInfo.InvariantCulture, $"{factor:R} SI units"), factor, "settings");
        }

        return new ModelUnits(units);
    }

    /// <summary>The assignments of the projects, the first one first; a single assignment counts also where no project names it.</summary>
    private static List<Part21Record> Assignments(Instances instances, DiagnosticList diagnostics)
    {
        var named = new List<Part21Record>();
        foreach (var project in instances.File.RecordsOf("IFCPROJECT"))
            if (instances.TryFollow(project[8], out var assignment) && !named.Exists(a => a.Id == assignment.Id))
                named.Add(assignment);
        if (named.Count > 0) return named;

        var all = instances.File.RecordsOf("IFCUNITASSIGNMENT").Take(2).ToList();
        if (all.Count == 1) return all;

        diagnostics.Add("IFC-0003", Severity.Warning, "The project names no units; values whose unit is missing are not used.");
        return [];
    }

    // Which project a value belongs to is not followed up: a unit that two projects name differently is no unit.
    private static void LeaveOutOther(Dictionary<string, ModelUnit> units, Part21Record assignment, Instances instances, UnitReader reader, DiagnosticList diagnostics)
    {
        foreach (var unit in instances.FollowAll(assignment[0]))
        {
            var type = Instances.Literal(unit[1]);
            if (!units.TryGetValue(type, out var first) || first.Factor is not { } factor || (reader.Factor(unit) is { } other && Math.Abs(other - factor) <= 1e-9 * factor)) continue;

            diagnostics.Add("IFC-0007", Severity.Warning, $"Two projects in the file name different units for {type} ({first.Text}, {reader.Words(unit)}); values in this unit are not used. Export each project to a file of its own.", unit.Span);
            units[type] = first with { Text = $"{first.Text} or {reader.Words(unit)}", Factor = null };
        }
    }

    private static void Add(Dictionary<string, ModelUnit> units, Part21Record unit, UnitReader reader, DiagnosticList diagnostics)
    {
        var type = Instances.Literal(unit[1]);
        if (type.Length == 0 || type == "USERDEFINED" || unit.Keyword == "IFCMONETARYUNIT") return;

        if (units.ContainsKey(type))
        {
            diagnostics.Add("IFC-0006", Severity.Warning, $"The unit assignment names {type} twice; the first counts.", unit.Span);
            return;
        }

        units[type] = new ModelUnit(type, reader.Words(unit), reader.Factor(unit), string.Create(CultureInfo.InvariantCulture, $"#{unit.Id}"));
    }
}
