using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Profiles;

/// <summary>The edges of any section as closed lines, for drawings.</summary>
public static class OutlineRings
{
    private const int ChordsPerQuarter = 24;

    /// <summary>The rings of a section about its centroid [m], the outer one first; arcs in chords.</summary>
    public static ImmutableArray<ImmutableArray<(double Y, double Z)>> Of(CrossSection section)
    {
        ArgumentNullException.ThrowIfNull(section);
        return [.. VerticesOf(section).Select(ring => RingGeometry.Edges([ring]).SelectMany(Points).ToImmutableArray())];
    }

    /// <summary>The edges of a section about its centroid, arcs as arcs, the outer ring first.</summary>
    internal static ImmutableArray<EdgeCurve> EdgesOf(CrossSection section) => RingGeometry.Edges(VerticesOf(section));

    private static ImmutableArray<ImmutableArray<OutlineVertex>> VerticesOf(CrossSection section) => section switch
    {
        Round round => [Circle(round.Radius)],
        Tube tube => [Circle(tube.OuterRadius), Circle(tube.InnerRadius)],
        Rectangle r => [Rectangle(r.Width, r.Depth, 0)],
        RoundedRectangle r => [Rectangle(r.Width, r.Depth, r.CornerRadius)],
        Box b => [Rectangle(b.Width, b.Depth, b.OuterRadius), Rectangle(b.Width - 2 * b.Wall, b.Depth - 2 * b.Wall, b.InnerRadius)],
        OpenProfile profile => [profile.Vertices],
        OutlineSection outline => outline.Rings,
        _ => throw new ArgumentOutOfRangeException(nameof(section), section.Kind, "no outline for this kind"),
    };

    private static IEnumerable<(double Y, double Z)> Points(EdgeCurve edge)
    {
        var count = edge.IsArc ? Math.Max(1, (int)Math.Ceiling(ChordsPerQuarter * Math.Abs(edge.Sweep) / (Math.PI / 2))) : 1;
        return Enumerable.Range(0, count).Select(k => edge.At((double)k / count));
    }

    private static ImmutableArray<OutlineVertex> Circle(double radius) => [new(-radius, 0, 1), new(radius, 0, 1)];

    private static ImmutableArray<OutlineVertex> Rectangle(double width, double depth, double radius)
    {
        var (y, z, quarter) = (width / 2, depth / 2, Math.Tan(Math.PI / 8));
        return radius == 0
            ? [new(-y, -z), new(y, -z), new(y, z), new(-y, z)]
            :
            [
                new(radius - y, -z), new(y - radius, -z, quarter), new(y, radius - z), new(y, z - radius, quarter),
                new(y - radius, z), new(radius - y, z, quarter), new(-y, z - radius), new(-y, radius - z, quarter),
            ];
    }
}
