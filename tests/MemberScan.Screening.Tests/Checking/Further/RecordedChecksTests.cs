using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Tests.Checking.Further;

/// <summary>What the record says of each check of a member: list, order, margin and hints.</summary>
public sealed class RecordedChecksTests
{
    // Solid round, d = 20 mm: A = π·20²/4 = 314.159 mm², W = π·20³/32 = 785.398 mm³.
    private static readonly Round s_bar = new(10e-3);

    [Fact]
    public void Every_check_stands_in_the_record_with_its_place_and_the_deciding_ones_come_first()
    {
        // N = 40 kN, My = 0.1 kN·m: σ = 127.32 + 127.32 = 254.65 MPa against 225 MPa (S235 over 16 mm): 1.1318 (by hand).
        var member = Landing.ScreenOne(Landing.OnePost(s_bar), Landing.Constant(new SectionForces(40e3, 0, 0, 0, 100, 0), kind: "design"));

        Assert.Equal(Verdict.Overstressed, member.Verdict);
        Assert.Equal(1.1318, member.Governing!.Utilization, 1e-4);
        Assert.Equal(1 - member.Governing.Utilization, member.Margin!.Value, 1e-12);
        Assert.Equal("stress", member.Checks[0].Key);
        var tension = member.Checks.Single(c => c.Key == "en-6.2.3");
        Assert.Equal(40e3 / (Math.PI * 100e-6 * 225e6), tension.Utilization!.Value, 1e-6);
        Assert.Equal(("S1", "design", 0.0), (tension.Situation, tension.Kind, tension.Station));
        Assert.Contains(tension.Trace, line => line is { Symbol: "utilization", Unit: "-" });
        Assert.All(member.Checks.Zip(member.Checks.Skip(1)), pair => Assert.True(pair.First.Decides || !pair.Second.Decides));
        Assert.DoesNotContain(member.NextWorst, line => line.Key == "stress");
        Assert.Equal(3, member.NextWorst.Length);
        Assert.True(member.NextWorst[0].Utilization >= member.NextWorst[1].Utilization);
    }

    [Fact]
    public void An_overstressed_member_says_which_strength_and_size_the_criterion_needs()
    {
        // σ = 60 kN/314.159 mm² = 190.99 MPa; service: 190.99·1.67 = 318.95 MPa; d ≥ √(4·60000·1.67/(π·225)) = 23.812 mm.
        var member = Landing.ScreenOne(Landing.OnePost(s_bar), Landing.Constant(new SectionForces(60e3, 0, 0, 0, 0, 0)));

        Assert.Equal(318.95e6, member.RequiredYield!.Value, 0.01e6);
        Assert.Equal("diameter", member.NearestSize!.Dimension);
        Assert.Equal(23.82e-3, member.NearestSize.Value, 1e-9);
        Assert.True(member.Margin < 0);
    }

    [Fact]
    public void A_member_without_strength_is_not_checked_and_says_what_it_needs()
    {
        var member = Landing.ScreenOne(Landing.OnePost(s_bar, material: "Steel"), Landing.Constant(new SectionForces(60e3, 0, 0, 0, 0, 0)));

        Assert.Equal((Verdict.NotChecked, ReasonCode.NoStrength), (member.Verdict, member.Reason!.Code));
        Assert.Equal(318.95e6, member.RequiredYield!.Value, 0.01e6);
        Assert.Contains(member.Notes, note => note.StartsWith("needs fy ≥ 319 MPa", StringComparison.Ordinal));
        Assert.Null(member.Governing);
        Assert.Empty(member.Checks);
    }

    [Fact]
    public void A_member_within_its_limit_lists_its_checks_without_their_calculations()
    {
        var member = Landing.ScreenOne(Landing.OnePost(s_bar), Landing.Constant(new SectionForces(10e3, 0, 0, 0, 0, 0)));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(["stress", "plastic"], member.Checks.Select(c => c.Key));
        Assert.All(member.Checks, c => Assert.Empty(c.Trace));
        Assert.NotEmpty(member.Governing!.Trace);
        Assert.Null(member.RequiredYield);
        Assert.Null(member.NearestSize);
    }
}
