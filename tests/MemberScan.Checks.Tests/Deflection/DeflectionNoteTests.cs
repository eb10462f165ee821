using MemberScan.Checks.Deflection;
using MemberScan.Foundation.Units;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Deflection;

public sealed class DeflectionNoteTests
{
    private static readonly DeflectionLimit[] s_limits = [new("gangway posts L/50", "post", 50, null), new("rails 20 mm", "rail", 100, Si.Mm(20))];

    [Fact]
    public void A_cantilever_post_stands_beside_its_named_limit_and_decides_nothing()
    {
        // PL³/3EI of the pipe post: 889.6 N·1.0668³/(3·200 GPa·12.9 cm⁴) = 13.96 mm against 1066.8/50 = 21.34 mm: 0.654; by hand.
        var deflection = Si.Lbf(200) * Math.Pow(Si.In(42), 3) / (3 * Si.GPa(200) * Si.Cm4(12.9));

        var note = DeflectionNote.For("Post", s_limits, SituationKind.Service, deflection, "closed form", Si.In(42));

        Assert.Equal(CheckStanding.Informs, note!.Standing);
        Assert.Equal(0.654, note.Utilization!.Value, 3);
        Assert.Equal("deflection against gangway posts L/50", note.Name);
        Assert.Null(new CheckSet([note], []).Worst);
    }

    [Fact]
    public void The_smaller_of_two_values_counts()
    {
        Assert.Equal(0.02, s_limits[1].For(3), 12);
        Assert.Equal(0.01, s_limits[1].For(1), 12);
    }

    [Theory]
    [InlineData(SituationKind.Design)]
    [InlineData(SituationKind.Unknown)]
    public void Other_situations_than_service_are_not_looked_at(SituationKind kind)
    {
        var note = DeflectionNote.For("post", s_limits, kind, 1, "", 1);

        Assert.Equal(ReasonCode.KindWithoutLimit, Assert.IsType<CheckResult.NotEvaluated>(note!.Result).Why.Code);
    }

    [Fact]
    public void Without_a_limit_there_is_no_note_and_an_empty_limit_throws()
    {
        Assert.Null(DeflectionNote.For("stay", s_limits, SituationKind.Service, 1, "", 1));
        Assert.Throws<InvalidOperationException>(() => new DeflectionLimit("none", "stay", null, null).For(1));
        Assert.Throws<ArgumentOutOfRangeException>(() => DeflectionNote.For("post", s_limits, SituationKind.Service, -1, "", 1));
    }
}
