using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Ifc.Tests;

/// <summary>Comparison of vectors and section forces within a share of the largest part.</summary>
internal static class Near
{
    public static void Vector(Vector3 expected, Vector3 actual, double within = 1e-9) =>
        Assert.True((expected - actual).Length <= within * Math.Max(1, expected.Length), $"expected {expected}, got {actual}");

    public static void Forces(SectionForces expected, SectionForces actual, double relative = 1e-9)
    {
        var (e, a) = (Parts(expected), Parts(actual));
        for (var i = 0; i < 6; i++)
        {
            var scale = i < 3 ? e[..3].Max(Math.Abs) : e[3..].Max(Math.Abs);
            Assert.True(Math.Abs(e[i] - a[i]) <= relative * Math.Max(scale, 1e-6), $"expected {expected}, got {actual}");
        }
    }

    private static double[] Parts(SectionForces f) => [f.N, f.Vy, f.Vz, f.T, f.My, f.Mz];
}
