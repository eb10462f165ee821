using BenchmarkDotNet.Attributes;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Benchmarks;

/// <summary>One search for the largest von Mises stress, by kind of section and shear model, over sixteen states in turn.</summary>
[MemoryDiagnoser]
public class GovernBenchmarks
{
    private const int States = 16;
    private readonly SectionForces[] _states = new SectionForces[States];
    private StressField _field = null!;
    private int _next;

    /// <summary>Section and model.</summary>
    [Params(
        "round elementary", "round elasticity", "tube elementary", "tube elasticity", "rectangle elementary", "rectangle elasticity",
        "rounded rectangle elementary", "box elementary", "box elasticity")]
    public string Field { get; set; } = "";

    /// <summary>Makes the field and seeded states of all six forces (no torsion where the field has none).</summary>
    [GlobalSetup]
    public void SetUp()
    {
        var field = Make(Field);
        _field = field;
        var random = new Random(5);
        double Next() => 2 * random.NextDouble() - 1;
        for (var i = 0; i < States; i++)
        {
            var p = field.Properties;
            _states[i] = 1e8 * new SectionForces(
                Next() * p.Area, Next() * p.Area / 2, Next() * p.Area / 2, Next() * (p.Wt ?? 0), Next() * p.WelY, Next() * p.WelZ);
        }
    }

    /// <summary>The search.</summary>
    [Benchmark]
    public double Govern() => _field.Govern(_states[_next++ % States], StressMeasure.VonMises).Value;

    internal static StressField Make(string text)
    {
        var split = text.LastIndexOf(' ');
        CrossSection section = text[..split] switch
        {
            "round" => new Round(0.010),
            "tube" => new Tube(0.02415, 0.0032),
            "rectangle" => new Rectangle(0.040, 0.080),
            "rounded rectangle" => new RoundedRectangle(0.050, 0.030, 0.006),
            "box" => new Box(0.050, 0.100, 0.005, 0.010, 0.005),
            _ => throw new InvalidOperationException(text),
        };
        var model = text[(split + 1)..] == "elementary" ? ShearModel.Elementary : ShearModel.Elasticity;
        if (!StressField.TryCreate(section, model, 0.3, out var field, out var whyNot)) throw new InvalidOperationException(whyNot);
        return field;
    }
}
