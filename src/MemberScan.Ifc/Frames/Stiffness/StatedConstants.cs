namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Constants of a section as profile properties state them; null where they state nothing usable.</summary>
/// <param name="Area">Area [m²].</param>
/// <param name="Iy">Second moment about y [m⁴].</param>
/// <param name="Iz">Second moment about z [m⁴].</param>
/// <param name="Iyz">Product of inertia [m⁴].</param>
/// <param name="J">Torsion constant [m⁴].</param>
/// <param name="ShearAreaY">Shear area for Vy [m²].</param>
/// <param name="ShearAreaZ">Shear area for Vz [m²].</param>
/// <param name="Source">Where they stand, in words.</param>
internal sealed record StatedConstants(
    double? Area, double? Iy, double? Iz, double? Iyz, double? J, double? ShearAreaY, double? ShearAreaZ, string Source)
{
    /// <summary>Largest quotient of the polar second moment and the square of the area that is no slip of a unit [-]: a thin tube has R/(2πt).</summary>
    private const double MostSpread = 1000;

    /// <summary>Share by which rounded values may pass their bounds.</summary>
    private const double Rounded = 0.01;

    /// <summary>Why they make no section; null when they do.</summary>
    /// <remarks>No section has a polar second moment below that of a disc, A²/2π, nor a torsion constant above its polar second moment (Saint-Venant).</remarks>
    public string? WhyNoSection
    {
        get
        {
            if (Area is not { } area || Iy is not { } iy || Iz is not { } iz || J is not { } j) return $"{Source} does not state area, both second moments and the torsion constant";
            if (Iyz is not (null or 0)) return $"{Source} states a product of inertia, whose sign the standard leaves open";

            var polar = iy + iz;
            var isPossible = polar >= (1 - Rounded) * area * area / (2 * Math.PI) && polar <= MostSpread * area * area && j <= (1 + Rounded) * polar;
            return isPossible ? null : $"the constants of {Source} belong to no section; their units are taken for a slip";
        }
    }
}
