using MemberScan.Checks.Stability;

namespace MemberScan.Checks.Tests.Stability;

public sealed class MemberActionsTests
{
    [Fact]
    public void The_largest_of_each_is_taken_over_the_stations()
    {
        var actions = MemberActions.Of([new(-5, 0, 0, 0, 3, 4), new(2, 0, 0, 0, -6, 1)]);

        Assert.Equal(new MemberActions(5, 6, 4, Math.Sqrt(37)), actions);
    }

    [Fact]
    public void Tension_is_no_compression_and_what_is_not_finite_is_refused()
    {
        Assert.Equal(0, MemberActions.Of([new(5, 0, 0, 0, 0, 0)]).Compression);
        Assert.Throws<ArgumentException>(() => MemberActions.Of([new(double.NaN, 0, 0, 0, 0, 0)]));
    }

    [Fact]
    public void Slenderness_is_information_only()
    {
        var note = Slenderness.Note(length: 3, radiusOfGyration: 0.016, isCompressed: true);

        Assert.Equal(CheckStanding.Informs, note.Standing);
        Assert.Equal(187.5 / 200, note.Utilization!.Value, 12);
        Assert.Equal(187.5 / 300, Slenderness.Note(3, 0.016, isCompressed: false).Utilization!.Value, 12);
    }
}
