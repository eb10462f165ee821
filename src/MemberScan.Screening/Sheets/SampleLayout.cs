using System.Collections.Immutable;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Screening.Sheets;

/// <summary>Where a section is sampled: a lattice fine enough for its walls.</summary>
internal static class SampleLayout
{
    // Squares along the larger extent, and across a wall.
    private const int Least = 36, Most = 84, AcrossWall = 3;

    // Every square that touches the material has all its corners within √2 of its side.
    private const double Reach = 1.5;

    // Share of the extent between two arrows.
    private const double ArrowPitch = 0.11;

    /// <summary>The lattice of a section and its nodes in and beside the material.</summary>
    public static (SampleGrid Grid, ImmutableArray<SamplePoint> Points) Of(StressField field, ImmutableArray<ImmutableArray<(double Y, double Z)>> rings)
    {
        var outer = rings[0];
        var (leastY, mostY, leastZ, mostZ) = (outer.Min(p => p.Y), outer.Max(p => p.Y), outer.Min(p => p.Z), outer.Max(p => p.Z));
        var extent = Math.Max(mostY - leastY, mostZ - leastZ);
        var wall = 2 * field.Properties.Area / rings.Sum(Length);
        var cell = Math.Clamp(wall / AcrossWall, extent / Most, extent / Least);
        var (columns, rows) = (Nodes(mostY - leastY, cell), Nodes(mostZ - leastZ, cell));
        var (left, bottom) = ((leastY + mostY - (columns - 1) * cell) / 2, (leastZ + mostZ - (rows - 1) * cell) / 2);

        var numbers = new int[columns * rows];
        var points = ImmutableArray.CreateBuilder<SamplePoint>();
        for (var at = 0; at < numbers.Length; at++)
        {
            var (y, z) = (left + at % columns * cell, bottom + at / columns * cell);
            var (nearY, nearZ, distance) = Nearest(rings, y, z);
            var isInside = field.Contains(y, z);
            numbers[at] = isInside || distance <= Reach * cell ? points.Count : -1;
            if (isInside) points.Add(new SamplePoint(y, z, true, distance, y, z));
            else if (numbers[at] >= 0) points.Add(Beside(field, (y, z), (nearY, nearZ), distance, extent));
        }

        return (new SampleGrid(columns, rows, left, bottom, cell, [.. numbers]), points.ToImmutable());
    }

    /// <summary>Nodes for arrows: the deepest first, each at a distance from those before it.</summary>
    public static ImmutableArray<int> Sites(ImmutableArray<SamplePoint> points, double extent)
    {
        var sites = new List<int>();
        var order = Enumerable.Range(0, points.Length).Where(i => points[i].IsInside).OrderByDescending(i => Math.Round(points[i].Depth / extent, 6)).ThenBy(i => i);
        foreach (var i in order)
            if (sites.TrueForAll(s => double.Hypot(points[s].Y - points[i].Y, points[s].Z - points[i].Z) >= ArrowPitch * extent)) sites.Add(i);
        return [.. sites];
    }

    private static int Nodes(double length, double cell) => (int)Math.Ceiling(length / cell - 1e-9) + 4;

    private static double Length(ImmutableArray<(double Y, double Z)> ring) =>
        ring.Select((p, i) => double.Hypot(ring[(i + 1) % ring.Length].Y - p.Y, ring[(i + 1) % ring.Length].Z - p.Z)).Sum();

    // Chords of a hole lie a little in the void: a small step onwards is in the material.
    private static SamplePoint Beside(StressField field, (double Y, double Z) node, (double Y, double Z) near, double distance, double extent)
    {
        var at = near;
        if (distance > 0)
        {
            foreach (var step in new[] { 0, 1e-3, 4e-3 })
            {
                var share = step * extent / distance;
                at = (near.Y + share * (near.Y - node.Y), near.Z + share * (near.Z - node.Z));
                if (field.Contains(at.Y, at.Z)) break;
            }
        }

        if (!field.Contains(at.Y, at.Z)) at = near;
        return new SamplePoint(node.Y, node.Z, false, distance, at.Y, at.Z);
    }

    private static (double Y, double Z, double Distance) Nearest(ImmutableArray<ImmutableArray<(double Y, double Z)>> rings, double y, double z)
    {
        var best = (Y: 0.0, Z: 0.0, Square: double.PositiveInfinity);
        foreach (var ring in rings)
        {
            for (var i = 0; i < ring.Length; i++)
            {
                var (a, b) = (ring[i], ring[i + 1 < ring.Length ? i + 1 : 0]);
                var (dy, dz) = (b.Y - a.Y, b.Z - a.Z);
                var length = dy * dy + dz * dz;
                var share = length > 0 ? Math.Clamp(((y - a.Y) * dy + (z - a.Z) * dz) / length, 0, 1) : 0;
                var (py, pz) = (a.Y + share * dy, a.Z + share * dz);
                var square = (y - py) * (y - py) + (z - pz) * (z - pz);
                if (square < best.Square) best = (py, pz, square);
            }
        }

        return (best.Y, best.Z, Math.Sqrt(best.Square));
    }
}
