using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Outlines;

/// <summary>A full disc. Inside: <c>(p, q)/√(p²+q²)</c> is the direction, <c>r·sin √(p²+q²)</c> the distance from the centre.</summary>
internal sealed class DiscOutline : Outline
{
    private const int Rings = 10;
    private const int Spokes = 40;
    private static readonly Lattice s_edge = Lattice.Curves(1, Spokes, ring: true);
    private static readonly Lattice s_inside = BuildLattice();
    private readonly double _radius;

    /// <summary>The outline of a round bar.</summary>
    public DiscOutline(Round section)
        : base(section)
    {
        _radius = section.Radius;
        Edges = new Chart(s_edge, (p, _) => AnnulusOutline.OnCircle(_radius, p));
        Inside = new Chart(s_inside, (p, q) =>
        {
            var length = Math.Sqrt(p * p + q * q);
            var scale = length == 0 ? 0 : _radius * Math.Sin(length) / length;
            return (scale * p, scale * q);
        });
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <inheritdoc/>
    public override Chart Inside { get; }

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance) => double.Hypot(y, z) <= _radius + tolerance;

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ)
    {
        var scale = _radius / double.Hypot(directionY, directionZ);
        return (scale * directionY, scale * directionZ);
    }

    /// <inheritdoc/>
    public override int Rank(double y, double z) => double.Hypot(y, z) >= _radius - OnEdge * Extent ? 0 : 1;

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces)
    {
        if (Rank(y, z) == 0) return PlaceName.OnOuterCircle(y, z, forces, _radius);

        return double.Hypot(y, z) <= 1e-6 * _radius ? PlaceName.Centre : PlaceName.Inside(y, z);
    }

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature() => AnnulusOutline.Quadrature(0, _radius);

    private static Lattice BuildLattice()
    {
        var (p, q) = (ImmutableArray.CreateBuilder<double>(), ImmutableArray.CreateBuilder<double>());
        var neighbours = ImmutableArray.CreateBuilder<int>();
        var pitch = Math.PI / 2 / Rings;
        p.Add(0);
        q.Add(0);
        neighbours.AddRange(Enumerable.Range(0, Lattice.NeighbourCount).Select(k => 1 + k * Spokes / Lattice.NeighbourCount));
        for (var ring = 1; ring <= Rings; ring++)
        {
            for (var spoke = 0; spoke < Spokes; spoke++)
            {
                var (y, z) = AnnulusOutline.Direction(spoke, Spokes);
                p.Add(pitch * ring * y);
                q.Add(pitch * ring * z);
                for (var d = -1; d <= 1; d++)
                {
                    var turned = (spoke + d + Spokes) % Spokes;
                    neighbours.Add(ring > 1 ? 1 + (ring - 2) * Spokes + turned : d == 0 ? 0 : -1);
                    neighbours.Add(ring < Rings ? 1 + ring * Spokes + turned : -1);
                    if (d != 0) neighbours.Add(1 + (ring - 1) * Spokes + turned);
                }
            }
        }

        return new Lattice(p.ToImmutable(), q.ToImmutable(), neighbours.ToImmutable(), pitch, pitch);
    }
}
