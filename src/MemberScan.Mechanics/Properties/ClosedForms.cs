using System.Globalization;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Series;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Properties;

/// <summary>Section properties by closed form, one method per kind.</summary>
internal static class ClosedForms
{
    public const string Exact = "exact";
    public const string TorsionSeries = "Saint-Venant series";

    public static SectionProperties Of(Round section)
    {
        var r = section.Radius;
        var inertia = Math.PI * r * r * r * r / 4;
        return DoublySymmetric(
            Math.PI * r * r, inertia, inertia, inertia / r, inertia / r, 4 * r * r * r / 3, 4 * r * r * r / 3,
            2 * inertia, Exact, 2 * inertia / r, null);
    }

    public static SectionProperties Of(Tube section)
    {
        var (b, a, t) = (section.OuterRadius, section.InnerRadius, section.Wall);
        var middle = b - t / 2;
        // b⁴ − a⁴ and b³ − a³ with the wall factored out: no digits are lost for a thin wall.
        var inertia = Math.PI / 4 * t * (b + a) * (b * b + a * a);
        var plastic = 4 * t * (b * b + a * b + a * a) / 3;
        return DoublySymmetric(
            Math.PI * t * (b + a), inertia, inertia, inertia / b, inertia / b, plastic, plastic,
            2 * inertia, Exact, 2 * inertia / b, 2 * Math.PI * middle * middle * middle * t) with
        { WtThinWall = 2 * Math.PI * middle * middle * t };
    }

    public static SectionProperties Of(Rectangle section)
    {
        var (b, h) = (section.Width, section.Depth);
        return DoublySymmetric(
            b * h, b * h * h * h / 12, h * b * b * b / 12, b * h * h / 6, h * b * b / 6, b * h * h / 4, h * b * b / 4,
            RectangleTorsionConstants.J(b, h), TorsionSeries, RectangleTorsionConstants.Wt(b, h), null);
    }

    public static SectionProperties Of(RoundedRectangle section)
    {
        var (b, h) = (section.Width, section.Depth);
        var corner = CornerSpandrel.Of(section.CornerRadius);
        var torsion = SolvedSections.Torsion(section);
        var iy = b * h * h * h / 12 - corner.FourInertia(h);
        var iz = h * b * b * b / 12 - corner.FourInertia(b);
        return DoublySymmetric(
            b * h - 4 * corner.Area, iy, iz, 2 * iy / h, 2 * iz / b,
            b * h * h / 4 - corner.FourMoment(h), h * b * b / 4 - corner.FourMoment(b),
            torsion?.J, Numerical(torsion), torsion?.Wt, null);
    }

    /// <remarks>Source: EN 10210-2 and EN 10219-2, annex of section properties, with independent radii (from memory).</remarks>
    public static SectionProperties Of(Box section)
    {
        var (b, h, t) = (section.Width, section.Depth, section.Wall);
        var (bi, hi) = (b - 2 * t, h - 2 * t);
        var outer = CornerSpandrel.Of(section.OuterRadius);
        var inner = CornerSpandrel.Of(section.InnerRadius);
        var iy = (b * h * h * h - bi * hi * hi * hi) / 12 - outer.FourInertia(h) + inner.FourInertia(hi);
        var iz = (h * b * b * b - hi * bi * bi * bi) / 12 - outer.FourInertia(b) + inner.FourInertia(bi);

        var rc = (section.OuterRadius + section.InnerRadius) / 2;
        var length = 2 * (b - t + h - t) - 2 * rc * (4 - Math.PI);                 // of the middle line
        var enclosed = (b - t) * (h - t) - rc * rc * (4 - Math.PI);                // inside the middle line
        var k = 2 * enclosed * t / length;
        var torsion = SolvedSections.Torsion(section);
        var it = t * t * t * length / 3 + 2 * k * enclosed;
        return DoublySymmetric(
            2 * t * (b + h - 2 * t) - 4 * outer.Area + 4 * inner.Area, iy, iz, 2 * iy / h, 2 * iz / b,
            (b * h * h - bi * hi * hi) / 4 - outer.FourMoment(h) + inner.FourMoment(hi),
            (h * b * b - hi * bi * bi) / 4 - outer.FourMoment(b) + inner.FourMoment(bi),
            torsion?.J, Numerical(torsion), it / (t + k / t), 4 * enclosed * enclosed * t / length) with
        { JAnnex = it, WtThinWall = 2 * enclosed * t };
    }

    /// <summary>Where a torsion constant comes from, in words.</summary>
    public static string Numerical(TorsionConstants? torsion) => torsion is null
        ? "not available: the dimensions are too far apart for a numerical field"
        : string.Create(CultureInfo.InvariantCulture, $"numerical field, change at the last refinement {torsion.Change:0.0E+0}");

    private static SectionProperties DoublySymmetric(
        double area, double iy, double iz, double welY, double welZ, double wplY, double wplZ,
        double? j, string jSource, double? wt, double? jThinWall) => new()
        {
            Area = area,
            Iy = iy,
            Iz = iz,
            Iyz = 0,
            J = j,
            JSource = jSource,
            WelY = welY,
            WelZ = welZ,
            Extremes = new ExtremeModuli(welY, welY, welZ, welZ),
            QY = wplY / 2,                                                         // the centroid halves the area
            QZ = wplZ / 2,
            WplY = wplY,
            WplZ = wplZ,
            Wt = wt,
            JThinWall = jThinWall,
            ShearCentreY = 0,
            ShearCentreZ = 0,
        };
}
