using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Mechanics.Tests.Profiles;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Governing points against 200 000 points of the section, edges and inside, for 2000 seeded states of every kind of section and model.</summary>
public sealed class BruteForceTests
{
    private const int Points = 200_000;
    private const int States = 2000;

    // The promise is 0.1 % of the supremum; nowhere may a point of the cloud exceed the governing value by more than this.
    private const double Excess = 1e-4;

    private static readonly StressMeasure[] s_measures = Enum.GetValues<StressMeasure>();

    private static readonly Dictionary<string, CrossSection> s_kinds = new()
    {
        ["round"] = new Round(0.010),
        ["tube"] = new Tube(0.02415, 0.0032),
        ["thick tube"] = new Tube(0.030, 0.020),
        ["rectangle"] = new Rectangle(0.040, 0.080),
        ["flat rectangle"] = new Rectangle(0.080, 0.012),
        ["rounded rectangle"] = new RoundedRectangle(0.050, 0.030, 0.006),
        ["rounded box"] = new Box(0.050, 0.100, 0.005, 0.010, 0.005),
        ["sharp box"] = new Box(0.060, 0.060, 0.003),
        ["plate with a hole"] = ProfileSamples.All[5],
        ["half disc"] = ProfileSamples.All[6],
        ["angle"] = new OpenProfile(OpenShape.L, 0.100, 0.080, 0.008, 0.008),
        ["rolled angle"] = new OpenProfile(OpenShape.L, 0.060, 0.060, 0.006, 0.006, 0.008),
        ["beam"] = new OpenProfile(OpenShape.I, 0.200, 0.100, 0.0056, 0.0085, 0.012),
        ["channel"] = new OpenProfile(OpenShape.U, 0.100, 0.050, 0.006, 0.0085, 0.0085),
        ["tee"] = new OpenProfile(OpenShape.T, 0.060, 0.060, 0.007, 0.007),
    };

    public static TheoryData<string, ShearModel> Cases
    {
        get
        {
            var cases = new TheoryData<string, ShearModel>();
            foreach (var (kind, section) in s_kinds)
            {
                if (section is not OutlineSection) cases.Add(kind, ShearModel.Elementary);
                cases.Add(kind, ShearModel.Elasticity);
            }

            return cases;
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void No_point_of_the_section_exceeds_the_governing_one(string kind, ShearModel model)
    {
        var field = Samples.Field(s_kinds[kind], model);
        var cloud = new PointCloud(field, Points);
        var random = new Random(20_000);
        var states = Enumerable.Range(0, States).Select(_ => Samples.Forces(field, random)).ToArray();
        var brute = cloud.Largest(states);
        var (worst, at, gate) = (0.0, (State: 0, Measure: StressMeasure.VonMises), new Lock());

        Parallel.For(0, States, state =>
        {
            foreach (var measure in s_measures)
            {
                var found = field.Govern(states[state], measure);
                var there = field.At(states[state], found.Y, found.Z);

                Assert.True(field.Contains(found.Y, found.Z) && field.Decides(found.Y, found.Z), $"{kind} {measure} {states[state]}: {found.Y}, {found.Z} is no point that decides");
                Assert.Equal(Of(measure, there), found.Value, 1e-9 * Math.Abs(found.Value));
                var largest = brute[state * s_measures.Length + (int)measure];
                var excess = largest > 0 ? 1 - Math.Abs(found.Value) / largest : 0;
                lock (gate)
                    if (excess > worst) (worst, at) = (excess, (state, measure));
            }
        });

        if (worst > Excess) Assert.Fail($"{kind} {model}: a point exceeds the governing one by {worst:E2}: {Faulty(field, cloud, states[at.State], at.Measure)}");
        Assert.True(cloud.Count >= Points, $"{cloud.Count} points");
    }

    private static string Faulty(StressField field, PointCloud cloud, SectionForces forces, StressMeasure measure)
    {
        var (found, (y, z)) = (field.Govern(forces, measure), cloud.Where((y, z) => Math.Abs(Of(measure, field.At(forces, y, z)))));
        return $"{measure} for {forces}: {found.Value} at {found.Y:G9}, {found.Z:G9} ({found.Place}), cloud {Of(measure, field.At(forces, y, z))} at {y:G9}, {z:G9}";
    }

    private static double Of(StressMeasure measure, StressState state) => measure switch
    {
        StressMeasure.VonMises => state.VonMises,
        StressMeasure.Tresca => state.Tresca,
        StressMeasure.AbsoluteSigma => state.Sigma,
        StressMeasure.Tau => state.Tau,
        StressMeasure.Sigma1 => state.Sigma1,
        _ => state.Sigma3,
    };
}
