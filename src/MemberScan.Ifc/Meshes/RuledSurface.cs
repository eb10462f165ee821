using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Part21;

namespace MemberScan.Ifc.Meshes;

/// <summary>B-spline surfaces that are one curve moved along one direction: the sides of prisms.</summary>
internal sealed class RuledSurface(Instances instances, PlacementReader placements)
{
    /// <summary>Most control points that are followed.</summary>
    public const int MostPoints = 5_000;

    /// <summary>Largest distance of a control point from where the movement puts it, over the net's size; of weights over the weight [-].</summary>
    private const double Tolerance = 1e-6;

    private readonly Dictionary<ulong, bool> _known = [];

    /// <summary>Whether a surface is a B-spline whose rows, or columns, of control points are one row moved along one direction.</summary>
    public bool IsOfParallelLines(Part21Record surface)
    {
        if (_known.TryGetValue(surface.Id, out var known)) return known;

        var isSpline = surface.Keyword is "IFCBSPLINESURFACEWITHKNOTS" or "IFCRATIONALBSPLINESURFACEWITHKNOTS";
        return _known[surface.Id] = isSpline && Net(surface) is { } net && (IsMoved(net) || IsMoved(Transposed(net)));
    }

    private (Vector3 Point, double Weight)[][]? Net(Part21Record surface)
    {
        var rows = surface[2].Items;
        if (rows.Count < 2 || rows.Sum(row => (long)row.ItemCount) > MostPoints) return null;

        var weights = surface.Keyword == "IFCRATIONALBSPLINESURFACEWITHKNOTS" ? surface[12].Items.Select(Instances.Reals).ToList() : null;
        if (weights is not null && weights.Count != rows.Count) return null;

        var net = new (Vector3, double)[rows.Count][];
        for (var i = 0; i < rows.Count; i++)
        {
            if (instances.FollowEach(rows[i]) is not { Count: >= 2 } records || records.ConvertAll(placements.Point) is not { } points || points.Exists(p => p is null)) return null;
            if (weights is not null && weights[i]?.Length != points.Count) return null;

            net[i] = [.. points.Select((p, k) => (p!.Value, weights is null ? 1.0 : weights[i]![k]))];
        }

        return Array.TrueForAll(net, row => row.Length == net[0].Length) ? net : null;
    }

    private static (Vector3 Point, double Weight)[][] Transposed((Vector3 Point, double Weight)[][] net) =>
        [.. Enumerable.Range(0, net[0].Length).Select(k => net.Select(row => row[k]).ToArray())];

    private static bool IsMoved((Vector3 Point, double Weight)[][] net)
    {
        var size = net.SelectMany(row => row).Max(c => (c.Point - net[0][0].Point).Length);
        if (!(net[^1][0].Point - net[0][0].Point).TryNormalize(out var along)) return false;

        return Array.TrueForAll(net, row =>
        {
            var move = row[0].Point - net[0][0].Point;
            return move.Cross(along).Length <= Tolerance * size && row.Zip(net[0]).All(pair =>
                (pair.First.Point - pair.Second.Point - move).Length <= Tolerance * size && Math.Abs(pair.First.Weight - pair.Second.Weight) <= Tolerance * pair.Second.Weight);
        });
    }
}
