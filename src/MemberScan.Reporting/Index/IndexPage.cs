using System.Globalization;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Unicode;
using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Index;

/// <summary>Several models as one offline page: a line per model, then the overstressed of all of them, worst first; no script, no network.</summary>
public static class IndexPage
{
    /// <summary>Rows of overstressed candidates; further ones are in the reports of the models.</summary>
    public const int MostOverstressed = 5000;

    private const string Style = "body{font:16px/1.5 system-ui,sans-serif;margin:2rem;max-width:96rem;color:#15202b;background:#fff}table{border-collapse:collapse;width:100%;margin:1rem 0}"
        + "th,td{border-bottom:1px solid #b8c2cc;padding:.3rem .6rem;text-align:left;vertical-align:top}td.n,th.n{text-align:right;font-variant-numeric:tabular-nums}"
        + ".first{font-weight:700}code{font-size:.85em}@media print{body{margin:0;font-size:11px}tr{break-inside:avoid}}";

    private static readonly HtmlEncoder s_encoder = HtmlEncoder.Create(UnicodeRanges.All);

    /// <summary>The page as text, to be written as UTF-8; line ends are LF.</summary>
    /// <param name="models">The models, in the order given; shown in that order.</param>
    /// <param name="version">Version of the program.</param>
    public static string Render(IReadOnlyList<ModelEntry> models, string version)
    {
        ArgumentNullException.ThrowIfNull(models);
        var page = new StringBuilder("<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n");
        page.Append("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline'\">\n");
        page.Append("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<title>Models screened</title>\n<style>").Append(Style).Append("</style>\n</head>\n<body>\n<h1>Models screened</h1>\n");
        Totals(page, models);
        Models(page, models);
        Overstressed(page, models);
        page.Append("<footer>\n");
        foreach (var caution in models.SelectMany(m => m.Cautions).Distinct(StringComparer.Ordinal)) page.Append("<p>").Append(Text(caution)).Append("</p>\n");
        return page.Append("<p>MemberScan ").Append(Text(version)).Append("</p>\n</footer>\n</body>\n</html>\n").ToString();
    }

    private static void Totals(StringBuilder page, IReadOnlyList<ModelEntry> models)
    {
        var counts = models.Select(m => m.Counts).Where(c => c is not null).ToList();
        var failed = models.Count(m => m.Failure.Length > 0);
        page.Append(CultureInfo.InvariantCulture, $"<p class=\"first\">{models.Count} models: {models.Count - failed} screened + {failed} not screened. Of those screened: ");
        page.Append(CultureInfo.InvariantCulture, $"{counts.Sum(c => c!.WithinLimit)} within limit + {counts.Sum(c => c!.Overstressed)} overstressed + {counts.Sum(c => c!.NotChecked)} not checked = {counts.Sum(c => c!.Candidates)} candidates.</p>\n");
    }

    private static void Models(StringBuilder page, IReadOnlyList<ModelEntry> models)
    {
        page.Append("<table>\n<thead><tr><th>Model</th><th>Outcome</th><th class=\"n\">Within limit</th><th class=\"n\">Overstressed</th><th class=\"n\">Not checked</th><th class=\"n\">Candidates</th><th class=\"n\">Worst</th><th>Run</th></tr></thead>\n<tbody>\n");
        foreach (var model in models)
        {
            page.Append("<tr><td>").Append(model.Report.Length > 0 ? $"<a href=\"{Link(model.Report)}\">{Text(model.Path)}</a>" : Text(model.Path)).Append("</td><td>").Append(Text(model.Outcome));
            if (model.Failure.Length > 0) page.Append(CultureInfo.InvariantCulture, $" (exit code {model.ExitCode}): ").Append(Text(model.Failure));
            else if (model.HasDamage) page.Append("; damage was passed over");
            page.Append("</td>");
            foreach (var count in new[] { model.Counts?.WithinLimit, model.Counts?.Overstressed, model.Counts?.NotChecked, model.Counts?.Candidates })
                page.Append("<td class=\"n\">").Append(count is { } number ? number.ToString(CultureInfo.InvariantCulture) : "–").Append("</td>");
            page.Append("<td class=\"n\">").Append(model.Overstressed.FirstOrDefault() is { } worst ? "▲ " + Figures.Utilization(worst.Utilization) : "–");
            page.Append("</td><td><code>").Append(Text(model.RunId)).Append("</code> ").Append(Text(model.Timestamp)).Append("</td></tr>\n");
        }

        page.Append("</tbody>\n</table>\n");
    }

    private static void Overstressed(StringBuilder page, IReadOnlyList<ModelEntry> models)
    {
        var all = models.SelectMany(model => model.Overstressed.Select(member => (Model: model, Member: member))).OrderByDescending(e => e.Member.Utilization).ToList();
        page.Append(CultureInfo.InvariantCulture, $"<h2>Overstressed: {all.Count}</h2>\n");
        if (all.Count == 0) return;

        page.Append("<table>\n<thead><tr><th class=\"n\">Utilization</th><th>Model</th><th>Member</th><th>Tag</th><th>Section</th><th>Criterion</th><th>Situation</th><th class=\"n\">x [m]</th><th>Where</th></tr></thead>\n<tbody>\n");
        foreach (var (model, member) in all.Take(MostOverstressed))
        {
            var name = $"{Text(member.Name)} <code>{Text(member.Key)}</code>";
            page.Append("<tr><td class=\"n\">▲ ").Append(Figures.Utilization(member.Utilization)).Append("</td><td>").Append(Text(model.Path)).Append("</td><td>")
                .Append(model.Report.Length > 0 ? $"<a href=\"{Link(model.Report)}#{s_encoder.Encode(MemberAnchors.Of(member.Key))}\">{name}</a>" : name).Append("</td><td>").Append(Text(member.Tag))
                .Append("</td><td>").Append(Text(member.Section)).Append("</td><td>").Append(Text(member.Criterion)).Append("</td><td>").Append(Text(member.Situation))
                .Append("</td><td class=\"n\">").Append(Figures.Plain(member.Station)).Append("</td><td>").Append(Text(member.Place)).Append("</td></tr>\n");
        }

        page.Append("</tbody>\n</table>\n");
        if (all.Count > MostOverstressed) page.Append(CultureInfo.InvariantCulture, $"<p>{all.Count - MostOverstressed} more overstressed, all with a lower utilization, are in the reports of the models.</p>\n");
    }

    // A name may hold what is a mark of an address ('#', '?', '%', ':'); each part is written so that it is a name again.
    private static string Link(string path) => s_encoder.Encode("./" + string.Join('/', path.Split('/').Select(Uri.EscapeDataString)));

    private static string Text(string text) => text.Length == 0 ? "" : $"<bdi>{s_encoder.Encode(ForeignText.Sentence(text))}</bdi>";
}
