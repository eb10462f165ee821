namespace MemberScan.Statics.Members;

/// <summary>Dense algebra on matrices of six rows.</summary>
internal static class SmallMatrix
{
    /// <summary>Inverse of a symmetric positive definite 6 × 6 matrix, row-major; false where it is none.</summary>
    public static bool TryInvert(ReadOnlySpan<double> matrix, Span<double> inverse)
    {
        const int N = 6;
        Span<double> scale = stackalloc double[N], l = stackalloc double[N * N];
        for (var i = 0; i < N; i++)
        {
            if (!(matrix[i * N + i] > 0)) return false;
            scale[i] = 1 / Math.Sqrt(matrix[i * N + i]);
        }

        for (var j = 0; j < N; j++)
        {
            for (var i = j; i < N; i++)
            {
                var sum = matrix[i * N + j] * scale[i] * scale[j];
                for (var k = 0; k < j; k++) sum -= l[i * N + k] * l[j * N + k];
                if (i == j && !(sum > 1e-15)) return false;
                l[i * N + j] = i == j ? Math.Sqrt(sum) : sum / l[j * N + j];
            }
        }

        Span<double> x = stackalloc double[N];
        for (var column = 0; column < N; column++)
        {
            x.Clear();
            x[column] = 1;
            SolveLower(l, x);
            for (var i = 0; i < N; i++) inverse[i * N + column] = x[i] * scale[i] * scale[column];
        }

        for (var i = 0; i < N; i++)
            for (var j = 0; j < i; j++) inverse[i * N + j] = inverse[j * N + i] = 0.5 * (inverse[i * N + j] + inverse[j * N + i]);
        return true;
    }

    private static void SolveLower(ReadOnlySpan<double> l, Span<double> x)
    {
        const int N = 6;
        for (var i = 0; i < N; i++)
        {
            for (var k = 0; k < i; k++) x[i] -= l[i * N + k] * x[k];
            x[i] /= l[i * N + i];
        }

        for (var i = N - 1; i >= 0; i--)
        {
            for (var k = i + 1; k < N; k++) x[i] -= l[k * N + i] * x[k];
            x[i] /= l[i * N + i];
        }
    }
}
