using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Double;

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
    private Matrix<double>? _inverse;

    /// <summary>Adds a straight edge in panels of about the given length.</summary>
    public void Line(double y0, double z0, double y1, double z1, double panel)
    {
        var length = double.Hypot(y1 - y0, z1 - z0);
        var (ty, tz) = ((y1 - y0) / length, (z1 - z0) / length);
        Panels(length, panel, s => new Node(y0 + s * ty, z0 + s * tz, tz, -ty, 0, 0));
    }

    /// <summary>Adds an arc; the sweep is negative where the material lies outside it.</summary>
    public void Arc(double y, double z, double radius, double from, double sweep, double panel)
    {
        var sign = Math.Sign(sweep);
        Panels(radius * Math.Abs(sweep), panel, s =>
        {
            var (sin, cos) = Math.SinCos(from + sign * s / radius);
            return new Node(y + radius * cos, z + radius * sin, sign * cos, sign * sin, sign / radius, 0);
        });
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
        _inverse ??= Operator().Inverse();
        var right = DenseVector.OfEnumerable(_nodes.Select(node =>
        {
            var ((py, pz), (ey, ez)) = (particular(node.Y, node.Z), extra(node.Y, node.Z));
            return -((py + ey) * node.NY + (pz + ez) * node.NZ);
        }));
        return [.. _inverse * right];
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

    private (double Y, double Z) Gradient(double[] density, double y, double z)
    {
        var (sumY, sumZ) = (0.0, 0.0);
        for (var j = 0; j < _nodes.Count; j++)
        {
            var (dy, dz) = (y - _nodes[j].Y, z - _nodes[j].Z);
            var share = -density[j] * _nodes[j].Weight / (2 * Math.PI * (dy * dy + dz * dz));
            sumY += share * dy;
            sumZ += share * dz;
        }

        return (sumY, sumZ);
    }

    private void Panels(double length, double panel, Func<double, Node> at)
    {
        var count = Math.Max(1, (int)Math.Round(length / panel));
        for (var k = 0; k < count; k++)
            for (var i = 0; i < PerPanel; i++)
                _nodes.Add(at(length * (k + s_at[i]) / count) with { Weight = s_weight[i] * length / count });
    }

    private readonly record struct Node(double Y, double Z, double NY, double NZ, double Curvature, double Weight);
}
