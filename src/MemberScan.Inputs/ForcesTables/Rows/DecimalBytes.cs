using System.Globalization;

namespace MemberScan.Inputs.ForcesTables.Rows;

/// <summary>Decimal numbers straight from bytes, by the grammar of <see cref="Values.NumberText"/>.</summary>
/// <remarks>
/// Up to 15 digits with a power of ten up to 22 both are exact as doubles, so one multiplication or division rounds once, to the nearest
/// (Clinger, <i>How to read floating point numbers accurately</i>, 1990). Everything else goes to the library's parser.
/// </remarks>
internal static class DecimalBytes
{
    private const int ExactDigits = 15;

    private static readonly double[] s_powers =
    [
        1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22,
    ];

    /// <summary>Reads a whole field; false when it is not plainly a number, for another to say what it is.</summary>
    public static bool TryRead(ReadOnlySpan<byte> text, out double value)
    {
        value = 0;
        var at = 0;
        var negative = text.Length > 0 && text[0] == '-';
        if (negative || (text.Length > 0 && text[0] == '+')) at = 1;

        var (mantissa, digits, fraction, any) = (0L, 0, 0, false);
        for (; at < text.Length && (uint)(text[at] - '0') <= 9; at++) Take(text[at], ref mantissa, ref digits, ref any);
        if (at < text.Length && text[at] == '.')
        {
            var start = ++at;
            for (; at < text.Length && (uint)(text[at] - '0') <= 9; at++) Take(text[at], ref mantissa, ref digits, ref any);
            fraction = at - start;
        }

        if (!any) return false;

        var exponent = 0;
        if (at < text.Length && (text[at] | 0x20) == 'e')
        {
            var down = ++at < text.Length && text[at] == '-';
            if (down || (at < text.Length && text[at] == '+')) at++;
            if (at >= text.Length) return false;
            for (; at < text.Length && (uint)(text[at] - '0') <= 9; at++) exponent = Math.Min(9999, 10 * exponent + text[at] - '0');
            if ((text[at - 1] | 0x20) is 'e' or '+' or '-') return false;
            if (down) exponent = -exponent;
        }

        if (at != text.Length) return false;

        exponent -= fraction;
        if (digits <= ExactDigits && Math.Abs(exponent) < s_powers.Length)
        {
            var exact = exponent < 0 ? mantissa / s_powers[-exponent] : mantissa * s_powers[exponent];
            value = negative ? -exact : exact;
            return true;
        }

        return double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value);
    }

    // Leading zeros are no digits; beyond the exact ones only their number matters.
    private static void Take(byte digit, ref long mantissa, ref int digits, ref bool any)
    {
        any = true;
        if (digits == 0 && digit == '0') return;
        if (++digits <= ExactDigits) mantissa = 10 * mantissa + (digit - '0');
    }
}
