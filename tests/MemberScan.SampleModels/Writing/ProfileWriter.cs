using MemberScan.Mechanics.Sections;

namespace MemberScan.SampleModels.Writing;

/// <summary>Writes profiles; dimensions in metres.</summary>
public sealed class ProfileWriter
{
    private readonly ModelWriter _model;

    internal ProfileWriter(ModelWriter model) => _model = model;

    /// <summary>The profile of a section: width along the profile's X axis, depth along its Y axis. Corner radii of zero are left out.</summary>
    public int Of(CrossSection section, string? name = null) => section switch
    {
        Round round => Circle(round.Radius, name),
        Tube tube => CircleHollow(tube.OuterRadius, tube.Wall, name),
        Rectangle rectangle => Rectangle(rectangle.Width, rectangle.Depth, name),
        RoundedRectangle rounded => RoundedRectangle(rounded.Width, rounded.Depth, rounded.CornerRadius, name),
        Box box => RectangleHollow(box.Width, box.Depth, box.Wall, Radius(box.InnerRadius), Radius(box.OuterRadius), name),
        _ => throw new ArgumentException($"No profile for {section.Kind}.", nameof(section)),
    };

    /// <summary>IfcCircleProfileDef.</summary>
    public int Circle(double radius, string? name = null) => Add("IFCCIRCLEPROFILEDEF", name, Length(radius));

    /// <summary>IfcCircleHollowProfileDef; the radius is the outer one.</summary>
    public int CircleHollow(double radius, double wall, string? name = null) => Add("IFCCIRCLEHOLLOWPROFILEDEF", name, Length(radius), Length(wall));

    /// <summary>IfcRectangleProfileDef.</summary>
    public int Rectangle(double xDim, double yDim, string? name = null) => Add("IFCRECTANGLEPROFILEDEF", name, Length(xDim), Length(yDim));

    /// <summary>IfcRoundedRectangleProfileDef.</summary>
    public int RoundedRectangle(double xDim, double yDim, double radius, string? name = null) =>
        Add("IFCROUNDEDRECTANGLEPROFILEDEF", name, Length(xDim), Length(yDim), Length(radius));

    /// <summary>IfcRectangleHollowProfileDef; a radius of null is left out.</summary>
    public int RectangleHollow(double xDim, double yDim, double wall, double? innerRadius = null, double? outerRadius = null, string? name = null) =>
        Add("IFCRECTANGLEHOLLOWPROFILEDEF", name, Length(xDim), Length(yDim), Length(wall), Optional(innerRadius), Optional(outerRadius));

    /// <summary>IfcIShapeProfileDef with parallel flanges.</summary>
    public int IShape(double width, double depth, double web, double flange, double? fillet = null, string? name = null)
    {
        string[] own = [Length(width), Length(depth), Length(web), Length(flange), Optional(fillet)];
        return Add("IFCISHAPEPROFILEDEF", name, _model.Schema == SchemaVersion.Ifc2X3 ? own : [.. own, Spelling.Unset, Spelling.Unset]);
    }

    private static double? Radius(double radius) => radius > 0 ? radius : null;

    private string Length(double metres) => _model.Units.LengthText(metres);

    private string Optional(double? metres) => metres is { } value ? Length(value) : Spelling.Unset;

    private int Add(string keyword, string? name, params ReadOnlySpan<string> own)
    {
        // The position is mandatory in IFC2X3 alone.
        var position = _model.Schema == SchemaVersion.Ifc2X3
            ? Spelling.Reference(_model.AddOnce("IFCAXIS2PLACEMENT2D", Spelling.Reference(_model.AddOnce("IFCCARTESIANPOINT", "(0.,0.)")), Spelling.Unset))
            : Spelling.Unset;
        return _model.AddOnce(keyword, [Spelling.Literal("AREA"), Spelling.Text(name), position, .. own]);
    }
}
