using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace MemberScan.Part21.Plain;

/// <summary>Shifts and sums over masks of 512 bits, the lowest word first.</summary>
internal static class WideBits
{
    private static readonly Vector512<ulong> s_one = Vector512.Create(1UL, 2, 4, 8, 16, 32, 64, 128);

    /// <summary>The bits moved up by some places, those of the mask before filled in below.</summary>
    /// <param name="bits">The mask.</param>
    /// <param name="previous">The mask before; afterwards this one.</param>
    /// <param name="steps">Places, 1 to 63.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Vector512<ulong> Before(Vector512<ulong> bits, ref Vector512<ulong> previous, int steps = 1)
    {
        var lower = Avx512F.IsSupported
            ? Avx512F.AlignRight64(bits, previous, 7)
            : Vector512.Create(previous[7], bits[0], bits[1], bits[2], bits[3], bits[4], bits[5], bits[6]);
        previous = bits;
        return (bits << steps) | (lower >>> (64 - steps));
    }

    /// <summary>The first bit at or above each start that is none of those to run through: a sum carries each start through its run.</summary>
    /// <param name="starts">Where runs begin.</param>
    /// <param name="through">What they run through.</param>
    /// <param name="carry">1 if a run goes on from the mask before; afterwards whether one goes on into the next.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Vector512<ulong> Run(Vector512<ulong> starts, Vector512<ulong> through, ref uint carry)
    {
        var sum = through + starts;
        var over = (uint)Vector512.LessThan(sum, through).ExtractMostSignificantBits();
        var full = (uint)Vector512.Equals(sum, Vector512<ulong>.AllBitsSet).ExtractMostSignificantBits();

        // A word of ones passes a carry on: the sum of both masks finds all words that get one.
        var carries = ((over << 1) | carry) + full;
        carry = carries >> 8;
        var raised = Vector512.Create((ulong)(carries ^ full)) & s_one;
        return (sum - Vector512.Equals(raised, s_one)) & ~through;
    }

    /// <summary>Each bit the exclusive sum of all up to it: a mask of turns becomes a mask of what is on between them.</summary>
    /// <param name="bits">The mask.</param>
    /// <param name="carry">1 if it is on before the mask; afterwards whether it is on behind.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Vector512<ulong> PrefixXor(Vector512<ulong> bits, ref uint carry)
    {
        var within = WithinWords(bits);

        // The same over the words: each is turned by the sum of those before.
        var sums = (uint)within.ExtractMostSignificantBits();
        sums ^= sums << 1;
        sums ^= sums << 2;
        sums ^= sums << 4;
        var turned = (sums << 1) ^ (0 - carry);
        carry ^= (sums >> 7) & 1;
        return within ^ Vector512.Equals(Vector512.Create((ulong)turned) & s_one, s_one);
    }

    /// <summary>Each bit the exclusive sum of all up to it, in one word.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static ulong PrefixXor(ulong bits)
    {
        if (Pclmulqdq.IsSupported) return Pclmulqdq.CarrylessMultiply(Vector128.CreateScalar(bits), Vector128<ulong>.AllBitsSet, 0).ToScalar();

        for (var step = 1; step < 64; step <<= 1) bits ^= bits << step;
        return bits;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static Vector512<ulong> WithinWords(Vector512<ulong> bits)
    {
        if (Pclmulqdq.V512.IsSupported)
        {
            var even = Pclmulqdq.V512.CarrylessMultiply(bits, Vector512<ulong>.AllBitsSet, 0x00);
            var odd = Pclmulqdq.V512.CarrylessMultiply(bits, Vector512<ulong>.AllBitsSet, 0x01);
            return Avx512F.UnpackLow(even, odd);
        }

        for (var step = 1; step < 64; step <<= 1) bits ^= bits << step;
        return bits;
    }
}
