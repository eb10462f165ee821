using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Outlines;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Sections.General;

/// <summary>Sections of general outlines: equal ones are equal values wherever they are drawn, so that each is solved once.</summary>
internal static class OutlineShapes
{
    /// <summary>Grid that corners are laid on [m]; far below what any model means.</summary>
    private const double Grid = 1e-10;

    /// <summary>Grid of bulges [-].</summary>
    private const double BulgeGrid = 1e-9;

    /// <summary>Makes the section of rings; null, with the fault, when they bound none.</summary>
    /// <param name="label">What it is called, such as <c>Z</c>; size and area are added.</param>
    /// <param name="rings">The rings [m], the outer one first.</param>
    /// <param name="centroid">Its centroid in the coordinates of the rings [m].</param>
    /// <param name="fault">What is wrong; empty when nothing is.</param>
    public static OutlineSection? Of(string label, ImmutableArray<ImmutableArray<OutlineVertex>> rings, out Vector3 centroid, out string fault)
    {
        centroid = Vector3.Zero;
        var (leastY, leastZ) = (rings.SelectMany(r => r).Min(v => v.Y), rings.SelectMany(r => r).Min(v => v.Z));
        var laid = rings.Select(ring => Laid(ring, leastY, leastZ)).ToImmutableArray();
        if (OutlineSection.Fault(laid) is { } wrong)
        {
            fault = wrong.Message;
            return null;
        }

        fault = "";
        var unnamed = new OutlineSection("", laid);
        centroid = new Vector3(leastY + unnamed.GivenY, leastZ + unnamed.GivenZ, 0);
        var name = string.Create(CultureInfo.InvariantCulture, $"{label} {unnamed.ExtentY * 1e3:0.###}x{unnamed.ExtentZ * 1e3:0.###} mm, {AreaOf(unnamed) * 1e6:0.#} mm²");
        return new OutlineSection(name, laid);
    }

    /// <summary>Makes the section of a drawn outline with its voids.</summary>
    public static OutlineSection? Of(string label, ClosedOutline outer, ImmutableArray<ClosedOutline> voids, out Vector3 centroid, out string fault) =>
        Of(label, [Ring(outer), .. voids.Select(Ring)], out centroid, out fault);

    /// <summary>The label that a section was made with.</summary>
    public static string LabelOf(OutlineSection section)
    {
        // The size is the third word from the end but one: label, size, "mm,", area, "mm²".
        var words = section.Name.Split(' ');
        return words.Length > 4 ? string.Join(' ', words[..^4]) : section.Name;
    }

    /// <summary>The same section in other dimensions.</summary>
    /// <param name="section">The section.</param>
    /// <param name="scaleY">Factor along y, above zero, or below it to mirror.</param>
    /// <param name="scaleZ">Factor along z, above zero.</param>
    /// <exception cref="ArgumentException">The scaled outline is none.</exception>
    public static OutlineSection Scaled(OutlineSection section, double scaleY, double scaleZ) =>
        Remade(LabelOf(section), section.Rings, scaleY, scaleZ);

    /// <summary>A section seen from the other side: y reversed.</summary>
    public static CrossSection Mirrored(CrossSection section) => section switch
    {
        OutlineSection outline => Scaled(outline, -1, 1),
        OpenProfile { Shape: OpenShape.L or OpenShape.U } profile => Remade($"{profile.Shape} mirrored", [profile.Vertices], -1, 1),
        _ => section,
    };

    private static OutlineSection Remade(string label, ImmutableArray<ImmutableArray<OutlineVertex>> rings, double scaleY, double scaleZ)
    {
        var sense = scaleY < 0 ? -1 : 1;
        ImmutableArray<ImmutableArray<OutlineVertex>> scaled =
            [.. rings.Select(ring => ring.Select(v => new OutlineVertex(scaleY * v.Y, scaleZ * v.Z, sense * v.Bulge)).ToImmutableArray())];
        return Of(label, scaled, out _, out var fault) ?? throw new ArgumentException(fault, nameof(rings));
    }

    /// <summary>Area [m²]: that of the corners' polygons and of the segments between arcs and their chords.</summary>
    private static double AreaOf(OutlineSection section) => section.Rings.Sum(ring => ring.Select((v, i) =>
    {
        var next = ring[(i + 1) % ring.Length];
        var chord = double.Hypot(next.Y - v.Y, next.Z - v.Z);
        if (v.Bulge == 0) return (v.Y * next.Z - next.Y * v.Z) / 2;

        var (angle, radius) = (4 * Math.Atan(v.Bulge), chord * (1 + v.Bulge * v.Bulge) / (4 * v.Bulge));
        return (v.Y * next.Z - next.Y * v.Z + radius * radius * (angle - Math.Sin(angle))) / 2;
    }).Sum());

    /// <summary>The corners of an outline and the ways between them.</summary>
    public static ImmutableArray<OutlineVertex> Ring(ClosedOutline outline)
    {
        // A full circle is one edge, which has no chord: two halves then.
        var edges = outline.Edges.SelectMany(e => e.IsArc && Math.Abs(e.Turn) > 1.5 * Math.PI ? Halves(e) : [e]);
        return [.. edges.Select(e => new OutlineVertex(e.Start.X, e.Start.Y, e.IsArc ? Math.Tan(e.Turn / 4) : 0))];
    }

    private static OutlineEdge[] Halves(OutlineEdge arc) =>
        [arc with { End = arc.At(0.5), Turn = arc.Turn / 2 }, arc with { Start = arc.At(0.5), Turn = arc.Turn / 2 }];

    /// <summary>The ring on the grid, from its least corner on, without repeated corners.</summary>
    private static ImmutableArray<OutlineVertex> Laid(ImmutableArray<OutlineVertex> ring, double leastY, double leastZ)
    {
        var laid = ring.Select(v => new OutlineVertex(
            Math.Round((v.Y - leastY) / Grid) * Grid, Math.Round((v.Z - leastZ) / Grid) * Grid, Math.Round(v.Bulge / BulgeGrid) * BulgeGrid)).ToList();
        laid.RemoveAll(v => laid.Count > 2 && laid[(laid.IndexOf(v) + 1) % laid.Count] is var next && next.Y == v.Y && next.Z == v.Z);
        var first = laid.IndexOf(laid.MinBy(v => (v.Y, v.Z)));
        return [.. laid.Skip(first), .. laid.Take(first)];
    }
}
