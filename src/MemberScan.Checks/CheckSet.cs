using System.Collections.Immutable;

namespace MemberScan.Checks;

/// <summary>The checks that a standard makes of one section or member, in the order of its clauses.</summary>
/// <param name="Checks">The checks that apply; empty when nothing acts.</param>
/// <param name="Notes">What a reader must know: assumptions, what was taken more cautiously than the clause.</param>
public sealed record CheckSet(ImmutableArray<NamedCheck> Checks, ImmutableArray<string> Notes)
{
    /// <summary>No check applies.</summary>
    public static CheckSet Empty { get; } = new([], []);

    /// <summary>The deciding check of largest utilization; null when none was made.</summary>
    public NamedCheck? Worst => Deciding.Where(c => c.Utilization is not null).MaxBy(c => c.Utilization);

    /// <summary>The first deciding check that was not made; null when all were.</summary>
    public CheckResult.NotEvaluated? Barred => Deciding.Select(c => c.Result).OfType<CheckResult.NotEvaluated>().FirstOrDefault();

    private IEnumerable<NamedCheck> Deciding => Checks.Where(c => c.Standing == CheckStanding.Decides);

    /// <summary>The set without the checks of the given keys.</summary>
    public CheckSet Without(IReadOnlySet<string> keys)
    {
        ArgumentNullException.ThrowIfNull(keys);
        return this with { Checks = [.. Checks.Where(c => !keys.Contains(c.Key))] };
    }

    /// <summary>A set of one check that was not made.</summary>
    internal static CheckSet Refused(string key, string name, CheckResult.NotEvaluated refusal) =>
        new([new NamedCheck(key, name, CheckStanding.Decides, refusal)], []);
}
