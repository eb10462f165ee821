using MemberScan.Statics.Sparse;

namespace MemberScan.Statics.Solving;

/// <summary>Solutions refined by residuals of twice the working precision and kept in two parts.</summary>
internal static class RefinedSolve
{
    /// <summary>Rest over load at which nothing more is to be gained.</summary>
    private const double Enough = 1e-13;

    private const int MostRounds = 6;

    /// <summary>Solves all cases; they share each pass over the factor.</summary>
    /// <param name="factor">Factor of the stiffness.</param>
    /// <param name="residual">What loads leave over.</param>
    /// <param name="cases">The cases; their displacements are found.</param>
    /// <param name="threads">Threads to use; every number gives the same bits.</param>
    public static void Run(SupernodalCholesky factor, ElementResidual residual, IReadOnlyList<LoadCase> cases, int threads)
    {
        var matrix = factor.Matrix;
        var corrections = cases.Select(c => new double[c.Loads.Length]).ToArray();
        var last = new double[cases.Count];
        var open = Enumerable.Range(0, cases.Count).ToList();
        for (var round = 0; round <= MostRounds && open.Count > 0; round++)
        {
            Each(open.Count, threads, k => Measure(matrix, residual, cases[open[k]], isFirst: round == 0));
            open.RemoveAll(k => cases[k].LargestRest <= Enough * cases[k].LargestLoad || (round > 1 && cases[k].Contraction > 0.5));
            if (round == MostRounds || open.Count == 0) break;

            foreach (var k in open) cases[k].Rest.CopyTo(corrections[k], 0);
            TriangularSolve.Solve(factor, [.. open.Select(k => corrections[k])], threads);
            Each(open.Count, threads, at =>
            {
                var k = open[at];
                var size = Apply(matrix, cases[k], corrections[k]);
                cases[k].Contraction = round == 0 || last[k] == 0 ? 0 : size / last[k];
                last[k] = size;
            });
        }
    }

    private static void Each(int count, int threads, Action<int> action)
    {
        if (threads > 1 && count > 1) Parallel.For(0, count, new ParallelOptions { MaxDegreeOfParallelism = threads }, action);
        else
            for (var k = 0; k < count; k++) action(k);
    }

    private static void Measure(ScaledMatrix matrix, ElementResidual residual, LoadCase at, bool isFirst)
    {
        residual.Measure(at);
        at.LargestRest = 0;
        for (var i = 0; i < at.Rest.Length; i++)
            if (!matrix.IsFixed[i]) at.LargestRest = Math.Max(at.LargestRest, Math.Abs(at.Rest[i]));
        if (isFirst) at.LargestLoad = at.LargestRest;
    }

    // Largest part of the correction, scaled as the matrix is.
    private static double Apply(ScaledMatrix matrix, LoadCase at, double[] correction)
    {
        var size = 0.0;
        for (var i = 0; i < correction.Length; i++)
        {
            if (matrix.IsFixed[i]) continue;

            size = Math.Max(size, Math.Abs(correction[i]) / matrix.Scale[i]);
            var sum = at.High[i] + correction[i];
            var part = sum - at.High[i];
            at.Low[i] += (at.High[i] - (sum - part)) + (correction[i] - part);
            at.High[i] = sum;
        }

        return size;
    }
}
