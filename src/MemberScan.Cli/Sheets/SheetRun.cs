using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Sheets;
using MemberScan.Screening;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Sheets;

/// <summary>One run of the sheet command.</summary>
internal static class SheetRun
{
    /// <summary>What was asked for.</summary>
    public sealed record Options(string Model, string Member, IReadOnlyList<string> Forces, string? Settings, string? Html, bool Verbose);

    /// <summary>Runs and returns the exit code, of the one member as <c>screen</c> returns it of all.</summary>
    /// <param name="options">What was asked for.</param>
    /// <param name="output">Where the lines go.</param>
    /// <param name="cancellation">Stops the run.</param>
    public static int Execute(Options options, TextWriter output, CancellationToken cancellation)
    {
        if (options.Html is { } path) OutputNames.RefuseClashes([path], [options.Model, .. options.Forces, .. new[] { options.Settings }.OfType<string>()]);

        using var log = new FindingLog(options.Verbose);
        var diagnostics = new DiagnosticList();
        using var read = RunInputs.Read(options.Model, options.Forces, options.Settings, diagnostics, log.Write);
        var request = new ScreeningRequest
        {
            Model = read.Model,
            Settings = read.Settings,
            Tables = read.Tables,
            Timestamp = Program.Clock.GetUtcNow().ToString("yyyy-MM-dd'T'HH:mm:ss'Z'", System.Globalization.CultureInfo.InvariantCulture),
            Version = Program.Version,
        };
        ScreeningOutcome? outcome;
        using (var progress = ProgressDisplay.Start()) outcome = Screener.Run(request, diagnostics, progress, cancellation);
        log.Write(diagnostics);
        if (outcome is null) throw new Failure(ExitCodes.Usage, "The forces table does not fit the model; nothing was written.");

        var member = MemberChoice.Of(outcome.Record.Members, options.Member);
        if (options.Html is { } html) Write(html, SheetPage.Render(outcome.Record, member, outcome.Sheets));
        output.WriteLine($"MemberScan {outcome.Record.Version}, run {outcome.Record.RunId}, {outcome.Record.Model.FileName}");
        foreach (var line in SheetText.Lines(member, outcome.Sheets)) output.WriteLine(line);
        output.WriteLine();
        foreach (var caution in outcome.Record.Cautions) output.WriteLine(caution);
        if (options.Html is not null) output.WriteLine($"wrote {options.Html}");
        return Code(outcome.Record, member);
    }

    private static int Code(ScreeningRecord record, MemberResult member) =>
        !record.Model.ReadToEnd ? ExitCodes.NotReadToEnd
        : member.Verdict == Verdict.Overstressed ? ExitCodes.Overstressed
        : member.Verdict == Verdict.NotChecked || record.HasDamage ? ExitCodes.NotChecked
        : ExitCodes.WithinLimit;

    private static void Write(string path, string page)
    {
        try
        {
            using var files = new OutputSet();
            files.Add(path, Encoding.UTF8.GetBytes(page));
            files.Commit();
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The sheet cannot be written: {e.Message} Nothing was changed; give another file.", e);
        }
    }
}
