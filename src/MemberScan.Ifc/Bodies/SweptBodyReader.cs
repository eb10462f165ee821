using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Sections;
using MemberScan.Ifc.Units;
using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Bodies;

/// <summary>Bars that are profiles swept along a line, about an axis or along a curve.</summary>
internal sealed class SweptBodyReader(
    Instances instances, PlacementReader placements, ProfileReader profiles, DirectrixReader directrices, ModelUnits units)
{
    /// <summary>Largest sine of the angle between sweep and profile normal that still counts as square (section error below 1e-6).</summary>
    private const double SkewTolerance = 1e-3;

    private readonly record struct Start(Finding<ProfileShape>.Found Profile, Transform3 Plane, double Scale, double Metre);

    /// <summary>Reads IfcExtrudedAreaSolid.</summary>
    public Finding<BarBody> Extrusion(BodyItem item) =>
        Prepared(item, out var start) ?? Extruded(item, start);

    /// <summary>
    /// Reads IfcExtrudedAreaSolidTapered: a bar where both ends are the same; a tapering bar where they make a taper that is evaluated,
    /// about one axis; refused with both named where they do not.
    /// </summary>
    public Finding<BarBody> Tapered(BodyItem item)
    {
        if (Prepared(item, out var start) is { } missing) return missing;
        if (!instances.TryFollow(item.Record[4], out var endRecord)) return Missing(ReasonCode.DamagedRecord, $"{item.Called} has no profile at its end");
        if (!profiles.Read(endRecord).TryGet(out var end, out var why)) return Missing(why.Code, $"at the end of {item.Called}: {why.Message}");

        var (first, last) = (start.Profile.Value, end.Value);
        var moves = (last.Position.Origin - first.Position.Origin).Length > 1e-4 * first.LargestExtent || (last.Position.X - first.Position.X).Length > 1e-4;
        if (SectionAlike.Of(first.Section.Shape, last.Section.Shape) && !moves) return Extruded(item, start);

        var words = $"{item.Called} tapers from {first.Section.Shape.Designation} ({start.Profile.Source}) to {last.Section.Shape.Designation} ({end.Source})";
        if (moves) return Missing(ReasonCode.SectionNotCovered, $"{words}, shifted or turned; stress along such a taper is not evaluated");
        if (!Extruded(item, start).TryGet(out var bar, out var whyNot)) return new Finding<BarBody>.Missing(whyNot);
        if (TaperedEnds.WhyNot(first.Section.Shape, last.Section.Shape, bar.Value.Length / start.Scale) is { Length: > 0 } fault)
            return Missing(ReasonCode.SectionNotCovered, $"{words}; {fault}");

        var scaled = (last with { Position = first.Position }).Scaled(start.Scale);
        return bar with { Value = bar.Value with { EndSection = scaled.Section, Notes = bar.Value.Notes.Add(words) } };
    }

    /// <summary>Reads IfcRevolvedAreaSolid as a bent bar: length and bend radius at the centroid.</summary>
    public Finding<BarBody> Revolved(BodyItem item)
    {
        if (Prepared(item, out var start) is { } missing) return missing;
        if (!instances.TryFollow(item.Record[2], out var axis) || !instances.TryFollow(axis[0], out var place) || placements.Point(place) is not { } through)
            return Missing(ReasonCode.DamagedRecord, $"the axis of {item.Called} is damaged");
        if (!(placements.Direction(axis[1]) ?? Vector3.UnitZ).TryNormalize(out var about) || Math.Abs(about.Z) > SkewTolerance)
            return Missing(ReasonCode.SectionNotCovered, $"the axis of {item.Called} does not lie in the plane of its profile");
        if (Instances.Real(item.Record[3]) is not { } written || !(Math.Abs(written) > 0)) return Missing(ReasonCode.SectionInvalid, $"{item.Called} is revolved by no angle");

        var angle = Math.Abs(written) * units.Angle;
        if (angle > 2 * Math.PI - 1e-6) return Missing(ReasonCode.SectionNotCovered, $"{item.Called} is a closed ring, which has no ends");

        var arm = start.Profile.Value.Position.Origin - through;
        arm -= arm.Dot(about) * about;
        var radius = arm.Length;
        var reach = start.Profile.Value.LargestExtent / 2;
        if (radius <= reach)
            return Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"the profile of {item.Called} may reach its axis of revolution: its centroid is {radius * 1e3:0.###} mm away and its half extent {reach * 1e3:0.###} mm"));

        var along = (written > 0 ? 1 : -1) * about.Cross(arm);
        var length = new Finding<double>.Found(radius * angle, string.Create(CultureInfo.InvariantCulture, $"arc at the centroid of {item.Called}, radius {radius * 1e3:0.###} mm, {angle * 180 / Math.PI:0.###}°"));
        return BarBody.Swept(item, start.Scale, start.Plane, start.Plane.Direction(along), start.Profile, length, [radius], isStraight: false);
    }

    /// <summary>Reads sweeps along a curve whose profile is kept upright by a direction, or by the normal of a plane.</summary>
    public Finding<BarBody> AlongCurve(BodyItem item)
    {
        if (Prepared(item, out var start) is { } missing) return missing;
        if (!directrices.Read(item.Record[2], item.Record[3], item.Record[4], filletRadius: 0).TryGet(out var line, out var why)) return new Finding<BarBody>.Missing(why);
        if (Reference(item) is not { } reference) return Missing(ReasonCode.SectionNotCovered, $"the profile of {item.Called} is not held by a fixed direction or a plane");

        var z = line.Value.Tangent;
        if (!(reference - reference.Dot(z) * z).TryNormalize(out var x)) return Missing(ReasonCode.SectionInvalid, $"the reference direction of {item.Called} lies along its line");

        var profile = start.Profile.Value;
        if (!line.Value.IsStraight && profile.Position.Origin.Length > 1e-6 * profile.LargestExtent)
            return Missing(ReasonCode.LengthAmbiguous, $"{item.Called} is bent and its profile lies beside the line that it is swept along, so its length is not that line's");

        var plane = start.Plane.After(new Transform3(line.Value.Start, x, z.Cross(x), z));
        var length = new Finding<double>.Found(line.Value.Length, $"centre line {line.Source} of {item.Called}");
        return BarBody.Swept(item, start.Scale, plane, start.Plane.Direction(z), start.Profile, length, line.Value.BendRadii, line.Value.IsStraight);
    }

    private Finding<BarBody> Extruded(BodyItem item, Start start)
    {
        var solid = item.Record;
        if (placements.Direction(solid[2]) is not { } given || !given.TryNormalize(out var direction))
            return Missing(ReasonCode.DamagedRecord, $"the position or direction of {item.Called} is damaged");
        if (Instances.Real(solid[3]) is not { } depth || !(depth * start.Metre > 0)) return Missing(ReasonCode.SectionInvalid, $"the depth of {item.Called} is not above zero");
        if (Math.Sqrt(direction.X * direction.X + direction.Y * direction.Y) > SkewTolerance)
            return Missing(ReasonCode.SectionNotCovered, $"{item.Called} is extruded at an angle to its profile's normal");

        var length = new Finding<double>.Found(depth * start.Metre, $"depth of {item.Called}");
        return BarBody.Swept(item, start.Scale, start.Plane, start.Plane.Direction(direction), start.Profile, length, [], isStraight: true);
    }

    /// <summary>What every sweep begins with: profile, position, scale; or the reason why there is none.</summary>
    private Finding<BarBody>? Prepared(BodyItem item, out Start start)
    {
        start = default;
        if (units.Length is not { } metre) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (!instances.TryFollow(item.Record[0], out var profileRecord)) return Missing(ReasonCode.DamagedRecord, $"{item.Called} has no profile");
        if (!profiles.Read(profileRecord).TryGet(out var profile, out var why)) return new Finding<BarBody>.Missing(why);
        if (placements.Axis2(item.Record[1]) is not { } position) return Missing(ReasonCode.DamagedRecord, $"the position or direction of {item.Called} is damaged");
        if (item.UniformScale is not { } scale) return Missing(ReasonCode.PlacementNotSupported, $"{item.Called} is mapped with unequal scales");
        if (!double.IsFinite(scale * profile.Value.LargestExtent)) return Missing(ReasonCode.SectionInvalid, $"{item.Called} has no finite size");

        start = new Start(profile, position, scale, metre);
        return null;
    }

    private Vector3? Reference(BodyItem item)
    {
        if (item.Record.Keyword == "IFCFIXEDREFERENCESWEPTAREASOLID") return placements.Direction(item.Record[5]);

        return instances.TryFollow(item.Record[5], out var surface) && surface.Keyword == "IFCPLANE" ? placements.Axis2(surface[0])?.Z : null;
    }

    private static Finding<BarBody> Missing(ReasonCode code, string message) => new Finding<BarBody>.Missing(new Reason(code, message));
}
