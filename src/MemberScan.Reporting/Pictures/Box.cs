using MemberScan.Foundation.Geometry;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Pictures;

/// <summary>A box along the axes of the project [m].</summary>
/// <param name="Least">Its least corner.</param>
/// <param name="Most">Its greatest corner.</param>
public sealed record Box(Vector3 Least, Vector3 Most)
{
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

    private Box With(Vector3 p) => new(
        new Vector3(Math.Min(Least.X, p.X), Math.Min(Least.Y, p.Y), Math.Min(Least.Z, p.Z)),
        new Vector3(Math.Max(Most.X, p.X), Math.Max(Most.Y, p.Y), Math.Max(Most.Z, p.Z)));
}
