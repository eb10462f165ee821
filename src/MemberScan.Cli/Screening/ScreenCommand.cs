using System.CommandLine;
using MemberScan.Cli.Screening.Many;
using MemberScan.Reporting.Topics;

namespace MemberScan.Cli.Screening;

/// <summary><c>memberscan screen MODEL…</c>: the main job, for one model or several.</summary>
internal static class ScreenCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var model = new Argument<string[]>("MODEL")
        {
            Description = "The model: .ifc, .ifczip or .gz (IFC2X3, IFC4, IFC4X3). Also several of them, folders (with all below), and patterns with *, ? and **.",
            Arity = ArgumentArity.OneOrMore,
        };
        RefuseOptions(model);
        var forces = new Option<string[]>("--forces") { Description = "A forces table (CSV or .xlsx, units in its header); may be given several times.", HelpName = "FILE" };
        var beside = new Option<bool>("--forces-beside") { Description = "Take the forces table beside each model: NAME.forces.csv or NAME.forces.xlsx for NAME.ifc." };
        var settings = new Option<string?>("--settings") { Description = "A settings file (JSON with comments).", HelpName = "FILE" };
        var kind = new Option<string?>("--kind") { Description = "Kind of every situation that nothing else tells.", HelpName = "service|design" };
        kind.AcceptOnlyFromAmong("service", "design");
        var output = new Option<string?>("--out") { Description = "Folder for the outputs; default: beside the model.", HelpName = "DIR" };
        var timestamp = new Option<string?>("--timestamp") { Description = "Time of the run, ISO 8601; default: now. Given, it is also written into the model.", HelpName = "TIME" };
        var decisions = new Option<string?>("--decisions") { Description = "Decisions of people to carry along (CSV or JSON).", HelpName = "FILE" };
        var decidedOn = new Option<string?>("--decided-on") { Description = "The run record (.run.json) that the decisions were made on; tells which are stale.", HelpName = "FILE" };
        var bcf = new Option<string?>("--bcf") { Description = "Also write the overstressed as topics, one per cause.", HelpName = "FILE" };
        var bcfVersion = new Option<string?>("--bcf-version") { Description = "Release of that format; default 2.1.", HelpName = "2.1|3.0" };
        bcfVersion.AcceptOnlyFromAmong("2.1", "3.0");
        var request = new Option<string[]>("--request") { Description = "Also write what is missing as a request to the modeler: .csv, .html or .ids; may be given several times.", HelpName = "FILE" };
        var xlsx = new Option<string?>("--xlsx") { Description = "Also write the candidates as a workbook.", HelpName = "FILE" };
        var parquet = new Option<string?>("--parquet") { Description = "Also write the candidates as a Parquet file.", HelpName = "FILE" };
        var earlier = new Option<string?>("--earlier") { Description = "The run record (.run.json) of an earlier run; the report tells what changed since.", HelpName = "FILE" };
        var pdf = new Option<string?>("--pdf") { Description = "Also print the report to PDF (needs Chromium).", HelpName = "FILE" };
        var template = new Option<bool>("--set-template") { Description = "Explain the property set by a template in the checked model (IFC4 and later)." };
        var workers = new Option<int?>("--workers") { Description = "Several models: how many at a time; default 4, at most the number of processors.", HelpName = "N" };
        var resume = new Option<bool>("--resume") { Description = "Several models: pass over those whose outputs stand unchanged and were made from the same inputs." };
        var verbose = new Option<bool>("--verbose") { Description = "Log every finding, notes included." };

        var command = new Command("screen", "Read a model, find forces, check its members, write checked model, report and tables.")
        {
            model, forces, beside, settings, kind, output, timestamp, decisions, decidedOn, bcf, bcfVersion, request, xlsx, parquet, earlier, pdf, template, workers, resume, verbose,
        };

        // On a thread of its own: the parser listens for an interruption only once the action has given its task back.
        command.SetAction((parsed, cancellation) =>
        {
            var models = parsed.GetValue(model)!;
            var each = new ScreenRun.Options(
                "", parsed.GetValue(forces) ?? [], parsed.GetValue(settings), parsed.GetValue(kind), parsed.GetValue(output), parsed.GetValue(timestamp), parsed.GetValue(verbose))
            {
                Decisions = parsed.GetValue(decisions),
                DecidedOn = parsed.GetValue(decidedOn),
                SetTemplate = parsed.GetValue(template),
                Earlier = parsed.GetValue(earlier),
                Pdf = parsed.GetValue(pdf),
                Further = new FurtherOutputs(
                    parsed.GetValue(bcf), parsed.GetValue(bcfVersion) == "3.0" ? BcfVersion.Bcf30 : BcfVersion.Bcf21, parsed.GetValue(request) ?? [], parsed.GetValue(xlsx), parsed.GetValue(parquet)),
            };
            var several = new ManyRun.Options(models, each, parsed.GetValue(workers), parsed.GetValue(resume), parsed.GetValue(beside));

            // On a thread of its own: the parser listens for an interruption only once the action has given its task back.
            return Task.Run(() => IsOne(several) ? ScreenRun.Execute(each with { Model = models[0] }, cancellation) : ManyRun.Execute(several, cancellation), CancellationToken.None);
        });
        return command;
    }

    /// <summary>Lets no misspelt option pass for a model: an argument that takes any number of names would swallow it.</summary>
    public static void RefuseOptions(Argument<string[]> models) => models.Validators.Add(result =>
    {
        foreach (var token in result.Tokens)
            if (token.Value.StartsWith('-') && !File.Exists(token.Value)) result.AddError($"Unrecognized option '{token.Value}'.");
    });

    private static bool IsOne(ManyRun.Options options) =>
        options is { Models.Count: 1, Resume: false, ForcesBeside: false, Workers: null } && !ModelList.IsSeveral(options.Models[0]);
}
