using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Bodies;

/// <summary>Bar-like bodies of an element: sweeps, swept disks, blocks and cylinders, mapped, clipped or plain.</summary>
internal sealed class BodyReader(
    Instances instances, PlacementReader placements, SweptBodyReader sweeps, DiskBodyReader disks, PrimitiveReader primitives, MeshBodyReader meshes)
{
    /// <summary>Deepest nesting of mapped items, solids and operands that is followed.</summary>
    private const int MaxNesting = 16;

    /// <summary>Most bodies that one element may have.</summary>
    public const int MaxBodies = 2_000;

    private static readonly string[] s_notBodies =
        ["axis", "box", "footprint", "reference", "profile", "surface", "cog", "clearance", "lighting", "annotation", "plan", "body-fallback"];

    /// <summary>Most steps through mapped items and operands for one element: models can nest references without end.</summary>
    public const int MaxSteps = 50_000;

    private sealed class Walk
    {
        public List<BodyItem> Found { get; } = [];

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

        var bodies = walk.Found.Take(MaxBodies).SelectMany(item => IsMesh(item.Record) ? meshes.Read(item, toProject) : [ReadItem(item, toProject)]).Take(MaxBodies);
        return walk.IsOver
            ? [.. bodies, Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"more than {MaxBodies} bodies or {MaxSteps} nested references in one element"))]
            : [.. bodies];
    }

    /// <summary>Whether all bodies of a product are meshes, or it has none; looks into none of them.</summary>
    /// <param name="representation">Reference to the product's shape.</param>
    public bool AreMeshes(Part21Value representation)
    {
        if (representation.IsEmpty || !instances.TryFollow(representation, out var shape)) return true;

        var walk = new Walk();
        foreach (var item in BodyItems(shape)) Flatten(item, Transform3.Identity, false, 0, walk);
        return !walk.IsOver && walk.Found.TrueForAll(item => IsMesh(item.Record));
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
                walk.Found.Add(new BodyItem(item, map, isCut));
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

    private static bool IsMesh(Part21Record body) => !body.IsDamaged && body.Keyword is
        "IFCFACETEDBREP" or "IFCFACETEDBREPWITHVOIDS" or "IFCADVANCEDBREP" or "IFCADVANCEDBREPWITHVOIDS" or "IFCTRIANGULATEDFACESET"
        or "IFCPOLYGONALFACESET" or "IFCFACEBASEDSURFACEMODEL" or "IFCSHELLBASEDSURFACEMODEL" or "IFCTRIANGULATEDIRREGULARNETWORK";

    private Finding<BarBody> ReadItem(BodyItem item, Transform3 toProject)
    {
        if (item.Record.IsDamaged) return Missing(ReasonCode.DamagedRecord, $"the record of {item.Called} is damaged");

        return item.Record.Keyword switch
        {
            "IFCEXTRUDEDAREASOLID" => sweeps.Extrusion(item),
            "IFCEXTRUDEDAREASOLIDTAPERED" => sweeps.Tapered(item),
            "IFCREVOLVEDAREASOLID" => sweeps.Revolved(item),
            "IFCFIXEDREFERENCESWEPTAREASOLID" or "IFCSURFACECURVESWEPTAREASOLID" => sweeps.AlongCurve(item),
            "IFCSWEPTDISKSOLID" or "IFCSWEPTDISKSOLIDPOLYGONAL" => disks.Read(item, toProject),
            "IFCBLOCK" => primitives.Block(item),
            "IFCRIGHTCIRCULARCYLINDER" => primitives.Cylinder(item),
            "IFCMAPPEDITEM" => Missing(ReasonCode.DamagedRecord, $"the mapped body {item.Called} is damaged or nested too deep"),
            _ => Missing(ReasonCode.SectionNotCovered, $"the body {item.Called} is not a sweep of a section, a swept disk, a block or a cylinder"),
        };
    }

    private static Finding<BarBody> Missing(ReasonCode code, string message) => new Finding<BarBody>.Missing(new Reason(code, message));
}
