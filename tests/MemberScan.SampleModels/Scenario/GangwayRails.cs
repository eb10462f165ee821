using System.Collections.Immutable;
using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Scenario;

/// <summary>Guard rails of the gangway: posts, rails, infill, edge beams, a railing of several swept disks; results in the model.</summary>
public static class GangwayRails
{
    /// <summary>File name without extension.</summary>
    public const string Name = "gangway-rails";

    private const string Service = "GZG: G + Q";
    private const string Design = "GZT: 1.35 G + 1.5 Q";

    private static readonly SampleMaterial s_s235 = new("S235JR", Si.MPa(235), Si.GPa(210), InProperties: true);
    private static readonly SampleMaterial s_s355 = new("S355J2H", Si.MPa(355), Si.GPa(210), InProperties: true);
    // Over 16 mm the grades have less (EN 10025-2:2004, Table 7, and EN 10210-1:2006, from memory).
    private static readonly SampleMaterial s_thickS235 = new("S235JR, t > 16 mm", Si.MPa(225), Si.GPa(210), InProperties: true);
    private static readonly SampleMaterial s_thickS355 = new("S355J2H, t > 16 mm", Si.MPa(345), Si.GPa(210), InProperties: true);
    private static readonly SampleMaterial s_s235ByName = new("S235JRH", Si.MPa(235), Si.GPa(210), InProperties: false);
    private static readonly SampleMaterial s_nameless = new("Stahl", null, null, InProperties: false);

    private static readonly CrossSection s_tube48 = TubeMm(48.3, 3.2);
    private static readonly CrossSection s_tube42 = TubeMm(42.4, 2.6);
    private static readonly CrossSection s_tube33 = TubeMm(33.7, 2.6);

    /// <summary>Writes the sample.</summary>
    public static SampleModel Write()
    {
        var builder = new LandingBuilder(new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, Name), Name, Transform3.Identity, resultsInGlobalAxes: false);
        builder.StartAnalysis(Service, Design);
        int[] posts = [.. Posts().Select(builder.Add)];
        foreach (var member in Rails().Concat(Others())) builder.Add(member);
        builder.AddRailing("Geländer Wartehäuschen «Süd»", "GL-1", [.. RailingItems()]);
        builder.Writer.PropertySet("Pset_MemberCommon", posts,
            ("Reference", Spelling.Typed("IFCIDENTIFIER", Spelling.Text("GP-1"))),
            ("IsExternal", Spelling.Typed("IFCBOOLEAN", Spelling.Boolean(true))),
            ("LoadBearing", Spelling.Typed("IFCBOOLEAN", Spelling.Boolean(true))),
            ("Span", Spelling.Typed("IFCPOSITIVELENGTHMEASURE", builder.Writer.Units.LengthText(1.1))));
        return builder.Build(ForcesTableText(builder.Members), DescriptionPage.Write(Prose, builder.Members));
    }

    private static IEnumerable<SampleMember> Posts()
    {
        SampleMember Post(int number, string name, CrossSection section, SampleMaterial material, double height, double py, double pz, double t = 0, SampleBody body = SampleBody.Extrusion) => new()
        {
            Name = name,
            Tag = $"P-{number:00}",
            PredefinedType = "POST",
            Section = section,
            Material = material,
            Axes = Axes(new(1.5 * (number - 1), 0, 0), Vector3.UnitZ, Vector3.UnitY),
            Length = height,
            Body = body,
            Situations = Both(Effects.Cantilever(height, n: -Si.KN(0.05)), Effects.Cantilever(height, 0, Si.KN(py), Si.KN(pz), Si.KNm(t))),
        };
        yield return Post(1, "Geländerpfosten A1", s_tube48, s_s355, 1.1, 0, 0.40);
        yield return Post(2, "Geländerpfosten A2", s_tube48, s_s355, 1.1, 0, 0.75, body: SampleBody.Mapped);
        yield return Post(3, "Geländerpfosten A3", s_tube48, s_s355, 1.1, 0.20, 0.75, body: SampleBody.Mapped);
        yield return Post(4, "Geländerpfosten A4", s_tube48, s_s355, 1.1, 0, 0.60, body: SampleBody.Mapped);
        yield return Post(5, "Geländerpfosten A5 ('Nord')", s_tube48, s_s355, 1.1, 0.30, 0.60, 0.05, SampleBody.Mapped);
        yield return Post(6, "Geländerpfosten A6, Bestand", s_tube48, s_s235, 1.1, 0, 0.75);
        yield return Post(7, "Zwischenpfosten B1", s_tube42, s_s235ByName, 1.0, 0, 0.25);
        yield return Post(8, "Flachstahlpfosten B2", RectangleMm(12, 60), s_s235, 1.1, 0, 0.75);
        yield return Post(9, "Flachstahlpfosten B3", RectangleMm(10, 50), s_s235, 1.1, 0, 0.75);
        yield return Post(10, @"Pfosten \X2\00G4\X0\ Ost", s_tube42, s_s235ByName, 1.0, 0, 0.30) with { NameSpelling = @"'Pfosten \X2\00G4\X0\ Ost'" };
        yield return Post(11, "Pfosten aus 'Stahl'", s_tube42, s_nameless, 1.0, 0, 0.30);
    }

    private static IEnumerable<SampleMember> Rails()
    {
        SampleMember Rail(int number, string name, CrossSection section, double length, int stations, double qy, double qz, SampleBody body = SampleBody.Extrusion, SampleMaterial? material = null) => new()
        {
            Name = name,
            Tag = $"H-{number:00}",
            PredefinedType = "MEMBER",
            Section = section,
            Material = material ?? s_s235ByName,
            Axes = Axes(new(3.0 * (number - 1), 0.2 * number, 1.1), Vector3.UnitX, Vector3.UnitZ),
            Length = length,
            Body = body,
            Situations = Both(Effects.SimpleSpan(length, stations, qz: -Si.KN(0.04)), Effects.SimpleSpan(length, stations, Si.KN(qy), -Si.KN(qz))),
        };
        yield return Rail(1, "Handlauf Nord", s_tube48, 3.0, 5, 0.5, 0);
        yield return Rail(2, "Handlauf Süd", s_tube48, 2.0, 3, 0.5, 0.2);
        yield return Rail(3, "Handlauf 手摺", new RoundedRectangle(Si.Mm(60), Si.Mm(40), Si.Mm(8)), 2.0, 5, 0.5, 0.5, material: s_thickS235);
        yield return Rail(4, "Handlauf Kasse", s_tube42, 1.5, 5, 0.5, 0, SampleBody.SweptDisk);
        yield return Rail(5, "Knieleiste 1", s_tube33, 1.5, 3, 0.2, 0, SampleBody.SweptDisk);
        yield return Rail(6, "Knieleiste 2", s_tube33, 1.5, 3, 0.2, 0, SampleBody.SweptDisk);
        yield return Rail(7, "Knieleiste 3", TubeMm(26.9, 2.3), 1.5, 5, 0.2, 0);
        yield return Rail(8, "Fußleiste", RectangleMm(6, 100), 1.5, 3, 0.1, 0, material: s_s235);
        yield return Rail(9, "Randträger T1", new Box(Si.Mm(30), Si.Mm(50), Si.Mm(3), Si.Mm(6), Si.Mm(3)), 2.0, 5, 0.1, 0.9, material: s_s235);
        yield return Rail(10, "Randträger T2, Radien unbekannt", new Box(Si.Mm(40), Si.Mm(60), Si.Mm(4)), 2.0, 5, 0.2, 1.5, material: s_s235);
    }

    private static IEnumerable<SampleMember> Others()
    {
        SampleMember Infill(int number, double diameterMm) => new()
        {
            Name = $"Füllstab {number}",
            Tag = $"F-{number:00}",
            Section = new Round(Si.Mm(diameterMm / 2)),
            Material = s_s235,
            Axes = Axes(new(0.12 * number, 0, 0.1), Vector3.UnitZ, Vector3.UnitX),
            Length = 0.9,
            Situations = Both(Effects.SimpleSpan(0.9, 3, n: Si.KN(0.01)), Effects.SimpleSpan(0.9, 3, qz: Si.KN(0.2))),
        };
        yield return Infill(1, 12);
        yield return Infill(2, 10);
        yield return new()
        {
            Name = "Konsole K1",
            Tag = "K-01",
            Keyword = "IFCBEAM",
            PredefinedType = "BEAM",
            Section = new Box(Si.Mm(40), Si.Mm(80), Si.Mm(4), Si.Mm(8), Si.Mm(4)),
            Material = s_s235,
            Axes = Axes(new(2, 0, -0.2), Vector3.UnitY, Vector3.UnitZ),
            Length = 0.6,
            AnalysisIsTurned = true,
            Situations = Both(Effects.Cantilever(0.6, pz: -Si.KN(0.2)), Effects.Cantilever(0.6, Si.KN(1), Si.KN(0.4), -Si.KN(2.5))),
        };
        yield return new()
        {
            Name = "Kragarm Rettungsring 🚢",
            Tag = "K-02",
            Keyword = "IFCBEAM",
            Section = TubeMm(60.3, 4),
            Material = s_s235,
            Axes = Axes(new(4, 0, 0.9), Vector3.UnitY, Vector3.UnitZ),
            Length = 0.45,
            Situations = Both(Effects.Cantilever(0.45, 0, 0, -Si.KN(0.3)), Effects.Cantilever(0.45, Si.KN(2), Si.KN(0.4), -Si.KN(1.2), Si.KNm(0.15))),
        };
        yield return new()
        {
            Name = "Druckstrebe D1",
            Tag = "D-01",
            PredefinedType = "STRUT",
            Section = s_tube33,
            Material = s_s235ByName,
            Axes = Axes(new(6, 0, -1.2), new(0.6, 0, 0.8), Vector3.UnitX),
            Length = 1.8,
            Situations = Both(Effects.Cantilever(1.8, -Si.KN(1)), Effects.Cantilever(1.8, -Si.KN(7))),
        };
        yield return new()
        {
            Name = "Stützkonsole, nur Flächen",
            Tag = "K-03",
            Section = RectangleMm(40, 60),
            Material = s_s235,
            Axes = Axes(new(7, 0, -0.3), Vector3.UnitY, Vector3.UnitZ),
            Length = 0.3,
            Body = SampleBody.Brep,
            Situations = Both(Effects.Cantilever(0.3, pz: -Si.KN(0.1)), Effects.Cantilever(0.3, pz: -Si.KN(1))),
        };
        yield return new()
        {
            Name = "Zugstab Z9",
            Keyword = "IFCSTRUCTURALCURVEMEMBER",
            Section = new Round(Si.Mm(10)),
            Material = s_thickS355,
            Axes = Axes(new(9, 0, 0), new(0, 0.6, 0.8), Vector3.UnitX),
            Length = 2.5,
            Body = SampleBody.AnalyticalOnly,
            Situations = Both(Effects.Cantilever(2.5, Si.KN(4)), Effects.Cantilever(2.5, Si.KN(26))),
        };
    }

    private static IEnumerable<SampleMember> RailingItems()
    {
        yield return new()
        {
            Name = "",
            Section = s_tube48,
            Material = s_s235ByName,
            Axes = Axes(new(12, 1.4, 1.1), Vector3.UnitX, Vector3.UnitZ),
            Length = 6,
            Situations = Both(Effects.SimpleSpans(1.5, 4, 3, qz: -Si.KN(0.04)), Effects.SimpleSpans(1.5, 4, 3, qy: Si.KN(0.5))),
        };
        for (var i = 0; i < 5; i++)
        {
            var pull = i is 0 or 4 ? 0.375 : 0.75;
            yield return new()
            {
                Name = "",
                Section = s_tube48,
                Material = s_s235ByName,
                Axes = Axes(new(12 + 1.5 * i, 1.4, 0), Vector3.UnitZ, Vector3.UnitX),
                Length = 1.1,
                Situations = Both(Effects.Cantilever(1.1, -Si.KN(0.06)), Effects.Cantilever(1.1, py: -Si.KN(pull))),
            };
        }
    }

    private static ImmutableArray<byte> ForcesTableText(IEnumerable<SampleMember> members)
    {
        var text = new StringBuilder("# Gangway rails: section forces of the items of railing GL-1, in each item's own axes.\n# convention: positive-face\n");
        text.Append(ForcesRows.Header("m", "kN", "kN·m")).Append('\n');
        foreach (var item in members.Where(m => m.Body == SampleBody.RailingItem)) text.Append(ForcesRows.Of(item, item.Key, 1, 1e3, 1e3));
        return [.. Encoding.UTF8.GetBytes(text.ToString())];
    }

    private static ImmutableArray<SampleSituation> Both(ImmutableArray<ForceStation> g, ImmutableArray<ForceStation> q) =>
        [new(Service, true, Effects.Combine(1, g, 1, q)), new(Design, false, Effects.Combine(1.35, g, 1.5, q))];

    private static MemberAxes Axes(Vector3 origin, Vector3 along, Vector3 towardsZ) => MemberAxes.From(origin, along, towardsZ)!;

    private static Tube TubeMm(double diameterMm, double wallMm) => new(Si.Mm(diameterMm / 2), Si.Mm(wallMm));

    private static Rectangle RectangleMm(double widthMm, double depthMm) => new(Si.Mm(widthMm), Si.Mm(depthMm));

    private const string Prose = """
        # gangway-rails.ifc

        Guard rails on the gangway of a cable-ferry landing, IFC4, millimetre, newton, megapascal, newton millimetre. Everything in it is invented for
        demonstration: geometry, loads and results; no real structure stands behind it.

        What it shows:

        - posts as extrusions and as mapped items of one type; flat-bar posts; rails as extrusions and swept disks; rectangular tubes with and without corner
          radii; a rounded rectangle; round infill bars;
        - an analysis model with curve members linked to the elements and results of two load combinations: `GZG: G + Q` (purpose SLS, service) and
          `GZT: 1.35 G + 1.5 Q` (purpose ULS, design). Posts and brackets are cantilevers, rails simple spans under uniform load: the stations are in exact equilibrium;
        - `Konsole K1`, whose analytical axes are turned by a quarter against the profile's;
        - a railing (`GL-1`) whose body has six swept disks: six candidates. The model links no results to them: without the forces table they are NOT CHECKED,
          no-forces; with `--forces gangway-rails.forces.csv` they have the verdicts below;
        - `Zugstab Z9`, an analytical curve member without an element;
        - what cannot be checked: `Pfosten aus 'Stahl'` (no strength), `Stützkonsole, nur Flächen` (a mesh, and recognition of meshes is not asked for), `Druckstrebe D1` (compressed beyond 4 % of
          its Euler load);
        - a name with a damaged escape (`P-10`), which is kept as it stands; names with umlauts, apostrophes, CJK characters and a character outside the BMP.
        """;
}
