namespace MemberScan.Statics.Sparse;

/// <summary>Distances in a part of a graph, counted in edges, from a node at its rim.</summary>
internal static class DistanceInGraph
{
    /// <summary>Distances of the nodes of a part; those that cannot be reached are one step beyond all others.</summary>
    public static Dictionary<int, int> From(NodeGraph graph, int[] nodes, Func<int, bool> isInside)
    {
        var rim = nodes[0];
        for (var round = 0; round < 2; round++) rim = Walk(graph, rim, isInside).Last;
        var distance = Walk(graph, rim, isInside).Distance;
        var beyond = distance.Values.Max() + 1;
        foreach (var v in nodes) distance.TryAdd(v, beyond);
        return distance;
    }

    private static (Dictionary<int, int> Distance, int Last) Walk(NodeGraph graph, int root, Func<int, bool> isInside)
    {
        var distance = new Dictionary<int, int> { [root] = 0 };
        var waiting = new Queue<int>([root]);
        var last = root;
        while (waiting.TryDequeue(out var v))
        {
            last = v;
            foreach (var u in graph.Of(v))
                if (isInside(u) && distance.TryAdd(u, distance[v] + 1)) waiting.Enqueue(u);
        }

        return (distance, last);
    }
}
