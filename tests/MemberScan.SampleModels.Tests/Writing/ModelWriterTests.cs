using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.SampleModels.Tests.Writing;

/// <summary>Everything that the writer offers, in each schema and unit system, against the attribute tables of the published schemas.</summary>
public sealed class ModelWriterTests
{
    private static readonly (string Name, ModelUnits Units)[] s_units =
    [
        ("mm N", ModelUnits.MillimetreNewton), ("mm kN", ModelUnits.MillimetreKilonewton), ("m N", ModelUnits.MetreNewton),
        ("in kip", ModelUnits.InchKip), ("in lbf", ModelUnits.InchPound), ("ft lbf", ModelUnits.FootPound),
    ];

    public static TheoryData<SchemaVersion, string> SchemasAndUnits
    {
        get
        {
            var data = new TheoryData<SchemaVersion, string>();
            foreach (var schema in Enum.GetValues<SchemaVersion>())
                foreach (var (name, _) in s_units) data.Add(schema, name);
            return data;
        }
    }

    [Theory]
    [MemberData(nameof(SchemasAndUnits))]
    public void What_is_written_fits_the_schema(SchemaVersion schema, string units)
    {
        var file = new WrittenFile(Everything(schema, UnitsNamed(units)));

        var faults = SchemaTable.Of(file.Schema).Faults(file);

        Assert.Empty(faults);
        Assert.True(file.Instances.Count > 120);
    }

    [Theory]
    [MemberData(nameof(SchemasAndUnits))]
    public void A_length_a_force_a_stress_and_a_modulus_come_back_by_the_units_that_the_file_names(SchemaVersion schema, string units)
    {
        var file = new WrittenFile(Everything(schema, UnitsNamed(units)));

        var radius = WrittenFile.Number(file.Of("IFCCIRCLEPROFILEDEF").First().Parameters[3]) * Factor(file, "LENGTHUNIT");
        var force = file.Of("IFCSTRUCTURALLOADSINGLEFORCE").First().Parameters;
        var newtons = WrittenFile.Number(force[1]) * Factor(file, "FORCEUNIT");
        var newtonMetres = WrittenFile.Number(force[5]) * Factor(file, "TORQUEUNIT");
        var yield = MaterialValue(file, "YieldStress", 6) * Factor(file, "PRESSUREUNIT");
        var modulus = MaterialValue(file, "YoungModulus", 2) * Factor(file, "MODULUSOFELASTICITYUNIT");

        Assert.Equal(0.0125, radius, 1e-12);
        Assert.Equal(-12345.6, newtons, 1e-6);
        Assert.Equal(789.5, newtonMetres, 1e-7);
        Assert.Equal(1, yield / 235e6, 1e-11);
        Assert.Equal(1, modulus / 210e9, 1e-11);
    }

    [Theory]
    [InlineData("FORCEUNIT")]
    [InlineData("TORQUEUNIT")]
    [InlineData("PRESSUREUNIT")]
    [InlineData("LENGTHUNIT")]
    public void A_unit_type_can_be_left_out(string unitType)
    {
        var model = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, "left-out", unitType);

        var file = new WrittenFile(model.Build());

        var assignment = WrittenFile.List(Assert.Single(file.Of("IFCUNITASSIGNMENT")).Parameters[0]);
        Assert.Equal(7, assignment.Length);
        Assert.DoesNotContain(assignment, unit => file.At(unit)[1] == $".{unitType}.");
    }

    [Fact]
    public void An_unknown_unit_type_to_leave_out_is_refused()
    {
        Assert.Throws<ArgumentException>(() => new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, "left-out", "FORCEUNITS"));
    }

    [Fact]
    public void The_same_calls_give_the_same_bytes()
    {
        var one = Everything(SchemaVersion.Ifc4X3, ModelUnits.InchKip);
        var other = Everything(SchemaVersion.Ifc4X3, ModelUnits.InchKip);

        Assert.Equal(one, other);
    }

    [Fact]
    public void Two_instances_of_one_class_with_one_key_are_refused()
    {
        var model = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MetreNewton, "twice");
        model.Element("IFCMEMBER", "Post", null, null);

        Assert.Throws<ArgumentException>(() => model.Element("IFCMEMBER", "Post", null, null));
    }

    [Fact]
    public void A_name_can_be_written_malformed()
    {
        var model = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MetreNewton, "malformed");
        model.Element("IFCMEMBER", "Post", null, null, new ElementOptions { NameSpelling = @"'\X2\00G4'" });

        var file = new WrittenFile(model.Build());

        Assert.Equal(@"'\X2\00G4'", Assert.Single(file.Of("IFCMEMBER")).Parameters[2]);
    }

    private static ModelUnits UnitsNamed(string name) => s_units.Single(u => u.Name == name).Units;

    private static double Factor(WrittenFile file, string unitType) =>
        FactorOf(file, WrittenFile.List(file.Of("IFCUNITASSIGNMENT").Single().Parameters[0]).Single(unit => file.At(unit)[1] == $".{unitType}."));

    // The rules of the standard's text: prefix times base, conversion factor times its unit, product of powers.
    private static double FactorOf(WrittenFile file, string unit)
    {
        var (keyword, p) = file.Instances[WrittenFile.Id(unit)];
        if (keyword == "IFCSIUNIT") return p[2] switch { "$" => 1, ".MILLI." => 1e-3, ".KILO." => 1e3, ".MEGA." => 1e6, _ => throw new InvalidOperationException(p[2]) };
        if (keyword == "IFCCONVERSIONBASEDUNIT")
        {
            var measure = file.At(p[3]);
            return WrittenFile.Number(measure[0].Split('(')[1].TrimEnd(')')) * FactorOf(file, measure[1]);
        }

        Assert.Equal("IFCDERIVEDUNIT", keyword);
        return WrittenFile.List(p[0]).Select(file.At).Aggregate(1.0, (product, e) => product * Math.Pow(FactorOf(file, e[0]), WrittenFile.Number(e[1])));
    }

    private static double MaterialValue(WrittenFile file, string property, int oldPosition)
    {
        if (file.Schema == "IFC2X3") return WrittenFile.Number(file.Of("IFCMECHANICALSTEELMATERIALPROPERTIES").First().Parameters[oldPosition]);
        var value = file.Of("IFCPROPERTYSINGLEVALUE").First(p => p.Parameters[0] == $"'{property}'").Parameters[2];
        return WrittenFile.Number(value.Split('(')[1].TrimEnd(')'));
    }

    private static byte[] Everything(SchemaVersion schema, ModelUnits units)
    {
        var old = schema == SchemaVersion.Ifc2X3;
        var model = new ModelWriter(schema, units, "everything");
        var steel = model.Materials.Material("S235JR", 235e6, 360e6, 210e9, 0.3, "steel");
        model.Materials.Material("Stahl");
        CrossSection[] sections =
        [
            new Round(0.0125), new Tube(0.02415, 0.0032), new Rectangle(0.012, 0.06), new RoundedRectangle(0.06, 0.04, 0.008),
            new Box(0.04, 0.06, 0.004), new Box(0.04, 0.06, 0.004, 0.008, 0.004),
        ];
        int[] profiles = [.. sections.Select(s => model.Profiles.Of(s, s.Designation)), model.Profiles.IShape(0.1, 0.1, 0.006, 0.01, 0.012, "I"), model.Profiles.IShape(0.1, 0.2, 0.006, 0.01)];

        string[] keywords = ["IFCMEMBER", "IFCBEAM", "IFCCOLUMN", "IFCPLATE", "IFCDISCRETEACCESSORY", "IFCBUILDINGELEMENTPROXY", "IFCMECHANICALFASTENER", "IFCFLOWSEGMENT"];
        int[] elements = [.. keywords.Zip(profiles, (keyword, profile) => model.Element(keyword, "Körper 'x' " + keyword,
            model.LocalPlacement(new Transform3(new(1, 2, 3), new(0, 1, 0), new(0, 0, 1), new(1, 0, 0))),
            model.Bodies.Shape("SweptSolid", model.Bodies.Extrusion(profile, 1.5)), new ElementOptions { Tag = keyword[3..], ObjectType = "bar" }))];
        model.Associate(steel, elements);

        var map = model.Bodies.Map(model.Bodies.Representation("SweptSolid", model.Bodies.Extrusion(profiles[0], 1)));
        var mapped = model.Element("IFCMEMBER", "mapped", model.LocalPlacement(Transform3.Identity),
            model.Bodies.Shape("MappedRepresentation", model.Bodies.MappedItem(map), model.Bodies.MappedItem(map, new Transform3(new(0, 1, 0), -Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ), 2)));
        model.TypeObject("IFCMEMBERTYPE", "post type", "POST", map, [mapped]);
        var disks = model.Bodies.Shape("AdvancedSweptSolid",
            model.Bodies.SweptDisk([Vector3.Zero, new(1, 0, 0), new(1, 0, 1)], 0.02, 0.017), model.Bodies.SweptDisk([new(0, 0, 0), new(0, 0, 1)], 0.01));
        var railing = model.Element("IFCRAILING", "Geländer 手摺 🚢", model.LocalPlacement(Transform3.Identity), disks, new ElementOptions { PredefinedType = "GUARDRAIL" });
        var part = model.Element("IFCMEMBER", "block", model.LocalPlacement(Transform3.Identity), model.Bodies.Shape("Brep", model.Bodies.FacetedBlock(0.1, 0.2, 0.3)), new ElementOptions { IsContained = false });
        var whole = model.Element("IFCELEMENTASSEMBLY", "whole", null, null);
        model.Aggregate(whole, part);
        model.PropertySet("Pset_MemberCommon", [elements[0], mapped], ("Span", Spelling.Typed("IFCPOSITIVELENGTHMEASURE", units.LengthText(1.5))), ("Reference", Spelling.Typed("IFCIDENTIFIER", "'P1'")));

        var analysis = model.StartAnalysis("analysis", new Transform3(new(10, 0, 0), new(0, 1, 0), new(-1, 0, 0), new(0, 0, 1)));
        var (g, q, lone) = (analysis.LoadCase("G", "PERMANENT_G", "DEAD_LOAD_G"), analysis.LoadCase("Q"), analysis.LoadCase("W"));
        analysis.ListOnTop(lone);
        var results = analysis.ResultGroup("R1", analysis.LoadCombination("CO1", "ULS", (g, 1.35), (q, 1.5)));
        var member = analysis.CurveMember("M1", Vector3.Zero, new(1.5, 0, 0), Vector3.UnitZ);
        var node = analysis.PointConnection("N1", Vector3.Zero, [true, true, true, true, false, false]);
        analysis.PointConnection("N2", new(1.5, 0, 0));
        analysis.Connect(member, node);
        analysis.Link(elements[0], member);
        var forces = new SectionForces(-12345.6, 100, 200, 300, 789.5, 500);
        analysis.PointReaction(member, results, forces, new(0.75, 0, 0));
        analysis.PointReaction(node, results, forces, inGlobalAxes: true);
        if (!old)
        {
            model.Associate(model.Materials.ProfileSetUsage(model.Materials.ProfileSet("set", steel, profiles[1])), member);
            analysis.CurveReaction(member, results, [new(0, forces), new(1.5, forces)]);
            analysis.CurveReaction(member, results, [new(0, forces), new(0.7, forces), new(1.5, forces)], inGlobalAxes: true);
            analysis.CurveReaction(member, results, [new(0, forces)], predefinedType: "CONST");
            analysis.CurveReaction(member, null, [new(0, forces), new(1.5, forces)], predefinedType: "EQUIDISTANT", omitted: ["T", "Vy"]);
        }

        return model.Build();
    }
}
