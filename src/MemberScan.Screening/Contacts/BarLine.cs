using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;

namespace MemberScan.Screening.Contacts;

/// <summary>The axis of a straight member with the extents of its section.</summary>
/// <param name="Key">Key of the member.</param>
/// <param name="Axes">Local axes; their origin is the start.</param>
/// <param name="Length">Length [m].</param>
/// <param name="Shape">The section.</param>
internal sealed record BarLine(string Key, MemberAxes Axes, double Length, CrossSection Shape)
{
    /// <summary>End of the axis [m].</summary>
    public Vector3 End => PointAt(Length);

    /// <summary>Half of the section's diagonal: no surface is farther from the axis [m].</summary>
    public double Reach => Shape is Round or Tube ? Shape.ExtentY / 2 : 0.5 * double.Hypot(Shape.ExtentY, Shape.ExtentZ);

    /// <summary>The line of a member; null when it is bent or lacks section, length or axes.</summary>
    public static BarLine? Of(Member member) =>
        member.IsStraight && member.Axes is Finding<MemberAxes>.Found axes && member.Length is Finding<double>.Found { Value: > 0 } length
            && double.IsFinite(length.Value) && member.Section is Finding<SectionFinding>.Found section
            ? new BarLine(member.Key, axes.Value, length.Value, section.Value.Shape)
            : null;

    /// <summary>A point of the axis [m].</summary>
    public Vector3 PointAt(double at) => Axes.Origin + at * Axes.X;

    /// <summary>How far the surface lies from the axis in a direction square to it or not [m]; nothing straight along the member.</summary>
    public double ExtentTowards(Vector3 direction)
    {
        var (y, z) = (Math.Abs(direction.Dot(Axes.Y)), Math.Abs(direction.Dot(Axes.Z)));
        return Shape is Round or Tube ? Shape.ExtentY / 2 * double.Hypot(y, z) : 0.5 * (y * Shape.ExtentY + z * Shape.ExtentZ);
    }
}
