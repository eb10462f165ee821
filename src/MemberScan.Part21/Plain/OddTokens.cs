using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;

namespace MemberScan.Part21.Plain;

/// <summary>Tokens in which letters and digits meet, which no pair of bytes decides: exponents, words with digits. Rare, so one at a time.</summary>
internal static class OddTokens
{
    private static readonly bool[] s_parts = Parts();

    // A longer one is left to the other reader.
    private const int Longest = 80;

    /// <summary>Those of the places marked whose token is not sound, or is cut off.</summary>
    /// <param name="places">A byte of each token.</param>
    /// <param name="text">The text.</param>
    /// <param name="block">Where the 512 bytes of the mask begin in it.</param>
    public static Vector512<ulong> Unsound(Vector512<ulong> places, ReadOnlySpan<byte> text, int block)
    {
        Span<ulong> bad = stackalloc ulong[8];
        bad.Clear();
        var behind = 0;
        for (var i = 0; i < 8; i++)
        {
            for (var rest = places[i]; rest != 0; rest &= rest - 1)
            {
                var bit = BitOperations.TrailingZeroCount(rest);
                var at = block + 64 * i + bit;

                // A token looked at once is not looked at again.
                if (at >= behind && !IsSound(text, at, out behind)) bad[i] |= 1UL << bit;
            }
        }

        return Vector512.Create<ulong>(bad);
    }

    private static bool IsSound(ReadOnlySpan<byte> text, int at, out int end)
    {
        end = at;
        if (at >= text.Length) return false;

        var start = at;
        while (start > 0 && at - start < Longest && IsPart(text[start - 1])) start--;
        while (end < text.Length && end - at < Longest && IsPart(text[end])) end++;
        if (end == text.Length || end - at == Longest || at - start == Longest) return false;

        var token = text[start..end];
        var behind = text[end];
        return token.Length > 0 && token[0] switch
        {
            (byte)'.' => behind is (byte)',' or (byte)')' && token.Length > 2 && token[^1] == '.' && IsWord(token[1..^1]),
            (byte)'+' or (byte)'-' => behind is (byte)',' or (byte)')' && IsNumber(token[1..]),
            >= (byte)'0' and <= (byte)'9' => behind is (byte)',' or (byte)')' && IsNumber(token),
            _ => behind is (byte)'(' && IsWord(token),
        };
    }

    private static bool IsPart(byte value) => s_parts[value];

    private static bool[] Parts()
    {
        var parts = new bool[256];
        foreach (var part in "ABCDEFGHIJKLMNOPQRSTUVWXYZ_0123456789.+-"u8) parts[part] = true;
        return parts;
    }

    private static bool IsWord(ReadOnlySpan<byte> token)
    {
        if (char.IsAsciiDigit((char)token[0])) return false;
        return token.IndexOfAny((byte)'.', (byte)'+', (byte)'-') < 0;
    }

    // digits [. [digits]] E [sign] digit [digit]; larger exponents may be beyond a double.
    private static bool IsNumber(ReadOnlySpan<byte> token)
    {
        var at = AfterDigits(token, 0);
        if (at == 0) return false;

        if (at < token.Length && token[at] == '.') at = AfterDigits(token, at + 1);
        if (at >= token.Length || token[at] != 'E') return false;

        at++;
        if (at < token.Length && token[at] is (byte)'+' or (byte)'-') at++;
        return token.Length - at is 1 or 2 && AfterDigits(token, at) == token.Length;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static int AfterDigits(ReadOnlySpan<byte> token, int at)
    {
        while (at < token.Length && char.IsAsciiDigit((char)token[at])) at++;
        return at;
    }
}
