using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Screening.Presets;

namespace MemberScan.Screening.Tests.Presets;

/// <summary>Beams on supports against the cases of the handbooks: PL/4, wL²/8, Pa and wa²/2 of an overhang (AISC Manual, Table 3-23; from memory).</summary>
public sealed class SpanForcesTests
{
    [Fact]
    public void A_force_in_the_middle_of_a_span_gives_a_quarter_of_it_times_the_span()
    {
        var stations = SpanForces.Of(3, [0, 3], new AssumedLoad(new(0, 100, -200), 1.5, 1.5));

        Assert.Equal(-200 * 3 / 4.0, stations.MinBy(s => s.Forces.My).Forces.My, 9);
        Assert.Equal(-100 * 3 / 4.0, stations.MinBy(s => s.Forces.Mz).Forces.Mz, 9);
    }

    [Fact]
    public void A_uniform_load_gives_an_eighth_of_it_times_the_span_squared()
    {
        var stations = SpanForces.Of(5, [1, 4], new AssumedLoad(new(0, 0, -10), 1, 4));

        Assert.Equal(-10 * 9 / 8.0, stations.Min(s => s.Forces.My), 9);
        Assert.Equal(15, stations.Max(s => s.Forces.Vz), 9);
    }

    [Fact]
    public void An_overhang_is_a_cantilever_and_its_moment_runs_out_along_the_next_span()
    {
        var point = SpanForces.Of(4, [1, 3], new AssumedLoad(new(0, 0, -100), 0, 0));
        var spread = SpanForces.Of(4, [1, 3], new AssumedLoad(new(0, 0, -100), 3, 4));

        Assert.Equal(100 * 1, At(point, 1).My, 9);
        Assert.Equal(0, At(point, 3).My, 9);
        Assert.Equal(-50, After(point, 1).Vz, 9);
        Assert.Equal(100 * 1 / 2.0, At(spread, 3).My, 9);
        Assert.Equal(-100, After(spread, 3).Vz, 9);
    }

    [Fact]
    public void Reactions_of_an_overhang_are_larger_than_its_load()
    {
        // Load at the free end: P(a + L)/L.
        Assert.Equal(1.5, SpanForces.Reaction(0, 4, [1, 3], new AssumedLoad(Vector3.UnitZ, 0, 0)), 9);
        Assert.Equal(1, SpanForces.Reaction(0, 4, [1, 3], new AssumedLoad(Vector3.UnitZ, 1, 1)), 9);
        Assert.Equal(0, SpanForces.Reaction(1, 4, [1, 3], new AssumedLoad(Vector3.UnitZ, 1, 1)), 9);
        Assert.Equal(1, SpanForces.Reaction(1, 4, [1, 3], new AssumedLoad(Vector3.UnitZ, 1, 3)), 9);
    }

    [Theory]
    [InlineData(0.7, 0.7)]
    [InlineData(2.2, 2.2)]
    [InlineData(1.0, 2.5)]
    [InlineData(0.0, 5.0)]
    public void Between_stations_the_change_of_the_moment_is_the_area_of_the_shear(double from, double to)
    {
        var stations = SpanForces.Of(5, [1, 2.5, 4], new AssumedLoad(new(30, 100, -200), from, to));

        foreach (var (a, b) in stations.Zip(stations.Skip(1)).Where(pair => pair.Second.X > pair.First.X))
        {
            Assert.Equal(0.5 * (a.Forces.Vz + b.Forces.Vz) * (b.X - a.X), b.Forces.My - a.Forces.My, 9);
            Assert.Equal(-0.5 * (a.Forces.Vy + b.Forces.Vy) * (b.X - a.X), b.Forces.Mz - a.Forces.Mz, 9);
        }

        Assert.True(ForceLine.Build(stations, 5).IsComplete);
    }

    [Theory]
    [InlineData(50)]
    [InlineData(-50)]
    public void A_load_along_the_member_pulls_it_from_the_support_behind(double force)
    {
        var stations = SpanForces.Of(3, [0.5, 2.5], new AssumedLoad(new(force, 0, 0), 1, 1));

        Assert.Equal(50, stations.Max(s => s.Forces.N), 9);
        Assert.Equal(0, stations.Min(s => s.Forces.N), 9);
        Assert.Equal(force > 0 ? 50 : 0, After(stations, 0.5).N, 9);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_cantilever_carries_the_force_times_its_lever_to_the_fixed_end(bool fixedAtStart)
    {
        var stations = CantileverForces.Of(1.2, fixedAtStart, fixedAtStart ? 1.0 : 0.2, new(10, 100, -200));

        var root = fixedAtStart ? stations[0].Forces : stations[^1].Forces;
        Assert.Equal(200, Math.Abs(root.My), 9);
        Assert.Equal(100, Math.Abs(root.Mz), 9);
        Assert.Equal(fixedAtStart ? 10 : -10, root.N, 9);
        Assert.True(ForceLine.Build(stations, 1.2).IsComplete);
        Assert.Equal(default, fixedAtStart ? stations[^1].Forces : stations[0].Forces);
    }

    private static SectionForces At(IEnumerable<ForceStation> stations, double x) => stations.First(s => s.X.Equals(x)).Forces;

    private static SectionForces After(IEnumerable<ForceStation> stations, double x) => stations.Last(s => s.X.Equals(x)).Forces;
}
