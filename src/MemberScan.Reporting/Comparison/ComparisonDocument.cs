using System.Collections.Immutable;

namespace MemberScan.Reporting.Comparison;

/// <summary>The content of a comparison file.</summary>
internal sealed record ComparisonDocument(
    string Format, ComparisonDocument.Run Earlier, ComparisonDocument.Run Later, bool HasWorse, int Reidentified, ImmutableArray<ComparisonDocument.Total> Totals,
    ImmutableArray<string> RunChanges, ImmutableArray<ComparisonDocument.Candidate> Members)
{
    /// <summary>One of the two runs.</summary>
    internal sealed record Run(string File, string Sha256, string RunId, string Timestamp, string Version, bool ReadToEnd);

    /// <summary>How many candidates moved in one way.</summary>
    internal sealed record Total(string Outcome, int Count);

    /// <summary>An input that changed.</summary>
    internal sealed record Change(string Input, string Earlier, string Later);

    /// <summary>One candidate.</summary>
    internal sealed record Candidate(
        string? Key, string? EarlierKey, string GlobalId, string Tag, string Name, string Class, string MatchedBy, string Outcome, bool Worse, bool Reidentified,
        string? EarlierStatus, string? LaterStatus, double? EarlierUtilization, double? LaterUtilization, ImmutableArray<Change> Changes, string InWords);
}
