using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Outlines;

/// <summary>The inner corners of a rectangular tube alone, each a fillet of radius above zero: where local peaks stand.</summary>
internal sealed class FilletOutline : Outline
{
    private static readonly Lattice s_arcs = Lattice.Curves(4, RoundedCorner.NodesPerPiece, ring: false);
    private readonly BoxOutline _whole;

    /// <summary>The fillets of a box.</summary>
    public FilletOutline(Box section)
        : base(section)
    {
        _whole = new BoxOutline(section);
        var (holeY, holeZ, radius) = (section.Width / 2 - section.Wall, section.Depth / 2 - section.Wall, section.InnerRadius);
        Edges = new Chart(s_arcs, (p, corner) => RoundedCorner.OnPiece(holeY, holeZ, radius, 0, RoundedCorner.Sides + (int)corner, p));
    }

    /// <inheritdoc/>
    public override Chart Edges { get; }

    /// <summary>None: the peaks stand on the edge.</summary>
    public override Chart? Inside => null;

    /// <inheritdoc/>
    public override bool IsWhole => false;

    /// <inheritdoc/>
    public override bool Contains(double y, double z, double tolerance) => _whole.Contains(y, z, tolerance);

    /// <inheritdoc/>
    public override (double Y, double Z) Farthest(double directionY, double directionZ) => _whole.Farthest(directionY, directionZ);

    /// <inheritdoc/>
    public override int Rank(double y, double z) => _whole.Rank(y, z);

    /// <inheritdoc/>
    public override string NameOf(double y, double z, in SectionForces forces) => _whole.NameOf(y, z, forces);

    /// <inheritdoc/>
    public override IEnumerable<(double Y, double Z, double Area)> Quadrature() => _whole.Quadrature();
}
