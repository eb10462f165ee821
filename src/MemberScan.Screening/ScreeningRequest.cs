using System.Collections.Immutable;
using MemberScan.Inputs.Decisions;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Part21.Containers;
using MemberScan.Screening.Record;

namespace MemberScan.Screening;

/// <summary>Everything that one screening works from; no files, no clock.</summary>
public sealed record ScreeningRequest
{
    /// <summary>The text of the model, with or without a block of ours; it must stay open until the outcome is written.</summary>
    public required ModelText Model { get; init; }

    /// <summary>The settings in force.</summary>
    public required Settings Settings { get; init; }

    /// <summary>Forces tables, in the order given.</summary>
    public ImmutableArray<ForcesTable> Tables { get; init; } = [];

    /// <summary>Decisions of people, carried along.</summary>
    public ImmutableArray<ReviewDecision> Decisions { get; init; } = [];

    /// <summary>The run that the decisions were made on; null when not known.</summary>
    public ScreeningRecord? DecidedOn { get; init; }

    /// <summary>Time of the run, ISO 8601.</summary>
    public required string Timestamp { get; init; }

    /// <summary>Whether the time was given for the run rather than read off the clock; only then it is written into the model.</summary>
    public bool TimestampIsGiven { get; init; }

    /// <summary>Whether the checked model explains our set by a template (IFC4 and later).</summary>
    public bool WithSetTemplate { get; init; }

    /// <summary>Version of the program.</summary>
    public required string Version { get; init; }
}
