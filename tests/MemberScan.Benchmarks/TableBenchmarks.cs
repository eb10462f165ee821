using BenchmarkDotNet.Attributes;
using MemberScan.Mechanics.Profiles;
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

    /// <summary>A rolled beam.</summary>
    [Benchmark]
    public double RolledBeam() => Closure(new OpenProfile(OpenShape.I, 0.2 + Next(), 0.1, 0.0056, 0.0085, 0.012));

    /// <summary>An angle with sharp corners.</summary>
    [Benchmark]
    public double SharpAngle() => Closure(new OpenProfile(OpenShape.L, 0.1 + Next(), 0.08, 0.008, 0.008));

    /// <summary>A rolled channel.</summary>
    [Benchmark]
    public double RolledChannel() => Closure(new OpenProfile(OpenShape.U, 0.1 + Next(), 0.05, 0.006, 0.0085, 0.0085));

    /// <summary>A plate with a hole, a general outline.</summary>
    [Benchmark]
    public double PlateWithHole() => Closure(new OutlineSection(
        "plate", [[new(-0.06 - Next(), -0.03), new(0.06, -0.03), new(0.06, 0.03), new(-0.06 - Next(), 0.03)], [new(0.005, 0, 1), new(0.035, 0, 1)]]));

    private double Next() => 1e-7 * ++_count;

    private static double Closure(CrossSection section) =>
        StressField.TryCreate(section, ShearModel.Elasticity, 0.3, out var field, out var whyNot)
            ? field.Closure.LargestError
            : throw new InvalidOperationException(whyNot);
}
