using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Screening.Tests;

/// <summary>One small model for each way in which a candidate can end NOT CHECKED.</summary>
public sealed class ReasonCodeTests
{
    private static readonly SectionForces s_small = new(100, 0, 0, 0, 0, 0);
    private static readonly Rectangle s_flat = new(20e-3, 50e-3);

    private sealed record Way(ReasonCode Code, byte[] Model, string? Table, string? Settings = null);

    private static Dictionary<string, Func<Way>> All { get; } = new(StringComparer.Ordinal)
    {
        ["no body and no profile"] = () => Model(ReasonCode.NoSection, w => Landing.Add(w, null)),
        ["a boundary of curved faces"] = () => Model(ReasonCode.SectionNotParametric, w => Landing.Add(w, w.Bodies.Shape("AdvancedBrep", w.Add("IFCADVANCEDBREP", "$")))),
        ["a faceted boundary that is a prism"] = () => Model(ReasonCode.MeshNotAllowed, w => Landing.Add(w, w.Bodies.Shape("Brep", w.Bodies.FacetedBlock(0.05, 0.05, 1)))),
        ["a section of two parts"] = () => Model(ReasonCode.SectionNotCovered, w => Landing.Add(w, Extruded(w, w.Outlines.Composite(w.Profiles.Rectangle(0.1, 0.01), w.Profiles.Rectangle(0.01, 0.1))))),
        ["torsion of an angle about no said line"] = () => Model(ReasonCode.ConventionUnknown, w => Landing.Add(w, Extruded(w, w.Add("IFCLSHAPEPROFILEDEF", ".AREA.", "$", "$", "80.", "60.", "8.", "$", "$", "$")))) with { Table = Landing.Constant(new(100, 0, 0, 5, 0, 0)) },
        ["a rectangle of no width"] = () => Model(ReasonCode.SectionInvalid, w => Landing.Add(w, Extruded(w, w.Profiles.Rectangle(0, 0.05)))),
        ["a wall thicker than the radius"] = () => Model(ReasonCode.WallOverRadius, w => Landing.Add(w, Extruded(w, w.Profiles.CircleHollow(0.02, 0.025)))),
        ["a material without a strength"] = () => Model(ReasonCode.NoStrength, w => Plain(w, "Steel")),
        ["no material at all"] = () => Model(ReasonCode.NoStrength, w => w.Element("IFCMEMBER", "Post", w.LocalPlacement(Transform3.Identity), Landing.Shape(w, Landing.PostTube, 1), new ElementOptions { Tag = Landing.Post })),
        ["a strength of 0.235 MPa"] = () => Model(ReasonCode.StrengthImplausible, w => WithMaterial(w, m => m.Material("Own steel", yield: 235e3))),
        ["concrete"] = () => Model(ReasonCode.MaterialNotCovered, w => Plain(w, "Concrete C30/37")),
        ["no forces in any source"] = () => Model(ReasonCode.NoForces, w => Plain(w)) with { Table = null },
        ["results that leave a component out"] = () => Results(ReasonCode.ForcesIncomplete, omitted: ["Mz"]),
        ["load cases alone"] = () => Model(ReasonCode.NoCombination, w => Plain(w)) with { Table = "# situations: load-cases\n" + Landing.Constant(s_small) },
        ["results of a load case alone"] = () => Results(ReasonCode.NoCombination, isCase: true),
        ["stations that do not reach the end"] = () => Model(ReasonCode.StationsTooCoarse, w => Plain(w)) with { Table = Landing.Constant(s_small, 0.9) },
        ["moments without the shear that makes them"] = () => Model(ReasonCode.StationsTooCoarse, w => Plain(w)) with
        {
            Table = Landing.Table(("S1", "service", 0, new(0, 0, 0, 0, 0, 0)), ("S1", "service", 1, new(0, 0, 0, 0, 100, 0))),
        },
        ["a kind that nothing tells"] = () => Model(ReasonCode.KindUnknown, w => Plain(w)) with { Table = Landing.Constant(s_small, kind: ""), Settings = """{"basis": {"service": null}}""" },
        ["a kind without a limit"] = () => Model(ReasonCode.KindWithoutLimit, w => Plain(w)) with { Table = Landing.Constant(s_small, kind: "design"), Settings = """{"basis": {"design": null}}""" },
        ["a profile set without a body"] = () => Model(ReasonCode.LengthAmbiguous, w =>
        {
            var post = w.Element("IFCMEMBER", "Post", w.LocalPlacement(Transform3.Identity), null, new ElementOptions { Tag = Landing.Post });
            w.Associate(w.Materials.ProfileSetUsage(w.Materials.ProfileSet("Tube", w.Materials.Material("S235JR"), w.Profiles.Of(Landing.PostTube))), post);
        }),
        ["an analytical axis along the member"] = () => Results(ReasonCode.AxesUnknown, section: s_flat, axis: Vector3.UnitZ),
        ["a placement along a curve under results of the model"] = () => Results(ReasonCode.PlacementNotSupported, section: s_flat, alongCurve: true),
        ["a body mapped with unequal scales"] = () => Model(ReasonCode.PlacementNotSupported, w => Landing.Add(w, Uneven(w))),
        ["moments without a unit"] = () => Results(ReasonCode.UnitMissing, leftOut: ["TORQUEUNIT"], moment: 100),
        ["forces without a unit"] = () => Results(ReasonCode.UnitMissing, leftOut: ["FORCEUNIT", "TORQUEUNIT", "LINEARFORCEUNIT", "MODULUSOFELASTICITYUNIT"]),
        ["a strength without a unit"] = () => Model(ReasonCode.UnitMissing, w => WithMaterial(w, m => m.Material("Own steel", yield: 235e6)), "PRESSUREUNIT"),
        ["dimensions without a unit"] = () => Model(ReasonCode.UnitMissing, w => Plain(w), "LENGTHUNIT", "AREAUNIT", "LINEARFORCEUNIT", "TORQUEUNIT", "MODULUSOFELASTICITYUNIT"),
        ["end forces with a station in between"] = () => Results(ReasonCode.ConventionUnknown, stations: 3) with { Settings = """{"forces": {"convention": "end-forces"}}""" },
        ["compression over 4 % of the Euler load"] = () => Model(ReasonCode.StabilityNotChecked, w => Plain(w)) with { Table = Landing.Constant(new(-10e3, 0, 0, 0, 0, 0)) },
        ["compression without a modulus"] = () => Model(ReasonCode.StabilityNotChecked, w => WithMaterial(w, m => m.Material("Own steel", yield: 235e6))) with { Table = Landing.Constant(new(-1, 0, 0, 0, 0, 0)) },
        ["a rod of two threads"] = () => Model(ReasonCode.ThreadUnknown, w => Landing.Add(w, Landing.Shape(w, new Round(6e-3), 1))) with { Settings = """{"threads": {"byMember": {"P-*": "M12 or M16"}}}""" },
        ["a compressed tube of d/t = 200"] = () => Model(ReasonCode.SlenderWall, w => Landing.Add(w, Landing.Shape(w, new Tube(0.1, 1e-3), 1))) with { Table = Landing.Constant(new(-100, 0, 0, 0, 0, 0)) },
        ["a bend of three depths"] = () => Model(ReasonCode.CheckNotEvaluated, w => Landing.Add(w, Bent(w, radius: 0.09))) with { Table = Shares(s_small) },
        ["a damaged profile"] = () => Damaged("IFCCIRCLEHOLLOWPROFILEDEF(.AREA.,$,$,24.15,3.2)", "IFCCIRCLEHOLLOWPROFILEDEF(.AREA.,$,$,24.15,3.2"),
        ["a damaged element"] = () => Damaged("'P-1',$);", "'P-1' $);"),
    };

    public static TheoryData<string> Ways => [.. All.Keys];

    [Theory]
    [MemberData(nameof(Ways))]
    public void A_candidate_that_cannot_be_checked_says_why(string way)
    {
        var (code, model, table, settings) = All[way]();

        var member = Landing.ScreenOne(model, table, settings);

        Assert.Equal((Verdict.NotChecked, code), (member.Verdict, member.Reason!.Code));
        Assert.True(member.Reason.Message.Length > 10, member.Reason.Message);
        Assert.True(member.Reason.Code.Request().EndsWith('.'));
    }

    [Fact]
    public void Every_code_of_the_closed_list_occurs()
    {
        var occurring = All.Values.Select(way => way().Code).Distinct();

        Assert.Equal(Enum.GetValues<ReasonCode>().Order(), occurring.Order());
    }

    [Fact]
    public void A_grid_placement_does_not_bar_forces_that_are_given_in_member_axes()
    {
        var model = Results(ReasonCode.PlacementNotSupported, section: s_flat, alongCurve: true).Model;

        var member = Landing.ScreenOne(model, Landing.Constant(s_small));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Null(member.Axes);
    }

    [Fact]
    public void A_bend_of_eleven_depths_bars_nothing()
    {
        var writer = Landing.Writer();
        Landing.Add(writer, Bent(writer, radius: 0.33));

        var member = Landing.ScreenOne(writer.Build(), Shares(s_small));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
    }

    [Fact]
    public void Compression_of_nearly_4_percent_of_the_Euler_load_bars_nothing_and_says_its_share()
    {
        // CHS 48.3×3.2: I = 11.6 cm⁴ (EN 10219-2). Ncr = π²·210e9·11.586e-8/2² = 60.03 kN for Lcr = 2 m; 4 % is 2.401 kN.
        var within = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(-2390, 0, 0, 0, 0, 0)));
        var beyond = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new(-2410, 0, 0, 0, 0, 0)));

        Assert.Equal(Verdict.WithinLimit, within.Verdict);
        Assert.Contains(within.Notes, n => n.Contains("3.98 % of the Euler load", StringComparison.Ordinal));
        Assert.Equal(ReasonCode.StabilityNotChecked, beyond.Reason!.Code);
    }

    private static Way Model(ReasonCode code, Action<ModelWriter> write, params string[] unitTypesLeftOut)
    {
        var writer = Landing.Writer(SchemaVersion.Ifc4, unitTypesLeftOut);
        write(writer);
        return new Way(code, writer.Build(), Landing.Constant(s_small));
    }

    private static void Plain(ModelWriter writer, string material = "S235JR") => Landing.Add(writer, Landing.Shape(writer, Landing.PostTube, 1), material: material);

    private static void WithMaterial(ModelWriter writer, Func<MaterialWriter, int> material)
    {
        var post = writer.Element("IFCMEMBER", "Post", writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, Landing.PostTube, 1), new ElementOptions { Tag = Landing.Post });
        writer.Associate(material(writer.Materials), post);
    }

    private static int Extruded(ModelWriter writer, int profile) => writer.Bodies.Shape("SweptSolid", writer.Bodies.Extrusion(profile, 1));

    private static int Uneven(ModelWriter writer)
    {
        var map = writer.Bodies.Map(writer.Bodies.Representation("SweptSolid", writer.Bodies.Extrusion(writer.Profiles.Of(Landing.PostTube), 1)));
        var target = writer.Add("IFCCARTESIANTRANSFORMATIONOPERATOR3DNONUNIFORM", "$", "$", Spelling.Reference(writer.Point(Vector3.Zero)), "1.", "$", "2.", "1.");
        return writer.Bodies.Shape("MappedRepresentation", writer.Add("IFCMAPPEDITEM", Spelling.Reference(map), Spelling.Reference(target)));
    }

    // A bar of 30 mm: half a metre straight, a quarter bend, half a metre straight.
    private static int Bent(ModelWriter writer, double radius)
    {
        var mm = radius * 1000;
        var middle = mm * (1 - Math.Sqrt(0.5));
        string[] places = ["(0.,0.,0.)", $"(0.,0.,500.)", $"({Spelling.Real(middle)},0.,{Spelling.Real(500 + mm * Math.Sqrt(0.5))})", $"({Spelling.Real(mm)},0.,{Spelling.Real(500 + mm)})", $"({Spelling.Real(mm + 500)},0.,{Spelling.Real(500 + mm)})"];
        var points = writer.Add("IFCCARTESIANPOINTLIST3D", $"({string.Join(',', places)})");
        var curve = writer.Add("IFCINDEXEDPOLYCURVE", Spelling.Reference(points), "(IFCLINEINDEX((1,2)),IFCARCINDEX((2,3,4)),IFCLINEINDEX((4,5)))", ".F.");
        return writer.Bodies.Shape("AdvancedSweptSolid", writer.Add("IFCSWEPTDISKSOLID", Spelling.Reference(curve), "15.", "$", "$", "$"));
    }

    private static string Shares(SectionForces forces) => Landing.Constant(forces).Replace("station[m]", "station[%]", StringComparison.Ordinal).Replace(",1,100,", ",100,100,", StringComparison.Ordinal);

    private static Way Damaged(string sound, string damaged)
    {
        var text = Encoding.ASCII.GetString(Landing.OnePost());
        Assert.Contains(sound, text, StringComparison.Ordinal);
        return new Way(ReasonCode.DamagedRecord, Encoding.ASCII.GetBytes(text.Replace(sound, damaged, StringComparison.Ordinal)), null);
    }

    // One post of 1 m with results of one situation; all values small.
    private static Way Results(
        ReasonCode code, CrossSection? section = null, Vector3? axis = null, bool isCase = false, bool alongCurve = false, int stations = 2, double moment = 0,
        string[]? omitted = null, string[]? leftOut = null)
    {
        var writer = Landing.Writer(SchemaVersion.Ifc4, leftOut ?? []);
        int? placement = alongCurve ? writer.Add("IFCLINEARPLACEMENT", "$", "$", "$") : null;
        var post = Landing.Add(writer, Landing.Shape(writer, section ?? Landing.PostTube, 1), placement: placement);
        var analysis = writer.StartAnalysis("Landing analysis", Transform3.Identity);
        var line = analysis.CurveMember("A P-1", Vector3.Zero, Vector3.UnitZ, axis ?? Vector3.UnitY);
        analysis.Link(post, line);
        var loads = analysis.LoadCase("G", "PERMANENT_G", "DEAD_LOAD_G");
        if (!isCase) loads = analysis.LoadCombination("C1", "SLS", (loads, 1));
        ForceStation[] values = [.. Enumerable.Range(0, stations).Select(i => new ForceStation((double)i / (stations - 1), new SectionForces(100, 0, 0, 0, moment, 0)))];
        analysis.CurveReaction(line, analysis.ResultGroup("R", loads), values, omitted: omitted ?? []);
        return new Way(code, writer.Build(), null);
    }
}
