using System.Globalization;
using System.IO.Compression;
using System.Text;
using System.Xml;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Packaging;
using DocumentFormat.OpenXml.Spreadsheet;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Inputs.ForcesTables.Workbooks;

/// <summary>The sheet of a workbook as a text of tabs, one line a row, so that one reader serves both; formulas give their stored values.</summary>
internal sealed class WorkbookText
{
    private readonly string _fileName;
    private readonly DiagnosticList _diagnostics;
    private readonly WorkbookLimits _limits;
    private readonly StringBuilder _text = new();
    private readonly List<string> _shared = [];
    private int _formulas;
    private int _width;

    private WorkbookText(string fileName, DiagnosticList diagnostics, WorkbookLimits limits) => (_fileName, _diagnostics, _limits) = (fileName, diagnostics, limits);

    /// <summary>Whether bytes begin as a workbook does.</summary>
    public static bool IsWorkbook(ReadOnlySpan<byte> bytes) => bytes.StartsWith("PK\u0003\u0004"u8);

    /// <summary>The text of the sheet; null, with an error, when there is none.</summary>
    public static byte[]? Read(ReadOnlyMemory<byte> bytes, string fileName, DiagnosticList diagnostics, WorkbookLimits limits)
    {
        var workbook = new WorkbookText(fileName, diagnostics, limits);
        try
        {
            using var stream = new MemoryStream(bytes.ToArray(), writable: false);
            if (!workbook.IsWithinLimits(stream)) return null;

            stream.Position = 0;
            using var document = SpreadsheetDocument.Open(stream, isEditable: false, new OpenSettings { MaxCharactersInPart = limits.Unpacked });
            return workbook.Sheet(document) ? Encoding.UTF8.GetBytes(workbook._text.ToString()) : null;
        }
        catch (Exception fault) when (fault is OpenXmlPackageException or InvalidDataException or XmlException or FileFormatException or ArgumentException or InvalidOperationException or IOException or FormatException)
        {
            workbook.Fail(InputCodes.Workbook, 1, 0, "the workbook cannot be read: it is damaged, protected, or no spreadsheet; save it as .xlsx without a password, or as CSV");
            return null;
        }
    }

    /// <summary>The directory of the container is looked at before anything is unpacked: a small file can promise a large one.</summary>
    private bool IsWithinLimits(Stream stream)
    {
        using var container = new ZipArchive(stream, ZipArchiveMode.Read, leaveOpen: true);
        if (container.Entries.Count <= _limits.Parts && container.Entries.Sum(e => Math.Min(e.Length, long.MaxValue / _limits.Parts)) <= _limits.Unpacked) return true;

        Fail(InputCodes.TableLimit, 1, 0, $"the workbook unpacks to more than {_limits.Unpacked / (1024 * 1024)} MiB or {_limits.Parts} parts; save the one sheet as CSV");
        return false;
    }

    private bool Sheet(SpreadsheetDocument document)
    {
        var book = document.WorkbookPart;
        var sheets = book?.Workbook?.Sheets?.Elements<Sheet>().Where(s => s.Id?.Value is not null).ToList() ?? [];
        var sheet = sheets.Find(s => string.Equals(s.Name?.Value, "forces", StringComparison.OrdinalIgnoreCase)) ?? sheets.FirstOrDefault();
        if (sheet is null || book!.GetPartById(sheet.Id!.Value!) is not WorksheetPart part)
        {
            Fail(InputCodes.Workbook, 1, 0, "the workbook has no sheet of cells; put the table into one, named 'forces' where there are several");
            return false;
        }

        if (sheets.Count > 1)
            _diagnostics.Add(InputCodes.WorkbookRead, Severity.Note, $"the workbook has {sheets.Count} sheets; the table is read from {Excerpt.Of(sheet.Name?.Value ?? "")}", SourceSpan.At(_fileName, 1, 1));
        if (book.SharedStringTablePart is { } shared && !SharedTexts(shared)) return false;
        if (!Rows(part)) return false;

        if (_formulas > 0)
            _diagnostics.Add(InputCodes.WorkbookRead, Severity.Note, string.Create(CultureInfo.InvariantCulture, $"{_formulas} cells hold formulas; the values stored with them are used, nothing is calculated"), SourceSpan.At(_fileName, 1, 1));
        return true;
    }

    private bool SharedTexts(SharedStringTablePart part)
    {
        using var reader = OpenXmlReader.Create(part);
        while (reader.Read())
        {
            if (reader.ElementType != typeof(SharedStringItem) || !reader.IsStartElement) continue;
            if (_shared.Count >= _limits.SharedTexts)
            {
                Fail(InputCodes.TableLimit, 1, 0, $"the workbook has more than {_limits.SharedTexts} texts; save the one sheet as CSV");
                return false;
            }

            var item = (SharedStringItem)reader.LoadCurrentElement()!;
            _shared.Add(item.Text?.Text ?? string.Concat(item.Elements<Run>().Select(r => r.Text?.Text)));
        }

        return true;
    }

    private bool Rows(WorksheetPart part)
    {
        using var reader = OpenXmlReader.Create(part);
        var line = 1;
        while (reader.Read())
        {
            if (reader.ElementType != typeof(Row) || !reader.IsStartElement) continue;

            var row = (Row)reader.LoadCurrentElement()!;
            var number = row.RowIndex?.Value is { } index ? (int)Math.Min(index, int.MaxValue) : line;
            if (number < line || number - line > TableLimits.MostRows)
            {
                Fail(InputCodes.Workbook, line, 0, "the rows of the sheet are in no order; save the workbook anew");
                return false;
            }

            for (; line < number; line++) _text.Append('\n');
            if (!Cells(row, line)) return false;

            _text.Append('\n');
            line++;
        }

        return true;
    }

    private bool Cells(Row row, int line)
    {
        var (column, any) = (0, false);
        foreach (var cell in row.Elements<Cell>())
        {
            var place = cell.CellReference?.Value is { } name ? CellName.ColumnOf(name) : column;
            if (place < column || place >= _limits.Columns)
            {
                Fail(InputCodes.TableLimit, line, Math.Min(Math.Max(place, 0), _limits.Columns), $"the sheet has cells in no order or beyond {_limits.Columns} columns; take them out");
                return false;
            }

            if (Value(cell, line, place) is not { } value) return false;
            if (value.Length == 0) continue;                            // a formatted cell without a value is none

            any = true;
            for (; column < place; column++) _text.Append('\t');
            if (place == 0 && value.StartsWith('#'))
            {
                _text.Append(value.AsSpan().IndexOfAny('\r', '\n') < 0 ? value : value.ReplaceLineEndings(" "));
                return true;                                            // a remark takes its row
            }

            Append(value);
        }

        // Empty cells at the end of a row are not stored: it is as wide as the header.
        if (any && _width == 0) _width = column + 1;
        for (; any && column < _width - 1; column++) _text.Append('\t');
        return true;
    }

    private void Append(string value)
    {
        if (value.AsSpan().IndexOfAny("\t\r\n\"") < 0) _text.Append(value);
        else _text.Append('"').Append(value.Replace("\"", "\"\"", StringComparison.Ordinal)).Append('"');
    }

    private string? Value(Cell cell, int line, int column)
    {
        var stored = cell.CellValue?.Text ?? "";
        if (cell.CellFormula is not null)
        {
            _formulas++;
            if (cell.CellValue is null)
            {
                Fail(InputCodes.WorkbookCell, line, column, "the cell holds a formula without a stored value; open and save the workbook, or put the value in its place");
                return null;
            }
        }

        var type = cell.DataType?.Value ?? CellValues.Number;
        if (type == CellValues.SharedString)
        {
            if (int.TryParse(stored, NumberStyles.None, CultureInfo.InvariantCulture, out var index) && index < _shared.Count) return _shared[index];

            Fail(InputCodes.WorkbookCell, line, column, "the cell names a text that the workbook does not have; save the workbook anew");
            return null;
        }

        if (type == CellValues.InlineString) return cell.InlineString?.Text?.Text ?? string.Concat(cell.InlineString?.Elements<Run>().Select(r => r.Text?.Text) ?? []);
        if (type == CellValues.Number || type == CellValues.String) return stored;

        Fail(InputCodes.WorkbookCell, line, column, $"the cell holds {(type == CellValues.Error ? $"the error {Excerpt.Of(stored)}" : "a truth value or a date")}; put a number or a text in its place");
        return null;
    }

    private void Fail(string code, int row, int column, string message) =>
        _diagnostics.Add(code, Severity.Error, column > 0 || row > 1 ? $"{message} (cell {CellName.Of(column, row)})" : message, SourceSpan.At(_fileName, row, column + 1));
}
