using DocumentFormat.OpenXml.Packaging;
using DocumentFormat.OpenXml.Spreadsheet;
using DocumentFormat.OpenXml.Validation;
using MemberScan.Reporting.Spreadsheets;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests.Spreadsheets;

/// <summary>The workbook as an independent reader (the Open XML SDK) sees it.</summary>
public sealed class MembersWorkbookTests
{
    [Fact]
    public void The_validator_of_the_format_has_no_objection()
    {
        foreach (var record in new[] { FerryLanding.Small(), FerryLanding.Record(), FerryLanding.Large(300) })
        {
            using var file = Open(record);
            Assert.Empty(new OpenXmlValidator().Validate(file).Select(e => $"{e.Path?.XPath}: {e.Description}"));
        }
    }

    [Fact]
    public void Numbers_are_numbers_in_the_unit_of_their_header_and_texts_are_texts()
    {
        var record = FerryLanding.Small();
        using var file = Open(record);
        var rows = Rows(file, "Members");

        Assert.Equal(1 + record.Members.Length, rows.Count);
        var (strength, key, item) = (rows[0].IndexOf("strength [MPa]"), rows[0].IndexOf("key"), rows[0].IndexOf("item"));
        Assert.Equal("355", rows[1][strength]);
        Assert.Equal(FerryLanding.RailKey, rows[1][key]);
        Assert.Equal(("", "2"), (rows[1][item], rows[2][item]));
        Assert.Equal(record.Members[0].Governing!.Forces.My / 1e3, double.Parse(rows[1][rows[0].IndexOf("My [kN·m]")], System.Globalization.CultureInfo.InvariantCulture), 1e-12);
        Assert.Equal("no-forces", rows[7][rows[0].IndexOf("reasonCode")]);
    }

    [Theory]
    [InlineData("=HYPERLINK(\"x\")")]
    [InlineData("Geländer 橋 O'Neill 🛟 C:\\landing")]
    [InlineData(" leading, _x0041_ and <b>&amp;")]
    public void Names_come_back_as_they_are_and_are_no_formulas(string name)
    {
        using var file = Open(FerryLanding.Record(FerryLanding.Rail("a", name, 1e3)));
        var rows = Rows(file, "Members");

        Assert.Equal(name, rows[1][rows[0].IndexOf("name")].Replace("_x005F_", "_", StringComparison.Ordinal));
        Assert.Empty(file.WorkbookPart!.WorksheetParts.SelectMany(p => p.Worksheet!.Descendants<CellFormula>()));
    }

    [Fact]
    public void The_same_record_gives_the_same_bytes() => Assert.Equal(MembersWorkbook.Write(FerryLanding.Small()), MembersWorkbook.Write(FerryLanding.Small()));

    private static SpreadsheetDocument Open(ScreeningRecord record) => SpreadsheetDocument.Open(new MemoryStream(MembersWorkbook.Write(record)), isEditable: false);

    private static List<List<string>> Rows(SpreadsheetDocument file, string sheet)
    {
        var id = file.WorkbookPart!.Workbook!.Descendants<Sheet>().Single(s => s.Name == sheet).Id!.Value!;
        var part = (WorksheetPart)file.WorkbookPart.GetPartById(id);
        return [.. part.Worksheet!.Descendants<Row>().Select(r => r.Elements<Cell>().Select(c => c.InlineString?.InnerText ?? c.CellValue?.Text ?? "").ToList())];
    }
}
