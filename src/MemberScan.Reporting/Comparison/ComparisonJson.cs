using System.Text.Json;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Comparison;

/// <summary>A comparison as JSON.</summary>
public static class ComparisonJson
{
    /// <summary>Name and number of the format.</summary>
    public const string Format = "memberscan-comparison/1";

    /// <summary>The comparison as UTF-8 bytes, lines end with LF.</summary>
    public static byte[] Write(ComparisonRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        var document = new ComparisonDocument(
            Format, Of(record.Earlier), Of(record.Later), record.HasWorse, record.Reidentified,
            [.. Enum.GetValues<Movement>().Select(m => new ComparisonDocument.Total(MovementText.Of(m), record.Count(m)))], record.RunChanges, [.. record.Members.Select(Of)]);
        return [.. JsonSerializer.SerializeToUtf8Bytes(document, ComparisonContext.Plain.ComparisonDocument), (byte)'\n'];
    }

    private static ComparisonDocument.Run Of(ScreeningRecord run) => new(run.Model.FileName, run.Model.Sha256, run.RunId, run.Timestamp, run.Version, run.Model.ReadToEnd);

    private static ComparisonDocument.Candidate Of(MemberMovement m) => new(
        m.Later?.Key, m.Earlier?.Key, m.Latest.GlobalId, m.Latest.Tag, m.Latest.Name, m.Latest.Class, ComparisonTable.WordOf(m.MatchedBy), MovementText.Of(m.Movement), m.IsWorse, m.IsReidentified,
        m.Earlier?.Verdict.Word(), m.Later?.Verdict.Word(), m.Earlier?.Governing?.Utilization, m.Later?.Governing?.Utilization,
        [.. m.Changes.Select(c => new ComparisonDocument.Change(c.What, c.Earlier, c.Later))], m.Words);
}
