using System.Globalization;
using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Reporting.Comparison;
using MemberScan.Screening;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;

namespace MemberScan.Cli.Comparing;

/// <summary>One run of the compare command.</summary>
internal static class CompareRun
{
    /// <summary>Something became worse.</summary>
    public const int Worse = 1;

    /// <summary>Most candidates printed per outcome; all are in the files.</summary>
    private const int MostListed = 20;

    /// <summary>What was asked for on the command line; the forces are those of the models that are screened on the fly.</summary>
    public sealed record Options(
        string Earlier, string Later, IReadOnlyList<string> EarlierForces, IReadOnlyList<string> LaterForces, string? Settings, string? Csv, string? Json, string? Html);

    /// <summary>Runs and returns the exit code: 0 nothing became worse, 1 something did, 3 a model was not read to its end.</summary>
    public static int Execute(Options options, TextWriter output, CancellationToken cancellation)
    {
        var outputs = new[] { options.Csv, options.Json, options.Html }.OfType<string>().ToList();
        OutputNames.RefuseClashes(outputs, [options.Earlier, options.Later, .. options.EarlierForces, .. options.LaterForces, .. options.Settings is { } path ? new[] { path } : []]);
        var record = RunComparison.Of(Run(options.Earlier, options.EarlierForces, options, cancellation), Run(options.Later, options.LaterForces, options, cancellation));
        cancellation.ThrowIfCancellationRequested();
        Write(options, record);
        Print(record, output);
        foreach (var file in outputs) output.WriteLine($"wrote {file}");
        return !record.Earlier.Model.ReadToEnd || !record.Later.Model.ReadToEnd ? ExitCodes.NotReadToEnd : record.HasWorse ? Worse : 0;
    }

    private static ScreeningRecord Run(string path, IReadOnlyList<string> forces, Options options, CancellationToken cancellation) =>
        path.EndsWith(".json", StringComparison.OrdinalIgnoreCase) ? RunRecordFile.Read(path) : Screened(path, forces, options.Settings, cancellation);

    private static ScreeningRecord Screened(string path, IReadOnlyList<string> forces, string? settings, CancellationToken cancellation)
    {
        using var log = new FindingLog(verbose: false);
        var diagnostics = new DiagnosticList();
        using var read = RunInputs.Read(path, forces, settings, diagnostics, log.Write);
        var request = new ScreeningRequest
        {
            Model = read.Model,
            Settings = read.Settings,
            Tables = read.Tables,
            Timestamp = "",
            Version = Program.Version,
        };
        var outcome = Screener.Run(request, diagnostics, null, cancellation);
        log.Write(diagnostics);
        return outcome?.Record ?? throw new Failure(ExitCodes.Usage, $"A forces table does not fit '{read.Model.Name}'; nothing was compared.");
    }

    private static void Write(Options options, ComparisonRecord record)
    {
        try
        {
            using var files = new OutputSet();
            if (options.Csv is { } csv) files.Add(csv, ComparisonTable.Write(record));
            if (options.Json is { } json) files.Add(json, ComparisonJson.Write(record));
            if (options.Html is { } html) files.Add(html, Encoding.UTF8.GetBytes(ComparisonPage.Render(record)));
            files.Commit();
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new Failure(ExitCodes.InputOutput, $"The comparison cannot be written: {e.Message} Nothing was changed; give another file.", e);
        }
    }

    private static void Print(ComparisonRecord record, TextWriter output)
    {
        void Line(FormattableString text) => output.WriteLine(text.ToString(CultureInfo.InvariantCulture));

        foreach (var change in record.RunChanges) output.WriteLine(change);
        foreach (var group in record.Members.Where(m => m.Movement < Movement.Unchanged || m.IsReidentified).GroupBy(m => m.Movement))
        {
            foreach (var member in group.Take(MostListed))
                Line($"{(member.IsWorse ? "WORSE " : "")}{member.Latest.Key} '{Plain(member.Latest.Name)}': {Plain(member.Words)}{Inputs(member)}");
            if (group.Count() > MostListed) Line($"and {group.Count() - MostListed} more: {MovementText.Of(group.Key)}");
        }

        Line($"{string.Join(", ", Enum.GetValues<Movement>().Select(m => string.Create(CultureInfo.InvariantCulture, $"{record.Count(m)} {MovementText.Of(m)}")))}; {record.Reidentified} re-identified; {record.Members.Count(m => m.IsWorse)} worse than before");
    }

    private static string Inputs(MemberMovement member)
    {
        var told = member.Changes.Where(c => c.Earlier.Length + c.Later.Length > 0 && c.What != "forces").Select(c => $"{c.What} {c.Earlier} → {c.Later}").ToList();
        return told.Count > 0 ? $" ({Plain(string.Join("; ", told))})" : "";
    }

    /// <summary>Model text on a terminal: control characters would be commands to it.</summary>
    private static string Plain(string text) => string.Concat(text.Select(c => char.IsControl(c) ? '\u00b7' : c));
}
