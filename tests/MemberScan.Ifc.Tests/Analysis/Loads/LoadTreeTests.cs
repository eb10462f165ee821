using MemberScan.Foundation.Geometry;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Analysis.Loads;

public sealed class LoadTreeTests
{
    /// <summary>
    /// Coefficients multiply along the chain, self-weight skips its case's own coefficient (documentation of IfcStructuralLoadCase): with a load of
    /// 2 kN and a self-weight of 1 kN in a case of coefficient 1.1, in a combination of coefficient 1.2: 1.2 · (1.1 · 2 + 1) = 3.84 kN.
    /// </summary>
    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Self_weight_is_not_multiplied_by_the_coefficient_of_its_case(Release release)
    {
        var model = Bars.Model(release);
        var rail = Rail(model);
        var live = Actions.Case(model, "Q", "1.1", "(0.,0.,-1.)");
        Actions.Point(model, rail, live, Lines.SingleForce(model, "0.", "0.", "-2000.", "0.", "0.", "0."), Lines.Vertex(model, Vector3.UnitX), ".GLOBAL_COORDS.");
        var combination = Actions.Group(model, "CO1", "LOAD_COMBINATION", "1.2");
        Actions.Assign(model, combination, null, live);
        const double Weight = 1000;

        var read = new ReadLoads(model);
        var acting = read.Tree.ActionsOf((ulong)combination);

        Assert.Null(acting.Why);
        var load = Assert.Single(read.On(rail));
        var total = acting.Of(load) * load.Start.Force + Weight * acting.SelfWeight;
        Near.Vector(new Vector3(0, 0, -3840), total, 1e-15);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void Factors_of_nested_groups_multiply(Release release)
    {
        // IFC2X3: combination 1.2 × combination group 1.5 × case 1.1 × group 0.5; later the relation carries the 1.5.
        var model = Bars.Model(release);
        var rail = Rail(model);
        var live = Actions.Case(model, "Q", "1.1");
        var crowd = Actions.Group(model, "crowd", "LOAD_GROUP", "0.5");
        Actions.Linear(model, rail, crowd, "-2.");
        var combination = Actions.Group(model, "CO1", "LOAD_COMBINATION", "1.2");
        Actions.Assign(model, live, null, crowd);
        if (release == Release.Ifc2X3)
        {
            var inner = Actions.Group(model, "CO1 × 1.5", "LOAD_COMBINATION_GROUP", "1.5");
            Actions.Assign(model, inner, null, live);
            Actions.Assign(model, combination, null, inner);
        }
        else
        {
            Actions.Assign(model, combination, "1.5", live);
        }

        var read = new ReadLoads(model);

        Reading.AssertNear(1.2 * 1.5 * 1.1 * 0.5, read.Tree.ActionsOf((ulong)combination).Of(Assert.Single(read.On(rail))), 1e-15);
    }

    [Theory]
    [MemberData(nameof(Schemas.All), MemberType = typeof(Schemas))]
    public void A_coefficient_that_is_left_out_is_not_known_unless_the_settings_say_that_it_is_1(Release release)
    {
        var model = Bars.Model(release);
        var live = Actions.Case(model, "Q", "1.");
        var combination = Actions.Group(model, "CO1", "LOAD_COMBINATION", "$");
        Actions.Assign(model, combination, null, live);

        var refused = new ReadLoads(model).Tree.ActionsOf((ulong)combination);
        var asOne = new ReadLoads(model, new ForceRules { MissingCoefficientsAreOne = true }).Tree.ActionsOf((ulong)combination);

        Assert.Equal(ReasonCode.NoCombination, refused.Why!.Code);
        Assert.Contains("leaves out its coefficient", refused.Why.Message, StringComparison.Ordinal);
        Assert.Empty(refused.Groups);
        Assert.Equal([1.0, 1.0], asOne.Groups.Select(g => g.Factor));
    }

    [Fact]
    public void Groups_in_a_ring_or_twice_in_one_are_told()
    {
        var model = Bars.Model(Release.Ifc4);
        var (a, b) = (Actions.Group(model, "A", "LOAD_COMBINATION", "1."), Actions.Group(model, "B", "LOAD_COMBINATION", "1."));
        Actions.Assign(model, a, null, b);
        Actions.Assign(model, b, null, a);
        var live = Actions.Case(model, "Q", "1.");
        var twice = Actions.Group(model, "C", "LOAD_COMBINATION", "1.");
        Actions.Assign(model, twice, "1.35", live);
        Actions.Assign(model, twice, "1.5", live);

        var tree = new ReadLoads(model).Tree;

        Assert.Contains("in a ring", tree.ActionsOf((ulong)a).Why!.Message, StringComparison.Ordinal);
        Assert.Contains("twice", tree.ActionsOf((ulong)twice).Why!.Message, StringComparison.Ordinal);
        Assert.Equal([(ulong)b, (ulong)a], tree.Below((ulong)a).Order().Reverse());
    }

    private static int Rail(ModelWriter model) => Lines.CurveMember(model, "rail", Lines.Edge(model, Vector3.Zero, new Vector3(3, 0, 0)), Vector3.UnitZ);
}
