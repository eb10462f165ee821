using System.Text.Json;

namespace MemberScan.Cli.Tests.Comparing;

public sealed class CompareRunTests
{
    // CHS 48.3: Wel 4.80 cm³ with a wall of 3.2 mm, 4.05 cm³ with 2.6 mm (EN 10219-2:2006, from memory); 235/1.67 = 140.7 MPa.
    private const double Moment = 0.92 * 140.7 * 4.80;
    private const double Later = Moment / (140.7 * 4.05);

    private static readonly string s_table = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\n"
        + FormattableString.Invariant($"P-1,D + L,service,0,0,0,0,0,{Moment:0.00},0\nP-1,D + L,service,1,0,0,0,0,{Moment:0.00},0\n");

    [Fact]
    public async Task A_thinner_wall_became_overstressed_section_changed_and_the_run_ends_in_1()
    {
        using var folder = new TemporaryFolder();
        var (earlier, later, table) = (folder.Write("a.ifc", Posts.One(3.2e-3)), folder.Write("b.ifc", Posts.One(2.6e-3)), folder.Write("t.csv", s_table));

        var ran = await Memberscan.Run("compare", earlier, later, "--forces", table, "--csv", folder["c.csv"], "--json", folder["c.json"], "--html", folder["c.html"]);

        Assert.True(ran.ExitCode == 1, ran.All);
        Assert.Contains("became overstressed, section changed", ran.Output, StringComparison.Ordinal);
        Assert.Contains("section tube 48.3x3.2 mm → tube 48.3x2.6 mm", ran.Output, StringComparison.Ordinal);
        var member = JsonDocument.Parse(await File.ReadAllBytesAsync(folder["c.json"], TestContext.Current.CancellationToken)).RootElement.GetProperty("members")[0];
        Assert.Equal(0.92, member.GetProperty("earlierUtilization").GetDouble(), 0.005);
        Assert.Equal(Later, member.GetProperty("laterUtilization").GetDouble(), 0.005);
        Assert.Equal(["a.ifc", "b.ifc", "c.csv", "c.html", "c.json", "t.csv"], folder.Names);
    }

    [Fact]
    public async Task Run_records_give_what_the_models_give_and_the_way_back_is_cured_with_0()
    {
        using var folder = new TemporaryFolder();
        var (earlier, later, table) = (folder.Write("a.ifc", Posts.One(2.6e-3)), folder.Write("b.ifc", Posts.One(3.2e-3, key: "other")), folder.Write("t.csv", s_table));
        foreach (var model in new[] { earlier, later }) await Memberscan.Run("screen", model, "--forces", table);

        var records = await Memberscan.Run("compare", folder["a.run.json"], folder["b.run.json"]);
        var models = await Memberscan.Run("compare", earlier, folder["b.run.json"], "--forces", table);

        Assert.True(records.ExitCode == 0, records.All);
        Assert.Contains("cured, section changed, re-identified by its tag", records.Output, StringComparison.Ordinal);
        Assert.Equal(records.Output, models.Output);
    }

    [Fact]
    public async Task A_file_that_is_no_run_record_ends_in_64_and_a_missing_one_in_74()
    {
        using var folder = new TemporaryFolder();
        var wrong = folder.Write("a.json", "{}");

        Assert.Equal(64, (await Memberscan.Run("compare", wrong, wrong)).ExitCode);
        Assert.Equal(74, (await Memberscan.Run("compare", folder["b.json"], wrong)).ExitCode);
        Assert.Equal(64, (await Memberscan.Run("compare", wrong, wrong, "--csv", wrong)).ExitCode);
        Assert.Equal("{}", await File.ReadAllTextAsync(wrong, TestContext.Current.CancellationToken));
    }
}
