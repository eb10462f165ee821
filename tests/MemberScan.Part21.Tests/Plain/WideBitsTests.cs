using System.Runtime.Intrinsics;
using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Tests.Plain;

/// <summary>Masks of 512 bits against the same done bit by bit.</summary>
public sealed class WideBitsTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    public void Bits_move_up_across_words_and_masks(int steps)
    {
        var random = new Random(71);
        var previous = Vector512<ulong>.Zero;
        var before = new bool[512];
        for (var round = 0; round < 50; round++)
        {
            var bits = Bits(random, 2);

            var moved = Flat(WideBits.Before(Mask(bits), ref previous, steps));

            for (var i = 0; i < 512; i++) Assert.Equal(i >= steps ? bits[i - steps] : before[512 - steps + i], moved[i]);
            before = bits;
        }
    }

    [Fact]
    public void Runs_end_at_the_first_bit_that_is_not_run_through()
    {
        var random = new Random(72);
        var carry = 0u;
        var isRunning = false;
        for (var round = 0; round < 400; round++)
        {
            // Some masks all ones, so that runs go over whole words and masks.
            var through = round % 5 == 0 ? [.. Enumerable.Repeat(true, 512)] : Bits(random, 12);
            var starts = new bool[512];
            for (var i = 0; i < 512; i++)
            {
                var beginsRun = (through[i] && i > 0 && !through[i - 1]) || (!through[i] && i > 0 && !through[i - 1]);
                starts[i] = beginsRun && random.Next(3) == 0;
            }

            var ends = Flat(WideBits.Run(Mask(starts), Mask(through), ref carry));

            for (var i = 0; i < 512; i++)
            {
                isRunning |= starts[i];
                Assert.Equal(isRunning && !through[i], ends[i]);
                if (!through[i]) isRunning = false;
            }

            Assert.Equal(isRunning ? 1u : 0u, carry);
        }
    }

    [Fact]
    public void Turns_add_up_across_words_and_masks()
    {
        var random = new Random(74);
        var carry = 0u;
        var isOn = false;
        for (var round = 0; round < 200; round++)
        {
            var turns = Bits(random, 2 + round % 3);

            var on = Flat(WideBits.PrefixXor(Mask(turns), ref carry));

            for (var i = 0; i < 512; i++) Assert.Equal(isOn ^= turns[i], on[i]);
            Assert.Equal(isOn ? 1u : 0u, carry);
        }
    }

    private static bool[] Bits(Random random, int oneIn) => [.. Enumerable.Range(0, 512).Select(_ => random.Next(oneIn) != 0)];

    private static Vector512<ulong> Mask(bool[] bits)
    {
        var words = new ulong[8];
        for (var i = 0; i < 512; i++) words[i / 64] |= bits[i] ? 1UL << (i % 64) : 0;
        return Vector512.Create<ulong>(words);
    }

    private static bool[] Flat(Vector512<ulong> mask) => [.. Enumerable.Range(0, 512).Select(i => (mask[i / 64] >> (i % 64) & 1) != 0)];
}
