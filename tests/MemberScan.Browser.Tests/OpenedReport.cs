using System.Collections.Concurrent;
using Microsoft.Playwright;

namespace MemberScan.Browser.Tests;

/// <summary>A report in a browser, with all that it asked for and all that it complained of.</summary>
internal sealed class OpenedReport : IAsyncDisposable
{
    private readonly IBrowserContext _context;

    public OpenedReport(IBrowserContext context, IPage page)
    {
        (_context, Page) = (context, page);
        page.Request += (_, request) => Requests.Add(request.Url);
        page.PageError += (_, error) => Faults.Add(error);
        page.Console += (_, message) =>
        {
            if (message.Type is "error" or "warning" && !message.Text.Contains("GL Driver Message", StringComparison.Ordinal)) Faults.Add(message.Text);
        };
    }

    public IPage Page { get; }

    /// <summary>Addresses asked for, the page itself first.</summary>
    public ConcurrentBag<string> Requests { get; } = [];

    /// <summary>Errors and warnings of the page.</summary>
    public ConcurrentBag<string> Faults { get; } = [];

    /// <summary>Names in the rows of the table that are in sight, from the top.</summary>
    public Task<string[]> Names() => Page.EvaluateAsync<string[]>(
        "() => [...document.querySelectorAll('#table-rows .row')].sort((a, b) => a.dataset.place - b.dataset.place).map(r => memberScan.data.textOf('name', Number(r.id.slice(4))))");

    /// <summary>The line of counts above the table.</summary>
    public Task<string> Count() => Page.InnerTextAsync("#table-count");

    /// <summary>The key of the selected member; empty for none.</summary>
    public Task<string> Selected() => Page.EvaluateAsync<string>("() => memberScan.selected < 0 ? '' : memberScan.data.textOf('key', memberScan.selected)");

    /// <summary>Keeps a picture of the whole page for people to look at.</summary>
    public Task Keep(string name) => Page.ScreenshotAsync(new PageScreenshotOptions { Path = Path.Combine(Chromium.Artifacts, name + ".png"), FullPage = true });

    public ValueTask DisposeAsync() => _context.DisposeAsync();
}
