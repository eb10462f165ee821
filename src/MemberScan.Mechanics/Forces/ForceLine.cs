using System.Collections.Immutable;

namespace MemberScan.Mechanics.Forces;

/// <summary>The section forces of one situation along one member: its stations and what is known between them.</summary>
/// <param name="Stations">Stations in rising order; two at one place are a jump.</param>
/// <param name="Intervals">The stretches between neighbouring stations at different places.</param>
/// <param name="ReachesBothEnds">Whether the first and last station lie at the member's ends.</param>
public sealed record ForceLine(
    ImmutableArray<ForceStation> Stations, ImmutableArray<ForceInterval> Intervals, bool ReachesBothEnds)
{
    /// <summary>Share of the largest value within which the tests between stations must hold.</summary>
    public const double Tolerance = 0.01;

    // Shares of the length: two stations nearer than the first are one place, the second still counts as the member's end.
    private const double SamePlace = 1e-9;
    private const double AtEnd = 1e-6;

    /// <summary>Orders stations stably and tests each interval between them.</summary>
    /// <param name="stations">Stations in any order; two at one place keep their order and are a jump.</param>
    /// <param name="length">Length of the member [m], &gt; 0.</param>
    /// <remarks>
    /// Each interval is tested against the end values alone, within <see cref="Tolerance"/> of the largest shear force or moment of the
    /// line: first for constant shear, then for a uniform load. N and T are taken as linear in between. Noise far below every other
    /// force passes. Stations outside the member are kept; whether to accept them is the caller's matter.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="length"/> is not a finite number above zero.</exception>
    /// <exception cref="ArgumentException">A place or a force is not finite.</exception>
    public static ForceLine Build(IEnumerable<ForceStation> stations, double length)
    {
        ArgumentNullException.ThrowIfNull(stations);
        if (!(length > 0 && double.IsFinite(length)))
            throw new ArgumentOutOfRangeException(nameof(length), length, "the length must be a finite number above zero");

        var ordered = Order(stations, SamePlace * length);
        var scale = LineScale.Of(ordered, length);
        var intervals = ImmutableArray.CreateBuilder<ForceInterval>();
        for (var i = 1; i < ordered.Length; i++)
        {
            var (start, end) = (ordered[i - 1], ordered[i]);
            if (end.X - start.X > SamePlace * length) intervals.Add(new ForceInterval(start, end, scale.Test(start, end)));
        }

        var reaches = ordered.Length > 0 && ordered[0].X <= AtEnd * length && ordered[^1].X >= (1 - AtEnd) * length;
        return new ForceLine(ordered, intervals.DrainToImmutable(), reaches);
    }

    /// <summary>Whether every place of the member is covered by an interval whose forces are known.</summary>
    public bool IsComplete => ReachesBothEnds && Intervals.All(i => i.Kind != IntervalKind.Unknown);

    // By place; stations of one place stay in the order given, however their places are rounded.
    private static ImmutableArray<ForceStation> Order(IEnumerable<ForceStation> stations, double samePlace)
    {
        var given = stations.ToArray();
        foreach (var station in given)
        {
            if (!double.IsFinite(station.X) || !station.Forces.IsFinite)
                throw new ArgumentException("places and forces of stations must be finite numbers", nameof(stations));
        }

        var order = Enumerable.Range(0, given.Length).OrderBy(i => given[i].X).ToArray();
        for (var first = 0; first < order.Length;)
        {
            var next = first + 1;
            while (next < order.Length && given[order[next]].X - given[order[next - 1]].X <= samePlace) next++;
            Array.Sort(order, first, next - first);
            first = next;
        }

        return [.. order.Select(i => given[i])];
    }
}
