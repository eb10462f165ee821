using System.Collections.Concurrent;
using System.Text.Json;

namespace MemberScan.Cli.Tests.Screening;

/// <summary>The outputs of one screening of a sample, made once for all tests; with its forces table where it has one.</summary>
internal sealed record ScreenedSample(string Name, Memberscan.Ran Ran, byte[] Input, byte[] Checked, byte[] Csv, byte[] RunJson, string Report)
{
    /// <summary>Time given to the runs.</summary>
    public const string Time = "2026-03-04T05:06:07Z";

    private static readonly ConcurrentDictionary<string, Lazy<Task<ScreenedSample>>> s_made = new(StringComparer.Ordinal);

    /// <summary>Names of the samples and the exit code of each.</summary>
    public static TheoryData<string, int> Samples => new() { { "gangway-rails", 1 }, { "deck-hangers", 1 }, { "mast-stays", 1 } };

    /// <summary>The run record as JSON.</summary>
    public JsonElement Screening => JsonDocument.Parse(RunJson).RootElement.GetProperty("screening");

    /// <summary>Screens a sample.</summary>
    public static Task<ScreenedSample> Of(string name) => s_made.GetOrAdd(name, n => new Lazy<Task<ScreenedSample>>(() => Make(n))).Value;

    /// <summary>Arguments that screen a sample with its table.</summary>
    public static string[] Arguments(string name, string folder, params string[] more)
    {
        var table = Memberscan.Sample(name + ".forces.csv");
        return ["screen", Memberscan.Sample(name + ".ifc"), .. File.Exists(table) ? new[] { "--forces", table } : [], "--timestamp", Time, "--out", folder, .. more];
    }

    private static async Task<ScreenedSample> Make(string name)
    {
        using var folder = new TemporaryFolder();
        var ran = await Memberscan.Run(Arguments(name, folder.Path));
        Assert.True(ran.ExitCode is 0 or 1 or 2, ran.All);
        Assert.Equal(new[] { ".checked.ifc", ".members.csv", ".report.html", ".run.json" }.Select(e => name + e), folder.Names);
        byte[] Read(string ending) => File.ReadAllBytes(folder[name + ending]);
        return new ScreenedSample(
            name, ran, await File.ReadAllBytesAsync(Memberscan.Sample(name + ".ifc")), Read(".checked.ifc"), Read(".members.csv"), Read(".run.json"),
            await File.ReadAllTextAsync(folder[name + ".report.html"]));
    }
}
