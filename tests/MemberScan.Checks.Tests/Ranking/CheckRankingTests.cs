using MemberScan.Checks.Ranking;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Ranking;

public sealed class CheckRankingTests
{
    private static readonly Clause s_clause = new("", "a limit", "", FromMemory: false);

    [Fact]
    public void The_worst_and_the_next_three_are_kept_each_check_once_in_a_situation()
    {
        var ranking = CheckRanking.Of(
        [
            Made("a", "S1", 0.5, 0), Made("a", "S1", 0.9, 1), Made("a", "S2", 0.7), Made("b", "S1", 0.8), Made("b", "S2", 0.6), Made("c", "S1", 0.1),
        ]);

        Assert.Equal(("a", "S1", 1.0), (ranking.Worst!.Check.Key, ranking.Worst.Situation, ranking.Worst.Station!.Value));
        Assert.Equal([0.8, 0.7, 0.6], ranking.Next.Select(c => c.Check.Utilization!.Value));
        Assert.Equal(0.1, ranking.Margin!.Value, 12);
    }

    [Fact]
    public void Over_the_limit_the_margin_is_below_zero() => Assert.Equal(-0.25, CheckRanking.Of([Made("a", "S1", 1.25)]).Margin!.Value, 12);

    [Fact]
    public void What_informs_is_not_ranked_and_what_was_not_made_is_listed()
    {
        var note = new RankedCheck(new NamedCheck("n", "note", CheckStanding.Informs, new CheckResult.Evaluated(s_clause, 9, [])), "S1", null);
        var notMade = new RankedCheck(new NamedCheck("x", "x", CheckStanding.Decides, new CheckResult.NotEvaluated(s_clause, new Reason(ReasonCode.SlenderWall, "slender"))), "S1", null);

        var ranking = CheckRanking.Of([note, notMade]);

        Assert.Null(ranking.Worst);
        Assert.Null(ranking.Margin);
        Assert.Same(notMade, Assert.Single(ranking.NotMade));
    }

    [Fact]
    public void Among_equals_the_earlier_comes_first() => Assert.Equal("a", CheckRanking.Of([Made("a", "S1", 1), Made("b", "S1", 1)]).Worst!.Check.Key);

    private static RankedCheck Made(string key, string situation, double utilization, double? station = null) =>
        new(new NamedCheck(key, key, CheckStanding.Decides, new CheckResult.Evaluated(s_clause, utilization, [])), situation, station);
}
