using System.Buffers.Binary;
using System.Text.Json;

namespace MemberScan.Reporting.Data;

/// <summary>Columns of equal length one behind the other, each at a multiple of eight bytes; little endian.</summary>
internal sealed class ColumnSet : IDisposable
{
    private readonly List<(string Name, string Type, int At)> _columns = [];
    private readonly MemoryStream _bytes = new();

    /// <summary>Numbers of texts, four bytes each.</summary>
    public void Add(string name, IEnumerable<uint> values)
    {
        Span<byte> bytes = stackalloc byte[sizeof(uint)];
        Begin(name, "text");
        foreach (var value in values)
        {
            BinaryPrimitives.WriteUInt32LittleEndian(bytes, value);
            _bytes.Write(bytes);
        }
    }

    /// <summary>Numbers of full precision, eight bytes each; what is not known is NaN.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A known number is not finite.</exception>
    public void Add(string name, IEnumerable<double?> values)
    {
        Span<byte> bytes = stackalloc byte[sizeof(double)];
        Begin(name, "number");
        foreach (var value in values)
        {
            if (value is { } known && !double.IsFinite(known)) throw new ArgumentOutOfRangeException(nameof(values), "A number of the record is not finite.");
            BinaryPrimitives.WriteDoubleLittleEndian(bytes, value ?? double.NaN);
            _bytes.Write(bytes);
        }
    }

    /// <summary>Places and directions for drawing, four bytes each; what is not known is NaN.</summary>
    public void Add(string name, IEnumerable<float> values)
    {
        Span<byte> bytes = stackalloc byte[sizeof(float)];
        Begin(name, "drawn");
        foreach (var value in values)
        {
            BinaryPrimitives.WriteSingleLittleEndian(bytes, value);
            _bytes.Write(bytes);
        }
    }

    /// <summary>Small numbers, one byte each.</summary>
    public void Add(string name, IEnumerable<byte> values)
    {
        Begin(name, "byte");
        foreach (var value in values) _bytes.WriteByte(value);
    }

    /// <summary>Name, type and place of each column.</summary>
    public void WriteNames(Utf8JsonWriter json)
    {
        json.WriteStartObject("columns");
        foreach (var (name, type, at) in _columns)
        {
            json.WriteStartObject(name);
            json.WriteString("type", type);
            json.WriteNumber("at", at);
            json.WriteEndObject();
        }

        json.WriteEndObject();
    }

    /// <inheritdoc />
    public void Dispose() => _bytes.Dispose();

    /// <summary>The bytes of all columns.</summary>
    public void WriteBytes(Stream target) => _bytes.WriteTo(target);

    private void Begin(string name, string type)
    {
        while (_bytes.Length % sizeof(double) != 0) _bytes.WriteByte(0);
        _columns.Add((name, type, (int)_bytes.Length));
    }
}
