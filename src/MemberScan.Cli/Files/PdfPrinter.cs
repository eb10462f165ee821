using System.ComponentModel;
using System.Diagnostics;

namespace MemberScan.Cli.Files;

/// <summary>Prints a report to PDF with a Chromium of the machine, headless and without a network.</summary>
internal static class PdfPrinter
{
    /// <summary>The longest that printing may take.</summary>
    public static readonly TimeSpan Longest = TimeSpan.FromMinutes(5);

    private static readonly string[] s_names = ["chromium", "chromium-browser", "google-chrome", "google-chrome-stable", "chrome.exe", "msedge.exe"];

    // Only what starts it: every address but the file itself is barred by the page's own policy.
    private static readonly string[] s_flags =
    [
        "--headless", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync",
        "--disable-dev-shm-usage", "--no-pdf-header-footer",
    ];

    /// <summary>The browser on the search path.</summary>
    /// <exception cref="Failure">There is none.</exception>
    public static string Find() =>
        (Environment.GetEnvironmentVariable("PATH") ?? "").Split(Path.PathSeparator, StringSplitOptions.RemoveEmptyEntries)
            .SelectMany(folder => s_names.Select(name => Path.Combine(folder, name))).FirstOrDefault(File.Exists)
        ?? throw new Failure(ExitCodes.Usage, "--pdf needs Chromium on the search path (Debian package chromium); install it, or print the .report.html from a browser. Nothing was written.");

    /// <summary>The PDF file of a page.</summary>
    /// <exception cref="Failure">The browser does not start, does not end or writes nothing.</exception>
    public static byte[] Print(string browser, string html, CancellationToken cancellation)
    {
        var folder = Directory.CreateTempSubdirectory("memberscan-pdf");
        try
        {
            var (page, pdf) = (Path.Combine(folder.FullName, "report.html"), Path.Combine(folder.FullName, "report.pdf"));
            File.WriteAllText(page, html);
            Run(browser, [.. s_flags, $"--user-data-dir={Path.Combine(folder.FullName, "profile")}", $"--print-to-pdf={pdf}", new Uri(page).AbsoluteUri], cancellation);
            return File.Exists(pdf) ? File.ReadAllBytes(pdf) : throw Failed(browser, "it wrote no file");
        }
        finally
        {
            // A browser that was stopped may still write into its profile for a moment.
            try
            {
                folder.Delete(recursive: true);
            }
            catch (IOException)
            {
            }
        }
    }

    private static void Run(string browser, IReadOnlyList<string> arguments, CancellationToken cancellation)
    {
        var start = new ProcessStartInfo(browser) { RedirectStandardError = true, RedirectStandardOutput = true };

        // Its sandbox does not run as root.
        if (Environment.IsPrivilegedProcess && !OperatingSystem.IsWindows()) start.ArgumentList.Add("--no-sandbox");
        foreach (var argument in arguments) start.ArgumentList.Add(argument);
        try
        {
            using var process = Process.Start(start)!;
            var (output, error) = (process.StandardOutput.ReadToEndAsync(cancellation), process.StandardError.ReadToEndAsync(cancellation));
            Wait(process, browser, cancellation);
            Task.WaitAll([output, error], cancellation);
            if (process.ExitCode != 0) throw Failed(browser, $"it ended with code {process.ExitCode}");
        }
        catch (Win32Exception e)
        {
            throw Failed(browser, e.Message);
        }
    }

    private static void Wait(Process process, string browser, CancellationToken cancellation)
    {
        using var limit = CancellationTokenSource.CreateLinkedTokenSource(cancellation);
        limit.CancelAfter(Longest);
        try
        {
            process.WaitForExitAsync(limit.Token).GetAwaiter().GetResult();
        }
        catch (OperationCanceledException)
        {
            process.Kill(entireProcessTree: true);
            cancellation.ThrowIfCancellationRequested();
            throw Failed(browser, "it took too long");
        }
    }

    private static Failure Failed(string browser, string why) =>
        new(ExitCodes.InputOutput, $"The report could not be printed with '{browser}': {why}. Nothing was changed; leave --pdf out or print the report from a browser.");
}
