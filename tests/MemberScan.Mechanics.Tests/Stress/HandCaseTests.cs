using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Figures that a colleague can follow with a pocket calculator.</summary>
public sealed class HandCaseTests
{
    private const double Inch = 0.0254;
    private const double PoundForce = 4.4482216152605;

    // σ = 10 000/314.16 + √2·100 000/785.40 = 31.83 + 180.06 = 211.89 MPa, τ = 50 000/1570.8 = 31.83 MPa.
    [Theory]
    [InlineData(ShearModel.Elementary)]
    [InlineData(ShearModel.Elasticity)]
    public void A_hanger_rod_of_20_mm_under_tension_bending_both_ways_and_torsion(ShearModel model)
    {
        var field = Samples.Field(new Round(0.010), model);
        var forces = new SectionForces(10e3, 0, 0, 50, 100, 100);

        var mises = field.Govern(forces, StressMeasure.VonMises);
        var tresca = field.Govern(forces, StressMeasure.Tresca);

        Printed.Agrees("218.95", mises.Value / 1e6, "von Mises");
        Printed.Agrees("221.25", tresca.Value / 1e6, "Tresca");
        Printed.Agrees("211.89", mises.State.Sigma / 1e6, "σ");
        Printed.Agrees("31.83", mises.State.Tau / 1e6, "τ");
        Assert.Equal("extreme fibre, direction 45° from −y towards +z", mises.Place);
    }

    [Theory]
    [InlineData(ShearModel.Elementary)]
    [InlineData(ShearModel.Elasticity)]
    public void A_trapeze_strut_of_40_by_80_mm_under_torsion(ShearModel model)
    {
        var field = Samples.Field(new Rectangle(0.040, 0.080), model);

        var tau = field.Govern(new SectionForces(0, 0, 0, 200, 0, 0), StressMeasure.Tau);

        Printed.Agrees("1.171", field.Properties.J!.Value * 1e6, "J, 10⁶ mm⁴");
        Printed.Agrees("6.35", tau.Value / 1e6, "τ");
        Assert.Equal("middle of the long side, +y", tau.Place);
        Assert.Equal((0.020, 0), (tau.Y, tau.Z));
    }

    // 200 lbf (ASCE 7, 4.5.1) on a post of 42 in, pipe 1½ Sch 40 with its nominal wall: M = 8400 lbf·in, W = 0.3262 in³.
    [Fact]
    public void A_gangway_post_of_pipe_under_the_guard_load()
    {
        var field = Samples.Field(new Tube(1.900 / 2 * Inch, 0.145 * Inch), ShearModel.Elementary);
        var forces = new SectionForces(0, 0, 200 * PoundForce, 0, -200 * PoundForce * 42 * Inch, 0);

        var sigma = field.Govern(forces, StressMeasure.AbsoluteSigma);

        var ksi = 1000 * PoundForce / (Inch * Inch);
        Printed.Agrees("25.75", Math.Abs(sigma.Value) / ksi, "σ, ksi");
        Assert.Equal("extreme fibre, +z", sigma.Place);
        Assert.True(sigma.Value < 0);
        Assert.Equal("extreme fibre, +z", field.Govern(forces, StressMeasure.VonMises).Place);
    }
}
