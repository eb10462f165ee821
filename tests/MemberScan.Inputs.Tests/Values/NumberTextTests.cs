using MemberScan.Inputs.Values;

namespace MemberScan.Inputs.Tests.Values;

public sealed class NumberTextTests
{
    [Theory]
    [InlineData("0", 0)]
    [InlineData(" -12.5 ", -12.5)]
    [InlineData("+.5", 0.5)]
    [InlineData("5.", 5)]
    [InlineData("1E+3", 1000)]
    [InlineData("2e-3", 0.002)]
    public void Plain_numbers_are_read(string text, double expected)
    {
        var fault = NumberText.Read(text, out var value);

        Assert.Equal(NumberFault.None, fault);
        Assert.Equal(expected, value);
    }

    [Theory]
    [InlineData("", nameof(NumberFault.Empty))]
    [InlineData("  ", nameof(NumberFault.Empty))]
    [InlineData("NaN", nameof(NumberFault.NotFinite))]
    [InlineData("-Infinity", nameof(NumberFault.NotFinite))]
    [InlineData("1e999", nameof(NumberFault.NotFinite))]
    [InlineData("1,5", nameof(NumberFault.DecimalComma))]
    [InlineData("1.234,5", nameof(NumberFault.DecimalComma))]
    [InlineData("1 000", nameof(NumberFault.NotANumber))]
    [InlineData(".", nameof(NumberFault.NotANumber))]
    [InlineData("1e", nameof(NumberFault.NotANumber))]
    [InlineData("0x10", nameof(NumberFault.NotANumber))]
    [InlineData("12kN", nameof(NumberFault.NotANumber))]
    [InlineData("٣", nameof(NumberFault.NotANumber))]
    public void Everything_else_is_refused_by_kind(string text, string expected)
    {
        var fault = NumberText.Read(text, out _);

        Assert.Equal(expected, fault.ToString());
    }
}
