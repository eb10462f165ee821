using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;

namespace MemberScan.Model.Tests.Forces;

public sealed class EnvelopeStationTests
{
    [Fact]
    public void A_box_of_six_ranges_has_64_corners_and_a_fixed_component_halves_them()
    {
        var full = new EnvelopeStation(0, new(-1, -2, -3, -4, -5, -6), new(1, 2, 3, 4, 5, 6));
        var flat = full with { Least = full.Least with { T = 4 } };

        Assert.Equal(EnvelopeStation.MostCorners, full.Corners().Distinct().Count());
        Assert.Equal(32, flat.Corners().Count());
        Assert.All(full.Corners(), c => Assert.Equal((1, 2, 3), (Math.Abs(c.N), Math.Abs(c.Vy), Math.Abs(c.Vz))));
        Assert.Equal(new SectionForces(7, 0, 0, 0, 0, 0), Assert.Single(new EnvelopeStation(0, new(7, 0, 0, 0, 0, 0), new(7, 0, 0, 0, 0, 0)).Corners()));
    }
}
