using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace MemberScan.Mechanics.Warping;

/// <summary>Loops over numbers in vectors of fixed width, so that every machine adds in the same order.</summary>
internal static class Kernel
{
    /// <summary>Σ x·y over the length of x.</summary>
    public static double Dot(ReadOnlySpan<double> x, ReadOnlySpan<double> y)
    {
        var vx = MemoryMarshal.Cast<double, Vector512<double>>(x);
        var vy = MemoryMarshal.Cast<double, Vector512<double>>(y[..x.Length]);
        var sum = Vector512<double>.Zero;
        for (var i = 0; i < vx.Length; i++) sum = Vector512.FusedMultiplyAdd(vx[i], vy[i], sum);
        var total = Vector512.Sum(sum);
        for (var i = vx.Length * Vector512<double>.Count; i < x.Length; i++) total += x[i] * y[i];
        return total;
    }

    /// <summary>y += a·x over the length of x.</summary>
    public static void Add(double a, ReadOnlySpan<double> x, Span<double> y)
    {
        var vx = MemoryMarshal.Cast<double, Vector512<double>>(x);
        var vy = MemoryMarshal.Cast<double, Vector512<double>>(y[..x.Length]);
        var factor = Vector512.Create(a);
        for (var i = 0; i < vx.Length; i++) vy[i] = Vector512.FusedMultiplyAdd(vx[i], factor, vy[i]);
        for (var i = vx.Length * Vector512<double>.Count; i < x.Length; i++) y[i] += a * x[i];
    }
}
