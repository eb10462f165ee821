using System.Collections.Immutable;

namespace MemberScan.Mechanics.Outlines;

/// <summary>Nodes of a coarse search over a section, with their neighbours.</summary>
/// <param name="P">First chart coordinate of each node.</param>
/// <param name="Q">Second chart coordinate of each node.</param>
/// <param name="Neighbours">Nodes × <see cref="NeighbourCount"/>, row-major; −1 where there is none.</param>
/// <param name="PitchP">Distance between neighbouring nodes in p.</param>
/// <param name="PitchQ">The same in q; 0 where q only numbers separate curves.</param>
internal sealed record Lattice(
    ImmutableArray<double> P, ImmutableArray<double> Q, ImmutableArray<int> Neighbours, double PitchP, double PitchQ)
{
    /// <summary>Places for neighbours kept for each node.</summary>
    public const int NeighbourCount = 8;

    /// <summary>Whether q only numbers separate curves.</summary>
    public bool AreCurves => PitchQ == 0;

    /// <summary>Number of nodes.</summary>
    public int Count => P.Length;

    /// <summary>A lattice of rows and columns whose columns may close into a ring.</summary>
    /// <param name="rows">Values of q, one a row.</param>
    /// <param name="columns">Values of p, one a column.</param>
    /// <param name="ring">Whether the last column is the neighbour of the first.</param>
    public static Lattice Grid(ReadOnlySpan<double> rows, ReadOnlySpan<double> columns, bool ring) => Build(rows, columns, ring, curves: false);

    /// <summary>Separate curves, numbered by q: sin p runs from −1 to 1 along each, or p once around.</summary>
    public static Lattice Curves(int count, int nodesEach, bool ring) => Build(
        [.. Enumerable.Range(0, count).Select(q => (double)q)],
        ring ? Even(0, 2 * Math.PI, nodesEach + 1).AsSpan(0, nodesEach) : Even(-Math.PI / 2, Math.PI / 2, nodesEach),
        ring, curves: true);

    /// <summary>Values from one end to the other at equal distances, both ends included to the last bit.</summary>
    public static double[] Even(double from, double to, int count)
    {
        var values = new double[count];
        for (var i = 0; i < count; i++)
        {
            // From both ends towards the middle: symmetric values are exact opposites.
            var share = (double)i / (count - 1);
            values[i] = from * (1 - share) + to * share;
        }

        return values;
    }

    private static Lattice Build(ReadOnlySpan<double> rows, ReadOnlySpan<double> columns, bool ring, bool curves)
    {
        var (p, q) = (ImmutableArray.CreateBuilder<double>(), ImmutableArray.CreateBuilder<double>());
        var neighbours = ImmutableArray.CreateBuilder<int>();
        for (var i = 0; i < rows.Length; i++)
        {
            for (var j = 0; j < columns.Length; j++)
            {
                p.Add(columns[j]);
                q.Add(rows[i]);
                for (var di = -1; di <= 1; di++)
                {
                    for (var dj = -1; dj <= 1; dj++)
                    {
                        if (di == 0 && dj == 0) continue;
                        var (row, column) = (i + di, ring ? (j + dj + columns.Length) % columns.Length : j + dj);
                        var exists = row >= 0 && row < rows.Length && column >= 0 && column < columns.Length && !(curves && di != 0);
                        neighbours.Add(exists ? row * columns.Length + column : -1);
                    }
                }
            }
        }

        return new Lattice(
            p.ToImmutable(), q.ToImmutable(), neighbours.ToImmutable(),
            columns[1] - columns[0], curves ? 0 : rows[1] - rows[0]);
    }
}
