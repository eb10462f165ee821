using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Geometry;

/// <summary>Points, directions, placements and transformation operators, in metres.</summary>
internal sealed class PlacementReader
{
    private readonly Instances _instances;
    private readonly ModelUnits _units;
    private readonly GridReader _grids;
    private readonly Dictionary<ulong, Finding<Transform3>> _known = [];

    public PlacementReader(Instances instances, ModelUnits units)
    {
        (_instances, _units) = (instances, units);
        _grids = new GridReader(instances, this, units);
    }

    /// <summary>From object coordinates to project coordinates.</summary>
    /// <param name="placement">Reference to the object placement; unset counts as none (identity).</param>
    public Finding<Transform3> Placement(Part21Value placement)
    {
        if (placement.IsEmpty) return new Finding<Transform3>.Found(Transform3.Identity, "no placement");
        if (!_instances.TryFollow(placement, out var record))
            return Missing(ReasonCode.DamagedRecord, "the object placement refers to nothing");

        return Resolve(record, depth: 0);
    }

    /// <summary>An IfcAxis2Placement3D (or 2D, in its plane) by the rules of the standard; identity where unset.</summary>
    public Transform3? Axis2(Part21Value value)
    {
        if (value.IsEmpty) return Transform3.Identity;
        if (!_instances.TryFollow(value, out var record)) return null;
        if (!_instances.TryFollow(record[0], out var location) || Point(location) is not { } origin) return null;

        if (record.Keyword == "IFCAXIS2PLACEMENT2D")
        {
            var x2 = Direction(record[1]) is { } given && (given with { Z = 0 }).TryNormalize(out var unit) ? unit : Vector3.UnitX;
            return new Transform3(origin, x2, new Vector3(-x2.Y, x2.X, 0), Vector3.UnitZ);
        }

        var z = Direction(record[1]) is { } axis && axis.TryNormalize(out var zUnit) ? zUnit : Vector3.UnitZ;
        var x = Square(Direction(record[2]) ?? Vector3.UnitX, z);
        return new Transform3(origin, x, z.Cross(x), z);
    }

    /// <summary>A transformation operator in space; null when damaged. Unequal scales are kept as they are.</summary>
    public Transform3? Operator(Part21Record op)
    {
        if (!_instances.TryFollow(op[2], out var originRecord) || Point(originRecord) is not { } origin) return null;

        var scale1 = op[3].IsEmpty ? 1 : Instances.Real(op[3]);
        var u3 = Direction(op[4]) is { } axis3 && axis3.TryNormalize(out var unit3) ? unit3 : Vector3.UnitZ;
        var u1 = Square(Direction(op[0]) ?? Vector3.UnitX, u3);
        var u2 = Direction(op[1]) ?? Vector3.UnitY;
        u2 -= u2.Dot(u3) * u3;
        u2 -= u2.Dot(u1) * u1;
        if (!u2.TryNormalize(out u2)) u2 = u3.Cross(u1);

        var uneven = op.Keyword == "IFCCARTESIANTRANSFORMATIONOPERATOR3DNONUNIFORM";
        var scale2 = uneven && !op[5].IsEmpty ? Instances.Real(op[5]) : scale1;
        var scale3 = uneven && !op[6].IsEmpty ? Instances.Real(op[6]) : scale1;
        if (scale1 is not { } s1 || scale2 is not { } s2 || scale3 is not { } s3) return null;

        return new Transform3(origin, s1 * u1, s2 * u2, s3 * u3);
    }

    /// <summary>The mirror that turns x round in a plane, as of IfcMirroredProfileDef.</summary>
    public static Transform3 MirrorX { get; } = new(Vector3.Zero, -Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ);

    /// <summary>A transformation operator in a plane; null when damaged. Unequal scales are kept as they are.</summary>
    public Transform3? Operator2(Part21Record op)
    {
        if (!_instances.TryFollow(op[2], out var originRecord) || Point(originRecord) is not { } origin) return null;

        var axis1 = Direction(op[0]) is { } given1 && (given1 with { Z = 0 }).TryNormalize(out var unit1) ? unit1 : (Vector3?)null;
        var axis2 = Direction(op[1]) is { } given2 && (given2 with { Z = 0 }).TryNormalize(out var unit2) ? unit2 : (Vector3?)null;
        var u1 = axis1 ?? (axis2 is { } y ? new Vector3(y.Y, -y.X, 0) : Vector3.UnitX);
        var u2 = new Vector3(-u1.Y, u1.X, 0);
        if (axis2 is { } towards && towards.Dot(u2) < 0) u2 = -u2;

        var scale1 = op[3].IsEmpty ? 1 : Instances.Real(op[3]);
        var isUneven = op.Keyword == "IFCCARTESIANTRANSFORMATIONOPERATOR2DNONUNIFORM";
        var scale2 = isUneven && !op[4].IsEmpty ? Instances.Real(op[4]) : scale1;
        return scale1 is { } s1 && scale2 is { } s2 ? new Transform3(origin, s1 * u1, s2 * u2, Vector3.UnitZ) : null;
    }

    /// <summary>Coordinates of an IfcCartesianPoint [m]; null when damaged or the length unit is missing.</summary>
    public Vector3? Point(Part21Record point)
    {
        if (point.Keyword != "IFCCARTESIANPOINT" || _units.Length is not { } metre) return null;
        if (Instances.Reals(point[0]) is not { Length: >= 1 and <= 3 } c) return null;

        return metre * new Vector3(c[0], c.Length > 1 ? c[1] : 0, c.Length > 2 ? c[2] : 0);
    }

    /// <summary>Ratios of an IfcDirection, not normalised; null when unset or damaged.</summary>
    public Vector3? Direction(Part21Value value)
    {
        if (!_instances.TryFollow(value, out var record) || Instances.Reals(record[0]) is not { Length: 2 or 3 } d) return null;

        var direction = new Vector3(d[0], d[1], d.Length > 2 ? d[2] : 0);
        return direction.IsFinite ? direction : null;
    }

    private Finding<Transform3> Resolve(Part21Record record, int depth)
    {
        if (_known.TryGetValue(record.Id, out var known)) return known;
        if (depth > Instances.MaxDepth) return Missing(ReasonCode.PlacementNotSupported, "the chain of placements has no end");

        return _known[record.Id] = ResolveOnce(record, depth);
    }

    private Finding<Transform3> ResolveOnce(Part21Record record, int depth) => record.Keyword switch
    {
        "IFCLOCALPLACEMENT" => Local(record, depth),
        "IFCGRIDPLACEMENT" => OnGrid(record, depth),
        "IFCLINEARPLACEMENT" => Linear(record, depth),
        _ => Missing(ReasonCode.PlacementNotSupported, $"the object is placed by {record.Keyword}, which is not read"),
    };

    private Finding<Transform3> Local(Part21Record record, int depth)
    {
        if (Axis2(record[1]) is not { } own)
            return Missing(ReasonCode.DamagedRecord, $"the placement #{record.Id} is damaged");
        if (record[0].IsEmpty) return new Finding<Transform3>.Found(own, "placement");
        if (!_instances.TryFollow(record[0], out var parent))
            return Missing(ReasonCode.DamagedRecord, $"the placement #{record.Id} is relative to nothing");

        return Within(parent, own, "placement", depth);
    }

    /// <summary>On the crossing of two grid axes. IFC4X3 put the placement that it is relative to in front.</summary>
    private Finding<Transform3> OnGrid(Part21Record record, int depth)
    {
        var first = 0;
        if (!_instances.TryFollow(record[0], out var crossing) || crossing.Keyword != "IFCVIRTUALGRIDINTERSECTION")
        {
            first = 1;
            if (!_instances.TryFollow(record[1], out crossing)) return Missing(ReasonCode.DamagedRecord, $"the grid placement #{record.Id} is on no crossing of axes");
        }

        if (_grids.At(crossing, record[first + 1]) is not { } own)
            return Missing(ReasonCode.PlacementNotSupported, $"the grid placement #{record.Id} is not on the crossing of two straight axes");

        var grid = _grids.PlacementOfGrid(crossing);
        if (grid.IsEmpty && first == 1) grid = record[0];
        if (grid.IsEmpty) return new Finding<Transform3>.Found(own, "grid placement");

        return _instances.TryFollow(grid, out var parent)
            ? Within(parent, own, "grid placement", depth)
            : Missing(ReasonCode.DamagedRecord, $"the grid of placement #{record.Id} is placed by nothing");
    }

    /// <summary>Along an alignment: by its Cartesian position, where the text of the standard leaves no doubt what that is relative to.</summary>
    private Finding<Transform3> Linear(Part21Record record, int depth)
    {
        if (record[2].IsEmpty) return Missing(ReasonCode.PlacementNotSupported, $"the linear placement #{record.Id} has no CartesianPosition, and alignments are not evaluated");
        if (Axis2(record[2]) is not { } own) return Missing(ReasonCode.DamagedRecord, $"the linear placement #{record.Id} is damaged");
        if (record[0].IsEmpty) return new Finding<Transform3>.Found(own, "CartesianPosition of the linear placement");
        if (!_instances.TryFollow(record[0], out var parent)) return Missing(ReasonCode.DamagedRecord, $"the placement #{record.Id} is relative to nothing");
        if (!Resolve(parent, depth + 1).TryGet(out var outer, out var why)) return new Finding<Transform3>.Missing(why);

        return IsIdentity(outer.Value)
            ? new Finding<Transform3>.Found(own, "CartesianPosition of the linear placement")
            : Missing(ReasonCode.PlacementNotSupported, $"the linear placement #{record.Id} is relative to a moved placement, and the standard leaves open whether its CartesianPosition is");
    }

    private static bool IsIdentity(Transform3 map) =>
        map.Origin.Length < 1e-9 && (map.X - Vector3.UnitX).Length < 1e-9 && (map.Y - Vector3.UnitY).Length < 1e-9;

    private Finding<Transform3> Within(Part21Record parent, Transform3 own, string source, int depth) => Resolve(parent, depth + 1) switch
    {
        Finding<Transform3>.Found outer => new Finding<Transform3>.Found(outer.Value.After(own), source),
        var missing => missing,
    };

    private static Vector3 Square(Vector3 towards, Vector3 axis)
    {
        var across = towards - towards.Dot(axis) * axis;
        if (across.Length > 1e-9 && across.TryNormalize(out var unit)) return unit;

        var other = Math.Abs(axis.X) < 0.9 ? Vector3.UnitX : Vector3.UnitY;
        _ = (other - other.Dot(axis) * axis).TryNormalize(out unit);
        return unit;
    }

    private static Finding<Transform3> Missing(ReasonCode code, string message) => new Finding<Transform3>.Missing(new Reason(code, message));
}
