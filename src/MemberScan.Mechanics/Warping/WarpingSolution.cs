using MemberScan.Mechanics.Meshes;

namespace MemberScan.Mechanics.Warping;

/// <summary>The numerical field of a section: potentials, torsion constant and the error that is left, for every ν.</summary>
internal sealed class WarpingSolution
{
    private const int FirstDegree = 6;
    private const int FirstDegreeOfManyPatches = 4;
    private const int LastDegreeOfManyPatches = 8;
    private const int LastDegreeOfManyGraded = 10;
    private const int ManyPatches = 130;
    private const int LastDegree = 12;
    private const double TorsionTolerance = 1e-5;
    private const double StressTolerance = 2e-3;
    private const int Components = 10;

    // What changes more at the last refinement is no result.
    private const double LargestChange = 0.05;

    private WarpingSolution(WarpingPotential potential, double j, double torsionError, double stressError)
    {
        (Potential, J, TorsionError, StressError) = (potential, j, torsionError, stressError);
        Locator = new PatchLocator(potential.Mesh);
    }

    /// <summary>The potentials.</summary>
    public WarpingPotential Potential { get; }

    /// <summary>Finds the patch of a point.</summary>
    public PatchLocator Locator { get; }

    /// <summary>Torsion constant [m⁴].</summary>
    public double J { get; }

    /// <summary>Change of J between the last two refinements [-].</summary>
    public double TorsionError { get; }

    /// <summary>Largest change of a shear stress between the last two refinements, against the largest stress of its load [-].</summary>
    public double StressError { get; }

    /// <summary>Solves with polynomials of rising degree until two successive results agree; null where the mesh is too distorted for that.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="counts">Whether the stress at a place counts for the comparison; those at sharp re-entrant corners do not.</param>
    public static WarpingSolution? TryOf(PatchMesh mesh, Func<double, double, bool> counts)
    {
        (WarpingPotential Potential, double J, double[] Stresses)? last = null;
        var (torsionError, stressError) = (1.0, 1.0);
        var areMany = mesh.Patches.Count > ManyPatches && !mesh.IsGraded;
        for (var degree = areMany ? FirstDegreeOfManyPatches : FirstDegree; degree <= LastDegreeOf(mesh); degree += 2)
        {
            if (WarpingSolver.TrySolve(mesh, degree) is not { } potential) break;

            var j = potential.Torsion().J;
            var stresses = Probe(potential, counts);
            if (last is { } before)
            {
                torsionError = Math.Abs(before.J / j - 1);
                stressError = Difference(before.Stresses, stresses);
            }

            last = (potential, j, stresses);
            if (torsionError <= TorsionTolerance && stressError <= StressTolerance) break;
        }

        return last is { } found && found.J > 0 && torsionError <= LargestChange && stressError <= LargestChange
            ? new WarpingSolution(found.Potential, found.J, torsionError, stressError)
            : null;
    }

    private static int LastDegreeOf(PatchMesh mesh) => mesh.Patches.Count <= ManyPatches ? LastDegree : mesh.IsGraded ? LastDegreeOfManyGraded : LastDegreeOfManyPatches;

    /// <summary>Largest shear stress of unit T among the nodes of all patches, those that count [1/m³].</summary>
    public double LargestTwistStress(Func<double, double, bool> counts)
    {
        var (largest, nodes) = (0.0, Potential.Rule.Nodes);
        for (var e = 0; e < Potential.Mesh.Patches.Count; e++)
        {
            foreach (var xi in nodes)
            {
                foreach (var eta in nodes)
                {
                    var at = Potential.Mesh.Patches[e].Map(xi, eta);
                    if (at.Determinant == 0 || !counts(at.Y, at.Z)) continue;
                    var (y, z) = WarpingPotential.Gradient(at, Potential.Coefficients(e, 0), xi, eta);
                    largest = Math.Max(largest, double.Hypot(y - at.Z, z + at.Y));
                }
            }
        }

        return largest / J;
    }

    // Shear stresses of twist and of both slopes of σ for ν = 0 and 1/2, at the corners and the middle of each patch.
    private static double[] Probe(WarpingPotential potential, Func<double, double, bool> counts)
    {
        const double LargestKappa = 1.0 / 3;
        ReadOnlySpan<(double Xi, double Eta)> places = [(0, 0), (-0.999, -0.999), (0.999, -0.999), (0.999, 0.999), (-0.999, 0.999), (0, 0.999), (0, -0.999)];

        var patches = potential.Mesh.Patches;
        var stresses = new List<double>(patches.Count * places.Length * Components);
        Span<(double Y, double Z)> g = stackalloc (double, double)[PatchStiffness.Loads];
        for (var e = 0; e < patches.Count; e++)
        {
            foreach (var (xi, eta) in places)
            {
                var at = patches[e].Map(xi, eta);
                if (!counts(at.Y, at.Z)) continue;
                for (var load = 0; load < g.Length; load++) g[load] = WarpingPotential.Gradient(at, potential.Coefficients(e, load), xi, eta);
                stresses.AddRange(
                [
                    g[0].Y - at.Z, g[0].Z + at.Y, g[1].Y, g[1].Z, g[2].Y, g[2].Z,
                    g[1].Y + LargestKappa * (g[3].Y + 0.5 * at.Z * at.Z), g[1].Z + LargestKappa * g[3].Z,
                    g[2].Y + LargestKappa * g[4].Y, g[2].Z + LargestKappa * (g[4].Z + 0.5 * at.Y * at.Y),
                ]);
            }
        }

        return [.. stresses];
    }

    private static double Difference(double[] before, double[] after)
    {
        var worst = 0.0;
        Span<double> largest = stackalloc double[Components / 2], changed = stackalloc double[Components / 2];
        largest.Clear();
        changed.Clear();
        for (var i = 0; i < after.Length; i++)
        {
            var kind = i / 2 % largest.Length;
            largest[kind] = Math.Max(largest[kind], Math.Abs(after[i]));
            changed[kind] = Math.Max(changed[kind], Math.Abs(after[i] - before[i]));
        }

        for (var kind = 0; kind < largest.Length; kind++)
            if (largest[kind] > 0) worst = Math.Max(worst, changed[kind] / largest[kind]);
        return worst;
    }
}
