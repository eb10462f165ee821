using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Frames;
using MemberScan.Model.Frames.Loads;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Frames;

/// <summary>Load cases and combinations of analysis models as situations of their frames, in the three schemas.</summary>
public sealed class LoadTests
{
    private static readonly Vector3 s_end = new(2, 0, 0);

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_combination_carries_its_factors_and_a_single_case_none(Release release)
    {
        var read = Loaded(release, (writer, bar, node) =>
        {
            var (dead, live) = (writer.Case("Dead", onTop: false), writer.Case("Live", onTop: false));
            writer.LineAction(bar, dead, new(0, 0, -100));
            writer.PointAction(node, live, new(0, 0, -500));
            writer.Combination("CO1", "ULS", (dead, 1.35), (live, 1.5));
        });

        Assert.True(read.HasLoads);
        Assert.Equal(["Dead", "Live", "CO1"], read.Cases.Select(c => c.Situation.Name).OrderBy(n => n == "CO1").ThenBy(n => n, StringComparer.Ordinal));
        Assert.Equal([false, false, true], read.Cases.OrderBy(c => c.Situation.Name == "CO1").Select(c => c.Situation.ActsInFull));
        var combination = SituationOf(read, "CO1");
        Near.Vector(new(0, 0, -135), Assert.Single(combination.LineLoads).ForceFrom);
        Near.Vector(new(0, 0, -750), Assert.Single(combination.NodeLoads).Force);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Point_loads_lie_where_their_vertex_lies_and_local_components_follow_the_members_axes(Release release)
    {
        var read = Loaded(release, (writer, bar, _) =>
        {
            var live = writer.Case("Live");
            writer.PointAction(bar, live, new(0, 0, -500), new(0, 30, 0), new(0.5, 0, 0));
            writer.PointAction(bar, live, new(10, 20, 0), place: new(1.5, 0, 0), inGlobalAxes: false);
        });

        // y = z × x: the member along X with z up has y along global Y.
        var loads = SituationOf(read, "Live").PointLoads;
        Assert.Equal([0.5, 1.5], loads.Select(l => Math.Round(l.At, 9)));
        Near.Vector(new(0, 0, -500), loads[0].Force);
        Near.Vector(new(0, 30, 0), loads[0].Moment);
        Near.Vector(new(10, 20, 0), loads[1].Force);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Loads_follow_a_shared_placement_that_is_moved_and_turned(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing", Bars.Askew);
        var bar = writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        Frames.Steel(model, writer, bar);
        writer.LineAction(bar, writer.Case("Live"), new(0, 0, -100));
        writer.Finish();

        var load = Assert.Single(SituationOf(Frames.Read(model), "Live").LineLoads);

        Near.Vector(Bars.Askew.Direction(new(0, 0, -100)), load.ForceFrom);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_projected_load_on_an_inclined_member_is_less_by_the_cosine_of_its_slope(Release release)
    {
        // 3-4-5: the member rises 3 m over 4 m, so a snow-like load of 100 N per metre of ground is 80 N per metre of member.
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var bar = writer.Member("Strut", Vector3.Zero, new(4, 0, 3), Vector3.UnitZ);
        Frames.Steel(model, writer, bar);
        writer.LineAction(bar, writer.Case("Snow"), new(0, 0, -100), isProjected: true);
        writer.Finish();

        Near.Vector(new(0, 0, -80), Assert.Single(SituationOf(Frames.Read(model), "Snow").LineLoads).ForceFrom);
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_poly_linear_load_is_cut_where_the_member_is_parted(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var node = writer.Node("Middle", new(0.5, 0, 0));
        var bar = writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        Frames.Steel(model, writer, bar);
        writer.Join(bar, node);
        writer.CurveAction(bar, writer.Case("Live"), true, (0.25, new(0, 0, 0)), (1.25, new(0, 0, -100)), (2, new(0, 0, -100)));
        writer.Finish();

        var loads = SituationOf(Frames.Read(model), "Live").LineLoads;

        // From 0.25 m to the node at 0.5 m: 0 to −25; on the second part from there to −100 at 1.25 m, then constant.
        Assert.Equal([(0, 0.25, 0.5), (1, 0, 0.75), (1, 0.75, 1.5)], loads.Select(l => (l.Member, Math.Round(l.From!.Value, 9), Math.Round(l.To!.Value, 9))));
        Assert.Equal([(0, -25), (-25, -100), (-100, -100)], loads.Select(l => (Math.Round(l.ForceFrom.Z, 9) + 0.0, Math.Round(l.ForceTo.Z, 9))));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Self_weight_acts_with_the_density_of_steel_where_the_model_gives_none_and_says_so(Release release)
    {
        var read = Loaded(release, (writer, _, _) => writer.Case("Dead", new(0, 0, -1)));

        Assert.Equal(new(0, 0, -1), SituationOf(read, "Dead").SelfWeight);
        Reading.AssertNear(7850 * 9.80665, read.Frame!.Members[0].Material.UnitWeight);
        Assert.Contains(read.Notes, n => n.Contains("7850 kg/m³", StringComparison.Ordinal));
        Assert.Contains(Assert.Single(read.Cases).Notes, n => n.Contains("9.80665", StringComparison.Ordinal));
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_forced_displacement_moves_a_support_that_is_held_and_is_refused_elsewhere(Release release)
    {
        var model = Frames.Model(release);
        var writer = new FrameWriter(model, "Landing");
        var held = writer.Node("A", Vector3.Zero, writer.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "free"));
        Frames.Steel(model, writer, writer.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ));
        writer.Movement(held, writer.Case("Settlement"), "$", "$", "-8.", "$", "$", "$");
        writer.Movement(held, writer.Case("Turn"), "$", "$", "$", "$", "$", "0.01");
        writer.Finish();

        var read = Frames.Read(model);

        var movement = Assert.Single(SituationOf(read, "Settlement").Movements);
        Assert.Equal((0, Model.Frames.Direction.Uz, -0.008), (movement.Node, movement.Direction, Math.Round(movement.Value, 9)));
        Assert.Contains("does not hold it rigidly", read.Cases.Single(c => c.Situation.Name == "Turn").Unusable!.Message, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_planar_action_is_told_as_not_covered_and_bars_its_situation_alone(Release release)
    {
        var read = Loaded(release, (writer, bar, node) =>
        {
            writer.PlanarAction(bar, writer.Case("Wind"), new(0, 0, -1));
            writer.PointAction(node, writer.Case("Live"), new(0, 0, -1));
        });

        var wind = read.Cases.Single(c => c.Situation.Name == "Wind");
        Assert.Equal(ReasonCode.ForcesIncomplete, wind.Unusable!.Code);
        Assert.Contains("IFCSTRUCTURALPLANARACTION", wind.Unusable.Message, StringComparison.Ordinal);
        Assert.Null(read.Cases.Single(c => c.Situation.Name == "Live").Unusable);
    }

    [Fact]
    public void A_change_of_temperature_needs_the_thermal_expansion()
    {
        var read = Loaded(Release.Ifc4, (writer, bar, _) => writer.Temperature(bar, writer.Case("Summer"), 30));

        Assert.Contains("thermal expansion", Assert.Single(read.Cases).Unusable!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_coefficient_that_is_left_out_makes_the_factors_unknown()
    {
        var read = Loaded(Release.Ifc4, (writer, _, node) => writer.PointAction(node, writer.Case("Live", coefficient: "$"), new(0, 0, -1)));

        Assert.Contains("leaves out its coefficient", Assert.Single(read.Cases).Unusable!.Message, StringComparison.Ordinal);
    }

    private static FrameSituation SituationOf(AnalysisFrame read, string name)
    {
        Assert.Empty(read.Refusals);
        var number = read.Cases.Select(c => c.Situation.Name).ToList().IndexOf(name);
        Assert.Null(read.Cases[number].Unusable);
        return read.Frame!.Situations[number];
    }

    private static AnalysisFrame Loaded(Release release, Action<FrameWriter, int, int> load) => Frames.Bar(release, (writer, bar, nodes) =>
    {
        writer.Join(bar, nodes.A);
        writer.Join(bar, nodes.B);
        load(writer, bar, nodes.B);
    });
}
