using MemberScan.Reporting.Page;
using MemberScan.Reporting.Script;
using MemberScan.Reporting.Sheets.Packed;
using MemberScan.Reporting.Style;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting;

/// <summary>The report: one HTML page that needs no network and no other file, and reads without script.</summary>
/// <remarks>
/// It shows the record and computes nothing. Text from the model is escaped, isolated against its own writing direction, freed of
/// control characters and cut at <see cref="Display.ForeignText.LongestName"/>. Every candidate has one row; those that are not overstressed have their sheet in packed form, sheets of overstressed
/// ones stop at <see cref="ReportView.LargestNumberOfSheets"/>, and the page says so.
/// </remarks>
public static class HtmlReport
{
    /// <summary>The page as text, to be written as UTF-8; line ends are LF. The same records give the same text.</summary>
    /// <param name="record">The finished screening.</param>
    /// <param name="changes">What changed against an earlier run; null when none is given.</param>
    /// <param name="sheets">Makes what sheets draw of stress fields; null where only the record is at hand, and sheets show the outline alone.</param>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number that is shown is not finite.</exception>
    public static string Render(ScreeningRecord record, ComparisonRecord? changes = null, SheetMaker? sheets = null)
    {
        SoundRecord.ThrowUnlessSound(record);
        var view = new ReportView(record, changes, sheets);
        return PageRenderer.Render<ReportPage>(new Dictionary<string, object?>
        {
            [nameof(ReportPage.View)] = view,
            [nameof(ReportPage.Style)] = ReportStyle.For(record, PageScripts.Embedded.Sources),
            [nameof(ReportPage.PackedSheets)] = sheets is null ? null : PackedSheets.Pack(view.WithoutSheet, sheets),
        });
    }
}
