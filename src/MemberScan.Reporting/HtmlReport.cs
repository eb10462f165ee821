using System.Text.Encodings.Web;
using System.Text.Unicode;
using MemberScan.Reporting.Page;
using MemberScan.Reporting.Style;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;
using Microsoft.Extensions.Logging.Abstractions;

namespace MemberScan.Reporting;

/// <summary>The report: one HTML page that needs no network and no other file, and reads without script.</summary>
/// <remarks>
/// It shows the record and computes nothing. Text from the model is escaped, isolated against its own writing direction, freed of
/// control characters and cut at <see cref="Display.ForeignText.LongestName"/>. Every candidate has one row; sheets of overstressed
/// ones stop at <see cref="ReportView.LargestNumberOfSheets"/>, and the page says so.
/// </remarks>
public static class HtmlReport
{
    /// <summary>The page as text, to be written as UTF-8; line ends are LF. The same records give the same text.</summary>
    /// <param name="record">The finished screening.</param>
    /// <param name="changes">What changed against an earlier run; null when none is given.</param>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number that is shown is not finite.</exception>
    public static string Render(ScreeningRecord record, ComparisonRecord? changes = null)
    {
        SoundRecord.ThrowUnlessSound(record);
        var parameters = ParameterView.FromDictionary(new Dictionary<string, object?>
        {
            [nameof(ReportPage.View)] = new ReportView(record, changes),
            [nameof(ReportPage.Style)] = ReportStyle.For(record),
        });

        using var renderer = new HtmlRenderer(new OnlyEncoder(), NullLoggerFactory.Instance);

        // No component waits for anything, so the task is complete when it returns.
        return renderer.Dispatcher.InvokeAsync(async () =>
        {
            var page = await renderer.RenderComponentAsync<ReportPage>(parameters);
            return page.ToHtmlString().ReplaceLineEndings("\n");
        }).GetAwaiter().GetResult();
    }

    // Letters of all scripts stay as they are; by default each would become a numeric entity.
    private sealed class OnlyEncoder : IServiceProvider
    {
        private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

        public object? GetService(Type serviceType) => serviceType == typeof(HtmlEncoder) ? s_encoder : null;
    }
}
