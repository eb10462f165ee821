using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Marks;
using MemberScan.Screening.Record.Lines;

namespace MemberScan.Screening.Record;

/// <summary>How one candidate ended, with all that is known of it. Values are SI; what is not known is null or empty.</summary>
public sealed record MemberResult
{
    /// <summary>What names the candidate and says where it belongs.</summary>
    public required MemberIdentity Identity { get; init; }

    /// <summary>GlobalId, for an item <c>GlobalId/2</c>.</summary>
    public string Key => Identity.Key;

    /// <summary>GlobalId of the element.</summary>
    public string GlobalId => Identity.GlobalId;

    /// <summary>Number of the item, from 1; 0 when the element is the candidate.</summary>
    public int ItemNumber => Identity.ItemNumber;

    /// <summary>Number of items of the element.</summary>
    public int ItemCount => Identity.ItemCount;

    /// <summary>Number after '#' of the element.</summary>
    public ulong StepId => Identity.StepId;

    /// <summary>Tag; empty if none.</summary>
    public string Tag => Identity.Tag;

    /// <summary>Name; empty if none.</summary>
    public string Name => Identity.Name;

    /// <summary>Class, such as <c>IfcMember</c>.</summary>
    public string Class => Identity.Class;

    /// <summary>Guess of the role.</summary>
    public string Role => Identity.Role;

    /// <summary>Storey or other container; empty if none.</summary>
    public string Storey => Identity.Storey;

    /// <summary>Section in words; empty if none.</summary>
    public required string Section { get; init; }

    /// <summary>Where the section comes from, in words; empty if none.</summary>
    public required string SectionSource { get; init; }

    /// <summary>Material name; empty if none.</summary>
    public required string Material { get; init; }

    /// <summary>Yield strength [Pa].</summary>
    public required double? Strength { get; init; }

    /// <summary>Where the strength comes from; empty if there is none.</summary>
    public required string StrengthSource { get; init; }

    /// <summary>Length along the sweep [m].</summary>
    public required double? Length { get; init; }

    /// <summary>Where the length comes from; empty if there is none.</summary>
    public required string LengthSource { get; init; }

    /// <summary>Local axes in project coordinates.</summary>
    public required MemberAxes? Axes { get; init; }

    /// <summary>The verdict.</summary>
    public required Verdict Verdict { get; init; }

    /// <summary>Why the candidate was not checked; null otherwise.</summary>
    public required Reason? Reason { get; init; }

    /// <summary>The governing check; null when nothing could be evaluated. Present on unchecked candidates too, where a figure is known.</summary>
    public required Governing? Governing { get; init; }

    /// <summary>The worst of each situation, worst first.</summary>
    public required ImmutableArray<SituationResult> Situations { get; init; }

    /// <summary>What a reader must know.</summary>
    public required ImmutableArray<string> Notes { get; init; }

    /// <summary>Marks of the inputs; null where no run made them.</summary>
    public InputMarks? Inputs { get; init; }

    /// <summary>What a person decided about it; null if nobody did.</summary>
    public MemberDecision? Decision { get; init; }

    /// <summary>Every check, each where it is worst: those that decide first, by falling utilization, those not made after them; then what informs.</summary>
    public ImmutableArray<CheckLine> Checks { get; init; } = [];

    /// <summary>The three next-worst of the deciding checks, behind the one that governs; each check once in a situation.</summary>
    public ImmutableArray<RankedLine> NextWorst { get; init; } = [];

    /// <summary>Share of the limit that is left, <c>1 − utilization</c> [-]; below zero over the limit, null without a utilization.</summary>
    public double? Margin { get; init; }

    /// <summary>
    /// Yield strength that the stress criterion needs [Pa]; given where the strength is missing or too small. No verdict: stability and walls
    /// are not looked at.
    /// </summary>
    public double? RequiredYield { get; init; }

    /// <summary>Nearest size at which the stress criterion holds; null unless overstressed, and where no size is known.</summary>
    public SizeHint? NearestSize { get; init; }

    /// <summary>Deflection beside its named limit; null where none is named for the role. Never part of the verdict.</summary>
    public CheckLine? Deflection { get; init; }
}
