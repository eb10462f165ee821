using System.Globalization;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Unicode;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Requests;

/// <summary>The information request as one offline page for the modeler: a list per reason with one line that says what helps.</summary>
public static class RequestPage
{
    private const string Style = "body{font:16px/1.5 system-ui,sans-serif;margin:2rem;max-width:80rem;color:#15202b;background:#fff}table{border-collapse:collapse;width:100%}"
        + "th,td{border-bottom:1px solid #b8c2cc;padding:.3rem .6rem;text-align:left;vertical-align:top}code{font-size:.85em}@media print{body{margin:0;font-size:11px}tr{break-inside:avoid}}";

    private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

    /// <summary>The page as text, to be written as UTF-8; line ends are LF.</summary>
    public static string Render(ScreeningRecord record)
    {
        var lines = RequestLine.Of(record);
        var page = new StringBuilder("<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline'\">\n");
        page.Append(CultureInfo.InvariantCulture, $"<title>Information request</title>\n<style>{Style}</style>\n</head>\n<body>\n<h1>Information request: {Text(record.Model.FileName)}</h1>\n");
        page.Append(CultureInfo.InvariantCulture, $"<p>{lines.Count} of {record.Counts.Candidates} candidates could not be checked. Run <code>{Text(record.RunId)}</code>, {Text(record.Timestamp)}, SHA-256 of the model <code>{Text(record.Model.Sha256)}</code>.</p>\n");
        foreach (var group in lines.GroupBy(l => l.Reason.Code)) Group(page, group.Key, [.. group]);
        page.Append("<footer>\n");
        foreach (var caution in record.Cautions) page.Append(CultureInfo.InvariantCulture, $"<p>{Text(caution)}</p>\n");
        return page.Append("</footer>\n</body>\n</html>\n").ToString();
    }

    private static void Group(StringBuilder page, ReasonCode code, List<RequestLine> lines)
    {
        page.Append(CultureInfo.InvariantCulture, $"<h2>{code.Text()}: {lines.Count}</h2>\n<p><b>{Text(code.Request())}</b></p>\n");
        page.Append("<table>\n<thead><tr><th>Member</th><th>Tag</th><th>Class, role (guess)</th><th>Storey</th><th>What was met</th></tr></thead>\n<tbody>\n");
        foreach (var line in lines)
        {
            var m = line.Member;
            page.Append(CultureInfo.InvariantCulture, $"<tr><td>{Text(m.Name)} <code>{Text(m.Key)}</code></td><td>{Text(m.Tag)}</td><td>{Text(m.Class)}, {Text(m.Role)}</td><td>{Text(m.Storey)}</td><td>{Text(line.Reason.Message)}</td></tr>\n");
        }

        page.Append("</tbody>\n</table>\n");
    }

    private static string Text(string text) => text.Length == 0 ? "" : $"<bdi>{s_encoder.Encode(ForeignText.Sentence(text))}</bdi>";
}
