using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Sections;

/// <summary>Bar-like bodies of an element: extrusions and swept disks, mapped, clipped or plain.</summary>
internal sealed class BodyReader(
    Instances instances, PlacementReader placements, ProfileReader profiles, DirectrixReader directrices, ModelUnits units)
{
    /// <summary>Deepest nesting of mapped items, solids and operands that is followed.</summary>
    private const int MaxNesting = 16;

    /// <summary>Most bodies that one element may have.</summary>
    public const int MaxBodies = 2_000;

    /// <summary>Largest sine of the angle between sweep and profile normal that still counts as square (section error below 1e-6).</summary>
    private const double SkewTolerance = 1e-3;

    private static readonly string[] s_notBodies =
        ["axis", "box", "footprint", "reference", "profile", "surface", "cog", "clearance", "lighting", "annotation", "plan", "body-fallback"];

    /// <summary>Most steps through mapped items and operands for one element: models can nest references without end.</summary>
    public const int MaxSteps = 50_000;

    private readonly record struct Item(Part21Record Record, Transform3 Map, bool IsCut);

    private sealed class Walk
    {
        public List<Item> Found { get; } = [];

        public int Steps { get; set; }

        public bool IsOver => Steps > MaxSteps || Found.Count > MaxBodies;
    }

    /// <summary>All bodies of a product in body order, each read or with the reason why not; empty when it has none.</summary>
    /// <param name="representation">Reference to the product's shape.</param>
    /// <param name="toProject">From object to project coordinates; identity where unknown.</param>
    public ImmutableArray<Finding<BarBody>> Read(Part21Value representation, Transform3 toProject)
    {
        if (representation.IsEmpty || !instances.TryFollow(representation, out var shape)) return [];

        var walk = new Walk();
        foreach (var item in BodyItems(shape)) Flatten(item, Transform3.Identity, false, 0, walk);

        var bodies = walk.Found.Take(MaxBodies).Select(item => ReadItem(item, toProject));
        return walk.IsOver
            ? [.. bodies, Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"more than {MaxBodies} bodies or {MaxSteps} nested references in one element"))]
            : [.. bodies];
    }

    private IEnumerable<Part21Record> BodyItems(Part21Record shape)
    {
        var representations = instances.FollowAll(shape[2]).ToList();
        bool Named(Part21Record r, string name) => string.Equals(Instances.Text(r[1]).Trim(), name, StringComparison.OrdinalIgnoreCase);

        var chosen = representations.Where(r => Named(r, "Body")).ToList();
        if (chosen.Count == 0)
            chosen = representations.Where(r => !Array.Exists(s_notBodies, name => Named(r, name))).Take(1).ToList();
        return chosen.Take(1).SelectMany(r => instances.FollowAll(r[3]));
    }

    private void Flatten(Part21Record item, Transform3 map, bool isCut, int depth, Walk walk)
    {
        walk.Steps++;
        if (walk.IsOver) return;

        switch (item.Keyword)
        {
            case "IFCMAPPEDITEM" when depth < MaxNesting && Mapped(item, map) is { } mapped:
                foreach (var child in mapped.Items) Flatten(child, mapped.Map, isCut, depth + 1, walk);
                return;
            case "IFCCSGSOLID" when depth < MaxNesting && instances.TryFollow(item[0], out var root):
                Flatten(root, map, isCut, depth + 1, walk);
                return;
            case "IFCBOOLEANRESULT" or "IFCBOOLEANCLIPPINGRESULT" when depth < MaxNesting && FirstOperand(item) is { } first:
                Flatten(first, map, true, depth + 1, walk);
                return;
            default:
                walk.Found.Add(new Item(item, map, isCut));
                return;
        }
    }

    /// <summary>Items of a mapped representation and the map to the element; null when the record is damaged.</summary>
    private (IEnumerable<Part21Record> Items, Transform3 Map)? Mapped(Part21Record item, Transform3 map)
    {
        if (!instances.TryFollow(item[0], out var source) || !instances.TryFollow(source[1], out var representation)) return null;
        if (!instances.TryFollow(item[1], out var op) || placements.Operator(op) is not { } target || placements.Axis2(source[0]) is not { } origin) return null;

        return (instances.FollowAll(representation[3]), map.After(target).After(origin));
    }

    /// <summary>The base solid of a chain of differences; null when the chain holds another operator or has no end.</summary>
    private Part21Record? FirstOperand(Part21Record item)
    {
        var current = item;
        for (var steps = 0; steps < Instances.MaxDepth; steps++)
        {
            if (current.Keyword is not ("IFCBOOLEANRESULT" or "IFCBOOLEANCLIPPINGRESULT")) return current;
            if (Instances.Literal(current[0]) != "DIFFERENCE" || !instances.TryFollow(current[1], out current)) return null;
        }

        return null;
    }

    private Finding<BarBody> ReadItem(Item item, Transform3 toProject)
    {
        if (item.Record.IsDamaged) return Missing(ReasonCode.DamagedRecord, $"the record of {Called(item.Record)} is damaged");

        return item.Record.Keyword switch
        {
            "IFCEXTRUDEDAREASOLID" => Extrusion(item),
            "IFCSWEPTDISKSOLID" or "IFCSWEPTDISKSOLIDPOLYGONAL" => SweptDisk(item, toProject),
            "IFCFACETEDBREP" or "IFCFACETEDBREPWITHVOIDS" or "IFCADVANCEDBREP" or "IFCADVANCEDBREPWITHVOIDS" or "IFCTRIANGULATEDFACESET"
                or "IFCPOLYGONALFACESET" or "IFCFACEBASEDSURFACEMODEL" or "IFCSHELLBASEDSURFACEMODEL" or "IFCTRIANGULATEDIRREGULARNETWORK" =>
                Missing(ReasonCode.SectionNotParametric, $"the body {Called(item.Record)} is a mesh without a parametric section"),
            "IFCMAPPEDITEM" => Missing(ReasonCode.DamagedRecord, $"the mapped body {Called(item.Record)} is damaged or nested too deep"),
            _ => Missing(ReasonCode.SectionNotCovered, $"the body {Called(item.Record)} is not an extrusion or swept disk"),
        };
    }

    private Finding<BarBody> Extrusion(Item item)
    {
        var solid = item.Record;
        if (units.Length is not { } metre) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (!instances.TryFollow(solid[0], out var profileRecord)) return Missing(ReasonCode.DamagedRecord, $"{Called(solid)} has no profile");
        if (!profiles.Read(profileRecord).TryGet(out var profile, out var why)) return Missing(why);
        if (placements.Axis2(solid[1]) is not { } position || placements.Direction(solid[2]) is not { } given || !given.TryNormalize(out var direction))
            return Missing(ReasonCode.DamagedRecord, $"the position or direction of {Called(solid)} is damaged");
        if (Instances.Real(solid[3]) is not { } depth || !(depth * metre > 0)) return Missing(ReasonCode.SectionInvalid, $"the depth of {Called(solid)} is not above zero");
        if (Math.Sqrt(direction.X * direction.X + direction.Y * direction.Y) > SkewTolerance)
            return Missing(ReasonCode.SectionNotCovered, $"{Called(solid)} is extruded at an angle to its profile's normal");
        if (UniformScale(item.Map) is not { } scale)
            return Missing(ReasonCode.PlacementNotSupported, $"{Called(solid)} is mapped with unequal scales");

        var frame = item.Map.After(position).After(profile.Value.Position);
        var notes = Notes(item);
        var along = item.Map.After(position).Direction(direction);
        _ = along.TryNormalize(out var x);
        _ = frame.Direction(Vector3.UnitY).TryNormalize(out var z);
        var y = z.Cross(x);
        if (y.Dot(frame.Direction(Vector3.UnitX)) < 0) notes = notes.Add("y is the reversed X axis of the profile (the sweep runs against its normal, or the placement mirrors)");

        var axes = new MemberAxes(frame.Origin, x, y, z);
        var source = $"profile {profile.Source} of {Called(solid)}";
        return new Finding<BarBody>.Found(
            new BarBody(profile.Value.Scaled(scale), scale * depth * metre, $"depth of {Called(solid)}", axes, source, [], true, [.. notes, .. profile.Value.Section.Notes]), source);
    }

    private Finding<BarBody> SweptDisk(Item item, Transform3 toProject)
    {
        var solid = item.Record;
        if (units.Length is not { } metre) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");

        var radius = Instances.Real(solid[1]) is { } r ? metre * r : double.NaN;
        var inner = solid[2].IsEmpty ? 0 : Instances.Real(solid[2]) is { } i ? metre * i : double.NaN;
        if (UniformScale(item.Map) is not { } scale) return Missing(ReasonCode.PlacementNotSupported, $"{Called(solid)} is mapped with unequal scales");

        var hollow = inner != 0;
        if (inner < 0) return Missing(ReasonCode.SectionInvalid, $"{Called(solid)}: the inner radius is negative");
        if ((hollow ? Tube.Fault(radius, radius - inner) : Round.Fault(radius)) is { } fault) return Missing(ReasonCode.SectionInvalid, $"{Called(solid)}: {fault.Message}");

        var fillet = solid.Keyword == "IFCSWEPTDISKSOLIDPOLYGONAL" && Instances.Real(solid[5]) is { } f ? metre * f : 0;
        if (!directrices.Read(solid[0], solid[3], solid[4], fillet).TryGet(out var line, out var why)) return Missing(why);

        var tangent = item.Map.Direction(line.Value.Tangent);
        var start = item.Map.Point(line.Value.Start);
        var axes = UprightAxes(start, tangent, toProject);
        var notes = Notes(item);
        if (line.Value.Corners > 0)
            notes = notes.Add(string.Create(CultureInfo.InvariantCulture, $"the centre line has {line.Value.Corners} mitred corners; stresses local to a corner are not covered"));
        if (!line.Value.IsStraight) notes = notes.Add("local axes are those at the start, carried along the centre line without twist");

        CrossSection shape = hollow ? new Tube(radius, radius - inner) : new Round(radius);
        var profile = new ProfileShape(new SectionFinding([shape], "", notes), Transform3.Identity).Scaled(scale);
        var source = $"swept disk {Called(solid)}";
        return new Finding<BarBody>.Found(
            new BarBody(profile, scale * line.Value.Length, $"centre line {line.Source} of {Called(solid)}", axes, source,
                [.. line.Value.BendRadii.Select(b => scale * b)], line.Value.IsStraight, notes),
            source);
    }

    /// <summary>Axes of a swept disk: z = global +Z square to x, for an upright member global +X.</summary>
    private static MemberAxes UprightAxes(Vector3 start, Vector3 tangent, Transform3 toProject)
    {
        // The global directions as seen from the object: its placement is a rotation, so the transposed map turns them back.
        var up = new Vector3(toProject.X.Z, toProject.Y.Z, toProject.Z.Z);
        var east = new Vector3(toProject.X.X, toProject.Y.X, toProject.Z.X);
        _ = tangent.TryNormalize(out var x);
        var isUpright = x.Cross(up).Length < 1e-3;
        return MemberAxes.From(start, tangent, isUpright ? east : up)
            ?? MemberAxes.From(start, tangent, Math.Abs(x.X) < 0.9 ? Vector3.UnitX : Vector3.UnitY)!;
    }

    private static ImmutableArray<string> Notes(Item item) =>
        item.IsCut ? ["cut: the body is clipped; its full section is used"] : [];

    /// <summary>The scale of a map that is a rotation, maybe mirrored, times one factor; null when it is not.</summary>
    private static double? UniformScale(Transform3 map)
    {
        var (sx, sy, sz) = (map.X.Length, map.Y.Length, map.Z.Length);
        var square = Math.Max(Math.Abs(map.X.Dot(map.Y)), Math.Max(Math.Abs(map.X.Dot(map.Z)), Math.Abs(map.Y.Dot(map.Z))));
        var isUniform = sx > 0 && Math.Abs(sy / sx - 1) < 1e-6 && Math.Abs(sz / sx - 1) < 1e-6 && square < 1e-6 * sx * sx;
        return isUniform ? sx : null;
    }

    private static string Called(Part21Record record) => string.Create(CultureInfo.InvariantCulture, $"{record.Keyword} #{record.Id}");

    private static Finding<BarBody> Missing(ReasonCode code, string message) => Missing(new Reason(code, message));

    private static Finding<BarBody> Missing(Reason why) => new Finding<BarBody>.Missing(why);
}
