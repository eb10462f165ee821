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
    private int _written;

    /// <summary>A log of warnings and errors; of everything when verbose.</summary>
    public FindingLog(bool verbose) => _logger = new LoggerConfiguration()
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
            _logger.Write(level, "{Code:l} {Message:l}{Place:l}{Times:l}", finding.Code, finding.Message, place, times);
        }
    }

    /// <summary>Flushes.</summary>
    public void Dispose() => _logger.Dispose();
}
