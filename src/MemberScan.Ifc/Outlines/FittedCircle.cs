using System.Globalization;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Outlines;

/// <summary>A circle that an outline stands for.</summary>
/// <param name="Centre">Centre [m].</param>
/// <param name="Radius">Radius [m]; of a polygon the radius through its corners.</param>
/// <param name="Deviation">Largest distance of the outline's own points from the circle [m].</param>
/// <param name="Sides">Number of chords when a polygon stands for the circle; 0 for arcs.</param>
internal sealed record FittedCircle(Vector3 Centre, double Radius, double Deviation, int Sides)
{
    /// <summary>Fewest equal chords that stand for a circle.</summary>
    public const int FewestSides = 8;

    /// <summary>Largest distance from the circle over its radius [-].</summary>
    public const double Tolerance = 1e-3;

    /// <summary>What a reader must know of a polygon; empty for arcs.</summary>
    public string Note => Sides == 0 ? "" : string.Create(
        CultureInfo.InvariantCulture, $"drawn as {Sides} equal chords; evaluated as the circle through their corners, whose area is {100 * (2 * Math.PI / (Sides * Math.Sin(2 * Math.PI / Sides)) - 1):0.##} % larger");

    /// <summary>The circle of an outline; null when it is none.</summary>
    public static FittedCircle? Of(ClosedOutline outline)
    {
        if (!outline.IsConvex) return null;

        var edges = outline.Edges;
        return edges.All(e => e.IsArc) ? OfArcs(edges) : edges.Length >= FewestSides && edges.All(e => !e.IsArc) ? OfChords(edges) : null;
    }

    private static FittedCircle? OfArcs(System.Collections.Immutable.ImmutableArray<OutlineEdge> arcs)
    {
        var whole = arcs.Sum(e => e.Turn);
        var centre = 1 / whole * arcs.Aggregate(Vector3.Zero, (sum, e) => sum + e.Turn * e.Centre);
        var radius = arcs.Sum(e => e.Turn * e.Radius) / whole;
        var deviation = arcs.Max(e => (e.Centre - centre).Length + Math.Abs(e.Radius - radius));
        return deviation <= Tolerance * radius ? new FittedCircle(centre, radius, deviation, 0) : null;
    }

    private static FittedCircle? OfChords(System.Collections.Immutable.ImmutableArray<OutlineEdge> chords)
    {
        var count = chords.Length;
        var centre = 1.0 / count * chords.Aggregate(Vector3.Zero, (sum, e) => sum + e.Start);
        var radius = chords.Average(e => (e.Start - centre).Length);
        var deviation = chords.Max(e => Math.Abs((e.Start - centre).Length - radius));
        var chord = 2 * radius * Math.Sin(Math.PI / count);
        var isEven = chords.All(e => Math.Abs(e.Length - chord) <= 4 * Tolerance * radius);
        return deviation <= Tolerance * radius && isEven ? new FittedCircle(centre, radius, deviation, count) : null;
    }
}
