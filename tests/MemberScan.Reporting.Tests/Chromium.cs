using System.Diagnostics;
using System.Text;

namespace MemberScan.Reporting.Tests;

/// <summary>Debian's Chromium, headless and without a network.</summary>
internal static class Chromium
{
    private static readonly string[] s_flags =
    [
        "--headless", "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking",
        "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage", "--host-resolver-rules=MAP * ~NOTFOUND",
    ];

    /// <summary>Runs it to its end and gives its output; skips, saying so, where it is absent.</summary>
    public static string Run(DirectoryInfo folder, params string[] arguments)
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
