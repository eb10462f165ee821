using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Tests.Textbook;

/// <summary>
/// Frames of several members against closed forms (Kleinlogel, Rigid Frame Formulas; statics of rigid bodies; from memory). Formulas for
/// frames leave the lengthening of members out, so their area is made very large.
/// </summary>
public sealed class FrameTests
{
    private const double H = 3, L = 4, W = 5000, P = 2000;

    private static readonly FrameSection s_stiff = FrameDraft.Bar with { Name = "stiff", Area = 3.2e-3 * 1e6 };
    private static readonly double s_ei = 210e9 * FrameDraft.Bar.Iy;

    [Fact]
    public void Portal_with_fixed_bases_under_a_uniform_load()
    {
        var draft = Portal(Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { LineLoads = [new(1, null, null, new(0, 0, -W), new(0, 0, -W), LoadAxes.Global)] }).Solve().Situations[0];

        const double K = H / L;                                                  // (Ib/Ic)·(h/l), equal sections
        Near.Equal(W * L * L / (12 * (K + 2)), Math.Abs(result.Reaction(0).Moment.Y), 1e-5);
        Near.Equal(W * L * L / (6 * (K + 2)), Math.Abs(result.Member(1).ForcesAt(0, true).My), 1e-5);
        Near.Equal(W * L / 2, result.Reaction(0).Force.Z);
    }

    [Fact]
    public void Portal_with_pinned_bases_under_a_uniform_load()
    {
        var draft = Portal(Restraints.AllFixed.With(Direction.Ry, Restraint.Free));
        var result = draft.Situation("S", s => s with { LineLoads = [new(1, null, null, new(0, 0, -W), new(0, 0, -W), LoadAxes.Global)] }).Solve().Situations[0];

        const double K = H / L;
        Near.Equal(W * L * L / (4 * (2 * K + 3)), Math.Abs(result.Member(1).ForcesAt(0, true).My), 1e-5);
    }

    [Fact]
    public void Portal_that_sways()
    {
        var draft = Portal(Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("B", new(P, 0, 0))] }).Solve().Situations[0];

        const double K = H / L;
        Near.Equal(P * H * (3 * K + 1) / (2 * (6 * K + 1)), Math.Abs(result.Reaction(0).Moment.Y), 1e-5);
        Near.Equal(3 * P * H * K / (2 * (6 * K + 1)), Math.Abs(result.Member(1).ForcesAt(0, true).My), 1e-5);
        Near.Equal(-P, result.Reaction(0).Force.X + result.Reaction(3).Force.X);
    }

    [Fact]
    public void Bracket_bent_in_two_planes_has_all_six_forces_at_its_root()
    {
        // Root at the origin along X, then Y, then Z; the section forces at the root are F and r × F.
        var draft = new FrameDraft();
        draft.Node("R", 0, 0, 0);
        draft.Node("A", 1.2, 0, 0);
        draft.Node("B", 1.2, 0.7, 0);
        draft.Node("C", 1.2, 0.7, -0.5);
        draft.Member("m1", "R", "A");
        draft.Member("m2", "A", "B");
        draft.Member("m3", "B", "C");
        draft.Support("R", Restraints.AllFixed);
        var (force, moment) = (new Vector3(300, -200, 700), new Vector3(11, 22, -33));
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("C", force, moment)] }).Solve().Situations[0];

        var about = moment + new Vector3(1.2, 0.7, -0.5).Cross(force);
        var root = result.Member(0).ForcesAt(0, true);
        Near.Equal(force.X, root.N);
        Near.Equal(force.Y, root.Vy);
        Near.Equal(force.Z, root.Vz);
        Near.Equal(about.X, root.T);
        Near.Equal(about.Y, root.My);
        Near.Equal(about.Z, root.Mz);
        Near.Equal(-about.X, result.Reaction(0).Moment.X);
        Near.Nothing(result.EquilibriumError, 1, 1e-12);
    }

    [Fact]
    public void Two_crossing_beams_share_a_load_by_their_stiffness()
    {
        var draft = new FrameDraft();
        draft.Node("M", 0, 0, 0);
        draft.Node("W", -1, 0, 0);
        draft.Node("E", 1, 0, 0);
        draft.Node("S", 0, -1.5, 0);
        draft.Node("N", 0, 1.5, 0);
        foreach (var (name, a, b) in new[] { ("m1", "W", "M"), ("m2", "M", "E"), ("m3", "S", "M"), ("m4", "M", "N") }) draft.Member(name, a, b);
        foreach (var end in new[] { "W", "E" }) draft.Support(end, Restraints.Pinned.With(Direction.Rx, Restraint.Fixed).With(Direction.Ux, end == "W" ? Restraint.Fixed : Restraint.Free));
        foreach (var end in new[] { "S", "N" }) draft.Support(end, Restraints.Pinned.With(Direction.Ry, Restraint.Fixed).With(Direction.Uy, end == "S" ? Restraint.Fixed : Restraint.Free));
        var result = draft.Situation("G", s => s with { NodeLoads = [draft.Load("M", new(0, 0, -P))] }).Solve().Situations[0];

        // k = 48EI/L³ each.
        var (k1, k2) = (1 / Math.Pow(2, 3), 1 / Math.Pow(3, 3));
        Near.Equal(P * k1 / (k1 + k2) / 2, result.Reaction(1).Force.Z);
        Near.Equal(P * k2 / (k1 + k2) / 2, result.Reaction(3).Force.Z);
    }

    [Fact]
    public void Beam_on_three_springs()
    {
        // A nearly rigid beam on three equal springs with a force over the left one: 5/6, 1/3, −1/6 of it (statics of a rigid body).
        var rigid = FrameDraft.Bar with { Iy = 1e3, Iz = 1e3, J = 1e3, Area = 1e3 };
        var draft = FrameDraft.Beam(2, 2, rigid);
        var spring = Restraints.AllFree.With(Direction.Uz, Restraint.Spring(1e4));
        draft.Support("N0", spring.With(Direction.Ux, Restraint.Fixed).With(Direction.Uy, Restraint.Fixed).With(Direction.Rx, Restraint.Fixed).With(Direction.Rz, Restraint.Fixed));
        draft.Support("N1", spring).Support("N2", spring);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N0", new(0, 0, -P))] }).Solve().Situations[0];

        Near.Equal(5 * P / 6, result.Reaction(0).Force.Z);
        Near.Equal(P / 3, result.Reaction(1).Force.Z);
        Near.Equal(-P / 6, result.Reaction(2).Force.Z);
        Near.Equal(-5 * P / 6 / 1e4, result.Displacement(0).Shift.Z);
    }

    [Fact]
    public void Three_hinged_arch_as_a_chain()
    {
        // A parabola of rise f under a uniform load per length of the projection has no bending: H = w·l²/8f. A chain of chords with the loads on
        // its nodes lies on the same funicular.
        const int Parts = 16;
        const double Span = 10, Rise = 2;
        var draft = new FrameDraft();
        for (var i = 0; i <= Parts; i++)
        {
            var x = Span * i / Parts;
            draft.Node($"N{i}", x, 0, 4 * Rise * x * (Span - x) / (Span * Span));
        }

        for (var i = 1; i <= Parts; i++)
            draft.Member($"m{i}", $"N{i - 1}", $"N{i}", change: m => i == Parts / 2 ? m with { EndJoint = Restraints.AllFixed.With(Direction.Ry, Restraint.Free) } : m);
        var hinge = Restraints.AllFixed.With(Direction.Ry, Restraint.Free);
        draft.Support("N0", hinge).Support($"N{Parts}", hinge);
        var loads = Enumerable.Range(1, Parts - 1).Select(i => draft.Load($"N{i}", new(0, 0, -W * Span / Parts))).ToArray();
        var result = draft.Situation("S", s => s with { NodeLoads = [.. loads] }).Solve().Situations[0];

        Near.Equal(W * Span * Span / (8 * Rise), result.Reaction(0).Force.X, 1e-6);
        for (var m = 0; m < Parts; m++) Near.Nothing(result.Member(m).Extremes[(int)ForceComponent.My].Largest, W * Span * Span / 8, 1e-4);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Truss(bool byTrussMembers)
    {
        // Two bars at 45° and a tie: bars −P/√2 each, tie +P/2 (method of joints).
        var open = Restraints.AllFixed.With(Direction.Ry, Restraint.Free).With(Direction.Rz, Restraint.Free);
        FrameMember Bar(FrameMember m) => byTrussMembers ? m with { TrussOnly = true } : m with { StartJoint = open, EndJoint = open };
        var draft = new FrameDraft();
        draft.Node("A", 0, 0, 0);
        draft.Node("B", 2, 0, 0);
        draft.Node("T", 1, 0, 1);
        draft.Member("m1", "A", "T", change: Bar);
        draft.Member("m2", "B", "T", change: Bar);
        draft.Member("tie", "A", "B", change: Bar);
        draft.Support("A", Restraints.Pinned).Support("B", Restraints.Pinned.With(Direction.Ux, Restraint.Free)).Support("T", Restraints.AllFree.With(Direction.Uy, Restraint.Fixed));
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("T", new(0, 0, -P))] }).Solve().Situations[0];

        Near.Equal(-P / Math.Sqrt(2), result.Member(0).ForcesAt(0.5, true).N);
        Near.Equal(-P / Math.Sqrt(2), result.Member(1).ForcesAt(0.5, true).N);
        Near.Equal(P / 2, result.Member(2).ForcesAt(0.5, true).N);
        // Displacement by virtual work: ΣN·n·l/EA.
        Near.Equal(-(2 * P / 2 * Math.Sqrt(2) + P / 4 * 2) / (210e9 * 3.2e-3), result.Displacement(2).Shift.Z);
    }

    [Fact]
    public void Skewed_roller()
    {
        // A bar along X from a pin to a roller on a plane that falls at 30°: pulled by P along X it slides along the plane, held across it.
        var (sin, cos) = Math.SinCos(Math.PI / 6);
        var draft = FrameDraft.Beam(2, 1).Support("N0", Restraints.AllFixed.With(Direction.Ry, Restraint.Free));
        draft.Support("N1", Restraints.AllFree.With(Direction.Uz, Restraint.Fixed), new(cos, 0, -sin), new(0, 1, 0));
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(P, 0, 0))] }).Solve().Situations[0];

        var moved = result.Displacement(1).Shift;
        Near.Nothing(moved.X * sin + moved.Z * cos, Math.Abs(moved.X));
        var reaction = result.Reaction(1).Force;
        Near.Nothing(reaction.X * cos - reaction.Z * sin, P);
        // Moments about the pin: the reaction has no upward part, since the load has none; so nothing holds but the bar.
        Near.Nothing(reaction.Z, P);
        Near.Equal(P * 2 / (210e9 * 3.2e-3), moved.X);
    }

    [Fact]
    public void Projected_load_on_a_slope()
    {
        // Snow on a slope: 1 kN per metre of the ground plan, cantilever from the origin.
        var draft = new FrameDraft();
        draft.Node("A", 0, 0, 0);
        draft.Node("B", 3, 0, 4);
        draft.Member("m", "A", "B");
        draft.Support("A", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { LineLoads = [new(0, null, null, new(1000, 500, -1000), new(1000, 500, -1000), LoadAxes.Projected)] }).Solve().Situations[0];

        Near.Equal(1000 * 3, result.Reaction(0).Force.Z);
        Near.Equal(-1000 * 4, result.Reaction(0).Force.X);
        Near.Equal(-500 * 5, result.Reaction(0).Force.Y);
    }

    [Fact]
    public void Semi_rigid_joint_that_slides()
    {
        // Two cantilevers joined by a sliding spring at midspan share the force as springs in a row and side by side: k = 3EI/L³.
        const double K = 3e5;
        var draft = FrameDraft.Beam(2, 2, change: m => m.Name == "m2" ? m with
        {
            StartJoint = new Restraints(Restraint.Free, Restraint.Free, Restraint.Spring(K), Restraint.Free, Restraint.Free, Restraint.Free),
        } : m);
        draft.Support("N0", Restraints.AllFixed).Support("N2", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -P))] }).Solve().Situations[0];

        var own = 3 * s_ei;
        var other = own * K / (own + K);
        Near.Equal(P * other / (own + other), result.Reaction(2).Force.Z);
        Near.Equal(P * own / (own + other), result.Reaction(0).Force.Z);
        Near.Equal(-P * other / (own + other) / own, result.Member(1).DisplacementAt(0).Z);
    }

    private static FrameDraft Portal(Restraints bases)
    {
        var draft = new FrameDraft();
        draft.Node("A", 0, 0, 0);
        draft.Node("B", 0, 0, H);
        draft.Node("C", L, 0, H);
        draft.Node("D", L, 0, 0);
        foreach (var (name, a, b) in new[] { ("left", "A", "B"), ("beam", "B", "C"), ("right", "C", "D") })
            draft.Member(name, a, b, s_stiff, m => name == "beam" ? m : m with { ZDirection = Vector3.UnitX });
        return draft.Support("A", bases).Support("D", bases);
    }
}
