using MemberScan.Checks.Aisc360.Sections;

namespace MemberScan.Checks.Tests.Aisc360.Sections;

/// <summary>Hand calculations in ksi, inches and kip-inches: the equations hold in any units that belong together.</summary>
public sealed class FlexuralStrengthTests
{
    private const double E = 29_000;

    [Fact]
    public void A_tube_is_compact_to_0_07_and_holds_below_0_45_of_e_over_fy()
    {
        // F8, from memory; F_y = 35 ksi: 0.07E/F_y = 58, 0.31E/F_y = 256.9, 0.45E/F_y = 372.9; Z = 10, S = 7.7 in³.
        Assert.Equal(350, FlexuralStrength.M_n_Tube(35, E, 58, 10, 7.7)!.Value, 9);
        // (0.021·29000/58.01 + 35)·7.7 = 350.3, capped at M_p.
        Assert.Equal(350, FlexuralStrength.M_n_Tube(35, E, 58.01, 10, 7.7)!.Value, 9);
        // (0.021·29000/100 + 35)·7.7 = 316.4.
        Assert.Equal(316.393, FlexuralStrength.M_n_Tube(35, E, 100, 10, 7.7)!.Value, 3);
        // 0.33·29000/300·7.7 = 245.6.
        Assert.Equal(245.63, FlexuralStrength.M_n_Tube(35, E, 300, 10, 7.7)!.Value, 2);
        Assert.NotNull(FlexuralStrength.M_n_Tube(35, E, 372.8, 10, 7.7));
        Assert.Null(FlexuralStrength.M_n_Tube(35, E, 372.9, 10, 7.7));
    }

    [Fact]
    public void Noncompact_flanges_and_webs_of_a_box_lie_between_the_plastic_and_the_elastic_moment()
    {
        // F7-2: at λp = 1.12√(E/F_y) the bracket is 3.57·1.12 − 4.0 = −0.0016, at λr = 1.40: 0.998; F7-6: at 2.42: 0.0001, at 5.70: 1.0005; by hand.
        var root = Math.Sqrt(E / 50);

        Assert.Equal(500, FlexuralStrength.M_n_Flange(500, 50, 8, 1.12 * root, E), 9);
        Assert.Equal(500 - 100 * 0.998, FlexuralStrength.M_n_Flange(500, 50, 8, 1.40 * root, E), 9);
        Assert.Equal(500 - 100 * 0.0001, FlexuralStrength.M_n_Web(500, 50, 8, 2.42 * root, E), 9);
        Assert.Equal(500 - 100 * 1.0005, FlexuralStrength.M_n_Web(500, 50, 8, 5.70 * root, E), 9);
    }

    [Fact]
    public void A_box_on_edge_loses_moment_between_its_two_lengths_and_beyond()
    {
        // r_y = 1.66 in, J = 35.3 in⁴, A = 5.24 in², Z = 13.3, S = 10.6 in³ (HSS8x4x1/4, AISC Manual, from memory), F_y = 50 ksi; by hand:
        // √(J·A) = 13.60; L_p = 0.13·29000·1.66·13.60/665 = 128.0 in; L_r = 2·29000·1.66·13.60/(0.7·50·10.6) = 3529 in.
        var (lp, lr) = FlexuralStrength.BoxLengths(E, 1.66, 35.3, 5.24, 665, 50, 10.6);

        Assert.Equal(128.0, lp, 0.1);
        Assert.Equal(3529, lr, 1.0);
        Assert.Equal(665, FlexuralStrength.M_n_BoxLateral(665, lp, lp, lr, 50, 10.6), 9);
        Assert.Equal((665 + 371) / 2.0, FlexuralStrength.M_n_BoxLateral(665, (lp + lr) / 2, lp, lr, 50, 10.6), 9);
        Assert.Equal(371, FlexuralStrength.M_n_BoxLateral(665, lr, lp, lr, 50, 10.6), 9);
        // Beyond L_r the elastic 2E·√(J·A)/(L_b/r_y) = 185.5 kip·in at twice L_r.
        Assert.Equal(2 * E * Math.Sqrt(35.3 * 5.24) / (2 * lr / 1.66), FlexuralStrength.M_n_BoxLateral(665, 2 * lr, lp, lr, 50, 10.6), 9);
    }

    [Fact]
    public void A_flat_bar_half_by_four_inches_follows_its_three_branches()
    {
        // F_y = 36 ksi, S = 1.3333, Z = 2 in³; 0.08E/F_y = 64.4, 1.9E/F_y = 1530.6; L_b·d/t² = 16·L_b; by hand.
        // 4 in: 64 → M_p = 72. 48 in: 768 → (1.52 − 0.274·768·36/29000)·48 = 60.42. 120 in: 1920 → 1.9·29000/1920·1.3333 = 38.26.
        Assert.Equal(72, FlexuralStrength.M_n_BarLateral(72, 36, E, 4.0 / 3, 64), 9);
        Assert.Equal(60.42, FlexuralStrength.M_n_BarLateral(72, 36, E, 4.0 / 3, 768), 2);
        Assert.Equal(38.26, FlexuralStrength.M_n_BarLateral(72, 36, E, 4.0 / 3, 1920), 2);
        // The branches on both sides of their limits: 1.52 − 0.274·0.08 = 1.498 of 48 and 1.52 − 0.274·1.9 = 0.9994 against 1.
        Assert.Equal(71.9, FlexuralStrength.M_n_BarLateral(72, 36, E, 4.0 / 3, 64.45), 1);
        Assert.Equal(48 * 0.9994, FlexuralStrength.M_n_BarLateral(72, 36, E, 4.0 / 3, 1.9 * E / 36), 9);
        Assert.Equal(48, FlexuralStrength.M_n_BarLateral(72, 36, E, 4.0 / 3, 1.9 * E / 36 * 1.000001), 3);
    }

    [Fact]
    public void The_plastic_moment_of_a_round_bar_is_capped_at_1_5_of_the_elastic_one()
    {
        // F11-1, from memory, the smaller of 1.5 and 1.6; Z/S of a round bar is 16/(3π) = 1.698, of a rectangle 1.5.
        Assert.Equal(1.5 * 36, FlexuralStrength.M_n_Bar(36, 1.698, 1), 9);
        Assert.Equal(1.5 * 36, FlexuralStrength.M_n_Bar(36, 1.5, 1), 9);
        Assert.Equal(1.2 * 36, FlexuralStrength.M_n_Bar(36, 1.2, 1), 9);
    }
}
