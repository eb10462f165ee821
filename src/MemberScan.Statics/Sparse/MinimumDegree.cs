using System.Numerics;

namespace MemberScan.Statics.Sparse;

/// <summary>Exact minimum degree on a small part of a graph; nodes around it count for degrees and stay.</summary>
internal static class MinimumDegree
{
    private const int Bits = 64;

    /// <summary>Nodes counted, those around included; the rows of bits grow with the square.</summary>
    private const int MostCounted = 4096;

    /// <summary>The nodes of a part in the sequence of their elimination; among equal degrees the first as given.</summary>
    public static int[] Order(NodeGraph graph, int[] nodes, Func<int, bool> isInside)
    {
        var number = new Dictionary<int, int>(2 * nodes.Length);
        foreach (var v in nodes) number[v] = number.Count;
        foreach (var v in nodes)
            foreach (var u in graph.Of(v))
                if (!isInside(u) && number.Count < MostCounted) number.TryAdd(u, number.Count);

        var words = (number.Count + Bits - 1) / Bits;
        var rows = new ulong[number.Count][];
        for (var i = 0; i < rows.Length; i++) rows[i] = new ulong[words];
        foreach (var v in nodes)
        {
            var i = number[v];
            foreach (var u in graph.Of(v))
            {
                if (!number.TryGetValue(u, out var j)) continue;
                rows[i][j / Bits] |= 1UL << (j % Bits);
                rows[j][i / Bits] |= 1UL << (i % Bits);
            }
        }

        return Eliminate(rows, nodes);
    }

    private static int[] Eliminate(ulong[][] rows, int[] nodes)
    {
        var order = new int[nodes.Length];
        var left = Enumerable.Range(0, nodes.Length).ToList();
        for (var step = 0; step < nodes.Length; step++)
        {
            var (least, at) = (int.MaxValue, 0);
            for (var k = 0; k < left.Count; k++)
            {
                var degree = 0;
                foreach (var word in rows[left[k]]) degree += BitOperations.PopCount(word);
                if (degree < least) (least, at) = (degree, k);
            }

            var gone = left[at];
            left.RemoveAt(at);
            order[step] = nodes[gone];
            Join(rows, gone);
        }

        return order;
    }

    // The neighbours of an eliminated node become neighbours of each other.
    private static void Join(ulong[][] rows, int gone)
    {
        var row = rows[gone];
        for (var word = 0; word < row.Length; word++)
        {
            for (var bits = row[word]; bits != 0; bits &= bits - 1)
            {
                var i = word * Bits + BitOperations.TrailingZeroCount(bits);
                for (var k = 0; k < row.Length; k++) rows[i][k] |= row[k];
                rows[i][i / Bits] &= ~(1UL << (i % Bits));
                rows[i][gone / Bits] &= ~(1UL << (gone % Bits));
            }
        }
    }
}
