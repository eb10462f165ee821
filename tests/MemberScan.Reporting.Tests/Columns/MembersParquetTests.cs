using MemberScan.Reporting.Columns;
using Parquet;

namespace MemberScan.Reporting.Tests.Columns;

public sealed class MembersParquetTests
{
    [Fact]
    public async Task Columns_and_values_come_back_in_SI()
    {
        var record = FerryLanding.Small();

        await using var reader = await ParquetReader.CreateAsync(new MemoryStream(MembersParquet.Write(record)), cancellationToken: TestContext.Current.CancellationToken);

        Assert.Equal(MembersParquet.RunColumns.Select(c => c.Name).Concat(MemberColumns.All.Select(c => c.SiName)), reader.Schema.DataFields.Select(f => f.Name));
        using var group = reader.OpenRowGroupReader(0);
        Assert.Equal(record.Members.Length, group.RowCount);
        var limits = new double?[record.Members.Length];
        await group.ReadAsync<double>(reader.Schema.DataFields.Single(f => f.Name == "limit_Pa"), limits, cancellationToken: TestContext.Current.CancellationToken);
        Assert.Equal(record.Members.Select(m => m.Governing?.Limit), limits);
        var names = new string[record.Members.Length];
        await group.ReadAsync(reader.Schema.DataFields.Single(f => f.Name == "name"), names, cancellationToken: TestContext.Current.CancellationToken);
        Assert.Equal(record.Members.Select(m => m.Name.Length > 0 ? m.Name : null), names);
    }

    [Fact]
    public void The_same_record_gives_the_same_bytes() => Assert.Equal(MembersParquet.Write(FerryLanding.Small()), MembersParquet.Write(FerryLanding.Small()));

    [Fact]
    public void The_documented_schema_lists_exactly_these_columns()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder.FullName, "MemberScan.sln"))) folder = folder.Parent!;
        var rows = File.ReadLines(Path.Combine(folder.FullName, "config", "parquet-columns.md")).Where(l => l.StartsWith("| `", StringComparison.Ordinal)).Select(l => l.Split('|')).ToList();

        var expected = MembersParquet.RunColumns.Select(c => (c.Name, "text")).Concat(MemberColumns.All.Select(c => (c.SiName, c.Kind switch { ColumnKind.Text => "text", ColumnKind.Integer => "int32", _ => "double" })));
        Assert.Equal(expected, rows.Select(r => (r[1].Trim().Trim('`'), r[2].Trim())));
    }
}
