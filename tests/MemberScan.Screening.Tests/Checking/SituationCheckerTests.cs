using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Screening.Tests.Checking;

/// <summary>Limits by the kind of the situation, what is known between stations, and two readings of one section.</summary>
public sealed class SituationCheckerTests
{
    private static readonly SectionForces s_tension = new(45e3, 0, 0, 0, 0, 0);

    // σ = 45e3/453.4 = 99.25 MPa: 0.705 of 235/1.67, 0.422 of 235.
    private const double Stress = 45e3 / 4.5339e-4;

    [Fact]
    public void A_situation_of_unknown_kind_is_held_against_the_service_limit_and_says_so()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(s_tension, kind: ""));

        Assert.Equal((Verdict.WithinLimit, "unknown"), (member.Verdict, member.Governing!.Kind));
        Assert.Equal(Stress / (235e6 / 1.67), member.Governing.Utilization, 1e-4);
        Assert.Contains("kind unknown: held against the service limit", member.Notes);
        Assert.Contains("kind unknown: held against the service limit", member.Situations[0].Note, StringComparison.Ordinal);
    }

    [Fact]
    public void Design_is_held_against_the_design_limit_only()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(s_tension, kind: "design"), """{"basis": {"design": {"gammaM0": 1.1}}}""");

        Assert.Equal(Stress / (235e6 / 1.1), member.Governing!.Utilization, 1e-4);
        Assert.Equal("EN 1993-1-1 6.2.1(5), γM0 = 1.10", member.Governing.Criterion);
    }

    [Fact]
    public void A_kind_without_a_limit_is_not_held_against_the_limit_of_the_other()
    {
        // Ten times the yield strength: held against any limit it would be overstressed.
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(1e6, 0, 0, 0, 0, 0), kind: "design"), """{"basis": {"design": null}}""");

        Assert.Equal((Verdict.NotChecked, ReasonCode.KindWithoutLimit), (member.Verdict, member.Reason!.Code));
        Assert.Null(member.Governing);
    }

    [Theory]
    [InlineData("ULS 7", "design", "settings, pattern")]
    [InlineData("SLS 7", "service", "settings, pattern")]
    [InlineData("Wind", "unknown", "")]
    public void The_settings_tell_kinds_by_names(string situation, string kind, string source)
    {
        var settings = """{"forces": {"kinds": [{"pattern": "ULS*", "kind": "design"}, {"pattern": "SLS*", "kind": "service"}]}}""";

        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(s_tension, kind: "", situation: situation), settings);

        Assert.Equal(kind, member.Situations[0].Kind);
        Assert.Equal(source.Length == 0, member.Notes.Contains("kind unknown: held against the service limit"));
    }

    [Fact]
    public void Tresca_is_taken_where_the_settings_ask_for_it()
    {
        // Pure torsion: τ = T/Wt, Wt = 9.59 cm³ (EN 10219-2); Tresca 2τ, von Mises √3·τ.
        var table = Landing.Constant(new(0, 0, 0, 500, 0, 0));

        var mises = Landing.ScreenOne(Landing.OnePost(), table);
        var tresca = Landing.ScreenOne(Landing.OnePost(), table, """{"basis": {"service": {"criterion": "allowable-tresca"}}}""");

        Assert.Equal(Math.Sqrt(3) * 500 / 9.5947e-6 / (235e6 / 1.67), mises.Governing!.Utilization, 1e-3);
        Assert.Equal(2 * 500 / 9.5947e-6 / (235e6 / 1.67), tresca.Governing!.Utilization, 1e-3);
    }

    /// <summary>
    /// M is zero at both stations and V the reaction of a uniform load: ΔMy = ½(V1 + V2)·L holds, so the load is inferred and the parabola's
    /// largest value qL²/8 lies in the middle (any structural handbook).
    /// </summary>
    [Theory]
    [InlineData(0, 1)]
    [InlineData(1, 0)]
    [InlineData(0.6, 0.8)]
    public void Between_two_stations_of_a_simple_span_the_largest_moment_is_found(double alongY, double alongZ)
    {
        var (q, length) = (1000.0, 2.0);
        SectionForces At(double x) => new(0, q * alongY * (length / 2 - x), q * alongZ * (length / 2 - x), 0, 0, 0);

        var member = Landing.ScreenOne(Landing.OnePost(length: length), Landing.Table(("S1", "service", 0, At(0)), ("S1", "service", length, At(length))));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(1, member.Governing!.Station, 1e-3);
        Assert.Equal(q * length * length / 8 / 4.7974e-6 / (235e6 / 1.67), member.Governing.Utilization, 1e-3);
        Assert.Contains("uniform load inferred between stations", member.Notes);
    }

    [Fact]
    public void Nothing_is_inferred_across_a_jump()
    {
        // Two simple spans of 1 m, hinged over the support: V jumps there from −qa/2 to +qa/2. Across the jump the rule of a uniform load would hold too.
        var q = 2000.0;
        var table = Landing.Table(
            ("S1", "service", 0, new(0, 0, q / 2, 0, 0, 0)), ("S1", "service", 1, new(0, 0, -q / 2, 0, 0, 0)),
            ("S1", "service", 1, new(0, 0, q / 2, 0, 0, 0)), ("S1", "service", 2, new(0, 0, -q / 2, 0, 0, 0)));

        var member = Landing.ScreenOne(Landing.OnePost(length: 2), table);

        Assert.Equal(q / 8 / 4.7974e-6 / (235e6 / 1.67), member.Governing!.Utilization, 1e-3);
        Assert.Contains(member.Governing.Station, new[] { 0.5, 1.5 }, new Near(1e-3));
    }

    [Fact]
    public void A_point_load_between_stations_is_too_coarse()
    {
        // Load P in the middle of 2 m: V = ±P/2, M = 0 at both ends by statics, PL/4 in the middle. Forces at the ends look like those of a uniform load;
        // a third station at the quarter point tells the difference.
        var p = 1000.0;
        var table = Landing.Table(
            ("S1", "service", 0, new(0, 0, p / 2, 0, 0, 0)), ("S1", "service", 0.5, new(0, 0, p / 2, 0, p / 4, 0)), ("S1", "service", 2, new(0, 0, -p / 2, 0, 0, 0)));

        var member = Landing.ScreenOne(Landing.OnePost(length: 2), table);

        Assert.Equal((Verdict.NotChecked, ReasonCode.StationsTooCoarse), (member.Verdict, member.Reason!.Code));
        Assert.Contains("0.5 m and 2 m", member.Reason.Message, StringComparison.Ordinal);
    }

    /// <summary>Sharp corners overstate the modulus: SHS 50×50×4 sharp W = 10.5 cm³, with the radii of EN 10219-2 less (formulas of its annex, from memory).</summary>
    [Fact]
    public void Of_a_box_without_corner_radii_the_less_favourable_reading_decides()
    {
        var table = Landing.Table(("S1", "service", 0, new(0, 0, 0, 0, 1000, 0)), ("S1", "service", 1, new(0, 0, 0, 0, 1000, 0)));

        var absent = Landing.ScreenOne(Landing.OnePost(new Box(50e-3, 50e-3, 4e-3)), table);
        var given = Landing.ScreenOne(Landing.OnePost(new Box(50e-3, 50e-3, 4e-3, 8e-3, 4e-3)), table);

        var sharp = 1000 * 25e-3 / ((Math.Pow(50e-3, 4) - Math.Pow(42e-3, 4)) / 12) / (235e6 / 1.67);
        Assert.True(absent.Governing!.Utilization > 1.02 * sharp);
        Assert.Equal(given.Governing!.Utilization, absent.Governing.Utilization, 1e-9);
        Assert.Equal(given.Section, absent.Governing.Section);
        Assert.Contains(absent.Notes.Concat([absent.SectionSource]), n => n.Contains("radii assumed", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(3.2e-3, 4.0e-3)]
    [InlineData(4.0e-3, 3.2e-3)]
    public void Where_body_and_profile_set_differ_the_less_favourable_decides(double bodyWall, double setWall)
    {
        var writer = Landing.Writer();
        var post = writer.Element("IFCMEMBER", "Post", writer.LocalPlacement(Foundation.Geometry.Transform3.Identity), Landing.Shape(writer, new Tube(24.15e-3, bodyWall), 1), new ElementOptions { Tag = Landing.Post });
        var set = writer.Materials.ProfileSet("Tube", writer.Materials.Material("S235JR"), writer.Profiles.Of(new Tube(24.15e-3, setWall)));
        writer.Associate(writer.Materials.ProfileSetUsage(set), post);

        var member = Landing.ScreenOne(writer.Build(), Landing.Constant(s_tension));

        Assert.Equal(Stress / (235e6 / 1.67), member.Governing!.Utilization, 1e-4);
        Assert.Contains(member.Notes, n => n.StartsWith("body and material profile set differ", StringComparison.Ordinal));
    }

    private sealed class Near(double tolerance) : IEqualityComparer<double>
    {
        public bool Equals(double x, double y) => Math.Abs(x - y) <= tolerance;

        public int GetHashCode(double obj) => 0;
    }
}
