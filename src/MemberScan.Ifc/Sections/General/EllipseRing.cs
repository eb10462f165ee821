using System.Collections.Immutable;
using MemberScan.Mechanics.Profiles;

namespace MemberScan.Ifc.Sections.General;

/// <summary>An ellipse as a ring of arcs through points of it.</summary>
internal static class EllipseRing
{
    /// <summary>Number of arcs.</summary>
    public const int Arcs = 48;

    /// <summary>The ring.</summary>
    /// <param name="a">Half axis along y [m].</param>
    /// <param name="b">Half axis along z [m].</param>
    /// <param name="deviation">Largest distance of the arcs from the ellipse [m].</param>
    public static ImmutableArray<OutlineVertex> Of(double a, double b, out double deviation)
    {
        var ring = ImmutableArray.CreateBuilder<OutlineVertex>(Arcs);
        deviation = 0;
        for (var i = 0; i < Arcs; i++)
        {
            var (from, middle, to) = (At(a, b, i), At(a, b, i + 0.5), At(a, b, i + 1));

            // The middle point in a frame of the chord: how far along from its middle, how high above.
            var (chordY, chordZ) = (to.Y - from.Y, to.Z - from.Z);
            var chord = double.Hypot(chordY, chordZ);
            var (my, mz) = (middle.Y - from.Y, middle.Z - from.Z);
            var height = (my * chordZ - mz * chordY) / chord;
            var along = (my * chordY + mz * chordZ) / chord - chord / 2;
            var radius = ArcRadius(chord / 2, along, height);
            var sagitta = radius - Math.Sqrt(radius * radius - chord * chord / 4);
            ring.Add(new OutlineVertex(from.Y, from.Z, sagitta / (chord / 2)));
            foreach (var share in new[] { 0.25, 0.75 }) deviation = Math.Max(deviation, Off(from, to, radius, At(a, b, i + share)));
        }

        return ring.ToImmutable();
    }

    private static (double Y, double Z) At(double a, double b, double step)
    {
        var (sin, cos) = Math.SinCos(2 * Math.PI * step / Arcs);
        return (a * cos, b * sin);
    }

    // Circle through (−c, 0), (c, 0) and (x, h), its centre below the chord: centre at depth k, k = (c² − x² − h²)/(2h), radius √(c² + k²).
    private static double ArcRadius(double c, double x, double h) => double.Hypot(c, (c * c - x * x - h * h) / (2 * h));

    private static double Off((double Y, double Z) from, (double Y, double Z) to, double radius, (double Y, double Z) point)
    {
        var (dy, dz) = (to.Y - from.Y, to.Z - from.Z);
        var chord = double.Hypot(dy, dz);
        var depth = Math.Sqrt(radius * radius - chord * chord / 4);
        var (cy, cz) = ((from.Y + to.Y) / 2 - depth * dz / chord, (from.Z + to.Z) / 2 + depth * dy / chord);
        return Math.Abs(double.Hypot(point.Y - cy, point.Z - cz) - radius);
    }
}
