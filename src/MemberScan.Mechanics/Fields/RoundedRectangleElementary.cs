using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Fields;

/// <summary>Rounded rectangle by hand calculation: <c>τ = V·Q/(I·b)</c> for each shear force, b the width at the level; torsion from the numerical field.</summary>
internal sealed class RoundedRectangleElementary : ShearSolution
{
    private readonly Direction _alongY;
    private readonly Direction _alongZ;
    private readonly ShearSolution? _torsion;

    /// <summary>The solution for a section with its properties and a solution that has its torsion, if there is one.</summary>
    public RoundedRectangleElementary(RoundedRectangle section, SectionProperties properties, ShearSolution? torsion)
    {
        _torsion = torsion;
        _alongY = new Direction(section.Depth, section.Width, section.CornerRadius, properties.Iz);
        _alongZ = new Direction(section.Width, section.Depth, section.CornerRadius, properties.Iy);
    }

    /// <inheritdoc/>
    public override bool CarriesTorsion => _torsion is not null;

    /// <inheritdoc/>
    public override ShearStress At(double vy, double vz, double t, double y, double z)
    {
        var twist = _torsion?.At(0, 0, t, y, z) ?? default;
        return new ShearStress(twist.XY + vy * _alongY.StressPerForce(y), twist.XZ + vz * _alongZ.StressPerForce(z));
    }

    /// <summary>One direction of force: sides across and along it, corner radius, second moment.</summary>
    private sealed class Direction(double across, double depth, double radius, double inertia)
    {
        private readonly double _arcStart = Math.Max(0, depth / 2 - radius);

        public double StressPerForce(double level)
        {
            var d = Math.Min(Math.Abs(level), depth / 2);
            if (d <= _arcStart)
                return (InArc(Math.PI / 2).Moment + across * (_arcStart - d) * (_arcStart + d) / 2) / (inertia * across);

            var (moment, width) = InArc(Math.Acos(Math.Min(1, (d - _arcStart) / radius)));
            return width > 0 ? moment / (inertia * width) : 0;
        }

        // First moment of what lies beyond a level of the corner arcs, and the width there; angle from the crown, 0 to π/2.
        private (double Moment, double Width) InArc(double angle)
        {
            var (sin, cos) = Math.SinCos(angle);
            var level = _arcStart + radius * cos;
            // 2φ − sin 2φ loses all digits near the crown; 4φ³/3 is its leading term.
            var segment = radius * radius / 4 * (angle > 1e-4 ? 2 * angle - 2 * sin * cos : 4 * angle * angle * angle / 3);
            var flat = Math.Max(0, across - 2 * radius);
            var moment = flat * (depth / 2 - level) * (depth / 2 + level) / 2
                + 2 * (_arcStart * segment + radius * radius * radius * sin * sin * sin / 3);
            return (moment, flat + 2 * radius * sin);
        }
    }
}
