using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using System.Xml;
using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Spreadsheets;

/// <summary>Writes one sheet row by row; its first row stays in sight.</summary>
internal sealed partial class SheetWriter : IDisposable
{
    /// <summary>Longest text of a cell that the format takes; a longer one is cut and ends in an ellipsis.</summary>
    public const int LongestText = 32_767;

    private const string Main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
    private const string ColumnWidth = "18";

    private readonly XmlWriter _xml;
    private int _row;

    /// <summary>A sheet of a number of columns.</summary>
    public SheetWriter(Stream stream, int columns)
    {
        _xml = XmlWriter.Create(stream, new XmlWriterSettings { Encoding = new UTF8Encoding(false), CloseOutput = false });
        _xml.WriteStartElement("worksheet", Main);
        _xml.WriteStartElement("sheetViews", Main);
        _xml.WriteStartElement("sheetView", Main);
        _xml.WriteAttributeString("workbookViewId", "0");
        Empty("pane", ("ySplit", "1"), ("topLeftCell", "A2"), ("activePane", "bottomLeft"), ("state", "frozen"));
        _xml.WriteEndElement();
        _xml.WriteEndElement();
        _xml.WriteStartElement("cols", Main);
        Empty("col", ("min", "1"), ("max", columns.ToString(CultureInfo.InvariantCulture)), ("width", ColumnWidth), ("customWidth", "1"));
        _xml.WriteEndElement();
        _xml.WriteStartElement("sheetData", Main);
    }

    /// <summary>Writes a row; the action writes its cells in order.</summary>
    public void Row(Action cells)
    {
        _xml.WriteStartElement("row", Main);
        _xml.WriteAttributeString("r", (++_row).ToString(CultureInfo.InvariantCulture));
        cells();
        _xml.WriteEndElement();
    }

    /// <summary>A cell of the header.</summary>
    public void Heading(string text) => Cell(text, style: "1");

    /// <summary>A text, which is never a formula; an empty cell for null.</summary>
    public void Text(string? text)
    {
        if (text is null) Empty("c");
        else Cell(text, style: null);
    }

    /// <summary>A number; an empty cell for null.</summary>
    public void Number(double? number)
    {
        if (number is not { } value)
        {
            Empty("c");
            return;
        }

        _xml.WriteStartElement("c", Main);
        _xml.WriteElementString("v", Main, value.ToString("R", CultureInfo.InvariantCulture));
        _xml.WriteEndElement();
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        _xml.WriteEndElement();
        _xml.WriteEndElement();
        _xml.Dispose();
    }

    private void Cell(string text, string? style)
    {
        _xml.WriteStartElement("c", Main);
        if (style is not null) _xml.WriteAttributeString("s", style);
        _xml.WriteAttributeString("t", "inlineStr");
        _xml.WriteStartElement("is", Main);
        _xml.WriteStartElement("t", Main);
        _xml.WriteAttributeString("xml", "space", null, "preserve");
        _xml.WriteString(Sound(text));
        _xml.WriteEndElement();
        _xml.WriteEndElement();
        _xml.WriteEndElement();
    }

    // Characters that XML does not know are shown as their pictures; what looks like the format's own escape of a character is escaped itself.
    private static string Sound(string text)
    {
        var sound = Escape().Replace(ForeignText.Visible(text), "_x005F$0");
        if (sound.Length <= LongestText) return sound;

        var end = char.IsHighSurrogate(sound[LongestText - 2]) ? LongestText - 2 : LongestText - 1;
        return sound[..end] + "…";
    }

    private void Empty(string element, params ReadOnlySpan<(string Name, string Value)> attributes)
    {
        _xml.WriteStartElement(element, Main);
        foreach (var (name, value) in attributes) _xml.WriteAttributeString(name, value);
        _xml.WriteEndElement();
    }

    [GeneratedRegex("_x[0-9A-Fa-f]{4}_")]
    private static partial Regex Escape();
}
