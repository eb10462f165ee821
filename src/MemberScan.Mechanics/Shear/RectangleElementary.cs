using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Shear;

/// <summary>Solid rectangle by hand calculation: a parabola <c>1.5·V/A·(1 − 4z²/h²)</c> for each shear force, plus torsion by series.</summary>
internal sealed class RectangleElementary(Rectangle section) : ShearSolution
{
    private readonly RectangleTorsion _torsion = new(section.Width, section.Depth);
    private readonly double _peak = 1.5 / (section.Width * section.Depth);
    private readonly double _halfWidth = section.Width / 2;
    private readonly double _halfDepth = section.Depth / 2;

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var torsion = _torsion.At(t, y, z);
        var (u, v) = (y / _halfWidth, z / _halfDepth);
        return new ShearStress(
            torsion.XY + vy * _peak * (1 - u) * (1 + u),
            torsion.XZ + vz * _peak * (1 - v) * (1 + v));
    }
}
