using System.Text.Json;
using MemberScan.Cli.Tests.Screening;

namespace MemberScan.Cli.Tests.Readers;

/// <summary>The Parquet file as an independent reader (the npm package hyparquet) reads it.</summary>
public sealed class ParquetReaderTests
{
    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task Columns_types_and_values_are_those_of_the_run_record(string name, int code)
    {
        using var folder = new TemporaryFolder();
        var ran = await Memberscan.Run(ScreenedSample.Arguments(name, folder.Path, "--parquet", folder["m.parquet"]));
        Assert.True(ran.ExitCode == code, ran.All);

        var read = await OtherProgram.Node("hyparquet", "read-parquet.mjs", folder["m.parquet"]);

        Assert.True(read.ExitCode == 0, read.All);
        using var json = JsonDocument.Parse(read.Output);
        Assert.Equal(Documented(), json.RootElement.GetProperty("columns").EnumerateArray().Select(c => (c.GetProperty("name").GetString()!, c.GetProperty("type").GetString()!)));
        using var run = JsonDocument.Parse(await File.ReadAllBytesAsync(folder[name + ".run.json"], TestContext.Current.CancellationToken));
        var screening = run.RootElement.GetProperty("screening");
        var (rows, members) = (json.RootElement.GetProperty("rows").EnumerateArray().ToList(), screening.GetProperty("members").EnumerateArray().ToList());
        Assert.Equal(members.Count, rows.Count);
        Assert.All(rows.Zip(members), pair => Compare(pair.First, pair.Second, screening));
    }

    private static void Compare(JsonElement row, JsonElement member, JsonElement screening)
    {
        Assert.Equal(screening.GetProperty("runId").GetString(), row.GetProperty("runId").GetString());
        Assert.Equal(screening.GetProperty("model").GetProperty("sha256").GetString(), row.GetProperty("modelSha256").GetString());
        foreach (var text in new[] { "key", "globalId", "tag", "name", "class", "role" })
            Assert.Equal(member.GetProperty("identity").GetProperty(text).GetString(), row.GetProperty(text).GetString() ?? "");
        Assert.Equal(member.GetProperty("section").GetString(), row.GetProperty("section").GetString() ?? "");
        Assert.Equal(member.GetProperty("verdict").GetString(), row.GetProperty("status").GetString());
        Same(member.GetProperty("length"), row.GetProperty("length_m"));
        Same(member.GetProperty("strength"), row.GetProperty("strength_Pa"));
        var governing = member.GetProperty("governing");
        if (governing.ValueKind == JsonValueKind.Null)
        {
            Assert.All(new[] { "utilization", "stress_Pa", "N_N", "My_Nm" }, column => Assert.Equal(JsonValueKind.Null, row.GetProperty(column).ValueKind));
            return;
        }

        (string Column, JsonElement Value)[] numbers =
        [
            ("utilization", governing.GetProperty("utilization")), ("stress_Pa", governing.GetProperty("stress")), ("limit_Pa", governing.GetProperty("limit")), ("station_m", governing.GetProperty("station")),
            ("y_m", governing.GetProperty("point").GetProperty("y")), ("z_m", governing.GetProperty("point").GetProperty("z")),
            .. new[] { ("N_N", "n"), ("Vy_N", "vy"), ("Vz_N", "vz"), ("T_Nm", "t"), ("My_Nm", "my"), ("Mz_Nm", "mz") }.Select(c => (c.Item1, governing.GetProperty("forces").GetProperty(c.Item2))),
        ];
        Assert.All(numbers, n => Same(n.Value, row.GetProperty(n.Column)));
    }

    // Both are doubles written with all their digits, so they are equal to the last bit.
    private static void Same(JsonElement expected, JsonElement read)
    {
        if (expected.ValueKind == JsonValueKind.Null) Assert.Equal(JsonValueKind.Null, read.ValueKind);
        else Assert.Equal(expected.GetDouble(), read.GetDouble());
    }

    // The columns as documented for those who query the files, with the physical types of the format.
    private static IEnumerable<(string, string)> Documented() => File.ReadLines(Path.Combine(Memberscan.Root, "config", "parquet-columns.md"))
        .Where(l => l.StartsWith("| `", StringComparison.Ordinal)).Select(l => l.Split('|'))
        .Select(c => (c[1].Trim(' ', '`'), c[2].Trim() switch { "int32" => "INT32", "double" => "DOUBLE", _ => "BYTE_ARRAY" }));
}
