using System.CommandLine;

namespace MemberScan.Cli.Members;

/// <summary><c>memberscan members MODEL</c>: what is in a model and how ready it is.</summary>
internal static class MembersCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var model = new Argument<string>("MODEL") { Description = "The model: .ifc, .ifczip or .gz (IFC2X3, IFC4, IFC4X3)." };
        var forces = new Option<string[]>("--forces") { Description = "A forces table (CSV or .xlsx, units in its header); may be given several times.", HelpName = "FILE" };
        var settings = new Option<string?>("--settings") { Description = "A settings file (JSON with comments).", HelpName = "FILE" };
        var csv = new Option<string?>("--csv") { Description = "Also write the table as CSV.", HelpName = "FILE" };
        var json = new Option<string?>("--json") { Description = "Also write the table as JSON.", HelpName = "FILE" };
        var forcesOnly = new Option<bool>("--forces-only") { Description = "List what tables, results and mappings of property sets give, situation by situation; nothing else." };
        var template = new Option<string?>("--write-forces-template") { Description = "Write the forces table to be filled for this model.", HelpName = "FILE" };
        var results = new Option<bool>("--results") { Description = "Instead, read back the results that the model carries; with --csv also as a table in SI." };
        var verbose = new Option<bool>("--verbose") { Description = "Log every finding, notes included." };

        var command = new Command("members", "List every candidate with section, material, length and forces found, and what is missing.")
        {
            model, forces, settings, csv, json, forcesOnly, template, results, verbose,
        };
        command.SetAction((parsed, cancellation) => Task.FromResult(parsed.GetValue(results)
            ? ResultsRun.Execute(parsed.GetValue(model)!, parsed.GetValue(csv), parsed.GetValue(json), Console.Out)
            : MembersRun.Execute(
            new MembersRun.Options(
                parsed.GetValue(model)!, parsed.GetValue(forces) ?? [], parsed.GetValue(settings), parsed.GetValue(csv), parsed.GetValue(json), parsed.GetValue(verbose))
            {
                ForcesOnly = parsed.GetValue(forcesOnly),
                Template = parsed.GetValue(template),
            },
            Console.Out, Console.IsOutputRedirected, cancellation)));
        return command;
    }
}
