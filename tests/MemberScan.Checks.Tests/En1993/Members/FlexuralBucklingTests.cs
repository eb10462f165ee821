using MemberScan.Checks.En1993;
using MemberScan.Checks.En1993.Members;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.Tests.En1993.Members;

public sealed class FlexuralBucklingTests
{
    [Theory]
    [InlineData("a0", 0.9701, 0.7253, 0.2323)]
    [InlineData("a", 0.9528, 0.6656, 0.2229)]
    [InlineData("b", 0.9261, 0.5970, 0.2095)]
    [InlineData("c", 0.8973, 0.5399, 0.1962)]
    [InlineData("d", 0.8504, 0.4671, 0.1766)]
    public void Chi_at_0_4_1_and_2_is_as_tabulated(string name, double at04, double at1, double at2)
    {
        // EN 1993-1-1:2005, 6.3.1.2 and Table 6.1; χ(1.0) = 0.725, 0.666, 0.597, 0.540, 0.467 from memory, the others recomputed.
        var curve = new[] { BucklingCurve.A0, BucklingCurve.A, BucklingCurve.B, BucklingCurve.C, BucklingCurve.D }.Single(c => c.Name == name);

        Assert.Equal(at04, FlexuralBuckling.Chi(0.4, curve.Alpha), 4);
        Assert.Equal(at1, FlexuralBuckling.Chi(1.0, curve.Alpha), 4);
        Assert.Equal(at2, FlexuralBuckling.Chi(2.0, curve.Alpha), 4);
    }

    [Fact]
    public void Chi_is_1_up_to_0_2_and_leaves_it_without_a_jump()
    {
        Assert.Equal(1, FlexuralBuckling.Chi(0, 0.49));
        Assert.Equal(1, FlexuralBuckling.Chi(0.2, 0.49));
        Assert.InRange(FlexuralBuckling.Chi(0.2001, 0.49), 0.9998, 0.99999);
    }

    [Fact]
    public void Hollow_sections_have_curves_by_forming_and_strength_and_solid_ones_c()
    {
        // Table 6.2, from memory.
        var (tube, bar) = (new Tube(0.05, 0.005), new Round(0.01));

        Assert.Same(BucklingCurve.A, BucklingCurve.Of(tube, HollowForming.HotFinished, Si.MPa(420), SteelKind.Carbon));
        Assert.Same(BucklingCurve.A0, BucklingCurve.Of(tube, HollowForming.HotFinished, Si.MPa(460), SteelKind.Carbon));
        Assert.Same(BucklingCurve.C, BucklingCurve.Of(tube, HollowForming.ColdFormed, Si.MPa(460), SteelKind.Carbon));
        Assert.Same(BucklingCurve.C, BucklingCurve.Of(tube, HollowForming.Unknown, Si.MPa(235), SteelKind.Carbon));
        Assert.Same(BucklingCurve.C, BucklingCurve.Of(bar, HollowForming.HotFinished, Si.MPa(460), SteelKind.Carbon));
        Assert.Same(BucklingCurve.D, BucklingCurve.Of(tube, HollowForming.HotFinished, Si.MPa(220), SteelKind.Stainless));
    }

    [Theory]
    [InlineData(121, 40, 235, "a", "b")]
    [InlineData(121, 40.1, 235, "b", "c")]
    [InlineData(120, 40, 235, "b", "c")]
    [InlineData(120, 100, 235, "b", "c")]
    [InlineData(120, 100.1, 235, "d", "d")]
    [InlineData(121, 40, 460, "a0", "a0")]
    [InlineData(120, 40, 460, "a", "a")]
    [InlineData(120, 100.1, 460, "c", "c")]
    public void Rolled_i_sections_change_curve_at_h_over_b_1_2_and_flanges_of_40_and_100_mm(double h, double flange, double fyMPa, string strong, string weak)
    {
        // Table 6.2, from memory; b = 100 mm, the flange's thickness taken by itself.
        var curves = BucklingCurve.OfRolledI(Si.Mm(h), Si.Mm(100), Si.Mm(flange), Si.MPa(fyMPa));

        Assert.Equal((strong, weak), (curves.Strong.Name, curves.Weak.Name));
    }
}
