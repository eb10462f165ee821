using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>The nodes of a frame as they are met; points within a tolerance are one node.</summary>
/// <remarks>The first point of a node stays its position, so the order of the file decides and nothing creeps along a row of near points.</remarks>
internal sealed class NodePool(double tolerance)
{
    private readonly List<FrameNode> _nodes = [];
    private readonly HashSet<string> _names = new(StringComparer.Ordinal);
    private readonly Dictionary<(long X, long Y, long Z), List<int>> _cells = [];

    /// <summary>The nodes so far.</summary>
    public IReadOnlyList<FrameNode> Nodes => _nodes;

    /// <summary>Number of the node at a point, from 0; a new one where none lies within the tolerance.</summary>
    /// <param name="point">The point [m].</param>
    /// <param name="name">Name for a new node; null for its position in words.</param>
    public int At(Vector3 point, string? name = null)
    {
        if (Find(point) is { } known) return known;

        var number = _nodes.Count;
        _nodes.Add(new FrameNode(Unique(name ?? Words(point), number), point));
        var cell = Cell(point);
        if (!_cells.TryGetValue(cell, out var list)) _cells[cell] = list = [];
        list.Add(number);
        return number;
    }

    /// <summary>A node of its own, that no other point is merged with: a corner within a member.</summary>
    /// <param name="point">The point [m].</param>
    /// <param name="name">Its name.</param>
    public int Apart(Vector3 point, string name)
    {
        _nodes.Add(new FrameNode(Unique(name, _nodes.Count), point));
        return _nodes.Count - 1;
    }

    /// <summary>Number of the nearest node within the tolerance; null when there is none.</summary>
    public int? Find(Vector3 point)
    {
        var (x, y, z) = Cell(point);
        int? nearest = null;
        var least = tolerance;
        for (var i = x - 1; i <= x + 1; i++)
            for (var j = y - 1; j <= y + 1; j++)
                for (var k = z - 1; k <= z + 1; k++)
                    foreach (var number in _cells.GetValueOrDefault((i, j, k)) ?? [])
                        if ((_nodes[number].Position - point).Length is var distance && distance <= least)
                            (nearest, least) = (number, distance);
        return nearest;
    }

    /// <summary>A point in words.</summary>
    public static string Words(Vector3 p) => string.Create(CultureInfo.InvariantCulture, $"node at ({p.X:0.####}, {p.Y:0.####}, {p.Z:0.####}) m");

    private string Unique(string name, int number)
    {
        if (_names.Add(name)) return name;

        var numbered = string.Create(CultureInfo.InvariantCulture, $"{name} ({number + 1})");
        _names.Add(numbered);
        return numbered;
    }

    private (long X, long Y, long Z) Cell(Vector3 p) => ((long)Math.Floor(p.X / tolerance), (long)Math.Floor(p.Y / tolerance), (long)Math.Floor(p.Z / tolerance));
}
