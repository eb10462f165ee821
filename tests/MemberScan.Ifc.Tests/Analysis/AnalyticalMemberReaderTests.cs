using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Analysis;

/// <summary>Axes of curve members: IFC documentation of IfcStructuralCurveMember (Axis gives local z, y = z × x) and, for IFC2X3, of IfcOrientationSelect.</summary>
public sealed class AnalyticalMemberReaderTests
{
    private static readonly Vector3 s_end = new(3, 0, 0);

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Axis_gives_the_side_of_z_and_need_not_be_square(Release release)
    {
        var axes = Reading.Value(Member(release, model => Lines.Edge(model, Vector3.Zero, s_end), new Vector3(5, 0, 2)).Axes);

        Near.Vector(Vector3.UnitX, axes.X);
        Near.Vector(Vector3.UnitZ, axes.Z);
        Near.Vector(Vector3.UnitY, axes.Y);
    }

    [Fact]
    public void A_placement_of_the_member_moves_and_turns_its_line_and_its_Axis()
    {
        var model = Bars.Model(Release.Ifc4);
        Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.UnitX, new Vector3(1, 0, 2)), Vector3.UnitY, model.LocalPlacement(Bars.Askew));

        var member = Reading.Of(model).Only;

        var axes = Reading.Value(member.Axes);
        Near.Vector(Bars.Askew.Point(Vector3.UnitX), axes.Origin);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitZ), axes.X);
        Near.Vector(Bars.Askew.Direction(Vector3.UnitY), axes.Z);
        Reading.AssertNear(2, Reading.Value(member.Length));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void An_Axis_that_is_missing_or_lies_along_the_member_leaves_the_axes_unknown(bool isMissing)
    {
        var member = Member(Release.Ifc4, model => Lines.Edge(model, Vector3.Zero, s_end), isMissing ? null : new Vector3(-2, 0, 0));

        Assert.Equal(ReasonCode.AxesUnknown, Reading.Why(member.Axes).Code);
        Reading.AssertNear(3, Reading.Value(member.Length));
    }

    [Theory]
    [InlineData("edge curve")]
    [InlineData("oriented edge")]
    public void An_edge_against_its_curve_is_told_and_x_follows_the_curve(string kind)
    {
        var reading = Of(model =>
        {
            var (start, end) = (Bars.Ref(Lines.Vertex(model, Vector3.Zero)), Bars.Ref(Lines.Vertex(model, s_end)));
            if (kind == "oriented edge") return model.Add("IFCORIENTEDEDGE", "*", "*", Bars.Ref(model.Add("IFCEDGE", end, start)), ".F.");

            var line = model.Add("IFCPOLYLINE", Bars.Refs(model.Point(s_end), model.Point(Vector3.Zero)));
            return model.Add("IFCEDGECURVE", start, end, Bars.Ref(line), ".F.");
        });

        Near.Vector(-Vector3.UnitX, Reading.Value(reading.Only.Axes).X);
        Near.Vector(s_end, Reading.Value(reading.Only.Axes).Origin);
        reading.AssertTold("IFC-0020", Severity.Warning, "follows the curve");
    }

    [Fact]
    public void Straight_edge_curves_are_read_and_curved_ones_are_not()
    {
        static int Edge(ModelWriter model, string keyword, params string[] own) => model.Add("IFCEDGECURVE",
            Bars.Ref(Lines.Vertex(model, Vector3.Zero)), Bars.Ref(Lines.Vertex(model, s_end)), Bars.Ref(model.Add(keyword, own)), ".T.");

        var straight = Member(Release.Ifc4, model => Edge(model, "IFCLINE", Bars.Ref(model.Point(Vector3.Zero)), "$"), Vector3.UnitZ);
        var curved = Member(Release.Ifc4, model => Edge(model, "IFCCIRCLE", "$", "3000."), Vector3.UnitZ);

        Reading.AssertNear(3, Reading.Value(straight.Length));
        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(curved.Length).Code);
        Assert.False(curved.Axes.TryGet(out _, out _));
    }

    [Fact]
    public void An_edge_without_length_or_vertex_and_a_member_without_an_edge_have_no_line()
    {
        var point = Member(Release.Ifc4, model => Lines.Edge(model, s_end, s_end), Vector3.UnitZ);
        var lost = Member(Release.Ifc4, model => model.Add("IFCEDGE", Bars.Ref(Lines.Vertex(model, s_end)), "#999999"), Vector3.UnitZ);
        var none = Member(Release.Ifc4, model => Lines.Vertex(model, s_end), Vector3.UnitZ);

        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(point.Length).Code);
        Assert.Equal(ReasonCode.DamagedRecord, Reading.Why(lost.Length).Code);
        Assert.Equal(ReasonCode.LengthAmbiguous, Reading.Why(none.Length).Code);
    }

    [Theory]
    [InlineData("beam", "none", 0, 0, 1)]
    [InlineData("beam", "direction", 0, -1, 0)]
    [InlineData("beam", "30", 0, 0.5, 0.86602540378443865)]
    [InlineData("column", "none", 1, 0, 0)]
    [InlineData("column", "30", 0.86602540378443865, -0.5, 0)]
    public void Orientation_in_IFC2X3_comes_from_profile_properties_or_the_default(string kind, string orientation, double x, double y, double z)
    {
        // (0, sin β, cos β) for a beam along X, (cos β, −sin β, 0) for a column: documentation of IfcOrientationSelect, IFC2X3.
        var model = Bars.Model(Release.Ifc2X3);
        var member = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, kind == "beam" ? s_end : new Vector3(0, 0, 3)), null);
        var properties = model.Add("IFCGENERALPROFILEPROPERTIES", "$", Bars.Ref(model.Profiles.Of(Bars.Flat)), "$", "$", "$", "$", "$");
        var given = orientation switch
        {
            "none" => "$",
            "direction" => Bars.Ref(model.Direction(new Vector3(3, -2, 0))),
            _ => Spelling.Typed("IFCPLANEANGLEMEASURE", Part21.Part21Text.Real(Math.PI / 6)),
        };
        model.Rooted("IFCRELASSOCIATESPROFILEPROPERTIES", "P", null, Bars.Refs(member), Bars.Ref(properties), "$", given);

        var axes = Reading.Value(Reading.Of(model).Only.Axes);

        Near.Vector(new Vector3(x, y, z), axes.Z);
        Near.Vector(axes.Z.Cross(axes.X), axes.Y);
    }

    [Fact]
    public void A_member_of_IFC2X3_with_the_arguments_of_IFC4_keeps_its_Axis()
    {
        var model = Bars.Model(Release.Ifc2X3);
        var shape = Lines.CurveMember(model, "old", Lines.Edge(model, Vector3.Zero, s_end), null) - 1;
        model.Rooted("IFCSTRUCTURALCURVEMEMBER", "new", "new", "$", "$", Bars.Ref(shape), ".RIGID_JOINED_MEMBER.", Bars.Ref(model.Direction(Vector3.UnitY)));

        Near.Vector(Vector3.UnitY, Reading.Value(Reading.Of(model).Named("new").Axes).Z);
    }

    private static Member Member(Release release, Func<ModelWriter, int> edge, Vector3? axis)
    {
        var model = Bars.Model(release);
        Lines.CurveMember(model, "L", edge(model), axis);
        return Reading.Of(model).Only;
    }

    private static Reading Of(Func<ModelWriter, int> edge)
    {
        var model = Bars.Model(Release.Ifc4);
        Lines.CurveMember(model, "L", edge(model), Vector3.UnitZ);
        return Reading.Of(model);
    }
}
