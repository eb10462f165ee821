using System.Text;
using System.Text.Json;

namespace MemberScan.Cli.Tests.Screening;

public sealed class DecisionsTests
{
    private const string Table = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\nP-1,D + L,service,0,0,0,0,0,700,0\nP-1,D + L,service,1,0,0,0,0,700,0\n";
    private const string Decisions = "member,decision,by,date,note\nP-1,\"strengthen, then tell 橋\",Jörg O'Neill 🛟,2026-02-03,C:\\letters\n";

    [Fact]
    public async Task A_decision_is_carried_into_model_report_and_record_and_stays_fresh_while_nothing_changes()
    {
        using var folder = new TemporaryFolder();
        var member = await Second(folder, Posts.One(3.2e-3), Table);

        Assert.Equal("strengthen, then tell 橋", member.GetProperty("decision").GetProperty("decision").GetString());
        Assert.Equal(0, member.GetProperty("decision").GetProperty("changed").GetArrayLength());
        var results = await Memberscan.Run("members", folder["b.checked.ifc"], "--results", "--csv", folder["r.csv"]);
        Assert.True(results.ExitCode == 0, results.All);
        var csv = await File.ReadAllTextAsync(folder["r.csv"], TestContext.Current.CancellationToken);
        Assert.Contains("\"strengthen, then tell 橋\",\"C:\\letters (Jörg O'Neill 🛟, 2026-02-03)\"", csv, StringComparison.Ordinal);
        var report = await File.ReadAllTextAsync(folder["b.report.html"], TestContext.Current.CancellationToken);
        Assert.Contains("Review decisions: 1", report, StringComparison.Ordinal);
        Assert.Contains("strengthen, then tell 橋", report, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("section")]
    [InlineData("material")]
    [InlineData("forces")]
    [InlineData("limit")]
    public async Task A_decision_goes_stale_when_what_it_was_made_on_changes(string what)
    {
        using var folder = new TemporaryFolder();
        var model = Posts.One(what == "section" ? 2.6e-3 : 3.2e-3, grade: what == "material" ? "S275JR" : "S235JR");
        var table = what == "forces" ? Table.Replace("700", "710", StringComparison.Ordinal) : Table;
        string[] more = what == "limit" ? ["--settings", folder.Write("s.json", """{ "basis": { "service": { "criterion": "allowable-von-mises", "omega": 1.5 }, "design": null } }""")] : [];

        var member = await Second(folder, model, table, more);

        Assert.Equal([what], member.GetProperty("decision").GetProperty("changed").EnumerateArray().Select(c => c.GetString()));
        var text = Encoding.ASCII.GetString(await File.ReadAllBytesAsync(folder["b.checked.ifc"], TestContext.Current.CancellationToken));
        Assert.Contains("'ReviewDecision',$,IFCLABEL('STALE: strengthen, then tell ", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_decision_keeps_the_inputs_it_was_first_made_on_from_run_to_run()
    {
        using var folder = new TemporaryFolder();
        await Second(folder, Posts.One(2.6e-3), Table);
        var (model, table, decisions) = (folder["b.ifc"], folder["t2.csv"], folder["d.csv"]);

        await Memberscan.Run("screen", model, "--forces", table, "--decisions", decisions, "--decided-on", folder["b.run.json"], "--out", folder["third"]);

        var third = JsonDocument.Parse(await File.ReadAllBytesAsync(Path.Combine(folder["third"], "b.run.json"), TestContext.Current.CancellationToken)).RootElement.GetProperty("screening").GetProperty("members")[0];
        Assert.Equal(["section"], third.GetProperty("decision").GetProperty("changed").EnumerateArray().Select(c => c.GetString()));
    }

    [Fact]
    public async Task Without_the_run_it_was_made_on_it_says_so_and_one_for_nobody_is_told()
    {
        using var folder = new TemporaryFolder();
        var decisions = folder.Write("d.csv", Decisions + "P-9,keep,me,2026-02-03,\n");

        var ran = await Memberscan.Run("screen", folder.Write("a.ifc", Posts.One(3.2e-3)), "--forces", folder.Write("t.csv", Table), "--decisions", decisions);

        Assert.Equal(1, ran.ExitCode);
        Assert.Contains("SCR-0024", ran.Error, StringComparison.Ordinal);
        Assert.Contains("INPUTS NOT KNOWN: strengthen", Encoding.ASCII.GetString(await File.ReadAllBytesAsync(folder["a.checked.ifc"], TestContext.Current.CancellationToken)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_second_decision_by_another_name_of_a_member_is_told_and_the_first_is_carried()
    {
        using var folder = new TemporaryFolder();
        var model = Posts.One(3.2e-3);
        var key = System.Text.RegularExpressions.Regex.Match(Encoding.ASCII.GetString(model), "IFCMEMBER\\('([^']{22})'").Groups[1].Value;
        var decisions = folder.Write("d.csv", Decisions + key + ",keep,me,2026-02-04,\n");

        var ran = await Memberscan.Run("screen", folder.Write("a.ifc", model), "--forces", folder.Write("t.csv", Table), "--decisions", decisions);

        Assert.Equal(1, ran.ExitCode);
        Assert.Matches($"SCR-0025 A second decision for '{System.Text.RegularExpressions.Regex.Escape(key)}'.*d.csv, line 3", ran.Error);
        var member = JsonDocument.Parse(await File.ReadAllBytesAsync(folder["a.run.json"], TestContext.Current.CancellationToken)).RootElement.GetProperty("screening").GetProperty("members")[0];
        Assert.Equal("strengthen, then tell 橋", member.GetProperty("decision").GetProperty("decision").GetString());
    }

    [Fact]
    public async Task A_wrong_file_ends_in_64_before_anything_is_written()
    {
        using var folder = new TemporaryFolder();
        var decisions = folder.Write("d.csv", "member,decision,by,date,note\nP-1,ok,me,yesterday,\n");

        var ran = await Memberscan.Run("screen", folder.Write("a.ifc", Posts.One(3.2e-3)), "--decisions", decisions);

        Assert.Equal(64, ran.ExitCode);
        Assert.Contains("d.csv, line 2, column 11", ran.Error, StringComparison.Ordinal);
        Assert.Equal(["a.ifc", "d.csv"], folder.Names);
    }

    // Screens a first model without decisions, then a second one with the decisions that were made on the first.
    private static async Task<JsonElement> Second(TemporaryFolder folder, byte[] model, string table, params string[] more)
    {
        var first = await Memberscan.Run("screen", folder.Write("a.ifc", Posts.One(3.2e-3)), "--forces", folder.Write("t.csv", Table));
        Assert.True(first.ExitCode == 1, first.All);
        var second = await Memberscan.Run(
            ["screen", folder.Write("b.ifc", model), "--forces", folder.Write("t2.csv", table), "--decisions", folder.Write("d.csv", Decisions), "--decided-on", folder["a.run.json"], .. more]);
        Assert.True(second.ExitCode is 0 or 1, second.All);
        return JsonDocument.Parse(await File.ReadAllBytesAsync(folder["b.run.json"])).RootElement.GetProperty("screening").GetProperty("members")[0];
    }
}
