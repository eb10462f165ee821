using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Sections;
using MemberScan.Reporting.Drawing;

namespace MemberScan.Reporting.Tests.Drawing;

public sealed class SectionTextTests
{
    public static TheoryData<CrossSection> Kinds =>
    [
        new Round(Si.Mm(12.5)), new Tube(Si.Mm(24.15), Si.Mm(3.2)), new Rectangle(Si.Mm(40), Si.Mm(80)), new RoundedRectangle(Si.Mm(40), Si.Mm(80), Si.Mm(15)),
        new Box(Si.Mm(50), Si.Mm(30), Si.Mm(3)), new Box(Si.Mm(50), Si.Mm(30), Si.Mm(3), Si.Mm(6), Si.Mm(3)),
    ];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Reads_the_designation_of_every_kind(CrossSection section)
    {
        var read = SectionText.Read(section.Designation);

        Assert.Equal(section.GetType(), read!.GetType());
        Assert.Equal(section.Designation, read.Designation);
    }

    [Theory]
    [InlineData("box 50x30x3 mm, radii assumed")]
    [InlineData("tube 48.3x3.2 mm (from the profile)")]
    public void Passes_over_words_that_follow(string text) => Assert.NotNull(SectionText.Read(text));

    [Theory]
    [InlineData("")]
    [InlineData("HEA 200")]
    [InlineData("tube 48.3x30 mm")]
    [InlineData("tube 48,3x3,2 mm")]
    [InlineData("tube -48.3x3.2 mm")]
    [InlineData("round 0 mm")]
    [InlineData("round 1e9 mm")]
    [InlineData("round 99999999999999999999 mm")]
    [InlineData("rectangle 40x80 mm r 25")]
    [InlineData("box 50x30x15 mm")]
    [InlineData("box 50x30x3 mmm")]
    [InlineData("a round 25 mm")]
    public void Draws_nothing_that_is_no_section(string text) => Assert.Null(SectionText.Read(text));

    [Fact]
    public void Does_not_try_endless_text() => Assert.Null(SectionText.Read("round 25 mm " + new string('x', SectionText.LongestText)));
}
