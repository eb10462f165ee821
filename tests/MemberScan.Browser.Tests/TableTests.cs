using MemberScan.Browser.Tests.Data;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;
using Microsoft.Playwright;

namespace MemberScan.Browser.Tests;

/// <summary>The table in a real browser; what it must show is counted from the record here, not by the page.</summary>
public sealed class TableTests(Chromium chromium) : IClassFixture<Chromium>
{
    private static readonly ScreeningRecord s_record = GeneratedLanding.Of(400, 24, 30);

    [Fact]
    public async Task Shows_all_candidates_worst_first()
    {
        await using var report = await chromium.Open(s_record);

        var names = await report.Names();

        Assert.Equal($"400 of 400 candidates: 24 overstressed, 30 not checked, 346 within limit.", await report.Count());
        var worst = s_record.Members.Where(m => m.Governing is not null).OrderByDescending(m => m.Governing!.Utilization).Select(m => m.Name).ToArray();
        Assert.Equal(worst[..10], names[..10]);
        Assert.InRange(names.Length, 10, 60);
    }

    [Fact]
    public async Task Filters_by_verdict_role_section_material_storey_situation_criterion_reason_and_text()
    {
        await using var report = await chromium.Open(s_record);
        var rail = s_record.Members.First(m => m.Role == "rail");

        await Expect(report, "role", "rail", m => m.Role == "rail");
        await Expect(report, "section", "round 25 mm", m => (m.Governing?.Section ?? m.Section) == "round 25 mm");
        await Expect(report, "material", "S235JR", m => m.Material == "S235JR");
        await Expect(report, "storey", rail.Storey, m => m.Storey == rail.Storey);
        await Expect(report, "situation", "Full deck", m => m.Governing?.Situation == "Full deck");
        await Expect(report, "criterion", rail.Governing!.Criterion, m => m.Governing?.Criterion == rail.Governing.Criterion);
        await Expect(report, "reason", "no-forces", m => m.Reason?.Code == ReasonCode.NoForces);
        await Expect(report, "reason", "", m => m.Reason is null);

        await report.Page.ClickAsync("#filter-reset");
        await report.Page.UncheckAsync("[name=filter-verdict] >> nth=0");
        Assert.StartsWith($"{s_record.Members.Count(m => m.Verdict != Verdict.WithinLimit)} of 400", await report.Count(), StringComparison.Ordinal);

        await report.Page.ClickAsync("#filter-reset");
        await report.Page.FillAsync("#filter-text", "RAIL 0000");
        Assert.StartsWith($"{s_record.Members.Count(m => m.Name.Contains("rail 0000", StringComparison.OrdinalIgnoreCase))} of 400", await report.Count(), StringComparison.Ordinal);

        await report.Page.FillAsync("#filter-text", "no such thing");
        Assert.StartsWith("0 of 400", await report.Count(), StringComparison.Ordinal);
        Assert.True(await report.Page.IsVisibleAsync("#table-none"));
        Assert.Empty(report.Faults);
    }

    [Fact]
    public async Task Sorts_by_any_column_both_ways_with_what_is_not_known_last()
    {
        await using var report = await chromium.Open(s_record);

        await report.Page.ClickAsync("[data-sort=name]");
        Assert.Equal(s_record.Members.Select(m => m.Name).Order(StringComparer.OrdinalIgnoreCase).Take(8), (await report.Names())[..8]);

        await report.Page.ClickAsync("[data-sort=name]");
        Assert.Equal(s_record.Members.Select(m => m.Name).OrderDescending(StringComparer.OrdinalIgnoreCase).Take(8), (await report.Names())[..8]);
        Assert.Equal("descending", await report.Page.GetAttributeAsync("[role=columnheader]:has([data-sort=name])", "aria-sort"));

        await report.Page.ClickAsync("[data-sort=utilization]");
        await report.Page.ClickAsync("[data-sort=utilization]");
        var least = s_record.Members.Where(m => m.Governing is not null).OrderBy(m => m.Governing!.Utilization).First();
        Assert.Equal(least.Name, (await report.Names())[0]);
        await report.Page.FocusAsync("#table-grid");
        await report.Page.Keyboard.PressAsync("End");
        Assert.Contains("NOT CHECKED", await report.Page.InnerTextAsync(".row.active"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Can_be_used_with_the_keyboard_alone()
    {
        await using var report = await chromium.Open(s_record);
        var page = report.Page;

        await page.FocusAsync("#filter-reset");
        for (var i = 0; i < 40 && await page.EvaluateAsync<string>("() => document.activeElement.id") != "table-grid"; i++) await page.Keyboard.PressAsync("Tab");
        Assert.Equal("table-grid", await page.EvaluateAsync<string>("() => document.activeElement.id"));

        await page.Keyboard.PressAsync("ArrowDown");
        await page.Keyboard.PressAsync("ArrowDown");
        await page.Keyboard.PressAsync("Enter");
        var third = s_record.Members.Where(m => m.Governing is not null).OrderByDescending(m => m.Governing!.Utilization).ElementAt(2);
        Assert.Equal(third.Key, await report.Selected());
        Assert.Contains(third.Name, await page.InnerTextAsync("#table-panel h3"), StringComparison.Ordinal);
        Assert.Equal(await page.GetAttributeAsync("#table-grid", "aria-activedescendant"), await page.GetAttributeAsync(".row.selected", "id"));

        await page.Keyboard.PressAsync("End");
        Assert.Equal("401", await page.GetAttributeAsync(".row.active", "aria-rowindex"));
        await page.Keyboard.PressAsync("PageUp");
        await page.Keyboard.PressAsync("Home");
        Assert.Equal("2", await page.GetAttributeAsync(".row.active", "aria-rowindex"));
        await page.Keyboard.PressAsync("Escape");
        Assert.Equal("", await report.Selected());
        Assert.False(await page.IsVisibleAsync("#table-panel"));
    }

    [Fact]
    public async Task Opens_at_the_member_of_a_link_and_writes_the_link_of_a_selection()
    {
        var member = s_record.Members[317];
        await using var report = await chromium.Open(s_record, fragment: "#member=" + Uri.EscapeDataString(member.Key));

        Assert.Equal(member.Key, await report.Selected());
        Assert.Contains(member.Name, await report.Page.InnerTextAsync("#table-panel h3"), StringComparison.Ordinal);
        Assert.True(await report.Page.IsVisibleAsync(".row.selected"));

        await report.Page.ClickAsync("#table-rows .row:not(.selected) >> nth=5");
        Assert.Equal("#member=" + Uri.EscapeDataString(await report.Selected()), await report.Page.EvaluateAsync<string>("() => location.hash"));
    }

    [Fact]
    public async Task Says_it_when_a_link_names_no_candidate()
    {
        await using var report = await chromium.Open(s_record, fragment: "#member=nobody");

        Assert.Equal("No candidate of this report has the key nobody.", await report.Page.InnerTextAsync("#script-note"));
    }

    [Fact]
    public async Task Saves_the_filtered_rows_with_the_numbers_of_the_record()
    {
        await using var report = await chromium.Open(s_record);
        await report.Page.SelectOptionAsync("#filter-storey", new SelectOptionValue { Index = 1 });
        await report.Page.UncheckAsync("[name=filter-verdict] >> nth=2");

        var waiting = report.Page.WaitForDownloadAsync();
        await report.Page.ClickAsync("#table-save");
        var download = await waiting;
        var lines = (await File.ReadAllTextAsync(await download.PathAsync(), TestContext.Current.CancellationToken)).Split("\r\n");

        Assert.Equal("ferry-landing-east.filtered.csv", download.SuggestedFilename);
        Assert.Equal("Verdict,Utilization,Name,Tag,Key,Role,Section,Material,Storey,Situation,Station [m]", lines[0]);
        var storey = lines[1].Split(',')[8];
        var expected = s_record.Members.Where(m => m.Storey == storey && m.Verdict != Verdict.NotChecked).OrderByDescending(m => m.Governing!.Utilization).ToArray();
        Assert.Equal(expected.Length, lines.Length - 2);
        Assert.Equal(expected[0].Key, lines[1].Split(',')[4]);
        Assert.Equal(expected[0].Governing!.Utilization, double.Parse(lines[1].Split(',')[1], System.Globalization.CultureInfo.InvariantCulture), 1e-9);
    }

    [Fact]
    public async Task Copies_the_filtered_rows()
    {
        await using var report = await chromium.Open(s_record, new BrowserNewContextOptions { Permissions = ["clipboard-read", "clipboard-write"], ViewportSize = new ViewportSize { Width = 1400, Height = 1000 } });
        await report.Page.FillAsync("#filter-text", "rail 00002");

        await report.Page.ClickAsync("#table-copy");

        await report.Page.WaitForFunctionAsync("() => document.getElementById('table-told').textContent.includes('copied')");
        var text = await report.Page.EvaluateAsync<string>("() => navigator.clipboard.readText()");
        Assert.Equal(2, text.Split("\r\n", StringSplitOptions.RemoveEmptyEntries).Length);
        Assert.Contains("Gangway rail 00002", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Shows_and_hides_columns_as_chosen()
    {
        await using var report = await chromium.Open(s_record);
        Assert.Equal(0, await report.Page.Locator("[data-sort=Mz]").CountAsync());

        await report.Page.ClickAsync(".choose > summary");
        await report.Page.CheckAsync("#table-columns label:has-text('Mz') input");
        await report.Page.UncheckAsync("#table-columns label:has-text('Material') input");

        Assert.Equal("Mz [kN·m]", await report.Page.InnerTextAsync("[data-sort=Mz]"));
        Assert.Equal(0, await report.Page.Locator("[data-sort=material]").CountAsync());
    }

    [Fact]
    public async Task Is_wide_and_narrow_a_page_to_look_at()
    {
        await using var wide = await chromium.Open(s_record, fragment: "#member=" + Uri.EscapeDataString(s_record.Members[7].Key));
        await wide.Page.WaitForTimeoutAsync(300);
        await wide.Page.ScreenshotAsync(new PageScreenshotOptions { Path = Path.Combine(Chromium.Artifacts, "wide-table.png") });
        await wide.Keep("wide");

        await using var narrow = await chromium.Open(s_record, new BrowserNewContextOptions { ViewportSize = new ViewportSize { Width = 390, Height = 844 } });
        await narrow.Page.WaitForTimeoutAsync(300);
        await narrow.Keep("narrow");

        Assert.Equal(390, await narrow.Page.EvaluateAsync<int>("() => document.documentElement.scrollWidth"));
        Assert.True(await narrow.Page.IsVisibleAsync("#table-grid.cards .row"));
        Assert.Empty(wide.Faults.Concat(narrow.Faults));
    }

    private static async Task Expect(OpenedReport report, string filter, string value, Func<MemberResult, bool> passes)
    {
        await report.Page.ClickAsync("#filter-reset");
        await report.Page.SelectOptionAsync("#filter-" + filter, "is " + value);
        Assert.StartsWith($"{s_record.Members.Count(passes)} of 400", await report.Count(), StringComparison.Ordinal);
    }
}
