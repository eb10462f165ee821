using System.Collections.Frozen;
using System.Collections.Immutable;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Rules.PropertySets;

namespace MemberScan.Inputs.SettingsFiles.Forces;

/// <summary>Reads the mappings of property sets to section forces.</summary>
internal sealed class PropertySetReader(JsonValues values)
{
    /// <summary>Most mappings in a settings file.</summary>
    public const int MostMappings = 100;

    /// <summary>What stands for the station in the name of a property.</summary>
    public const string Placeholder = "{station}";

    /// <summary>Reads the mappings; wrong ones are errors and left out.</summary>
    public ImmutableArray<PropertySetMapping> Read(JsonItem list, string path)
    {
        var mappings = ImmutableArray.CreateBuilder<PropertySetMapping>();
        var number = 0;
        foreach (var item in values.List(list, path))
        {
            if (++number > MostMappings)
            {
                values.Fail(InputCodes.OutOfRange, item, $"{path} has more than {MostMappings} mappings; join some of their patterns");
                break;
            }

            if (OfOne(item, $"{path}[{number}]") is { } mapping) mappings.Add(mapping);
        }

        return mappings.ToImmutable();
    }

    private PropertySetMapping? OfOne(JsonItem item, string path)
    {
        if (!values.Has(item, path, "set", "components", "stations")) return null;

        var mapping = new PropertySetMapping { Set = "", Components = [], Stations = StationSource.Constant };
        foreach (var (key, _, value) in values.Object(item, path, ForceKeys.PropertySet))
        {
            var at = $"{path}.{key}";
            mapping = key switch
            {
                "set" => mapping with { Set = values.Text(value, at) ?? "" },
                "situation" => mapping with { Situation = values.Text(value, at) },
                "kind" => values.Word(value, at, SettingKeys.Kinds.Words) is { } kind ? mapping with { Kind = SettingKeys.Kinds.Of(kind) } : mapping,
                "situations" => values.Word(value, at, ForceKeys.SituationWords.Words) is { } word ? mapping with { IsLoadCase = ForceKeys.SituationWords.Of(word) } : mapping,
                "results" => values.Word(value, at, ForceKeys.ResultWords.Words) is { } word ? mapping with { IsLinear = ForceKeys.ResultWords.Of(word) } : mapping,
                "convention" => values.Word(value, at, SettingKeys.StatedConventions.Words) is { } word ? mapping with { Convention = SettingKeys.StatedConventions.Of(word) } : mapping,
                "components" => mapping with { Components = Components(value, at) },
                "stations" => values.Word(value, at, ForceKeys.StationSources.Words) is { } word ? mapping with { Stations = ForceKeys.StationSources.Of(word) } : mapping,
                "station" => Station(mapping, value, at),
                _ => mapping with { StationWords = Words(value, at) },
            };
        }

        return Check(mapping, item, path);
    }

    private PropertySetMapping? Check(PropertySetMapping mapping, JsonItem item, string path)
    {
        if (mapping.Components.IsEmpty)
            values.Fail(InputCodes.KeyMissing, item, $"{path}.components maps no section force; give at least one, such as \"N\": {{\"property\": \"Axial force\"}}");
        else if (mapping.Stations == StationSource.List && mapping.StationProperty.Length == 0)
            values.Fail(InputCodes.KeyMissing, item, $"{path} reads lists but names no list of stations; add \"station\": {{\"property\": …}}");
        else if (mapping.Components.FirstOrDefault(c => c.Property.Contains(Placeholder, StringComparison.Ordinal) != (mapping.Stations == StationSource.Name)) is { } wrong)
            values.Fail(InputCodes.TextUnusable, item, mapping.Stations == StationSource.Name
                ? $"{path}.components.{wrong.Component} has no {Placeholder} in the name of its property, where the station would stand"
                : $"{path}.components.{wrong.Component} has {Placeholder} in the name of its property; set \"stations\": \"name\" for that");
        return mapping;
    }

    private ImmutableArray<ComponentMapping> Components(JsonItem item, string path)
    {
        var components = ImmutableArray.CreateBuilder<ComponentMapping>();
        foreach (var (key, _, value) in values.Object(item, path, ForceKeys.Components.Words))
        {
            var at = $"{path}.{key}";
            if (!values.Has(value, at, "property")) continue;

            var component = ForceKeys.Components.Of(key);
            string? property = null, symbol = null;
            foreach (var (inner, _, text) in values.Object(value, at, ForceKeys.Component))
            {
                if (inner == "property") property = values.Text(text, $"{at}.property");
                else symbol = values.Text(text, $"{at}.unit");
            }

            if (property is null) continue;

            var factor = symbol is null ? null : Factor(value, $"{at}.unit", symbol, component <= ForceComponent.Vz ? Quantity.Force : Quantity.Moment);
            components.Add(new ComponentMapping(component, property, factor, symbol ?? ""));
        }

        return components.ToImmutable();
    }

    private PropertySetMapping Station(PropertySetMapping mapping, JsonItem item, string path)
    {
        foreach (var (key, _, value) in values.Object(item, path, ForceKeys.Station))
        {
            if (values.Text(value, $"{path}.{key}") is not { } text) continue;
            mapping = key switch
            {
                "property" => mapping with { StationProperty = text },
                _ when text == "%" => mapping with { StationIsShare = true, StationFactor = 0.01 },
                _ => mapping with { StationFactor = Factor(value, $"{path}.unit", text, Quantity.Length) },
            };
        }

        return mapping;
    }

    private FrozenDictionary<string, double> Words(JsonItem item, string path)
    {
        var words = new Dictionary<string, double>(StringComparer.OrdinalIgnoreCase);
        foreach (var (key, _, value) in values.Object(item, path))
        {
            if (values.Number(value, $"{path}.{Excerpt.Of(key)}", ForceKeys.StationWord.Least, ForceKeys.StationWord.Most) is not { } percent) continue;
            if (!words.TryAdd(key, percent / 100)) values.Fail(InputCodes.EntryDoubled, value, $"{path} has the word {Excerpt.Of(key)} twice; case does not tell them apart");
        }

        return words.ToFrozenDictionary(StringComparer.OrdinalIgnoreCase);
    }

    private double? Factor(JsonItem item, string path, string symbol, Quantity quantity)
    {
        if (UnitText.TryRead(symbol, quantity, out var unit, out var error)) return unit.Factor;

        values.Fail(InputCodes.ValueUnit, item, $"{path}: {error}");
        return null;
    }
}
