using MemberScan.Foundation.Geometry;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Pictures;

/// <summary>A member as a picture shows it: a straight line from start along its first direction.</summary>
internal static class AxisLine
{
    /// <summary>Start and end in project coordinates [m]; null when the axis is not known or not finite.</summary>
    public static (Vector3 Start, Vector3 End)? Of(MemberResult member) =>
        member is { Axes: { } axes, Length: { } length } && axes.Origin.IsFinite && double.IsFinite(length) ? (axes.Origin, axes.Origin + length * axes.X) : null;
}
