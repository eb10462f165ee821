using MemberScan.Foundation.Geometry;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Geometry;

/// <summary>Rules for axes: functions IfcBuildAxes and IfcBaseAxis of the IFC schemas (z from Axis, x the part of RefDirection square to it).</summary>
public sealed class PlacementReaderTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_reference_direction_that_is_not_square_is_squared_and_no_length_matters(Release release)
    {
        var model = Bars.Model(release);
        var axes = Place(model, "(0.,0.,7.)", "(3.,0.,5.)");

        Near.Vector(Vector3.UnitX, axes.Y);
        Near.Vector(Vector3.UnitZ, axes.X);
    }

    [Theory]
    [InlineData("$", "$", 0, 0, 1, 1, 0, 0)]
    [InlineData("$", "(0.,1.,0.)", 0, 0, 1, 0, 1, 0)]
    [InlineData("(0.,1.,0.)", "$", 0, 1, 0, 1, 0, 0)]
    [InlineData("(1.,0.,0.)", "$", 1, 0, 0, 0, 1, 0)]
    [InlineData("(0.,0.,0.)", "(0.,0.,0.)", 0, 0, 1, 1, 0, 0)]
    [InlineData("(0.,0.,1.)", "(0.,0.,2.)", 0, 0, 1, 1, 0, 0)]
    public void Missing_zero_and_parallel_directions_take_the_defaults(string axis, string reference, double zx, double zy, double zz, double xx, double xy, double xz)
    {
        var axes = Place(Bars.Model(Release.Ifc4), axis, reference);

        Near.Vector(new Vector3(zx, zy, zz), axes.X);       // the bar runs along the placement's z, its y is the placement's x
        Near.Vector(new Vector3(xx, xy, xz), axes.Y);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_chain_of_placements_is_multiplied_from_the_outside_in(Release release)
    {
        var model = Bars.Model(release);
        var outer = model.LocalPlacement(Bars.Askew);
        var middle = model.LocalPlacement(new Transform3(new Vector3(1, 0, 0), Vector3.UnitY, Vector3.UnitZ, Vector3.UnitX), outer);
        var inner = model.LocalPlacement(new Transform3(new Vector3(0, 2, 0), Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ), middle);
        model.Element("IFCMEMBER", "R", inner, Shape(model));

        var axes = Reading.Value(Reading.Of(model).Only.Axes);

        // By hand: (0, 2, 0) in the middle frame is (1, 0, 2) in the outer one; its z is the outer X.
        Near.Vector(Bars.Askew.Point(new Vector3(1, 0, 2)), axes.Origin);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitX), axes.X);
    }

    [Fact]
    public void Circles_of_placements_end_with_a_reason_and_leave_the_section_known()
    {
        var model = Bars.Model(Release.Ifc4);
        var axes = Bars.Ref(model.AxisPlacement(Transform3.Identity));
        var self = model.Add("IFCLABELHOLDER") + 1;
        model.Add("IFCLOCALPLACEMENT", Bars.Ref(self), axes);
        model.Element("IFCMEMBER", "R", self, Shape(model));

        var member = Reading.Of(model).Only;

        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(member.Axes).Code);
        Assert.True(member.Section.TryGet(out _, out _));
    }

    [Fact]
    public void Placements_that_are_not_read_are_told_apart_and_children_inherit_the_reason()
    {
        var model = Bars.Model(Release.Ifc4X3);
        var line = model.Add("IFCLINEARPLACEMENT", "$", "$", "$");
        model.Element("IFCMEMBER", "on line", line, Shape(model));
        model.Element("IFCMEMBER", "child", model.LocalPlacement(Transform3.Identity, line), Shape(model));
        model.Element("IFCMEMBER", "on no crossing", model.Add("IFCGRIDPLACEMENT", "$", "$", "$"), Shape(model));
        model.Element("IFCMEMBER", "dangling", 999_999, Shape(model));
        model.Element("IFCMEMBER", "none", null, Shape(model));

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(reading.Named("on line").Axes).Code);
        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(reading.Named("child").Axes).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("on no crossing").Axes).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(reading.Named("dangling").Axes).Code);
        Near.Vector(Vector3.Zero, Reading.Value(reading.Named("none").Axes).Origin);
    }

    [Fact]
    public void A_linear_placement_is_taken_by_its_cartesian_position_unless_its_origin_is_in_doubt()
    {
        var model = Bars.Model(Release.Ifc4X3);
        var position = Bars.Ref(model.AxisPlacement(Bars.Askew));
        var moved = model.LocalPlacement(new Transform3(Vector3.UnitX, Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ));
        model.Element("IFCMEMBER", "alone", model.Add("IFCLINEARPLACEMENT", "$", "$", position), Shape(model));
        model.Element("IFCMEMBER", "at origin", model.Add("IFCLINEARPLACEMENT", Bars.Ref(model.LocalPlacement(Transform3.Identity)), "$", position), Shape(model));
        model.Element("IFCMEMBER", "in doubt", model.Add("IFCLINEARPLACEMENT", Bars.Ref(moved), "$", position), Shape(model));

        var reading = Reading.Of(model);

        Near.Vector(Bars.Askew.Origin, Reading.Value(reading.Named("alone").Axes).Origin);
        Near.Vector(Bars.Askew.Origin, Reading.Value(reading.Named("at origin").Axes).Origin);
        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(reading.Named("in doubt").Axes).Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_grid_placement_stands_where_its_axes_cross_moved_by_their_offsets(Release release)
    {
        // Axis A along +x at y = 2 m, run backwards; axis 1 along +y at x = 3 m. Offsets are to the left of each axis: A moves down, 1 moves to −x.
        var model = Bars.Model(release);
        var a = Axis(model, "A", new Vector3(0, 2, 0), new Vector3(9, 2, 0), ".F.");
        var one = Axis(model, "1", new Vector3(3, 0, 0), new Vector3(3, 9, 0), ".T.");
        var far = Axis(model, "2", new Vector3(0, 1, 0), new Vector3(9, 10, 0), ".T.");
        _ = model.Rooted("IFCGRID", "grid", "grid", "$", Bars.Ref(model.LocalPlacement(Bars.Askew)), "$", Bars.Refs(a), Bars.Refs(one, far), "$");
        var crossing = model.Add("IFCVIRTUALGRIDINTERSECTION", Bars.Refs(a, one), $"({model.Units.LengthText(0.5)},{model.Units.LengthText(0.25)},{model.Units.LengthText(1)})");
        var other = model.Add("IFCVIRTUALGRIDINTERSECTION", Bars.Refs(one, far), $"({model.Units.LengthText(0.25)},0.)");
        var parallel = model.Add("IFCVIRTUALGRIDINTERSECTION", Bars.Refs(a, a), "(0.,0.)");
        int Placed(int at, string reference) => release == Release.Ifc4X3 ? model.Add("IFCGRIDPLACEMENT", "$", Bars.Ref(at), reference) : model.Add("IFCGRIDPLACEMENT", Bars.Ref(at), reference);
        model.Element("IFCMEMBER", "along", Placed(crossing, "$"), Shape(model));
        model.Element("IFCMEMBER", "towards", Placed(crossing, Bars.Ref(other)), Shape(model));
        model.Element("IFCMEMBER", "parallel", Placed(parallel, "$"), Shape(model));

        var reading = Reading.Of(model);

        var along = Reading.Value(reading.Named("along").Axes);
        Near.Vector(Bars.Askew.Point(new Vector3(2.75, 1.5, 1)), along.Origin);
        Near.Vector(Bars.Askew.Direction(-Vector3.UnitX), along.Y);
        // The other crossing is at (2.75, 3.75), straight up from here.
        Near.Vector(Bars.Askew.Direction(Vector3.UnitY), Reading.Value(reading.Named("towards").Axes).Y);
        Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(reading.Named("parallel").Axes).Code);
    }

    private static int Axis(ModelWriter model, string tag, Vector3 from, Vector3 to, string sense) =>
        model.Add("IFCGRIDAXIS", Spelling.Text(tag), Bars.Ref(model.Add("IFCPOLYLINE", Bars.Refs(model.Point(from), model.Point(to)))), sense);

    [Theory]
    [InlineData(Instances.MaxDepth, true)]
    [InlineData(Instances.MaxDepth + 2, false)]
    public void A_chain_of_placements_longer_than_the_limit_is_not_supported(int links, bool isRead)
    {
        var model = Bars.Model(Release.Ifc4);
        int? placement = null;
        for (var i = 0; i < links; i++)
            placement = model.LocalPlacement(new Transform3(new Vector3(0, 0, 1), Vector3.UnitX, Vector3.UnitY, Vector3.UnitZ), placement);
        model.Element("IFCMEMBER", "R", placement, Shape(model));

        var axes = Reading.Of(model).Only.Axes;

        if (isRead) Near.Vector(new Vector3(0, 0, links), Reading.Value(axes).Origin);
        else Assert.Equal(ReasonCode.PlacementNotSupported, Reading.Why(axes).Code);
    }

    private static MemberAxes Place(ModelWriter model, string axis, string reference)
    {
        string Direction(string ratios) => ratios == "$" ? "$" : Bars.Ref(model.Add("IFCDIRECTION", ratios));
        var placement = model.Add("IFCAXIS2PLACEMENT3D", Bars.Ref(model.Point(Vector3.Zero)), Direction(axis), Direction(reference));
        model.Element("IFCMEMBER", "R", model.Add("IFCLOCALPLACEMENT", "$", Bars.Ref(placement)), Shape(model));
        return Reading.Value(Reading.Of(model).Only.Axes);
    }

    private static int Shape(ModelWriter model) => model.Bodies.Shape("SweptSolid", model.Bodies.Extrusion(model.Profiles.Of(Bars.Flat), 2));
}
