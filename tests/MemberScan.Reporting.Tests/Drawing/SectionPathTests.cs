using MemberScan.Mechanics.Sections;
using MemberScan.Reporting.Drawing;

namespace MemberScan.Reporting.Tests.Drawing;

public sealed class SectionPathTests
{
    [Fact]
    public void Draws_a_rectangle_by_its_corners() =>
        Assert.Equal("M80 60L120 60L120 140L80 140L80 60Z", SectionPath.Of(new Rectangle(0.04, 0.08), 100, 100, 1000));

    [Fact]
    public void Draws_a_round_bar_as_four_quarter_circles() =>
        Assert.Equal(
            "M100 90L100 90A10 10 0 0 1 110 100L110 100A10 10 0 0 1 100 110L100 110A10 10 0 0 1 90 100L90 100A10 10 0 0 1 100 90Z",
            SectionPath.Of(new Round(0.01), 100, 100, 1000));

    [Fact]
    public void Draws_the_hole_of_a_hollow_section()
    {
        Assert.Equal(2, SectionPath.Of(new Tube(0.024, 0.003), 0, 0, 1000).Count(c => c == 'M'));
        Assert.Equal(
            "M-25 -15L25 -15L25 15L-25 15L-25 -15ZM-22 -12L22 -12L22 12L-22 12L-22 -12Z", SectionPath.Of(new Box(0.05, 0.03, 0.003), 0, 0, 1000));
    }
}
