using System.Buffers;
using System.Globalization;
using MemberScan.Cli.Tests.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.WriteBack;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.OpenModels;
using MemberScan.Part21;
using MemberScan.Part21.Containers;
using MemberScan.Screening;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Tests.Readers;

/// <summary>The checked models as an independent parser (Debian's libifcplusplus, which reads IFC2X3 and IFC4) reads them.</summary>
public sealed class IfcPlusPlusTests
{
    // Its version of 2019 stops at some texts, and leaves the elements of others empty (too few arguments), with our sets or without.
    private const string Unreadable = "the library cannot read the model itself: ";

    public static TheoryData<string> Models => [.. Directory.EnumerateFiles(Memberscan.Sample(""), "*.ifc").Concat(OpenModel.All)];

    [Theory]
    [MemberData(nameof(Models))]
    public async Task Sets_values_and_units_are_found_and_no_original_instance_is_read_otherwise(string path)
    {
        var (bytes, checkedModel, record) = Screened(path);
        Assert.SkipUnless(record.Model.ReadAs is "IFC2X3" or "IFC4", "the library reads nothing of " + record.Model.ReadAs);
        using var folder = new TemporaryFolder();

        var before = await OtherProgram.IfcPlusPlus(folder.Write("model.ifc", bytes));
        Assert.SkipUnless(before.ExitCode == 0, Unreadable + before.Error);
        var after = await OtherProgram.IfcPlusPlus(folder.Write("checked.ifc", checkedModel));

        Assert.True(after.ExitCode == 0, after.All);
        var (original, appended) = (Lines(before.Output), Lines(after.Output));
        Assert.NotEmpty(original['I']);
        Assert.Empty(original['I'].Except(appended['I'], StringComparer.Ordinal));
        Assert.Equal(original['U'], appended['U']);
        var text = string.Concat(original['I']);
        var found = record.Members.Where(m => text.Contains($"'{m.GlobalId}'", StringComparison.Ordinal)).ToList();
        Assert.SkipWhen(found.Count == 0, Unreadable + "it finds none of the elements");
        AssertSets(record, found, appended['P']);
    }

    private static void AssertSets(ScreeningRecord record, List<MemberResult> found, IEnumerable<string> lines)
    {
        var sets = lines.Select(l => l.Split('\t')).Where(f => f[2] == StressCheckSet.SetName).GroupBy(f => f[1], StringComparer.Ordinal)
            .ToDictionary(g => g.Key, g => g.ToDictionary(f => f[3], f => (Type: f[4], Value: f[5]), StringComparer.Ordinal), StringComparer.Ordinal);
        Assert.All(found.GroupBy(m => m.GlobalId, StringComparer.Ordinal).Where(g => g.Count() == 1).Select(g => g.Single()), member =>
        {
            var set = sets[member.GlobalId];
            Assert.Equal(("IfcLabel", member.Verdict switch
            {
                Model.Verdicts.Verdict.WithinLimit => "WITHIN LIMIT",
                Model.Verdicts.Verdict.Overstressed => "OVERSTRESSED",
                _ => "NOT CHECKED",
            }), set["Status"]);
            Assert.Equal(("IfcIdentifier", record.RunId), set["RunId"]);
            if (member.Governing is not { } governing)
            {
                Assert.False(set.ContainsKey("Utilization"));
                return;
            }

            Number(set["Utilization"], "IfcRatioMeasure", governing.Utilization);
            Number(set["Station"], "IfcLengthMeasure", governing.Station / Factor(record, "LENGTHUNIT"));
            if (Factor(record, "PRESSUREUNIT") is var pressure and > 0) Number(set["StressLimit"], "IfcPressureMeasure", governing.Limit / pressure);
            Assert.Equal(("IfcLabel", governing.Situation), (set["Situation"].Type, Unquoted(set["Situation"].Value)));
        });
    }

    private static void Number((string Type, string Value) read, string type, double expected)
    {
        Assert.Equal(type, read.Type);
        Assert.Equal(expected, double.Parse(read.Value, CultureInfo.InvariantCulture), 1e-6 * Math.Abs(expected) + 1e-9);
    }

    // The library leaves doubled apostrophes and backslashes as they stand in the file.
    private static string Unquoted(string text) => text.Replace("''", "'", StringComparison.Ordinal).Replace(@"\\", @"\", StringComparison.Ordinal);

    private static double Factor(ScreeningRecord record, string unitType) => record.Model.Units.FirstOrDefault(u => u.UnitType == unitType)?.Factor ?? 0;

    private static ILookup<char, string> Lines(string output) => output.Split('\n', StringSplitOptions.RemoveEmptyEntries).ToLookup(l => l[0]);

    private static (byte[] Text, byte[] Checked, ScreeningRecord Record) Screened(string path)
    {
        var (text, _) = ModelContainer.Read(path);
        var diagnostics = new DiagnosticList();
        var table = Path.ChangeExtension(path, ".forces.csv");
        var request = new ScreeningRequest
        {
            Model = ModelText.Of(text, Path.GetFileName(path)),
            Settings = Settings.Default,
            Tables = File.Exists(table) ? [ForcesTable.Read(File.ReadAllBytes(table), Path.GetFileName(table), diagnostics)!] : [],
            Timestamp = ScreenedSample.Time,
            Version = "0",
        };
        var outcome = Screener.Run(request, diagnostics);
        Assert.NotNull(outcome);
        Assert.SkipUnless(outcome.CanWriteModel, "the model is not read to its end");
        Assert.SkipWhen(outcome.Record.Members.IsEmpty, "no candidates, so no results");
        var output = new ArrayBufferWriter<byte>();
        outcome.WriteModel(output);
        return (text, output.WrittenSpan.ToArray(), outcome.Record);
    }
}
