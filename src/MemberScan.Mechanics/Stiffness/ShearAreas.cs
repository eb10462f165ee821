using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Stiffness;

/// <summary>Shear areas of a section by the energy of its shear stresses: <c>V²/As = ∫τ² dA</c>.</summary>
/// <remarks>
/// Of the elementary model where it has the force in balance (round, rectangle, box, open profiles): 5/6 of the area of a rectangle, 9/10 of
/// a round bar; of the elasticity model for tubes, rounded rectangles and outlines. Source: Timoshenko, Strength of Materials, shear
/// energy of beams (from memory).
/// </remarks>
public static class ShearAreas
{
    /// <summary>Shear areas for Vy and Vz [m²]; null where the section has no shear stresses to go by.</summary>
    /// <param name="section">The section.</param>
    /// <param name="poisson">Poisson's ratio ν [-], in [0, 0.5).</param>
    public static (double Y, double Z)? Of(CrossSection section, double poisson)
    {
        ArgumentNullException.ThrowIfNull(section);
        var model = section is Round or Rectangle or Box or OpenProfile ? ShearModel.Elementary : ShearModel.Elasticity;
        if (!StressField.TryCreate(section, model, poisson, out var field, out _)) return null;

        var (y, z) = (0.0, 0.0);
        foreach (var point in ((SectionField)field).Quadrature())
        {
            var (alongY, alongZ) = (field.At(new SectionForces(0, 1, 0, 0, 0, 0), point.Y, point.Z), field.At(new SectionForces(0, 0, 1, 0, 0, 0), point.Y, point.Z));
            y += point.Area * (alongY.TauXY * alongY.TauXY + alongY.TauXZ * alongY.TauXZ);
            z += point.Area * (alongZ.TauXY * alongZ.TauXY + alongZ.TauXZ * alongZ.TauXZ);
        }

        return y > 0 && z > 0 ? (1 / y, 1 / z) : null;
    }
}
