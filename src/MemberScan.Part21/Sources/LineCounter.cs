using System.Buffers;

namespace MemberScan.Part21.Sources;

/// <summary>The lines that offsets lie in, counted in one pass up to the last of them.</summary>
internal static class LineCounter
{
    private const int PieceLength = 1024 * 1024;

    /// <param name="source">The text.</param>
    /// <param name="offsets">Rising offsets [byte].</param>
    /// <returns>The line of each, from 1. A line ends at LF, or at CR if no LF follows.</returns>
    public static long[] LinesAt(ByteSource source, ReadOnlySpan<long> offsets)
    {
        var lines = new long[offsets.Length];
        var (line, at) = (1L, 0L);
        for (var i = 0; i < offsets.Length; i++) lines[i] = line = LineAt(source, at, line, at = offsets[i]);
        return lines;
    }

    /// <summary>The line of an offset, counted on from the line of an earlier one.</summary>
    public static long LineAt(ByteSource source, long from, long line, long offset)
    {
        var piece = ArrayPool<byte>.Shared.Rent(PieceLength + 1);
        while (from < offset)
        {
            var length = (int)Math.Min(PieceLength, offset - from);
            var held = source.Read(from, piece.AsSpan(0, length + 1));
            line += CountLineEnds(piece.AsSpan(0, held), length);
            from += length;
        }

        ArrayPool<byte>.Shared.Return(piece);
        return line;
    }

    // Those in the first 'length' bytes; the byte behind tells whether a CR at the end is one of its own.
    private static int CountLineEnds(ReadOnlySpan<byte> text, int length)
    {
        var part = text[..Math.Min(length, text.Length)];
        var returns = part.Count((byte)'\r');
        return part.Count((byte)'\n') + returns - (returns == 0 ? 0 : text.Count("\r\n"u8));
    }
}
