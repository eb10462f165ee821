using System.Collections.Concurrent;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Part21.Containers;
using MemberScan.Screening;

namespace MemberScan.Reporting.Tests.Sheets;

/// <summary>The sample models, each screened once with its forces table where it has one.</summary>
internal static class Screened
{
    private static readonly ConcurrentDictionary<string, Lazy<ScreeningOutcome>> s_made = new(StringComparer.Ordinal);

    public static TheoryData<string> Samples => ["gangway-rails", "deck-hangers", "mast-stays"];

    public static ScreeningOutcome Of(string name) => s_made.GetOrAdd(name, n => new Lazy<ScreeningOutcome>(() => Make(n))).Value;

    private static ScreeningOutcome Make(string name)
    {
        var diagnostics = new DiagnosticList();
        var table = Path.Combine(Folder(), name + ".forces.csv");
        var outcome = Screener.Run(
            new ScreeningRequest
            {
                Model = ModelText.Of(File.ReadAllBytes(Path.Combine(Folder(), name + ".ifc")), name + ".ifc"),
                Settings = Settings.Default,
                Tables = File.Exists(table) ? [ForcesTable.Read(File.ReadAllBytes(table), name + ".forces.csv", diagnostics)!] : [],
                Timestamp = "2031-04-02T08:15:00Z",
                Version = "0.1.0",
            },
            diagnostics);
        Assert.True(outcome is not null, string.Join('\n', diagnostics.Items.Select(d => d.Message)));
        return outcome;
    }

    private static string Folder()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (Path.Combine(folder.FullName, "sample-models") is var path && Directory.Exists(path)) return path;
        throw new DirectoryNotFoundException("The tests run outside the repository.");
    }
}
