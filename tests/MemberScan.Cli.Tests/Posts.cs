using System.Globalization;
using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;
using MemberScan.SampleModels.Units;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Cli.Tests;

/// <summary>Models of gangway posts with tags P-1, P-2 and so on, and a forces table for them.</summary>
internal static class Posts
{
    private const string Header = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\n";

    /// <summary>Within its limit: CHS 48.3×3.2 under 0.5 kNm, 104 of 140.7 MPa.</summary>
    public const double Fine = 500;

    /// <summary>Over it: 146 of 140.7 MPa.</summary>
    public const double Over = 700;

    /// <summary>No row in the table: not checked.</summary>
    public const double Unknown = 0;

    /// <summary>A model with one post for each moment at its foot [N·m], and the table of these moments.</summary>
    public static (byte[] Model, string Table) Under(params double[] moments)
    {
        var writer = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, "posts");
        var table = new StringBuilder(Header);
        for (var i = 1; i <= moments.Length; i++)
        {
            Add(writer, i, new Tube(24.15e-3, 3.2e-3));
            if (moments[i - 1] is var m and not Unknown)
                table.Append(CultureInfo.InvariantCulture, $"P-{i},D + L,service,0,0,0,{m},0,{-m},0\nP-{i},D + L,service,1,0,0,{m},0,0,0\n");
        }

        return (writer.Build(), table.Length > Header.Length ? table.ToString() : Header + "P-1,D + L,service,0,0,0,0,0,0,0\n");
    }

    /// <summary>Many posts, each with a section of its own, all under small forces.</summary>
    public static (byte[] Model, string Table) Many(int count)
    {
        var writer = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, "posts");
        var table = new StringBuilder(Header);
        for (var i = 1; i <= count; i++)
        {
            Add(writer, i, new Rectangle(20e-3 + 1e-6 * i, 60e-3 - 2e-6 * i));
            table.Append(CultureInfo.InvariantCulture, $"P-{i},D + L,service,0,100,20,{i % 50},5,{-(i % 50)},20\nP-{i},D + L,service,1,100,20,{i % 50},5,0,0\n");
        }

        return (writer.Build(), table.ToString());
    }

    /// <summary>A model of one post of a tube with a wall [m], whose GlobalId derives from a key.</summary>
    public static byte[] One(double wall, string key = "P-1", string name = "Gangway post", string grade = "S235JR")
    {
        var writer = new ModelWriter(SchemaVersion.Ifc4, ModelUnits.MillimetreNewton, "posts");
        var shape = writer.Bodies.Shape("SweptSolid", writer.Bodies.Extrusion(writer.Profiles.Of(new Tube(24.15e-3, wall)), 1));
        var post = writer.Element("IFCMEMBER", name, writer.LocalPlacement(Transform3.Identity), shape, new ElementOptions { Key = key, Tag = "P-1" });
        writer.Associate(writer.Materials.Material(grade), post);
        return writer.Build();
    }

    private static void Add(ModelWriter writer, int number, CrossSection section)
    {
        var tag = string.Create(CultureInfo.InvariantCulture, $"P-{number}");
        var shape = writer.Bodies.Shape("SweptSolid", writer.Bodies.Extrusion(writer.Profiles.Of(section), 1));
        var post = writer.Element("IFCMEMBER", "Gangway post " + tag, writer.LocalPlacement(Transform3.Identity), shape, new ElementOptions { Key = tag, Tag = tag });
        writer.Associate(writer.Materials.Material("S235JR"), post);
    }
}
