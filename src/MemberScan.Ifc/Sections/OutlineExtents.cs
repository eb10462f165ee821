using System.Globalization;
using MemberScan.Part21;

namespace MemberScan.Ifc.Sections;

/// <summary>Overall width and depth of the parametric profiles that are read as general outlines only.</summary>
internal static class OutlineExtents
{
    /// <summary>The extents in words, with a comma before; empty where they are not given.</summary>
    public static string Words(Part21Record profile, double metre)
    {
        double Dim(int index) => Instances.Real(profile[index]) is { } value ? metre * value : double.NaN;
        var (width, depth) = profile.Keyword switch
        {
            "IFCISHAPEPROFILEDEF" => (Dim(3), Dim(4)),
            "IFCASYMMETRICISHAPEPROFILEDEF" => (Math.Max(Dim(3), Dim(8)), Dim(4)),
            "IFCLSHAPEPROFILEDEF" => (profile[4].IsEmpty ? Dim(3) : Dim(4), Dim(3)),
            "IFCUSHAPEPROFILEDEF" or "IFCTSHAPEPROFILEDEF" or "IFCCSHAPEPROFILEDEF" => (Dim(4), Dim(3)),
            "IFCZSHAPEPROFILEDEF" => (2 * Dim(4) - Dim(5), Dim(3)),
            "IFCELLIPSEPROFILEDEF" => (2 * Dim(3), 2 * Dim(4)),
            "IFCTRAPEZIUMPROFILEDEF" => (Math.Max(Dim(3), Dim(6) + Dim(4)) - Math.Min(0, Dim(6)), Dim(5)),
            _ => (double.NaN, double.NaN),
        };
        return double.IsNaN(width) || double.IsNaN(depth) ? "" : string.Create(CultureInfo.InvariantCulture, $", {width * 1e3:0.###} mm wide and {depth * 1e3:0.###} mm deep");
    }
}
