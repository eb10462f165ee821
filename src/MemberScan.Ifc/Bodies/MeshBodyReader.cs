using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Meshes;
using MemberScan.Ifc.Meshes.Runs;
using MemberScan.Ifc.Sections;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Bodies;

/// <summary>Bars that are meshes: recognised where the settings ask for it, told to be recognisable where they do not.</summary>
internal sealed class MeshBodyReader(MeshReader meshes, bool isAllowed)
{
    /// <summary>Source of a section that is read so, in words.</summary>
    public const string SourceWord = "recognised from mesh";

    /// <summary>Most reasons, and most sections, that a message names.</summary>
    private const int MostFaults = 3;

    private readonly Dictionary<ulong, string> _notRecognised = [];

    /// <summary>Reads a mesh: a bar for each straight prism or run of it, and the reason for each part that is none.</summary>
    /// <param name="item">The body.</param>
    /// <param name="toProject">From object to project coordinates, for the axes.</param>
    public IEnumerable<Finding<BarBody>> Read(BodyItem item, Transform3 toProject)
    {
        // What is no prism stays none however it is moved, turned or scaled as a whole.
        if (item.UniformScale is not null && _notRecognised.TryGetValue(item.Record.Id, out var known)) return [NotParametric(item, known)];

        var bars = Bars(item, toProject);
        var faults = bars.Faults.IsEmpty ? "" : Faults(bars);
        if (bars.Prisms.IsEmpty)
        {
            if (item.UniformScale is not null) _notRecognised[item.Record.Id] = faults;
            return [NotParametric(item, faults)];
        }

        if (!isAllowed) return [NotAllowed(item, bars)];

        var read = bars.Prisms.Select(prism => Bar(item, prism));
        return faults.Length > 0 ? [.. read, NotParametric(item, faults)] : [.. read];
    }

    private static string Faults(MeshBars bars) => bars.Parts == 1
        ? bars.Faults[0]
        : string.Create(CultureInfo.InvariantCulture, $"{bars.Faults.Length} of its {bars.Parts} parts: {string.Join("; ", bars.Faults.Distinct().Take(MostFaults))}");

    private static Finding<BarBody> NotAllowed(BodyItem item, MeshBars bars)
    {
        var what = bars.Prisms is [var one]
            ? string.Create(CultureInfo.InvariantCulture, $"{one.Section.Shapes[0].Designation}, {one.Length:0.###} m long")
            : string.Create(CultureInfo.InvariantCulture, $"{bars.Prisms.Length} bars ({string.Join(", ", bars.Prisms.Select(p => p.Section.Shapes[0].Designation).Distinct().Take(MostFaults))})");
        return Missing(ReasonCode.MeshNotAllowed, $"the body {item.Called} is a mesh that could be recognised as {what}; the settings do not ask for it (sections.recogniseMeshes)");
    }

    private static Finding<BarBody> Bar(BodyItem item, Prism prism)
    {
        var start = prism.Start.After(prism.Section.Position);
        var axes = new MemberAxes(start.Origin, prism.Start.Z, start.Y.Cross(prism.Start.Z), start.Y);
        var source = string.Create(CultureInfo.InvariantCulture, $"{SourceWord} {item.Called}, largest deviation {prism.Residual * 1e3:0.####} mm");
        ImmutableArray<string> notes = [.. item.Notes, .. Notes(prism), .. prism.Section.Notes];
        var profile = new ProfileShape(new SectionFinding(prism.Section.Shapes, "", notes), Transform3.Identity) { SourceWord = SourceWord };
        var length = prism.IsRun ? $"run of {item.Called} between its joints, {SourceWord}" : $"distance of the end faces of {item.Called}, {SourceWord}";
        return new Finding<BarBody>.Found(new BarBody(profile, prism.Length, length, axes, source, [], true, notes), source);
    }

    private static IEnumerable<string> Notes(Prism prism)
    {
        yield return "section, length and axes are recognised from a mesh; x points upwards, or along +X or +Y of the project where the member is level";
        if (prism.IsRun) yield return "one straight run of a mesh whose bars are joined; its length reaches to the axes of the bars that it meets; joints and bends between runs are not evaluated";
        if (prism.ShortPieces > 0) yield return string.Create(CultureInfo.InvariantCulture, $"{prism.ShortPieces} straight pieces of the mesh are shorter than {BarBody.BarLikeRatio} times their section; they count as bends or joints and are not checked");
        if (!prism.IsRun && prism.IsOblique) yield return "its ends are cut obliquely; the length is that along the middle, the section that square to it";
        if (prism.Section.Shapes[0] is Round or RoundedRectangle) yield return "the mesh shows no bore and is taken as solid; a hollow bar drawn by its outside alone looks the same";
    }

    private MeshBars Bars(BodyItem item, Transform3 toProject)
    {
        if (meshes.Read(item.Record, out var fault) is not { } mesh) return new MeshBars([], 1, [fault]);

        var moved = mesh with { Points = [.. mesh.Points.Select(item.Map.Point)] };
        return MeshBars.Of(moved, axis => UprightAxes.TowardsZ(axis, toProject), axis => Sense(toProject.Direction(axis)));
    }

    /// <summary>Upwards is positive; where level, along +X; where that is square too, along +Y.</summary>
    private static double Sense(Vector3 direction) =>
        Math.Abs(direction.Z) > 1e-3 ? direction.Z : Math.Abs(direction.X) > 1e-3 ? direction.X : direction.Y;

    private static Finding<BarBody> NotParametric(BodyItem item, string fault) =>
        Missing(ReasonCode.SectionNotParametric, $"the body {item.Called} is a mesh without a parametric section ({fault})");

    private static Finding<BarBody> Missing(ReasonCode code, string message) => new Finding<BarBody>.Missing(new Reason(code, message));
}
