using System.Collections.Immutable;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Unicode;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Page;

namespace MemberScan.Reporting.Data;

/// <summary>One row of plain HTML per candidate within its limit, written short: there may be tens of thousands.</summary>
/// <remarks>End tags that HTML lets go are left out. A cell is a paragraph of its own for writing directions, so only what shares a cell is isolated.</remarks>
internal static class PlainRows
{
    private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

    /// <summary>The rows: utilization, member and key, tag, class, section, situation, station, place on the section, notes.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    public static string WithinLimit(ImmutableArray<PlacedMember> members, UnitSet units)
    {
        var rows = new StringBuilder();
        foreach (var (member, anchor) in members)
        {
            var governing = member.Governing!;
            rows.Append("<tr id=\"").Append(s_encoder.Encode(anchor)).Append("\"><td>● ").Append(Figures.Utilization(governing.Utilization));
            rows.Append("<td><bdi>").Append(s_encoder.Encode(ReportView.TitleOf(member))).Append("</bdi> <code>").Append(Text(member.Key)).Append("</code>");
            foreach (var text in new[] { member.Tag, member.Class, governing.Section, governing.Situation }) rows.Append("<td>").Append(Text(text));
            rows.Append("<td>").Append(units.Station(governing.Station)).Append("<td>").Append(Text(governing.Point.Place)).Append("<td>");
            foreach (var note in member.Notes) rows.Append("<bdi>").Append(s_encoder.Encode(ForeignText.Sentence(note))).Append("</bdi><br>");
            rows.Append('\n');
        }

        return rows.ToString();
    }

    private static string Text(string text) => s_encoder.Encode(ForeignText.Name(text));
}
