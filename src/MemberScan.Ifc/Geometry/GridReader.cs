using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Part21;

namespace MemberScan.Ifc.Geometry;

/// <summary>Intersections of straight grid axes, in the coordinates of their grid.</summary>
internal sealed class GridReader
{
    private readonly Instances _instances;
    private readonly PlacementReader _placements;
    private readonly ModelUnits _units;
    private readonly Lazy<Dictionary<ulong, Part21Record>> _gridOf;

    public GridReader(Instances instances, PlacementReader placements, ModelUnits units)
    {
        (_instances, _placements, _units) = (instances, placements, units);
        _gridOf = new(Index);
    }

    /// <summary>Placement of the grid that the axes of an intersection belong to; unset when no grid has them.</summary>
    public Part21Value PlacementOfGrid(Part21Record intersection)
    {
        foreach (var axis in Instances.IdsOf(intersection[0]))
            if (_gridOf.Value.TryGetValue(axis, out var grid))
                return grid[5];
        return default;
    }

    /// <summary>The placement at an intersection, x along its first axis or as a reference says; null when damaged or an axis is not straight.</summary>
    /// <param name="intersection">IfcVirtualGridIntersection.</param>
    /// <param name="reference">Direction of x, or another intersection that x points to; may be unset.</param>
    public Transform3? At(Part21Record intersection, Part21Value reference)
    {
        if (Crossing(intersection) is not var (origin, tangent)) return null;
        if (!reference.IsEmpty)
        {
            if (!_instances.TryFollow(reference, out var towards)) return null;

            tangent = towards.Keyword == "IFCVIRTUALGRIDINTERSECTION"
                ? Crossing(towards) is var (target, _) ? target - origin : Vector3.Zero
                : _placements.Direction(reference) ?? Vector3.Zero;
            tangent = tangent with { Z = 0 };
        }

        return tangent.TryNormalize(out var x) ? new Transform3(origin, x, new Vector3(-x.Y, x.X, 0), Vector3.UnitZ) : null;
    }

    private (Vector3 Origin, Vector3 Tangent)? Crossing(Part21Record intersection)
    {
        if (intersection.Keyword != "IFCVIRTUALGRIDINTERSECTION" || _units.Length is not { } metre) return null;
        if (_instances.FollowEach(intersection[0]) is not { Count: 2 } axes || Instances.Reals(intersection[1]) is not { Length: 2 or 3 } offsets) return null;
        if (Line(axes[0], metre * offsets[0]) is not var (p, t) || Line(axes[1], metre * offsets[1]) is not var (q, s)) return null;

        var cross = t.Cross(s).Z;
        if (Math.Abs(cross) < 1e-9) return null;

        var at = p + (q - p).Cross(s).Z / cross * t;
        return (at with { Z = offsets.Length > 2 ? metre * offsets[2] : 0 }, t);
    }

    /// <summary>A point and the direction of a straight axis, moved to its left by an offset.</summary>
    private (Vector3 Point, Vector3 Tangent)? Line(Part21Record axis, double offset)
    {
        if (axis.Keyword != "IFCGRIDAXIS" || !_instances.TryFollow(axis[1], out var curve)) return null;
        if (curve.Keyword == "IFCTRIMMEDCURVE" && !_instances.TryFollow(curve[0], out curve)) return null;
        if (Ends(curve) is not var (start, towards) || !towards.TryNormalize(out var tangent)) return null;

        if (Instances.Literal(axis[2]) == "F") tangent = -tangent;
        return (start + offset * new Vector3(-tangent.Y, tangent.X, 0), tangent);
    }

    private (Vector3 Start, Vector3 Towards)? Ends(Part21Record curve)
    {
        switch (curve.Keyword)
        {
            case "IFCPOLYLINE" when _instances.FollowEach(curve[0]) is { Count: 2 } points && _placements.Point(points[0]) is { } a && _placements.Point(points[1]) is { } b:
                return (a, (b - a) with { Z = 0 });
            case "IFCLINE" when _instances.TryFollow(curve[0], out var point) && _placements.Point(point) is { } at && _instances.TryFollow(curve[1], out var vector) && _placements.Direction(vector[0]) is { } along:
                return (at, along with { Z = 0 });
            default:
                return null;
        }
    }

    private Dictionary<ulong, Part21Record> Index()
    {
        var index = new Dictionary<ulong, Part21Record>();
        foreach (var grid in _instances.File.RecordsOf("IFCGRID"))
            for (var list = 7; list <= 9; list++)
                foreach (var axis in Instances.IdsOf(grid[list]))
                    index.TryAdd(axis, grid);
        return index;
    }
}
