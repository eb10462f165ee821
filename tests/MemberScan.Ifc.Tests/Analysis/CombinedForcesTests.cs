using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Tests.Analysis.Loads;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;
using MemberScan.Model.Rules.Combinations;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Analysis;

/// <summary>A rail of 3 m with results of its cases G and Q, and combinations of them that have no results of their own.</summary>
public sealed class CombinedForcesTests
{
    private static readonly SectionForces s_g = new(-8000, 300, -1200, 45, 900, -150), s_q = new(-500, 100, 700, 5, -70, 210);

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Linear_results_of_cases_are_superposed_with_the_factors_of_the_model(Release release)
    {
        var (model, analysis, line) = Start(release);
        var (g, q) = (analysis.LoadCase("G"), analysis.LoadCase("Q"));
        analysis.LoadCombination("CO1", "ULS", (g, 1.35), (q, 1.5));
        Results(analysis, line, g, s_g);
        Results(analysis, line, q, s_q);

        var reading = Reading.Of(model);

        Assert.Equal([("G", false), ("Q", false), ("CO1", true)], reading.Forces.Select(f => (f.Situation.Name, f.Situation.ActsInFull)));
        var combined = reading.ForcesOf("rail", "CO1");
        Assert.Null(combined.Unusable);
        Assert.Equal(SituationKind.Design, combined.Situation.Kind);
        Near.Forces(1.35 * s_g + 1.5 * s_q, combined.Stations[0].Forces, 1e-12);
        Assert.StartsWith("1.35 × 'G' + 1.5 × 'Q' (combination #", combined.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Results_that_are_not_linear_are_not_superposed(Release release)
    {
        var (model, analysis, line) = Start(release);
        var (g, q) = (analysis.LoadCase("G"), analysis.LoadCase("Q"));
        analysis.LoadCombination("CO1", "ULS", (g, 1.35), (q, 1.5));
        Results(analysis, line, g, s_g);
        Results(analysis, line, q, s_q, isLinear: false);

        var combined = Reading.Of(model).ForcesOf("rail", "CO1");

        Assert.Equal(ReasonCode.NoCombination, combined.Unusable!.Code);
        Assert.Contains("nothing says that the results of 'Q' are linear", combined.Unusable.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_combination_with_results_of_its_own_is_not_superposed()
    {
        var (model, analysis, line) = Start(Release.Ifc4);
        var (g, q) = (analysis.LoadCase("G"), analysis.LoadCase("Q"));
        Results(analysis, line, analysis.LoadCombination("CO1", "ULS", (g, 1.35), (q, 1.5)), s_g);
        Results(analysis, line, g, s_g);
        Results(analysis, line, q, s_q);

        Near.Forces(s_g, Reading.Of(model).ForcesOf("rail", "CO1").Stations[0].Forces, 1e-12);
    }

    [Fact]
    public void A_case_without_results_on_the_member_leaves_the_combination_incomplete()
    {
        var (model, analysis, line) = Start(Release.Ifc4);
        var (g, q) = (analysis.LoadCase("G"), analysis.LoadCase("Q"));
        analysis.LoadCombination("CO1", "ULS", (g, 1.35), (q, 1.5));
        Results(analysis, line, g, s_g);
        var other = analysis.CurveMember("other", Vector3.UnitY, new Vector3(3, 1, 0), Vector3.UnitZ);
        Results(analysis, other, q, s_q);

        var combined = Reading.Of(model).ForcesOf("rail", "CO1");

        Assert.Equal(ReasonCode.ForcesIncomplete, combined.Unusable!.Code);
        Assert.Contains("this member has none", combined.Unusable.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_combination_that_nothing_has_results_for_is_told()
    {
        var (model, analysis, line) = Start(Release.Ifc4);
        var (g, q) = (analysis.LoadCase("G"), analysis.LoadCase("Q"));
        analysis.LoadCombination("CO2", "ULS", (q, 1.5));
        Results(analysis, line, g, s_g);

        var reading = Reading.Of(model);

        Assert.Equal("G", Assert.Single(reading.Forces).Situation.Name);
        reading.AssertTold("IFC-0027", Severity.Warning, "has no results");
    }

    [Theory]
    [InlineData(CaseCoefficients.Refuse, null)]
    [InlineData(CaseCoefficients.InResults, 1.35)]
    [InlineData(CaseCoefficients.NotInResults, 1.35 * 1.1)]
    public void A_case_with_a_coefficient_of_its_own_is_superposed_as_the_settings_say(CaseCoefficients rule, double? factor)
    {
        var (model, analysis, line) = Start(Release.Ifc4);
        var g = Actions.Case(model, "G", "1.1");
        analysis.LoadCombination("CO1", "ULS", (g, 1.35));
        Results(analysis, line, g, s_g);

        var combined = Reading.Of(model, new ReadingRules { Forces = new ForceRules { CaseCoefficients = rule } }).ForcesOf("rail", "CO1");

        if (factor is { } known) Near.Forces(known * s_g, combined.Stations[0].Forces, 1e-12);
        else Assert.Contains("nothing says whether its results carry it", combined.Unusable!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_coefficient_does_not_apply_to_self_weight_so_its_results_must_be_apart()
    {
        var (model, analysis, line) = Start(Release.Ifc4);
        var g = Actions.Case(model, "G", "1.1", "(0.,0.,-1.)");
        analysis.LoadCombination("CO1", "ULS", (g, 1.35));
        Results(analysis, line, g, s_g);

        var combined = Reading.Of(model, new ReadingRules { Forces = new ForceRules { CaseCoefficients = CaseCoefficients.NotInResults } }).ForcesOf("rail", "CO1");

        Assert.Contains("self-weight", combined.Unusable!.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(Release.Ifc2X3, false)]
    [InlineData(Release.Ifc2X3, true)]
    [InlineData(Release.Ifc4, false)]
    [InlineData(Release.Ifc4, true)]
    [InlineData(Release.Ifc4X3, false)]
    [InlineData(Release.Ifc4X3, true)]
    public void A_combination_that_leaves_out_its_coefficient_is_not_known(Release release, bool asOne)
    {
        var (model, analysis, line) = Start(release);
        var g = analysis.LoadCase("G");
        var combination = Actions.Group(model, "CO1", "LOAD_COMBINATION", "$");
        var isOld = release == Release.Ifc2X3;
        Actions.Assign(model, combination, isOld ? null : "1.35", g);
        Results(analysis, line, g, s_g);

        var combined = Reading.Of(model, new ReadingRules { Forces = new ForceRules { MissingCoefficientsAreOne = asOne } }).ForcesOf("rail", "CO1");

        if (asOne) Near.Forces((isOld ? 1 : 1.35) * s_g, combined.Stations[0].Forces, 1e-12);
        else Assert.Contains("leaves out its coefficient", combined.Unusable!.Message, StringComparison.Ordinal);
    }

    private static (ModelWriter Model, AnalysisWriter Analysis, int Line) Start(Release release)
    {
        var model = Bars.Model(release);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        return (model, analysis, analysis.CurveMember("rail", Vector3.Zero, new Vector3(3, 0, 0), Vector3.UnitZ));
    }

    private static void Results(AnalysisWriter analysis, int line, int loads, SectionForces forces, bool isLinear = true) =>
        analysis.PointReaction(line, analysis.ResultGroup(FormattableString.Invariant($"R {loads}"), loads, isLinear), forces, Vector3.Zero);
}
