using System.Buffers.Binary;
using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;
using MemberScan.Part21.Index;

namespace MemberScan.Part21.Plain;

/// <summary>Walks over statements of plain layout, 64 bytes at a time, and stops at the first that is anything else.</summary>
/// <remarks>
/// Plain is a statement in which <see cref="Reading.InstanceReader"/> would find nothing to tell and that needs no look back: upper-case
/// words, no comment, blanks only between statements and behind comma, opening bracket and equals sign, no line end in a string. Every
/// byte is checked: each class of bytes is one mask of 64 bits, the rules of the grammar are shifts and sums over masks, and what breaks one
/// is a bit in <c>bad</c>. Rules are stricter than the grammar, never laxer: a statement refused here is read by the other reader.
/// Several times as fast as that reader (benchmark: RESULTS.md, section Part 21), which is its oracle in the tests.
/// </remarks>
internal static class PlainScanner
{
    /// <summary>Bytes that must be readable behind the text [byte].</summary>
    public const int Slack = 512;

    private const int Stride = 512;
    private const ulong Top = 1UL << 63;
    private const int LongestKeyword = 64;

    /// <summary>Scans from a place between two statements.</summary>
    /// <param name="text">The loaded text; <see cref="Slack"/> more bytes are readable behind it.</param>
    /// <param name="at">Where to begin; afterwards the start of the statement, or of the text, that the scan stopped at.</param>
    /// <param name="until">Statements that begin here or beyond are left.</param>
    /// <param name="origin">Offset of the text in the file.</param>
    /// <param name="sink">Receives each instance.</param>
    /// <remarks>In one piece: what is known of the statement under way is kept in locals from one word to the next.</remarks>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static PlainStop Scan<TSink>(ReadOnlySpan<byte> text, ref int at, int until, long origin, ref TSink sink)
        where TSink : struct, IStatementSink
    {
        ref var bytes = ref MemoryMarshal.GetReference(text);
        var length = text.Length;
        Span<ulong> classWords = stackalloc ulong[ByteClasses.Words];
        Span<ulong> insideWords = stackalloc ulong[8];
        Span<ulong> found = stackalloc ulong[Found.Words];
        ref var results = ref MemoryMarshal.GetReference(found);
        var classes = new ByteClasses(classWords);
        var rules = new PlainRules();
        rules.Begin();

        var start = -1;            // of the statement being read; −1 between statements
        var depth = 1;
        var equalsSigns = 0;
        var broken = 0UL;
        var between = at;          // where the search for the next statement stands
        var inString = 0UL;

        for (var block = at; block < length; block += Stride)
        {
            for (var i = 0; i < 8; i++)
            {
                classes.Load(ref Unsafe.Add(ref bytes, block + 64 * i), i);

                // Strings: from each opening apostrophe to before the closing one.
                var inside = PrefixXor(classWords[ByteClasses.Quote + i]) ^ inString;
                inString = (ulong)((long)inside >> 63);
                insideWords[i] = inside;
            }

            rules.Apply(classes, Vector512.Create<ulong>(insideWords), ref bytes, block, length, found);

            for (var i = 0; i < 8; i++)
            {
                var word = block + 64 * i;
                var loaded = length - word;
                if (loaded <= 0) break;

                var rest = loaded >= 64 ? ulong.MaxValue : (1UL << loaded) - 1;
                var semicolon = Unsafe.Add(ref results, Found.Semicolon + i) & rest;
                var bad = Unsafe.Add(ref results, Found.Bad + i);
                var open = Unsafe.Add(ref results, Found.Open + i);
                var close = Unsafe.Add(ref results, Found.Close + i);
                var equals = Unsafe.Add(ref results, Found.EqualsSign + i);
                while (true)
                {
                    if (start < 0)
                    {
                        var next = ~Unsafe.Add(ref results, Found.Blank + i) & rest;
                        if (next == 0)
                        {
                            between = Math.Min(word + 64, length);
                            break;
                        }

                        var first = BitOperations.TrailingZeroCount(next);
                        at = word + first;
                        if (at >= until) return PlainStop.Until;
                        if (Unsafe.Add(ref bytes, at) != '#') return PlainStop.NoInstance;

                        start = at;
                        depth = 1;
                        equalsSigns = 0;
                        broken = 0;
                        rest &= ulong.MaxValue << first;
                    }

                    var last = semicolon & rest;
                    var part = last == 0 ? rest : rest & (last ^ (last - 1));
                    broken |= bad & part;
                    if (!BracketOrder.TryTake(open & part, close & part, ref depth)) broken = 1;
                    equalsSigns += BitOperations.PopCount(equals & part);
                    if (last == 0) break;

                    var end = word + BitOperations.TrailingZeroCount(last) + 1;
                    if (broken != 0 || depth != 0 || equalsSigns != 1 || !TryHead(ref bytes, start, end, out var id, out var keyword, out var keywordLength))
                    {
                        at = start;
                        return PlainStop.NotPlain;
                    }

                    sink.Add(origin + start, end - start, id, MemoryMarshal.CreateReadOnlySpan(ref Unsafe.Add(ref bytes, keyword), keywordLength), InstanceFlags.None);
                    start = -1;
                    between = end;
                    rest &= ~part;
                    if (rest == 0) break;
                }
            }
        }

        at = start >= 0 ? start : between;
        return PlainStop.More;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong PrefixXor(ulong bits)
    {
        if (Pclmulqdq.IsSupported) return Pclmulqdq.CarrylessMultiply(Vector128.CreateScalar(bits), Vector128<ulong>.AllBitsSet, 0).ToScalar();

        for (var step = 1; step < 64; step <<= 1) bits ^= bits << step;
        return bits;
    }

    // #id=KEYWORD( or #id= KEYWORD(
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static bool TryHead(ref byte bytes, int start, int end, out uint id, out int keyword, out int length)
    {
        var at = start + 1;
        var number = EightDigits(ref Unsafe.Add(ref bytes, at), out var digits);
        at += digits;
        keyword = length = 0;
        id = 0;
        while (digits >= 8)
        {
            var digit = (uint)Unsafe.Add(ref bytes, at) - '0';
            if (digit > 9) break;
            number = number * 10 + digit;
            at++;
        }

        if (at - start > 11 || number > uint.MaxValue || Unsafe.Add(ref bytes, at) != '=') return false;

        at++;
        if (Unsafe.Add(ref bytes, at) <= ' ') at++;
        id = (uint)number;
        keyword = at;

        // The word itself was checked by the masks; Slack makes the load readable.
        var brackets = Vector256.Equals(Vector256.LoadUnsafe(ref Unsafe.Add(ref bytes, at)), Vector256.Create((byte)'(')).ExtractMostSignificantBits();
        if (brackets != 0)
        {
            length = BitOperations.TrailingZeroCount(brackets);
        }
        else
        {
            while (at + length < end && length <= LongestKeyword && Unsafe.Add(ref bytes, at + length) != '(') length++;
        }

        var first = Unsafe.Add(ref bytes, at);
        return length > 0 && length <= LongestKeyword && (char.IsAsciiLetterUpper((char)first) || first == '_');
    }

    // The number that up to eight digits spell, by three multiplications; and how many there are.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong EightDigits(ref byte first, out int count)
    {
        var bytes = BinaryPrimitives.ReadUInt64LittleEndian(MemoryMarshal.CreateReadOnlySpan(ref first, 8)) ^ 0x3030_3030_3030_3030;
        var others = (((bytes & 0x7F7F_7F7F_7F7F_7F7F) + 0x7676_7676_7676_7676) | bytes) & 0x8080_8080_8080_8080;
        count = BitOperations.TrailingZeroCount(others) >> 3;
        if (count == 0) return 0;

        // Leading zeros in place of what follows the digits; then pairs, fours, eight.
        bytes <<= 64 - 8 * count;
        bytes = (bytes * 10 + (bytes >> 8)) & 0x00FF_00FF_00FF_00FF;
        bytes = (bytes * 100 + (bytes >> 16)) & 0x0000_FFFF_0000_FFFF;
        return (bytes * 10_000 + (bytes >> 32)) & 0xFFFF_FFFF;
    }
}
