using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;

namespace MemberScan.Mechanics.Resultants;

/// <summary>Normal stress by the bending formula, with the product of inertia where there is one.</summary>
internal static class BendingStress
{
    /// <summary>σ at a point [Pa].</summary>
    public static double At(SectionProperties p, in SectionForces forces, double y, double z)
    {
        var (n, perY, perZ) = Plane(p, forces);
        return n + perY * y + perZ * z;
    }

    /// <summary>σ as a plane: its value at the centroid [Pa] and what it gains along y and z [Pa/m].</summary>
    public static (double N, double PerY, double PerZ) Plane(SectionProperties p, in SectionForces forces)
    {
        if (p.Iyz == 0) return (forces.N / p.Area, -(forces.Mz / p.Iz), forces.My / p.Iy);

        var determinant = p.Iy * p.Iz - p.Iyz * p.Iyz;
        return (
            forces.N / p.Area,
            -(forces.Mz * p.Iy + forces.My * p.Iyz) / determinant,
            (forces.My * p.Iz + forces.Mz * p.Iyz) / determinant);
    }
}
