using System.CommandLine;

namespace MemberScan.Cli.SettingsFiles;

/// <summary><c>memberscan settings</c>: what is in force and where it comes from; the shipped files to begin with.</summary>
internal static class SettingsCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var explain = new Option<bool>("--explain") { Description = "Print every setting in force with its value and where it comes from: the default, or a line of the file." };
        var settings = new Option<string?>("--settings") { Description = "Settings file to explain; without it the shipped defaults." };
        var write = new Option<string?>("--write") { Description = "Write the shipped settings, their schema and the ready bases into this folder, to begin with; files that are there already stay and are named." };
        var command = new Command("settings", "Settings in force with their sources, and the shipped files.") { explain, settings, write };
        command.SetAction((parsed, _) => Task.FromResult(SettingsRun.Execute(parsed.GetValue(explain), parsed.GetValue(settings), parsed.GetValue(write))));
        return command;
    }
}
