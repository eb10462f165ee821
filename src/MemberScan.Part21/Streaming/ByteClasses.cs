using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace MemberScan.Part21.Streaming;

/// <summary>Where the bytes of each class stand among 64: bit i is byte i.</summary>
internal ref struct ByteClasses
{
    // Low table: one bit per class; high table: the others.
    private const byte QuoteBit = 1, DigitBit = 2, LetterBit = 4, DotBit = 8, SignBit = 16, HashBit = 32, SingleBit = 64, BlankBit = 128;
    private const byte OpenBit = 1, CloseBit = 2, CommaBit = 4, SemicolonBit = 8, EqualsBit = 16, ExponentBit = 32, LineEndBit = 64, BackslashBit = 128;

    private static readonly byte[] s_first = Table(First);
    private static readonly byte[] s_second = Table(Second);

    public ulong Quote, Digit, Letter, Dot, Sign, Hash, Single, Blank;
    public ulong Open, Close, Comma, Semicolon, EqualsSign, Exponent, LineEnd, Backslash;

    /// <summary>Classifies the 64 bytes from <paramref name="at"/> on; bytes from 0x80 on are in no class.</summary>
    /// <remarks>One table look-up for 64 bytes where the processor has it (AVX-512 VBMI), else one for each byte: the same bits.</remarks>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Load(ref byte at)
    {
        if (Avx512Vbmi.IsSupported)
        {
            var bytes = Vector512.LoadUnsafe(ref at);
            if (bytes.ExtractMostSignificantBits() != 0)
                bytes = Vector512.ConditionalSelect(Vector512.LessThan(bytes.AsSByte(), Vector512<sbyte>.Zero).AsByte(), Vector512.Create((byte)'!'), bytes);

            ref var first = ref System.Runtime.InteropServices.MemoryMarshal.GetArrayDataReference(s_first);
            ref var second = ref System.Runtime.InteropServices.MemoryMarshal.GetArrayDataReference(s_second);
            Spread(
                Avx512Vbmi.PermuteVar64x8x2(Vector512.LoadUnsafe(ref first), bytes, Vector512.LoadUnsafe(ref first, 64)),
                Avx512Vbmi.PermuteVar64x8x2(Vector512.LoadUnsafe(ref second), bytes, Vector512.LoadUnsafe(ref second, 64)));
            return;
        }

        LoadEach(ref at);
    }

    /// <summary>The same, byte for byte.</summary>
    public void LoadEach(ref byte at)
    {
        Span<byte> first = stackalloc byte[64];
        Span<byte> second = stackalloc byte[64];
        for (var i = 0; i < 64; i++)
        {
            var value = Unsafe.Add(ref at, i);
            first[i] = value < 0x80 ? s_first[value] : (byte)0;
            second[i] = value < 0x80 ? s_second[value] : (byte)0;
        }

        Spread(Vector512.Create<byte>(first), Vector512.Create<byte>(second));
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Spread(Vector512<byte> first, Vector512<byte> second)
    {
        Quote = Bits(first, QuoteBit);
        Digit = Bits(first, DigitBit);
        Letter = Bits(first, LetterBit);
        Dot = Bits(first, DotBit);
        Sign = Bits(first, SignBit);
        Hash = Bits(first, HashBit);
        Single = Bits(first, SingleBit);
        Blank = first.ExtractMostSignificantBits();
        Open = Bits(second, OpenBit);
        Close = Bits(second, CloseBit);
        Comma = Bits(second, CommaBit);
        Semicolon = Bits(second, SemicolonBit);
        EqualsSign = Bits(second, EqualsBit);
        Exponent = Bits(second, ExponentBit);
        LineEnd = Bits(second, LineEndBit);
        Backslash = second.ExtractMostSignificantBits();
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong Bits(Vector512<byte> classes, byte bit) =>
        ~Vector512.Equals(classes & Vector512.Create(bit), Vector512<byte>.Zero).ExtractMostSignificantBits();

    private static byte[] Table(Func<char, int> bits) => [.. Enumerable.Range(0, 128).Select(c => (byte)bits((char)c))];

    private static int First(char c) => c switch
    {
        '\'' => QuoteBit,
        >= '0' and <= '9' => DigitBit,
        (>= 'A' and <= 'Z') or '_' => LetterBit,
        '.' => DotBit,
        '+' or '-' => SignBit,
        '#' => HashBit,
        '$' or '*' => SingleBit,
        <= ' ' or (char)0x7F => BlankBit,
        _ => 0,
    };

    private static int Second(char c) => c switch
    {
        '(' => OpenBit,
        ')' => CloseBit,
        ',' => CommaBit,
        ';' => SemicolonBit,
        '=' => EqualsBit,
        'E' => ExponentBit,
        '\n' or '\r' => LineEndBit,
        '\\' => BackslashBit,
        _ => 0,
    };
}
