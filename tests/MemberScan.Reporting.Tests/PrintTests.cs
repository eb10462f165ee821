using System.Diagnostics;
using System.Text;
using System.Text.RegularExpressions;

namespace MemberScan.Reporting.Tests;

/// <summary>The page in a real browser, without a network: Debian's Chromium, headless.</summary>
public sealed class PrintTests
{
    private static readonly string[] s_flags =
    [
        "--headless", "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking",
        "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage",
    ];

    [Fact]
    public void Prints_to_several_pages()
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-print");
        try
        {
            var page = Path.Combine(folder.FullName, "landing.html");
            var pdf = Path.Combine(folder.FullName, "landing.pdf");
            File.WriteAllText(page, HtmlReport.Render(FerryLanding.Small()), new UTF8Encoding(false));

            Browse(folder, "--no-pdf-header-footer", $"--print-to-pdf={pdf}", new Uri(page).AbsoluteUri);

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

            var shown = Browse(folder, "--dump-dom", new Uri(page).AbsoluteUri);

            Assert.Contains($"= {record.Counts.Candidates} candidates", shown, StringComparison.Ordinal);
            Assert.Contains(record.RunId, shown, StringComparison.Ordinal);
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    private static string Browse(DirectoryInfo folder, params string[] arguments)
    {
        const string Browser = "/usr/bin/chromium";
        Assert.SkipUnless(File.Exists(Browser), "Chromium is not installed (Debian package chromium)");
        var start = new ProcessStartInfo(Browser) { RedirectStandardOutput = true, RedirectStandardError = true, StandardOutputEncoding = Encoding.UTF8 };
        foreach (var argument in s_flags.Append($"--user-data-dir={Path.Combine(folder.FullName, "profile")}").Concat(arguments)) start.ArgumentList.Add(argument);

        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        var output = process.StandardOutput.ReadToEnd();
        Assert.True(process.WaitForExit(TimeSpan.FromMinutes(2)), "Chromium did not end");
        Assert.True(process.ExitCode == 0, errors.GetAwaiter().GetResult());
        return output;
    }
}
