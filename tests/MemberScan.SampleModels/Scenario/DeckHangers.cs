using System.Collections.Immutable;
using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Scenario;

/// <summary>Hanger rods and trapeze struts under the landing's deck; forces in a table beside the model.</summary>
public static class DeckHangers
{
    /// <summary>File name without extension.</summary>
    public const string Name = "deck-hangers";

    private const string Service = "D + L";
    private const string Design = "1.2 D + 1.6 L";

    // Yields of ASTM grades from memory: A36 36 ksi, A53 Grade B 35 ksi, A500 Grade B round 42 ksi (the smaller of its two). E = 29 000 ksi.
    private static readonly SampleMaterial s_a36 = new("ASTM A36", Si.Ksi(36), Si.Ksi(29000), InProperties: false);
    private static readonly SampleMaterial s_a53 = new("A53 Gr. B", Si.Ksi(35), Si.Ksi(29000), InProperties: false);
    private static readonly SampleMaterial s_a500 = new("A500 Gr. B", Si.Ksi(42), Si.Ksi(29000), InProperties: false);
    private static readonly SampleMaterial s_rod50 = new("Rod steel, 50 ksi", Si.Ksi(50), Si.Ksi(29000), InProperties: true);
    private static readonly SampleMaterial s_steel = new("Steel", null, null, InProperties: false);

    /// <summary>Writes the sample.</summary>
    public static SampleModel Write()
    {
        var builder = new LandingBuilder(new ModelWriter(SchemaVersion.Ifc2X3, ModelUnits.InchKip, Name), Name, Transform3.Identity, resultsInGlobalAxes: false);
        int[] hangers = [.. Hangers().Select(builder.Add)];
        foreach (var strut in Struts()) builder.Add(strut);
        builder.Writer.PropertySet("Pset_LandingHanger", hangers,
            ("Line", Spelling.Typed("IFCLABEL", Spelling.Text("Deck edge \"upstream\" – Größe M"))),
            ("Spacing", Spelling.Typed("IFCLENGTHMEASURE", builder.Writer.Units.LengthText(Si.In(60)))),
            ("Galvanized", Spelling.Typed("IFCBOOLEAN", Spelling.Boolean(true))),
            ("Pieces", Spelling.Typed("IFCINTEGER", Spelling.Integer(2))));
        return builder.Build(ForcesTableText(builder.Members), DescriptionPage.Write(Prose, builder.Members));
    }

    private static IEnumerable<SampleMember> Hangers()
    {
        SampleMember Hanger(int number, string name, double diameterIn, double lengthIn, double deadKip, double liveKip,
            double sideKip = 0, string keyword = "IFCMEMBER", SampleMaterial? material = null, SampleBody body = SampleBody.Extrusion) => new()
            {
                Name = name,
                Tag = $"HR-{number:00}",
                Keyword = keyword,
                Section = new Round(Si.In(diameterIn / 2)),
                Material = material ?? s_a36,
                Axes = Axes(new(Si.In(60 * number), 0, 0), -Vector3.UnitZ, Vector3.UnitX),
                Length = Si.In(lengthIn),
                Body = body,
                Situations = Both(Effects.Cantilever(Si.In(lengthIn), Kip(deadKip)), Effects.Cantilever(Si.In(lengthIn), Kip(liveKip), 0, Kip(sideKip))),
            };
        yield return Hanger(1, "Hanger rod 1", 0.75, 48, 0.8, 2);
        yield return Hanger(2, "Hanger rod 2, pushed sideways", 1, 36, 1.2, 2.8, 0.01);
        yield return Hanger(3, "Hanger rod 3 (吊桿)", 0.625, 48, 0.5, 1, keyword: "IFCBUILDINGELEMENTPROXY");
        yield return Hanger(4, "Hanger rod 4", 0.5, 48, 1.5, 3.5, keyword: "IFCBUILDINGELEMENTPROXY");
        yield return Hanger(5, "Hanger rod 5", 0.75, 30, 1.5, 3.5, keyword: "IFCDISCRETEACCESSORY", material: s_rod50);
        yield return Hanger(6, "Hanger rod 6", 0.75, 48, 0.8, 1.6, body: SampleBody.Mapped);
        yield return Hanger(7, "Hanger rod 7", 0.75, 48, 0.8, 2.4, body: SampleBody.Mapped);
        yield return Hanger(8, "Hanger rod 8, no forces", 0.5, 48, 0, 0, keyword: "IFCDISCRETEACCESSORY") with { Situations = [] };
    }

    private static IEnumerable<SampleMember> Struts()
    {
        SampleMember Strut(int number, string name, CrossSection section, SampleMaterial material, double lengthIn, double deadKipPerIn, double liveKipPerIn,
            double sideKipPerIn = 0, double axialKip = 0, string keyword = "IFCMEMBER") => new()
            {
                Name = name,
                Tag = $"TS-{number:00}",
                Keyword = keyword,
                Section = section,
                Material = material,
                Axes = Axes(new(Si.In(60 * number), 0, Si.In(-48)), Vector3.UnitY, Vector3.UnitZ),
                Length = Si.In(lengthIn),
                Situations = Both(
                    Effects.SimpleSpan(Si.In(lengthIn), 5, qz: -KipPerIn(deadKipPerIn)),
                    Effects.SimpleSpan(Si.In(lengthIn), 5, KipPerIn(sideKipPerIn), -KipPerIn(liveKipPerIn), Kip(axialKip))),
            };
        yield return Strut(1, "Trapeze strut 1", TubeIn(1.9, 0.145), s_a53, 60, 0.003, 0.005);
        yield return Strut(2, "Trapeze strut 2", TubeIn(2.375, 0.154), s_a53, 72, 0.003, 0.006, 0.002, 0.5);
        yield return Strut(3, "Trapeze strut 3", BoxIn(2, 2, 0.116, 0.232, 0.116), s_a500, 60, 0.006, 0.010, 0.003);
        yield return Strut(4, "Trapeze strut 4, radii not given", BoxIn(2, 3, 0.125, 0, 0), s_a500, 60, 0.010, 0.016);
        yield return Strut(5, "Trapeze strut 5", BoxIn(2, 2, 0.116, 0.232, 0.116), s_a500, 60, 0.012, 0.020);
        yield return Strut(6, "Trapeze strut 6, 'Steel'", TubeIn(1.9, 0.145), s_steel, 60, 0.003, 0.005);
        yield return Strut(7, "Trapeze strut 7, compressed", TubeIn(1.66, 0.14), s_a53, 72, 0.001, 0.001, axialKip: -3);
        yield return Strut(8, "Cross bar", new Rectangle(Si.In(0.5), Si.In(3)), s_a36, 48, 0.006, 0.014, keyword: "IFCBEAM");
    }

    private static ImmutableArray<byte> ForcesTableText(IEnumerable<SampleMember> members)
    {
        var text = new StringBuilder("# Deck hangers: section forces in each member's own axes; every other member by GlobalId, the rest by Tag.\n# convention: positive-face\n");
        text.Append(ForcesRows.Header("in", "kip", "kip·in")).Append('\n');
        foreach (var (member, i) in members.Select((m, i) => (m, i)))
            text.Append(ForcesRows.Of(member, i % 2 == 0 ? member.Key : member.Tag!, Si.Inch, Si.Kip, Si.Kip * Si.Inch));
        return [.. Encoding.UTF8.GetBytes(text.ToString())];
    }

    private static ImmutableArray<SampleSituation> Both(ImmutableArray<ForceStation> d, ImmutableArray<ForceStation> l) =>
        [new(Service, true, Effects.Combine(1, d, 1, l)), new(Design, false, Effects.Combine(1.2, d, 1.6, l))];

    private static MemberAxes Axes(Vector3 origin, Vector3 along, Vector3 towardsZ) => MemberAxes.From(origin, along, towardsZ)!;

    private static double Kip(double kips) => kips * Si.Kip;

    private static double KipPerIn(double kipsPerInch) => kipsPerInch * Si.Kip / Si.Inch;

    private static Tube TubeIn(double diameterIn, double wallIn) => new(Si.In(diameterIn / 2), Si.In(wallIn));

    private static Box BoxIn(double widthIn, double depthIn, double wallIn, double outerIn, double innerIn) =>
        new(Si.In(widthIn), Si.In(depthIn), Si.In(wallIn), Si.In(outerIn), Si.In(innerIn));

    private const string Prose = """
        # deck-hangers.ifc

        Hanger rods and trapeze struts under the deck of a cable-ferry landing, IFC2X3, inch, kip, ksi, kip inch. Everything in it is invented for demonstration.

        What it shows:

        - the older schema: owner history on every rooted instance, yield strength in IfcMechanicalSteelMaterialProperties (`Rod steel, 50 ksi`) or by the grade's name
          (`ASTM A36` 36 ksi, `A53 Gr. B` 35 ksi, `A500 Gr. B` 42 ksi: from memory);
        - rods as members, proxies and discrete accessories, some as mapped items; tubes, boxes with and without corner radii, a flat cross bar;
        - forces in `deck-hangers.forces.csv` beside it (`--forces deck-hangers.forces.csv`), in kip and inches, for every other member by GlobalId, for the rest by Tag;
          situations `D + L` (service) and `1.2 D + 1.6 L` (design);
        - what cannot be checked: `Hanger rod 8, no forces`, `Trapeze strut 6, 'Steel'` (no strength), `Trapeze strut 7, compressed` (beyond 4 % of its Euler load).
        """;
}
