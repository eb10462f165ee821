using MemberScan.Screening.Record;

namespace MemberScan.Cli;

/// <summary>What the program returns to its caller.</summary>
internal static class ExitCodes
{
    /// <summary>At least one candidate, and every one within its limit.</summary>
    public const int WithinLimit = 0;

    /// <summary>At least one candidate overstressed.</summary>
    public const int Overstressed = 1;

    /// <summary>None overstressed, at least one not checked, or no candidate found.</summary>
    public const int NotChecked = 2;

    /// <summary>The model could not be read to its end.</summary>
    public const int NotReadToEnd = 3;

    /// <summary>Wrong usage, settings or forces table.</summary>
    public const int Usage = 64;

    /// <summary>Internal error.</summary>
    public const int Internal = 70;

    /// <summary>Reading or writing failed.</summary>
    public const int InputOutput = 74;

    /// <summary>Interrupted.</summary>
    public const int Interrupted = 130;

    // From the one that weighs most to the one that weighs least.
    private static readonly int[] s_byWeight = [Internal, InputOutput, Interrupted, Usage, NotReadToEnd, Overstressed, NotChecked, WithinLimit];

    /// <summary>The code that weighs most: 70, 74, 130, 64, 3, 1, 2, 0.</summary>
    /// <exception cref="ArgumentException">There is none, or one that the program does not return.</exception>
    public static int Worst(IEnumerable<int> codes)
    {
        var places = codes.Select(code => Array.IndexOf(s_byWeight, code)).ToList();
        return places.Count > 0 && places.TrueForAll(p => p >= 0) ? s_byWeight[places.Min()] : throw new ArgumentException("none of the codes of this program", nameof(codes));
    }

    /// <summary>The code of a finished screening; damage that was passed over is never 0.</summary>
    public static int Of(ScreeningRecord record) =>
        !record.Model.ReadToEnd ? NotReadToEnd
        : record.Counts.Overstressed > 0 ? Overstressed
        : record.Counts.NotChecked > 0 || record.Counts.Candidates == 0 || record.HasDamage ? NotChecked
        : WithinLimit;
}
