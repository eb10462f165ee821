using System.Diagnostics;
using System.Text.Json;
using MemberScan.Cli.Manual;

namespace MemberScan.Cli.Tests.Manual;

/// <summary>The files of <c>config/packaging</c> that are printed by the program or made from its lock file.</summary>
public sealed class ManualTests
{
    private static readonly string s_folder = Path.Combine(Memberscan.Root, "config", "packaging");

    [Theory]
    [InlineData("man", "memberscan.1")]
    [InlineData("bash", "memberscan.bash")]
    [InlineData("fish", "memberscan.fish")]
    public void The_published_file_is_what_the_commands_say(string format, string file) =>
        Assert.Equal(ManualCommand.Text(Program.Root(), format), File.ReadAllText(Path.Combine(s_folder, file)));

    [Fact]
    public void The_page_names_every_command_option_and_exit_code()
    {
        var page = ManualCommand.Text(Program.Root(), "man").Replace("\\-", "-", StringComparison.Ordinal);

        foreach (var command in Program.Root().Subcommands)
        {
            Assert.Contains($".SH {command.Name.ToUpperInvariant()}\n", page, StringComparison.Ordinal);
            Assert.All(command.Options, option => Assert.Contains($".B {option.Name}", page, StringComparison.Ordinal));
            Assert.All(command.Options, option => Assert.False(string.IsNullOrWhiteSpace(option.Description), option.Name));
        }

        Assert.All(new[] { 0, 1, 2, 3, 64, 70, 74, 130 }, code => Assert.Contains($".B {code}\n", page, StringComparison.Ordinal));
        Assert.DoesNotContain("\n'", page, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("1 memberscan scr", "screen")]
    [InlineData("2 memberscan screen --wor", "--workers")]
    [InlineData("2 memberscan work --until", "--until-empty")]
    [InlineData("2 memberscan manual fi", "fish")]
    public async Task A_shell_completes_commands_and_options(string words, string completed)
    {
        var parts = words.Split(' ');
        var start = new ProcessStartInfo("bash") { RedirectStandardOutput = true, RedirectStandardError = true };
        foreach (var argument in new[] { "--norc", "-c", $"source '{Path.Combine(s_folder, "memberscan.bash")}'; COMP_CWORD={parts[0]}; COMP_WORDS=({string.Join(' ', parts[1..])}); _memberscan; echo \"${{COMPREPLY[*]}}\"" }) start.ArgumentList.Add(argument);

        var ran = await Memberscan.Run(start);

        Assert.True(ran.ExitCode == 0, ran.All);
        Assert.Equal(completed, ran.Output.Trim());
    }

    [Fact]
    public void The_list_of_licences_names_exactly_the_packages_of_the_program()
    {
        using var locked = JsonDocument.Parse(File.ReadAllBytes(Path.Combine(Memberscan.Root, "src", "MemberScan.Cli", "packages.lock.json")));
        var expected = locked.RootElement.GetProperty("dependencies").EnumerateObject().SelectMany(framework => framework.Value.EnumerateObject())
            .Where(p => p.Value.GetProperty("type").GetString() != "Project" && !p.Name.EndsWith("Analyzers", StringComparison.Ordinal)).Select(p => (p.Name, p.Value.GetProperty("resolved").GetString()!)).Distinct();

        var rows = File.ReadLines(Path.Combine(s_folder, "licences.md")).Where(l => l.StartsWith("| ", StringComparison.Ordinal)).Skip(1).Select(l => l.Split('|', StringSplitOptions.TrimEntries)).ToList();

        Assert.Equal(expected.OrderBy(p => p.Item1, StringComparer.Ordinal), rows.Select(r => (r[1], r[2])).OrderBy(p => p.Item1, StringComparer.Ordinal));
        Assert.All(rows, r => Assert.NotEmpty(r[3]));
    }
}
