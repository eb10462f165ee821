using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Inputs.Decisions;

/// <summary>A file of decisions by people: CSV with the header <c>member,decision,by,date,note</c>, or JSON <c>{"decisions": [{…}]}</c> with these keys.</summary>
public static class DecisionFile
{
    /// <summary>Largest file that is read [bytes].</summary>
    public const int LargestFile = 1024 * 1024;

    /// <summary>Longest decision and name [characters]; a note may have <see cref="LongestNote"/>.</summary>
    public const int LongestText = 200;

    /// <summary>Longest note [characters].</summary>
    public const int LongestNote = 1000;

    /// <summary>Names of the columns and keys, in order.</summary>
    internal static readonly string[] Names = ["member", "decision", "by", "date", "note"];

    /// <summary>Reads a file: JSON where it begins with a brace or a comment of JSON, else CSV.</summary>
    /// <param name="bytes">The whole file.</param>
    /// <param name="fileName">Name for messages.</param>
    /// <param name="diagnostics">Receives every error with line and column.</param>
    /// <returns>The decisions in the order of the file; null when anything is wrong.</returns>
    public static ImmutableArray<ReviewDecision>? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        ArgumentNullException.ThrowIfNull(diagnostics);
        if (bytes.Length > LargestFile)
        {
            diagnostics.Add(InputCodes.SettingsLimit, Severity.Error, $"the file is larger than {LargestFile / 1024} KiB; split it", SourceSpan.At(fileName, 1, 1));
            return null;
        }

        var start = bytes.Span.StartsWith("\uFEFF"u8) ? bytes.Span[3..] : bytes.Span;
        start = start.TrimStart(" \t\r\n"u8);
        return start.Length > 0 && start[0] is (byte)'{' or (byte)'/'
            ? DecisionJson.Read(bytes, fileName, diagnostics)
            : DecisionTable.Read(bytes, fileName, diagnostics);
    }
}
