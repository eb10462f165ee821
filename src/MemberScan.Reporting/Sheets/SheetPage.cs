using MemberScan.Reporting.Page;
using MemberScan.Reporting.Style;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets;

/// <summary>The sheet of one candidate as a page of its own: no network, no script, no other file.</summary>
public static class SheetPage
{
    /// <summary>The page as text, to be written as UTF-8; line ends are LF.</summary>
    /// <param name="record">The run.</param>
    /// <param name="member">The candidate, one of the run's.</param>
    /// <param name="sheets">Makes what the sheet draws; null where only the record is at hand.</param>
    /// <exception cref="ArgumentException">The record contradicts itself, or the candidate is none of its members.</exception>
    public static string Render(ScreeningRecord record, MemberResult member, SheetMaker? sheets)
    {
        SoundRecord.ThrowUnlessSound(record);
        var placed = Placed(record, member, sheets);
        return PageRenderer.Render<SheetDocument>(new Dictionary<string, object?>
        {
            [nameof(SheetDocument.Record)] = record,
            [nameof(SheetDocument.Placed)] = placed,
            [nameof(SheetDocument.Style)] = ReportStyle.For(record),
        });
    }

    /// <summary>A candidate with its place.</summary>
    internal static PlacedMember Placed(ScreeningRecord record, MemberResult member, SheetMaker? sheets)
    {
        ArgumentNullException.ThrowIfNull(member);
        return new ReportView(record, sheets: sheets).Find(member) ?? throw new ArgumentException("The candidate is none of the run's members.", nameof(member));
    }
}
