using MemberScan.Inputs.Values;

namespace MemberScan.Inputs.Tests.Values;

public sealed class StressTextTests
{
    [Theory]
    [InlineData("235MPa", 235e6)]
    [InlineData("235 N/mm2", 235e6)]
    [InlineData(" 210 GPa ", 210e9)]
    [InlineData("36 ksi", 248.2112e6)]
    public void A_strength_is_read_in_pascals(string text, double expected)
    {
        // 1 ksi = 6.894757 MPa (NIST SP 811, from memory).
        var read = StressText.TryParse(text, out var stress, out var error);

        Assert.True(read, error);
        Assert.Equal(1, stress / expected, 6);
    }

    [Theory]
    [InlineData("235", "the unit is missing; give one of Pa, kPa, MPa, GPa, N/mm2, kN/m2, kN/cm2, psi, ksi")]
    [InlineData("235mpa", "'mpa' is not a unit of stress; did you mean 'MPa'?")]
    [InlineData("235kN", "'kN' is a unit of force, not of stress; give one of Pa, kPa, MPa, GPa, N/mm2, kN/m2, kN/cm2, psi, ksi")]
    [InlineData("-1MPa", "'-1MPa' is not a finite value above zero; write for example 235MPa")]
    [InlineData("", "a number is missing")]
    [InlineData("235,5MPa", "'235,5MPa' has a decimal comma; write the number with a decimal point and without grouping")]
    public void A_wrong_strength_is_refused_with_the_remedy(string text, string expected)
    {
        var read = StressText.TryParse(text, out var stress, out var error);

        Assert.False(read);
        Assert.Equal(0, stress);
        Assert.Equal(expected, error);
    }
}
