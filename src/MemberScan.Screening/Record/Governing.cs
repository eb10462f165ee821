using System.Collections.Immutable;
using MemberScan.Checks;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Screening.Record;

/// <summary>The check that decides a candidate: where, under which forces, with which calculation.</summary>
public sealed record Governing
{
    /// <summary>Key of the stress criterion of the basis.</summary>
    public const string StressKey = "stress";

    /// <summary>Utilization in root form, of the check that decides [-].</summary>
    public required double Utilization { get; init; }

    /// <summary>The check that decides in words: the criterion, or a check of section or member.</summary>
    public required string Criterion { get; init; }

    /// <summary>Standard, edition and clause; marked where from memory.</summary>
    public required string Clause { get; init; }

    /// <summary>Key of the check that decides; <see cref="StressKey"/> for the stress criterion.</summary>
    public string Check { get; init; } = StressKey;

    /// <summary>Utilization by the stress criterion alone, in the same situation [-]; that of the check where it is the stress criterion.</summary>
    public double StressUtilization { get; init; }

    /// <summary>Stress limit of the stress criterion [Pa].</summary>
    public required double Limit { get; init; }

    /// <summary>Stress at the point, which the stress criterion holds against its limit [Pa].</summary>
    public required double Stress { get; init; }

    /// <summary>Name of the situation.</summary>
    public required string Situation { get; init; }

    /// <summary>"service", "design" or "unknown".</summary>
    public required string Kind { get; init; }

    /// <summary>Distance from the member's start [m].</summary>
    public required double Station { get; init; }

    /// <summary>Section forces there.</summary>
    public required SectionForces Forces { get; init; }

    /// <summary>Where the stress criterion has its point, in the same situation: distance from the member's start [m]; null where that is <see cref="Station"/>.</summary>
    public double? StressStation { get; init; }

    /// <summary>Section forces that the stresses at the point belong to; null where they are <see cref="Forces"/>.</summary>
    public SectionForces? StressForces { get; init; }

    /// <summary>Where the forces come from.</summary>
    public required string ForcesSource { get; init; }

    /// <summary>The point of the section and its stresses.</summary>
    public required GoverningPoint Point { get; init; }

    /// <summary>Section that decides, in words (of two readings the less favourable).</summary>
    public required string Section { get; init; }

    /// <summary>"elementary" or "elasticity".</summary>
    public required string ShearModel { get; init; }

    /// <summary>Utilization by the other shear model, at its own point; null when it has none.</summary>
    public required double? OtherModelUtilization { get; init; }

    /// <summary>The calculation line by line.</summary>
    public required ImmutableArray<TraceLine> Trace { get; init; }
}
