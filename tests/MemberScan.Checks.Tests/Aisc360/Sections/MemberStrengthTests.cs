using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Sections;
using MemberScan.Checks.Stability;
using MemberScan.Checks.Tests.En1993.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Aisc360.Sections;

public sealed class MemberStrengthTests
{
    // HSS4x4x1/4 with the design wall of the tables, 0.233 in: A 3.37 in², Z 4.69 in³, r 1.52 in (AISC Manual, from memory); F_y = 50 ksi.
    private static readonly Box s_box = new(Si.In(4), Si.In(4), Si.In(0.233), Si.In(0.466), Si.In(0.233));
    private static readonly Tube s_pipe = new(Si.In(0.95), Si.In(0.93 * 0.145));
    private static readonly Rectangle s_flat = new(Si.In(0.5), Si.In(4));

    [Theory]
    [InlineData(DesignMethod.Asd, SituationKind.Service, 200)]
    [InlineData(DesignMethod.Lrfd, SituationKind.Design, 320)]
    public void The_pipe_post_is_at_its_plastic_ratio_by_f8(DesignMethod method, SituationKind kind, double pounds)
    {
        // M = 42 in · force; Z = 0.4211 in³ of the design wall; 35 ksi: 0.952 by ASD, 1.014 by LRFD.
        var set = MemberStrength.Check(Case(s_pipe, 35, method, kind, new(0, 0, Si.Lbf(pounds), 0, Si.LbfIn(42 * pounds), 0)));

        Assert.Equal(method == DesignMethod.Asd ? 0.952 : 1.014, set.Utilization("aisc-f-y"), 3);
        Assert.Equal(["aisc-f-y", "aisc-g-z", "aisc-h1"], set.Checks.Select(c => c.Key));
        Assert.Contains(set.Notes, n => n == "wall basis of the test");
    }

    [Fact]
    public void Tension_and_compression_of_a_square_section()
    {
        // D2: 0.9·50·3.371 = 151.7 kip. E3 at 12 ft: r = 1.521, L/r = 94.7, F_e = 31.93 ksi, F_n = 25.97, 0.9·25.97·3.371 = 78.8 kip; by hand.
        Assert.Equal(1.000, Lrfd(s_box, 50, new(Kips(151.7), 0, 0, 0, 0, 0)).Utilization("aisc-d2"), 3);
        Assert.Equal(1.000, MemberStrength.Check(Case(s_box, 50, DesignMethod.Lrfd, SituationKind.Design, new(-Kips(78.8), 0, 0, 0, 0, 0)) with
        {
            LengthY = Held(Si.In(144)),
            LengthZ = Held(Si.In(144)),
        }).Utilization("aisc-e3"), 2);
    }

    [Fact]
    public void Axial_force_and_biaxial_bending_follow_both_branches_of_h1()
    {
        // H1-1a: 0.5 + 8/9·0.5 = 0.9444; H1-1b: 0.1/2 + 0.8 = 0.85; both meet at 0.2 only where the sum is 1.
        Assert.Equal(0.5 + 8.0 / 9 * 0.5, CombinedStrength.AxialAndBending(0.5, 0.5), 12);
        Assert.Equal(0.85, CombinedStrength.AxialAndBending(0.1, 0.8), 12);
        Assert.Equal(0.2 + 8.0 / 9 * 0.9, CombinedStrength.AxialAndBending(0.2, 0.9), 12);
        Assert.Equal(1.0, CombinedStrength.AxialAndBending(0.2, 0.9), 12);
        Assert.Equal(0.1999 / 2 + 0.9, CombinedStrength.AxialAndBending(0.1999, 0.9), 12);

        var (p, m) = (0.4 * 151.70, 0.3 * 0.9 * 50 * 4.6923);
        var set = Lrfd(s_box, 50, new(Kips(p), 0, 0, 0, Kips(m) * Si.Inch, Kips(m) * Si.Inch));
        Assert.Equal(0.4 + 8.0 / 9 * 0.6, set.Utilization("aisc-h1"), 3);
    }

    [Fact]
    public void Torsion_up_to_one_fifth_is_left_out_and_beyond_counts_with_shear()
    {
        Assert.Equal(0.5, CombinedStrength.WithTorsion(0, 0.5, 0.3, 0.2), 12);
        Assert.Equal(0.5 + 0.51 * 0.51, CombinedStrength.WithTorsion(0, 0.5, 0.3, 0.21), 12);

        // T_c = 0.9·0.6·50·6.564 = 177.2 kip·in; M_c = 0.9·50·4.692 = 211.2 kip·in: 0.5 + 0.5² = 0.75, root (0.5 + √(0.25 + 1))/2 = 0.809; by hand.
        var set = Lrfd(s_box, 50, new(0, 0, 0, Kips(0.5 * 177.2) * Si.Inch, Kips(0.5 * 211.2) * Si.Inch, 0));
        var result = Assert.IsType<CheckResult.Evaluated>(set.Checks.Single(c => c.Key == "aisc-h1").Result);
        Assert.Equal(0.75, result.Trace.Single(l => l.Symbol == "left side").Value, 3);
        Assert.Equal(0.809, result.Utilization, 3);
        Assert.Equal("H3.2", result.Clause.Section);
    }

    [Fact]
    public void Utilizations_are_linear_in_the_load_but_for_the_share_of_torsion()
    {
        var c = Case(s_box, 50, DesignMethod.Asd, SituationKind.Service, new(Kips(20), Kips(3), Kips(5), Kips(60) * Si.Inch, Kips(40) * Si.Inch, Kips(20) * Si.Inch));

        foreach (var (full, part) in MemberStrength.Check(c).Checks.Zip(MemberStrength.Check(c with { Forces = 0.25 * c.Forces }).Checks))
            Assert.Equal(full.Utilization!.Value, 4 * part.Utilization!.Value, 9);
    }

    [Fact]
    public void A_flat_bar_on_edge_buckles_sideways_and_flatwise_does_not()
    {
        // F11 of 1/2 x 4 in, 36 ksi, L_b = 48 in: 60.42 kip·in; flatwise Z = 0.25 in³: 9.0 kip·in; by hand.
        var edge = MemberStrength.Check(Case(s_flat, 36, DesignMethod.Lrfd, SituationKind.Design, new(0, 0, 0, 0, Kips(0.9 * 60.42) * Si.Inch, 0)));
        var flat = MemberStrength.Check(Case(s_flat, 36, DesignMethod.Lrfd, SituationKind.Design, new(0, 0, 0, 0, 0, Kips(0.9 * 9.0) * Si.Inch)));

        Assert.Equal(1.000, edge.Utilization("aisc-f-y"), 3);
        Assert.Equal(1.000, flat.Utilization("aisc-f-z"), 3);
    }

    [Fact]
    public void Slender_walls_open_sections_unknown_lengths_and_the_wrong_kind_are_not_checked()
    {
        var slender = new Tube(Si.In(5), Si.In(0.05));
        var angle = new OpenProfile(OpenShape.L, Si.In(2), Si.In(2), Si.In(0.25), Si.In(0.25));
        var compressed = new SectionForces(-1000, 0, 0, 0, 0, 0);
        var unknown = BucklingLengthRule.Find("strut", EndHold.Unknown, 3, null);

        Assert.Equal(ReasonCode.SlenderWall, Lrfd(slender, 50, compressed).Barred!.Why.Code);
        Assert.Null(Lrfd(slender, 50, new(1000, 0, 0, 0, 0, 0)).Barred);
        Assert.Equal(ReasonCode.CheckNotEvaluated, Lrfd(angle, 50, compressed).Barred!.Why.Code);
        Assert.Equal(ReasonCode.KindWithoutLimit, MemberStrength.Check(Case(s_box, 50, DesignMethod.Asd, SituationKind.Design, compressed)).Barred!.Why.Code);

        var c = Case(s_box, 50, DesignMethod.Lrfd, SituationKind.Design, compressed) with { LengthZ = unknown };
        Assert.Equal(ReasonCode.StabilityNotChecked, MemberStrength.Check(c).Barred!.Why.Code);
        Assert.Null(MemberStrength.Check(c with { Forces = new(1000, 0, 0, 0, 0, 0) }).Barred);
    }

    [Fact]
    public void A_round_section_is_slender_in_compression_beyond_0_11_of_e_over_fy()
    {
        // F_y = 35 ksi: 0.11·29000/35 = 91.14.
        Assert.NotNull(Lrfd(new Tube(Si.In(91.1 / 20), Si.In(0.1)), 35, new(-1, 0, 0, 0, 0, 0)).Worst);
        Assert.Equal(ReasonCode.SlenderWall, Lrfd(new Tube(Si.In(91.2 / 20), Si.In(0.1)), 35, new(-1, 0, 0, 0, 0, 0)).Barred!.Why.Code);
    }

    [Fact]
    public void A_strength_that_is_missing_bars_the_interaction()
    {
        var set = Lrfd(new Tube(Si.In(20), Si.In(0.1)), 50, new(1000, 0, 0, 0, 100, 0));

        Assert.Equal(ReasonCode.SlenderWall, set.Barred!.Why.Code);
        Assert.IsType<CheckResult.NotEvaluated>(set.Checks.Single(c => c.Key == "aisc-h1").Result);
    }

    [Fact]
    public void Every_line_names_unit_and_source_and_every_clause_its_memory()
    {
        var set = Lrfd(s_box, 50, new(-Kips(20), Kips(3), Kips(5), Kips(60) * Si.Inch, Kips(40) * Si.Inch, Kips(20) * Si.Inch));

        Assert.Equal(["aisc-e3", "aisc-f-y", "aisc-f-z", "aisc-g-y", "aisc-g-z", "aisc-h3.1", "aisc-h1"], set.Checks.Select(c => c.Key));
        foreach (var result in set.Checks.Select(c => Assert.IsType<CheckResult.Evaluated>(c.Result)))
        {
            Assert.True(result.Clause.FromMemory);
            Assert.All(result.Trace, line => Assert.True(line.Unit.Length > 0 && line.Source.Length > 0));
            Assert.Equal(result.Utilization, result.Trace[^1].Value);
        }
    }

    private static CheckSet Lrfd(CrossSection section, double fyKsi, SectionForces forces) =>
        MemberStrength.Check(Case(section, fyKsi, DesignMethod.Lrfd, SituationKind.Design, forces));

    private static AiscCase Case(CrossSection section, double fyKsi, DesignMethod method, SituationKind kind, SectionForces forces) => new()
    {
        Section = section,
        Properties = SectionProperties.Of(section),
        WallBasis = "wall basis of the test",
        Forces = forces,
        Kind = kind,
        Method = method,
        Yield = Si.Ksi(fyKsi),
        LengthY = Held(Si.In(48)),
        LengthZ = Held(Si.In(48)),
        Length = Si.In(48),
    };

    private static Finding<BucklingLength> Held(double length) => BucklingLengthRule.Find("strut", EndHold.BothEnds, length, null);

    private static double Kips(double kips) => kips * Si.Kip;
}
