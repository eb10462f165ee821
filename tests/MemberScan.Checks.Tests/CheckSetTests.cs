using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests;

public sealed class CheckSetTests
{
    private static readonly Clause s_clause = new("", "a limit", "", FromMemory: false);

    [Fact]
    public void The_worst_is_the_largest_that_decides_and_what_was_not_made_is_told()
    {
        var set = new CheckSet(
            [Made("a", 0.4), Made("b", 0.9), Made("c", 2, CheckStanding.Informs), NotMade("d")], []);

        Assert.Equal("b", set.Worst!.Key);
        Assert.Equal(ReasonCode.CheckNotEvaluated, set.Barred!.Why.Code);
    }

    [Fact]
    public void A_check_that_is_switched_off_is_gone()
    {
        var set = new CheckSet([Made("a", 0.4), NotMade("d")], []).Without(new HashSet<string> { "d" });

        Assert.Equal(["a"], set.Checks.Select(c => c.Key));
        Assert.Null(set.Barred);
    }

    [Fact]
    public void An_empty_set_has_no_worst() => Assert.Null(CheckSet.Empty.Worst);

    private static NamedCheck Made(string key, double utilization, CheckStanding standing = CheckStanding.Decides) =>
        new(key, key, standing, new CheckResult.Evaluated(s_clause, utilization, []));

    private static NamedCheck NotMade(string key) =>
        new(key, key, CheckStanding.Decides, new CheckResult.NotEvaluated(s_clause, new Reason(ReasonCode.CheckNotEvaluated, "not made")));
}
