namespace MemberScan.Mechanics.Series;

/// <summary>Shear stresses of a solid rectangle under a shear force along one side, by Saint-Venant flexure.</summary>
/// <remarks>
/// <para>Force along "depth" (coordinate d, half H), the other side "across" (coordinate c, half B):
/// <c>τ_d = V(H² − d²)/2I + ∂φ/∂c</c>, <c>τ_c = −∂φ/∂d</c>, <c>∇²φ = ν/(1+ν)·V·c/I</c>, φ = 0 on the edge
/// (Timoshenko and Goodier, art. 124, from memory).</para>
/// <para>Two series for the same φ, κ = ν/(1+ν)·V/I: for deep sections
/// <c>(κ/6)[c³ − B²c − 12(B/π)³ Σ (−1)^m/m³ sin(mπc/B) cosh(mπd/B)/cosh(mπH/B)]</c>, for flat ones
/// <c>κ[c(d² − H²)/2 + B(16H²/π³) Σ (−1)^((n−1)/2)/n³ cos(nπd/2H) sinh(nπc/2H)/sinh(nπB/2H)]</c> over odd n.
/// The one whose terms fall faster is used.</para>
/// </remarks>
internal sealed class RectangleFlexure
{
    private readonly double _halfAcross;
    private readonly double _halfDepth;
    private readonly double _inertia;
    private readonly double _kappa;
    private readonly bool _deep;

    /// <summary>The solution for sides across and along the force [m] and Poisson's ratio ν [-].</summary>
    public RectangleFlexure(double across, double depth, double poisson)
    {
        (_halfAcross, _halfDepth) = (across / 2, depth / 2);
        _inertia = across * depth * depth * depth / 12;
        _kappa = poisson / (1 + poisson) / _inertia;
        _deep = 2 * depth * depth >= across * across;
    }

    /// <summary>Stresses across and along the force at a point [m], for a force [N].</summary>
    public (double Across, double Along) At(double force, double c, double d)
    {
        if (force == 0) return default;

        var (slopeC, slopeD) = _deep ? Deep(c, d) : Flat(c, d);
        var parabola = (_halfDepth - d) * (_halfDepth + d) / (2 * _inertia);
        return (-force * _kappa * slopeD, force * (parabola + _kappa * slopeC));
    }

    private (double C, double D) Deep(double c, double d)
    {
        var scale = Math.PI / _halfAcross;
        var sums = EdgeSums.AlternatingOverCosh(scale * c, scale * d, scale * _halfDepth);
        var factor = 2 / (scale * scale);
        return (0.5 * c * c - _halfAcross * _halfAcross / 6 - factor * sums.CosCosh, -factor * sums.SinSinh);
    }

    private (double C, double D) Flat(double c, double d)
    {
        var scale = Math.PI / (2 * _halfDepth);
        var sums = EdgeSums.OddOverSinh(scale * d, scale * c, scale * _halfAcross);
        var factor = 8 * _halfAcross * _halfDepth / (Math.PI * Math.PI);
        return (0.5 * (d - _halfDepth) * (d + _halfDepth) + factor * sums.CosCosh, c * d - factor * sums.SinSinh);
    }
}
