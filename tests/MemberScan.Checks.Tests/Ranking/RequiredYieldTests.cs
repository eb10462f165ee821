using MemberScan.Checks.Allowable;
using MemberScan.Checks.En1993.Sections;
using MemberScan.Checks.Ranking;
using MemberScan.Checks.Tests.En1993.Sections;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Ranking;

public sealed class RequiredYieldTests
{
    [Fact]
    public void A_stress_criterion_needs_the_stress_times_its_factor()
    {
        // 186.6 MPa·1.67 = 311.6 MPa, by hand.
        var state = new StressState(Si.MPa(186.6), 0, 0);

        var found = Found(fy => Set(AllowableStress.VonMises(state, fy, omega: 1.67)));

        Assert.Equal(311.6, found / 1e6, 1);
        Assert.Equal(RequiredYield.OfStress(state.VonMises, 1.67), found, 1.0);
        Assert.Equal("needs fy ≥ 312 MPa", RequiredYield.Words(found));
    }

    [Fact]
    public void A_whole_mpa_is_not_rounded_up_further() => Assert.Equal("needs fy ≥ 312 MPa", RequiredYield.Words(Si.MPa(312)));

    [Fact]
    public void A_section_resistance_needs_the_strength_at_which_it_is_at_1()
    {
        // Flat bar 20x60, Wpl = 18 cm³: 5 kNm/18 cm³ = 277.8 MPa, by hand.
        var c = Cases.Of(Cases.Flat20x60, 235, myKNm: 5);

        Assert.Equal(277.8, Found(fy => SectionResistance.Check(c with { Yield = fy })) / 1e6, 1);
    }

    [Fact]
    public void A_wall_that_turns_slender_with_the_strength_may_leave_none()
    {
        // Tube of d/t = 80 in compression: class 3 to 90·235/80 = 264 MPa, but the force needs 300 MPa.
        var tube = new Tube(Si.Mm(80), Si.Mm(2));
        var c = Cases.Of(tube, 235, nKN: -300e6 * SectionProperties.Of(tube).Area / 1e3);

        var missing = Assert.IsType<Finding<double>.Missing>(RequiredYield.Find(fy => SectionResistance.Check(c with { Yield = fy })));

        Assert.Equal(ReasonCode.SlenderWall, missing.Why.Code);
        Assert.Equal(250, Found(fy => SectionResistance.Check(c with { Yield = fy, Forces = 250.0 / 300 * c.Forces })) / 1e6, 1);
    }

    [Fact]
    public void Nothing_to_check_needs_the_least() => Assert.Equal(RequiredYield.Least, Found(_ => CheckSet.Empty));

    private static CheckSet Set(CheckResult result) => new([new NamedCheck("stress", "stress", CheckStanding.Decides, result)], []);

    private static double Found(Func<double, CheckSet> checksAt) => Assert.IsType<Finding<double>.Found>(RequiredYield.Find(checksAt)).Value;
}
