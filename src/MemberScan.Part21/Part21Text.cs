using System.Globalization;
using System.Text;

namespace MemberScan.Part21;

/// <summary>Values in the spelling of Part 21, in any culture.</summary>
public static class Part21Text
{
    /// <summary>A real: shortest digits that read back the same, with the point that Part 21 demands, upper-case E; <c>0.</c> for both zeros.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite: it has no spelling.</exception>
    public static string Real(double value)
    {
        if (!double.IsFinite(value)) throw new ArgumentOutOfRangeException(nameof(value), value, "Part 21 has no spelling for infinities and NaN.");
        if (value == 0) return "0.";

        var text = value.ToString("R", CultureInfo.InvariantCulture);
        if (text.Contains('.', StringComparison.Ordinal)) return text;

        var exponent = text.IndexOf('E', StringComparison.Ordinal);
        return exponent < 0 ? text + "." : text.Insert(exponent, ".");
    }

    /// <summary>A string in apostrophes, ASCII only; everything else as <c>\X2\…\X0\</c> or <c>\X4\…\X0\</c>.</summary>
    /// <remarks>Half a surrogate pair is no character; it is written as U+FFFD.</remarks>
    public static string String(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        var spelling = new StringBuilder(text.Length + 2).Append('\'');
        var open = 0;
        foreach (var rune in text.EnumerateRunes())
        {
            var form = Form(rune);
            if (form != open) spelling.Append(open == 0 ? "" : @"\X0\").Append(form == 0 ? "" : form == 4 ? @"\X2\" : @"\X4\");
            open = form;

            if (form > 0) spelling.Append(rune.Value.ToString(form == 4 ? "X4" : "X8", CultureInfo.InvariantCulture));
            else if (rune.Value is '\'' or '\\') spelling.Append((char)rune.Value, 2);
            else spelling.Append((char)rune.Value);
        }

        return spelling.Append(open == 0 ? "" : @"\X0\").Append('\'').ToString();
    }

    // Hexadecimal digits a character needs; 0 where it stands for itself.
    private static int Form(Rune rune)
    {
        if (rune.Value is >= 0x20 and <= 0x7E) return 0;
        return rune.IsBmp ? 4 : 8;
    }
}
