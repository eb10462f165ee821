using System.Text;
using MemberScan.Cli.Tests.Screening;
using MemberScan.OpenModels;
using MemberScan.Part21.Containers;

namespace MemberScan.Cli.Tests.Restoring;

public sealed class RestoreRunTests
{
    public static TheoryData<string> OpenModels => [.. OpenModel.All.Select(p => Path.GetFileName(p))];

    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task A_checked_sample_gives_its_original_bytes(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);
        Assert.Equal(code, sample.Ran.ExitCode);
        using var folder = new TemporaryFolder();
        var path = folder.Write(name + ".checked.ifc", sample.Checked);

        var ran = await Memberscan.Run("restore", path);

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.Equal(sample.Input, await File.ReadAllBytesAsync(folder[name + ".restored.ifc"]));
        Assert.Contains("These are the original bytes", ran.Output, StringComparison.Ordinal);
        Assert.Equal([name + ".checked.ifc", name + ".restored.ifc"], folder.Names);
    }

    // Screened and restored in one process each; a model that cannot be read to its end has no checked model.
    [Theory(SkipTestWithoutData = true)]
    [MemberData(nameof(OpenModels))]
    public void A_checked_open_model_gives_its_original_bytes(string name)
    {
        var (text, _) = MemberScan.Part21.ModelContainer.Read(OpenModel.Path(name));
        var diagnostics = new MemberScan.Foundation.Diagnostics.DiagnosticList();
        var outcome = MemberScan.Screening.Screener.Run(
            new MemberScan.Screening.ScreeningRequest { Model = ModelText.Of(text, name), Settings = MemberScan.Inputs.SettingsFiles.Settings.Default, Timestamp = "", Version = "0" }, diagnostics);
        Assert.NotNull(outcome);
        Assert.SkipUnless(outcome.CanWriteModel, "the model is not read to its end");
        using var folder = new TemporaryFolder();
        var written = new System.Buffers.ArrayBufferWriter<byte>();
        outcome.WriteModel(written);
        Assert.SkipWhen(written.WrittenCount == text.Length, "no candidates, so no results");
        var path = folder.Write("a.checked.ifc", written.WrittenSpan);

        var code = MemberScan.Cli.Restoring.RestoreRun.Execute(path, null, TextWriter.Null, TextWriter.Null);

        Assert.Equal(0, code);
        Assert.Equal(text, File.ReadAllBytes(folder["a.restored.ifc"]));
    }

    [Fact]
    public async Task A_reference_by_others_is_refused_and_named_and_screening_writes_no_model()
    {
        var sample = await ScreenedSample.Of("deck-hangers");
        using var folder = new TemporaryFolder();
        var text = Encoding.Latin1.GetString(sample.Checked);
        var set = System.Text.RegularExpressions.Regex.Match(text, @"#(\d+)=IFCPROPERTYSET\('[^']*',[^,]*,'MemberScan_StressCheck'").Groups[1].Value;
        text = text.Insert(text.LastIndexOf("ENDSEC", StringComparison.Ordinal), $"#900001=IFCRELASSOCIATES('2O2Fr$t4X7Zf8NOew3FL98',$,$,$,(#{set}));\n");
        var path = folder.Write("a.ifc", Encoding.Latin1.GetBytes(text));

        var restored = await Memberscan.Run("restore", path);
        var screened = await Memberscan.Run("screen", path, "--forces", Memberscan.Sample("deck-hangers.forces.csv"));

        Assert.Equal(1, restored.ExitCode);
        Assert.Contains($"#900001 IFCRELASSOCIATES refers to #{set}", restored.Error, StringComparison.Ordinal);
        Assert.Contains("SCR-0023", screened.Error, StringComparison.Ordinal);
        Assert.Equal(["a.ifc", "a.members.csv", "a.report.html", "a.run.json"], folder.Names);
    }

    [Fact]
    public async Task Lines_behind_ours_stay_and_a_second_run_replaces_ours_only()
    {
        var sample = await ScreenedSample.Of("deck-hangers");
        using var folder = new TemporaryFolder();
        const string Line = "#900001=IFCPERSON($,'later',$,$,$,$,$,$);\n";
        byte[] Behind(byte[] bytes)
        {
            var text = Encoding.Latin1.GetString(bytes);
            return Encoding.Latin1.GetBytes(text.Insert(text.LastIndexOf("ENDSEC", StringComparison.Ordinal), Line));
        }

        var path = folder.Write("a.ifc", Behind(sample.Checked));

        var restored = await Memberscan.Run("restore", path);
        var screened = await Memberscan.Run("screen", path, "--forces", Memberscan.Sample("deck-hangers.forces.csv"), "--verbose");

        Assert.Equal(2, restored.ExitCode);
        Assert.Equal(Behind(sample.Input), await File.ReadAllBytesAsync(folder["a.restored.ifc"]));
        Assert.Contains("SCR-0021", screened.Error, StringComparison.Ordinal);
        var again = Encoding.Latin1.GetString(await File.ReadAllBytesAsync(folder["a.checked.ifc"]));
        Assert.Equal(Count(Encoding.Latin1.GetString(sample.Checked)), Count(again));

        static int Count(string text) => text.Split("'MemberScan_StressCheck'").Length - 1;
    }

    [Fact]
    public async Task Sets_of_a_file_written_anew_are_replaced_not_doubled()
    {
        var sample = await ScreenedSample.Of("deck-hangers");
        using var folder = new TemporaryFolder();
        var anew = System.Text.RegularExpressions.Regex.Replace(Encoding.Latin1.GetString(sample.Checked), @"/\* MemberScan block[^\n]*\n", "");
        var path = folder.Write("a.ifc", Encoding.Latin1.GetBytes(anew));

        var screened = await Memberscan.Run("screen", path, "--forces", Memberscan.Sample("deck-hangers.forces.csv"), "--timestamp", ScreenedSample.Time);

        Assert.Contains("SCR-0022", screened.Error, StringComparison.Ordinal);
        Assert.Equal(sample.Checked, await File.ReadAllBytesAsync(folder["a.checked.ifc"]));
    }

    [Fact]
    public async Task A_model_without_results_gives_nothing_and_says_so()
    {
        using var folder = new TemporaryFolder();

        var ran = await Memberscan.Run("restore", Memberscan.Sample("mast-stays.ifc"), "--out", folder.Path);

        Assert.Equal(2, ran.ExitCode);
        Assert.Contains("carries no results", ran.Error, StringComparison.Ordinal);
        Assert.Empty(folder.Names);
    }

    [Fact]
    public async Task A_folder_that_takes_nothing_ends_in_74()
    {
        using var folder = new TemporaryFolder();
        var sample = await ScreenedSample.Of("deck-hangers");
        var path = folder.Write("a.checked.ifc", sample.Checked);

        var ran = await Memberscan.Run("restore", path, "--out", Path.Combine(path, "below-a-file"));

        Assert.Equal(74, ran.ExitCode);
        Assert.Equal(["a.checked.ifc"], folder.Names);
    }
}
