using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Inputs.Json;
using MemberScan.Model.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Inputs.Frames;

/// <summary>The situations and combinations of a frame file.</summary>
internal sealed class FrameLoadReader(FrameValues values, FrameUnits units, Dictionary<string, int> nodes, Dictionary<string, int> members)
{
    private static readonly string[] s_axes = ["local", "global", "projected"];

    public ImmutableArray<FrameSituation> Read(JsonItem? situations, JsonItem? combinations)
    {
        var found = situations is null ? [] : values.Json.Object(situations, "situations").Select(Situation).ToList();
        var numbers = found.Select((s, number) => (s.Name, number)).ToDictionary(pair => pair.Name, pair => pair.number, StringComparer.Ordinal);
        if (combinations is not null)
        {
            foreach (var entry in values.Json.Object(combinations, "combinations"))
            {
                if (numbers.ContainsKey(entry.Key)) values.Json.Fail(InputCodes.EntryDoubled, entry.Value, $"combinations.{entry.Key} has the name of a situation; give it another");
                else found.Add(Combination(entry, numbers));
            }
        }

        return [.. found];
    }

    private FrameSituation Situation(JsonEntry entry)
    {
        var path = $"situations.{entry.Key}";
        var e = values.Entries(entry.Value, path, [], ["kind", "selfWeight", "nodeLoads", "memberLoads", "temperature", "supportMovements"]);
        var (points, lines) = (ImmutableArray.CreateBuilder<MemberPointLoad>(), ImmutableArray.CreateBuilder<MemberLineLoad>());
        foreach (var (item, at) in Items(e, "memberLoads", path)) MemberLoad(item, at, points, lines);
        return new FrameSituation
        {
            Name = entry.Key,
            Kind = Kind(e, path),
            SelfWeight = values.Optional(e, "selfWeight", path) ?? default,
            NodeLoads = [.. Items(e, "nodeLoads", path).Select(pair => NodeLoad(pair.Item, pair.Path))],
            PointLoads = points.ToImmutable(),
            LineLoads = lines.ToImmutable(),
            Temperatures = [.. Items(e, "temperature", path).Select(pair => Temperature(pair.Item, pair.Path))],
            Movements = e.TryGetValue("supportMovements", out var moved) ? [.. values.Json.Object(moved, $"{path}.supportMovements").SelectMany(support => Movements(support, $"{path}.supportMovements"))] : [],
        };
    }

    private IEnumerable<SupportMovement> Movements(JsonEntry support, string path)
    {
        if (!nodes.TryGetValue(support.Key, out var node))
        {
            values.UnknownKey(support.Value, support.Key, path, nodes, "node");
            yield break;
        }

        foreach (var (key, value) in values.Entries(support.Value, $"{path}.{support.Key}", [], FrameValues.Directions))
        {
            var direction = (Direction)Array.IndexOf(FrameValues.Directions, key);
            yield return new SupportMovement(node, direction, values.Number(value, $"{path}.{support.Key}.{key}") * (direction >= Direction.Rx ? 1 : units.Length.Factor));
        }
    }

    private FrameSituation Combination(JsonEntry entry, Dictionary<string, int> numbers)
    {
        var path = $"combinations.{entry.Key}";
        var e = values.Entries(entry.Value, path, ["terms"], ["kind"]);
        var terms = ImmutableArray.CreateBuilder<SituationTerm>();
        if (e.TryGetValue("terms", out var listed))
        {
            foreach (var term in values.Json.Object(listed, $"{path}.terms"))
            {
                if (numbers.TryGetValue(term.Key, out var number)) terms.Add(new SituationTerm(number, values.Number(term.Value, $"{path}.terms.{term.Key}")));
                else values.UnknownKey(term.Value, term.Key, $"{path}.terms", numbers, "situation");
            }
        }

        return new FrameSituation { Name = entry.Key, Kind = Kind(e, path), Terms = terms.ToImmutable() };
    }

    private SituationKind Kind(Dictionary<string, JsonItem> entries, string path) =>
        !entries.TryGetValue("kind", out var item) ? SituationKind.Unknown
        : values.Json.Word(item, $"{path}.kind", ["service", "design"]) == "design" ? SituationKind.Design : SituationKind.Service;

    private IEnumerable<(JsonItem Item, string Path)> Items(Dictionary<string, JsonItem> entries, string key, string path) =>
        entries.TryGetValue(key, out var list) ? values.Json.List(list, $"{path}.{key}").Select((item, number) => (item, FormattableString.Invariant($"{path}.{key}[{number}]"))) : [];

    private NodeLoad NodeLoad(JsonItem item, string path)
    {
        var e = values.Entries(item, path, ["node"], ["F", "M"]);
        var node = e.TryGetValue("node", out var name) ? values.Reference(name, $"{path}.node", nodes, "node") : -1;
        return new NodeLoad(Math.Max(0, node), units.Force.Factor * Vector(e, "F", path), units.Moment * Vector(e, "M", path));
    }

    private void MemberLoad(JsonItem item, string path, ImmutableArray<MemberPointLoad>.Builder points, ImmutableArray<MemberLineLoad>.Builder lines)
    {
        var type = item.Kind == System.Text.Json.JsonValueKind.Object ? item.Entries.FirstOrDefault(entry => entry.Key == "type").Value : null;
        var word = type is null ? null : values.Json.Word(type, $"{path}.type", ["point", "line"]);
        var e = word switch
        {
            "point" => values.Entries(item, path, ["member", "type", "at"], ["F", "M", "axes"]),
            "line" => values.Entries(item, path, ["member", "type", "q1"], ["from", "to", "q2", "m1", "m2", "axes"]),
            _ => values.Entries(item, path, ["member", "type"], ["at", "F", "M", "from", "to", "q1", "q2", "m1", "m2", "axes"]),
        };
        var member = e.TryGetValue("member", out var name) ? Math.Max(0, values.Reference(name, $"{path}.member", members, "member")) : 0;
        var axes = e.TryGetValue("axes", out var given) && values.Json.Word(given, $"{path}.axes", s_axes) is { } said ? (LoadAxes)Array.IndexOf(s_axes, said) : LoadAxes.Local;
        if (word == "point" && Distance(e, "at", path) is { } at)
            points.Add(new MemberPointLoad(member, at, units.Force.Factor * Vector(e, "F", path), units.Moment * Vector(e, "M", path), axes));
        else if (word == "line")
            lines.Add(LineLoad(e, path, member, axes));
    }

    private MemberLineLoad LineLoad(Dictionary<string, JsonItem> e, string path, int member, LoadAxes axes)
    {
        var (q1, m1) = (Vector(e, "q1", path), Vector(e, "m1", path));
        var (q2, m2) = (values.Optional(e, "q2", path) ?? q1, values.Optional(e, "m2", path) ?? m1);
        return new MemberLineLoad(member, Distance(e, "from", path), Distance(e, "to", path), units.Spread * q1, units.Spread * q2, axes)
        {
            MomentFrom = units.Force.Factor * m1,
            MomentTo = units.Force.Factor * m2,
        };
    }

    private MemberTemperature Temperature(JsonItem item, string path)
    {
        var e = values.Entries(item, path, ["member"], ["uniform", "gradientY", "gradientZ"]);
        var member = e.TryGetValue("member", out var name) ? values.Reference(name, $"{path}.member", members, "member") : -1;
        return new MemberTemperature(Math.Max(0, member), Number("uniform"), Number("gradientY") / units.Length.Factor, Number("gradientZ") / units.Length.Factor);

        double Number(string key) => e.TryGetValue(key, out var value) ? values.Number(value, $"{path}.{key}") : 0;
    }

    private Vector3 Vector(Dictionary<string, JsonItem> entries, string key, string path) => values.Optional(entries, key, path) ?? default;

    private double? Distance(Dictionary<string, JsonItem> entries, string key, string path) =>
        entries.TryGetValue(key, out var item) ? units.Length.Factor * values.Positive(item, $"{path}.{key}", zeroToo: true) : null;
}
