using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Units;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Sections;

/// <summary>Sections from profile definitions: circle, hollow circle, rectangle, rounded rectangle, hollow rectangle.</summary>
internal sealed class ProfileReader(PlacementReader placements, ModelUnits units)
{
    private readonly Dictionary<ulong, Finding<ProfileShape>> _known = [];

    /// <summary>Reads a profile; its source names class and STEP id.</summary>
    public Finding<ProfileShape> Read(Part21Record profile)
    {
        if (_known.TryGetValue(profile.Id, out var known)) return known;

        return _known[profile.Id] = ReadOnce(profile);
    }

    private Finding<ProfileShape> ReadOnce(Part21Record profile)
    {
        var called = Called(profile);
        if (profile.IsDamaged) return Missing(ReasonCode.DamagedRecord, $"the record of {called} is damaged");
        if (!IsCovered(profile.Keyword)) return Missing(ReasonCode.SectionNotCovered, $"{called} is not a round, tubular, rectangular or box profile");
        if (Instances.Literal(profile[0]) is "CURVE") return Missing(ReasonCode.SectionNotCovered, $"{called} is a curve, not an area");
        if (units.Length is not { } metre) return Missing(ReasonCode.UnitMissing, "the model names no length unit (LENGTHUNIT)");
        if (placements.Axis2(profile[2]) is not { } position) return Missing(ReasonCode.DamagedRecord, $"the position of {called} is damaged");

        double Dim(int index) => Instances.Real(profile[index]) is { } value ? metre * value : double.NaN;
        var notes = ImmutableArray<string>.Empty;
        (ImmutableArray<CrossSection> Shapes, SectionFault? Fault) made = profile.Keyword switch
        {
            "IFCCIRCLEPROFILEDEF" => Made(Round.Fault(Dim(3)), () => new Round(Dim(3))),
            "IFCCIRCLEHOLLOWPROFILEDEF" => Made(Tube.Fault(Dim(3), Dim(4)), () => new Tube(Dim(3), Dim(4))),
            "IFCRECTANGLEPROFILEDEF" => Made(Rectangle.Fault(Dim(3), Dim(4)), () => new Rectangle(Dim(3), Dim(4))),
            "IFCROUNDEDRECTANGLEPROFILEDEF" => Made(RoundedRectangle.Fault(Dim(3), Dim(4), Dim(5)), () => new RoundedRectangle(Dim(3), Dim(4), Dim(5))),
            _ => BoxShapes(Dim(3), Dim(4), Dim(5), Radius(profile[6], metre), Radius(profile[7], metre), out notes),
        };
        if (made.Fault is { } fault)
        {
            var code = fault.Kind == SectionFaultKind.WallOverRadius ? ReasonCode.WallOverRadius : ReasonCode.SectionInvalid;
            return Missing(code, $"{called}: {fault.Message}");
        }

        var section = new SectionFinding(made.Shapes, Instances.Text(profile[1]), notes);
        return new Finding<ProfileShape>.Found(new ProfileShape(section, position), called);
    }

    private static (ImmutableArray<CrossSection> Shapes, SectionFault? Fault) Made(SectionFault? fault, Func<CrossSection> make) =>
        fault is null ? ([make()], null) : ([], fault);

    /// <summary>
    /// A box with the radii that are given. With none, the sharp box and the box with the cold-formed radii of EN 10219-2 are both kept:
    /// the less favourable decides.
    /// </summary>
    private static (ImmutableArray<CrossSection> Shapes, SectionFault? Fault) BoxShapes(
        double width, double depth, double wall, double? inner, double? outer, out ImmutableArray<string> notes)
    {
        notes = [];
        if (inner is null && outer is null)
        {
            var (ro, ri) = ColdFormedRadii(wall);
            if (Box.Fault(width, depth, wall) is { } sharpFault) return ([], sharpFault);

            var sharp = new Box(width, depth, wall);
            if (Box.Fault(width, depth, wall, ro, ri) is not null)
            {
                notes = ["corner radii absent; cold-formed radii of EN 10219-2 do not fit, evaluated sharp"];
                return ([sharp], null);
            }

            notes = ["radii assumed: corner radii absent; evaluated sharp and with the cold-formed radii of EN 10219-2 (from memory), the less favourable decides"];
            return ([sharp, new Box(width, depth, wall, ro, ri)], null);
        }

        if (inner is null)
        {
            inner = Math.Max(0, outer!.Value - wall);
            notes = ["inner corner radius absent; taken as outer radius less the wall"];
        }
        else if (outer is null)
        {
            outer = inner.Value > 0 ? inner.Value + wall : 0;
            notes = ["outer corner radius absent; taken as inner radius plus the wall"];
        }

        var fault = Box.Fault(width, depth, wall, outer.Value, inner.Value);
        return fault is null ? ([new Box(width, depth, wall, outer.Value, inner.Value)], null) : ([], fault);
    }

    /// <summary>Corner radii for calculation of cold-formed hollow sections, EN 10219-2:2006 (from memory).</summary>
    private static (double Outer, double Inner) ColdFormedRadii(double wall) =>
        wall <= 0.006 * (1 + 1e-9) ? (2.0 * wall, 1.0 * wall)
        : wall <= 0.010 * (1 + 1e-9) ? (2.5 * wall, 1.5 * wall)
        : (3.0 * wall, 2.0 * wall);

    private static double? Radius(Part21Value value, double metre) => Instances.Real(value) is { } radius ? metre * radius : null;

    private static bool IsCovered(string keyword) => keyword is "IFCCIRCLEPROFILEDEF" or "IFCCIRCLEHOLLOWPROFILEDEF" or "IFCRECTANGLEPROFILEDEF"
        or "IFCROUNDEDRECTANGLEPROFILEDEF" or "IFCRECTANGLEHOLLOWPROFILEDEF";

    private static string Called(Part21Record profile)
    {
        var name = Instances.Text(profile[1]);
        var words = string.Create(CultureInfo.InvariantCulture, $"{profile.Keyword} #{profile.Id}");
        return name.Length > 0 ? $"{words} '{name}'" : words;
    }

    private static Finding<ProfileShape> Missing(ReasonCode code, string message) => new Finding<ProfileShape>.Missing(new Reason(code, message));
}
