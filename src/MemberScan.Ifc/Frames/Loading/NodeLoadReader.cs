using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Frames.Topology;
using MemberScan.Ifc.Units;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Loading;

/// <summary>Forces and forced displacements on point connections.</summary>
internal sealed class NodeLoadReader(Instances instances, Relations relations, ModelUnits units)
{
    /// <summary>All actions on a connection, in the order of the model; those that cannot be used are among them, with the reason.</summary>
    /// <param name="connection">The connection.</param>
    /// <param name="node">Number of its node, from 0.</param>
    /// <param name="support">What holds the node; null if nothing does.</param>
    public IEnumerable<NodeAction> On(PointConnection connection, int node, FrameSupport? support)
    {
        foreach (var id in relations.ActivitiesOn(connection.Id))
            if (instances.File.TryFind(id, out var action) && action.Keyword == "IFCSTRUCTURALPOINTACTION")
                yield return Read(action, connection, node, support);
    }

    private NodeAction Read(Part21Record action, PointConnection connection, int node, FrameSupport? support)
    {
        var blank = new NodeAction(action.Id, node, [.. relations.GroupsOf(action.Id)], default, default, [], string.Create(CultureInfo.InvariantCulture, $"{action.Keyword} #{action.Id}"), null);
        if (!instances.TryFollow(action[7], out var load)) return Unusable(blank, ReasonCode.DamagedRecord, "has no values");

        var isLocal = Instances.Literal(action[8]) == "LOCAL_COORDS";
        return load.Keyword switch
        {
            "IFCSTRUCTURALLOADSINGLEFORCE" or "IFCSTRUCTURALLOADSINGLEFORCEWARPING" => Force(blank, load, connection, isLocal),
            "IFCSTRUCTURALLOADSINGLEDISPLACEMENT" or "IFCSTRUCTURALLOADSINGLEDISPLACEMENTDISTORTION" => Movement(blank, load, connection, support, isLocal),
            _ => Unusable(blank, ReasonCode.ForcesIncomplete, $"holds {load.Keyword}, which is no force and no displacement of a node"),
        };
    }

    private NodeAction Force(NodeAction action, Part21Record load, PointConnection connection, bool isLocal)
    {
        if (Values(load, units.Force, units.Torque) is not { } six)
            return Unusable(action, ReasonCode.UnitMissing, "holds something other than numbers, or its units are missing (FORCEUNIT, TORQUEUNIT)");

        Vector3 ToProject(Vector3 v) => isLocal ? v.X * connection.Axes.X + v.Y * connection.Axes.Y + v.Z * connection.Axes.Z : connection.GlobalAxes.Direction(v);
        return action with { Force = ToProject(new(six[0], six[1], six[2])), Moment = ToProject(new(six[3], six[4], six[5])) };
    }

    private NodeAction Movement(NodeAction action, Part21Record load, PointConnection connection, FrameSupport? support, bool isLocal)
    {
        if (support is null) return Unusable(action, ReasonCode.ForcesIncomplete, $"moves the connection {connection.Name}, which no support holds");
        if (Values(load, units.Length, units.Angle) is not { } six) return Unusable(action, ReasonCode.UnitMissing, "holds something other than numbers, or the unit of lengths is missing (LENGTHUNIT)");

        // Said in the support's own axes: turned where the load is in global ones, direction by direction where these are the same.
        var axes = new MemberAxes(connection.Position, support.X, support.Y, support.X.Cross(support.Y));
        Vector3 ToSupport(Vector3 v) => isLocal ? v : axes.Components(connection.GlobalAxes.Direction(v));
        var (shift, turn) = (ToSupport(new(six[0], six[1], six[2])), ToSupport(new(six[3], six[4], six[5])));
        double[] values = [shift.X, shift.Y, shift.Z, turn.X, turn.Y, turn.Z];
        var movements = ImmutableArray.CreateBuilder<SupportMovement>();
        for (var i = 0; i < 6; i++)
        {
            if (values[i] == 0) continue;

            var direction = (Direction)i;
            if (support.Restraints[direction].Kind != RestraintKind.Fixed)
                return Unusable(action, ReasonCode.ForcesIncomplete, $"moves the connection {connection.Name} in {direction}, in which its support does not hold it rigidly");

            movements.Add(new SupportMovement(action.Node, direction, values[i]));
        }

        return action with { Movements = movements.ToImmutable() };
    }

    /// <summary>Six numbers in SI; what is left out is 0. Null when one is none, or its unit is missing.</summary>
    private static double[]? Values(Part21Record load, double? first, double? second)
    {
        var six = new double[6];
        for (var i = 0; i < 6; i++)
        {
            if (load[i + 1].IsEmpty) continue;
            if (Instances.Real(load[i + 1]) is not { } value || !double.IsFinite(value)) return null;
            if (value == 0) continue;
            if ((i < 3 ? first : second) is not { } factor) return null;

            six[i] = value * factor;
        }

        return six;
    }

    private static NodeAction Unusable(NodeAction action, ReasonCode code, string words) => action with { Unusable = new Reason(code, $"the load {action.Source} {words}") };
}
