using System.IO.Compression;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Packaging;
using DocumentFormat.OpenXml.Spreadsheet;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.ForcesTables.Workbooks;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;

namespace MemberScan.Inputs.Tests.ForcesTables.Workbooks;

/// <summary>Workbooks written by the library that reads them; cells as numbers, shared or inline texts, formulas with and without stored values.</summary>
public sealed class WorkbookTests
{
    private static readonly string[] s_header = ["member", "situation", "kind", "station[m]", "N[kN]", "Vy[kN]", "Vz[kN]", "T[kNm]", "My[kNm]", "Mz[kNm]"];

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void A_sheet_is_read_like_a_table_of_text(bool shared)
    {
        var bytes = Book(shared, [Text("# convention: end-forces")], [.. s_header.Select(Text)], [Text("GR \"7\""), Text("S 1"), Text("design"), Number("0.5"), Number("1.25E1"), Number("0"), Number("-2"), Number("0"), Number("0.2"), Number("0")]);
        var diagnostics = new DiagnosticList();

        var table = ForcesTable.Read(bytes, "forces.xlsx", diagnostics);

        Assert.Empty(diagnostics.Items);
        Assert.Equal(new ForcesRow(3, "GR \"7\"", "S 1", SituationKind.Design, 0.5, false, new SectionForces(12_500, 0, -2000, 0, 200, 0)), Assert.Single(table!.Rows));
        Assert.Equal(Model.Rules.ForceConvention.EndForces, table.Convention);
        Assert.Equal(Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(bytes)), table.Sha256);
    }

    [Fact]
    public void Stored_values_of_formulas_are_used_and_told()
    {
        var bytes = Book(false, [.. s_header.Select(Text)], Row(Formula("1+1", "2")));
        var diagnostics = new DiagnosticList();

        Assert.Equal(2000, ForcesTable.Read(bytes, "f.xlsx", diagnostics)!.Rows[0].Forces.N);
        var note = Assert.Single(diagnostics.Items);
        Assert.Equal(("INP-0026", Severity.Note), (note.Code, note.Severity));
        Assert.Contains("1 cells hold formulas", note.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Faults_have_the_name_of_their_cell()
    {
        AssertFault("INP-0027", 2, 5, "(cell E2)", [.. s_header.Select(Text)], Row(Formula("1+1", null)));
        AssertFault("INP-0027", 2, 5, "the error '#REF!'", [.. s_header.Select(Text)], Row(new Cell { DataType = CellValues.Error, CellValue = new CellValue("#REF!") }));
        AssertFault("INP-0027", 2, 5, "a truth value", [.. s_header.Select(Text)], Row(new Cell { DataType = CellValues.Boolean, CellValue = new CellValue("1") }));
        AssertFault("INP-0013", 2, 5, "N is '1,5', with a comma; write the number with a decimal point and without grouping (cell E2)", [.. s_header.Select(Text)], Row(Text("1,5")));
        AssertFault("INP-0005", 1, 5, "(cell E1)", [.. s_header.Select(h => Text(h == "N[kN]" ? "Nx[kN]" : h))], Row(Number("1")));
        AssertFault("INP-0010", 2, 4, "the field 'station' is empty", [.. s_header.Select(Text)], [Text("A"), Text("B")]);
        AssertFault("INP-0009", 2, 11, "(cell K2)", [.. s_header.Select(Text)], [.. Row(Number("1")), Number("1")]);
        AssertFault("INP-0024", 2, 1, "(cell A2)", [.. s_header.Select(Text)], [Text("A\nB"), .. Row(Number("1"))[1..]]);
    }

    [Fact]
    public void Of_several_sheets_the_one_named_forces_is_read_and_told()
    {
        var diagnostics = new DiagnosticList();

        var table = ForcesTable.Read(Book(false, ["Notes", "Forces"], [.. s_header.Select(Text)], Row(Number("3"))), "f.xlsx", diagnostics);

        Assert.Equal(3000, table!.Rows[0].Forces.N);
        Assert.Contains("2 sheets; the table is read from 'Forces'", Assert.Single(diagnostics.Items).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Damaged_foreign_and_too_large_workbooks_are_refused()
    {
        var good = Book(false, [.. s_header.Select(Text)], Row(Number("1")));

        AssertRefused(good[..^40], "INP-0025");
        AssertRefused([.. "PK\u0003\u0004"u8, .. new byte[200]], "INP-0025");
        AssertRefused(Zip(("word/document.xml", 100)), "INP-0025");
        AssertRefused(good, "INP-0022", WorkbookLimits.Default with { Unpacked = 500 });
        AssertRefused(good, "INP-0022", WorkbookLimits.Default with { Parts = 2 });
        AssertRefused(good, "INP-0022", WorkbookLimits.Default with { Columns = 9 });
        AssertRefused(Book(true, [.. s_header.Select(Text)], Row(Number("1"))), "INP-0022", WorkbookLimits.Default with { SharedTexts = 5 });
        // A bomb: 4 MiB of zeros pack into a few KiB.
        AssertRefused(Zip(("xl/worksheets/sheet1.xml", 4 * 1024 * 1024)), "INP-0022", WorkbookLimits.Default with { Unpacked = 1024 * 1024 });
        Assert.Equal((1024L * 1024 * 1024, 10_000, 256, 2_000_000), (WorkbookLimits.Default.Unpacked, WorkbookLimits.Default.Parts, WorkbookLimits.Default.Columns, WorkbookLimits.Default.SharedTexts));
    }

    [Theory]
    [InlineData("A1", 0)]
    [InlineData("Z9", 25)]
    [InlineData("AA10", 26)]
    [InlineData("XFD1", 16383)]
    [InlineData("7", -1)]
    [InlineData("B", -1)]
    public void Columns_have_the_letters_of_the_sheet(string name, int column)
    {
        Assert.Equal(column, CellName.ColumnOf(name));
        if (column >= 0) Assert.Equal(name, CellName.Of(column, int.Parse(name.TrimStart([.. "ABCDEFGHIJKLMNOPQRSTUVWXYZ"]), System.Globalization.CultureInfo.InvariantCulture)));
    }

    private static Cell[] Row(Cell n) =>
        [Text("A"), Text("S"), Text("design"), Number("0"), n, Number("0"), Number("0"), Number("0"), Number("0"), Number("0")];

    private static Cell Text(string text) => new() { DataType = CellValues.InlineString, InlineString = new InlineString(new Text(text)) };

    private static Cell Number(string text) => new() { CellValue = new CellValue(text) };

    private static Cell Formula(string formula, string? stored) => new() { CellFormula = new CellFormula(formula), CellValue = stored is null ? null : new CellValue(stored) };

    private static byte[] Book(bool shared, params Cell[][] rows) => Book(shared, ["Sheet"], rows);

    // Every sheet but the last is empty.
    private static byte[] Book(bool shared, string[] sheets, params Cell[][] rows)
    {
        using var stream = new MemoryStream();
        using (var document = SpreadsheetDocument.Create(stream, SpreadsheetDocumentType.Workbook))
        {
            var book = document.AddWorkbookPart();
            book.Workbook = new Workbook(new Sheets());
            var texts = new SharedStringTable();
            foreach (var (name, i) in sheets.Select((s, i) => (s, i)))
            {
                var part = book.AddNewPart<WorksheetPart>();
                var data = new SheetData();
                if (i == sheets.Length - 1) data.Append(rows.Select((cells, r) => new Row(cells.Select((c, k) => Placed(c, r, k, shared ? texts : null))) { RowIndex = (uint)(r + 1) }));
                part.Worksheet = new Worksheet(data);
                book.Workbook.Sheets!.Append(new Sheet { Id = book.GetIdOfPart(part), SheetId = (uint)(i + 1), Name = name });
            }

            if (shared) book.AddNewPart<SharedStringTablePart>().SharedStringTable = texts;
        }

        return stream.ToArray();
    }

    private static Cell Placed(Cell cell, int row, int column, SharedStringTable? texts)
    {
        if (texts is not null && cell.InlineString is { } inline)
        {
            texts.Append(new SharedStringItem(new Text(inline.Text!.Text)));
            cell = new Cell { DataType = CellValues.SharedString, CellValue = new CellValue(texts.Count() - 1) };
        }

        cell.CellReference = CellName.Of(column, row + 1);
        return cell;
    }

    private static byte[] Zip(params (string Name, int Zeros)[] parts)
    {
        using var stream = new MemoryStream();
        using (var archive = new ZipArchive(stream, ZipArchiveMode.Create, leaveOpen: true))
            foreach (var (name, zeros) in parts)
            {
                using var part = archive.CreateEntry(name).Open();
                part.Write(new byte[zeros]);
            }

        return stream.ToArray();
    }

    private static void AssertFault(string code, int line, int column, string words, params Cell[][] rows)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(ForcesTable.Read(Book(false, rows), "f.xlsx", diagnostics));
        var first = diagnostics.Items.First(d => d.Severity == Severity.Error);
        Assert.Equal(code, first.Code);
        Assert.Contains(words, first.Message, StringComparison.Ordinal);
        Assert.Equal((line, column), ((int)first.Span!.Value.Line, first.Span.Value.Column));
    }

    private static void AssertRefused(byte[] bytes, string code, WorkbookLimits? limits = null)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(WorkbookText.Read(bytes, "f.xlsx", diagnostics, limits ?? WorkbookLimits.Default));
        Assert.Equal(code, diagnostics.Items[0].Code);
    }
}
