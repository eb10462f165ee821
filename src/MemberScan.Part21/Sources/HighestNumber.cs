using System.Buffers;

namespace MemberScan.Part21.Sources;

/// <summary>The highest number after a '#' anywhere in a text, also in strings and comments: what is above is surely free.</summary>
internal static class HighestNumber
{
    private const int PieceLength = 256 * 1024;

    // A number of more digits than this is beyond what an index holds.
    private const int Overlap = 16;

    public static uint In(ByteSource source, int threads)
    {
        var highest = 0L;
        var pieces = (source.Length + PieceLength - 1) / PieceLength;
        var next = -1L;
        Parallel.For(0, Math.Max(1, threads), new ParallelOptions { MaxDegreeOfParallelism = Math.Max(1, threads) }, _ =>
        {
            var piece = ArrayPool<byte>.Shared.Rent(PieceLength + Overlap);
            var most = 0u;
            for (var number = Interlocked.Increment(ref next); number < pieces; number = Interlocked.Increment(ref next))
            {
                var length = source.Read(number * PieceLength, piece.AsSpan(0, PieceLength + Overlap));
                most = Math.Max(most, In(piece.AsSpan(0, length), most));
            }

            ArrayPool<byte>.Shared.Return(piece);
            for (var seen = Interlocked.Read(ref highest); most > seen; seen = Interlocked.Read(ref highest))
                Interlocked.CompareExchange(ref highest, most, seen);
        });
        return (uint)highest;
    }

    private static uint In(ReadOnlySpan<byte> text, uint most)
    {
        var at = 0;
        while (true)
        {
            var hop = text[at..].IndexOf((byte)'#');
            if (hop < 0) return most;

            at += hop + 1;
            var number = 0UL;
            while (at < text.Length && char.IsAsciiDigit((char)text[at]) && number <= uint.MaxValue) number = number * 10 + text[at++] - '0';
            if (number <= uint.MaxValue && number > most) most = (uint)number;
        }
    }
}
