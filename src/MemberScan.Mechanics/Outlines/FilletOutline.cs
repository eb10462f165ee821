using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Outlines;

/// <summary>The rounded re-entrant corners of a section alone: where local peaks stand.</summary>
internal sealed class FilletOutline : Outline
{
    private readonly Outline _whole;

    /// <summary>The given arcs of a section.</summary>
    public FilletOutline(CrossSection section, Outline whole, EdgeCurve[] arcs)
        : base(section)
    {
        _whole = whole;
        Edges = new Chart(
            Lattice.Curves(arcs.Length, RoundedCorner.NodesPerPiece, ring: false), (p, arc) => arcs[(int)arc].At(0.5 * (1 + Math.Sin(p))));
    }

    /// <summary>The arcs inside the corners of a box.</summary>
    public static EdgeCurve[] ArcsOf(Box box)
    {
        var (y, z) = (box.Width / 2 - box.Wall - box.InnerRadius, box.Depth / 2 - box.Wall - box.InnerRadius);
        return [.. RoundedCorner.Quadrants.Select((sign, i) => EdgeCurve.Arc((sign.Y * y, sign.Z * z), box.InnerRadius, i * Math.PI / 2, (i + 1) * Math.PI / 2))];
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
