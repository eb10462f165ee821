using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Outlines;

/// <summary>The two edges of a rectangular tube. Chart: q numbers their sixteen pieces, sin p runs along one from −1 to 1.</summary>
/// <remarks>
/// Edges are enough: across the wall the shear stress of the elementary model is constant and σ is linear, so every measure is convex
/// there and largest at an end.
/// </remarks>
internal sealed class BoxOutline(Box section) : Outline(section, s_lattice)
{
    private const int Pieces = 16;
    private const int NodesPerPiece = 17;
    private static readonly Lattice s_lattice = Lattice.Grid(
        Lattice.Even(0, Pieces - 1, Pieces), Lattice.Even(-Math.PI / 2, Math.PI / 2, NodesPerPiece), ring: false, curves: true);

    private readonly double _halfWidth = section.Width / 2;
    private readonly double _halfDepth = section.Depth / 2;
    private readonly double _wall = section.Wall;
    private readonly double _outerRadius = section.OuterRadius;
    private readonly double _innerRadius = section.InnerRadius;

    /// <inheritdoc/>
    public override (double Y, double Z) Map(double p, double q)
    {
        var piece = (int)q;
        var inward = piece < 8 ? 0 : _wall;
        var radius = piece < 8 ? _outerRadius : _innerRadius;
        var (halfY, halfZ) = (_halfWidth - inward, _halfDepth - inward);
        var share = Math.Sin(p);
        switch (piece % 8)
        {
            case 0: return ((halfY - radius) * share, halfZ);
            case 1: return ((halfY - radius) * share, -halfZ);
            case 2: return (halfY, (halfZ - radius) * share);
            case 3: return (-halfY, (halfZ - radius) * share);
            default:
                var (signY, signZ) = RoundedCorner.Quadrants[piece % 4];
                var (sin, cos) = Math.SinCos(Math.PI / 4 * (1 + share));
                return (signY * (halfY - radius + radius * cos), signZ * (halfZ - radius + radius * sin));
        }
    }

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance) =>
        BeyondOuter(y, z) <= tolerance && BeyondInner(y, z) >= -tolerance;

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ) =>
        RoundedCorner.Farthest(_halfWidth, _halfDepth, _outerRadius, directionY, directionZ);

    /// <inheritdoc/>
    public override bool TryFarthestInside(double directionY, double directionZ, out (double Y, double Z) point)
    {
        point = RoundedCorner.Farthest(_halfWidth - _wall, _halfDepth - _wall, _innerRadius, directionY, directionZ);
        return true;
    }

    /// <inheritdoc/>
    public override int Rank(double y, double z)
    {
        var outer = RoundedCorner.Rank(_halfWidth, _halfDepth, _outerRadius, y, z, OnEdge * Extent);
        return outer < 3 ? outer : BeyondInner(y, z) <= OnEdge * Extent ? 2 : 3;
    }

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces)
    {
        var tolerance = 1e-6 * Extent;
        if (PlaceName.OnRectangle(y, z, _halfWidth, _halfDepth, _outerRadius, forces, tolerance) is { } outer) return outer;

        return Math.Abs(BeyondInner(y, z)) <= tolerance
            ? PlaceName.OnInnerRectangle(y, z, _halfWidth - _wall, _halfDepth - _wall, _innerRadius, tolerance)
            : PlaceName.InsideTheWall(y, z);
    }

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature()
    {
        // Four straight walls, and four corner blocks swept by rays from the block's own inner corner.
        var block = Math.Max(_outerRadius, _wall + _innerRadius);
        var (flatY, flatZ) = (_halfWidth - block, _halfDepth - block);
        foreach (var (u, wu) in GaussLegendre.UnitInterval)
        {
            foreach (var (v, wv) in GaussLegendre.UnitInterval)
            {
                foreach (var (signY, signZ) in RoundedCorner.Quadrants)
                {
                    yield return (signY * u * flatY, signZ * (_halfDepth - _wall * v), wu * wv * flatY * _wall);
                    yield return (signY * (_halfWidth - _wall * v), signZ * u * flatZ, wu * wv * flatZ * _wall);
                    for (var half = 0; half < 2; half++)
                    {
                        var angle = Math.PI / 4 * (half + u);
                        var inner = ToArc(angle, block - _wall, _innerRadius);
                        var outer = ToArc(angle, block, _outerRadius);
                        var ray = inner + (outer - inner) * v;
                        yield return (
                            signY * (flatY + ray * Math.Cos(angle)), signZ * (flatZ + ray * Math.Sin(angle)),
                            wu * wv * Math.PI / 4 * (outer - inner) * ray);
                    }
                }
            }
        }
    }

    // Length of a ray from the corner of a square of the given side to its opposite corner's edge, rounded by the radius.
    private static double ToArc(double angle, double side, double radius)
    {
        var (sin, cos) = Math.SinCos(angle);
        var straight = side / Math.Max(sin, cos);
        var centre = side - radius;
        if (radius == 0 || straight * Math.Min(sin, cos) <= centre) return straight;

        var along = centre * (cos + sin);
        return along + Math.Sqrt(Math.Max(0, along * along - 2 * centre * centre + radius * radius));
    }

    private double BeyondOuter(double y, double z) => RoundedCorner.Beyond(_halfWidth, _halfDepth, _outerRadius, y, z);

    private double BeyondInner(double y, double z) =>
        RoundedCorner.Beyond(_halfWidth - _wall, _halfDepth - _wall, _innerRadius, y, z);
}
