using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Outlines;

/// <summary>Where the material of a section lies, seen by a search: charts of its edges and its inside, and names of places.</summary>
internal abstract class Outline
{
    /// <summary>Share of the largest extent within which a point counts as lying on an edge.</summary>
    public const double OnEdge = 1e-9;

    private protected Outline(CrossSection section) => Extent = Math.Max(section.ExtentY, section.ExtentZ);

    /// <summary>Largest extent [m].</summary>
    public double Extent { get; }

    /// <summary>The edges, outer and inner, and creases of the shear stress between them: curves.</summary>
    public abstract Chart Edges { get; }

    /// <summary>The inside, edges included; null where it is never needed.</summary>
    public abstract Chart? Inside { get; }

    /// <summary>Whether a point lies in the material or within a tolerance [m] of it.</summary>
    public abstract bool Contains(double y, double z, double tolerance);

    /// <summary>Whether a point of the material counts for the governing place: not in the surroundings of a re-entrant corner of a field with peaks.</summary>
    public virtual bool Decides(double y, double z) => true;

    /// <summary>Whether the whole section is searched, so that the places that statics points at are worth a try.</summary>
    public virtual bool IsWhole => true;

    /// <summary>The point farthest in a direction, which need not be a unit vector but must not be zero.</summary>
    public abstract (double Y, double Z) Farthest(double directionY, double directionZ);

    /// <summary>The point of an inner edge farthest in a direction; false where there is none of interest.</summary>
    public virtual bool TryFarthestInside(double directionY, double directionZ, out (double Y, double Z) point)
    {
        point = default;
        return false;
    }

    /// <summary>Order of preference among places of equal stress: the outer edge first, the inside last.</summary>
    public abstract int Rank(double y, double z);

    /// <summary>The place in words, given what acts.</summary>
    public abstract string NameOf(double y, double z, in SectionForces forces);

    /// <summary>Points [m] and areas [m²] of a quadrature rule over the material.</summary>
    public abstract IEnumerable<(double Y, double Z, double Area)> Quadrature();

    /// <summary>The outline of a section for a field with or without peaks at re-entrant corners.</summary>
    public static Outline Of(CrossSection section, bool hasPeaks) => section switch
    {
        Round round => new DiscOutline(round),
        Tube tube => new AnnulusOutline(tube),
        Rectangle rectangle => new RectangleOutline(rectangle, rectangle.Width, rectangle.Depth, 0),
        RoundedRectangle rounded => new RectangleOutline(rounded, rounded.Width, rounded.Depth, rounded.CornerRadius),
        Box box => hasPeaks ? new BoxFieldOutline(box) : new BoxOutline(box),
        _ => throw new ArgumentOutOfRangeException(nameof(section), section.Kind, "no outline for this kind"),
    };
}
