using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Outlines;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>Finds rings of patches round an axis in a closed surface: their lines are edges along one direction, in convex order.</summary>
internal sealed class RingSearch(ClosedSurface surface)
{
    /// <summary>Most directions of edges that are tried, those along which most length runs first.</summary>
    public const int MaxDirections = 300;

    /// <summary>Largest sine of the angle between edges that count as parallel.</summary>
    private const double Parallel = 1e-3;

    /// <summary>Widest distance of edges on one line, over the ring's extent [-].</summary>
    private const double OneLine = 5e-4;

    /// <summary>All rings, whether sides or bores.</summary>
    public List<Ring> All()
    {
        var rings = new List<Ring>();
        foreach (var (axis, edges) in Directions())
        {
            rings.AddRange(Along(axis, edges, isBore: false));
            rings.AddRange(Along(axis, edges, isBore: true));
        }

        return rings;
    }

    private sealed class Bundle(Vector3 unit)
    {
        public Vector3 Unit { get; } = unit;

        public Vector3 Sum { get; set; }

        public List<SurfaceEdge> Edges { get; } = [];
    }

    private IEnumerable<(Vector3 Axis, List<SurfaceEdge> Edges)> Directions()
    {
        var bundles = new List<Bundle>();
        foreach (var (edge, along) in surface.Edges.Select(e => (Edge: e, Along: surface.Points[e.To] - surface.Points[e.From])).OrderByDescending(e => e.Along.Length))
        {
            if (!along.TryNormalize(out var unit)) continue;

            var bundle = bundles.Find(b => b.Unit.Cross(unit).Length < Parallel);
            if (bundle is null)
            {
                if (bundles.Count == MaxDirections) continue;
                bundles.Add(bundle = new Bundle(unit));
            }

            bundle.Sum += (bundle.Unit.Dot(along) < 0 ? -1 : 1) * along;
            bundle.Edges.Add(edge);
        }

        foreach (var bundle in bundles.Where(b => b.Edges.Count >= 3))
            if (bundle.Sum.TryNormalize(out var axis))
                yield return (axis, bundle.Edges);
    }

    private List<Ring> Along(Vector3 axis, List<SurfaceEdge> edges, bool isBore)
    {
        // The edge at which one bar meets the side of another is re-entrant, so it joins no two sides of one bar.
        var used = edges.FindAll(e => isBore ? e.Bend < ClosedSurface.Flat : e.Bend > -ClosedSurface.Flat);
        var index = new Dictionary<int, int>();
        foreach (var edge in used)
        {
            index.TryAdd(edge.Left, index.Count);
            index.TryAdd(edge.Right, index.Count);
        }

        var groups = new DisjointSets(index.Count);
        foreach (var edge in used) groups.Join(index[edge.Left], index[edge.Right]);

        var found = used.GroupBy(e => groups.Of(index[e.Left])).Select(g => Of(axis, [.. g], isBore)).OfType<Ring>().ToList();
        return Merged(found);
    }

    private sealed class LineBuilder(double u, double v)
    {
        private readonly List<(int Point, double U, double V, double Height)> _points = [];

        public bool IsNear(double atU, double atV, double within) => double.Hypot(atU - u, atV - v) <= within;

        public void Add(int point, double atU, double atV, double height) => _points.Add((point, atU, atV, height));

        public Ring.Line Build()
        {
            var (first, last) = (_points.MinBy(p => p.Height), _points.MaxBy(p => p.Height));
            return new Ring.Line(_points.Average(p => p.U), _points.Average(p => p.V), first.Point, last.Point, first.Height, last.Height, [.. _points.Select(p => p.Point)]);
        }

        public double Spread(Ring.Line line) => _points.Max(p => double.Hypot(p.U - line.U, p.V - line.V));
    }

    private Ring? Of(Vector3 axis, List<SurfaceEdge> edges, bool isBore)
    {
        if (edges.Count < 3) return null;

        _ = axis.Cross(Math.Abs(axis.X) < 0.9 ? Vector3.UnitX : Vector3.UnitY).TryNormalize(out var u);
        var v = axis.Cross(u);
        (double U, double V) Place(SurfaceEdge e)
        {
            var middle = 0.5 * (surface.Points[e.From] + surface.Points[e.To]);
            return (middle.Dot(u), middle.Dot(v));
        }

        var places = edges.ConvertAll(Place);
        var within = OneLine * Math.Max(places.Max(p => p.U) - places.Min(p => p.U), places.Max(p => p.V) - places.Min(p => p.V));
        var builders = new List<LineBuilder>();
        var ofPatch = new Dictionary<int, HashSet<int>>();
        for (var i = 0; i < edges.Count; i++)
        {
            var at = builders.FindIndex(b => b.IsNear(places[i].U, places[i].V, within));
            if (at < 0)
            {
                if (builders.Count == ClosedOutline.MaxEdges) return null;
                at = builders.Count;
                builders.Add(new LineBuilder(places[i].U, places[i].V));
            }

            foreach (var point in new[] { edges[i].From, edges[i].To })
                builders[at].Add(point, surface.Points[point].Dot(u), surface.Points[point].Dot(v), surface.Points[point].Dot(axis));
            foreach (var patch in new[] { edges[i].Left, edges[i].Right })
            {
                if (!ofPatch.TryGetValue(patch, out var lines)) ofPatch[patch] = lines = [];
                lines.Add(at);
            }
        }

        if (builders.Count < 3 || ofPatch.Values.Any(lines => lines.Count != 2)) return null;

        var built = builders.ConvertAll(b => b.Build());
        return Order(built, ofPatch.Values) is { } order
            ? new Ring(axis, u, isBore, [.. ofPatch.Keys.Order()], [.. order.Select(i => built[i])], built.Select((line, i) => builders[i].Spread(line)).Max())
            : null;
    }

    /// <summary>Lines round their middle; null unless each patch lies between neighbours and each two neighbours have a patch.</summary>
    private static List<int>? Order(List<Ring.Line> lines, IEnumerable<HashSet<int>> pairs)
    {
        var (u, v) = (lines.Average(l => l.U), lines.Average(l => l.V));
        List<int> order = [.. Enumerable.Range(0, lines.Count).OrderBy(i => Math.Atan2(lines[i].V - v, lines[i].U - u))];
        var place = new int[lines.Count];
        for (var i = 0; i < order.Count; i++) place[order[i]] = i;

        var isCovered = new bool[lines.Count];
        foreach (var pair in pairs)
        {
            var (a, b) = (place[pair.Min()], place[pair.Max()]);
            if ((a + 1) % lines.Count == b) isCovered[a] = true;
            else if ((b + 1) % lines.Count == a) isCovered[b] = true;
            else return null;
        }

        return Array.TrueForAll(isCovered, c => c) ? order : null;
    }

    /// <summary>Rings on the same lines that touch are one: faces may be cut across.</summary>
    private static List<Ring> Merged(List<Ring> rings)
    {
        for (var i = 0; i < rings.Count; i++)
            for (var k = i + 1; k < rings.Count; k++)
                if (Joined(rings[i], rings[k]) is { } one)
                {
                    rings[i] = one;
                    rings.RemoveAt(k);
                    k = i;
                }

        return rings;
    }

    private static Ring? Joined(Ring a, Ring b)
    {
        if (a.Lines.Length != b.Lines.Length) return null;

        var within = OneLine * a.Extent;
        var joined = ImmutableArray.CreateBuilder<Ring.Line>();
        var (touching, apart) = (0, 0.0);
        foreach (var line in a.Lines)
        {
            if (b.Lines.FirstOrDefault(l => double.Hypot(l.U - line.U, l.V - line.V) <= within) is not { } other) return null;

            if (line.Points.Overlaps(other.Points)) touching++;
            apart = Math.Max(apart, double.Hypot(other.U - line.U, other.V - line.V));
            var (first, last) = (line.From <= other.From ? line : other, line.To >= other.To ? line : other);
            joined.Add(new Ring.Line((line.U + other.U) / 2, (line.V + other.V) / 2, first.First, last.Last, first.From, last.To, line.Points.Union(other.Points)));
        }

        return touching == a.Lines.Length
            ? a with { Patches = [.. a.Patches.Union(b.Patches).Order()], Lines = joined.ToImmutable(), Spread = Math.Max(a.Spread, b.Spread) + apart / 2 }
            : null;
    }
}
