using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Screening.Tests;

/// <summary>One rail post, pipe 1 1/2 Sch 40 (OD 1.900 in, wall 0.145 in, ASME B36.10, from memory), 42 in high, 200 lbf at its top (ASCE 7, 4.5.1, from memory).</summary>
public sealed class UnitsTests
{
    private static readonly double s_height = Si.In(42);
    private static readonly Tube s_pipe = new(Si.In(0.95), Si.In(0.145));

    // M/W by hand in inches and pounds: W = π(D⁴ − d⁴)/(32·D) = 0.3262 in³, 200·42/0.3262 = 25.75 ksi.
    private static readonly double s_stressKsi = 200 * 42 / (Math.PI * (Math.Pow(1.9, 4) - Math.Pow(1.61, 4)) / (32 * 1.9)) / 1000;

    public static TheoryData<string, SchemaVersion> Files
    {
        get
        {
            var files = new TheoryData<string, SchemaVersion>();
            foreach (var units in new[] { "mm-N-MPa", "m-N-Pa", "ft-lbf-psi", "in-kip-ksi" })
                foreach (var schema in Enum.GetValues<SchemaVersion>())
                    files.Add(units, schema);
            return files;
        }
    }

    [Theory]
    [MemberData(nameof(Files))]
    public void The_post_has_the_same_stress_in_every_unit_and_schema(string units, SchemaVersion schema)
    {
        var (file, table) = units switch
        {
            "mm-N-MPa" => (ModelUnits.MillimetreNewton, Table("mm", 1e-3, "N", 1, "N·mm", 1e-3)),
            "m-N-Pa" => (ModelUnits.MetreNewton, Table("m", 1, "N", 1, "Nm", 1)),
            "ft-lbf-psi" => (ModelUnits.FootPound, Table("ft", Si.Foot, "lbf", Si.PoundForce, "lbf·ft", Si.PoundForce * Si.Foot)),
            _ => (ModelUnits.InchKip, Table("in", Si.Inch, "kip", Si.Kip, "kip·in", Si.Kip * Si.Inch)),
        };
        var byTable = schema == SchemaVersion.Ifc2X3;

        var member = Landing.ScreenOne(Model(schema, file, withResults: !byTable), byTable ? table : null);

        Assert.Equal(25.75, s_stressKsi, 0.005);
        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(1, member.Governing!.Stress / Si.Ksi(s_stressKsi), 1e-6);
        Assert.Equal(1, member.Governing.Utilization / (s_stressKsi * 1.67 / 50), 1e-6);
        Assert.Equal(1, member.Length!.Value / s_height, 1e-9);
        Assert.Equal(0, member.Governing.Station, 1e-9);
    }

    private static byte[] Model(SchemaVersion schema, ModelUnits units, bool withResults)
    {
        var writer = new ModelWriter(schema, units, "landing");
        var post = writer.Element("IFCMEMBER", "Gangway post", writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, s_pipe, s_height), new ElementOptions { Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("Pipe steel", yield: Si.Ksi(50), modulus: Si.Ksi(29000)), post);
        if (!withResults) return writer.Build();

        var analysis = writer.StartAnalysis("Landing analysis", Transform3.Identity);
        var line = analysis.CurveMember("A P-1", Vector3.Zero, s_height * Vector3.UnitZ, Vector3.UnitY);
        analysis.Link(post, line);
        var loads = analysis.LoadCombination("L", "SLS", (analysis.LoadCase("Rail load"), 1));
        analysis.CurveReaction(line, analysis.ResultGroup("R", loads), [new(0, Root), new(s_height, Top)]);
        return writer.Build();
    }

    private static SectionForces Root => new(0, 0, Si.Lbf(200), 0, -Si.LbfIn(200 * 42), 0);

    private static SectionForces Top => new(0, 0, Si.Lbf(200), 0, 0, 0);

    private static string Table(string length, double metre, string force, double newton, string moment, double newtonMetre)
    {
        string Row(double x, SectionForces f) => string.Create(CultureInfo.InvariantCulture, $"{Landing.Post},L,service,{x / metre:R},0,0,{f.Vz / newton:R},0,{f.My / newtonMetre:R},0\n");
        return $"member,situation,kind,station[{length}],N[{force}],Vy[{force}],Vz[{force}],T[{moment}],My[{moment}],Mz[{moment}]\n" + Row(0, Root) + Row(s_height, Top);
    }
}
