using MemberScan.Browser.Tests.Data;
using MemberScan.Reporting;
using MemberScan.Reporting.Tests;
using MemberScan.Screening.Record;
using Microsoft.Playwright;

namespace MemberScan.Browser.Tests;

/// <summary>The report without script, without WebGL, with broken data: nothing is lost by silence.</summary>
public sealed class PlainReadingTests(Chromium chromium) : IClassFixture<Chromium>
{
    private static readonly ScreeningRecord s_record = GeneratedLanding.Of(300, 14, 20);

    [Fact]
    public async Task Reads_whole_without_script()
    {
        await using var report = await chromium.Open(s_record, new BrowserNewContextOptions { JavaScriptEnabled = false, ViewportSize = new ViewportSize { Width = 1400, Height = 1000 } });

        var text = await report.Page.InnerTextAsync("body");

        Assert.All(s_record.Members, m => Assert.Contains(m.Name, text, StringComparison.Ordinal));
        Assert.Equal(14, await report.Page.Locator(".sheet:visible").CountAsync());
        Assert.Equal(300, await report.Page.Locator("[id^='member-']").CountAsync());
        Assert.True(await report.Page.IsVisibleAsync("#elevation > svg"));
        Assert.False(await report.Page.IsVisibleAsync("#members"));
        await report.Keep("no-script");
    }

    [Fact]
    public async Task Asks_for_nothing_but_itself_and_complains_of_nothing()
    {
        await using var report = await chromium.Open(s_record);
        await report.Page.FillAsync("#filter-text", "rail");
        await report.Page.ClickAsync("#table-rows .row >> nth=1");
        await report.Page.WaitForTimeoutAsync(500);

        Assert.Single(report.Requests, url => !url.StartsWith("blob:", StringComparison.Ordinal));
        Assert.Empty(report.Faults);
    }

    [Fact]
    public async Task Stops_any_script_and_any_address_that_is_not_its_own()
    {
        await using var report = await chromium.Open(s_record);

        var ran = await report.Page.EvaluateAsync<bool>("""
            async () => {
              const script = document.createElement('script');
              script.textContent = 'globalThis.foreign = true';
              document.body.append(script);
              const image = new Image();
              image.src = 'http://127.0.0.1:9/x.png';
              await new Promise(r => setTimeout(r, 200));
              let fetched = true;
              try { await fetch('http://127.0.0.1:9/'); } catch { fetched = false; }
              return globalThis.foreign === true || fetched;
            }
            """);

        Assert.False(ran);
        Assert.Contains(report.Faults, f => f.Contains("Content Security Policy", StringComparison.Ordinal));
        Assert.DoesNotContain("unsafe", await report.Page.GetAttributeAsync("meta[http-equiv]", "content"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Shows_the_plain_lists_and_says_why_when_its_data_are_broken()
    {
        var html = HtmlReport.Render(s_record);
        var at = html.IndexOf("id=\"members-data\">", StringComparison.Ordinal) + 40;

        await using var report = await chromium.OpenText(html[..at] + "AAAA" + html[(at + 4)..]);

        Assert.Contains("The table could not be built", await report.Page.InnerTextAsync("#script-note"), StringComparison.Ordinal);
        var text = await report.Page.InnerTextAsync("body");
        Assert.All(s_record.Members, m => Assert.Contains(m.Name, text, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Keeps_the_elevation_where_there_is_no_webgl()
    {
        const string NoWebGl = "const get = HTMLCanvasElement.prototype.getContext; HTMLCanvasElement.prototype.getContext = function (kind, ...rest) { return /webgl/.test(kind) ? null : get.call(this, kind, ...rest); };";

        await using var report = await chromium.Open(s_record, before: NoWebGl);

        Assert.Contains("needs WebGL 2, which this browser does not give", await report.Page.InnerTextAsync("#space-note"), StringComparison.Ordinal);
        Assert.True(await report.Page.IsVisibleAsync("#elevation > svg"));
        Assert.Equal(0, await report.Page.Locator("canvas").CountAsync());
    }

    [Fact]
    public async Task Says_that_the_view_was_left_out_where_the_program_was_built_without_it()
    {
        var html = HtmlReport.Render(s_record);
        var view = html.LastIndexOf("<script>", StringComparison.Ordinal);

        await using var report = await chromium.OpenText(html[..view] + html[(html.LastIndexOf("</script>", StringComparison.Ordinal) + "</script>".Length)..]);

        Assert.Contains("The view in space was left out of this report", await report.Page.InnerTextAsync("#space-note"), StringComparison.Ordinal);
        Assert.True(await report.Page.IsVisibleAsync("#elevation > svg"));
        Assert.True(await report.Page.IsVisibleAsync("#table-grid .row"));
        Assert.Empty(report.Faults);
    }

    [Theory]
    [InlineData("<script>document.title='taken'</script>")]
    [InlineData("</script><script>document.title='taken'</script>")]
    [InlineData("</noscript><img src=x onerror=\"document.title='taken'\">")]
    [InlineData("javascript:document.title='taken'")]
    [InlineData("<!--<script>")]
    [InlineData("=HYPERLINK(\"x\")")]
    public async Task Shows_hostile_names_as_the_text_they_are(string hostile)
    {
        var rail = FerryLanding.Rail("Rail", hostile, 0.2e3);
        var over = FerryLanding.Rail(hostile, hostile, 1.4e3);
        rail = rail with { Identity = rail.Identity with { Tag = hostile, Storey = hostile }, Material = hostile, Notes = [hostile] };
        await using var report = await chromium.Open(FerryLanding.Record(rail, over), fragment: "#member=" + Uri.EscapeDataString(hostile));
        var title = await report.Page.TitleAsync();

        Assert.Equal([hostile, hostile], await report.Names());
        Assert.Equal(hostile, await report.Selected());
        Assert.Equal(hostile, await report.Page.InnerTextAsync("#table-panel h3"));
        await report.Page.ClickAsync("#table-rows .row >> nth=1");
        Assert.Contains(hostile, await report.Page.InnerTextAsync("#table-panel"), StringComparison.Ordinal);
        Assert.DoesNotContain("taken", title, StringComparison.Ordinal);
        Assert.Equal(title, await report.Page.TitleAsync());
        Assert.Empty(report.Faults);
        var cell = (await report.Page.EvaluateAsync<string>("() => memberScan.table.csv()")).Split("\r\n")[1];
        if (hostile[0] == '=') Assert.Contains("'=HYPERLINK", cell, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Cuts_long_names_and_lets_no_writing_direction_act()
    {
        var record = FerryLanding.Record(FerryLanding.Rail("Rail", new string('x', 10_240), 0.2e3), FerryLanding.Rail("Rail2", "a\u202Eb", 0.3e3));

        await using var report = await chromium.Open(record);

        var names = await report.Names();
        Assert.Equal("a⟨U+202E⟩b", names[0]);
        Assert.EndsWith("… (cut; 10\u202F240 characters in all)", names[1], StringComparison.Ordinal);
        Assert.Equal(1400, await report.Page.EvaluateAsync<int>("() => document.documentElement.scrollWidth"));
    }
}
