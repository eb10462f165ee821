using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;

namespace MemberScan.Ifc.Tests.Analysis.Loads;

/// <summary>Results of a case with self-weight: between stations by equilibrium with the member's weight and its other loads together.</summary>
public sealed class SelfWeightTests
{
    /// <summary>
    /// Weight of the rail's tube by hand: π(24.15² − 20.95²) = 453.39 mm²; × 7850 kg/m³ × 9.80665 m/s² = 34.903 N/m, on a simple span of 3 m ±52.355 N
    /// at the ends and 34.903·3²/8 = 39.266 N·m in the middle.
    /// </summary>
    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void The_moment_in_the_middle_follows_from_the_weight(Release release)
    {
        var forces = Read(release, isSteel: true, "-52.355", "52.355");

        Assert.True(forces.LoadsAreKnown);
        var middle = Assert.Single(forces.Stations, s => Math.Abs(s.X - 1.5) < 1e-9);
        Assert.Equal(-39.266, middle.Forces.My, 1e-3);
        var note = Assert.Single(forces.Notes);
        Assert.Contains("453.39 mm² × 7850 kg/m³ × 9.80665 m/s²", note, StringComparison.Ordinal);
        Assert.Contains("from memory", note, StringComparison.Ordinal);
    }

    /// <summary>With 100 N at 1 m: 66.667 N and 33.333 N more at the ends; at 1 m −66.667 − 34.903·1·2/2 = −101.570 N·m.</summary>
    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Weight_and_other_loads_act_together(Release release)
    {
        var forces = Read(release, isSteel: true, "-119.022", "85.688", pointLoad: "-100.");

        Assert.True(forces.LoadsAreKnown);
        Assert.All(forces.Stations.Where(s => Math.Abs(s.X - 1) < 1e-9), s => Assert.Equal(-101.570, s.Forces.My, 2e-3));
        Assert.Equal(2, forces.Stations.Count(s => Math.Abs(s.X - 1) < 1e-9));
        Assert.Contains("IFCSTRUCTURALPOINTACTION", Assert.Single(forces.Notes), StringComparison.Ordinal);
    }

    [Fact]
    public void A_weight_that_does_not_explain_the_results_is_told()
    {
        var forces = Read(Release.Ifc4, isSteel: true, "-60.", "60.");

        Assert.False(forces.LoadsAreKnown);
        Assert.Equal(2, forces.Stations.Length);
        Assert.Contains("do not explain", Assert.Single(forces.Notes), StringComparison.Ordinal);
    }

    [Fact]
    public void A_weight_that_is_not_known_is_told_and_the_stations_stay_as_they_are()
    {
        var forces = Read(Release.Ifc4, isSteel: false, "-52.355", "52.355");

        Assert.False(forces.LoadsAreKnown);
        Assert.Equal(2, forces.Stations.Length);
        Assert.Contains("weight is not known", Assert.Single(forces.Notes), StringComparison.Ordinal);
    }

    /// <summary>A rail of 3 m along X with z up, shear forces [N] at its two ends, and no moments there.</summary>
    private static MemberForces Read(Release release, bool isSteel, string start, string end, string? pointLoad = null)
    {
        var model = Bars.Model(release);
        var rail = Lines.CurveMember(model, "rail", Lines.Edge(model, Vector3.Zero, new Vector3(3, 0, 0)), Vector3.UnitZ);
        var steel = isSteel ? model.Materials.Material("S235JR", 235e6, null, 210e9, 0.3) : model.Materials.Material("Landing mix");
        var set = model.Materials.ProfileSet("set", steel, model.Profiles.Of(Bars.Rail));
        model.Associate(model.Materials.ProfileSetUsage(set), rail);
        var dead = Actions.Case(model, "G", "1.", "(0.,0.,-1.)");
        if (pointLoad is not null)
            Actions.Point(model, rail, dead, Lines.SingleForce(model, "$", "$", pointLoad, "$", "$", "$"), Lines.Vertex(model, new Vector3(1, 0, 0)), ".GLOBAL_COORDS.");
        var results = model.Rooted("IFCSTRUCTURALRESULTGROUP", "R", "R", "$", ".FIRST_ORDER_THEORY.", Bars.Ref(dead), ".T.");
        int Sample(string vz) => Lines.SingleForce(model, "0.", "0.", vz, "0.", "0.", "0.");
        Lines.CurveReaction(model, rail, Lines.Samples(model, [Sample(start), Sample(end)], "0.", "3000."), results, "DISCRETE");
        return Reading.Of(model).OnlyForces;
    }
}
