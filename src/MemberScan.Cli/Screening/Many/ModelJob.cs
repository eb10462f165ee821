using MemberScan.Cli.Files;
using MemberScan.Reporting.Index;

namespace MemberScan.Cli.Screening.Many;

/// <summary>One of several models, with what is asked of it.</summary>
/// <param name="Options">What is asked of it.</param>
/// <param name="Names">Where its outputs go.</param>
/// <param name="Wrong">Why it cannot be run at all; null when it can.</param>
internal sealed record ModelJob(ScreenRun.Options Options, OutputNames Names, Failure? Wrong = null)
{
    private static readonly string[] s_tables = [".forces.csv", ".forces.xlsx"];

    /// <summary>The jobs of several models.</summary>
    /// <exception cref="Failure">Two models would write the same files, or a further output does not name each model.</exception>
    public static IReadOnlyList<ModelJob> Of(IReadOnlyList<FoundModel> models, ScreenRun.Options each, bool forcesBeside)
    {
        each.Further.RefuseUnknown();
        if (each.Further.Paths.FirstOrDefault(path => path.Count(c => c == '*') != 1) is { } unstarred)
            throw new Failure(ExitCodes.Usage, $"'{unstarred}' would be the same file for each model; with several models a further output needs one '*' that stands for the model's name, such as 'results/*{Path.GetExtension(unstarred)}'.");

        var jobs = models.Select(model => Of(model, each, forcesBeside)).ToList();
        var taken = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);
        foreach (var job in jobs)
            foreach (var path in job.Options.Further.Paths.Append(job.Names.RunRecord))
                if (!taken.TryAdd(Path.GetFullPath(path), job.Options.Model))
                    throw new Failure(ExitCodes.Usage, $"'{taken[Path.GetFullPath(path)]}' and '{job.Options.Model}' would both write '{path}'; rename one, screen them apart, or give the folder above them, whose subfolders are kept under --out.");
        return jobs;
    }

    /// <summary>Runs it, or takes over what an earlier run finished; a failure becomes an entry, so that other models go on.</summary>
    /// <param name="index">Folder of the index.</param>
    /// <param name="resume">Whether what is finished from the same inputs is taken over.</param>
    /// <param name="cancellation">Stops the run.</param>
    public (ModelEntry Entry, bool WasFinished) Run(string index, bool resume, CancellationToken cancellation)
    {
        try
        {
            if (Wrong is not null) throw Wrong;

            var inputs = FinishedMark.InputsOf(Options);
            if (resume && FinishedMark.Find(Names, inputs) is { } mark) return (ModelEntry.Of(Options.Model, mark.ExitCode, RunRecordFile.Read(Names.RunRecord), ReportFrom(index)), true);

            foreach (var path in Options.Further.Paths) Directory.CreateDirectory(Path.GetDirectoryName(Path.GetFullPath(path))!);
            using var log = new FindingLog(Options.Verbose, Options.Model);
            var done = ScreenRun.Run(Options, Names, log, null, (files, record) => FinishedMark.AddTo(files, Names, inputs, ExitCodes.Of(record)), cancellation);
            return (ModelEntry.Of(Options.Model, ExitCodes.Of(done.Record), done.Record, ReportFrom(index)), false);
        }
        catch (OperationCanceledException)
        {
            throw;
        }
        catch (Failure failure)
        {
            return (ModelEntry.Failed(Options.Model, failure.ExitCode, failure.Message), false);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            return (ModelEntry.Failed(Options.Model, ExitCodes.InputOutput, $"Reading or writing failed: {e.Message}"), false);
        }
#pragma warning disable CA1031 // the last door of this model: the others go on
        catch (Exception e)
        {
            return (ModelEntry.Failed(Options.Model, ExitCodes.Internal, $"Internal error: {e.GetType().Name}: {e.Message} Please report it with the model and the command."), false);
        }
#pragma warning restore CA1031
    }

    private static ModelJob Of(FoundModel model, ScreenRun.Options each, bool forcesBeside)
    {
        var folder = each.Output is { } output ? Path.Combine(output, model.Below) : null;
        var names = OutputNames.For(model.Path, folder);
        var name = Path.GetFileName(names.RunRecord)[..^".run.json".Length];
        var starred = Path.Combine(model.Below, name);
        string? Own(string? path) => path?.Replace("*", starred, StringComparison.Ordinal);
        var tables = forcesBeside ? TablesBeside(model.Path, name) : [];
        var options = each with
        {
            Model = model.Path,
            Output = folder,
            Forces = [.. each.Forces, .. tables],
            Further = each.Further with { Bcf = Own(each.Further.Bcf), Workbook = Own(each.Further.Workbook), Parquet = Own(each.Further.Parquet), Requests = [.. each.Further.Requests.Select(r => Own(r)!)] },
        };
        return new ModelJob(options, names, tables.Count > 1 ? new Failure(ExitCodes.Usage, $"there are two forces tables beside the model, '{tables[0]}' and '{tables[1]}'; take one away") : null);
    }

    /// <summary>Forces tables that stand beside a model under its name.</summary>
    public static IReadOnlyList<string> TablesBeside(string model, string name) =>
        [.. s_tables.Select(ending => Path.Combine(Path.GetDirectoryName(model) ?? "", name + ending)).Where(File.Exists)];

    private string ReportFrom(string index) => Path.GetRelativePath(index, Path.GetFullPath(Names.Report)).Replace('\\', '/');
}
