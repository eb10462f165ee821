using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Outlines;

/// <summary>A rectangular tube: its two edges, each in the pieces of <see cref="RoundedCorner"/>, and creases inside each corner.</summary>
/// <remarks>
/// Creases exist where the inner corner is sharper than the middle line allows for, so that the centre of the middle line's corner arc
/// lies in the material: the diagonal from that centre to the inner edge, where points change from one wall to the other (so it is
/// walked on both sides), and a minute arc about the centre itself, which is nearest to all of the middle line's arc at once. Else
/// all three shrink to a point of the inner edge.
/// </remarks>
internal sealed class BoxOutline : Outline
{
    private static readonly Lattice s_lattice = Lattice.Curves(2 * RoundedCorner.Pieces + 12, RoundedCorner.NodesPerPiece, ring: false);

    private readonly double _halfWidth;
    private readonly double _halfDepth;
    private readonly double _wall;
    private readonly double _outerRadius;
    private readonly double _innerRadius;

    /// <summary>The outline of a box.</summary>
    public BoxOutline(Box section)
        : base(section)
    {
        (_halfWidth, _halfDepth, _wall) = (section.Width / 2, section.Depth / 2, section.Wall);
        (_outerRadius, _innerRadius) = (section.OuterRadius, section.InnerRadius);
        // A sharp middle line turns at once: beyond it the stress of the outer face stays as in the corner, which is a piece of its own.
        var shortBy = _outerRadius == 0 && _innerRadius == 0 ? _wall / 2 : 0;
        Edges = new Chart(s_lattice, (p, q) => (int)q switch
        {
            < RoundedCorner.Pieces => RoundedCorner.OnPiece(_halfWidth, _halfDepth, _outerRadius, shortBy, (int)q, p),
            < 2 * RoundedCorner.Pieces => RoundedCorner.OnPiece(
                _halfWidth - _wall, _halfDepth - _wall, _innerRadius, 0, (int)q - RoundedCorner.Pieces, p),
            var piece => OnCrease(piece % 4, (piece - 2 * RoundedCorner.Pieces) / 4, p),
        });
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <summary>None: no shear solution of a box needs it.</summary>
    public override Chart? Inside => null;

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
        var (outerBend, innerBend) = (Math.Atan(1 - _outerRadius / block), Math.Atan(1 - _innerRadius / Math.Max(block - _wall, 1e-300)));
        double[] bends = [0, Math.Min(outerBend, innerBend), Math.Max(outerBend, innerBend), Math.PI / 4, 0, 0, Math.PI / 2];
        (bends[4], bends[5]) = (Math.PI / 2 - bends[2], Math.PI / 2 - bends[1]);
        foreach (var (u, wu) in GaussLegendre.UnitInterval)
        {
            foreach (var (v, wv) in GaussLegendre.UnitInterval)
            {
                foreach (var (signY, signZ) in RoundedCorner.Quadrants)
                {
                    yield return (signY * u * flatY, signZ * (_halfDepth - _wall * v), wu * wv * flatY * _wall);
                    yield return (signY * (_halfWidth - _wall * v), signZ * u * flatZ, wu * wv * flatZ * _wall);
                    for (var panel = 1; panel < bends.Length; panel++)
                    {
                        var sweep = bends[panel] - bends[panel - 1];
                        var angle = bends[panel - 1] + sweep * u;
                        var inner = ToArc(angle, block - _wall, _innerRadius);
                        var outer = ToArc(angle, block, _outerRadius);
                        var ray = inner + (outer - inner) * v;
                        yield return (
                            signY * (flatY + ray * Math.Cos(angle)), signZ * (flatZ + ray * Math.Sin(angle)),
                            wu * wv * sweep * (outer - inner) * ray);
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

    // Kind 0 the minute arc, 1 and 2 the diagonal a hair to either side.
    private (double Y, double Z) OnCrease(int corner, int kind, double p)
    {
        var inner = _wall + _innerRadius * (1 - Math.Sqrt(0.5));                   // distances from the outer sides
        var centre = Math.Min(inner, 0.5 * (_wall + _outerRadius + _innerRadius));
        var hair = centre < inner ? 1e-7 * _wall : 0;
        var share = 0.5 * (1 + Math.Sin(p));
        var inset = kind == 0 ? centre : centre + (inner - centre) * share;
        var (sin, cos) = kind == 0 ? Math.SinCos(Math.PI / 2 * share) : (kind - 1, 2 - kind);
        var (signY, signZ) = RoundedCorner.Quadrants[corner];
        return (signY * (_halfWidth - inset + hair * cos), signZ * (_halfDepth - inset + hair * sin));
    }

    private double BeyondOuter(double y, double z) => RoundedCorner.Beyond(_halfWidth, _halfDepth, _outerRadius, y, z);

    private double BeyondInner(double y, double z) =>
        RoundedCorner.Beyond(_halfWidth - _wall, _halfDepth - _wall, _innerRadius, y, z);
}
