using System.Collections.Concurrent;
using MemberScan.Mechanics.Meshes;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Warping;

/// <summary>Numerical fields by section, each solved once while it is among the latest in use.</summary>
internal static class SolvedSections
{
    /// <summary>Fields kept; one takes some hundred kilobytes.</summary>
    public const int Kept = 64;

    /// <summary>Torsion constants kept.</summary>
    public const int KeptConstants = 16384;

    private static readonly ConcurrentDictionary<CrossSection, (double J, double Wt, double Change)> s_torsion = new();
    private static readonly ConcurrentDictionary<CrossSection, Lazy<WarpingSolution>> s_solutions = new();
    private static readonly ConcurrentQueue<CrossSection> s_order = new();

    /// <summary>The numerical field of a box or a rounded rectangle.</summary>
    public static WarpingSolution Of(CrossSection section)
    {
        if (s_solutions.TryGetValue(section, out var known)) return known.Value;

        var made = new Lazy<WarpingSolution>(() => Solve(section));
        var kept = s_solutions.GetOrAdd(section, made);
        if (ReferenceEquals(kept, made)) s_order.Enqueue(section);
        while (s_order.Count > Kept && s_order.TryDequeue(out var oldest)) s_solutions.TryRemove(oldest, out _);
        return kept.Value;
    }

    /// <summary>J [m⁴], Wt [m³] and the change of J at the last refinement [-].</summary>
    public static (double J, double Wt, double Change) Torsion(CrossSection section)
    {
        if (s_torsion.TryGetValue(section, out var known)) return known;

        var solution = Of(section);
        var torsion = (solution.J, 1 / solution.LargestTwistStress(Counts(section)), solution.TorsionError);
        if (s_torsion.Count >= KeptConstants) s_torsion.Clear();
        s_torsion[section] = torsion;
        return torsion;
    }

    private static Func<double, double, bool> Counts(CrossSection section) => section switch
    {
        Box box => (y, z) => !ReentrantZone.Covers(box, y, z),
        _ => (_, _) => true,
    };

    private static WarpingSolution Solve(CrossSection section) => section switch
    {
        Box box => WarpingSolution.Of(WalledMesh.Of(box), Counts(box)),
        RoundedRectangle rounded => WarpingSolution.Of(WalledMesh.Of(rounded), Counts(rounded)),
        _ => throw new ArgumentOutOfRangeException(nameof(section), section.Kind, "no numerical field for this kind"),
    };
}
