using MemberScan.Foundation.Geometry;

namespace MemberScan.Foundation.Tests.Geometry;

public sealed class Vector3Tests
{
    [Fact]
    public void Products_follow_the_right_hand()
    {
        Assert.Equal(Vector3.UnitZ, Vector3.UnitX.Cross(Vector3.UnitY));
        Assert.Equal(Vector3.UnitX, Vector3.UnitY.Cross(Vector3.UnitZ));
        Assert.Equal(32, new Vector3(1, 2, 3).Dot(new Vector3(4, 5, 6)));
        Assert.Equal(new Vector3(-3, 6, -3), new Vector3(1, 2, 3).Cross(new Vector3(4, 5, 6)));
        Assert.Equal(7, new Vector3(2, 3, 6).Length);
    }

    [Theory]
    [InlineData(3e200, 4e200, 0, false)]
    [InlineData(3e-100, 4e-100, 0, true)]
    [InlineData(0, 0, 0, false)]
    [InlineData(double.NaN, 1, 0, false)]
    public void A_direction_exists_for_lengths_that_can_be_told(double x, double y, double z, bool exists)
    {
        Assert.Equal(exists, new Vector3(x, y, z).TryNormalize(out var unit));
        Assert.Equal(exists ? 1 : 0, unit.Length, 12);
    }

    [Fact]
    public void Finite_means_all_three() => Assert.False(new Vector3(0, double.NegativeInfinity, 0).IsFinite);
}
