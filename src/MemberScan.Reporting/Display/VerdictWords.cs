using MemberScan.Model.Verdicts;

namespace MemberScan.Reporting.Display;

/// <summary>The words and symbols of the three verdicts; colour never stands alone.</summary>
public static class VerdictWords
{
    /// <summary>The verdict as printed and written: WITHIN LIMIT, OVERSTRESSED or NOT CHECKED.</summary>
    public static string Word(this Verdict verdict) => verdict switch
    {
        Verdict.WithinLimit => "WITHIN LIMIT",
        Verdict.Overstressed => "OVERSTRESSED",
        Verdict.NotChecked => "NOT CHECKED",
        _ => throw new ArgumentOutOfRangeException(nameof(verdict)),
    };

    /// <summary>A shape that goes with the word: filled disc, filled triangle, hollow lozenge.</summary>
    public static string Symbol(this Verdict verdict) => verdict switch
    {
        Verdict.WithinLimit => "●",
        Verdict.Overstressed => "▲",
        Verdict.NotChecked => "◇",
        _ => throw new ArgumentOutOfRangeException(nameof(verdict)),
    };

    /// <summary>Reads the word back.</summary>
    /// <returns>False when the text is none of the three words.</returns>
    public static bool TryParse(string? word, out Verdict verdict)
    {
        foreach (var candidate in Enum.GetValues<Verdict>())
        {
            verdict = candidate;
            if (candidate.Word() == word) return true;
        }

        verdict = default;
        return false;
    }
}
