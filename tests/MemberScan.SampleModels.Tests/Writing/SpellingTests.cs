using System.Globalization;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Tests.Writing;

/// <summary>Spellings against ISO 10303-21 as described in public: a real has its point, an exponent its capital E.</summary>
public sealed class SpellingTests
{
    [Theory]
    [InlineData(0, "0.")]
    [InlineData(5, "5.")]
    [InlineData(1e-5, "1.E-05")]
    [InlineData(-1.5, "-1.5")]
    [InlineData(1e21, "1.E+21")]
    [InlineData(210e9, "210000000000.")]
    [InlineData(0.0483 / 0.002, "24.15")]
    public void Reals_have_a_point_and_no_noise(double value, string expected)
    {
        var text = Spelling.Real(value);

        Assert.Equal(expected, text);
    }

    [Fact]
    public void Negative_zero_is_zero()
    {
        var text = Spelling.Real(-0.0);

        Assert.Equal("0.", text);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void A_number_that_is_not_finite_is_refused(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Spelling.Real(value));
    }

    [Theory]
    [InlineData("O'Neil", "'O''Neil'")]
    [InlineData(@"a\b", @"'a\\b'")]
    [InlineData("Ä", @"'\X2\00C4\X0\'")]
    [InlineData("αβ", @"'\X2\03B103B2\X0\'")]
    [InlineData("😀", @"'\X4\0001F600\X0\'")]
    [InlineData("ä😀b", @"'\X2\00E4\X0\\X4\0001F600\X0\b'")]
    [InlineData(null, "$")]
    public void Strings_use_the_control_directives(string? text, string expected)
    {
        var spelled = Spelling.Text(text);

        Assert.Equal(expected, spelled);
    }

    [Fact]
    public void The_culture_of_the_thread_changes_nothing()
    {
        var before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = new CultureInfo("de-DE");
        try
        {
            Assert.Equal("-1234.5", Spelling.Real(-1234.5));
            Assert.Equal("#1234567", Spelling.Reference(1234567));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
