namespace MemberScan.Mechanics.Warping;

/// <summary>What a section's numerical field gives for its properties.</summary>
/// <param name="J">Torsion constant [m⁴].</param>
/// <param name="Wt">T over the largest torsional shear stress, surroundings of re-entrant corners left out [m³].</param>
/// <param name="Change">Change of J at the last refinement [-].</param>
/// <param name="Moments">Moments about the centroid of the loads 1 to 4 of <see cref="WarpingSolver"/>.</param>
internal sealed record TorsionConstants(double J, double Wt, double Change, double[] Moments)
{
    /// <summary>The line in which shear forces leave the mean twist zero: for unit V the moment about the centroid is <c>y_S·Vz − z_S·Vy</c>.</summary>
    public (double Y, double Z) ShearCentre(double iy, double iz, double iyz, double poisson)
    {
        var (kappa, determinant) = (poisson / (1 + poisson), iy * iz - iyz * iyz);
        var (fromA, fromB) = (Moments[0] + kappa * Moments[2], Moments[1] + kappa * Moments[3]);
        return ((iz * fromB - iyz * fromA) / determinant, -(iy * fromA - iyz * fromB) / determinant);
    }
}
