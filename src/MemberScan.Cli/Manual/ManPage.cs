using System.CommandLine;
using System.Globalization;
using System.Text;

namespace MemberScan.Cli.Manual;

/// <summary>The commands as a page for <c>man</c>: section 1, macros of the package <c>man</c>.</summary>
internal static class ManPage
{
    // What the README tells in its table of exit codes.
    private static readonly (int Code, string Means)[] s_exitCodes =
    [
        (ExitCodes.WithinLimit, "At least one candidate, and every one within its limit."),
        (ExitCodes.Overstressed, "At least one candidate is overstressed."),
        (ExitCodes.NotChecked, "None is overstressed, at least one was not checked, no candidate was found, or damage was passed over."),
        (ExitCodes.NotReadToEnd, "The model could not be read to its end."),
        (ExitCodes.Usage, "Wrong usage, settings or forces table."),
        (ExitCodes.Internal, "Internal error."),
        (ExitCodes.InputOutput, "Reading or writing failed."),
        (ExitCodes.Interrupted, "Interrupted."),
    ];

    /// <summary>The page.</summary>
    public static string Of(RootCommand root)
    {
        var page = new StringBuilder(".TH MEMBERSCAN 1 \"\" \"MemberScan ").Append(Escaped(Program.Version)).Append("\" \"User Commands\"\n");
        page.Append(".SH NAME\nmemberscan \\- stress screening of the secondary steel of building models\n");
        page.Append(".SH SYNOPSIS\n");
        foreach (var command in Visible(root)) page.Append(".B memberscan ").Append(Escaped(command.Name)).Append("\n.br\n");
        page.Append(".SH DESCRIPTION\n").Append(Line(root.Description));
        foreach (var command in Visible(root)) Describe(page, command);
        page.Append(".SH EXIT STATUS\n");
        foreach (var (code, means) in s_exitCodes) page.Append(".TP\n.B ").Append(code).Append('\n').Append(Line(means));
        return page.ToString();
    }

    /// <summary>The commands that help shows.</summary>
    public static IEnumerable<Command> Visible(Command command) => command.Subcommands.Where(c => !c.Hidden);

    /// <summary>The options that help shows, those of every command left out.</summary>
    public static IEnumerable<Option> Options(Command command) => command.Options.Where(o => !o.Hidden && o.Name is not ("--help" or "--version"));

    private static void Describe(StringBuilder page, Command command)
    {
        page.Append(".SH ").Append(Escaped(command.Name.ToUpperInvariant())).Append('\n').Append(".B memberscan ").Append(Escaped(command.Name));
        foreach (var argument in command.Arguments) page.Append(' ').Append(Escaped(argument.Name)).Append(argument.Arity.MaximumNumberOfValues > 1 ? "..." : "");
        page.Append(" [options]\n.PP\n").Append(Line(command.Description));
        foreach (var argument in command.Arguments) page.Append(".TP\n.I ").Append(Escaped(argument.Name)).Append('\n').Append(Line(argument.Description));
        foreach (var option in Options(command))
        {
            page.Append(".TP\n.B ").Append(Escaped(option.Name));
            if (option.HelpName is { } value) page.Append(" \\fI").Append(Escaped(value)).Append("\\fR");
            page.Append('\n').Append(Line(option.Description + (option.Required ? " Required." : "")));
        }
    }

    // A line that begins with a point or an apostrophe would be a macro.
    private static string Line(string? text) => "\\&" + Escaped(text ?? "") + "\n";

    private static string Escaped(string text)
    {
        var escaped = new StringBuilder();
        foreach (var rune in text.EnumerateRunes())
        {
            if (rune.Value == '\\') escaped.Append("\\e");
            else if (rune.Value == '-') escaped.Append("\\-");
            else if (rune.Value == '\n') escaped.Append(' ');
            else if (rune.IsAscii) escaped.Append((char)rune.Value);
            else escaped.Append(CultureInfo.InvariantCulture, $"\\[u{rune.Value:X4}]");
        }

        return escaped.ToString();
    }
}
