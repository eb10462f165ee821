using System.Globalization;
using MemberScan.Reporting;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;
using Microsoft.Playwright;

namespace MemberScan.Browser.Tests;

/// <summary>Debian's Chromium, headless, once for all tests; missing, each test fails and says so.</summary>
public sealed class Chromium : IAsyncLifetime
{
    private static readonly string[] s_paths = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];
    private readonly string _folder = Directory.CreateTempSubdirectory("memberscan-browser").FullName;
    private IPlaywright? _playwright;
    private IBrowser? _browser;
    private int _number;

    /// <summary>Pictures that a person looks at are kept here.</summary>
    public static string Artifacts { get; } = Directory.CreateDirectory(Path.Combine(AppContext.BaseDirectory, "artifacts")).FullName;

    /// <inheritdoc />
    public async ValueTask InitializeAsync()
    {
        var path = s_paths.FirstOrDefault(File.Exists) ?? throw new InvalidOperationException("These tests need Chromium (Debian package 'chromium'); tests/run.sh installs it.");
        _playwright = await Playwright.CreateAsync();
        _browser = await _playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = path,
            Headless = true,
            Args = ["--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage"],
        });
    }

    /// <inheritdoc />
    public async ValueTask DisposeAsync()
    {
        if (_browser is not null) await _browser.DisposeAsync();
        _playwright?.Dispose();
        Directory.Delete(_folder, recursive: true);
    }

    /// <summary>Writes the report of a record and opens it from its file, as a reader would.</summary>
    internal Task<OpenedReport> Open(ScreeningRecord record, BrowserNewContextOptions? options = null, string? fragment = null, string? before = null, ComparisonRecord? changes = null) =>
        OpenText(HtmlReport.Render(record, changes), options, fragment, before);

    /// <summary>Opens a page of this text.</summary>
    internal async Task<OpenedReport> OpenText(string html, BrowserNewContextOptions? options = null, string? fragment = null, string? before = null)
    {
        var path = Path.Combine(_folder, string.Create(CultureInfo.InvariantCulture, $"report-{Interlocked.Increment(ref _number)}.html"));
        await File.WriteAllTextAsync(path, html, TestContext.Current.CancellationToken);
        options ??= new BrowserNewContextOptions { ViewportSize = new ViewportSize { Width = 1400, Height = 1000 } };
        var context = await _browser!.NewContextAsync(options);
        if (before is not null) await context.AddInitScriptAsync(before);
        var opened = new OpenedReport(context, await context.NewPageAsync());
        await opened.Page.GotoAsync(new Uri(path).AbsoluteUri + fragment);
        if (options.JavaScriptEnabled != false) await opened.Page.EvaluateAsync("() => memberScan.ready");
        return opened;
    }
}
