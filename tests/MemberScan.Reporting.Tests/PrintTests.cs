using System.Text;
using System.Text.RegularExpressions;

namespace MemberScan.Reporting.Tests;

/// <summary>The page in a real browser, without a network: Debian's Chromium, headless.</summary>
public sealed class PrintTests
{
    [Fact]
    public void Prints_to_several_pages()
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-print");
        try
        {
            var page = Path.Combine(folder.FullName, "landing.html");
            var pdf = Path.Combine(folder.FullName, "landing.pdf");
            File.WriteAllText(page, HtmlReport.Render(FerryLanding.Small()), new UTF8Encoding(false));

            Chromium.Run(folder, "--no-pdf-header-footer", $"--print-to-pdf={pdf}", new Uri(page).AbsoluteUri);

            var text = Encoding.Latin1.GetString(File.ReadAllBytes(pdf));
            Assert.StartsWith("%PDF-", text, StringComparison.Ordinal);
            Assert.True(Regex.Count(text, @"/Type\s*/Page\b") >= 3, "fewer pages than summary, sheet and lists need");
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    [Fact]
    public void Shows_the_same_text_in_a_browser_as_in_the_file()
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-page");
        try
        {
            var page = Path.Combine(folder.FullName, "landing.html");
            var record = FerryLanding.Small();
            File.WriteAllText(page, HtmlReport.Render(record), new UTF8Encoding(false));

            var shown = Chromium.Run(folder, "--dump-dom", new Uri(page).AbsoluteUri);

            Assert.Contains($"= {record.Counts.Candidates} candidates", shown, StringComparison.Ordinal);
            Assert.Contains(record.RunId, shown, StringComparison.Ordinal);
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }
}
