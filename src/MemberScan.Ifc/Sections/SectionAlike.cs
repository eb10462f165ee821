using MemberScan.Mechanics.Profiles;
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
            (OpenProfile p, OpenProfile q) => p.Shape == q.Shape && Near(p.Depth, q.Depth) && Near(p.Width, q.Width) && Near(p.Web, q.Web) && Near(p.Flange, q.Flange) && Near(p.Root, q.Root),
            (OutlineSection p, OutlineSection q) => Alike(p, q),
            _ => false,
        };
    }

    /// <summary>Whether two outlines have their corners in the same places, within 0.01 % of the largest extent.</summary>
    private static bool Alike(OutlineSection a, OutlineSection b)
    {
        var hair = 1e-4 * Math.Max(a.ExtentY, a.ExtentZ);
        return a.Rings.Length == b.Rings.Length && a.Rings.Zip(b.Rings).All(pair => pair.First.Length == pair.Second.Length
            && pair.First.All(v => pair.Second.Any(w => double.Hypot(v.Y - w.Y, v.Z - w.Z) <= hair && Math.Abs(v.Bulge - w.Bulge) <= 1e-3)));
    }
}
