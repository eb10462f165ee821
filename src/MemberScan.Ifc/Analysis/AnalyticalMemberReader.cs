using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis;

/// <summary>Lines and axes of curve members, by the rules of each schema.</summary>
internal sealed class AnalyticalMemberReader(
    Instances instances, Relations relations, PlacementReader placements, ModelUnits units, SchemaVersion schema, DiagnosticList diagnostics)
{
    private readonly Dictionary<ulong, AnalyticalMember?> _known = [];

    /// <summary>Reads a curve member; null when the id names none.</summary>
    public AnalyticalMember? Read(ulong id)
    {
        if (_known.TryGetValue(id, out var known)) return known;

        var isOne = instances.File.TryFind(id, out var record) && record.Keyword is "IFCSTRUCTURALCURVEMEMBER" or "IFCSTRUCTURALCURVEMEMBERVARYING";
        return _known[id] = isOne ? Read(record) : null;
    }

    private AnalyticalMember Read(Part21Record member)
    {
        var placed = placements.Placement(member[5]);
        var toProject = placed is Finding<Transform3>.Found found ? found.Value : Transform3.Identity;
        var line = Line(member, toProject);
        var axes = placed.TryGet(out _, out var notPlaced) ? Axes(member, line, toProject) : new Finding<MemberAxes>.Missing(notPlaced);
        return new AnalyticalMember(member.Id, Instances.Text(member[2]), Instances.Text(member[0]), axes, line, toProject, schema == SchemaVersion.Ifc2x3 ? Transform3.Identity : toProject)
        {
            EccentricCardinalPoint = EccentricCardinalPoint(member.Id),
        };
    }

    // 10 is the geometric centroid; 5 mid-depth centre and 15 shear centre are the same point in doubly symmetric sections alone.
    private long? EccentricCardinalPoint(ulong member)
    {
        foreach (var id in relations.MaterialsOf(member))
            if (instances.File.TryFind(id, out var usage) && usage.Keyword.StartsWith("IFCMATERIALPROFILESETUSAGE", StringComparison.Ordinal) && usage[1].TryInteger(out var point))
                return point == 10 || point is 5 or 15 && IsDoublySymmetric(usage) ? null : point;
        return null;
    }

    private bool IsDoublySymmetric(Part21Record usage) =>
        instances.TryFollow(usage[0], out var set) && instances.FollowEach(set[2]) is { Count: > 0 } parts
        && parts.TrueForAll(part => instances.TryFollow(part[3], out var profile) && IsDoublySymmetric(profile, depth: 0));

    private bool IsDoublySymmetric(Part21Record profile, int depth) => profile.Keyword switch
    {
        "IFCCIRCLEPROFILEDEF" or "IFCCIRCLEHOLLOWPROFILEDEF" or "IFCRECTANGLEPROFILEDEF" or "IFCROUNDEDRECTANGLEPROFILEDEF"
            or "IFCRECTANGLEHOLLOWPROFILEDEF" or "IFCELLIPSEPROFILEDEF" or "IFCISHAPEPROFILEDEF" => true,
        "IFCDERIVEDPROFILEDEF" or "IFCMIRROREDPROFILEDEF" => depth < ProfileReader.MaxNesting && instances.TryFollow(profile[2], out var parent) && IsDoublySymmetric(parent, depth + 1),
        _ => false,
    };

    private Finding<(Vector3 Start, Vector3 End)> Line(Part21Record member, Transform3 toProject)
    {
        if (units.Length is null) return NoLine(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (Edge(member) is not { } edge) return NoLine(ReasonCode.LengthAmbiguous, $"the analytical member #{member.Id} has no edge");

        if (edge.Keyword == "IFCORIENTEDEDGE")
        {
            if (!instances.TryFollow(edge[2], out var inner)) return NoLine(ReasonCode.DamagedRecord, $"the edge #{edge.Id} is damaged");
            if (Instances.Literal(edge[3]) == "F")
                diagnostics.Add("IFC-0020", Severity.Warning, "An analytical member's edge runs against its curve; its x axis follows the curve.", member.Span);
            edge = inner;
        }

        var isCurved = edge.Keyword == "IFCEDGECURVE" && (!instances.TryFollow(edge[2], out var curve) || !IsStraight(curve));
        if (isCurved) return NoLine(ReasonCode.LengthAmbiguous, $"the analytical member #{member.Id} is curved, which is not read");
        if (Vertex(edge[0]) is not { } start || Vertex(edge[1]) is not { } end || (end - start).Length <= 0)
            return NoLine(ReasonCode.DamagedRecord, $"the edge #{edge.Id} has no two different end points");

        if (edge.Keyword == "IFCEDGECURVE" && Instances.Literal(edge[3]) == "F")
        {
            diagnostics.Add("IFC-0020", Severity.Warning, "An analytical member's edge runs against its curve; its x axis follows the curve.", member.Span);
            (start, end) = (end, start);
        }

        return new Finding<(Vector3, Vector3)>.Found(
            (toProject.Point(start), toProject.Point(end)), string.Create(CultureInfo.InvariantCulture, $"edge #{edge.Id} of the analytical member #{member.Id}"));
    }

    private Part21Record? Edge(Part21Record member)
    {
        if (!instances.TryFollow(member[6], out var shape)) return null;

        foreach (var representation in instances.FollowAll(shape[2]))
            foreach (var item in instances.FollowAll(representation[3]))
                if (item.Keyword is "IFCEDGE" or "IFCEDGECURVE" or "IFCORIENTEDEDGE" or "IFCSUBEDGE")
                    return item;
        return null;
    }

    private bool IsStraight(Part21Record curve) =>
        curve.Keyword == "IFCLINE"
        || (curve.Keyword == "IFCPOLYLINE" && curve[0].ItemCount == 2)
        || (curve.Keyword == "IFCTRIMMEDCURVE" && instances.TryFollow(curve[0], out var basis) && basis.Keyword == "IFCLINE");

    private Vector3? Vertex(Part21Value value) =>
        instances.TryFollow(value, out var vertex) && vertex.Keyword == "IFCVERTEXPOINT" && instances.TryFollow(vertex[0], out var point)
            ? placements.Point(point)
            : null;

    private Finding<MemberAxes> Axes(Part21Record member, Finding<(Vector3 Start, Vector3 End)> line, Transform3 toProject)
    {
        if (!line.TryGet(out var found, out var why)) return new Finding<MemberAxes>.Missing(why);

        var (start, along) = (found.Value.Start, found.Value.End - found.Value.Start);
        if (schema == SchemaVersion.Ifc2x3 && member[8].IsEmpty) return Axes2x3(member, start, along, toProject);

        if (placements.Direction(member[8]) is not { } axis)
            return NoAxes($"the analytical member #{member.Id} has no Axis, so its y and z are not known");

        return MemberAxes.From(start, along, toProject.Direction(axis)) is { } axes
            ? new Finding<MemberAxes>.Found(axes, $"Axis of the analytical member #{member.Id}")
            : NoAxes($"the Axis of the analytical member #{member.Id} lies along it, so its y and z are not known");
    }

    /// <summary>IFC2X3: z from the orientation of the profile properties; without one global Z, for a vertical member global X.</summary>
    private Finding<MemberAxes> Axes2x3(Part21Record member, Vector3 start, Vector3 along, Transform3 toProject)
    {
        var axes = along.TryNormalize(out var x) && x.Cross(Vector3.UnitZ).Length < 1e-3
            ? MemberAxes.From(start, along, Vector3.UnitX)
            : MemberAxes.From(start, along, Vector3.UnitZ);
        var orientation = relations.ProfilePropertiesOf(member.Id).Select(p => p.Orientation).FirstOrDefault(o => !o.IsEmpty);
        if (placements.Direction(orientation) is { } direction)
            axes = MemberAxes.From(start, along, toProject.Direction(direction));
        else if (Instances.Real(orientation) is { } angle && axes is not null)
            axes = MemberAxes.From(start, along, Math.Cos(angle * units.Angle) * axes.Z + Math.Sin(angle * units.Angle) * axes.Y);

        return axes is null
            ? NoAxes($"the orientation of the analytical member #{member.Id} lies along it")
            : new Finding<MemberAxes>.Found(axes, $"orientation of the analytical member #{member.Id}");
    }

    private static Finding<(Vector3 Start, Vector3 End)> NoLine(ReasonCode code, string message) =>
        new Finding<(Vector3 Start, Vector3 End)>.Missing(new Reason(code, message));

    private static Finding<MemberAxes> NoAxes(string message) => new Finding<MemberAxes>.Missing(new Reason(ReasonCode.AxesUnknown, message));
}
