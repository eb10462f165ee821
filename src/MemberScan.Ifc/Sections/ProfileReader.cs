using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Curves;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Outlines;
using MemberScan.Ifc.Sections.General;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Sections;

/// <summary>Sections from profile definitions: parametric ones, drawn outlines, and profiles derived from others.</summary>
internal sealed class ProfileReader(Instances instances, PlacementReader placements, CurveReader curves, ModelUnits units)
{
    /// <summary>Deepest nesting of derived and composite profiles that is followed.</summary>
    public const int MaxNesting = 16;

    private readonly Dictionary<ulong, Finding<ProfileShape>> _known = [];
    private readonly DrawnProfileReader _drawn = new(instances, curves);

    /// <summary>Reads a profile; its source names class and STEP id.</summary>
    public Finding<ProfileShape> Read(Part21Record profile) => Read(profile, depth: 0);

    /// <summary>Class, STEP id and name of a profile.</summary>
    public static string Called(Part21Record profile)
    {
        var name = Instances.Text(profile[1]);
        var words = string.Create(CultureInfo.InvariantCulture, $"{profile.Keyword} #{profile.Id}");
        return name.Length > 0 ? $"{words} '{name}'" : words;
    }

    private Finding<ProfileShape> Read(Part21Record profile, int depth)
    {
        if (_known.TryGetValue(profile.Id, out var known)) return known;
        if (depth > MaxNesting) return Missing(ReasonCode.SectionNotCovered, $"{Called(profile)} is derived from others without end");

        return _known[profile.Id] = ReadOnce(profile, depth);
    }

    private Finding<ProfileShape> ReadOnce(Part21Record profile, int depth)
    {
        var called = Called(profile);
        if (profile.IsDamaged) return Missing(ReasonCode.DamagedRecord, $"the record of {called} is damaged");
        if (Instances.Literal(profile[0]) is "CURVE") return Missing(ReasonCode.SectionNotCovered, $"{called} is a curve, not an area");
        if (units.Length is not { } metre) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");

        return profile.Keyword switch
        {
            "IFCARBITRARYCLOSEDPROFILEDEF" or "IFCARBITRARYPROFILEDEFWITHVOIDS" => _drawn.Read(profile),
            "IFCDERIVEDPROFILEDEF" or "IFCMIRROREDPROFILEDEF" => Derived(profile, called, depth),
            "IFCCOMPOSITEPROFILEDEF" => Composite(profile, called, depth),
            _ => Parametric(profile, called, metre),
        };
    }

    private Finding<ProfileShape> Parametric(Part21Record profile, string called, double metre)
    {
        double Dim(int index) => Instances.Real(profile[index]) is { } value ? metre * value : double.NaN;
        var notes = ImmutableArray<string>.Empty;
        (ImmutableArray<CrossSection> Shapes, SectionFault? Fault) made;
        switch (profile.Keyword)
        {
            case "IFCCIRCLEPROFILEDEF": made = Made(Round.Fault(Dim(3)), () => new Round(Dim(3))); break;
            case "IFCCIRCLEHOLLOWPROFILEDEF": made = Made(Tube.Fault(Dim(3), Dim(4)), () => new Tube(Dim(3), Dim(4))); break;
            case "IFCRECTANGLEPROFILEDEF": made = Made(Rectangle.Fault(Dim(3), Dim(4)), () => new Rectangle(Dim(3), Dim(4))); break;
            case "IFCROUNDEDRECTANGLEPROFILEDEF": made = Made(RoundedRectangle.Fault(Dim(3), Dim(4), Dim(5)), () => new RoundedRectangle(Dim(3), Dim(4), Dim(5))); break;
            case "IFCRECTANGLEHOLLOWPROFILEDEF": made = BoxReadings.Of(Dim(3), Dim(4), Dim(5), Radius(profile[6], metre), Radius(profile[7], metre), out notes); break;
            default: return General(profile, called, metre);
        }

        if (placements.Axis2(profile[2]) is not { } position) return Missing(ReasonCode.DamagedRecord, $"the position of {called} is damaged");
        if (made.Fault is { } fault)
        {
            var code = fault.Kind == SectionFaultKind.WallOverRadius ? ReasonCode.WallOverRadius : ReasonCode.SectionInvalid;
            return Missing(code, $"{called}: {fault.Message}");
        }

        var section = new SectionFinding(made.Shapes, Instances.Text(profile[1]), notes);
        return new Finding<ProfileShape>.Found(new ProfileShape(section, position), called);
    }

    private Finding<ProfileShape> General(Part21Record profile, string called, double metre)
    {
        if (ParametricOutlines.Of(new ParametricDims(profile, metre, units.Angle)) is not { } made)
            return Missing(ReasonCode.SectionNotCovered, $"{called} is of a class that is not read as a section");
        if (placements.Axis2(profile[2]) is not { } position) return Missing(ReasonCode.DamagedRecord, $"the position of {called} is damaged");
        if (made.Shape is not { } shape)
        {
            var code = made.Fault!.Kind == SectionFaultKind.WallOverRadius ? ReasonCode.WallOverRadius : ReasonCode.SectionInvalid;
            return Missing(code, $"{called}: {made.Fault.Message}");
        }

        var section = new SectionFinding([shape], Instances.Text(profile[1]), made.Notes);
        var centred = position.After(new Transform3(made.Centroid, Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ));
        return new Finding<ProfileShape>.Found(new ProfileShape(section, centred) { Drawn = position }, called);
    }

    /// <summary>A profile moved, turned, mirrored or scaled in its plane.</summary>
    private Finding<ProfileShape> Derived(Part21Record profile, string called, int depth)
    {
        if (!instances.TryFollow(profile[2], out var parent)) return Missing(ReasonCode.DamagedRecord, $"{called} has no parent profile");
        if (!Read(parent, depth + 1).TryGet(out var found, out var why)) return Missing(why.Code, why.Message.StartsWith(called, StringComparison.Ordinal) ? why.Message : $"{called}: {why.Message}");

        var isMirror = profile.Keyword == "IFCMIRROREDPROFILEDEF" && profile[3].IsEmpty;
        var map = isMirror ? PlacementReader.MirrorX : instances.TryFollow(profile[3], out var op) ? placements.Operator2(op) : null;
        if (map is null) return Missing(ReasonCode.DamagedRecord, $"the transformation of {called} is damaged");
        if (found.Value.Mapped(map) is not { } shape)
            return Missing(ReasonCode.SectionNotCovered, $"{called} stretches {found.Source} ({found.Value.Section.Shape.Designation}) unequally, so that it is no longer a {found.Value.Section.Shape.Kind}");

        var name = Instances.Text(profile[1]) is { Length: > 0 } own ? own : shape.Section.Name;
        var notes = map.Determinant < 0 ? shape.Section.Notes.Add("the profile is mirrored") : shape.Section.Notes;
        return new Finding<ProfileShape>.Found(shape with { Section = shape.Section with { Name = name, Notes = notes } }, $"{called} of {found.Source}");
    }

    private Finding<ProfileShape> Composite(Part21Record profile, string called, int depth)
    {
        var parts = instances.FollowEach(profile[2]);
        if (parts is not { Count: > 0 }) return Missing(ReasonCode.DamagedRecord, $"{called} has no parts, or refers to missing ones");
        if (parts.Count > 1)
            return Missing(ReasonCode.SectionNotCovered, string.Create(CultureInfo.InvariantCulture, $"{called} is composed of {parts.Count} profiles ({string.Join(", ", parts.Take(4).Select(Called))})"));

        return Read(parts[0], depth + 1) is Finding<ProfileShape>.Found found
            ? found with { Source = $"{called} of {found.Source}" }
            : Read(parts[0], depth + 1);
    }

    private static (ImmutableArray<CrossSection> Shapes, SectionFault? Fault) Made(SectionFault? fault, Func<CrossSection> make) =>
        fault is null ? ([make()], null) : ([], fault);

    private static double? Radius(Part21Value value, double metre) => Instances.Real(value) is { } radius ? metre * radius : null;

    private static Finding<ProfileShape> Missing(ReasonCode code, string message) => new Finding<ProfileShape>.Missing(new Reason(code, message));
}
