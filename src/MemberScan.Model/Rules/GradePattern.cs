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

    // What is quick to make may be slow to match: a name that takes longer than this is matched in linear time.
    private static readonly TimeSpan s_shortPatience = TimeSpan.FromMilliseconds(20);

    private const RegexOptions Options = RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    // Linear in the length of the name whatever the pattern: material names come from models.
    private const RegexOptions Linear = Options | RegexOptions.NonBacktracking;

    private static readonly ConcurrentDictionary<string, Matcher> s_made = new(StringComparer.Ordinal);

    /// <summary>Whether a whole name fits a pattern; blanks round it do not count.</summary>
    /// <exception cref="ArgumentException">The pattern has a <see cref="Fault"/>.</exception>
    public static bool Fits(string pattern, string name)
    {
        ArgumentNullException.ThrowIfNull(pattern);
        ArgumentNullException.ThrowIfNull(name);
        var trimmed = name.Trim();
        return trimmed.Length is > 0 and <= LongestName && For(Whole(pattern)).IsMatch(trimmed);
    }

    /// <summary>Whether a pattern fits any part of a text.</summary>
    /// <exception cref="ArgumentException">The pattern has a <see cref="Fault"/>.</exception>
    public static bool IsIn(string pattern, string text)
    {
        ArgumentNullException.ThrowIfNull(pattern);
        ArgumentNullException.ThrowIfNull(text);
        return For(pattern).IsMatch(text);
    }

    /// <summary>What is wrong with a pattern; null when nothing is.</summary>
    public static string? Fault(string pattern)
    {
        ArgumentNullException.ThrowIfNull(pattern);
        try
        {
            _ = new Regex(pattern, Linear, s_patience);              // alone, so that brackets cannot pair up with ours
            return For(Whole(pattern)).IsMatch("") ? "it fits the empty name; let it demand at least one letter" : null;
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

    private static string Whole(string pattern) => $@"\A(?:{pattern})\z";

    private static Matcher For(string pattern)
    {
        if (s_made.TryGetValue(pattern, out var known)) return known;

        var made = new Matcher(pattern);
        if (s_made.Count < Kept) s_made[pattern] = made;
        return made;
    }

    /// <summary>A pattern as two expressions of the same meaning: one that is quick to make, one that is linear to match and costs far more to make.</summary>
    private sealed class Matcher(string pattern)
    {
        private readonly Regex _quick = new(pattern, Options, s_shortPatience);
        private readonly Lazy<Regex> _linear = new(() => new Regex(pattern, Linear, s_patience));

        public bool IsMatch(string name)
        {
            if (_linear.IsValueCreated) return _linear.Value.IsMatch(name);

            try
            {
                return _quick.IsMatch(name);
            }
            catch (RegexMatchTimeoutException)
            {
                return _linear.Value.IsMatch(name);
            }
        }
    }
}
