using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace MemberScan.Part21.Plain;

/// <summary>Where the bytes of each class stand among 512: bit i of word w is byte 64·w + i; and which bytes may not follow the one before.</summary>
/// <remarks>
/// Two look-ups give each of 64 bytes sixteen classes, one bit each; a matrix of bits is turned so that each class becomes one word. Where the
/// processor has no such instruction (AVX-512 VBMI, GFNI), the same bits are set one byte at a time.
/// </remarks>
internal readonly ref struct ByteClasses
{
    /// <summary>Classes of the first set.</summary>
    public const int Quote = 0, Numeric = 1, Letter = 2, Dot = 3, Hash = 4, Blank = 5, Open = 6, Close = 7;

    /// <summary>Classes of the second set.</summary>
    public const int Comma = 8, Semicolon = 9, EqualsSign = 10, LineEnd = 11, Backslash = 12;

    /// <summary>Bytes that may not follow the one before, or are no bytes of Part 21; true outside of strings only.</summary>
    public const int Misplaced = 13;

    /// <summary>Words of both sets.</summary>
    public const int Words = 128;

    private const int Rows = 64;
    private const byte MisplacedBit = 1 << (Misplaced - 8);

    // How far ahead of the look-up the bytes are asked for [byte]: what the kernel copied stands in an outer cache.
    private const int Ahead = 2048;

    private static readonly byte[] s_first = Table(First);
    private static readonly byte[] s_second = Table(Second);

    // Bytes of each group of eight in reverse: the turn of the matrix puts the last one lowest. Then the k-th bytes of all groups together.
    private static readonly byte[] s_reversed = Places(i => i ^ 7);
    private static readonly byte[] s_gathered = Places(i => (i & 7) * 8 + i / 8);
    private static readonly byte[] s_shifted = Places(i => Math.Max(0, i - 1));

    private readonly ref ulong _words;
    private readonly Vector512<byte> _firstLow, _firstHigh, _secondLow, _secondHigh, _beforeLow, _beforeHigh, _behindLow, _behindHigh;
    private readonly Vector512<byte> _reversed, _gathered;

    public ByteClasses(Span<ulong> words)
    {
        _words = ref MemoryMarshal.GetReference(words);
        (_firstLow, _firstHigh) = Halves(s_first);
        (_secondLow, _secondHigh) = Halves(s_second);
        (_beforeLow, _beforeHigh) = Halves(BytePairs.Before);
        (_behindLow, _behindHigh) = Halves(BytePairs.Behind);
        _reversed = Vector512.Create<byte>(s_reversed);
        _gathered = Vector512.Create<byte>(s_gathered);
    }

    /// <summary>Whether the instructions for 64 bytes at a time are there.</summary>
    public static bool IsWide => Avx512Vbmi.IsSupported && Gfni.V512.IsSupported;

    /// <summary>Classifies the 64 bytes from <paramref name="at"/> on as one word of each class; bytes from 0x80 on are in no class.</summary>
    /// <param name="at">The first byte.</param>
    /// <param name="hasBefore">Whether the byte before counts; else a blank stands for it.</param>
    /// <param name="word">Number of the word.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Load(ref byte at, bool hasBefore, int word)
    {
        if (!IsWide)
        {
            LoadEach(ref at, hasBefore, word);
            return;
        }

        if (Sse.IsSupported) Prefetch(ref at);
        var bytes = Vector512.LoadUnsafe(ref at);
        var reversed = Avx512Vbmi.PermuteVar64x8(bytes, _reversed);
        var before = Avx512Vbmi.PermuteVar64x8(hasBefore ? Vector512.LoadUnsafe(ref Unsafe.Subtract(ref at, 1)) : Shifted(bytes), _reversed);
        var high = reversed & Vector512.Create((byte)0x80);
        var misplaced = (Avx512Vbmi.PermuteVar64x8x2(_beforeLow, before, _beforeHigh) & Avx512Vbmi.PermuteVar64x8x2(_behindLow, reversed, _behindHigh)) | high;
        if (high != Vector512<byte>.Zero)
            reversed = Vector512.ConditionalSelect(Vector512.LessThan(reversed.AsSByte(), Vector512<sbyte>.Zero).AsByte(), Vector512.Create((byte)'!'), reversed);
        var first = Avx512Vbmi.PermuteVar64x8x2(_firstLow, reversed, _firstHigh);
        var second = Avx512Vbmi.PermuteVar64x8x2(_secondLow, reversed, _secondHigh)
            | (~Vector512.Equals(misplaced, Vector512<byte>.Zero) & Vector512.Create(MisplacedBit));
        Turned(first).StoreUnsafe(ref _words, (nuint)(8 * word));
        Turned(second).StoreUnsafe(ref _words, (nuint)(Rows + 8 * word));
    }

    /// <summary>The same, byte for byte.</summary>
    public void LoadEach(ref byte at, bool hasBefore, int word)
    {
        Span<ulong> rows = stackalloc ulong[16];
        rows.Clear();
        var before = hasBefore ? Unsafe.Subtract(ref at, 1) : (byte)' ';
        for (var i = 0; i < 64; i++)
        {
            var value = Unsafe.Add(ref at, i);
            var classes = value < 0x80 ? s_first[value] | s_second[value] << 8 : 0;
            if (value >= 0x80 || (BytePairs.Before[before & 0x7F] & BytePairs.Behind[value]) != 0) classes |= 1 << Misplaced;
            for (; classes != 0; classes &= classes - 1) rows[BitOperations.TrailingZeroCount(classes)] |= 1UL << i;
            before = value;
        }

        for (var i = 0; i < 8; i++)
        {
            Unsafe.Add(ref _words, 8 * word + i) = rows[i];
            Unsafe.Add(ref _words, Rows + 8 * word + i) = rows[8 + i];
        }
    }

    /// <summary>The eight words of a class.</summary>
    public Vector512<ulong> Of(int which)
    {
        ref var first = ref Unsafe.Add(ref _words, which / 8 * Rows + which % 8);
        return Vector512.Create(
            first, Unsafe.Add(ref first, 8), Unsafe.Add(ref first, 16), Unsafe.Add(ref first, 24),
            Unsafe.Add(ref first, 32), Unsafe.Add(ref first, 40), Unsafe.Add(ref first, 48), Unsafe.Add(ref first, 56));
    }

    /// <summary>The words of all classes of a set, the first class of it in <paramref name="c0"/>.</summary>
    /// <param name="set">0 or 1.</param>
    /// <param name="c0">First class.</param>
    /// <param name="c1">Second class.</param>
    /// <param name="c2">Third class.</param>
    /// <param name="c3">Fourth class.</param>
    /// <param name="c4">Fifth class.</param>
    /// <param name="c5">Sixth class.</param>
    /// <param name="c6">Seventh class.</param>
    /// <param name="c7">Eighth class.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Columns(
        int set, out Vector512<ulong> c0, out Vector512<ulong> c1, out Vector512<ulong> c2, out Vector512<ulong> c3,
        out Vector512<ulong> c4, out Vector512<ulong> c5, out Vector512<ulong> c6, out Vector512<ulong> c7)
    {
        if (!Avx512F.IsSupported)
        {
            (c0, c1, c2, c3) = (Of(8 * set), Of(8 * set + 1), Of(8 * set + 2), Of(8 * set + 3));
            (c4, c5, c6, c7) = (Of(8 * set + 4), Of(8 * set + 5), Of(8 * set + 6), Of(8 * set + 7));
            return;
        }

        // Rows of words to columns in three steps: pairs of words, pairs of those, halves.
        Interleave(set, 0, out var even01, out var odd01);
        Interleave(set, 2, out var even23, out var odd23);
        Interleave(set, 4, out var even45, out var odd45);
        Interleave(set, 6, out var even67, out var odd67);
        Join(even01, even23, even45, even67, out c0, out c2, out c4, out c6);
        Join(odd01, odd23, odd45, odd67, out c1, out c3, out c5, out c7);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Interleave(int set, int row, out Vector512<ulong> even, out Vector512<ulong> odd)
    {
        var one = Vector512.LoadUnsafe(ref _words, (nuint)(Rows * set + 8 * row));
        var next = Vector512.LoadUnsafe(ref _words, (nuint)(Rows * set + 8 * row + 8));
        even = Avx512F.UnpackLow(one, next);
        odd = Avx512F.UnpackHigh(one, next);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Join(
        Vector512<ulong> a, Vector512<ulong> b, Vector512<ulong> c, Vector512<ulong> d,
        out Vector512<ulong> first, out Vector512<ulong> second, out Vector512<ulong> third, out Vector512<ulong> fourth)
    {
        const byte Even = 0x88, Odd = 0xDD;
        var (evenAb, oddAb) = (Avx512F.Shuffle4x128(a, b, Even), Avx512F.Shuffle4x128(a, b, Odd));
        var (evenCd, oddCd) = (Avx512F.Shuffle4x128(c, d, Even), Avx512F.Shuffle4x128(c, d, Odd));
        first = Avx512F.Shuffle4x128(evenAb, evenCd, Even);
        third = Avx512F.Shuffle4x128(evenAb, evenCd, Odd);
        second = Avx512F.Shuffle4x128(oddAb, oddCd, Even);
        fourth = Avx512F.Shuffle4x128(oddAb, oddCd, Odd);
    }

    // Each group of eight bytes as a matrix of bits, its columns as rows; then the k-th rows of all groups side by side.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private Vector512<ulong> Turned(Vector512<byte> classes)
    {
        var unit = Vector512.Create(0x8040_2010_0804_0201).AsByte();
        return Avx512Vbmi.PermuteVar64x8(Gfni.V512.GaloisFieldAffineTransform(unit, classes, 0), _gathered).AsUInt64();
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static unsafe void Prefetch(ref byte at) => Sse.Prefetch0(Unsafe.AsPointer(ref Unsafe.Add(ref at, Ahead)));

    // The bytes moved up by one, a blank below.
    private static Vector512<byte> Shifted(Vector512<byte> bytes) =>
        Avx512Vbmi.PermuteVar64x8(bytes, Vector512.Create<byte>(s_shifted)).WithElement(0, (byte)' ');

    private static (Vector512<byte> Low, Vector512<byte> High) Halves(ReadOnlySpan<byte> table) =>
        (Vector512.Create(table[..64]), Vector512.Create(table[64..]));

    private static byte[] Places(Func<int, int> place)
    {
        var places = new byte[64];
        for (var i = 0; i < places.Length; i++) places[i] = (byte)place(i);
        return places;
    }

    private static byte[] Table(Func<char, int> bits)
    {
        var table = new byte[128];
        for (var c = 0; c < table.Length; c++) table[c] = (byte)bits((char)c);
        return table;
    }

    private static int First(char c) => c switch
    {
        '\'' => 1 << Quote,
        (>= '0' and <= '9') or '+' or '-' => 1 << Numeric,
        (>= 'A' and <= 'Z') or '_' => 1 << Letter,
        '.' => 1 << Dot,
        '#' => 1 << Hash,
        <= ' ' or (char)0x7F => 1 << Blank,
        '(' => 1 << Open,
        ')' => 1 << Close,
        _ => 0,
    };

    private static int Second(char c) => c switch
    {
        ',' => 1 << (Comma - 8),
        ';' => 1 << (Semicolon - 8),
        '=' => 1 << (EqualsSign - 8),
        '\n' or '\r' => 1 << (LineEnd - 8),
        '\\' => 1 << (Backslash - 8),
        _ => 0,
    };
}
