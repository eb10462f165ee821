using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Shear;

/// <summary>Shear stresses of a solid rectangle under torsion by Saint-Venant's series.</summary>
/// <remarks>
/// Prandtl's function for half sides a ≤ b along x and y: <c>φ = a² − x² − (32a²/π³) Σ (−1)^((n−1)/2)/n³ cos(nπx/2a) cosh(nπy/2a)/cosh(nπb/2a)</c>
/// over odd n, stress <c>(T/J)·∇φ</c> turned by a right angle. Source: Timoshenko and Goodier, art. 109 (from memory). The parabola
/// is summed in closed form, so that the rest falls off from the short sides inwards.
/// </remarks>
internal sealed class RectangleTorsion(double width, double depth)
{
    private readonly bool _shortAlongY = width <= depth;
    private readonly double _half = Math.Min(width, depth) / 2;
    private readonly double _lambda = Math.PI / 2 * Math.Max(width, depth) / Math.Min(width, depth);
    private readonly double _j = RectangleTorsionConstants.J(width, depth);

    /// <summary>Stresses at a point [m] for T [N·m].</summary>
    public ShearStress At(double t, double y, double z)
    {
        if (t == 0) return default;

        var (x, along) = _shortAlongY ? (y, z) : (z, y);
        var sums = EdgeSums.OddOverCosh(Math.PI / 2 * x / _half, Math.PI / 2 * along / _half, _lambda);
        var factor = 16 * _half / (Math.PI * Math.PI);
        var slopeShort = -2 * x + factor * sums.SinCosh;
        var slopeLong = -factor * sums.CosSinh;
        var twist = t / _j;
        return _shortAlongY
            ? new ShearStress(twist * slopeLong, -twist * slopeShort)              // τxy = ∂φ/∂z, τxz = −∂φ/∂y
            : new ShearStress(twist * slopeShort, -twist * slopeLong);
    }
}
