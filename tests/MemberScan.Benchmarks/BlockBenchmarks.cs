using BenchmarkDotNet.Attributes;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Benchmarks;

/// <summary>The largest value of all six measures over a block of states; times are per state.</summary>
[MemoryDiagnoser]
public class BlockBenchmarks
{
    private const int States = 8192;
    private const int Few = 64;
    private readonly SectionForces[] _states = new SectionForces[States];
    private readonly GoverningPoint[] _largest = new GoverningPoint[6];
    private readonly int[] _which = new int[6];
    private readonly double[] _values = new double[Few];
    private StressField _field = null!;

    /// <summary>Section and model.</summary>
    [Params(
        "round elementary", "round elasticity", "tube elementary", "tube elasticity", "rectangle elementary", "rectangle elasticity",
        "box elementary", "box elasticity")]
    public string Field { get; set; } = "";

    /// <summary>Makes the field, its tables and seeded states of all six forces.</summary>
    [GlobalSetup]
    public void SetUp()
    {
        _field = GovernBenchmarks.Make(Field);
        var random = new Random(5);
        double Next() => 2 * random.NextDouble() - 1;
        for (var i = 0; i < States; i++)
        {
            var p = _field.Properties;
            _states[i] = 1e8 * new SectionForces(
                Next() * p.Area, Next() * p.Area / 2, Next() * p.Area / 2, Next() * (p.Wt ?? 0), Next() * p.WelY, Next() * p.WelZ);
        }

        Block();
    }

    /// <summary>Scanned in vectors, the promising states searched.</summary>
    [Benchmark(OperationsPerInvoke = States)]
    public double Block()
    {
        _field.GovernAll(_states, _largest, _which);
        return _largest[0].Value;
    }

    /// <summary>The value of every measure for every state, without place or name.</summary>
    [Benchmark(OperationsPerInvoke = Few)]
    public double Each()
    {
        for (var measure = 0; measure < 6; measure++) _field.GovernEach(_states.AsSpan(0, Few), (StressMeasure)measure, _values);
        return _values[0];
    }

    /// <summary>Every state searched by itself for every measure.</summary>
    [Benchmark(Baseline = true, OperationsPerInvoke = Few)]
    public double OneByOne()
    {
        var sum = 0.0;
        for (var i = 0; i < Few; i++)
            for (var measure = 0; measure < 6; measure++) sum += _field.Govern(_states[i], (StressMeasure)measure).Value;
        return sum;
    }
}
