using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Mechanics.Sections;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Drawing;

/// <summary>The outline of a section as SVG path data; holes are cut by the even-odd rule.</summary>
/// <remarks>The cut face is seen from the +x end, its positive side: y points right, z points up.</remarks>
public static class SectionPath
{
    /// <summary>Path data of a section centred at a place of the picture.</summary>
    /// <param name="section">The section.</param>
    /// <param name="centreX">Horizontal place of the centroid [picture unit].</param>
    /// <param name="centreY">Vertical place of the centroid [picture unit], downward.</param>
    /// <param name="scale">Picture units per metre.</param>
    public static string Of(CrossSection section, double centreX, double centreY, double scale) => section switch
    {
        Round round => Oblong(centreX, centreY, scale, 2 * round.Radius, 2 * round.Radius, round.Radius),
        Tube tube => Oblong(centreX, centreY, scale, 2 * tube.OuterRadius, 2 * tube.OuterRadius, tube.OuterRadius)
            + Oblong(centreX, centreY, scale, 2 * tube.InnerRadius, 2 * tube.InnerRadius, tube.InnerRadius),
        Rectangle rectangle => Oblong(centreX, centreY, scale, rectangle.Width, rectangle.Depth, 0),
        RoundedRectangle rounded => Oblong(centreX, centreY, scale, rounded.Width, rounded.Depth, rounded.CornerRadius),
        Box box => Oblong(centreX, centreY, scale, box.Width, box.Depth, box.OuterRadius)
            + Oblong(centreX, centreY, scale, box.Width - 2 * box.Wall, box.Depth - 2 * box.Wall, box.InnerRadius),
        _ => throw new ArgumentOutOfRangeException(nameof(section)),
    };

    /// <summary>Path data of rings centred on their section's centroid.</summary>
    /// <param name="rings">Outer line and holes [m].</param>
    /// <param name="centreX">Horizontal place of the centroid [picture unit].</param>
    /// <param name="centreY">Vertical place of the centroid [picture unit], downward.</param>
    /// <param name="scale">Picture units per metre.</param>
    public static string Of(ImmutableArray<ImmutableArray<RingPoint>> rings, double centreX, double centreY, double scale) =>
        string.Concat(rings.Select(ring => $"M{string.Join('L', ring.Select(p => $"{Coordinate(centreX + p.Y * scale)} {Coordinate(centreY - p.Z * scale)}"))}Z"));

    /// <summary>A length or place of a picture as SVG writes it, to a hundredth.</summary>
    public static string Coordinate(double value) =>
        (Math.Round(value, 2) + 0.0).ToString("0.##", CultureInfo.InvariantCulture);

    // A rectangle with quarter circles at its corners; a circle is one whose sides are used up by them.
    private static string Oblong(double centreX, double centreY, double scale, double width, double depth, double radius)
    {
        var (w, h, r) = (width * scale, depth * scale, radius * scale);
        var (left, right, top, bottom) = (centreX - w / 2, centreX + w / 2, centreY - h / 2, centreY + h / 2);
        string P(double x, double y) => Coordinate(x) + " " + Coordinate(y);
        string Arc(double x, double y) => r > 0 ? $"A{Coordinate(r)} {Coordinate(r)} 0 0 1 {P(x, y)}" : "";
        return $"M{P(left + r, top)}L{P(right - r, top)}{Arc(right, top + r)}L{P(right, bottom - r)}{Arc(right - r, bottom)}"
            + $"L{P(left + r, bottom)}{Arc(left, bottom - r)}L{P(left, top + r)}{Arc(left + r, top)}Z";
    }
}
