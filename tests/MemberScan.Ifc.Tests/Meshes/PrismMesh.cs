using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Ifc.Tests.Meshes;

/// <summary>Prisms as meshes: one loop for the outline, a second one of as many corners for a void, start points before end points.</summary>
internal sealed class PrismMesh
{
    private readonly int _corners;
    private readonly bool _isHollow;

    private PrismMesh(List<Vector3> points, int corners, bool isHollow) => (Points, _corners, _isHollow) = (points, corners, isHollow);

    public List<Vector3> Points { get; }

    private int PerEnd => _isHollow ? 2 * _corners : _corners;

    /// <summary>A prism along z; sections with round parts get about as many chords as facets.</summary>
    public static PrismMesh Of(CrossSection section, double length, int facets)
    {
        var perCorner = Math.Max(2, facets / 4);
        var (outer, inner) = section switch
        {
            Round s => (Circle(s.Radius, facets), null),
            Tube s => (Circle(s.OuterRadius, facets), Circle(s.OuterRadius - s.Wall, facets)),
            Rectangle s => (OutlineWriter.Rectangle(Transform3.Identity, s.Width, s.Depth), null),
            RoundedRectangle s => (Rounded(s.Width, s.Depth, s.CornerRadius, perCorner), null),
            Box { OuterRadius: 0 } s => (OutlineWriter.Rectangle(Transform3.Identity, s.Width, s.Depth), OutlineWriter.Rectangle(Transform3.Identity, s.Width - 2 * s.Wall, s.Depth - 2 * s.Wall)),
            Box s => (Rounded(s.Width, s.Depth, s.OuterRadius, perCorner), Rounded(s.Width - 2 * s.Wall, s.Depth - 2 * s.Wall, s.InnerRadius, perCorner)),
            _ => throw new ArgumentException(section.Kind, nameof(section)),
        };
        return Of(outer, inner, length);
    }

    /// <summary>A prism along z of any loops.</summary>
    public static PrismMesh Of(IReadOnlyList<Vector3> outer, IReadOnlyList<Vector3>? inner, double length)
    {
        Vector3[] start = [.. outer, .. inner ?? []];
        return new PrismMesh([.. start, .. start.Select(p => p + length * Vector3.UnitZ)], outer.Count, inner is not null);
    }

    /// <summary>Changes every point.</summary>
    public PrismMesh Changed(Func<Vector3, Vector3> change)
    {
        for (var i = 0; i < Points.Count; i++) Points[i] = change(Points[i]);
        return this;
    }

    /// <summary>Faces with whole ends, a void as a hole in them.</summary>
    public IEnumerable<IReadOnlyList<IReadOnlyList<int>>> Faces()
    {
        foreach (var end in new[] { 0, PerEnd })
            yield return _isHollow ? [Range(end), Range(end + _corners)] : [Range(end)];
        foreach (var quad in Sides()) yield return [quad];

        int[] Range(int from) => [.. Enumerable.Range(from, _corners)];
    }

    /// <summary>Triangles, ends too.</summary>
    public IEnumerable<IReadOnlyList<int>> Triangles()
    {
        foreach (var quad in Sides().Concat(_isHollow ? new[] { 0, PerEnd }.SelectMany(Ring) : []))
        {
            yield return [quad[0], quad[1], quad[2]];
            yield return [quad[0], quad[2], quad[3]];
        }

        if (_isHollow) yield break;

        foreach (var end in new[] { 0, PerEnd })
            for (var i = 1; i + 1 < _corners; i++)
                yield return [end, end + i, end + i + 1];

        IEnumerable<int[]> Ring(int end) => Enumerable.Range(0, _corners).Select(i => (I: i, N: (i + 1) % _corners))
            .Select(e => new[] { end + e.I, end + e.N, end + _corners + e.N, end + _corners + e.I });
    }

    private IEnumerable<int[]> Sides()
    {
        for (var loop = 0; loop < (_isHollow ? 2 : 1); loop++)
            for (var i = 0; i < _corners; i++)
            {
                var (a, b) = (loop * _corners + i, loop * _corners + (i + 1) % _corners);
                yield return [a, b, b + PerEnd, a + PerEnd];
            }
    }

    private static IReadOnlyList<Vector3> Circle(double radius, int facets) => OutlineWriter.RegularPolygon(Vector3.Zero, radius, facets);

    private static IReadOnlyList<Vector3> Rounded(double width, double depth, double radius, int perCorner)
    {
        var points = new List<Vector3>();
        for (var corner = 0; corner < 4; corner++)
            for (var i = 0; i <= perCorner; i++)
            {
                var angle = Math.PI / 2 * (corner + (double)i / perCorner);
                var (u, v) = (corner is 0 or 3 ? 1 : -1, corner is 0 or 1 ? 1 : -1);
                points.Add(new Vector3(u * (width / 2 - radius) + radius * Math.Cos(angle), v * (depth / 2 - radius) + radius * Math.Sin(angle), 0));
            }

        return points;
    }
}
