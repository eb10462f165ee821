using System.Text.RegularExpressions;

namespace MemberScan.Inputs.Materials;

/// <summary>The pattern of a grade as a matcher of whole names, without regard to case.</summary>
internal static class GradePattern
{
    /// <summary>Longest time for one name; patterns are matched in linear time, so this only bounds what a settings file could ask for.</summary>
    public static readonly TimeSpan MatchTimeout = TimeSpan.FromSeconds(10);

    // Linear in the length of the name whatever the pattern: material names come from models.
    private const RegexOptions Options = RegexOptions.NonBacktracking | RegexOptions.IgnoreCase | RegexOptions.CultureInvariant;

    public static Regex Whole(string pattern) => new($@"\A(?:{pattern})\z", Options, MatchTimeout);

    /// <summary>What is wrong with a pattern; null when nothing is.</summary>
    public static string? Fault(string pattern)
    {
        try
        {
            _ = new Regex(pattern, Options, MatchTimeout);             // alone, so that brackets cannot pair up with ours
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
}
