using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;

namespace MemberScan.Ifc.Bodies;

/// <summary>One bar-like body of an element: a section swept along a line, in the coordinates of its element.</summary>
/// <param name="Profile">The section; its position is used up in the axes.</param>
/// <param name="Length">Length along the sweep [m].</param>
/// <param name="LengthSource">Where the length comes from, in words.</param>
/// <param name="Axes">Local axes at the start, in object coordinates.</param>
/// <param name="Source">Class and STEP id of body and profile, in words.</param>
/// <param name="BendRadii">Radii of the bends along it [m].</param>
/// <param name="IsStraight">Whether the centre line is one straight line.</param>
/// <param name="Notes">What a reader must know: cut, corners, reversed axes.</param>
internal sealed record BarBody(
    ProfileShape Profile, double Length, string LengthSource, MemberAxes Axes, string Source, ImmutableArray<double> BendRadii,
    bool IsStraight, ImmutableArray<string> Notes)
{
    /// <summary>The section at its end where it tapers; null otherwise.</summary>
    public SectionFinding? EndSection { get; init; }

    /// <summary>Length over largest extent from which a body counts as bar-like in classes that are candidates only then.</summary>
    public const double BarLikeRatio = 3;

    /// <summary>Whether the body is long against its section.</summary>
    public bool IsBarLike => Length >= BarLikeRatio * Profile.LargestExtent;

    /// <summary>Whether the section has no preferred axes, so that turning the member about itself changes nothing.</summary>
    public bool IsIsotropic => Profile.Section.Shape is Mechanics.Sections.Round or Mechanics.Sections.Tube;

    /// <summary>A bar of a profile swept along a line.</summary>
    /// <param name="item">The solid.</param>
    /// <param name="scale">Scale of the solid's map.</param>
    /// <param name="plane">From the profile's plane at the start to the solid's coordinates.</param>
    /// <param name="along">Direction of the sweep at the start, in the solid's coordinates.</param>
    /// <param name="profile">The profile with its source.</param>
    /// <param name="length">Length in the solid's coordinates [m], with its source.</param>
    /// <param name="bendRadii">Radii of bends in the solid's coordinates [m].</param>
    /// <param name="isStraight">Whether the centre line is one straight line.</param>
    public static Finding<BarBody>.Found Swept(
        BodyItem item, double scale, Transform3 plane, Vector3 along, Finding<ProfileShape>.Found profile, Finding<double>.Found length,
        ImmutableArray<double> bendRadii, bool isStraight)
    {
        var frame = item.Map.After(plane).After(profile.Value.Position);
        var notes = item.Notes;
        _ = item.Map.Direction(along).TryNormalize(out var x);
        _ = frame.Direction(Vector3.UnitY).TryNormalize(out var z);
        var y = z.Cross(x);
        var shape = profile.Value.Scaled(scale);
        var isReversed = y.Dot(frame.Direction(Vector3.UnitX)) < 0;
        if (isReversed) shape = shape.Mirrored();
        if (isReversed) notes = notes.Add("y is the reversed X axis of the profile (the sweep runs against its normal, or its profile or the placement mirrors)");
        if (!isStraight) notes = notes.Add("local axes are those at the start, carried along the centre line without twist");

        var source = $"{profile.Value.SourceWord} {profile.Source} of {item.Called}";
        var body = new BarBody(
            shape, scale * length.Value, length.Source, new MemberAxes(frame.Origin, x, y, z), source,
            [.. bendRadii.Select(r => scale * r)], isStraight, [.. notes, .. profile.Value.Section.Notes]);
        return new Finding<BarBody>.Found(body, source);
    }
}
