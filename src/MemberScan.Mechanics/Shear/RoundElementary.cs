using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Shear;

/// <summary>Solid round bar by hand calculation: a parabola along the resultant shear force, plus torsion.</summary>
/// <remarks>
/// <c>τ = (4/3)(V/A)(1 − s²/r²)</c>, parallel to V, s measured along V. A round bar has no preferred axes, so the two shear forces are
/// never taken apart: turned by any angle the stresses turn along. That makes it the one solution that is not linear in (Vy, Vz).
/// </remarks>
internal sealed class RoundElementary(Round section) : ShearSolution
{
    private readonly double _peak = 4 / (3 * Math.PI * section.Radius * section.Radius);
    private readonly double _radiusSquared = section.Radius * section.Radius;
    private readonly double _polar = Math.PI * Math.Pow(section.Radius, 4) / 2;

    /// <inheritdoc/>
    public override bool IsLinear => false;

    /// <summary>True: along chords square to V all stresses are linear.</summary>
    public override bool EdgesGovern => true;

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var resultantSquared = vy * vy + vz * vz;
        var along = y * vy + z * vz;                                               // s·V
        var parabola = resultantSquared > 0 ? _peak * (1 - along * along / (resultantSquared * _radiusSquared)) : 0;
        var twist = t / _polar;
        return new ShearStress(parabola * vy - twist * z, parabola * vz + twist * y);
    }
}
