using MemberScan.Browser.Tests.Data;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;
using Microsoft.Playwright;

namespace MemberScan.Browser.Tests;

/// <summary>The view in space in Chromium's software WebGL 2.</summary>
public sealed class SpaceTests(Chromium chromium) : IClassFixture<Chromium>
{
    private static readonly ScreeningRecord s_record = GeneratedLanding.Of(120, 6, 8);

    private sealed class Place
    {
        public double X { get; set; }

        public double Y { get; set; }
    }

    [Fact]
    public async Task Picks_the_member_under_the_pointer_and_selects_its_row()
    {
        await using var report = await chromium.Open(s_record);
        var index = await Fitted(report, m => m.Role == "rail");

        var place = await report.Page.EvaluateAsync<Place>($"() => memberScan.view.placeOf({index})");
        await report.Page.Locator("#space canvas").ClickAsync(new LocatorClickOptions { Position = new Position { X = (float)place.X, Y = (float)place.Y } });

        Assert.Equal(s_record.Members[index].Key, await report.Selected());
        Assert.Equal($"row-{index}", await report.Page.GetAttributeAsync(".row.selected", "id"));
        Assert.Contains(s_record.Members[index].Name, await report.Page.InnerTextAsync(".labels .selected"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Marks_the_member_whose_row_is_selected()
    {
        await using var report = await chromium.Open(s_record);
        var before = await Pixels(report);

        await report.Page.ClickAsync("#table-rows .row >> nth=2");
        await report.Page.ClickAsync("text=Fit selection");
        await report.Page.WaitForTimeoutAsync(200);

        Assert.NotEqual(before, await Pixels(report));
        var name = await report.Page.InnerTextAsync("#table-panel h3");
        Assert.Contains(name, await report.Page.InnerTextAsync(".labels .selected"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Draws_only_what_passes_the_filters()
    {
        await using var report = await chromium.Open(s_record);
        var index = await Fitted(report, m => m.Role == "rail");
        Assert.Equal(index, await Pick(report, index));

        await report.Page.SelectOptionAsync("#filter-role", "is hanger");
        await report.Page.WaitForTimeoutAsync(200);

        Assert.NotEqual(index, await Pick(report, index));
    }

    [Fact]
    public async Task Cuts_away_what_lies_beyond_the_section_plane()
    {
        await using var report = await chromium.Open(s_record);
        var index = await Fitted(report, m => m.Role == "rail" && m.Axes!.Origin.X > 60);

        await report.Page.SelectOptionAsync("[name=cut-axis]", "x");
        await report.Page.EvaluateAsync("() => { const s = document.querySelector('[name=cut-at]'); s.value = '20'; s.dispatchEvent(new Event('input')); }");

        Assert.Equal(-1, await Pick(report, index));
        Assert.StartsWith("X ", await report.Page.InnerTextAsync(".toolbar output"), StringComparison.Ordinal);
        await report.Page.SelectOptionAsync("[name=cut-axis]", "none");
        Assert.Equal(index, await Pick(report, index));
    }

    [Fact]
    public async Task Tells_in_the_legend_how_many_members_each_colour_has_and_how_many_have_no_place()
    {
        await using var report = await chromium.Open(s_record);

        var legend = await report.Page.InnerTextAsync("#space .scale");

        var over = s_record.Members.Count(m => m.Verdict == Verdict.Overstressed && m.Governing!.Utilization <= 1.5);
        Assert.Contains($"1 to 1.5: {over}", legend, StringComparison.Ordinal);
        Assert.Contains($"not checked: {s_record.Counts.NotChecked}", legend, StringComparison.Ordinal);
        Assert.Contains($"without a known place, not drawn: {s_record.Members.Count(m => m.Axes is null)}", legend, StringComparison.Ordinal);
        Assert.Contains("Deck +3.20 5.20 m", await report.Page.InnerTextAsync(".labels"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Turns_by_keys_and_stays_a_picture_to_look_at()
    {
        await using var report = await chromium.Open(s_record);
        var before = await Pixels(report);

        await report.Page.FocusAsync("#space canvas");
        for (var i = 0; i < 4; i++) await report.Page.Keyboard.PressAsync("ArrowLeft");
        await report.Page.Keyboard.PressAsync("+");
        await report.Page.WaitForTimeoutAsync(200);

        Assert.NotEqual(before, await Pixels(report));
        await report.Page.Locator(".spacePart").ScreenshotAsync(new LocatorScreenshotOptions { Path = Path.Combine(Chromium.Artifacts, "space.png") });
        await Fitted(report, m => m.Verdict == Verdict.Overstressed);
        await report.Page.Locator(".spacePart").ScreenshotAsync(new LocatorScreenshotOptions { Path = Path.Combine(Chromium.Artifacts, "space-near.png") });
        Assert.Empty(report.Faults);
    }

    [Fact]
    public async Task Draws_far_members_of_many_as_boxes_and_picks_them_all_the_same()
    {
        var record = GeneratedLanding.Of(3_000, 20, 20);
        await using var report = await chromium.Open(record);
        await report.Page.Locator("#space canvas").ScrollIntoViewIfNeededAsync();
        await report.Page.WaitForTimeoutAsync(1500);
        await report.Page.Locator(".spacePart").ScreenshotAsync(new LocatorScreenshotOptions { Path = Path.Combine(Chromium.Artifacts, "space-many.png") });

        var index = record.Members.Select((m, i) => (m, i)).Last(p => p.m.Axes is not null && p.m.Role == "rail").i;
        await report.Page.EvaluateAsync($"() => memberScan.view.fit([{index}])");

        Assert.Equal(index, await Pick(report, index));
        Assert.Contains("of more than 2000 members the far ones as boxes", await report.Page.InnerTextAsync("#space .scale"), StringComparison.Ordinal);
        Assert.Empty(report.Faults);
    }

    private static async Task<int> Fitted(OpenedReport report, Func<MemberResult, bool> wanted)
    {
        var index = s_record.Members.Select((m, i) => (m, i)).First(p => p.m.Axes is not null && wanted(p.m)).i;
        await report.Page.EvaluateAsync($"() => memberScan.view.fit([{index}])");
        await report.Page.WaitForTimeoutAsync(200);
        return index;
    }

    private static Task<int> Pick(OpenedReport report, int index) =>
        report.Page.EvaluateAsync<int>($"() => {{ const p = memberScan.view.placeOf({index}); return memberScan.view.pick(p.x, p.y); }}");

    private static async Task<string> Pixels(OpenedReport report)
    {
        await report.Page.Locator("#space canvas").ScrollIntoViewIfNeededAsync();
        await report.Page.WaitForTimeoutAsync(500);
        return await report.Page.EvaluateAsync<string>("() => document.querySelector('#space canvas').toDataURL()");
    }
}
