using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace MemberScan.Part21.Tests;

/// <summary>A slow and plain reading of a sound data section, one character at a time; shares nothing with the product.</summary>
internal static partial class PlainTokenizer
{
    public static IEnumerable<(ulong Id, string Keyword, List<string> Arguments)> Instances(string text)
    {
        var inData = false;
        foreach (var statement in Split(WithoutComments(text), ';'))
        {
            if (DataSection().IsMatch(statement)) inData = true;
            if (statement == "ENDSEC") inData = false;
            var match = Instance().Match(statement);
            if (!inData || !match.Success) continue;

            var id = ulong.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture);
            var inside = match.Groups[3].Value;
            yield return (id, match.Groups[2].Value.ToUpperInvariant(), inside.Trim().Length == 0 ? [] : Split(inside, ','));
        }
    }

    /// <summary>Comments taken out, and blanks with them; strings kept.</summary>
    public static string WithoutComments(string text)
    {
        var kept = new StringBuilder();
        var inString = false;
        for (var i = 0; i < text.Length; i++)
        {
            if (text[i] == '\'') inString = !inString;
            if (!inString && text[i] == '/' && i + 1 < text.Length && text[i + 1] == '*')
            {
                i = text.IndexOf("*/", i + 2, StringComparison.Ordinal) + 1;
                continue;
            }

            if (inString || text[i] is > ' ' and not '\u007F') kept.Append(text[i]);
        }

        return kept.ToString();
    }

    private static List<string> Split(string text, char separator)
    {
        var parts = new List<string>();
        var inString = false;
        var depth = 0;
        var start = 0;
        for (var i = 0; i < text.Length; i++)
        {
            if (text[i] == '\'') inString = !inString;
            if (inString) continue;
            if (text[i] == '(') depth++;
            if (text[i] == ')') depth--;
            if (text[i] != separator || (separator == ',' && depth > 0)) continue;
            parts.Add(text[start..i]);
            start = i + 1;
        }

        if (separator == ',') parts.Add(text[start..]);
        return parts;
    }

    [GeneratedRegex(@"^DATA(\(.*\))?$", RegexOptions.Singleline)]
    private static partial Regex DataSection();

    [GeneratedRegex(@"^#(\d+)=([A-Za-z_!][A-Za-z0-9_]*)\((.*)\)$", RegexOptions.Singleline)]
    private static partial Regex Instance();
}
