using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Screening;
using MemberScan.Screening.Readiness;

namespace MemberScan.Cli.Members;

/// <summary>One run of the members command.</summary>
internal static class MembersRun
{
    /// <summary>What was asked for on the command line.</summary>
    public sealed record Options(string Model, IReadOnlyList<string> Forces, string? Settings, string? Csv, string? Json, bool Verbose)
    {
        /// <summary>Whether only what was found of forces is listed.</summary>
        public bool ForcesOnly { get; init; }

        /// <summary>Where the forces table to be filled goes; null for none.</summary>
        public string? Template { get; init; }
    }

    /// <summary>Runs and returns the exit code: 0 all ready, 2 something missing or no candidate, 3 not read to its end.</summary>
    /// <param name="options">What was asked for.</param>
    /// <param name="output">Where the table goes.</param>
    /// <param name="plain">Whether to write plain lines instead of a table for a terminal.</param>
    /// <param name="cancellation">Stops the run.</param>
    public static int Execute(Options options, TextWriter output, bool plain, CancellationToken cancellation)
    {
        string[] inputs = [options.Model, .. options.Forces, .. options.Settings is { } path ? new[] { path } : []];
        string[] outputs = [.. new[] { options.Csv, options.Json, options.Template }.OfType<string>()];
        if (outputs.FirstOrDefault(o => inputs.Any(i => Path.GetFullPath(i) == Path.GetFullPath(o))) is { } clash)
            throw new Failure(ExitCodes.Usage, $"The output '{clash}' would be an input of this run; give another file.");
        if (outputs.Select(Path.GetFullPath).Distinct(StringComparer.Ordinal).Count() < outputs.Length)
            throw new Failure(ExitCodes.Usage, "Two of --csv, --json and --write-forces-template name the same file; give each its own.");

        using var log = new FindingLog(options.Verbose);
        var diagnostics = new DiagnosticList();
        using var read = RunInputs.Read(options.Model, options.Forces, options.Settings, diagnostics, log.Write);
        var request = new ScreeningRequest
        {
            Model = read.Model,
            Settings = read.Settings,
            Tables = read.Tables,
            Timestamp = "",
            Version = Program.Version,
        };
        ReadinessRecord? record;
        using (var progress = ProgressDisplay.Start()) record = Inventory.Take(request, diagnostics, progress, cancellation);
        log.Write(diagnostics);
        if (record is null) throw new Failure(ExitCodes.Usage, "The forces table does not fit the model; nothing was written.");

        cancellation.ThrowIfCancellationRequested();
        Write(options, record);
        if (options.ForcesOnly) ForcesPrint.Write(output, record);
        else MembersPrint.Write(output, record, plain);
        foreach (var file in outputs) output.WriteLine($"wrote {file}");
        return options.ForcesOnly ? ForcesCode(record) : Code(record);
    }

    private static int Code(ReadinessRecord record) =>
        !record.Model.ReadToEnd ? ExitCodes.NotReadToEnd
        : record.Members.IsEmpty || record.Ready < record.Members.Length || record.HasDamage ? ExitCodes.NotChecked
        : ExitCodes.WithinLimit;

    // Of forces alone: all that was found is usable, and something was.
    private static int ForcesCode(ReadinessRecord record)
    {
        var lines = record.Members.SelectMany(m => m.Forces).ToList();
        return !record.Model.ReadToEnd ? ExitCodes.NotReadToEnd
            : lines.Count == 0 || lines.Exists(l => l.Unusable is not null) || record.HasDamage ? ExitCodes.NotChecked
            : ExitCodes.WithinLimit;
    }

    private static void Write(Options options, ReadinessRecord record)
    {
        try
        {
            using var files = new OutputSet();
            if (options.Csv is { } csv) files.Add(csv, ReadinessTable.Write(record));
            if (options.Json is { } json) files.Add(json, ReadinessJson.Write(record));
            if (options.Template is { } template) files.Add(template, ForcesTemplate.Write(record));
            files.Commit();
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The table cannot be written: {e.Message} Nothing was changed; give another file.", e);
        }
    }
}
