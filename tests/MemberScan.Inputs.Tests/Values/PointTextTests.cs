using MemberScan.Inputs.Values;

namespace MemberScan.Inputs.Tests.Values;

public sealed class PointTextTests
{
    [Fact]
    public void A_point_is_read_in_metres()
    {
        var read = PointText.TryParse("z=-0.5in y=0mm", out var y, out var z, out var error);

        Assert.True(read, error);
        Assert.Equal(0, y);
        Assert.Equal(-0.0127, z, 1e-15);
    }

    [Theory]
    [InlineData("y=0mm", "'z' is missing; give both, such as y=0mm z=10mm")]
    [InlineData("z=0mm", "'y' is missing; give both, such as y=0mm z=10mm")]
    [InlineData("x=0mm", "'x' is not one of the names; known are y, z")]
    [InlineData("y=0 z=1mm", "y: the unit is missing; give one of m, mm, cm, in, ft")]
    [InlineData("y=0kN z=1mm", "y: 'kN' is a unit of force, not of length; give one of m, mm, cm, in, ft")]
    public void A_wrong_point_is_refused_with_the_remedy(string text, string expected)
    {
        var read = PointText.TryParse(text, out _, out _, out var error);

        Assert.False(read);
        Assert.Equal(expected, error);
    }
}
