using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Rules.PropertySets;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.ForceSets;

/// <summary>One property set read through a mapping: stations with six components, before any is taken as zero.</summary>
internal sealed class MappedSet
{
    private static readonly ImmutableArray<ForceComponent> s_all =
        [ForceComponent.N, ForceComponent.Vy, ForceComponent.Vz, ForceComponent.T, ForceComponent.My, ForceComponent.Mz];

    private readonly PropertySetMapping _mapping;
    private readonly PropertyNumbers _numbers;
    private readonly double _length;
    private readonly List<(double X, double?[] Values)> _stations = [];

    private MappedSet(PropertySetMapping mapping, PropertyNumbers numbers, double length) => (_mapping, _numbers, _length) = (mapping, numbers, length);

    /// <summary>Reads the properties of a set.</summary>
    /// <param name="mapping">The mapping.</param>
    /// <param name="patterns">A pattern for each component of the mapping, in its order.</param>
    /// <param name="properties">The properties of the set.</param>
    /// <param name="numbers">Turns values into SI.</param>
    /// <param name="length">Length of the member [m].</param>
    /// <param name="missingAreZero">Whether components without a value count as zero.</param>
    /// <param name="zeros">Components that counted as zero.</param>
    /// <param name="why">Why there are no stations.</param>
    public static ImmutableArray<ForceStation>? Read(
        PropertySetMapping mapping, ImmutableArray<NamePattern> patterns, List<Part21Record> properties, PropertyNumbers numbers, double length,
        bool missingAreZero, out ImmutableArray<ForceComponent> zeros, out Reason? why)
    {
        zeros = [];
        var set = new MappedSet(mapping, numbers, length);
        double[]? stations = null;
        why = mapping.Stations == StationSource.List ? set.StationList(properties, out stations) : null;
        for (var i = 0; why is null && i < mapping.Components.Length; i++) why = set.Take(mapping.Components[i], patterns[i], properties, stations);
        return why is null ? set.Finish(missingAreZero, out zeros, out why) : null;
    }

    private Reason? StationList(List<Part21Record> properties, out double[]? stations)
    {
        stations = null;
        var pattern = new NamePattern(_mapping.StationProperty);
        var list = properties.Find(p => p.Keyword == "IFCPROPERTYLISTVALUE" && pattern.Fits(Instances.Text(p[0]), out _, out _));
        if (list.Keyword != "IFCPROPERTYLISTVALUE") return Incomplete($"there is no list '{_mapping.StationProperty}' of stations");

        stations = Places(Instances.Text(list[0]), list[2], list[3], out var why);
        return why;
    }

    private Reason? Take(ComponentMapping component, NamePattern pattern, List<Part21Record> properties, double[]? stations)
    {
        var count = 0;
        foreach (var property in properties)
        {
            if (!pattern.Fits(Instances.Text(property[0]), out _, out var token)) continue;

            if (++count > 1 && _mapping.Stations != StationSource.Name) return Incomplete($"several properties fit '{component.Property}'");
            if (Take(component, property, token, stations) is { } why) return why;
        }

        return null;
    }

    private Reason? Take(ComponentMapping component, Part21Record property, string? token, double[]? stations)
    {
        var (name, isForce) = (Instances.Text(property[0]), component.Component <= ForceComponent.Vz);
        var unitType = isForce ? "FORCEUNIT" : "TORQUEUNIT";
        var wanted = _mapping.Stations switch { StationSource.List => "IFCPROPERTYLISTVALUE", StationSource.Table => "IFCPROPERTYTABLEVALUE", _ => "IFCPROPERTYSINGLEVALUE" };
        if (property.Keyword != wanted) return Incomplete($"the property '{name}' is no {Words(wanted)}");

        var (values, unit) = wanted == "IFCPROPERTYTABLEVALUE" ? (property[3], property[6]) : (property[2], property[3]);
        if (_numbers.Read(name, values, unit, unitType, component.Factor, out var why) is not { } numbers) return why;

        switch (_mapping.Stations)
        {
            case StationSource.Constant:
                return Put(component.Component, [0, _length], [numbers[0], numbers[0]], name);
            case StationSource.List:
                return Put(component.Component, stations!, numbers, name);
            case StationSource.Table:
                return Places(name, property[2], property[5], out why) is { } places ? Put(component.Component, places, numbers, name) : why;
            default:
                return Place(token!, name, out why) is { } x ? PutAt(component.Component, x, numbers[0], name) : why;
        }
    }

    private double[]? Places(string name, Part21Value values, Part21Value unit, out Reason? why)
    {
        var places = _numbers.Read(name, values, unit, "LENGTHUNIT", _mapping.StationIsShare ? _mapping.StationFactor * _length : _mapping.StationFactor, out why);
        return places is null || (why = places.Select(x => Beyond(name, x)).FirstOrDefault(w => w is not null)) is not null ? null : places;
    }

    private double? Place(string token, string name, out Reason? why)
    {
        why = null;
        if (_mapping.StationWords.TryGetValue(token, out var share)) return share * _length;

        if (!double.TryParse(token, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var number))
            why = Incomplete($"the station '{token}' in the name of the property '{name}' is neither a number nor one of stationWords");
        else if (_mapping.StationFactor is not { } factor)
            why = new Reason(ReasonCode.UnitMissing, $"the station '{token}' in the name of the property '{name}' has no unit; the mapping can state one");
        else if (Beyond(name, number * factor * (_mapping.StationIsShare ? _length : 1)) is { } beyond)
            why = beyond;
        else
            return number * factor * (_mapping.StationIsShare ? _length : 1);
        return null;
    }

    private Reason? Beyond(string name, double x) => x >= -1e-6 * _length && x <= (1 + 1e-6) * _length
        ? null
        : Incomplete(string.Create(CultureInfo.InvariantCulture, $"the property '{name}' has a station at {x:0.####} m on a member of {_length:0.####} m"));

    // Lists and tables: every component must have the same stations, in the same order; two at one place are a jump.
    private Reason? Put(ForceComponent component, double[] places, double[] numbers, string name)
    {
        if (places.Length != numbers.Length) return Incomplete($"the property '{name}' has {numbers.Length} values at {places.Length} stations");
        if (_stations.Count == 0) _stations.AddRange(places.Select(x => (x, new double?[6])));
        if (_stations.Count != places.Length || _stations.Where((s, i) => Math.Abs(s.X - places[i]) > 1e-9 * _length).Any())
            return Incomplete($"the property '{name}' has other stations than the ones before");

        for (var i = 0; i < numbers.Length; i++) _stations[i].Values[(int)component] = numbers[i];
        return null;
    }

    private Reason? PutAt(ForceComponent component, double x, double number, string name)
    {
        var index = _stations.FindIndex(s => Math.Abs(s.X - x) <= 1e-9 * _length);
        if (index < 0)
        {
            index = _stations.Count;
            _stations.Add((x, new double?[6]));
        }

        if (_stations[index].Values[(int)component] is not null) return Incomplete($"the property '{name}' gives a component a second value at one station");

        _stations[index].Values[(int)component] = number;
        return null;
    }

    private ImmutableArray<ForceStation>? Finish(bool missingAreZero, out ImmutableArray<ForceComponent> zeros, out Reason? why)
    {
        zeros = [.. s_all.Where(c => _stations.Exists(s => s.Values[(int)c] is null))];
        why = _stations.Count == 0 ? Incomplete("it holds none of the mapped properties")
            : zeros.IsEmpty || missingAreZero ? null
            : Incomplete($"it has no value of {string.Join(", ", zeros)} at every station, and the settings do not say that these are zero (forces.missingComponents)");
        if (why is not null) return null;

        return [.. _stations.OrderBy(s => s.X).Select(s => new ForceStation(s.X, new SectionForces(
            s.Values[0] ?? 0, s.Values[1] ?? 0, s.Values[2] ?? 0, s.Values[3] ?? 0, s.Values[4] ?? 0, s.Values[5] ?? 0)))];
    }

    private static string Words(string keyword) => keyword switch { "IFCPROPERTYLISTVALUE" => "list", "IFCPROPERTYTABLEVALUE" => "table", _ => "single value" };

    private static Reason Incomplete(string message) => new(ReasonCode.ForcesIncomplete, message);
}
