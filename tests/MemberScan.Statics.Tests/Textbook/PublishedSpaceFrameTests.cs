using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Statics.Tests.Textbook;

/// <summary>
/// A space frame of three members that meet at right angles, each turned about its axis: Kassimali, Matrix Analysis of Structures, example 8.4 (from
/// memory, to the five digits that are printed there). Inches and kips: 240 in long, E = 29,000 ksi, G = 11,500 ksi, A = 32.9 in², second moments 716 and
/// 236 in⁴, J = 15.1 in⁴; 0.25 kip/in downwards on the first member, couples of −1800 and 1800 kip·in about X and Z at the joint.
/// </summary>
public sealed class PublishedSpaceFrameTests
{
    private const double Length = 240;

    [Fact]
    public void Displacements_and_reactions_are_those_of_the_book()
    {
        var result = Solve();

        var moved = result.Displacement(0);
        AssertFive([-1.3522e-3, -2.7965e-3, -1.812e-3], moved.Shift);
        AssertFive([-3.0021e-3, 1.0569e-3, 6.4986e-3], moved.Turn);
        AssertFive([5.3757, 44.106, -0.74272], result.Reaction(1).Force);
        AssertFive([2.1722, 58.987, 2330.5], result.Reaction(1).Moment);
        AssertFive([-4.6249, 11.117, -6.4607], result.Reaction(2).Force);
        AssertFive([-515.55, -0.76472, 369.67], result.Reaction(2).Moment);
        AssertFive([-0.75082, 4.7763, 7.2034], result.Reaction(3).Force);
        AssertFive([-383.5, -60.166, -4.702], result.Reaction(3).Moment);
    }

    // The book's axes have the larger second moment about z; here z of the section is its y.
    private static SituationResult Solve()
    {
        var section = new FrameSection { Name = "book", Area = 32.9, Iy = 716, Iz = 236, J = 15.1 };
        var material = new FrameMaterial("steel", 29_000, 11_500);
        var draft = new FrameDraft();
        draft.Node("1", 0, 0, 0);
        draft.Node("2", -Length, 0, 0);
        draft.Node("3", 0, -Length, 0);
        draft.Node("4", 0, 0, -Length);
        draft.Member("first", "2", "1", section, m => m with { ZDirection = Vector3.UnitY }, material);
        draft.Member("second", "3", "1", section, m => m with { ZDirection = Vector3.UnitZ }, material);
        draft.Member("third", "4", "1", section, m => m with { ZDirection = new Vector3(-0.5, Math.Sqrt(0.75), 0) }, material);
        foreach (var held in new[] { "2", "3", "4" }) draft.Support(held, Restraints.AllFixed);
        draft.Situation("S", s => s with
        {
            NodeLoads = [new(0, Vector3.Zero, new(-1800, 0, 1800))],
            LineLoads = [new(0, null, null, new(0, -0.25, 0), new(0, -0.25, 0), Model.Frames.Loads.LoadAxes.Global)],
        });
        return draft.Solve().Situations[0];
    }

    private static void AssertFive(double[] printed, Vector3 actual)
    {
        double[] found = [actual.X, actual.Y, actual.Z];
        for (var i = 0; i < 3; i++) Assert.True(Math.Abs(found[i] - printed[i]) <= 5.1e-5 * Math.Pow(10, Math.Ceiling(Math.Log10(Math.Abs(printed[i])))), $"printed {printed[i]}, found {found[i]}");
    }
}
