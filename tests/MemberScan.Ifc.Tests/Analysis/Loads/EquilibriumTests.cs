using CsCheck;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Loads;

namespace MemberScan.Ifc.Tests.Analysis.Loads;

public sealed class EquilibriumTests
{
    /// <summary>Largest moments of simple spans, any structural handbook: uniform qL²/8, triangle qL²/(9√3) at L/√3, half sine qL²/π², parabola 5qL²/48, force PL/4.</summary>
    [Theory]
    [InlineData(LoadShape.Linear, 1, 1, 0.5, 1 / 8.0)]
    [InlineData(LoadShape.Linear, 0, 1, 0.57735026918962576, 0.064150029909958411)]
    [InlineData(LoadShape.HalfSine, 1, 1, 0.5, 0.10132118364233778)]
    [InlineData(LoadShape.Parabola, 1, 1, 0.5, 5 / 48.0)]
    public void Moments_of_simple_spans_are_those_of_the_handbook(LoadShape shape, double start, double end, double place, double moment)
    {
        const double Length = 3, Load = 1500;
        LineLoad[] loads = [new(shape, 0, Length, Down(start * Load), Down(end * Load))];
        // Left reaction from moment equilibrium about the right end.
        var shear = loads[0].Between(0, Length).Moment.Force.Z / Length;

        var atEnd = Equilibrium.Carry(new SectionForces(0, 0, shear, 0, 0, 0), 0, Length, loads);
        var largest = Equilibrium.Carry(new SectionForces(0, 0, shear, 0, 0, 0), 0, place * Length, loads);

        Assert.Equal(0, atEnd.My, 1e-9 * Load);
        Assert.Equal(0, largest.Vz, 1e-9 * Load);
        // dMy/dx = Vz and Vz at the start is −(upward reaction): a sagging rail has My < 0.
        Assert.Equal(-moment * Load * Length * Length, largest.My, 1e-9 * Load);
    }

    [Fact]
    public void Every_component_follows_its_own_equation()
    {
        // q = (1, 2, 3) N/m and m = (4, 5, 6) N·m/m over 2 m, by hand: ∫q = 2q, ∫(x − s)q ds = 2q.
        LineLoad[] loads = [new(LoadShape.Linear, 0, 2, new(new(1, 2, 3), new(4, 5, 6)), new(new(1, 2, 3), new(4, 5, 6)))];

        var end = Equilibrium.Carry(new SectionForces(10, 20, 30, 40, 50, 60), 0, 2, loads);

        Near.Forces(new SectionForces(10 - 2, 20 - 4, 30 - 6, 40 - 8, 50 + 60 - 6 - 10, 60 - 40 + 4 - 12), end, 1e-12);
    }

    [Fact]
    public void A_force_between_stations_gives_a_jump_there()
    {
        const double P = 1000, Length = 2;
        LineLoad[] loads = [new(LoadShape.Point, 1, 1, Down(P), Down(P))];
        ForceStation[] ends = [new(0, new(0, 0, -P / 2, 0, 0, 0)), new(Length, new(0, 0, P / 2, 0, 0, 0))];

        var filled = Equilibrium.Fill(ends, loads, Length, out var stretches);

        Assert.Equal((1, 1), stretches);
        Assert.Equal([(0, -500, 0), (1, -500, -500), (1, 500, -500), (2, 500, 0)], filled.Select(s => (s.X, Math.Round(s.Forces.Vz, 9), Math.Round(s.Forces.My, 9))));
        Assert.True(ForceLine.Build(filled, Length).IsComplete);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void A_station_right_at_a_force_may_be_the_value_on_either_side(bool isLeft)
    {
        const double P = 1000;
        LineLoad[] loads = [new(LoadShape.Point, 1, 1, Down(P), Down(P))];
        ForceStation[] stations = [new(0, new(0, 0, -P / 2, 0, 0, 0)), new(1, new(0, 0, isLeft ? -P / 2 : P / 2, 0, -P / 2, 0)), new(2, new(0, 0, P / 2, 0, 0, 0))];

        var filled = Equilibrium.Fill(stations, loads, 2, out var stretches);

        Assert.Equal((2, 2), stretches);
        Assert.Equal([-500, -500, 500, 500], filled.Select(s => s.Forces.Vz));
    }

    [Fact]
    public void Loads_that_do_not_explain_the_change_add_nothing()
    {
        LineLoad[] loads = [new(LoadShape.Linear, 0, 2, Down(1), Down(1))];
        ForceStation[] ends = [new(0, new(0, 0, -500, 0, 0, 0)), new(2, new(0, 0, 500, 0, 300, 0))];

        var filled = Equilibrium.Fill(ends, loads, 2, out var stretches);

        Assert.Equal((0, 1), stretches);
        Assert.Equal(ends, filled);
    }

    [Fact]
    public void Carrying_on_in_two_steps_is_carrying_on_in_one()
    {
        var number = Gen.Double[-1e3, 1e3];
        var vector = Gen.Select(number, number, number, (x, y, z) => new Vector3(x, y, z));
        var load = Gen.Select(Gen.Enum<LoadShape>().Where(s => s != LoadShape.Temperature), Gen.Double[0, 4], Gen.Double[0.1, 2], vector, vector, vector,
            (shape, from, length, start, end, couple) => new LineLoad(shape, from, shape == LoadShape.Point ? from : from + length, new(start, couple), new(end, couple)));
        Gen.Select(load.Array[0, 5], Gen.Double[0, 5], Gen.Double[0, 5], number).Sample((loads, one, other, n) =>
        {
            var (middle, end) = (Math.Min(one, other), Math.Max(one, other));
            var start = new SectionForces(n, 2 * n, -n, n / 2, 3 * n, -2 * n);
            // A point load right where the two steps meet would count in both.
            if (loads.Any(l => l.From.Equals(middle))) return;
            var inOne = Equilibrium.Carry(start, 0, end, loads);
            var inTwo = Equilibrium.Carry(Equilibrium.Carry(start, 0, middle, loads), middle, end, loads);

            var miss = inOne - inTwo;
            Assert.True(new[] { miss.N, miss.Vy, miss.Vz, miss.T, miss.My, miss.Mz }.Max(Math.Abs) < 1e-7, $"{miss}");
        }, iter: 2000, seed: "0000000000001");
    }

    private static LoadVector Down(double value) => new(new Vector3(0, 0, -value), Vector3.Zero);
}
