using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Outlines;

/// <summary>A rectangular tube for a field that has peaks at the inner corners: what lies in <see cref="ReentrantZone"/> is left out.</summary>
/// <remarks>
/// Edges: the outer edge, the inner sides as far as the zones, and the edges of the zones, an arc with a cap at either end.
/// Inside: p runs around the wall from +y, three pieces a quadrant; sin q from −1 at the inner edge to 1 at the outer one; a
/// point that falls into a zone is moved out of it, away from the hole.
/// </remarks>
internal sealed class BoxFieldOutline : Outline
{
    private const int Columns = 48;
    private const int Lines = 7;
    private const int InnerSides = RoundedCorner.Pieces;
    private const int Arcs = InnerSides + RoundedCorner.Sides;
    private const int Caps = Arcs + 4;
    private const int Count = Caps + 8;
    private static readonly Lattice s_edges = Lattice.Curves(Count, RoundedCorner.NodesPerPiece, ring: false);
    private static readonly Lattice s_inside = Lattice.Grid(
        Lattice.Even(-Math.PI / 2, Math.PI / 2, Lines), Lattice.Even(0, 2 * Math.PI, Columns + 1).AsSpan(0, Columns), ring: true);

    private readonly Box _section;
    private readonly BoxOutline _whole;
    private readonly double _halfWidth;
    private readonly double _halfDepth;
    private readonly double _holeY;
    private readonly double _holeZ;
    private readonly double _reach;

    /// <summary>The outline of a box.</summary>
    public BoxFieldOutline(Box section)
        : base(section)
    {
        (_section, _whole) = (section, new BoxOutline(section));
        (_halfWidth, _halfDepth) = (section.Width / 2, section.Depth / 2);
        (_holeY, _holeZ) = (_halfWidth - section.Wall, _halfDepth - section.Wall);
        _reach = ReentrantZone.ReachOf(section);
        Edges = new Chart(s_edges, (p, q) => OnEdgePiece((int)q, p));
        Inside = new Chart(s_inside, AcrossTheWall);
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <inheritdoc/>
    public override Chart Inside { get; }

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance) => _whole.Contains(y, z, tolerance);

    /// <inheritdoc/>
    public override bool Decides(double y, double z) => ReentrantZone.Inset(_section, y, z) >= _reach - OnEdge * Extent;

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ) => _whole.Farthest(directionY, directionZ);

    /// <inheritdoc/>
    public override int Rank(double y, double z) => _whole.Rank(y, z);

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces) => _whole.NameOf(y, z, forces);

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature() => _whole.Quadrature();

    private (double Y, double Z) OnEdgePiece(int piece, double p)
    {
        if (piece < InnerSides) return RoundedCorner.OnPiece(_halfWidth, _halfDepth, _section.OuterRadius, 0, piece, p);

        var radius = _section.InnerRadius;
        if (piece < Arcs)
        {
            var share = Math.Sin(p);
            var (flatY, flatZ) = (Math.Max(0, _holeY - radius - _reach), Math.Max(0, _holeZ - radius - _reach));
            return (piece - InnerSides) switch
            {
                0 => Moved(flatY * share, _holeZ),
                1 => Moved(flatY * share, -_holeZ),
                2 => Moved(_holeY, flatZ * share),
                _ => Moved(-_holeY, flatZ * share),
            };
        }

        if (piece < Caps)
            return RoundedCorner.OnPiece(_holeY + _reach, _holeZ + _reach, radius + _reach, 0, piece - Arcs + RoundedCorner.Sides, p);

        var (signY, signZ) = RoundedCorner.Quadrants[(piece - Caps) % 4];
        var overTop = piece < Caps + 4;
        var straight = (overTop ? _holeY : _holeZ) - radius;
        // From the inner side, or from the axis where the zones of two corners meet, to square over the arc's end.
        var from = straight < _reach ? Math.Acos(straight / _reach) : 0;
        var (sin, cos) = Math.SinCos(from + (Math.PI / 2 - from) * 0.5 * (1 + Math.Sin(p)));
        var (along, rise) = (Math.Max(0, straight - _reach * cos), _reach * sin);
        return overTop ? (signY * along, signZ * (_holeZ + rise)) : (signY * (_holeY + rise), signZ * along);
    }

    private (double Y, double Z) AcrossTheWall(double p, double q)
    {
        const int PiecesPerQuadrant = 3;

        var turns = p / (Math.PI / 2);
        var quadrant = Math.Floor(turns);
        var (odd, at) = ((long)quadrant % 2 != 0, PiecesPerQuadrant * (turns - quadrant));
        // Quadrants 0 to 3 as signs; in odd ones the way leads from the z axis, so the walk is turned around.
        var (signY, signZ) = RoundedCorner.Quadrants[(int)(((long)quadrant % 4 + 4) % 4)];
        if (odd) at = PiecesPerQuadrant - at;
        var outer = OnQuadrant(_halfWidth, _halfDepth, _section.OuterRadius, at);
        var inner = OnQuadrant(_holeY, _holeZ, _section.InnerRadius, at);
        var share = 0.5 * (1 + Math.Sin(q));
        return Moved(signY * (inner.Y * (1 - share) + outer.Y * share), signZ * (inner.Z * (1 - share) + outer.Z * share));
    }

    // 0 on the y axis, 1 and 2 at the ends of the corner, 3 on the z axis.
    private static (double Y, double Z) OnQuadrant(double halfWidth, double halfDepth, double radius, double at)
    {
        if (at <= 1) return (halfWidth, at * (halfDepth - radius));
        if (at >= 2) return ((3 - at) * (halfWidth - radius), halfDepth);

        var (sin, cos) = Math.SinCos(Math.PI / 2 * (at - 1));
        return (halfWidth - radius + radius * cos, halfDepth - radius + radius * sin);
    }

    private (double Y, double Z) Moved(double y, double z)
    {
        if (Decides(y, z)) return (y, z);

        var radius = _section.InnerRadius;
        var (centreY, centreZ) = (_holeY - radius, _holeZ - radius);
        var (overY, overZ) = (Math.Abs(y) - centreY, Math.Abs(z) - centreZ);
        if (overY > 0 && overZ > 0)
        {
            var scale = (radius + _reach) / double.Hypot(overY, overZ);
            return (Math.CopySign(centreY + scale * overY, y), Math.CopySign(centreZ + scale * overZ, z));
        }

        return Math.Abs(z) >= _holeZ - OnEdge * Extent && overY <= 0
            ? (y, Math.CopySign(_holeZ + Math.Sqrt(Math.Max(0, (_reach - overY) * (_reach + overY))), z))
            : (Math.CopySign(_holeY + Math.Sqrt(Math.Max(0, (_reach - overZ) * (_reach + overZ))), y), z);
    }
}
