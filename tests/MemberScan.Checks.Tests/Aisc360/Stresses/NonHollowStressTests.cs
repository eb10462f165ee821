using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Stresses;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Aisc360.Stresses;

public sealed class NonHollowStressTests
{
    private static readonly double s_fy = Si.Ksi(36);
    private static readonly StressState s_state = new(0.8 * Si.Ksi(36), 0.4 * Si.Ksi(36), 0);
    private static readonly Rectangle s_bar = new(Si.Mm(10), Si.Mm(50));

    [Fact]
    public void Split_limits_of_0_8_and_0_4_fy_are_0_889_and_0_741_by_lrfd()
    {
        // 0.8/0.9 = 0.8889; 0.4/(0.9·0.6) = 0.7407, by hand.
        var set = NonHollowStress.Check(s_bar, s_state, s_fy, DesignMethod.Lrfd, SituationKind.Design);

        Assert.Equal(0.8889, set.Checks[0].Utilization!.Value, 4);
        Assert.Equal(0.7407, set.Checks[1].Utilization!.Value, 4);
        Assert.Equal("aisc-h3.3a", set.Worst!.Key);
        Assert.Null(set.Barred);
    }

    [Fact]
    public void By_asd_the_limits_are_fy_over_1_67()
    {
        var set = NonHollowStress.Check(s_bar, s_state, s_fy, DesignMethod.Asd, SituationKind.Service);

        Assert.Equal(0.8 * 1.67, set.Worst!.Utilization!.Value, 12);
    }

    [Fact]
    public void Of_an_open_section_buckling_is_not_evaluated()
    {
        var channel = new OpenProfile(OpenShape.U, Si.Mm(80), Si.Mm(45), Si.Mm(6), Si.Mm(8));

        var set = NonHollowStress.Check(channel, s_state, s_fy, DesignMethod.Lrfd, SituationKind.Design);

        Assert.Equal(ReasonCode.CheckNotEvaluated, set.Barred!.Why.Code);
        Assert.Equal(3, set.Checks.Length);
    }

    [Fact]
    public void Hollow_sections_and_the_wrong_kind_are_refused()
    {
        var tube = new Tube(Si.Mm(24.15), Si.Mm(3.2));

        Assert.Equal(ReasonCode.CheckNotEvaluated, NonHollowStress.Check(tube, s_state, s_fy, DesignMethod.Lrfd, SituationKind.Design).Barred!.Why.Code);
        Assert.Equal(ReasonCode.KindWithoutLimit, NonHollowStress.Check(s_bar, s_state, s_fy, DesignMethod.Lrfd, SituationKind.Service).Barred!.Why.Code);
    }
}
