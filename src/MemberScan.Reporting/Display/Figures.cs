using System.Globalization;
using System.Text;

namespace MemberScan.Reporting.Display;

/// <summary>Numbers as the report prints them: point as decimal mark, digits grouped in threes from 10 000 up, true minus sign.</summary>
/// <remarks>Grouping by a thin space and the sign U+2212 follow ISO 80000-1; the thin space is the one that does not break a line, U+202F.</remarks>
public static class Figures
{
    /// <summary>Significant figures of stresses, forces and dimensions.</summary>
    public const int SignificantFigures = 4;

    /// <summary>Decimals of a utilization.</summary>
    public const int UtilizationDecimals = 3;

    /// <summary>The space between groups of three digits.</summary>
    public const char GroupSpace = '\u202F';

    /// <summary>The minus sign.</summary>
    public const char Minus = '\u2212';

    private const int MostUtilizationDecimals = 12;
    private const string Superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    /// <summary>A number to <see cref="SignificantFigures"/>; very large and very small ones as a multiple of a power of ten.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static string Significant(double value)
    {
        ThrowUnlessFinite(value);
        if (value == 0) return "0";

        var rounded = value.ToString("E" + (SignificantFigures - 1), CultureInfo.InvariantCulture);
        var exponent = int.Parse(rounded.AsSpan(rounded.IndexOf('E', StringComparison.Ordinal) + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        if (exponent is < -4 or > 14)
            return Signed(rounded[..rounded.IndexOf('E', StringComparison.Ordinal)]) + "×10" + Raised(exponent);

        var plain = decimal.Parse(rounded, NumberStyles.Float, CultureInfo.InvariantCulture);
        var decimals = Math.Max(0, SignificantFigures - 1 - exponent);
        return Grouped(plain.ToString("F" + decimals, CultureInfo.InvariantCulture));
    }

    /// <summary>A number with a fixed count of decimals.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static string Fixed(double value, int decimals)
    {
        ThrowUnlessFinite(value);
        return Grouped(value.ToString("F" + decimals, CultureInfo.InvariantCulture));
    }

    /// <summary>A conversion factor to ten significant digits, without trailing zeros and grouping.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static string Plain(double value)
    {
        ThrowUnlessFinite(value);
        return Signed(value.ToString("G10", CultureInfo.InvariantCulture));
    }

    /// <summary>A count.</summary>
    public static string Count(long count) => Grouped(count.ToString(CultureInfo.InvariantCulture));

    /// <summary>A utilization to <see cref="UtilizationDecimals"/>; with more of them where fewer would print a value beside 1 as 1.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static string Utilization(double utilization)
    {
        ThrowUnlessFinite(utilization);
        var decimals = UtilizationDecimals;
        var text = Fixed(utilization, decimals);
        while (utilization != 1 && text.TrimEnd('0') == "1." && decimals < MostUtilizationDecimals)
            text = Fixed(utilization, ++decimals);

        return text.TrimEnd('0') == "1." ? Fixed(1, UtilizationDecimals) : text;
    }

    private static void ThrowUnlessFinite(double value)
    {
        if (!double.IsFinite(value)) throw new ArgumentOutOfRangeException(nameof(value), "A number of the record is not finite.");
    }

    private static string Raised(int exponent)
    {
        var text = new StringBuilder(exponent < 0 ? "⁻" : "");
        foreach (var digit in Math.Abs(exponent).ToString(CultureInfo.InvariantCulture)) text.Append(Superscripts[digit - '0']);
        return text.ToString();
    }

    private static string Grouped(string plain)
    {
        var start = plain[0] == '-' ? 1 : 0;
        var point = plain.IndexOf('.', StringComparison.Ordinal);
        var end = point < 0 ? plain.Length : point;
        if (end - start < 5) return Signed(plain);

        var text = new StringBuilder(plain.Length + 4);
        text.Append(plain, 0, start);
        for (var at = start; at < end; at++)
        {
            if (at > start && (end - at) % 3 == 0) text.Append(GroupSpace);
            text.Append(plain[at]);
        }

        return Signed(text.Append(plain, end, plain.Length - end).ToString());
    }

    private static string Signed(string plain)
    {
        if (plain[0] != '-') return plain;

        // What rounds to nothing has no sign.
        return plain.AsSpan(1).IndexOfAnyInRange('1', '9') < 0 ? plain[1..] : Minus + plain[1..];
    }
}
