using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Tests.Display;

/// <summary>Grouping in threes by a thin space, point, and the sign U+2212 are those of ISO 80000-1 (from memory).</summary>
public sealed class FiguresTests
{
    [Theory]
    [InlineData(0, "0")]
    [InlineData(218.94, "218.9")]
    [InlineData(218.96, "219.0")]
    [InlineData(0.012344, "0.01234")]
    [InlineData(-24.15, "\u221224.15")]
    [InlineData(9999.4, "9999")]
    [InlineData(9999.6, "10\u202F000")]
    [InlineData(115860, "115\u202F900")]
    [InlineData(-1234567, "\u22121\u202F235\u202F000")]
    [InlineData(1e15, "1.000×10¹⁵")]
    [InlineData(-2.5e-7, "\u22122.500×10⁻⁷")]
    public void Prints_four_significant_figures(double value, string expected) =>
        Assert.Equal(expected, Figures.Significant(value));

    [Theory]
    [InlineData(1.2874, "1.287")]
    [InlineData(0, "0.000")]
    [InlineData(1, "1.000")]
    [InlineData(1.00004, "1.00004")]
    [InlineData(0.99996, "0.99996")]
    [InlineData(1 + 1e-9, "1.000000001")]
    [InlineData(12345.6789, "12\u202F345.679")]
    public void Prints_no_utilization_beside_one_as_one(double utilization, string expected) =>
        Assert.Equal(expected, Figures.Utilization(utilization));

    [Theory]
    [InlineData(-0.0004, "0.000")]
    [InlineData(-0.0, "0.000")]
    [InlineData(-3.2, "\u22123.200")]
    [InlineData(20000, "20\u202F000.000")]
    public void Prints_fixed_decimals_and_no_sign_on_what_rounds_to_nothing(double value, string expected) =>
        Assert.Equal(expected, Figures.Fixed(value, 3));

    // 1 lbf = 4.448 221 615 260 5 N (international pound, standard gravity).
    [Theory]
    [InlineData(4.4482216152605, "4.448221615")]
    [InlineData(0.001, "0.001")]
    [InlineData(1e6, "1000000")]
    public void Prints_a_conversion_factor_to_ten_digits(double factor, string expected) => Assert.Equal(expected, Figures.Plain(factor));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Refuses_what_is_not_finite(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Figures.Significant(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => Figures.Utilization(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => Figures.Fixed(value, 3));
    }
}
