using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking;

/// <summary>Brings torsional moments to the shear centre, about which the fields take them.</summary>
internal static class AboutShearCentre
{
    /// <summary>Share of the extent within which centroid and shear centre are one point.</summary>
    private const double OnePoint = 1e-6;

    /// <summary>The forces about the shear centre: <c>T_S = T − (y_S·Vz − z_S·Vy)</c>; null, with what bars a verdict, where the source does not say its line.</summary>
    public static MemberForces? Of(SituationFindings findings, MemberForces forces, CrossSection shape, SectionProperties properties)
    {
        var (y, z) = (properties.ShearCentreY, properties.ShearCentreZ);
        if (Math.Max(Math.Abs(y), Math.Abs(z)) <= OnePoint * Math.Max(shape.ExtentY, shape.ExtentZ)) return forces;
        if (forces.TorsionAxis == TorsionAxis.ShearCentre || !forces.Stations.Any(s => s.Forces.T != 0 || s.Forces.Vy != 0 || s.Forces.Vz != 0)) return forces;
        if (forces.TorsionAxis == TorsionAxis.NotStated || !forces.Envelope.IsEmpty)
        {
            findings.Bar(ReasonCode.ConventionUnknown, forces.Envelope.IsEmpty
                ? "the source does not say whether T is about the centroid or the shear centre, which differ in this section"
                : "an envelope with T about the centroid cannot be brought to the shear centre, which differs in this section");
            return null;
        }

        findings.Note("T brought from the centroid to the shear centre");
        return forces with { Stations = [.. forces.Stations.Select(s => s with { Forces = s.Forces with { T = s.Forces.T - (y * s.Forces.Vz - z * s.Forces.Vy) } })] };
    }
}
