using System.Collections.Immutable;

namespace MemberScan.Model.Limits;

/// <summary>How the stability of members is judged.</summary>
public sealed record StabilityRules
{
    /// <summary>Buckling length over member length of a cantilever: the cautious choice for a rail post or bracket [-].</summary>
    public const double DefaultLengthFactor = 2.0;

    /// <summary>Buckling length over member length, for the rule of 4 % of the Euler load [-]; where given, for the checks of stability too.</summary>
    public double LengthFactor { get; init; } = DefaultLengthFactor;

    /// <summary>Whether <see cref="LengthFactor"/> was given.</summary>
    public bool IsLengthFactorGiven { get; init; }

    /// <summary>Buckling length over member length by role [-].</summary>
    public ImmutableSortedDictionary<string, double> FactorByRole { get; init; } = ImmutableSortedDictionary.Create<string, double>(StringComparer.OrdinalIgnoreCase);

    /// <summary>Whether ends that meet other members count as held.</summary>
    public bool EndsFromContacts { get; init; } = true;

    /// <summary>How hollow sections were made.</summary>
    public TubeForming Forming { get; init; }

    /// <summary>The factor that is set for a role; null where none is.</summary>
    /// <param name="role">Role of the member.</param>
    public double? FactorOf(string role) =>
        FactorByRole.TryGetValue(role, out var factor) ? factor : IsLengthFactorGiven ? LengthFactor : null;
}
