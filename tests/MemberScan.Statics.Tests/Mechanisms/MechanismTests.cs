using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;

namespace MemberScan.Statics.Tests.Mechanisms;

/// <summary>Frames that give way are refused with node, direction and member; turns that matter to nothing are told and held.</summary>
public sealed class MechanismTests
{
    private static readonly Restraints s_hinge = Restraints.AllFixed.With(Direction.Ry, Restraint.Free);

    [Fact]
    public void A_hinge_at_midspan_of_a_simple_beam()
    {
        var draft = FrameDraft.Beam(4, 2, change: m => m.Name == "m1" ? m with { EndJoint = s_hinge } : m).Support("N0", s_hinge).Support("N2", s_hinge);
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -1))] });

        var refused = draft.Refused();

        Assert.Equal("STA-0008", refused.Code);
        Assert.Contains("node N1 moves along uz", refused.Message, StringComparison.Ordinal);
        Assert.Contains("member m1", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_same_turned_in_space_is_found_too()
    {
        var along = new Vector3(1, 2, 3);
        Assert.True(along.TryNormalize(out var x));
        var draft = new FrameDraft();
        for (var i = 0; i <= 6; i++) draft.Node($"N{i}", i * x.X, i * x.Y, i * x.Z);
        for (var i = 1; i <= 6; i++) draft.Member($"m{i}", $"N{i - 1}", $"N{i}", change: m => i is 2 or 4 ? m with { EndJoint = s_hinge } : m);
        draft.Support("N0", s_hinge, x, new Vector3(0, 3, -2)).Support("N6", Restraints.Pinned);
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -1))] });

        Assert.Equal("STA-0008", draft.Refused().Code);
    }

    [Fact]
    public void A_frame_without_enough_supports()
    {
        var draft = FrameDraft.Beam(4, 3).Support("N0", Restraints.AllFixed.With(Direction.Ux, Restraint.Free));
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -1))] });

        var refused = draft.Refused();

        Assert.Equal("STA-0008", refused.Code);
        Assert.Contains("ux", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_part_that_floats_beside()
    {
        var draft = FrameDraft.Beam(4, 1).Support("N0", Restraints.AllFixed);
        draft.Node("X", 0, 5, 0);
        draft.Node("Y", 1, 5, 0);
        draft.Member("afloat", "X", "Y");
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -1))] });

        Assert.Matches("node (X|Y) .*member afloat", draft.Refused().Message);
    }

    [Fact]
    public void A_node_without_members()
    {
        var draft = FrameDraft.Beam(4, 1).Support("N0", Restraints.AllFixed);
        draft.Node("alone", 0, 5, 0);
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -1))] });

        var refused = draft.Refused();

        Assert.Equal("STA-0008", refused.Code);
        Assert.Contains("node alone", refused.Message, StringComparison.Ordinal);
        Assert.Contains("no member ends", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_node_between_hinges_is_held_while_nothing_turns_it()
    {
        FrameDraft Draft(double moment)
        {
            var draft = FrameDraft.Beam(4, 2, change: m => m.Name == "m1" ? m with { EndJoint = s_hinge } : m with { StartJoint = s_hinge });
            draft.Support("N0", Restraints.AllFixed).Support("N2", Restraints.AllFixed);
            return draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -1000), new(0, moment, 0))] });
        }

        var diagnostics = new DiagnosticList();
        var result = FrameSolver.Solve(Draft(0).Frame, diagnostics);

        Assert.NotNull(result);
        Near.Equal(500, result.Situations[0].Reaction(0).Force.Z);
        Assert.Equal(0, result.Situations[0].Displacement(1).Turn.Y);
        var note = Assert.Single(diagnostics.Items);
        Assert.Equal(("STA-0010", Severity.Note), (note.Code, note.Severity));
        Assert.Contains("N1 ry", note.Message, StringComparison.Ordinal);
        Assert.Contains("turns node N1 about ry", Draft(1).Refused().Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_member_that_spins_between_its_nodes_is_told_and_refused_under_torsion()
    {
        FrameDraft Draft(double torsion)
        {
            var spin = Restraints.AllFixed.With(Direction.Rx, Restraint.Free);
            var draft = FrameDraft.Beam(4, 1, change: m => m with { StartJoint = spin, EndJoint = spin }).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);
            return draft.Situation("S", s => s with { PointLoads = [new(0, 2, new(0, 0, -1000), new(torsion, 0, 0), Model.Frames.Loads.LoadAxes.Local)] });
        }

        var diagnostics = new DiagnosticList();
        var result = FrameSolver.Solve(Draft(0).Frame, diagnostics);

        Assert.NotNull(result);
        Near.Equal(500, result.Situations[0].Reaction(0).Force.Z);
        Assert.Contains("m1 rx", Assert.Single(diagnostics.Items).Message, StringComparison.Ordinal);
        Assert.Contains("member m1 in rx", Draft(5).Refused().Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_member_that_slides_between_its_nodes()
    {
        var slide = Restraints.AllFixed.With(Direction.Ux, Restraint.Free);
        var draft = FrameDraft.Beam(4, 1, change: m => m with { StartJoint = slide, EndJoint = slide }).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);
        draft.Situation("S", s => s);

        Assert.Contains("member m1 moves along ux", draft.Refused().Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_plane_truss_that_nothing_holds_across_its_plane()
    {
        var draft = new FrameDraft();
        draft.Node("A", 0, 0, 0);
        draft.Node("B", 2, 0, 0);
        draft.Node("T", 1, 0, 1);
        foreach (var (name, a, b) in new[] { ("m1", "A", "T"), ("m2", "B", "T"), ("tie", "A", "B") }) draft.Member(name, a, b, change: m => m with { TrussOnly = true });
        draft.Support("A", Restraints.Pinned).Support("B", Restraints.Pinned);
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("T", new(0, 0, -1000))] });

        var refused = draft.Refused();

        Assert.Equal("STA-0008", refused.Code);
        Assert.Contains("node T", refused.Message, StringComparison.Ordinal);
        Assert.Contains("uy", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Bars_hinged_all_round_answer_no_torsion_that_spins_their_nodes()
    {
        var open = Restraints.AllFixed.With(Direction.Ry, Restraint.Free).With(Direction.Rz, Restraint.Free);
        var draft = new FrameDraft();
        draft.Node("A", 0, 0, 0);
        draft.Node("B", 2, 0, 0);
        draft.Node("T", 1, 0, 1);
        foreach (var (name, a, b) in new[] { ("m1", "A", "T"), ("m2", "B", "T"), ("tie", "A", "B") }) draft.Member(name, a, b, change: m => m with { StartJoint = open, EndJoint = open });
        draft.Support("A", Restraints.Pinned).Support("B", Restraints.Pinned).Support("T", Restraints.AllFree.With(Direction.Uy, Restraint.Fixed));
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("T", new(0, 0, -1000), new(40, 0, 0))] });

        var refused = draft.Refused();

        Assert.Equal("STA-0008", refused.Code);
        Assert.Contains("node T", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_long_chain_is_no_mechanism()
    {
        const int Parts = 400;
        var draft = FrameDraft.Beam(400, Parts).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load($"N{Parts}", new(0, 0, -1))] }).Solve();

        Near.Equal(-400.0 * 400 * 400 / (3 * 210e9 * FrameDraft.Bar.Iy), result.Situations[0].Displacement(Parts).Shift.Z, 1e-5);
        Near.Equal(1, result.Situations[0].Reaction(0).Force.Z, 1e-6);
    }

    [Fact]
    public void Stiffnesses_too_far_apart_are_refused()
    {
        var draft = FrameDraft.Beam(4, 2, change: m => m.Name == "m1" ? m with { Section = FrameDraft.Bar with { Iy = 1e-26, Iz = 1e-26, J = 1e-26, Area = 1e-20 } } : m).Support("N0", Restraints.AllFixed);
        draft.Situation("S", s => s with { NodeLoads = [draft.Load("N2", new(0, 0, -1))] });

        Assert.Contains(draft.Refused().Code, (string[])["STA-0008", "STA-0009"]);
    }
}
