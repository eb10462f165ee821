using MemberScan.Mechanics.Meshes;

namespace MemberScan.Mechanics.Warping;

/// <summary>Solves Saint-Venant's torsion and flexure of a section for the potential ψ of the shear stresses.</summary>
/// <remarks>
/// <para>With <c>dσ/dx = a·y + b·z</c> and κ = ν/(1+ν): <c>τ = ∇ψ + e</c>, <c>e = κ(a·z²/2, b·y²/2) + C(−z, y)/2</c>, so that the curl is
/// <c>κ(b·y − a·z) + C</c> as the equations of Beltrami and Michell ask, with the mean twist zero for C = 0. Then
/// <c>∫(∇ψ + e)·∇v dA = ∫(a·y + b·z)·v dA</c> for every v, which holds the equilibrium inside and the free edge at once.
/// Source: Timoshenko and Goodier, Theory of Elasticity, chapters 10 and 11; W. D. Pilkey, Analysis and Design of Elastic Beams,
/// chapters 5 and 6 (both from memory).</para>
/// <para>Loads in order: twist e = (−z, y); a = 1; b = 1; the ν-part of a; the ν-part of b. The matrix does not depend on ν.</para>
/// </remarks>
internal static class WarpingSolver
{
    /// <summary>Solves for polynomials of a degree; null where the matrix cannot be factored.</summary>
    public static WarpingPotential? TrySolve(PatchMesh mesh, int degree)
    {
        var rule = SpectralRule.Of(degree);
        var order = PatchStiffness.Order(rule);
        var numbers = new NodeNumbers(mesh, rule);
        var patches = mesh.Patches.Select(patch => new PatchStiffness(patch, rule, order)).ToArray();
        var equations = Equations(numbers);
        var solutions = new double[PatchStiffness.Loads][];
        (int Load, bool FixY, bool FixZ)[] cases = [(0, true, true), (1, true, false), (2, false, true), (3, true, false), (4, false, true)];
        foreach (var group in cases.GroupBy(c => mesh.IsQuarter ? (c.FixY, c.FixZ) : (false, false)))
        {
            // Odd in y: zero on the z axis; odd in z: zero on the y axis. A whole section may slide along x: one node is held.
            var onAxis = 1e-11 * mesh.Scale;
            bool IsHeld(int node) => mesh.IsQuarter
                ? (group.Key.Item1 && Math.Abs(numbers.Place(node).Y) <= onAxis) || (group.Key.Item2 && Math.Abs(numbers.Place(node).Z) <= onAxis)
                : node == 0;
            var held = new bool[numbers.Count];
            for (var node = 0; node < held.Length; node++) held[node] = IsHeld(node);
            if (Assemble(numbers, equations, patches, held) is not { } matrix) return null;

            foreach (var (load, _, _) in group)
            {
                var right = new double[numbers.Count];
                for (var e = 0; e < patches.Length; e++)
                {
                    for (var k = 0; k < patches[e].Sides; k++) right[equations[numbers.OfPatch[e][k]]] += patches[e].Load(load, k);
                }

                for (var node = 0; node < held.Length; node++)
                    if (held[node]) right[equations[node]] = 0;
                matrix.Solve(right);
                solutions[load] = right;
            }
        }

        return new WarpingPotential(mesh, rule, Recover(rule, order, numbers, equations, patches, solutions));
    }

    private static SkylineCholesky? Assemble(NodeNumbers numbers, int[] equations, PatchStiffness[] patches, bool[] held)
    {
        var first = Enumerable.Range(0, numbers.Count).ToArray();
        foreach (var nodes in numbers.OfPatch)
        {
            var least = nodes.Min(node => equations[node]);
            foreach (var node in nodes) first[equations[node]] = Math.Min(first[equations[node]], least);
        }

        var matrix = new SkylineCholesky(first);
        for (var e = 0; e < patches.Length; e++)
        {
            var nodes = numbers.OfPatch[e];
            for (var i = 0; i < nodes.Length; i++)
            {
                if (held[nodes[i]]) continue;
                for (var j = 0; j <= i; j++)
                {
                    if (held[nodes[j]]) continue;
                    var (row, column) = (Math.Max(equations[nodes[i]], equations[nodes[j]]), Math.Min(equations[nodes[i]], equations[nodes[j]]));
                    // Two side nodes of a patch may be one: its entry then counts from both sides of the diagonal.
                    matrix.Add(row, column, i != j && row == column ? 2 * patches[e].Matrix(i, j) : patches[e].Matrix(i, j));
                }
            }
        }

        for (var node = 0; node < held.Length; node++)
            if (held[node]) matrix.Add(equations[node], equations[node], 1);
        return matrix.TryFactor() ? matrix : null;
    }

    // Reverse Cuthill–McKee: from a node far out, neighbours with few neighbours first.
    private static int[] Equations(NodeNumbers numbers)
    {
        var touching = new List<int>[numbers.Count];
        for (var node = 0; node < touching.Length; node++) touching[node] = [];
        for (var e = 0; e < numbers.OfPatch.Length; e++)
            foreach (var node in numbers.OfPatch[e]) touching[node].Add(e);

        var start = Walk(0)[^1];
        var reached = Walk(start);
        var equations = new int[numbers.Count];
        for (var i = 0; i < reached.Count; i++) equations[reached[i]] = reached.Count - 1 - i;
        return equations;

        List<int> Walk(int from)
        {
            var (seen, done) = (new bool[numbers.Count], new bool[numbers.OfPatch.Length]);
            var queue = new List<int> { from };
            seen[from] = true;
            for (var next = 0; next < queue.Count || Refill(queue, seen); next++)
            {
                foreach (var e in touching[queue[next]])
                {
                    if (done[e]) continue;
                    done[e] = true;
                    foreach (var node in numbers.OfPatch[e].OrderBy(n => touching[n].Count))
                    {
                        if (seen[node]) continue;
                        seen[node] = true;
                        queue.Add(node);
                    }
                }
            }

            return queue;
        }

        static bool Refill(List<int> queue, bool[] seen)
        {
            var node = Array.IndexOf(seen, false);
            if (node < 0) return false;
            seen[node] = true;
            queue.Add(node);
            return true;
        }
    }

    // Values at all nodes of every patch: patch × load × (i·n + j).
    private static double[][] Recover(
        SpectralRule rule, int[] order, NodeNumbers numbers, int[] equations, PatchStiffness[] patches, double[][] solutions)
    {
        var all = rule.Count * rule.Count;
        var values = new double[patches.Length][];
        Span<double> local = new double[all];
        for (var e = 0; e < patches.Length; e++)
        {
            values[e] = new double[PatchStiffness.Loads * all];
            for (var load = 0; load < PatchStiffness.Loads; load++)
            {
                local.Clear();
                for (var k = 0; k < patches[e].Sides; k++) local[all - patches[e].Sides + k] = solutions[load][equations[numbers.OfPatch[e][k]]];
                patches[e].Recover(load, local);
                for (var k = 0; k < all; k++) values[e][load * all + order[k]] = local[k];
            }
        }

        return values;
    }
}
