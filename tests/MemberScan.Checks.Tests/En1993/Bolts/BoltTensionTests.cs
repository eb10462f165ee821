using MemberScan.Checks.En1993.Bolts;
using MemberScan.Checks.Threads;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.En1993.Bolts;

public sealed class BoltTensionTests
{
    [Theory]
    [InlineData("M12", 1.75, 84.3, 48.6)]
    [InlineData("M16", 2.0, 157, 90.4)]
    [InlineData("M20", 2.5, 245, 141.1)]
    public void The_resistance_of_8_8_bolts_is_the_customary_one(string name, double pitchMm, double areaMm2, double resistanceKN)
    {
        // 0.9·800·A_s/1.25 with the tabulated A_s, by hand; the same figures stand in design guides for EN 1993-1-8 (from memory).
        Assert.Equal(resistanceKN, BoltTension.F_t_Rd(Si.MPa(800), Si.Mm2(areaMm2), 1.25) / 1e3, 0.1);

        var set = BoltTension.Check(Rod(name, pitchMm, Si.KN(resistanceKN)), Si.MPa(800), 1.25, isCutThread: false, "settings");
        Assert.Equal(1.000, set.Worst!.Utilization!.Value, 0.0025);
    }

    [Fact]
    public void A_cut_thread_has_0_85_of_the_resistance()
    {
        var plain = BoltTension.Check(Rod("M12", 1.75, 1000), Si.MPa(400), 1.25, isCutThread: false, "settings").Worst!.Utilization!.Value;
        var cut = BoltTension.Check(Rod("M12", 1.75, 1000), Si.MPa(400), 1.25, isCutThread: true, "settings").Worst!.Utilization!.Value;

        Assert.Equal(plain / 0.85, cut, 12);
    }

    [Fact]
    public void Service_forces_torsion_and_a_factor_below_1_are_told()
    {
        var rod = Rod("M12", 1.75, 1000);

        Assert.Equal(ReasonCode.KindWithoutLimit, BoltTension.Check(rod with { Kind = SituationKind.Service }, 4e8, 1.25, false, "").Barred!.Why.Code);
        Assert.Equal(ReasonCode.CheckNotEvaluated, BoltTension.Check(rod with { Forces = rod.Forces with { T = 1 } }, 4e8, 1.25, false, "").Barred!.Why.Code);
        Assert.Throws<ArgumentOutOfRangeException>(() => BoltTension.Check(rod, 4e8, 0.9, false, ""));
    }

    private static RodCase Rod(string name, double pitchMm, double tension) => new()
    {
        Thread = new(ThreadSeries.Metric, Si.Mm(double.Parse(name[1..], System.Globalization.CultureInfo.InvariantCulture)), Si.Mm(pitchMm), "coarse"),
        ThreadSource = "name",
        Forces = new SectionForces(tension, 0, 0, 0, 0, 0),
        Kind = SituationKind.Design,
    };
}
