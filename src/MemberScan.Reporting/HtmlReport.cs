using MemberScan.Reporting.Page;
using MemberScan.Reporting.Sheets;
using MemberScan.Reporting.Style;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting;

/// <summary>The report: one HTML page that needs no network and no other file, and reads without its script.</summary>
/// <remarks>
/// It shows the record and computes nothing. Text from the model is escaped, isolated against its own writing direction, freed of
/// control characters and cut at <see cref="Display.ForeignText.LongestName"/>. Candidates that are not overstressed get one row, and their sheet in packed form; sheets of overstressed
/// ones stop at <see cref="ReportView.LargestNumberOfSheets"/>, and the page says so.
/// </remarks>
public static class HtmlReport
{
    /// <summary>The page as text, to be written as UTF-8; line ends are LF. The same record gives the same text.</summary>
    /// <param name="record">The record.</param>
    /// <param name="sheets">Makes what sheets draw of stress fields; null where only the record is at hand, and sheets show the outline alone.</param>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number that is shown is not finite.</exception>
    public static string Render(ScreeningRecord record, SheetMaker? sheets = null)
    {
        SoundRecord.ThrowUnlessSound(record);
        var view = new ReportView(record, sheets);
        return PageRenderer.Render<ReportPage>(new Dictionary<string, object?>
        {
            [nameof(ReportPage.View)] = view,
            [nameof(ReportPage.Style)] = ReportStyle.For(record, sheets is null ? null : PackedSheets.Script),
            [nameof(ReportPage.PackedSheets)] = sheets is null ? null : PackedSheets.Pack(view.WithoutSheet, sheets),
        });
    }
}
