using System.Diagnostics;
using System.Globalization;
using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;

namespace MemberScan.Benchmarks.Question;

/// <summary>The least a pass can cost: semicolons counted by masks of 64 bytes, read through a window on one thread.</summary>
internal static class MaskScan
{
    public static int Run(string path)
    {
        for (var i = 0; i < 4; i++)
        {
            var watch = Stopwatch.StartNew();
            using var file = File.OpenHandle(path);
            var buffer = new byte[256 * 1024];
            var (count, at) = (0L, 0L);
            for (var length = RandomAccess.Read(file, buffer, 0); length > 0; length = RandomAccess.Read(file, buffer, at))
            {
                count += Count(buffer.AsSpan(0, length));
                at += length;
            }

            Console.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{count} semicolons {watch.Elapsed.TotalMilliseconds:F0} ms {at / watch.Elapsed.TotalSeconds / 1e9:F2} GB/s"));
        }

        return 0;
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static long Count(ReadOnlySpan<byte> text)
    {
        var count = 0L;
        var at = 0;
        for (; at + 64 <= text.Length; at += 64)
            count += BitOperations.PopCount(Vector512.Equals(Vector512.Create(text[at..]), Vector512.Create((byte)';')).ExtractMostSignificantBits());
        return count + text[at..].Count((byte)';');
    }
}
