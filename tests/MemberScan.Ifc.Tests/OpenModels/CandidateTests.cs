using MemberScan.Mechanics.Sections;
using MemberScan.Model.Rules;
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
        { "balcony-railings-ifc2x3.ifc", "IfcBeam outline 21, IfcBeam rectangle 16", "IfcBuildingElementProxy 164" },
        { "bar-swept-disk-polygonal-ifc4.ifc", "IfcReinforcingBar length-ambiguous 1", "" },
        { "beam-i-shape-tessellated-ifc4.ifc", "IfcBeam section-not-parametric 1", "" },
        { "beam-varying-profiles-ifc4x3.ifc", "IfcBeam I profile 1, IfcBeam tube 1", "" },
        { "beams-six-profiles-ifc4.ifc", "IfcBeam I profile 2, IfcBeam L profile 2, IfcBeam T profile 2, IfcBeam U profile 2, IfcBeam box 2, IfcBeam tube 2", "" },
        {
            "carwash-steel-ifc2x3.ifc",
            "IfcBeam I profile 6, IfcBeam L profile 68, IfcBeam box 322, IfcBeam mesh-not-allowed 10, IfcBeam outline 62, IfcBeam rectangle 1134, IfcBeam round 48, IfcBeam section-not-parametric 99, IfcBeam tube 200, "
            + "IfcColumn L profile 2, IfcColumn section-not-parametric 18, IfcColumn tube 6, IfcDiscreteAccessory box 2, IfcDiscreteAccessory rectangle 11, IfcMember rectangle 228",
            "IfcDiscreteAccessory 396"
        },
        { "column-room-foot-ifc4x3.ifc", "IfcColumn section-not-parametric 1", "" },
        { "columns-on-grid-ifc4x3.ifc", "IfcBeam rectangle 10, IfcColumn rectangle 25", "" },
        { "concrete-frame-spanish-ifc2x3.ifc", "IfcBeam rectangle 18, IfcColumn I profile 4, IfcColumn rectangle 12", "IfcBuildingElementProxy 645" },
        { "drainage-pipes-ifc4x3rc3.ifc", "IfcPipeSegment tube 6", "" },
        { "house-german-ifc4.ifc", "IfcBeam mesh-not-allowed 3, IfcBeam rectangle 1, IfcMember mesh-not-allowed 42, IfcRailing mesh-not-allowed 2", "" },
        { "members-mirrored-profiles-inch-ifc4.ifc", "IfcMember I profile 2, IfcMember T profile 1, IfcMember box 1, IfcMember outline 1, IfcMember rectangle 1", "" },
        { "newlines-in-strings-inch-ifc2x3.ifc", "IfcMember outline 1", "" },
        { "rounded-rectangle-csg-ifc4.ifc", "", "" },
        { "stair-railings-ifc2x3.ifczip", "IfcRailing mesh-not-allowed 13", "IfcBuildingElementProxy 1" },
        { "steel-frame-drawn-sections-ifc2x3.ifc", "IfcBeam U profile 1, IfcBeam box 17, IfcBeam outline 25, IfcColumn outline 37, IfcColumn rectangle 5", "IfcBuildingElementProxy 4" },
        { "structural-beams-linked-ifc4.ifc", "IfcBeam I profile 2, IfcBeam L profile 2, IfcBeam T profile 2, IfcBeam U profile 2, IfcBeam box 2, IfcBeam tube 2", "IfcStructuralCurveMember 12" },
        { "structural-portal-frame-results-ifc4.ifc", "IfcStructuralCurveMember I profile 3", "" },
        { "structural-surface-member-ifc4x2.ifc", "", "" },
        { "bad-24-files-in-one-ifc2x3.ifc", "", "" },
        { "bad-double-comma-ifc4.ifc", "", "" },
        { "bad-foot-factor-ifc2x3.ifc", "", "" },
        { "bad-numbers-and-latin1-ifc4.ifc", "", "" },
        { "comments-inside-instances-ifc2x3.ifc", "", "" },
        { "strings-solidus-escapes-ifc2x3.ifc", "", "" },
    };

    // Candidates with a usable section and all candidates: as the settings are shipped, and with recognition of meshes.
    public static TheoryData<string, int, int, int, int> Shares => new()
    {
        { "balcony-railings-ifc2x3.ifc", 37, 37, 37, 37 },
        { "carwash-steel-ifc2x3.ifc", 2089, 2216, 2099, 2216 },
        { "columns-on-grid-ifc4x3.ifc", 35, 35, 35, 35 },
        { "concrete-frame-spanish-ifc2x3.ifc", 34, 34, 34, 34 },
        { "house-german-ifc4.ifc", 1, 48, 70, 70 },
        { "members-mirrored-profiles-inch-ifc4.ifc", 6, 6, 6, 6 },
        { "stair-railings-ifc2x3.ifczip", 0, 13, 187, 187 },
        { "steel-frame-drawn-sections-ifc2x3.ifc", 85, 85, 85, 85 },
    };

    [Theory]
    [MemberData(nameof(Shares))]
    public void Share_of_candidates_with_a_section_without_and_with_recognition_of_meshes(string file, int usable, int all, int usableWithMeshes, int allWithMeshes)
    {
        var plain = Read(file).Catalog.Members;
        var asked = Reading.Of(ModelContainer.Read(OpenModel.Path(file)).Bytes, new ReadingRules { RecogniseMeshes = true }).Catalog.Members;

        Assert.Equal((usable, all), (plain.Count(m => m.Section.TryGet(out _, out _)), plain.Length));
        Assert.Equal((usableWithMeshes, allWithMeshes), (asked.Count(m => m.Section.TryGet(out _, out _)), asked.Length));
    }

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

    [Fact]
    public void Lengths_agree_with_the_length_quantities_that_the_steel_job_carries()
    {
        // Quantity sets 'BaseQuantities' of the file, in mm; three walls modelled as beams carry a length of zero there.
        var reading = Reading.Of(ModelContainer.Read(OpenModel.Path("carwash-steel-ifc2x3.ifc")).Bytes, new ReadingRules { RecogniseMeshes = true });
        var lengths = LengthQuantities(reading.Model.File);

        var compared = reading.Catalog.Members.Where(m => m.ItemNumber == 0 && m.Section.TryGet(out _, out _) && lengths.ContainsKey(m.Element.StepId))
            .Select(m => (Read: Reading.Value(m.Length), Written: 1e-3 * lengths[m.Element.StepId])).ToList();

        Assert.Equal(2086, compared.Count);
        Assert.Equal(3, compared.Count(c => c.Written == 0));
        var off = compared.Where(c => c.Written > 0 && Math.Abs(c.Read - c.Written) > 1e-4 * c.Written).ToList();

        // Four bars that end in a cut: the quantity is that of the cut body, up to 9 mm of 8.3 m shorter than the sweep.
        var cut = off.FindAll(c => c.Read > c.Written);
        Assert.Equal(4, cut.Count);
        Assert.All(cut, c => Assert.InRange(c.Read - c.Written, 0.007, 0.0095));

        // Seven pipes with a bend at one end: the quantity is that of the whole pipe, beyond the straight run by bend and short leg, some three diameters (160 and 110 mm) at most.
        var bent = off.FindAll(c => c.Read < c.Written);
        Assert.Equal(7, bent.Count);
        Assert.All(bent, c => Assert.InRange(c.Written - c.Read, 0.15, 0.5));
    }

    [Theory]
    [InlineData("carwash-steel-ifc2x3.ifc", 1581)]
    [InlineData("balcony-railings-ifc2x3.ifc", 16)]
    public void Sizes_that_profiles_spell_in_their_names_are_those_read(string file, int atLeast)
    {
        // PL5*30 and Strip 30x5: the two sides in mm; BUIS65*2.5: diameter and wall; R360: diameter; L65/130/8: legs and thickness.
        var compared = 0;
        foreach (var member in Read(file).Catalog.Members)
        {
            if (!member.Section.TryGet(out var section, out _)) continue;

            var (name, shape) = (section.Value.Name, section.Value.Shape);
            var spelled = System.Text.RegularExpressions.Regex.Match(name, @"^(PL|Strip |BUIS|R|L)([0-9.]+)(?:[*x/]([0-9.]+))?(?:/([0-9.]+))?$");
            if (!spelled.Success) continue;

            double[] sizes = [.. spelled.Groups.Cast<System.Text.RegularExpressions.Group>().Skip(2).Where(g => g.Success).Select(g => double.Parse(g.Value, System.Globalization.CultureInfo.InvariantCulture))];
            double[] read = (spelled.Groups[1].Value, shape) switch
            {
                ("PL" or "Strip ", Rectangle r) => [.. new[] { r.Width, r.Depth }.Order()],
                ("BUIS", Tube t) => [2 * t.OuterRadius, t.Wall],
                ("R", Round r) => [2 * r.Radius],
                ("L", Mechanics.Profiles.OpenProfile p) when sizes.Length == 3 => [.. new[] { p.Width, p.Depth }.Order(), p.Web],
                _ => [],
            };
            if (read.Length != sizes.Length) continue;
            if (spelled.Groups[1].Value is "PL" or "Strip ") Array.Sort(sizes);
            if (spelled.Groups[1].Value == "L") Array.Sort(sizes, 0, 2);

            compared++;
            Assert.Equal(sizes, read.Select(r => Math.Round(r * 1e3, 6)));
        }

        Assert.True(compared >= atLeast, $"{compared} compared");
    }

    private static Dictionary<ulong, double> LengthQuantities(Part21File file)
    {
        var lengths = new Dictionary<ulong, double>();
        foreach (var relation in file.RecordsOf("IFCRELDEFINESBYPROPERTIES"))
        {
            if (!relation[5].TryReference(out var setId) || !file.TryFind(setId, out var set) || set.Keyword != "IFCELEMENTQUANTITY") continue;

            foreach (var item in set[5].Items)
                if (item.TryReference(out var id) && file.TryFind(id, out var quantity) && quantity.Keyword == "IFCQUANTITYLENGTH"
                    && quantity[0].TryText(out var name) && name == "Length" && quantity[3].TryReal(out var value))
                    foreach (var element in relation[4].Items)
                        if (element.TryReference(out var elementId))
                            lengths.TryAdd(elementId, value);
        }

        return lengths;
    }

    private static Reading Read(string file) => Reading.Of(ModelContainer.Read(OpenModel.Path(file)).Bytes);
}
