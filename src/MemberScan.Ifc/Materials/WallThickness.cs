using System.Collections.Immutable;
using System.Runtime.CompilerServices;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Materials;

/// <summary>The thickness of a section, by which standards grade the strength of steel.</summary>
internal static class WallThickness
{
    /// <summary>Step at which the search for the largest circle ends, over the larger extent [-].</summary>
    private const double Step = 1e-3;

    private static readonly ConditionalWeakTable<OutlineSection, object> s_known = [];

    /// <summary>The wall [m]; of solid sections the smaller extent, of outlines the diameter of the largest circle within.</summary>
    public static double Of(CrossSection shape) => shape switch
    {
        Tube tube => tube.Wall,
        Box box => box.Wall,
        OpenProfile profile => Math.Max(profile.Web, profile.Flange),
        OutlineSection outline => (double)s_known.GetValue(outline, o => 2 * LargestCircle(OutlineRings.Of(o))),
        _ => Math.Min(shape.ExtentY, shape.ExtentZ),
    };

    /// <summary>Radius of the largest circle within rings: squares are halved as long as they may hold a larger one.</summary>
    private static double LargestCircle(ImmutableArray<ImmutableArray<(double Y, double Z)>> rings)
    {
        var (leastY, leastZ) = (rings[0].Min(p => p.Y), rings[0].Min(p => p.Z));
        var (sizeY, sizeZ) = (rings[0].Max(p => p.Y) - leastY, rings[0].Max(p => p.Z) - leastZ);
        var extent = Math.Max(sizeY, sizeZ);
        var queue = new PriorityQueue<(double Y, double Z, double Half), double>();
        var best = 0.0;
        void Try(double y, double z, double half)
        {
            var distance = Distance(rings, y, z);
            best = Math.Max(best, distance);
            queue.Enqueue((y, z, half), -(distance + half * Math.Sqrt(2)));
        }

        Try(leastY + sizeY / 2, leastZ + sizeZ / 2, extent / 2);
        while (queue.TryDequeue(out var cell, out var bound) && -bound > best + Step * extent)
        {
            var half = cell.Half / 2;
            foreach (var (dy, dz) in new[] { (-half, -half), (half, -half), (-half, half), (half, half) }) Try(cell.Y + dy, cell.Z + dz, half);
        }

        return best + Step * extent;
    }

    /// <summary>Distance of a point from the rings, below zero outside the material [m].</summary>
    private static double Distance(ImmutableArray<ImmutableArray<(double Y, double Z)>> rings, double y, double z)
    {
        var (least, isInside) = (double.PositiveInfinity, false);
        foreach (var ring in rings)
            for (var i = 0; i < ring.Length; i++)
            {
                var (a, b) = (ring[i], ring[(i + 1) % ring.Length]);
                if (a.Z > z != b.Z > z && y < a.Y + (z - a.Z) / (b.Z - a.Z) * (b.Y - a.Y)) isInside = !isInside;

                var (dy, dz) = (b.Y - a.Y, b.Z - a.Z);
                var share = Math.Clamp(((y - a.Y) * dy + (z - a.Z) * dz) / (dy * dy + dz * dz), 0, 1);
                least = Math.Min(least, double.Hypot(y - a.Y - share * dy, z - a.Z - share * dz));
            }

        return isInside ? least : -least;
    }
}
