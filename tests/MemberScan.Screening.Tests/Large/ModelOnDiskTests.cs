using System.Text.Json;
using System.Text.Json.Serialization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.OpenModels;
using MemberScan.Part21.Containers;
using MemberScan.SampleModels.Scenario;

namespace MemberScan.Screening.Tests.Large;

/// <summary>A model that stays on disk while it is screened against the same held in memory: the same verdicts, the same checked model.</summary>
public sealed class ModelOnDiskTests : IDisposable
{
    // Open models above this take long in both ways and show nothing that smaller ones do not [byte].
    private const long LargestCompared = 4_000_000;

    private static readonly JsonSerializerOptions s_json = new() { NumberHandling = JsonNumberHandling.AllowNamedFloatingPointLiterals };

    private readonly string _folder = Directory.CreateTempSubdirectory("memberscan-on-disk-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Theory]
    [InlineData(GangwayRails.Name)]
    [InlineData(DeckHangers.Name)]
    [InlineData(MastStays.Name)]
    public void Samples_are_screened_the_same(string name)
    {
        var sample = SampleModel.All().Single(s => s.Name == name);
        var path = Path.Combine(_folder, sample.Name + ".ifc");
        File.WriteAllBytes(path, sample.Model.AsSpan());
        ForcesTable[] tables = sample.ForcesTable.IsEmpty ? [] : [ForcesTable.Read(sample.ForcesTable.AsMemory(), "forces.csv", new DiagnosticList())!];
        AssertSame(path, Settings.Default, tables);
    }

    [Fact]
    public void Open_models_are_screened_the_same()
    {
        OpenModel.SkipIfAbsent();
        var diagnostics = new DiagnosticList();
        var withMeshes = SettingsFile.Read("""{ "sections": { "recogniseMeshes": true } }"""u8.ToArray(), "settings.json", diagnostics)!;
        foreach (var path in OpenModel.All.Where(path => new FileInfo(path).Length < LargestCompared && path.EndsWith(".ifc", StringComparison.OrdinalIgnoreCase)))
            AssertSame(path, withMeshes, []);
    }

    [Fact]
    public void A_checked_model_on_disk_is_screened_like_its_base_model()
    {
        var sample = SampleModel.All().Single(s => s.Name == MastStays.Name);
        var path = Path.Combine(_folder, "stays.ifc");
        File.WriteAllBytes(path, sample.Model.AsSpan());
        var (_, written) = Screened(path, 0, Settings.Default, []);
        File.WriteAllBytes(path, written);

        var (again, writtenAgain) = Screened(path, 0, Settings.Default, []);

        Assert.Equal(written, writtenAgain);
        Assert.Equal(sample.Model.Length, again.Record.Model.Bytes);
    }

    [Fact]
    public void A_reference_to_nothing_is_damage_on_disk_too()
    {
        var text = System.Text.Encoding.UTF8.GetString(SampleModel.All().Single(s => s.Name == MastStays.Name).Model.AsSpan());
        var path = Path.Combine(_folder, "stays.ifc");
        File.WriteAllText(path, System.Text.RegularExpressions.Regex.Replace(text, @"(=IFCMEMBER\([^#]*#\d+,[^#]*)#\d+", "$1#99999999"));

        var (outcome, _) = Screened(path, 0, Settings.Default, []);

        Assert.True(outcome.Record.HasDamage);
        Assert.Contains(outcome.Record.Findings, f => f.Code == "P21-0028" && f.Place.Contains("line", StringComparison.Ordinal));
    }

    private void AssertSame(string path, Settings settings, ForcesTable[] tables)
    {
        var (held, heldModel) = Screened(path, long.MaxValue, settings, tables);
        var (disk, diskModel) = Screened(path, 0, settings, tables);

        Assert.Equal(held.Record.Counts, disk.Record.Counts);
        Assert.Equal(Json(held.Record.Model), Json(disk.Record.Model));
        Assert.Equal(Json(held.Record.PassedOver), Json(disk.Record.PassedOver));
        Assert.Equal(Json(held.Record.Members), Json(disk.Record.Members));
        Assert.Equal(heldModel, diskModel);
    }

    private (ScreeningOutcome Outcome, byte[] Model) Screened(string path, long longestHeld, Settings settings, ForcesTable[] tables)
    {
        using var text = ModelText.Open(path, longestHeld);
        Assert.Equal(longestHeld == 0, text.IsOnDisk);
        var request = new ScreeningRequest { Model = text, Settings = settings, Tables = [.. tables], Timestamp = "2026-03-04T05:06:07Z", Version = "1.2.3" };
        var outcome = Screener.Run(request, new DiagnosticList(), null, TestContext.Current.CancellationToken)!;
        if (!outcome.CanWriteModel) return (outcome, []);

        var target = Path.Combine(_folder, "checked.ifc");
        using (var file = new FileStream(target, FileMode.Create, FileAccess.Write)) outcome.WriteModel(file);
        return (outcome, File.ReadAllBytes(target));
    }

    private static string Json<T>(T value) => JsonSerializer.Serialize(value, s_json);
}
