using System.Collections.Immutable;
using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Checks.Combinations;

/// <summary>One line of a standard's list: a factor on all permanent cases, and actions beside them.</summary>
/// <param name="Equation">Number of the equation or combination.</param>
/// <param name="Permanent">Factor of all permanent cases [-].</param>
/// <param name="Places">Actions beside the permanent ones; one choice is made in each place.</param>
internal sealed record CombinationRule(string Equation, double Permanent, params ImmutableArray<CombinationRule.Place> Places)
{
    /// <summary>A place that one of several actions takes.</summary>
    /// <param name="IsRequired">Whether one must; otherwise it may stay empty.</param>
    /// <param name="Choices">The actions with their factors.</param>
    internal sealed record Place(bool IsRequired, params ImmutableArray<(ActionTag Tag, double Factor)> Choices);

    /// <summary>A place that must be taken.</summary>
    public static Place Must(params ImmutableArray<(ActionTag Tag, double Factor)> choices) => new(true, choices);

    /// <summary>A place that may be taken: a variable action that helps is left out.</summary>
    public static Place May(params ImmutableArray<(ActionTag Tag, double Factor)> choices) => new(false, choices);
}
