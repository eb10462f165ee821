using System.Collections.Immutable;
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
        var (left, right, bottom, top) = RingGeometry.Bounds(edges);
        var (farY, farZ) = (Math.Max(right, -left), Math.Max(top, -bottom));
        var exchanged = edges.Select(edge => edge.Exchanged().Reversed()).ToImmutableArray();
        var (plasticY, plasticZ) = (OutlineIntegrals.Plastic(edges), OutlineIntegrals.Plastic(exchanged));
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
            Extremes = new ExtremeModuli(integrals.Iy / top, integrals.Iy / -bottom, integrals.Iz / right, integrals.Iz / -left),
            QY = OutlineIntegrals.Above(edges, 0).MomentZ,
            QZ = OutlineIntegrals.Above(exchanged, 0).MomentZ,
            WplY = plasticY.Modulus,
            WplZ = plasticZ.Modulus,
            PlasticAxisZ = Math.Abs(plasticY.Axis) <= Nothing * farZ ? 0 : plasticY.Axis,
            PlasticAxisY = Math.Abs(plasticZ.Axis) <= Nothing * farY ? 0 : plasticZ.Axis,
            Wt = thinWall is { } j ? j / walls.Max(wall => wall.Thickness) : torsion?.Wt,
            JThinWall = thinWall,
            ShearCentreY = Math.Abs(y) <= Rounding * farY ? 0 : y,
            ShearCentreZ = Math.Abs(z) <= Rounding * farZ ? 0 : z,
        };
    }

    // What a numerical field leaves of nothing.
    private const double Rounding = 1e-5;

    // What halving an interval leaves of nothing.
    private const double Nothing = 1e-9;

    private static bool IsSymmetric(OutlineIntegrals integrals) => Math.Abs(integrals.Iyz) <= 1e-12 * (integrals.Iy + integrals.Iz);
}
