using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Fields;

/// <summary>Rectangular tube by hand calculation: bending-shear flow along the wall's middle line, plus torsion.</summary>
/// <remarks>
/// <para>Middle line (b−t)×(h−t) with corner radius (ro+ri)/2, sharp when both are 0; wall t throughout. For each shear force the closed
/// section is cut on its axis of symmetry, where the flow is zero: <c>τ = V·∫z ds/I</c> from there, tangential, uniform over the wall.
/// A point takes the stress of its nearest middle-line point.</para>
/// <para>Torsion is <c>T/Wt</c>, the value at the outer face, taken for the whole thickness of the wall: on the cautious side, since
/// the wall's own torsion lowers it towards the inner face.</para>
/// </remarks>
internal sealed class BoxElementary : ShearSolution
{
    private readonly double _halfY;
    private readonly double _halfZ;
    private readonly double _radius;
    private readonly double _perT;
    private readonly double _iy;
    private readonly double _iz;

    /// <summary>The solution for a section with its properties.</summary>
    public BoxElementary(Box section, SectionProperties properties)
    {
        _halfY = (section.Width - section.Wall) / 2;
        _halfZ = (section.Depth - section.Wall) / 2;
        _radius = (section.OuterRadius + section.InnerRadius) / 2;
        _perT = 1 / properties.Wt ?? throw new ArgumentException("a box has a torsion modulus", nameof(properties));
        (_iy, _iz) = (properties.Iy, properties.Iz);
    }

    /// <summary>True: along lines across the wall all stresses are linear.</summary>
    public override bool EdgesGovern => true;

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        // First quadrant; tangent (−cos φ, sin φ), φ from the +z axis, runs from +y towards +z as positive torsion does.
        var (signY, signZ) = (y < 0 ? -1.0 : 1.0, z < 0 ? -1.0 : 1.0);
        var (momentY, momentZ, cos, sin) = Nearest(Math.Abs(y), Math.Abs(z));
        var alongZ = vz * momentY / _iy;                                           // up on the y sides, towards the middle on the z sides
        var alongY = vy * momentZ / _iz;
        var torsion = t * _perT;
        return new ShearStress(
            cos * (alongY - signY * signZ * alongZ - signZ * torsion),
            sin * (alongZ - signY * signZ * alongY + signY * torsion));
    }

    // First moments ∫z ds from the z axis and ∫y ds from the y axis up to the middle-line point nearest to (y, z) in the first quadrant.
    private (double MomentY, double MomentZ, double Cos, double Sin) Nearest(double y, double z)
    {
        var (arcY, arcZ) = (_halfY - _radius, _halfZ - _radius);
        if (y > arcY && z > arcZ)
        {
            var angle = _radius > 0 ? Math.Atan2(y - arcY, z - arcZ) : Math.PI / 4;
            var (sin, cos) = Math.SinCos(angle);
            return (
                _halfZ * arcY + _radius * (arcZ * angle + _radius * sin),
                _halfY * arcZ + _radius * (arcY * (Math.PI / 2 - angle) + _radius * cos),
                cos, sin);
        }

        var onZSide = z > arcZ || (y <= arcY && Math.Abs(z - _halfZ) < Math.Abs(y - _halfY));
        return onZSide
            ? (_halfZ * y, EndOfArc(_halfY, arcZ, arcY) + (arcY - y) * (arcY + y) / 2, 1, 0)
            : (EndOfArc(_halfZ, arcY, arcZ) + (arcZ - z) * (arcZ + z) / 2, _halfY * z, 0, 1);
    }

    private double EndOfArc(double half, double straight, double lever) =>
        half * straight + _radius * (lever * Math.PI / 2 + _radius);
}
