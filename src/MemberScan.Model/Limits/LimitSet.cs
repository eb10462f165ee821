using System.Collections.Immutable;
using MemberScan.Model.Limits.Threads;

namespace MemberScan.Model.Limits;

/// <summary>Everything that decides which checks are made of a member and against what.</summary>
public sealed record LimitSet
{
    /// <summary>Partial factors that EN 1993-1-1 and -1-8 recommend (from memory) [-].</summary>
    public const double RecommendedGammaM1 = 1.00, RecommendedGammaM2 = 1.25;

    /// <summary>The stress limits, one for each kind of situation.</summary>
    public Basis Basis { get; init; } = Basis.Default;

    /// <summary>The wall of hollow sections; null where none is set: the design wall by grade with AISC 360-22, else the nominal wall.</summary>
    public WallBasis? Wall { get; init; }

    /// <summary>The wall in force.</summary>
    public WallBasis WallInForce => Wall ?? (IsAisc(Basis.Service) || IsAisc(Basis.Design) ? WallBasis.ByGrade : WallBasis.Nominal);

    /// <summary>Limits of brittle materials; null for none: such members are then not checked.</summary>
    public BrittleLimits? Brittle { get; init; }

    /// <summary>Keys of checks that are switched off.</summary>
    public ImmutableSortedSet<string> ChecksOff { get; init; } = ImmutableSortedSet.Create<string>(StringComparer.Ordinal);

    /// <summary>Partial factor γM1 of EN 1993-1-1 [-], ≥ 1.</summary>
    public double GammaM1 { get; init; } = RecommendedGammaM1;

    /// <summary>Partial factor γM2 of EN 1993-1-8 [-], ≥ 1.</summary>
    public double GammaM2 { get; init; } = RecommendedGammaM2;

    /// <summary>Stability.</summary>
    public StabilityRules Stability { get; init; } = new();

    /// <summary>Threaded rods.</summary>
    public ThreadRules Threads { get; init; } = new();

    /// <summary>Welds of aluminium members; the first that fits counts.</summary>
    public ImmutableArray<WeldRule> Welds { get; init; } = [];

    /// <summary>Limits of deflection; the first of a role counts.</summary>
    public ImmutableArray<DeflectionRule> Deflection { get; init; } = [];

    private static bool IsAisc(StressLimit? limit) => limit is { Criterion: Criterion.Aisc360Asd or Criterion.Aisc360Lrfd };
}
