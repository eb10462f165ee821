using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Json;
using MemberScan.Inputs.Values;
using MemberScan.Model.Frames;

namespace MemberScan.Inputs.Frames;

/// <summary>Reads the parts of a frame file in the order in which they name each other, whatever their order in the file.</summary>
internal sealed class FrameReader(FrameValues values)
{
    private const int MostStations = 100_000;

    private FrameUnits _units = new(new Unit("m", Quantity.Length, 1), new Unit("N", Quantity.Force, 1));

    public FrameFile? Read(JsonItem root)
    {
        var entries = values.Entries(root, "", ["units", "nodes", "materials", "sections", "members", "supports", "situations"], ["combinations", "stations"]);
        if (entries.TryGetValue("units", out var units)) Units(units);
        var nodes = Nodes(entries.GetValueOrDefault("nodes"));
        var nodeNumbers = Numbers(nodes.Select(n => n.Name));
        var members = new FrameMemberReader(values, _units, nodeNumbers, Materials(entries.GetValueOrDefault("materials")), Sections(entries.GetValueOrDefault("sections")), Stations)
            .Read(entries.GetValueOrDefault("members"));
        var supports = Supports(entries.GetValueOrDefault("supports"), nodeNumbers);
        var situations = new FrameLoadReader(values, _units, nodeNumbers, Numbers(members.Select(m => m.Name)))
            .Read(entries.GetValueOrDefault("situations"), entries.GetValueOrDefault("combinations"));
        var stations = entries.TryGetValue("stations", out var asked) ? Stations(asked, "stations") : null;
        return new FrameFile(
            new Frame { Nodes = nodes, Members = members, Supports = supports, Situations = situations, Stations = stations ?? FrameStations.Default }, _units);
    }

    private static Dictionary<string, int> Numbers(IEnumerable<string> names) =>
        names.Select((name, number) => (name, number)).ToDictionary(pair => pair.name, pair => pair.number, StringComparer.Ordinal);

    private void Units(JsonItem item)
    {
        var entries = values.Entries(item, "units", ["length", "force"], []);
        var length = entries.TryGetValue("length", out var l) ? UnitOf(l, "units.length", Quantity.Length) : null;
        var force = entries.TryGetValue("force", out var f) ? UnitOf(f, "units.force", Quantity.Force) : null;
        if (length is not null && force is not null) _units = new FrameUnits(length, force);
    }

    private Unit? UnitOf(JsonItem item, string path, Quantity quantity)
    {
        if (values.Json.Text(item, path) is not { } text) return null;
        if (UnitText.TryRead(text, quantity, out var unit, out var error)) return unit;

        values.Json.Fail(InputCodes.ValueUnit, item, $"{path}: {error}");
        return null;
    }

    private ImmutableArray<FrameNode> Nodes(JsonItem? item) => item is null ? [] :
        [.. values.Json.Object(item, "nodes").Select(entry => new FrameNode(entry.Key, _units.Length.Factor * values.Vector(entry.Value, $"nodes.{entry.Key}")))];

    private Dictionary<string, FrameMaterial> Materials(JsonItem? item)
    {
        var found = new Dictionary<string, FrameMaterial>(StringComparer.Ordinal);
        if (item is null) return found;

        foreach (var entry in values.Json.Object(item, "materials"))
        {
            var path = $"materials.{entry.Key}";
            var e = values.Entries(entry.Value, path, ["E", "G"], ["unitWeight", "yield", "expansion"]);
            found[entry.Key] = new FrameMaterial(
                entry.Key, Positive("E", _units.Stress) ?? 1, Positive("G", _units.Stress) ?? 1,
                e.TryGetValue("unitWeight", out var weight) ? values.Positive(weight, $"{path}.unitWeight", zeroToo: true) * _units.Stress / _units.Length.Factor : 0,
                e.TryGetValue("expansion", out var expansion) ? values.Number(expansion, $"{path}.expansion") : 0, Positive("yield", _units.Stress));

            double? Positive(string key, double factor) => e.TryGetValue(key, out var value) ? factor * values.Positive(value, $"{path}.{key}") : null;
        }

        return found;
    }

    private Dictionary<string, FrameSection> Sections(JsonItem? item)
    {
        var found = new Dictionary<string, FrameSection>(StringComparer.Ordinal);
        if (item is null) return found;

        // A section with an error keeps its name, so that members do not miss it too.
        foreach (var entry in values.Json.Object(item, "sections"))
            found[entry.Key] = FrameSectionReader.Read(values, _units, entry) ?? new FrameSection { Name = entry.Key, Area = 1, Iy = 1, Iz = 1, J = 1 };
        return found;
    }

    private ImmutableArray<FrameSupport> Supports(JsonItem? item, Dictionary<string, int> nodes)
    {
        if (item is null) return [];

        var found = ImmutableArray.CreateBuilder<FrameSupport>();
        foreach (var entry in values.Json.Object(item, "supports"))
        {
            var path = $"supports.{entry.Key}";
            if (!nodes.TryGetValue(entry.Key, out var node)) values.UnknownKey(entry.Value, entry.Key, "supports", nodes, "node");
            else found.Add(Support(entry.Value, path, node));
        }

        return found.ToImmutable();
    }

    private FrameSupport Support(JsonItem item, string path, int node)
    {
        var (restraints, entries) = (Restraints.AllFree, values.Entries(item, path, [], [.. FrameValues.Directions, "axes"]));
        for (var d = 0; d < FrameValues.Directions.Length; d++)
            if (entries.TryGetValue(FrameValues.Directions[d], out var value)) restraints = restraints.With((Direction)d, Restraint(value, $"{path}.{FrameValues.Directions[d]}", (Direction)d));
        var support = new FrameSupport(node, restraints);
        if (!entries.TryGetValue("axes", out var axes)) return support;

        var turned = values.Entries(axes, $"{path}.axes", ["x", "y"], []);
        return support with { X = values.Optional(turned, "x", $"{path}.axes") ?? Vector3.UnitX, Y = values.Optional(turned, "y", $"{path}.axes") ?? Vector3.UnitY };
    }

    private Restraint Restraint(JsonItem item, string path, Direction direction)
    {
        var isTurn = direction >= Direction.Rx;
        switch (item.Kind)
        {
            case JsonValueKind.Number:
                return Model.Frames.Restraint.Moved(values.Number(item, path) * (isTurn ? 1 : _units.Length.Factor));
            case JsonValueKind.Object:
                var entries = values.Entries(item, path, ["spring"], []);
                return entries.TryGetValue("spring", out var spring)
                    ? Model.Frames.Restraint.Spring(values.Positive(spring, $"{path}.spring") * (isTurn ? _units.Moment : _units.Spread))
                    : Model.Frames.Restraint.Fixed;
            case JsonValueKind.String:
                _ = values.Json.Word(item, path, ["fixed"]);
                return Model.Frames.Restraint.Fixed;
            default:
                values.Json.Fail(InputCodes.WrongType, item, $"{path} is {item.Word}; give \"fixed\", a number that is the displacement forced upon it, or {{\"spring\": stiffness}}");
                return Model.Frames.Restraint.Fixed;
        }
    }

    private FrameStations? Stations(JsonItem item, string path)
    {
        if (item.Kind == JsonValueKind.Array)
        {
            if (item.Items.IsEmpty) values.Json.Fail(InputCodes.OutOfRange, item, $"{path} is an empty list; give distances from the flexible start, or a count");
            return FrameStations.At(item.Items.Select(x => _units.Length.Factor * values.Positive(x, path, zeroToo: true)));
        }

        if (item.Kind != JsonValueKind.Number)
        {
            values.Json.Fail(InputCodes.WrongType, item, $"{path} is {item.Word}; give a count, or a list of distances from the flexible start");
            return null;
        }

        if (values.Json.Number(item, path, 2, MostStations) is not { } count) return null;
        if (count == Math.Floor(count)) return FrameStations.Equal((int)count);

        values.Json.Fail(InputCodes.OutOfRange, item, $"{path} is {Excerpt.Of(item.Text)}; a count has no fraction");
        return null;
    }
}
