using System.Collections.Immutable;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Outlines;

/// <summary>The ways to read a box whose corner radii may be absent.</summary>
internal static class BoxReadings
{
    /// <summary>
    /// A box with the radii that are given. With none, the sharp box and the box with the cold-formed radii of EN 10219-2 are both kept:
    /// the less favourable decides.
    /// </summary>
    public static (ImmutableArray<CrossSection> Shapes, SectionFault? Fault) Of(
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
}
