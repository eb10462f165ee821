using MemberScan.Cli.Files;

namespace MemberScan.Cli.Tests.Files;

public sealed class OutputSetTests
{
    [Fact]
    public void Nothing_shows_under_its_name_before_all_is_put_in_place()
    {
        using var folder = new TemporaryFolder();
        using var files = new OutputSet();

        files.Add(folder["a"], "new"u8);
        files.Add(folder["b"], "new"u8);
        var before = (File.Exists(folder["a"]), File.Exists(folder["b"]));
        files.Commit();

        Assert.Equal((false, false), before);
        Assert.Equal(["a", "b"], folder.Names);
    }

    [Fact]
    public void What_is_not_put_in_place_is_taken_away_again()
    {
        using var folder = new TemporaryFolder();
        folder.Write("a", "old");

        using (var files = new OutputSet()) files.Add(folder["a"], "new"u8);

        Assert.Equal(["a"], folder.Names);
        Assert.Equal("old", File.ReadAllText(folder["a"]));
    }

    [Fact]
    public void A_stale_file_goes_with_the_others()
    {
        using var folder = new TemporaryFolder();
        folder.Write("stale", "old");
        folder.Write("a", "old");
        using var files = new OutputSet();

        files.Add(folder["a"], "new"u8);
        files.Commit(folder["stale"]);

        Assert.Equal(["a"], folder.Names);
        Assert.Equal("new", File.ReadAllText(folder["a"]));
    }

    [Fact]
    public void Where_one_cannot_be_put_in_place_the_old_ones_come_back_and_a_stale_one_stays()
    {
        using var folder = new TemporaryFolder();
        folder.Write("a", "old");
        folder.Write("stale", "old");
        Directory.CreateDirectory(Path.Combine(folder["b"], "taken"));

        using (var files = new OutputSet())
        {
            files.Add(folder["a"], "new"u8);
            files.Add(folder["b"], "new"u8);
            Assert.ThrowsAny<IOException>(() => files.Commit(folder["stale"]));
        }

        Assert.Equal(["a", "b", "stale"], folder.Names);
        Assert.Equal("old", File.ReadAllText(folder["a"]));
    }
}
