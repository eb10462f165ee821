using System.CommandLine;

namespace MemberScan.Cli.Screening;

/// <summary><c>memberscan screen MODEL</c>: the main job.</summary>
internal static class ScreenCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var model = new Argument<string>("MODEL") { Description = "The model: .ifc, .ifczip or .gz (IFC2X3, IFC4, IFC4X3)." };
        var forces = new Option<string[]>("--forces") { Description = "A forces table (CSV or .xlsx, units in its header); may be given several times.", HelpName = "FILE" };
        var settings = new Option<string?>("--settings") { Description = "A settings file (JSON with comments).", HelpName = "FILE" };
        var kind = new Option<string?>("--kind") { Description = "Kind of every situation that nothing else tells.", HelpName = "service|design" };
        kind.AcceptOnlyFromAmong("service", "design");
        var output = new Option<string?>("--out") { Description = "Folder for the outputs; default: beside the model.", HelpName = "DIR" };
        var timestamp = new Option<string?>("--timestamp") { Description = "Time of the run, ISO 8601; default: now. Given, it is also written into the model.", HelpName = "TIME" };
        var verbose = new Option<bool>("--verbose") { Description = "Log every finding, notes included." };

        var command = new Command("screen", "Read a model, find forces, check its members, write checked model, report and tables.")
        {
            model, forces, settings, kind, output, timestamp, verbose,
        };

        // On a thread of its own: the parser listens for an interruption only once the action has given its task back.
        command.SetAction((parsed, cancellation) => Task.Run(
            () => ScreenRun.Execute(
                new ScreenRun.Options(
                    parsed.GetValue(model)!, parsed.GetValue(forces) ?? [], parsed.GetValue(settings), parsed.GetValue(kind), parsed.GetValue(output),
                    parsed.GetValue(timestamp), parsed.GetValue(verbose)),
                cancellation),
            CancellationToken.None));
        return command;
    }
}
