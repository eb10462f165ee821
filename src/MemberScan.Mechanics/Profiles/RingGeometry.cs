using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Sections;
using NetTopologySuite.Geometries;

namespace MemberScan.Mechanics.Profiles;

/// <summary>Rings of vertices as edges and polygons.</summary>
internal static class RingGeometry
{
    private const int ChordsPerArc = 24;

    /// <summary>The edges of rings in order.</summary>
    public static ImmutableArray<EdgeCurve> Edges(IEnumerable<ImmutableArray<OutlineVertex>> rings) =>
        [.. rings.SelectMany(ring => ring.Select((vertex, i) => Edge(vertex, ring[(i + 1) % ring.Length])))];

    /// <summary>The edge between two vertices.</summary>
    public static EdgeCurve Edge(OutlineVertex from, OutlineVertex to)
    {
        if (from.Bulge == 0) return EdgeCurve.Line((from.Y, from.Z), (to.Y, to.Z));

        // Centre to the left of the chord for a positive bulge below 1: c = chord/2·(1/b − b)/2 from its middle.
        var (dy, dz) = (to.Y - from.Y, to.Z - from.Z);
        var offset = 0.25 * (1 / from.Bulge - from.Bulge);
        var (cy, cz) = (0.5 * (from.Y + to.Y) - offset * dz, 0.5 * (from.Z + to.Z) + offset * dy);
        var start = Math.Atan2(from.Z - cz, from.Y - cy);
        return EdgeCurve.Arc((cy, cz), double.Hypot(from.Y - cy, from.Z - cz), start, start + 4 * Math.Atan(from.Bulge));
    }

    /// <summary>The ring in the wanted turn.</summary>
    public static ImmutableArray<OutlineVertex> Turned(ImmutableArray<OutlineVertex> ring, bool counterClockwise)
    {
        if (OutlineIntegrals.Of(Edges([ring])).Area > 0 == counterClockwise) return ring;

        // Backwards: the way to the next vertex is the old way from it.
        return [.. Enumerable.Range(0, ring.Length).Select(i => ring.Length - 1 - i)
            .Select(i => ring[i] with { Bulge = -ring[(i + ring.Length - 1) % ring.Length].Bulge })];
    }

    /// <summary>Least and largest y, least and largest z.</summary>
    public static (double LeastY, double LargestY, double LeastZ, double LargestZ) Bounds(ImmutableArray<EdgeCurve> edges)
    {
        var points = edges.SelectMany(edge => edge.Extremes()).ToArray();
        return (points.Min(p => p.Y), points.Max(p => p.Y), points.Min(p => p.Z), points.Max(p => p.Z));
    }

    /// <summary>What is wrong with rings; null when nothing is.</summary>
    public static SectionFault? Fault(ImmutableArray<ImmutableArray<OutlineVertex>> rings, int mostVertices)
    {
        if (rings.IsDefaultOrEmpty || rings.Any(ring => ring.IsDefault || ring.Length < 2))
            return new SectionFault(SectionFaultKind.NotSimple, "an outline needs an outer ring, and every ring at least two corners");
        if (rings.Sum(ring => ring.Length) > mostVertices)
            return new SectionFault(SectionFaultKind.NotSimple, $"the outline has more than {mostVertices} corners");
        if (rings.Any(ring => ring.Any(v => !double.IsFinite(v.Y) || !double.IsFinite(v.Z) || !(Math.Abs(v.Bulge) <= 1e3))))
            return new SectionFault(SectionFaultKind.NotPositive, "a corner of the outline is not a finite number");
        if (rings.Any(ring => ring.Select((v, i) => (v, next: ring[(i + 1) % ring.Length])).Any(p => p.v.Y == p.next.Y && p.v.Z == p.next.Z)))
            return new SectionFault(SectionFaultKind.NotSimple, "two corners of the outline that follow each other are one");

        var polygon = Polygon(rings);
        return polygon is { IsValid: true, Area: > 0 }
            ? null
            : new SectionFault(SectionFaultKind.NotSimple, "the outline crosses itself, a hole reaches outside, or it has no area");
    }

    private static Polygon? Polygon(ImmutableArray<ImmutableArray<OutlineVertex>> rings)
    {
        var loops = rings.Select(ring => Edges([ring]).SelectMany(Chords).Select(p => new Coordinate(p.Y, p.Z)).ToArray()).ToArray();
        if (loops.Any(loop => loop.Length < 3)) return null;

        var closed = loops.Select(loop => new LinearRing([.. loop, loop[0]])).ToArray();
        return new Polygon(closed[0], closed[1..]);
    }

    private static IEnumerable<(double Y, double Z)> Chords(EdgeCurve edge) =>
        Enumerable.Range(0, edge.IsArc ? ChordsPerArc : 1).Select(k => edge.At(k / (double)ChordsPerArc));
}
