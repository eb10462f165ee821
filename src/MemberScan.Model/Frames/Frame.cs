using System.Collections.Immutable;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Model.Frames;

/// <summary>A space frame: nodes, straight members, supports, and the situations under which it stands. SI, global axes right-handed.</summary>
/// <remarks>Members, supports and loads name nodes and members by their number in these lists, from 0; names are for people.</remarks>
public sealed record Frame
{
    /// <summary>The nodes.</summary>
    public required ImmutableArray<FrameNode> Nodes { get; init; }

    /// <summary>The members.</summary>
    public required ImmutableArray<FrameMember> Members { get; init; }

    /// <summary>The supports, at most one for each node.</summary>
    public required ImmutableArray<FrameSupport> Supports { get; init; }

    /// <summary>The situations: load cases and combinations of them.</summary>
    public required ImmutableArray<FrameSituation> Situations { get; init; }

    /// <summary>Where results are wanted along members that do not say so themselves.</summary>
    public FrameStations Stations { get; init; } = FrameStations.Default;
}
