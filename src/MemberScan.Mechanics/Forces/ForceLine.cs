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

    /// <summary>Orders stations stably and tests each interval between them.</summary>
    /// <param name="stations">Stations in any order; two at one place keep their order and are a jump.</param>
    /// <param name="length">Length of the member [m], &gt; 0.</param>
    public static ForceLine Build(IEnumerable<ForceStation> stations, double length) => throw new NotImplementedException();

    /// <summary>Whether every place of the member is covered by an interval whose forces are known.</summary>
    public bool IsComplete => ReachesBothEnds && Intervals.All(i => i.Kind != IntervalKind.Unknown);
}
