using System.IO.Compression;
using System.Text;

namespace MemberScan.Cli.Tests.Screening;

public sealed class FurtherOutputsTests
{
    private const string Name = "O'Neill Geländer 橋 🛟 C:\\rail";

    /// <summary>Every output of a run, on one processor and eight, in three languages and three time zones: a decimal comma or a local hour would be another byte.</summary>
    [Fact]
    public async Task All_outputs_are_the_same_bytes_whatever_threads_language_and_time_zone_and_again()
    {
        using var folder = new TemporaryFolder();
        var runs = new List<Dictionary<string, byte[]>>();
        foreach (var (threads, language, zone) in new[] { ("1", "C", "UTC"), ("8", "de_DE.UTF-8", "Pacific/Auckland"), ("8", "tr_TR.UTF-8", "America/St_Johns"), ("3", "C", "UTC") })
        {
            var output = folder[$"out{runs.Count}"];
            Directory.CreateDirectory(output);
            string Path(string name) => System.IO.Path.Combine(output, name);
            var start = Memberscan.Start(ScreenedSample.Arguments("gangway-rails", output,
                "--bcf", Path("t.bcf"), "--xlsx", Path("m.xlsx"), "--parquet", Path("m.parquet"), "--request", Path("r.csv"), "--request", Path("r.html"), "--set-template"));
            start.Environment["DOTNET_PROCESSOR_COUNT"] = threads;
            start.Environment["LC_ALL"] = start.Environment["LANG"] = language;
            start.Environment["TZ"] = zone;
            start.Environment.Remove("DOTNET_SYSTEM_GLOBALIZATION_INVARIANT");
            var ran = await Memberscan.Run(start);
            Assert.True(ran.ExitCode == 1, ran.All);
            runs.Add(Directory.EnumerateFiles(output).ToDictionary(f => System.IO.Path.GetFileName(f), File.ReadAllBytes));
        }

        Assert.Equal(9, runs[0].Count);
        foreach (var again in runs.Skip(1))
            Assert.All(runs[0], file => Assert.True(file.Value.AsSpan().SequenceEqual(again[file.Key]), file.Key));
    }

    [Fact]
    public async Task A_name_of_any_alphabet_comes_back_from_every_file()
    {
        using var folder = new TemporaryFolder();
        var table = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\nP-1,D + L,service,0,0,0,0,0,700,0\nP-1,D + L,service,1,0,0,0,0,700,0\n";

        var ran = await Memberscan.Run("screen", folder.Write("a.ifc", Posts.One(3.2e-3, name: Name)), "--forces", folder.Write("t.csv", table), "--bcf", folder["t.bcf"], "--bcf-version", "3.0", "--xlsx", folder["m.xlsx"]);
        var results = await Memberscan.Run("members", folder["a.checked.ifc"], "--results");

        Assert.True(ran.ExitCode == 1, ran.All);
        Assert.Contains(Name, results.Output, StringComparison.Ordinal);
        Assert.Contains(Name, await File.ReadAllTextAsync(folder["a.members.csv"], TestContext.Current.CancellationToken), StringComparison.Ordinal);
        Assert.Contains(Name, System.Net.WebUtility.HtmlDecode(await File.ReadAllTextAsync(folder["a.report.html"], TestContext.Current.CancellationToken)), StringComparison.Ordinal);
        Assert.Contains(Name, Content(folder["m.xlsx"], "sheet1.xml"), StringComparison.Ordinal);
        Assert.Contains(Name, Content(folder["t.bcf"], "markup.bcf"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Wrong_endings_and_clashing_paths_end_in_64()
    {
        using var folder = new TemporaryFolder();
        var model = folder.Write("a.ifc", Posts.One(3.2e-3));

        Assert.Equal(64, (await Memberscan.Run("screen", model, "--request", folder["r.txt"])).ExitCode);
        Assert.Equal(64, (await Memberscan.Run("screen", model, "--xlsx", model)).ExitCode);
        Assert.Equal(64, (await Memberscan.Run("screen", model, "--bcf", folder["a.report.html"])).ExitCode);
        Assert.Equal(["a.ifc"], folder.Names);
    }

    [Fact]
    public async Task A_specification_that_can_say_nothing_is_not_written_and_an_old_one_goes()
    {
        using var folder = new TemporaryFolder();
        var old = folder.Write("r.ids", "old");

        var ran = await Memberscan.Run("screen", folder.Write("a.ifc", Posts.One(3.2e-3)), "--request", old);

        Assert.True(ran.ExitCode == 2, ran.All);
        Assert.Contains("not written: ", ran.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("r.ids", folder.Names);
    }

    private static string Content(string zipFile, string ending)
    {
        using var zip = ZipFile.OpenRead(zipFile);
        using var reader = new StreamReader(zip.Entries.First(e => e.FullName.EndsWith(ending, StringComparison.Ordinal)).Open(), Encoding.UTF8);
        return reader.ReadToEnd();
    }
}
