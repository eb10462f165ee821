using System.Globalization;
using System.Text;

namespace MemberScan.Reporting.Display;

/// <summary>Text that comes from a model or table, made fit to be shown: nothing invisible acts, nothing endless fills the page.</summary>
public static class ForeignText
{
    /// <summary>Most UTF-16 units of a name, tag, key or designation that are shown.</summary>
    public const int LongestName = 160;

    /// <summary>Most UTF-16 units of a sentence, note or formula that are shown.</summary>
    public const int LongestSentence = 1200;

    /// <summary>A name: cut at <see cref="LongestName"/> with a remark.</summary>
    public static string Name(string? text) => Shown(text, LongestName);

    /// <summary>A sentence: cut at <see cref="LongestSentence"/> with a remark.</summary>
    public static string Sentence(string? text) => Shown(text, LongestSentence);

    /// <summary>Control characters as their pictures (U+2400 and following), bidirectional controls and lone surrogates spelled out.</summary>
    /// <remarks>Line feeds, carriage returns and tabs have pictures too: in a table cell they would only be mistaken for blanks.</remarks>
    public static string Visible(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        var shown = new StringBuilder(text.Length);
        for (var at = 0; at < text.Length; at++)
        {
            var unit = text[at];
            if (char.IsHighSurrogate(unit) && at + 1 < text.Length && char.IsLowSurrogate(text[at + 1])) shown.Append(unit).Append(text[++at]);
            else if (unit < 0x20) shown.Append((char)(0x2400 + unit));
            else if (unit == 0x7F) shown.Append('\u2421');
            else if (IsSpelledOut(unit)) shown.Append(CultureInfo.InvariantCulture, $"⟨U+{(int)unit:X4}⟩");
            else shown.Append(unit);
        }

        return shown.ToString();
    }

    private static string Shown(string? text, int longest)
    {
        if (string.IsNullOrEmpty(text)) return "";
        if (text.Length <= longest) return Visible(text);

        var end = char.IsHighSurrogate(text[longest - 1]) ? longest - 1 : longest;
        return $"{Visible(text[..end])}… (cut; {Figures.Count(text.Length)} characters in all)";
    }

    // C1 controls, line and paragraph separators, bidirectional embeddings, overrides and isolates (Unicode Annex 9), non-characters of this plane, lone surrogates.
    private static bool IsSpelledOut(char unit) => unit is >= '\u0080' and <= '\u009F' or '\u2028' or '\u2029'
        or >= '\u202A' and <= '\u202E' or >= '\u2066' and <= '\u2069' or '\uFEFF' or '\uFFFE' or '\uFFFF' || char.IsSurrogate(unit);
}
