using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Bodies;

/// <summary>Bars that are disks swept along a centre line: round bars and tubes, with any bends.</summary>
internal sealed class DiskBodyReader(DirectrixReader directrices, ModelUnits units)
{
    /// <summary>Reads IfcSweptDiskSolid and its polygonal form.</summary>
    /// <param name="item">The solid.</param>
    /// <param name="toProject">From object to project coordinates, for the axes.</param>
    public Finding<BarBody> Read(BodyItem item, Transform3 toProject)
    {
        var solid = item.Record;
        if (units.Length is not { } metre) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");

        var radius = Instances.Real(solid[1]) is { } r ? metre * r : double.NaN;
        var inner = solid[2].IsEmpty ? 0 : Instances.Real(solid[2]) is { } i ? metre * i : double.NaN;
        if (item.UniformScale is not { } scale) return Missing(ReasonCode.PlacementNotSupported, $"{item.Called} is mapped with unequal scales");

        var hollow = inner != 0;
        if (inner < 0) return Missing(ReasonCode.SectionInvalid, $"{item.Called}: the inner radius is negative");
        if ((hollow ? Tube.Fault(radius, radius - inner) : Round.Fault(radius)) is { } fault) return Missing(ReasonCode.SectionInvalid, $"{item.Called}: {fault.Message}");

        var fillet = solid.Keyword == "IFCSWEPTDISKSOLIDPOLYGONAL" && Instances.Real(solid[5]) is { } f ? metre * f : 0;
        if (!double.IsFinite(scale * radius)) return Missing(ReasonCode.SectionInvalid, $"{item.Called} has no finite size");
        if (!directrices.Read(solid[0], solid[3], solid[4], fillet).TryGet(out var line, out var why)) return Missing(why);

        var tangent = item.Map.Direction(line.Value.Tangent);
        var start = item.Map.Point(line.Value.Start);
        var axes = UprightAxes(start, tangent, toProject);
        var notes = item.Notes;
        if (line.Value.Corners > 0)
            notes = notes.Add(string.Create(CultureInfo.InvariantCulture, $"the centre line has {line.Value.Corners} mitred corners; stresses local to a corner are not covered"));
        if (!line.Value.IsStraight) notes = notes.Add("local axes are those at the start, carried along the centre line without twist");

        CrossSection shape = hollow ? new Tube(radius, radius - inner) : new Round(radius);
        var profile = new ProfileShape(new SectionFinding([shape], "", notes), Transform3.Identity).Scaled(scale);
        var source = $"swept disk {item.Called}";
        return new Finding<BarBody>.Found(
            new BarBody(profile, scale * line.Value.Length, $"centre line {line.Source} of {item.Called}", axes, source,
                [.. line.Value.BendRadii.Select(b => scale * b)], line.Value.IsStraight, notes),
            source);
    }

    /// <summary>Axes of a swept disk: z = global +Z square to x, for an upright member global +X.</summary>
    private static MemberAxes UprightAxes(Vector3 start, Vector3 tangent, Transform3 toProject)
    {
        // The global directions as seen from the object: its placement is a rotation, so the transposed map turns them back.
        var up = new Vector3(toProject.X.Z, toProject.Y.Z, toProject.Z.Z);
        var east = new Vector3(toProject.X.X, toProject.Y.X, toProject.Z.X);
        _ = tangent.TryNormalize(out var x);
        var isUpright = x.Cross(up).Length < 1e-3;
        return MemberAxes.From(start, tangent, isUpright ? east : up)
            ?? MemberAxes.From(start, tangent, Math.Abs(x.X) < 0.9 ? Vector3.UnitX : Vector3.UnitY)!;
    }

    private static Finding<BarBody> Missing(ReasonCode code, string message) => Missing(new Reason(code, message));

    private static Finding<BarBody> Missing(Reason why) => new Finding<BarBody>.Missing(why);
}
