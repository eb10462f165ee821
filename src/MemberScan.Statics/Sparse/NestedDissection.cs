using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Sparse;

/// <summary>An order of elimination by nested dissection: a small set of nodes that parts the rest comes last, each part alike.</summary>
/// <remarks>
/// Cuts are sought across the three axes at and beside the median, and by distance in the graph; of each the smallest set of nodes that
/// covers the cut edges is taken (König's theorem on bipartite graphs). Small parts are ordered by minimum degree, the nodes around
/// them counted but not eliminated.
/// </remarks>
internal sealed class NestedDissection
{
    /// <summary>Parts up to this many nodes are not cut further.</summary>
    private const int LargestLeaf = 120;

    private readonly NodeGraph _graph;
    private readonly int[] _part;
    private readonly int[] _order;
    private int _partCount;
    private int _filled;

    private NestedDissection(NodeGraph graph)
    {
        _graph = graph;
        _part = new int[graph.Count];
        _order = new int[graph.Count];
    }

    /// <summary>The order: nodes in the sequence of their elimination. Nodes without unknowns come first.</summary>
    public static int[] Order(NodeGraph graph)
    {
        var made = new NestedDissection(graph);
        for (var v = 0; v < graph.Count; v++)
            if (graph.Weight[v] == 0) (made._order[made._filled++], made._part[v]) = (v, -1);
        made.Run([.. Enumerable.Range(0, graph.Count).Where(v => graph.Weight[v] > 0)]);
        return made._order;
    }

    // Parts wait on a stack, separators too: what is eliminated last goes down first.
    private void Run(int[] all)
    {
        var waiting = new Stack<(int[] Nodes, bool IsSeparator)>();
        waiting.Push((all, false));
        while (waiting.Count > 0)
        {
            var (nodes, isSeparator) = waiting.Pop();
            if (isSeparator)
            {
                foreach (var v in nodes) _order[_filled++] = v;
                continue;
            }

            var part = ++_partCount;
            foreach (var v in nodes) _part[v] = part;
            if (nodes.Length > LargestLeaf && Best(nodes, part) is { } cut)
            {
                waiting.Push((cut.Separator, true));
                waiting.Push((cut.After, false));
                waiting.Push((cut.Before, false));
            }
            else if (nodes.Length > 0) Leaf(nodes, part);
        }
    }

    private void Leaf(int[] nodes, int part)
    {
        if (nodes.Length > 16 * LargestLeaf)                                     // no cut was found: a graph of full rows
        {
            foreach (var v in nodes) _order[_filled++] = v;
            return;
        }

        foreach (var v in MinimumDegree.Order(_graph, nodes, v => _part[v] == part)) _order[_filled++] = v;
    }

    private Cut? Best(int[] nodes, int part)
    {
        Cut? best = null;
        foreach (var sorted in Sortings(nodes, part))
        {
            foreach (var size in Sizes(sorted.Nodes, sorted.Key))
            {
                var cut = Cut.Of(_graph, sorted.Nodes, size, _part, part);
                if (cut.Before.Length > 0 && cut.After.Length > 0 && (best is null || cut.Cost < best.Cost)) best = cut;
            }
        }

        return best;
    }

    private IEnumerable<(int[] Nodes, Func<int, double> Key)> Sortings(int[] nodes, int part)
    {
        var p = _graph.Positions;
        Func<int, Vector3>[] keys = [v => p[v], v => new(p[v].Y, p[v].Z, p[v].X), v => new(p[v].Z, p[v].X, p[v].Y)];
        foreach (var key in keys) yield return ([.. nodes.OrderBy(v => key(v).X).ThenBy(v => key(v).Y).ThenBy(v => key(v).Z).ThenBy(v => v)], v => key(v).X);

        var distance = DistanceInGraph.From(_graph, nodes, v => _part[v] == part);
        yield return ([.. nodes.OrderBy(v => distance[v]).ThenBy(v => v)], v => distance[v]);
    }

    // The middle, and the nearest places beside it where the key changes.
    private static IEnumerable<int> Sizes(int[] sorted, Func<int, double> key)
    {
        var middle = sorted.Length / 2;
        var (before, after) = (middle, middle);
        var tolerance = 1e-9 * (Math.Abs(key(sorted[0])) + Math.Abs(key(sorted[^1])));
        while (before > 0 && Math.Abs(key(sorted[before - 1]) - key(sorted[middle])) <= tolerance) before--;
        while (after < sorted.Length && Math.Abs(key(sorted[after]) - key(sorted[middle])) <= tolerance) after++;
        return new[] { middle, before, after }.Where(size => size > 0 && size < sorted.Length).Distinct();
    }
}
