using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Outlines;

/// <summary>A full rectangle with sharp or rounded corners.</summary>
/// <remarks>
/// Inside: <c>z = (h/2)·sin q</c>, <c>y = w(z)·sin p</c>, w half the width at z. Edges: the pieces of <see cref="RoundedCorner"/>.
/// </remarks>
internal sealed class RectangleOutline : Outline
{
    private const int Lines = 25;
    private static readonly Lattice s_sharp = Lattice.Curves(RoundedCorner.Sides, RoundedCorner.NodesPerPiece, ring: false);
    private static readonly Lattice s_rounded = Lattice.Curves(RoundedCorner.Pieces, RoundedCorner.NodesPerPiece, ring: false);
    private static readonly Lattice s_inside = Lattice.Grid(
        Lattice.Even(-Math.PI / 2, Math.PI / 2, Lines), Lattice.Even(-Math.PI / 2, Math.PI / 2, Lines), ring: false);

    private readonly double _halfWidth;
    private readonly double _halfDepth;
    private readonly double _radius;

    /// <summary>The outline of a section by width, depth and corner radius [m].</summary>
    public RectangleOutline(CrossSection section, double width, double depth, double radius)
        : base(section)
    {
        (_halfWidth, _halfDepth, _radius) = (width / 2, depth / 2, radius);
        Edges = new Chart(radius > 0 ? s_rounded : s_sharp, (p, piece) => RoundedCorner.OnPiece(_halfWidth, _halfDepth, _radius, 0, (int)piece, p));
        Inside = new Chart(s_inside, (p, q) =>
        {
            var z = _halfDepth * Math.Sin(q);
            return (HalfWidthAt(Math.Abs(z)) * Math.Sin(p), z);
        });
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <inheritdoc/>
    public override Chart Inside { get; }

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance) =>
        RoundedCorner.Contains(_halfWidth, _halfDepth, _radius, y, z, tolerance);

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ) =>
        RoundedCorner.Farthest(_halfWidth, _halfDepth, _radius, directionY, directionZ);

    /// <inheritdoc/>
    public override int Rank(double y, double z) => RoundedCorner.Rank(_halfWidth, _halfDepth, _radius, y, z, OnEdge * Extent);

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces)
    {
        var tolerance = 1e-6 * Extent;
        if (PlaceName.OnRectangle(y, z, _halfWidth, _halfDepth, _radius, forces, tolerance) is { } name) return name;

        return double.Hypot(y, z) <= tolerance ? PlaceName.Centre : PlaceName.InsideTowards(y, z, tolerance);
    }

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature()
    {
        var (flatY, flatZ) = (_halfWidth - _radius, _halfDepth - _radius);
        foreach (var (y, dy) in Panels(flatY, _halfDepth))
        {
            foreach (var (z, dz) in Panels(flatZ, _halfWidth))
            {
                foreach (var (signY, signZ) in RoundedCorner.Quadrants) yield return (signY * y, signZ * z, dy * dz);
            }
        }

        if (_radius == 0) yield break;

        foreach (var (v, wv) in GaussLegendre.UnitInterval)
        {
            foreach (var (signY, signZ) in RoundedCorner.Quadrants)
            {
                foreach (var (y, dy) in Panels(flatY, _halfDepth)) yield return (signY * y, signZ * (flatZ + v * _radius), dy * wv * _radius);
                foreach (var (z, dz) in Panels(flatZ, _halfWidth)) yield return (signY * (flatY + v * _radius), signZ * z, dz * wv * _radius);

                // Quarter circle in strips: angle from the corner's horizontal, so that the strip's length is smooth.
                var (sin, cos) = Math.SinCos(v * Math.PI / 2);
                foreach (var (u, wu) in GaussLegendre.UnitInterval)
                {
                    yield return (
                        signY * (flatY + u * _radius * cos), signZ * (flatZ + _radius * sin),
                        wu * wv * Math.PI / 2 * _radius * _radius * cos * cos);
                }
            }
        }
    }

    // A half side from its end inwards: the stresses of a flat bar change within some thicknesses of its ends.
    private static IEnumerable<(double At, double Length)> Panels(double half, double otherHalf)
    {
        var from = 0.0;
        foreach (var to in new[] { Math.Min(half, 2 * otherHalf), Math.Min(half, 10 * otherHalf), half })
        {
            if (to <= from) continue;
            foreach (var (u, weight) in GaussLegendre.UnitInterval) yield return (half - from - (to - from) * u, weight * (to - from));
            from = to;
        }
    }

    private double HalfWidthAt(double level)
    {
        var rise = level - (_halfDepth - _radius);
        return rise <= 0 ? _halfWidth : _halfWidth - _radius + Math.Sqrt(Math.Max(0, (_radius - rise) * (_radius + rise)));
    }
}
