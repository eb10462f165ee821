namespace MemberScan.Statics.Sparse;

/// <summary>A part of a graph cut in two by a set of nodes.</summary>
/// <param name="Before">One side.</param>
/// <param name="After">The other side; no edge leads to the first.</param>
/// <param name="Separator">The nodes between.</param>
internal sealed record Cut(int[] Before, int[] After, int[] Separator)
{
    /// <summary>What the cut costs: its size, more where the sides are uneven.</summary>
    public double Cost
    {
        get
        {
            var share = (double)Math.Min(Before.Length, After.Length) / (Before.Length + After.Length);
            return (Separator.Length + 1) * (1 + 8 * (0.5 - share) * (0.5 - share) / (share + 0.05));
        }
    }

    /// <summary>Cuts sorted nodes after the first so many; the smallest set of nodes that covers the cut edges parts them.</summary>
    /// <param name="graph">The graph.</param>
    /// <param name="sorted">Nodes of the part.</param>
    /// <param name="size">How many of them come first.</param>
    /// <param name="part">Part of each node of the graph.</param>
    /// <param name="number">The part.</param>
    public static Cut Of(NodeGraph graph, int[] sorted, int size, int[] part, int number)
    {
        var isFirst = new HashSet<int>(sorted[..size]);
        var edges = new Dictionary<int, List<int>>();
        foreach (var v in sorted.AsSpan(0, size))
            foreach (var u in graph.Of(v))
                if (part[u] == number && !isFirst.Contains(u)) (edges.TryGetValue(v, out var list) ? list : edges[v] = []).Add(u);

        var cover = Cover(edges);
        return new Cut(
            [.. sorted[..size].Where(v => !cover.Contains(v))], [.. sorted[size..].Where(v => !cover.Contains(v))], [.. sorted.Where(cover.Contains)]);
    }

    // König: from the unmatched left nodes walk to the right by any edge and back by matched ones; the cover is what is left of the left side and reached of the right.
    private static HashSet<int> Cover(Dictionary<int, List<int>> edges)
    {
        var matchOfRight = new Dictionary<int, int>();
        var matchOfLeft = new Dictionary<int, int>();
        foreach (var left in edges.Keys) Augment(edges, left, matchOfLeft, matchOfRight);

        var (reachedLeft, reachedRight) = (new HashSet<int>(), new HashSet<int>());
        var waiting = new Stack<int>(edges.Keys.Where(left => !matchOfLeft.ContainsKey(left)));
        while (waiting.TryPop(out var left))
        {
            if (!reachedLeft.Add(left)) continue;
            foreach (var right in edges[left])
                if (reachedRight.Add(right) && matchOfRight.TryGetValue(right, out var back)) waiting.Push(back);
        }

        return [.. edges.Keys.Where(left => !reachedLeft.Contains(left)), .. reachedRight];
    }

    // One augmenting path, breadth first.
    private static void Augment(Dictionary<int, List<int>> edges, int root, Dictionary<int, int> matchOfLeft, Dictionary<int, int> matchOfRight)
    {
        var cameFrom = new Dictionary<int, int>();                               // right node → left node before it
        var waiting = new Queue<int>([root]);
        while (waiting.TryDequeue(out var left))
        {
            foreach (var right in edges[left])
            {
                if (!cameFrom.TryAdd(right, left)) continue;
                if (matchOfRight.TryGetValue(right, out var next))
                {
                    waiting.Enqueue(next);
                    continue;
                }

                for (var at = right; ;)
                {
                    var from = cameFrom[at];
                    var hadBefore = matchOfLeft.TryGetValue(from, out var before);
                    (matchOfRight[at], matchOfLeft[from]) = (from, at);
                    if (!hadBefore) return;
                    at = before;
                }
            }
        }
    }
}
