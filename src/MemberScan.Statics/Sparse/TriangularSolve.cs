using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace MemberScan.Statics.Sparse;

/// <summary>Solutions with a factor: one right-hand side, or eight side by side.</summary>
internal static class TriangularSolve
{
    /// <summary>Right-hand sides of a group.</summary>
    public const int Group = 8;

    /// <summary>Solves <c>K·x = f</c> in place for any number of right-hand sides, each of all unknowns in the order of the nodes; fixed ones become 0.</summary>
    /// <param name="factor">A whole factor.</param>
    /// <param name="vectors">Right-hand sides; receive the solutions.</param>
    /// <param name="threads">Threads to use; every number gives the same bits.</param>
    public static void Solve(SupernodalCholesky factor, IReadOnlyList<double[]> vectors, int threads)
    {
        var groups = (vectors.Count + Group - 1) / Group;
        if (threads > 1 && groups > 1) Parallel.For(0, groups, new ParallelOptions { MaxDegreeOfParallelism = threads }, g => SolveGroup(factor, vectors, g * Group));
        else
            for (var g = 0; g < groups; g++) SolveGroup(factor, vectors, g * Group);
    }

    // Bits must not depend on how many others there are beside: a group of one goes the same way as a group of eight.
    private static void SolveGroup(SupernodalCholesky factor, IReadOnlyList<double[]> vectors, int from)
    {
        var count = Math.Min(Group, vectors.Count - from);
        var x = new double[factor.Symbolic.Unknowns * Group];
        for (var lane = 0; lane < count; lane++) Scatter(factor, vectors[from + lane], x, lane, isBack: false);
        var height = factor.Symbolic.Supernodes.Length == 0 ? 0 : factor.Symbolic.Supernodes.Max(s => s.Height);
        var buffer = new double[height * Group];
        for (var s = 0; s < factor.Symbolic.Supernodes.Length; s++) Forward(factor.Symbolic.Supernodes[s], factor.Panel(s), x, buffer);
        for (var s = factor.Symbolic.Supernodes.Length - 1; s >= 0; s--) Backward(factor.Symbolic.Supernodes[s], factor.Panel(s), x, buffer);
        for (var lane = 0; lane < count; lane++) Scatter(factor, vectors[from + lane], x, lane, isBack: true);
    }

    private static void Scatter(SupernodalCholesky factor, double[] vector, double[] x, int lane, bool isBack)
    {
        var matrix = factor.Matrix;
        for (var node = 0; node < matrix.Weight.Length; node++)
        {
            var place = factor.Symbolic.DofPlace[node];
            for (var d = 0; d < 6; d++)
            {
                var i = 6 * node + d;
                if (matrix.IsFixed[i]) vector[i] = isBack ? 0 : vector[i];
                else if (isBack) vector[i] = matrix.Scale[i] * x[place++ * Group + lane];
                else x[place++ * Group + lane] = matrix.Scale[i] * vector[i];
            }
        }
    }

    // Four columns at a time, so that the rows below are read and written once for four.
    private static void Forward(Supernode s, double[] panel, double[] x, double[] buffer)
    {
        var (k, m) = (s.Pivots, s.Height);
        ref var b = ref MemoryMarshal.GetArrayDataReference(buffer);
        Load(s, x, buffer);
        var j = 0;
        for (; j + 4 <= k; j += 4)
        {
            for (var c = j; c < j + 4; c++) ForwardColumn(panel, c * m, c, Math.Min(j + 4, m), ref b);
            var (b0, b1) = (Vector512.LoadUnsafe(ref b, (nuint)(j * Group)), Vector512.LoadUnsafe(ref b, (nuint)((j + 1) * Group)));
            var (b2, b3) = (Vector512.LoadUnsafe(ref b, (nuint)((j + 2) * Group)), Vector512.LoadUnsafe(ref b, (nuint)((j + 3) * Group)));
            ReadOnlySpan<double> l0 = panel.AsSpan(j * m, m);
            ReadOnlySpan<double> l1 = panel.AsSpan((j + 1) * m, m);
            ReadOnlySpan<double> l2 = panel.AsSpan((j + 2) * m, m);
            ReadOnlySpan<double> l3 = panel.AsSpan((j + 3) * m, m);
            for (var i = j + 4; i < m; i++)
            {
                var sum = Vector512.LoadUnsafe(ref b, (nuint)(i * Group));
                sum = Vector512.FusedMultiplyAdd(b0, Vector512.Create(-l0[i]), sum);
                sum = Vector512.FusedMultiplyAdd(b1, Vector512.Create(-l1[i]), sum);
                sum = Vector512.FusedMultiplyAdd(b2, Vector512.Create(-l2[i]), sum);
                Vector512.FusedMultiplyAdd(b3, Vector512.Create(-l3[i]), sum).StoreUnsafe(ref b, (nuint)(i * Group));
            }
        }

        for (; j < k; j++) ForwardColumn(panel, j * m, j, m, ref b);
        Store(s, x, buffer, s.Height);
    }

    private static void ForwardColumn(double[] panel, int column, int j, int end, ref double b)
    {
        var solved = Vector512.LoadUnsafe(ref b, (nuint)(j * Group)) / Vector512.Create(panel[column + j]);
        solved.StoreUnsafe(ref b, (nuint)(j * Group));
        for (var i = j + 1; i < end; i++)
            Vector512.FusedMultiplyAdd(solved, Vector512.Create(-panel[column + i]), Vector512.LoadUnsafe(ref b, (nuint)(i * Group))).StoreUnsafe(ref b, (nuint)(i * Group));
    }

    private static void Backward(Supernode s, double[] panel, double[] x, double[] buffer)
    {
        var (k, m) = (s.Pivots, s.Height);
        ref var b = ref MemoryMarshal.GetArrayDataReference(buffer);
        Load(s, x, buffer);
        var j = k;
        for (; j - 4 >= 0; j -= 4)
        {
            ReadOnlySpan<double> l0 = panel.AsSpan((j - 4) * m, m);
            ReadOnlySpan<double> l1 = panel.AsSpan((j - 3) * m, m);
            ReadOnlySpan<double> l2 = panel.AsSpan((j - 2) * m, m);
            ReadOnlySpan<double> l3 = panel.AsSpan((j - 1) * m, m);
            var (s0, s1) = (Vector512.LoadUnsafe(ref b, (nuint)((j - 4) * Group)), Vector512.LoadUnsafe(ref b, (nuint)((j - 3) * Group)));
            var (s2, s3) = (Vector512.LoadUnsafe(ref b, (nuint)((j - 2) * Group)), Vector512.LoadUnsafe(ref b, (nuint)((j - 1) * Group)));
            for (var i = j; i < m; i++)
            {
                var v = Vector512.LoadUnsafe(ref b, (nuint)(i * Group));
                s0 = Vector512.FusedMultiplyAdd(v, Vector512.Create(-l0[i]), s0);
                s1 = Vector512.FusedMultiplyAdd(v, Vector512.Create(-l1[i]), s1);
                s2 = Vector512.FusedMultiplyAdd(v, Vector512.Create(-l2[i]), s2);
                s3 = Vector512.FusedMultiplyAdd(v, Vector512.Create(-l3[i]), s3);
            }

            s0.StoreUnsafe(ref b, (nuint)((j - 4) * Group));
            s1.StoreUnsafe(ref b, (nuint)((j - 3) * Group));
            s2.StoreUnsafe(ref b, (nuint)((j - 2) * Group));
            s3.StoreUnsafe(ref b, (nuint)((j - 1) * Group));
            for (var c = j - 1; c >= j - 4; c--) BackwardColumn(panel, c * m, c, j, ref b);
        }

        for (; j > 0; j--) BackwardColumn(panel, (j - 1) * m, j - 1, m, ref b);
        Store(s, x, buffer, k);
    }

    private static void BackwardColumn(double[] panel, int column, int j, int end, ref double b)
    {
        var sum = Vector512.LoadUnsafe(ref b, (nuint)(j * Group));
        for (var i = j + 1; i < end; i++) sum = Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref b, (nuint)(i * Group)), Vector512.Create(-panel[column + i]), sum);
        (sum / Vector512.Create(panel[column + j])).StoreUnsafe(ref b, (nuint)(j * Group));
    }

    private static void Load(Supernode s, double[] x, double[] buffer)
    {
        x.AsSpan(s.First * Group, s.Pivots * Group).CopyTo(buffer);
        for (var i = 0; i < s.Rows.Length; i++) x.AsSpan(s.Rows[i] * Group, Group).CopyTo(buffer.AsSpan((s.Pivots + i) * Group));
    }

    private static void Store(Supernode s, double[] x, double[] buffer, int rows)
    {
        buffer.AsSpan(0, s.Pivots * Group).CopyTo(x.AsSpan(s.First * Group));
        for (var i = s.Pivots; i < rows; i++) buffer.AsSpan(i * Group, Group).CopyTo(x.AsSpan(s.Rows[i - s.Pivots] * Group));
    }
}
