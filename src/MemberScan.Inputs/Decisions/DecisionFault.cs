using System.Globalization;

namespace MemberScan.Inputs.Decisions;

/// <summary>What is wrong with a value of a decision.</summary>
internal static class DecisionFault
{
    private const string DateFormat = "yyyy-MM-dd";

    /// <summary>Code and message; null when the value is sound.</summary>
    /// <param name="name">Name of its column.</param>
    /// <param name="value">The value.</param>
    public static (string Code, string Message)? Of(string name, string value)
    {
        var longest = name == "note" ? DecisionFile.LongestNote : DecisionFile.LongestText;
        if (value.Length > longest) return (InputCodes.DecisionText, $"{name} is longer than {longest} characters; shorten it");
        if (value.Any(letter => !Excerpt.IsPlain(letter) && !char.IsSurrogate(letter))) return (InputCodes.DecisionText, $"{name} holds a control or direction character; take it out");
        if (name != "note" && value.Trim().Length == 0) return (InputCodes.DecisionText, $"{name} is empty; fill it in");
        return name == "date" && !DateOnly.TryParseExact(value, DateFormat, CultureInfo.InvariantCulture, DateTimeStyles.None, out _)
            ? (InputCodes.DecisionDate, $"{Excerpt.Of(value)} is no day; write it as 2026-01-31")
            : null;
    }
}
