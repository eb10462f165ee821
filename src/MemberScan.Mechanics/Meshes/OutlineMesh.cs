using MemberScan.Mechanics.Edges;
using NetTopologySuite.Geometries;
using NetTopologySuite.Triangulate;

namespace MemberScan.Mechanics.Meshes;

/// <summary>Patches of any outline: a Delaunay triangulation that keeps the edges, each triangle cut into three patches.</summary>
/// <remarks>
/// The edges are cut in pieces of the size of the wall, finer towards sharp re-entrant corners; points of rings around those and of a
/// raster fill the inside. Where a piece of an edge is no side of the triangulation it is halved, until all are. Triangles along
/// an arc have the arc for a side. Triangulation: NetTopologySuite.
/// </remarks>
internal sealed class OutlineMesh
{
    private const double SizePerWall = 1.4;
    private const double LargestSize = 0.35;
    private const double Finest = 0.08;
    private const double GrowthFromCorner = 1.5;
    private const double LargestSweep = Math.PI / 6;
    private const int MostRounds = 12;
    private const int MostEdgePoints = 600;
    private readonly OutlineShape _shape;
    private readonly List<(double Y, double Z)> _points = [];
    private readonly Dictionary<(double, double), int> _numbers = [];
    private readonly Dictionary<(int, int), EdgeCurve> _sides = [];

    private OutlineMesh(OutlineShape shape) => _shape = shape;

    /// <summary>The mesh of a shape; null where it would be too large, or the triangulation does not keep the edges.</summary>
    public static PatchMesh? TryOf(OutlineShape shape) => new OutlineMesh(shape).Build();

    private PatchMesh? Build()
    {
        foreach (var edge in _shape.Edges)
        {
            CutEdge(edge);
            if (_points.Count > MostEdgePoints) return null;
        }

        var onEdges = _points.Count;
        AddInside(onEdges);
        for (var round = 0; round < MostRounds; round++)
        {
            var triangles = Triangulate();
            var present = triangles.SelectMany(t => new[] { (t.A, t.B), (t.B, t.C), (t.C, t.A) }).ToHashSet();
            var missing = _sides.Keys.Where(side => !present.Contains(side) && !present.Contains((side.Item2, side.Item1))).ToArray();
            if (missing.Length == 0) return new PatchMesh([.. triangles.Where(IsInside).SelectMany(Patches)], false, 0.5 * _shape.Extent);

            foreach (var side in missing) Halve(side);
        }

        return null;
    }

    private void CutEdge(EdgeCurve edge)
    {
        const int Samples = 96;

        // Pieces of equal share of ∫ds/size.
        var sum = new double[Samples + 1];
        for (var k = 1; k <= Samples; k++) sum[k] = sum[k - 1] + edge.Length / Samples / SizeAt(edge, (k - 0.5) / Samples);
        var count = (int)Math.Ceiling(Math.Max(Math.Min(sum[^1], MostEdgePoints + 1), edge.IsArc ? Math.Abs(edge.Sweep) / LargestSweep : 1) - 1e-6);
        var cuts = new List<double> { 0 };
        for (var (k, piece) = (1, 1); piece < count; piece++)
        {
            while (sum[k] < sum[^1] * piece / count) k++;
            cuts.Add((k - 1 + (sum[^1] * piece / count - sum[k - 1]) / (sum[k] - sum[k - 1])) / Samples);
        }

        cuts.Add(1);
        for (var k = 1; k < cuts.Count; k++)
        {
            var piece = edge.Piece(cuts[k - 1], cuts[k]);
            _sides[(Number(piece.At(0)), Number(piece.At(1)))] = piece;
        }
    }

    private double SizeAt(EdgeCurve edge, double share)
    {
        var (y, z) = edge.At(share);
        var size = Math.Min(SizePerWall * _shape.Thickness(edge, share), LargestSize * _shape.Extent);
        foreach (var corner in _shape.Corners)
        {
            // A fillet is as fine as itself, a sharp corner ever finer.
            var finest = corner.IsFillet ? 0.8 * corner.Curve.Radius : Finest * 2 * corner.Reach;
            size = Math.Min(size, Math.Max(finest, GrowthFromCorner * corner.Distance(y, z)));
        }

        return size;
    }

    private void AddInside(int onEdges)
    {
        foreach (var corner in _shape.Corners)
        {
            // Sides along a fillet bulge inwards: points close to it would fold the patches.
            if (corner.IsFillet) continue;

            var wall = 2 * corner.Reach;
            var (cy, cz) = corner.Curve.At(0.5);
            for (var radius = Finest * wall; radius < 0.6 * wall; radius *= 1 + GrowthFromCorner)
            {
                for (var k = 0; k < 8; k++)
                {
                    var (sin, cos) = Math.SinCos(Math.PI / 4 * (k + 0.5));
                    Offer(cy + radius * cos, cz + radius * sin, 0.35 * radius, onEdges);
                }
            }
        }

        var pitch = LargestSize * _shape.Extent;
        var (countY, countZ) = ((int)((_shape.LargestY - _shape.LeastY) / pitch) + 1, (int)((_shape.LargestZ - _shape.LeastZ) / pitch) + 1);
        for (var i = 0; i < countY; i++)
            for (var j = 0; j < countZ; j++)
                Offer(_shape.LeastY + (i + 0.5) * (_shape.LargestY - _shape.LeastY) / countY, _shape.LeastZ + (j + 0.5) * (_shape.LargestZ - _shape.LeastZ) / countZ, 0.3 * pitch, onEdges);
    }

    // A point inside that keeps a distance from the edges and from the other points inside.
    private void Offer(double y, double z, double distance, int onEdges)
    {
        if (!_shape.Contains(y, z) || _shape.NearestEdge(y, z).Distance < distance) return;

        for (var i = 0; i < _points.Count; i++)
            if (double.Hypot(_points[i].Y - y, _points[i].Z - z) < (i < onEdges ? 0.5 : 1) * distance) return;
        Number((y, z));
    }

    private void Halve((int From, int To) side)
    {
        var piece = _sides[side];
        _sides.Remove(side);
        var middle = Number(piece.At(0.5));
        _sides[(side.From, middle)] = piece.Piece(0, 0.5);
        _sides[(middle, side.To)] = piece.Piece(0.5, 1);
    }

    private int Number((double Y, double Z) at)
    {
        // Ends of pieces that meet differ by rounding only.
        var tolerance = 1e-9 * _shape.Extent;
        var key = (Math.Round(at.Y / tolerance), Math.Round(at.Z / tolerance));
        foreach (var (dy, dz) in new[] { (0, 0), (1, 0), (-1, 0), (0, 1), (0, -1), (1, 1), (-1, -1), (1, -1), (-1, 1) })
            if (_numbers.TryGetValue((key.Item1 + dy, key.Item2 + dz), out var known)) return known;
        _numbers[key] = _points.Count;
        _points.Add(at);
        return _points.Count - 1;
    }

    private List<Triangle> Triangulate()
    {
        var builder = new DelaunayTriangulationBuilder();
        // In units of the extent, so that the tolerances of the triangulation fit.
        var places = new Dictionary<(double, double), int>();
        for (var i = 0; i < _points.Count; i++) places[(_points[i].Y / _shape.Extent, _points[i].Z / _shape.Extent)] = i;
        builder.SetSites(places.Keys.Select(p => new Coordinate(p.Item1, p.Item2)).ToArray());
        var found = builder.GetTriangles(new GeometryFactory());
        var triangles = new List<Triangle>(found.NumGeometries);
        for (var k = 0; k < found.NumGeometries; k++)
        {
            var ring = found.GetGeometryN(k).Coordinates;
            var (a, b, c) = (places[(ring[0].X, ring[0].Y)], places[(ring[1].X, ring[1].Y)], places[(ring[2].X, ring[2].Y)]);
            var area = Cross(a, b, c);
            if (Math.Abs(area) > 1e-12 * _shape.Extent * _shape.Extent) triangles.Add(area > 0 ? new Triangle(a, b, c) : new Triangle(a, c, b));
        }

        return triangles;
    }

    private double Cross(int a, int b, int c) =>
        (_points[b].Y - _points[a].Y) * (_points[c].Z - _points[a].Z) - (_points[b].Z - _points[a].Z) * (_points[c].Y - _points[a].Y);

    // By the polygon of the pieces' chords, which is what the triangles fill.
    private bool IsInside(Triangle triangle)
    {
        var (y, z) = Centre(triangle);
        var inside = false;
        foreach (var (from, to) in _sides.Keys)
        {
            var (p, q) = (_points[from], _points[to]);
            if (p.Z > z != q.Z > z && y < p.Y + (z - p.Z) / (q.Z - p.Z) * (q.Y - p.Y)) inside = !inside;
        }

        return inside;
    }

    private (double Y, double Z) Centre(Triangle t) => (
        (_points[t.A].Y + _points[t.B].Y + _points[t.C].Y) / 3, (_points[t.A].Z + _points[t.B].Z + _points[t.C].Z) / 3);

    private IEnumerable<Patch> Patches(Triangle t)
    {
        EdgeCurve[] sides = [Side(t.A, t.B), Side(t.B, t.C), Side(t.C, t.A)];
        var (middles, centre) = (sides.Select(side => side.At(0.5)).ToArray(), (Y: 0.0, Z: 0.0));
        foreach (var (y, z) in middles) centre = (centre.Y + y / 3, centre.Z + z / 3);
        for (var k = 0; k < 3; k++)
        {
            var before = (k + 2) % 3;
            yield return Patch.Blended(
                sides[k].Piece(0, 0.5), EdgeCurve.Line(middles[before], centre),
                sides[before].Piece(1, 0.5), EdgeCurve.Line(middles[k], centre));
        }
    }

    private EdgeCurve Side(int from, int to) => _sides.TryGetValue((from, to), out var piece)
        ? piece
        : _sides.TryGetValue((to, from), out var back) ? back.Reversed() : EdgeCurve.Line(_points[from], _points[to]);

    private readonly record struct Triangle(int A, int B, int C);
}
