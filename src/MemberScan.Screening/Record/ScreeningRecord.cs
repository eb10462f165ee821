using System.Collections.Immutable;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Contacts;
using MemberScan.Screening.Record.Given;

namespace MemberScan.Screening.Record;

/// <summary>One finished screening: everything that report, tables, property sets and the run record show. All values are SI.</summary>
public sealed record ScreeningRecord
{
    /// <summary>Version of the program.</summary>
    public required string Version { get; init; }

    /// <summary>First 16 hexadecimal digits of SHA-256 over base model, forces files, effective settings and version.</summary>
    public required string RunId { get; init; }

    /// <summary>Time of the run as text, ISO 8601; a value passed in.</summary>
    public required string Timestamp { get; init; }

    /// <summary>The model.</summary>
    public required ModelFacts Model { get; init; }

    /// <summary>Files of forces beside the model.</summary>
    public required ImmutableArray<ForcesFile> ForcesFiles { get; init; }

    /// <summary>The limits in force, in words with numbers: one line for service, one for design.</summary>
    public required ImmutableArray<BasisLine> Basis { get; init; }

    /// <summary>The effective settings.</summary>
    public required ImmutableArray<SettingLine> Settings { get; init; }

    /// <summary>The cautions that are always printed.</summary>
    public required ImmutableArray<string> Cautions { get; init; }

    /// <summary>Elements that are no candidates, per class.</summary>
    public required ImmutableArray<PassedOver> PassedOver { get; init; }

    /// <summary>Sections in use with their closure.</summary>
    public required ImmutableArray<SectionFacts> Sections { get; init; }

    /// <summary>One result per candidate, in the order of the model.</summary>
    public required ImmutableArray<MemberResult> Members { get; init; }

    /// <summary>Findings about model, tables and settings.</summary>
    public required ImmutableArray<FindingLine> Findings { get; init; }

    /// <summary>Number of candidates by verdict.</summary>
    public required VerdictCounts Counts { get; init; }

    /// <summary>Whether anything was passed over as damaged.</summary>
    public required bool HasDamage { get; init; }

    /// <summary>The contacts between members by which load presets found spans and supports; empty when none is switched on.</summary>
    public ImmutableArray<Contact> Contacts { get; init; } = [];
}
