using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Outlines;

/// <summary>Any outline, with or without the surroundings of its re-entrant corners.</summary>
/// <remarks>
/// Edges: each edge as far as it decides, the edges of the zones around re-entrant corners, and creases that a shear solution
/// names. Inside: a raster, p and q being y and z; what falls outside is drawn to the nearest edge, what falls into a zone to the zone's edge.
/// </remarks>
internal sealed class ProfileOutline : Outline
{
    private const int RasterPoints = 700;
    private const int NodesPerPiece = 11;
    private const double LongestPerWall = 1.5;
    private const int FewestPieces = 2;
    private const int MostPieces = 40;
    private const double Hair = 1e-9;
    private readonly OutlineShape _shape;
    private readonly PatchMesh _mesh;
    private readonly bool _hasPeaks;
    private readonly Func<double, double, string> _name;
    private readonly (double Y, double Z) _fallback;

    /// <summary>The outline of a section.</summary>
    public ProfileOutline(
        CrossSection section, OutlineShape shape, PatchMesh mesh, bool hasPeaks, IEnumerable<EdgeCurve> creases, Func<double, double, string> name)
        : base(section)
    {
        (_shape, _mesh, _hasPeaks, _name) = (shape, mesh, hasPeaks, name);
        EdgeCurve[] pieces =
        [
            .. shape.Edges.SelectMany(Deciding).SelectMany(Short), .. hasPeaks ? shape.Corners.SelectMany(ZoneEdges).SelectMany(Kept) : [],
            .. creases.SelectMany(WithinMaterial),
        ];
        Edges = new Chart(Lattice.Curves(pieces.Length, NodesPerPiece, ring: false), (p, q) => pieces[(int)q].At(0.5 * (1 + (1 - Hair) * Math.Sin(p))));
        var raster = Raster(out _fallback);
        Inside = raster is null ? null : new Chart(raster, Inward);
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <inheritdoc/>
    public override Chart? Inside { get; }

    /// <summary>Arcs at the re-entrant corners that are rounded.</summary>
    public IEnumerable<EdgeCurve> Fillets => _shape.Corners.Where(corner => corner.IsFillet).Select(corner => corner.Curve);

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance) =>
        _shape.Contains(y, z) || _shape.NearestEdge(y, z).Distance <= tolerance;

    /// <inheritdoc/>
    public override bool Decides(double y, double z) => !_hasPeaks || !_shape.IsNearCorner(y, z, 10 * OnEdge * Extent);

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ)
    {
        var length = double.Hypot(directionY, directionZ);
        var (best, most) = ((0.0, 0.0), double.NegativeInfinity);
        foreach (var edge in _shape.Edges)
        {
            Offer(edge.At(0));
            if (!edge.IsArc) continue;
            var (y, z) = (edge.Centre.Y + edge.Radius * directionY / length, edge.Centre.Z + edge.Radius * directionZ / length);
            Offer(edge.At(edge.Nearest(y, z)));
        }

        return best;

        void Offer((double Y, double Z) at)
        {
            var reach = at.Y * directionY + at.Z * directionZ;
            if (reach > most) (best, most) = (at, reach);
        }
    }

    /// <inheritdoc/>
    public override int Rank(double y, double z) => _shape.NearestEdge(y, z).Distance <= 10 * OnEdge * Extent ? 1 : 3;

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces) => _name(y, z);

    /// <summary>The name of a place by what it lies on and where from the centroid that is.</summary>
    public static string PlainName(OutlineShape shape, double y, double z)
    {
        var tolerance = 1e-6 * shape.Extent;
        var towards = PlaceName.InsideTowards(y, z, tolerance)["inside, ".Length..];
        if (shape.NearestEdge(y, z).Distance > tolerance) return "inside, " + towards;

        var isCorner = shape.Edges.Any(edge => double.Hypot(edge.At(0).Y - y, edge.At(0).Z - z) <= tolerance);
        return (isCorner ? "corner, " : "edge, ") + towards;
    }

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature()
    {
        var rule = SpectralRule.Of(6);
        foreach (var patch in _mesh.Patches)
        {
            for (var i = 0; i < rule.QuadratureCount; i++)
            {
                for (var j = 0; j < rule.QuadratureCount; j++)
                {
                    var at = patch.Map(rule.QuadratureAt[i], rule.QuadratureAt[j]);
                    var area = rule.QuadratureWeights[i] * rule.QuadratureWeights[j] * Math.Abs(at.Determinant);
                    yield return (at.Y, at.Z, area);
                    if (!_mesh.IsQuarter) continue;

                    yield return (-at.Y, at.Z, area);
                    yield return (-at.Y, -at.Z, area);
                    yield return (at.Y, -at.Z, area);
                }
            }
        }
    }

    // The stretches of an edge that decide.
    private IEnumerable<EdgeCurve> Deciding(EdgeCurve edge) => Stretches(edge, share => Decides(edge.At(share).Y, edge.At(share).Z));

    private IEnumerable<EdgeCurve> WithinMaterial(EdgeCurve line) => Stretches(line, share => _shape.Contains(line.At(share).Y, line.At(share).Z));

    // A field changes along an edge over lengths of the wall's thickness; the hand calculation does not.
    private IEnumerable<EdgeCurve> Short(EdgeCurve edge)
    {
        var count = _hasPeaks ? (int)Math.Clamp(Math.Ceiling(edge.Length / (LongestPerWall * _shape.Thickness(edge, 0.5))), FewestPieces, MostPieces) : FewestPieces;
        for (var k = 0; k < count; k++) yield return edge.Piece((double)k / count, (double)(k + 1) / count);
    }

    // The stretches of a zone's edge that lie in the material and in no other zone.
    private IEnumerable<EdgeCurve> Kept(EdgeCurve edge) => Stretches(edge, share =>
        _shape.Contains(edge.At(share).Y, edge.At(share).Z) && Decides(edge.At(share).Y, edge.At(share).Z));

    private static IEnumerable<EdgeCurve> Stretches(EdgeCurve edge, Func<double, bool> holds)
    {
        const int Samples = 64;

        var start = -1.0;
        for (var k = 0; k <= Samples; k++)
        {
            var share = k / (double)Samples;
            if (holds(share) == start >= 0)
            {
                if (k == Samples && start >= 0) yield return edge.Piece(start, 1);
                continue;
            }

            if (start < 0)
            {
                start = k == 0 ? 0 : Turn(share - 1.0 / Samples, share);
                if (k == Samples) yield break;
            }
            else
            {
                yield return edge.Piece(start, Turn(share, share - 1.0 / Samples));
                start = -1;
            }
        }

        // The share next to the first that holds, on its side.
        double Turn(double not, double does)
        {
            for (var step = 0; step < 50; step++)
            {
                var middle = 0.5 * (not + does);
                if (holds(middle)) does = middle;
                else not = middle;
            }

            return does;
        }
    }

    private static IEnumerable<EdgeCurve> ZoneEdges(ReentrantCorner corner)
    {
        var reach = corner.Reach;
        if (!corner.IsFillet)
        {
            for (var k = 0; k < 4; k++) yield return EdgeCurve.Arc(corner.Curve.At(0), reach, k * Math.PI / 2, (k + 1) * Math.PI / 2);
            yield break;
        }

        var arc = corner.Curve;
        foreach (var end in new[] { 0.0, 1.0 })
        {
            for (var k = 0; k < 4; k++) yield return EdgeCurve.Arc(arc.At(end), reach, k * Math.PI / 2, (k + 1) * Math.PI / 2);
        }

        var first = arc.At(0);
        var from = Math.Atan2(first.Z - arc.Centre.Z, first.Y - arc.Centre.Y);
        yield return EdgeCurve.Arc(arc.Centre, arc.Radius + reach, from, from + arc.Sweep);
    }

    private (double Y, double Z) Inward(double p, double q)
    {
        var (y, z) = (p, q);
        if (!_shape.Contains(y, z)) (y, z) = _shape.NearestEdge(y, z).At;
        for (var pass = 0; pass < 3 && !Decides(y, z); pass++)
        {
            var corner = _shape.Corners.MinBy(c => c.Distance(y, z) - c.Reach);
            var foot = corner.Curve.At(corner.Curve.Nearest(y, z));
            var distance = double.Hypot(y - foot.Y, z - foot.Z);
            if (distance == 0) return _fallback;
            (y, z) = (foot.Y + corner.Reach / distance * (y - foot.Y), foot.Z + corner.Reach / distance * (z - foot.Z));
            if (!_shape.Contains(y, z)) (y, z) = _shape.NearestEdge(y, z).At;
        }

        return Decides(y, z) ? (y, z) : _fallback;
    }

    private Lattice? Raster(out (double Y, double Z) first)
    {
        var (area, width, depth) = (Quadrature().Sum(point => point.Area), _shape.LargestY - _shape.LeastY, _shape.LargestZ - _shape.LeastZ);
        var pitch = Math.Sqrt(area / RasterPoints);
        var (countY, countZ) = ((int)(width / pitch) + 1, (int)(depth / pitch) + 1);
        var (pitchY, pitchZ) = (width / countY, depth / countZ);
        var (numbers, p, q) = (new Dictionary<(int, int), int>(), ImmutableArray.CreateBuilder<double>(), ImmutableArray.CreateBuilder<double>());
        for (var i = 0; i < countY; i++)
        {
            for (var j = 0; j < countZ; j++)
            {
                var (y, z) = (_shape.LeastY + (i + 0.5) * pitchY, _shape.LeastZ + (j + 0.5) * pitchZ);
                if (!_shape.Contains(y, z) || !Decides(y, z)) continue;
                numbers[(i, j)] = p.Count;
                p.Add(y);
                q.Add(z);
            }
        }

        first = p.Count > 0 ? (p[0], q[0]) : default;
        if (p.Count == 0) return null;

        var neighbours = ImmutableArray.CreateBuilder<int>();
        foreach (var (i, j) in numbers.Keys)
        {
            for (var k = 0; k < 9; k++)
                if (k != 4) neighbours.Add(numbers.GetValueOrDefault((i + k / 3 - 1, j + k % 3 - 1), -1));
        }

        return new Lattice(p.ToImmutable(), q.ToImmutable(), neighbours.ToImmutable(), pitchY, pitchZ);
    }
}
