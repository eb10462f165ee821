using MemberScan.Checks.Allowable;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Allowable;

public sealed class LargestNormalStressTests
{
    [Fact]
    public void Principal_stresses_of_40_and_30_are_56_06_and_minus_16_06()
    {
        // 20 ± √(20² + 30²) = 20 ± 36.06 MPa, by hand (Mohr's circle).
        var result = Assert.IsType<CheckResult.Evaluated>(Check(new StressState(Si.MPa(40), Si.MPa(30), 0), 60, 20));

        Assert.Equal(56.06, result.Trace.Single(l => l.Symbol == "σ1").Value / 1e6, 2);
        Assert.Equal(-16.06, result.Trace.Single(l => l.Symbol == "σ3").Value / 1e6, 2);
        Assert.Equal(56.06 / 60, result.Utilization, 3);
    }

    [Fact]
    public void Compression_is_held_against_its_own_limit()
    {
        var result = Assert.IsType<CheckResult.Evaluated>(Check(new StressState(Si.MPa(-30), 0, 0), 10, 20));

        Assert.Equal(1.5, result.Utilization, 12);
    }

    [Fact]
    public void A_design_situation_is_not_held_against_a_service_limit()
    {
        var result = LargestNormalStress.Check(default, 1, 1, SituationKind.Service, SituationKind.Design, "settings");

        Assert.Equal(ReasonCode.KindWithoutLimit, Assert.IsType<CheckResult.NotEvaluated>(result).Why.Code);
    }

    [Fact]
    public void A_limit_of_zero_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Check(default, 0, 1));

    private static CheckResult Check(StressState state, double tensionMPa, double compressionMPa) =>
        LargestNormalStress.Check(state, Si.MPa(tensionMPa), Si.MPa(compressionMPa), SituationKind.Service, SituationKind.Service, "settings");
}
