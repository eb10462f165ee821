using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Members;

namespace MemberScan.Ifc.Sections;

/// <summary>A profile as read, with its own position in the plane it is drawn in.</summary>
/// <param name="Section">The section, about its centroid, its y the profile's X and its z the profile's Y.</param>
/// <param name="Position">From profile axes to the plane of the sweep [m].</param>
internal sealed record ProfileShape(SectionFinding Section, Transform3 Position)
{
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
}
