using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Members;

namespace MemberScan.Ifc.Sections;

/// <summary>A profile as read, with its own position in the plane it is drawn in.</summary>
/// <param name="Section">The section, about its centroid, its y the profile's X and its z the profile's Y.</param>
/// <param name="Position">From profile axes to the plane of the sweep [m].</param>
internal sealed record ProfileShape(SectionFinding Section, Transform3 Position)
{
    /// <summary>Smallest and largest scale that is followed [-].</summary>
    public const double LeastScale = 1e-6, MostScale = 1e6;

    /// <summary>Where the section comes from, in words: <c>profile</c>, <c>drawn outline</c>, …</summary>
    public string SourceWord { get; init; } = "profile";

    /// <summary>The largest extent of the section [m].</summary>
    public double LargestExtent => Math.Max(Section.Shape.ExtentY, Section.Shape.ExtentZ);

    /// <summary>The same profile with all its dimensions scaled.</summary>
    public ProfileShape Scaled(double scale)
    {
        if (Math.Abs(scale - 1) < 1e-12) return this;

        CrossSection Scale(CrossSection shape) => shape switch
        {
            Round s => new Round(scale * s.Radius),
            Tube s => new Tube(scale * s.OuterRadius, scale * s.Wall),
            Rectangle s => new Rectangle(scale * s.Width, scale * s.Depth),
            RoundedRectangle s => new RoundedRectangle(scale * s.Width, scale * s.Depth, scale * s.CornerRadius),
            Box s => new Box(scale * s.Width, scale * s.Depth, scale * s.Wall, scale * s.OuterRadius, scale * s.InnerRadius),
            _ => shape,
        };
        return this with { Section = Section with { Shapes = [.. Section.Shapes.Select(Scale)] } };
    }

    /// <summary>The same profile moved, turned, mirrored and scaled in its plane; null when it is no section of the same kind any more.</summary>
    public ProfileShape? Mapped(Transform3 map)
    {
        var to = map.After(Position);
        var (scaleX, scaleY) = (to.X.Length, to.Y.Length);
        if (scaleX is not (>= LeastScale and <= MostScale) || scaleY is not (>= LeastScale and <= MostScale)) return null;
        if (Math.Abs(to.X.Dot(to.Y)) > 1e-6 * scaleX * scaleY) return null;

        var position = new Transform3(to.Origin, 1 / scaleX * to.X, 1 / scaleY * to.Y, Vector3.UnitZ);
        if (Math.Abs(scaleX / scaleY - 1) < 1e-6) return Scaled(scaleX) with { Position = position };
        if (Section.Shape is not Rectangle r) return null;

        return this with { Position = position, Section = Section with { Shapes = [new Rectangle(scaleX * r.Width, scaleY * r.Depth)] } };
    }
}
