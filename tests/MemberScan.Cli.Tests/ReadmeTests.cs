using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace MemberScan.Cli.Tests;

/// <summary>The commands of README.md run as they are written.</summary>
public sealed partial class ReadmeTests
{
    private const string Call = "dotnet run --project src/MemberScan.Cli -- ";

    public static TheoryData<string> Commands => [.. Lines()];

    [Theory]
    [MemberData(nameof(Commands))]
    public async Task A_command_of_the_README_ends_with_the_code_that_stands_beside_it(string line)
    {
        using var folder = new TemporaryFolder();
        var expected = ExitComment().Match(line) is { Success: true } match ? int.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture) : 0;
        var arguments = Words(ExitComment().Replace(line, "")[Call.Length..]);
        if (arguments[0] is "screen" or "restore")
        {
            var output = arguments.IndexOf("--out");
            if (output >= 0) arguments.RemoveRange(output, 2);
            arguments.AddRange(["--out", folder.Path]);
        }

        // The checked model that an earlier line of the README writes.
        if (arguments[0] == "restore" && Path.GetFileName(arguments[1]) is var name)
            arguments[1] = folder.Write(name, (await Screening.ScreenedSample.Of(name[..name.IndexOf('.', StringComparison.Ordinal)])).Checked);

        var ran = await Memberscan.Run([.. arguments]);

        Assert.True(expected == ran.ExitCode, ran.All);
        Assert.NotEmpty(ran.Output);
        // A folder of four models: five files each, and the index as page and table.
        Assert.Equal(arguments[0] switch { "screen" => Directory.Exists(Path.Combine(Memberscan.Root, arguments[1])) ? 22 : 4, "restore" => 2, _ => 0 }, folder.Names.Count());
    }

    [Fact]
    public void The_README_shows_every_command()
    {
        var commands = Lines().Select(l => l[Call.Length..].Split(' ')[0]).Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal);

        Assert.Equal(["compare", "frame", "members", "restore", "screen", "section", "settings", "sheet"], commands);
    }

    [Fact]
    public async Task The_README_names_every_option()
    {
        var text = await File.ReadAllTextAsync(Path.Combine(Memberscan.Root, "README.md"), TestContext.Current.CancellationToken);
        var help = "";
        foreach (var command in new[] { "screen", "section", "members", "frame", "compare", "restore", "sheet", "settings", "enqueue", "work", "manual" }) help += (await Memberscan.Run(command, "--help")).Output;

        var options = LongOption().Matches(help).Select(m => m.Value).Except(["--help", "--version"]).Distinct(StringComparer.Ordinal).ToArray();

        Assert.Equal(40, options.Length);
        Assert.All(options, option => Assert.Contains(option, text, StringComparison.Ordinal));
    }

    // Lines of fenced sh blocks that call the program.
    private static IEnumerable<string> Lines()
    {
        var inside = false;
        foreach (var line in File.ReadLines(Path.Combine(Memberscan.Root, "README.md")))
        {
            if (line.StartsWith("```", StringComparison.Ordinal)) inside = line == "```sh";
            else if (inside && line.StartsWith(Call, StringComparison.Ordinal)) yield return line;
        }
    }

    // Double quotes alone: the README needs no more of a shell.
    private static List<string> Words(string line)
    {
        var words = new List<string>();
        var word = new StringBuilder();
        var (quoted, begun) = (false, false);
        foreach (var letter in line.Trim() + " ")
        {
            if (letter == '"') (quoted, begun) = (!quoted, true);
            else if (letter != ' ' || quoted) (begun, _) = (true, word.Append(letter));
            else if (begun)
            {
                words.Add(word.ToString());
                word.Clear();
                begun = false;
            }
        }

        return words;
    }

    [GeneratedRegex(@"\s+# exit (\d+)\s*$")]
    private static partial Regex ExitComment();

    [GeneratedRegex("--[a-z]+(-[a-z]+)*")]
    private static partial Regex LongOption();
}
