using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Foundation.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Threads;

/// <summary>Finds the thread designation in a name, a type's name, a property or a setting.</summary>
/// <remarks>
/// Read are <c>M12</c>, <c>M12x1.75</c>, <c>3/8-16 UNC</c>, <c>1 1/4-7</c>, <c>1/2"</c> and <c>1/2 in</c>. A bare fraction, a bare number and
/// the length behind a second <c>x</c> are no thread. Two different threads in one text are none: the text does not say which counts.
/// </remarks>
public static partial class ThreadText
{
    /// <summary>Longest text that is searched; a longer one has no thread.</summary>
    public const int LongestText = 1024;

    /// <summary>Largest diameter over pitch that is a screw thread, and the smallest [-].</summary>
    private const double LargestRatio = 64, SmallestRatio = 3;

    private const string Remedy = "give the thread as M12, M12x1.75, 3/8-16 UNC or 1/2\"";

    /// <summary>The one thread that a text designates.</summary>
    /// <param name="text">Text; may be empty.</param>
    /// <param name="source">Where the text comes from, in words.</param>
    /// <returns>The thread, or <see cref="ReasonCode.ThreadUnknown"/> with what was met.</returns>
    public static Finding<ThreadDesignation> Find(string text, string source)
    {
        ArgumentNullException.ThrowIfNull(text);
        if (text.Length > LongestText) return Unknown($"the {source} is longer than {LongestText} characters; {Remedy}");

        var found = new List<ThreadDesignation>();
        foreach (Match match in Metric().Matches(text))
        {
            if (MetricOf(match) is not { } thread) return Unknown($"'{match.Value.Trim()}' in the {source} is no thread of the coarse series and no possible pitch; {Remedy}");
            if (!found.Contains(thread)) found.Add(thread);
        }

        foreach (Match match in Unified().Matches(text))
        {
            if (UnifiedOf(match) is not { } thread) return Unknown($"'{match.Value.Trim()}' in the {source} is no thread of the coarse series and no possible pitch; {Remedy}");
            if (!found.Contains(thread)) found.Add(thread);
        }

        return found.Count switch
        {
            0 => Unknown($"the {source} names no thread; {Remedy}"),
            1 => new Finding<ThreadDesignation>.Found(found[0], source),
            _ => Unknown($"the {source} names more than one thread ({string.Join(", ", found)}); {Remedy}"),
        };
    }

    private static ThreadDesignation? MetricOf(Match match)
    {
        var diameter = Number(match.Groups["d"].Value);
        if (!match.Groups["p"].Success)
            return CoarseSeries.MetricPitch(diameter) is { } coarse ? new ThreadDesignation(ThreadSeries.Metric, Si.Mm(diameter), coarse, "coarse series of ISO 261, from memory") : null;

        var pitch = Number(match.Groups["p"].Value);
        // M12x80 is a bolt of 80 mm: what is no possible pitch is a length.
        if (pitch >= diameter)
            return CoarseSeries.MetricPitch(diameter) is { } coarse ? new ThreadDesignation(ThreadSeries.Metric, Si.Mm(diameter), coarse, "coarse series of ISO 261, from memory") : null;
        return IsThread(diameter, pitch) ? new ThreadDesignation(ThreadSeries.Metric, Si.Mm(diameter), Si.Mm(pitch), "designation") : null;
    }

    private static ThreadDesignation? UnifiedOf(Match match)
    {
        var diameter = Diameter(match);
        if (!double.IsFinite(diameter) || diameter <= 0) return null;
        if (!match.Groups["n"].Success)
            return CoarseSeries.UnifiedPitch(diameter) is { } coarse ? new ThreadDesignation(ThreadSeries.Unified, Si.In(diameter), coarse, "coarse series of ASME B1.1, from memory") : null;

        var count = Number(match.Groups["n"].Value);
        return count > 0 && IsThread(diameter, 1 / count) ? new ThreadDesignation(ThreadSeries.Unified, Si.In(diameter), Si.Inch / count, "designation") : null;
    }

    private static double Diameter(Match match)
    {
        var whole = match.Groups["w"].Success ? Number(match.Groups["w"].Value) : 0;
        return match.Groups["num"].Success
            ? whole + Number(match.Groups["num"].Value) / Number(match.Groups["den"].Value)
            : Number(match.Groups["dec"].Value);
    }

    private static bool IsThread(double diameter, double pitch) => diameter / pitch is >= SmallestRatio and <= LargestRatio;

    private static double Number(string text) =>
        double.Parse(text.Replace(',', '.'), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture);

    private static Finding<ThreadDesignation> Unknown(string sentence) =>
        new Finding<ThreadDesignation>.Missing(new Reason(ReasonCode.ThreadUnknown, sentence));

    // No letter or digit before the M; a pitch only behind x, ×, * with at most blanks between.
    [GeneratedRegex(@"(?<![\p{L}\p{N}.,/])M ?(?<d>\d{1,3}(?:[.,]\d)?)(?:\s?[x×X*]\s?(?<p>\d{1,4}(?:[.,]\d{1,3})?))?(?![\p{N}\p{L}])", RegexOptions.CultureInvariant)]
    private static partial Regex Metric();

    // A diameter in inches counts only with threads per inch behind a hyphen, or with an inch mark.
    [GeneratedRegex(
        @"(?<![\p{L}\p{N}.,/])(?:(?:(?<w>\d{1,2})[ -])?(?<num>\d{1,2})/(?<den>\d{1,2})|(?<dec>\d{1,2}(?:\.\d{1,4})?))(?:\s?(?:""|″|”|in\b\.?|inch\b)?\s?-\s?(?<n>\d{1,2}(?:\.5)?)(?![\p{N}./])(?:\s?UN[CFR]?\b)?|\s?(?:""|″|”|in\b|inch\b)(?:\s?UNC\b)?)",
        RegexOptions.CultureInvariant)]
    private static partial Regex Unified();
}
