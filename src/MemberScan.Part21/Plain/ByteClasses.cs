using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace MemberScan.Part21.Plain;

/// <summary>Where the bytes of each class stand among 512: bit i of word w is byte 64·w + i.</summary>
/// <remarks>One table look-up for 64 bytes where the processor has it (AVX-512 VBMI), else one for each byte: the same bits.</remarks>
internal readonly ref struct ByteClasses
{
    public const int Quote = 0, Digit = 8, Letter = 16, Dot = 24, Sign = 32, Hash = 40, Single = 48, Blank = 56;
    public const int Open = 64, Close = 72, Comma = 80, Semicolon = 88, EqualsSign = 96, Exponent = 104, LineEnd = 112, Backslash = 120;

    /// <summary>Words that hold all classes, eight each.</summary>
    public const int Words = 128;

    private static readonly byte[] s_first = Table(First);
    private static readonly byte[] s_second = Table(Second);

    private readonly ref ulong _words;
    private readonly Vector512<byte> _firstLow, _firstHigh, _secondLow, _secondHigh;

    public ByteClasses(Span<ulong> words)
    {
        _words = ref MemoryMarshal.GetReference(words);
        _firstLow = Vector512.Create<byte>(s_first.AsSpan(0, 64));
        _firstHigh = Vector512.Create<byte>(s_first.AsSpan(64, 64));
        _secondLow = Vector512.Create<byte>(s_second.AsSpan(0, 64));
        _secondHigh = Vector512.Create<byte>(s_second.AsSpan(64, 64));
    }

    /// <summary>The eight words of a class.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public Vector512<ulong> Of(int which) => Vector512.LoadUnsafe(ref _words, (nuint)which);

    /// <summary>Classifies the 64 bytes from <paramref name="at"/> on as one word of each class; bytes from 0x80 on are in no class.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Load(ref byte at, int word)
    {
        if (!Avx512Vbmi.IsSupported)
        {
            LoadEach(ref at, word);
            return;
        }

        var bytes = Vector512.LoadUnsafe(ref at);
        if (bytes.ExtractMostSignificantBits() != 0)
            bytes = Vector512.ConditionalSelect(Vector512.LessThan(bytes.AsSByte(), Vector512<sbyte>.Zero).AsByte(), Vector512.Create((byte)'!'), bytes);
        Spread(
            Avx512Vbmi.PermuteVar64x8x2(_firstLow, bytes, _firstHigh),
            Avx512Vbmi.PermuteVar64x8x2(_secondLow, bytes, _secondHigh),
            word);
    }

    /// <summary>The same, byte for byte.</summary>
    public void LoadEach(ref byte at, int word)
    {
        Span<byte> first = stackalloc byte[64];
        Span<byte> second = stackalloc byte[64];
        for (var i = 0; i < 64; i++)
        {
            var value = Unsafe.Add(ref at, i);
            first[i] = value < 0x80 ? s_first[value] : (byte)0;
            second[i] = value < 0x80 ? s_second[value] : (byte)0;
        }

        Spread(Vector512.Create<byte>(first), Vector512.Create<byte>(second), word);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Spread(Vector512<byte> first, Vector512<byte> second, int word)
    {
        ref var words = ref Unsafe.Add(ref _words, word);
        Unsafe.Add(ref words, Quote) = Bits(first, 1);
        Unsafe.Add(ref words, Digit) = Bits(first, 2);
        Unsafe.Add(ref words, Letter) = Bits(first, 4);
        Unsafe.Add(ref words, Dot) = Bits(first, 8);
        Unsafe.Add(ref words, Sign) = Bits(first, 16);
        Unsafe.Add(ref words, Hash) = Bits(first, 32);
        Unsafe.Add(ref words, Single) = Bits(first, 64);
        Unsafe.Add(ref words, Blank) = first.ExtractMostSignificantBits();
        Unsafe.Add(ref words, Open) = Bits(second, 1);
        Unsafe.Add(ref words, Close) = Bits(second, 2);
        Unsafe.Add(ref words, Comma) = Bits(second, 4);
        Unsafe.Add(ref words, Semicolon) = Bits(second, 8);
        Unsafe.Add(ref words, EqualsSign) = Bits(second, 16);
        Unsafe.Add(ref words, Exponent) = Bits(second, 32);
        Unsafe.Add(ref words, LineEnd) = Bits(second, 64);
        Unsafe.Add(ref words, Backslash) = second.ExtractMostSignificantBits();
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong Bits(Vector512<byte> classes, byte bit) =>
        Vector512.Equals(classes & Vector512.Create(bit), Vector512.Create(bit)).ExtractMostSignificantBits();

    private static byte[] Table(Func<char, int> bits) => [.. Enumerable.Range(0, 128).Select(c => (byte)bits((char)c))];

    private static int First(char c) => c switch
    {
        '\'' => 1,
        >= '0' and <= '9' => 2,
        (>= 'A' and <= 'Z') or '_' => 4,
        '.' => 8,
        '+' or '-' => 16,
        '#' => 32,
        '$' or '*' => 64,
        <= ' ' or (char)0x7F => 128,
        _ => 0,
    };

    private static int Second(char c) => c switch
    {
        '(' => 1,
        ')' => 2,
        ',' => 4,
        ';' => 8,
        '=' => 16,
        'E' => 32,
        '\n' or '\r' => 64,
        '\\' => 128,
        _ => 0,
    };
}
