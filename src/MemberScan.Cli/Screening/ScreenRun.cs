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

        /// <summary>Further outputs that were asked for.</summary>
        public FurtherOutputs Further { get; init; } = FurtherOutputs.None;
    }

    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(Options options, CancellationToken cancellation)
    {
        using var log = new FindingLog(options.Verbose);
        if (options.Output is { } given && string.IsNullOrWhiteSpace(given))
            throw new Failure(ExitCodes.Usage, "The path after --out is empty; give a folder.");

        var diagnostics = new DiagnosticList();
        using var read = RunInputs.Read(options.Model, options.Forces, options.Settings, diagnostics, log.Write);
        var names = OutputNames.For(options.Model, options.Output);
        string[] inputs = [options.Model, .. options.Forces, .. new[] { options.Settings, options.Decisions, options.DecidedOn }.OfType<string>()];
        if (names.Clashes(inputs).FirstOrDefault() is { } clash)
            throw new Failure(ExitCodes.Usage, $"The output '{clash}' would be an input of this run; give another folder with --out DIR.");
        OutputNames.RefuseClashes(options.Further.Paths, [.. inputs, names.CheckedModel, names.Report, names.MembersTable, names.RunRecord]);
        options.Further.RefuseUnknown();

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
        using (var progress = ProgressDisplay.Start()) outcome = Screener.Run(request, diagnostics, progress, cancellation);
        log.Write(diagnostics);
        if (outcome is null) throw new Failure(ExitCodes.Usage, "The forces table does not fit the model; nothing was written.");

        cancellation.ThrowIfCancellationRequested();
        WriteOutputs(options, names, outcome);
        Summary.Print(outcome.Record, names, outcome.CanWriteModel);
        if (options.SetTemplate && outcome.Record.Model.ReadAs == "IFC2X3") Console.Out.WriteLine("no set template is written: IFC2X3 knows none");
        foreach (var path in options.Further.Written(outcome.Record)) Console.Out.WriteLine($"wrote {path}");
        foreach (var path in options.Further.NotWritten(outcome.Record)) Console.Out.WriteLine($"not written: {path}; nothing that was missing can be said in its format, see the list in .csv or .html");
        return ExitCodes.Of(outcome.Record);
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

    private static void WriteOutputs(Options options, OutputNames names, ScreeningOutcome outcome)
    {
        try
        {
            if (options.Output is { } folder) Directory.CreateDirectory(folder);

            using var files = new OutputSet();
            if (outcome.CanWriteModel) files.Add(names.CheckedModel, outcome.WriteModel);

            files.Add(names.Report, Encoding.UTF8.GetBytes(HtmlReport.Render(outcome.Record)));
            files.Add(names.MembersTable, MembersTable.Write(outcome.Record));
            files.Add(names.RunRecord, RunRecord.Write(outcome.Record));
            options.Further.AddTo(files, outcome.Record);
            files.Commit([outcome.CanWriteModel ? null : names.CheckedModel, .. options.Further.NotWritten(outcome.Record)]);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            var folder = Path.GetDirectoryName(Path.GetFullPath(names.Report));
            throw new Failure(ExitCodes.InputOutput, $"The outputs cannot be written to '{folder}': {e.Message} Nothing was changed; give another folder with --out DIR.", e);
        }
    }
}
