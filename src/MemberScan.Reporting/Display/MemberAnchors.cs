using System.Collections.Immutable;
using System.Globalization;
using System.Text;

namespace MemberScan.Reporting.Display;

/// <summary>Names of the places in a page that links lead to: <c>member-</c> and the key.</summary>
public static class MemberAnchors
{
    /// <summary>Most UTF-16 units of a key that go into an anchor; a well-formed key has 22, an item's a few more.</summary>
    public const int LongestKey = 64;

    /// <summary>The anchor of a key: letters, digits, <c>_</c> and <c>$</c> as they are, <c>/</c> as <c>-</c>, anything else as <c>.</c> and its code.</summary>
    public static string Of(string key)
    {
        ArgumentNullException.ThrowIfNull(key);
        var anchor = new StringBuilder("member-");
        foreach (var unit in key.AsSpan(0, Math.Min(key.Length, LongestKey)))
        {
            if (char.IsAsciiLetterOrDigit(unit) || unit is '_' or '$') anchor.Append(unit);
            else if (unit == '/') anchor.Append('-');
            else anchor.Append(CultureInfo.InvariantCulture, $".{(int)unit:X4}");
        }

        return anchor.ToString();
    }

    /// <summary>One anchor per key, in order; a key met again gets <c>~2</c>, <c>~3</c> … behind it.</summary>
    public static ImmutableArray<string> OfAll(IEnumerable<string> keys)
    {
        ArgumentNullException.ThrowIfNull(keys);
        var met = new Dictionary<string, int>(StringComparer.Ordinal);
        return [.. keys.Select(key =>
        {
            var anchor = Of(key);
            var number = met[anchor] = met.GetValueOrDefault(anchor) + 1;
            return number == 1 ? anchor : string.Create(CultureInfo.InvariantCulture, $"{anchor}~{number}");
        })];
    }
}
