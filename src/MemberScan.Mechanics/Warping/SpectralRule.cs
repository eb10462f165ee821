using System.Collections.Concurrent;

namespace MemberScan.Mechanics.Warping;

/// <summary>Polynomials of one degree on [−1, 1]: Lobatto's nodes, Gauss's quadrature, Legendre's basis.</summary>
/// <remarks>Source: C. Canuto and others, Spectral Methods: Fundamentals in Single Domains (2006), section 2.3 (from memory).</remarks>
internal sealed class SpectralRule
{
    private static readonly ConcurrentDictionary<int, SpectralRule> s_rules = new();

    private SpectralRule(int degree)
    {
        Degree = degree;
        Count = degree + 1;
        QuadratureCount = degree + 2;
        Nodes = LobattoNodes(degree);
        ToModal = BuildToModal();
        (QuadratureAt, QuadratureWeights) = Gauss(QuadratureCount);
        (Values, Slopes) = (new double[QuadratureCount * Count], new double[QuadratureCount * Count]);
        Span<double> p = stackalloc double[Count], d = stackalloc double[Count];
        for (var q = 0; q < QuadratureCount; q++)
        {
            Legendre(QuadratureAt[q], p, d);
            for (var i = 0; i < Count; i++)
            {
                for (var k = 0; k < Count; k++)
                {
                    Values[q * Count + i] += p[k] * ToModal[k * Count + i];
                    Slopes[q * Count + i] += d[k] * ToModal[k * Count + i];
                }
            }
        }
    }

    /// <summary>Degree of the polynomials.</summary>
    public int Degree { get; }

    /// <summary>Number of nodes.</summary>
    public int Count { get; }

    /// <summary>Number of quadrature places.</summary>
    public int QuadratureCount { get; }

    /// <summary>Nodes from −1 to 1.</summary>
    public double[] Nodes { get; }

    /// <summary>From values at nodes to coefficients of Legendre's polynomials: coefficient × node, row-major.</summary>
    public double[] ToModal { get; }

    /// <summary>Places of Gauss's rule.</summary>
    public double[] QuadratureAt { get; }

    /// <summary>Its weights, which add up to 2.</summary>
    public double[] QuadratureWeights { get; }

    /// <summary>Nodal polynomials at the quadrature places: place × node, row-major.</summary>
    public double[] Values { get; }

    /// <summary>Their derivatives.</summary>
    public double[] Slopes { get; }

    /// <summary>The rule of a degree.</summary>
    public static SpectralRule Of(int degree) => s_rules.GetOrAdd(degree, static d => new SpectralRule(d));

    /// <summary>Legendre's polynomials and their derivatives at a place.</summary>
    public static void Legendre(double x, Span<double> values, Span<double> slopes)
    {
        (values[0], slopes[0], values[1], slopes[1]) = (1, 0, x, 1);
        for (var k = 2; k < values.Length; k++)
        {
            values[k] = ((2 * k - 1) * x * values[k - 1] - (k - 1) * values[k - 2]) / k;
            slopes[k] = slopes[k - 2] + (2 * k - 1) * values[k - 1];
        }
    }

    private static double[] LobattoNodes(int degree)
    {
        Span<double> p = stackalloc double[degree + 1], d = stackalloc double[degree + 1];
        var nodes = new double[degree + 1];
        for (var i = 0; i <= degree; i++)
        {
            var x = -Math.Cos(Math.PI * i / degree);
            for (var pass = 0; pass < 50 && i > 0 && i < degree; pass++)
            {
                // Roots of P'; P'' from Legendre's equation (1 − x²)P'' = 2xP' − n(n+1)P.
                Legendre(x, p, d);
                var step = d[degree] * (1 - x * x) / (2 * x * d[degree] - degree * (degree + 1) * p[degree]);
                x -= step;
                if (Math.Abs(step) < 1e-16) break;
            }

            nodes[i] = x;
        }

        return nodes;
    }

    private static (double[] At, double[] Weights) Gauss(int count)
    {
        Span<double> p = stackalloc double[count + 1], d = stackalloc double[count + 1];
        var (at, weights) = (new double[count], new double[count]);
        for (var i = 0; i < count; i++)
        {
            var x = -Math.Cos(Math.PI * (i + 0.75) / (count + 0.5));
            for (var pass = 0; pass < 10; pass++)
            {
                Legendre(x, p, d);
                x -= p[count] / d[count];
            }

            Legendre(x, p, d);
            (at[i], weights[i]) = (x, 2 / ((1 - x * x) * d[count] * d[count]));
        }

        return (at, weights);
    }

    // Discrete orthogonality over Lobatto's nodes: exact but for the highest degree, whose norm is 2/n.
    private double[] BuildToModal()
    {
        Span<double> p = stackalloc double[Count], d = stackalloc double[Count];
        var matrix = new double[Count * Count];
        for (var i = 0; i < Count; i++)
        {
            Legendre(Nodes[i], p, d);
            var weight = 2 / (Degree * (Degree + 1) * p[Degree] * p[Degree]);
            for (var k = 0; k < Count; k++)
                matrix[k * Count + i] = weight * p[k] * (k < Degree ? (2 * k + 1) / 2.0 : Degree / 2.0);
        }

        return matrix;
    }
}
