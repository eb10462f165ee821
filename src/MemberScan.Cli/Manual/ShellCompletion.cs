using System.CommandLine;
using System.Text;

namespace MemberScan.Cli.Manual;

/// <summary>Completion of commands and options for shells; files are completed where no option fits.</summary>
internal static class ShellCompletion
{
    /// <summary>For bash: a function for <c>complete -F</c>.</summary>
    public static string Bash(RootCommand root)
    {
        var text = new StringBuilder("# Completion of memberscan for bash; printed by 'memberscan manual bash'.\n_memberscan() {\n  local word=${COMP_WORDS[COMP_CWORD]} words=\n");
        text.Append("  if [ \"$COMP_CWORD\" -eq 1 ]; then\n    words='").AppendJoin(' ', ManPage.Visible(root).Select(c => c.Name)).Append(" --help --version'\n  else\n    case ${COMP_WORDS[1]} in\n");
        foreach (var command in ManPage.Visible(root)) text.Append("      ").Append(command.Name).Append(") words='").AppendJoin(' ', Names(command)).Append("' ;;\n");
        return text.Append("    esac\n  fi\n  COMPREPLY=($(compgen -W \"$words\" -- \"$word\"))\n  if [ ${#COMPREPLY[@]} -eq 0 ]; then COMPREPLY=($(compgen -f -- \"$word\")); fi\n}\ncomplete -o filenames -F _memberscan memberscan\n").ToString();
    }

    /// <summary>For fish: one line per command and option.</summary>
    public static string Fish(RootCommand root)
    {
        var text = new StringBuilder("# Completion of memberscan for fish; printed by 'memberscan manual fish'.\n");
        foreach (var command in ManPage.Visible(root))
        {
            text.Append("complete -c memberscan -n __fish_use_subcommand -a ").Append(command.Name).Append(" -d ").Append(Quoted(command.Description)).Append('\n');
            foreach (var option in ManPage.Options(command))
                text.Append("complete -c memberscan -n '__fish_seen_subcommand_from ").Append(command.Name).Append("' -l ").Append(option.Name.TrimStart('-')).Append(option.HelpName is null ? "" : " -r").Append(" -d ").Append(Quoted(option.Description)).Append('\n');
        }

        return text.ToString();
    }

    private static IEnumerable<string> Names(Command command) =>
        command.Arguments.Count == 1 && command.Name == "manual" ? ["man", "bash", "fish", "--help"] : ManPage.Options(command).Select(o => o.Name).Append("--help");

    private static string Quoted(string? text) => "'" + (text ?? "").Replace("\\", "\\\\", StringComparison.Ordinal).Replace("'", "\\'", StringComparison.Ordinal) + "'";
}
