using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Members;

/// <summary>One candidate: an element, or one bar-like body of an element that has several.</summary>
public sealed record Member
{
    /// <summary>GlobalId, for an item <c>GlobalId/2</c>: the key of tables, settings and links.</summary>
    public required string Key { get; init; }

    /// <summary>The element.</summary>
    public required ElementIdentity Element { get; init; }

    /// <summary>Number of the item among the element's bodies, from 1; 0 when the element is the candidate.</summary>
    public required int ItemNumber { get; init; }

    /// <summary>How many items the element has; 1 when it is the candidate itself.</summary>
    public required int ItemCount { get; init; }

    /// <summary>Guess of the role (rail, post, hanger, strut, brace, beam, column, stay, member); shown as a guess.</summary>
    public required string Role { get; init; }

    /// <summary>The section, or why there is none.</summary>
    public required Finding<SectionFinding> Section { get; init; }

    /// <summary>The section at the member's end where it tapers to another of the same kind; null for a member of one section.</summary>
    public SectionFinding? EndSection { get; init; }

    /// <summary>Length along the sweep [m], or why it is not known.</summary>
    public required Finding<double> Length { get; init; }

    /// <summary>Local axes in project coordinates, or why they are not known.</summary>
    public required Finding<MemberAxes> Axes { get; init; }

    /// <summary>
    /// Distance of the section's centroid from the line that results in the model are tied to, along y and z [m]; zero where the
    /// line is the centroid's. Known for members that no body shows in space.
    /// </summary>
    public (double Y, double Z) CentroidOffset { get; init; }

    /// <summary>The material.</summary>
    public required Material Material { get; init; }

    /// <summary>Radii of the bends along the member [m]; empty for a straight one.</summary>
    public ImmutableArray<double> BendRadii { get; init; } = [];

    /// <summary>Whether the centre line is one straight line.</summary>
    public bool IsStraight { get; init; } = true;

    /// <summary>What a reader must know about the reading of this member.</summary>
    public ImmutableArray<string> Notes { get; init; } = [];
}
