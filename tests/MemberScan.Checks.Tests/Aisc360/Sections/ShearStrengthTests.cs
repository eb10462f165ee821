using MemberScan.Checks.Aisc360.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Tests.Aisc360.Sections;

/// <summary>Hand calculations in ksi and inches.</summary>
public sealed class ShearStrengthTests
{
    private const double E = 29_000;

    [Fact]
    public void Webs_of_a_box_lose_shear_beyond_1_10_and_1_37_of_the_root()
    {
        // k_v = 5, F_y = 50: √(5·29000/50) = 53.85; by hand.
        Assert.Equal(1, ShearStrength.C_v2(59.2, E, 50));
        Assert.Equal(1.10 * 53.852 / 70, ShearStrength.C_v2(70, E, 50), 4);
        Assert.Equal(1.51 * 5 * E / (100.0 * 100 * 50), ShearStrength.C_v2(100, E, 50), 12);
        Assert.True(ShearStrength.C_v2(59.3, E, 50) < 1);
        Assert.Equal(ShearStrength.C_v2(1.37 * 53.8516, E, 50), ShearStrength.C_v2(1.3701 * 53.8516, E, 50), 0.003);
    }

    [Fact]
    public void A_box_of_8_by_4_by_a_quarter_has_102_kips_along_its_depth()
    {
        // h = 8 − 3·0.233 = 7.301 in: 0.6·50·2·7.301·0.233 = 102.1 kip; by hand.
        Assert.Equal(102.1, ShearStrength.V_n_Box(50, 7.301, 0.233, E), 1);
    }

    [Fact]
    public void A_stocky_tube_yields_in_shear_and_a_slender_one_buckles()
    {
        // D/t = 20: 0.78E/20^1.5 = 253 ksi > 0.6F_y = 21. D/t = 200, L_v = 20D: larger of 1.60E/(√20·200^1.25) = 13.79 and 0.78E/200^1.5 = 8.00; by hand.
        Assert.Equal(21, ShearStrength.F_cr_Shear(35, E, 20, 1, 100), 9);
        Assert.Equal(13.79, ShearStrength.F_cr_Shear(35, E, 200, 1, 4000), 2);
        Assert.Equal(10.5 * 3, ShearStrength.V_n_Tube(21, 3), 9);
    }

    [Fact]
    public void Torsion_of_boxes_and_tubes_follows_h3_1()
    {
        // √(E/F_y) = 24.083 at 50 ksi: to 59.00 yielding, to 73.94 inelastic, to 260 elastic; by hand.
        Assert.Equal(30, ShearStrength.F_cr_TorsionBox(50, E, 59.0)!.Value, 9);
        Assert.Equal(30 * 59.0038 / 65, ShearStrength.F_cr_TorsionBox(50, E, 65)!.Value, 0.001);
        Assert.Equal(0.458 * Math.PI * Math.PI * E / 1e4, ShearStrength.F_cr_TorsionBox(50, E, 100)!.Value, 9);
        Assert.NotNull(ShearStrength.F_cr_TorsionBox(50, E, 260));
        Assert.Null(ShearStrength.F_cr_TorsionBox(50, E, 260.1));
        // Tube of D/t = 200, L = 20D: larger of 1.23E/(√20·200^1.25) = 10.60 and 0.60E/200^1.5 = 6.15.
        Assert.Equal(10.60, ShearStrength.F_cr_TorsionTube(35, E, 200, 1, 4000), 2);
        Assert.Equal(21, ShearStrength.F_cr_TorsionTube(35, E, 20, 1, 100), 9);
    }

    [Theory]
    [InlineData(4, 4, 0.233, 6.56)]
    [InlineData(6, 6, 0.233, 15.4)]
    [InlineData(8, 4, 0.233, 13.6)]
    [InlineData(3, 3, 0.233, 3.52)]
    public void The_torsion_constant_c_of_a_box_is_the_tabulated_one(double b, double h, double t, double c)
    {
        // AISC Steel Construction Manual, Tables 1-11 and 1-12, from memory.
        var box = new Box(Si.In(b), Si.In(h), Si.In(t), Si.In(2 * t), Si.In(t));

        Assert.Equal(1, ShearStrength.C(box, 0) / Math.Pow(Si.Inch, 3) / c, 0.004);
    }

    [Fact]
    public void The_torsion_constant_c_of_a_tube_is_the_smaller_of_two()
    {
        // HSS6.000x0.250: 2J/D = 11.7 in³ (AISC Manual, from memory); π(D − t)²t/2 = 12.2.
        var tube = new Tube(Si.In(3), Si.In(0.233));

        Assert.Equal(11.7, ShearStrength.C(tube, SectionProperties.Of(tube).J!.Value) / Math.Pow(Si.Inch, 3), 1);
    }
}
