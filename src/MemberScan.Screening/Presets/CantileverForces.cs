using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Screening.Presets;

/// <summary>Section forces of a member that is fixed at one end, under a force at a place of it.</summary>
internal static class CantileverForces
{
    /// <summary>Stations from start to end, with a jump at the load.</summary>
    /// <param name="length">Length of the member [m].</param>
    /// <param name="fixedAtStart">Whether the start is fixed; otherwise the end.</param>
    /// <param name="place">Where the force acts [m].</param>
    /// <param name="force">The force in the member's axes [N].</param>
    public static ImmutableArray<ForceStation> Of(double length, bool fixedAtStart, double place, Vector3 force)
    {
        var stations = ImmutableArray.CreateBuilder<ForceStation>();
        foreach (var x in new SortedSet<double> { 0, place, length })
        {
            if (x > 0) stations.Add(new ForceStation(x, At(x, false, fixedAtStart, place, force)));
            if (x < length) stations.Add(new ForceStation(x, At(x, true, fixedAtStart, place, force)));
        }

        return stations.ToImmutable();
    }

    // On the +x face: what acts beyond the place, or the reverse of what acts before it.
    private static SectionForces At(double x, bool after, bool fixedAtStart, double place, Vector3 force)
    {
        var isBeyond = place > x || (place.Equals(x) && !after);
        if (isBeyond != fixedAtStart) return default;

        var lever = place - x;
        var sign = fixedAtStart ? 1 : -1;
        return new SectionForces(sign * force.X, sign * force.Y, sign * force.Z, 0, -sign * lever * force.Z, sign * lever * force.Y);
    }
}
