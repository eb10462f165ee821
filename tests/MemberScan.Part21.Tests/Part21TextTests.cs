using System.Globalization;

namespace MemberScan.Part21.Tests;

public sealed class Part21TextTests
{
    // ISO 10303-21: REAL = [ SIGN ] DIGIT { DIGIT } "." { DIGIT } [ "E" [ SIGN ] DIGIT { DIGIT } ].
    [Theory]
    [InlineData(5, "5.")]
    [InlineData(-5, "-5.")]
    [InlineData(0, "0.")]
    [InlineData(0.1, "0.1")]
    [InlineData(1e-5, "1.E-05")]
    [InlineData(1.5e-5, "1.5E-05")]
    [InlineData(1e21, "1.E+21")]
    [InlineData(187.3, "187.3")]
    [InlineData(0.017453292519943295, "0.017453292519943295")]
    [InlineData(double.MaxValue, "1.7976931348623157E+308")]
    [InlineData(double.Epsilon, "5.E-324")]
    public void Real_carries_the_point_that_the_grammar_demands(double value, string spelling)
    {
        Assert.Equal(spelling, Part21Text.Real(value));
    }

    [Fact]
    public void Real_writes_both_zeros_alike()
    {
        Assert.Equal("0.", Part21Text.Real(-0.0));
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void Real_refuses_what_has_no_spelling(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Part21Text.Real(value));
    }

    [Fact]
    public void Real_is_the_same_in_a_culture_with_a_decimal_comma()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");

            Assert.Equal("1.5", Part21Text.Real(1.5));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void String_writes_half_a_surrogate_pair_as_the_replacement_character()
    {
        Assert.Equal(@"'a\X2\FFFD\X0\b'", Part21Text.String("a\uD83Db"));
    }

    [Theory]
    [InlineData("", "''")]
    [InlineData("gangway rail", "'gangway rail'")]
    [InlineData("O'Neil", "'O''Neil'")]
    [InlineData(@"a\b", @"'a\\b'")]
    [InlineData("Ä", @"'\X2\00C4\X0\'")]
    [InlineData("αβ", @"'\X2\03B103B2\X0\'")]
    [InlineData("\U0001F600", @"'\X4\0001F600\X0\'")]
    [InlineData("α\U0001F600β", @"'\X2\03B1\X0\\X4\0001F600\X0\\X2\03B2\X0\'")]
    [InlineData("a\nb", @"'a\X2\000A\X0\b'")]
    [InlineData("LC3 Überlast", @"'LC3 \X2\00DC\X0\berlast'")]
    public void String_is_ascii_with_directives(string text, string spelling)
    {
        Assert.Equal(spelling, Part21Text.String(text));
    }
}
