using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>Plane patches that run round an axis, each between two lines along it: the side of a straight run, or its bore.</summary>
/// <param name="Axis">Direction of the lines, a unit vector.</param>
/// <param name="U">First direction of the plane square to the axis; the second is Axis × U.</param>
/// <param name="IsBore">Whether the lines are re-entrant, so that the patches bound a bore.</param>
/// <param name="Patches">The patches.</param>
/// <param name="Lines">The lines in order round the axis.</param>
/// <param name="Spread">Largest distance of the mesh's points from their line [m].</param>
internal sealed record Ring(Vector3 Axis, Vector3 U, bool IsBore, ImmutableArray<int> Patches, ImmutableArray<Ring.Line> Lines, double Spread)
{
    /// <summary>A line along the axis, at which two patches meet.</summary>
    /// <param name="U">Place along U [m].</param>
    /// <param name="V">Place along Axis × U [m].</param>
    /// <param name="First">Point of the mesh where it begins.</param>
    /// <param name="Last">Point of the mesh where it ends.</param>
    /// <param name="From">Height of its beginning along the axis [m].</param>
    /// <param name="To">Height of its end along the axis [m].</param>
    /// <param name="Points">All points of the mesh on it.</param>
    internal sealed record Line(double U, double V, int First, int Last, double From, double To, ImmutableHashSet<int> Points);

    /// <summary>Height of the middle of its start along the axis [m].</summary>
    public double AtStart => Lines.Average(l => l.From);

    /// <summary>Height of the middle of its end along the axis [m].</summary>
    public double AtEnd => Lines.Average(l => l.To);

    /// <summary>Distance of the middles of its ends [m].</summary>
    public double Length => AtEnd - AtStart;

    /// <summary>Largest distance of two of its lines along U or across it [m].</summary>
    public double Extent => Math.Max(Lines.Max(l => l.U) - Lines.Min(l => l.U), Lines.Max(l => l.V) - Lines.Min(l => l.V));

    /// <summary>A point of its axis at a height.</summary>
    public Vector3 Middle(double height) => Lines.Average(l => l.U) * U + Lines.Average(l => l.V) * Axis.Cross(U) + height * Axis;

    /// <summary>Largest distance of an end's corners from a plane, along the axis [m].</summary>
    public double OutOfPlane(bool end) => ObliqueEnds.OutOfPlane([.. Lines.Select(l => l.U * U + l.V * Axis.Cross(U) + (end ? l.To : l.From) * Axis)], Axis);
}
