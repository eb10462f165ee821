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

    /// <summary>The code of a finished screening; damage that was passed over is never 0.</summary>
    public static int Of(ScreeningRecord record) =>
        !record.Model.ReadToEnd ? NotReadToEnd
        : record.Counts.Overstressed > 0 ? Overstressed
        : record.Counts.NotChecked > 0 || record.Counts.Candidates == 0 || record.HasDamage ? NotChecked
        : WithinLimit;
}
