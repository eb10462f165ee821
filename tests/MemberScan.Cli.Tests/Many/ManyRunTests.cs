using System.Globalization;
using System.Text;
using AngleSharp.Html.Parser;
using MemberScan.Cli.Tests.Screening;

namespace MemberScan.Cli.Tests.Many;

public sealed class ManyRunTests
{
    private const string Time = ScreenedSample.Time;

    [Fact]
    public async Task A_folder_gives_the_outputs_that_each_model_gives_alone_and_one_index_whatever_the_workers()
    {
        using var folder = new TemporaryFolder();
        var landing = Landing(folder);
        var trees = new List<SortedDictionary<string, byte[]>>();
        foreach (var workers in new[] { "1", "4", "4" })
        {
            var ran = await Memberscan.Run("screen", landing, "--forces-beside", "--timestamp", Time, "--workers", workers, "--out", folder[$"out{trees.Count}"], "--parquet", Path.Combine(folder[$"out{trees.Count}"], "*.parquet"));
            Assert.True(ran.ExitCode == 1, ran.All);
            Assert.Contains("4 models screened + 0 not screened = 4 models", ran.Output, StringComparison.Ordinal);
            trees.Add(Tree(folder[$"out{trees.Count}"]));
        }

        Assert.Equal(["deck/post.checked.ifc", "deck/post.finished.json", "deck/post.members.csv", "deck/post.parquet", "deck/post.report.html", "deck/post.run.json"], trees[0].Keys.Where(k => k.StartsWith("deck/", StringComparison.Ordinal)));
        Assert.Equal(2 + 4 * 6, trees[0].Count);
        Assert.All(trees.Skip(1), tree => AssertSame(trees[0], tree));
        await Memberscan.Run("screen", Path.Combine(landing, "deck", "post.ifc"), "--forces", Path.Combine(landing, "deck", "post.forces.csv"), "--timestamp", Time, "--out", folder["alone"]);
        Assert.All(Tree(folder["alone"]), file => Assert.Equal(file.Value, trees[0]["deck/" + file.Key]));
    }

    [Fact]
    public async Task A_model_that_fails_stops_no_other_and_the_worst_code_is_returned()
    {
        using var folder = new TemporaryFolder();
        var landing = Landing(folder);
        File.WriteAllText(Path.Combine(landing, "rail.forces.csv"), "nonsense\n");
        var cut = File.ReadAllBytes(Path.Combine(landing, "fine.ifc"));
        File.WriteAllBytes(Path.Combine(landing, "cut.ifc"), cut[..(cut.Length / 2)]);

        var ran = await Memberscan.Run("screen", landing, Path.Combine(landing, "absent.ifc"), "--forces-beside", "--timestamp", Time, "--out", folder["out"]);

        Assert.True(ran.ExitCode == 74, ran.All);
        var rows = Rows(Path.Combine(folder["out"], "models.index.csv"));
        Assert.Equal(["cut.ifc", "post.ifc", "fine.ifc", "open.ifc", "rail.ifc", "absent.ifc"], rows.Select(r => Path.GetFileName(r[0])));
        Assert.Equal(["NOT READ TO ITS END", "OVERSTRESSED", "WITHIN LIMIT", "NOT CHECKED IN FULL", "NOT SCREENED", "NOT SCREENED"], rows.Select(r => r[1]));
        Assert.Equal(["3", "1", "0", "2", "64", "74"], rows.Select(r => r[2]));
        Assert.Contains("absent.ifc' does not exist", rows[5][^1], StringComparison.Ordinal);
        Assert.Equal(["cut", "fine", "open"], Directory.EnumerateFiles(folder["out"], "*.report.html").Select(f => Path.GetFileName(f)[..^".report.html".Length]).Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task The_page_shows_all_models_their_sum_and_the_overstressed_worst_first_with_links_that_lead_somewhere()
    {
        using var folder = new TemporaryFolder();
        var landing = Landing(folder);
        await Memberscan.Run("screen", landing, "--forces-beside", "--timestamp", Time, "--out", folder["out"]);

        using var page = new HtmlParser().ParseDocument(await File.ReadAllTextAsync(Path.Combine(folder["out"], "models.index.html"), TestContext.Current.CancellationToken));

        Assert.Contains("4 models: 4 screened + 0 not screened. Of those screened: 1 within limit + 2 overstressed + 1 not checked = 4 candidates.", page.Body!.TextContent, StringComparison.Ordinal);
        Assert.Equal(4, page.QuerySelectorAll("table")[0].QuerySelectorAll("tbody tr").Length);
        var worst = page.QuerySelectorAll("table")[1].QuerySelectorAll("tbody tr").Select(r => double.Parse(r.QuerySelector("td")!.TextContent[2..], CultureInfo.InvariantCulture)).ToList();
        Assert.Equal(2, worst.Count);
        Assert.Equal(worst.OrderDescending(), worst);
        Assert.Empty(page.QuerySelectorAll("script, img, link, iframe, [src]"));
        Assert.All(page.QuerySelectorAll("a"), a =>
        {
            var parts = a.GetAttribute("href")!.Split('#');
            var report = Path.Combine(folder["out"], Uri.UnescapeDataString(parts[0]));
            Assert.True(File.Exists(report), report);
            if (parts.Length > 1) Assert.NotNull(new HtmlParser().ParseDocument(File.ReadAllText(report)).GetElementById(parts[1]));
        });
    }

    [Fact]
    public async Task Resuming_passes_over_what_is_finished_and_only_that()
    {
        using var folder = new TemporaryFolder();
        var landing = Landing(folder);
        string[] arguments = ["screen", landing, "--forces-beside", "--timestamp", Time, "--out", folder["out"], "--resume"];
        await Memberscan.Run(arguments);
        var before = Tree(folder["out"]);

        var again = await Memberscan.Run(arguments);
        AssertSame(before, Tree(folder["out"]));
        File.AppendAllText(Path.Combine(landing, "rail.forces.csv"), "# a remark\n");
        File.Delete(Path.Combine(folder["out"], "fine.members.csv"));
        File.WriteAllText(Path.Combine(folder["out"], "deck", "post.report.html"), "changed by hand");
        var third = await Memberscan.Run(arguments);

        Assert.Equal(4, Finished(again));
        Assert.Equal(1, again.ExitCode);
        Assert.Equal(1, Finished(third));
        Assert.Matches("open\\.ifc: .*\\(finished before\\)", third.Output);
        Assert.Equal(before["fine.members.csv"], Tree(folder["out"])["fine.members.csv"]);
        Assert.Equal(before["deck/post.report.html"], Tree(folder["out"])["deck/post.report.html"]);
        var other = await Memberscan.Run([.. arguments, "--kind", "design"]);
        Assert.Equal(0, Finished(other));

        static int Finished(Memberscan.Ran ran) => ran.Output.Split("(finished before)").Length - 1;
    }

    [Fact]
    public async Task Patterns_find_models_and_never_our_own_outputs()
    {
        using var folder = new TemporaryFolder();
        var landing = Landing(folder);
        foreach (var round in new[] { 1, 2 })
        {
            var ran = await Memberscan.Run("screen", Path.Combine(landing, "**", "*o*.ifc"), "--forces-beside", "--timestamp", Time);

            Assert.True(ran.ExitCode == 1, round + ran.All);
            Assert.Equal(["post.ifc", "open.ifc"], Rows(Path.Combine(landing, "models.index.csv")).Select(r => Path.GetFileName(r[0])));
        }
    }

    [Fact]
    public async Task Models_that_would_write_the_same_files_and_outputs_without_a_star_are_refused_before_anything_is_written()
    {
        using var folder = new TemporaryFolder();
        var landing = Landing(folder);
        string One(string name) => Path.Combine(landing, name);
        File.Copy(One("fine.ifc"), One("fine.checked.ifc"));
        var before = Tree(landing);

        foreach (var (arguments, word) in new (string[], string)[]
        {
            ([One("fine.ifc"), One("fine.checked.ifc")], "would both write"),
            ([One("fine.ifc"), One("open.ifc"), "--parquet", One("m.parquet")], "needs one '*'"),
            ([One("fine.ifc"), One("open.ifc"), "--workers", "0"], "--workers 0 is out of range"),
            ([landing, "--timestamp", "yesterday"], "is no time"),
            ([landing, One("*.none")], "finds no model"),
            ([Directory.CreateDirectory(folder["empty"]).FullName], "finds no model"),
        })
        {
            var ran = await Memberscan.Run(["screen", .. arguments]);
            Assert.True(ran.ExitCode == 64, ran.All);
            Assert.Contains(word, ran.Error, StringComparison.Ordinal);
        }

        AssertSame(before, Tree(landing));
    }

    /// <summary>Four models: one within its limit, one open (no forces), two over it, one of these in a folder below.</summary>
    private static string Landing(TemporaryFolder folder)
    {
        var landing = folder["landing"];
        foreach (var (name, moments) in new (string, double[])[] { ("fine", [Posts.Fine]), ("open", []), ("rail", [Posts.Over]), ("deck/post", [800]) })
        {
            var (model, table) = Posts.Under(moments.Length > 0 ? moments : [Posts.Unknown]);
            var path = Path.Combine(landing, name);
            Directory.CreateDirectory(Path.GetDirectoryName(path)!);
            File.WriteAllBytes(path + ".ifc", model);
            if (moments.Length > 0) File.WriteAllText(path + ".forces.csv", table);
        }

        return landing;
    }

    private static List<string[]> Rows(string csv) => [.. File.ReadAllText(csv, Encoding.UTF8).Split("\r\n", StringSplitOptions.RemoveEmptyEntries).Skip(1).Select(l => l.Split(','))];

    private static SortedDictionary<string, byte[]> Tree(string folder) => new(
        Directory.EnumerateFiles(folder, "*", SearchOption.AllDirectories).ToDictionary(f => Path.GetRelativePath(folder, f).Replace('\\', '/'), File.ReadAllBytes), StringComparer.Ordinal);

    private static void AssertSame(SortedDictionary<string, byte[]> expected, SortedDictionary<string, byte[]> actual)
    {
        Assert.Equal(expected.Keys, actual.Keys);
        Assert.All(expected, file => Assert.True(file.Value.AsSpan().SequenceEqual(actual[file.Key]), file.Key));
    }
}
