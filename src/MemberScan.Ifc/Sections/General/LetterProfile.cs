using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Outlines;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;

namespace MemberScan.Ifc.Sections.General;

/// <summary>An I, L, U or T profile that a drawn outline stands for.</summary>
/// <param name="Profile">The profile.</param>
/// <param name="Position">From the profile's axes to the plane of the outline [m].</param>
/// <param name="Deviation">Largest distance of the outline's corners from the profile's [m].</param>
/// <remarks>
/// Only outlines that stand as the profile does count, but for the slope of their sides: y and z then stay those of the drawing.
/// An angle or channel that is drawn the other way round, or mirrored, stays an outline.
/// </remarks>
internal sealed record LetterProfile(OpenProfile Profile, Transform3 Position, double Deviation)
{
    /// <summary>The profile of an outline; null when it is none.</summary>
    public static LetterProfile? Of(ClosedOutline outline)
    {
        var longest = outline.Edges.Where(e => !e.IsArc).DefaultIfEmpty().MaxBy(e => (e.End - e.Start).Length);
        if (outline.Edges.Length > OutlineSection.MostVertices || !(longest.End - longest.Start).TryNormalize(out var u)) return null;

        // The direction of the sides that is nearest to the plane's x axis.
        if (Math.Abs(u.X) < Math.Abs(u.Y) - 1e-9) u = OutlineEdge.Left(u);
        if (u.X < 0) u = -u;
        var v = OutlineEdge.Left(u);
        ImmutableArray<OutlineVertex> ring = [.. OutlineShapes.Ring(outline).Select(p => new OutlineVertex(p.Y * u.X + p.Z * u.Y, p.Y * v.X + p.Z * v.Y, p.Bulge))];
        if (OutlineShapes.Of("", [ring], out var centroid, out _) is not { } section || LetterFit.Of(section) is not { IsUpright: true } fit) return null;

        return new LetterProfile(fit.Profile, new Transform3(centroid.X * u + centroid.Y * v, u, v, Vector3.UnitZ), fit.Deviation);
    }
}
