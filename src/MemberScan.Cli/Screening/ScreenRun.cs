using System.Buffers;
using System.Globalization;
using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Foundation.Diagnostics;
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
        string Model, IReadOnlyList<string> Forces, string? Settings, string? Kind, string? Output, string? Timestamp, bool Verbose);

    /// <summary>Runs and returns the exit code.</summary>
    public static int Execute(Options options, CancellationToken cancellation)
    {
        using var log = new FindingLog(options.Verbose);
        if (options.Output is { } given && string.IsNullOrWhiteSpace(given))
            throw new Failure(ExitCodes.Usage, "The path after --out is empty; give a folder.");

        var diagnostics = new DiagnosticList();
        var read = RunInputs.Read(options.Model, options.Forces, options.Settings, diagnostics, log.Write);
        var names = OutputNames.For(options.Model, options.Output);
        var inputs = new[] { options.Model }.Concat(options.Forces).Concat(options.Settings is { } path ? [path] : []);
        if (names.Clashes(inputs).FirstOrDefault() is { } clash)
            throw new Failure(ExitCodes.Usage, $"The output '{clash}' would be an input of this run; give another folder with --out DIR.");

        var (timestamp, isGiven) = Time(options);

        var request = new ScreeningRequest
        {
            ModelName = read.ModelName,
            Container = read.Container,
            ModelBytes = read.Model,
            Settings = WithKind(read.Settings, options.Kind),
            Tables = read.Tables,
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
        return ExitCodes.Of(outcome.Record);
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
            if (outcome.CanWriteModel)
            {
                var model = new ArrayBufferWriter<byte>();
                outcome.WriteModel(model);
                files.Add(names.CheckedModel, model.WrittenSpan);
            }

            files.Add(names.Report, Encoding.UTF8.GetBytes(HtmlReport.Render(outcome.Record)));
            files.Add(names.MembersTable, MembersTable.Write(outcome.Record));
            files.Add(names.RunRecord, RunRecord.Write(outcome.Record));
            files.Commit(outcome.CanWriteModel ? null : names.CheckedModel);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            var folder = Path.GetDirectoryName(Path.GetFullPath(names.Report));
            throw new Failure(ExitCodes.InputOutput, $"The outputs cannot be written to '{folder}': {e.Message} Nothing was changed; give another folder with --out DIR.", e);
        }
    }
}
