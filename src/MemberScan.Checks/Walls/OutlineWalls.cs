using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;

namespace MemberScan.Checks.Walls;

/// <summary>Walls of general outlines: those that are an I, L, U or T are held against its rules; the others have none.</summary>
internal static class OutlineWalls
{
    // A chord of 1/24 of a quarter circle lies within 0.06 % of its radius of the arc.
    private const double ChordShare = 6e-4;

    /// <summary>
    /// Null where no wall could buckle: nothing is compressed, or the outline is convex and without holes. Not evaluated where
    /// something is compressed and no rule holds.
    /// </summary>
    public static CheckResult? Check(OutlineSection outline, SectionProperties properties, in SectionForces forces, double fy)
    {
        if (IsConvexSolid(outline) || !IsCompressed(outline, properties, forces)) return null;

        return LetterFit.Of(outline) is { } letter
            ? OpenProfileWalls.Check(letter.Profile, letter.Turned(properties), letter.Turned(forces), fy)
            : SlenderWall.NotChecked($"There is no slenderness rule for a section of the kind {outline.Kind}.");
    }

    /// <summary>Whether σ is below zero at any point of the outer line; inside it is nowhere less.</summary>
    private static bool IsCompressed(OutlineSection outline, SectionProperties p, SectionForces forces)
    {
        var determinant = p.Iy * p.Iz - p.Iyz * p.Iyz;
        var axial = forces.N / p.Area;
        var perY = -(forces.Mz * p.Iy + forces.My * p.Iyz) / determinant;
        var perZ = (forces.My * p.Iz + forces.Mz * p.Iyz) / determinant;
        var least = axial + OutlineRings.Of(outline)[0].Min(point => perY * point.Y + perZ * point.Z);
        var bending = Math.Abs(perY) * outline.ExtentY + Math.Abs(perZ) * outline.ExtentZ;
        return SlenderWall.IsCompressed(least - ChordShare * bending, Math.Abs(axial) + bending);
    }

    private static bool IsConvexSolid(OutlineSection outline)
    {
        if (outline.Rings.Length > 1) return false;

        var ring = outline.Rings[0];
        for (var i = 0; i < ring.Length; i++)
        {
            if (ring[i].Bulge < 0) return false;

            // A corner turns by the angle of the chords less what the arcs on both sides take of it.
            var (before, at, after) = (ring[(i + ring.Length - 1) % ring.Length], ring[i], ring[(i + 1) % ring.Length]);
            var (ay, az, by, bz) = (at.Y - before.Y, at.Z - before.Z, after.Y - at.Y, after.Z - at.Z);
            var turn = Math.Atan2(ay * bz - az * by, ay * by + az * bz) - 2 * Math.Atan(before.Bulge) - 2 * Math.Atan(at.Bulge);
            if (turn < -1e-6) return false;
        }

        return true;
    }
}
