using System.Collections.Immutable;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Drawing;

/// <summary>A section ready to be drawn: its outline, its place about the centroid and its size.</summary>
/// <param name="Path">Gives the path data for a centre in the picture and a scale [picture units per metre].</param>
/// <param name="LeastY">Least y [m].</param>
/// <param name="MostY">Largest y [m].</param>
/// <param name="LeastZ">Least z [m].</param>
/// <param name="MostZ">Largest z [m].</param>
public sealed record DrawnSection(Func<double, double, double, string> Path, double LeastY, double MostY, double LeastZ, double MostZ)
{
    /// <summary>Extent along y [m].</summary>
    public double Width => MostY - LeastY;

    /// <summary>Extent along z [m].</summary>
    public double Depth => MostZ - LeastZ;

    /// <summary>The section that rings or, without them, a designation tell; null when neither does.</summary>
    public static DrawnSection? Of(string designation, ImmutableArray<ImmutableArray<RingPoint>> rings)
    {
        if (!rings.IsDefaultOrEmpty && rings.All(ring => ring.Length > 2))
        {
            var points = rings[0];
            return new DrawnSection(
                (x, y, scale) => SectionPath.Of(rings, x, y, scale), points.Min(p => p.Y), points.Max(p => p.Y), points.Min(p => p.Z), points.Max(p => p.Z));
        }

        return SectionText.Read(designation) is { } section
            ? new DrawnSection(
                (x, y, scale) => SectionPath.Of(section, x, y, scale), -section.ExtentY / 2, section.ExtentY / 2, -section.ExtentZ / 2, section.ExtentZ / 2)
            : null;
    }
}
