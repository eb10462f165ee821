using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Tests.Outlines;

public sealed class PlaceNameTests
{
    private static readonly SectionForces s_bending = new(0, 0, 0, 0, 100, 0);
    private static readonly SectionForces s_torsion = new(0, 0, 0, 100, 0, 0);

    [Theory]
    [InlineData(0, 10, "extreme fibre, +z")]
    [InlineData(0, -10, "extreme fibre, −z")]
    [InlineData(-10, 0, "neutral axis, −y side")]
    [InlineData(10, 0, "neutral axis, +y side")]
    [InlineData(8, 6, "outer edge, direction 37° from +y towards +z")]
    [InlineData(-6, -8, "outer edge, direction 53° from −y towards −z")]
    [InlineData(0, 0, "centre")]
    [InlineData(0, 4, "inside, +z")]
    [InlineData(3, -3, "inside, direction 45° from +y towards −z")]
    public void Places_of_a_round_bar_bent_about_y(double yMm, double zMm, string name) =>
        Assert.Equal(name, Outline.Of(new Round(0.010), hasPeaks: false).NameOf(yMm / 1e3, zMm / 1e3, s_bending));

    [Theory]
    [InlineData(0, 30, "extreme fibre, +z")]
    [InlineData(0, 26, "bore, +z")]
    [InlineData(-26, 0, "bore, neutral axis, −y side")]
    [InlineData(28, 0, "inside the wall, +y")]
    public void Places_of_a_tube_bent_about_y(double yMm, double zMm, string name) =>
        Assert.Equal(name, Outline.Of(new Tube(0.030, 0.004), hasPeaks: false).NameOf(yMm / 1e3, zMm / 1e3, s_bending));

    // Without bending the shear resultant tells fibre from axis; without both there is only the edge.
    [Fact]
    public void Places_of_a_round_bar_without_bending()
    {
        var bar = Outline.Of(new Round(0.010), hasPeaks: false);

        Assert.Equal("neutral axis, +z side", bar.NameOf(0, 0.010, new SectionForces(0, 5, 0, 0, 0, 0)));
        Assert.Equal("extreme fibre, +y", bar.NameOf(0.010, 0, new SectionForces(0, 5, 0, 0, 0, 0)));
        Assert.Equal("outer edge, +z", bar.NameOf(0, 0.010, s_torsion));
    }

    [Fact]
    public void Forces_that_are_rounding_noise_do_not_decide_a_name()
    {
        var bar = Outline.Of(new Round(0.010), hasPeaks: false);

        Assert.Equal("outer edge, +z", bar.NameOf(0, 0.010, new SectionForces(0, 0, 0, 100, 1e-9, 0)));
    }

    [Theory]
    [InlineData(0, 40, "middle of the short side, +z")]
    [InlineData(-20, 0, "middle of the long side, −y")]
    [InlineData(20, 40, "corner +y +z")]
    [InlineData(-20, -40, "corner −y −z")]
    [InlineData(20, 10, "long side, +y, towards +z")]
    [InlineData(-5, -40, "short side, −z, towards −y")]
    [InlineData(0, 0, "centre")]
    [InlineData(0, -7, "inside, towards −z")]
    [InlineData(7, 0, "inside, towards +y")]
    [InlineData(-7, 7, "inside, towards −y +z")]
    public void Places_of_a_rectangle_in_torsion(double yMm, double zMm, string name) =>
        Assert.Equal(name, Outline.Of(new Rectangle(0.040, 0.080), hasPeaks: false).NameOf(yMm / 1e3, zMm / 1e3, s_torsion));

    [Fact]
    public void The_middle_of_a_side_is_the_extreme_fibre_when_the_section_bends_that_way_alone()
    {
        var bar = Outline.Of(new Rectangle(0.040, 0.080), hasPeaks: false);

        Assert.Equal("extreme fibre, −z", bar.NameOf(0, -0.040, s_bending));
        Assert.Equal("middle of the long side, +y", bar.NameOf(0.020, 0, s_bending));
        Assert.Equal("middle of the short side, −z", bar.NameOf(0, -0.040, s_bending with { Mz = 10 }));
    }

    [Theory]
    [InlineData(25, 0, "middle of the long side, +y")]
    [InlineData(20, 0, "inner face, middle of the long side, +y")]
    [InlineData(0, -45, "inner face, middle of the short side, −z")]
    [InlineData(20, 10, "inner face, long side, +y, towards +z")]
    [InlineData(22, 0, "inside the wall, +y")]
    [InlineData(22.0710678, 47.0710678, "corner +y +z")]
    [InlineData(-18.5355339, 43.5355339, "inner corner −y +z")]
    public void Places_of_a_box_in_torsion(double yMm, double zMm, string name) =>
        Assert.Equal(name, Outline.Of(new Box(0.050, 0.100, 0.005, 0.010, 0.005), hasPeaks: false).NameOf(yMm / 1e3, zMm / 1e3, s_torsion));
}
