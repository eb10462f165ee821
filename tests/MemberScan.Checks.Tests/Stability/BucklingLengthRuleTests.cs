using MemberScan.Checks.Stability;
using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Stability;

public sealed class BucklingLengthRuleTests
{
    [Theory]
    [InlineData("strut", EndHold.BothEnds, null, 3.0, true)]
    [InlineData("post", EndHold.BothEnds, null, 3.0, true)]
    [InlineData("post", EndHold.BaseOnly, null, 6.0, true)]
    [InlineData("Post", EndHold.Unknown, null, 6.0, true)]
    [InlineData("beam", EndHold.BaseOnly, null, 6.0, true)]
    [InlineData("beam", EndHold.Unknown, 0.7, 2.1, false)]
    [InlineData("post", EndHold.BaseOnly, 2.2, 6.6, false)]
    public void The_length_follows_settings_then_ends_then_role(string role, EndHold hold, double? factor, double length, bool isAssumed)
    {
        var found = Assert.IsType<Finding<BucklingLength>.Found>(BucklingLengthRule.Find(role, hold, 3, factor)).Value;

        Assert.Equal(length, found.Value, 12);
        Assert.Equal(isAssumed, found.IsAssumed);
        Assert.Equal(isAssumed, found.Source.StartsWith("assumed", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("strut")]
    [InlineData("hanger")]
    [InlineData("member")]
    public void A_member_of_unknown_ends_has_no_length(string role)
    {
        var missing = Assert.IsType<Finding<BucklingLength>.Missing>(BucklingLengthRule.Find(role, EndHold.Unknown, 3, null));

        Assert.Equal(ReasonCode.StabilityNotChecked, missing.Why.Code);
        Assert.Contains(role, missing.Why.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0, 1.0)]
    [InlineData(3, 0.0)]
    [InlineData(3, double.NaN)]
    public void Lengths_and_factors_out_of_range_are_refused(double length, double factor) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => BucklingLengthRule.Find("post", EndHold.BaseOnly, length, factor));
}
