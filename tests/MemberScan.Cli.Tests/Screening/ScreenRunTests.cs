using System.IO.Compression;
using System.Security.Cryptography;
using System.Text;
using System.Text.Json;
using AngleSharp.Html.Parser;
using MemberScan.OpenModels;

namespace MemberScan.Cli.Tests.Screening;

public sealed class ScreenRunTests
{
    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task The_checked_model_is_the_input_with_one_block_of_lines_appended(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);

        var (text, block) = WithoutBlock(sample.Checked);

        Assert.True(code == sample.Ran.ExitCode, sample.Ran.All);
        Assert.Equal(Sha256(sample.Input), Sha256(text));
        Assert.StartsWith($"/* MemberScan block 1 sha256={Sha256(sample.Input)} */\n#", block, StringComparison.Ordinal);
        Assert.All(block.Split('\n')[1..^2], line => Assert.Matches(@"^#\d+=IFC[A-Z]+\(.*\);$", line));
        Assert.True(sample.Input.Length + block.Length == sample.Checked.Length);
    }

    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task The_record_names_input_run_and_counts_as_the_summary_does(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);

        var (screening, model) = (sample.Screening, sample.Screening.GetProperty("model"));
        var counts = screening.GetProperty("counts");

        Assert.True(code == sample.Ran.ExitCode, sample.Ran.All);
        Assert.Equal(Sha256(sample.Input), model.GetProperty("sha256").GetString());
        Assert.Equal(ScreenedSample.Time, screening.GetProperty("timestamp").GetString());
        var sum = $"{counts.GetProperty("withinLimit")} within limit + {counts.GetProperty("overstressed")} overstressed + {counts.GetProperty("notChecked")} not checked = {screening.GetProperty("members").GetArrayLength()} candidates";
        Assert.Contains($"{name}.ifc: {sum}", sample.Ran.Output, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task The_report_names_every_candidate_and_asks_no_network(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);

        using var page = new HtmlParser().ParseDocument(sample.Report);

        var text = page.Body!.TextContent;
        Assert.True(code == sample.Ran.ExitCode, sample.Ran.All);
        Assert.All(sample.Screening.GetProperty("members").EnumerateArray(), m => Assert.Contains(m.GetProperty("identity").GetProperty("key").GetString()!, text, StringComparison.Ordinal));
        Assert.All(
            page.QuerySelectorAll("[src], link[href], iframe, object, embed"),
            e => Assert.StartsWith("data:", e.GetAttribute("src") ?? e.GetAttribute("href") ?? "", StringComparison.Ordinal));
        Assert.All(page.QuerySelectorAll("a[href]"), a => Assert.StartsWith("#", a.GetAttribute("href"), StringComparison.Ordinal));
    }

    [Theory]
    [MemberData(nameof(ScreenedSample.Samples), MemberType = typeof(ScreenedSample))]
    public async Task A_run_on_its_own_output_gives_the_same_bytes_under_the_same_name(string name, int code)
    {
        var sample = await ScreenedSample.Of(name);
        using var folder = new TemporaryFolder();
        var model = folder.Write(name + ".checked.ifc", sample.Checked);
        var arguments = ScreenedSample.Arguments(name, folder["again"]);
        arguments[1] = model;

        var ran = await Memberscan.Run(arguments);

        Assert.True(code == ran.ExitCode, ran.All);
        Assert.Equal(sample.Checked, await File.ReadAllBytesAsync(Path.Combine(folder["again"], name + ".checked.ifc"), TestContext.Current.CancellationToken));
        Assert.Equal(sample.Csv, await File.ReadAllBytesAsync(Path.Combine(folder["again"], name + ".members.csv"), TestContext.Current.CancellationToken));
        Assert.Equal(sample.Checked, await File.ReadAllBytesAsync(model, TestContext.Current.CancellationToken));
    }

    /// <summary>One processor and eight, and a machine set to German: a decimal comma there would be a wrong number in every output.</summary>
    [Theory]
    [InlineData("gangway-rails", "1", "C")]
    [InlineData("gangway-rails", "8", "de_DE.UTF-8")]
    [InlineData("deck-hangers", "8", "de_DE.UTF-8")]
    [InlineData("mast-stays", "1", "de_DE.UTF-8")]
    public async Task Processors_and_language_of_the_machine_change_no_byte(string name, string processors, string language)
    {
        var sample = await ScreenedSample.Of(name);
        using var folder = new TemporaryFolder();
        var start = Memberscan.Start(ScreenedSample.Arguments(name, folder.Path));
        start.Environment["DOTNET_PROCESSOR_COUNT"] = processors;
        start.Environment["LC_ALL"] = start.Environment["LANG"] = language;
        start.Environment.Remove("DOTNET_SYSTEM_GLOBALIZATION_INVARIANT");

        var ran = await Memberscan.Run(start);

        Assert.True(sample.Ran.ExitCode == ran.ExitCode, ran.All);
        Assert.Equal(sample.Checked, await File.ReadAllBytesAsync(folder[name + ".checked.ifc"], TestContext.Current.CancellationToken));
        Assert.Equal(sample.Csv, await File.ReadAllBytesAsync(folder[name + ".members.csv"], TestContext.Current.CancellationToken));
        Assert.Equal(sample.RunJson, await File.ReadAllBytesAsync(folder[name + ".run.json"], TestContext.Current.CancellationToken));
        Assert.Equal(sample.Report, await File.ReadAllTextAsync(folder[name + ".report.html"], TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Many_posts_on_one_and_on_eight_processors_give_the_same_bytes()
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Many(400);
        string[] arguments = ["screen", folder.Write("posts.ifc", model), "--forces", folder.Write("posts.csv", table), "--timestamp", ScreenedSample.Time];
        var records = new List<byte[]>();
        foreach (var processors in new[] { "1", "8", "8" })
        {
            var start = Memberscan.Start(arguments);
            start.Environment["DOTNET_PROCESSOR_COUNT"] = processors;
            var ran = await Memberscan.Run(start);
            Assert.True(ran.ExitCode == 0, ran.All);
            records.Add([.. await File.ReadAllBytesAsync(folder["posts.run.json"], TestContext.Current.CancellationToken), .. await File.ReadAllBytesAsync(folder["posts.checked.ifc"], TestContext.Current.CancellationToken)]);
        }

        Assert.Equal(records[0], records[1]);
        Assert.Equal(records[0], records[2]);
    }

    [Theory]
    [InlineData("post.ifc.gz")]
    [InlineData("post.ifczip")]
    public async Task A_container_gives_the_checked_model_of_its_text(string container)
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Fine);
        using var packed = new MemoryStream();
        if (container.EndsWith(".gz", StringComparison.Ordinal))
        {
            using var gzip = new GZipStream(packed, CompressionLevel.Fastest, leaveOpen: true);
            gzip.Write(model);
        }
        else
        {
            using var zip = new ZipArchive(packed, ZipArchiveMode.Create, leaveOpen: true);
            using var entry = zip.CreateEntry("inner.ifc").Open();
            entry.Write(model);
        }

        var ran = await Memberscan.Run("screen", folder.Write(container, packed.ToArray()), "--forces", folder.Write("posts.csv", table));

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.Equal(model, WithoutBlock(await File.ReadAllBytesAsync(folder["post.checked.ifc"], TestContext.Current.CancellationToken)).Text);
    }

    [Theory]
    [InlineData("screen", "posts.checked.ifc")]
    [InlineData("through a link", "posts.checked.ifc")]
    [InlineData("table", "posts.ifc")]
    public async Task An_output_that_would_be_an_input_is_refused_with_the_remedy(string way, string modelName)
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Fine);
        var path = folder.Write(modelName, model);
        var tablePath = folder.Write(way == "table" ? "posts.members.csv" : "posts.csv", table);
        string[] more = [];
        if (way == "through a link")
        {
            Directory.CreateSymbolicLink(folder["link"], folder.Path);
            more = ["--out", folder["link"]];
        }

        var before = folder.Names.ToArray();
        var ran = await Memberscan.Run(["screen", path, "--forces", tablePath, .. more]);

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains("--out", ran.Error, StringComparison.Ordinal);
        Assert.Equal(before, folder.Names);
        Assert.Equal(model, await File.ReadAllBytesAsync(path, TestContext.Current.CancellationToken));
    }

    [Theory]
    [InlineData(".checked.ifc")]
    [InlineData(".report.html")]
    [InlineData(".members.csv")]
    [InlineData(".run.json")]
    public async Task Where_one_output_cannot_be_put_none_is_and_old_ones_stay(string ending)
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Fine);
        string[] arguments = ["screen", folder.Write("posts.ifc", model), "--forces", folder.Write("posts.csv", table), "--out", folder["out"]];
        Directory.CreateDirectory(folder["out"]);
        var others = new[] { ".checked.ifc", ".report.html", ".members.csv", ".run.json" }.Where(e => e != ending).Select(e => Path.Combine(folder["out"], "posts" + e)).ToArray();
        foreach (var other in others) await File.WriteAllTextAsync(other, "of an earlier run", TestContext.Current.CancellationToken);
        Directory.CreateDirectory(Path.Combine(folder["out"], "posts" + ending, "taken"));

        var ran = await Memberscan.Run(arguments);

        Assert.True(ran.ExitCode == 74, ran.All);
        Assert.Contains("--out", ran.Error, StringComparison.Ordinal);
        Assert.Empty(ran.Output);
        Assert.Equal(4, Directory.GetFileSystemEntries(folder["out"]).Length);
        Assert.All(others, other => Assert.Equal("of an earlier run", File.ReadAllText(other)));
    }

    [Fact]
    public async Task A_folder_that_may_not_be_written_to_ends_with_74_and_holds_nothing_new()
    {
        Assert.SkipUnless(File.Exists("/usr/bin/setpriv") && Environment.UserName == "root", "needs setpriv and the right to drop rights: a folder's permissions do not bind the superuser");
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Fine);
        string[] arguments = ["screen", folder.Write("posts.ifc", model), "--forces", folder.Write("posts.csv", table)];
        if (!OperatingSystem.IsWindows()) File.SetUnixFileMode(folder.Path, UnixFileMode.UserRead | UnixFileMode.UserExecute | UnixFileMode.OtherRead | UnixFileMode.OtherExecute);
        var start = Memberscan.Start(arguments, "setpriv", "--reuid=65534", "--regid=65534", "--clear-groups");
        start.WorkingDirectory = folder.Path;

        var ran = await Memberscan.Run(start);

        Assert.SkipWhen(ran.ExitCode is not (74 or 0 or 1 or 2 or 64 or 70), "the program may not be started by another user here: " + ran.Error);
        Assert.True(ran.ExitCode == 74, ran.All);
        Assert.Equal(["posts.csv", "posts.ifc"], folder.Names);
    }

    [Theory]
    [InlineData("gangway-rails")]
    [InlineData("mast-stays")]
    public async Task A_model_that_is_cut_off_gives_report_and_tables_but_no_checked_model(string name)
    {
        using var folder = new TemporaryFolder();
        var whole = await File.ReadAllBytesAsync(Memberscan.Sample(name + ".ifc"), TestContext.Current.CancellationToken);
        var model = folder.Write(name + ".ifc", whole.AsSpan(0, whole.Length * 6 / 10));
        folder.Write(name + ".checked.ifc", "of an earlier run");

        var ran = await Memberscan.Run("screen", model);

        Assert.True(ran.ExitCode == 3, ran.All);
        Assert.Equal(new[] { ".ifc", ".members.csv", ".report.html", ".run.json" }.Select(e => name + e), folder.Names);
        Assert.Matches($@"P21-0003 .*\[{name}\.ifc, line \d+, byte \d+", ran.Error);
        Assert.Contains("could not be read to its end; no checked model is written", ran.Output, StringComparison.Ordinal);
        Assert.DoesNotContain(name + ".checked.ifc", ran.Output, StringComparison.Ordinal);
    }

    public static TheoryData<string> OpenModels => [.. OpenModel.All.Select(f => Path.GetFileName(f)!).DefaultIfEmpty("absent.ifc")];

    [Theory]
    [MemberData(nameof(OpenModels))]
    public async Task No_model_by_others_makes_the_program_fail(string fileName)
    {
        var model = OpenModel.Path(fileName);
        using var folder = new TemporaryFolder();

        var ran = await Memberscan.Run("screen", model, "--out", folder.Path);

        Assert.True(ran.ExitCode is 0 or 1 or 2 or 3, ran.All);
        if (!fileName.StartsWith("bad-", StringComparison.Ordinal)) return;

        Assert.True(fileName.StartsWith("bad-24-files", StringComparison.Ordinal) ? ran.ExitCode == 3 : ran.ExitCode != 0, ran.All);
        Assert.Matches($@"(P21|IFC)-\d{{4}} .*\[{fileName}, line \d+, byte \d+", ran.Error);
    }

    /// <summary>
    /// Forces at the left column's foot and head by hand: forces on the two ends, so the start changes sign; stored z is global −X where the
    /// member's own is +X, so both are turned by 180° about x (notes beside the open models; statics: ΔMy = V·L within 0.002 %).
    /// </summary>
    [Fact]
    public async Task The_portal_frame_lists_section_forces_in_member_axes()
    {
        var model = OpenModel.Path("structural-portal-frame-results-ifc4.ifc");
        using var folder = new TemporaryFolder();
        var settings = folder.Write("portal.json", """
            {
              // what the notes of the model say
              "forces": { "convention": "end-forces", "components": "member-axes", "turnDegreesByMember": { "Curve Member #1": 180, "Curve Member #2": 180 } },
              "units": { "TORQUEUNIT": "lbf·in" },
            }
            """);

        var ran = await Memberscan.Run("screen", model, "--settings", settings, "--out", folder.Path);

        Assert.True(ran.ExitCode == 2, ran.All);
        using var json = JsonDocument.Parse(await File.ReadAllBytesAsync(folder["structural-portal-frame-results-ifc4.run.json"], TestContext.Current.CancellationToken));
        var column = json.RootElement.GetProperty("screening").GetProperty("members").EnumerateArray().Single(m => m.GetProperty("identity").GetProperty("name").GetString() == "Curve Member #1");
        var stations = column.GetProperty("situations")[0].GetProperty("stations").EnumerateArray().ToArray();
        double[] Values(JsonElement station, params string[] names) => [.. names.Select(n => station.GetProperty("forces").GetProperty(n).GetDouble())];
        const double Lbf = 4.44822162, LbfIn = Lbf * 0.0254;
        Assert.Equal([0, 120 * 0.0254], stations.Select(s => Math.Round(s.GetProperty("x").GetDouble(), 9)));
        double[][] expected = [[-2278.52897 * Lbf, -1422.663266 * Lbf, 66694.854893 * LbfIn], [-2278.52897 * Lbf, -1422.663266 * Lbf, -104027.289933 * LbfIn]];
        for (var i = 0; i < 2; i++)
            Assert.All(Values(stations[i], "n", "vz", "my").Zip(expected[i]), pair => Assert.Equal(1, pair.First / pair.Second, 1e-6));
        Assert.Contains("end forces: values at the start reversed", column.GetProperty("situations")[0].GetProperty("conversion").GetString(), StringComparison.Ordinal);
    }

    /// <summary>The text before and after the lines from the opening to the closing comment, and those lines.</summary>
    private static (byte[] Text, string Block) WithoutBlock(byte[] model)
    {
        var begin = model.AsSpan().IndexOf("/* MemberScan block 1 "u8);
        var end = model.AsSpan().IndexOf("/* MemberScan block end */\n"u8) + "/* MemberScan block end */\n".Length;
        Assert.True(begin > 0 && end > begin);
        Assert.True(model.AsSpan(end).StartsWith("ENDSEC"u8));
        return ([.. model[..begin], .. model[end..]], Encoding.ASCII.GetString(model[begin..end]));
    }

    private static string Sha256(byte[] bytes) => Convert.ToHexStringLower(SHA256.HashData(bytes));
}
