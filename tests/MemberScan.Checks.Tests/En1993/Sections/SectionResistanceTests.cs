using MemberScan.Checks.En1993.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.En1993.Sections;

public sealed class SectionResistanceTests
{
    // Hand calculations with the tabulated section values; RHS 200x100x8 and CHS 114.3x5 of S355.
    [Fact]
    public void Axial_resistance_of_the_box_is_1589_kN_in_tension_and_compression()
    {
        // 44.75 cm²·355 MPa = 1588.7 kN.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, nKN: 1588.7)).Utilization("en-6.2.3"), 3);
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, nKN: -1588.7)).Utilization("en-6.2.4"), 3);
    }

    [Fact]
    public void Bending_resistance_of_the_box_is_100_1_and_61_0_kNm()
    {
        // 281.95 cm³·355 = 100.09 kNm; 171.78 cm³·355 = 60.98 kNm.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, myKNm: 100.09)).Utilization("en-6.2.5-y"), 3);
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, mzKNm: -60.98)).Utilization("en-6.2.5-z"), 3);
    }

    [Fact]
    public void Class_3_has_its_elastic_moment()
    {
        // Tube of d/t = 80: Wel of 160x2 mm, π(160⁴ − 156⁴)/(32·160) = 38.73 cm³; ·235 = 9.101 kNm, by hand.
        var set = SectionResistance.Check(Cases.Of(new Tube(Si.Mm(80), Si.Mm(2)), 235, myKNm: 9.101));

        Assert.Equal(1.000, set.Utilization("en-6.2.5-y"), 3);
        Assert.Equal(1.000, set.Utilization("en-6.2.9"), 3);
    }

    [Fact]
    public void Shear_resistances_by_kind_are_those_of_a_hand_calculation()
    {
        // Box along z: A_v = 44.75·200/300 = 29.84 cm², ·355/√3 = 611.5 kN; along y half of it.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, vzKN: 611.5)).Utilization("en-6.2.6-z"), 3);
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, vyKN: 305.8)).Utilization("en-6.2.6-y"), 3);
        // Tube: 2·17.169/π = 10.930 cm², ·355/√3 = 224.0 kN, the resultant of 134.4 and 179.2.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Chs114x5, 355, vyKN: 134.4, vzKN: 179.2)).Utilization("en-6.2.6-z"), 3);
        // Flat bar: 1.5·V/1200 mm² = 355/√3: V = 163.97 kN.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Flat20x60, 355, vzKN: 163.97)).Utilization("en-6.2.6-z"), 3);
        // Round 20: 4/3·V/314.16 mm² = 235/√3: V = 31.97 kN.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(new Round(0.01), 235, vyKN: 31.97)).Utilization("en-6.2.6-z"), 3);
    }

    [Fact]
    public void Torsion_alone_and_with_shear()
    {
        // Tube: Wt 89.911 cm³·355/√3 = 18.428 kNm. Half of it leaves half the shear resistance: V = 112.0 kN.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Chs114x5, 355, tKNm: -18.428)).Utilization("en-6.2.7"), 3);

        var set = SectionResistance.Check(Cases.Of(Cases.Chs114x5, 355, vzKN: 56.0, tKNm: 9.214));
        Assert.Equal(0.5, set.Checks.Single(c => c.Key == "en-6.2.7-v").Result is CheckResult.Evaluated e ? e.Trace.Single(l => l.Symbol == "left side").Value : 0, 3);
        // Linear in the load: shear 0.25 and torsion 0.5 meet 1 at 4/3 of the load.
        Assert.Equal(0.75, set.Utilization("en-6.2.7-v"), 3);
    }

    [Fact]
    public void Axial_force_lowers_the_moment_of_a_solid_rectangle_by_its_square()
    {
        // (6.32), n = 0.5: 0.75 of 18 cm³·355 MPa = 4.7925 kNm; by hand.
        var set = SectionResistance.Check(Cases.Of(Cases.Flat20x60, 355, nKN: 213, myKNm: 4.7925));

        Assert.Equal(1.000, set.Utilization("en-6.2.9"), 3);
    }

    [Fact]
    public void Axial_force_lowers_the_moment_of_a_box_by_6_39_and_6_40()
    {
        // a_w = (44.75 − 2·10·0.8)/44.75 = 0.6425 → 0.5; n = 0.5: 0.5/0.75 = 0.6667 of 100.09 = 66.73 kNm.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, nKN: 794.35, myKNm: 66.73)).Utilization("en-6.2.9"), 3);
        // a_f = (44.75 − 2·20·0.8)/44.75 = 0.2850; 0.5/0.8575 = 0.5831 of 60.98 = 35.56 kNm.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, nKN: 794.35, mzKNm: 35.56)).Utilization("en-6.2.9"), 3);
        // Up to n = 0.25 nothing is lost about y.
        Assert.Equal(1.000, SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, nKN: 390, myKNm: 100.09)).Utilization("en-6.2.9"), 3);
    }

    [Fact]
    public void Biaxial_bending_of_a_box_has_the_exponent_1_66_without_axial_force()
    {
        // 0.5^1.66 + m^1.66 = 1, by hand: 0.5^1.66 = 0.3164, m = 0.6836^(1/1.66) = 0.7952.
        var set = SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, myKNm: 0.5 * 100.09, mzKNm: 0.7952 * 60.98));

        Assert.Equal(1.000, set.Utilization("en-6.2.9"), 3);
        Assert.Equal(1.66, CombinedResistance.BoxExponent(0), 12);
        Assert.Equal(6, CombinedResistance.BoxExponent(0.9), 12);
        Assert.Equal(6, CombinedResistance.BoxExponent(0.99), 12);
        Assert.Equal(1.66 / (1 - 1.13 * 0.25), CombinedResistance.BoxExponent(0.5), 12);
    }

    [Fact]
    public void The_ring_and_the_bar_stay_below_their_exact_plastic_interactions()
    {
        // Round bar, exact: compressed and tensed caps beside a middle part of half angle φ: m = sin³φ, n = 1 − 2(φ − sin φ·cos φ)/π. Thin ring, exact: cos(πn/2).
        for (var phi = 0.05; phi < Math.PI / 2; phi += 0.05)
        {
            var n = 1 - 2 * (phi - Math.Sin(phi) * Math.Cos(phi)) / Math.PI;
            var exact = Math.Pow(Math.Sin(phi), 3);

            Assert.InRange(CombinedResistance.RectangleShare(n), 0, exact + 1e-12);
            Assert.InRange(CombinedResistance.RingShare(n), 0, exact + 1e-12);
        }
    }

    [Theory]
    [InlineData(0.5, 0)]
    [InlineData(0.6, 0.04)]
    [InlineData(1.0, 1)]
    [InlineData(1.4, 1)]
    public void Shear_beyond_one_half_lowers_the_strength(double used, double rho) => Assert.Equal(rho, CombinedResistance.Rho(used), 12);

    [Fact]
    public void Shear_of_0_75_of_the_resistance_leaves_three_quarters_of_the_moment()
    {
        // ρ = (2·0.75 − 1)² = 0.25; M = 0.75·100.09 = 75.07 kNm with V = 0.75·611.5 kN.
        var set = SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, vzKN: 0.75 * 611.5, myKNm: 75.07));

        Assert.Equal(1.000, set.Utilization("en-6.2.9"), 3);
    }

    [Fact]
    public void Utilizations_are_linear_in_the_load()
    {
        var c = Cases.Of(Cases.Rhs200x100x8, 355, nKN: -300, vyKN: 100, vzKN: 200, tKNm: 10, myKNm: 30, mzKNm: 15);
        var half = c with { Forces = 0.5 * c.Forces };

        foreach (var (full, part) in SectionResistance.Check(c).Checks.Zip(SectionResistance.Check(half).Checks))
            Assert.Equal(full.Utilization!.Value, 2 * part.Utilization!.Value, 9);
    }

    [Fact]
    public void Class_4_slender_webs_open_sections_and_service_forces_are_not_checked()
    {
        var slender = new Box(Si.Mm(200), Si.Mm(60), Si.Mm(3));
        var deepWeb = new Box(Si.Mm(60), Si.Mm(250), Si.Mm(3));
        var angle = new OpenProfile(OpenShape.L, Si.Mm(50), Si.Mm(50), Si.Mm(5), Si.Mm(5));

        Assert.Equal(ReasonCode.SlenderWall, SectionResistance.Check(Cases.Of(slender, 235, nKN: -1)).Barred!.Why.Code);
        Assert.Equal(ReasonCode.SlenderWall, SectionResistance.Check(Cases.Of(deepWeb, 235, vzKN: 1)).Barred!.Why.Code);
        Assert.Null(SectionResistance.Check(Cases.Of(deepWeb, 235, vyKN: 1)).Barred);
        Assert.Equal(ReasonCode.CheckNotEvaluated, SectionResistance.Check(Cases.Of(angle, 235, nKN: 1)).Barred!.Why.Code);
        Assert.Equal(ReasonCode.KindWithoutLimit, SectionResistance.Check(Cases.Of(Cases.Chs114x5, 235, nKN: 1) with { Kind = SituationKind.Service }).Barred!.Why.Code);
    }

    [Fact]
    public void The_partial_factor_divides_every_resistance()
    {
        var c = Cases.Of(Cases.Rhs200x100x8, 355, nKN: -300, vyKN: 100, vzKN: 200, tKNm: 10, myKNm: 30, mzKNm: 15);

        foreach (var (plain, divided) in SectionResistance.Check(c).Checks.Zip(SectionResistance.Check(c with { GammaM0 = 1.1 }).Checks))
            Assert.Equal(1.1 * plain.Utilization!.Value, divided.Utilization!.Value, 9);
    }

    [Fact]
    public void Every_line_names_unit_and_source_and_every_clause_its_memory()
    {
        var set = SectionResistance.Check(Cases.Of(Cases.Rhs200x100x8, 355, nKN: -300, vyKN: 100, vzKN: 200, tKNm: 10, myKNm: 30, mzKNm: 15));

        Assert.Equal(["en-6.2.4", "en-6.2.5-y", "en-6.2.5-z", "en-6.2.6-y", "en-6.2.6-z", "en-6.2.7", "en-6.2.7-v", "en-6.2.9"], set.Checks.Select(c => c.Key));
        foreach (var result in set.Checks.Select(c => Assert.IsType<CheckResult.Evaluated>(c.Result)))
        {
            Assert.True(result.Clause.FromMemory);
            Assert.All(result.Trace, line => Assert.True(line.Unit.Length > 0 && line.Source.Length > 0));
            Assert.Equal(result.Utilization, result.Trace[^1].Value);
        }
    }

    [Fact]
    public void Nothing_acting_gives_no_check() => Assert.Empty(SectionResistance.Check(Cases.Of(Cases.Chs114x5, 235)).Checks);
}
