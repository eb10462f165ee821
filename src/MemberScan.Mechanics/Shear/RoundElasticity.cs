using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Shear;

/// <summary>Solid round bar by Saint-Venant flexure and torsion, in closed form.</summary>
/// <remarks>
/// Source: Timoshenko and Goodier, Theory of Elasticity, bending of bars, circular cross-section (art. 122, from memory):
/// <c>τxz = Vz(3+2ν)/(8(1+ν)I)·[r² − z² − (1−2ν)/(3+2ν)·y²]</c>, <c>τxy = −Vz(1+2ν)/(4(1+ν)I)·yz</c>; Vy with y and z exchanged.
/// </remarks>
internal sealed class RoundElasticity : ShearSolution
{
    private readonly double _radiusSquared;
    private readonly double _polar;
    private readonly double _along;
    private readonly double _across;
    private readonly double _sideShare;

    /// <summary>The solution for Poisson's ratio ν [-].</summary>
    public RoundElasticity(Round section, double poisson)
    {
        var r = section.Radius;
        var inertia = Math.PI * r * r * r * r / 4;
        _radiusSquared = r * r;
        _polar = 2 * inertia;
        _along = (3 + 2 * poisson) / (8 * (1 + poisson) * inertia);
        _across = (1 + 2 * poisson) / (4 * (1 + poisson) * inertia);
        _sideShare = (1 - 2 * poisson) / (3 + 2 * poisson);
    }

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var twist = t / _polar;
        return new ShearStress(
            vy * _along * (_radiusSquared - y * y - _sideShare * z * z) - vz * _across * y * z - twist * z,
            vz * _along * (_radiusSquared - z * z - _sideShare * y * y) - vy * _across * y * z + twist * y);
    }
}
