using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Analysis;

/// <summary>
/// A strut from (1, 0, 0) to (1, 2, 2) of a shared placement that is itself moved and turned. By hand, in the shared axes, with Axis = X:
/// x = (0, 1, 1)/√2, z = (1, 0, 0), y = z × x = (0, −1, 1)/√2.
/// </summary>
public sealed class ModelForcesReaderTests
{
    private static readonly double s_half = Math.Sqrt(0.5);

    private static readonly Vector3 s_start = new(1, 0, 0), s_end = new(1, 2, 2);

    private static readonly Vector3 s_x = new(0, s_half, s_half), s_y = new(0, -s_half, s_half), s_z = new(1, 0, 0);

    private static readonly double s_length = Math.Sqrt(8);

    private static readonly SectionForces s_first = new(-8000, 300, -1200, 45, 900, -150), s_last = new(-7600, 300, 800, 45, -700, 210);

    [Theory]
    [InlineData(Release.Ifc4, false)]
    [InlineData(Release.Ifc4, true)]
    [InlineData(Release.Ifc4X3, false)]
    [InlineData(Release.Ifc4X3, true)]
    public void Local_and_global_components_of_an_inclined_member_read_to_the_same_forces(Release release, bool inGlobalAxes)
    {
        var model = Bars.Model(release);
        var analysis = model.StartAnalysis("A", Bars.Askew);
        var line = analysis.CurveMember("S", s_start, s_end, s_z);
        var stored = inGlobalAxes ? (Global(s_first), Global(s_last)) : (s_first, s_last);
        analysis.CurveReaction(line, Combination(analysis), [new(0, stored.Item1), new(s_length, stored.Item2)], inGlobalAxes);

        var forces = Reading.Of(model).OnlyForces;

        Assert.Null(forces.Unusable);
        Near.Forces(s_first, forces.Stations[0].Forces);
        Near.Forces(s_last, forces.Stations[1].Forces);
        Reading.AssertNear(s_length, forces.Stations[1].X);
        Assert.Contains(inGlobalAxes ? "global axes" : "the analytical member's axes", forces.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(Release.Ifc4, false)]
    [InlineData(Release.Ifc4X3, true)]
    public void A_body_turned_about_x_takes_the_forces_in_its_own_axes(Release release, bool inGlobalAxes)
    {
        // The body's profile X lies 30° from the analytical y towards its z.
        var (sin, cos) = Math.SinCos(Math.PI / 6);
        var model = Bars.Model(release);
        var (analysis, body) = Linked(model, Body(model, s_start, s_x, cos * s_y + sin * s_z, s_length), s_start, s_end, out var line);
        analysis.CurveReaction(line, Combination(analysis), [new(0, inGlobalAxes ? Global(s_first) : s_first), new(s_length, inGlobalAxes ? Global(s_last) : s_last)], inGlobalAxes);

        var forces = Reading.Of(model).OnlyForces;

        Assert.True(body > 0);
        Near.Forces(
            new(-8000, 300 * cos - 1200 * sin, -1200 * cos - 300 * sin, 45, 900 * cos - 150 * sin, -150 * cos - 900 * sin), forces.Stations[0].Forces);
        Reading.AssertNear(s_length, forces.Stations[1].X);
        Assert.Contains("30°", forces.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_body_that_runs_the_other_way_takes_the_forces_of_the_opposite_face(Release release)
    {
        // Body x' = −x with profile X = y, so y' = y, z' = x' × y' = −z. The face of +x' carries the opposite vectors:
        // N' = N, Vy' = −Vy, Vz' = Vz, T' = T, My' = −My, Mz' = Mz; places run from the other end.
        var model = Bars.Model(release);
        var (analysis, _) = Linked(model, Body(model, s_end, -s_x, s_y, s_length), s_start, s_end, out var line);
        analysis.CurveReaction(line, Combination(analysis), [new(0, s_first), new(s_length, s_last)]);

        var forces = Reading.Of(model).OnlyForces;

        Near.Forces(new(-7600, -300, 800, 45, 700, 210), forces.Stations[0].Forces);
        Near.Forces(new(-8000, -300, -1200, 45, -900, -150), forces.Stations[1].Forces);
        Assert.True(Math.Abs(forces.Stations[0].X) < 1e-9);
        Reading.AssertNear(s_length, forces.Stations[1].X);
        Assert.Contains("x reversed", forces.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void Members_chained_on_one_body_join_in_order_and_keep_the_jump_at_their_node(bool reversedBody)
    {
        var middle = 0.5 * (s_start + s_end);
        var model = Bars.Model(Release.Ifc4);
        var (origin, along) = reversedBody ? (s_end, -s_x) : (s_start, s_x);
        var (analysis, _) = Linked(model, Body(model, origin, along, s_y, s_length), middle, s_end, out var second, s_start, middle, out var first);
        var group = Combination(analysis);
        analysis.CurveReaction(second, group, [new(0, new(-7000, 0, 0, 0, 0, 0)), new(s_length / 2, new(-7100, 0, 0, 0, 0, 0))]);
        analysis.CurveReaction(first, group, [new(0, new(-8000, 0, 0, 0, 0, 0)), new(s_length / 2, new(-8100, 0, 0, 0, 0, 0))]);

        var forces = Reading.Of(model).OnlyForces;

        double[] expected = reversedBody ? [-7100, -7000, -8100, -8000] : [-8000, -8100, -7000, -7100];
        Assert.Equal(expected, forces.Stations.Select(s => Math.Round(s.Forces.N, 6)));
        double[] places = [0, s_length / 2, s_length / 2, s_length];
        Assert.All(places.Zip(forces.Stations), pair => Assert.True(Math.Abs(pair.First - pair.Second.X) < 1e-9));
        Assert.Equal(1, ForceLine.Build(forces.Stations, s_length).Stations.Select(s => Math.Round(s.Forces.N, 6)).ToList().IndexOf(expected[1]));
    }

    [Theory]
    [InlineData(10, false, true)]
    [InlineData(5, false, true)]
    [InlineData(15, false, true)]
    [InlineData(8, false, false)]
    [InlineData(10, true, true)]
    [InlineData(5, true, false)]
    [InlineData(15, true, false)]
    public void A_line_along_another_cardinal_point_than_the_centroid_leaves_open_what_its_forces_are_about(int cardinalPoint, bool isChannel, bool isUsable)
    {
        // In a channel neither the middle of the bounding box (5) nor the shear centre (15) is the centroid (10).
        var model = Bars.Model(Release.Ifc4);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, new Vector3(2, 0, 0)), Vector3.UnitZ);
        var set = model.Materials.ProfileSet("flat", model.Materials.Material("S235JR"),
            isChannel ? model.Add("IFCUSHAPEPROFILEDEF", ".AREA.", "$", "$", "100.", "50.", "6.", "8.", "$", "$", "$") : model.Profiles.Of(Bars.Flat));
        var usage = model.Add("IFCMATERIALPROFILESETUSAGE", Bars.Ref(set), cardinalPoint.ToString(System.Globalization.CultureInfo.InvariantCulture), "$");
        model.Rooted("IFCRELASSOCIATESMATERIAL", "usage", null, Bars.Refs(line), Bars.Ref(usage));
        Lines.CurveReaction(model, line, Lines.SingleForce(model, "1.", "0.", "0.", "0.", "0.", "0."), Combination(model.StartAnalysis("landing", Transform3.Identity)), "CONST");

        var forces = Reading.Of(model).OnlyForces;

        Assert.Equal(isUsable, forces.Unusable is null);
        if (!isUsable) Assert.Contains($"cardinal point {cardinalPoint} ", forces.Unusable!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_line_beside_its_body_is_used_about_the_centroid_and_it_is_said()
    {
        var model = Bars.Model(Release.Ifc4);
        var body = Bars.Add(model, "rail", Bars.Rail, 2);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, new Vector3(0.012, 0, 0), new Vector3(0.012, 0, 2)), Vector3.UnitX);
        model.Rooted("IFCRELASSIGNSTOPRODUCT", "link", "Context", Bars.Refs(line), "$", Bars.Ref(body));
        Lines.CurveReaction(model, line, Lines.SingleForce(model, "5.", "0.", "0.", "0.", "0.", "0."), Combination(model.StartAnalysis("landing", Transform3.Identity)), "CONST");

        var forces = Reading.Of(model).OnlyForces;

        Assert.Contains("its line lies 12 mm beside the body's", forces.Conversion, StringComparison.Ordinal);
        Assert.All(forces.Stations, s => Assert.Equal(5, s.Forces.N, 1e-12));
    }

    [Fact]
    public void A_line_slightly_askew_lays_nothing_of_its_axial_force_into_shear()
    {
        var model = Bars.Model(Release.Ifc4);
        var body = Bars.Add(model, "rail", Bars.Flat, 2);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, new Vector3(0.02, 0, 2)), Vector3.UnitY);
        model.Rooted("IFCRELASSIGNSTOPRODUCT", "link", "Context", Bars.Refs(line), "$", Bars.Ref(body));
        Lines.CurveReaction(model, line, Lines.SingleForce(model, "10000.", "0.", "0.", "0.", "0.", "0."), Combination(model.StartAnalysis("landing", Transform3.Identity)), "CONST");

        var forces = Reading.Of(model).OnlyForces;

        Assert.All(forces.Stations, s => Assert.Equal(new SectionForces(10000, 0, 0, 0, 0, 0), s.Forces));
    }

    [Fact]
    public void A_warping_moment_is_left_out_and_it_is_said()
    {
        var model = Bars.Model(Release.Ifc4);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, new Vector3(2, 0, 0)), Vector3.UnitZ);
        var load = model.Add("IFCSTRUCTURALLOADSINGLEFORCEWARPING", "$", "1.", "0.", "0.", "0.", "0.", "0.", "3.5");
        Lines.CurveReaction(model, line, load, Combination(model.StartAnalysis("landing", Transform3.Identity)), "CONST");

        Assert.Contains("the warping moment is left out", Reading.Of(model).OnlyForces.Conversion, StringComparison.Ordinal);
    }

    [Fact]
    public void A_chain_with_a_link_that_has_no_results_is_not_used()
    {
        var (a, b) = (s_start + s_length / 3 * s_x, s_start + s_length * 2 / 3 * s_x);
        var model = Bars.Model(Release.Ifc4);
        var (analysis, body) = Linked(model, Body(model, s_start, s_x, s_y, s_length), s_start, a, out var first, b, s_end, out var last);
        analysis.Link(body, analysis.CurveMember("middle", a, b, s_z));
        var group = Combination(analysis);
        foreach (var line in new[] { first, last }) analysis.CurveReaction(line, group, [new(0, s_first), new(s_length / 3, s_first)]);

        var why = Reading.Of(model).OnlyForces.Unusable;

        Assert.Equal(ReasonCode.StationsTooCoarse, why!.Code);
        Assert.Contains("no results lie between 0.943 m and 1.886 m", why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_chain_whose_results_stop_short_of_a_node_is_not_used()
    {
        var middle = 0.5 * (s_start + s_end);
        var model = Bars.Model(Release.Ifc4);
        var (analysis, _) = Linked(model, Body(model, s_start, s_x, s_y, s_length), s_start, middle, out var first, middle, s_end, out var last);
        var group = Combination(analysis);
        analysis.CurveReaction(first, group, [new(0, s_first), new(s_length / 2 - 0.1, s_first)]);
        analysis.CurveReaction(last, group, [new(0, s_first), new(s_length / 2, s_first)]);

        Assert.Equal(ReasonCode.StationsTooCoarse, Reading.Of(model).OnlyForces.Unusable!.Code);
    }

    [Fact]
    public void Two_reactions_over_one_stretch_or_two_lines_over_one_body_are_not_used()
    {
        var model = Bars.Model(Release.Ifc4);
        var (analysis, _) = Linked(model, Body(model, s_start, s_x, s_y, s_length), s_start, s_end, out var line);
        var doubled = analysis.ResultGroup("R1", analysis.LoadCombination("doubled", "ULS"));
        analysis.CurveReaction(line, doubled, [new(0, s_first), new(s_length, s_last)]);
        analysis.CurveReaction(line, doubled, [new(0, s_last), new(s_length, s_first)]);
        var halves = analysis.ResultGroup("R2", analysis.LoadCombination("halves", "ULS"));
        analysis.CurveReaction(line, halves, [new(0, s_first), new(s_length / 2, s_last)]);
        analysis.CurveReaction(line, halves, [new(s_length / 2, s_last), new(s_length, s_first)]);

        var reading = Reading.Of(model);

        Assert.Equal(ReasonCode.ForcesIncomplete, reading.ForcesOf("strut", "doubled").Unusable!.Code);
        Assert.Null(reading.ForcesOf("strut", "halves").Unusable);
        Assert.Equal(4, reading.ForcesOf("strut", "halves").Stations.Length);
    }

    [Fact]
    public void Two_analytical_members_over_one_stretch_are_not_used()
    {
        var model = Bars.Model(Release.Ifc4);
        var (analysis, _) = Linked(model, Body(model, s_start, s_x, s_y, s_length), s_start, s_end, out var one, s_start, s_end, out var other);
        var group = Combination(analysis);
        foreach (var line in new[] { one, other }) analysis.CurveReaction(line, group, [new(0, s_first), new(s_length, s_first)]);

        Assert.Equal(ReasonCode.ForcesIncomplete, Reading.Of(model).OnlyForces.Unusable!.Code);
    }

    [Theory]
    [InlineData(0.03, true)]
    [InlineData(0.2, false)]
    public void A_body_may_stick_out_a_little_beyond_its_analytical_line_and_no_more(double beyond, bool isCovered)
    {
        // The flat is 60 mm wide: 2 % of 2.83 m is 56.6 mm, so one section extent, 60 mm, is the limit.
        var model = Bars.Model(Release.Ifc4);
        var (analysis, _) = Linked(model, Body(model, s_start - beyond * s_x, s_x, s_y, s_length + 2 * beyond), s_start, s_end, out var line);
        analysis.CurveReaction(line, Combination(analysis), [new(0, s_first), new(s_length, s_last)]);

        var forces = Reading.Of(model).OnlyForces;

        Reading.AssertNear(beyond, forces.Stations[0].X, 1e-6);
        Assert.True(Math.Abs((isCovered ? beyond : 0) - forces.From) < 1e-9);
        Reading.AssertNear(isCovered ? s_length + beyond : s_length + 2 * beyond, forces.To!.Value, 1e-9);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Without_an_Axis_a_round_bar_is_usable_and_a_flat_one_is_not(Release release)
    {
        var model = Bars.Model(release);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        var group = Combination(analysis);
        foreach (var (name, section) in new (string, CrossSection)[] { ("rail", Bars.Rail), ("flat", Bars.Flat) })
        {
            var line = Lines.CurveMember(model, name, Lines.Edge(model, Vector3.Zero, new Vector3(0, 0, 2)), axis: null);
            analysis.Link(Bars.Add(model, name, section, 2), line);
            analysis.CurveReaction(line, group, [new(0, s_first), new(2, s_last)]);
        }

        var reading = Reading.Of(model);

        var round = reading.ForcesOf("rail");
        Assert.Null(round.Unusable);
        var f = round.Stations[0].Forces;
        Reading.AssertNear(-8000, f.N);
        Reading.AssertNear(Math.Sqrt(300 * 300 + 1200 * 1200), Math.Sqrt(f.Vy * f.Vy + f.Vz * f.Vz));
        Reading.AssertNear(900.0 * 300 + -150.0 * -1200 - 0, f.My * f.Vy + f.Mz * f.Vz);      // M·V does not change by a turn about x
        Assert.Equal(ReasonCode.AxesUnknown, reading.ForcesOf("flat").Unusable!.Code);
    }

    [Theory]
    [InlineData(Release.Ifc2X3, "IFCRELCONNECTSSTRUCTURALELEMENT")]
    [InlineData(Release.Ifc2X3, "product")]
    [InlineData(Release.Ifc4, "IFCRELCONNECTSSTRUCTURALELEMENT")]
    [InlineData(Release.Ifc4, "product")]
    [InlineData(Release.Ifc4, "reversed product")]
    [InlineData(Release.Ifc4X3, "product")]
    [InlineData(Release.Ifc4X3, "reversed product")]
    public void Links_of_both_generations_and_directions_lead_to_the_physical_element(Release release, string link)
    {
        var model = Bars.Model(release);
        var body = Bars.Add(model, "rail", Bars.Rail, 2);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, new Vector3(0, 0, 2)), Vector3.UnitX);
        var (first, second) = link == "reversed product" ? (body, line) : (line, body);
        if (link.Contains("product", StringComparison.Ordinal)) model.Rooted("IFCRELASSIGNSTOPRODUCT", "link", "Context", Bars.Refs(first), "$", Bars.Ref(second));
        else model.Rooted(link, "link", null, Bars.Ref(body), Bars.Ref(line));
        Ends(model, line, 2);

        var reading = Reading.Of(model);

        Assert.Equal("rail", reading.Only.Element.Name);
        Reading.AssertNear(-8000, reading.OnlyForces.Stations[0].Forces.N);
    }

    [Fact]
    public void Links_between_two_physical_or_two_analytical_objects_are_none()
    {
        var model = Bars.Model(Release.Ifc4);
        var (a, b) = (Bars.Add(model, "a", Bars.Rail, 2), Bars.Add(model, "b", Bars.Rail, 2));
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, Vector3.UnitZ), Vector3.UnitX);
        model.Rooted("IFCRELASSIGNSTOPRODUCT", "physical", null, Bars.Refs(a), "$", Bars.Ref(b));
        model.Rooted("IFCRELASSIGNSTOPRODUCT", "analytical", null, Bars.Refs(line), "$", Bars.Ref(line));

        Assert.Equal(["a", "b", "L"], Reading.Of(model).Catalog.Members.Select(m => m.Element.Name));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void An_analytical_member_goes_to_the_item_of_a_railing_that_it_runs_along(Release release)
    {
        var model = Bars.Model(release);
        int[] solids = [.. new[] { 0.0, 1.0, 2.0 }.Select(x => model.Bodies.SweptDisk([new Vector3(x, 0, 0), new Vector3(x, 0, 1.1)], 0.02))];
        var railing = model.Element("IFCRAILING", "railing", model.LocalPlacement(Bars.Askew), model.Bodies.Shape("AdvancedSweptSolid", solids));
        var analysis = model.StartAnalysis("A", Bars.Askew);
        var post = analysis.CurveMember("post", new Vector3(1.01, 0, 0), new Vector3(1.01, 0, 1.1), Vector3.UnitX);
        var stray = analysis.CurveMember("stray", new Vector3(1.5, 0, 0), new Vector3(1.5, 0, 1.1), Vector3.UnitX);
        analysis.Link(railing, post, stray);
        Ends(model, post, 1.1, Bars.Askew);

        var reading = Reading.Of(model);

        Assert.Equal(reading.Catalog.Members[1].Key, reading.OnlyForces.MemberKey);
        Assert.Equal(2, reading.Catalog.Members[1].ItemNumber);
        reading.AssertTold("IFC-0022", Severity.Warning, "none of the bodies");
    }

    [Fact]
    public void A_line_that_does_not_run_along_the_body_or_a_bent_body_is_not_used()
    {
        var model = Bars.Model(Release.Ifc4);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        var group = Combination(analysis);
        var bent = Bars.Add(model, "bent", model.Bodies.SweptDisk([Vector3.Zero, Vector3.UnitZ, new Vector3(1, 0, 1)], 0.02));
        foreach (var (name, body, end) in new[] { ("across", Bars.Add(model, "across", Bars.Rail, 2), new Vector3(0, 0.1, 2)), ("bent", bent, new Vector3(0, 0, 2)) })
        {
            var line = analysis.CurveMember(name, Vector3.Zero, end, Vector3.UnitX);
            analysis.Link(body, line);
            analysis.CurveReaction(line, group, [new(0, s_first), new(2, s_last)]);
        }

        var reading = Reading.Of(model);

        Assert.Contains("does not run along", reading.ForcesOf("across").Unusable!.Message, StringComparison.Ordinal);
        Assert.Contains("is bent", reading.ForcesOf("bent").Unusable!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Reactions_without_a_situation_or_a_member_are_told_and_not_used()
    {
        var model = Bars.Model(Release.Ifc4);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, Vector3.UnitX), Vector3.UnitZ);
        var load = Lines.SingleForce(model, "1.", "2.", "3.", "4.", "5.", "6.");
        Lines.CurveReaction(model, line, load, resultGroup: null, "CONST");
        var group = Combination(model.StartAnalysis("A", Transform3.Identity));
        var loose = model.Rooted("IFCSTRUCTURALCURVEREACTION", "loose", null, "$", "$", "$", Bars.Ref(load), ".LOCAL_COORDS.", ".CONST.");
        model.Rooted("IFCRELASSIGNSTOGROUP", "loose", null, Bars.Refs(loose), "$", Bars.Ref(group));

        var reading = Reading.Of(model);

        Assert.Empty(reading.Forces);
        reading.AssertTold("IFC-0023", Severity.Warning, "no result group");
        reading.AssertTold("IFC-0024", Severity.Warning, "connected to no member");
    }

    [Fact]
    public void A_reaction_on_the_element_itself_has_no_axes()
    {
        var model = Bars.Model(Release.Ifc4);
        var body = Bars.Add(model, "rail", Bars.Rail, 2, keyword: "IFCBUILDINGELEMENTPROXY");
        Lines.CurveReaction(model, body, Lines.SingleForce(model, "1.", "2.", "3.", "4.", "5.", "6."), Combination(model.StartAnalysis("A", Transform3.Identity)), "CONST");

        Assert.Equal(ReasonCode.AxesUnknown, Reading.Of(model).OnlyForces.Unusable!.Code);
    }

    [Fact]
    public void Point_reactions_of_IFC2X3_are_placed_by_their_vertices_and_global_there_means_the_project()
    {
        // No Axis in IFC2X3: the default z of an inclined member is the project's Z square to it.
        var model = Bars.Model(Release.Ifc2X3);
        var analysis = model.StartAnalysis("A", Bars.Askew);
        var line = analysis.CurveMember("S", s_start, s_end, s_z);
        var x = Bars.Askew.Direction(s_x);
        Assert.True((Vector3.UnitZ - Vector3.UnitZ.Dot(x) * x).TryNormalize(out var z));
        var force = -8000 * x + 300 * z.Cross(x) + -1200 * z;
        var moment = 45 * x + 900 * z.Cross(x) + -150 * z;
        var group = Combination(analysis);
        analysis.PointReaction(line, group, new(force.X, force.Y, force.Z, moment.X, moment.Y, moment.Z), s_end, inGlobalAxes: true);
        analysis.PointReaction(line, group, s_first, s_start);

        var stations = Reading.Of(model).OnlyForces.Stations.OrderBy(s => s.X).ToList();

        Assert.True(Math.Abs(stations[0].X) < 1e-9);
        Reading.AssertNear(s_length, stations[1].X);
        Near.Forces(s_first, stations[0].Forces);
        Near.Forces(new(-8000, 300, -1200, 45, 900, -150), stations[1].Forces);
    }

    [Fact]
    public void Point_reactions_at_one_place_of_a_reversed_body_swap_their_sides()
    {
        var model = Bars.Model(Release.Ifc4);
        var (analysis, _) = Linked(model, Body(model, s_end, -s_x, s_y, s_length), s_start, s_end, out var line);
        var group = Combination(analysis);
        var middle = 0.5 * (s_start + s_end);
        foreach (var (n, place) in new[] { (1.0, s_start), (2.0, middle), (3.0, middle), (4.0, s_end) }) analysis.PointReaction(line, group, new(n, 0, 0, 0, 0, 0), place);

        Assert.Equal([4, 3, 2, 1], Reading.Of(model).OnlyForces.Stations.Select(s => Math.Round(s.Forces.N, 9)));
    }

    private static int Combination(AnalysisWriter analysis) => analysis.ResultGroup("R", analysis.LoadCombination("CO1", "ULS"));

    /// <summary>The vectors of section forces in the shared axes, by hand.</summary>
    private static SectionForces Global(SectionForces f)
    {
        var force = f.N * s_x + f.Vy * s_y + f.Vz * s_z;
        var moment = f.T * s_x + f.My * s_y + f.Mz * s_z;
        return new(force.X, force.Y, force.Z, moment.X, moment.Y, moment.Z);
    }

    private static int Body(ModelWriter model, Vector3 origin, Vector3 along, Vector3 profileX, double length)
    {
        var frame = Bars.Frame(Bars.Askew.Point(origin), Bars.Askew.Direction(along), Bars.Askew.Direction(profileX));
        return Bars.Add(model, "strut", Bars.Flat, length, frame);
    }

    private static (AnalysisWriter Analysis, int Body) Linked(ModelWriter model, int body, Vector3 start, Vector3 end, out int line)
    {
        var analysis = model.StartAnalysis("A", Bars.Askew);
        line = analysis.CurveMember("one", start, end, s_z);
        analysis.Link(body, line);
        return (analysis, body);
    }

    private static (AnalysisWriter Analysis, int Body) Linked(
        ModelWriter model, int body, Vector3 start, Vector3 end, out int line, Vector3 otherStart, Vector3 otherEnd, out int other)
    {
        var (analysis, _) = Linked(model, body, start, end, out line);
        other = analysis.CurveMember("two", otherStart, otherEnd, s_z);
        analysis.Link(body, other);
        return (analysis, body);
    }

    // Point reactions exist in all schemas: one at each end of a line along z of its frame.
    private static void Ends(ModelWriter model, int line, double length, Transform3? frame = null)
    {
        var analysis = model.StartAnalysis("ends", frame ?? Transform3.Identity);
        var group = Combination(analysis);
        var x = frame is null ? 0 : 1.01;
        analysis.PointReaction(line, group, s_first, new Vector3(x, 0, 0));
        analysis.PointReaction(line, group, s_last, new Vector3(x, 0, length));
    }
}
