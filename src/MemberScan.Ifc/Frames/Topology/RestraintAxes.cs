using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>The same restraints said in other axes.</summary>
internal static class RestraintAxes
{
    /// <summary>Largest sine of the angle at which two axes still are one.</summary>
    private const double Parallel = 1e-6;

    /// <summary>The restraints in other axes; null when the axes lie askew and the directions are held unequally, so that none says the same.</summary>
    /// <param name="restraints">The restraints.</param>
    /// <param name="from">Axes in which they are given; their origin does not matter.</param>
    /// <param name="to">Axes wanted.</param>
    public static Restraints? Turned(Restraints restraints, MemberAxes from, MemberAxes to)
    {
        if (Three(restraints.Ux, restraints.Uy, restraints.Uz, from, to) is not { } shifts) return null;
        if (Three(restraints.Rx, restraints.Ry, restraints.Rz, from, to) is not { } turns) return null;

        return new Restraints(shifts[0], shifts[1], shifts[2], turns[0], turns[1], turns[2]);
    }

    private static Restraint[]? Three(Restraint x, Restraint y, Restraint z, MemberAxes from, MemberAxes to)
    {
        Restraint[] given = [x, y, z];
        if (x == y && y == z) return given;

        Vector3[] old = [from.X, from.Y, from.Z];
        Vector3[] wanted = [to.X, to.Y, to.Z];
        var turned = new Restraint[3];
        for (var i = 0; i < 3; i++)
        {
            var same = Array.FindIndex(old, axis => axis.Cross(wanted[i]).Length <= Parallel);
            if (same < 0 && Pair(given, old, wanted[i]) is not { } pair) return null;

            turned[i] = same >= 0 ? given[same] : Pair(given, old, wanted[i])!.Value;
        }

        return turned;
    }

    /// <summary>Where an axis lies in the plane of two old ones that are held alike, it is held as both are.</summary>
    private static Restraint? Pair(Restraint[] given, Vector3[] old, Vector3 axis)
    {
        for (var i = 0; i < 3; i++)
            if (Math.Abs(old[i].Dot(axis)) <= Parallel && given[(i + 1) % 3] == given[(i + 2) % 3])
                return given[(i + 1) % 3];
        return null;
    }
}
