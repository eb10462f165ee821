using System.Globalization;
using CsCheck;
using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Inputs.Tests.Values;

public sealed class SectionTextTests
{
    public static TheoryData<string, CrossSection> Known => new()
    {
        { "round 25 mm", new Round(0.0125) },
        { "Round25mm", new Round(0.0125) },
        { "tube 48.3x3.2 mm", new Tube(48.3e-3 / 2, 3.2e-3) },
        { "  tube  48.3 × 3.2mm ", new Tube(48.3e-3 / 2, 3.2e-3) },
        { "tube 48.3 mm x 3.2 mm", new Tube(48.3e-3 / 2, 3.2e-3) },
        { "tube 1.900x0.145 in", new Tube(1.900 * 0.0254 / 2, 0.145 * 0.0254) },
        { "tube 4.83 cm X 3.2 mm", new Tube(4.83e-2 / 2, 3.2e-3) },
        { "rectangle 40x80 mm", new Rectangle(0.04, 0.08) },
        { "rectangle 1.5e1 x 8e-1 cm", new Rectangle(15e-2, 0.8e-2) },
        { "rectangle 60x100 mm r 15", new RoundedRectangle(0.06, 0.1, 0.015) },
        { "rectangle 60x100 mm r 1.5 cm", new RoundedRectangle(0.06, 0.1, 0.015) },
        { "L 100x80x8 mm", new OpenProfile(OpenShape.L, 0.1, 0.08, 0.008, 0.008) },
        { "i 200x100x5.6x8.5 mm r 12", new OpenProfile(OpenShape.I, 0.2, 0.1, 0.0056, 0.0085, 0.012) },
        { "U100x50x6x8.5mm", new OpenProfile(OpenShape.U, 0.1, 0.05, 0.006, 0.0085) },
        { "T 60x60x7x7 mm r 7", new OpenProfile(OpenShape.T, 0.06, 0.06, 0.007, 0.007, 0.007) },
        { "box 50x30x3 mm", new Box(0.05, 0.03, 0.003) },
        { "box 50x30x3 mm ro 6 ri 3", new Box(0.05, 0.03, 0.003, 0.006, 0.003) },
        { "box 50x30x3 mm ri=3 ro=6mm", new Box(0.05, 0.03, 0.003, 0.006, 0.003) },
        { "box 2x2x0.116 in ro 0.232 ri 0.116", new Box(2 * 0.0254, 2 * 0.0254, 0.116 * 0.0254, 0.232 * 0.0254, 0.116 * 0.0254) },
    };

    [Theory]
    [MemberData(nameof(Known))]
    public void A_section_text_gives_its_section(string text, CrossSection expected)
    {
        var read = SectionText.TryParse(text, out var section, out var error);

        Assert.True(read, error);
        Assert.Empty(error);
        Assert.Equal(expected.GetType(), section!.GetType());
        foreach (var property in expected.GetType().GetProperties().Where(p => p.PropertyType == typeof(double)))
            Assert.Equal((double)property.GetValue(expected)!, (double)property.GetValue(section)!, 1e-12);
    }

    [Theory]
    [InlineData("", "the section kind is missing; begin with one of round, tube, rectangle, box, I, L, U, T, such as 'tube 48.3x3.2 mm'")]
    [InlineData("tub 48.3x3.2 mm", "'tub' is not a section kind; did you mean 'tube'?")]
    [InlineData("girder 1x2 mm", "'girder' is not a section kind; known are round, tube, rectangle, box, I, L, U, T")]
    [InlineData("tube 48.3x3.2", "the unit is missing; give one of m, mm, cm, in, ft after the last dimension")]
    [InlineData("box 50x30x3 ro 6 ri 3", "the unit is missing; give one of m, mm, cm, in, ft after the last dimension")]
    [InlineData("tube 48.3 mm x 3.2", "the unit is missing; give one of m, mm, cm, in, ft after the last dimension")]
    [InlineData("tube 48.3x3.2 kN", "'kN' is a unit of force, not of length; give one of m, mm, cm, in, ft")]
    [InlineData("tube 48.3x3.2 mn", "'mn' is not a unit of length; did you mean 'm'?")]
    [InlineData("tube 48.3 mm", "a tube has 2 dimensions (outer diameter x wall), but 1 is given")]
    [InlineData("L 100x80 mm", "an L has 3 dimensions (leg along z x leg along y x thickness), but 2 are given")]
    [InlineData("U 100x50x6 mm", "a U has 4 dimensions (depth along z x width along y x web x flange), but 3 are given")]
    [InlineData("T 60x60x7x60 mm", "the walls are as thick as the profile")]
    [InlineData("round 25x3 mm", "a round has 1 dimension (the diameter), but 2 are given")]
    [InlineData("tube 48,3x3.2 mm", "'48,3x3.2' has a decimal comma; write the number with a decimal point and without grouping")]
    [InlineData("tube 48.3xNaN mm", "'NaN' is not a finite number; give a finite number")]
    [InlineData("round 1e999 mm", "'1e999' is too large; give a finite number")]
    [InlineData("round mm", "'mm' is not a number; write digits with a decimal point, such as -12.5 or 3e-2")]
    [InlineData("round", "a number is missing")]
    [InlineData("round -25 mm", "a dimension is -12.5 mm; it must be a finite number above zero")]
    [InlineData("tube 20x10 mm", "the wall of 10 mm leaves no hole in a radius of 10 mm")]
    [InlineData("rectangle 40x80 mm r 25", "the corner radius of 25 mm is more than half of 40 mm")]
    [InlineData("box 50x30x3 mm ro 6", "'ri' is missing; give both radii, ro outside and ri inside, or neither for sharp corners")]
    [InlineData("box 50x30x3 mm ro 6 ro 3", "'ro' is given twice; give it once")]
    [InlineData("box 50x30x3 mm rx 6", "'rx' is not a corner radius of a box; did you mean 'ro'?")]
    [InlineData("tube 48.3x3.2 mm thick", "'thick' after the dimensions is not understood; leave it out")]
    public void A_wrong_section_text_is_refused_with_the_remedy(string text, string expected)
    {
        var read = SectionText.TryParse(text, out var section, out var error);

        Assert.False(read);
        Assert.Null(section);
        Assert.Equal(expected, error);
    }

    [Fact]
    public void A_text_of_256_characters_is_read_and_a_longer_one_is_not()
    {
        var longest = "round 25 mm" + new string(' ', ValueScanner.LongestText - "round 25 mm".Length);

        Assert.True(SectionText.TryParse(longest, out _, out _));
        Assert.False(SectionText.TryParse(longest + " ", out _, out var error));
        Assert.Contains("longer than 256 characters", error, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_designation_is_read_back_to_the_same_dimensions()
    {
        var dimension = Gen.Int[1, 100_000].Select(n => n * 1e-6);
        var box = Gen.Select(dimension, dimension, Gen.Double[0.01, 0.24], Gen.Double[0, 1]).Select((b, h, share, corner) =>
        {
            var wall = Math.Max(1e-6, Math.Round(share * Math.Min(b, h), 6));
            var radius = Math.Round(corner * wall, 6);
            return Box.Fault(b, h, wall, radius + 0, radius / 2) is null ? (CrossSection)new Box(b, h, wall, radius, Math.Round(radius / 2, 6)) : new Rectangle(b, h);
        });

        box.Sample(section =>
        {
            var read = SectionText.TryParse(section.Designation, out var back, out var error);

            Assert.True(read, error);
            Assert.Equal(section.Designation, back!.Designation);
        }, iter: 2000, seed: "0000000000001");
    }

    [Fact]
    public void Any_text_at_all_gives_a_section_or_an_error_of_one_line()
    {
        Gen.String[Gen.Char["tuberoundx×=. mmin0123456789,-eNaNr\n\t"], 0, 40].Sample(text =>
        {
            var read = SectionText.TryParse(text, out var section, out var error);

            Assert.Equal(read, section is not null);
            Assert.Equal(read, error.Length == 0);
            Assert.DoesNotContain('\n', error);
        }, iter: 20_000, seed: "0000000000001");
    }

    [Fact]
    public void The_culture_of_the_machine_changes_nothing()
    {
        var culture = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");

            Assert.True(SectionText.TryParse("round 2.5 mm", out var section, out _));
            Assert.Equal(0.00125, ((Round)section).Radius, 1e-15);
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }
    }
}
