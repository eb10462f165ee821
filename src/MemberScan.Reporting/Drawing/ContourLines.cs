using System.Text;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Drawing;

/// <summary>The part of a sample grid where a value reaches a level, as closed lines (marching squares, common practice).</summary>
/// <remarks>Nodes without a sample count as below every level; they lie farther from the material than one square, so the outline, which clips the picture, hides the lines along them.</remarks>
internal static class ContourLines
{
    /// <summary>Largest distance by which a dropped point may miss the line [picture unit].</summary>
    private const double Tolerance = 0.2;

    // Ways through a square by its corners at or above the level (1: lower left, 2: lower right, 4: upper right, 8: upper left), the higher side
    // to the left of the way. Sides: 0 lower, 1 right, 2 upper, 3 left. 16 and 17 are the two saddles whose middle is at or above the level.
    private static readonly int[][] s_ways =
    [
        [], [0, 3], [1, 0], [1, 3], [2, 1], [0, 3, 2, 1], [2, 0], [2, 3],
        [3, 2], [0, 2], [1, 0, 3, 2], [1, 2], [3, 1], [0, 1], [3, 0], [], [0, 1, 2, 3], [1, 2, 3, 0],
    ];

    /// <summary>Path data of the part at or above a level; empty where there is none.</summary>
    /// <param name="grid">The grid.</param>
    /// <param name="values">Value of each sample.</param>
    /// <param name="level">The level.</param>
    /// <param name="x">Horizontal place in the picture of the centroid.</param>
    /// <param name="y">Vertical place in the picture of the centroid, downward.</param>
    /// <param name="scale">Picture units per metre.</param>
    public static string Path(SampleGrid grid, double[] values, double level, double x, double y, double scale)
    {
        var next = new Dictionary<int, int>();
        for (var row = 0; row + 1 < grid.Rows; row++)
            for (var column = 0; column + 1 < grid.Columns; column++)
                Cross(grid, values, level, row * grid.Columns + column, next);

        var path = new StringBuilder();
        while (next.Count > 0)
        {
            var loop = new List<(double X, double Y)>();
            var edge = next.Keys.First();
            while (next.Remove(edge, out var following))
            {
                var (gy, gz) = Crossing(grid, values, level, edge);
                loop.Add((x + (grid.Left + gy * grid.Cell) * scale, y - (grid.Bottom + gz * grid.Cell) * scale));
                edge = following;
            }

            Append(path, loop);
        }

        return path.ToString();
    }

    private static double At(SampleGrid grid, double[] values, int node) => grid.Numbers[node] is >= 0 and var number ? values[number] : double.NegativeInfinity;

    private static void Cross(SampleGrid grid, double[] values, double level, int node, Dictionary<int, int> next)
    {
        double a = At(grid, values, node), b = At(grid, values, node + 1), c = At(grid, values, node + grid.Columns + 1), d = At(grid, values, node + grid.Columns);
        var corners = (a >= level ? 1 : 0) | (b >= level ? 2 : 0) | (c >= level ? 4 : 0) | (d >= level ? 8 : 0);
        if (corners is 5 or 10 && (a + b + c + d) / 4 >= level) corners = corners == 5 ? 16 : 17;
        var ways = s_ways[corners];
        for (var i = 0; i < ways.Length; i += 2) next[Edge(grid, node, ways[i])] = Edge(grid, node, ways[i + 1]);
    }

    // Twice the node that an edge starts at, one more for an upright one.
    private static int Edge(SampleGrid grid, int node, int side) => side switch
    {
        0 => 2 * node,
        1 => 2 * (node + 1) + 1,
        2 => 2 * (node + grid.Columns),
        _ => 2 * node + 1,
    };

    private static (double Column, double Row) Crossing(SampleGrid grid, double[] values, double level, int edge)
    {
        var (node, isUpright) = (edge / 2, edge % 2 == 1);
        var (from, to) = (At(grid, values, node), At(grid, values, node + (isUpright ? grid.Columns : 1)));
        var share = double.IsInfinity(from) ? 0.02 : double.IsInfinity(to) ? 0.98 : (level - from) / (to - from);
        return (node % grid.Columns + (isUpright ? 0 : share), node / grid.Columns + (isUpright ? share : 0));
    }

    private static void Append(StringBuilder path, List<(double X, double Y)> loop)
    {
        if (loop.Count < 3) return;

        var kept = 0;
        path.Append('M').Append(Ink.C(loop[0].X)).Append(' ').Append(Ink.C(loop[0].Y));
        for (var i = 2; i <= loop.Count; i++)
        {
            if (i < loop.Count && IsStraight(loop, kept, i)) continue;

            kept = i - 1;
            path.Append('L').Append(Ink.C(loop[kept].X)).Append(' ').Append(Ink.C(loop[kept].Y));
        }

        path.Append('Z');
    }

    private static bool IsStraight(List<(double X, double Y)> loop, int from, int to)
    {
        var (dx, dy) = (loop[to].X - loop[from].X, loop[to].Y - loop[from].Y);
        var length = double.Hypot(dx, dy);
        for (var i = from + 1; i < to; i++)
        {
            var (px, py) = (loop[i].X - loop[from].X, loop[i].Y - loop[from].Y);
            if ((length == 0 ? double.Hypot(px, py) : Math.Abs(px * dy - py * dx) / length) > Tolerance) return false;
        }

        return true;
    }
}
