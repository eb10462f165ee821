using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using Serilog;
using Serilog.Core;
using Serilog.Events;

namespace MemberScan.Cli.Screening;

/// <summary>Findings as log lines on standard error.</summary>
internal sealed class FindingLog : IDisposable
{
    private readonly Logger _logger;
    private readonly string _prefix;
    private int _written;

    /// <summary>A log of warnings and errors; of everything when verbose.</summary>
    /// <param name="verbose">Whether notes are written too.</param>
    /// <param name="about">What the findings are about, where several runs write side by side; empty for one.</param>
    public FindingLog(bool verbose, string about = "") => (_prefix, _logger) = (about.Length > 0 ? about + ": " : "", Logger(verbose));

    private static Logger Logger(bool verbose) => new LoggerConfiguration()
        .MinimumLevel.Is(verbose ? LogEventLevel.Verbose : LogEventLevel.Warning)
        .WriteTo.Console(
            outputTemplate: "{Level:w}: {Message:l}{NewLine}", standardErrorFromLevel: LogEventLevel.Verbose,
            formatProvider: CultureInfo.InvariantCulture, theme: Serilog.Sinks.SystemConsole.Themes.ConsoleTheme.None)
        .CreateLogger();

    /// <summary>Writes the findings that were not written yet.</summary>
    public void Write(DiagnosticList diagnostics)
    {
        for (; _written < diagnostics.Items.Count; _written++)
        {
            var finding = diagnostics.Items[_written];
            var level = finding.Severity switch { Severity.Error => LogEventLevel.Error, Severity.Warning => LogEventLevel.Warning, _ => LogEventLevel.Information };
            var place = finding.Span is { } span ? $" [{span}]" : "";
            var count = diagnostics.CountOf(finding);
            var times = count > 1 ? string.Create(CultureInfo.InvariantCulture, $" ({count} times)") : "";
            _logger.Write(level, "{About:l}{Code:l} {Message:l}{Place:l}{Times:l}", _prefix, finding.Code, finding.Message, place, times);
        }
    }

    /// <summary>Flushes.</summary>
    public void Dispose() => _logger.Dispose();
}
