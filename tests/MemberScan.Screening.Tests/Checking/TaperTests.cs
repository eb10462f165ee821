using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Checking;

/// <summary>Tapering members by hand: the section at a place from even dimensions, σ = M·c/I there.</summary>
public sealed class TaperTests
{
    // S235 of 63 to 80 mm: 215 MPa (EN 10025-2, from memory); the thickness of the thicker end counts.
    private const double Service = 215e6 / 1.67;

    [Fact]
    public void The_largest_stress_of_a_tapered_cantilever_lies_where_the_derivative_says()
    {
        // A round mast of 1 m, diameter 80 mm at its foot (x = 0) and 30 mm at its head, F = 500 N across the head: M = F·(1 − x), d = 80 − 50x,
        // σ = 32·M/(π·d³) is largest where d(σ)/dx = 0: −d + 150·(1 − x) = 0 with d = 80 − 50x, so x = 0.7 and d = 45 mm.
        var stress = 32 * 500 * 0.3 / (Math.PI * Math.Pow(0.045, 3));

        var member = Screen(0.080, 0.030, new(0, 0, 500, 0, -500, 0), new(0, 0, 500, 0, 0, 0));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(0.7, member.Governing!.Station, 0.01);
        Assert.Equal(stress / Service, member.Governing.Utilization, 1e-3 * stress / Service);
        Assert.Equal("round 80 mm to round 30 mm", member.Section);
        Assert.Contains(member.Notes, n => n.StartsWith("tapered:", StringComparison.Ordinal));
    }

    [Fact]
    public void In_tension_the_thinner_end_governs()
    {
        var member = Screen(0.080, 0.030, new(60e3, 0, 0, 0, 0, 0), new(60e3, 0, 0, 0, 0, 0));

        Assert.Equal(1, member.Governing!.Station, 1e-9);
        Assert.Equal(60e3 / (Math.PI * 0.015 * 0.015) / Service, member.Governing.Utilization, 1e-6);
    }

    [Fact]
    public void A_compressed_taper_is_held_against_the_Euler_load_of_its_thinner_end()
    {
        // d = 30 mm: I = 3.976e-8 m⁴; 4 % of π²·210e9·I/2² is 824 N.
        Assert.Equal(Verdict.WithinLimit, Screen(0.080, 0.030, new(-800, 0, 0, 0, 0, 0), new(-800, 0, 0, 0, 0, 0)).Verdict);
        Assert.Equal(ReasonCode.StabilityNotChecked, Screen(0.080, 0.030, new(-850, 0, 0, 0, 0, 0), new(-850, 0, 0, 0, 0, 0)).Reason!.Code);
    }

    [Fact]
    public void A_steep_taper_is_not_covered()
    {
        Assert.Equal(ReasonCode.SectionNotCovered, Screen(0.420, 0.030, new(1e3, 0, 0, 0, 0, 0), new(1e3, 0, 0, 0, 0, 0)).Reason!.Code);
    }

    [Fact]
    public void A_tapering_box_is_held_against_either_end_along_its_whole_length()
    {
        // Box 100 × 60 × 5 mm (radii 10 and 5) to 60 × 40 × 4 mm (radii 8 and 4); area of the smaller: 60·40 − (4 − π)·8² − (52·32 − (4 − π)·4²) = 694.797 mm².
        // The moment is largest at the thicker foot; with the smaller section everywhere it governs there.
        var area = (60 * 40 - (4 - Math.PI) * 64 - (52 * 32 - (4 - Math.PI) * 16)) * 1e-6;

        var pulled = Screen(w => (w.Profiles.RectangleHollow(0.1, 0.06, 0.005, 0.005, 0.01), w.Profiles.RectangleHollow(0.06, 0.04, 0.004, 0.004, 0.008)), new(60e3, 0, 0, 0, 0, 0), new(60e3, 0, 0, 0, 0, 0));
        var bent = Screen(w => (w.Profiles.RectangleHollow(0.1, 0.06, 0.005, 0.005, 0.01), w.Profiles.RectangleHollow(0.06, 0.04, 0.004, 0.004, 0.008)), new(0, 0, 300, 0, -300, 0), new(0, 0, 300, 0, 0, 0));

        // S235 up to 16 mm: 235 MPa.
        Assert.Equal(60e3 / area / (235e6 / 1.67), pulled.Governing!.Utilization, 1e-4);
        Assert.Equal(Verdict.WithinLimit, pulled.Verdict);
        Assert.Equal("box 100x60x5 mm ro 10 ri 5 to box 60x40x4 mm ro 8 ri 4", pulled.Section);
        Assert.Contains(pulled.Notes, n => n.Contains("section of either end", StringComparison.Ordinal));
        Assert.Equal(0, bent.Governing!.Station, 1e-9);
    }

    [Fact]
    public void A_tapering_I_of_constant_plates_is_held_against_its_shallower_end()
    {
        // Flanges 100 × 10 mm, web 6 mm, depth 200 to 120 mm; N = 100 kN over the shallower end's 2·100·10 + 100·6 = 2600 mm².
        var member = Screen(w => (w.Profiles.IShape(0.1, 0.2, 0.006, 0.01), w.Profiles.IShape(0.1, 0.12, 0.006, 0.01)), new(100e3, 0, 0, 0, 0, 0), new(100e3, 0, 0, 0, 0, 0));

        Assert.Equal(100e3 / 2600e-6 / (235e6 / 1.67), member.Governing!.Utilization, 1e-4);
    }

    private static MemberResult Screen(double foot, double head, SectionForces start, SectionForces end) =>
        Screen(w => (w.Profiles.Circle(foot / 2), w.Profiles.Circle(head / 2)), start, end);

    private static MemberResult Screen(Func<ModelWriter, (int Foot, int Head)> profiles, SectionForces start, SectionForces end)
    {
        var writer = Landing.Writer();
        var (foot, head) = profiles(writer);
        var solid = writer.Add("IFCEXTRUDEDAREASOLIDTAPERED", Spelling.Reference(foot), Spelling.Reference(writer.AxisPlacement(Transform3.Identity)),
            Spelling.Reference(writer.Direction(Vector3.UnitZ)), writer.Units.LengthText(1), Spelling.Reference(head));
        Landing.Add(writer, writer.Bodies.Shape("AdvancedSweptSolid", solid));
        return Landing.ScreenOne(writer.Build(), Landing.Table(("S1", "service", 0, start), ("S1", "service", 1, end)));
    }
}
