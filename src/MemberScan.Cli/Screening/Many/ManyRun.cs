using System.Collections.Concurrent;
using System.Globalization;
using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Reporting.Index;

namespace MemberScan.Cli.Screening.Many;

/// <summary>One run of the screen command over several models: each on its own, side by side, then one index.</summary>
internal static class ManyRun
{
    /// <summary>Most models at a time.</summary>
    public const int MostWorkers = 64;

    /// <summary>Models at a time when nothing is said: each holds its text in memory; a plain file over 64 MiB stays on disk.</summary>
    private const int MostWorkersByDefault = 4;

    /// <summary>What was asked for on the command line.</summary>
    /// <param name="Models">Models, folders and patterns.</param>
    /// <param name="Each">What is asked of each model; its model is empty.</param>
    /// <param name="Workers">Models at a time; null for the default.</param>
    /// <param name="Resume">Whether models that are finished from the same inputs are passed over.</param>
    /// <param name="ForcesBeside">Whether the forces table beside each model is taken.</param>
    public sealed record Options(IReadOnlyList<string> Models, ScreenRun.Options Each, int? Workers, bool Resume, bool ForcesBeside);

    /// <summary>Runs and returns the exit code: of all models the one that weighs most.</summary>
    public static int Execute(Options options, CancellationToken cancellation)
    {
        if (options.Workers is < 1 or > MostWorkers)
            throw new Failure(ExitCodes.Usage, string.Create(CultureInfo.InvariantCulture, $"--workers {options.Workers} is out of range; give 1 to {MostWorkers}."));
        if (options.Each.Earlier is not null || options.Each.Pdf is not null)
            throw new Failure(ExitCodes.Usage, $"{(options.Each.Pdf is null ? "--earlier" : "--pdf")} goes with a single model; screen the models one by one for it.");
        ScreenRun.RefuseWrong(options.Each);
        var jobs = ModelJob.Of(ModelList.Of(options.Models), options.Each, options.ForcesBeside);
        var index = IndexFolder(options);
        var entries = Screen(jobs, index, options, cancellation);
        var written = WriteIndex(index, entries);
        Tell(entries, written);
        return ExitCodes.Worst(entries.Select(e => e.ExitCode));
    }

    private static ModelEntry[] Screen(IReadOnlyList<ModelJob> jobs, string index, Options options, CancellationToken cancellation)
    {
        var entries = new ModelEntry[jobs.Count];
        var told = new InOrder(jobs.Count, Console.Out);
        var parallel = new ParallelOptions { MaxDegreeOfParallelism = options.Workers ?? Math.Min(MostWorkersByDefault, Environment.ProcessorCount), CancellationToken = cancellation };
        try
        {
            Parallel.ForEach(Partitioner.Create(Enumerable.Range(0, jobs.Count), EnumerablePartitionerOptions.NoBuffering), parallel, i =>
            {
                (entries[i], var wasFinished) = jobs[i].Run(index, options.Resume, cancellation);
                told.Finished(i, Words(entries[i], wasFinished));
            });
        }
        catch (Exception e) when (cancellation.IsCancellationRequested && e is OperationCanceledException or AggregateException)
        {
            throw new Failure(ExitCodes.Interrupted, string.Create(CultureInfo.InvariantCulture,
                $"Interrupted; {entries.Count(x => x is not null)} of {jobs.Count} models are finished, their outputs are whole. No index was written. The same command with --resume goes on from there."), e);
        }

        return entries;
    }

    private static string Words(ModelEntry entry, bool wasFinished) => entry.Counts is { } counts
        ? string.Create(CultureInfo.InvariantCulture, $"{entry.Path}: {counts.WithinLimit} within limit + {counts.Overstressed} overstressed + {counts.NotChecked} not checked = {counts.Candidates} candidates{(entry.ReadToEnd ? "" : "; not read to its end")}{(wasFinished ? " (finished before)" : "")}")
        : string.Create(CultureInfo.InvariantCulture, $"{entry.Path}: not screened (exit code {entry.ExitCode}): {entry.Failure}");

    /// <summary>Where the index goes: the folder of the outputs, else the first folder given, else that of the first model.</summary>
    private static string IndexFolder(Options options)
    {
        var first = options.Models[0];
        var folder = options.Each.Output ?? (Directory.Exists(first) ? first : Path.GetDirectoryName(first.Split('*', '?')[0]));
        return Path.GetFullPath(string.IsNullOrEmpty(folder) ? "." : folder);
    }

    private static string[] WriteIndex(string folder, ModelEntry[] entries)
    {
        try
        {
            Directory.CreateDirectory(folder);
            string[] paths = [Path.Combine(folder, "models.index.html"), Path.Combine(folder, "models.index.csv")];
            using var files = new OutputSet();
            files.Add(paths[0], Encoding.UTF8.GetBytes(IndexPage.Render(entries, Program.Version)));
            files.Add(paths[1], IndexTable.Write(entries));
            files.Commit();
            return paths;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The index of the models cannot be written to '{folder}': {e.Message} The outputs of the models are in place; give another folder with --out DIR.", e);
        }
    }

    private static void Tell(ModelEntry[] entries, string[] written)
    {
        var failed = entries.Count(e => e.Failure.Length > 0);
        Console.Out.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{entries.Length - failed} models screened + {failed} not screened = {entries.Length} models"));
        foreach (var caution in entries.SelectMany(e => e.Cautions).Distinct(StringComparer.Ordinal)) Console.Out.WriteLine(caution);
        foreach (var path in written) Console.Out.WriteLine($"wrote {path}");
    }

    /// <summary>Lines of jobs that end in any order, printed in theirs.</summary>
    private sealed class InOrder(int count, TextWriter output)
    {
        private readonly string?[] _lines = new string?[count];
        private readonly Lock _lock = new();
        private int _next;

        public void Finished(int job, string line)
        {
            lock (_lock)
            {
                _lines[job] = line;
                for (; _next < count && _lines[_next] is { } next; _next++) output.WriteLine(next);
            }
        }
    }
}
