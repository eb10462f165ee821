using System.Globalization;
using System.Text.Json;
using MemberScan.Reporting.RunFile;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting;

/// <summary>The run record: everything a screening found, as a JSON file that later runs are compared with.</summary>
/// <remarks>
/// UTF-8 without byte order mark, indented, lines end with LF. First <c>format</c>, then <c>screening</c> with the members of
/// <see cref="ScreeningRecord"/> in their order. All values are SI; numbers are the shortest text that reads back to the same value.
/// </remarks>
public static class RunRecord
{
    /// <summary>Name and number of the format.</summary>
    public const string Format = "memberscan-run/1";

    /// <summary>The record as bytes; the same record gives the same bytes.</summary>
    /// <exception cref="ArgumentException">The record contradicts itself (<see cref="SoundRecord"/>), or a number is not finite.</exception>
    public static byte[] Write(ScreeningRecord record)
    {
        SoundRecord.ThrowUnlessSound(record);
        return [.. JsonSerializer.SerializeToUtf8Bytes(new RunDocument(Format, record), RunJson.Document), (byte)'\n'];
    }

    /// <summary>Reads a record back, strictly: a missing, unknown or repeated member, a wrong type or an unknown word is refused.</summary>
    /// <param name="utf8">The file's bytes.</param>
    /// <exception cref="InvalidDataException">The bytes are no run record of this format; the message says what and, where known, at which line and column.</exception>
    public static ScreeningRecord Read(ReadOnlySpan<byte> utf8)
    {
        var document = Parse(utf8);
        if (document.Format != Format) throw new InvalidDataException($"The file says its format is another than {Format}.");
        if (SoundRecord.WhatIsWrong(document.Screening) is { } fault) throw new InvalidDataException("The run record contradicts itself. " + fault);
        return document.Screening;
    }

    private static RunDocument Parse(ReadOnlySpan<byte> utf8)
    {
        try
        {
            return JsonSerializer.Deserialize(utf8, RunJson.Document) ?? throw new InvalidDataException("The file holds null, not a run record.");
        }
        catch (JsonException e)
        {
            // The reader counts lines and bytes from 0.
            var place = e.LineNumber is { } line
                ? string.Create(CultureInfo.InvariantCulture, $" (line {line + 1}, byte {e.BytePositionInLine + 1} of it, {e.Path})")
                : "";
            throw new InvalidDataException($"The file is no run record{place}: {e.Message}", e);
        }
    }
}
