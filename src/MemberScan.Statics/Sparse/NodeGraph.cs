using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Sparse;

/// <summary>Which nodes are joined: neighbours of each, without itself, rising; with the places of the nodes.</summary>
/// <param name="Start">Where the neighbours of a node begin; one more than there are nodes.</param>
/// <param name="Neighbours">The neighbours.</param>
/// <param name="Positions">Places of the nodes; any numbers do, they only guide the cuts.</param>
/// <param name="Weight">Number of unknowns of each node.</param>
internal sealed record NodeGraph(int[] Start, int[] Neighbours, Vector3[] Positions, int[] Weight)
{
    /// <summary>Number of nodes.</summary>
    public int Count => Weight.Length;

    /// <summary>Neighbours of a node.</summary>
    public ReadOnlySpan<int> Of(int node) => Neighbours.AsSpan(Start[node]..Start[node + 1]);

    /// <summary>The graph of the lower triangle of a pattern.</summary>
    /// <param name="columnsOf">Columns of a row, the diagonal included.</param>
    /// <param name="positions">Places of the nodes.</param>
    /// <param name="weight">Number of unknowns of each node; nodes without any are left without neighbours.</param>
    public static NodeGraph Of(Func<int, ReadOnlyMemory<int>> columnsOf, Vector3[] positions, int[] weight)
    {
        var n = weight.Length;
        var start = new int[n + 1];
        for (var row = 0; row < n; row++)
            foreach (var column in columnsOf(row).Span)
                if (column != row && weight[row] > 0 && weight[column] > 0) (start[row + 1], start[column + 1]) = (start[row + 1] + 1, start[column + 1] + 1);
        for (var i = 0; i < n; i++) start[i + 1] += start[i];
        var (next, neighbours) = (start[..^1].ToArray(), new int[start[n]]);
        for (var row = 0; row < n; row++)
        {
            foreach (var column in columnsOf(row).Span)
            {
                if (column == row || weight[row] == 0 || weight[column] == 0) continue;
                neighbours[next[row]++] = column;
                neighbours[next[column]++] = row;
            }
        }

        for (var i = 0; i < n; i++) Array.Sort(neighbours, start[i], start[i + 1] - start[i]);
        return new NodeGraph(start, neighbours, positions, weight);
    }
}
