using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Shear;

/// <summary>Round tube by hand calculation: a radial cut, tangential stress uniform over the wall, plus torsion.</summary>
/// <remarks>
/// <c>τ = V·Q/(I·2t)</c> with <c>Q = ⅔(b³ − a³)·sin ϑ</c>, ϑ from the direction of V: nothing at the extreme fibre, the most on the
/// neutral axis. It gives back only <c>⅔(b² + ab + a²)/(b² + a²)</c> of V: 1 for a thin wall, ⅔ for a vanishing bore.
/// </remarks>
internal sealed class TubeElementary : ShearSolution
{
    private readonly double _peak;
    private readonly double _polar;

    /// <summary>The solution for a tube.</summary>
    public TubeElementary(Tube section)
    {
        var (a, b, t) = (section.InnerRadius, section.OuterRadius, section.Wall);
        var inertia = Math.PI / 4 * t * (b + a) * (b * b + a * a);
        _polar = 2 * inertia;
        _peak = (b * b + a * b + a * a) / (3 * inertia);                           // ⅔(b³ − a³)/(2·t·I), t = b − a
    }

    /// <summary>True: along radii all stresses are linear.</summary>
    public override bool EdgesGovern => true;

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var radius = Math.Sqrt(y * y + z * z);
        var sine = (vy * z - vz * y) / radius;                                     // V·sin ϑ
        var tangential = (t * radius / _polar - _peak * sine) / radius;
        return new ShearStress(-tangential * z, tangential * y);
    }
}
