using System.Collections.Immutable;
using System.IO.Compression;
using System.Text.Json;
using System.Text.RegularExpressions;
using MemberScan.Reporting.Page;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets.Packed;

/// <summary>The sheets that the page does not write out, packed for <c>sheet.js</c>: zlib over JSON, in base64.</summary>
/// <remarks>
/// Each sheet is the same component as a written-out one, its pictures left to the script. Its text is cut into rows; a row without its
/// numbers and names is a text of the table <c>texts</c>, U+0001 where a value belongs. Sheets of the same rows are one shape: the values
/// stand column by column, a tab between members, so that what is alike lies together.
/// </remarks>
internal static partial class PackedSheets
{
    /// <summary>Anchor inside packed sheets, replaced by the script.</summary>
    public const string Anchor = "one-sheet";

    private const int Chunk = 256;
    private const char Hole = '\u0001';

    private sealed record Row(string Text, List<string> Values);

    private sealed class Shape(int[] rows)
    {
        public int[] Rows { get; } = rows;

        public List<string> Keys { get; } = [];

        public List<List<string>> Columns { get; } = [];
    }

    /// <summary>Packs the sheets of some candidates.</summary>
    public static string Pack(ImmutableArray<PlacedMember> members, SheetMaker sheets)
    {
        var sections = new PackedSections();
        Parallel.ForEach(members, m => sheets.SamplesOf(m.Member));
        foreach (var member in members)
            if (sheets.SamplesOf(member.Member) is { } samples) sections.Add(samples);

        var (texts, shapes) = (new Dictionary<string, int>(StringComparer.Ordinal), new Dictionary<string, Shape>(StringComparer.Ordinal));
        foreach (var chunk in members.Chunk(Chunk))
        {
            var cut = new List<Row>[chunk.Length];
            Parallel.For(0, chunk.Length, i => cut[i] = Cut(PageRenderer.Render<MemberSheet>(new Dictionary<string, object?>
            {
                [nameof(MemberSheet.Placed)] = chunk[i] with { Anchor = Anchor },
                [nameof(MemberSheet.Packed)] = sections,
            })));
            for (var i = 0; i < chunk.Length; i++) Add(chunk[i].Member.Key, cut[i], texts, shapes);
        }

        return Written(texts, shapes, sections);
    }

    private static void Add(string key, List<Row> rows, Dictionary<string, int> texts, Dictionary<string, Shape> shapes)
    {
        var numbers = new int[rows.Count];
        for (var i = 0; i < numbers.Length; i++)
        {
            if (!texts.TryGetValue(rows[i].Text, out numbers[i])) texts[rows[i].Text] = numbers[i] = texts.Count;
        }

        var name = string.Join(' ', numbers);
        if (!shapes.TryGetValue(name, out var shape)) shapes[name] = shape = new Shape(numbers);
        shape.Keys.Add(key);
        var column = 0;
        foreach (var value in rows.SelectMany(r => r.Values))
        {
            if (column == shape.Columns.Count) shape.Columns.Add([]);
            shape.Columns[column++].Add(value);
        }
    }

    private static List<Row> Cut(string sheet)
    {
        var rows = new List<Row>();
        foreach (var part in RowEnd().Split(Blanks().Replace(sheet.Replace(Hole, ' '), " ")))
        {
            var values = new List<string>();
            string Take(Match m)
            {
                values.Add(m.Value);
                return Hole.ToString();
            }

            // Names and keys are values as a whole, elsewhere only the numbers are.
            var named = NamedPart().Match(part);
            var text = named.Success
                ? Number().Replace(part[..named.Index], Take) + TextNode().Replace(part[named.Index..], Take)
                : Number().Replace(part, Take);
            rows.Add(new Row(text, values));
        }

        return rows;
    }

    private static string Written(Dictionary<string, int> texts, Dictionary<string, Shape> shapes, PackedSections sections)
    {
        using var bytes = new MemoryStream();
        using (var zlib = new ZLibStream(bytes, CompressionLevel.SmallestSize, leaveOpen: true))
        using (var json = new Utf8JsonWriter(zlib, new JsonWriterOptions { Encoder = System.Text.Encodings.Web.JavaScriptEncoder.UnsafeRelaxedJsonEscaping }))
        {
            json.WriteStartObject();
            json.WriteStartArray("texts");
            foreach (var text in texts.OrderBy(t => t.Value)) json.WriteStringValue(text.Key);
            json.WriteEndArray();
            json.WriteStartArray("shapes");
            foreach (var shape in shapes.Values) Write(json, shape);
            json.WriteEndArray();
            sections.Write(json);
            json.WriteEndObject();
        }

        return Convert.ToBase64String(bytes.GetBuffer(), 0, (int)bytes.Length);
    }

    private static void Write(Utf8JsonWriter json, Shape shape)
    {
        json.WriteStartObject();
        json.WriteStartArray("rows");
        foreach (var row in shape.Rows) json.WriteNumberValue(row);
        json.WriteEndArray();
        json.WriteStartArray("keys");
        foreach (var key in shape.Keys) json.WriteStringValue(key);
        json.WriteEndArray();
        json.WriteStartArray("columns");
        foreach (var column in shape.Columns) json.WriteStringValue(string.Join('\t', column));
        json.WriteEndArray();
        json.WriteEndObject();
    }

    [GeneratedRegex("(?<=</tr>|</div>|</figure>|</h4>|</p>|</caption>|</li>|</summary>|</thead>)", RegexOptions.CultureInvariant)]
    private static partial Regex RowEnd();

    [GeneratedRegex("[ \n\r\t]+", RegexOptions.CultureInvariant)]
    private static partial Regex Blanks();

    [GeneratedRegex("<(?:dd|h3|code)", RegexOptions.CultureInvariant)]
    private static partial Regex NamedPart();

    [GeneratedRegex("(?<=>)[^<>]*[^<> ][^<>]*(?=<)", RegexOptions.CultureInvariant)]
    private static partial Regex TextNode();

    [GeneratedRegex("[-\u2212]?[0-9][0-9.\u202F]*(?:E[-+][0-9]+)?", RegexOptions.CultureInvariant)]
    private static partial Regex Number();
}
