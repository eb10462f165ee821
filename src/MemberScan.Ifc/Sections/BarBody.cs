using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Sections;

/// <summary>One bar-like body of an element: a section swept along a line, in the coordinates of its element.</summary>
/// <param name="Profile">The section; its position is used up in the axes.</param>
/// <param name="Length">Length along the sweep [m].</param>
/// <param name="LengthSource">Where the length comes from, in words.</param>
/// <param name="Axes">Local axes at the start, in object coordinates.</param>
/// <param name="Source">Class and STEP id of body and profile, in words.</param>
/// <param name="BendRadii">Radii of the bends along it [m].</param>
/// <param name="IsStraight">Whether the centre line is one straight line.</param>
/// <param name="Notes">What a reader must know: cut, corners, reversed axes.</param>
internal sealed record BarBody(
    ProfileShape Profile, double Length, string LengthSource, MemberAxes Axes, string Source, ImmutableArray<double> BendRadii,
    bool IsStraight, ImmutableArray<string> Notes)
{
    /// <summary>Length over largest extent from which a body counts as bar-like in classes that are candidates only then.</summary>
    public const double BarLikeRatio = 3;

    /// <summary>Whether the body is long against its section.</summary>
    public bool IsBarLike => Length >= BarLikeRatio * Profile.LargestExtent;

    /// <summary>Whether the section has no preferred axes, so that turning the member about itself changes nothing.</summary>
    public bool IsIsotropic => Profile.Section.Shape is Mechanics.Sections.Round or Mechanics.Sections.Tube;
}
