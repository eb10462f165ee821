using System.Buffers.Binary;
using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;

namespace MemberScan.Part21.Plain;

/// <summary>Walks over statements of plain layout, 512 bytes at a time, and stops at the first that is anything else.</summary>
/// <remarks>
/// Plain is a statement in which <see cref="Reading.InstanceReader"/> would find nothing to tell and that needs no look back: upper-case
/// words, no comment, blanks only between statements and behind comma, opening bracket and equals sign, no line end in a string, brackets
/// not deeper than seven. Every byte is checked: each class of bytes is a mask of 512 bits, the rules of the grammar are shifts and sums over
/// masks, and what breaks one is a bit in <c>bad</c>. Rules are stricter than the grammar, never laxer: a statement refused here is read by the
/// other reader. Many times as fast as that reader (benchmark: RESULTS.md, section Part 21), which is its oracle in the tests.
/// </remarks>
internal static class PlainScanner
{
    /// <summary>Bytes that must be readable behind the text [byte].</summary>
    public const int Slack = 512;

    private const int Stride = 512;

    // The shortest statement has seven bytes; four places are written at once.
    private const int MostStatements = Stride / 7 + 8;

    /// <summary>Scans from a place between two statements.</summary>
    /// <param name="text">The loaded text; <see cref="Slack"/> more bytes are readable behind it.</param>
    /// <param name="at">Where to begin; afterwards the start of the statement, or of the text, that the scan stopped at.</param>
    /// <param name="until">Statements that begin here or beyond are left.</param>
    /// <param name="origin">Offset of the text in the file.</param>
    /// <param name="sink">Receives each instance.</param>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static PlainStop Scan<TSink>(ReadOnlySpan<byte> text, ref int at, int until, long origin, ref TSink sink)
        where TSink : struct, IStatementSink
    {
        ref var bytes = ref MemoryMarshal.GetReference(text);
        Span<ulong> classWords = stackalloc ulong[ByteClasses.Words];
        Span<ulong> found = stackalloc ulong[Found.Words];
        Span<int> starts = stackalloc int[MostStatements];
        Span<int> ends = stackalloc int[MostStatements];
        var classes = new ByteClasses(classWords);
        var rules = new PlainRules();
        rules.Begin();

        var first = at;
        var under = -1;            // start of the statement under way; −1 between statements
        for (var block = first; block < text.Length; block += Stride)
        {
            ref var here = ref Unsafe.Add(ref bytes, block);
            for (var i = 0; i < 8; i++) classes.Load(ref Unsafe.Add(ref here, 64 * i), i > 0 || block > first, i);

            var isClean = rules.Apply(classes, text, block, found);
            if (!isClean || block + Stride > Math.Min(text.Length, until))
            {
                if (TryCarefully(text, block, until, origin, found, ref under, ref at, ref sink, out var stop)) continue;
                return stop;
            }

            // Each semicolon ends the statement under way, or the one that began behind the semicolon before.
            starts[0] = under;
            var begun = Places(found[Found.Start..], block, starts, under >= 0 ? 1 : 0);
            var ended = TSink.NeedsText ? Places(found[Found.Semicolon..], block, ends, 0) : Count(found[Found.Semicolon..]);
            var hasEnds = TSink.NeedsText;
            for (var i = 0; i < ended; i++)
            {
                var start = starts[i];
                if (!TryHead(ref bytes, start, out var id, out var word))
                {
                    at = start;
                    return PlainStop.NotPlain;
                }

                var isWanted = sink.MayWant(Unsafe.ReadUnaligned<uint>(ref Unsafe.Add(ref bytes, word + 3)));
                if (!TSink.NeedsText && !isWanted)
                {
                    sink.AddPlain(origin + start, id, default, default);
                    continue;
                }

                if (!hasEnds) Places(found[Found.Semicolon..], block, ends, 0);
                hasEnds = true;
                sink.AddPlain(origin + start, id, text[start..(ends[i] + 1)], isWanted ? Keyword(text[word..]) : default);
            }

            under = begun > ended ? starts[ended] : -1;
        }

        at = under >= 0 ? under : Math.Max(first, text.Length);
        return PlainStop.More;
    }

    // Where something is to be stopped at: statement after statement. True if it is not in these 512 bytes after all.
    [MethodImpl(MethodImplOptions.NoInlining)]
    private static bool TryCarefully<TSink>(
        ReadOnlySpan<byte> text, int block, int until, long origin, ReadOnlySpan<ulong> found, ref int under, ref int at, ref TSink sink, out PlainStop stop)
        where TSink : struct, IStatementSink
    {
        var loaded = Math.Min(Stride, text.Length - block);
        var bad = Next(found[Found.Bad..], 0, loaded);
        var from = 0;
        while (true)
        {
            if (under < 0)
            {
                from = Next(found[Found.Start..], from, loaded);
                stop = PlainStop.More;
                if (from == loaded) return true;

                at = block + from;
                stop = at >= until ? PlainStop.Until : PlainStop.NoInstance;
                if (at >= until || text[at] != '#') return false;

                under = at;
            }

            var semicolon = Next(found[Found.Semicolon..], from, loaded);
            at = under;
            if (bad <= semicolon && bad < loaded)
            {
                // Cut off at the end of what is loaded, a token is not known to be bad.
                stop = semicolon == loaded && text.Length - block - bad < Stride / 2 ? PlainStop.More : PlainStop.NotPlain;
                return false;
            }

            stop = PlainStop.NotPlain;
            if (semicolon == loaded) return true;
            if (!TryHead(ref MemoryMarshal.GetReference(text), under, out var id, out var word)) return false;

            var end = block + semicolon + 1;
            sink.AddPlain(origin + under, id, text[under..end], Keyword(text[word..]));
            under = -1;
            from = semicolon + 1;
        }
    }

    // The first bit at or above a place, or the length.
    private static int Next(ReadOnlySpan<ulong> words, int from, int length)
    {
        for (var i = from >> 6; i < 8; i++)
        {
            var rest = i == from >> 6 ? words[i] & (ulong.MaxValue << (from & 63)) : words[i];
            if (rest != 0) return Math.Min(length, 64 * i + BitOperations.TrailingZeroCount(rest));
        }

        return length;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static int Count(ReadOnlySpan<ulong> words)
    {
        ref var first = ref MemoryMarshal.GetReference(words);
        var count = 0;
        for (var i = 0; i < 8; i++) count += BitOperations.PopCount(Unsafe.Add(ref first, i));
        return count;
    }

    // The places of all bits. Four are written whatever the number, which costs less than to guess it wrong.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static int Places(ReadOnlySpan<ulong> words, int block, Span<int> places, int count)
    {
        ref var word = ref MemoryMarshal.GetReference(words);
        ref var place = ref MemoryMarshal.GetReference(places);
        for (var i = 0; i < 8; i++)
        {
            var rest = Unsafe.Add(ref word, i);
            var number = BitOperations.PopCount(rest);
            ref var next = ref Unsafe.Add(ref place, count);
            var at = block + 64 * i;
            for (var j = 0; j < 4; j++)
            {
                Unsafe.Add(ref next, j) = at + BitOperations.TrailingZeroCount(rest);
                rest &= rest - 1;
            }

            for (var j = 4; rest != 0; j++, rest &= rest - 1) Unsafe.Add(ref next, j) = at + BitOperations.TrailingZeroCount(rest);
            count += number;
        }

        return count;
    }

    /// <summary>Number and keyword of a plain statement; false for a number beyond 32 bits.</summary>
    /// <param name="bytes">First byte of the text; eight more than the statement are readable.</param>
    /// <param name="start">Where the statement begins, <c>#id=KEYWORD(</c> or <c>#id= KEYWORD(</c>.</param>
    /// <param name="id">Its number.</param>
    /// <param name="word">Where its keyword begins.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static bool TryHead(ref byte bytes, int start, out uint id, out int word)
    {
        ref var head = ref Unsafe.Add(ref bytes, start + 1);
        var number = EightDigits(ref head, out var digits);
        if (digits == 8)
        {
            for (var digit = (uint)Unsafe.Add(ref head, digits) - '0'; digit <= 9; digit = (uint)Unsafe.Add(ref head, digits) - '0')
            {
                number = number * 10 + digit;
                digits++;
            }
        }

        id = (uint)number;
        word = start + 2 + digits;
        if (Unsafe.Add(ref bytes, word) <= ' ') word++;
        return number <= uint.MaxValue && digits <= 10;
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private static ReadOnlySpan<byte> Keyword(ReadOnlySpan<byte> text) => text[..text.IndexOf((byte)'(')];

    // The number that up to eight digits spell, by three multiplications; and how many there are.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong EightDigits(ref byte first, out int count)
    {
        var bytes = BinaryPrimitives.ReadUInt64LittleEndian(MemoryMarshal.CreateReadOnlySpan(ref first, 8)) ^ 0x3030_3030_3030_3030;
        var others = (((bytes & 0x7F7F_7F7F_7F7F_7F7F) + 0x7676_7676_7676_7676) | bytes) & 0x8080_8080_8080_8080;
        count = BitOperations.TrailingZeroCount(others) >> 3;

        // Leading zeros in place of what follows the digits; then pairs, fours, eight.
        bytes <<= 64 - 8 * count;
        bytes = (bytes * 10 + (bytes >> 8)) & 0x00FF_00FF_00FF_00FF;
        bytes = (bytes * 100 + (bytes >> 16)) & 0x0000_FFFF_0000_FFFF;
        return (bytes * 10_000 + (bytes >> 32)) & 0xFFFF_FFFF;
    }
}
