using System.Text.RegularExpressions;
using MemberScan.Browser.Tests.Data;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;
using Microsoft.Playwright;
using UglyToad.PdfPig;

namespace MemberScan.Browser.Tests;

/// <summary>The printed report, read back with an independent PDF reader.</summary>
public sealed class PaperTests(Chromium chromium) : IClassFixture<Chromium>
{
    private static readonly ScreeningRecord s_record = GeneratedLanding.Of(300, 24, 20);

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task Carries_run_revision_and_page_number_on_each_page(bool withScript)
    {
        var pages = await Pages(s_record, withScript, "landing");

        Assert.InRange(pages.Count, 6, 60);
        for (var i = 0; i < pages.Count; i++)
        {
            Assert.Contains(Tight($"Page {i + 1} of {pages.Count}"), pages[i], StringComparison.Ordinal);
            Assert.Contains(s_record.RunId, pages[i], StringComparison.Ordinal);
            Assert.Contains(Tight("Revision 9b1c6e0f4f0a, 2031-03-28T16:40:11"), pages[i], StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task Holds_summary_every_overstressed_and_every_unchecked_member_and_not_the_rest()
    {
        var text = string.Concat(await Pages(s_record, true, "landing"));

        Assert.Contains(Tight("256 within limit + 24 overstressed + 20 not checked = 300 candidates"), text, StringComparison.Ordinal);
        foreach (var member in s_record.Members.Where(m => m.Verdict != Verdict.WithinLimit)) Assert.Contains(Tight(member.Name), text, StringComparison.Ordinal);
        var inWorst = s_record.Members.Where(m => m.Governing is not null).OrderByDescending(m => m.Governing!.Utilization).Take(10).ToHashSet();
        Assert.DoesNotContain(s_record.Members.Where(m => m.Verdict == Verdict.WithinLimit && !inWorst.Contains(m)), m => text.Contains(Tight(m.Name), StringComparison.Ordinal));
    }

    [Fact]
    public async Task Prints_ten_full_sheets_and_four_of_the_others_on_a_page()
    {
        var pages = await Pages(s_record, true, "landing");

        Assert.Equal(10, pages.Sum(p => Regex.Count(p, "Whereeachinputcomesfrom")));
        Assert.Equal(14, pages.Sum(p => Regex.Count(p, "Stressesthere")));
        Assert.True(pages.Max(p => Regex.Count(p, "Stressesthere")) == 4);
    }

    [Fact]
    public async Task Repeats_the_head_of_a_table_on_each_page()
    {
        var pages = await Pages(GeneratedLanding.Of(300, 2, 200), true, "not-checked");

        var listed = pages.Where(p => Regex.Count(p, Tight("Trapeze strut")) > 3).ToList();
        Assert.True(listed.Count >= 3);
        Assert.All(listed, p => Assert.Contains("Utilizationknown", p, StringComparison.Ordinal));
    }

    private async Task<List<string>> Pages(ScreeningRecord record, bool withScript, string name)
    {
        await using var report = await chromium.Open(record, new BrowserNewContextOptions { JavaScriptEnabled = withScript });
        var path = Path.Combine(Chromium.Artifacts, name + (withScript ? "" : "-no-script") + ".pdf");
        var file = await report.Page.PdfAsync(new PagePdfOptions { PreferCSSPageSize = true, PrintBackground = true });
        await File.WriteAllBytesAsync(path, file, TestContext.Current.CancellationToken);
        using var pdf = PdfDocument.Open(file);
        return [.. pdf.GetPages().Select(p => Tight(p.Text))];
    }

    // Readers of PDF differ in where they put blanks.
    private static string Tight(string text) => Regex.Replace(text, @"\s", "");
}
