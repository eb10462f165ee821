using MemberScan.Foundation.Geometry;

namespace MemberScan.Statics.Mechanisms;

/// <summary>Principal values and axes of a symmetric 3 × 3 matrix, by Jacobi rotations.</summary>
internal static class SymmetricThree
{
    private const int Sweeps = 30;

    /// <summary>Values with their unit axes, smallest value first.</summary>
    public static (double Value, Vector3 Axis)[] Of(double xx, double yy, double zz, double xy, double xz, double yz)
    {
        double[] a = [xx, xy, xz, xy, yy, yz, xz, yz, zz];
        double[] v = [1, 0, 0, 0, 1, 0, 0, 0, 1];
        for (var sweep = 0; sweep < Sweeps; sweep++)
            foreach (var (p, q) in ((int, int)[])[(0, 1), (0, 2), (1, 2)]) Rotate(a, v, p, q);
        return [.. Enumerable.Range(0, 3).Select(k => (a[4 * k], new Vector3(v[k], v[3 + k], v[6 + k]))).OrderBy(pair => pair.Item1)];
    }

    private static void Rotate(double[] a, double[] v, int p, int q)
    {
        var apq = a[3 * p + q];
        if (apq == 0) return;

        var theta = (a[4 * q] - a[4 * p]) / (2 * apq);
        var t = (theta >= 0 ? 1 : -1) / (Math.Abs(theta) + Math.Sqrt(theta * theta + 1));
        var c = 1 / Math.Sqrt(t * t + 1);
        var s = t * c;
        for (var k = 0; k < 3; k++)
        {
            var (akp, akq) = (a[3 * k + p], a[3 * k + q]);
            (a[3 * k + p], a[3 * k + q]) = (c * akp - s * akq, s * akp + c * akq);
        }

        for (var k = 0; k < 3; k++)
        {
            var (apk, aqk) = (a[3 * p + k], a[3 * q + k]);
            (a[3 * p + k], a[3 * q + k]) = (c * apk - s * aqk, s * apk + c * aqk);
            var (vkp, vkq) = (v[3 * k + p], v[3 * k + q]);
            (v[3 * k + p], v[3 * k + q]) = (c * vkp - s * vkq, s * vkp + c * vkq);
        }
    }
}
