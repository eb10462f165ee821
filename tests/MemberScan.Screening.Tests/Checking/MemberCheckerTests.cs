using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Tests.Checking;

/// <summary>OVERSTRESSED before NOT CHECKED before WITHIN LIMIT, and which shear model decides.</summary>
public sealed class MemberCheckerTests
{
    // CHS 48.3×3.2: A = 4.53 cm², Wel = 4.80 cm³ (EN 10219-2, printed); σ = M/W; S235 in service 235/1.67 = 140.7 MPa, so 0.1 kNm uses 0.148.
    private const double PerKNm = 1000 / 4.7974e-6 / (235e6 / 1.67);

    [Fact]
    public void One_load_case_over_its_limit_is_overstressed_although_nothing_combines_it()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), "# situations: load-cases\n" + Bending("LC1", 700));

        Assert.Equal((Verdict.Overstressed, (Reason?)null), (member.Verdict, member.Reason));
        Assert.Equal(0.7 * PerKNm, member.Governing!.Utilization, 1e-3);
        Assert.Contains(member.Notes, n => n.StartsWith("beside the verdict: only single load cases", StringComparison.Ordinal));
    }

    [Fact]
    public void Three_uncombined_load_cases_at_six_tenths_each_support_no_verdict()
    {
        var moment = 600 / PerKNm;

        var member = Landing.ScreenOne(Landing.OnePost(), "# situations: load-cases\n" + Bending("LC1", moment) + Rows(Bending("LC2", moment)) + Rows(Bending("LC3", moment)));

        Assert.Equal((Verdict.NotChecked, ReasonCode.NoCombination), (member.Verdict, member.Reason!.Code));
        Assert.Equal([0.6, 0.6, 0.6], member.Situations.Select(s => Math.Round(s.Utilization!.Value, 3)));
        Assert.All(member.Situations, s => Assert.False(s.ActsInFull));
    }

    [Fact]
    public void Stations_that_are_too_coarse_bar_a_verdict_within_the_limit_but_not_one_over_it()
    {
        string Coarse(double moment) => Landing.Table(("S1", "service", 0, new(0, 0, 0, 0, moment, 0)), ("S1", "service", 0.5, new(0, 0, 0, 0, 0, 0)));

        var within = Landing.ScreenOne(Landing.OnePost(), Coarse(500));
        var over = Landing.ScreenOne(Landing.OnePost(), Coarse(700));

        Assert.Equal((Verdict.NotChecked, ReasonCode.StationsTooCoarse), (within.Verdict, within.Reason!.Code));
        Assert.Equal(0.5 * PerKNm, within.Governing!.Utilization, 1e-3);
        Assert.Equal(Verdict.Overstressed, over.Verdict);
    }

    /// <summary>By stress on the yield strength 60 kN gives 60e3/453.4 = 132.3 MPa, 0.94 of 140.7 MPa; the Euler load of 3 m is far below 60 kN however it is held.</summary>
    [Theory]
    [InlineData(0.5)]
    [InlineData(1)]
    [InlineData(2)]
    public void A_compressed_tube_of_three_metres_is_never_within_its_limit_by_stress_alone(double lengthFactor)
    {
        var settings = string.Create(System.Globalization.CultureInfo.InvariantCulture, $$$"""{"stability": {"lengthFactor": {{{lengthFactor}}}}}""");

        var member = Landing.ScreenOne(Landing.OnePost(length: 3), Landing.Constant(new(-60e3, 0, 0, 0, 0, 0), 3), settings);

        Assert.Equal((Verdict.NotChecked, ReasonCode.StabilityNotChecked), (member.Verdict, member.Reason!.Code));
        Assert.Equal(60e3 / 4.5339e-4 / (235e6 / 1.67), member.Governing!.Utilization, 1e-4);
    }

    [Fact]
    public void The_worst_of_all_situations_decides_each_against_the_limit_of_its_kind()
    {
        // 0.6 kNm in service: 125.1/140.7 = 0.889. 1.0 kNm in design: 208.4/235 = 0.887.
        var table = Bending("SLS", 600) + Rows(Bending("ULS", 1000, "design"));

        var member = Landing.ScreenOne(Landing.OnePost(), table);

        Assert.Equal((Verdict.WithinLimit, "SLS", "service"), (member.Verdict, member.Governing!.Situation, member.Governing.Kind));
        Assert.Equal(0.6 * PerKNm, member.Governing.Utilization, 1e-3);
        var design = member.Situations.Single(s => s.Situation == "ULS");
        Assert.Equal(1000 / 4.7974e-6 / 235e6, design.Utilization!.Value, 1e-3);
    }

    [Fact]
    public void Values_of_different_situations_are_never_taken_together()
    {
        var apart = Landing.ScreenOne(Landing.OnePost(), Bending("A", 500) + Rows(Landing.Constant(new(40e3, 0, 0, 0, 0, 0), situation: "B")));
        var together = Landing.ScreenOne(Landing.OnePost(), Landing.Table(
            ("C", "service", 0, new(40e3, 0, 500, 0, -500, 0)), ("C", "service", 1, new(40e3, 0, 500, 0, 0, 0))));

        Assert.Equal(Verdict.WithinLimit, apart.Verdict);
        Assert.Equal(Verdict.Overstressed, together.Verdict);
        Assert.Equal(0.5 * PerKNm + 40e3 / 4.5339e-4 / (235e6 / 1.67), together.Governing!.Utilization, 1e-3);
    }

    /// <summary>
    /// With a depth of a quarter of the width the largest shear, in the middle of the short side, is 1.988 × 1.5 V/A
    /// (Timoshenko and Goodier, art. 124, ν = 1/4, from memory).
    /// </summary>
    [Fact]
    public void A_flat_bar_sheared_across_its_width_is_overstressed_by_the_elasticity_model_alone()
    {
        var section = new Rectangle(80e-3, 20e-3);
        // 1.5 V/A·√3 = 0.9·140.7 MPa by the elementary model; elasticity gives 1.988 × as much.
        var v = 0.9 * 235e6 / 1.67 * (80e-3 * 20e-3) / (1.5 * Math.Sqrt(3));
        var settings = """{"materials": {"grades": [{"name": "Own", "pattern": "own steel", "standard": "mill certificate", "yields": [{"yield": "235 MPa"}], "modulus": "210 GPa", "poisson": 0.25, "isSteel": true}]}}""";

        var member = Landing.ScreenOne(
            Landing.OnePost(section, 0.002, "Own steel"), Landing.Table(("S1", "service", 0, new(0, 0, v, 0, -v * 0.001, 0)), ("S1", "service", 0.002, new(0, 0, v, 0, v * 0.001, 0))), settings);

        Assert.Equal((Verdict.Overstressed, "elasticity"), (member.Verdict, member.Governing!.ShearModel));
        Assert.Equal(0.9 * 1.988, member.Governing.Utilization, 2e-3);
        Assert.Equal(0.9, member.Governing.OtherModelUtilization!.Value, 1e-3);
        Assert.Contains("over the limit by the elasticity model only, which decides", member.Notes);
        Assert.Contains(member.Notes, n => n.StartsWith("the shear models differ by 49.7 %", StringComparison.Ordinal));
    }

    [Fact]
    public void Shear_models_that_agree_are_not_talked_about()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), Bending("S1", 500));

        Assert.Equal("elementary", member.Governing!.ShearModel);
        Assert.DoesNotContain(member.Notes, n => n.Contains("shear models differ", StringComparison.Ordinal));
    }

    /// <summary>Under bending alone both models have the same normal stress, M/W, and no shear.</summary>
    [Fact]
    public void A_box_is_decided_by_the_elementary_model_with_the_elasticity_model_beside_it()
    {
        var member = Landing.ScreenOne(Landing.OnePost(new Box(50e-3, 50e-3, 4e-3, 8e-3, 4e-3)), Landing.Constant(new(0, 0, 0, 0, 500, 0)));

        Assert.Equal((Verdict.WithinLimit, "elementary"), (member.Verdict, member.Governing!.ShearModel));
        Assert.Equal(1, member.Governing.OtherModelUtilization!.Value / member.Governing.Utilization, 1e-6);
    }

    /// <summary>With corners that meet it is the round bar: τ = 16·T/(π·d³), σvM = √3·τ.</summary>
    [Fact]
    public void A_rounded_rectangle_whose_corners_make_a_circle_takes_torsion_as_the_round_bar_does()
    {
        var member = Landing.ScreenOne(Landing.OnePost(new RoundedRectangle(40e-3, 40e-3, 20e-3)), Landing.Constant(new(0, 0, 0, 50, 0, 0)));

        var expected = Math.Sqrt(3) * 16 * 50 / (Math.PI * Math.Pow(40e-3, 3));
        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(1, member.Governing!.Stress / expected, 1e-3);
    }

    [Fact]
    public void A_utilization_of_one_is_within_the_limit_and_a_millionth_more_is_not()
    {
        var n = 235e6 / 1.67 * Math.PI * (24.15e-3 * 24.15e-3 - 20.95e-3 * 20.95e-3);

        var at = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(n, 0, 0, 0, 0, 0)));
        var beyond = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(n * (1 + 1e-6), 0, 0, 0, 0, 0)));

        Assert.Equal((Verdict.WithinLimit, Verdict.Overstressed), (at.Verdict, beyond.Verdict));
    }

    [Fact]
    public void The_calculation_line_by_line_leads_from_the_forces_to_the_utilization()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(10e3, 0, 0, 0, 0, 0)));

        double Value(string symbol) => member.Governing!.Trace.First(l => l.Symbol == symbol).Value;
        Assert.Equal(4.5339e-4, Value("A"), 1e-8);
        Assert.Equal(10e3, Value("N"));
        Assert.Equal(10e3 / 4.5339e-4, Value("N/A"), 1e3);
        Assert.Equal(member.Governing!.Utilization, member.Governing.Trace[^1].Value, 1e-12);
        Assert.All(member.Governing.Trace, l => Assert.True(l.Unit.Length > 0 && l.Source.Length > 0, l.Symbol));
    }

    private static string Bending(string situation, double moment, string kind = "service") =>
        Landing.Table((situation, kind, 0, new(0, 0, moment, 0, -moment, 0)), (situation, kind, 1, new(0, 0, moment, 0, 0, 0)));

    private static string Rows(string table) => table[(table.IndexOf('\n', StringComparison.Ordinal) + 1)..];
}
