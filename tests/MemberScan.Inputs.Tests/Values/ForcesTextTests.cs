using MemberScan.Inputs.Values;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Inputs.Tests.Values;

public sealed class ForcesTextTests
{
    [Fact]
    public void Forces_left_out_are_zero()
    {
        var read = ForcesText.TryParse("N=10kN My=0.1kNm Mz=0.1kNm T=0.05kNm", out var forces, out var error);

        Assert.True(read, error);
        Assert.Equal(new SectionForces(10_000, 0, 0, 50, 100, 100), forces);
    }

    [Fact]
    public void Blanks_commas_and_any_unit_are_allowed()
    {
        var read = ForcesText.TryParse(" Vy = -2 kip, Vz=1.5e3 N;  My=3 lbf·in ", out var forces, out var error);

        Assert.True(read, error);
        // 1 lbf = 4.4482216152605 N exactly, 1 in = 0.0254 m exactly.
        Assert.Equal(-2 * 4448.2216152605, forces.Vy, 1e-9);
        Assert.Equal(1500, forces.Vz);
        Assert.Equal(3 * 4.4482216152605 * 0.0254, forces.My, 1e-12);
    }

    [Theory]
    [InlineData("", "no value is given; write for example N=10kN")]
    [InlineData("Vx=1kN", "'Vx' is not one of the names; did you mean 'Vy'?")]
    [InlineData("my=1kNm", "'my' is not one of the names; did you mean 'My'?")]
    [InlineData("N=10", "N: the unit is missing; give one of N, kN, MN, lbf, kip")]
    [InlineData("N=10 My=1kNm", "N: the unit is missing; give one of N, kN, MN, lbf, kip")]
    [InlineData("N=10kNm", "N: 'kNm' is a unit of moment, not of force; give one of N, kN, MN, lbf, kip")]
    [InlineData("My=1kN", "My: 'kN' is a unit of force, not of moment; give one of N·m, kN·m, MN·m, N·mm, kN·mm, kN·cm, lbf·in, lbf·ft, kip·in, kip·ft")]
    [InlineData("N=1kN N=2kN", "'N' is given twice; give it once")]
    [InlineData("N=1,5kN", "N: '1,5kN' has a decimal comma; write the number with a decimal point and without grouping")]
    [InlineData("N=Infinity", "N: 'Infinity' is not a finite number; give a finite number")]
    [InlineData("N=1e308kN", "N: the value is too large; give a finite number")]
    [InlineData("N 10kN", "after 'N' stands no '='; write for example N=10kN")]
    [InlineData("10kN", "'10kN' is not understood; write name=number unit, such as N=10kN")]
    [InlineData("N=", "N: a number is missing")]
    public void Wrong_forces_are_refused_with_the_remedy(string text, string expected)
    {
        var read = ForcesText.TryParse(text, out var forces, out var error);

        Assert.False(read);
        Assert.Equal(default, forces);
        Assert.Equal(expected, error);
    }

    [Fact]
    public void A_text_longer_than_256_characters_is_refused()
    {
        Assert.False(ForcesText.TryParse("N=1kN" + new string(' ', ValueScanner.LongestText), out _, out var error));
        Assert.Contains("longer than 256 characters", error, StringComparison.Ordinal);
    }
}
