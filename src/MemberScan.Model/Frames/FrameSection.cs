using MemberScan.Mechanics.Sections;

namespace MemberScan.Model.Frames;

/// <summary>The stiffness of a cross-section in the y and z of its member; the axis of the member runs through the centroid.</summary>
public sealed record FrameSection
{
    /// <summary>Name, for messages.</summary>
    public required string Name { get; init; }

    /// <summary>The section itself; null where only the constants are known, and so no stresses.</summary>
    public CrossSection? Shape { get; init; }

    /// <summary>Area [m²], above zero.</summary>
    public required double Area { get; init; }

    /// <summary>Second moment <c>∫z² dA</c> about y [m⁴], above zero.</summary>
    public required double Iy { get; init; }

    /// <summary>Second moment <c>∫y² dA</c> about z [m⁴], above zero.</summary>
    public required double Iz { get; init; }

    /// <summary>Product of inertia <c>+∫yz dA</c> [m⁴]; <c>Iyz² &lt; Iy·Iz</c>.</summary>
    public double Iyz { get; init; }

    /// <summary>Torsion constant [m⁴], above zero.</summary>
    public required double J { get; init; }

    /// <summary>Shear area for Vy [m²]: <c>γ = Vy/(G·Asy)</c>; above zero where a member is flexible in shear, without effect elsewhere.</summary>
    public double ShearAreaY { get; init; }

    /// <summary>Shear area for Vz [m²]: <c>γ = Vz/(G·Asz)</c>; above zero where a member is flexible in shear, without effect elsewhere.</summary>
    public double ShearAreaZ { get; init; }

    /// <summary>Shear centre, distance from the centroid along y [m]; T of a result is about it.</summary>
    public double ShearCentreY { get; init; }

    /// <summary>Shear centre, distance from the centroid along z [m]; T of a result is about it.</summary>
    public double ShearCentreZ { get; init; }
}
