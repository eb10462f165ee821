using MemberScan.Foundation.Geometry;
using MemberScan.Model.Loads;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Analysis.Loads;

/// <summary>Loads of a rail of 3 m along x; the file is in millimetres and newtons, so 2 N/mm are 2000 N/m.</summary>
public sealed class MemberLoadReaderTests
{
    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_linear_action_lies_along_the_whole_member(Release release)
    {
        var model = Bars.Model(release);
        var (rail, live) = Rail(model);
        var action = Actions.Linear(model, rail, live, "-2.", projected: ".PROJECTED_LENGTH.");

        var load = Assert.Single(new ReadLoads(model).On(rail));

        Assert.Null(load.Unusable);
        Assert.Equal((LoadShape.Linear, LoadAxes.Project, true, 0.0, 3.0), (load.Shape, load.Axes, load.IsProjected, load.From, load.To));
        Assert.Equal(((ulong)action, (ulong)rail), (load.Action, load.Member));
        Assert.Equal([(ulong)live], load.Groups);
        Near.Vector(new Vector3(0, 0, -2000), load.Start.Force);
        Assert.Equal(load.Start, load.End);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_point_action_lies_at_its_vertex_and_without_one_is_not_used(Release release)
    {
        var model = Bars.Model(release);
        var (rail, live) = Rail(model);
        Actions.Point(model, rail, live, Lines.SingleForce(model, "1.", "-2000.", "$", "5000.", "$", "$"), Lines.Vertex(model, new Vector3(1.2, 0, 0)));
        Actions.Point(model, rail, live, Lines.SingleForce(model, "1.", "2.", "3.", "$", "$", "$"), vertex: null);

        var loads = new ReadLoads(model).On(rail);

        Assert.Equal((LoadShape.Point, LoadAxes.Member, 1.2), (loads[0].Shape, loads[0].Axes, Math.Round(loads[0].From, 12)));
        Near.Vector(new Vector3(1, -2000, 0), loads[0].Start.Force);
        Near.Vector(new Vector3(5, 0, 0), loads[0].Start.Couple);
        Assert.Equal(ReasonCode.ForcesIncomplete, loads[1].Unusable!.Code);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Curve_actions_of_every_kind_are_read_or_told(Release release)
    {
        var model = Bars.Model(release);
        var (rail, live) = Rail(model);
        var (one, three) = (Actions.LinearForce(model, "$", "$", "-1.", "$", "$", "$"), Actions.LinearForce(model, "$", "$", "-3.", "$", "$", "$"));
        var force = Lines.SingleForce(model, "$", "$", "-500.", "$", "$", "$");
        Actions.Curve(model, rail, live, Lines.Samples(model, [one, three], "0.", "1000."), "LINEAR");
        Actions.Curve(model, rail, live, Lines.Samples(model, [one, three, one], "0.", "1000.", "3000."), "POLYGONAL");
        Actions.Curve(model, rail, live, Lines.Samples(model, [force, force], "1000.", "2000."), "DISCRETE");
        Actions.Curve(model, rail, live, one, "SINUS");
        Actions.Curve(model, rail, live, three, "PARABOLA");
        Actions.Curve(model, rail, live, Actions.LinearForce(model, "1.", "$", "$", "$", "$", "$"), "CONST");
        Actions.Curve(model, rail, live, Lines.Samples(model, [one, one], null), "EQUIDISTANT");
        Actions.Curve(model, rail, live, Lines.Samples(model, [one, three], "0.", "4000."), "LINEAR");
        Actions.Curve(model, rail, live, Lines.Samples(model, [three, one], "1000.", "0."), "LINEAR");
        Actions.Curve(model, rail, live, force, "CONST");

        var loads = new ReadLoads(model).On(rail);

        (LoadShape Shape, double From, double To, double Start, double End)[] expected =
        [
            (LoadShape.Linear, 0, 1, -1000, -3000), (LoadShape.Linear, 0, 1, -1000, -3000), (LoadShape.Linear, 1, 3, -3000, -1000),
            (LoadShape.Point, 1, 1, -500, -500), (LoadShape.Point, 2, 2, -500, -500), (LoadShape.HalfSine, 0, 3, -1000, -1000), (LoadShape.Parabola, 0, 3, -3000, -3000),
            (LoadShape.Linear, 0, 3, 0, 0),
        ];
        Assert.Equal(expected, loads.Where(l => l.Unusable is null).Select(l => (l.Shape, Math.Round(l.From, 9), Math.Round(l.To, 9), Math.Round(l.Start.Force.Z, 6), Math.Round(l.End.Force.Z, 6))));
        Assert.Equal(4, loads.Count(l => l.Unusable is not null));
    }

    [Theory]
    [InlineData("line")]
    [InlineData("polyline")]
    [InlineData("points")]
    [InlineData("vertices")]
    public void A_varying_line_load_of_IFC2X3_is_linear_between_the_points_of_its_aspect(string kind)
    {
        var model = Bars.Model(Release.Ifc2X3);
        var (rail, live) = Rail(model);
        Actions.Varying(model, rail, live, Down(model, "-2."), Aspect(model, kind, 0, 1, 3), Down(model, "-4."), Down(model, "0."));

        var loads = new ReadLoads(model).On(rail);

        Assert.All(loads, l => Assert.Null(l.Unusable));
        Assert.Equal([(0, 1, -2000, -4000), (1, 3, -4000, 0)], loads.Select(l => (Math.Round(l.From, 9), Math.Round(l.To, 9), Math.Round(l.Start.Force.Z, 6), Math.Round(l.End.Force.Z, 6))));
    }

    [Fact]
    public void A_varying_line_load_without_a_place_for_each_value_is_told()
    {
        var model = Bars.Model(Release.Ifc2X3);
        var (rail, live) = Rail(model);
        Actions.Varying(model, rail, live, Down(model, "-2."), Aspect(model, "points", 0, 1, 3), Down(model, "-4."));
        Actions.Varying(model, rail, live, Down(model, "-2."), Aspect(model, "points", 0, 4), Down(model, "-4."));
        Actions.Varying(model, rail, live, Down(model, "-2."), Aspect(model, "points", 3, 0), Down(model, "-4."));
        Actions.Varying(model, rail, live, Down(model, "-2."), model.Add("IFCSHAPEASPECT", Bars.Refs(model.Add("IFCSHAPEREPRESENTATION",
            Bars.Ref(model.ReferenceContext), "'Reference'", "'Curve'", Bars.Refs(model.Direction(Vector3.UnitX)))), "$", "$", ".F.", "$"), Down(model, "-4."));

        var loads = new ReadLoads(model).On(rail);

        Assert.Equal(4, loads.Length);
        Assert.All(loads, l => Assert.Equal(ReasonCode.ForcesIncomplete, l.Unusable!.Code));
    }

    [Fact]
    public void A_projected_load_on_an_inclined_member_is_less_per_length_of_it()
    {
        // 3-4-5: the member rises 3 over a projection of 4 square to the load, so 4/5 of the load acts per length.
        var model = Bars.Model(Release.Ifc4);
        var strut = Lines.CurveMember(model, "strut", Lines.Edge(model, Vector3.Zero, new Vector3(4, 0, 3)), Vector3.UnitZ);
        var live = Actions.Case(model, "Q", "1.");
        Actions.Linear(model, strut, live, "-1.", projected: ".PROJECTED_LENGTH.");

        var read = new ReadLoads(model);
        var load = Assert.Single(read.On(strut));
        var own = load.Along(load.Start, Reading.Value(read.Member(strut).Axes));

        Near.Vector(new Vector3(-1000 * 0.8 * 0.6, 0, -1000 * 0.8 * 0.8), own.Force);
    }

    [Fact]
    public void Values_without_a_unit_and_foreign_values_are_told()
    {
        var model = Bars.Model(Release.Ifc4, leftOut: "LINEARFORCEUNIT");
        var (rail, live) = Rail(model);
        Actions.Linear(model, rail, live, "-2.");
        Actions.Curve(model, rail, live, model.Add("IFCSTRUCTURALLOADSINGLEDISPLACEMENT", "$", "1.", "$", "$", "$", "$", "$"), "CONST");

        var loads = new ReadLoads(model).On(rail);

        Assert.Equal([ReasonCode.UnitMissing, ReasonCode.ForcesIncomplete], loads.Select(l => l.Unusable!.Code));
    }

    private static int Down(ModelWriter model, string z) => Actions.LinearForce(model, "$", "$", z, "$", "$", "$");

    /// <summary>A shape aspect of places along X [m]: points on a line in file units, on a polyline of 1 m and 2 m, plain points, or vertices.</summary>
    private static int Aspect(ModelWriter model, string kind, params double[] places)
    {
        int Point(double x) => model.Point(new Vector3(x, 0, 0));
        var line = model.Add("IFCLINE", Bars.Ref(Point(0)), Bars.Ref(model.Add("IFCVECTOR", Bars.Ref(model.Direction(Vector3.UnitX)), "1.")));
        var polyline = model.Add("IFCPOLYLINE", Bars.Refs(Point(0), Point(1), Point(3)));
        int[] items = [.. places.Select(x => kind switch
        {
            "line" => model.Add("IFCPOINTONCURVE", Bars.Ref(line), Spelling.Real(1000 * x)),
            "polyline" => model.Add("IFCPOINTONCURVE", Bars.Ref(polyline), Spelling.Real(x <= 1 ? x : 1 + (x - 1) / 2)),
            "points" => Point(x),
            _ => Lines.Vertex(model, new Vector3(x, 0, 0)),
        })];
        var representation = model.Add(kind == "vertices" ? "IFCTOPOLOGYREPRESENTATION" : "IFCSHAPEREPRESENTATION", Bars.Ref(model.ReferenceContext), "'Reference'", "'Point'", Bars.Refs(items));
        return model.Add("IFCSHAPEASPECT", Bars.Refs(representation), "$", "$", ".F.", "$");
    }

    private static (int Rail, int Case) Rail(ModelWriter model) =>
        (Lines.CurveMember(model, "rail", Lines.Edge(model, Vector3.Zero, new Vector3(3, 0, 0)), Vector3.UnitZ), Actions.Case(model, "Q", "1."));
}
