using System.CommandLine;

namespace MemberScan.Cli.Manual;

/// <summary><c>memberscan manual</c>: man page and shell completion, from the commands themselves.</summary>
internal static class ManualCommand
{
    private static readonly string[] s_formats = ["man", "bash", "fish"];

    /// <summary>Builds the command.</summary>
    /// <param name="root">The program's root, whose commands are described.</param>
    public static Command Build(RootCommand root)
    {
        var format = new Argument<string>("FORMAT") { Description = "man (page of section 1), bash or fish (completion)." };
        format.AcceptOnlyFromAmong(s_formats);
        var command = new Command("manual", "Print the man page, or the completion of a shell, from the same source as --help.") { format };
        command.SetAction(parsed =>
        {
            Console.Out.Write(Text(root, parsed.GetValue(format)!));
            return 0;
        });
        return command;
    }

    /// <summary>The text in one of the formats; line ends are LF.</summary>
    public static string Text(RootCommand root, string format) => format switch
    {
        "man" => ManPage.Of(root),
        "bash" => ShellCompletion.Bash(root),
        "fish" => ShellCompletion.Fish(root),
        _ => throw new ArgumentOutOfRangeException(nameof(format)),
    };
}
