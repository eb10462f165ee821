using System.Globalization;

namespace MemberScan.Foundation.Diagnostics;

/// <summary>A place in an input file.</summary>
/// <param name="File">Name of the file, without its folder; empty when there is only one.</param>
/// <param name="Offset">Bytes before the place, from 0; −1 if unknown.</param>
/// <param name="Line">Line, from 1; 0 if unknown.</param>
/// <param name="Column">Column in characters, from 1; 0 if unknown.</param>
/// <param name="InstanceId">Number after '#' of the instance concerned; 0 if none.</param>
public readonly record struct SourceSpan(string File, long Offset, long Line, int Column, ulong InstanceId)
{
    /// <summary>A place known by line and column only.</summary>
    public static SourceSpan At(string file, long line, int column) => new(file, -1, line, column, 0);

    /// <summary>The place in words, such as <c>line 12, byte 431 (#7)</c>.</summary>
    public override string ToString()
    {
        var parts = new List<string>(4);
        if (File is { Length: > 0 }) parts.Add(File);
        if (Line > 0) parts.Add(string.Create(CultureInfo.InvariantCulture, $"line {Line}"));
        if (Column > 0) parts.Add(string.Create(CultureInfo.InvariantCulture, $"column {Column}"));
        if (Offset >= 0) parts.Add(string.Create(CultureInfo.InvariantCulture, $"byte {Offset}"));
        var text = string.Join(", ", parts);
        return InstanceId > 0 ? string.Create(CultureInfo.InvariantCulture, $"{text} (#{InstanceId})") : text;
    }
}
