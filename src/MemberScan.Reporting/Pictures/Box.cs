using MemberScan.Foundation.Geometry;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Pictures;

/// <summary>A box along the axes of the project [m].</summary>
/// <param name="Least">Its least corner.</param>
/// <param name="Most">Its greatest corner.</param>
public sealed record Box(Vector3 Least, Vector3 Most)
{
    /// <summary>Least side of a room [m]: a row of members lies in a plane, and from within that plane each hides the next.</summary>
    public const double LeastSide = 3;

    /// <summary>Its centre.</summary>
    public Vector3 Centre => 0.5 * (Least + Most);

    /// <summary>Half of its diagonal [m].</summary>
    public double Radius => 0.5 * (Most - Least).Length;

    /// <summary>The box around the axes of members; null when none has a known axis.</summary>
    public static Box? Around(IEnumerable<MemberResult> members)
    {
        ArgumentNullException.ThrowIfNull(members);
        Box? box = null;
        foreach (var (start, end) in members.Select(AxisLine.Of).OfType<(Vector3, Vector3)>())
            box = (box ?? new Box(start, start)).With(start).With(end);
        return box;
    }

    /// <summary>The box in which a person or a camera can stand: sides thinner than <see cref="LeastSide"/> are widened to it, about their middle.</summary>
    public Box AsRoom()
    {
        var (x, y, z) = (Side(Least.X, Most.X), Side(Least.Y, Most.Y), Side(Least.Z, Most.Z));
        return new Box(new Vector3(x.Least, y.Least, z.Least), new Vector3(x.Most, y.Most, z.Most));

        static (double Least, double Most) Side(double least, double most) =>
            most - least >= LeastSide ? (least, most) : (0.5 * (least + most - LeastSide), 0.5 * (least + most + LeastSide));
    }

    /// <summary>Whether a point lies in it or on its faces.</summary>
    public bool Contains(Vector3 point) => Nearest(point) == point;

    /// <summary>The point of the box that is nearest to another.</summary>
    public Vector3 Nearest(Vector3 point) => new(
        Math.Clamp(point.X, Least.X, Most.X), Math.Clamp(point.Y, Least.Y, Most.Y), Math.Clamp(point.Z, Least.Z, Most.Z));

    private Box With(Vector3 p) => new(
        new Vector3(Math.Min(Least.X, p.X), Math.Min(Least.Y, p.Y), Math.Min(Least.Z, p.Z)),
        new Vector3(Math.Max(Most.X, p.X), Math.Max(Most.Y, p.Y), Math.Max(Most.Z, p.Z)));
}
