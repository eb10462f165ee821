using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Model.Frames;

/// <summary>A straight member between two nodes; a bent or curved one is a chain of them.</summary>
/// <remarks>
/// Its flexible part runs from the start node plus <see cref="StartOffset"/> to the end node plus <see cref="EndOffset"/>; the offsets are
/// rigid. Local axes: x along the flexible part, z the part of <see cref="ZDirection"/> square to x, <c>y = z × x</c>. Loads and stations
/// count from the flexible start.
/// </remarks>
public sealed record FrameMember
{
    /// <summary>Name, unique within the frame.</summary>
    public required string Name { get; init; }

    /// <summary>Number of the start node in <see cref="Frame.Nodes"/>, from 0.</summary>
    public required int Start { get; init; }

    /// <summary>Number of the end node in <see cref="Frame.Nodes"/>, from 0.</summary>
    public required int End { get; init; }

    /// <summary>The section.</summary>
    public required FrameSection Section { get; init; }

    /// <summary>The material.</summary>
    public required FrameMaterial Material { get; init; }

    /// <summary>A direction on the side of local z; null for global +Z square to x, and global +X for an upright member.</summary>
    public Vector3? ZDirection { get; init; }

    /// <summary>Whether shear deforms the member (Timoshenko); false for Euler–Bernoulli.</summary>
    public bool ShearFlexible { get; init; }

    /// <summary>
    /// Whether both ends are hinged about y and z and the end also about x: the member resists N alone; loads across it act on it as on a
    /// simple beam.
    /// </summary>
    public bool TrussOnly { get; init; }

    /// <summary>How the flexible start is joined to its node, in local directions; a free direction is a release.</summary>
    public Restraints StartJoint { get; init; } = Restraints.AllFixed;

    /// <summary>How the flexible end is joined to its node, in local directions; a free direction is a release.</summary>
    public Restraints EndJoint { get; init; } = Restraints.AllFixed;

    /// <summary>From the start node to the flexible start [m], in global axes; rigid.</summary>
    public Vector3 StartOffset { get; init; }

    /// <summary>From the end node to the flexible end [m], in global axes; rigid.</summary>
    public Vector3 EndOffset { get; init; }

    /// <summary>
    /// Sections along a tapered member, the first at share 0 and the last at 1, shares rising; between them every constant changes
    /// linearly. Empty for a member of one section.
    /// </summary>
    public ImmutableArray<TaperPoint> Taper { get; init; } = [];

    /// <summary>Where results are wanted; null for the stations of the frame.</summary>
    public FrameStations? Stations { get; init; }
}
