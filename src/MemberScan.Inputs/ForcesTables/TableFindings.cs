using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Inputs.ForcesTables;

/// <summary>The errors of one table, each with its line and column, up to the limit.</summary>
internal sealed class TableFindings(string fileName, DiagnosticList diagnostics, int most)
{
    public int Count { get; private set; }

    /// <summary>Whether reading must go no further.</summary>
    public bool Full => Count >= most;

    /// <summary>Adds an error at a byte of the table.</summary>
    /// <param name="code">Its code.</param>
    /// <param name="offset">Place of the byte in the table.</param>
    /// <param name="before">What stands between the beginning of the row and that byte.</param>
    /// <param name="rowLine">Line on which the row begins.</param>
    /// <param name="message">What is wrong, and the remedy.</param>
    public void Add(string code, long offset, ReadOnlySpan<byte> before, int rowLine, string message)
    {
        if (Full) return;

        var line = rowLine + before.Count((byte)'\n');
        var column = CodePoints(before[(before.LastIndexOf((byte)'\n') + 1)..]) + 1;
        diagnostics.Add(code, Severity.Error, message, new SourceSpan(fileName, offset, line, column, 0));
        Count++;
        if (Full)
        {
            diagnostics.Add(InputCodes.TooManyErrors, Severity.Note,
                $"reading stopped after {Count} errors; mend these and read the table again", SourceSpan.At(fileName, line, column));
        }
    }

    /// <summary>Adds an error about the file as a whole.</summary>
    public void Add(string code, string message)
    {
        diagnostics.Add(code, Severity.Error, message, SourceSpan.At(fileName, 1, 1));
        Count++;
    }

    private static int CodePoints(ReadOnlySpan<byte> text)
    {
        var count = 0;
        foreach (var unit in text)
            if ((unit & 0xC0) != 0x80) count++;
        return count;
    }
}
