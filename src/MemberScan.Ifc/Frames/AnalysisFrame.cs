using System.Collections.Immutable;
using MemberScan.Model.Frames;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Frames;

/// <summary>A structural analysis model as a frame, or why it is none.</summary>
public sealed record AnalysisFrame
{
    /// <summary>Points nearer than this are one node [m].</summary>
    public const double NodeTolerance = 1e-4;

    /// <summary>STEP id of the analysis model.</summary>
    public required ulong Id { get; init; }

    /// <summary>The analysis model in words, such as <c>analysis model #12 'Landing'</c>.</summary>
    public required string Name { get; init; }

    /// <summary>STEP ids of its analytical members, in the order of the file.</summary>
    public required ImmutableArray<ulong> Lines { get; init; }

    /// <summary>The frame; null where something bars its analysis.</summary>
    public Frame? Frame { get; init; }

    /// <summary>What the members of the frame are, in their order.</summary>
    public ImmutableArray<FramePiece> Pieces { get; init; } = [];

    /// <summary>What the situations of the frame are, in their order.</summary>
    public ImmutableArray<FrameCase> Cases { get; init; } = [];

    /// <summary>Whether any action or self-weight acts on it.</summary>
    public required bool HasLoads { get; init; }

    /// <summary>Whether it holds results of its own.</summary>
    public required bool HasResults { get; init; }

    /// <summary>What bars the analysis, naming each item; empty when nothing does.</summary>
    public ImmutableArray<Reason> Refusals { get; init; } = [];

    /// <summary>What a reader must know of every result, one sentence each.</summary>
    public ImmutableArray<string> Notes { get; init; } = [];
}
