using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Drawing;

namespace MemberScan.Reporting.Tests.Drawing;

public sealed class UtilizationSpreadTests
{
    [Theory]
    [InlineData(0, 0)]
    [InlineData(0.1, 0)]
    [InlineData(0.1001, 1)]
    [InlineData(0.3, 2)]
    [InlineData(0.7, 6)]
    [InlineData(1, 9)]
    [InlineData(1 + 1e-9, 9)]
    [InlineData(1.00001, 10)]
    [InlineData(1.5, 14)]
    [InlineData(1.51, 15)]
    [InlineData(1e300, 15)]
    public void Puts_a_utilization_into_the_bar_whose_upper_edge_it_does_not_pass(double utilization, int bar)
    {
        var hanger = FerryLanding.Hanger("Key", "", 1e3);

        var spread = UtilizationSpread.Of([hanger with { Governing = hanger.Governing! with { Utilization = utilization } }]);

        Assert.Equal(bar, spread.Bars.IndexOf(spread.Bars.Single(b => b.Total == 1)));
    }

    [Fact]
    public void Counts_every_candidate_once()
    {
        var members = FerryLanding.Small().Members;

        var spread = UtilizationSpread.Of(members);

        Assert.Equal(members.Length, spread.Bars.Sum(b => b.Total) + spread.WithoutUtilization);
        Assert.Equal(members.Count(m => m.Verdict == Verdict.Overstressed), spread.Bars.Sum(b => b.Overstressed));
        Assert.Equal(1, spread.Bars.Sum(b => b.NotChecked));
        Assert.Equal(3, spread.WithoutUtilization);
    }
}
