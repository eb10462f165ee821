using System.Collections.Immutable;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Index;

/// <summary>What became of one of several models.</summary>
/// <param name="Path">Path of the model as given or found; names it in page and table.</param>
/// <param name="ExitCode">What a run on this model alone would return.</param>
public sealed record ModelEntry(string Path, int ExitCode)
{
    /// <summary>Why there is no screening; empty when there is one.</summary>
    public string Failure { get; init; } = "";

    /// <summary>Path of its report from the folder of the index, parted by <c>/</c>; empty when there is none.</summary>
    public string Report { get; init; } = "";

    /// <summary>RunId; empty when there is no screening.</summary>
    public string RunId { get; init; } = "";

    /// <summary>Time of the run, ISO 8601; empty when there is no screening.</summary>
    public string Timestamp { get; init; } = "";

    /// <summary>SHA-256 of the model without results, in hexadecimal; empty when there is no screening.</summary>
    public string ModelSha256 { get; init; } = "";

    /// <summary>Number of candidates by verdict; null when there is no screening.</summary>
    public VerdictCounts? Counts { get; init; }

    /// <summary>Whether the model was read to its end.</summary>
    public bool ReadToEnd { get; init; }

    /// <summary>Whether anything was passed over as damaged.</summary>
    public bool HasDamage { get; init; }

    /// <summary>The cautions that are always printed.</summary>
    public ImmutableArray<string> Cautions { get; init; } = [];

    /// <summary>The overstressed, worst first.</summary>
    public ImmutableArray<OverstressedEntry> Overstressed { get; init; } = [];

    /// <summary>The entry of a finished screening.</summary>
    /// <param name="path">Path of the model.</param>
    /// <param name="exitCode">What the run returned.</param>
    /// <param name="record">The screening.</param>
    /// <param name="report">Path of its report from the folder of the index.</param>
    public static ModelEntry Of(string path, int exitCode, ScreeningRecord record, string report)
    {
        ArgumentNullException.ThrowIfNull(record);
        return new ModelEntry(path, exitCode)
        {
            Report = report,
            RunId = record.RunId,
            Timestamp = record.Timestamp,
            ModelSha256 = record.Model.Sha256,
            Counts = record.Counts,
            ReadToEnd = record.Model.ReadToEnd,
            HasDamage = record.HasDamage,
            Cautions = record.Cautions,
            Overstressed = [.. record.Members.Where(m => m.Verdict == Verdict.Overstressed).OrderByDescending(m => m.Governing!.Utilization).Select(OverstressedEntry.Of)],
        };
    }

    /// <summary>The entry of a model that could not be screened.</summary>
    public static ModelEntry Failed(string path, int exitCode, string why) => new(path, exitCode) { Failure = why };

    /// <summary>Outcome in words.</summary>
    public string Outcome => Failure.Length > 0 ? "NOT SCREENED"
        : !ReadToEnd ? "NOT READ TO ITS END"
        : Counts!.Overstressed > 0 ? "OVERSTRESSED"
        : Counts.Candidates == 0 ? "NO CANDIDATE"
        : Counts.NotChecked > 0 || HasDamage ? "NOT CHECKED IN FULL"
        : "WITHIN LIMIT";
}
