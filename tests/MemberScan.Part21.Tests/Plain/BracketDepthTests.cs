using System.Runtime.Intrinsics;
using MemberScan.Part21.Plain;

namespace MemberScan.Part21.Tests.Plain;

/// <summary>Depths of brackets by masks against counting.</summary>
public sealed class BracketDepthTests
{
    [Theory]
    [InlineData(4)]
    [InlineData(7)]
    [InlineData(8)]
    public void Depths_are_those_counted(int deepest)
    {
        var random = new Random(75);
        var counted = new BracketDepth();
        var depth = 0;
        for (var round = 0; round < 300; round++)
        {
            var (open, close, depths, beyond) = (new ulong[8], new ulong[8], new int[512], new List<int>());
            for (var i = 0; i < 512; i++)
            {
                if (random.Next(4) == 0)
                {
                    var opens = depth == 0 || (depth < deepest && random.Next(2) == 0);
                    (opens ? open : close)[i / 64] |= 1UL << (i % 64);
                    depth += opens ? 1 : -1;
                    if (opens && depth == 8) beyond.Add(i);
                    if (!opens && depth == 7) beyond.Add(i);
                }

                depths[i] = depth;
            }

            var bad = counted.Take(Vector512.Create<ulong>(open), Vector512.Create<ulong>(close), out var ones, out var higher);

            // Eight wraps to zero and is told; coming back from there is told as well.
            for (var i = 0; i < 512; i++)
            {
                Assert.Equal(beyond.Contains(i), Has(bad, i));
                Assert.Equal((depths[i] & 1) != 0, Has(ones, i));
                Assert.Equal((depths[i] & 6) != 0, Has(higher, i));
            }
        }
    }

    [Fact]
    public void Closing_what_is_not_open_is_told()
    {
        var depth = new BracketDepth();

        var bad = depth.Take(Vector512<ulong>.Zero, Vector512.CreateScalar(16UL), out _, out _);

        Assert.Equal(Vector512.CreateScalar(16UL), bad);
    }

    private static bool Has(Vector512<ulong> mask, int bit) => (mask[bit / 64] >> (bit % 64) & 1) != 0;
}
