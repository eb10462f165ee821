using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.HandCalculation;
using MemberScan.SampleModels.Scenario;

namespace MemberScan.SampleModels.Tests.HandCalculation;

/// <summary>The calculation by hand against tabulated section values and textbook formulas.</summary>
public sealed class HandVerdictTests
{
    private static readonly SampleMaterial s_s235 = new("S235JR", Si.MPa(235), Si.GPa(210), InProperties: true);

    /// <summary>Wel of EN 10210-2 and EN 10219-2 tables (from memory), in cm³, as printed there: half a unit of the last digit is left.</summary>
    public static TheoryData<string, CrossSection, double, double> TabulatedModuli => new()
    {
        { "CHS 48.3x3.2", new Tube(Si.Mm(24.15), Si.Mm(3.2)), 4.80, 0.005 },
        { "CHS 168.3x6.3", new Tube(Si.Mm(84.15), Si.Mm(6.3)), 125, 0.5 },
        { "RHS 120x60x5 hot", new Box(Si.Mm(60), Si.Mm(120), Si.Mm(5), Si.Mm(7.5), Si.Mm(5)), 49.9, 0.05 },
        { "SHS 60x60x3 cold", new Box(Si.Mm(60), Si.Mm(60), Si.Mm(3), Si.Mm(6), Si.Mm(3)), 11.7, 0.05 },
        { "SHS 100x100x5 cold", new Box(Si.Mm(100), Si.Mm(100), Si.Mm(5), Si.Mm(10), Si.Mm(5)), 54.2, 0.05 },
    };

    [Theory]
    [MemberData(nameof(TabulatedModuli))]
    public void Bending_alone_gives_moment_over_the_tabulated_modulus(string name, CrossSection section, double modulusCm3, double toleranceCm3)
    {
        var member = Member(section, new SectionForces(0, 0, 0, 0, 1000, 0));

        var result = HandVerdict.Of(member);

        var modulus = 1000 / Math.Abs(result.Point.Sigma) * 1e6;
        Assert.True(Math.Abs(modulus - modulusCm3) <= toleranceCm3, $"{name}: {modulus}");
    }

    /// <summary>Wt of EN 10210-2 and EN 10219-2 tables (from memory), in cm³.</summary>
    [Fact]
    public void Torsion_of_a_box_gives_moment_over_the_tabulated_torsion_modulus()
    {
        var hot = HandVerdict.Of(Member(new Box(Si.Mm(60), Si.Mm(120), Si.Mm(5), Si.Mm(7.5), Si.Mm(5)), new SectionForces(0, 0, 0, 1000, 0, 0)));
        var cold = HandVerdict.Of(Member(new Box(Si.Mm(60), Si.Mm(60), Si.Mm(3), Si.Mm(6), Si.Mm(3)), new SectionForces(0, 0, 0, 1000, 0, 0)));

        Assert.Equal(56.0, 1000 / hot.Point.Tau * 1e6, 0.05);
        Assert.Equal(17.7, 1000 / cold.Point.Tau * 1e6, 0.05);
    }

    /// <summary>Elementary shear peaks of textbooks: 4/3 V/A round, 3/2 V/A rectangle, 2 V/A thin tube (from memory).</summary>
    [Fact]
    public void Shear_alone_gives_the_textbook_peaks()
    {
        var shear = new SectionForces(0, 300, 400, 0, 0, 0);
        var along = new SectionForces(0, 0, 500, 0, 0, 0);

        var round = HandVerdict.Of(Member(new Round(0.01), shear));
        var rectangle = HandVerdict.Of(Member(new Rectangle(0.02, 0.05), along));
        var tube = HandVerdict.Of(Member(new Tube(0.05, 0.0005), shear));

        Assert.Equal(4.0 / 3 * 500 / (Math.PI * 1e-4), round.Point.Tau, 1.0);
        Assert.Equal(1.5 * 500 / 1e-3, rectangle.Point.Tau, 1.0);
        Assert.Equal(2, tube.Point.Tau / (500 / (Math.PI * (0.05 * 0.05 - 0.0495 * 0.0495))), 2e-3);
    }

    /// <summary>Closed thin square under shear along z: V·Q/(2·I·t) on the neutral axis is 9/8·V/(2·a·t) with side a of the middle line.</summary>
    [Fact]
    public void Shear_of_a_thin_square_box_gives_the_closed_form()
    {
        const double a = 0.1, t = 0.0005;
        var result = HandVerdict.Of(Member(new Box(a + t, a + t, t, t * 0.51, t * 0.01), new SectionForces(0, 0, 1000, 0, 0, 0)));

        Assert.Equal(9.0 / 8, result.Point.Tau / (1000 / (2 * a * t)), 3e-3);
    }

    /// <summary>Torsion and shear of a tube add on one side: T·r/J + V·Q/(I·2t).</summary>
    [Fact]
    public void Torsion_adds_to_shear_on_one_side_of_a_tube()
    {
        var (outer, inner) = (0.03, 0.026);
        var inertia = Math.PI / 4 * (Math.Pow(outer, 4) - Math.Pow(inner, 4));
        var q = 2.0 / 3 * (Math.Pow(outer, 3) - Math.Pow(inner, 3));
        var expected = 2000 * q / (inertia * 2 * 0.004) + 150 * outer / (2 * inertia);

        var result = HandVerdict.Of(Member(new Tube(outer, 0.004), new SectionForces(0, 0, 2000, 150, 0, 0)));

        Assert.Equal(1, result.Point.Tau / expected, 1e-9);
        Assert.Equal(outer, result.Point.Y, 1e-9);
    }

    /// <summary>EN 1993-1-1, 6.3.1.2(4): 4 % of the Euler load. Tube 48.3x3.2, 3 m, E 210 GPa: 26.7 kN with the member's own length.</summary>
    [Theory]
    [InlineData(-0.266, "WITHIN LIMIT", null)]
    [InlineData(-0.268, "NOT CHECKED", "stability-not-checked")]
    [InlineData(-90, "OVERSTRESSED", null)]
    public void Compression_is_held_against_four_percent_of_the_Euler_load(double kilonewtons, string verdict, string? reason)
    {
        // Twice the length quarters the load: 6.67 kN, 4 % of it 0.267 kN.
        var member = Member(new Tube(Si.Mm(24.15), Si.Mm(3.2)), new SectionForces(Si.KN(kilonewtons), 0, 0, 0, 0, 0)) with { Length = 3 };

        var result = HandVerdict.Of(member);

        Assert.Equal((verdict, reason), (result.Verdict, result.ReasonCode));
    }

    [Fact]
    public void Service_is_held_against_a_share_of_the_strength_and_design_against_all_of_it()
    {
        var forces = new SectionForces(Si.MPa(150) * Math.PI * 1e-4, 0, 0, 0, 0, 0);
        var service = Member(new Round(0.01), forces);
        var design = service with { Situations = [service.Situations[0] with { IsService = false }] };

        Assert.Equal(150 / (235 / 1.67), HandVerdict.Of(service).Utilization!.Value, 1e-9);
        Assert.Equal(150.0 / 235, HandVerdict.Of(design).Utilization!.Value, 1e-9);
    }

    [Fact]
    public void The_largest_moment_between_stations_is_found()
    {
        // Two stations only: the span's moment qL²/8 lies in between.
        var stations = Effects.SimpleSpan(2, 2, qz: -1000);
        var member = Member(new Tube(Si.Mm(24.15), Si.Mm(3.2)), default) with { Length = 2, Situations = [new SampleSituation("S", true, stations)] };

        var result = HandVerdict.Of(member);

        Assert.Equal(1, result.Station, 1e-12);
        Assert.Equal(500 / 4.7974e-6, Math.Abs(result.Point.Sigma), 500 / 4.7974e-6 * 1e-4);
    }

    private static SampleMember Member(CrossSection section, SectionForces forces) => new()
    {
        Name = "member",
        Section = section,
        Material = s_s235,
        Axes = MemberAxes.From(Vector3.Zero, Vector3.UnitX, Vector3.UnitZ)!,
        Length = 1,

        // A stretch so short that shear adds no moment.
        Situations = [new SampleSituation("S", true, [new ForceStation(0, forces), new ForceStation(1e-9, forces)])],
    };
}
