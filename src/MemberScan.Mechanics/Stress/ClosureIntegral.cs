using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;

namespace MemberScan.Mechanics.Stress;

/// <summary>Integrates a field over its section for each unit force.</summary>
internal static class ClosureIntegral
{
    /// <summary>The closure of a field.</summary>
    public static Closure Of(StressField field, Outline outline)
    {
        var points = outline.Quadrature().ToArray();
        var (cross, extent) = (0.0, outline.Extent);
        var n = Own(new SectionForces(1, 0, 0, 0, 0, 0));
        var vy = Own(new SectionForces(0, 1, 0, 0, 0, 0));
        var vz = Own(new SectionForces(0, 0, 1, 0, 0, 0));
        var t = field.CarriesTorsion ? Own(new SectionForces(0, 0, 0, 1, 0, 0)) : 1;
        var my = Own(new SectionForces(0, 0, 0, 0, 1, 0));
        var mz = Own(new SectionForces(0, 0, 0, 0, 0, 1));
        return new Closure(n, vy, vz, t, my, mz, cross);

        double Own(in SectionForces unit)
        {
            var got = Integrate(field, unit, points);
            // Everything as a force: moments by the extent. A unit moment stands for a force of 1/extent.
            var isMoment = unit.N == 0 && unit.Vy == 0 && unit.Vz == 0;
            var scale = isMoment ? extent : 1;
            var own = got.N * unit.N + got.Vy * unit.Vy + got.Vz * unit.Vz + got.T * unit.T + got.My * unit.My + got.Mz * unit.Mz;
            var rest = got - own * unit;
            cross = Math.Max(cross, scale * Math.Max(
                Math.Max(Math.Abs(rest.N), Math.Max(Math.Abs(rest.Vy), Math.Abs(rest.Vz))),
                Math.Max(Math.Abs(rest.T), Math.Max(Math.Abs(rest.My), Math.Abs(rest.Mz))) / extent));
            return own;
        }
    }

    private static SectionForces Integrate(StressField field, in SectionForces forces, (double Y, double Z, double Area)[] points)
    {
        var sum = default(SectionForces);
        foreach (var (y, z, area) in points)
        {
            var state = field.At(forces, y, z);
            sum += area * new SectionForces(
                state.Sigma, state.TauXY, state.TauXZ, state.TauXZ * y - state.TauXY * z, state.Sigma * z, -state.Sigma * y);
        }

        return sum;
    }
}
