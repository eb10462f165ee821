using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Presets;

/// <summary>Guards of the gangway by presets: spans and supports from geometry, loads from ASCE 7-22 4.5.1 (from memory).</summary>
public sealed class GuardPresetTests
{
    private const double Inch = 0.0254, Pound = 4.4482216152605, PoundInch = Pound * Inch;
    private const double Height = 42 * Inch;
    private const string On = """{"loads": {"presets": ["guard-asce-7-22"]}}""";

    // Issue figures: 42 in post, 200 lb × 42 in = 8,400 lb-in; at 6 ft spacing 50 lb/ft × 6 ft × 42 in = 12,600 lb-in; never the sum.
    [Theory]
    [InlineData(36, 8400, "concentrated")]
    [InlineData(72, 12600, "N/m on the rail")]
    public void The_larger_of_the_two_loads_governs_the_post_and_never_their_sum(double spacingInches, double momentPoundInches, string governing)
    {
        var record = Landing.Screen(Guard(spacingInches * Inch), settings: On);

        var post = Post(record, 1);
        var largest = post.Situations.SelectMany(s => s.Stations).Max(s => double.Hypot(s.Forces.My, s.Forces.Mz));
        Assert.Equal(momentPoundInches, largest / PoundInch, 1e-6 * momentPoundInches);
        Assert.Equal(momentPoundInches, double.Hypot(post.Governing!.Forces.My, post.Governing.Forces.Mz) / PoundInch, 0.02 * momentPoundInches);
        Assert.Contains(governing.Replace("N/m", "kN/m", StringComparison.Ordinal), post.Governing.Situation, StringComparison.Ordinal);
        Assert.Contains("assumed", post.Governing.ForcesSource, StringComparison.Ordinal);
        Assert.Contains("ASCE/SEI 7-22, 4.5.1", post.Governing.ForcesSource, StringComparison.Ordinal);
        Assert.Contains("from memory", post.Governing.ForcesSource, StringComparison.Ordinal);
    }

    [Fact]
    public void The_rail_spans_between_the_posts_and_carries_a_quarter_of_the_load_times_the_span()
    {
        var rail = Rail(Landing.Screen(Guard(72 * Inch), settings: On));

        // PL/4 = 200 × 72/4 = 3,600 lb-in; wL²/8 = 50/12 × 72²/8 = 2,700 lb-in (AISC Manual, Table 3-23; from memory).
        double Largest(string words) => rail.Situations.Where(s => s.Situation.Contains(words, StringComparison.Ordinal)).SelectMany(s => s.Stations).Max(s => double.Hypot(s.Forces.My, s.Forces.Mz));
        Assert.Equal(3600, Largest("concentrated") / PoundInch, 1e-3);
        Assert.Equal(2700, Largest("kN/m from") / PoundInch, 1e-3);
        Assert.NotEqual(Verdict.NotChecked, rail.Verdict);
    }

    [Fact]
    public void Without_a_preset_there_are_no_forces()
    {
        var record = Landing.Screen(Guard(36 * Inch));

        Assert.All(record.Members, m => Assert.Equal(ReasonCode.NoForces, m.Reason!.Code));
    }

    [Fact]
    public void A_rail_that_nearly_touches_its_post_is_not_checked_with_the_reason()
    {
        var record = Landing.Screen(Guard(36 * Inch, gap: 0.04), settings: On);

        var rail = Rail(record);
        Assert.Equal((Verdict.NotChecked, ReasonCode.NoForces), (rail.Verdict, rail.Reason!.Code));
        Assert.Contains("a contact is in doubt", rail.Reason.Message, StringComparison.Ordinal);
        Assert.Contains("gap 40 mm", rail.Reason.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_post_without_a_rail_is_not_checked_with_the_reason()
    {
        var record = Landing.Screen(Landing.OnePost(), settings: """{"loads": {"presets": [{"use": "guard-asce-7-22", "members": "P-*"}]}}""");

        Assert.Contains("touches no rail", Assert.Single(record.Members).Reason!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Forces_of_a_table_come_before_a_preset()
    {
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(1000, 0, 0, 0, 0, 0)), """{"loads": {"presets": [{"use": "guard-asce-7-22", "members": "P-*"}]}}""");

        Assert.Equal("S1", member.Governing!.Situation);
    }

    /// <summary>Three posts of 42 in under one rail, whose axis lies at the top of the posts plus a gap and a radius.</summary>
    private static byte[] Guard(double spacing, double gap = 0)
    {
        var writer = Landing.Writer();
        var tube = Landing.PostTube;
        var top = Height + (gap > 0 ? gap + tube.OuterRadius : 0);
        for (var i = 0; i < 3; i++) Add(writer, $"Post {i}", tube, new(i * spacing, 0, 0), Vector3.UnitZ, Height);
        Add(writer, "Rail", tube, new(0, 0, top), Vector3.UnitX, 2 * spacing);
        return writer.Build();
    }

    private static void Add(ModelWriter writer, string name, CrossSection section, Vector3 start, Vector3 along, double length)
    {
        var across = Math.Abs(along.Z) > 0.5 ? Vector3.UnitX : Vector3.UnitZ;
        var placement = writer.LocalPlacement(new Transform3(start, across, along.Cross(across), along));
        var element = writer.Element("IFCMEMBER", name, placement, Landing.Shape(writer, section, length), new ElementOptions { Key = name, Tag = name });
        writer.Associate(writer.Materials.Material("S355J2H"), element);
    }

    private static MemberResult Post(ScreeningRecord record, int number) => record.Members.Single(m => m.Name == $"Post {number}");

    private static MemberResult Rail(ScreeningRecord record) => record.Members.Single(m => m.Name == "Rail");
}
