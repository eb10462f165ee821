using System.Numerics;

namespace MemberScan.Mechanics.Series;

/// <summary>Euler's dilogarithm <c>Li2(z) = Σ zᵐ/m²</c> in the closed unit disc.</summary>
/// <remarks>
/// Source: L. Lewin, Polylogarithms and Associated Functions (1981), chapter 1: reflection <c>z → 1 − z</c> and the series in
/// <c>u = −ln(1 − z)</c> with Bernoulli numbers, which converges for |u| &lt; 2π; here |u| stays below 1.26.
/// </remarks>
internal static class Dilogarithm
{
    // B_2k/(2k+1)!, k = 1, 2, …: coefficients of u^(2k+1).
    private static readonly double[] s_coefficients =
    [
        1.0 / 36, -1.0 / 3600, 1.0 / 211680, -1.0 / 10886400, 1.0 / 526901760,
        -691.0 / (2730 * 6227020800.0), 7.0 / (6 * 1307674368000.0), -3617.0 / (510 * 355687428096000.0),
        43867.0 / (798 * 121645100408832000.0), -174611.0 / (330 * 51090942171709440000.0),
        854513.0 / (138 * 25852016738884976640000.0),
    ];

    /// <summary>Li2(z) for |z| ≤ 1, to about 1e-15.</summary>
    public static Complex Of(Complex z)
    {
        if (z == Complex.One) return Math.PI * Math.PI / 6;
        if (z == Complex.Zero) return Complex.Zero;
        if (z.Real <= 0.5) return InLogarithm(-Log(1 - z));

        var logZ = Log(z);
        return Math.PI * Math.PI / 6 - logZ * Log(1 - z) - InLogarithm(-logZ);
    }

    private static Complex InLogarithm(Complex u)
    {
        var square = u * u;
        var sum = new Complex(s_coefficients[^1], 0);
        for (var k = s_coefficients.Length - 2; k >= 0; k--) sum = sum * square + s_coefficients[k];
        return u - 0.25 * square + u * square * sum;
    }

    // Not Complex.Log: its modulus guards against overflow, which costs time and cannot occur here.
    private static Complex Log(Complex z) =>
        new(0.5 * Math.Log(z.Real * z.Real + z.Imaginary * z.Imaginary), Math.Atan2(z.Imaginary, z.Real));
}
