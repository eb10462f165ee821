using MemberScan.Checks.Aisc360;
using MemberScan.Checks.Aisc360.Sections;
using MemberScan.Foundation.Units;

namespace MemberScan.Checks.Tests.Aisc360.Sections;

public sealed class AxialStrengthTests
{
    private static readonly double s_modulus = Si.Ksi(29_000);

    [Theory]
    [InlineData(50, 37.5, 1)]
    [InlineData(100, 21.7, 1)]
    [InlineData(150, 10.0, 1)]
    [InlineData(200, 5.65, 2)]
    public void Available_stresses_of_fy_50_are_those_of_the_table(double slenderness, double ksi, int digits)
    {
        // AISC Steel Construction Manual, Table 4-22 (4-14 in the 15th edition), φFcr, from memory.
        var stress = StrengthFactor.Member.Available(AxialStrength.F_n(Si.Ksi(50), AxialStrength.F_e(s_modulus, slenderness)), DesignMethod.Lrfd);

        Assert.Equal(ksi, stress / Si.Ksi(1), 0.6 * Math.Pow(10, -digits));
    }

    [Fact]
    public void The_two_branches_meet_at_a_ratio_of_2_25()
    {
        // 0.658^2.25 = 0.38995 and 0.877/2.25 = 0.38978, by hand.
        var fy = Si.Ksi(50);

        Assert.Equal(0.38995, AxialStrength.F_n(fy, fy / 2.25) / fy, 5);
        Assert.Equal(0.38976, AxialStrength.F_n(fy, fy / 2.2501) / fy, 5);
        Assert.True(AxialStrength.F_n(fy, fy / 2.2501) < AxialStrength.F_n(fy, fy / 2.25));
    }

    [Fact]
    public void The_ratio_of_2_25_is_a_slenderness_of_4_71_times_the_root()
    {
        // AISC 360-22, E3, from memory: L_c/r ≤ 4.71·√(E/F_y).
        var slenderness = 4.71 * Math.Sqrt(s_modulus / Si.Ksi(36));

        Assert.Equal(2.25, Si.Ksi(36) / AxialStrength.F_e(s_modulus, slenderness), 2);
    }
}
