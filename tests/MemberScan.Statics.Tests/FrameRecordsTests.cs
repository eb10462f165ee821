using MemberScan.Model.Frames;

namespace MemberScan.Statics.Tests;

/// <summary>The records that a frame is written in.</summary>
public sealed class FrameRecordsTests
{
    [Fact]
    public void Stations_by_count_reach_both_ends_exactly()
    {
        var x = FrameStations.Equal(4).Along(0.7).ToArray();

        Assert.Equal(4, x.Length);
        Assert.Equal((0, 0.7), (x[0], x[^1]));
    }

    [Fact]
    public void Stations_by_place_are_put_in_rising_order_once() => Assert.Equal([0.0, 0.5, 2.0], FrameStations.At([2.0, 0.5, 0.0, 0.5]).Along(9));

    [Fact]
    public void Fewer_than_two_stations_are_refused() => Assert.Throws<ArgumentOutOfRangeException>(() => FrameStations.Equal(1));

    [Fact]
    public void A_restraint_is_replaced_in_its_own_direction_alone()
    {
        foreach (var direction in Enum.GetValues<Direction>())
        {
            var held = Restraints.AllFree.With(direction, Restraint.Spring(5));

            foreach (var other in Enum.GetValues<Direction>()) Assert.Equal(other == direction ? Restraint.Spring(5) : Restraint.Free, held[other]);
        }
    }
}
