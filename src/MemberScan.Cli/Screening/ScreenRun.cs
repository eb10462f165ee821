using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Decisions;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Model.Forces;
using MemberScan.Reporting;
using MemberScan.Screening;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Screening;

/// <summary>One run of the screen command: files in, files out.</summary>
internal static class ScreenRun
{
    /// <summary>What was asked for on the command line.</summary>
    public sealed record Options(
        string Model, IReadOnlyList<string> Forces, string? Settings, string? Kind, string? Output, string? Timestamp, bool Verbose)
    {
        /// <summary>A file of decisions; null for none.</summary>
        public string? Decisions { get; init; }

        /// <summary>Run record that the decisions were made on; null when not known.</summary>
        public string? DecidedOn { get; init; }

        /// <summary>Whether the checked model explains our set by a template.</summary>
        public bool SetTemplate { get; init; }

        /// <summary>Run record of an earlier run that the report is compared with; null for none.</summary>
        public string? Earlier { get; init; }

        /// <summary>Path of the printed report; null for none.</summary>
        public string? Pdf { get; init; }

        /// <summary>Further outputs that were asked for.</summary>
        public FurtherOutputs Further { get; init; } = FurtherOutputs.None;

        /// <summary>All files that the run reads.</summary>
        public IReadOnlyList<string> Inputs => [.. NamedInputs.Select(i => i.Path)];

        /// <summary>All files that the run reads, each with what it is for.</summary>
        public IEnumerable<(string Name, string Path)> NamedInputs =>
            new[] { ("model", Model) }.Concat(Forces.Select(f => ("forces", f))).Concat(new[] { ("settings", Settings), ("decisions", Decisions), ("decided-on", DecidedOn), ("earlier", Earlier) }.Where(i => i.Item2 is not null).Select(i => (i.Item1, i.Item2!)));
    }

    /// <summary>A finished run: its outputs are in place.</summary>
    /// <param name="Record">The screening.</param>
    /// <param name="ModelWritten">Whether there is a checked model.</param>
    public sealed record Done(ScreeningRecord Record, bool ModelWritten);

    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(Options options, CancellationToken cancellation)
    {
        using var log = new FindingLog(options.Verbose);
        if (options.Output is { } given && string.IsNullOrWhiteSpace(given))
            throw new Failure(ExitCodes.Usage, "The path after --out is empty; give a folder.");

        if (string.IsNullOrWhiteSpace(options.Model)) throw new Failure(ExitCodes.Usage, "A path is empty; give the model a name.");

        var names = OutputNames.For(options.Model, options.Output);
        var done = Run(options, names, log, ProgressDisplay.Start, (_, _) => { }, cancellation);
        Summary.Print(done.Record, names, done.ModelWritten);
        if (options.SetTemplate && done.Record.Model.ReadAs == "IFC2X3") Console.Out.WriteLine("no set template is written: IFC2X3 knows none");
        if (options.Pdf is { } printed) Console.Out.WriteLine($"wrote {printed}");
        foreach (var path in options.Further.Written(done.Record)) Console.Out.WriteLine($"wrote {path}");
        foreach (var path in options.Further.NotWritten(done.Record)) Console.Out.WriteLine($"not written: {path}; nothing that was missing can be said in its format, see the list in .csv or .html");
        return ExitCodes.Of(done.Record);
    }

    /// <summary>Screens one model and puts its outputs in place; prints nothing but findings.</summary>
    /// <param name="options">What was asked for.</param>
    /// <param name="names">Where the outputs go.</param>
    /// <param name="log">Takes the findings.</param>
    /// <param name="progress">Starts a display of how far the run is; null for none.</param>
    /// <param name="more">Adds further files, which appear after all others.</param>
    /// <param name="cancellation">Stops the run.</param>
    /// <exception cref="Failure">The run cannot be made; nothing was written.</exception>
    public static Done Run(Options options, OutputNames names, FindingLog log, Func<ProgressDisplay>? progress, Action<OutputSet, ScreeningRecord> more, CancellationToken cancellation)
    {
        var diagnostics = new DiagnosticList();
        using var read = RunInputs.Read(options.Model, options.Forces, options.Settings, diagnostics, log.Write);
        if (names.Clashes(options.Inputs).FirstOrDefault() is { } clash)
            throw new Failure(ExitCodes.Usage, $"The output '{clash}' would be an input of this run; give another folder with --out DIR.");
        OutputNames.RefuseClashes([.. options.Further.Paths, .. options.Pdf is { } asked ? new[] { asked } : []], [.. options.Inputs, names.CheckedModel, names.Report, names.MembersTable, names.RunRecord]);
        options.Further.RefuseUnknown();

        var browser = options.Pdf is null ? null : PdfPrinter.Find();
        var earlier = options.Earlier is { } before ? RunRecordFile.Read(before) : null;
        var decisions = Decisions(options, diagnostics, log);
        var (timestamp, isGiven) = Time(options);

        var request = new ScreeningRequest
        {
            Model = read.Model,
            Settings = WithKind(read.Settings, options.Kind),
            Tables = read.Tables,
            Decisions = decisions,
            DecidedOn = options.DecidedOn is { } run ? RunRecordFile.Read(run) : null,
            WithSetTemplate = options.SetTemplate,
            Timestamp = timestamp,
            TimestampIsGiven = isGiven,
            Version = Program.Version,
        };
        ScreeningOutcome? outcome;
        using (var display = progress?.Invoke()) outcome = Screener.Run(request, diagnostics, display, cancellation);
        log.Write(diagnostics);
        if (outcome is null) throw new Failure(ExitCodes.Usage, "The forces table does not fit the model; nothing was written.");

        cancellation.ThrowIfCancellationRequested();
        WriteOutputs(options, names, outcome, Report(outcome, earlier, browser, cancellation), more);
        return new Done(outcome.Record, outcome.CanWriteModel);
    }

    /// <summary>Refuses what would be wrong for every model of a run over several: the time, the settings, the folder.</summary>
    /// <exception cref="Failure">Something is.</exception>
    public static void RefuseWrong(Options options)
    {
        _ = Time(options);
        if (options.Output is { } given && string.IsNullOrWhiteSpace(given)) throw new Failure(ExitCodes.Usage, "The path after --out is empty; give a folder.");
        if (options.Settings is not { } settings) return;

        using var log = new FindingLog(options.Verbose);
        var diagnostics = new DiagnosticList();
        if (SettingsFile.Read(InputFile.Read(settings), Path.GetFileName(settings), diagnostics) is not null) return;

        log.Write(diagnostics);
        throw new Failure(ExitCodes.Usage, "The settings file is wrong; nothing was read further.");
    }

    private static ImmutableArray<ReviewDecision> Decisions(Options options, DiagnosticList diagnostics, FindingLog log)
    {
        if (options.Decisions is not { } path)
            return options.DecidedOn is null ? [] : throw new Failure(ExitCodes.Usage, "--decided-on goes with --decisions; give both.");
        if (string.IsNullOrWhiteSpace(path)) throw new Failure(ExitCodes.Usage, "The path after --decisions is empty; give a file.");
        if (DecisionFile.Read(InputFile.Read(path), Path.GetFileName(path), diagnostics) is { } decisions) return decisions;

        log.Write(diagnostics);
        throw new Failure(ExitCodes.Usage, "The file of decisions is wrong; nothing was written.");
    }

    private static Settings WithKind(Settings settings, string? kind)
    {
        if (kind is null) return settings;

        var forces = settings.Reading.Forces with { KindOfAll = kind == "service" ? SituationKind.Service : SituationKind.Design };
        return settings with { Reading = settings.Reading with { Forces = forces } };
    }

    private static (string Text, bool IsGiven) Time(Options options)
    {
        const string Format = "yyyy-MM-dd'T'HH:mm:ss'Z'";
        if (options.Timestamp is not { } given) return (Program.Clock.GetUtcNow().ToString(Format, CultureInfo.InvariantCulture), false);
        if (DateTimeOffset.TryParse(given, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var time))
            return (time.ToUniversalTime().ToString(Format, CultureInfo.InvariantCulture), true);

        throw new Failure(ExitCodes.Usage, $"'{given}' is no time; write it as 2026-01-31T10:00:00Z.");
    }

    private static (byte[] Html, byte[]? Pdf) Report(ScreeningOutcome outcome, ScreeningRecord? earlier, string? browser, CancellationToken cancellation)
    {
        var html = HtmlReport.Render(outcome.Record, earlier is null ? null : RunComparison.Of(earlier, outcome.Record), outcome.Sheets);
        return (Encoding.UTF8.GetBytes(html), browser is null ? null : PdfPrinter.Print(browser, html, cancellation));
    }

    private static void WriteOutputs(Options options, OutputNames names, ScreeningOutcome outcome, (byte[] Html, byte[]? Pdf) report, Action<OutputSet, ScreeningRecord> more)
    {
        try
        {
            if (options.Output is { } folder) Directory.CreateDirectory(folder);

            using var files = new OutputSet();
            if (outcome.CanWriteModel) files.Add(names.CheckedModel, outcome.WriteModel);

            files.Add(names.Report, report.Html);
            if (report.Pdf is { } pdf) files.Add(options.Pdf!, pdf);
            files.Add(names.MembersTable, MembersTable.Write(outcome.Record));
            files.Add(names.RunRecord, RunRecord.Write(outcome.Record));
            options.Further.AddTo(files, outcome.Record);
            more(files, outcome.Record);
            files.Commit([outcome.CanWriteModel ? null : names.CheckedModel, .. options.Further.NotWritten(outcome.Record)]);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            var folder = Path.GetDirectoryName(Path.GetFullPath(names.Report));
            throw new Failure(ExitCodes.InputOutput, $"The outputs cannot be written to '{folder}': {e.Message} Nothing was changed; give another folder with --out DIR.", e);
        }
    }
}
