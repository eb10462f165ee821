using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Shear;

/// <summary>Solid rectangle by Saint-Venant flexure in both directions and torsion, by series.</summary>
internal sealed class RectangleElasticity(Rectangle section, double poisson) : ShearSolution
{
    private readonly RectangleTorsion _torsion = new(section.Width, section.Depth);
    private readonly RectangleFlexure _alongY = new(section.Depth, section.Width, poisson);
    private readonly RectangleFlexure _alongZ = new(section.Width, section.Depth, poisson);

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var torsion = _torsion.At(t, y, z);
        var fromY = _alongY.At(vy, z, y);
        var fromZ = _alongZ.At(vz, y, z);
        return new ShearStress(torsion.XY + fromY.Along + fromZ.Across, torsion.XZ + fromY.Across + fromZ.Along);
    }
}
