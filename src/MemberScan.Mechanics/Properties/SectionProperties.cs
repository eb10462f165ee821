using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Properties;

/// <summary>Properties of a cross-section about its centroid; warping is left out.</summary>
public sealed record SectionProperties
{
    /// <summary>Area [m²].</summary>
    public required double Area { get; init; }

    /// <summary>Second moment <c>∫z² dA</c> about y [m⁴].</summary>
    public required double Iy { get; init; }

    /// <summary>Second moment <c>∫y² dA</c> about z [m⁴].</summary>
    public required double Iz { get; init; }

    /// <summary>Product of inertia <c>+∫yz dA</c> [m⁴].</summary>
    public required double Iyz { get; init; }

    /// <summary>Saint-Venant torsion constant [m⁴]: closed form, series, or the numerical field; every kind of today has one.</summary>
    public required double? J { get; init; }

    /// <summary>Where J comes from, in words.</summary>
    public required string JSource { get; init; }

    /// <summary>Elastic modulus about y at the nearer extreme fibre: the smaller one [m³].</summary>
    public required double WelY { get; init; }

    /// <summary>Elastic modulus about z at the nearer extreme fibre: the smaller one [m³].</summary>
    public required double WelZ { get; init; }

    /// <summary>Elastic moduli at each of the four extreme fibres.</summary>
    public required ExtremeModuli Extremes { get; init; }

    /// <summary>First moment about y of the part above the centroid, <c>∫z dA</c> over z ≥ 0 [m³].</summary>
    public required double QY { get; init; }

    /// <summary>First moment about z of the part beyond the centroid, <c>∫y dA</c> over y ≥ 0 [m³].</summary>
    public required double QZ { get; init; }

    /// <summary>Plastic modulus about y: first moments of both halves about the axis that halves the area [m³].</summary>
    public required double WplY { get; init; }

    /// <summary>Plastic modulus about z [m³].</summary>
    public required double WplZ { get; init; }

    /// <summary>Distance from the centroid along z of the axis parallel to y that halves the area [m].</summary>
    public double PlasticAxisZ { get; init; }

    /// <summary>Distance from the centroid along y of the axis parallel to z that halves the area [m].</summary>
    public double PlasticAxisY { get; init; }

    /// <summary>
    /// Torsion modulus: largest torsional shear stress = T/Wt [m³]; null where J is. Of a box that of the hand calculation,
    /// <c>It/(t + K/t)</c> by the annex formula, and of an open profile <c>JThinWall/t</c> of its thickest wall.
    /// </summary>
    public required double? Wt { get; init; }

    /// <summary>Torsion constant of a box by the annex formula It of EN 10210-2 and EN 10219-2 [m⁴]; null for other kinds.</summary>
    public double? JAnnex { get; init; }

    /// <summary>Thin-wall torsion constant [m⁴]: <c>4·Am²·t/p</c> of a closed wall, <c>Σbt³/3</c> of open walls; null for other sections.</summary>
    public required double? JThinWall { get; init; }

    /// <summary>Thin-wall torsion modulus <c>2·Am·t</c> of a closed wall (Bredt) [m³], shown beside Wt; null for other sections.</summary>
    public double? WtThinWall { get; init; }

    /// <summary>Shear centre, distance from the centroid along y [m].</summary>
    public required double ShearCentreY { get; init; }

    /// <summary>Shear centre, distance from the centroid along z [m].</summary>
    public required double ShearCentreZ { get; init; }

    /// <summary>Poisson's ratio at which the shear centre is given where none is named [-].</summary>
    public const double CustomaryPoisson = 0.3;

    /// <summary>The larger of the two second moments about principal axes [m⁴].</summary>
    public double IMax => 0.5 * (Iy + Iz) + Math.Sqrt(0.25 * (Iy - Iz) * (Iy - Iz) + Iyz * Iyz);

    /// <summary>Angle from y towards z of the principal axis about which the second moment is <see cref="IMax"/> [rad], in (−π/2, π/2].</summary>
    public double PrincipalAngle => Math.Abs(Iyz) <= 1e-12 * (Iy + Iz) ? (Iy >= Iz * (1 - 1e-12) ? 0 : Math.PI / 2) : 0.5 * Math.Atan2(-2 * Iyz, Iy - Iz);

    /// <summary>The smaller of the two second moments about principal axes [m⁴].</summary>
    public double IMin => 0.5 * (Iy + Iz) - Math.Sqrt(0.25 * (Iy - Iz) * (Iy - Iz) + Iyz * Iyz);

    /// <summary>Properties of a section by closed form or exact integrals; J of all but round, tube and rectangle, and the shear centre, from the numerical field, solved once.</summary>
    public static SectionProperties Of(CrossSection section) => section switch
    {
        Round round => ClosedForms.Of(round),
        Tube tube => ClosedForms.Of(tube),
        Rectangle rectangle => ClosedForms.Of(rectangle),
        RoundedRectangle rounded => ClosedForms.Of(rounded),
        Box box => ClosedForms.Of(box),
        OutlineSection or OpenProfile => OutlineProperties.Of(section, CustomaryPoisson),
        null => throw new ArgumentNullException(nameof(section)),
        _ => throw new ArgumentOutOfRangeException(nameof(section), section.Kind, "no closed form for this kind"),
    };
}
