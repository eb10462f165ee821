using System.Collections.Immutable;
using MemberScan.Screening.Record;
using MemberScan.Screening.Record.Given;

namespace MemberScan.Screening.Readiness;

/// <summary>What is in a model and how ready it is to be screened.</summary>
public sealed record ReadinessRecord
{
    /// <summary>The model.</summary>
    public required ModelFacts Model { get; init; }

    /// <summary>The forces tables.</summary>
    public required ImmutableArray<ForcesFile> ForcesFiles { get; init; }

    /// <summary>Every candidate in the order of the model.</summary>
    public required ImmutableArray<MemberReadiness> Members { get; init; }

    /// <summary>Elements that are no candidates, per class and reason.</summary>
    public required ImmutableArray<PassedOver> PassedOver { get; init; }

    /// <summary>Whether something in the file was damaged and passed over.</summary>
    public required bool HasDamage { get; init; }

    /// <summary>Number of candidates with nothing missing.</summary>
    public int Ready => Members.Count(m => m.IsReady);

    /// <summary>How many candidates lack what, in the order of the reason codes; a candidate counts in each reason that it has.</summary>
    public ImmutableArray<ReadinessTotal> Totals =>
        [.. Members.SelectMany(m => m.Missing.Select(r => r.Code).Distinct()).GroupBy(code => code).OrderBy(g => g.Key).Select(g => new ReadinessTotal(g.Key, g.Count()))];
}
