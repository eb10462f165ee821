namespace MemberScan.Checks.Tests;

public sealed class ShownTests
{
    [Theory]
    [InlineData(0, "0")]
    [InlineData(1.67, "1.67")]
    [InlineData(140.718562, "140.72")]
    [InlineData(-0.0123456, "-0.012346")]
    [InlineData(115860.4, "115860")]
    [InlineData(1.5e-9, "1.5E-9")]
    [InlineData(2.1e11, "2.1E+11")]
    public void A_number_keeps_five_significant_digits(double value, string expected)
    {
        Assert.Equal(expected, Shown.Number(value));
    }

    [Fact]
    public void A_negative_factor_stands_in_brackets()
    {
        Assert.Equal("(-2.5)", Shown.KN(-2500));
        Assert.Equal("48.3", Shown.Mm(0.0483));
    }
}
