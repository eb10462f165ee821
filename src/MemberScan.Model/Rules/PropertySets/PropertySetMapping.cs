using System.Collections.Frozen;
using System.Collections.Immutable;
using MemberScan.Model.Forces;

namespace MemberScan.Model.Rules.PropertySets;

/// <summary>How section forces are read from property sets of an element: the reviewer's mapping of names to components.</summary>
public sealed record PropertySetMapping
{
    /// <summary>Name of the sets, without regard to case; <c>*</c> and <c>?</c> are wildcards.</summary>
    public required string Set { get; init; }

    /// <summary>Name of the situation; null: what the first <c>*</c> of <see cref="Set"/> stands for, or the set's name.</summary>
    public string? Situation { get; init; }

    /// <summary>Kind of the situations; unknown where the mapping does not say.</summary>
    public SituationKind Kind { get; init; }

    /// <summary>Whether each set is a single load case; otherwise it acts in full.</summary>
    public bool IsLoadCase { get; init; }

    /// <summary>Whether the values of load cases may be superposed.</summary>
    public bool IsLinear { get; init; }

    /// <summary>What the values act on.</summary>
    public ForceConvention Convention { get; init; } = ForceConvention.PositiveFace;

    /// <summary>The section forces that are mapped; each once.</summary>
    public required ImmutableArray<ComponentMapping> Components { get; init; }

    /// <summary>How stations are given.</summary>
    public required StationSource Stations { get; init; }

    /// <summary>Name of the property with the list of stations; empty for other sources.</summary>
    public string StationProperty { get; init; } = "";

    /// <summary>SI size of a bare station [m]; null when it has none.</summary>
    public double? StationFactor { get; init; }

    /// <summary>Whether bare stations are shares of the length [%].</summary>
    public bool StationIsShare { get; init; }

    /// <summary>Stations that names carry as words: word → share of the length [-].</summary>
    public FrozenDictionary<string, double> StationWords { get; init; } = FrozenDictionary<string, double>.Empty;
}
