using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Shear;

/// <summary>Round tube by Saint-Venant flexure and torsion, in closed form.</summary>
/// <remarks>
/// Flexure in polar coordinates, ϑ from the direction of V, <c>k = (3+2ν)/(8(1+ν))·V/I</c>:
/// <c>τr = k[b² + a² − r² − a²b²/r²]·cos ϑ</c>, <c>τϑ = −k[b² + a² + a²b²/r² − (1−2ν)/(3+2ν)·r²]·sin ϑ</c>.
/// Both edges are free of radial stress; as a → 0 the solid bar comes back everywhere but at the bore.
/// </remarks>
internal sealed class TubeElasticity : ShearSolution
{
    private readonly double _sumOfSquares;
    private readonly double _productOfSquares;
    private readonly double _factor;
    private readonly double _sideShare;
    private readonly double _polar;

    /// <summary>The solution for Poisson's ratio ν [-].</summary>
    public TubeElasticity(Tube section, double poisson)
    {
        var (a, b, t) = (section.InnerRadius, section.OuterRadius, section.Wall);
        var inertia = Math.PI / 4 * t * (b + a) * (b * b + a * a);
        _sumOfSquares = a * a + b * b;
        _productOfSquares = a * a * b * b;
        _factor = (3 + 2 * poisson) / (8 * (1 + poisson) * inertia);
        _sideShare = (1 - 2 * poisson) / (3 + 2 * poisson);
        _polar = 2 * inertia;
    }

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var r2 = y * y + z * z;
        var image = _productOfSquares / r2;
        // Each divided by r once more, so that (y, z) below need no norm.
        var radial = _factor * (_sumOfSquares - r2 - image) * (vy * y + vz * z) / r2;                              // V·cos ϑ = (…)/r
        var tangential = -_factor * (_sumOfSquares + image - _sideShare * r2) * (vy * z - vz * y) / r2 + t / _polar; // V·sin ϑ = (…)/r
        return new ShearStress(radial * y - tangential * z, radial * z + tangential * y);
    }
}
