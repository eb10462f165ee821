using System.CommandLine;

namespace MemberScan.Cli.Sheets;

/// <summary><c>memberscan sheet MODEL MEMBER</c>: the calculation of one member.</summary>
internal static class SheetCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var model = new Argument<string>("MODEL") { Description = "The model: .ifc, .ifczip or .gz (IFC2X3, IFC4, IFC4X3)." };
        var member = new Argument<string>("MEMBER") { Description = "The member: its key or GlobalId, its Tag or its name." };
        var forces = new Option<string[]>("--forces") { Description = "A forces table (CSV or .xlsx, units in its header); may be given several times.", HelpName = "FILE" };
        var settings = new Option<string?>("--settings") { Description = "A settings file (JSON with comments).", HelpName = "FILE" };
        var html = new Option<string?>("--html") { Description = "Also write the sheet with its drawings as one HTML page.", HelpName = "FILE" };
        var verbose = new Option<bool>("--verbose") { Description = "Log every finding, notes included." };

        var command = new Command("sheet", "Show the whole calculation of one member, line by line.") { model, member, forces, settings, html, verbose };
        command.SetAction((parsed, cancellation) => Task.FromResult(SheetRun.Execute(
            new SheetRun.Options(
                parsed.GetValue(model)!, parsed.GetValue(member)!, parsed.GetValue(forces) ?? [], parsed.GetValue(settings), parsed.GetValue(html), parsed.GetValue(verbose)),
            Console.Out, cancellation)));
        return command;
    }
}
