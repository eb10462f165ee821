using System.Collections.Immutable;

namespace MemberScan.Checks.Ranking;

/// <summary>The worst of the deciding checks of a member, the next three, and what was not made.</summary>
/// <param name="Worst">The check of largest utilization; null when none was made.</param>
/// <param name="Next">The three next-worst, each check counted once in a situation.</param>
/// <param name="NotMade">Deciding checks that were not made, in their order.</param>
public sealed record CheckRanking(RankedCheck? Worst, ImmutableArray<RankedCheck> Next, ImmutableArray<RankedCheck> NotMade)
{
    /// <summary>How many are kept beside the worst.</summary>
    public const int Kept = 3;

    /// <summary>Share of the limit that is left: <c>1 − utilization</c> [-], below zero over the limit; null when no check was made.</summary>
    public double? Margin => 1 - Worst?.Check.Utilization;

    /// <summary>Ranks the checks of a member over situations and stations; among equals the earlier one comes first.</summary>
    public static CheckRanking Of(IEnumerable<RankedCheck> checks)
    {
        ArgumentNullException.ThrowIfNull(checks);
        var deciding = checks.Where(c => c.Check.Standing == CheckStanding.Decides).ToArray();
        var made = deciding.Where(c => c.Check.Utilization is not null)
            .OrderByDescending(c => c.Check.Utilization!.Value)
            .DistinctBy(c => (c.Check.Key, c.Situation))
            .Take(1 + Kept)
            .ToArray();
        return new CheckRanking(made.FirstOrDefault(), [.. made.Skip(1)], [.. deciding.Where(c => c.Check.Utilization is null)]);
    }
}
