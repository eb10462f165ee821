using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Ifc.Sections.General;

/// <summary>
/// Parametric profiles that are no round, tube, rectangle or box: I, L, U and T with root fillets alone become open profiles, all others
/// outlines. Profiles are centred on the middle of their bounding box (IFC documentation of IfcParameterizedProfileDef).
/// </summary>
internal static class ParametricOutlines
{
    private const string SlopeNote = "sloped flanges: their thickness is taken where rolled sections give it, at a quarter of the width of an I or T and half the width of a channel (from memory)";

    /// <summary>A profile as read.</summary>
    /// <param name="Shape">The section; null when the dimensions make none.</param>
    /// <param name="Centroid">Its centroid from the profile's origin [m].</param>
    /// <param name="Notes">What a reader must know.</param>
    /// <param name="Fault">What is wrong; null when nothing is.</param>
    public readonly record struct Made(CrossSection? Shape, Vector3 Centroid, ImmutableArray<string> Notes, SectionFault? Fault);

    /// <summary>Reads a profile; null when its class is not one of these.</summary>
    public static Made? Of(ParametricDims d) => d.Profile.Keyword switch
    {
        "IFCISHAPEPROFILEDEF" => I(d),
        "IFCASYMMETRICISHAPEPROFILEDEF" => AsymmetricI(d),
        "IFCLSHAPEPROFILEDEF" => L(d),
        "IFCUSHAPEPROFILEDEF" => U(d),
        "IFCTSHAPEPROFILEDEF" => T(d),
        "IFCCSHAPEPROFILEDEF" => C(d),
        "IFCZSHAPEPROFILEDEF" => Z(d),
        "IFCELLIPSEPROFILEDEF" => Ellipse(d),
        "IFCTRAPEZIUMPROFILEDEF" => Trapezium(d),
        _ => null,
    };

    private readonly record struct Flange(double Width, double Thickness, double Fillet, double Edge, double Slope);

    private static Made I(ParametricDims d)
    {
        var (width, depth, web) = (d.Length(3), d.Length(4), d.Length(5));
        var flange = new Flange(width, d.Length(6), d.Optional(7), d.Optional(8), d.Slope(9));
        return flange is { Edge: 0, Slope: 0 }
            ? Open(OpenShape.I, depth, width, web, flange.Thickness, flange.Fillet)
            : Flanged("I", depth, web, flange, flange);
    }

    // In IFC2X3 the class is a kind of I profile, without roundings of edges and slopes; the place of its centroid stands there at 11.
    private static Made AsymmetricI(ParametricDims d)
    {
        var hasEdges = d.Profile.ArgumentCount > 12;
        var bottom = new Flange(d.Length(3), d.Length(6), d.Optional(7), hasEdges ? d.Optional(11) : 0, hasEdges ? d.Slope(12) : 0);
        var thickness = d.Profile[9].IsEmpty ? bottom.Thickness : d.Length(9);
        var top = new Flange(d.Length(8), thickness, d.Optional(10), hasEdges ? d.Optional(13) : 0, hasEdges ? d.Slope(14) : 0);
        return Flanged("asymmetric I", d.Length(4), d.Length(5), bottom, top);
    }

    private static Made Flanged(string label, double depth, double web, Flange bottom, Flange top)
    {
        if (Positive(depth, web, bottom.Width, bottom.Thickness, top.Width, top.Thickness) is { } fault) return Wrong(fault);
        if (web >= Math.Min(bottom.Width, top.Width) || bottom.Thickness + top.Thickness >= depth) return Wrong(Thick);

        double Inner(Flange f, double y) => f.Thickness + (f.Width / 4 - y) * Math.Tan(f.Slope);
        var (b1, b2, w, h) = (bottom.Width / 2, top.Width / 2, web / 2, depth / 2);
        var ring = new RoundedPolygon()
            .Corner(-b1, -h).Corner(b1, -h).Corner(b1, -h + Inner(bottom, b1), bottom.Edge).Corner(w, -h + Inner(bottom, w), bottom.Fillet)
            .Corner(w, h - Inner(top, w), top.Fillet).Corner(b2, h - Inner(top, b2), top.Edge).Corner(b2, h).Corner(-b2, h)
            .Corner(-b2, h - Inner(top, b2), top.Edge).Corner(-w, h - Inner(top, w), top.Fillet)
            .Corner(-w, -h + Inner(bottom, w), bottom.Fillet).Corner(-b1, -h + Inner(bottom, b1), bottom.Edge);
        return Outline(label, ring, bottom.Slope != 0 || top.Slope != 0 ? [SlopeNote] : []);
    }

    private static Made L(ParametricDims d)
    {
        var (depth, thickness, edge) = (d.Length(3), d.Length(5), d.Optional(7));
        var width = d.Profile[4].IsEmpty ? depth : d.Length(4);
        if (d.Slope(8) != 0) return Wrong("the legs slope, and where their thickness is meant is not certain");
        if (edge == 0) return Open(OpenShape.L, depth, width, thickness, thickness, d.Optional(6));
        if (Positive(depth, width, thickness) is { } fault) return Wrong(fault);
        if (thickness >= Math.Min(depth, width)) return Wrong(Thick);

        var (y, z) = (-width / 2, -depth / 2);
        return Outline("L", new RoundedPolygon()
            .Corner(y, z).Corner(-y, z).Corner(-y, z + thickness, edge).Corner(y + thickness, z + thickness, d.Optional(6)).Corner(y + thickness, -z, edge).Corner(y, -z), []);
    }

    private static Made U(ParametricDims d)
    {
        var (depth, width, web, flange, edge, slope) = (d.Length(3), d.Length(4), d.Length(5), d.Length(6), d.Optional(8), d.Slope(9));
        if (edge == 0 && slope == 0) return Open(OpenShape.U, depth, width, web, flange, d.Optional(7));
        if (Positive(depth, width, web, flange) is { } fault) return Wrong(fault);
        if (web >= width || 2 * flange >= depth) return Wrong(Thick);

        var (y, h) = (-width / 2, depth / 2);
        double Inner(double at) => h - flange + at * Math.Tan(slope);
        return Outline("U", new RoundedPolygon()
            .Corner(y, -h).Corner(-y, -h).Corner(-y, -Inner(-y), edge).Corner(y + web, -Inner(y + web), d.Optional(7))
            .Corner(y + web, Inner(y + web), d.Optional(7)).Corner(-y, Inner(-y), edge).Corner(-y, h).Corner(y, h), slope != 0 ? [SlopeNote] : []);
    }

    private static Made T(ParametricDims d)
    {
        var (depth, width, web, flange) = (d.Length(3), d.Length(4), d.Length(5), d.Length(6));
        var (edge, foot, slope) = (d.Optional(8), d.Optional(9), d.Slope(11));
        if (d.Slope(10) != 0) return Wrong("the web slopes, and where its thickness is meant is not certain");
        if (edge == 0 && foot == 0 && slope == 0) return Open(OpenShape.T, depth, width, web, flange, d.Optional(7));
        if (Positive(depth, width, web, flange) is { } fault) return Wrong(fault);
        if (web >= width || flange >= depth) return Wrong(Thick);

        var (w, b, h) = (web / 2, width / 2, depth / 2);
        double Inner(double at) => h - flange - (b / 2 - at) * Math.Tan(slope);
        return Outline("T", new RoundedPolygon()
            .Corner(-w, -h, foot).Corner(w, -h, foot).Corner(w, Inner(w), d.Optional(7)).Corner(b, Inner(b), edge).Corner(b, h)
            .Corner(-b, h).Corner(-b, Inner(b), edge).Corner(-w, Inner(w), d.Optional(7)), slope != 0 ? [SlopeNote] : []);
    }

    // A web at −y, lips that turn back at +y; bent from a strip, so outer corners are rounded round the same centres.
    private static Made C(ParametricDims d)
    {
        var (depth, width, wall, girth, inner) = (d.Length(3), d.Length(4), d.Length(5), d.Length(6), d.Optional(7));
        if (Positive(depth, width, wall, girth) is { } fault) return Wrong(fault);
        if (2 * wall >= Math.Min(depth, width) || girth <= wall || 2 * girth > depth) return Wrong(Thick);

        var (y, h, outer) = (width / 2, depth / 2, inner > 0 ? inner + wall : 0);
        return Outline("C", new RoundedPolygon()
            .Corner(-y, -h, outer).Corner(y, -h, outer).Corner(y, girth - h).Corner(y - wall, girth - h).Corner(y - wall, wall - h, inner)
            .Corner(wall - y, wall - h, inner).Corner(wall - y, h - wall, inner).Corner(y - wall, h - wall, inner).Corner(y - wall, h - girth)
            .Corner(y, h - girth).Corner(y, h, outer).Corner(-y, h, outer), []);
    }

    // The bottom flange points to +y, the top one to −y; FlangeWidth runs from the far face of the web.
    private static Made Z(ParametricDims d)
    {
        var (depth, flangeWidth, web, flange, root, edge) = (d.Length(3), d.Length(4), d.Length(5), d.Length(6), d.Optional(7), d.Optional(8));
        if (Positive(depth, flangeWidth, web, flange) is { } fault) return Wrong(fault);
        if (web >= flangeWidth || 2 * flange >= depth) return Wrong(Thick);

        var (w, y, h) = (web / 2, flangeWidth - web / 2, depth / 2);
        return Outline("Z", new RoundedPolygon()
            .Corner(-w, -h).Corner(y, -h).Corner(y, flange - h, edge).Corner(w, flange - h, root).Corner(w, h)
            .Corner(-y, h).Corner(-y, h - flange, edge).Corner(-w, h - flange, root), []);
    }

    private static Made Ellipse(ParametricDims d)
    {
        var (a, b) = (d.Length(3), d.Length(4));
        if (Positive(a, b) is { } fault) return Wrong(fault);
        if (Math.Abs(a / b - 1) < 1e-9) return new Made(new Round(a), Vector3.Zero, [], null);

        return OfRing("ellipse", EllipseRing.Of(a, b, out var deviation),
            [string.Create(CultureInfo.InvariantCulture, $"the ellipse is evaluated as {EllipseRing.Arcs} arcs, nowhere further from it than {deviation * 1e3:0.#####} mm")]);
    }

    private static Made Trapezium(ParametricDims d)
    {
        var (bottom, top, depth, offset) = (d.Length(3), d.Length(4), d.Length(5), d.Length(6));
        if (Positive(bottom, top, depth) is { } fault) return Wrong(fault);
        if (!double.IsFinite(offset)) return Wrong("its top edge has no place");
        if (Math.Abs(offset) < 1e-9 * bottom && Math.Abs(top / bottom - 1) < 1e-9) return new Made(new Rectangle(bottom, depth), Vector3.Zero, [], null);

        // From the bottom's left end; the origin is the middle of what both edges span.
        var (least, most) = (Math.Min(0, offset), Math.Max(bottom, offset + top));
        var (middle, h) = ((least + most) / 2, depth / 2);
        ImmutableArray<string> notes = Math.Abs(middle - bottom / 2) > 1e-9 * bottom ? ["the top edge overhangs the bottom one: the profile is centred on its bounding box"] : [];
        return Outline("trapezium", new RoundedPolygon()
            .Corner(-middle, -h).Corner(bottom - middle, -h).Corner(offset + top - middle, h).Corner(offset - middle, h), notes);
    }

    private static Made Open(OpenShape shape, double depth, double width, double web, double flange, double root)
    {
        if (OpenProfile.Fault(shape, depth, width, web, flange, root) is { } fault) return new Made(null, Vector3.Zero, [], fault);

        var profile = new OpenProfile(shape, depth, width, web, flange, root);
        return new Made(profile, new Vector3(profile.CentroidY - width / 2, profile.CentroidZ - depth / 2, 0), [], null);
    }

    private static Made Outline(string label, RoundedPolygon polygon, ImmutableArray<string> notes) =>
        polygon.Ring() is { } ring ? OfRing(label, ring, notes) : Wrong("a rounding does not fit between its neighbours");

    private static Made OfRing(string label, ImmutableArray<OutlineVertex> ring, ImmutableArray<string> notes) =>
        OutlineShapes.Of(label, [ring], out var centroid, out var fault) is { } section ? new Made(section, centroid, notes, null) : Wrong(fault);

    private const string Thick = "the walls are as thick as the profile";

    private static string? Positive(params ReadOnlySpan<double> dimensions)
    {
        foreach (var dimension in dimensions)
            if (!double.IsFinite(dimension) || dimension <= 0)
                return "a dimension is absent or not above zero";
        return null;
    }

    private static Made Wrong(string message) => new(null, Vector3.Zero, [], new SectionFault(message == Thick ? SectionFaultKind.WallOverRadius : SectionFaultKind.NotSimple, message));
}
