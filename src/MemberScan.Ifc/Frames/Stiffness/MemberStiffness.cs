using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Ifc.Frames.Stiffness;

/// <summary>Section and material of a curve member, and how the section lies in space.</summary>
/// <param name="Section">The section.</param>
/// <param name="Material">The material.</param>
/// <param name="Z">Direction of the section's z, project axes; null where any direction does.</param>
/// <param name="ReversedY">Whether the section was turned round because the member runs against the body that it was read from.</param>
/// <param name="Density">Mass per volume [kg/m³]; null where the model does not say.</param>
/// <param name="Expansion">Thermal expansion [1/K]; null where the model does not say.</param>
/// <param name="ExtentY">Extent of the section along y [m]; 0 where the model states constants alone.</param>
/// <param name="ExtentZ">Extent of the section along z [m]; 0 where the model states constants alone.</param>
/// <param name="Notes">What a reader must know, one sentence each.</param>
internal sealed record MemberStiffness(
    FrameSection Section, FrameMaterial Material, Vector3? Z, bool ReversedY, double? Density, double? Expansion, double ExtentY, double ExtentZ, ImmutableArray<string> Notes)
{
    /// <summary>The sections along a tapering member; null for a member of one section, which <see cref="Section"/> then is.</summary>
    public SectionCourse? Course { get; init; }

    /// <summary>How far the section's centroid lies from the member's line along y and z of the section [m]; zero where it lies on it.</summary>
    public (double Y, double Z) Beside { get; init; }

    /// <summary>Whether shear deforms the member: the model states its shear areas.</summary>
    public bool ShearFlexible { get; init; }
}
