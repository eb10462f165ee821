using System.Collections.Frozen;
using System.Collections.Immutable;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules.Combinations;
using MemberScan.Model.Rules.PropertySets;

namespace MemberScan.Model.Rules;

/// <summary>How forces are read from model and tables.</summary>
public sealed record ForceRules
{
    /// <summary>Convention of results in the model.</summary>
    public ForceConvention Convention { get; init; } = ForceConvention.PositiveFace;

    /// <summary>Axes of results in the model.</summary>
    public ForceComponents Components { get; init; } = ForceComponents.AsFlagged;

    /// <summary>The line about which T is taken in results of the model and in property sets.</summary>
    public TorsionAxis Torsion { get; init; } = TorsionAxis.NotStated;

    /// <summary>Turn about x from the member's own axes to the axes of the stored components [degree].</summary>
    public double TurnDegrees { get; init; }

    /// <summary>Turns that differ for single members, by key, GlobalId or name [degree].</summary>
    public FrozenDictionary<string, double> TurnDegreesByMember { get; init; } = FrozenDictionary<string, double>.Empty;

    /// <summary>Whether components that results leave out count as zero; otherwise such forces are incomplete.</summary>
    public bool MissingComponentsAreZero { get; init; }

    /// <summary>Whether table rows of unknown members are listed instead of refused.</summary>
    public bool ListUnknownMembers { get; init; }

    /// <summary>Kinds by patterns on situation names; the first that fits wins.</summary>
    public ImmutableArray<KindPattern> Kinds { get; init; } = [];

    /// <summary>Whether a load group's coefficient that the model leaves out counts as 1; otherwise it is not known.</summary>
    public bool MissingCoefficientsAreOne { get; init; }

    /// <summary>Whether results of load cases carry the case's own coefficient.</summary>
    public CaseCoefficients CaseCoefficients { get; init; } = CaseCoefficients.Refuse;

    /// <summary>Combinations of load cases.</summary>
    public ImmutableArray<CaseCombination> Combinations { get; init; } = [];

    /// <summary>Standards whose combinations are generated from tagged cases.</summary>
    public ImmutableArray<CombinationSet> CombinationSets { get; init; } = [];

    /// <summary>Actions by patterns on names of load cases; the first that fits wins.</summary>
    public ImmutableArray<CaseTag> CaseTags { get; init; } = [];

    /// <summary>Section forces in property sets of elements, in the order of trial.</summary>
    public ImmutableArray<PropertySetMapping> PropertySets { get; init; } = [];

    /// <summary>Kind of every situation that nothing else tells; from the command line.</summary>
    public SituationKind KindOfAll { get; init; } = SituationKind.Unknown;

    /// <summary>The order in which sources are tried; for each member the first that has any forces counts, and sources left out are not used.</summary>
    public ImmutableArray<ForceSource> From { get; init; } = AutomaticOrder;

    /// <summary>The order where the settings say nothing: what somebody computed, then our own analysis, then assumed loads.</summary>
    public static ImmutableArray<ForceSource> AutomaticOrder { get; } =
        [ForceSource.Table, ForceSource.Results, ForceSource.PropertySets, ForceSource.Statics, ForceSource.Presets];
}
