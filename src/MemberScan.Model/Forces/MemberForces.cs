using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Model.Forces;

/// <summary>The section forces of one candidate in one situation, in its local axes.</summary>
public sealed record MemberForces
{
    /// <summary>Key of the candidate.</summary>
    public required string MemberKey { get; init; }

    /// <summary>The situation.</summary>
    public required Situation Situation { get; init; }

    /// <summary>Stations along the member, in the order of the source; SI, positive-face, about the centroid. Of an envelope: least, then largest values.</summary>
    public required ImmutableArray<ForceStation> Stations { get; init; }

    /// <summary>File and lines, or STEP ids, in words.</summary>
    public required string Source { get; init; }

    /// <summary>How the values were turned into local axes and this convention, in words; empty when they were so already.</summary>
    public string Conversion { get; init; } = "";

    /// <summary>Where the stations must begin [m]; the member's start, or that of its analytical line when it reaches beyond.</summary>
    public double From { get; init; }

    /// <summary>Where the stations must end [m]; null for the member's end.</summary>
    public double? To { get; init; }

    /// <summary>Least and largest values, in rising order of places, where the source is named an envelope; empty otherwise.</summary>
    public ImmutableArray<EnvelopeStation> Envelope { get; init; } = [];

    /// <summary>Whether known loads explain the forces all along the member, so that stations between those of the source stand where they matter.</summary>
    public bool LoadsAreKnown { get; init; }

    /// <summary>What a reader must know of these forces, one sentence each, such as loads by which stations were added.</summary>
    public ImmutableArray<string> Notes { get; init; } = [];

    /// <summary>Why the values cannot be used; null when they can.</summary>
    public Reason? Unusable { get; init; }
}
