using MemberScan.Statics.Sparse;

namespace MemberScan.Statics.Solving;

/// <summary>Estimate of the 1-norm of the inverse of the scaled matrix, from below.</summary>
/// <remarks>Source: Higham, Tisseur, A block algorithm for matrix 1-norm estimation, SIAM J. Matrix Anal. Appl. 21 (2000); here with fixed first vectors and two rounds (from memory).</remarks>
internal static class ConditionEstimate
{
    private const int Rounds = 2;

    /// <summary>Norm of the scaled matrix times the estimate.</summary>
    public static double Of(SupernodalCholesky factor, int threads)
    {
        var matrix = factor.Matrix;
        var n = matrix.Scale.Length;
        var x = Enumerable.Range(0, TriangularSolve.Group).Select(lane => First(matrix, lane)).ToArray();
        var largest = 0.0;
        for (var round = 0; round < Rounds; round++)
        {
            Invert(factor, x, threads);
            foreach (var v in x) largest = Math.Max(largest, v.Sum(Math.Abs));
            foreach (var v in x)
                for (var i = 0; i < n; i++) v[i] = matrix.IsFixed[i] ? 0 : v[i] >= 0 ? 1 : -1;
            if (round + 1 == Rounds) break;

            Invert(factor, x, threads);
            var rows = Enumerable.Range(0, n).Where(i => !matrix.IsFixed[i]).OrderByDescending(i => x.Max(v => Math.Abs(v[i]))).ThenBy(i => i).Take(x.Length).ToArray();
            for (var lane = 0; lane < x.Length; lane++)
            {
                Array.Clear(x[lane]);
                if (lane < rows.Length) x[lane][rows[lane]] = 1;
            }
        }

        return largest * matrix.Matrix.Norm(matrix.Scale);
    }

    private static double[] First(ScaledMatrix matrix, int lane)
    {
        var (x, count) = (new double[matrix.Scale.Length], (double)matrix.Weight.Sum());
        for (var i = 0; i < x.Length; i++)
            if (!matrix.IsFixed[i]) x[i] = (lane > 0 && System.Numerics.BitOperations.PopCount((uint)(i * 2654435761L >> 7) & (uint)(lane * 0x9E3779B1L)) % 2 == 1 ? -1 : 1) / count;
        return x;
    }

    // (S·K·S)⁻¹·x = S⁻¹·K⁻¹·S⁻¹·x.
    private static void Invert(SupernodalCholesky factor, double[][] x, int threads)
    {
        Unscale(factor.Matrix, x);
        TriangularSolve.Solve(factor, x, threads);
        Unscale(factor.Matrix, x);
    }

    private static void Unscale(ScaledMatrix matrix, double[][] x)
    {
        foreach (var v in x)
            for (var i = 0; i < v.Length; i++) v[i] = matrix.IsFixed[i] ? 0 : v[i] / matrix.Scale[i];
    }
}
