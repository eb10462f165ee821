using CsCheck;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Foundation.Tests.Geometry;

public sealed class MemberAxesTests
{
    private static readonly Gen<Vector3> s_vector = Gen.Select(Gen.Double[-5, 5], Gen.Double[-5, 5], Gen.Double[-5, 5], (x, y, z) => new Vector3(x, y, z));

    [Fact]
    public void Are_right_handed_with_x_along_and_z_on_the_given_side() =>
        Gen.Select(s_vector, s_vector).Where((along, side) => along.Cross(side).Length > 0.1).Sample((along, side) =>
        {
            var axes = MemberAxes.From(new Vector3(1, 2, 3), along, side)!;

            Assert.True((axes.Z.Cross(axes.X) - axes.Y).Length < 1e-9);
            Assert.True((axes.X.Cross(axes.Y) - axes.Z).Length < 1e-9);
            Assert.True((along.Length * axes.X - along).Length < 1e-9);
            Assert.True(axes.Z.Dot(side) > 0);
            Assert.True(Math.Abs(axes.Y.Dot(side)) < 1e-9);
        });

    [Fact]
    public void Components_of_a_vector_keep_its_length() =>
        Gen.Select(s_vector, s_vector, s_vector).Where((along, side, _) => along.Cross(side).Length > 0.1).Sample((along, side, v) =>
        {
            var axes = MemberAxes.From(Vector3.Zero, along, side)!;
            var c = axes.Components(v);

            Assert.True(Math.Abs(c.Length - v.Length) < 1e-9);
            Assert.True((c.X * axes.X + c.Y * axes.Y + c.Z * axes.Z - v).Length < 1e-9);
        });

    [Theory]
    [InlineData(0, 0, 0, 0, 0, 1)]
    [InlineData(0, 0, 1, 0, 0, 0)]
    [InlineData(0, 0, 2, 0, 0, -3)]
    [InlineData(double.NaN, 0, 1, 1, 0, 0)]
    [InlineData(0, 0, 1, double.PositiveInfinity, 0, 0)]
    public void There_are_none_for_parallel_or_missing_directions(double x, double y, double z, double sideX, double sideY, double sideZ) =>
        Assert.Null(MemberAxes.From(Vector3.Zero, new Vector3(x, y, z), new Vector3(sideX, sideY, sideZ)));
}
