using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Bolts;
using MemberScan.Checks.Threads;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Aisc360.Bolts;

public sealed class ThreadedPartTests
{
    // 5/8-11 rod of A36, Fu = 58 ksi: F_nt = 43.5 ksi on 0.3068 in².
    private static readonly ThreadDesignation s_thread = new(ThreadSeries.Unified, Si.In(0.625), Si.Inch / 11, "designation");

    [Theory]
    [InlineData(DesignMethod.Asd, SituationKind.Service, 6.67)]
    [InlineData(DesignMethod.Lrfd, SituationKind.Design, 10.0)]
    public void The_available_strength_of_a_five_eighths_rod_is_the_tabulated_one(DesignMethod method, SituationKind kind, double kips)
    {
        // AISC Steel Construction Manual, table of threaded parts of A36, 5/8 in: 6.67 and 10.0 kips, from memory; 0.5·43.5·0.30680 = 6.673 by hand.
        var set = ThreadedPart.Check(Rod(new SectionForces(1000 * Si.Lbf(kips), 0, 0, 0, 0, 0), kind), Si.Ksi(58), method, "A36");

        Assert.Equal(1.000, set.Worst!.Utilization!.Value, 2);
        Assert.Null(set.Barred);
    }

    [Fact]
    public void Bending_beside_tension_is_not_covered()
    {
        var set = ThreadedPart.Check(Rod(new SectionForces(1000, 0, 0, 0, 0.1, 0), SituationKind.Service), Si.Ksi(58), DesignMethod.Asd, "A36");

        Assert.Equal(ReasonCode.CheckNotEvaluated, set.Barred!.Why.Code);
        Assert.Single(set.Notes);
    }

    [Fact]
    public void The_wrong_kind_is_refused() =>
        Assert.Equal(ReasonCode.KindWithoutLimit, ThreadedPart.Check(Rod(default, SituationKind.Design), Si.Ksi(58), DesignMethod.Asd, "A36").Barred!.Why.Code);

    private static RodCase Rod(SectionForces forces, SituationKind kind) =>
        new() { Thread = s_thread, ThreadSource = "name", Forces = forces, Kind = kind };
}
