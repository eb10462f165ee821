using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.Threads;

/// <summary>A threaded rod under the forces of one situation at one station.</summary>
public sealed record RodCase
{
    /// <summary>The thread.</summary>
    public required ThreadDesignation Thread { get; init; }

    /// <summary>Where the thread comes from, in words.</summary>
    public required string ThreadSource { get; init; }

    /// <summary>Section forces about the rod's axis; finite.</summary>
    public required SectionForces Forces { get; init; }

    /// <summary>Kind of the situation.</summary>
    public required SituationKind Kind { get; init; }

    /// <summary>Role of the member, such as <c>hanger</c>; shown in notes.</summary>
    public string Role { get; init; } = "rod";

    /// <summary>Factor of the temperature on the strength or allowable stress [-], in (0, 1].</summary>
    public double TemperatureFactor { get; init; } = 1;

    /// <summary>Where the temperature factor comes from, in words.</summary>
    public string TemperatureSource { get; init; } = "no reduction for temperature";

    /// <summary>Refuses values out of range.</summary>
    /// <exception cref="ArgumentException">A force is not finite, the temperature factor is not in (0, 1], or the thread leaves no core.</exception>
    internal void ThrowUnlessUsable()
    {
        if (!Forces.IsFinite) throw new ArgumentException("the section forces must be finite numbers", nameof(Forces));
        if (!(TemperatureFactor > 0 && TemperatureFactor <= 1)) throw new ArgumentException("the temperature factor must be above 0 and at most 1", nameof(TemperatureFactor));
        if (!(Thread.RootDiameter > 0)) throw new ArgumentException("the thread leaves no core", nameof(Thread));
    }
}
