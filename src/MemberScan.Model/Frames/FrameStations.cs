using System.Collections.Immutable;

namespace MemberScan.Model.Frames;

/// <summary>Where along a member results are wanted.</summary>
public sealed record FrameStations
{
    private FrameStations(int count, ImmutableArray<double> positions) => (Count, Positions) = (count, positions);

    /// <summary>Eleven, both ends included.</summary>
    public static FrameStations Default { get; } = Equal(11);

    /// <summary>Number of equally spaced stations, both ends included; 0 where <see cref="Positions"/> are given.</summary>
    public int Count { get; }

    /// <summary>Distances from the flexible start [m], in rising order; empty where <see cref="Count"/> is given.</summary>
    public ImmutableArray<double> Positions { get; }

    /// <summary>Equally spaced stations, both ends included.</summary>
    /// <param name="count">How many, at least 2.</param>
    public static FrameStations Equal(int count)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(count, 2);
        return new FrameStations(count, []);
    }

    /// <summary>Stations at given distances from the flexible start [m]; they are put in rising order.</summary>
    public static FrameStations At(IEnumerable<double> positions)
    {
        ArgumentNullException.ThrowIfNull(positions);
        return new FrameStations(0, [.. positions.Distinct().Order()]);
    }

    /// <summary>The stations of a member.</summary>
    /// <param name="length">Its flexible length [m].</param>
    public IEnumerable<double> Along(double length) => Count > 0
        ? Enumerable.Range(0, Count).Select(i => i == Count - 1 ? length : length * i / (Count - 1))
        : Positions;
}
