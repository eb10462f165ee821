using System.Diagnostics;
using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using MemberScan.Browser.Tests.Data;
using MemberScan.Reporting;
using MemberScan.Reporting.Data;
using MemberScan.Reporting.Page;
using Microsoft.Playwright;

namespace MemberScan.Benchmarks.Pages;

/// <summary>The report of 20,000 members in headless Chromium: size, first content, ready, scroll, filter, printed pages.</summary>
internal static class PageTimes
{
    private const int Members = 20_000, Overstressed = 150, NotChecked = 200, Rounds = 3;

    // Each step is timed until two frames are drawn after it.
    private const string Timed = """
        async (step) => {
          const frame = () => new Promise(r => requestAnimationFrame(r));
          const act = new Function('part', 'k', step);
          const times = [];
          for (let k = 0; k < 10; k++) {
            const start = performance.now();
            act((id) => document.getElementById(id), k);
            await frame();
            await frame();
            times.push(performance.now() - start);
          }
          return times.sort((a, b) => a - b);
        }
        """;

    private static readonly (string What, string Step)[] s_steps =
    [
        ("scroll of the table", "part('table-grid').scrollTop = 20000 * (k * 7 % 10)"),
        ("filter by text", "part('filter-text').value = ['rail', 'rod 1', '', 'deck', 'strut', '7', 'l-03', 'full', 'mast', ''][k]; part('filter-text').dispatchEvent(new Event('input'))"),
        ("filter by verdict", "document.querySelectorAll('[name=filter-verdict]')[k % 3].click()"),
        ("sort", "document.querySelector('[data-sort=' + ['name', 'section', 'station', 'tag', 'utilization'][k % 5] + ']').click()"),
        ("selection", "memberScan.select(k * 1999)"),
        ("filter by text with the view in sight", "part('space').scrollIntoView(); part('filter-text').value = ['rail', 'rod 1', '', 'deck', 'strut', '7', 'l-03', 'full', 'mast', ''][k]; part('filter-text').dispatchEvent(new Event('input'))"),
    ];

    /// <summary>Measures and prints; the page and its PDF stay in the folder.</summary>
    public static async Task<int> Print(string folder)
    {
        Directory.CreateDirectory(folder);
        var record = GeneratedLanding.Of(Members, Overstressed, NotChecked);
        var watch = Stopwatch.StartNew();
        var html = HtmlReport.Render(record);
        Line($"rendered in {watch.Elapsed.TotalSeconds:0.00} s");
        Line($"size {Encoding.UTF8.GetByteCount(html) / 1e6:0.00} MB, block of all members {MemberBlock.Write(new ReportView(record)).Length / 1e6:0.00} MB");
        var path = Path.Combine(folder, "landing.report.html");
        await File.WriteAllTextAsync(path, html);

        using var playwright = await Playwright.CreateAsync();
        await using var browser = await playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = "/usr/bin/chromium",
            Headless = true,
            Args = ["--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage"],
        });
        for (var round = 0; round < Rounds; round++) await Open(browser, new Uri(path).AbsoluteUri, round == Rounds - 1 ? folder : null);
        return 0;
    }

    private static async Task Open(IBrowser browser, string address, string? folder)
    {
        await using var context = await browser.NewContextAsync(new BrowserNewContextOptions { ViewportSize = new ViewportSize { Width = 1400, Height = 1000 }, BypassCSP = true });
        var page = await context.NewPageAsync();
        await page.GotoAsync(address);
        await page.EvaluateAsync("() => memberScan.ready");
        var times = await page.EvaluateAsync<double[]>("""
            () => [performance.getEntriesByName('first-contentful-paint')[0]?.startTime ?? NaN, performance.getEntriesByName('members-ready')[0].startTime, performance.getEntriesByName('page-ready')[0].startTime]
            """);
        Line($"first content {times[0]:0} ms, table ready {times[1]:0} ms, all ready {times[2]:0} ms");
        if (folder is null) return;

        foreach (var (what, step) in s_steps)
        {
            var taken = await page.EvaluateAsync<double[]>(Timed, step);
            Line($"{what}: median {taken[taken.Length / 2]:0} ms, largest {taken[^1]:0} ms");
        }

        var watch = Stopwatch.StartNew();
        var pdf = await page.PdfAsync(new PagePdfOptions { PreferCSSPageSize = true, PrintBackground = true });
        await File.WriteAllBytesAsync(Path.Combine(folder, "landing.report.pdf"), pdf);
        Line($"PDF: {Regex.Count(Encoding.Latin1.GetString(pdf), @"/Type\s*/Page\b")} pages, {pdf.Length / 1e6:0.0} MB, in {watch.Elapsed.TotalSeconds:0.0} s");
    }

    private static void Line(FormattableString text) => Console.WriteLine(text.ToString(CultureInfo.InvariantCulture));
}
