using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Properties;

/// <summary>Properties of outlines and open profiles: exact integrals along the edges; J and the shear centre from the numerical field.</summary>
internal static class OutlineProperties
{
    /// <summary>The properties at a ν, on which the shear centre depends.</summary>
    public static SectionProperties Of(CrossSection section, double poisson)
    {
        var edges = ProfileEdges.Of(section);
        var integrals = OutlineIntegrals.Of(edges);
        var torsion = SolvedSections.Torsion(section);
        var (y, z) = torsion?.ShearCentre(integrals.Iy, integrals.Iz, integrals.Iyz, poisson) ?? (double.NaN, double.NaN);
        var (farY, farZ) = (0.0, 0.0);
        foreach (var at in edges.SelectMany(edge => edge.Extremes())) (farY, farZ) = (Math.Max(farY, Math.Abs(at.Y)), Math.Max(farZ, Math.Abs(at.Z)));
        var walls = section is OpenProfile profile ? ProfileWalls.Of(profile) : [];
        double? thinWall = walls.IsEmpty ? null : walls.Sum(wall => wall.Length * Math.Pow(wall.Thickness, 3) / 3);
        return new SectionProperties
        {
            Area = integrals.Area,
            Iy = integrals.Iy,
            Iz = integrals.Iz,
            Iyz = IsSymmetric(integrals) ? 0 : integrals.Iyz,
            J = torsion?.J,
            JSource = ClosedForms.Numerical(torsion),
            WelY = integrals.Iy / farZ,
            WelZ = integrals.Iz / farY,
            WplY = OutlineIntegrals.Plastic(edges),
            WplZ = OutlineIntegrals.Plastic([.. edges.Select(edge => edge.Exchanged().Reversed())]),
            Wt = thinWall is { } j ? j / walls.Max(wall => wall.Thickness) : torsion?.Wt,
            JThinWall = thinWall,
            ShearCentreY = Math.Abs(y) <= Rounding * farY ? 0 : y,
            ShearCentreZ = Math.Abs(z) <= Rounding * farZ ? 0 : z,
        };
    }

    // What a numerical field leaves of nothing.
    private const double Rounding = 1e-5;

    private static bool IsSymmetric(OutlineIntegrals integrals) => Math.Abs(integrals.Iyz) <= 1e-12 * (integrals.Iy + integrals.Iz);
}
