using MemberScan.Mechanics.Meshes;

namespace MemberScan.Mechanics.Warping;

/// <summary>Matrix and loads of the warping problem on one patch, with its inner nodes eliminated.</summary>
/// <remarks>Nodes: the inner ones first, then the sides in the order of <see cref="NodeNumbers.Side"/>. Row-major, lower half.</remarks>
internal sealed class PatchStiffness
{
    /// <summary>Number of load cases: see <see cref="WarpingSolver"/>.</summary>
    public const int Loads = 5;

    private readonly double[] _matrix;
    private readonly double[] _loads;
    private readonly int _all;
    private readonly int _inner;

    /// <summary>Integrates over a patch and eliminates its inner nodes.</summary>
    public PatchStiffness(Patch patch, SpectralRule rule, int[] order)
    {
        _all = rule.Count * rule.Count;
        _inner = (rule.Count - 2) * (rule.Count - 2);
        _matrix = new double[_all * _all];
        _loads = new double[Loads * _all];
        Integrate(patch, rule, order);
        Eliminate();
    }

    /// <summary>Number of side nodes.</summary>
    public int Sides => _all - _inner;

    /// <summary>The matrix between two side nodes, row ≥ column.</summary>
    public double Matrix(int row, int column) => _matrix[(_inner + row) * _all + _inner + column];

    /// <summary>The load at a side node.</summary>
    public double Load(int load, int side) => _loads[load * _all + _inner + side];

    /// <summary>From the values at the sides, put in at the end of <paramref name="values"/>, those inside.</summary>
    public void Recover(int load, Span<double> values)
    {
        _loads.AsSpan(load * _all, _inner).CopyTo(values);
        for (var i = _all - 1; i >= 0; i--)
        {
            var row = _matrix.AsSpan(i * _all, Math.Min(i, _inner));
            if (i < _inner) values[i] /= _matrix[i * _all + i];
            Kernel.Add(-values[i], row, values);                                   // L_iiᵀ·u_i = y_i − L_biᵀ·u_b
        }
    }

    /// <summary>Order of the nodes of a rule: inner first, then sides. Position → index i·n + j.</summary>
    public static int[] Order(SpectralRule rule)
    {
        var n = rule.Count;
        var inner = from i in Enumerable.Range(1, n - 2) from j in Enumerable.Range(1, n - 2) select i * n + j;
        return [.. inner, .. Enumerable.Range(0, 4 * (n - 1)).Select(k => NodeNumbers.Side(k, n)).Select(at => at.I * n + at.J)];
    }

    private void Integrate(Patch patch, SpectralRule rule, int[] order)
    {
        var (n, m) = (rule.Count, rule.QuadratureCount);
        Span<double> gy = new double[_all], gz = new double[_all];
        for (var a = 0; a < m; a++)
        {
            for (var b = 0; b < m; b++)
            {
                var at = patch.Map(rule.QuadratureAt[a], rule.QuadratureAt[b]);
                var determinant = at.Determinant;
                var weight = rule.QuadratureWeights[a] * rule.QuadratureWeights[b] * Math.Abs(determinant);
                var root = Math.Sqrt(weight);
                var (yEta, zEta, yXi, zXi) = (root * at.YEta / determinant, root * at.ZEta / determinant, root * at.YXi / determinant, root * at.ZXi / determinant);
                // Σ e·∇v and Σ s·v for the loads: twist, y and z, and the two that ν brings.
                var (ey0, ez0) = (root * at.Z, -root * at.Y);
                var (eyNu, ezNu) = (-0.5 * root * at.Z * at.Z, -0.5 * root * at.Y * at.Y);
                for (var k = 0; k < _all; k++)
                {
                    var (i, j) = (order[k] / n, order[k] % n);
                    var (vi, vj) = (rule.Values[a * n + i], rule.Values[b * n + j]);
                    var (dXi, dEta) = (rule.Slopes[a * n + i] * vj, vi * rule.Slopes[b * n + j]);
                    var (y, z) = (dXi * zEta - dEta * zXi, dEta * yXi - dXi * yEta);
                    (gy[k], gz[k]) = (y, z);
                    _loads[k] += ey0 * y + ez0 * z;
                    _loads[_all + k] += weight * at.Y * vi * vj;
                    _loads[2 * _all + k] += weight * at.Z * vi * vj;
                    _loads[3 * _all + k] += eyNu * y;
                    _loads[4 * _all + k] += ezNu * z;
                }

                for (var k = 0; k < _all; k++)
                {
                    var row = _matrix.AsSpan(k * _all, k + 1);
                    Kernel.Add(gy[k], gy[..(k + 1)], row);
                    Kernel.Add(gz[k], gz[..(k + 1)], row);
                }
            }
        }
    }

    // Cholesky's factor as far as the inner nodes; what is left at the sides is the matrix between them.
    private void Eliminate()
    {
        for (var i = 0; i < _all; i++)
        {
            var row = _matrix.AsSpan(i * _all, i + 1);
            for (var j = 0; j <= i; j++)
            {
                var known = Math.Min(j, _inner);
                var rest = row[j] - Kernel.Dot(row[..known], _matrix.AsSpan(j * _all, known));
                row[j] = j >= _inner ? rest : j == i ? Math.Sqrt(rest) : rest / _matrix[j * _all + j];
            }

            for (var load = 0; load < Loads; load++)
            {
                var f = _loads.AsSpan(load * _all, _all);
                f[i] -= Kernel.Dot(row[..Math.Min(i, _inner)], f);
                if (i < _inner) f[i] /= row[i];
            }
        }
    }
}
