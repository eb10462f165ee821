using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Scenario;

/// <summary>The signal mast of the landing with stays, spreaders and outriggers; results in global axes of a moved and turned analysis model.</summary>
public static class MastStays
{
    /// <summary>File name without extension.</summary>
    public const string Name = "mast-stays";

    private const string Service = "GZG: G + W";
    private const string Design = "GZT: 1.35 G + 1.5 W";

    private static readonly SampleMaterial s_s355 = new("S355J2H", Si.MPa(355), Si.GPa(210), InProperties: true);
    // Over 16 mm the grade has less (EN 10210-1:2006, from memory).
    private static readonly SampleMaterial s_thickS355 = new("S355J2H, t > 16 mm", Si.MPa(345), Si.GPa(210), InProperties: true);
    private static readonly SampleMaterial s_s235 = new("S235JRH", Si.MPa(235), Si.GPa(210), InProperties: false);

    // Turned by 30° about the vertical, moved to the mast's foot.
    private static readonly Transform3 s_foot = new(
        new(120, 45, 3.2), new(Math.Sqrt(3) / 2, 0.5, 0), new(-0.5, Math.Sqrt(3) / 2, 0), Vector3.UnitZ);

    /// <summary>Writes the sample.</summary>
    public static SampleModel Write()
    {
        var builder = new LandingBuilder(new ModelWriter(SchemaVersion.Ifc4X3, ModelUnits.MetreNewton, Name), Name, s_foot, resultsInGlobalAxes: true);
        builder.StartAnalysis(Service, Design, "W", "WIND_W");
        foreach (var member in Mast()) builder.Add(member);
        int[] stays = [.. Stays().Select(builder.Add)];
        foreach (var member in Arms()) builder.Add(member);
        builder.Writer.PropertySet("Landing_Stay", stays,
            ("Pretension", Spelling.Typed("IFCFORCEMEASURE", builder.Writer.Units.ForceText(Si.KN(5)))),
            ("Note", Spelling.Typed("IFCTEXT", Spelling.Text("Prüfung 'jährlich'; 纜索; 🚢"))),
            ("Diameter", Spelling.Typed("IFCPOSITIVELENGTHMEASURE", builder.Writer.Units.LengthText(Si.Mm(16)))));
        return builder.Build([], DescriptionPage.Write(Prose, builder.Members));
    }

    private static IEnumerable<SampleMember> Mast()
    {
        yield return new()
        {
            Name = "Mastschaft unten",
            Tag = "M-1",
            Keyword = "IFCCOLUMN",
            PredefinedType = "COLUMN",
            Section = TubeMm(168.3, 6.3),
            Material = s_s355,
            Axes = From(new(0, 0, 0), Vector3.UnitZ, Vector3.UnitX),
            Length = 3,
            Situations = Both(Effects.Cantilever(3, -Si.KN(8)), Effects.Cantilever(3, -Si.KN(6), Si.KN(2), Si.KN(4), Si.KNm(1.5))),
        };
        yield return new()
        {
            Name = "Mastschaft oben",
            Tag = "M-2",
            Keyword = "IFCCOLUMN",
            PredefinedType = "COLUMN",
            Section = TubeMm(114.3, 5),
            Material = s_s355,
            Axes = From(new(0, 0, 3), Vector3.UnitZ, Vector3.UnitX),
            Length = 6,
            Situations = Both(Effects.Cantilever(6, -Si.KN(6)), Effects.Cantilever(6, -Si.KN(5), 0, Si.KN(0.4))),
        };
    }

    private static IEnumerable<SampleMember> Stays()
    {
        SampleMember Stay(int number, string name, double x, double y, double diameterMm, double g, double w, SampleMaterial? material = null)
        {
            Vector3 foot = new(x, y, 0), head = new(0, 0, 9);
            var length = (head - foot).Length;
            return new()
            {
                Name = name,
                Tag = $"S-{number}",
                PredefinedType = "STAY_CABLE",
                Section = new Round(Si.Mm(diameterMm / 2)),
                Material = material ?? s_s355,
                Axes = From(foot, head - foot, Vector3.UnitZ),
                Length = length,
                Body = number % 2 == 0 ? SampleBody.SweptDisk : SampleBody.Extrusion,
                Situations = Both(Effects.Cantilever(length, Si.KN(g)), Effects.Cantilever(length, Si.KN(w))),
            };
        }

        yield return Stay(1, "Abspannstab Bug 1", 6, 4, 16, 5, 20);
        yield return Stay(2, "Abspannstab Bug 2", 6, -4, 16, 5, 24);
        yield return Stay(3, "Abspannstab Heck 1", -6, 4, 20, 5, 30, s_thickS355);
        yield return Stay(4, "Abspannstab Heck 2", -6, -4, 12, 5, 21);
        yield return Stay(5, "Abspannstab 'quer' 纜索 🚢", 0, 7, 16, 5, 12, s_s235);
    }

    private static IEnumerable<SampleMember> Arms()
    {
        SampleMember Arm(string tag, string name, Vector3 origin, Vector3 along, CrossSection section, double length, double n, double py, double pz, double t, SampleBody body) => new()
        {
            Name = name,
            Tag = tag,
            PredefinedType = "MEMBER",
            Section = section,
            Material = s_s355,
            Axes = From(origin, along, Vector3.UnitZ),
            Length = length,
            Body = body,
            Situations = Both(Effects.Cantilever(length, pz: -Si.KN(0.15)), Effects.Cantilever(length, Si.KN(n), Si.KN(py), Si.KN(pz), Si.KNm(t))),
        };
        var spreader = TubeMm(60.3, 4);
        yield return Arm("R-1", "Saling 1", new(0, 0, 6), new(0.8, 0.5, 0.1), spreader, 1.2, -2, 0.3, -0.6, 0, SampleBody.Extrusion);
        yield return Arm("R-2", "Saling 2", new(0, 0, 6), new(-0.8, 0.5, 0.1), spreader, 1.2, -2, 0.9, -0.9, 0.2, SampleBody.Extrusion);

        var outrigger = new Box(Si.Mm(60), Si.Mm(120), Si.Mm(5), Si.Mm(7.5), Si.Mm(5));
        yield return Arm("O-1", "Ausleger 1", new(0, 0, 2.5), new(1, 0.2, 0.25), outrigger, 2, 4, 0.8, -3, 0.6, SampleBody.ProfileSet);
        yield return Arm("O-2", "Ausleger 2", new(0, 0, 2.5), new(-1, 0.2, 0.25), outrigger, 2, -3, 0.5, -2, 0.3, SampleBody.ProfileSet);
        yield return Arm("O-3", "Ausleger 3, Radien unbekannt", new(0, 0, 2.5), new(0.1, -1, 0.3), new Box(Si.Mm(50), Si.Mm(90), Si.Mm(4)), 1.5, 2, 0.3, -1.8, 0.2, SampleBody.ProfileSet);
    }

    private static ImmutableArray<SampleSituation> Both(ImmutableArray<ForceStation> g, ImmutableArray<ForceStation> w) =>
        [new(Service, true, Effects.Combine(1, g, 1, w)), new(Design, false, Effects.Combine(1.35, g, 1.5, w))];

    // Axes given in the analysis model's frame, in project coordinates.
    private static MemberAxes From(Vector3 origin, Vector3 along, Vector3 towardsZ) =>
        MemberAxes.From(s_foot.Point(origin), s_foot.Direction(along), s_foot.Direction(towardsZ))!;

    private static Tube TubeMm(double diameterMm, double wallMm) => new(Si.Mm(diameterMm / 2), Si.Mm(wallMm));

    private const string Prose = """
        # mast-stays.ifc

        The signal mast of a cable-ferry landing with its stays, spreaders and outriggers, IFC4X3_ADD2, metre, newton, pascal, newton metre. Everything in it is
        invented for demonstration.

        What it shows:

        - an analysis model whose shared placement is moved to (120 m, 45 m, 3.2 m) and turned by 30° about the vertical; results are flagged GLOBAL_COORDS: their
          components follow the axes of that placement and must be turned into each inclined member's own;
        - results of two load combinations: `GZG: G + W` (purpose SLS, service) and `GZT: 1.35 G + 1.5 W` (purpose ULS, design);
        - stays as solid round bars, by extrusion and by swept disk; outriggers whose section comes from a material profile set usage;
        - `Mastschaft oben`, compressed beyond 4 % of its Euler load, is not checked; `Mastschaft unten` stays below that share.
        """;
}
