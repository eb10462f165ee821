using System.Collections.Immutable;
using System.Runtime.InteropServices;
using System.Text;
using System.Text.Unicode;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.ForcesTables.Rows;

namespace MemberScan.Inputs.Decisions;

/// <summary>Decisions in CSV (RFC 4180): the header names exactly the five columns; lines that begin with '#' are remarks.</summary>
internal static class DecisionTable
{
    // A note of 1000 characters has at most four bytes each, quotes doubled.
    private static readonly TableLimits s_limits = TableLimits.Default with { FieldLength = 8 * DecisionFile.LongestNote };

    public static ImmutableArray<ReviewDecision>? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics)
    {
        var findings = new TableFindings(fileName, diagnostics, s_limits.Errors);
        if (!Utf8.IsValid(bytes.Span))
        {
            findings.Add(InputCodes.TableNotUtf8, "the table is not UTF-8; save it as UTF-8");
            return null;
        }

        var decisions = ImmutableArray.CreateBuilder<ReviewDecision>();
        var met = new HashSet<string>(StringComparer.Ordinal);
        using var stream = new MemoryStream(MemoryMarshal.TryGetArray(bytes, out var array) ? array.Array! : bytes.ToArray(), array.Offset, bytes.Length, writable: false);
        using var window = new RowWindow(stream, TableReader.Reach(s_limits));
        var scanner = new CsvScanner(window, s_limits);
        var fields = new List<CsvField>();
        var hasHeader = false;
        while (!findings.Full && scanner.TryRow(fields))
        {
            var (start, line) = (scanner.RowStart, scanner.RowLine);
            if (scanner.Fault != CsvFault.None)
            {
                Tell(InputCodes.Quoting, scanner.FaultAt, "the row cannot be taken apart: write it by RFC 4180, fields with commas, quotes or line ends in quotes, quotes doubled");
                scanner.Resume();
            }
            else if (scanner.IsRemark || fields is [{ Length: 0, IsQuoted: false }]) continue;
            else if (!hasHeader)
            {
                hasHeader = true;
                if (fields.Select(f => Text(window.Bytes, f)).SequenceEqual(DecisionFile.Names, StringComparer.Ordinal)) continue;
                Tell(InputCodes.DecisionHeader, start, $"the header is not '{string.Join(',', DecisionFile.Names)}'; write these five columns, separated by commas");
                return null;
            }
            else if (fields.Count != DecisionFile.Names.Length)
                Tell(InputCodes.FieldCount, start, $"the row has {fields.Count} fields; give {DecisionFile.Names.Length}");
            else if (Row(window.Bytes, fields, Tell) is { } texts)
            {
                if (!met.Add(texts[0])) Tell(InputCodes.DecisionDoubled, fields[0].Start, $"a second decision for {Excerpt.Of(texts[0])}; keep one");
                decisions.Add(new ReviewDecision(texts[0], texts[1], texts[2], texts[3], texts[4], SourceSpan.At(fileName, line, 1)));
            }
        }

        if (!hasHeader && findings.Count == 0) findings.Add(InputCodes.TableEmpty, "the table is empty; give a header and a row for each decision");
        return findings.Count > 0 ? null : decisions.ToImmutable();

        void Tell(string code, int at, string message) => findings.Add(code, window.Offset + at, window.Bytes[scanner.RowStart..at], scanner.RowLine, message);
    }

    private static string[]? Row(ReadOnlySpan<byte> bytes, List<CsvField> fields, Action<string, int, string> tell)
    {
        var texts = new string[fields.Count];
        var isSound = true;
        for (var i = 0; i < texts.Length; i++)
        {
            texts[i] = Text(bytes, fields[i]);
            if (DecisionFault.Of(DecisionFile.Names[i], texts[i]) is not var (code, message)) continue;

            tell(code, fields[i].Start, message);
            isSound = false;
        }

        return isSound ? texts : null;
    }

    private static string Text(ReadOnlySpan<byte> bytes, CsvField field)
    {
        var text = Encoding.UTF8.GetString(bytes.Slice(field.Start, field.Length));
        return field.IsQuoted ? text.Replace("\"\"", "\"", StringComparison.Ordinal) : text;
    }
}
