using System.CommandLine;

namespace MemberScan.Cli.Restoring;

/// <summary><c>memberscan restore MODEL</c>: takes our results out of a model again.</summary>
internal static class RestoreCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var model = new Argument<string>("MODEL") { Description = "A model that carries results: .ifc, .ifczip or .gz." };
        var output = new Option<string?>("--out") { Description = "Folder for the output; default: beside the model.", HelpName = "DIR" };
        var command = new Command("restore", "Take the results out of a model again: gives back the original bytes, or says why not.") { model, output };
        command.SetAction((parsed, _) => Task.Run(() => RestoreRun.Execute(parsed.GetValue(model)!, parsed.GetValue(output), Console.Out, Console.Error), CancellationToken.None));
        return command;
    }
}
