using System.Buffers;
using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Sources;

/// <summary>The highest number after a '#' anywhere in a text, also in strings and comments: what is above is surely free.</summary>
internal static class HighestNumber
{
    private const int PieceLength = 256 * 1024;

    // A number of more digits than this is beyond what an index holds.
    private const int Overlap = 16;

    // Readable behind a piece [byte].
    private const int Slack = 128;

    public static uint In(ByteSource source, int threads)
    {
        var highest = 0L;
        var pieces = (source.Length + PieceLength - 1) / PieceLength;
        var next = -1L;
        Parallel.For(0, Math.Max(1, threads), new ParallelOptions { MaxDegreeOfParallelism = Math.Max(1, threads) }, _ =>
        {
            var piece = ArrayPool<byte>.Shared.Rent(PieceLength + Overlap + Slack);
            var most = 0u;
            for (var number = Interlocked.Increment(ref next); number < pieces; number = Interlocked.Increment(ref next))
            {
                var length = source.Read(number * PieceLength, piece.AsSpan(0, PieceLength + Overlap));
                piece.AsSpan(length, Slack).Clear();
                most = Math.Max(most, In(piece.AsSpan(0, length), most));
            }

            ArrayPool<byte>.Shared.Return(piece);
            for (var seen = Interlocked.Read(ref highest); most > seen; seen = Interlocked.Read(ref highest))
                Interlocked.CompareExchange(ref highest, most, seen);
        });
        return (uint)highest;
    }

    // Behind the text stand bytes enough to look at 64 at a time and at the digits behind a '#' in the last of them.
    private static uint In(ReadOnlySpan<byte> text, uint most)
    {
        ref var bytes = ref MemoryMarshal.GetReference(text);
        for (var word = 0; word < text.Length; word += 64)
        {
            var loaded = Vector512.LoadUnsafe(ref Unsafe.Add(ref bytes, word));
            for (var rest = Vector512.Equals(loaded, Vector512.Create((byte)'#')).ExtractMostSignificantBits(); rest != 0; rest &= rest - 1)
            {
                var at = word + BitOperations.TrailingZeroCount(rest) + 1;
                var number = PlainScanner.EightDigits(ref Unsafe.Add(ref bytes, at), out var digits);
                if (digits == 0 || (digits < 8 && number <= most) || at + digits > text.Length) continue;

                for (at += digits; digits >= 8 && at < text.Length && char.IsAsciiDigit((char)text[at]) && number <= uint.MaxValue; at++) number = number * 10 + text[at] - '0';
                if (number <= uint.MaxValue && number > most) most = (uint)number;
            }
        }

        return most;
    }
}
