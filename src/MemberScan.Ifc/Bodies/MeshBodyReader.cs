using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Meshes;
using MemberScan.Ifc.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Bodies;

/// <summary>Bars that are meshes: recognised where the settings ask for it, told to be recognisable where they do not.</summary>
internal sealed class MeshBodyReader(MeshReader meshes, bool isAllowed)
{
    /// <summary>Source of a section that is read so, in words.</summary>
    public const string SourceWord = "recognised from mesh";

    private readonly Dictionary<ulong, string> _notRecognised = [];

    /// <summary>Reads a mesh.</summary>
    /// <param name="item">The body.</param>
    /// <param name="toProject">From object to project coordinates, for the axes.</param>
    public Finding<BarBody> Read(BodyItem item, Transform3 toProject)
    {
        // What is no prism stays none however it is moved, turned or scaled as a whole.
        if (item.UniformScale is not null && _notRecognised.TryGetValue(item.Record.Id, out var known)) return NotParametric(item, known);

        if (Prism(item, toProject, out var fault) is not { } prism)
        {
            if (item.UniformScale is not null) _notRecognised[item.Record.Id] = fault;
            return NotParametric(item, fault);
        }

        var shape = prism.Section.Shapes[0];
        if (!isAllowed)
            return Missing(ReasonCode.MeshNotAllowed, string.Create(CultureInfo.InvariantCulture, $"the body {item.Called} is a mesh that could be recognised as {shape.Designation}, {prism.Length:0.###} m long; the settings do not ask for it (sections.recogniseMeshes)"));

        var start = prism.Start.After(prism.Section.Position);
        var axes = new MemberAxes(start.Origin, prism.Start.Z, start.Y.Cross(prism.Start.Z), start.Y);
        var source = string.Create(CultureInfo.InvariantCulture, $"{SourceWord} {item.Called}, largest deviation {prism.Residual * 1e3:0.####} mm");
        ImmutableArray<string> notes =
        [
            .. item.Notes, "section, length and axes are recognised from a mesh; x points upwards, or along +X or +Y of the project where the member is level",
            .. prism.IsOblique ? new[] { "its ends are cut obliquely; the length is that along the middle, the section that square to it" } : [], .. prism.Section.Notes,
        ];
        var profile = new ProfileShape(new SectionFinding(prism.Section.Shapes, "", notes), Transform3.Identity) { SourceWord = SourceWord };
        return new Finding<BarBody>.Found(
            new BarBody(profile, prism.Length, $"distance of the end faces of {item.Called}, {SourceWord}", axes, source, [], true, notes), source);
    }

    private Prism? Prism(BodyItem item, Transform3 toProject, out string fault)
    {
        if (meshes.Read(item.Record, out fault) is not { } mesh) return null;

        var moved = mesh with { Points = [.. mesh.Points.Select(item.Map.Point)] };
        return PrismFit.Of(moved, axis => UprightAxes.TowardsZ(axis, toProject), axis => Sense(toProject.Direction(axis)), out fault);
    }

    /// <summary>Upwards is positive; where level, along +X; where that is square too, along +Y.</summary>
    private static double Sense(Vector3 direction) =>
        Math.Abs(direction.Z) > 1e-3 ? direction.Z : Math.Abs(direction.X) > 1e-3 ? direction.X : direction.Y;

    private static Finding<BarBody> NotParametric(BodyItem item, string fault) =>
        Missing(ReasonCode.SectionNotParametric, $"the body {item.Called} is a mesh without a parametric section ({fault})");

    private static Finding<BarBody> Missing(ReasonCode code, string message) => new Finding<BarBody>.Missing(new Reason(code, message));
}
