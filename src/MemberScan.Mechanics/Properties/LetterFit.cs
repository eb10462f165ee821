using System.Collections.Immutable;
using System.Runtime.CompilerServices;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;

namespace MemberScan.Mechanics.Properties;

/// <summary>An I, L, U or T profile that an outline is, mirrored and turned by quarter turns as it may be.</summary>
/// <param name="Profile">The profile.</param>
/// <param name="IsMirrored">Whether its y is reversed before it is turned.</param>
/// <param name="QuarterTurns">Quarter turns from y towards z that bring it onto the outline, 0 to 3.</param>
/// <param name="Deviation">Largest distance of the outline's corners from the profile's [m].</param>
public sealed record LetterFit(OpenProfile Profile, bool IsMirrored, int QuarterTurns, double Deviation)
{
    /// <summary>Largest deviation over the thinner wall [-].</summary>
    public const double Tolerance = 5e-3;

    private const int FewestCorners = 6, MostVertices = 16;

    private static readonly ConditionalWeakTable<OutlineSection, LetterFit[]> s_known = [];

    /// <summary>Whether it stands as the profile does.</summary>
    public bool IsUpright => !IsMirrored && QuarterTurns == 0;

    /// <summary>The profile of an outline; null when it is none.</summary>
    public static LetterFit? Of(OutlineSection outline)
    {
        ArgumentNullException.ThrowIfNull(outline);
        return s_known.GetValue(outline, static o => Find(o) is { } fit ? [fit] : []).FirstOrDefault();
    }

    /// <summary>Section forces on the outline as the profile sees them: N and bending alone.</summary>
    public SectionForces Turned(in SectionForces forces)
    {
        // Moments are vectors: they turn back with the axes. Reversing y reverses the lever arm of Mz.
        var (my, mz) = (forces.My, forces.Mz);
        for (var turn = 0; turn < QuarterTurns; turn++) (my, mz) = (mz, -my);
        return new SectionForces(forces.N, 0, 0, 0, my, IsMirrored ? -mz : mz);
    }

    /// <summary>Properties of the outline as the profile sees them: area and second moments.</summary>
    public SectionProperties Turned(SectionProperties properties)
    {
        ArgumentNullException.ThrowIfNull(properties);
        var isAcross = QuarterTurns % 2 == 1;
        var sign = isAcross != IsMirrored ? -1 : 1;
        return properties with
        {
            Iy = isAcross ? properties.Iz : properties.Iy,
            Iz = isAcross ? properties.Iy : properties.Iz,
            Iyz = sign * properties.Iyz,
        };
    }

    private static LetterFit? Find(OutlineSection outline)
    {
        if (outline.Rings.Length > 1 || outline.Rings[0].Length is < FewestCorners or > MostVertices) return null;
        if (Corners(outline.Rings[0]) is not { } corners) return null;

        foreach (var isMirrored in new[] { false, true })
        {
            for (var turns = 0; turns < 4; turns++)
            {
                // Back to the profile: turned the other way, then mirrored.
                var points = corners.Points.ConvertAll(p =>
                {
                    for (var turn = 0; turn < turns; turn++) p = (p.Z, -p.Y);
                    return isMirrored ? (-p.Y, p.Z) : p;
                });
                if (Candidate(points, corners.Radius) is not { } profile) continue;

                var deviation = DeviationOf(profile, points);
                if (deviation <= Tolerance * Math.Min(profile.Web, profile.Flange)) return new LetterFit(profile, isMirrored, turns, deviation);
            }
        }

        return null;
    }

    /// <summary>Sharp corners of a ring of sides along y and z whose inner corners alone are rounded, all by one radius; null for any other.</summary>
    private static (List<(double Y, double Z)> Points, double Radius)? Corners(ImmutableArray<OutlineVertex> ring)
    {
        var sides = new List<(bool IsAlongY, double Level)>();
        var radii = new List<double>();
        for (var i = 0; i < ring.Length; i++)
        {
            var (from, to) = (ring[i], ring[(i + 1) % ring.Length]);
            var (dy, dz) = (to.Y - from.Y, to.Z - from.Z);
            if (from.Bulge != 0)
            {
                // A quarter turn to the right, between two straight sides.
                if (Math.Abs(from.Bulge + Math.Tan(Math.PI / 8)) > 5e-3 || ring[(i + 1) % ring.Length].Bulge != 0) return null;

                radii.Add(double.Hypot(dy, dz) / Math.Sqrt(2));
                continue;
            }

            var isAlongY = Math.Abs(dy) > Math.Abs(dz);
            if (Math.Min(Math.Abs(dy), Math.Abs(dz)) > 1e-3 * Math.Max(Math.Abs(dy), Math.Abs(dz))) return null;
            if (sides.Count > 0 && sides[^1].IsAlongY == isAlongY) return null;

            sides.Add((isAlongY, isAlongY ? (from.Z + to.Z) / 2 : (from.Y + to.Y) / 2));
        }

        // All inner corners are rounded or none: two fewer than half the corners are inner ones.
        if (sides.Count < FewestCorners || sides[0].IsAlongY == sides[^1].IsAlongY || (radii.Count > 0 && radii.Count != sides.Count / 2 - 2)) return null;

        var radius = radii.Count > 0 ? radii.Average() : 0;
        if (radii.Exists(r => Math.Abs(r - radius) > 0.01 * radius)) return null;

        return ([.. sides.Select((side, i) => side.IsAlongY
            ? (sides[(i + 1) % sides.Count].Level, side.Level)
            : (side.Level, sides[(i + 1) % sides.Count].Level))], radius);
    }

    /// <summary>A profile whose walls are read from the levels at which corners lie.</summary>
    private static OpenProfile? Candidate(List<(double Y, double Z)> corners, double radius)
    {
        var (across, up) = (Levels(corners.Select(c => c.Y)), Levels(corners.Select(c => c.Z)));
        var (width, depth, root) = (OnGrid(across[^1] - across[0]), OnGrid(up[^1] - up[0]), OnGrid(radius));
        OpenProfile? Made(OpenShape shape, double web, double flange) =>
            OpenProfile.Fault(shape, depth, width, OnGrid(web), OnGrid(flange), root) is null ? new OpenProfile(shape, depth, width, OnGrid(web), OnGrid(flange), root) : null;

        return (corners.Count, across.Count, up.Count) switch
        {
            (6, 3, 3) => Made(OpenShape.L, (across[1] - across[0] + up[1] - up[0]) / 2, (across[1] - across[0] + up[1] - up[0]) / 2),
            (8, 3, 4) => Made(OpenShape.U, across[1] - across[0], (up[1] - up[0] + up[3] - up[2]) / 2),
            (8, 4, 3) => Made(OpenShape.T, across[2] - across[1], up[2] - up[1]),
            (12, 4, 4) => Made(OpenShape.I, across[2] - across[1], (up[1] - up[0] + up[3] - up[2]) / 2),
            _ => null,
        };
    }

    // To a nanometre, so that one profile drawn in several places is one value.
    private static double OnGrid(double metres) => Math.Round(metres, 9);

    private static List<double> Levels(IEnumerable<double> values)
    {
        var levels = new List<double>();
        var sorted = values.Order().ToList();
        var hair = 1e-4 * (sorted[^1] - sorted[0]);
        foreach (var value in sorted)
            if (levels.Count == 0 || value - levels[^1] > hair)
                levels.Add(value);
        return levels;
    }

    private static double DeviationOf(OpenProfile profile, List<(double Y, double Z)> corners)
    {
        var sharp = new OpenProfile(profile.Shape, profile.Depth, profile.Width, profile.Web, profile.Flange);
        var (leastY, leastZ) = (corners.Min(c => c.Y), corners.Min(c => c.Z));
        var expected = sharp.Vertices.Select(v => (Y: leastY + sharp.CentroidY + v.Y, Z: leastZ + sharp.CentroidZ + v.Z)).ToList();
        if (expected.Count != corners.Count) return double.PositiveInfinity;

        static double Farthest(List<(double Y, double Z)> from, List<(double Y, double Z)> to) =>
            from.Max(a => to.Min(b => double.Hypot(a.Y - b.Y, a.Z - b.Z)));
        return Math.Max(Farthest(corners, expected), Farthest(expected, corners));
    }
}
