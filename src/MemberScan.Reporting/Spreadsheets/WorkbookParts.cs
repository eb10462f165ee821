using System.Collections.Immutable;
using System.Globalization;

namespace MemberScan.Reporting.Spreadsheets;

/// <summary>The parts of a workbook around its sheets.</summary>
internal static class WorkbookParts
{
    private const string Declaration = "<?xml version=\"1.0\" encoding=\"UTF-8\" standalone=\"yes\"?>\n";
    private const string Main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
    private const string Packages = "http://schemas.openxmlformats.org/package/2006/";
    private const string Relations = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
    private const string Types = "application/vnd.openxmlformats-officedocument.spreadsheetml.";

    /// <summary>Path of a sheet by its index.</summary>
    public static string SheetPath(int index) => string.Create(CultureInfo.InvariantCulture, $"xl/worksheets/sheet{index + 1}.xml");

    /// <summary>Names and contents.</summary>
    /// <param name="sheets">Names of the sheets: letters, digits and blanks.</param>
    public static IEnumerable<(string Name, string Content)> All(ImmutableArray<string> sheets)
    {
        yield return ("[Content_Types].xml", Declaration
            + $"<Types xmlns=\"{Packages}content-types\"><Default Extension=\"rels\" ContentType=\"application/vnd.openxmlformats-package.relationships+xml\"/>"
            + $"<Override PartName=\"/xl/workbook.xml\" ContentType=\"{Types}sheet.main+xml\"/><Override PartName=\"/xl/styles.xml\" ContentType=\"{Types}styles+xml\"/>"
            + string.Concat(sheets.Select((_, i) => $"<Override PartName=\"/{SheetPath(i)}\" ContentType=\"{Types}worksheet+xml\"/>")) + "</Types>");
        yield return ("_rels/.rels", Declaration
            + $"<Relationships xmlns=\"{Packages}relationships\"><Relationship Id=\"rId1\" Type=\"{Relations}/officeDocument\" Target=\"xl/workbook.xml\"/></Relationships>");
        yield return ("xl/workbook.xml", Declaration
            + $"<workbook xmlns=\"{Main}\" xmlns:r=\"{Relations}\"><sheets>"
            + string.Concat(sheets.Select((name, i) => string.Create(CultureInfo.InvariantCulture, $"<sheet name=\"{name}\" sheetId=\"{i + 1}\" r:id=\"rId{i + 1}\"/>"))) + "</sheets></workbook>");
        yield return ("xl/_rels/workbook.xml.rels", Declaration
            + $"<Relationships xmlns=\"{Packages}relationships\">"
            + string.Concat(sheets.Select((_, i) => string.Create(CultureInfo.InvariantCulture, $"<Relationship Id=\"rId{i + 1}\" Type=\"{Relations}/worksheet\" Target=\"worksheets/sheet{i + 1}.xml\"/>")))
            + string.Create(CultureInfo.InvariantCulture, $"<Relationship Id=\"rId{sheets.Length + 1}\" Type=\"{Relations}/styles\" Target=\"styles.xml\"/></Relationships>"));
        yield return ("xl/styles.xml", Declaration
            + $"<styleSheet xmlns=\"{Main}\"><fonts count=\"2\"><font><sz val=\"11\"/><name val=\"Calibri\"/></font><font><b/><sz val=\"11\"/><name val=\"Calibri\"/></font></fonts>"
            + "<fills count=\"2\"><fill><patternFill patternType=\"none\"/></fill><fill><patternFill patternType=\"gray125\"/></fill></fills><borders count=\"1\"><border><left/><right/><top/><bottom/><diagonal/></border></borders>"
            + "<cellStyleXfs count=\"1\"><xf numFmtId=\"0\" fontId=\"0\" fillId=\"0\" borderId=\"0\"/></cellStyleXfs>"
            + "<cellXfs count=\"2\"><xf numFmtId=\"0\" fontId=\"0\" fillId=\"0\" borderId=\"0\" xfId=\"0\"/><xf numFmtId=\"0\" fontId=\"1\" fillId=\"0\" borderId=\"0\" xfId=\"0\" applyFont=\"1\"/></cellXfs></styleSheet>");
    }
}
