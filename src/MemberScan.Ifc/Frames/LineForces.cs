using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Frames;

/// <summary>Section forces along one analytical member in one situation, found outside of the model.</summary>
public sealed record LineForces
{
    /// <summary>STEP id of the analytical member.</summary>
    public required ulong Line { get; init; }

    /// <summary>The situation.</summary>
    public required Situation Situation { get; init; }

    /// <summary>Axes of the forces; x along the analytical member. Null where there are none.</summary>
    public MemberAxes? Axes { get; init; }

    /// <summary>Stations from the start of the analytical member to its end; two at one place are a jump.</summary>
    public ImmutableArray<ForceStation> Stations { get; init; } = [];

    /// <summary>Where they come from, in words.</summary>
    public required string Source { get; init; }

    /// <summary>What a reader must know, one sentence each.</summary>
    public ImmutableArray<string> Notes { get; init; } = [];

    /// <summary>Why there are none that can be used; null when there are.</summary>
    public Reason? Unusable { get; init; }
}
