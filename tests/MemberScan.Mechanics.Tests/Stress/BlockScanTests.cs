using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Many states at a time against one state at a time.</summary>
public sealed class BlockScanTests
{
    public static TheoryData<int> FieldNumbers => [.. Enumerable.Range(0, Samples.Fields.Count())];

    [Theory]
    [MemberData(nameof(FieldNumbers))]
    public void Eight_states_a_pass_give_what_one_gives(int number)
    {
        var field = (SectionField)Samples.Fields.ElementAt(number);
        var states = States(field, 43, 1);
        var (fast, plain) = (new double[states.Length * BlockScan.Measures], new double[states.Length * BlockScan.Measures]);
        foreach (var scan in new[] { field.Scans.Thin, field.Scans.Dense })
        {
            scan.Scan(states, fast);
            scan.Plain(states, plain);

            for (var i = 0; i < fast.Length; i++) Assert.True(Math.Abs(fast[i] - plain[i]) <= 1e-12 * plain[i - i % 6 + 1] + 1e-6, $"{Samples.Name(field)}, {i}: {fast[i]} against {plain[i]}");
        }

        Assert.True(field.Scans.Thin.Nodes <= field.Scans.Dense.Nodes);
    }

    [Theory]
    [MemberData(nameof(FieldNumbers))]
    public void The_largest_of_many_states_is_the_largest_of_all_searched_one_by_one(int number)
    {
        var field = Samples.Fields.ElementAt(number);
        var states = States(field, 150, 2);
        var (largest, which) = (new GoverningPoint[6], new int[6]);

        field.GovernAll(states, largest, which);

        foreach (var measure in Enum.GetValues<StressMeasure>())
        {
            var best = states.Max(forces => Math.Abs(field.Govern(forces, measure).Value));
            var (found, state) = (largest[(int)measure], which[(int)measure]);

            Assert.Equal(best, Math.Abs(found.Value), 1e-9 * best);
            Assert.Equal(field.Govern(states[state], measure), found);
        }
    }

    [Theory]
    [MemberData(nameof(FieldNumbers))]
    public void Each_state_of_a_block_has_its_own_largest_value(int number)
    {
        var field = Samples.Fields.ElementAt(number);
        var states = States(field, 200, 4);
        var (values, one) = (new double[states.Length], new double[1]);
        foreach (var measure in Enum.GetValues<StressMeasure>())
        {
            field.GovernEach(states, measure, values);
            for (var i = 0; i < states.Length; i++)
            {
                var best = field.Govern(states[i], measure).Value;
                field.GovernEach([states[i]], measure, one);

                Assert.True(Math.Abs(values[i] - best) <= 1e-4 * Math.Abs(best), $"{Samples.Name(field)} {measure} {states[i]}: {values[i]} against {best}");
                Assert.Equal(values[i], one[0]);
            }
        }
    }

    [Fact]
    public void Each_state_is_searched_without_allocating_and_wrong_input_is_refused()
    {
        var field = Samples.Field(new Box(0.05, 0.1, 0.005, 0.01, 0.005), ShearModel.Elasticity);
        var states = States(field, 20, 5);
        var values = new double[states.Length];
        for (var warm = 0; warm < 30; warm++) field.GovernEach(states, StressMeasure.VonMises, values);

        var before = GC.GetAllocatedBytesForCurrentThread();
        field.GovernEach(states, StressMeasure.VonMises, values);

        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
        field.GovernEach([], StressMeasure.Tau, values);
        field.GovernEach([default], StressMeasure.Tau, values);
        Assert.Equal(0, values[0]);
        Assert.Throws<ArgumentException>(() => field.GovernEach(states, StressMeasure.Tau, values.AsSpan(1)));
        Assert.Throws<ArgumentException>(() => field.GovernEach([new SectionForces(0, 0, double.NaN, 0, 0, 0)], StressMeasure.Tau, values));
    }

    [Fact]
    public void How_states_are_grouped_changes_nothing()
    {
        foreach (var field in Samples.Fields)
        {
            var states = States(field, 60, 3);
            var (whole, which) = (new GoverningPoint[6], new int[6]);
            field.GovernAll(states, whole, which);
            foreach (var size in new[] { 1, 7, 32 })
            {
                var (part, at) = (new GoverningPoint[6], new int[6]);
                var best = new GoverningPoint?[6];
                for (var from = 0; from < states.Length; from += size)
                {
                    field.GovernAll(states.AsSpan(from, Math.Min(size, states.Length - from)), part, at);
                    for (var m = 0; m < 6; m++)
                        if (best[m] is not { } known || Math.Abs(part[m].Value) > Math.Abs(known.Value)) best[m] = part[m];
                }

                for (var m = 0; m < 6; m++) Assert.Equal(whole[m], best[m]);
            }
        }
    }

    [Fact]
    public void Equal_states_give_the_first_of_them()
    {
        var field = Samples.Field(new Box(0.05, 0.1, 0.005, 0.01, 0.005), ShearModel.Elasticity);
        var forces = new SectionForces(1e4, 2e3, 3e3, 100, 200, 300);
        var (largest, which) = (new GoverningPoint[6], new int[6]);

        field.GovernAll([0.5 * forces, forces, forces, 0.9 * forces, forces], largest, which);

        Assert.All(which, state => Assert.Equal(1, state));
        Assert.Equal(field.Govern(forces, StressMeasure.Tau), largest[(int)StressMeasure.Tau]);
    }

    [Fact]
    public void No_forces_at_all_give_zero()
    {
        var (largest, which) = (new GoverningPoint[6], new int[6]);

        Samples.Field(new Tube(0.03, 0.004), ShearModel.Elementary).GovernAll([default, default], largest, which);

        Assert.All(largest, point => Assert.Equal(0, point.Value));
        Assert.All(which, state => Assert.Equal(0, state));
    }

    [Fact]
    public void States_that_are_missing_or_not_finite_are_refused()
    {
        var field = Samples.Field(new Tube(0.03, 0.004), ShearModel.Elementary);
        var (largest, which) = (new GoverningPoint[6], new int[6]);

        Assert.Throws<ArgumentException>(() => field.GovernAll([], largest, which));
        Assert.Throws<ArgumentException>(() => field.GovernAll([new SectionForces(0, double.PositiveInfinity, 0, 0, 0, 0)], largest, which));
        Assert.Throws<ArgumentException>(() => field.GovernAll([default], largest.AsSpan(1), which.AsSpan()));
    }

    private static SectionForces[] States(StressField field, int count, int seed)
    {
        var random = new Random(30_000 + seed);
        return [.. Enumerable.Range(0, count).Select(_ => Samples.Forces(field, random))];
    }
}
