using MemberScan.Statics.Solving;

namespace MemberScan.Statics.Results;

/// <summary>Betti's theorem as a check: two situations do the same work on each other's displacements.</summary>
internal static class Reciprocity
{
    /// <summary>Largest difference over neighbouring situations, against the root of the product of their own works; null for one situation.</summary>
    public static double? Of(FrameSolution solution)
    {
        var cases = solution.Cases;
        if (cases.Length < 2) return null;

        var worst = 0.0;
        for (var s = 0; s + 1 < cases.Length; s++)
        {
            var (a, b) = (cases[s], cases[s + 1]);
            var own = Math.Sqrt(Math.Abs(Work(a, a) * Work(b, b)));
            if (own > 0) worst = Math.Max(worst, Math.Abs(Work(a, b) - Work(b, a)) / own);
        }

        return worst;
    }

    // Loads and reactions of one on the displacements of the other; Rest is load less what the structure answers.
    private static double Work(LoadCase forces, LoadCase moved)
    {
        var sum = 0.0;
        for (var i = 0; i < forces.Loads.Length; i++) sum += (forces.Loads[i] - forces.Rest[i]) * (moved.High[i] + moved.Low[i]);
        return sum;
    }
}
