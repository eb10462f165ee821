using System.Text;

namespace MemberScan.Inputs;

/// <summary>Text of an input as it may stand in a message: short, on one line, without control characters.</summary>
internal static class Excerpt
{
    public const int LongestText = 40;

    /// <summary>The text in single quotes; cut with an ellipsis, control and format characters shown as '?'.</summary>
    public static string Of(ReadOnlySpan<char> text)
    {
        var shown = new StringBuilder("'", LongestText + 3);
        foreach (var letter in text[..Math.Min(text.Length, LongestText)])
            shown.Append(IsPlain(letter) ? letter : '?');
        return shown.Append(text.Length > LongestText ? "…'" : "'").ToString();
    }

    /// <summary>Whether a character prints as itself: no control, direction or line-separator character.</summary>
    public static bool IsPlain(char letter) => char.GetUnicodeCategory(letter) is not
        (System.Globalization.UnicodeCategory.Control or System.Globalization.UnicodeCategory.Format
        or System.Globalization.UnicodeCategory.LineSeparator or System.Globalization.UnicodeCategory.ParagraphSeparator
        or System.Globalization.UnicodeCategory.Surrogate);
}
