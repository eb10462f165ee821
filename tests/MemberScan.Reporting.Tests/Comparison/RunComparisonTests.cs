using System.Globalization;
using System.Text;
using System.Text.Json;
using AngleSharp.Html.Parser;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Comparison;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Marks;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests.Comparison;

public sealed class RunComparisonTests
{
    [Fact]
    public void Of_fifty_three_with_new_GlobalIds_and_the_same_Tag_are_re_identified_and_none_is_new_or_gone()
    {
        var earlier = Rails(50, 0.4e3);
        var later = FerryLanding.Record([.. earlier.Members.Select((m, i) => i is 3 or 17 or 40 ? m.As(key: "other" + m.Tag, globalId: "other" + m.Tag) : m)]);

        var record = RunComparison.Of(earlier, later);

        Assert.Equal((3, 0, 0), (record.Reidentified, record.Count(Movement.New), record.Count(Movement.Gone)));
        Assert.Equal(50, record.Count(Movement.Unchanged));
        Assert.All(record.Members.Where(m => m.IsReidentified), m => Assert.Equal(MatchedBy.Tag, m.MatchedBy));
        Assert.False(record.HasWorse);
    }

    [Fact]
    public void Without_Tag_the_axis_finds_a_member_again_also_when_it_runs_the_other_way()
    {
        var earlier = FerryLanding.Record([.. Rails(5, 0.4e3).Members.Select(m => m.As(tag: ""))]);
        var turned = earlier.Members.Select((m, i) =>
        {
            var axes = m.Axes!;
            return m.As(key: $"new{i}", globalId: $"new{i}") with
            {
                Axes = i % 2 == 0 ? MemberAxes.From(axes.Origin + new Vector3(0.0005, 0, 0) + m.Length!.Value * axes.X, -1 * axes.X, axes.Z) : axes,
            };
        });

        var record = RunComparison.Of(earlier, FerryLanding.Record([.. turned]));

        Assert.Equal((5, 0, 0), (record.Reidentified, record.Count(Movement.New), record.Count(Movement.Gone)));
        Assert.Equal(earlier.Members.Select(m => m.Key), record.Members.Select(m => m.Earlier!.Key));
    }

    [Fact]
    public void Two_members_in_one_place_are_not_taken_for_each_other()
    {
        var one = Rails(1, 0.4e3).Members[0].As(tag: "");
        var earlier = FerryLanding.Record(one.As(key: "a", globalId: "a"), one.As(key: "b", globalId: "b"));

        var record = RunComparison.Of(earlier, FerryLanding.Record(one.As(key: "c", globalId: "c")));

        Assert.Equal((1, 2), (record.Count(Movement.New), record.Count(Movement.Gone)));
    }

    [Fact]
    public void A_thinner_wall_and_more_than_the_limit_became_overstressed_section_changed()
    {
        var before = With(FerryLanding.Rail("a", "post", 0.9e3), 0.92);
        var after = With(before with { Section = "tube 48.3x2.6 mm" }, 1.10);

        var record = RunComparison.Of(FerryLanding.Record(before), FerryLanding.Record(after));

        var member = Assert.Single(record.Members);
        Assert.Equal("became overstressed, section changed", member.Words);
        Assert.Equal(new InputChange("section", "tube 48.3x3.2 mm", "tube 48.3x2.6 mm"), Assert.Single(member.Changes));
        Assert.True(record.HasWorse);
    }

    [Theory]
    [InlineData(1.10, 0.92, "cured", false)]
    [InlineData(1.10, 1.25, "still overstressed, 1.100 → 1.250 (+0.150)", true)]
    [InlineData(1.25, 1.10, "still overstressed, 1.250 → 1.100 (-0.150)", false)]
    [InlineData(0.92, 1.10, "became overstressed", true)]
    [InlineData(0.80, 0.92, "unchanged", false)]
    [InlineData(0.92, null, "no longer checked", true)]
    [InlineData(1.10, null, "no longer checked", true)]
    [InlineData(null, 0.92, "now within limit", false)]
    [InlineData(null, 1.10, "became overstressed", true)]
    [InlineData(null, null, "unchanged", false)]
    public void Each_pair_of_verdicts_has_its_outcome(double? earlier, double? later, string words, bool isWorse)
    {
        var record = RunComparison.Of(FerryLanding.Record(Of(earlier)), FerryLanding.Record(Of(later)));

        Assert.Equal((words, isWorse), (Assert.Single(record.Members).Words, record.HasWorse));
    }

    [Fact]
    public void A_changed_input_without_a_changed_verdict_is_told_with_which()
    {
        var marks = new InputMarks("s", "m", "f", "l");
        var before = Of(0.5) with { Inputs = marks };

        var record = RunComparison.Of(FerryLanding.Record(before), FerryLanding.Record(before with { Inputs = marks with { Forces = "g", Limit = "k" } }));

        Assert.Equal("changed input: forces, limit", Assert.Single(record.Members).Words);
    }

    [Theory]
    [InlineData(0.5, false)]
    [InlineData(1.5, true)]
    [InlineData(null, true)]
    public void A_new_member_is_worse_unless_it_is_within_its_limit(double? utilization, bool isWorse)
    {
        var record = RunComparison.Of(FerryLanding.Record(), FerryLanding.Record(Of(utilization)));

        Assert.Equal((Movement.New, isWorse), (Assert.Single(record.Members).Movement, record.HasWorse));
    }

    [Fact]
    public void Table_JSON_and_page_say_the_same()
    {
        var earlier = FerryLanding.Record(Of(1.10).As(name: "=Geländer \"橋\", 🛟"), Of(0.5).As(key: "b", globalId: "b", tag: "b"));
        var record = RunComparison.Of(earlier, FerryLanding.Record(Of(0.92).As(name: "=Geländer \"橋\", 🛟")));

        var lines = Encoding.UTF8.GetString(ComparisonTable.Write(record)).Split("\r\n");
        var json = JsonDocument.Parse(ComparisonJson.Write(record)).RootElement;
        var page = new HtmlParser().ParseDocument(ComparisonPage.Render(record));

        Assert.Equal(4, lines.Length);
        Assert.Contains("\"'=Geländer \"\"橋\"\", 🛟\"", lines[2], StringComparison.Ordinal);
        Assert.Contains(",-0.18,", lines[2], StringComparison.Ordinal);
        Assert.Equal(["gone", "cured"], json.GetProperty("members").EnumerateArray().Select(m => m.GetProperty("outcome").GetString()));
        Assert.Equal("=Geländer \"橋\", 🛟", json.GetProperty("members")[1].GetProperty("name").GetString());
        Assert.Contains("cured", page.Body!.TextContent, StringComparison.Ordinal);
        Assert.Contains("=Geländer \"橋\", 🛟", page.Body.TextContent, StringComparison.Ordinal);
        Assert.Empty(page.QuerySelectorAll("script,img,link"));
    }

    private static MemberResult Of(double? utilization) => utilization is { } u
        ? With(FerryLanding.Rail("a", "rail", 0.5e3), u)
        : FerryLanding.Rail("a", "rail", 0.5e3) with { Verdict = Verdict.NotChecked, Reason = new Reason(ReasonCode.NoForces, "none"), Governing = null };

    private static MemberResult With(MemberResult member, double utilization) => member with
    {
        Governing = member.Governing! with { Utilization = utilization },
        Verdict = utilization > 1 ? Verdict.Overstressed : Verdict.WithinLimit,
    };

    private static ScreeningRecord Rails(int count, double bending) => FerryLanding.Record([.. Enumerable.Range(0, count).Select(i =>
    {
        var key = string.Create(CultureInfo.InvariantCulture, $"2O2Fr$t4X7Zf8NOew3{i:D4}");
        return FerryLanding.Rail(key, "Gangway rail", bending).As(tag: $"R-{i}") with { Axes = MemberAxes.From(new Vector3(2.5 * i, -3.2, 4.05), Vector3.UnitX, Vector3.UnitZ) };
    })]);
}
