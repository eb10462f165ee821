using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.OpenModels;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.OpenModels;

/// <summary>
/// Candidates of real files by class and by kind of section or reason. The numbers per class and per kind of body were counted by a scanner
/// that shares no code with this reader (INVENTORY.md beside the files); the rest is counted here.
/// </summary>
public sealed class CandidateTests
{
    // Candidates by class and section kind or reason; passed over by class.
    public static TheoryData<string, string, string> Golden => new()
    {
        { "balcony-railings-ifc2x3.ifc", "IfcBeam rectangle 16, IfcBeam section-not-covered 21", "IfcBuildingElementProxy 164" },
        { "bar-swept-disk-polygonal-ifc4.ifc", "IfcReinforcingBar length-ambiguous 1", "" },
        { "beam-i-shape-tessellated-ifc4.ifc", "IfcBeam section-not-parametric 1", "" },
        { "beam-varying-profiles-ifc4x3.ifc", "IfcBeam section-not-covered 1, IfcBeam tube 1", "" },
        { "beams-six-profiles-ifc4.ifc", "IfcBeam box 2, IfcBeam section-not-covered 8, IfcBeam tube 2", "" },
        {
            "carwash-steel-ifc2x3.ifc",
            "IfcBeam box 322, IfcBeam rectangle 1134, IfcBeam round 48, IfcBeam section-not-covered 136, IfcBeam section-not-parametric 109, IfcBeam tube 200, "
            + "IfcColumn section-not-covered 2, IfcColumn section-not-parametric 18, IfcColumn tube 6, IfcDiscreteAccessory box 2, IfcDiscreteAccessory rectangle 11, IfcMember rectangle 228",
            "IfcDiscreteAccessory 396"
        },
        { "column-room-foot-ifc4x3.ifc", "IfcColumn section-not-parametric 1", "" },
        { "columns-on-grid-ifc4x3.ifc", "IfcBeam rectangle 10, IfcColumn rectangle 25", "" },
        { "concrete-frame-spanish-ifc2x3.ifc", "IfcBeam rectangle 18, IfcColumn rectangle 12, IfcColumn section-not-covered 4", "IfcBuildingElementProxy 645" },
        { "drainage-pipes-ifc4x3rc3.ifc", "IfcPipeSegment tube 6", "" },
        { "house-german-ifc4.ifc", "IfcBeam rectangle 1, IfcBeam section-not-parametric 3, IfcMember section-not-parametric 42, IfcRailing section-not-parametric 2", "" },
        { "members-mirrored-profiles-inch-ifc4.ifc", "IfcMember box 1, IfcMember rectangle 1, IfcMember section-not-covered 4", "" },
        { "newlines-in-strings-inch-ifc2x3.ifc", "IfcMember section-not-covered 1", "" },
        { "rounded-rectangle-csg-ifc4.ifc", "", "" },
        { "stair-railings-ifc2x3.ifczip", "IfcRailing section-not-parametric 13", "IfcBuildingElementProxy 1" },
        { "steel-frame-drawn-sections-ifc2x3.ifc", "IfcBeam box 17, IfcBeam section-not-covered 26, IfcColumn rectangle 5, IfcColumn section-not-covered 37", "IfcBuildingElementProxy 4" },
        { "structural-beams-linked-ifc4.ifc", "IfcBeam box 2, IfcBeam section-not-covered 8, IfcBeam tube 2", "IfcStructuralCurveMember 12" },
        { "structural-portal-frame-results-ifc4.ifc", "IfcStructuralCurveMember section-not-covered 3", "" },
        { "structural-surface-member-ifc4x2.ifc", "", "" },
        { "bad-24-files-in-one-ifc2x3.ifc", "", "" },
        { "bad-double-comma-ifc4.ifc", "", "" },
        { "bad-foot-factor-ifc2x3.ifc", "", "" },
        { "bad-numbers-and-latin1-ifc4.ifc", "", "" },
        { "comments-inside-instances-ifc2x3.ifc", "", "" },
        { "strings-solidus-escapes-ifc2x3.ifc", "", "" },
    };

    // Products of the classes that are always or conditionally candidates, from INVENTORY.md, "products".
    public static TheoryData<string, string, int> Inventory => new()
    {
        { "balcony-railings-ifc2x3.ifc", "IfcBeam", 37 },
        { "balcony-railings-ifc2x3.ifc", "IfcBuildingElementProxy", 164 },
        { "carwash-steel-ifc2x3.ifc", "IfcBeam", 1949 },
        { "carwash-steel-ifc2x3.ifc", "IfcMember", 228 },
        { "carwash-steel-ifc2x3.ifc", "IfcColumn", 26 },
        { "carwash-steel-ifc2x3.ifc", "IfcDiscreteAccessory", 409 },
        { "columns-on-grid-ifc4x3.ifc", "IfcColumn", 25 },
        { "columns-on-grid-ifc4x3.ifc", "IfcBeam", 10 },
        { "concrete-frame-spanish-ifc2x3.ifc", "IfcBuildingElementProxy", 645 },
        { "concrete-frame-spanish-ifc2x3.ifc", "IfcColumn", 16 },
        { "drainage-pipes-ifc4x3rc3.ifc", "IfcPipeSegment", 6 },
        { "house-german-ifc4.ifc", "IfcMember", 42 },
        { "house-german-ifc4.ifc", "IfcRailing", 2 },
        { "house-german-ifc4.ifc", "IfcBeam", 4 },
        { "members-mirrored-profiles-inch-ifc4.ifc", "IfcMember", 6 },
        { "stair-railings-ifc2x3.ifczip", "IfcRailing", 13 },
        { "stair-railings-ifc2x3.ifczip", "IfcBuildingElementProxy", 1 },
        { "steel-frame-drawn-sections-ifc2x3.ifc", "IfcBeam", 43 },
        { "steel-frame-drawn-sections-ifc2x3.ifc", "IfcColumn", 42 },
        { "steel-frame-drawn-sections-ifc2x3.ifc", "IfcBuildingElementProxy", 4 },
        { "structural-beams-linked-ifc4.ifc", "IfcBeam", 12 },
        { "structural-beams-linked-ifc4.ifc", "IfcStructuralCurveMember", 12 },
        { "structural-portal-frame-results-ifc4.ifc", "IfcStructuralCurveMember", 3 },
    };

    [Theory]
    [MemberData(nameof(Golden))]
    public void Candidates_by_class_and_section_or_reason(string file, string candidates, string passedOver)
    {
        var catalog = Read(file).Catalog;

        var found = catalog.Members.GroupBy(m => $"{m.Element.Class} {(m.Section.TryGet(out var section, out var why) ? section.Value.Shape.Kind : why.Code.Text())}")
            .OrderBy(g => g.Key, StringComparer.Ordinal).Select(g => FormattableString.Invariant($"{g.Key} {g.Count()}"));
        Assert.Equal(candidates, string.Join(", ", found));
        Assert.Equal(passedOver, string.Join(", ", catalog.PassedOver.Select(p => FormattableString.Invariant($"{p.Class} {p.Count}"))));
    }

    [Theory]
    [MemberData(nameof(Inventory))]
    public void Every_product_of_a_candidate_class_is_a_candidate_or_counted(string file, string className, int products)
    {
        var catalog = Read(file).Catalog;

        var elements = catalog.Members.Where(m => m.Element.Class == className).Select(m => m.Element.StepId).Distinct().Count();
        Assert.Equal(products, elements + catalog.PassedOver.Where(p => p.Class == className).Sum(p => p.Count));
    }

    [Fact]
    public void Keys_are_unique_in_every_file()
    {
        OpenModel.SkipIfAbsent();

        foreach (var path in OpenModel.All)
        {
            var keys = Reading.Of(ModelContainer.Read(path).Bytes).Catalog.Members.Select(m => m.Key).ToList();
            Assert.Equal(keys.Count, keys.Distinct(StringComparer.Ordinal).Count());
        }
    }

    [Fact]
    public void Columns_placed_on_a_grid_stand_on_the_crossings_of_its_axes()
    {
        // From the file, in mm: axes '5'..'1' at y = 0, −2000, −6000, −8000, −12000, axes 'A'..'E' at x = 19000, 15000, 11000, 7000, 3000 (#115 to #268),
        // in a grid at (−17000, 16000) (#273).
        var columns = Read("columns-on-grid-ifc4x3.ifc").Catalog.Members.Where(m => m.Element.Class == "IfcColumn").Select(m => Reading.Value(m.Axes)).ToList();

        var expected = from x in new[] { 19, 15, 11, 7, 3 } from y in new[] { 0, -2, -6, -8, -12 } select (X: x - 17, Y: y + 16);
        Assert.Equal(expected.Order(), columns.Select(a => (X: (int)Math.Round(a.Origin.X), Y: (int)Math.Round(a.Origin.Y))).Order());
        Assert.All(columns, a => Near.Vector(new MemberScan.Foundation.Geometry.Vector3(Math.Round(a.Origin.X), Math.Round(a.Origin.Y), 0), a.Origin));
        Assert.All(columns, a => Near.Vector(MemberScan.Foundation.Geometry.Vector3.UnitZ, a.X));
    }

    [Fact]
    public void Axes_are_right_handed_and_of_unit_length_in_every_file()
    {
        OpenModel.SkipIfAbsent();

        foreach (var axes in OpenModel.All.SelectMany(path => Reading.Of(ModelContainer.Read(path).Bytes).Catalog.Members).Where(m => m.Axes.TryGet(out _, out _)).Select(m => Reading.Value(m.Axes)))
        {
            Near.Vector(axes.Z, axes.X.Cross(axes.Y), 1e-6);
            Assert.All(new[] { axes.X, axes.Y, axes.Z }, v => Assert.True(Math.Abs(v.Length - 1) < 1e-6));
        }
    }

    [Fact]
    public void The_pipes_of_the_drainage_model_have_the_dimensions_of_their_profiles()
    {
        // The file, in metres: outer radii and walls of IfcCircleHollowProfileDef as they stand there.
        var text = File.ReadAllText(OpenModel.Path("drainage-pipes-ifc4x3rc3.ifc"));
        var written = System.Text.RegularExpressions.Regex.Matches(text, @"IFCCIRCLEHOLLOWPROFILEDEF\(\.AREA\.,[^,]*,[^,]*,\s*([0-9.E-]+),\s*([0-9.E-]+)\)", System.Text.RegularExpressions.RegexOptions.IgnoreCase)
            .Select(m => (Radius: double.Parse(m.Groups[1].Value, null), Wall: double.Parse(m.Groups[2].Value, null))).ToHashSet();

        var tubes = Read("drainage-pipes-ifc4x3rc3.ifc").Catalog.Members.Select(Reading.Shape).Cast<Tube>().ToList();

        Assert.Equal(6, tubes.Count);
        Assert.All(tubes, t => Assert.Contains((t.OuterRadius, t.Wall), written));
    }

    [Fact]
    public void Drawn_square_hollow_sections_have_the_size_that_their_name_spells()
    {
        // "100x6.0SHS" in the file: 100 mm square, wall 6 mm; the arcs drawn there have radii 15 mm and 9 mm.
        var named = Read("steel-frame-drawn-sections-ifc2x3.ifc").Catalog.Members
            .Where(m => m.Section.TryGet(out var section, out _) && section.Value.Name == "100x6.0SHS").ToList();

        Assert.Equal(17, named.Count);
        Assert.All(named, m => Sections.ProfileReaderTests.AssertAlike(new Box(0.100, 0.100, 0.006, 0.015, 0.009), Reading.Shape(m), 1e-6));
    }

    private static Reading Read(string file) => Reading.Of(ModelContainer.Read(OpenModel.Path(file)).Bytes);
}
