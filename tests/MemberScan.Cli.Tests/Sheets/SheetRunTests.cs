namespace MemberScan.Cli.Tests.Sheets;

public sealed class SheetRunTests
{
    private static readonly string s_model = Memberscan.Sample("gangway-rails.ifc");

    [Theory]
    [InlineData("P-06", 1, "OVERSTRESSED 1.223")]
    [InlineData("0VsJP0Dp9mL6wcMzaRCVtw", 1, "OVERSTRESSED 1.223")]
    [InlineData("Geländerpfosten A6, Bestand", 1, "OVERSTRESSED 1.223")]
    [InlineData("P-01", 0, "WITHIN LIMIT 0.432")]
    [InlineData("P-11", 2, "NOT CHECKED")]
    public async Task Shows_the_member_that_a_key_tag_or_name_names(string member, int code, string head)
    {
        var ran = await Memberscan.Run("sheet", s_model, member);

        Assert.True(ran.ExitCode == code, ran.All);
        Assert.Contains(head, ran.Output, StringComparison.Ordinal);
        Assert.Contains("not a design, not a certificate", ran.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Lists_the_members_that_an_ambiguous_name_may_mean()
    {
        var ran = await Memberscan.Run("sheet", s_model, "GL-1");

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains("names several candidates; give the key of one", ran.Error, StringComparison.Ordinal);
        Assert.Equal(6, ran.Error.Split('\n').Count(l => l.Contains("Tag 'GL-1'", StringComparison.Ordinal)));
    }

    [Fact]
    public async Task Says_what_to_do_where_nothing_is_named_so()
    {
        var ran = await Memberscan.Run("sheet", s_model, "P-999");

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Contains("No candidate has the key, GlobalId, Tag or name 'P-999'", ran.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Writes_the_sheet_as_one_page()
    {
        using var folder = new TemporaryFolder();

        var ran = await Memberscan.Run("sheet", s_model, "P-06", "--html", folder["p06.html"]);

        Assert.True(ran.ExitCode == 1, ran.All);
        var page = await File.ReadAllTextAsync(folder["p06.html"], TestContext.Current.CancellationToken);
        Assert.Contains("Mohr&#x27;s circles", page, StringComparison.Ordinal);
        Assert.DoesNotContain("<script", page, StringComparison.Ordinal);
        Assert.DoesNotContain("://", page, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Refuses_to_write_over_its_model()
    {
        using var folder = new TemporaryFolder();
        File.Copy(s_model, folder["model.ifc"]);

        var ran = await Memberscan.Run("sheet", folder["model.ifc"], "P-06", "--html", folder["model.ifc"]);

        Assert.True(ran.ExitCode == 64, ran.All);
        Assert.Equal(await File.ReadAllBytesAsync(s_model, TestContext.Current.CancellationToken), await File.ReadAllBytesAsync(folder["model.ifc"], TestContext.Current.CancellationToken));
    }
}
