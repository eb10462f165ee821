using System.Globalization;
using System.Text;

namespace MemberScan.SampleModels.Writing;

/// <summary>Values in the spelling of ISO 10303-21: each method gives the text of one parameter.</summary>
public static class Spelling
{
    /// <summary>An optional parameter that is not given.</summary>
    public const string Unset = "$";

    /// <summary>A parameter that the schema derives.</summary>
    public const string Derived = "*";

    /// <summary>A reference to an instance; <c>$</c> for null.</summary>
    public static string Reference(int? id) => id is { } number ? "#" + number.ToString(CultureInfo.InvariantCulture) : Unset;

    /// <summary>A list of references.</summary>
    public static string References(IEnumerable<int> ids) => List(ids.Select(id => Reference(id)));

    /// <summary>A list of values already spelled.</summary>
    public static string List(IEnumerable<string> values) => "(" + string.Join(',', values) + ")";

    /// <summary>A value with its measure type, where the attribute is a SELECT.</summary>
    public static string Typed(string type, string value) => $"{type}({value})";

    /// <summary>An enumeration literal.</summary>
    public static string Literal(string literal) => $".{literal}.";

    /// <summary>A BOOLEAN.</summary>
    public static string Boolean(bool value) => value ? ".T." : ".F.";

    /// <summary>An INTEGER.</summary>
    public static string Integer(long value) => value.ToString(CultureInfo.InvariantCulture);

    /// <summary>A REAL with at most twelve significant digits (a change of unit leaves noise in the rest); always with its point.</summary>
    public static string Real(double value)
    {
        if (!double.IsFinite(value)) throw new ArgumentOutOfRangeException(nameof(value), value, "Part 21 has no spelling for it.");

        var rounded = double.Parse(value.ToString("G12", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        if (rounded == 0) return "0.";

        var text = rounded.ToString("R", CultureInfo.InvariantCulture);
        if (text.Contains('.', StringComparison.Ordinal)) return text;

        var exponent = text.IndexOf('E', StringComparison.Ordinal);
        return exponent < 0 ? text + "." : text.Insert(exponent, ".");
    }

    /// <summary>A STRING; everything outside the basic alphabet as <c>\X2\</c> (BMP) or <c>\X4\</c>. Null gives <c>$</c>.</summary>
    public static string Text(string? text)
    {
        if (text is null) return Unset;

        var spelled = new StringBuilder("'");
        var open = "";
        foreach (var rune in text.EnumerateRunes())
        {
            var needed = rune.Value is >= 0x20 and <= 0x7E ? "" : rune.IsBmp ? @"\X2\" : @"\X4\";
            if (needed != open)
            {
                if (open.Length > 0) spelled.Append(@"\X0\");
                spelled.Append(open = needed);
            }

            spelled.Append(needed.Length > 0
                ? rune.Value.ToString(rune.IsBmp ? "X4" : "X8", CultureInfo.InvariantCulture)
                : rune.Value switch { '\'' => "''", '\\' => @"\\", _ => rune.ToString() });
        }

        if (open.Length > 0) spelled.Append(@"\X0\");
        return spelled.Append('\'').ToString();
    }
}
