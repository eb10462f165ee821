using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Curves;

/// <summary>The centre line of a swept disk.</summary>
/// <param name="Start">Start [m].</param>
/// <param name="Tangent">Direction at the start, a unit vector.</param>
/// <param name="Length">Length along the line [m].</param>
/// <param name="BendRadii">Radii of its arcs [m]; empty for a straight line.</param>
/// <param name="Corners">Number of corners without a bend.</param>
internal sealed record Directrix(Vector3 Start, Vector3 Tangent, double Length, ImmutableArray<double> BendRadii, int Corners)
{
    /// <summary>Whether it is one straight line.</summary>
    public bool IsStraight => BendRadii.IsEmpty && Corners == 0;
}
