using MemberScan.Screening.Record;
using Parquet;
using Parquet.Schema;

namespace MemberScan.Reporting.Columns;

/// <summary>The candidates of a run as a Parquet file, for questions over many runs: SI, the run's own columns first.</summary>
/// <remarks>Columns are listed in <c>config/parquet-columns.md</c>. The same record gives the same bytes.</remarks>
public static class MembersParquet
{
    /// <summary>Columns that are the same in each row of a run: name and value.</summary>
    internal static readonly (string Name, Func<ScreeningRecord, string> Value)[] RunColumns =
    [
        ("runId", r => r.RunId), ("timestamp", r => r.Timestamp), ("program", r => $"MemberScan {r.Version}"), ("model", r => r.Model.FileName), ("modelSha256", r => r.Model.Sha256),
    ];

    /// <summary>The file.</summary>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    public static byte[] Write(ScreeningRecord record)
    {
        SoundRecord.ThrowUnlessSound(record);
        using var file = new MemoryStream();

        // Writing to memory waits for nothing, so the task is complete when it returns.
        Write(record, file).GetAwaiter().GetResult();
        return file.ToArray();
    }

    private static async Task Write(ScreeningRecord record, MemoryStream file)
    {
        var run = RunColumns.Select(c => new DataField<string>(c.Name)).ToArray();
        DataField[] members = [.. MemberColumns.All.Select(Field)];
        await using var writer = await ParquetWriter.CreateAsync(new ParquetSchema([.. run, .. members]), file);
        using var group = writer.CreateRowGroup();
        for (var i = 0; i < run.Length; i++) await group.WriteAsync(run[i], Enumerable.Repeat(RunColumns[i].Value(record), record.Members.Length).ToArray());
        for (var i = 0; i < members.Length; i++)
        {
            var column = MemberColumns.All[i];
            if (column.Kind == ColumnKind.Text) await group.WriteAsync(members[i], record.Members.Select(m => column.TextOf(m)!).ToArray());
            else if (column.Kind == ColumnKind.Integer) await group.WriteAsync<int>(members[i], record.Members.Select(m => (int?)column.NumberOf(m)).ToArray());
            else await group.WriteAsync<double>(members[i], record.Members.Select(column.NumberOf).ToArray());
        }
    }

    private static DataField Field(MemberColumn column) => column.Kind switch
    {
        ColumnKind.Text => new DataField<string>(column.SiName),
        ColumnKind.Integer => new DataField<int?>(column.SiName),
        _ => new DataField<double?>(column.SiName),
    };
}
