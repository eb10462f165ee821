using System.CommandLine;
using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using MemberScan.Cli.Screening;
using MemberScan.Cli.Screening.Many;

namespace MemberScan.Cli.Queue;

/// <summary><c>memberscan enqueue</c>: puts models into a queue.</summary>
internal static class EnqueueCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var model = new Argument<string[]>("MODEL") { Description = "Models, folders (with all below), and patterns with *, ? and **.", Arity = ArgumentArity.OneOrMore };
        ScreenCommand.RefuseOptions(model);
        var queue = new Option<string>("--queue") { Description = "Address of the queue: a NATS server with JetStream, such as nats://127.0.0.1:4222.", HelpName = "URL", Required = true };
        var root = new Option<string>("--root") { Description = "The folder that holds the models and all other files; workers see it under a name of their own. Default: the current one.", HelpName = "DIR", DefaultValueFactory = _ => "." };
        var forces = new Option<string[]>("--forces") { Description = "A forces table for each of the models; may be given several times.", HelpName = "FILE" };
        var beside = new Option<bool>("--forces-beside") { Description = "Take the forces table beside each model: NAME.forces.csv or NAME.forces.xlsx for NAME.ifc." };
        var settings = new Option<string?>("--settings") { Description = "A settings file (JSON with comments).", HelpName = "FILE" };
        var kind = new Option<string?>("--kind") { Description = "Kind of every situation that nothing else tells.", HelpName = "service|design" };
        kind.AcceptOnlyFromAmong("service", "design");
        var timestamp = new Option<string?>("--timestamp") { Description = "Time of the runs, ISO 8601; default: that of the worker's clock.", HelpName = "TIME" };
        var template = new Option<bool>("--set-template") { Description = "Explain the property set by a template in the checked models (IFC4 and later)." };
        var also = new Option<string[]>("--also") { Description = "Further outputs, NAME.bcf, NAME.parquet or NAME.xlsx; may be given several times.", HelpName = "bcf|parquet|xlsx" };
        also.AcceptOnlyFromAmong(QueueJob.Outputs);
        var command = new Command("enqueue", "Put models into a queue, for memberscan work on this and other machines.") { model, queue, root, forces, beside, settings, kind, timestamp, template, also };
        command.SetAction((parsed, cancellation) => Task.Run(
            () =>
            {
                var each = new ScreenRun.Options("", parsed.GetValue(forces) ?? [], parsed.GetValue(settings), parsed.GetValue(kind), null, parsed.GetValue(timestamp), false) { SetTemplate = parsed.GetValue(template) };
                return Execute(parsed.GetValue(queue)!, parsed.GetValue(root)!, parsed.GetValue(model)!, each, parsed.GetValue(beside), parsed.GetValue(also) ?? [], cancellation);
            },
            CancellationToken.None));
        return command;
    }

    private static async Task<int> Execute(string url, string root, string[] models, ScreenRun.Options each, bool beside, string[] also, CancellationToken cancellation)
    {
        ScreenRun.RefuseWrong(each);
        var shared = new SharedRoot(root);
        var found = ModelJob.Of(ModelList.Of(models), each, beside);
        if (found.FirstOrDefault(j => j.Wrong is not null)?.Wrong is { } wrong) throw wrong;

        // All are read before any goes into the queue: a file that cannot be read stops here and not at a worker.
        var jobs = found.Select(j => (Job: JobOf(j.Options, shared, also), Id: IdOf(FinishedMark.InputsOf(j.Options), JobOf(j.Options, shared, also)))).ToList();
        await using var queue = await JobQueue.Open(url, cancellation);
        var put = 0;
        foreach (var (job, id) in jobs)
            if (await queue.Put(job, id, cancellation)) put++;
        Console.Out.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{put} models put into the queue + {jobs.Count - put} that went into it before = {jobs.Count} models"));
        return 0;
    }

    // The same model with the same inputs and the same wishes, in the letters that a header of the queue may hold.
    private static string IdOf(string inputs, QueueJob job) => Convert.ToHexStringLower(SHA256.HashData([.. Encoding.ASCII.GetBytes(inputs), .. job.Write()]));

    private static QueueJob JobOf(ScreenRun.Options options, SharedRoot shared, string[] also) => new(
        QueueJob.FormatName, shared.NameOf(options.Model), [.. options.Forces.Select(shared.NameOf)], options.Settings is { } settings ? shared.NameOf(settings) : null, options.Kind, options.Timestamp,
        options.SetTemplate, [.. also.Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal)]);
}
