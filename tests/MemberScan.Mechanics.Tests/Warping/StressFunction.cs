using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Tests.Warping;

/// <summary>Torsion constant of a box by Prandtl's stress function on bilinear elements: never above the true value.</summary>
/// <remarks>
/// <c>J = max [4(∫φ dA + c·A_hole) − ∫|∇φ|² dA]</c> over φ that vanish outside and equal c along the hole; any choice gives too little. Source:
/// Timoshenko and Goodier, Theory of Elasticity, art. 104 and 115 (from memory). The first quadrant of a box whose corner arcs have one centre.
/// </remarks>
internal static class StressFunction
{
    public static double J(Box box, int along, int across)
    {
        var (y, z) = Grid(box, along, across);
        // Unknown 0 is the hole's value; then the inner rows, column by column. The outer row is zero.
        int Unknown(int i, int j) => j == 0 ? 0 : j == across ? -1 : 1 + i * (across - 1) + j - 1;
        var n = 1 + (along + 1) * (across - 1);
        var (entries, load) = (new List<(int Row, int Column, double Value)>(), new double[n]);
        for (var i = 0; i < along; i++)
        {
            for (var j = 0; j < across; j++)
            {
                (int I, int J)[] corners = [(i, j), (i + 1, j), (i + 1, j + 1), (i, j + 1)];
                foreach (var (u, v) in new[] { (-1, -1), (1, -1), (1, 1), (-1, 1) })
                {
                    var (xi, eta) = (u / Math.Sqrt(3), v / Math.Sqrt(3));
                    double[] shape = [(1 - xi) * (1 - eta) / 4, (1 + xi) * (1 - eta) / 4, (1 + xi) * (1 + eta) / 4, (1 - xi) * (1 + eta) / 4];
                    double[] dXi = [-(1 - eta) / 4, (1 - eta) / 4, (1 + eta) / 4, -(1 + eta) / 4];
                    double[] dEta = [-(1 - xi) / 4, -(1 + xi) / 4, (1 + xi) / 4, (1 - xi) / 4];
                    double Sum(double[] d, double[,] x) => corners.Select((c, k) => d[k] * x[c.I, c.J]).Sum();
                    var (yXi, zXi, yEta, zEta) = (Sum(dXi, y), Sum(dXi, z), Sum(dEta, y), Sum(dEta, z));
                    var det = yXi * zEta - zXi * yEta;
                    for (var a = 0; a < 4; a++)
                    {
                        var row = Unknown(corners[a].I, corners[a].J);
                        if (row < 0) continue;
                        load[row] += 2 * Math.Abs(det) * shape[a];
                        for (var b = 0; b < 4; b++)
                        {
                            var column = Unknown(corners[b].I, corners[b].J);
                            if (column < 0) continue;
                            var (ay, az) = ((dXi[a] * zEta - dEta[a] * zXi) / det, (dEta[a] * yXi - dXi[a] * yEta) / det);
                            var (by, bz) = ((dXi[b] * zEta - dEta[b] * zXi) / det, (dEta[b] * yXi - dXi[b] * yEta) / det);
                            entries.Add((row, column, Math.Abs(det) * (ay * by + az * bz)));
                        }
                    }
                }
            }
        }

        var hole = 0.0;
        for (var i = 0; i < along; i++) hole += 0.5 * Math.Abs(y[i, 0] * z[i + 1, 0] - y[i + 1, 0] * z[i, 0]);
        load[0] += 2 * hole;
        var phi = Solve(entries, load);
        return 4 * phi.Zip(load, (p, f) => p * f).Sum();                           // four quadrants of 2f·φ − φ·Kφ with Kφ = f
    }

    private static (double[,] Y, double[,] Z) Grid(Box box, int along, int across)
    {
        var (flatY, flatZ) = (box.Width / 2 - box.OuterRadius, box.Depth / 2 - box.OuterRadius);
        var arc = Math.PI / 2 * (box.OuterRadius + box.InnerRadius) / 2;
        var (y, z) = (new double[along + 1, across + 1], new double[along + 1, across + 1]);
        for (var i = 0; i <= along; i++)
        {
            var s = i * (flatY + arc + flatZ) / along;
            for (var j = 0; j <= across; j++)
            {
                var radius = box.InnerRadius + j * box.Wall / across;
                var angle = Math.Clamp((s - flatY) / arc, 0, 1) * Math.PI / 2;
                y[i, j] = Math.Min(s, flatY) + radius * Math.Sin(angle);
                z[i, j] = Math.Min(flatZ, flatY + arc + flatZ - s) + radius * Math.Cos(angle);
            }
        }

        return (y, z);
    }

    // Conjugate gradients with the diagonal as a first guess of the inverse.
    private static double[] Solve(List<(int Row, int Column, double Value)> entries, double[] f)
    {
        var merged = entries.GroupBy(e => (e.Row, e.Column)).Select(g => (g.Key.Row, g.Key.Column, Value: g.Sum(e => e.Value))).ToArray();
        var diagonal = new double[f.Length];
        foreach (var (row, column, value) in merged)
            if (row == column) diagonal[row] = value;
        var (x, r) = (new double[f.Length], (double[])f.Clone());
        var p = r.Zip(diagonal, (a, d) => a / d).ToArray();
        var rho = r.Zip(p, (a, b) => a * b).Sum();
        var start = rho;
        for (var pass = 0; pass < 20_000 && rho > 1e-20 * start; pass++)
        {
            var ap = new double[f.Length];
            foreach (var (row, column, value) in merged) ap[row] += value * p[column];
            var step = rho / p.Zip(ap, (a, b) => a * b).Sum();
            for (var i = 0; i < x.Length; i++) (x[i], r[i]) = (x[i] + step * p[i], r[i] - step * ap[i]);
            var next = r.Zip(diagonal, (a, d) => a * a / d).Sum();
            for (var i = 0; i < p.Length; i++) p[i] = r[i] / diagonal[i] + next / rho * p[i];
            rho = next;
        }

        return x;
    }
}
