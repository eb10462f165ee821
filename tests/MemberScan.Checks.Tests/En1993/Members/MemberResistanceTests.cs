using MemberScan.Checks.En1993;
using MemberScan.Checks.En1993.Members;
using MemberScan.Checks.Stability;
using MemberScan.Checks.Tests.En1993.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.En1993.Members;

public sealed class MemberResistanceTests
{
    private static readonly Tube s_tube = new(Si.Mm(48.3) / 2, Si.Mm(3.2));

    [Fact]
    public void A_rail_tube_of_3_m_under_60_kN_is_never_within_its_limit()
    {
        // By stress alone 60 kN/453.39 mm² = 132.3 MPa over 235/1.67: 0.94. Euler load 26.7 kN, λ̄ = 1.998, curve c: χ = 0.1965, N_b,Rd = 20.93 kN; by hand.
        Assert.Equal(0.94, Si.KN(60) / SectionProperties.Of(s_tube).Area / (Si.MPa(235) / 1.67), 2);

        var set = MemberResistance.Check(Case(s_tube, 235, 3, nKN: 60));

        var buckling = Assert.IsType<CheckResult.Evaluated>(set.Checks.Single(c => c.Key == "en-6.3.1-y").Result);
        Assert.Equal(26.7, Value(buckling, "N_cr") / 1e3, 1);
        Assert.Equal(1.998, Value(buckling, "λ̄"), 3);
        Assert.Equal(0.1965, Value(buckling, "χ"), 4);
        Assert.Equal(60 / 20.93, buckling.Utilization, 2);
        Assert.IsType<CheckResult.NotEvaluated>(CompressionRule.Check(Si.KN(-60), Si.GPa(210), "", SectionProperties.Of(s_tube).IMin, 3, 1));
        Assert.Contains("buckling length for bending about y: assumed: system length, both ends held", set.Notes);
    }

    [Fact]
    public void Bending_and_compression_of_a_hot_finished_box_follow_annex_b()
    {
        // RHS 200x100x8, S355, 4 m, N = 500 kN, My = 40, Mz = 10 kNm; by hand: λ̄ = 0.741 and 1.288, curve a: χ = 0.8277 and 0.4770,
        // χ_LT = 0.9301 (curve d at λ̄_LT = 0.2911), k_yy = 1.2057, k_yz = 0.9167, k_zy = 0.7234, k_zz = 1.5278: (6.61) 1.049, (6.62) 1.221.
        var set = MemberResistance.Check(Case(Cases.Rhs200x100x8, 355, 4, 500, 40, 10) with { Forming = HollowForming.HotFinished });

        Assert.Equal(500 / (0.8277 * 1588.7), set.Utilization("en-6.3.1-y"), 3);
        Assert.Equal(500 / (0.4770 * 1588.7), set.Utilization("en-6.3.1-z"), 3);
        Assert.Equal(40 / (0.9301 * 100.09), set.Utilization("en-6.3.2"), 3);
        var interaction = Assert.IsType<CheckResult.Evaluated>(set.Checks.Single(c => c.Key == "en-6.3.3").Result);
        Assert.Equal(1.2057, Value(interaction, "k_yy"), 3);
        Assert.Equal(0.9167, Value(interaction, "k_yz"), 3);
        Assert.Equal(0.7234, Value(interaction, "k_zy"), 3);
        Assert.Equal(1.5278, Value(interaction, "k_zz"), 3);
        Assert.Equal(1.221, Value(interaction, "left side"), 3);
    }

    [Fact]
    public void The_interaction_is_linear_in_the_load_and_1_where_its_left_side_is_1()
    {
        var c = Case(Cases.Rhs200x100x8, 355, 4, 500, 40, 10) with { Forming = HollowForming.HotFinished };
        var utilization = MemberResistance.Check(c).Utilization("en-6.3.3");

        Assert.InRange(utilization, 1.0, 1.221);
        Assert.Equal(1, MemberResistance.Check(c with { Actions = c.Actions.Times(1 / utilization) }).Utilization("en-6.3.3"), 9);
        Assert.Equal(0.5 * utilization, MemberResistance.Check(c with { Actions = c.Actions.Times(0.5) }).Utilization("en-6.3.3"), 9);
    }

    [Fact]
    public void The_axes_may_be_turned()
    {
        var upright = MemberResistance.Check(Case(Cases.Flat20x60, 235, 1, 20, 1, 0.1));
        var flat = MemberResistance.Check(Case(new Rectangle(Si.Mm(60), Si.Mm(20)), 235, 1, 20, 0.1, 1));

        Assert.Equal(upright.Utilization("en-6.3.1-y"), flat.Utilization("en-6.3.1-z"), 9);
        Assert.Equal(upright.Utilization("en-6.3.2"), flat.Utilization("en-6.3.2"), 9);
        Assert.Equal(upright.Utilization("en-6.3.3"), flat.Utilization("en-6.3.3"), 9);
    }

    [Fact]
    public void A_flat_bar_on_edge_loses_moment_to_lateral_torsional_buckling()
    {
        // 20x60, 1 m, S235: I_z = 4 cm⁴, I_t = 0.26332·60·20³ = 126 394 mm⁴, M_cr = 29.09 kNm, λ̄_LT = 0.381, curve d: χ_LT = 0.864; by hand.
        var result = Assert.IsType<CheckResult.Evaluated>(MemberResistance.Check(Case(Cases.Flat20x60, 235, 1, myKNm: 3.654)).Checks.Single().Result);

        Assert.Equal(29.09, Value(result, "M_cr") / 1e3, 2);
        Assert.Equal(0.864, Value(result, "χ_LT"), 3);
        Assert.Equal(1.000, result.Utilization, 3);
    }

    [Fact]
    public void Round_and_square_sections_and_the_weaker_axis_do_not_turn_sideways()
    {
        // EN 1993-1-1:2005, 6.3.2.1(2), from memory.
        Assert.Empty(MemberResistance.Check(Case(s_tube, 235, 3, myKNm: 0.5)).Checks);
        Assert.Empty(MemberResistance.Check(Case(new Rectangle(0.02, 0.02), 235, 1, myKNm: 0.5)).Checks);
        Assert.Empty(MemberResistance.Check(Case(Cases.Flat20x60, 235, 1, mzKNm: 0.5)).Checks);
    }

    [Fact]
    public void A_round_section_takes_its_resultant_moment()
    {
        var one = MemberResistance.Check(Case(s_tube, 235, 1.5, nKN: 10, myKNm: 0.5) with { Actions = new MemberActions(Si.KN(10), Si.KNm(0.5), 0, Si.KNm(0.5)) });
        var two = MemberResistance.Check(Case(s_tube, 235, 1.5) with { Actions = new MemberActions(Si.KN(10), Si.KNm(0.3), Si.KNm(0.4), Si.KNm(0.5)) });

        Assert.Equal(one.Utilization("en-6.3.3"), two.Utilization("en-6.3.3"), 12);
    }

    [Fact]
    public void A_short_member_keeps_its_whole_resistance()
    {
        // λ̄ = 0.2 at L = 0.2·93.91·i, i = 15.99 mm: 300.2 mm; on both sides.
        Assert.Equal(10 / 106.55, MemberResistance.Check(Case(s_tube, 235, 0.300, nKN: 10)).Utilization("en-6.3.1-y"), 4);
        Assert.True(MemberResistance.Check(Case(s_tube, 235, 0.302, nKN: 10)).Utilization("en-6.3.1-y") > 10 / 106.54);
    }

    [Fact]
    public void Class_4_open_sections_unknown_lengths_and_service_forces_are_not_checked()
    {
        var unknown = BucklingLengthRule.Find("strut", EndHold.Unknown, 3, null);
        var angle = new OpenProfile(OpenShape.L, Si.Mm(50), Si.Mm(50), Si.Mm(5), Si.Mm(5));

        Assert.Equal(ReasonCode.SlenderWall, Barred(Case(new Tube(Si.Mm(50), Si.Mm(1)), 235, 3, 1)));
        Assert.Equal(ReasonCode.StabilityNotChecked, Barred(Case(angle, 235, 3, 1)));
        Assert.Equal(ReasonCode.StabilityNotChecked, Barred(Case(s_tube, 235, 3, 1) with { LengthZ = unknown }));
        Assert.Equal(ReasonCode.KindWithoutLimit, Barred(Case(s_tube, 235, 3, 1) with { Kind = SituationKind.Service }));
        Assert.Equal(ReasonCode.KindUnknown, Barred(Case(s_tube, 235, 3, 1) with { Kind = SituationKind.Unknown }));
    }

    [Fact]
    public void Stainless_steel_takes_curve_d_and_bending_with_compression_is_not_evaluated()
    {
        var c = Case(s_tube, 220, 3, nKN: 5) with { Steel = SteelKind.Stainless, Modulus = Si.GPa(200) };

        var buckling = Assert.IsType<CheckResult.Evaluated>(MemberResistance.Check(c).Checks[0].Result);
        Assert.Equal(0.76, Value(buckling, "α"));
        Assert.Null(MemberResistance.Check(c).Barred);
        Assert.Equal(ReasonCode.StabilityNotChecked, Barred(c with { Actions = new MemberActions(5000, 100, 0, 100) }));
    }

    [Fact]
    public void Pure_tension_needs_no_check() => Assert.Empty(MemberResistance.Check(Case(s_tube, 235, 3)).Checks);

    private static ReasonCode Barred(MemberCase c) => MemberResistance.Check(c).Barred!.Why.Code;

    private static double Value(CheckResult.Evaluated result, string symbol) => result.Trace.Single(l => l.Symbol == symbol).Value;

    private static MemberCase Case(CrossSection section, double fyMPa, double length, double nKN = 0, double myKNm = 0, double mzKNm = 0) => new()
    {
        Section = section,
        Properties = SectionProperties.Of(section),
        Actions = new MemberActions(Si.KN(nKN), Si.KNm(myKNm), Si.KNm(mzKNm), Si.KNm(double.Hypot(myKNm, mzKNm))),
        Kind = SituationKind.Design,
        Yield = Si.MPa(fyMPa),
        LengthY = BucklingLengthRule.Find("strut", EndHold.BothEnds, length, null),
        LengthZ = BucklingLengthRule.Find("strut", EndHold.BothEnds, length, null),
    };
}
