using System.Collections.Concurrent;
using System.Text.RegularExpressions;

namespace MemberScan.Model.Rules;

/// <summary>The pattern of a grade as a matcher of whole names, without regard to case; each pattern is made once.</summary>
public static class GradePattern
{
    /// <summary>Longer names fit no grade [characters].</summary>
    public const int LongestName = 256;

    /// <summary>Patterns kept; more come from no sound settings.</summary>
    private const int Kept = 1024;

    // Patterns are matched in linear time; this only bounds what a settings file could ask for.
    private static readonly TimeSpan s_patience = TimeSpan.FromSeconds(10);

    // Linear in the length of the name whatever the pattern: material names come from models.
    private const RegexOptions Options = RegexOptions.NonBacktracking | RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    private static readonly ConcurrentDictionary<string, Regex> s_made = new(StringComparer.Ordinal);

    /// <summary>Whether a whole name fits a pattern; blanks round it do not count.</summary>
    /// <exception cref="ArgumentException">The pattern has a <see cref="Fault"/>.</exception>
    public static bool Fits(string pattern, string name)
    {
        ArgumentNullException.ThrowIfNull(pattern);
        ArgumentNullException.ThrowIfNull(name);
        var trimmed = name.Trim();
        return trimmed.Length is > 0 and <= LongestName && Whole(pattern).IsMatch(trimmed);
    }

    /// <summary>What is wrong with a pattern; null when nothing is.</summary>
    public static string? Fault(string pattern)
    {
        ArgumentNullException.ThrowIfNull(pattern);
        try
        {
            _ = new Regex(pattern, Options, s_patience);             // alone, so that brackets cannot pair up with ours
            return Whole(pattern).IsMatch("") ? "it fits the empty name; let it demand at least one letter" : null;
        }
        catch (RegexParseException fault)
        {
            return $"it is not a regular expression ({fault.Error} after {fault.Offset} characters); mend it";
        }
        catch (NotSupportedException)
        {
            return "it looks around or back, or repeats too much, for a bounded time; simplify it";
        }
    }

    // A pattern of linear matching time costs far more to make than to match.
    private static Regex Whole(string pattern)
    {
        if (s_made.TryGetValue(pattern, out var known)) return known;

        var made = new Regex($@"\A(?:{pattern})\z", Options, s_patience);
        if (s_made.Count < Kept) s_made[pattern] = made;
        return made;
    }
}
