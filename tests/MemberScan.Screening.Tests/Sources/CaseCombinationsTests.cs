using MemberScan.Foundation.Diagnostics;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Tests.Sources;

/// <summary>Load cases of a table and combinations of the settings over them. Post 48.3 × 3.2 mm, A = 4.5339 cm² (EN 10219-2), S235.</summary>
public sealed class CaseCombinationsTests
{
    private const string Cases = "# situations: load-cases\n# results: linear\n";
    private const double Area = 4.5339e-4;

    private static readonly string s_table = Landing.Table(Cases, Landing.Post,
        ("G", "", 0, N(20e3)), ("G", "", 1, N(20e3)), ("Q", "", 0, N(30e3)), ("Q", "", 1, N(30e3)), ("W", "", 0, N(-2e3)), ("W", "", 1, N(-2e3)));

    [Fact]
    public void A_combination_of_the_settings_is_checked_with_its_factors_printed()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), s_table, """{"forces": {"combinations": [{"name": "ULS 1", "kind": "design", "factors": {"G": 1.35, "Q": 1.5}}]}}""");

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        var combined = member.Situations.Single(s => s.Situation == "ULS 1");
        Assert.Equal((1.35 * 20e3 + 1.5 * 30e3) / Area / 235e6, combined.Utilization!.Value, 1e-4);
        Assert.Equal("1.35 × 'G' + 1.5 × 'Q' (settings)", combined.Conversion);
        Assert.True(combined.ActsInFull);
        Assert.Contains("forces-1.csv, lines 4-5", combined.ForcesSource, StringComparison.Ordinal);
    }

    [Fact]
    public void A_set_is_generated_from_tagged_cases()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), s_table, """
            {"forces": {"combinationSets": ["en1990-6.10"], "caseTags": [{"pattern": "G*", "tag": "permanent"}, {"pattern": "Q", "tag": "live"}, {"pattern": "W", "tag": "wind"}]}}
            """);

        // Ten sums over G, Q, W; wind helps here, so it is left out of the governing one: 1.35·20 + 1.5·30 = 72 kN.
        Assert.Equal(13, member.Situations.Length);
        Assert.Equal("EN 1990:2002 6.10: 1.35 G + 1.5 Q", member.Governing!.Situation);
        Assert.Equal(72e3 / Area / 235e6, member.Governing.Utilization, 1e-4);
        Assert.Contains("from memory", member.Situations[0].Conversion, StringComparison.Ordinal);
    }

    [Fact]
    public void Without_a_combination_single_cases_are_not_checked()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), s_table);

        Assert.Equal((Verdict.NotChecked, ReasonCode.NoCombination), (member.Verdict, member.Reason!.Code));
    }

    [Fact]
    public void Cases_of_a_table_that_does_not_call_them_linear_are_not_superposed()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), s_table.Replace("# results: linear\n", "", StringComparison.Ordinal),
            """{"forces": {"combinations": [{"name": "ULS 1", "kind": "design", "factors": {"G": 1.35}}]}}""");

        Assert.Equal((Verdict.NotChecked, ReasonCode.NoCombination), (member.Verdict, member.Reason!.Code));
        Assert.Contains("nothing says that the results of 'G' are linear", member.Reason.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_case_that_the_member_lacks_leaves_it_unchecked()
    {
        var writer = Landing.Writer();
        Landing.Add(writer, Landing.Shape(writer, Landing.PostTube, 1));
        Landing.Add(writer, Landing.Shape(writer, Landing.PostTube, 1), tag: "P-2");
        var table = s_table + "P-2,G,,0,1,0,0,0,0,0\nP-2,G,,1,1,0,0,0,0,0\n";

        var members = Landing.Screen(writer.Build(), table, """{"forces": {"combinations": [{"name": "ULS 1", "kind": "design", "factors": {"G": 1.35, "Q": 1.5}}]}}""").Members;

        Assert.Equal([Verdict.WithinLimit, Verdict.NotChecked], members.Select(m => m.Verdict));
        Assert.Equal(ReasonCode.ForcesIncomplete, members[1].Reason!.Code);
    }

    [Theory]
    [InlineData("""{"forces": {"combinations": [{"name": "ULS 1", "kind": "design", "factors": {"G": 1.35, "S": 1.5}}]}}""", "SCR-0009", "'S', which no source has; there are 'G', 'Q', 'W'")]
    [InlineData("""{"forces": {"combinationSets": ["en1990-6.10"], "caseTags": [{"pattern": "G", "tag": "permanent"}, {"pattern": "Q", "tag": "live"}]}}""", "SCR-0010", "'W' of forces table fits no pattern")]
    public void Settings_that_do_not_fit_the_cases_are_refused(string settings, string code, string words)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(Landing.Run(Landing.OnePost(), diagnostics, settings, tables: [s_table]));
        Assert.Contains(diagnostics.Items, d => d.Code == code && d.Severity == Severity.Error && d.Message.Contains(words, StringComparison.Ordinal));
    }

    [Fact]
    public void More_combinations_than_the_limit_are_refused_and_a_case_without_a_rule_is_told()
    {
        var many = Cases + Landing.Constant(N(1), kind: "", situation: "Q1");
        for (var i = 2; i <= 6; i++) many += $"P-1,Q{i},,0,1,0,0,0,0,0\nP-1,Q{i},,1,1,0,0,0,0,0\n";
        for (var i = 1; i <= 40; i++) many += $"P-1,W{i},,0,1,0,0,0,0,0\nP-1,W{i},,1,1,0,0,0,0,0\n";
        var settings = """{"forces": {"combinationSets": ["en1990-6.10"], "caseTags": [{"pattern": "Q*", "tag": "live"}, {"pattern": "W*", "tag": "wind"}, {"pattern": "G", "tag": "rain"}]}}""";
        var diagnostics = new DiagnosticList();

        Assert.Null(Landing.Run(Landing.OnePost(), diagnostics, settings, tables: [many]));
        Assert.Contains(diagnostics.Items, d => d.Code == "SCR-0011");
        Assert.Contains(Landing.Screen(Landing.OnePost(), s_table, settings).Findings, f => f.Code == "SCR-0012" && f.Severity == Severity.Warning && f.Message.Contains("'G'", StringComparison.Ordinal));
    }

    private static SectionForces N(double n) => new(n, 0, 0, 0, 0, 0);
}
