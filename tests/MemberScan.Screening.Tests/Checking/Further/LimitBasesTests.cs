using System.Text;
using MemberScan.Foundation.Units;
using MemberScan.Inputs;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;
using MemberScan.Screening.Record.Lines;

namespace MemberScan.Screening.Tests.Checking.Further;

/// <summary>The ready bases on small models, each figure worked out by hand from the formulas named.</summary>
public sealed class LimitBasesTests
{
    private static readonly string s_asd = Basis(ShippedFiles.AiscAsd);
    private static readonly string s_lrfd = Basis(ShippedFiles.AiscLrfd);
    private static readonly string s_allowable = Basis(ShippedFiles.AllowableStressBasis);
    private static readonly string s_en = Basis(ShippedFiles.En1993Basis);

    /// <summary>
    /// Pipe 1.900 × 0.145 in of A53 Gr. B (35 ksi), 200 lbf at 42 in: S = π(D⁴ − d⁴)/(32D) = 0.3262 in³, σ = 8400/0.3262 = 25.75 ksi;
    /// 25.75/(35/1.67) = 1.229; Z = (D³ − d³)/6 = 0.4480 in³, 18.75/20.96 = 0.895. With 0.93·0.145: S = 0.3083, Z = 0.4209: 1.300 and 0.952.
    /// </summary>
    [Theory]
    [InlineData("allowable", "service", 200, 1.229, "plastic", 0.895)]
    [InlineData("asd", "service", 200, 1.300, "aisc-f-y", 0.952)]
    [InlineData("lrfd", "design", 320, 1.384, "aisc-f-y", 1.014)]
    public void The_pipe_post_has_its_elastic_and_its_plastic_figure_on_the_wall_of_its_basis(string basis, string kind, double pounds, double elastic, string key, double plastic)
    {
        var member = Post(pounds, kind, basis switch { "allowable" => s_allowable, "asd" => s_asd, _ => s_lrfd });

        Assert.Equal(Verdict.Overstressed, member.Verdict);
        Assert.Equal(elastic, member.Governing!.Utilization, 6e-4);
        Assert.Equal(plastic, Line(member, key).Utilization!.Value, 6e-4);
        if (basis != "allowable") Assert.Contains(member.Notes, note => note.StartsWith("design wall 0.93·3.683 mm", StringComparison.Ordinal));
    }

    [Fact]
    public void A_design_force_is_not_held_against_the_allowable_stress()
    {
        var member = Post(320, "design", s_allowable);

        Assert.Equal((Verdict.NotChecked, ReasonCode.KindWithoutLimit), (member.Verdict, member.Reason!.Code));
        Assert.Null(member.Governing);
    }

    /// <summary>48.3 × 3.2 mm, 3 m, N = −60 kN, S235, buckling length twice the length: Ncr = π²·210 GPa·11.586 cm⁴/6² = 6.67 kN; with the length itself 26.7 kN.</summary>
    [Theory]
    [InlineData(null)]
    [InlineData("""{"stability": {"factorByRole": {"post": 1.0}}}""")]
    [InlineData("""{"stability": {"factorByRole": {"post": 1.0}}, "checks": {"off": ["en-6.3.1-y", "en-6.3.1-z"]}}""")]
    public void A_slender_tube_in_compression_is_never_within_its_limit(string? settings)
    {
        var member = Landing.ScreenOne(Landing.OnePost(length: 3), Landing.Constant(new SectionForces(-60e3, 0, 0, 0, 0, 0), length: 3, kind: "design"), settings);

        Assert.NotEqual(Verdict.WithinLimit, member.Verdict);
        // A = π(24.15² − 20.95²) = 453.4 mm²: 60/(453.4·0.235) = 0.563 by stress alone in design, × 1.67 = 0.940 in service.
        Assert.Equal(0.563, Line(member, "stress").Utilization!.Value, 1e-3);
        if (settings is null || settings.Contains("off", StringComparison.Ordinal)) return;

        // λ̄ = √(106.55/26.68) = 1.9984, curve c: φ = 0.5(1 + 0.49·1.7984 + 3.9936) = 2.9374, χ = 1/(φ + √(φ² − λ̄²)) = 0.1965: 60/20.93 = 2.866.
        Assert.Equal(2.866, member.Governing!.Utilization, 5e-3);
        Assert.StartsWith("en-6.3.1", member.Governing.Check, StringComparison.Ordinal);
        Assert.Equal(Verdict.Overstressed, member.Verdict);
    }

    [Fact]
    public void In_service_the_slender_tube_is_not_checked_since_no_clause_of_stability_goes_with_the_limit()
    {
        var member = Landing.ScreenOne(Landing.OnePost(length: 3), Landing.Constant(new SectionForces(-60e3, 0, 0, 0, 0, 0), length: 3));

        Assert.Equal((Verdict.NotChecked, ReasonCode.StabilityNotChecked), (member.Verdict, member.Reason!.Code));
        Assert.Equal(0.940, member.Governing!.Utilization, 1e-3);
    }

    [Fact]
    public void Three_load_cases_and_no_combination_of_them_are_not_checked()
    {
        // 0.6 of the limit in each: N = 0.6·(235/1.67)·453.4 mm² = 38.28 kN.
        var rows = new[] { "G", "Q", "W" }.SelectMany(name => new[] { 0.0, 1.0 }.Select(x => (name, "service", x, new SectionForces(38.28e3, 0, 0, 0, 0, 0)))).ToArray();

        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Table("# situations: load-cases\n", Landing.Post, rows));

        Assert.Equal((Verdict.NotChecked, ReasonCode.NoCombination), (member.Verdict, member.Reason!.Code));
        Assert.Equal(0.6, member.Governing!.Utilization, 1e-3);
    }

    [Fact]
    public void Stress_of_a_bar_in_the_AISC_basis_is_split_into_normal_and_shear()
    {
        // d = 16 mm, σ = 0.8·235 = 188 MPa by N, τ = 0.4·235 = 94 MPa by T: max(0.8, 0.4/0.6)/0.9 = 0.889; von Mises would be 1.058/0.9.
        var (area, wt) = (Math.PI * 64e-6, Math.PI * 512e-9 / 2);
        var member = Landing.ScreenOne(Landing.OnePost(new Round(8e-3)), Landing.Constant(new SectionForces(188e6 * area, 0, 0, 94e6 * wt, 0, 0), kind: "design"), s_lrfd);

        Assert.Equal(0.889, Line(member, "stress").Utilization!.Value, 1e-3);
        Assert.Contains("H3.3", Line(member, "stress").Name, StringComparison.Ordinal);
    }

    [Fact]
    public void An_open_section_is_not_evaluated_in_the_AISC_basis_and_says_why()
    {
        var text = Encoding.ASCII.GetString(Landing.OnePost()).Replace("IFCCIRCLEHOLLOWPROFILEDEF(.AREA.,$,$,24.15,3.2)", "IFCISHAPEPROFILEDEF(.AREA.,$,$,100.,200.,5.6,8.5,12.,$,$)", StringComparison.Ordinal);
        var member = Landing.ScreenOne(Encoding.ASCII.GetBytes(text), Landing.Constant(new SectionForces(5e3, 0, 0, 0, 0, 0)), s_asd);

        Assert.Equal((Verdict.NotChecked, ReasonCode.CheckNotEvaluated), (member.Verdict, member.Reason!.Code));
        Assert.Contains(member.Checks, c => c is { Key: "aisc-h3.3c", Decides: true, Utilization: null, Reason: not null });
        Assert.Contains("bars, tubes and boxes", Line(member, "aisc").Reason!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_check_that_is_switched_off_is_not_made()
    {
        string Table() => Landing.Constant(new SectionForces(40e3, 0, 0, 0, 100, 0), kind: "design");

        Assert.Contains(Landing.ScreenOne(Landing.OnePost(), Table(), s_en).Checks, c => c.Key == "en-6.2.3");
        var off = s_en.TrimEnd().TrimEnd('}') + """, "checks": {"off": ["en-6.2.3"]}}""";
        Assert.DoesNotContain(Landing.ScreenOne(Landing.OnePost(), Table(), off).Checks, c => c.Key == "en-6.2.3");
    }

    [Theory]
    [InlineData("""{"rules": [{"when": {"role": "member", "storey": "*"}, "set": {"basis": {"service": {"omega": 2.0}}}}]}""", 1.67)]
    [InlineData("""{"rules": [{"when": {"name": "P-*"}, "set": {"basis": {"service": {"omega": 2.0}}}}]}""", 2.0)]
    [InlineData("""{"rules": [{"when": {"name": "Q-*"}, "set": {"basis": {"service": {"omega": 2.0}}}}, {"when": {"class": "IfcMember"}, "set": {"basis": {"service": {"omega": 1.8}}}}]}""", 1.8)]
    public void A_rule_sets_the_limits_of_the_members_that_it_fits(string settings, double omega)
    {
        // N = 30 kN on 453.4 mm²: 66.17 MPa.
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new SectionForces(30e3, 0, 0, 0, 0, 0)), settings);

        Assert.Equal(30e3 / 453.4e-6 / (235e6 / omega), member.Governing!.Utilization, 1e-3);
    }

    private static MemberResult Post(double pounds, string kind, string settings)
    {
        var (force, length) = (pounds * Si.PoundForce, Si.In(42));
        var table = Landing.Table(
            ("S1", kind, 0, new SectionForces(0, 0, force, 0, -force * length, 0)),
            ("S1", kind, length, new SectionForces(0, 0, force, 0, 0, 0)));
        return Landing.ScreenOne(Landing.OnePost(new Tube(Si.In(0.95), Si.In(0.145)), length, "A53 Gr. B"), table, settings);
    }

    private static CheckLine Line(MemberResult member, string key) => member.Checks.First(c => c.Key == key);

    private static string Basis(string name) => Encoding.UTF8.GetString(ShippedFiles.Read(name).Span);
}
