using System.Collections.Concurrent;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Warping;

/// <summary>Numerical fields by section, each solved once while it is among the latest in use.</summary>
internal static class SolvedSections
{
    /// <summary>Fields kept; one takes some hundred kilobytes.</summary>
    public const int Kept = 64;

    /// <summary>Torsion constants kept.</summary>
    public const int KeptConstants = 16384;

    private static readonly ConcurrentDictionary<CrossSection, TorsionConstants> s_torsion = new();
    private static readonly ConcurrentDictionary<CrossSection, Lazy<WarpingSolution?>> s_solutions = new();
    private static readonly ConcurrentQueue<CrossSection> s_order = new();

    /// <summary>The numerical field of a box, a rounded rectangle, an outline or an open profile; null where its dimensions are too far apart to be solved.</summary>
    public static WarpingSolution? TryOf(CrossSection section)
    {
        if (s_solutions.TryGetValue(section, out var known)) return known.Value;

        var made = new Lazy<WarpingSolution?>(() => Solve(section));
        var kept = s_solutions.GetOrAdd(section, made);
        if (ReferenceEquals(kept, made)) s_order.Enqueue(section);
        while (s_order.Count > Kept && s_order.TryDequeue(out var oldest)) s_solutions.TryRemove(oldest, out _);
        return kept.Value;
    }

    /// <summary>What a section's numerical field gives for its properties; null where there is none.</summary>
    public static TorsionConstants? Torsion(CrossSection section)
    {
        if (s_torsion.TryGetValue(section, out var known)) return known;

        if (TryOf(section) is not { } solution) return null;

        var torsion = new TorsionConstants(solution.J, 1 / solution.LargestTwistStress(Counts(section)), solution.TorsionError, solution.Potential.FlexureMoments());
        if (s_torsion.Count >= KeptConstants) s_torsion.Clear();
        s_torsion[section] = torsion;
        return torsion;
    }

    private static Func<double, double, bool> Counts(CrossSection section) => section switch
    {
        Box box => (y, z) => !ReentrantZone.Covers(box, y, z),
        OutlineSection or OpenProfile => CountsIn(new OutlineShape(ProfileEdges.Of(section))),
        _ => (_, _) => true,
    };

    private static Func<double, double, bool> CountsIn(OutlineShape shape) => (y, z) => !shape.IsNearCorner(y, z, 0);

    private static WarpingSolution? Solve(CrossSection section) => section switch
    {
        Box box => WarpingSolution.TryOf(WalledMesh.Of(box), Counts(box)),
        RoundedRectangle rounded => WarpingSolution.TryOf(WalledMesh.Of(rounded), Counts(rounded)),
        OpenProfile profile => WarpingSolution.TryOf(
            JunctionMesh.Of(ProfileJunctions.Of(profile), ProfileJunctions.IsQuarter(profile), 0.5 * Math.Max(profile.Width, profile.Depth)), Counts(profile)),
        OutlineSection => OutlineMesh.TryOf(new OutlineShape(ProfileEdges.Of(section))) is { } mesh
            ? WarpingSolution.TryOf(mesh, Counts(section)) : null,
        _ => throw new ArgumentOutOfRangeException(nameof(section), section.Kind, "no numerical field for this kind"),
    };
}
