using System.Globalization;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Unicode;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Comparison;

/// <summary>A comparison as one offline page: no script, no network, no other file.</summary>
public static class ComparisonPage
{
    /// <summary>Rows of candidates whose verdict did not move; further ones are in the CSV and JSON files.</summary>
    public const int MostUnmoved = 2000;

    private const string Style = "body{font:16px/1.5 system-ui,sans-serif;margin:2rem;max-width:90rem;color:#15202b;background:#fff}table{border-collapse:collapse;width:100%;margin:1rem 0}"
        + "th,td{border-bottom:1px solid #b8c2cc;padding:.3rem .6rem;text-align:left;vertical-align:top}td.n,th.n{text-align:right;font-variant-numeric:tabular-nums}"
        + ".worse{font-weight:700}code{font-size:.85em}@media print{body{margin:0;font-size:11px}tr{break-inside:avoid}}";

    private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

    /// <summary>The page as text, to be written as UTF-8; line ends are LF.</summary>
    public static string Render(ComparisonRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        var page = new StringBuilder("<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n");
        page.Append("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline'\">\n");
        page.Append("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<title>Two screenings compared</title>\n<style>").Append(Style).Append("</style>\n</head>\n<body>\n<h1>Two screenings compared</h1>\n");
        page.Append("<table>\n<thead><tr><th></th><th>Model</th><th>Run</th><th>Time</th><th>Program</th><th>Candidates</th></tr></thead>\n<tbody>\n");
        Run(page, "earlier", record.Earlier);
        Run(page, "later", record.Later);
        page.Append("</tbody>\n</table>\n");
        List(page, record.RunChanges);
        Totals(page, record);
        Members(page, record);
        page.Append("<footer>\n");
        foreach (var caution in record.Later.Cautions) page.Append("<p>").Append(Text(caution)).Append("</p>\n");
        return page.Append("</footer>\n</body>\n</html>\n").ToString();
    }

    private static void Run(StringBuilder page, string word, ScreeningRecord run) => page.Append(CultureInfo.InvariantCulture,
        $"<tr><th scope=\"row\">{word}</th><td>{Text(run.Model.FileName)} <code>{Text(run.Model.Sha256)}</code></td><td><code>{Text(run.RunId)}</code></td><td>{Text(run.Timestamp)}</td><td>{Text(run.Version)}</td><td>{run.Counts.WithinLimit} within limit + {run.Counts.Overstressed} overstressed + {run.Counts.NotChecked} not checked = {run.Counts.Candidates}</td></tr>\n");

    private static void List(StringBuilder page, IReadOnlyCollection<string> lines)
    {
        if (lines.Count == 0) return;
        page.Append("<ul>\n");
        foreach (var line in lines) page.Append("<li>").Append(Text(line)).Append("</li>\n");
        page.Append("</ul>\n");
    }

    private static void Totals(StringBuilder page, ComparisonRecord record)
    {
        page.Append("<h2>What moved</h2>\n<table>\n<thead><tr><th>Outcome</th><th class=\"n\">Candidates</th></tr></thead>\n<tbody>\n");
        foreach (var movement in Enum.GetValues<Movement>())
            page.Append(CultureInfo.InvariantCulture, $"<tr><td>{MovementText.Of(movement)}</td><td class=\"n\">{record.Count(movement)}</td></tr>\n");
        page.Append(CultureInfo.InvariantCulture, $"<tr><td>of these re-identified under another GlobalId</td><td class=\"n\">{record.Reidentified}</td></tr>\n");
        page.Append(CultureInfo.InvariantCulture, $"<tr><td>of these worse than before</td><td class=\"n\">{record.Members.Count(m => m.IsWorse)}</td></tr>\n</tbody>\n</table>\n");
    }

    private static void Members(StringBuilder page, ComparisonRecord record)
    {
        page.Append("<h2>Candidates</h2>\n<table>\n<thead><tr><th>Outcome</th><th>Member</th><th>Tag</th><th class=\"n\">Earlier</th><th class=\"n\">Later</th><th>Changed inputs</th></tr></thead>\n<tbody>\n");
        var unmoved = 0;
        foreach (var member in record.Members)
        {
            if (member.Movement >= Movement.ChangedInput && ++unmoved > MostUnmoved) continue;
            var name = member.Latest.Name.Length > 0 ? member.Latest.Name : member.Latest.Class;
            page.Append(CultureInfo.InvariantCulture, $"<tr><td{(member.IsWorse ? " class=\"worse\"" : "")}>{(member.IsWorse ? "▲ " : "")}{Text(member.Words)}</td><td>{Text(name)} <code>{Text(member.Latest.Key)}</code></td><td>{Text(member.Latest.Tag)}</td><td class=\"n\">{State(member.Earlier)}</td><td class=\"n\">{State(member.Later)}</td><td>{string.Join("<br>", member.Changes.Select(Change))}</td></tr>\n");
        }

        page.Append("</tbody>\n</table>\n");
        if (unmoved > MostUnmoved) page.Append(CultureInfo.InvariantCulture, $"<p>{unmoved - MostUnmoved} more whose verdict did not move are in the tables only.</p>\n");
    }

    private static string Change(InputChange change) => change.Earlier.Length + change.Later.Length == 0 ? change.What : $"{change.What}: {Text(change.Earlier)} → {Text(change.Later)}";

    private static string State(MemberResult? member) => member is null ? "–"
        : member.Governing is { } governing ? $"{member.Verdict.Symbol()} {Figures.Utilization(governing.Utilization)}" : $"{member.Verdict.Symbol()} {member.Verdict.Word()}";

    private static string Text(string text) => text.Length == 0 ? "" : $"<bdi>{s_encoder.Encode(ForeignText.Sentence(text))}</bdi>";
}
