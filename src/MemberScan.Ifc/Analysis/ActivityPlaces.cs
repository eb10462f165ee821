using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Model;
using MemberScan.Part21;

namespace MemberScan.Ifc.Analysis;

/// <summary>Where on an analytical member actions and reactions lie: by their own vertices and edges, or by locations in their samples.</summary>
internal sealed class ActivityPlaces(Instances instances, PlacementReader placements, ModelUnits units)
{
    /// <summary>Place of the vertex that an activity has as its shape, from the member's start [m]; null when it has none.</summary>
    public double? OfVertex(Part21Record activity, AnalyticalMember member)
    {
        foreach (var item in Items(activity))
            if (item.Keyword == "IFCVERTEXPOINT" && Along(activity, item, member) is { } place)
                return place;
        return null;
    }

    /// <summary>Ends of the edge that an activity has as its shape, from the member's start [m]; null when it has none.</summary>
    public (double From, double To)? OfEdge(Part21Record activity, AnalyticalMember member)
    {
        foreach (var item in Items(activity))
            if (item.Keyword == "IFCEDGE" && instances.TryFollow(item[0], out var start) && instances.TryFollow(item[1], out var end)
                && Along(activity, start, member) is { } from && Along(activity, end, member) is { } to)
                return (from, to);
        return null;
    }

    /// <summary>Locations of a load configuration [m], as many as it lists; NaN for one that is no single number. Null without a unit of length.</summary>
    public double[]? Locations(Part21Record configuration) => units.Length is { } metre
        ? [.. configuration[2].Items.Select(item => Instances.Reals(item) is { Length: 1 } place ? metre * place[0] : double.NaN)]
        : null;

    private IEnumerable<Part21Record> Items(Part21Record activity)
    {
        if (!instances.TryFollow(activity[6], out var shape)) yield break;

        foreach (var representation in instances.FollowAll(shape[2]))
            foreach (var item in instances.FollowAll(representation[3]))
                yield return item;
    }

    private double? Along(Part21Record activity, Part21Record vertex, AnalyticalMember member)
    {
        if (!member.Line.TryGet(out var line, out _) || !(line.Value.End - line.Value.Start).TryNormalize(out var x)) return null;
        if (vertex.Keyword != "IFCVERTEXPOINT" || !instances.TryFollow(vertex[0], out var record) || placements.Point(record) is not { } point) return null;

        var toProject = !activity[5].IsEmpty && placements.Placement(activity[5]) is Finding<Transform3>.Found own ? own.Value : member.ToProject;
        return (toProject.Point(point) - line.Value.Start).Dot(x);
    }
}
