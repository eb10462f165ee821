using MemberScan.Checks.Aisc360;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Tests.Aisc360;

public sealed class DesignWallTests
{
    [Theory]
    [InlineData(4.000, 0.250, 2.76, 4.91, 2.45, 3.31)]
    [InlineData(6.000, 0.250, 4.22, 17.6, 5.86, 7.75)]
    public void Round_sections_have_the_tabulated_properties(double diameter, double wall, double area, double inertia, double elastic, double plastic)
    {
        // AISC Steel Construction Manual, 14th and 15th edition, Table 1-13, from memory; the table rounds the wall to 0.233 in, 0.2 % more.
        var properties = SectionProperties.Of(DesignWall.Of(new Tube(Si.In(diameter) / 2, Si.In(wall)), DesignWall.Share));

        Assert.Equal(1, properties.Area / Math.Pow(Si.Inch, 2) / area, 0.004);
        Assert.Equal(1, properties.Iy / Math.Pow(Si.Inch, 4) / inertia, 0.004);
        Assert.Equal(1, properties.WelY / Math.Pow(Si.Inch, 3) / elastic, 0.004);
        Assert.Equal(1, properties.WplY / Math.Pow(Si.Inch, 3) / plastic, 0.004);
    }

    [Fact]
    public void A_square_section_keeps_its_outer_size_and_solid_bars_stay_as_they_are()
    {
        var box = (Box)DesignWall.Of(new Box(Si.In(4), Si.In(4), Si.In(0.25), Si.In(0.5), Si.In(0.25)), 0.93);
        var bar = new Round(0.01);

        Assert.Equal(Si.In(4), box.Width, 15);
        Assert.Equal(Si.In(0.2325), box.Wall, 15);
        Assert.Equal(2 * box.Wall, box.OuterRadius, 15);
        Assert.Same(bar, DesignWall.Of(bar, 0.93));
    }

    [Theory]
    [InlineData("A1085", 1)]
    [InlineData("ASTM A1065 Gr 50", 1)]
    [InlineData("A500 Gr B", 0.93)]
    [InlineData("", 0.93)]
    public void The_whole_wall_counts_for_a1065_and_a1085_alone(string grade, double share) => Assert.Equal(share, DesignWall.ShareOf(grade));

    [Theory]
    [InlineData(0)]
    [InlineData(1.01)]
    [InlineData(double.NaN)]
    public void A_share_out_of_range_is_refused(double share) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => DesignWall.Of(new Round(1), share));
}
