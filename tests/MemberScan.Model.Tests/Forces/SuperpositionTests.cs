using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Model.Tests.Forces;

public sealed class SuperpositionTests
{
    private static readonly Situation s_sum = new("CO1", SituationKind.Design, "", true, "");

    [Fact]
    public void Stations_of_one_place_are_summed_with_their_factors()
    {
        var sum = Sum((1.35, Case("G", (0, new(1, 2, 3, 4, 5, 6)), (2, new(1, 2, 3, 4, 11, 2)))), (1.5, Case("Q", (0, new(10, 0, 0, 0, 0, 0)), (2, new(20, 0, 0, 0, 0, 0)))));

        Assert.Equal([0, 2], sum.Stations.Select(s => s.X));
        Assert.Equal(1.35 * 1 + 1.5 * 10, sum.Stations[0].Forces.N, 1e-12);
        Assert.Equal(1.35 * 11, sum.Stations[1].Forces.My, 1e-12);
        Assert.Equal("1.35 × 'G' + 1.5 × 'Q' (settings)", sum.Conversion);
        Assert.Equal("source of G + source of Q", sum.Source);
    }

    [Fact]
    public void A_case_without_a_station_there_is_taken_between_its_neighbours()
    {
        // Uniform load 100 N/m down on a simple span of 2 m: V from −100 to 100 N, M −50 N·m in the middle, −37.5 at the quarter.
        var uniform = Case("Q", (0, new(0, 0, -100, 0, 0, 0)), (2, new(0, 0, 100, 0, 0, 0)));
        var axial = Case("G", (0, new(10, 0, 0, 0, 0, 0)), (0.5, new(10, 0, 0, 0, 0, 0)), (2, new(10, 0, 0, 0, 0, 0)));

        var sum = Sum((1, axial), (2, uniform));

        Assert.Equal([0, 0.5, 2], sum.Stations.Select(s => s.X));
        Assert.Equal(new SectionForces(10, 0, -100, 0, -75, 0), sum.Stations[1].Forces);
    }

    [Fact]
    public void A_jump_of_one_case_is_a_jump_of_the_sum()
    {
        var jump = Case("Q", (0, new(1, 0, 0, 0, 0, 0)), (1, new(1, 0, 0, 0, 0, 0)), (1, new(3, 0, 0, 0, 0, 0)), (2, new(3, 0, 0, 0, 0, 0)));
        var plain = Case("G", (0, new(10, 0, 0, 0, 0, 0)), (2, new(10, 0, 0, 0, 0, 0)));

        var sum = Sum((1, plain), (1, jump));

        Assert.Equal([(0, 11), (1, 11), (1, 13), (2, 13)], sum.Stations.Select(s => (s.X, s.Forces.N)));
    }

    [Fact]
    public void What_cannot_be_superposed_says_why()
    {
        var good = Case("G", (0, default), (2, default));
        var coarse = Case("Q", (0, new(0, 0, 100, 0, 0, 0)), (2, new(0, 0, 100, 0, 700, 0)));
        var three = Case("W", (0, default), (1, default), (2, default));

        Assert.Equal(ReasonCode.StationsTooCoarse, Sum((1, coarse), (1, three)).Unusable!.Code);
        Assert.Contains("nothing says that the results of 'G' are linear", Sum((1, good with { Situation = good.Situation with { IsLinear = false } })).Unusable!.Message, StringComparison.Ordinal);
        Assert.Contains("an envelope", Sum((1, good with { Envelope = [new(0, default, default)] })).Unusable!.Message, StringComparison.Ordinal);
        Assert.Equal("broken", Sum((1, good with { Unusable = new Reason(ReasonCode.DamagedRecord, "broken") })).Unusable!.Message);
        Assert.Equal(ReasonCode.NoForces, Sum((1, good with { Stations = [] })).Unusable!.Code);
    }

    private static MemberForces Sum(params (double Factor, MemberForces Forces)[] parts) =>
        Superposition.Of(s_sum, [.. parts.Select(p => new FactoredForces(p.Factor, p.Forces))], 2, "settings");

    private static MemberForces Case(string name, params (double X, SectionForces Forces)[] stations) => new()
    {
        MemberKey = "M",
        Situation = new Situation(name, SituationKind.Unknown, "", false, "") { IsLinear = true },
        Stations = [.. stations.Select(s => new ForceStation(s.X, s.Forces))],
        Source = $"source of {name}",
    };
}
