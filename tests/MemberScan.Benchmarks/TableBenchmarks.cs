using BenchmarkDotNet.Attributes;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Benchmarks;

/// <summary>The making of an elasticity field with its tables and closure, each time for a section that was not seen before.</summary>
[MemoryDiagnoser]
public class TableBenchmarks
{
    private int _count;

    /// <summary>A box with the corners of cold-formed tubes.</summary>
    [Benchmark]
    public double RoundedBox() => Closure(new Box(0.05 + Next(), 0.1, 0.005, 0.01, 0.005));

    /// <summary>A box with sharp corners.</summary>
    [Benchmark]
    public double SharpBox() => Closure(new Box(0.05 + Next(), 0.1, 0.005));

    /// <summary>A rounded rectangle.</summary>
    [Benchmark]
    public double RoundedRectangle() => Closure(new RoundedRectangle(0.05 + Next(), 0.1, 0.008));

    private double Next() => 1e-7 * ++_count;

    private static double Closure(CrossSection section) =>
        StressField.TryCreate(section, ShearModel.Elasticity, 0.3, out var field, out var whyNot)
            ? field.Closure.LargestError
            : throw new InvalidOperationException(whyNot);
}
