using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;

namespace MemberScan.Model.Frames.Loads;

/// <summary>Loads that act on a frame together: a load case, or a combination of other situations.</summary>
public sealed record FrameSituation
{
    /// <summary>Name, unique within the frame.</summary>
    public required string Name { get; init; }

    /// <summary>Whether the loads carry load factors.</summary>
    public SituationKind Kind { get; init; }

    /// <summary>
    /// Multiple of the weight of every member, as a vector in global axes: (0, 0, −1) is its own weight downwards. Acts over the flexible length.
    /// </summary>
    public Vector3 SelfWeight { get; init; }

    /// <summary>Forces and moments on nodes.</summary>
    public ImmutableArray<NodeLoad> NodeLoads { get; init; } = [];

    /// <summary>Forces and moments at points of members.</summary>
    public ImmutableArray<MemberPointLoad> PointLoads { get; init; } = [];

    /// <summary>Forces and moments spread along members.</summary>
    public ImmutableArray<MemberLineLoad> LineLoads { get; init; } = [];

    /// <summary>Changes of temperature.</summary>
    public ImmutableArray<MemberTemperature> Temperatures { get; init; } = [];

    /// <summary>Displacements forced upon fixed directions of supports, added to <see cref="Restraint.Displacement"/>.</summary>
    public ImmutableArray<SupportMovement> Movements { get; init; } = [];

    /// <summary>
    /// Other situations that act too, each with its factor. Their loads and <see cref="Movements"/> are multiplied;
    /// <see cref="Restraint.Displacement"/> acts once, without a factor. They must not hold terms themselves.
    /// </summary>
    public ImmutableArray<SituationTerm> Terms { get; init; } = [];
}
