using System.Collections.Frozen;
using System.Collections.Immutable;

namespace MemberScan.Model.Rules;

/// <summary>Everything that the settings say about reading a model.</summary>
public sealed record ReadingRules
{
    /// <summary>Which classes are candidates.</summary>
    public CandidateRules Candidates { get; init; } = CandidateRules.Default;

    /// <summary>How forces are read.</summary>
    public ForceRules Forces { get; init; } = new();

    /// <summary>Whether meshes that are one straight prism of a covered section are recognised; otherwise they are not checked.</summary>
    public bool RecogniseMeshes { get; init; }

    /// <summary>How the role of a member is guessed; the first rule that fits wins.</summary>
    public ImmutableArray<RoleRule> Roles { get; init; } = RoleRule.Default;

    /// <summary>Units that the settings name for unit types missing in the model: unit type → factor to SI.</summary>
    public FrozenDictionary<string, double> MissingUnits { get; init; } = FrozenDictionary<string, double>.Empty;

    /// <summary>Grades by name, in the order of trial.</summary>
    public ImmutableArray<Grade> Grades { get; init; } = [];

    /// <summary>Poisson's ratio where the model gives none [-].</summary>
    public double DefaultPoisson { get; init; } = 0.3;
}
