using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting;

/// <summary>What every output relies on: the counts are those of the candidates, each unchecked one has its reason, each other one its governing check.</summary>
public static class SoundRecord
{
    /// <summary>Refuses a record that contradicts itself, before anything of it is shown.</summary>
    /// <exception cref="ArgumentException">Counts differ from the candidates' verdicts, or an unchecked candidate has no reason, or one with a verdict has no governing check.</exception>
    public static void ThrowUnlessSound(ScreeningRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        if (WhatIsWrong(record) is { } fault) throw new ArgumentException(fault, nameof(record));
    }

    /// <summary>One sentence on the first contradiction; null when there is none.</summary>
    public static string? WhatIsWrong(ScreeningRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        var counts = new VerdictCounts(
            record.Members.Count(m => m.Verdict == Verdict.WithinLimit),
            record.Members.Count(m => m.Verdict == Verdict.Overstressed),
            record.Members.Count(m => m.Verdict == Verdict.NotChecked));
        if (counts != record.Counts || counts.Candidates != record.Members.Length) return "The counts differ from the verdicts of the candidates.";
        if (record.Members.Any(m => m.Verdict == Verdict.NotChecked && m.Reason is null)) return "A candidate that was not checked has no reason.";
        if (record.Members.Any(m => m.Verdict != Verdict.NotChecked && m.Governing is null)) return "A candidate with a verdict has no governing check.";
        return null;
    }
}
