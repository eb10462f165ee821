using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;

namespace MemberScan.Ifc.Tests.Analysis;

public sealed class SituationReaderTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_combination_acts_in_full_and_a_load_case_or_group_does_not(Release release)
    {
        var situations = Read(release, null, analysis =>
        {
            var live = analysis.LoadCase("Q");
            return [analysis.ResultGroup("R1", analysis.LoadCombination("CO1", null, (live, 1.5))), analysis.ResultGroup("R2", live), analysis.ResultGroup("R3", null)];
        });

        Assert.Equal([("CO1", true), ("Q", false), ("R3", false)], situations.Select(s => (s.Name, s.ActsInFull)));
        Assert.Contains("of combination #", situations[0].Origin, StringComparison.Ordinal);
        Assert.Contains("of load case #", situations[1].Origin, StringComparison.Ordinal);
        Assert.Contains("without a load group", situations[2].Origin, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("SLS", SituationKind.Service)]
    [InlineData("uls", SituationKind.Design)]
    [InlineData("ALS", SituationKind.Design)]
    [InlineData("fatigue", SituationKind.Unknown)]
    [InlineData(null, SituationKind.Unknown)]
    public void The_purpose_in_the_model_tells_the_kind(string? purpose, SituationKind kind)
    {
        var situation = Assert.Single(Read(Release.Ifc4, null, analysis => [analysis.ResultGroup("R", analysis.LoadCombination("CO1", purpose))]));

        Assert.Equal(kind, situation.Kind);
        if (kind == SituationKind.Unknown) Assert.Equal("not stated", situation.KindSource);
        else Assert.Contains($"purpose '{purpose}'", situation.KindSource, StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public void Patterns_come_before_the_purpose_and_the_kind_of_all_comes_last()
    {
        var rules = new ForceRules { Kinds = [new("CO*", SituationKind.Service), new("*1", SituationKind.Design)], KindOfAll = SituationKind.Design };

        var situations = Read(Release.Ifc4, rules, analysis =>
        [
            analysis.ResultGroup("R1", analysis.LoadCombination("CO1", "ULS")), analysis.ResultGroup("R2", analysis.LoadCombination("x", "SLS")), analysis.ResultGroup("R3", analysis.LoadCombination("y", null)),
        ]);

        Assert.Equal([SituationKind.Service, SituationKind.Service, SituationKind.Design], situations.Select(s => s.Kind));
        Assert.Equal(["settings, pattern 'CO*'", "purpose 'SLS' in the model", "given for the run"], situations.Select(s => s.KindSource));
    }

    [Fact]
    public void Equal_and_missing_names_are_told_apart_by_the_number_of_the_group()
    {
        var situations = Read(Release.Ifc4, null, analysis =>
        [
            analysis.ResultGroup("a", analysis.LoadCombination("CO1", null)), analysis.ResultGroup("b", analysis.LoadCombination("CO1 ", null)), analysis.ResultGroup(" ", null),
        ]);

        Assert.Equal("CO1", situations[0].Name);
        Assert.Matches(@"^CO1 \(#\d+\)$", situations[1].Name);
        Assert.Matches(@"^result group #\d+$", situations[2].Name);
    }

    private static List<Situation> Read(Release release, ForceRules? rules, Func<AnalysisWriter, int[]> write)
    {
        var model = Bars.Model(release);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        var line = analysis.CurveMember("L", Vector3.Zero, new Vector3(3, 0, 0), Vector3.UnitZ);
        foreach (var group in write(analysis)) analysis.PointReaction(line, group, new(1, 2, 3, 4, 5, 6), Vector3.Zero);
        return [.. Reading.Of(model, new ReadingRules { Forces = rules ?? new ForceRules() }).Forces.Select(f => f.Situation)];
    }
}
