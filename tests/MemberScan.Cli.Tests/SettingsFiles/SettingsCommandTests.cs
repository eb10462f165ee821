namespace MemberScan.Cli.Tests.SettingsFiles;

public sealed class SettingsCommandTests
{
    [Fact]
    public async Task Every_setting_in_force_is_printed_with_its_source()
    {
        using var folder = new TemporaryFolder();
        var file = folder.Write("own.json", "{\n  \"basis\": {\n    \"service\": { \"omega\": 1.5 }\n  }\n}\n"u8.ToArray());

        var ran = await Memberscan.Run("settings", "--explain", "--settings", file);

        Assert.True(ran.ExitCode == 0, ran.All);
        var lines = ran.Output.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(line => line.Split("  ", StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries)).ToArray();
        Assert.Contains(lines, line => line is ["basis.service.omega", "1.5", "own.json, line 3"]);
        Assert.Contains(lines, line => line is ["threads.rule", "automatic", "default"]);
    }

    [Fact]
    public async Task The_shipped_files_are_written_once_and_are_sound_settings()
    {
        using var folder = new TemporaryFolder();

        var first = await Memberscan.Run("settings", "--write", folder.Path);
        var second = await Memberscan.Run("settings", "--write", folder.Path);
        var explained = await Memberscan.Run("settings", "--explain", "--settings", Path.Combine(folder.Path, "basis", "aisc-360-asd.json"));

        Assert.True(first.ExitCode == 0, first.All);
        Assert.True(File.Exists(Path.Combine(folder.Path, "settings.schema.json")));
        Assert.Equal(6, second.Output.Split('\n').Count(line => line.StartsWith("is there already", StringComparison.Ordinal)));
        Assert.Contains("aisc-360-asd", explained.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("settings")]
    [InlineData("settings --settings own.json")]
    public async Task Nothing_to_do_is_wrong_usage(string arguments)
    {
        var ran = await Memberscan.Run(arguments.Split(' '));

        Assert.Equal(64, ran.ExitCode);
        Assert.Contains("--explain", ran.Error, StringComparison.Ordinal);
    }
}
