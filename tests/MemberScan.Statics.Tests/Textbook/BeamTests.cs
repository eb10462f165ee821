using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;

namespace MemberScan.Statics.Tests.Textbook;

/// <summary>
/// Single beams against closed forms of structural handbooks (Roark's Formulas for Stress and Strain Table 8.1, AISC Manual Table 3-23; from
/// memory), loads downwards, so along −z; a beam along X has local z up and y along Y.
/// </summary>
public sealed class BeamTests
{
    private const double L = 3, P = 1000, Q = 500;
    private static readonly double s_ei = 210e9 * FrameDraft.Bar.Iy;
    private static readonly double s_eiz = 210e9 * FrameDraft.Bar.Iz;

    [Fact]
    public void Cantilever_with_an_end_force()
    {
        var draft = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -P))] }).Solve().Situations[0];

        var tip = result.Displacement(1);
        Near.Equal(-P * L * L * L / (3 * s_ei), tip.Shift.Z);
        Near.Equal(P * L * L / (2 * s_ei), tip.Turn.Y);
        var root = result.Reaction(0);
        Near.Equal(P, root.Force.Z);
        Near.Equal(-P * L, root.Moment.Y);
        var forces = result.Member(0).ForcesAt(0, true);
        Near.Equal(-P, forces.Vz);
        Near.Equal(P * L, forces.My);
        Near.Equal(-P * L * L * L * 5 / (48 * s_ei), result.Member(0).DisplacementAt(L / 2).Z);
    }

    [Fact]
    public void Cantilever_with_an_end_force_across_its_other_axis()
    {
        var draft = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, P, 0), new(70, 0, 0))] }).Solve().Situations[0];

        Near.Equal(P * L * L * L / (3 * s_eiz), result.Displacement(1).Shift.Y);
        Near.Equal(70 * L / (80e9 * FrameDraft.Bar.J), result.Displacement(1).Turn.X);
        var forces = result.Member(0).ForcesAt(0, true);
        Near.Equal(P, forces.Vy);
        Near.Equal(P * L, forces.Mz);
        Near.Equal(70, forces.T);
    }

    [Fact]
    public void Cantilever_that_shears()
    {
        var draft = FrameDraft.Beam(L, 1, change: m => m with { ShearFlexible = true }).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -P))] }).Solve().Situations[0];

        Near.Equal(-P * L * L * L / (3 * s_ei) - P * L / (80e9 * FrameDraft.Bar.ShearAreaZ), result.Displacement(1).Shift.Z);
    }

    [Theory]
    [InlineData(1, 1, 8.0)]
    [InlineData(1, 0, 30.0)]
    public void Cantilever_with_a_spread_load(double atRoot, double atTip, double divisor)
    {
        var draft = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed);
        var load = new MemberLineLoad(0, null, null, new(0, 0, -Q * atRoot), new(0, 0, -Q * atTip), LoadAxes.Global);
        var result = draft.Situation("S", s => s with { LineLoads = [load] }).Solve().Situations[0];

        Near.Equal(-Q * L * L * L * L / (divisor * s_ei), result.Displacement(1).Shift.Z);
        Near.Equal(Q * L * (atRoot + atTip) / 2, result.Reaction(0).Force.Z);
    }

    [Fact]
    public void Simple_beam_with_a_uniform_load()
    {
        var draft = Simple(L);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        var member = result.Member(0);
        Near.Equal(Q * L * L / 8, -member.ForcesAt(L / 2, true).My);
        Near.Equal(-5 * Q * L * L * L * L / (384 * s_ei), member.DisplacementAt(L / 2).Z);
        Near.Equal(-5 * Q * L * L * L * L / (384 * s_ei), member.ChordDeflectionAt(L / 2).Z);
        var extreme = member.Extremes[(int)ForceComponent.My];
        Near.Equal(-Q * L * L / 8, extreme.Least);
        Near.Equal(L / 2, extreme.LeastAt);
    }

    [Fact]
    public void Propped_cantilever_with_a_uniform_load()
    {
        var draft = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed).Support("N1", Restraints.Pinned);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        Near.Equal(3 * Q * L / 8, result.Reaction(1).Force.Z);
        Near.Equal(-Q * L * L / 8, result.Reaction(0).Moment.Y);
        var extreme = result.Member(0).Extremes[(int)ForceComponent.My];
        Near.Equal(-9 * Q * L * L / 128, extreme.Least);
        Near.Equal(5 * L / 8, extreme.LeastAt, 1e-7);
    }

    [Theory]
    [InlineData(0.3)]
    [InlineData(0.5)]
    [InlineData(0.85)]
    public void Fixed_beam_with_a_point_load(double share)
    {
        var (a, b) = (share * L, (1 - share) * L);
        var draft = Fixed();
        var result = draft.Situation("S", s => s with { PointLoads = [new(0, a, new(0, 0, -P), default, LoadAxes.Local)] }).Solve().Situations[0];

        Near.Equal(-P * a * b * b / (L * L), result.Reaction(0).Moment.Y);
        Near.Equal(P * a * a * b / (L * L), result.Reaction(1).Moment.Y);
        Near.Equal(-2 * P * a * a * b * b / (L * L * L), -result.Member(0).ForcesAt(a, true).My * -1);
    }

    [Fact]
    public void Fixed_beam_with_a_couple_at_midspan()
    {
        var result = Fixed().Situation("S", s => s with { PointLoads = [new(0, L / 2, default, new(0, P, 0), LoadAxes.Global)] }).Solve().Situations[0];

        Near.Equal(P / 4, Math.Abs(result.Reaction(0).Moment.Y));
        Near.Equal(P / 4, Math.Abs(result.Reaction(1).Moment.Y));
        Near.Equal(3 * P / (2 * L), Math.Abs(result.Reaction(0).Force.Z));
        var rows = result.Member(0).Stations;
        Assert.Equal(12, rows.Length);
        Near.Equal(P, Math.Abs(rows[6].Forces.My - rows[5].Forces.My));
    }

    [Fact]
    public void Fixed_beam_with_uniform_and_triangular_loads()
    {
        var result = Fixed()
            .Situation("uniform", s => s with { LineLoads = [Uniform(-Q)] })
            .Situation("triangle", s => s with { LineLoads = [new(0, null, null, default, new(0, 0, -Q), LoadAxes.Local)] }).Solve();

        Near.Equal(-Q * L * L / 12, result.Situations[0].Reaction(0).Moment.Y);
        Near.Equal(-Q * L * L / 24, result.Situations[0].Member(0).ForcesAt(L / 2, true).My);
        Near.Equal(-Q * L * L * L * L / (384 * s_ei), result.Situations[0].Member(0).DisplacementAt(L / 2).Z);
        Near.Equal(-Q * L * L / 30, result.Situations[1].Reaction(0).Moment.Y);
        Near.Equal(Q * L * L / 20, result.Situations[1].Reaction(1).Moment.Y);
    }

    [Fact]
    public void A_partial_load_is_the_sum_of_many_point_loads()
    {
        const double From = 0.7, To = 2.1;
        var part = Fixed().Situation("S", s => s with { LineLoads = [new(0, From, To, new(0, 0, -Q), new(0, 0, -3 * Q), LoadAxes.Local)] }).Solve().Situations[0];

        // Influence of a point load on the fixed-end moment, P·a·b²/L², integrated over the stretch: a polynomial, by Simpson's rule on 2000 strips.
        const int Strips = 2000;
        var moment = 0.0;
        for (var i = 0; i <= Strips; i++)
        {
            var a = From + (To - From) * i / Strips;
            var weight = i is 0 or Strips ? 1 : i % 2 == 1 ? 4 : 2;
            moment += weight * (To - From) / Strips / 3 * Q * (1 + 2 * (a - From) / (To - From)) * a * (L - a) * (L - a) / (L * L);
        }

        Near.Equal(-moment, part.Reaction(0).Moment.Y);
    }

    [Fact]
    public void Fixed_beam_whose_end_settles()
    {
        var draft = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed.With(Direction.Uz, Restraint.Moved(-0.01)));
        var result = draft.Situation("S", s => s).Solve().Situations[0];

        Near.Equal(6 * s_ei * 0.01 / (L * L), Math.Abs(result.Reaction(0).Moment.Y));
        Near.Equal(12 * s_ei * 0.01 / (L * L * L), result.Reaction(0).Force.Z);
        Near.Equal(-0.005, result.Member(0).DisplacementAt(L / 2).Z);
    }

    [Fact]
    public void A_settlement_of_one_situation_leaves_the_others_alone()
    {
        var draft = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { Movements = [new(1, Direction.Uz, -0.01)] }).Situation("none", s => s)
            .Situation("both", s => s with { Terms = [new(0, 0.5), new(1, 1)] }).Solve();

        Near.Equal(12 * s_ei * 0.01 / (L * L * L), result.Situations[0].Reaction(0).Force.Z);
        Assert.Equal(0, result.Situations[1].Reaction(0).Force.Z);
        Near.Equal(6 * s_ei * 0.01 / (L * L * L), result.Situations[2].Reaction(0).Force.Z);
    }

    [Fact]
    public void Beam_on_springs_that_turn()
    {
        const double K = 2e5;
        var support = Restraints.Pinned.With(Direction.Rx, Restraint.Fixed).With(Direction.Rz, Restraint.Fixed).With(Direction.Ry, Restraint.Spring(K));
        var result = FrameDraft.Beam(L, 1).Support("N0", support).Support("N1", support).Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        Near.Equal(-Q * L * L / 12 / (1 + 2 * s_ei / (K * L)), result.Reaction(0).Moment.Y);
    }

    [Fact]
    public void Ends_that_give_do_as_supports_that_give()
    {
        const double K = 2e5;
        var joint = Restraints.AllFixed.With(Direction.Ry, Restraint.Spring(K));
        var draft = FrameDraft.Beam(L, 1, change: m => m with { StartJoint = joint, EndJoint = joint }).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        Near.Equal(-Q * L * L / 12 / (1 + 2 * s_ei / (K * L)), result.Reaction(0).Moment.Y);
        // Deflection: simple beam less what the end moments take back.
        var end = Q * L * L / 12 / (1 + 2 * s_ei / (K * L));
        Near.Equal(-5 * Q * L * L * L * L / (384 * s_ei) + end * L * L / (8 * s_ei), result.Member(0).DisplacementAt(L / 2).Z);
    }

    [Fact]
    public void Released_ends_make_a_simple_beam()
    {
        var draft = FrameDraft.Beam(L, 1, change: m => m with
        {
            StartJoint = Restraints.AllFixed.With(Direction.Ry, Restraint.Free).With(Direction.Rz, Restraint.Free),
            EndJoint = Restraints.AllFixed.With(Direction.Ry, Restraint.Free).With(Direction.Rz, Restraint.Free),
        }).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        Assert.Equal(0, result.Reaction(0).Moment.Y);
        Near.Equal(-Q * L * L / 8, result.Member(0).ForcesAt(L / 2, true).My);
        Near.Equal(-5 * Q * L * L * L * L / (384 * s_ei), result.Member(0).DisplacementAt(L / 2).Z);
    }

    [Fact]
    public void Heat_held_back_and_heat_let_go()
    {
        var heat = new MemberTemperature(0, 20, 0, 300);
        var held = Fixed().Situation("S", s => s with { Temperatures = [heat] }).Solve().Situations[0];
        var free = FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed).Situation("S", s => s with { Temperatures = [heat] }).Solve().Situations[0];

        Near.Equal(-210e9 * 3.2e-3 * 1.2e-5 * 20, held.Member(0).ForcesAt(1, true).N);
        Near.Equal(-s_ei * 1.2e-5 * 300, held.Member(0).ForcesAt(1, true).My);
        Near.Equal(1.2e-5 * 20 * L, free.Displacement(1).Shift.X);
        Near.Equal(-1.2e-5 * 300 * L * L / 2, free.Displacement(1).Shift.Z);     // the hot upper side grows: the tip goes down
        Near.Nothing(free.Member(0).ForcesAt(1, true).N, 1);
    }

    [Fact]
    public void Weight_of_its_own()
    {
        var result = Fixed().Situation("S", s => s with { SelfWeight = new(0, 0, -1) }).Solve().Situations[0];

        Near.Equal(78500 * 3.2e-3 * L / 2, result.Reaction(0).Force.Z);
        Near.Equal(-78500 * 3.2e-3 * L * L / 12, result.Reaction(0).Moment.Y);
    }

    [Fact]
    public void Member_with_offset_ends_is_shorter_and_carries_the_arms()
    {
        // Clamped through rigid arms of 0.2 m: a clamped beam of the flexible length.
        var draft = FrameDraft.Beam(L, 1, change: m => m with { StartOffset = new(0.2, 0, 0), EndOffset = new(-0.2, 0, 0) }).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        const double Clear = L - 0.4;
        Near.Equal(Clear, result.Member(0).Length);
        Near.Equal(Q * Clear * Clear / 12, result.Member(0).ForcesAt(0, true).My);
        Near.Equal(-Q * Clear * Clear / 12 - Q * Clear / 2 * 0.2, result.Reaction(0).Moment.Y);
    }

    [Fact]
    public void An_eccentric_pull_bends()
    {
        // The axis lies 50 mm below the nodes; N at the node bends the member by N·e all along, upper side stretched.
        var draft = FrameDraft.Beam(L, 1, change: m => m with { StartOffset = new(0, 0, -0.05), EndOffset = new(0, 0, -0.05) })
            .Support("N0", Restraints.AllFixed.With(Direction.Ry, Restraint.Free)).Support("N1", Restraints.AllFixed.With(Direction.Ry, Restraint.Free).With(Direction.Ux, Restraint.Free));
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(P, 0, 0))] }).Solve().Situations[0];

        Near.Equal(P, result.Member(0).ForcesAt(L / 3, true).N);
        Near.Equal(P * 0.05, result.Member(0).ForcesAt(L / 3, true).My);
    }

    [Fact]
    public void Unsymmetric_section_bends_askew()
    {
        // Principal axes turned by 30°: the tip moves as two plain beams along them say.
        var (i1, i2, angle) = (8e-7, 2e-7, Math.PI / 6);
        var (sin, cos) = Math.SinCos(angle);
        var section = FrameDraft.Bar with
        {
            Iy = i1 * cos * cos + i2 * sin * sin,
            Iz = i1 * sin * sin + i2 * cos * cos,
            Iyz = (i2 - i1) * sin * cos,
        };
        var draft = FrameDraft.Beam(L, 1, section).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -P))] }).Solve().Situations[0];

        // Principal y' = cos·y + sin·z carries I1 about it, z' = −sin·y + cos·z; force along z' bends about y'.
        var (alongY, alongZ) = (-P * sin * L * L * L / (3 * 210e9 * i2), -P * cos * L * L * L / (3 * 210e9 * i1));
        Near.Equal(alongY * cos - alongZ * sin, result.Displacement(1).Shift.Y);
        Near.Equal(alongY * sin + alongZ * cos, result.Displacement(1).Shift.Z);
    }

    [Fact]
    public void Force_off_the_shear_centre_twists()
    {
        var section = FrameDraft.Bar with { ShearCentreY = -0.03 };
        var draft = FrameDraft.Beam(L, 1, section).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -P))] }).Solve().Situations[0];

        // The force acts 30 mm on the +y side of the shear centre: moment about x there is y·Fz.
        Near.Equal(-P * 0.03 * L / (80e9 * section.J), result.Displacement(1).Turn.X);
        Near.Equal(-P * 0.03, result.Member(0).ForcesAt(1, true).T);
        Near.Equal(-P * L * L * L / (3 * s_ei) - P * 0.03 * 0.03 * L / (80e9 * section.J), result.Displacement(1).Shift.Z);
        Near.Nothing(result.Reaction(0).Moment.X, P * L);
    }

    [Fact]
    public void Tapered_cantilever()
    {
        // EI falls linearly to half at the tip: w = P·L³/EI0 · ∫(1 − s)²/(1 − s/2) ds = P·L³/EI0 · (8·ln 2 − ... ) by Simpson's rule on 20000 strips.
        var half = FrameDraft.Bar with { Area = FrameDraft.Bar.Area / 2, Iy = FrameDraft.Bar.Iy / 2, Iz = FrameDraft.Bar.Iz / 2, J = FrameDraft.Bar.J / 2 };
        var draft = FrameDraft.Beam(L, 1, change: m => m with { Taper = [new(0, FrameDraft.Bar), new(1, half)] }).Support("N0", Restraints.AllFixed);
        var result = draft.Situation("S", s => s with { NodeLoads = [draft.Load("N1", new(0, 0, -P))] }).Situation("W", s => s with { SelfWeight = new(0, 0, -1) }).Solve();

        const int Strips = 20000;
        var sum = 0.0;
        for (var i = 0; i <= Strips; i++)
        {
            var s = (double)i / Strips;
            sum += (i is 0 or Strips ? 1 : i % 2 == 1 ? 4 : 2) / (3.0 * Strips) * (1 - s) * (1 - s) / (1 - s / 2);
        }

        Near.Equal(-P * L * L * L / s_ei * sum, result.Situations[0].Displacement(1).Shift.Z);
        Near.Equal(78500 * 3.2e-3 * 0.75 * L, result.Situations[1].Reaction(0).Force.Z);
    }

    [Fact]
    public void Deep_beam_on_two_supports_shears()
    {
        var draft = FrameDraft.Beam(0.2, 1, change: m => m with { ShearFlexible = true }).Support("N0", Restraints.AllFixed.With(Direction.Ry, Restraint.Free)).Support("N1", Restraints.Pinned);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q)] }).Solve().Situations[0];

        // 5qL⁴/384EI + qL²/8GAs (Timoshenko, Strength of Materials; from memory).
        Near.Equal(-5 * Q * 0.0016 / (384 * s_ei) - Q * 0.04 / (8 * 80e9 * FrameDraft.Bar.ShearAreaZ), result.Member(0).DisplacementAt(0.1).Z);
    }

    [Fact]
    public void Continuous_beam_over_two_equal_spans()
    {
        var draft = FrameDraft.Beam(2 * L, 2).Support("N0", Restraints.AllFixed.With(Direction.Ry, Restraint.Free)).Support("N1", Restraints.Pinned).Support("N2", Restraints.Pinned);
        var result = draft.Situation("S", s => s with { LineLoads = [Uniform(-Q), Uniform(-Q) with { Member = 1 }] }).Solve().Situations[0];

        Near.Equal(3 * Q * L / 8, result.Reaction(0).Force.Z);
        Near.Equal(10 * Q * L / 8, result.Reaction(1).Force.Z);
        Near.Equal(Q * L * L / 8, result.Member(0).ForcesAt(L, false).My);
    }

    private static MemberLineLoad Uniform(double q) => new(0, null, null, new Vector3(0, 0, q), new Vector3(0, 0, q), LoadAxes.Local);

    private static FrameDraft Fixed() => FrameDraft.Beam(L, 1).Support("N0", Restraints.AllFixed).Support("N1", Restraints.AllFixed);

    private static FrameDraft Simple(double length) =>
        FrameDraft.Beam(length, 1).Support("N0", Restraints.AllFixed.With(Direction.Ry, Restraint.Free)).Support("N1", Restraints.Pinned.With(Direction.Ux, Restraint.Free));
}
