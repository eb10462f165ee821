using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Resultants;

/// <summary>Integrates a field over its section for each unit force.</summary>
internal static class ClosureIntegral
{
    private static readonly SectionForces[] s_units =
    [
        new(1, 0, 0, 0, 0, 0), new(0, 1, 0, 0, 0, 0), new(0, 0, 1, 0, 0, 0),
        new(0, 0, 0, 1, 0, 0), new(0, 0, 0, 0, 1, 0), new(0, 0, 0, 0, 0, 1),
    ];

    /// <summary>The closure of the bending formula and a shear solution.</summary>
    public static Closure Of(SectionProperties p, ShearSolution shear, Outline outline)
    {
        var got = new SectionForces[s_units.Length];
        foreach (var (y, z, area) in outline.Quadrature())
        {
            var (vy, vz, t) = shear.UnitsAt(y, z);
            ReadOnlySpan<ShearStress> stresses = [default, vy, vz, t, default, default];
            for (var k = 0; k < got.Length; k++)
            {
                var (sigma, tau) = (BendingStress.At(p, s_units[k], y, z), stresses[k]);
                got[k] += area * new SectionForces(
                    sigma, tau.XY, tau.XZ, tau.XZ * (y - p.ShearCentreY) - tau.XY * (z - p.ShearCentreZ), sigma * z, -sigma * y);
            }
        }

        var (own, cross) = (new double[got.Length], 0.0);
        for (var k = 0; k < got.Length; k++)
        {
            var unit = s_units[k];
            own[k] = got[k].N * unit.N + got[k].Vy * unit.Vy + got[k].Vz * unit.Vz + got[k].T * unit.T + got[k].My * unit.My + got[k].Mz * unit.Mz;
            // Everything as a force: moments by the extent. A unit moment stands for a force of 1/extent.
            var rest = got[k] - own[k] * unit;
            cross = Math.Max(cross, (k >= 3 ? outline.Extent : 1) * Math.Max(
                Math.Max(Math.Abs(rest.N), Math.Max(Math.Abs(rest.Vy), Math.Abs(rest.Vz))),
                Math.Max(Math.Abs(rest.T), Math.Max(Math.Abs(rest.My), Math.Abs(rest.Mz))) / outline.Extent));
        }

        return new Closure(own[0], own[1], own[2], own[3], own[4], own[5], cross);
    }

    /// <summary>Shear areas: <c>1/∫τ² dA</c> for unit shear forces [m²].</summary>
    public static ShearAreas ShearAreas(ShearSolution shear, Outline outline)
    {
        var (alongY, alongZ) = (0.0, 0.0);
        foreach (var (y, z, area) in outline.Quadrature())
        {
            var (vy, vz, _) = shear.UnitsAt(y, z);
            alongY += area * (vy.XY * vy.XY + vy.XZ * vy.XZ);
            alongZ += area * (vz.XY * vz.XY + vz.XZ * vz.XZ);
        }

        return new ShearAreas(1 / alongY, 1 / alongZ);
    }
}
