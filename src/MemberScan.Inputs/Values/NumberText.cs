using System.Buffers;
using System.Globalization;

namespace MemberScan.Inputs.Values;

/// <summary>Decimal numbers as people and programs write them: a point, an optional exponent, no grouping.</summary>
internal static class NumberText
{
    private static readonly string[] s_notFinite = ["nan", "inf", "infinity", "∞", "1.#inf", "1.#ind", "1.#qnan"];
    private static readonly SearchValues<char> s_numberLetters = SearchValues.Create("0123456789,.eE+-");

    /// <summary>Reads a whole text, blanks around it allowed.</summary>
    public static NumberFault Read(ReadOnlySpan<char> text, out double value)
    {
        value = 0;
        var trimmed = text.Trim();
        if (trimmed.IsEmpty) return NumberFault.Empty;
        if (Measure(trimmed) != trimmed.Length) return FaultOf(trimmed);

        // The grammar was measured, so this cannot fail; a number too large to hold becomes infinite.
        value = double.Parse(trimmed, NumberStyles.Float, CultureInfo.InvariantCulture);
        return double.IsFinite(value) ? NumberFault.None : NumberFault.NotFinite;
    }

    /// <summary>Length of the number at the head of a text; 0 if there is none.</summary>
    public static int Measure(ReadOnlySpan<char> text)
    {
        var at = text is ['+' or '-', ..] ? 1 : 0;
        var whole = Digits(text[at..]);
        at += whole;
        var fraction = 0;
        if (at < text.Length && text[at] == '.')
        {
            fraction = Digits(text[(at + 1)..]);
            if (whole + fraction > 0) at += 1 + fraction;
        }

        if (whole + fraction == 0) return 0;
        if (at >= text.Length || text[at] is not ('e' or 'E')) return at;

        var exponent = at + 1 < text.Length && text[at + 1] is '+' or '-' ? at + 2 : at + 1;
        var digits = exponent < text.Length ? Digits(text[exponent..]) : 0;
        return digits > 0 ? exponent + digits : at;
    }

    /// <summary>What to write instead, as the end of a sentence.</summary>
    public static string Remedy(NumberFault fault) => fault switch
    {
        NumberFault.Empty => "write the number, 0 where it is zero",
        NumberFault.DecimalComma => "write the number with a decimal point and without grouping",
        NumberFault.NotFinite => "give a finite number",
        _ => "write digits with a decimal point, such as -12.5 or 3e-2",
    };

    private static NumberFault FaultOf(ReadOnlySpan<char> text)
    {
        var unsigned = text.TrimStart("+-");
        foreach (var word in s_notFinite)
            if (unsigned.Equals(word, StringComparison.OrdinalIgnoreCase)) return NumberFault.NotFinite;

        return unsigned.Contains(',') && !unsigned.ContainsAnyExcept(s_numberLetters)
            ? NumberFault.DecimalComma
            : NumberFault.NotANumber;
    }

    private static int Digits(ReadOnlySpan<char> text)
    {
        var end = text.IndexOfAnyExceptInRange('0', '9');
        return end < 0 ? text.Length : end;
    }
}
