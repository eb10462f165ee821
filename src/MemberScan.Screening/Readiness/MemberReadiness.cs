using System.Collections.Immutable;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Readiness;

/// <summary>What is known of one candidate before any check, and what is missing for one.</summary>
public sealed record MemberReadiness
{
    /// <summary>What names the candidate and says where it belongs.</summary>
    public required MemberIdentity Identity { get; init; }

    /// <summary>Key of the candidate.</summary>
    public string Key => Identity.Key;

    /// <summary>Name; empty if none.</summary>
    public string Name => Identity.Name;

    /// <summary>Class in its schema's spelling.</summary>
    public string Class => Identity.Class;

    /// <summary>Guess of the role.</summary>
    public string RoleGuess => Identity.Role;

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
