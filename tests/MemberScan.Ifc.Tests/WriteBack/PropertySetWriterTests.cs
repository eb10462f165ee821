using System.Collections.Frozen;
using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.WriteBack;
using MemberScan.Model.Rules;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.WriteBack;

public sealed class PropertySetWriterTests
{
    private static readonly string[] s_names =
    [
        "Status", "Reason", "Utilization", "Criterion", "StressLimit", "EquivalentStress", "NormalStress", "ShearStress", "EquivalentStressText", "Situation", "Station",
        "PointY", "PointZ", "PointName", "ForcesSource", "SectionSource", "ShearModel", "Item", "ItemCount", "RunId", "Program",
        "ReviewDecision", "ReviewNote",
    ];

    private static readonly string[] s_measures =
    [
        "IFCLABEL", "IFCTEXT", "IFCRATIOMEASURE", "IFCLABEL", "IFCPRESSUREMEASURE", "IFCPRESSUREMEASURE", "IFCPRESSUREMEASURE", "IFCPRESSUREMEASURE", "IFCLABEL", "IFCLABEL", "IFCLENGTHMEASURE",
        "IFCLENGTHMEASURE", "IFCLENGTHMEASURE", "IFCLABEL", "IFCLABEL", "IFCLABEL", "IFCLABEL", "IFCLABEL", "IFCINTEGER", "IFCIDENTIFIER", "IFCLABEL",
        "IFCLABEL", "IFCTEXT",
    ];

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Every_property_is_written_once_with_its_measure_and_in_order(Release release)
    {
        var (file, added) = Write(release, Full());

        var set = Assert.Single(added, r => r.Keyword == "IFCPROPERTYSET");
        var properties = set[4].Items.Select(i => Follow(file, i)).ToList();
        Assert.Equal(StressCheckSet.SetName, Text(set[2]));
        Assert.Equal(s_names, properties.Select(p => Text(p[0])));
        Assert.Equal(s_measures, properties.Select(p => p[2].TypeName));
        var relation = Assert.Single(added, r => r.Keyword == "IFCRELDEFINESBYPROPERTIES");
        Assert.Equal((7ul, set.Id), (Follow(file, Assert.Single(relation[4].Items)).Id, Follow(file, relation[5]).Id));
        Assert.Equal(release == Release.Ifc2X3 ? 2 : 4, added.Where(r => r.Keyword.StartsWith("IFCREL", StringComparison.Ordinal) || r.Keyword == "IFCPROPERTYSET").Select(r => Text(r[0])).Distinct().Count());
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Instances_fit_the_published_attribute_tables(Release release)
    {
        var (file, added) = Write(release, Full(), Full() with { ElementKey = "other", Reason = null, ItemCount = null });
        using var tables = Tables();
        var entities = tables.RootElement.GetProperty(Schemas.Header(release)).GetProperty("entities").EnumerateObject()
            .ToDictionary(e => e.Name.ToUpperInvariant(), e => e.Value.GetProperty("attributes").EnumerateArray().ToArray());

        Assert.NotEmpty(added);
        foreach (var record in added)
        {
            var attributes = entities[record.Keyword];
            var arguments = record.Arguments();
            Assert.Equal(attributes.Length, arguments.Count);
            foreach (var (attribute, argument) in attributes.Zip(arguments))
            {
                Assert.Equal(attribute.GetProperty("derived").GetBoolean(), argument.Kind == Part21ValueKind.Derived);
                if (argument.Kind == Part21ValueKind.Unset) Assert.True(attribute.GetProperty("optional").GetBoolean(), $"{record.Keyword}.{attribute.GetProperty("name")}");
                if (argument.TryReference(out var id)) Assert.True(file.TryFind(id, out _));
            }
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Stresses_and_places_are_in_the_units_of_the_model_without_an_override(Release release)
    {
        var (_, added) = Write(release, Full());

        var stress = Property(added, "EquivalentStress");
        var station = Property(added, "Station");
        Reading.AssertNear(218.9, Number(stress), 1e-12);            // the model has MPa and mm
        Reading.AssertNear(1250, Number(station), 1e-12);
        Assert.Equal((Part21ValueKind.Unset, Part21ValueKind.Unset), (stress[3].Kind, station[3].Kind));
        Assert.Equal(release == Release.Ifc2X3 ? 1 : 0, added.Count(r => r.Keyword == "IFCOWNERHISTORY"));
        Assert.DoesNotContain(added, r => r.Keyword == "IFCSIUNIT");
    }

    [Fact]
    public void Stresses_of_an_inch_and_ksi_model_are_in_ksi()
    {
        var (_, added) = Write(Release.Ifc4, FileUnits.InchKip, [], Full());

        Reading.AssertNear(218.9e6 / 6894757.293168361, Number(Property(added, "EquivalentStress")), 1e-12);
        Reading.AssertNear(1.25 / 0.0254, Number(Property(added, "Station")), 1e-12);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_unit_that_the_model_lacks_is_named_at_the_property_even_when_the_settings_have_one(Release release)
    {
        var (file, added) = Write(release, FileUnits.MillimetreNewton, ["PRESSUREUNIT"], Full());

        var stress = Property(added, "EquivalentStress");
        Reading.AssertNear(218.9, Number(stress), 1e-12);
        var unit = Follow(file, stress[3]);
        Assert.Equal("*,.PRESSUREUNIT.,.MEGA.,.PASCAL.", string.Join(',', unit.Arguments().Select(a => System.Text.Encoding.ASCII.GetString(a.Text))));
        Assert.Equal(Part21ValueKind.Unset, Property(added, "Station")[3].Kind);
    }

    [Fact]
    public void Values_that_are_not_known_are_left_out()
    {
        var (file, added) = Write(Release.Ifc4, new StressCheckSet { ElementId = 7, ElementKey = "k", Status = "NOT CHECKED", Reason = "no-forces: none", RunId = "0123456789abcdef", Program = "MemberScan 0.1.0" });

        var set = Assert.Single(added, r => r.Keyword == "IFCPROPERTYSET");
        Assert.Equal(["Status", "Reason", "RunId", "Program"], set[4].Items.Select(i => Text(Follow(file, i)[0])));
    }

    [Theory]
    [InlineData("Geländer über dem Steg")]
    [InlineData("橋の手すり")]
    [InlineData("rail 🛟 deck")]
    [InlineData("O'Neill's rail")]
    [InlineData(@"C:\landing\X\41")]
    [InlineData("tab\there\nand a new line")]
    public void Names_of_any_alphabet_come_back_and_the_lines_are_plain_ASCII(string name)
    {
        var (_, added) = Write(Release.Ifc2X3, Full() with { Situation = name, Reason = name });

        Assert.Equal(name, Text(Property(added, "Situation")[2]));
        Assert.Equal(name, Text(Property(added, "Reason")[2]));
        Assert.All(added, r => Assert.True(System.Text.Ascii.IsValid(r.Text)));
    }

    [Theory]
    [InlineData(255, "")]
    [InlineData(256, "")]
    [InlineData(400, "🛟")]
    public void Labels_are_cut_at_255_characters_and_never_within_one(int length, string filler)
    {
        var text = filler.Length == 0 ? new string('r', length) : string.Concat(Enumerable.Repeat(filler, length / 2));
        var odd = "x" + text;

        foreach (var label in new[] { text, odd })
        {
            var (_, added) = Write(Release.Ifc4, Full() with { Situation = label, Reason = label });
            var written = Text(Property(added, "Situation")[2]);

            Assert.True(written.Length <= PropertySetWriter.MaxLabel);
            Assert.Equal(label.Length > 255, written.EndsWith('…'));
            Assert.StartsWith(written.TrimEnd('…'), label, StringComparison.Ordinal);
            Assert.DoesNotContain('\uFFFD', written);
            Assert.Equal(label, Text(Property(added, "Reason")[2]));
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void The_same_input_gives_the_same_lines_in_any_culture(Release release)
    {
        var (_, expected) = Lines(release, FileUnits.MillimetreNewton, [], Full());
        var before = Thread.CurrentThread.CurrentCulture;
        try
        {
            Thread.CurrentThread.CurrentCulture = new System.Globalization.CultureInfo("de-DE");
            var (_, again) = Lines(release, FileUnits.MillimetreNewton, [], Full());

            Assert.Equal(expected, again);
        }
        finally
        {
            Thread.CurrentThread.CurrentCulture = before;
        }
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_template_explains_every_property_where_the_schema_knows_templates(Release release)
    {
        var (file, added) = Write(release, Full(), Full() with { ElementKey = "other" });

        Assert.Equal(release == Release.Ifc2X3 ? 0 : 1, added.Count(r => r.Keyword == "IFCPROPERTYSETTEMPLATE"));
        if (release == Release.Ifc2X3) return;

        var template = Assert.Single(added, r => r.Keyword == "IFCPROPERTYSETTEMPLATE");
        var properties = template[6].Items.Select(i => Follow(file, i)).ToList();
        Assert.Equal(StressCheckSet.SetName, Text(template[2]));
        Assert.Equal(s_names, properties.Select(p => Text(p[2])));
        Assert.Equal(s_measures, properties.Select(p => Text(p[5]).ToUpperInvariant()));
        var relation = Assert.Single(added, r => r.Keyword == "IFCRELDEFINESBYTEMPLATE");
        Assert.Equal(added.Where(r => r.Keyword == "IFCPROPERTYSET").Select(r => r.Id), relation[4].Items.Select(i => Follow(file, i).Id));
        Assert.Equal("IFCPROJECT", Follow(file, Assert.Single(added, r => r.Keyword == "IFCRELDECLARES")[4]).Keyword);
        Assert.All(added.Where(r => Text(r[0]).Length == 22).GroupBy(r => Text(r[0])), g => Assert.Single(g));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Results_are_read_back_in_SI(Release release)
    {
        var (file, _) = Write(release, FileUnits.InchKip, ["PRESSUREUNIT"], Full());
        var model = IfcModel.Open(file, new ReadingRules(), new DiagnosticList())!;

        var element = Assert.Single(ResultReader.Read(model));

        Assert.Equal(7ul, element.StepId);
        Assert.Equal(s_names, element.Values.Select(v => v.Name));
        Assert.Equal(s_measures, element.Values.Select(v => v.Measure));
        Reading.AssertNear(218.9e6, element.Values.Single(v => v.Name == "EquivalentStress").Number!.Value, 1e-12);
        Reading.AssertNear(1.25, element.Values.Single(v => v.Name == "Station").Number!.Value, 1e-12);
        Assert.Equal("OVERSTRESSED", element.Values[0].Text);
    }

    [Fact]
    public void No_sets_give_no_lines()
    {
        Assert.Empty(Lines(Release.Ifc2X3, FileUnits.MillimetreNewton, []).Lines);
    }

    private static StressCheckSet Full() => new()
    {
        ElementId = 7,
        ElementKey = "2O2Fr$t4X7Zf8NOew3FLOH",
        Status = "OVERSTRESSED",
        Reason = "over the elastic limit",
        Utilization = 1.14,
        Criterion = "von Mises",
        StressLimit = 192e6,
        EquivalentStress = 218.9e6,
        NormalStress = -210e6,
        ShearStress = 0,
        EquivalentStressText = "218.9 MPa",
        Situation = "CO1",
        Station = 1.25,
        PointY = 0,
        PointZ = -0.02415,
        PointName = "extreme fibre, -z",
        ForcesSource = "model",
        SectionSource = "profile",
        ShearModel = "elementary",
        Item = "2O2Fr$t4X7Zf8NOew3FLOH/2",
        ItemCount = 3,
        RunId = "0123456789abcdef",
        Program = "MemberScan 0.1.0",
        ReviewDecision = "strengthen",
        ReviewNote = "letter 4 (R. Vu, 2026-02-03)",
    };

    private static (Part21File File, List<Part21Record> Added) Write(Release release, params StressCheckSet[] sets) => Write(release, FileUnits.MillimetreNewton, [], sets);

    /// <summary>The model with the lines in it, read back, and the records that were added; nothing may be damaged or refer to nothing.</summary>
    private static (Part21File File, List<Part21Record> Added) Write(Release release, FileUnits units, string[] leftOut, params StressCheckSet[] sets)
    {
        var (model, lines) = Lines(release, units, leftOut, sets);
        var output = new System.Buffers.ArrayBufferWriter<byte>();
        ResultBlock.Write(output, model.File.Bytes.Span, model.File.InsertionOffset, lines, model.File.LineEnd);
        var diagnostics = new DiagnosticList();
        var file = Part21File.Read(output.WrittenMemory, "landing.checked.ifc", diagnostics);
        Assert.Empty(diagnostics.Items);
        var added = file.Records.Where(r => r.Id > model.File.HighestId).ToList();
        Assert.Equal(lines.Length, added.Count);
        return (file, added);
    }

    private static (IfcModel Model, ImmutableArray<string> Lines) Lines(Release release, FileUnits units, string[] leftOut, params StressCheckSet[] sets)
    {
        const bool WithTemplate = true;
        var writer = Bars.Model(release, units, leftOut);
        Bars.Add(writer, "R", Bars.Rail, 2);
        var rules = new ReadingRules { MissingUnits = leftOut.ToFrozenDictionary(type => type, _ => 1e3) };
        var model = Reading.Of(writer, rules).Model;
        return (model, PropertySetWriter.Lines(model, sets, 1768464000, "0.1.0", WithTemplate));
    }

    private static Part21Record Property(List<Part21Record> added, string name) =>
        Assert.Single(added, r => r.Keyword == "IFCPROPERTYSINGLEVALUE" && Text(r[0]) == name);

    private static Part21Record Follow(Part21File file, Part21Value value) =>
        value.TryReference(out var id) && file.TryFind(id, out var record) ? record : throw new InvalidDataException("a reference to nothing");

    private static string Text(Part21Value value) => value.TryText(out var text) ? text : "";

    private static double Number(Part21Record property) => property[2].TryReal(out var value) ? value : double.NaN;

    /// <summary>Attribute tables derived from the published EXPRESS files; skips, saying so, where they are absent.</summary>
    private static JsonDocument Tables()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            var path = Path.Combine(folder.FullName, "shared", "ifc", "attributes.json");
            if (File.Exists(path)) return JsonDocument.Parse(File.ReadAllBytes(path));
        }

        Assert.Skip("the attribute tables (shared/ifc/attributes.json) are absent");
        return null!;
    }
}
