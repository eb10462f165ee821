using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Inputs.Json;

/// <summary>The text of a JSON file: turns byte offsets into lines and columns and takes the errors.</summary>
internal sealed class JsonSource(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
{
    /// <summary>Errors that are told; further ones are only counted.</summary>
    public const int MostErrors = 50;

    public ReadOnlySpan<byte> Bytes => bytes.Span;

    /// <summary>Whether the text is one of the program's own, whose patterns the tests have tried: they cost far more to try than to use.</summary>
    public bool IsShipped { get; init; }

    /// <summary>How many errors were added.</summary>
    public int ErrorCount { get; private set; }

    /// <summary>Line of a byte, from 1.</summary>
    public int LineOf(int offset) => bytes.Span[..Math.Clamp(offset, 0, bytes.Length)].Count((byte)'\n') + 1;

    /// <summary>Adds an error at a byte of the file.</summary>
    public void Fail(string code, int offset, string message)
    {
        if (++ErrorCount > MostErrors) return;

        var before = bytes.Span[..Math.Clamp(offset, 0, bytes.Length)];
        var line = LineOf(offset);
        var inLine = before[(before.LastIndexOf((byte)'\n') + 1)..];
        if (line == 1 && inLine.StartsWith("\uFEFF"u8)) inLine = inLine[3..];
        var column = 1;
        foreach (var unit in inLine)
            if ((unit & 0xC0) != 0x80) column++;

        diagnostics.Add(code, Severity.Error, message, new SourceSpan(fileName, before.Length, line, column, 0));
        if (ErrorCount < MostErrors) return;
        diagnostics.Add(InputCodes.TooManyErrors, Severity.Note,
            $"only the first {MostErrors} errors are told; mend these and read the file again", SourceSpan.At(fileName, line, column));
    }
}
