using System.Collections.Frozen;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.OpenModels;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.OpenModels;

/// <summary>
/// The published sample with results: structural-portal-frame-results-ifc4.ifc. It stores forces on the member ends ('Head', 'Tail'), in axes
/// x along the member, y global Y, although it flags them global; inch and pound-force, and no unit of moments. For the columns (Axis = X) those
/// axes lie a half turn from the member's own, for the beam (Axis = Z) they are the same: README.md beside the file.
/// </summary>
public sealed class PortalFrameTests
{
    // The file's own factors: #22 IFCMASSMEASURE(4.44822162), #29 IFCLENGTHMEASURE(0.0254).
    private const double PoundForce = 4.44822162, Inch = 0.0254;

    private static readonly ReadingRules s_rules = new()
    {
        MissingUnits = new Dictionary<string, double> { ["TORQUEUNIT"] = PoundForce * Inch }.ToFrozenDictionary(),
        Forces = new ForceRules
        {
            Convention = ForceConvention.EndForces,
            Components = ForceComponents.MemberAxes,
            TurnDegreesByMember = new Dictionary<string, double> { ["Curve Member #1"] = 180, ["Curve Member #2"] = 180 }.ToFrozenDictionary(),
        },
    };

    // Sign of Vz and My against the stored values: reversed at the start (end forces), and reversed once more where the axes lie a half turn apart.
    [Theory]
    [InlineData("Curve Member #1", -1, 2278.52897011915, -1422.66326629449, 66694.8548930371, -2278.52897011915, 1422.66326629449, 104027.289932507)]    // #2770, #2771
    [InlineData("Curve Member #2", -1, 7321.47102988085, 1422.73493120008, -43375.4476654014, -7321.47102988085, -1422.73493120008, -127343.989381682)]  // #2778, #2779
    [InlineData("Curve Member #3", 1, 1422.69473557039, 2278.52222225513, -104030.36194645, -1422.69473557039, 7321.47777774487, 127353.857770554)]      // #2786, #2787
    public void Section_forces_at_both_ends_follow_from_the_stored_end_forces(
        string name, int turn, double headX, double headZ, double headY, double tailX, double tailZ, double tailY)
    {
        var forces = Read().ForcesOf(name);

        Assert.Null(forces.Unusable);
        Assert.Equal(name.EndsWith('3'), forces.Stations.Length > 2);
        Near.Forces(new(-headX * PoundForce, 0, -turn * headZ * PoundForce, 0, -turn * headY * PoundForce * Inch, 0), forces.Stations[0].Forces, 1e-12);
        Near.Forces(new(tailX * PoundForce, 0, turn * tailZ * PoundForce, 0, turn * tailY * PoundForce * Inch, 0), forces.Stations[^1].Forces, 1e-12);
        Assert.True(forces.Stations[0].Forces.N < 0, "all three members are compressed");
        Reading.AssertNear(name.EndsWith('3') ? 192 * Inch : 120 * Inch, forces.Stations[^1].X);
    }

    [Theory]
    [InlineData(0, 0, 120, "Curve Member #1", "Curve Member #3")]
    [InlineData(192, 0, 120, "Curve Member #2", "Curve Member #3")]
    public void Both_joints_are_in_equilibrium(double x, double y, double z, string column, string beam)
    {
        var reading = Read();
        var joint = Inch * new Vector3(x, y, z);

        var (columnForce, columnMoment) = OnEnd(reading, column, joint);
        var (beamForce, beamMoment) = OnEnd(reading, beam, joint);

        // No load acts on the joints, so the forces on the two ends sum to nothing; within 1e-4 of the largest of the frame.
        var all = reading.Forces.SelectMany(f => f.Stations).Select(s => s.Forces).ToList();
        Assert.True((columnForce + beamForce).Length < 1e-4 * all.Max(f => Math.Abs(f.N)), $"{columnForce + beamForce}");
        Assert.True((columnMoment + beamMoment).Length < 1e-4 * all.Max(f => Math.Abs(f.My)), $"{columnMoment + beamMoment}");
    }

    [Fact]
    public void The_feet_carry_the_reactions_of_the_supports()
    {
        // #2740 and #2758: forces and moments on the frame's feet, in global axes.
        var reading = Read();

        var (leftForce, leftMoment) = OnEnd(reading, "Curve Member #1", Vector3.Zero);
        var (rightForce, rightMoment) = OnEnd(reading, "Curve Member #2", new Vector3(192 * Inch, 0, 0));

        Near.Vector(PoundForce * new Vector3(1422.66326629449, 0, 2278.52897011915), leftForce, 1e-9);
        Near.Vector(PoundForce * Inch * new Vector3(0, 66694.8548930371, 0), leftMoment, 1e-9);
        Near.Vector(PoundForce * new Vector3(-1422.73493120008, 0, 7321.47102988085), rightForce, 1e-9);
        Near.Vector(PoundForce * Inch * new Vector3(0, -43375.4476654014, 0), rightMoment, 1e-9);
    }

    [Theory]
    [InlineData("Curve Member #1", 120)]
    [InlineData("Curve Member #2", 120)]
    public void The_columns_satisfy_the_change_of_moment_along_the_member(string name, double lengthInches)
    {
        var stations = Read().ForcesOf(name).Stations;

        // dMy/dx = Vz, without load between the ends.
        var (start, end) = (stations[0].Forces, stations[1].Forces);
        Reading.AssertNear(start.Vz, end.Vz, 1e-9);
        Reading.AssertNear(start.Vz * lengthInches * Inch, end.My - start.My, 1e-4);
    }

    /// <summary>
    /// The load is #326: 100 lbf/in downwards from 96 in to 192 in. From the stored values at the left end, V = −2278.5222 lbf and M = 104,030.36 lbf·in, by hand:
    /// V = 0 at 96 + 22.785222 = 118.785 in, M there = 104,030.36 − 2278.5222·118.785222 + 100·22.785222²/2 = −140,666 lbf·in. The stored values miss equilibrium
    /// with that load by 9.9 lbf·in at the right end.
    /// </summary>
    [Fact]
    public void The_largest_moment_of_the_beam_lies_between_its_ends_and_is_found_from_the_load()
    {
        var reading = Read();
        var forces = reading.ForcesOf("Curve Member #3");

        var line = ForceLine.Build(forces.Stations, 192 * Inch);

        Assert.True(line.IsComplete);
        Assert.True(forces.LoadsAreKnown);
        Assert.Contains("IFCSTRUCTURALCURVEACTION #317", Assert.Single(forces.Notes), StringComparison.Ordinal);
        var all = line.Intervals.SelectMany(i => Enumerable.Range(0, 2001).Select(k => (X: i.Start.X + k / 2000.0 * (i.End.X - i.Start.X), i.At(k / 2000.0).My)));
        var (x, my) = all.MaxBy(m => Math.Abs(m.My));
        Reading.AssertNear(118.785, x / Inch, 1e-3);
        Reading.AssertNear(-140666, my / (PoundForce * Inch), 1e-4);
    }

    [Fact]
    public void Without_that_load_the_two_stations_of_the_beam_are_too_coarse()
    {
        var reading = Read(without: "#335=");

        var line = ForceLine.Build(reading.ForcesOf("Curve Member #3").Stations, 192 * Inch);

        Assert.Equal(IntervalKind.Unknown, Assert.Single(line.Intervals).Kind);
    }

    /// <summary>Frame against its loads: 9600 lbf of load downwards at 144 in, held by the two feet; within 1e-4 of the largest force and moment.</summary>
    [Fact]
    public void The_feet_hold_the_load()
    {
        var reading = Read();
        var (leftForce, leftMoment) = OnEnd(reading, "Curve Member #1", Vector3.Zero);
        var (rightForce, rightMoment) = OnEnd(reading, "Curve Member #2", new Vector3(192 * Inch, 0, 0));
        var load = new Vector3(0, 0, -100.0 * 96 * PoundForce);

        var force = leftForce + rightForce + load;
        var moment = leftMoment + rightMoment + new Vector3(192 * Inch, 0, 0).Cross(rightForce) + new Vector3(144 * Inch, 0, 0).Cross(load);

        var all = reading.Forces.SelectMany(f => f.Stations).Select(s => s.Forces).ToList();
        Assert.True(force.Length < 1e-4 * all.Max(f => Math.Abs(f.N)), $"{force}");
        Assert.True(moment.Length < 1e-4 * all.Max(f => Math.Abs(f.My)), $"{moment}");
    }

    [Fact]
    public void The_convention_is_detected_and_without_a_word_proposed()
    {
        var detected = Read(s_rules with { Forces = s_rules.Forces with { Convention = ForceConvention.Detect } });
        var refused = Read(s_rules with { Forces = s_rules.Forces with { Convention = ForceConvention.PositiveFace } });

        var stated = Read();
        Assert.All(detected.Forces, f => Assert.Contains("end forces, detected by equilibrium", f.Conversion, StringComparison.Ordinal));
        Assert.Equal(stated.Forces.SelectMany(f => f.Stations), detected.Forces.SelectMany(f => f.Stations));
        Assert.All(refused.Forces, f => Assert.Equal(ReasonCode.ConventionUnknown, f.Unusable!.Code));
        Assert.Equal(3, refused.CountOf("IFC-0025"));
    }

    [Fact]
    public void Without_the_unit_of_moments_nothing_is_used_and_the_load_case_does_not_act_in_full()
    {
        var forces = Read(s_rules with { MissingUnits = FrozenDictionary<string, double>.Empty }).Forces;

        Assert.Equal(3, forces.Length);
        Assert.All(forces, f => Assert.Equal(ReasonCode.UnitMissing, f.Unusable!.Code));
        Assert.All(forces, f => Assert.Equal(("Structural Load Case #1", false), (f.Situation.Name, f.Situation.ActsInFull)));
    }

    /// <summary>Force and moment on the end of a member at a place, as vectors: what acts on the end face there.</summary>
    private static (Vector3 Force, Vector3 Moment) OnEnd(Reading reading, string name, Vector3 place)
    {
        var axes = Reading.Value(reading.Named(name).Axes);
        var stations = reading.ForcesOf(name).Stations;
        var isStart = (axes.Origin - place).Length < 1e-6;
        SectionForces f = isStart ? -1 * stations[0].Forces : stations[^1].Forces;
        return (f.N * axes.X + f.Vy * axes.Y + f.Vz * axes.Z, f.T * axes.X + f.My * axes.Y + f.Mz * axes.Z);
    }

    private static Reading Read(ReadingRules? rules = null, string? without = null)
    {
        var text = System.Text.Encoding.Latin1.GetString(ModelContainer.Read(OpenModel.Path("structural-portal-frame-results-ifc4.ifc")).Bytes.ToArray());
        if (without is not null) text = string.Join('\n', text.Split('\n').Where(line => !line.StartsWith(without, StringComparison.Ordinal)));
        return Reading.Of(System.Text.Encoding.Latin1.GetBytes(text), rules ?? s_rules);
    }
}
