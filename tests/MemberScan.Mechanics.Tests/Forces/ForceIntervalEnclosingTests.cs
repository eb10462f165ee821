using MemberScan.Mechanics.Forces;

namespace MemberScan.Mechanics.Tests.Forces;

public sealed class ForceIntervalEnclosingTests
{
    /// <summary>Simple span of 2 m under 1 kN/m, its left half: M = q·x·(L − x)/2; the moments rise by qL²/8 of the stretch at most.</summary>
    [Fact]
    public void Encloses_every_state_of_a_stretch_under_uniform_load()
    {
        var start = new ForceStation(0, new SectionForces(100, 0, 1000, 5, 0, 0));
        var end = new ForceStation(1, new SectionForces(200, 0, 0, 5, 500, 0));
        var interval = new ForceInterval(start, end, IntervalKind.UniformLoadInferred);

        var (left, right) = interval.Enclosing;

        Assert.Equal((125, 625), (left.My, right.My));
        for (var share = 0.0; share <= 1; share += 0.01)
        {
            var at = interval.At(share);
            var chord = start.Forces + share * (end.Forces - start.Forces);
            Assert.InRange(at.My, chord.My, (left + share * (right - left)).My);
        }
    }
}
