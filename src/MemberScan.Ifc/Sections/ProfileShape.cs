using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Sections.General;
using MemberScan.Mechanics.Profiles;
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

    /// <summary>From the axes that the profile is drawn in to the plane of the sweep [m]; its centroid may lie beside their origin.</summary>
    public Transform3 Drawn { get; init; } = Position;

    /// <summary>Whether the profile is turned or shifted in its plane.</summary>
    public bool IsMoved
    {
        get
        {
            var isTurned = (Drawn.X - Vector3.UnitX).Length > 1e-6 && Section.Shape is not (Round or Tube);
            return isTurned || Drawn.Origin.Length > 1e-6 * LargestExtent;
        }
    }

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
            OpenProfile s => new OpenProfile(s.Shape, scale * s.Depth, scale * s.Width, scale * s.Web, scale * s.Flange, scale * s.Root),
            OutlineSection s => OutlineShapes.Scaled(s, scale, scale),
            _ => throw new ArgumentOutOfRangeException(nameof(scale), shape.Kind, "no scaling for this kind"),
        };
        return this with { Section = Section with { Shapes = [.. Section.Shapes.Select(Scale)] } };
    }

    /// <summary>The same profile with its section seen from the other side: y reversed.</summary>
    public ProfileShape Mirrored() => this with { Section = Section with { Shapes = [.. Section.Shapes.Select(OutlineShapes.Mirrored)] } };

    /// <summary>The same profile moved, turned, mirrored and scaled in its plane; null when it is no section of the same kind any more.</summary>
    public ProfileShape? Mapped(Transform3 map)
    {
        var to = map.After(Position);
        var (scaleX, scaleY) = (to.X.Length, to.Y.Length);
        if (scaleX is not (>= LeastScale and <= MostScale) || scaleY is not (>= LeastScale and <= MostScale)) return null;
        if (Math.Abs(to.X.Dot(to.Y)) > 1e-6 * scaleX * scaleY) return null;

        var position = new Transform3(to.Origin, 1 / scaleX * to.X, 1 / scaleY * to.Y, Vector3.UnitZ);
        var drawn = map.After(Drawn);
        drawn = new Transform3(drawn.Origin, position.X, position.Y, Vector3.UnitZ);
        if (Math.Abs(scaleX / scaleY - 1) < 1e-6) return Scaled(scaleX) with { Position = position, Drawn = drawn };

        CrossSection? stretched = Section.Shape switch
        {
            Rectangle r => new Rectangle(scaleX * r.Width, scaleY * r.Depth),
            OutlineSection outline when outline.Rings.All(ring => ring.All(v => v.Bulge == 0)) => OutlineShapes.Scaled(outline, scaleX, scaleY),
            _ => null,
        };
        return stretched is null ? null : this with { Position = position, Drawn = drawn, Section = Section with { Shapes = [stretched] } };
    }
}
