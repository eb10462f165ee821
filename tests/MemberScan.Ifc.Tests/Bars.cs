using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Tests;

/// <summary>Bars of the cable-ferry landing as the tests place them.</summary>
internal static class Bars
{
    /// <summary>Gangway rail, 48.3 × 3.2 mm.</summary>
    public static Tube Rail { get; } = new(0.02415, 0.0032);

    /// <summary>Flat of a trapeze strut, 60 mm along profile X, 12 mm along profile Y.</summary>
    public static Rectangle Flat { get; } = new(0.060, 0.012);

    /// <summary>A frame that is neither at the origin nor along any axis, turned by a 2-3-6 rotation (entries in sevenths, exactly orthogonal).</summary>
    public static Transform3 Askew { get; } = new(
        new Vector3(12, -7, 3.5),
        new Vector3(2 / 7.0, 3 / 7.0, 6 / 7.0),
        new Vector3(6 / 7.0, 2 / 7.0, -3 / 7.0),
        new Vector3(-3 / 7.0, 6 / 7.0, -2 / 7.0));

    public static ModelWriter Model(Release release, FileUnits? units = null, params string[] leftOut) =>
        new(release, units ?? FileUnits.MillimetreNewton, "landing", leftOut);

    /// <summary>An extruded bar along its placement's z axis; gives the element.</summary>
    public static int Add(ModelWriter model, string name, CrossSection section, double length, Transform3? at = null, string keyword = "IFCMEMBER", ElementOptions? options = null) =>
        Add(model, name, model.Bodies.Extrusion(model.Profiles.Of(section), length), at, keyword, options);

    /// <summary>An element with one solid as its body.</summary>
    public static int Add(ModelWriter model, string name, int solid, Transform3? at = null, string keyword = "IFCMEMBER", ElementOptions? options = null) =>
        model.Element(keyword, name, model.LocalPlacement(at ?? Transform3.Identity), model.Bodies.Shape("SweptSolid", solid), options);

    /// <summary>A frame at a point with z along a direction and x as near as can be to a second one.</summary>
    public static Transform3 Frame(Vector3 origin, Vector3 z, Vector3 towardsX)
    {
        _ = z.TryNormalize(out var unitZ);
        _ = (towardsX - towardsX.Dot(unitZ) * unitZ).TryNormalize(out var unitX);
        return new Transform3(origin, unitX, unitZ.Cross(unitX), unitZ);
    }

    public static string Ref(int id) => Spelling.Reference(id);

    public static string Refs(params int[] ids) => Spelling.References(ids);
}
