using CsCheck;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Mechanics.Tests.Forces;

public sealed class ForceLineTests
{
    private static ForceStation At(double x, double vz = 0, double my = 0, double n = 0, double vy = 0, double mz = 0) =>
        new(x, new SectionForces(n, vy, vz, 0, my, mz));

    [Fact]
    public void Constant_shear_with_the_moment_it_makes_is_linear()
    {
        // Cantilever of 2 m with 3 kN at its tip: Vz = 3, My from −6 to 0 kNm (dMy/dx = Vz).
        var line = ForceLine.Build([At(0, 3e3, -6e3), At(2, 3e3, 0)], 2);

        Assert.Equal(IntervalKind.Linear, Assert.Single(line.Intervals).Kind);
        Assert.True(line.ReachesBothEnds);
        Assert.True(line.IsComplete);
        Assert.Equal(-3e3, line.Intervals[0].At(0.5).My);
    }

    [Fact]
    public void Shear_along_y_bends_about_minus_z()
    {
        var right = ForceLine.Build([At(0, vy: 3e3, mz: 6e3), At(2, vy: 3e3, mz: 0)], 2);
        var wrong = ForceLine.Build([At(0, vy: 3e3, mz: -6e3), At(2, vy: 3e3, mz: 0)], 2);

        Assert.Equal(IntervalKind.Linear, right.Intervals[0].Kind);
        Assert.Equal(IntervalKind.Unknown, wrong.Intervals[0].Kind);
        Assert.False(wrong.IsComplete);
    }

    // Simple beam under uniform load: qL²/8 at midspan though both ends have none (any structural handbook).
    [Fact]
    public void A_uniform_load_is_inferred_and_its_moment_found_between_the_stations()
    {
        var (q, l) = (2e3, 6.0);

        var line = ForceLine.Build([At(0, q * l / 2, 0), At(l, -q * l / 2, 0)], l);

        var interval = Assert.Single(line.Intervals);
        Assert.Equal(IntervalKind.UniformLoadInferred, interval.Kind);
        Assert.Equal(q * l * l / 8, interval.At(0.5).My, 1e-9);
        Assert.Equal(0, interval.At(0.5).Vz, 1e-9);
    }

    [Fact]
    public void End_values_that_fit_neither_are_unknown()
    {
        // 10 kN at midspan of 4 m, given at the ends alone: shear jumps, the moment looks like nothing.
        var line = ForceLine.Build([At(0, 5e3, 0), At(3, -5e3, 5e3), At(4, -5e3, 0)], 4);

        Assert.Equal([IntervalKind.Unknown, IntervalKind.Linear], line.Intervals.Select(i => i.Kind));
        Assert.False(line.IsComplete);
    }

    [Fact]
    public void Two_stations_at_one_place_are_a_jump_and_make_no_interval()
    {
        var line = ForceLine.Build([At(0, 5e3, 0), At(2, 5e3, 10e3), At(2, -5e3, 10e3), At(4, -5e3, 0)], 4);

        Assert.Equal(4, line.Stations.Length);
        Assert.Equal([(0.0, 2.0), (2.0, 4.0)], line.Intervals.Select(i => (i.Start.X, i.End.X)));
        Assert.Equal((5e3, -5e3), (line.Intervals[0].End.Forces.Vz, line.Intervals[1].Start.Forces.Vz));
        Assert.True(line.IsComplete);
    }

    [Fact]
    public void Places_that_differ_by_rounding_are_one_and_keep_their_order()
    {
        var line = ForceLine.Build([At(0, 5e3, 0), At(2 + 1e-10, 5e3, 10e3), At(2, -5e3, 10e3), At(4, -5e3, 0)], 4);

        Assert.Equal([5e3, 5e3, -5e3, -5e3], line.Stations.Select(s => s.Forces.Vz));
        Assert.Equal(2, line.Intervals.Length);
    }

    [Fact]
    public void Stations_are_put_in_order()
    {
        var line = ForceLine.Build([At(4, n: 3), At(0, n: 1), At(2, n: 2)], 4);

        Assert.Equal([1.0, 2, 3], line.Stations.Select(s => s.Forces.N));
    }

    [Fact]
    public void A_member_with_axial_force_alone_is_linear_even_with_rounding_noise()
    {
        var clean = ForceLine.Build([At(0, n: 10e3), At(3, n: 10e3)], 3);
        var noisy = ForceLine.Build([At(0, 1e-9, 2e-9, n: 10e3), At(3, -3e-9, 5e-9, n: 10e3)], 3);
        var nothing = ForceLine.Build([At(0), At(3)], 3);

        Assert.Equal(IntervalKind.Linear, clean.Intervals[0].Kind);
        Assert.Equal(IntervalKind.Linear, noisy.Intervals[0].Kind);
        Assert.Equal(IntervalKind.Linear, nothing.Intervals[0].Kind);
    }

    [Fact]
    public void Shear_without_the_moment_it_must_make_is_unknown()
    {
        var line = ForceLine.Build([At(0, 5e3), At(3, 5e3)], 3);

        Assert.Equal(IntervalKind.Unknown, line.Intervals[0].Kind);
    }

    // 1 % of the largest value: Vz 100, My up to 200; misses of 1.9 and 2.1.
    [Theory]
    [InlineData(1.9, IntervalKind.Linear)]
    [InlineData(2.1, IntervalKind.Unknown)]
    public void The_moment_may_miss_by_one_per_cent_of_the_largest(double miss, IntervalKind kind)
    {
        var line = ForceLine.Build([At(0, 100, -200), At(2, 100, miss)], 2);

        Assert.Equal(kind, line.Intervals[0].Kind);
    }

    [Theory]
    [InlineData(0.9, IntervalKind.Linear)]
    [InlineData(1.1, IntervalKind.UniformLoadInferred)]
    public void Shear_counts_as_constant_within_one_per_cent_of_the_largest(double change, IntervalKind kind)
    {
        var line = ForceLine.Build([At(0, 100, -200), At(2, 100 - change, 0)], 2);

        Assert.Equal(kind, line.Intervals[0].Kind);
    }

    [Theory]
    [InlineData(0.0, 3.0, true)]
    [InlineData(2e-6, 3.0, true)]
    [InlineData(4e-6, 3.0, false)]
    [InlineData(0.0, 2.99999, false)]
    [InlineData(-1.0, 4.0, true)]
    public void Stations_reach_the_ends_within_a_millionth_of_the_length(double first, double last, bool reaches)
    {
        var line = ForceLine.Build([At(first, n: 1), At(last, n: 1)], 3);

        Assert.Equal(reaches, line.ReachesBothEnds);
    }

    [Fact]
    public void One_station_or_none_covers_nothing()
    {
        var none = ForceLine.Build([], 3);
        var one = ForceLine.Build([At(0, n: 1)], 3);

        Assert.False(none.IsComplete);
        Assert.False(one.IsComplete);
        Assert.Empty(one.Intervals);
    }

    [Fact]
    public void What_cannot_be_a_line_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ForceLine.Build([], 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => ForceLine.Build([], double.NaN));
        Assert.Throws<ArgumentException>(() => ForceLine.Build([At(double.NaN)], 3));
        Assert.Throws<ArgumentException>(() => ForceLine.Build([At(0, double.PositiveInfinity)], 3));
    }

    // Any beam under a uniform load, cut anywhere, is recognised and reproduced at every place.
    [Fact]
    public void A_beam_under_uniform_load_is_reproduced_everywhere() =>
        Gen.Select(Gen.Double[-5, 5], Gen.Double[-5, 5], Gen.Double[-5, 5], Gen.Double[0.05, 0.95], Gen.Double[0, 1]).Sample((q, v0, m0, cut, share) =>
        {
            const double Length = 4;
            ForceStation Exact(double x) => At(x, v0 - q * x, m0 + v0 * x - q * x * x / 2);

            var line = ForceLine.Build([Exact(0), Exact(cut * Length), Exact(Length)], Length);

            Assert.True(line.IsComplete);
            var interval = line.Intervals[share < cut ? 0 : 1];
            var at = (share * Length - interval.Start.X) / (interval.End.X - interval.Start.X);
            var found = interval.At(at);
            var exact = Exact(share * Length).Forces;
            var largest = line.Stations.Max(s => Math.Max(Math.Abs(s.Forces.My), Length * Math.Abs(s.Forces.Vz)));
            Assert.True(Math.Abs(found.My - exact.My) <= 0.01 * largest);
        });
}
