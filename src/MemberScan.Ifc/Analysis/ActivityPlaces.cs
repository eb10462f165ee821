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

    /// <summary>Places [m] that the shape aspect of a varying action (IFC2X3) lists for its loads; null when one of them is no point that is read.</summary>
    public double[]? OfAspect(Part21Record activity, Part21Value aspect, AnalyticalMember member)
    {
        if (!instances.TryFollow(aspect, out var record) || instances.FollowEach(record[0]) is not { } representations) return null;

        var places = new List<double>();
        foreach (var representation in representations)
        {
            if (instances.FollowEach(representation[3]) is not { } items) return null;

            foreach (var item in items)
            {
                if (Point(item) is not { } point || Along(activity, point, member) is not { } place) return null;

                places.Add(place);
            }
        }

        return [.. places];
    }

    /// <summary>A vertex, a point, or a point on a line or polyline by its parameter: along a line in multiples of its vector, along a polyline one for each chord.</summary>
    private Vector3? Point(Part21Record item) => item.Keyword switch
    {
        "IFCVERTEXPOINT" => instances.TryFollow(item[0], out var vertex) && vertex.Keyword != "IFCVERTEXPOINT" ? Point(vertex) : null,
        "IFCCARTESIANPOINT" => placements.Point(item),
        "IFCPOINTONCURVE" => instances.TryFollow(item[0], out var curve) && Instances.Real(item[1]) is { } parameter ? OnCurve(curve, parameter) : null,
        _ => null,
    };

    private Vector3? OnCurve(Part21Record curve, double parameter)
    {
        if (curve.Keyword == "IFCTRIMMEDCURVE" && (!instances.TryFollow(curve[0], out curve) || curve.Keyword != "IFCLINE")) return null;
        if (curve.Keyword == "IFCLINE" && instances.TryFollow(curve[0], out var start) && instances.TryFollow(curve[1], out var vector) && units.Length is { } metre)
        {
            return placements.Point(start) is { } from && placements.Direction(vector[0]) is { } along && along.TryNormalize(out var unit) && Instances.Real(vector[1]) is { } size
                ? from + parameter * size * metre * unit
                : null;
        }

        if (curve.Keyword != "IFCPOLYLINE" || instances.FollowEach(curve[0]) is not { Count: > 1 } corners || !(parameter >= 0 && parameter <= corners.Count - 1)) return null;

        var chord = Math.Min((int)parameter, corners.Count - 2);
        return placements.Point(corners[chord]) is { } a && placements.Point(corners[chord + 1]) is { } b ? a + (parameter - chord) * (b - a) : null;
    }

    private IEnumerable<Part21Record> Items(Part21Record activity)
    {
        if (!instances.TryFollow(activity[6], out var shape)) yield break;

        foreach (var representation in instances.FollowAll(shape[2]))
            foreach (var item in instances.FollowAll(representation[3]))
                yield return item;
    }

    private double? Along(Part21Record activity, Part21Record vertex, AnalyticalMember member) =>
        vertex.Keyword == "IFCVERTEXPOINT" && instances.TryFollow(vertex[0], out var record) && placements.Point(record) is { } point ? Along(activity, point, member) : null;

    private double? Along(Part21Record activity, Vector3 point, AnalyticalMember member)
    {
        if (!member.Line.TryGet(out var line, out _) || !(line.Value.End - line.Value.Start).TryNormalize(out var x)) return null;

        var toProject = !activity[5].IsEmpty && placements.Placement(activity[5]) is Finding<Transform3>.Found own ? own.Value : member.ToProject;
        return (toProject.Point(point) - line.Value.Start).Dot(x);
    }
}
