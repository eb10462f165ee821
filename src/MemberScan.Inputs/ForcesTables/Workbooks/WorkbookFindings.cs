using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Inputs.ForcesTables.Workbooks;

/// <summary>Brings findings about the text of a sheet back to its cells.</summary>
internal static class WorkbookFindings
{
    /// <summary>Adds findings with their place as row and column of the sheet, and the name of the cell.</summary>
    /// <param name="found">Findings about the text.</param>
    /// <param name="text">The text.</param>
    /// <param name="diagnostics">Takes them.</param>
    public static void Add(DiagnosticList found, ReadOnlySpan<byte> text, DiagnosticList diagnostics)
    {
        foreach (var finding in found.Items)
        {
            if (finding.Span is not { Offset: >= 0 } span)
            {
                diagnostics.Add(finding);
                continue;
            }

            var column = ColumnOf(text[..(int)Math.Min(span.Offset, text.Length)]);
            diagnostics.Add(finding.Code, finding.Severity, $"{finding.Message} (cell {CellName.Of(column, (int)span.Line)})", SourceSpan.At(span.File, span.Line, column + 1));
        }
    }

    // Tabs since the beginning of the line, those in quotes left out; no line end stands in quotes but in a wrong name.
    private static int ColumnOf(ReadOnlySpan<byte> before)
    {
        var line = before[(before.LastIndexOf((byte)'\n') + 1)..];
        var (column, inQuotes) = (0, false);
        foreach (var unit in line)
        {
            if (unit == '"') inQuotes = !inQuotes;
            else if (unit == '\t' && !inQuotes) column++;
        }

        return column;
    }
}
