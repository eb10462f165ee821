using System.Buffers.Binary;
using System.IO.Compression;

namespace MemberScan.Reporting.Pictures;

/// <summary>Portable Network Graphics (ISO/IEC 15948): eight bits of red, green, blue, not interlaced.</summary>
internal static class Png
{
    private static readonly uint[] s_crc = MakeTable();

    /// <summary>The file.</summary>
    public static byte[] Write(Raster picture)
    {
        using var file = new MemoryStream();
        file.Write([0x89, (byte)'P', (byte)'N', (byte)'G', 0x0D, 0x0A, 0x1A, 0x0A]);
        var header = new byte[13];
        BinaryPrimitives.WriteInt32BigEndian(header, picture.Width);
        BinaryPrimitives.WriteInt32BigEndian(header.AsSpan(4), picture.Height);
        (header[8], header[9]) = (8, 2);                                // eight bits, true colour
        Chunk(file, "IHDR"u8, header);
        Chunk(file, "IDAT"u8, Packed(picture));
        Chunk(file, "IEND"u8, []);
        return file.ToArray();
    }

    private static byte[] Packed(Raster picture)
    {
        using var packed = new MemoryStream();
        using (var zlib = new ZLibStream(packed, CompressionLevel.Optimal, leaveOpen: true))
            for (var row = 0; row < picture.Height; row++)
            {
                zlib.WriteByte(0);                                      // filter: none
                zlib.Write(picture.Pixels, row * 3 * picture.Width, 3 * picture.Width);
            }

        return packed.ToArray();
    }

    private static void Chunk(Stream file, ReadOnlySpan<byte> type, ReadOnlySpan<byte> content)
    {
        Span<byte> number = stackalloc byte[4];
        BinaryPrimitives.WriteInt32BigEndian(number, content.Length);
        file.Write(number);
        file.Write(type);
        file.Write(content);
        BinaryPrimitives.WriteUInt32BigEndian(number, ~Add(Add(uint.MaxValue, type), content));
        file.Write(number);
    }

    // Cyclic redundancy code of annex D: polynomial 0xEDB88320, reflected.
    private static uint Add(uint crc, ReadOnlySpan<byte> bytes)
    {
        foreach (var unit in bytes) crc = s_crc[(crc ^ unit) & 0xFF] ^ crc >> 8;
        return crc;
    }

    private static uint[] MakeTable()
    {
        var table = new uint[256];
        for (var n = 0u; n < table.Length; n++)
        {
            var c = n;
            for (var k = 0; k < 8; k++) c = (c & 1) != 0 ? 0xEDB88320 ^ c >> 1 : c >> 1;
            table[n] = c;
        }

        return table;
    }
}
