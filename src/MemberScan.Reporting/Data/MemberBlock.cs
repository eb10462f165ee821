using System.Buffers.Binary;
using System.IO.Compression;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Unicode;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Page;
using MemberScan.Reporting.Space;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Data;

/// <summary>All candidates for the page's own script: what the table shows and what the view in space draws.</summary>
/// <remarks>
/// Before packing: length of the head [four bytes, little endian], the head (JSON, UTF-8), zeros up to a multiple of eight, the columns.
/// The head holds the number of candidates, the distinct texts, name, type and place of each column (from the first byte behind the head),
/// the shown units, the colours and the outlines of the sections. Numbers are SI and those of the record, bit for bit; geometry is rounded
/// to single precision about the middle of the model. Packed by zlib (RFC 1950), written in base 64.
/// </remarks>
public static class MemberBlock
{
    // Read from text columns and by filters under these names; the script knows the same.
    private static readonly (string Name, Func<MemberResult, string> Text)[] s_texts =
    [
        ("key", m => ForeignText.Name(m.Key)),
        ("name", ReportView.TitleOf),
        ("tag", m => ForeignText.Name(m.Tag)),
        ("class", m => ForeignText.Name(m.Class)),
        ("role", m => ForeignText.Name(m.Role)),
        ("section", m => ForeignText.Name(m.Governing?.Section ?? m.Section)),
        ("material", m => ForeignText.Name(m.Material)),
        ("storey", m => ForeignText.Name(m.Storey)),
        ("situation", m => ForeignText.Name(m.Governing?.Situation)),
        ("kind", m => ForeignText.Name(m.Governing?.Kind)),
        ("criterion", m => ForeignText.Name(m.Governing?.Criterion)),
        ("place", m => ForeignText.Name(m.Governing?.Point.Place)),
        ("forcesSource", m => ForeignText.Sentence(m.Governing?.ForcesSource)),
        ("reason", m => m.Reason?.Code.Text() ?? ""),
        ("reasonText", m => ForeignText.Sentence(m.Reason?.Message)),
        ("request", m => m.Reason?.Code.Request() ?? ""),
        ("notes", m => ForeignText.Sentence(string.Join(' ', m.Notes))),
        ("decision", m => m.Decision is { } decision ? ForeignText.Sentence(decision.Shown) : ""),
    ];

    private static readonly (string Name, Func<MemberResult, double?> Number)[] s_numbers =
    [
        ("utilization", m => m.Governing?.Utilization), ("station", m => m.Governing?.Station), ("length", m => m.Length), ("strength", m => m.Strength),
        ("stress", m => m.Governing?.Stress), ("limit", m => m.Governing?.Limit), ("y", m => m.Governing?.Point.Y), ("z", m => m.Governing?.Point.Z),
        ("N", m => m.Governing?.Forces.N), ("Vy", m => m.Governing?.Forces.Vy), ("Vz", m => m.Governing?.Forces.Vz),
        ("T", m => m.Governing?.Forces.T), ("My", m => m.Governing?.Forces.My), ("Mz", m => m.Governing?.Forces.Mz),
    ];

    /// <summary>The block in base 64; the same view gives the same text.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A number that is shown is not finite.</exception>
    public static string Write(ReportView view)
    {
        ArgumentNullException.ThrowIfNull(view);
        var (texts, outlines) = (new TextPool(), new OutlineSet(view.Record));
        using var columns = new ColumnSet();
        var members = view.Record.Members;
        columns.Add("verdict", members.Select(m => (byte)m.Verdict));
        columns.Add("step", members.Select(m => (byte)UtilizationScale.StepOf(m)));
        foreach (var (name, text) in s_texts) columns.Add(name, members.Select(m => texts.NumberOf(text(m))));
        columns.Add("anchor", view.Placed.Select(p => texts.NumberOf(p.HasSheet ? p.Anchor : "")));
        foreach (var (name, number) in s_numbers) columns.Add(name, members.Select(number));
        var middle = BarGeometry.Add(columns, members);
        columns.Add("outline", members.Select(m => (uint)outlines.NumberOf(m)));
        return Convert.ToBase64String(Packed(Head(view, texts, columns, outlines, middle), columns));
    }

    private static byte[] Head(ReportView view, TextPool texts, ColumnSet columns, OutlineSet outlines, (double X, double Y, double Z) middle)
    {
        using var head = new MemoryStream();
        using (var json = new Utf8JsonWriter(head, new JsonWriterOptions { Encoder = JavaScriptEncoder.Create(UnicodeRanges.All) }))
        {
            json.WriteStartObject();
            json.WriteNumber("count", view.Record.Members.Length);
            texts.Write(json);
            columns.WriteNames(json);
            Units(json, view.Units);
            UtilizationScale.Write(json);
            outlines.Write(json);
            json.WriteStartArray("middle");
            json.WriteNumberValue(middle.X);
            json.WriteNumberValue(middle.Y);
            json.WriteNumberValue(middle.Z);
            json.WriteEndArray();
            json.WriteString("runId", ForeignText.Name(view.Record.RunId));
            json.WriteString("file", ForeignText.Name(view.Record.Model.FileName));
            json.WriteEndObject();
        }

        return head.ToArray();
    }

    private static void Units(Utf8JsonWriter json, UnitSet units)
    {
        json.WriteStartObject("units");
        foreach (var (name, unit) in new[]
        {
            ("stress", units.Stress), ("force", units.Force), ("moment", units.Moment), ("length", units.Length), ("dimension", units.Dimension),
        })
        {
            json.WriteStartObject(name);
            json.WriteString("symbol", unit.Symbol);
            json.WriteNumber("size", unit.Size);
            json.WriteEndObject();
        }

        json.WriteEndObject();
    }

    private static byte[] Packed(byte[] head, ColumnSet columns)
    {
        using var packed = new MemoryStream();
        using (var zlib = new ZLibStream(packed, CompressionLevel.Optimal, leaveOpen: true))
        {
            Span<byte> length = stackalloc byte[sizeof(int)];
            BinaryPrimitives.WriteInt32LittleEndian(length, head.Length);
            zlib.Write(length);
            zlib.Write(head);
            for (var at = sizeof(int) + head.Length; at % sizeof(double) != 0; at++) zlib.WriteByte(0);
            columns.WriteBytes(zlib);
        }

        return packed.ToArray();
    }
}
