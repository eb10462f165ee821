using System.Collections.Immutable;
using MemberScan.Checks.Walls;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Tests.Walls;

/// <summary>Class 3 limits of EN 1993-1-1:2005, Table 5.2, sheets 1 to 3 (from memory): outstands 14ε, webs by ψ, angles 15ε and 11.5ε; ε = 1 at 235 MPa.</summary>
public sealed class OpenProfileWallsTests
{
    private static readonly SectionForces s_pressed = new(-1e3, 0, 0, 0, 0, 0);

    // Wall thickness that makes the decisive ratio just reach its limit at ε = 1; the profiles are otherwise stout.
    public static TheoryData<OpenShape, double, double, double, double, double> Edges => new()
    {
        // c = (100 − 8)/2 = 46 over t = 46/14.
        { OpenShape.I, 0.1, 0.1, 0.008, 0.046 / 14, 14 },
        // c = 60 − 8 = 52.
        { OpenShape.U, 0.08, 0.06, 0.008, 0.052 / 14, 14 },
        // c = (80 − 10)/2 = 35.
        { OpenShape.T, 0.06, 0.08, 0.010, 0.035 / 14, 14 },
        // Equal legs of 60: (60 + 60)/2t = 11.5 decides before 60/t = 15 and (60 − t)/t = 14.
        { OpenShape.L, 0.06, 0.06, 0.06 / 11.5, 0.06 / 11.5, 11.5 },
    };

    [Theory]
    [MemberData(nameof(Edges))]
    public void A_wall_at_its_limit_is_class_3_and_one_beyond_it_is_not_checked(OpenShape shape, double depth, double width, double web, double flange, double limit)
    {
        var at = Check(new OpenProfile(shape, depth, width, web, flange));
        var beyond = Check(shape == OpenShape.L ? new OpenProfile(shape, depth, width, web * 0.99, flange * 0.99) : new OpenProfile(shape, depth, width, web, flange * 0.99));

        var evaluated = Assert.IsType<CheckResult.Evaluated>(at);
        Assert.Equal(1, evaluated.Utilization, 1e-9);
        Assert.Equal(limit, evaluated.Trace.Single(line => line.Symbol == "limit").Value, 1e-9);
        Assert.Equal(ReasonCode.SlenderWall, Assert.IsType<CheckResult.NotEvaluated>(beyond).Why.Code);
    }

    [Fact]
    public void The_web_of_an_I_in_bending_goes_by_the_ratio_of_its_end_stresses()
    {
        // ψ = −1: 62ε(1 − ψ)√(−ψ) = 124, and 42ε/(0.67 + 0.33ψ) = 123.5 on the other side of it; the flange is stout.
        var profile = new OpenProfile(OpenShape.I, 0.520, 0.1, 0.500 / 100, 0.01);

        var evaluated = Assert.IsType<CheckResult.Evaluated>(Check(profile, new(0, 0, 0, 0, 1e3, 0)));

        Assert.InRange(evaluated.Utilization, 100 / 124.0 - 1e-6, 100 / 123.5 + 1e-4);
    }

    [Fact]
    public void Nothing_compressed_needs_no_rule()
    {
        Assert.Null(Check(new OpenProfile(OpenShape.I, 0.1, 0.1, 0.001, 0.001), new(1e3, 0, 0, 0, 0, 0)));
        Assert.Null(Check(Zed, new(1e3, 0, 0, 0, 0, 0)));
    }

    [Fact]
    public void A_solid_outline_has_no_walls_and_one_with_walls_but_without_rule_is_not_checked_when_pressed()
    {
        var trapezium = new OutlineSection("trapezium", [[new(0, 0), new(0.06, 0), new(0.05, 0.03), new(0.01, 0.03)]]);

        Assert.Null(Check(trapezium, s_pressed));
        Assert.Equal(ReasonCode.SlenderWall, Assert.IsType<CheckResult.NotEvaluated>(Check(Zed, s_pressed)).Why.Code);
    }

    [Fact]
    public void An_outline_that_is_a_letter_lying_down_is_held_like_the_letter()
    {
        var upright = new OpenProfile(OpenShape.U, 0.12, 0.055, 0.007, 0.009);
        var lying = new OutlineSection("lying", [upright.Vertices.Select(v => new OutlineVertex(-v.Z, v.Y, v.Bulge)).ToImmutableArray()]);

        // A quarter turn from y to z takes My of the profile to Mz of the outline, and Mz to −My.
        var (a, b) = (Check(upright, new(-1e3, 0, 0, 0, 50, 20)), Check(lying, new(-1e3, 0, 0, 0, -20, 50)));

        Assert.Equal(Assert.IsType<CheckResult.Evaluated>(a).Utilization, Assert.IsType<CheckResult.Evaluated>(b).Utilization, 1e-6);
    }

    private static OutlineSection Zed { get; } = new("Z", [[new(0, 0), new(0.06, 0), new(0.06, 0.005), new(0.005, 0.005), new(0.005, 0.1), new(-0.055, 0.1), new(-0.055, 0.095), new(0, 0.095)]]);

    private static CheckResult? Check(CrossSection section) => Check(section, s_pressed);

    private static CheckResult? Check(CrossSection section, SectionForces forces) => SlenderWall.Check(section, SectionProperties.Of(section), forces, 235e6);
}
