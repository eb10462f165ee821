namespace MemberScan.Mechanics.Series;

/// <summary>Torsion constant and modulus of a solid rectangle by Saint-Venant's series.</summary>
/// <remarks>Source: Timoshenko and Goodier, Theory of Elasticity, 3rd ed., art. 109 (from memory). Converged to rounding.</remarks>
internal static class RectangleTorsionConstants
{
    private const double Zeta5 = 1.0369277551433699;

    /// <summary>J [m⁴] of a rectangle of the two sides [m], in any order.</summary>
    public static double J(double side, double otherSide)
    {
        var (a, b) = (Math.Min(side, otherSide), Math.Max(side, otherSide));
        var sum = 31.0 / 32 * Zeta5;                                               // Σ 1/n⁵ over odd n; then tanh = 1 − 2/(e^2x + 1)
        for (var n = 1; ; n += 2)
        {
            var term = 2 / (Math.Exp(n * Math.PI * b / a) + 1) / Math.Pow(n, 5);
            if (term < 1e-17) break;
            sum -= term;
        }

        return b * a * a * a / 3 * (1 - 192 / Math.Pow(Math.PI, 5) * (a / b) * sum);
    }

    /// <summary>Wt = T/τmax [m³], the largest stress being at the middle of the long side.</summary>
    public static double Wt(double side, double otherSide)
    {
        var (a, b) = (Math.Min(side, otherSide), Math.Max(side, otherSide));
        var sum = 0.0;
        for (var n = 1; ; n += 2)
        {
            var term = 1 / (n * (double)n * Math.Cosh(n * Math.PI * b / (2 * a)));
            if (term < 1e-17) break;
            sum += term;
        }

        return J(a, b) / (a * (1 - 8 / (Math.PI * Math.PI) * sum));                // τmax = Gθ·a·[…]
    }
}
