using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Sections;

/// <summary>Whether two sources give one section.</summary>
internal static class SectionAlike
{
    /// <summary>Whether the sections are of one kind and their dimensions differ by less than 0.01 %.</summary>
    public static bool Of(CrossSection a, CrossSection b)
    {
        static bool Near(double p, double q) => Math.Abs(p - q) <= 1e-4 * Math.Max(Math.Abs(p), Math.Abs(q)) + 1e-9;
        return (a, b) switch
        {
            (Round p, Round q) => Near(p.Radius, q.Radius),
            (Tube p, Tube q) => Near(p.OuterRadius, q.OuterRadius) && Near(p.Wall, q.Wall),
            (Rectangle p, Rectangle q) => Near(p.Width, q.Width) && Near(p.Depth, q.Depth),
            (RoundedRectangle p, RoundedRectangle q) => Near(p.Width, q.Width) && Near(p.Depth, q.Depth) && Near(p.CornerRadius, q.CornerRadius),
            (Box p, Box q) => Near(p.Width, q.Width) && Near(p.Depth, q.Depth) && Near(p.Wall, q.Wall) && Near(p.OuterRadius, q.OuterRadius) && Near(p.InnerRadius, q.InnerRadius),
            _ => false,
        };
    }
}
