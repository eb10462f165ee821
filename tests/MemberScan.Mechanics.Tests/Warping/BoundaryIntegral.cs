using MathNet.Numerics.LinearAlgebra.Double;
using MathNet.Numerics.LinearAlgebra.Factorization;
using MemberScan.Mechanics.Edges;

namespace MemberScan.Mechanics.Tests.Warping;

/// <summary>Saint-Venant's problem by a single layer on the edge: a route that shares nothing with the field under test.</summary>
/// <remarks>
/// The potential is <c>ψ = ψp + ∫G·μ ds</c>, <c>G = −ln r/2π</c>, <c>½μ + K'μ = −(∇ψp + e)·n</c> at Gauss's points of short panels (Nyström).
/// Source: R. Kress, Linear Integral Equations, chapter 6 (from memory). Every edge is walked with the material on the left.
/// </remarks>
internal sealed class BoundaryIntegral
{
    private const int PerPanel = 6;
    private static readonly double[] s_at = [0.03376524289842397, 0.16939530676686776, 0.38069040695840156, 0.6193095930415985, 0.8306046932331322, 0.966234757101576];
    private static readonly double[] s_weight = [0.08566224618958517, 0.1803807865240693, 0.23395696728634552, 0.23395696728634552, 0.1803807865240693, 0.08566224618958517];

    private readonly List<Node> _nodes = [];
    private readonly List<Panel> _panels = [];
    private LU<double>? _factor;

    /// <summary>Adds a straight edge in panels of about the given length.</summary>
    public void Line(double y0, double z0, double y1, double z1, double panel) =>
        Panels(EdgeCurve.Line((y0, z0), (y1, z1)), panel);

    /// <summary>Adds an arc; the sweep is negative where the material lies outside it.</summary>
    public void Arc(double y, double z, double radius, double from, double sweep, double panel) =>
        Panels(EdgeCurve.Arc((y, z), radius, from, from + sweep), panel);

    /// <summary>Adds any edge in panels of about the given length, the first and the last of them halved towards the end a number of times.</summary>
    public void Edge(EdgeCurve edge, double panel, int halvingsAtStart, int halvingsAtEnd)
    {
        var count = Math.Max(2, (int)Math.Ceiling(edge.Length / panel));
        List<double> cuts = [.. Enumerable.Range(1, count - 1).Select(k => (double)k / count)];
        for (var k = 1; k <= halvingsAtStart; k++) cuts.Add(Math.Pow(0.5, k) / count);
        for (var k = 1; k <= halvingsAtEnd; k++) cuts.Add(1 - Math.Pow(0.5, k) / count);
        cuts.Sort();
        cuts = [0, .. cuts, 1];
        for (var k = 1; k < cuts.Count; k++) Add(edge.Piece(cuts[k - 1], cuts[k]));
    }

    /// <summary>Torsion constant, given the polar second moment <c>∫(y² + z²) dA</c>: <c>J = Ip + ∮w·(y·nz − z·ny) ds</c>.</summary>
    public double J(double polar)
    {
        var density = Density((y, z) => (0, 0), (y, z) => (-z, y));
        var sum = polar;
        foreach (var node in _nodes)
            sum += node.Weight * Sum(density, node.Y, node.Z, static (dy, dz) => (-0.25 / Math.PI * Math.Log(dy * dy + dz * dz), 0)).Y * (node.Y * node.NZ - node.Z * node.NY);
        return sum;
    }

    /// <summary>Shear stress per unit twist, <c>τ/(Gθ)</c>.</summary>
    public Func<double, double, (double XY, double XZ)> Twist()
    {
        var density = Density((y, z) => (0, 0), (y, z) => (-z, y));
        return (y, z) =>
        {
            var (gy, gz) = Gradient(density, y, z);
            return (gy - z, gz + y);
        };
    }

    /// <summary>Shear stress for <c>dσ/dx = a·y + b·z</c> and ν.</summary>
    public Func<double, double, (double XY, double XZ)> Flexure(double a, double b, double poisson)
    {
        var kappa = poisson / (1 + poisson);
        (double, double) Particular(double y, double z) => (-0.5 * a * y * y, -0.5 * b * z * z);
        (double, double) Extra(double y, double z) => (0.5 * kappa * a * z * z, 0.5 * kappa * b * y * y);
        var density = Density(Particular, Extra);
        return (y, z) =>
        {
            var (gy, gz) = Gradient(density, y, z);
            var ((py, pz), (ey, ez)) = (Particular(y, z), Extra(y, z));
            return (gy + py + ey, gz + pz + ez);
        };
    }

    private double[] Density(Func<double, double, (double Y, double Z)> particular, Func<double, double, (double Y, double Z)> extra)
    {
        _factor ??= Operator().LU();
        var right = DenseVector.OfEnumerable(_nodes.Select(node =>
        {
            var ((py, pz), (ey, ez)) = (particular(node.Y, node.Z), extra(node.Y, node.Z));
            return -((py + ey) * node.NY + (pz + ez) * node.NZ);
        }));
        return [.. _factor.Solve(right)];
    }

    private DenseMatrix Operator()
    {
        var perLength = 1 / _nodes.Sum(n => n.Weight);
        return DenseMatrix.Create(_nodes.Count, _nodes.Count, (i, j) =>
        {
            var (x, y) = (_nodes[i], _nodes[j]);
            var (dy, dz) = (x.Y - y.Y, x.Z - y.Z);
            var kernel = i == j ? -x.Curvature / (4 * Math.PI) : -(dy * x.NY + dz * x.NZ) / (dy * dy + dz * dz) / (2 * Math.PI);
            // The last term takes away the freedom of a constant: the whole density is zero.
            return (i == j ? 0.5 : 0) + y.Weight * (kernel + perLength);
        });
    }

    private (double Y, double Z) Gradient(double[] density, double y, double z) => Sum(density, y, z, static (dy, dz) =>
    {
        var share = -1 / (2 * Math.PI * (dy * dy + dz * dz));
        return (share * dy, share * dz);
    });

    // ∫ kernel·μ ds; panels nearer than their length are cut towards the place on them that is nearest, the density interpolated.
    private (double Y, double Z) Sum(double[] density, double y, double z, Func<double, double, (double Y, double Z)> kernel)
    {
        var (sumY, sumZ) = (0.0, 0.0);
        foreach (var panel in _panels)
        {
            var nearest = panel.Edge.Nearest(y, z);
            var (ny, nz) = panel.Edge.At(nearest);
            var distance = double.Hypot(ny - y, nz - z);
            if (distance > panel.Edge.Length)
            {
                for (var i = 0; i < PerPanel; i++) Add(panel.First + i, density[panel.First + i], s_weight[i] * panel.Edge.Length, panel.Edge.At(s_at[i]));
                continue;
            }

            foreach (var (from, to) in Halves(nearest))
            {
                for (var i = 0; i < PerPanel; i++)
                {
                    var share = from + (to - from) * s_at[i];
                    var value = 0.0;
                    for (var k = 0; k < PerPanel; k++) value += density[panel.First + k] * Basis(k, share);
                    Add(-1, value, s_weight[i] * (to - from) * panel.Edge.Length, panel.Edge.At(share));
                }
            }
        }

        return (sumY, sumZ);

        void Add(int node, double value, double weight, (double Y, double Z) at)
        {
            if (node >= 0 && _nodes[node].Y == y && _nodes[node].Z == z) return;
            var (ky, kz) = kernel(y - at.Y, z - at.Z);
            sumY += weight * value * ky;
            sumZ += weight * value * kz;
        }
    }

    // [0, 1] in pieces that halve towards a place from both sides.
    private static IEnumerable<(double From, double To)> Halves(double place)
    {
        const int Times = 16;

        foreach (var end in new[] { 0.0, 1.0 })
        {
            var far = end;
            for (var k = 0; k <= Times && far != place; k++)
            {
                var near = k == Times ? place : place + 0.5 * (far - place);
                yield return far < near ? (far, near) : (near, far);
                far = near;
            }
        }
    }

    private static double Basis(int k, double share)
    {
        var value = 1.0;
        for (var i = 0; i < PerPanel; i++)
            if (i != k) value *= (share - s_at[i]) / (s_at[k] - s_at[i]);
        return value;
    }

    private void Add(EdgeCurve panel)
    {
        _panels.Add(new Panel(panel, _nodes.Count));
        for (var i = 0; i < PerPanel; i++)
        {
            var ((y, z), (dy, dz)) = panel.WithSlope(s_at[i]);
            var speed = double.Hypot(dy, dz);
            _nodes.Add(new Node(y, z, dz / speed, -dy / speed, panel.IsArc ? Math.Sign(panel.Sweep) / panel.Radius : 0, s_weight[i] * panel.Length));
        }
    }

    private void Panels(EdgeCurve edge, double panel)
    {
        var count = Math.Max(1, (int)Math.Round(edge.Length / panel));
        for (var k = 0; k < count; k++) Add(edge.Piece((double)k / count, (k + 1.0) / count));
    }

    private readonly record struct Panel(EdgeCurve Edge, int First);

    private readonly record struct Node(double Y, double Z, double NY, double NZ, double Curvature, double Weight);
}
