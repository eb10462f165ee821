using System.Collections.Immutable;
using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Tests.Warping;

/// <summary>A lower bound of the torsion constant by Prandtl's stress function, where the field under test gives an upper one by its potential.</summary>
/// <remarks>
/// <c>J = max [4(∫φ dA + Σ c·A_hole) − ∫|∇φ|² dA]</c> over φ that vanish on the outer edge and are constant on the edge of each hole; any
/// choice gives too little. Source: Timoshenko and Goodier, Theory of Elasticity, art. 104 and 115 (from memory). Polynomials on the patches of
/// the section, whose sides follow the edges exactly; another unknown, another condition at the edge and another solver than the field's.
/// </remarks>
internal static class EnergyBound
{
    /// <summary>The bound for rings about the centroid, the outer one first [m⁴].</summary>
    public static double J(PatchMesh mesh, ImmutableArray<ImmutableArray<OutlineVertex>> rings, int degree)
    {
        var (rule, numbers, holes) = (SpectralRule.Of(degree), new Dictionary<(long, long), int>(), rings.Length - 1);
        var shapes = rings.Select(ring => RingGeometry.Edges([ring])).ToArray();
        var count = holes;                                                         // the unknowns of the holes come first
        var patches = mesh.Patches.Select(patch => new Part(patch, rule, Number)).ToArray();
        var load = new double[count];
        foreach (var part in patches) part.AddLoad(load);
        for (var k = 0; k < holes; k++) load[k] += 2 * Math.Abs(OutlineIntegrals.Of(shapes[k + 1]).Area) / (mesh.IsQuarter ? 4 : 1);
        return (mesh.IsQuarter ? 4 : 1) * Solve(patches, load).Zip(load, (phi, f) => phi * f).Sum();

        int Number(double y, double z)
        {
            for (var ring = 0; ring < shapes.Length; ring++)
            {
                foreach (var edge in shapes[ring])
                {
                    var at = edge.At(edge.Nearest(y, z));
                    if (double.Hypot(at.Y - y, at.Z - z) <= 1e-9 * mesh.Scale) return ring - 1;
                }
            }

            var key = ((long)Math.Round(y / (1e-8 * mesh.Scale)), (long)Math.Round(z / (1e-8 * mesh.Scale)));
            for (var dy = -1; dy <= 1; dy++)
                for (var dz = -1; dz <= 1; dz++)
                    if (numbers.TryGetValue((key.Item1 + dy, key.Item2 + dz), out var known)) return known;
            return numbers[key] = count++;
        }
    }

    // Conjugate gradients with the diagonal as a first guess of the inverse; parts are applied one by one.
    private static double[] Solve(Part[] parts, double[] f)
    {
        var (x, r, diagonal) = (new double[f.Length], (double[])f.Clone(), new double[f.Length]);
        foreach (var part in parts) part.AddDiagonal(diagonal);
        var p = r.Zip(diagonal, (a, d) => a / d).ToArray();
        var rho = r.Zip(p, (a, b) => a * b).Sum();
        var start = rho;
        for (var pass = 0; pass < 20_000 && rho > 1e-22 * start; pass++)
        {
            var ap = new double[f.Length];
            foreach (var part in parts) part.Apply(p, ap);
            var step = rho / p.Zip(ap, (a, b) => a * b).Sum();
            for (var i = 0; i < x.Length; i++) (x[i], r[i]) = (x[i] + step * p[i], r[i] - step * ap[i]);
            var next = r.Zip(diagonal, (a, d) => a * a / d).Sum();
            for (var i = 0; i < p.Length; i++) p[i] = r[i] / diagonal[i] + next / rho * p[i];
            rho = next;
        }

        return x;
    }

    // A patch with its own matrix ∫∇u·∇v and load 2∫v; unknown −1 is the outer edge, where φ is zero.
    private sealed class Part
    {
        private readonly int[] _numbers;
        private readonly double[,] _matrix;
        private readonly double[] _load;

        public Part(Patch patch, SpectralRule rule, Func<double, double, int> number)
        {
            var n = rule.Count;
            _numbers = [.. Enumerable.Range(0, n * n).Select(k => patch.At(rule.Nodes[k / n], rule.Nodes[k % n])).Select(at => number(at.Y, at.Z))];
            (_matrix, _load) = (new double[n * n, n * n], new double[n * n]);
            var slopes = new (double Y, double Z)[n * n];
            for (var a = 0; a < rule.QuadratureCount; a++)
            {
                for (var b = 0; b < rule.QuadratureCount; b++)
                {
                    var at = patch.Map(rule.QuadratureAt[a], rule.QuadratureAt[b]);
                    var weight = rule.QuadratureWeights[a] * rule.QuadratureWeights[b] * Math.Abs(at.Determinant);
                    for (var k = 0; k < n * n; k++)
                    {
                        var (vi, vj) = (rule.Values[a * n + k / n], rule.Values[b * n + k % n]);
                        var (dXi, dEta) = (rule.Slopes[a * n + k / n] * vj, vi * rule.Slopes[b * n + k % n]);
                        slopes[k] = ((dXi * at.ZEta - dEta * at.ZXi) / at.Determinant, (dEta * at.YXi - dXi * at.YEta) / at.Determinant);
                        _load[k] += 2 * weight * vi * vj;
                    }

                    for (var k = 0; k < n * n; k++)
                        for (var l = 0; l < n * n; l++) _matrix[k, l] += weight * (slopes[k].Y * slopes[l].Y + slopes[k].Z * slopes[l].Z);
                }
            }
        }

        public void AddLoad(double[] load)
        {
            for (var k = 0; k < _numbers.Length; k++)
                if (_numbers[k] >= 0) load[_numbers[k]] += _load[k];
        }

        public void AddDiagonal(double[] diagonal)
        {
            // Nodes of one hole are one unknown: the whole block between them counts.
            for (var k = 0; k < _numbers.Length; k++)
                for (var l = 0; l < _numbers.Length; l++)
                    if (_numbers[k] >= 0 && _numbers[k] == _numbers[l]) diagonal[_numbers[k]] += _matrix[k, l];
        }

        public void Apply(double[] x, double[] y)
        {
            for (var k = 0; k < _numbers.Length; k++)
            {
                if (_numbers[k] < 0) continue;
                var sum = 0.0;
                for (var l = 0; l < _numbers.Length; l++)
                    if (_numbers[l] >= 0) sum += _matrix[k, l] * x[_numbers[l]];
                y[_numbers[k]] += sum;
            }
        }
    }
}
