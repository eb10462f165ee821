using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Series;

namespace MemberScan.Mechanics.Outlines;

/// <summary>A ring. Inside: p is the angle from +y towards +z, sin q runs from −1 at the bore to 1 at the outer edge.</summary>
internal sealed class AnnulusOutline : Outline
{
    private const int Spokes = 32;
    private const int Rings = 9;
    private static readonly Lattice s_edges = Lattice.Curves(2, Spokes, ring: true);
    private static readonly Lattice s_inside = Lattice.Grid(
        Lattice.Even(-Math.PI / 2, Math.PI / 2, Rings), Lattice.Even(0, 2 * Math.PI, Spokes + 1).AsSpan(0, Spokes), ring: true);

    private readonly double _outer;
    private readonly double _inner;

    /// <summary>The outline of a tube.</summary>
    public AnnulusOutline(Tube section)
        : base(section)
    {
        (_outer, _inner) = (section.OuterRadius, section.InnerRadius);
        Edges = new Chart(s_edges, (p, q) => OnCircle(q == 0 ? _outer : _inner, p));
        Inside = new Chart(s_inside, (p, q) =>
        {
            var share = 0.5 * (1 + Math.Sin(q));
            return OnCircle(_inner * (1 - share) + _outer * share, p);
        });
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <inheritdoc/>
    public override Chart Inside { get; }

    /// <summary>The point of a circle at an angle from +y towards +z [rad].</summary>
    public static (double Y, double Z) OnCircle(double radius, double angle)
    {
        const double Rounding = 1e-15;

        var (sin, cos) = Math.SinCos(angle);
        return (Math.Abs(cos) < Rounding ? 0 : radius * cos, Math.Abs(sin) < Rounding ? 0 : radius * sin);
    }

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance)
    {
        var radius = double.Hypot(y, z);
        return radius <= _outer + tolerance && radius >= _inner - tolerance;
    }

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ) => At(_outer, directionY, directionZ);

    /// <inheritdoc/>
    public override bool TryFarthestInside(double directionY, double directionZ, out (double Y, double Z) point)
    {
        point = At(_inner, directionY, directionZ);
        return true;
    }

    /// <inheritdoc/>
    public override int Rank(double y, double z)
    {
        var radius = double.Hypot(y, z);
        return radius >= _outer - OnEdge * Extent ? 0 : radius <= _inner + OnEdge * Extent ? 1 : 2;
    }

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces) => Rank(y, z) switch
    {
        0 => PlaceName.OnOuterCircle(y, z, forces, _outer),
        1 => PlaceName.OnBore(y, z, forces, _outer),
        _ => PlaceName.InsideTheWall(y, z),
    };

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature() => Quadrature(_inner, _outer);

    /// <summary>The rule for a ring or a disc: Gauss along the radius, equal steps around.</summary>
    public static IEnumerable<(double Y, double Z, double Area)> Quadrature(double inner, double outer)
    {
        foreach (var (at, weight) in GaussLegendre.UnitInterval)
        {
            var radius = inner + (outer - inner) * at;
            for (var spoke = 0; spoke < Spokes; spoke++)
            {
                var (y, z) = Direction(spoke, Spokes);
                yield return (radius * y, radius * z, weight * (outer - inner) * radius * 2 * Math.PI / Spokes);
            }
        }
    }

    /// <summary>Unit vector of one of several equal steps around, exact on the axes.</summary>
    public static (double Y, double Z) Direction(int step, int count) => (4 * step % count == 0 ? 4 * step / count : -1) switch
    {
        0 => (1, 0),
        1 => (0, 1),
        2 => (-1, 0),
        3 => (0, -1),
        _ => (Math.Cos(2 * Math.PI * step / count), Math.Sin(2 * Math.PI * step / count)),
    };

    private static (double Y, double Z) At(double radius, double directionY, double directionZ)
    {
        var scale = radius / double.Hypot(directionY, directionZ);
        return (scale * directionY, scale * directionZ);
    }
}
