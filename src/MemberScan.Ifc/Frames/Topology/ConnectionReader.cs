using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Schema;
using MemberScan.Model;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>Point connections with their supports.</summary>
internal sealed class ConnectionReader(Instances instances, PlacementReader placements, BoundaryReader boundaries, SchemaVersion schema)
{
    /// <summary>Reads a point connection.</summary>
    public Finding<PointConnection> Read(Part21Record connection)
    {
        var name = Named(connection);
        if (!placements.Placement(connection[5]).TryGet(out var placed, out var notPlaced)) return new Finding<PointConnection>.Missing(notPlaced);
        if (Vertex(connection) is not { } place) return Missing(ReasonCode.DamagedRecord, $"{name} has no vertex that says where it is, or the model names no length unit");

        // Since IFC4 the condition's own system is told relative to the global one, which is that of the shared placement.
        var global = schema == SchemaVersion.Ifc2x3 ? Transform3.Identity : placed.Value;
        if (placements.Axis2(connection[8]) is not { } system) return Missing(ReasonCode.DamagedRecord, $"the condition's coordinate system of {name} is damaged");

        var origin = placed.Value.Point(place);
        var axes = new MemberAxes(origin, global.Direction(system.X), global.Direction(system.Y), global.Direction(system.Z));
        if (connection[7].IsEmpty) return new Finding<PointConnection>.Found(new PointConnection(connection.Id, name, origin, axes, global, null), name);
        if (!instances.TryFollow(connection[7], out var condition)) return Missing(ReasonCode.DamagedRecord, $"the condition of {name} is missing");
        if (boundaries.Read(condition, out var why) is not { } held) return Missing(why!.Code, $"{name}: {why.Message}");

        return new Finding<PointConnection>.Found(new PointConnection(connection.Id, name, origin, axes, global, held), name);
    }

    /// <summary>A structural item by name and STEP id.</summary>
    public static string Named(Part21Record item)
    {
        var name = Instances.Text(item[2]).Trim();
        return name.Length > 0 ? string.Create(CultureInfo.InvariantCulture, $"'{name}' #{item.Id}") : string.Create(CultureInfo.InvariantCulture, $"#{item.Id}");
    }

    private Vector3? Vertex(Part21Record connection)
    {
        if (!instances.TryFollow(connection[6], out var shape)) return null;

        foreach (var representation in instances.FollowAll(shape[2]))
            foreach (var item in instances.FollowAll(representation[3]))
                if (item.Keyword == "IFCVERTEXPOINT" && instances.TryFollow(item[0], out var point))
                    return placements.Point(point);
        return null;
    }

    private static Finding<PointConnection> Missing(ReasonCode code, string message) => new Finding<PointConnection>.Missing(new Reason(code, message));
}
