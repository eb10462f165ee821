using CsCheck;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Foundation.Tests.Geometry;

public sealed class Transform3Tests
{
    private static readonly Gen<Vector3> s_vector = Gen.Select(Gen.Double[-10, 10], Gen.Double[-10, 10], Gen.Double[-10, 10], (x, y, z) => new Vector3(x, y, z));

    private static readonly Gen<Transform3> s_map = Gen.Select(s_vector, s_vector, s_vector, s_vector, (o, x, y, z) => new Transform3(o, x, y, z));

    [Fact]
    public void Maps_a_point_by_hand()
    {
        // A quarter turn about z and a shift: (1, 2, 3) goes to (−2, 1, 3) + (10, 20, 30).
        var map = new Transform3(new Vector3(10, 20, 30), Vector3.UnitY, -Vector3.UnitX, Vector3.UnitZ);

        Assert.Equal(new Vector3(8, 21, 33), map.Point(new Vector3(1, 2, 3)));
        Assert.Equal(new Vector3(-2, 1, 3), map.Direction(new Vector3(1, 2, 3)));
        Assert.Equal(1, map.Determinant);
    }

    [Fact]
    public void After_is_first_the_inner_then_the_outer_map() =>
        Gen.Select(s_map, s_map, s_vector).Sample((outer, inner, p) =>
        {
            AssertNear(outer.Point(inner.Point(p)), outer.After(inner).Point(p));
            AssertNear(outer.Direction(inner.Direction(p)), outer.After(inner).Direction(p));
        });

    [Fact]
    public void Determinants_multiply_and_the_identity_changes_nothing() =>
        Gen.Select(s_map, s_map).Sample((a, b) =>
        {
            Assert.True(Math.Abs(a.After(b).Determinant - a.Determinant * b.Determinant) < 1e-6);
            Assert.Equal(a, a.After(Transform3.Identity));
            Assert.Equal(a, Transform3.Identity.After(a));
        });

    [Fact]
    public void A_mirror_has_a_negative_determinant() =>
        Assert.Equal(-1, (Transform3.Identity with { X = -Vector3.UnitX }).Determinant);

    private static void AssertNear(Vector3 expected, Vector3 actual) => Assert.True((expected - actual).Length < 1e-9 * (1 + expected.Length));
}
