using System.Collections.Immutable;
using MemberScan.Model.Frames;

namespace MemberScan.Statics;

/// <summary>Displacements, reactions and section forces of a frame in all its situations.</summary>
public sealed class FrameResult
{
    internal FrameResult(Frame frame, ImmutableArray<SituationResult> situations, SolveQuality quality) =>
        (Frame, Situations, Quality) = (frame, situations, quality);

    /// <summary>The frame.</summary>
    public Frame Frame { get; }

    /// <summary>One result per situation, in the order of the frame.</summary>
    public ImmutableArray<SituationResult> Situations { get; }

    /// <summary>What is known of the arithmetic.</summary>
    public SolveQuality Quality { get; }
}
