using System.Globalization;
using System.Text;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Space;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Style;

/// <summary>The page's one style sheet, with what stands in the margins of each printed page, and its hash for the content policy.</summary>
/// <param name="Text">The style sheet; line ends are LF, and it holds no <c>&lt;</c>, so that nothing in it can end its element.</param>
/// <param name="Policy">The content security policy: nothing may be loaded, only this style sheet applies and only the embedded scripts run, where the page has any.</param>
public sealed record ReportStyle(string Text, string Policy)
{
    /// <summary>Most UTF-16 units of the file name in the page margin.</summary>
    public const int LongestMarginText = 60;

    /// <summary>Digits of the model's SHA-256 in the page margin.</summary>
    public const int RevisionDigits = 12;

    // The members' colours follow the sheet: they are data of the scale.
    private static readonly string s_sheet = Read("report.css") + Read("members.css") + Read("sheet.css") + ScaleRules();

    /// <summary>The style sheet for a record.</summary>
    /// <param name="record">The record.</param>
    /// <param name="scripts">Sources of the page's scripts, as the policy names them; null where it has none.</param>
    public static ReportStyle For(ScreeningRecord record, string? scripts = null)
    {
        ArgumentNullException.ThrowIfNull(record);
        var text = s_sheet + Margins(record);
        var ofScripts = scripts is null ? "" : $"script-src {scripts}; ";
        return new ReportStyle(text, $"default-src 'none'; style-src {EmbeddedText.PolicySource(text)}; {ofScripts}base-uri 'none'; form-action 'none'");
    }

    private static string Margins(ScreeningRecord record) =>
        "\n@page {\n"
        + $"  @top-left {{ content: {Quoted(Short(record.Model.FileName))}; }}\n"
        + $"  @top-right {{ content: {Quoted("Run " + Short(record.RunId))}; }}\n"
        + $"  @bottom-left {{ content: {Quoted("MemberScan " + Short(record.Version) + ", screening aid, see the cautions")}; }}\n"
        + $"  @top-center {{ content: {Quoted(Revision(record))}; }}\n"
        + "  @bottom-right { content: \"Page \" counter(page) \" of \" counter(pages); }\n"
        + "}\n";

    // Which state of the model was screened: the beginning of its hash and the time stamp of its header.
    private static string Revision(ScreeningRecord record)
    {
        var (hash, time) = (record.Model.Sha256, record.Model.TimeStamp);
        return $"Revision {Short(hash[..Math.Min(hash.Length, RevisionDigits)])}{(time.Length > 0 ? ", " + Short(time) : "")}";
    }

    private static string ScaleRules()
    {
        var rules = new StringBuilder();
        for (var i = 0; i < UtilizationScale.All.Length; i++)
        {
            var (colour, isOver, isOpen) = (UtilizationScale.All[i].Colour, i >= UtilizationScale.UpToLimit.Length, i == UtilizationScale.All.Length - 1);
            var stroke = isOpen ? "stroke: var(--open); stroke-dasharray: 3 2;" : isOver ? $"stroke: {colour}; stroke-width: 2.6;" : $"stroke: {colour};";
            var ground = isOpen ? $"radial-gradient(circle, #5d5413 1.2px, {colour} 1.6px) 0 0 / 6px 6px"
                : isOver ? $"repeating-linear-gradient(135deg, #ffeed9 0 2px, {colour} 2px 6px)" : colour;
            rules.Append(CultureInfo.InvariantCulture, $"\n.step{i} {{ {stroke} }}\n.patch{i} {{ background: {ground}; }}");
        }

        return rules.Append('\n').ToString();
    }

    private static string Short(string text)
    {
        var visible = ForeignText.Visible(text);
        if (visible.Length <= LongestMarginText) return visible;

        var end = char.IsHighSurrogate(visible[LongestMarginText - 1]) ? LongestMarginText - 1 : LongestMarginText;
        return visible[..end] + "…";
    }

    // Everything but plain letters, digits and blanks is written as a CSS escape: a name cannot leave its string.
    private static string Quoted(string text)
    {
        var quoted = new StringBuilder("\"");
        foreach (var rune in text.EnumerateRunes())
        {
            if (rune.Value is ' ' or '.' or '-' or '_' or ',' or ';' || (rune.IsAscii && Rune.IsLetterOrDigit(rune))) quoted.Append(rune.ToString());
            else quoted.Append(CultureInfo.InvariantCulture, $"\\{rune.Value:X} ");
        }

        return quoted.Append('"').ToString();
    }

    private static string Read(string name) => EmbeddedText.Find(name) ?? throw new InvalidOperationException("A style sheet is missing from the assembly.");
}
