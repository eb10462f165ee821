using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>Which curve member is joined to which point connection, and with what eccentricity.</summary>
internal sealed class JointReader
{
    private readonly Instances _instances;
    private readonly PlacementReader _placements;
    private readonly ModelUnits _units;
    private readonly Dictionary<ulong, List<Part21Record>> _relationsOf = [];

    public JointReader(Instances instances, PlacementReader placements, ModelUnits units)
    {
        (_instances, _placements, _units) = (instances, placements, units);
        foreach (var keyword in (string[])["IFCRELCONNECTSSTRUCTURALMEMBER", "IFCRELCONNECTSWITHECCENTRICITY"])
            foreach (var relation in instances.File.RecordsOf(keyword))
                if (relation[4].TryReference(out var member))
                {
                    if (!_relationsOf.TryGetValue(member, out var list)) _relationsOf[member] = list = [];
                    list.Add(relation);
                }
    }

    /// <summary>Connections that a member is joined to, whether they are points or not.</summary>
    public IEnumerable<ulong> ConnectionsOf(ulong member)
    {
        foreach (var relation in _relationsOf.GetValueOrDefault(member) ?? [])
            if (relation[5].TryReference(out var connection))
                yield return connection;
    }

    /// <summary>The joints of a member with point connections; null with the reason when one cannot be read.</summary>
    public List<Joint>? Read(AnalyticalMember member, out Reason? why)
    {
        why = null;
        var joints = new List<Joint>();
        foreach (var relation in _relationsOf.GetValueOrDefault(member.Id) ?? [])
        {
            if (!_instances.TryFollow(relation[5], out var connection) || connection.Keyword != "IFCSTRUCTURALPOINTCONNECTION") continue;
            if (Offset(relation, member, out why) is not { } offset) return null;

            joints.Add(new Joint(relation, connection.Id, offset));
        }

        return joints;
    }

    private Vector3? Offset(Part21Record relation, AnalyticalMember member, out Reason? why)
    {
        why = null;
        if (relation.Keyword != "IFCRELCONNECTSWITHECCENTRICITY") return Vector3.Zero;
        if (!_instances.TryFollow(relation[10], out var geometry) || geometry.Keyword is not ("IFCCONNECTIONPOINTGEOMETRY" or "IFCCONNECTIONPOINTECCENTRICITY"))
            return Unknown(relation, "has an eccentricity that is not between two points", out why);

        // Where points and numbers disagree the points count.
        if (Point(geometry[0]) is { } onMember && Point(geometry[1]) is { } onNode) return member.ToProject.Direction(onMember - onNode);
        if (geometry.Keyword != "IFCCONNECTIONPOINTECCENTRICITY" || (geometry[2].IsEmpty && geometry[3].IsEmpty && geometry[4].IsEmpty))
            return Unknown(relation, "does not say how far the member lies from the connection", out why);
        if (!member.Axes.TryGet(out var axes, out why)) return null;
        if (_units.Length is not { } metre) return Unknown(relation, "has lengths whose unit the model does not name (LENGTHUNIT)", out why);

        return metre * ((Instances.Real(geometry[2]) ?? 0) * axes.Value.X + (Instances.Real(geometry[3]) ?? 0) * axes.Value.Y + (Instances.Real(geometry[4]) ?? 0) * axes.Value.Z);
    }

    private Vector3? Point(Part21Value value)
    {
        if (!_instances.TryFollow(value, out var record)) return null;
        if (record.Keyword == "IFCVERTEXPOINT" && !_instances.TryFollow(record[0], out record)) return null;

        return _placements.Point(record);
    }

    private static Vector3? Unknown(Part21Record relation, string words, out Reason? why)
    {
        why = new Reason(ReasonCode.NoForces, $"the relation #{relation.Id} {words}");
        return null;
    }
}
