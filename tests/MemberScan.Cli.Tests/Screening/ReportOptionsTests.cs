using System.Text;

namespace MemberScan.Cli.Tests.Screening;

/// <summary>What changed since an earlier run, and the printed report.</summary>
public sealed class ReportOptionsTests
{
    private const string Table = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\nP-1,D + L,service,0,0,0,0,0,{0},0\nP-1,D + L,service,1,0,0,0,0,{0},0\n";

    [Fact]
    public async Task The_report_tells_what_changed_since_an_earlier_run()
    {
        using var folder = new TemporaryFolder();
        var model = folder.Write("a.ifc", Posts.One(3.2e-3));
        await Memberscan.Run("screen", model, "--forces", folder.Write("light.csv", Table.Replace("{0}", "100", StringComparison.Ordinal)));
        File.Move(folder["a.run.json"], folder["before.json"]);

        var ran = await Memberscan.Run("screen", model, "--forces", folder.Write("heavy.csv", Table.Replace("{0}", "9000", StringComparison.Ordinal)), "--earlier", folder["before.json"]);

        Assert.True(ran.ExitCode == 1, ran.All);
        var report = await File.ReadAllTextAsync(folder["a.report.html"], TestContext.Current.CancellationToken);
        Assert.Contains("1 became overstressed; 1 worse than before", report, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_report_is_printed_to_pdf()
    {
        using var folder = new TemporaryFolder();

        var ran = await Memberscan.Run("screen", folder.Write("a.ifc", Posts.One(3.2e-3)), "--pdf", folder["a.pdf"]);

        Assert.True(ran.ExitCode == 2, ran.All);
        Assert.Contains("wrote " + folder["a.pdf"], ran.Output, StringComparison.Ordinal);
        Assert.StartsWith("%PDF-", Encoding.Latin1.GetString(await File.ReadAllBytesAsync(folder["a.pdf"], TestContext.Current.CancellationToken)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Without_a_browser_or_with_a_file_that_is_no_record_nothing_is_written()
    {
        using var folder = new TemporaryFolder();
        var model = folder.Write("a.ifc", Posts.One(3.2e-3));
        var dotnet = Environment.GetEnvironmentVariable("DOTNET_HOST_PATH") ?? Environment.ProcessPath!;
        var start = Memberscan.Start(["screen", model, "--pdf", folder["a.pdf"]]);
        start.FileName = dotnet;
        start.Environment["PATH"] = folder.Path;

        var bare = await Memberscan.Run(start);
        var wrong = await Memberscan.Run("screen", model, "--earlier", folder.Write("x.json", "{}"));

        Assert.True(bare.ExitCode == 64, bare.All);
        Assert.Contains("--pdf needs Chromium on the search path", bare.Error, StringComparison.Ordinal);
        Assert.True(wrong.ExitCode == 64, wrong.All);
        Assert.Equal(["a.ifc", "x.json"], folder.Names.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task A_printed_report_that_would_be_an_input_ends_in_64()
    {
        using var folder = new TemporaryFolder();
        var model = folder.Write("a.ifc", Posts.One(3.2e-3));

        Assert.Equal(64, (await Memberscan.Run("screen", model, "--pdf", model)).ExitCode);
    }
}
