using System.Collections.Immutable;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Readiness;

/// <summary>What is known of one candidate before any check, and what is missing for one.</summary>
public sealed record MemberReadiness
{
    /// <summary>Key of the candidate.</summary>
    public required string Key { get; init; }

    /// <summary>GlobalId of its element.</summary>
    public required string GlobalId { get; init; }

    /// <summary>Number of the item among the element's bodies, from 1; 0 when the element is the candidate.</summary>
    public required int ItemNumber { get; init; }

    /// <summary>Tag; empty if none.</summary>
    public required string Tag { get; init; }

    /// <summary>Name; empty if none.</summary>
    public required string Name { get; init; }

    /// <summary>Class in its schema's spelling.</summary>
    public required string Class { get; init; }

    /// <summary>Guess of the role.</summary>
    public required string RoleGuess { get; init; }

    /// <summary>Name of its storey or other container; empty if none.</summary>
    public required string Storey { get; init; }

    /// <summary>Designation of the section; empty if none.</summary>
    public required string Section { get; init; }

    /// <summary>Where the section comes from, in words; empty if none.</summary>
    public required string SectionSource { get; init; }

    /// <summary>Name of the material as written; empty if none.</summary>
    public required string Material { get; init; }

    /// <summary>Yield strength [Pa]; null if not known.</summary>
    public required double? Strength { get; init; }

    /// <summary>Where the strength comes from, in words; empty if not known.</summary>
    public required string StrengthSource { get; init; }

    /// <summary>Length [m]; null if not known.</summary>
    public required double? Length { get; init; }

    /// <summary>Where the length comes from, in words; empty if not known.</summary>
    public required string LengthSource { get; init; }

    /// <summary>Number of situations with usable forces.</summary>
    public required int Situations { get; init; }

    /// <summary>Number of stations in all of them.</summary>
    public required int Stations { get; init; }

    /// <summary>Where the forces come from, in words; empty if there are none.</summary>
    public required string ForcesSource { get; init; }

    /// <summary>What was found of each situation, usable or not, in the order of the source.</summary>
    public ImmutableArray<ForcesLine> Forces { get; init; } = [];

    /// <summary>Everything that is missing, each code once; empty when a check can begin.</summary>
    public required ImmutableArray<Reason> Missing { get; init; }

    /// <summary>What a reader must know about the reading of this member.</summary>
    public required ImmutableArray<string> Notes { get; init; }

    /// <summary>Whether nothing is missing.</summary>
    public bool IsReady => Missing.IsEmpty;
}
