using System.Globalization;
using MemberScan.Screening;

namespace MemberScan.Cli.Screening;

/// <summary>Progress on standard error: one line that is rewritten on a terminal, one plain line per stage when redirected.</summary>
internal sealed class ProgressDisplay : IProgress<ScreeningProgress>, IDisposable
{
    private const string ClearLine = "\r\x1b[K";

    private readonly bool _isTerminal = !Console.IsErrorRedirected;
    private readonly Lock _lock = new();
    private string _shown = "";

    private ProgressDisplay()
    {
    }

    /// <summary>Starts the display.</summary>
    public static ProgressDisplay Start() => new();

    /// <inheritdoc/>
    public void Report(ScreeningProgress value)
    {
        var text = _isTerminal && value.Share > 0
            ? string.Create(CultureInfo.InvariantCulture, $"{value.Stage} {100 * value.Share:0} %")
            : value.Stage;
        lock (_lock)
        {
            if (text == _shown) return;

            _shown = text;
            if (_isTerminal) Console.Error.Write(ClearLine + text);
            else Console.Error.WriteLine(text);
        }
    }

    /// <summary>Clears the line.</summary>
    public void Dispose()
    {
        if (_isTerminal && _shown.Length > 0) Console.Error.Write(ClearLine);
    }
}
