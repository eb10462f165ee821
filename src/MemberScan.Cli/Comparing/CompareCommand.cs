using System.CommandLine;

namespace MemberScan.Cli.Comparing;

/// <summary><c>memberscan compare EARLIER LATER</c>: what moved from one run to the next.</summary>
internal static class CompareCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var earlier = new Argument<string>("EARLIER") { Description = "The earlier run: a run record (.run.json), or a model that is screened on the fly." };
        var later = new Argument<string>("LATER") { Description = "The later run, likewise." };
        var forces = new Option<string[]>("--forces") { Description = "A forces table for every model that is screened; may be given several times.", HelpName = "FILE" };
        var earlierForces = new Option<string[]>("--earlier-forces") { Description = "A forces table for the earlier model only.", HelpName = "FILE" };
        var laterForces = new Option<string[]>("--later-forces") { Description = "A forces table for the later model only.", HelpName = "FILE" };
        var settings = new Option<string?>("--settings") { Description = "A settings file for the models that are screened.", HelpName = "FILE" };
        var csv = new Option<string?>("--csv") { Description = "Also write the comparison as CSV.", HelpName = "FILE" };
        var json = new Option<string?>("--json") { Description = "Also write the comparison as JSON.", HelpName = "FILE" };
        var html = new Option<string?>("--html") { Description = "Also write the comparison as one offline page.", HelpName = "FILE" };
        var command = new Command("compare", "Tell what moved from one run to the next: became overstressed, cured, still, changed input, new, gone, re-identified.")
        {
            earlier, later, forces, earlierForces, laterForces, settings, csv, json, html,
        };
        command.SetAction((parsed, cancellation) => Task.Run(
            () => CompareRun.Execute(
                new CompareRun.Options(
                    parsed.GetValue(earlier)!, parsed.GetValue(later)!, [.. parsed.GetValue(forces) ?? [], .. parsed.GetValue(earlierForces) ?? []],
                    [.. parsed.GetValue(forces) ?? [], .. parsed.GetValue(laterForces) ?? []], parsed.GetValue(settings), parsed.GetValue(csv), parsed.GetValue(json), parsed.GetValue(html)),
                Console.Out, cancellation),
            CancellationToken.None));
        return command;
    }
}
