using System.Numerics;

namespace MemberScan.Mechanics.Series;

/// <summary>Sums <c>Σ cₙ·{cos, sin}(nξ)·{cosh, sinh}(nη)/{cosh, sinh}(nλ)</c> with <c>|cₙ| = 1/n²</c>, |η| ≤ λ, exact up to the edge |η| = λ.</summary>
/// <remarks>
/// The stresses of a rectangle are such sums. At the edge the terms fall only as 1/n²; there the slow part, <c>Σ cₙ e^(−n(λ−|η|) − inξ)</c>,
/// is a dilogarithm in closed form, and what remains falls at least as <c>e^(−nλ)</c>.
/// </remarks>
internal readonly struct EdgeSums
{
    private const double NegligibleTerm = 1e-17;
    private readonly Complex _even;
    private readonly Complex _odd;

    private EdgeSums(Complex near, Complex far, double eta)
    {
        _even = near + far;
        _odd = eta < 0 ? far - near : near - far;
    }

    /// <summary>Σ cₙ cos(nξ) cosh(nη)/D(nλ).</summary>
    public double CosCosh => _even.Real;

    /// <summary>Σ cₙ cos(nξ) sinh(nη)/D(nλ).</summary>
    public double CosSinh => _odd.Real;

    /// <summary>Σ cₙ sin(nξ) cosh(nη)/D(nλ).</summary>
    public double SinCosh => -_even.Imaginary;

    /// <summary>Σ cₙ sin(nξ) sinh(nη)/D(nλ).</summary>
    public double SinSinh => -_odd.Imaginary;

    /// <summary>n = 1, 3, 5, …, cₙ = (−1)^((n−1)/2)/n², denominator cosh(nλ).</summary>
    public static EdgeSums OddOverCosh(double xi, double eta, double lambda) => Sum(xi, eta, lambda, 1, odd: true);

    /// <summary>n = 1, 3, 5, …, cₙ = (−1)^((n−1)/2)/n², denominator sinh(nλ).</summary>
    public static EdgeSums OddOverSinh(double xi, double eta, double lambda) => Sum(xi, eta, lambda, -1, odd: true);

    /// <summary>n = 1, 2, 3, …, cₙ = (−1)ⁿ/n², denominator cosh(nλ).</summary>
    public static EdgeSums AlternatingOverCosh(double xi, double eta, double lambda) => Sum(xi, eta, lambda, 1, odd: false);

    private static EdgeSums Sum(double xi, double eta, double lambda, double kappa, bool odd)
    {
        var (sin, cos) = Math.SinCos(xi);
        var turn = new Complex(cos, -sin);
        var depth = lambda - Math.Abs(eta);
        var near1 = Math.Exp(-depth);
        var far1 = Math.Exp(-lambda - Math.Abs(eta));
        var q1 = Math.Exp(-2 * lambda);
        var closed = depth < 1;
        var near = !closed ? Complex.Zero : odd ? InverseTangentIntegral(near1 * turn) : Dilogarithm.Of(-near1 * turn);
        var far = Complex.Zero;

        var (e1, e2, q, e) = (near1, far1, q1, turn);
        var (near2, far2, q2, turn2) = odd ? (near1 * near1, far1 * far1, q1 * q1, turn * turn) : (near1, far1, q1, turn);
        var stride = odd ? 2 : 1;
        var sign = odd ? 1.0 : -1.0;
        for (var n = 1; ; n += stride)
        {
            var share = 1 / (1 + kappa * q);                       // cosh(nλ) or sinh(nλ) = e^(nλ)(1 ± e^(−2nλ))/2
            var nearTerm = closed ? -kappa * e1 * q * share : e1 * share;
            var farTerm = e2 * share;
            if (Math.Abs(nearTerm) < NegligibleTerm && farTerm < NegligibleTerm) break;

            var c = sign / ((double)n * n);
            near += c * nearTerm * e;
            far += c * farTerm * e;
            (e1, e2, q, e, sign) = (e1 * near2, e2 * far2, q * q2, e * turn2, -sign);
        }

        return new EdgeSums(near, far, eta);
    }

    // Ti2(u) = Σ (−1)^((n−1)/2) uⁿ/n² over odd n (Lewin, chapter 2).
    private static Complex InverseTangentIntegral(Complex u)
    {
        var iu = new Complex(-u.Imaginary, u.Real);
        var difference = Dilogarithm.Of(iu) - Dilogarithm.Of(-iu);
        return new Complex(0.5 * difference.Imaginary, -0.5 * difference.Real);
    }
}
