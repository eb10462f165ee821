using System.Text.RegularExpressions;

namespace MemberScan.Ifc.ForceSets;

/// <summary>A name with <c>*</c> and <c>?</c> as wildcards and <c>{station}</c> for the station in it, without regard to case.</summary>
internal sealed class NamePattern
{
    private const string Placeholder = "{station}";

    private readonly Regex _regex;

    public NamePattern(string pattern)
    {
        // Escape leaves '}' and escapes '{'; the placeholder is put in last.
        var text = Regex.Escape(pattern).Replace("\\*", "(.*)", StringComparison.Ordinal).Replace("\\?", ".", StringComparison.Ordinal)
            .Replace(Regex.Escape(Placeholder), "(?<station>.+)", StringComparison.Ordinal);
        _regex = new Regex($"^{text}$", RegexOptions.NonBacktracking | RegexOptions.IgnoreCase | RegexOptions.CultureInvariant | RegexOptions.Singleline);
    }

    /// <summary>Whether a name fits.</summary>
    /// <param name="name">The name.</param>
    /// <param name="wildcard">What the first <c>*</c> stands for; null when there is none.</param>
    /// <param name="station">What <c>{station}</c> stands for; null when there is none.</param>
    public bool Fits(string name, out string? wildcard, out string? station)
    {
        (wildcard, station) = (null, null);
        var match = _regex.Match(name);
        if (!match.Success) return false;

        if (match.Groups["station"].Success) station = match.Groups["station"].Value.Trim();
        if (match.Groups.Count > 1 && match.Groups[1].Name != "station") wildcard = match.Groups[1].Value.Trim();
        return true;
    }
}
