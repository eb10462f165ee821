using CsCheck;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Tests.Properties;

/// <summary>What holds for every linear frame, whatever is in it.</summary>
public sealed class FramePropertyTests
{
    private const int Frames = 100;

    [Fact]
    public void Loads_and_reactions_balance_and_two_situations_do_the_same_work_on_each_other() => RandomFrame.Frames.Sample(frame =>
    {
        var result = RandomFrame.Solve(frame);

        Near.Nothing(result.Quality.Reciprocity!.Value, 1, 1e-8);
        foreach (var situation in result.Situations)
        {
            Near.Nothing(situation.EquilibriumError, 1, 1e-9);
            Near.Nothing(situation.Residual, 1, 1e-10);
            Near.Nothing(situation.BackwardError, 1, 1e-14);
        }
    }, iter: Frames, threads: 1);

    [Fact]
    public void Every_node_is_in_balance_with_the_section_forces_at_the_ends_of_its_members() => RandomFrame.Frames.Sample(frame =>
    {
        var result = RandomFrame.Solve(frame).Situations[0];

        for (var node = 0; node < frame.Nodes.Length; node++)
        {
            var (force, moment) = (result.Reaction(node).Force, result.Reaction(node).Moment);
            var size = force.Length + moment.Length;
            foreach (var load in result.Situation.NodeLoads.Where(l => l.Node == node)) (force, moment) = (force + load.Force, moment + load.Moment);
            for (var m = 0; m < frame.Members.Length; m++)
            {
                foreach (var isEnd in (bool[])[false, true])
                {
                    if ((isEnd ? frame.Members[m].End : frame.Members[m].Start) != node) continue;

                    var member = result.Member(m);
                    var (f, t) = OnNode(frame.Members[m], member, isEnd);
                    var arm = isEnd ? frame.Members[m].EndOffset : frame.Members[m].StartOffset;
                    (force, moment, size) = (force + f, moment + t + arm.Cross(f), size + f.Length + t.Length);
                }
            }

            Near.Nothing(force.Length, size, 1e-8);
            Near.Nothing(moment.Length, size, 1e-8);
        }
    }, iter: Frames, threads: 1);

    [Fact]
    public void Turning_the_whole_frame_changes_directions_alone() => RandomFrame.Frames.Sample(frame =>
    {
        var (x, y) = (new Vector3(2, 1, -2), new Vector3(2, -2, 1));
        Vector3 Turn(Vector3 v) => 1.0 / 3 * (v.X * x + v.Y * y + v.Z * (1.0 / 3 * x.Cross(y)));
        var (still, turned) = (Global(frame), Turned(Global(frame), Turn));

        var (a, b) = (RandomFrame.Solve(still).Situations[0], RandomFrame.Solve(turned).Situations[0]);

        var size = frame.Nodes.Select((_, n) => a.Displacement(n).Shift.Length).Max();
        for (var n = 0; n < frame.Nodes.Length; n++)
        {
            Near.Nothing((b.Displacement(n).Shift - Turn(a.Displacement(n).Shift)).Length, size, 1e-8);
            Near.Nothing((b.Reaction(n).Force - Turn(a.Reaction(n).Force)).Length, 1e4, 1e-8);
        }

        for (var m = 0; m < frame.Members.Length; m++) Same(a.Member(m).ForcesAt(0.4 * a.Member(m).Length, true), b.Member(m).ForcesAt(0.4 * a.Member(m).Length, true), 1e4);
    }, iter: Frames, threads: 1);

    [Fact]
    public void Splitting_a_member_changes_nothing() => RandomFrame.Frames.Sample(frame =>
    {
        // The first member in two at 1/3 of its flexible length; loads of it by global axes on both parts.
        var load = new MemberLineLoad(0, null, null, new(100, -200, -300), new(100, -200, -300), LoadAxes.Global);
        var whole = frame with { Situations = [new FrameSituation { Name = "S", LineLoads = [load], NodeLoads = frame.Situations[0].NodeLoads, Temperatures = [new(0, 10, 5, -7)] }] };
        var first = whole.Members[0];
        var (from, to) = (whole.Nodes[first.Start].Position + first.StartOffset, whole.Nodes[first.End].Position + first.EndOffset);
        var split = whole with
        {
            Nodes = whole.Nodes.Add(new FrameNode("split", from + 1.0 / 3 * (to - from))),
            Members = whole.Members.SetItem(0, first with { End = whole.Nodes.Length, EndOffset = default, EndJoint = Restraints.AllFixed })
                .Add(first with { Name = "rest", Start = whole.Nodes.Length, StartOffset = default, StartJoint = Restraints.AllFixed }),
            Situations = [whole.Situations[0] with { LineLoads = [load, load with { Member = whole.Members.Length }], Temperatures = [new(0, 10, 5, -7), new(whole.Members.Length, 10, 5, -7)] }],
        };

        var (a, b) = (RandomFrame.Solve(whole).Situations[0], RandomFrame.Solve(split).Situations[0]);

        var third = a.Member(0).Length / 3;
        Same(a.Member(0).ForcesAt(third / 2, true), b.Member(0).ForcesAt(third / 2, true), 1e4);
        Same(a.Member(0).ForcesAt(2 * third, true), b.Member(whole.Members.Length).ForcesAt(b.Member(whole.Members.Length).Length / 2, true), 1e4);
        Near.Nothing((a.Member(0).DisplacementAt(third) - b.Member(0).DisplacementAt(b.Member(0).Length)).Length, a.Member(0).DisplacementAt(third).Length, 1e-7);
        for (var n = 0; n < whole.Nodes.Length; n++) Near.Nothing((a.Displacement(n).Shift - b.Displacement(n).Shift).Length, a.Displacement(n).Shift.Length + 1e-6, 1e-7);
    }, iter: Frames, threads: 1);

    [Fact]
    public void Situations_add_up() => RandomFrame.Frames.Sample(frame =>
    {
        var result = RandomFrame.Solve(frame with { Situations = frame.Situations.Add(new FrameSituation { Name = "sum", Terms = [new(0, 1.35), new(1, -0.8)] }) });

        var (a, b, sum) = (result.Situations[0], result.Situations[1], result.Situations[2]);
        for (var n = 0; n < frame.Nodes.Length; n++)
        {
            var expected = 1.35 * a.Displacement(n).Shift - 0.8 * b.Displacement(n).Shift;
            Near.Nothing((sum.Displacement(n).Shift - expected).Length, a.Displacement(n).Shift.Length + b.Displacement(n).Shift.Length, 1e-8);
        }

        for (var m = 0; m < frame.Members.Length; m++)
        {
            var x = 0.45 * a.Member(m).Length;
            Same(1.35 * a.Member(m).ForcesAt(x, true) + -0.8 * b.Member(m).ForcesAt(x, true), sum.Member(m).ForcesAt(x, true), 1e4);
        }
    }, iter: Frames, threads: 1);

    [Fact]
    public void Threads_change_no_bit() => RandomFrame.Frames.Sample(frame =>
    {
        var (one, two) = (RandomFrame.Solve(frame), RandomFrame.Solve(frame, threads: 3));

        for (var n = 0; n < frame.Nodes.Length; n++) Assert.Equal(one.Situations[1].Displacement(n), two.Situations[1].Displacement(n));
    }, iter: Frames, threads: 1);

    // What a member does to its node; torsion moved from the shear centre back to the axis.
    private static (Vector3 Force, Vector3 Moment) OnNode(FrameMember member, MemberResult result, bool isEnd)
    {
        var f = result.ForcesAt(isEnd ? result.Length : 0, afterJump: isEnd);
        var t = f.T + member.Section.ShearCentreY * f.Vz - member.Section.ShearCentreZ * f.Vy;
        var (x, y, z) = (result.Axes.X, result.Axes.Y, result.Axes.Z);
        var sign = isEnd ? -1 : 1;
        return (sign * (f.N * x + f.Vy * y + f.Vz * z), sign * (t * x + f.My * y + f.Mz * z));
    }

    // Every direction in the frame as global vectors, so that it can be turned.
    private static Frame Global(Frame frame) => frame with
    {
        Situations = [frame.Situations[0] with
        {
            PointLoads = [.. frame.Situations[0].PointLoads.Select(l => l.Axes == LoadAxes.Projected ? l with { Axes = LoadAxes.Global } : l)],
            LineLoads = [.. frame.Situations[0].LineLoads.Select(l => l.Axes == LoadAxes.Projected ? l with { Axes = LoadAxes.Global } : l)],
        }],
        Members = [.. frame.Members.Select(m => m with { ZDirection = m.ZDirection ?? new Vector3(0, 0, 1) })],
    };

    private static Frame Turned(Frame frame, Func<Vector3, Vector3> turn)
    {
        var s = frame.Situations[0];
        return frame with
        {
            Nodes = [.. frame.Nodes.Select(n => n with { Position = turn(n.Position) })],
            Members = [.. frame.Members.Select(m => m with { ZDirection = turn(m.ZDirection!.Value), StartOffset = turn(m.StartOffset), EndOffset = turn(m.EndOffset) })],
            Supports = [.. frame.Supports.Select(p => p with { X = turn(p.X), Y = turn(p.Y) })],
            Situations = [s with
            {
                SelfWeight = turn(s.SelfWeight),
                NodeLoads = [.. s.NodeLoads.Select(l => l with { Force = turn(l.Force), Moment = turn(l.Moment) })],
                PointLoads = [.. s.PointLoads.Select(l => l.Axes == LoadAxes.Local ? l : l with { Force = turn(l.Force), Moment = turn(l.Moment) })],
                LineLoads = [.. s.LineLoads.Select(l => l.Axes == LoadAxes.Local ? l : l with
                {
                    ForceFrom = turn(l.ForceFrom), ForceTo = turn(l.ForceTo), MomentFrom = turn(l.MomentFrom), MomentTo = turn(l.MomentTo),
                })],
            }],
        };
    }

    private static void Same(in SectionForces a, in SectionForces b, double size)
    {
        var difference = a - b;
        foreach (var value in (double[])[difference.N, difference.Vy, difference.Vz, difference.T, difference.My, difference.Mz]) Near.Nothing(value, size, 1e-8);
    }
}
