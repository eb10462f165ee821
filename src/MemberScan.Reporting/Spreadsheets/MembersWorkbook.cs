using System.Collections.Immutable;
using System.IO.Compression;
using System.Text;
using MemberScan.Reporting.Columns;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Spreadsheets;

/// <summary>The candidates as a workbook (Office Open XML, ISO/IEC 29500): typed cells, units in the header, one more sheet about the run.</summary>
/// <remarks>Texts are stored as texts, so none is taken for a formula. The same record gives the same bytes.</remarks>
public static class MembersWorkbook
{
    /// <summary>Candidates on one sheet; the format has 1,048,576 rows, one of which is the header. Further ones go to further sheets.</summary>
    public const int MostRows = 1_048_575;

    /// <summary>Time of the entries: the earliest that a zip file knows.</summary>
    private static readonly DateTimeOffset s_entryTime = new(1980, 1, 1, 0, 0, 0, TimeSpan.Zero);

    /// <summary>The file.</summary>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    public static byte[] Write(ScreeningRecord record)
    {
        SoundRecord.ThrowUnlessSound(record);
        var parts = record.Members.Chunk(MostRows).ToList();
        if (parts.Count == 0) parts.Add([]);
        var names = parts.Select((_, i) => i == 0 ? "Members" : $"Members {i + 1}").Append("Run").ToImmutableArray();

        using var file = new MemoryStream();
        using (var zip = new ZipArchive(file, ZipArchiveMode.Create, leaveOpen: true, Encoding.UTF8))
        {
            foreach (var (name, content) in WorkbookParts.All(names)) Add(zip, name, stream => stream.Write(Encoding.UTF8.GetBytes(content)));
            for (var i = 0; i < parts.Count; i++)
            {
                var members = parts[i];
                Add(zip, WorkbookParts.SheetPath(i), stream => Members(stream, members));
            }

            Add(zip, WorkbookParts.SheetPath(parts.Count), stream => Run(stream, record));
        }

        return file.ToArray();
    }

    private static void Members(Stream stream, IEnumerable<MemberResult> members)
    {
        using var sheet = new SheetWriter(stream, MemberColumns.All.Length);
        sheet.Row(() =>
        {
            foreach (var column in MemberColumns.All) sheet.Heading(column.Unit is { Symbol.Length: > 0 } unit ? $"{column.Name} [{unit.Symbol}]" : column.Name);
        });
        foreach (var member in members)
            sheet.Row(() =>
            {
                foreach (var column in MemberColumns.All)
                    if (column.Kind == ColumnKind.Text) sheet.Text(column.TextOf(member));
                    else sheet.Number(column.NumberOf(member) / (column.Unit?.Size ?? 1));
            });
    }

    private static void Run(Stream stream, ScreeningRecord record)
    {
        (string Name, string Value)[] facts =
        [
            ("model", record.Model.FileName), ("modelSha256", record.Model.Sha256), ("schema", record.Model.ReadAs), ("project", record.Model.ProjectName), ("runId", record.RunId),
            ("timestamp", record.Timestamp), ("program", $"MemberScan {record.Version}"), .. record.Basis.Select(b => (b.Kind, $"{b.Text} ({b.Clause})")),
            .. record.ForcesFiles.Select(f => ("forces table", $"{f.FileName}, SHA-256 {f.Sha256}")), .. record.Cautions.Select(c => ("caution", c)),
        ];
        using var sheet = new SheetWriter(stream, 2);
        sheet.Row(() =>
        {
            sheet.Heading("what");
            sheet.Heading("value");
        });
        foreach (var (name, value) in facts)
            sheet.Row(() =>
            {
                sheet.Text(name);
                sheet.Text(value);
            });
        foreach (var (name, count) in new[] { ("within limit", record.Counts.WithinLimit), ("overstressed", record.Counts.Overstressed), ("not checked", record.Counts.NotChecked), ("candidates", record.Counts.Candidates) })
            sheet.Row(() =>
            {
                sheet.Text(name);
                sheet.Number(count);
            });
    }

    private static void Add(ZipArchive zip, string name, Action<Stream> content)
    {
        var entry = zip.CreateEntry(name, CompressionLevel.Optimal);
        entry.LastWriteTime = s_entryTime;
        using var stream = entry.Open();
        content(stream);
    }
}
