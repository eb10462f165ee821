using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Inputs.Json;
using MemberScan.Mechanics.Stiffness;
using MemberScan.Model.Frames;

namespace MemberScan.Inputs.Frames;

/// <summary>The members of a frame file.</summary>
internal sealed class FrameMemberReader(
    FrameValues values, FrameUnits units, Dictionary<string, int> nodes, Dictionary<string, FrameMaterial> materials,
    Dictionary<string, FrameSection> sections, Func<JsonItem, string, FrameStations?> stations)
{
    private static readonly string[] s_required = ["start", "end", "section", "material"];
    private static readonly string[] s_optional = ["zDirection", "shearFlexible", "trussOnly", "released", "springs", "offsets", "stations"];

    private readonly Dictionary<(string Section, double Poisson), FrameSection> _shearing = [];

    public ImmutableArray<FrameMember> Read(JsonItem? item)
    {
        if (item is null) return [];

        return [.. values.Json.Object(item, "members").Select(Member).OfType<FrameMember>()];
    }

    private FrameMember? Member(JsonEntry entry)
    {
        var path = $"members.{entry.Key}";
        var e = values.Entries(entry.Value, path, s_required, s_optional);
        var (start, end) = (Node(e, path, "start"), Node(e, path, "end"));
        var (section, last) = Section(e, path);
        var material = Named(e, path, "material", materials);
        var shears = e.TryGetValue("shearFlexible", out var shear) && (values.Json.Flag(shear, $"{path}.shearFlexible") ?? false);
        var truss = e.TryGetValue("trussOnly", out var only) && (values.Json.Flag(only, $"{path}.trussOnly") ?? false);
        var (startJoint, endJoint) = Joints(e, path);
        var offsets = e.TryGetValue("offsets", out var o) ? values.Entries(o, $"{path}.offsets", [], ["start", "end"]) : [];
        var own = e.TryGetValue("stations", out var s) ? stations(s, $"{path}.stations") : null;
        var zDirection = values.Optional(e, "zDirection", path);
        var (startOffset, endOffset) = (values.Optional(offsets, "start", $"{path}.offsets") ?? default, values.Optional(offsets, "end", $"{path}.offsets") ?? default);
        if (section is null || material is null || start < 0 || end < 0) return null;

        var taper = last is null ? [] : FrameTaper.Of(values, section, last, e["section"], $"{path}.section");
        if (shears) taper = [.. taper.Select(point => point with { Section = Shearing(point.Section, material, entry, path) })];
        return new FrameMember
        {
            Name = entry.Key,
            Start = start,
            End = end,
            Section = shears ? Shearing(section, material, entry, path) : section,
            Material = material,
            ZDirection = zDirection,
            Taper = taper,
            ShearFlexible = shears,
            TrussOnly = truss,
            StartJoint = startJoint,
            EndJoint = endJoint,
            StartOffset = units.Length.Factor * startOffset,
            EndOffset = units.Length.Factor * endOffset,
            Stations = own,
        };
    }

    /// <summary>The section, and the one at the end where two are named.</summary>
    private (FrameSection? Start, FrameSection? End) Section(Dictionary<string, JsonItem> entries, string path)
    {
        if (!entries.TryGetValue("section", out var item) || item.Kind != JsonValueKind.Object) return (Named(entries, path, "section", sections), null);

        var both = values.Entries(item, $"{path}.section", ["start", "end"], []);
        var (start, end) = (Named(both, $"{path}.section", "start", sections, "section"), Named(both, $"{path}.section", "end", sections, "section"));
        return end is null ? (null, null) : (start, end);
    }

    private int Node(Dictionary<string, JsonItem> entries, string path, string key) =>
        entries.TryGetValue(key, out var item) ? values.Reference(item, $"{path}.{key}", nodes, "node") : -1;

    private T? Named<T>(Dictionary<string, JsonItem> entries, string path, string key, Dictionary<string, T> known, string? what = null)
        where T : class
    {
        if (!entries.TryGetValue(key, out var item)) return null;

        var numbers = known.Keys.Select((name, number) => (name, number)).ToDictionary(pair => pair.name, pair => pair.number, StringComparer.Ordinal);
        return values.Reference(item, $"{path}.{key}", numbers, what ?? key) >= 0 ? known[item.Text] : null;
    }

    // Shear areas of a section text, for ν = E/2G − 1; those of constants stand in the file.
    private FrameSection Shearing(FrameSection section, FrameMaterial material, JsonEntry entry, string path)
    {
        if (section.Shape is not { } shape) return section;

        var poisson = Math.Clamp(material.E / (2 * material.G) - 1, 0, 0.499);
        if (_shearing.TryGetValue((section.Name, poisson), out var known)) return known;
        if (ShearAreas.Of(shape, poisson) is { } areas) return _shearing[(section.Name, poisson)] = section with { ShearAreaY = areas.Y, ShearAreaZ = areas.Z };

        values.Json.Fail(InputCodes.TextUnusable, entry.Value, $"{path}: the section {section.Name} has no shear areas, since its dimensions are too far apart; give constants with Asy and Asz");
        return section;
    }

    private (Restraints Start, Restraints End) Joints(Dictionary<string, JsonItem> entries, string path)
    {
        var released = entries.TryGetValue("released", out var r) ? values.Entries(r, $"{path}.released", [], ["start", "end"]) : [];
        var springs = entries.TryGetValue("springs", out var s) ? values.Entries(s, $"{path}.springs", [], ["start", "end"]) : [];
        return (Joint("start"), Joint("end"));

        Restraints Joint(string end)
        {
            var joint = Restraints.AllFixed;
            if (released.TryGetValue(end, out var list)) joint = Released(list, $"{path}.released.{end}");
            return springs.TryGetValue(end, out var given) ? Sprung(joint, given, $"{path}.springs.{end}") : joint;
        }
    }

    private Restraints Released(JsonItem list, string path)
    {
        var joint = Restraints.AllFixed;
        foreach (var item in values.Json.List(list, path))
        {
            if (values.Direction(item, path) is not { } direction) continue;
            if (joint[direction].Kind == RestraintKind.Free) values.Json.Fail(InputCodes.EntryDoubled, item, $"{path} names '{item.Text}' twice; name it once");
            joint = joint.With(direction, Restraint.Free);
        }

        return joint;
    }

    private Restraints Sprung(Restraints joint, JsonItem item, string path)
    {
        foreach (var (key, value) in values.Entries(item, path, [], FrameValues.Directions))
        {
            var direction = (Direction)Array.IndexOf(FrameValues.Directions, key);
            var stiffness = values.Positive(value, $"{path}.{key}") * (direction >= Direction.Rx ? units.Moment : units.Spread);
            if (joint[direction].Kind == RestraintKind.Free) values.Json.Fail(InputCodes.EntryDoubled, value, $"{path}.{key} has a spring and is released; keep one of them");
            joint = joint.With(direction, Restraint.Spring(stiffness));
        }

        return joint;
    }
}
