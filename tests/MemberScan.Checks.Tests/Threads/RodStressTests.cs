using MemberScan.Checks.Threads;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Threads;

/// <summary>A hanger rod 3/8-16 UNC under the deck, 700 lbf in tension.</summary>
public sealed class RodStressTests
{
    private static readonly ThreadDesignation s_thread = new(ThreadSeries.Unified, Si.In(0.375), Si.Inch / 16, "designation");
    private static readonly double s_allowable = Si.Ksi(9);

    [Theory]
    [InlineData(ThreadArea.Nominal, 6.3)]
    [InlineData(ThreadArea.Stress, 9.0)]
    [InlineData(ThreadArea.Root, 10.3)]
    public void The_stress_hangs_on_the_area(ThreadArea area, double ksi)
    {
        // 700/0.11045 = 6338, 700/0.07749 = 9033, 700/0.06780 = 10325 psi, by hand.
        Assert.Equal(ksi, RodStress.Of(s_thread, area, Si.Lbf(700)) / Si.Ksi(1), 1);
    }

    [Fact]
    public void At_9_ksi_on_the_root_area_the_rod_is_at_1_15()
    {
        var set = Check(Rod(new SectionForces(Si.Lbf(700), 0, 0, 0, 0, 0)));

        Assert.Equal(1.15, set.Worst!.Utilization!.Value, 2);
        Assert.Empty(set.Notes);
    }

    [Fact]
    public void The_older_table_of_hanger_rods_is_9_ksi_on_the_root_area()
    {
        // MSS SP-58 before 2002: 610 lbf for 3/8 in, from memory; 9000 psi·0.0678 in² = 610.2 lbf.
        var set = Check(Rod(new SectionForces(Si.Lbf(610), 0, 0, 0, 0, 0)));

        Assert.Equal(1.000, set.Worst!.Utilization!.Value, 3);
    }

    [Fact]
    public void Temperature_lowers_the_allowable_stress()
    {
        var rod = Rod(new SectionForces(Si.Lbf(700), 0, 0, 0, 0, 0)) with { TemperatureFactor = 0.8, TemperatureSource = "settings" };

        Assert.Equal(1.147 / 0.8, Check(rod).Worst!.Utilization!.Value, 3);
    }

    [Fact]
    public void Bending_is_taken_on_the_root_diameter_and_named_whatever_its_size()
    {
        // Root diameter 0.2938 in: W = π·0.2938³/32 = 0.0024899 in³; 5 lbf·in / W = 2.008 ksi, with 1.475 ksi of 100 lbf; by hand.
        var set = Check(Rod(new SectionForces(Si.Lbf(100), 0, 0, 0, Si.LbfIn(3), Si.LbfIn(4))));

        Assert.Equal((1.475 + 2.008) / 9, set.Worst!.Utilization!.Value, 3);
        Assert.Contains("bending of 0.56492 N·m", Assert.Single(set.Notes), StringComparison.Ordinal);
    }

    [Fact]
    public void Torsion_and_shear_add_by_von_mises()
    {
        var root = s_thread.RootDiameter;
        var set = Check(Rod(new SectionForces(0, Si.Lbf(50), 0, Si.LbfIn(2), 0, 0)));

        var shear = 4 * Si.Lbf(50) / 3 / (Math.PI / 4 * root * root) + 16 * Si.LbfIn(2) / (Math.PI * Math.Pow(root, 3));
        Assert.Equal(Math.Sqrt(3) * shear / s_allowable, set.Worst!.Utilization!.Value, 12);
    }

    [Fact]
    public void A_compressed_rod_is_never_within_its_limit()
    {
        var set = Check(Rod(new SectionForces(-1, 0, 0, 0, 0, 0)));

        Assert.Equal(ReasonCode.StabilityNotChecked, set.Barred!.Why.Code);
        Assert.Contains("compression", Assert.Single(set.Notes), StringComparison.Ordinal);
    }

    [Fact]
    public void Rounding_of_zero_is_not_named() =>
        Assert.Null(RodStress.OtherThanTension(Rod(new SectionForces(3000, 1e-9, 0, 0, 1e-12, 0))));

    [Fact]
    public void A_design_situation_is_refused_and_a_factor_out_of_range_too()
    {
        var rod = Rod(default);

        Assert.Equal(ReasonCode.KindWithoutLimit, Check(rod with { Kind = SituationKind.Design }).Barred!.Why.Code);
        Assert.Throws<ArgumentException>(() => Check(rod with { TemperatureFactor = 0 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => RodStress.Check(rod, ThreadArea.Root, 0, SituationKind.Service, "settings"));
    }

    private static CheckSet Check(RodCase rod) => RodStress.Check(rod, ThreadArea.Root, s_allowable, SituationKind.Service, "settings");

    private static RodCase Rod(SectionForces forces) =>
        new() { Thread = s_thread, ThreadSource = "name", Forces = forces, Kind = SituationKind.Service, Role = "hanger" };
}
