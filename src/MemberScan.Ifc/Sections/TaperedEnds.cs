using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Sections;

/// <summary>
/// Which two sections may stand at the ends of a tapering member: those that change evenly by formula (<see cref="MemberScan.Mechanics.Sections.Taper"/>), and those of
/// which one is smaller in every dimension, so that the stresses with the smaller one bound those between.
/// </summary>
internal static class TaperedEnds
{
    /// <summary>Share by which dimensions that should be equal may differ [-].</summary>
    private const double Hair = 1e-6;

    /// <summary>Why the ends do not make a taper that is evaluated; empty when they do.</summary>
    /// <param name="start">Section at the start.</param>
    /// <param name="end">Section at the end.</param>
    /// <param name="length">Length [m], above zero.</param>
    public static string WhyNot(CrossSection start, CrossSection end, double length)
    {
        if (Taper.Of(start, end) is null && !OneIsSmaller(start, end))
            return "only tapers of one kind are evaluated, and beside round, tubular and rectangular ones those of which one end is smaller in every dimension (general outlines: in the same shape)";

        var slope = Math.Max(Math.Abs(start.ExtentY - end.ExtentY), Math.Abs(start.ExtentZ - end.ExtentZ)) / 2 / length;
        return slope <= Taper.LargestSlope ? "" : string.Create(CultureInfo.InvariantCulture, $"its slope is {slope:0.###}; over {Taper.LargestSlope} the formulas of a straight bar do not hold");
    }

    private static bool OneIsSmaller(CrossSection a, CrossSection b) => (a, b) switch
    {
        (RoundedRectangle p, RoundedRectangle q) => AllOneWay([p.Width - q.Width, p.Depth - q.Depth, p.CornerRadius - q.CornerRadius], p.ExtentZ),
        (Box p, Box q) => AllOneWay([p.Width - q.Width, p.Depth - q.Depth, p.Wall - q.Wall], p.ExtentZ),
        (OpenProfile p, OpenProfile q) => p.Shape == q.Shape
            && AllOneWay([p.Depth - q.Depth, p.Width - q.Width, p.Web - q.Web, p.Flange - q.Flange, p.Root - q.Root], p.ExtentZ),
        (OutlineSection p, OutlineSection q) => AllOneWay([p.ExtentY - q.ExtentY, p.ExtentZ - q.ExtentZ], p.ExtentZ) && IsScaled(p, q),
        _ => false,
    };

    private static bool AllOneWay(ImmutableArray<double> changes, double size) =>
        changes.All(c => c >= -Hair * size) || changes.All(c => c <= Hair * size);

    /// <summary>Whether an outline is another one in other dimensions, corner by corner; with arcs by one factor.</summary>
    private static bool IsScaled(OutlineSection a, OutlineSection b)
    {
        if (a.Rings.Length != b.Rings.Length) return false;

        var (y, z) = (b.ExtentY / a.ExtentY, b.ExtentZ / a.ExtentZ);
        var hair = 1e-4 * Math.Max(b.ExtentY, b.ExtentZ);
        if (a.Rings.Any(ring => ring.Any(v => v.Bulge != 0)) && Math.Abs(y / z - 1) > 1e-4) return false;

        return a.Rings.Zip(b.Rings).All(pair => pair.First.Length == pair.Second.Length && pair.First.Zip(pair.Second).All(v =>
            double.Hypot(y * v.First.Y - v.Second.Y, z * v.First.Z - v.Second.Z) <= hair && Math.Abs(v.First.Bulge - v.Second.Bulge) <= 1e-4));
    }
}
