using System.Globalization;
using System.Text;
using CsCheck;
using MemberScan.Inputs.ForcesTables.Rows;
using MemberScan.Inputs.Values;

namespace MemberScan.Inputs.Tests.ForcesTables.Rows;

/// <summary>Against the library's parser: the same bits for every number that the grammar knows, and nothing else read.</summary>
public sealed class DecimalBytesTests
{
    [Theory]
    [InlineData("0")]
    [InlineData("-0")]
    [InlineData("+12.")]
    [InlineData(".5")]
    [InlineData("1e22")]
    [InlineData("123456789012345e-22")]
    [InlineData("9007199254740993")]
    [InlineData("0.1e-300")]
    [InlineData("000000000000000000012.5")]
    [InlineData("1.7976931348623157e308")]
    public void A_number_has_the_bits_of_the_library(string text)
    {
        Assert.True(DecimalBytes.TryRead(Encoding.ASCII.GetBytes(text), out var value));
        Assert.Equal(BitConverter.DoubleToInt64Bits(double.Parse(text, CultureInfo.InvariantCulture)), BitConverter.DoubleToInt64Bits(value));
    }

    [Theory]
    [InlineData("")]
    [InlineData("-")]
    [InlineData(".")]
    [InlineData("1e")]
    [InlineData("1e+")]
    [InlineData("1,5")]
    [InlineData("1 ")]
    [InlineData("0x1")]
    [InlineData("NaN")]
    [InlineData("1e999")]
    [InlineData("--1")]
    public void What_is_no_finite_number_is_left_to_others(string text) => Assert.False(DecimalBytes.TryRead(Encoding.ASCII.GetBytes(text), out _));

    [Fact]
    public void Doubles_and_short_decimals_are_read_to_the_last_bit()
    {
        var shortest = Gen.Double.Where(double.IsFinite).Select(d => d.ToString("R", CultureInfo.InvariantCulture));
        var decimals = Gen.Select(Gen.Int, Gen.Int[0, 12], (whole, places) => (whole / Math.Pow(10, places)).ToString($"F{places}", CultureInfo.InvariantCulture));
        Gen.OneOf(shortest, decimals).Sample(text =>
        {
            Assert.True(DecimalBytes.TryRead(Encoding.ASCII.GetBytes(text), out var value));
            Assert.Equal(BitConverter.DoubleToInt64Bits(double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture)), BitConverter.DoubleToInt64Bits(value));
        }, iter: 20_000, seed: "0000000000001");
    }

    [Fact]
    public void Any_text_is_read_as_the_plain_reader_reads_it_or_not_at_all()
    {
        Gen.String[Gen.Char["0123456789.eE+-,x "], 0, 8].Sample(text =>
        {
            if (!DecimalBytes.TryRead(Encoding.ASCII.GetBytes(text), out var value)) return;

            Assert.Equal(NumberFault.None, NumberText.Read(text, out var plain));
            Assert.Equal(plain, value);
        }, iter: 50_000, seed: "0000000000001");
    }
}
