using System.Globalization;
using System.Text.Json;
using MemberScan.Cli.Tests.Screening;

namespace MemberScan.Cli.Tests.Readers;

/// <summary>The questions of <c>config/parquet-questions.sql</c> over the Parquet files of several models, answered by DuckDB.</summary>
public sealed class DuckDbTests
{
    [Fact]
    public async Task The_published_questions_are_answered_as_the_run_records_say()
    {
        using var folder = new TemporaryFolder();
        var ran = await Memberscan.Run(
            "screen", Memberscan.Sample(""), "--forces-beside", "--timestamp", ScreenedSample.Time, "--out", folder["out"], "--parquet", Path.Combine(folder["results"], "*.parquet"));
        Assert.True(ran.ExitCode == 1, ran.All);

        var asked = await OtherProgram.Node("@duckdb/node-api", "ask-parquet.mjs", Path.Combine(Memberscan.Root, "config", "parquet-questions.sql"), folder.Path);

        Assert.True(asked.ExitCode == 0, asked.All);
        using var answers = JsonDocument.Parse(asked.Output);
        var models = Directory.EnumerateFiles(folder["out"], "*.run.json").Select(f => JsonDocument.Parse(File.ReadAllBytes(f)).RootElement.GetProperty("screening")).ToList();
        var members = models.SelectMany(m => m.GetProperty("members").EnumerateArray()).ToList();
        Assert.Equal(models.Select(Worst).OrderByDescending(w => w.Utilization), answers.RootElement[0].EnumerateArray().Select(r =>
            (Text(r, "model"), Text(r, "worst"), r.GetProperty("utilization").GetDouble(), int.Parse(Text(r, "candidates"), CultureInfo.InvariantCulture))));
        Assert.Equal(
            members.Where(m => Text(m, "verdict") == "OVERSTRESSED").GroupBy(m => Text(m, "section")).Select(g => (g.Key, g.Count())).Order(),
            answers.RootElement[1].EnumerateArray().Select(r => (Text(r, "section"), int.Parse(Text(r, "members"), CultureInfo.InvariantCulture))).Order());
        Assert.Equal(
            members.Where(m => Text(m, "verdict") == "NOT CHECKED").GroupBy(m => Text(m.GetProperty("reason"), "code")).Select(g => (g.Key, g.Count())).Order(),
            answers.RootElement[2].EnumerateArray().Select(r => (Text(r, "reasonCode"), int.Parse(Text(r, "members"), CultureInfo.InvariantCulture))).Order());
    }

    private static (string Model, string Worst, double Utilization, int Candidates) Worst(JsonElement model)
    {
        var members = model.GetProperty("members").EnumerateArray().ToList();
        var worst = members.Where(m => m.GetProperty("governing").ValueKind != JsonValueKind.Null).MaxBy(m => m.GetProperty("governing").GetProperty("utilization").GetDouble());
        return (Text(model.GetProperty("model"), "fileName"), Text(worst.GetProperty("identity"), "key"), Math.Round(worst.GetProperty("governing").GetProperty("utilization").GetDouble(), 3), members.Count);
    }

    private static string Text(JsonElement element, string property) => element.GetProperty(property).GetString()!;
}
