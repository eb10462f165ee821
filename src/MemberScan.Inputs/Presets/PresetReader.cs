using System.Collections.Immutable;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Model.Forces;
using MemberScan.Model.Presets;

namespace MemberScan.Inputs.Presets;

/// <summary>Reads load presets from JSON; wrong ones are errors and left out.</summary>
internal static class PresetReader
{
    public static readonly ImmutableArray<string> Keys =
        ["name", "kind", "standard", "clause", "occupancy", "situation", "concentrated", "line", "infill", "weightFactor", "added", "note", "fromMemory"];
    public static readonly ImmutableArray<string> Kinds = ["guard", "hanger", "sprinkler-hanger", "maintenance"];

    private static readonly (double Least, double Most) s_force = (1, 1e6), s_length = (0.01, 10);

    /// <summary>Reads the list under <c>presets</c>.</summary>
    public static ImmutableArray<LoadPreset> Read(JsonItem list, string path, JsonValues values)
    {
        var presets = ImmutableArray.CreateBuilder<LoadPreset>();
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            var at = $"{path}[{++number}]";
            if (OfOne(item, at, values) is not { } preset) continue;
            if (presets.Any(other => other.Name == preset.Name)) values.Fail(InputCodes.EntryDoubled, item, $"{at} has the name {Excerpt.Of(preset.Name)} of an earlier one; keep one of them");
            else presets.Add(preset);
        }

        return presets.ToImmutable();
    }

    private static LoadPreset? OfOne(JsonItem item, string path, JsonValues values)
    {
        if (!values.Has(item, path, "name", "kind", "standard", "clause", "occupancy", "situation", "fromMemory")) return null;

        var entries = values.Object(item, path, Keys).ToDictionary(e => e.Key, e => e.Value, StringComparer.Ordinal);
        string? Text(string key) => entries.TryGetValue(key, out var value) ? values.Text(value, $"{path}.{key}") : null;
        string? Word(string key, IReadOnlyCollection<string> words) => entries.TryGetValue(key, out var value) ? values.Word(value, $"{path}.{key}", words) : null;
        double? Force(string key) => entries.TryGetValue(key, out var value) ? values.Quantity(value, $"{path}.{key}", Quantity.Force, "200 lbf", s_force.Least, s_force.Most) : null;

        var (name, standard, clause, occupancy) = (Text("name"), Text("standard"), Text("clause"), Text("occupancy"));
        var (kind, situation) = (Word("kind", Kinds), Word("situation", ["service", "design"]));
        var fromMemory = values.Flag(entries["fromMemory"], $"{path}.fromMemory");
        if (name is null || standard is null || clause is null || occupancy is null || kind is null || situation is null || fromMemory is null) return null;

        var infill = entries.TryGetValue("infill", out var given) ? Pair(given, $"{path}.infill", "side", values) : null;
        return new LoadPreset
        {
            Name = name,
            Kind = (PresetKind)Kinds.IndexOf(kind),
            Standard = standard,
            Clause = clause,
            Occupancy = occupancy,
            FromMemory = fromMemory.Value,
            SituationKind = situation == "service" ? SituationKind.Service : SituationKind.Design,
            Concentrated = Force("concentrated"),
            Line = entries.TryGetValue("line", out var line) && Pair(line, $"{path}.line", "per", values) is { } load ? load.Force / load.Length : null,
            Infill = infill?.Force,
            InfillSide = infill?.Length,
            WeightFactor = entries.TryGetValue("weightFactor", out var factor) ? values.Number(factor, $"{path}.weightFactor", 1, 100) ?? 1 : 1,
            Added = Force("added") ?? 0,
            Note = Text("note") ?? "",
        };
    }

    private static (double Force, double Length)? Pair(JsonItem item, string path, string lengthKey, JsonValues values)
    {
        if (!values.Has(item, path, "force", lengthKey)) return null;

        double? force = null, length = null;
        foreach (var (key, _, value) in values.Object(item, path, ["force", lengthKey]))
        {
            if (key == "force") force = values.Quantity(value, $"{path}.force", Quantity.Force, "50 lbf", s_force.Least, s_force.Most);
            else length = values.Quantity(value, $"{path}.{key}", Quantity.Length, "1 ft", s_length.Least, s_length.Most);
        }

        return force is { } f && length is { } l ? (f, l) : null;
    }
}
