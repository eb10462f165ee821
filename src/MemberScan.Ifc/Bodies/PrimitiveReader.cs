using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Bodies;

/// <summary>Bars that are blocks or cylinders of constructive solid geometry.</summary>
internal sealed class PrimitiveReader(PlacementReader placements, ModelUnits units)
{
    /// <summary>Source of a section that is read so, in words.</summary>
    private const string SourceWord = "solid primitive";

    /// <summary>Reads IfcBlock as a rectangle along its longest edge; the other two edges follow in cyclic order.</summary>
    public Finding<BarBody> Block(BodyItem item)
    {
        if (Position(item, out var position, out var scale) is { } missing) return missing;

        var (a, b, c) = (Dim(item, 1), Dim(item, 2), Dim(item, 3));
        if (Rectangle.Fault(a, b) is not null || Rectangle.Fault(b, c) is not null) return Missing(ReasonCode.SectionInvalid, $"a dimension of {item.Called} is not above zero");

        var centre = new Vector3(a / 2, b / 2, c / 2);
        var (section, length, plane) = c >= a && c >= b ? (new Rectangle(a, b), c, new Transform3(centre with { Z = 0 }, Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ))
            : a >= b ? (new Rectangle(b, c), a, new Transform3(centre with { X = 0 }, Vector3.UnitY, Vector3.UnitZ, Vector3.UnitX))
            : (new Rectangle(c, a), b, new Transform3(centre with { Y = 0 }, Vector3.UnitZ, Vector3.UnitX, Vector3.UnitY));
        return Bar(item, scale, position.After(plane), section, length, "longest edge");
    }

    /// <summary>Reads IfcRightCircularCylinder as a round bar along its axis.</summary>
    public Finding<BarBody> Cylinder(BodyItem item)
    {
        if (Position(item, out var position, out var scale) is { } missing) return missing;

        var (height, radius) = (Dim(item, 1), Dim(item, 2));
        if (Round.Fault(radius) is { } fault) return Missing(ReasonCode.SectionInvalid, $"{item.Called}: {fault.Message}");
        if (!(height > 0)) return Missing(ReasonCode.SectionInvalid, $"the height of {item.Called} is not above zero");

        return Bar(item, scale, position, new Round(radius), height, "height");
    }

    private static Finding<BarBody> Bar(BodyItem item, double scale, Transform3 plane, CrossSection section, double length, string lengthWord)
    {
        if (!double.IsFinite(scale * Math.Max(section.ExtentY, section.ExtentZ))) return Missing(ReasonCode.SectionInvalid, $"{item.Called} has no finite size");

        var profile = new ProfileShape(new SectionFinding([section], "", []), Transform3.Identity) { SourceWord = SourceWord };
        return BarBody.Swept(
            item, scale, plane, plane.Z, new Finding<ProfileShape>.Found(profile, section.Kind), new Finding<double>.Found(length, $"{lengthWord} of {item.Called}"), [], isStraight: true);
    }

    private Finding<BarBody>? Position(BodyItem item, out Transform3 position, out double scale)
    {
        (position, scale) = (placements.Axis2(item.Record[0]) ?? Transform3.Identity, item.UniformScale ?? 0);
        if (units.Length is null) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (placements.Axis2(item.Record[0]) is null) return Missing(ReasonCode.DamagedRecord, $"the position of {item.Called} is damaged");

        return scale > 0 ? null : Missing(ReasonCode.PlacementNotSupported, $"{item.Called} is mapped with unequal scales");
    }

    private double Dim(BodyItem item, int index) => Instances.Real(item.Record[index]) is { } value ? units.Length!.Value * value : double.NaN;

    private static Finding<BarBody> Missing(ReasonCode code, string message) => new Finding<BarBody>.Missing(new Reason(code, message));
}
