using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Presets;

/// <summary>Hangers under the deck by presets: weight of pipe and contents by hand, rods and struts from geometry.</summary>
public sealed class HangerPresetTests
{
    private const double Spacing = 3;

    // π/4 · (7850·(D² − d²) + 1000·d²) · g with D = 4.5 in and d = 4.5 − 2 × 0.237 in (ASME B36.10, NPS 4 schedule 40, from memory).
    private static readonly double s_weight = 9.80665 * Math.PI / 4 * (7850 * (0.1143 * 0.1143 - 0.1022604 * 0.1022604) + 1000 * 0.1022604 * 0.1022604) * Spacing;

    [Fact]
    public void A_trapeze_gives_its_rods_the_whole_weight_and_its_strut_a_quarter_of_it_times_the_span()
    {
        var record = Landing.Screen(Trapeze(), settings: Settings("pipe-hanger"));

        var rod = Named(record, "Hanger rod 0");
        Assert.All(rod.Situations.SelectMany(s => s.Stations), s => Assert.Equal(s_weight, s.Forces.N, 1e-6 * s_weight));
        Assert.Equal("service", rod.Governing!.Kind);
        var strut = Named(record, "Strut");
        Assert.Equal(s_weight * 0.8 / 4, strut.Situations.SelectMany(s => s.Stations).Max(s => double.Hypot(s.Forces.My, s.Forces.Mz)), 1e-6 * s_weight);
    }

    [Fact]
    public void The_sprinkler_basis_is_five_times_the_weight_and_250_pounds_held_against_the_yield_strength_itself()
    {
        var rod = Named(Landing.Screen(Trapeze(), settings: Settings("sprinkler-hanger-nfpa-13")), "Hanger rod 0");

        var load = 5 * s_weight + 250 * 4.4482216152605;
        Assert.Equal(load, rod.Governing!.Forces.N, 1e-6 * load);
        Assert.Equal("design", rod.Governing.Kind);
        Assert.Contains("without a further reduction", Assert.Single(rod.Situations).Conversion, StringComparison.Ordinal);
    }

    [Fact]
    public void A_maintenance_load_stands_at_the_middle_of_a_strut_that_is_held_at_both_ends()
    {
        // Here the rods stand at the strut's ends. 300 lb × 0.8 m / 4.
        var strut = Named(Landing.Screen(Trapeze(overhang: 0), settings: """{"loads": {"presets": ["maintenance-asce-7-22"]}}"""), "Strut");

        Assert.Equal(300 * 4.4482216152605 * 0.8 / 4, strut.Situations.SelectMany(s => s.Stations).Max(s => double.Hypot(s.Forces.My, s.Forces.Mz)), 1e-6);
    }

    private static string Settings(string preset) =>
        """{"loads": {"presets": [{"use": "NAME", "pipe": "4", "schedule": "40", "contents": "water", "spacing": "3 m"}]}}""".Replace("NAME", preset, StringComparison.Ordinal);

    /// <summary>Two rods 0.8 m apart on a strut of flat bar, which sticks out beyond them.</summary>
    private static byte[] Trapeze(double overhang = 0.1)
    {
        var writer = Landing.Writer();
        for (var i = 0; i < 2; i++) Add(writer, $"Hanger rod {i}", new Round(0.008), new(0.8 * i, 0, 0), Vector3.UnitZ, 1);
        Add(writer, "Strut", new Rectangle(0.040, 0.060), new(-overhang, 0, 0), Vector3.UnitX, 0.8 + 2 * overhang);
        return writer.Build();
    }

    private static void Add(ModelWriter writer, string name, CrossSection section, Vector3 start, Vector3 along, double length)
    {
        var across = Math.Abs(along.Z) > 0.5 ? Vector3.UnitX : Vector3.UnitY;
        var placement = writer.LocalPlacement(new Transform3(start, across, along.Cross(across), along));
        var element = writer.Element("IFCMEMBER", name, placement, Landing.Shape(writer, section, length), new ElementOptions { Key = name, Tag = name });
        writer.Associate(writer.Materials.Material("S355J2H"), element);
    }

    private static MemberResult Named(ScreeningRecord record, string name) => record.Members.Single(m => m.Name == name);
}
