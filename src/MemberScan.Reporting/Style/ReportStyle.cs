using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Style;

/// <summary>The page's one style sheet, with what stands in the margins of each printed page, and its hash for the content policy.</summary>
/// <param name="Text">The style sheet; line ends are LF, and it holds no <c>&lt;</c>, so that nothing in it can end its element.</param>
/// <param name="Policy">The content security policy: nothing may be loaded, only this style sheet and the page's own script, where it has one, apply.</param>
public sealed record ReportStyle(string Text, string Policy)
{
    /// <summary>Most UTF-16 units of the file name in the page margin.</summary>
    public const int LongestMarginText = 60;

    private static readonly string s_sheet = Read("report.css") + "\n" + Read("sheet.css");

    /// <summary>The style sheet for a record.</summary>
    /// <param name="record">The record.</param>
    /// <param name="script">The page's script; null where it has none.</param>
    public static ReportStyle For(ScreeningRecord record, string? script = null)
    {
        ArgumentNullException.ThrowIfNull(record);
        var text = s_sheet + Margins(record);
        var scripts = script is null ? "" : $"script-src {Hash(script)}; ";
        return new ReportStyle(text, $"default-src 'none'; {scripts}style-src {Hash(text)}; base-uri 'none'; form-action 'none'");
    }

    private static string Hash(string text) => $"'sha256-{Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(text)))}'";

    private static string Margins(ScreeningRecord record) =>
        "\n@page {\n"
        + $"  @top-left {{ content: {Quoted(Short(record.Model.FileName))}; }}\n"
        + $"  @top-right {{ content: {Quoted("Run " + Short(record.RunId))}; }}\n"
        + $"  @bottom-left {{ content: {Quoted("MemberScan " + Short(record.Version) + ", screening aid; see the cautions")}; }}\n"
        + "  @bottom-right { content: \"Page \" counter(page) \" of \" counter(pages); }\n"
        + "}\n";

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

    private static string Read(string name)
    {
        using var stream = typeof(ReportStyle).Assembly.GetManifestResourceStream(name)
            ?? throw new InvalidOperationException("The style sheet is missing from the assembly.");
        using var reader = new StreamReader(stream, Encoding.UTF8);
        return reader.ReadToEnd().ReplaceLineEndings("\n");
    }
}
