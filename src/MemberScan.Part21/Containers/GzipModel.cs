using System.Buffers.Binary;
using System.IO.Compression;

namespace MemberScan.Part21.Containers;

/// <summary>The model in a gzip file (RFC 1952) of one member.</summary>
internal static class GzipModel
{
    private const int TrailerLength = 8;

    public static byte[] Read(Stream file, string name, long maxBytes, int maxRatio)
    {
        try
        {
            using var packed = new GZipStream(file, CompressionMode.Decompress, leaveOpen: true);
            var bytes = Expansion.Unpack(packed, file.Length, maxBytes, maxRatio, name);
            if (EndsInTrailerOf(bytes, file)) return bytes;
        }
        catch (Exception fault) when (fault is InvalidDataException or EndOfStreamException)
        {
            // told below
        }

        throw new RefusedContainer($"{name} is a damaged gzip file; pack or fetch it again.");
    }

    // A stream that is cut off unpacks without complaint; only the checksum and the length at its end tell.
    private static bool EndsInTrailerOf(ReadOnlySpan<byte> bytes, Stream file)
    {
        if (file.Length < TrailerLength) return false;

        Span<byte> trailer = stackalloc byte[TrailerLength];
        file.Position = file.Length - TrailerLength;
        file.ReadExactly(trailer);
        return BinaryPrimitives.ReadUInt32LittleEndian(trailer) == Checksum.Of(bytes)
            && BinaryPrimitives.ReadUInt32LittleEndian(trailer[4..]) == (uint)bytes.Length;
    }
}
