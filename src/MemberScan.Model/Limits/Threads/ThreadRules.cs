using System.Collections.Immutable;

namespace MemberScan.Model.Limits.Threads;

/// <summary>How threaded rods are checked.</summary>
public sealed record ThreadRules
{
    /// <summary>The rule; null where none is named: a thread that is known is then held on its root diameter against the limit of the basis.</summary>
    public ThreadRule? Rule { get; init; }

    /// <summary>The rule in force.</summary>
    public ThreadRule InForce => Rule ?? ThreadRule.Basis;

    /// <summary>Area of the rule <see cref="ThreadRule.Allowable"/>.</summary>
    public ThreadAreaBasis Area { get; init; }

    /// <summary>Allowable stress of the rule <see cref="ThreadRule.Allowable"/> [Pa]; null where none is given.</summary>
    public double? Allowable { get; init; }

    /// <summary>Tensile strength of the rods [Pa]; null where none is given.</summary>
    public double? TensileStrength { get; init; }

    /// <summary>Whether threads count as cut and outside EN 1090, the less favourable.</summary>
    public bool IsCut { get; init; } = true;

    /// <summary>Factor of the temperature on the strength [-], in (0, 1].</summary>
    public double TemperatureFactor { get; init; } = 1;

    /// <summary>Threads by key, tag or name of members, <c>*</c> and <c>?</c> being wildcards; they come before the names in the model.</summary>
    public ImmutableArray<(string Members, string Thread)> ByMember { get; init; } = [];
}
