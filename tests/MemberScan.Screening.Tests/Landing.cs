using System.Globalization;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Part21.Containers;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests;

/// <summary>Small models of the ferry landing, mostly one post with the tag P-1, and runs over them.</summary>
internal static class Landing
{
    /// <summary>Tag of the one post.</summary>
    public const string Post = "P-1";

    /// <summary>A gangway post, 48.3 mm × 3.2 mm.</summary>
    public static Tube PostTube { get; } = new(24.15e-3, 3.2e-3);

    /// <summary>A model writer in millimetres and newtons.</summary>
    public static ModelWriter Writer(SchemaVersion schema = SchemaVersion.Ifc4, params string[] unitTypesLeftOut) =>
        new(schema, ModelUnits.MillimetreNewton, "landing", unitTypesLeftOut);

    /// <summary>An upright extrusion; z of the member is the project's y.</summary>
    public static int Shape(ModelWriter writer, CrossSection section, double length) =>
        writer.Bodies.Shape("SweptSolid", writer.Bodies.Extrusion(writer.Profiles.Of(section), length));

    /// <summary>Adds an element with a material of the given name.</summary>
    public static int Add(ModelWriter writer, int? shape, string tag = Post, string material = "S235JR", int? placement = null)
    {
        var element = writer.Element("IFCMEMBER", "Gangway post " + tag, placement ?? writer.LocalPlacement(Transform3.Identity), shape, new ElementOptions { Key = tag, Tag = tag });
        writer.Associate(writer.Materials.Material(material), element);
        return element;
    }

    /// <summary>A model of one extruded post.</summary>
    public static byte[] OnePost(CrossSection? section = null, double length = 1, string material = "S235JR")
    {
        var writer = Writer();
        Add(writer, Shape(writer, section ?? PostTube, length), material: material);
        return writer.Build();
    }

    /// <summary>A forces table in newtons and metres; each line in full precision.</summary>
    public static string Table(params (string Situation, string Kind, double Station, SectionForces Forces)[] rows) => Table("", Post, rows);

    /// <summary>A forces table of one member with directives above its header.</summary>
    public static string Table(string directives, string member, params (string Situation, string Kind, double Station, SectionForces Forces)[] rows)
    {
        var text = new StringBuilder(directives).Append("member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\n");
        foreach (var (situation, kind, x, f) in rows)
            text.Append(CultureInfo.InvariantCulture, $"{member},{situation},{kind},{x:R},{f.N:R},{f.Vy:R},{f.Vz:R},{f.T:R},{f.My:R},{f.Mz:R}\n");
        return text.ToString();
    }

    /// <summary>The same forces at both ends of a member.</summary>
    public static string Constant(SectionForces forces, double length = 1, string kind = "service", string situation = "S1") =>
        Table((situation, kind, 0, forces), (situation, kind, length, forces));

    /// <summary>A run; null when a table does not fit the model.</summary>
    public static ScreeningOutcome? Run(byte[] model, DiagnosticList diagnostics, string? settings = null, string version = "1.2.3", params string[] tables)
    {
        var inForce = settings is null ? Settings.Default : SettingsFile.Read(Encoding.UTF8.GetBytes(settings), "settings.json", diagnostics);
        var read = tables.Select((text, i) => ForcesTable.Read(Encoding.UTF8.GetBytes(text), $"forces-{i + 1}.csv", diagnostics)).ToArray();
        Assert.True(inForce is not null && read.All(t => t is not null), string.Join('\n', diagnostics.Items.Select(d => $"{d.Span} {d.Message}")));
        return Screener.Run(
            new ScreeningRequest
            {
                Model = ModelText.Of(model, "landing.ifc"),
                Settings = inForce,
                Tables = [.. read.Select(t => t!)],
                Timestamp = "2026-03-04T05:06:07Z",
                Version = version,
            },
            diagnostics, progress: null, TestContext.Current.CancellationToken);
    }

    /// <summary>The record of a run that must succeed.</summary>
    public static ScreeningRecord Screen(byte[] model, string? table = null, string? settings = null)
    {
        var diagnostics = new DiagnosticList();
        var outcome = Run(model, diagnostics, settings, tables: table is null ? [] : [table]);
        Assert.True(outcome is not null, string.Join('\n', diagnostics.Items.Select(d => $"{d.Span} {d.Message}")));
        return outcome.Record;
    }

    /// <summary>The one candidate of a run.</summary>
    public static MemberResult ScreenOne(byte[] model, string? table = null, string? settings = null) => Assert.Single(Screen(model, table, settings).Members);
}
