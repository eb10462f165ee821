using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Checking;

/// <summary>Brings the torsion of a source to the shear centre, about which stress fields take it: <c>T_S = T − (y_S·Vz − z_S·Vy)</c>.</summary>
internal static class TorsionMove
{
    /// <summary>Share of the root of the area within which centroid and shear centre are one point.</summary>
    private const double OnePoint = 1e-6;

    /// <summary>Stations whose T is about the shear centre.</summary>
    /// <param name="forces">The forces with what their source says about T.</param>
    /// <param name="properties">Properties of the section.</param>
    /// <param name="findings">Takes the note of the move; bars a verdict where the source does not say and it matters.</param>
    /// <param name="isKnown">Whether shear forces and torsion can be used.</param>
    public static ImmutableArray<ForceStation> Of(MemberForces forces, SectionProperties properties, SituationFindings findings, out bool isKnown)
    {
        var (y, z) = (properties.ShearCentreY, properties.ShearCentreZ);
        isKnown = true;
        var isAside = Math.Max(Math.Abs(y), Math.Abs(z)) > OnePoint * Math.Sqrt(properties.Area);
        if (!isAside || forces.TorsionAxis == TorsionAxis.ShearCentre || !forces.Stations.Any(s => s.Forces is not { Vy: 0, Vz: 0, T: 0 })) return forces.Stations;

        if (forces.TorsionAxis == TorsionAxis.NotStated || !double.IsFinite(y + z))
        {
            isKnown = false;
            findings.Bar(ReasonCode.ConventionUnknown, string.Create(
                CultureInfo.InvariantCulture, $"'{forces.Situation.Name}' does not say whether T is about the centroid or the shear centre, which lies at y {y * 1e3:0.##} mm, z {z * 1e3:0.##} mm from it; a value shown leaves shear and torsion out and is a lower bound"));
            return forces.Stations;
        }

        if (!forces.Envelope.IsEmpty)
        {
            isKnown = false;
            findings.Bar(ReasonCode.ConventionUnknown, $"'{forces.Situation.Name}' is an envelope with T about the centroid, which cannot be brought to the shear centre; it is not evaluated");
            return forces.Stations;
        }

        findings.Note(string.Create(CultureInfo.InvariantCulture, $"T is moved from the centroid to the shear centre at y {y * 1e3:0.##} mm, z {z * 1e3:0.##} mm: T − (yS·Vz − zS·Vy)"));
        return [.. forces.Stations.Select(s => s with { Forces = s.Forces with { T = s.Forces.T - (y * s.Forces.Vz - z * s.Forces.Vy) } })];
    }
}
