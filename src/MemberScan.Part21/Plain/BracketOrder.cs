using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics.X86;

namespace MemberScan.Part21.Plain;

/// <summary>Whether the brackets of a statement close each other, eight at a time.</summary>
internal static class BracketOrder
{
    // Deeper ones are left to the reader that counts exactly.
    private const int DepthTaken = 48;

    // Brackets taken at a time.
    private const int Taken = 8;

    // Index: a one above k ≤ 8 bits, the first bracket lowest, 1 for an opening one.
    private static readonly sbyte[] s_net = Table((net, _) => net);
    private static readonly sbyte[] s_least = Table((_, least) => least);

    /// <summary>Takes the brackets of a stretch: false if one stands behind the bracket that closed the outermost, or they are deep.</summary>
    /// <param name="open">Opening brackets, without the outermost of a statement.</param>
    /// <param name="close">Closing brackets.</param>
    /// <param name="depth">Brackets open before and after; 1 at the beginning of a statement.</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static bool TryTake(ulong open, ulong close, ref int depth)
    {
        var both = open | close;
        var count = BitOperations.PopCount(both);
        var order = Gather(open, both);
        if (count > Taken) return TryTakeMany(order, count, ref depth);

        var index = (1 << count) | (int)order;
        var sound = depth + s_least[index] >= 1 && depth <= DepthTaken;
        depth += s_net[index];
        return sound;
    }

    private static bool TryTakeMany(ulong order, int count, ref int depth)
    {
        var sound = true;
        while (count > 0)
        {
            var taken = Math.Min(count, Taken);
            var index = (1 << taken) | (int)(order & ((1UL << taken) - 1));
            sound &= depth + s_least[index] >= 1 && depth <= DepthTaken;
            depth += s_net[index];
            order >>= taken;
            count -= taken;
        }

        return sound;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static ulong Gather(ulong bits, ulong mask)
    {
        if (Bmi2.X64.IsSupported) return Bmi2.X64.ParallelBitExtract(bits, mask);

        var gathered = 0UL;
        for (var i = 0; mask != 0; i++, mask &= mask - 1)
            gathered |= (bits >> BitOperations.TrailingZeroCount(mask) & 1) << i;
        return gathered;
    }

    // Change of depth over the brackets, and the least depth before any of them.
    private static sbyte[] Table(Func<int, int, int> value)
    {
        var table = new sbyte[512];
        for (var index = 1; index < table.Length; index++)
        {
            int depth = 0, least = sbyte.MaxValue;
            for (var i = 0; i < BitOperations.Log2((uint)index); i++)
            {
                least = Math.Min(least, depth);
                depth += (index >> i & 1) != 0 ? 1 : -1;
            }

            table[index] = (sbyte)value(depth, least);
        }

        return table;
    }
}
