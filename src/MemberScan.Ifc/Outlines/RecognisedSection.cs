using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Outlines;

/// <summary>A round, tube, rectangle, rounded rectangle or box that an outline with its voids stands for.</summary>
/// <param name="Shapes">The section; two for a box drawn with sharp corners.</param>
/// <param name="Position">From the section's axes to the plane of the outline [m].</param>
/// <param name="Deviation">Largest distance of what is drawn from the section [m].</param>
/// <param name="Notes">What a reader must know.</param>
internal sealed record RecognisedSection(ImmutableArray<CrossSection> Shapes, Transform3 Position, double Deviation, ImmutableArray<string> Notes)
{
    /// <summary>Largest deviation over the wall of a hollow section [-].</summary>
    public const double WallTolerance = 5e-3;

    /// <summary>Recognises an outline; null when it is none of the kinds within the tolerances.</summary>
    public static RecognisedSection? Of(ClosedOutline outer, ImmutableArray<ClosedOutline> voids)
    {
        if (voids.Length > 1) return null;

        if (FittedCircle.Of(outer) is { } circle) return voids.IsEmpty ? Solid(circle) : FittedCircle.Of(voids[0]) is { } bore ? Hollow(circle, bore) : null;
        if (FittedRectangle.Of(outer) is { } rectangle) return voids.IsEmpty ? Solid(rectangle) : FittedRectangle.Of(voids[0]) is { } inside ? Hollow(rectangle, inside) : null;

        return null;
    }

    private static RecognisedSection? Solid(FittedCircle circle) =>
        Round.Fault(circle.Radius) is null ? At(circle.Centre, Vector3.UnitX, [new Round(circle.Radius)], circle.Deviation, [circle.Note]) : null;

    private static RecognisedSection? Hollow(FittedCircle circle, FittedCircle bore)
    {
        var wall = circle.Radius - bore.Radius;
        var deviation = circle.Deviation + bore.Deviation + (circle.Centre - bore.Centre).Length;
        if (deviation > WallTolerance * wall || Tube.Fault(circle.Radius, wall) is not null) return null;

        return At(circle.Centre, Vector3.UnitX, [new Tube(circle.Radius, wall)], deviation, [circle.Note, bore.Note]);
    }

    private static RecognisedSection? Solid(FittedRectangle r)
    {
        if (r.CornerRadius == 0) return Rectangle.Fault(r.Width, r.Depth) is null ? At(r, [new Rectangle(r.Width, r.Depth)], r.Deviation, []) : null;

        // A fitted radius can exceed half the side by a rounding.
        var radius = Math.Min(r.CornerRadius, Math.Min(r.Width, r.Depth) / 2);
        return RoundedRectangle.Fault(r.Width, r.Depth, radius) is null ? At(r, [new RoundedRectangle(r.Width, r.Depth, radius)], r.Deviation, []) : null;
    }

    private static RecognisedSection? Hollow(FittedRectangle outer, FittedRectangle inner)
    {
        // The directions agree but for a quarter turn; then the void's extents change places.
        var along = Math.Abs(outer.U.Dot(inner.U));
        var across = Math.Abs(OutlineEdge.Cross(outer.U, inner.U));
        var (width, depth) = along > across ? (inner.Width, inner.Depth) : (inner.Depth, inner.Width);
        var skew = Math.Min(along, across) * Math.Max(inner.Width, inner.Depth) / 2;
        var (wallU, wallV) = ((outer.Width - width) / 2, (outer.Depth - depth) / 2);
        var wall = (wallU + wallV) / 2;
        var deviation = outer.Deviation + inner.Deviation + skew + (outer.Centre - inner.Centre).Length + Math.Abs(wallU - wallV) / 2;
        if (deviation > WallTolerance * wall) return null;

        var isSharp = outer.CornerRadius == 0 && inner.CornerRadius == 0;
        var (shapes, fault) = BoxReadings.Of(outer.Width, outer.Depth, wall, isSharp ? null : inner.CornerRadius, isSharp ? null : outer.CornerRadius, out var notes);
        return fault is null ? At(outer, shapes, deviation, inner.HasChords && !outer.HasChords ? [ChordsNote, .. notes] : notes) : null;
    }

    private const string ChordsNote = "corners drawn as chords; evaluated as the arcs through their corners";

    private static RecognisedSection At(FittedRectangle r, ImmutableArray<CrossSection> shapes, double deviation, ImmutableArray<string> notes)
    {
        if (r.HasChords) notes = [ChordsNote, .. notes];
        var degrees = Math.Atan2(r.U.Y, r.U.X) * 180 / Math.PI;
        if (Math.Abs(degrees) > 0.01)
            notes = notes.Add(string.Create(System.Globalization.CultureInfo.InvariantCulture, $"y and z follow the sides, turned by {degrees:0.##}° from the axes of the drawing"));
        return At(r.Centre, r.U, shapes, deviation, notes);
    }

    private static RecognisedSection At(Vector3 centre, Vector3 u, ImmutableArray<CrossSection> shapes, double deviation, ImmutableArray<string> notes) =>
        new(shapes, new Transform3(centre, u, OutlineEdge.Left(u), Vector3.UnitZ), deviation, [.. notes.Where(n => n.Length > 0).Distinct()]);
}
