using AngleSharp.Html.Parser;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Script;

namespace MemberScan.Reporting.Tests;

public sealed class HostileTextTests
{
    [Theory]
    [InlineData("<script>alert(1)</script>")]
    [InlineData("\"><img src=x onerror=alert(1)>")]
    [InlineData("</style><script>1</script>")]
    [InlineData("' onmouseover='x")]
    [InlineData("&lt;b&gt; &#x3c;")]
    [InlineData("</bdi></td></table>")]
    [InlineData("רמפה של מעבורת")]
    public void Shows_a_name_as_the_text_it_is(string hostile)
    {
        var rail = FerryLanding.Rail("Rail", hostile, 1.32e3);
        var record = FerryLanding.Record(
            rail with { Identity = rail.Identity with { Tag = hostile, Storey = hostile }, Material = hostile, Notes = [hostile] },
            FerryLanding.Open("Strut", hostile, ReasonCode.NoForces, hostile));
        record = record with { Model = record.Model with { FileName = hostile, ProjectName = hostile, Schema = hostile } };

        var page = new HtmlParser().ParseDocument(HtmlReport.Render(record));

        Assert.Empty(page.QuerySelectorAll("img, [src], [onmouseover], [onerror]"));
        Assert.All(page.QuerySelectorAll("script:not([type])"), s => Assert.True(s.TextContent == PageScripts.Embedded.Main || s.TextContent == PageScripts.Embedded.View));
        Assert.Matches("^[A-Za-z0-9+/=]+$", Assert.Single(page.QuerySelectorAll("script[type]")).TextContent);
        Assert.Single(page.QuerySelectorAll("style"));
        Assert.Equal(hostile, page.QuerySelector("#member-Rail summary h3 bdi")!.TextContent);
        Assert.Equal(hostile, page.QuerySelector("#member-Strut td bdi")!.TextContent);
        Assert.Equal(2, page.QuerySelectorAll("[id^='member-']").Length);
    }

    [Fact]
    public void Cuts_a_name_of_ten_kilobytes_and_says_so()
    {
        var page = new HtmlParser().ParseDocument(HtmlReport.Render(FerryLanding.Record(FerryLanding.Rail("Rail", new string('x', 10_240), 1.32e3))));

        var shown = page.QuerySelector("#member-Rail summary h3 bdi")!.TextContent;
        Assert.Equal(new string('x', ForeignText.LongestName) + "… (cut; 10\u202F240 characters in all)", shown);
    }

    [Fact]
    public void Lets_no_writing_direction_or_control_character_act()
    {
        var page = new HtmlParser().ParseDocument(HtmlReport.Render(FerryLanding.Record(FerryLanding.Rail("Rail", "a\u202Eb\u2069c\0d\u001Be\nf", 1.32e3))));

        Assert.Equal("a⟨U+202E⟩b⟨U+2069⟩c␀d␛e␊f", page.QuerySelector("#member-Rail summary h3 bdi")!.TextContent);
    }

    [Fact]
    public void Gives_hostile_and_repeated_keys_places_of_their_own()
    {
        var record = FerryLanding.Record(
            FerryLanding.Hanger("a b\"<>", "one", 1e3), FerryLanding.Hanger("a b\"<>", "two", 1e3), FerryLanding.Hanger(new string('k', 10_000), "three", 1e3), FerryLanding.Hanger("", "four", 1e3));

        var page = new HtmlParser().ParseDocument(HtmlReport.Render(record));

        var ids = page.QuerySelectorAll("[id^='member-']").Select(e => e.Id!).ToList();
        Assert.Equal(4, ids.Distinct().Count());
        Assert.All(ids, id => Assert.InRange(id.Length, 1, 5 * MemberAnchors.LongestKey + 10));
        Assert.DoesNotContain(ids, id => id.Contains(' ', StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("x\"; } body { display: none } @page { x: \"")]
    [InlineData("\\")]
    [InlineData("a\nb")]
    public void Lets_no_file_name_leave_its_string_in_the_page_margins(string fileName)
    {
        var record = FerryLanding.Small();

        var page = new HtmlParser().ParseDocument(HtmlReport.Render(record with { Model = record.Model with { FileName = fileName } }));

        var margin = page.QuerySelector("style")!.TextContent.Split('\n').Single(l => l.Contains("@top-left", StringComparison.Ordinal));
        Assert.Matches("^  @top-left \\{ content: \"([A-Za-z0-9 ._,;-]|\\\\[0-9A-F]+ )*\"; \\}$", margin);
    }
}
