using System.Collections.Frozen;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Tests.Analysis;

/// <summary>One line of 3 m along X with z up; samples as the IFC documentation of IfcStructuralCurveActivityTypeEnum and IfcStructuralLoadConfiguration says.</summary>
public sealed class ReactionReaderTests
{
    private static readonly string[] s_six = ["1000.", "2000.", "3000.", "4000.", "5000.", "6000."];

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void Equidistant_samples_spread_over_the_whole_line(Release release)
    {
        var forces = Read(model => (Lines.Samples(model, Loads(model, 1, 2, 3, 4), null), "EQUIDISTANT"), release: release);

        Assert.Equal([0, 1, 2, 3], forces.Stations.Select(s => Math.Round(s.X, 12)));
        Assert.Equal([1, 2, 3, 4], forces.Stations.Select(s => s.Forces.N));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_constant_sample_holds_at_both_ends(Release release)
    {
        var forces = Read(model => (Lines.SingleForce(model, s_six), "CONST"), release: release);

        // Millimetre and newton: forces as they stand, moments from N·mm.
        var expected = new SectionForces(1000, 2000, 3000, 4, 5, 6);
        Assert.Equal([0, 3], forces.Stations.Select(s => Math.Round(s.X, 12)));
        Assert.All(forces.Stations, s => Near.Forces(expected, s.Forces));
    }

    [Theory]
    [InlineData("POLYGONAL")]
    [InlineData("DISCRETE")]
    [InlineData("NOTDEFINED")]
    [InlineData("EQUIDISTANT")]
    public void Locations_are_lengths_along_the_line_in_file_units(string kind)
    {
        var forces = Read(model => (Lines.Samples(model, Loads(model, 1, 2, 3), "0.", "750.", "3000."), kind));

        Assert.Equal([0, 0.75, 3], forces.Stations.Select(s => Math.Round(s.X, 12)));
    }

    [Theory]
    [MemberData(nameof(Schemas.Later), MemberType = typeof(Schemas))]
    public void A_place_named_twice_is_a_jump_in_the_order_of_the_file(Release release)
    {
        var forces = Read(model => (Lines.Samples(model, Loads(model, 1, 2, 3, 4), "0.", "1500.", "1500.", "3000."), "DISCRETE"), release: release);

        Assert.Equal([1, 2, 3, 4], forces.Stations.Select(s => s.Forces.N));
    }

    [Theory]
    [InlineData(Release.Ifc4, "0.", "1500.", "3001.")]
    [InlineData(Release.Ifc4, "-1.", "1500.", "3000.")]
    [InlineData(Release.Ifc4X3, "0.", "1500.", "3001.")]
    public void A_location_beyond_the_line_is_not_used(Release release, params string[] locations)
    {
        var why = Read(model => (Lines.Samples(model, Loads(model, 1, 2, 3), locations), "DISCRETE"), release: release).Unusable!;

        Assert.Equal(ReasonCode.ForcesIncomplete, why.Code);
        Assert.Contains("on an analytical member of 3 m", why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Locations_from_0_to_1_are_lengths_all_the_same_and_it_is_told()
    {
        var reading = Of(model => (Lines.Samples(model, Loads(model, 1, 2, 3), "0.", "0.5", "1."), "POLYGONAL"));

        Reading.AssertNear(0.001, reading.OnlyForces.Stations[2].X);
        reading.AssertTold("IFC-0021", Severity.Warning, "as if they were shares");
    }

    [Theory]
    [InlineData("too few places")]
    [InlineData("two numbers")]
    [InlineData("no places")]
    public void Samples_without_a_place_each_are_not_used(string fault)
    {
        var why = Read(model => (fault switch
        {
            "too few places" => Lines.Samples(model, Loads(model, 1, 2, 3), "0.", "3000."),
            "two numbers" => Lines.Samples(model, Loads(model, 1, 2), "0.", "3000.,1."),
            _ => Lines.Samples(model, Loads(model, 1, 2), null),
        }, "POLYGONAL")).Unusable!;

        Assert.Equal(ReasonCode.ForcesIncomplete, why.Code);
    }

    [Fact]
    public void One_sample_of_a_distribution_is_too_coarse()
    {
        var configured = Read(model => (Lines.Samples(model, Loads(model, 1), null), "EQUIDISTANT")).Unusable!;
        var bare = Read(model => (Lines.SingleForce(model, s_six), "DISCRETE")).Unusable!;

        Assert.Equal((ReasonCode.StationsTooCoarse, ReasonCode.StationsTooCoarse), (configured.Code, bare.Code));
    }

    [Fact]
    public void Lost_samples_and_other_loads_are_not_used()
    {
        var lost = Read(model => (Lines.Samples(model, [.. Loads(model, 1, 2), 999_999], null), "EQUIDISTANT")).Unusable!;
        var none = Read(_ => (999_999, "CONST")).Unusable!;
        var other = Read(model => (model.Add("IFCSTRUCTURALLOADLINEARFORCE", "$", "1.", "2.", "3.", "4.", "5.", "6."), "CONST")).Unusable!;
        var word = Read(model => (Lines.SingleForce(model, "'much'", "0.", "0.", "0.", "0.", "0."), "CONST")).Unusable!;
        var infinite = Read(model => (Lines.SingleForce(model, "1.E308", "1.E308", "0.", "0.", "0.", "0."), "CONST"), units: FileUnits.MillimetreKilonewton).Unusable!;

        Assert.Equal(ReasonCode.DamagedRecord, lost.Code);
        Assert.Equal(ReasonCode.DamagedRecord, none.Code);
        Assert.Equal(ReasonCode.ForcesIncomplete, other.Code);
        Assert.Equal(ReasonCode.DamagedRecord, word.Code);
        Assert.Equal(ReasonCode.ForcesIncomplete, infinite.Code);
    }

    [Fact]
    public void Samples_beyond_the_limit_are_not_used()
    {
        var why = Read(model => (Lines.Samples(model, Enumerable.Repeat(Lines.SingleForce(model, s_six), ReactionReader.MaxSamples + 1), null), "EQUIDISTANT")).Unusable!;

        Assert.Contains("more than 1000000 samples", why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Components_left_out_are_incomplete_or_zero_as_the_settings_say()
    {
        static (int Load, string Kind) Planar(ModelWriter model) => (Lines.SingleForce(model, "1000.", "$", "3000.", "$", "5000.", "$"), "CONST");

        var refused = Read(Planar);
        var zero = Read(Planar, new ForceRules { MissingComponentsAreZero = true });

        Assert.Equal(ReasonCode.ForcesIncomplete, refused.Unusable!.Code);
        Assert.Equal(new SectionForces(1000, 0, 3000, 0, 5, 0), zero.Stations[0].Forces);
    }

    [Theory]
    [InlineData("TORQUEUNIT", "0.", "0.", "5.", "TORQUEUNIT")]
    [InlineData("FORCEUNIT", "3.", "0.", "0.", "FORCEUNIT")]
    public void A_value_whose_unit_is_missing_is_not_used(string leftOut, string force, string torsion, string moment, string words)
    {
        var why = Of(model => (Lines.SingleForce(model, "0.", "0.", force, torsion, moment, "0."), "CONST"), leftOut: leftOut).OnlyForces.Unusable!;

        Assert.Equal(ReasonCode.UnitMissing, why.Code);
        Assert.Contains(words, why.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_zero_needs_no_unit_and_the_settings_can_name_the_missing_one()
    {
        var zero = Of(model => (Lines.SingleForce(model, "1.", "0.", "0.", "0.", "0.", "0."), "CONST"), leftOut: "TORQUEUNIT").OnlyForces;
        var rules = new ReadingRules { MissingUnits = new Dictionary<string, double> { ["TORQUEUNIT"] = 10 }.ToFrozenDictionary() };
        var named = Of(model => (Lines.SingleForce(model, "1.", "0.", "0.", "0.", "7.", "0."), "CONST"), rules, leftOut: "TORQUEUNIT").OnlyForces;

        Assert.Null(zero.Unusable);
        Assert.Equal(70, named.Stations[0].Forces.My);
    }

    [Fact]
    public void End_forces_change_sign_at_the_start_and_say_so()
    {
        var rules = new ForceRules { Convention = ForceConvention.EndForces };

        var forces = Read(model => (Lines.Samples(model, [Lines.SingleForce(model, s_six), Lines.SingleForce(model, s_six)], "0.", "3000."), "DISCRETE"), rules);

        Near.Forces(new(-1000, -2000, -3000, -4, -5, -6), forces.Stations[0].Forces);
        Near.Forces(new(1000, 2000, 3000, 4, 5, 6), forces.Stations[1].Forces);
        Assert.Contains("end forces", forces.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("middle")]
    [InlineData("constant")]
    public void End_forces_between_the_ends_or_constant_contradict_their_convention(string fault)
    {
        var rules = new ForceRules { Convention = ForceConvention.EndForces };

        var why = Read(model => fault == "middle"
            ? (Lines.Samples(model, Loads(model, 1, 2, 3), "0.", "1500.", "3000."), "DISCRETE")
            : (Lines.SingleForce(model, s_six), "CONST"), rules).Unusable!;

        Assert.Equal(ReasonCode.ConventionUnknown, why.Code);
    }

    [Fact]
    public void A_turn_leads_from_the_axes_of_the_members_to_those_of_the_values()
    {
        // The values' y is the member's z, their z its −y: a quarter turn from the member's axes to theirs.
        var rules = new ForceRules { TurnDegrees = 90 };

        var forces = Read(model => (Lines.SingleForce(model, s_six), "CONST"), rules);

        Near.Forces(new(1000, -3000, 2000, 4, -6, 5), forces.Stations[0].Forces);
        Assert.Contains("turned by 90°", forces.Conversion, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("name")]
    [InlineData("GlobalId")]
    [InlineData("candidate's GlobalId")]
    [InlineData("candidate's name")]
    public void A_turn_for_one_member_is_found_by_ids_and_names_and_comes_before_the_general_one(string by)
    {
        var model = Bars.Model(Release.Ifc4);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, new Vector3(0, 0, 3)), Vector3.UnitY);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        analysis.Link(Bars.Add(model, "flat", Bars.Flat, 3), line);
        Lines.CurveReaction(model, line, Lines.SingleForce(model, s_six), analysis.ResultGroup("R", analysis.LoadCombination("CO1", null)), "CONST");
        var key = by switch
        {
            "name" => "L",
            "GlobalId" => model.GlobalIdOf("IFCSTRUCTURALCURVEMEMBER", "L"),
            "candidate's GlobalId" => model.GlobalIdOf("IFCMEMBER", "flat"),
            _ => "flat",
        };
        var rules = new ForceRules { TurnDegrees = 90, TurnDegreesByMember = new Dictionary<string, double> { [key] = 180 }.ToFrozenDictionary() };

        var forces = Reading.Of(model, new ReadingRules { Forces = rules }).OnlyForces;

        // Axis Y and body Y agree, so only the half turn is left.
        Near.Forces(new(1000, -2000, -3000, 4, -5, -6), forces.Stations[0].Forces);
    }

    [Fact]
    public void The_settings_may_overrule_the_flag_both_ways_and_it_is_said()
    {
        static (int Load, string Kind) Six(ModelWriter model) => (Lines.SingleForce(model, s_six), "CONST");

        var member = Read(Six, new ForceRules { Components = ForceComponents.MemberAxes }, flag: ".GLOBAL_COORDS.");
        var global = Read(Six, new ForceRules { Components = ForceComponents.GlobalAxes }, flag: ".LOCAL_COORDS.", axis: Vector3.UnitY);

        // With Axis = Y the member's z is Y and its y is z × x = −Z.
        Near.Forces(new(1000, 2000, 3000, 4, 5, 6), member.Stations[0].Forces);
        Near.Forces(new(1000, -3000, 2000, 4, -6, 5), global.Stations[0].Forces);
        Assert.Contains("by the settings (flag GLOBAL_COORDS)", member.Conversion, StringComparison.Ordinal);
        Assert.Contains("by the settings (flag LOCAL_COORDS)", global.Conversion, StringComparison.Ordinal);
    }

    [Fact]
    public void A_point_reaction_without_a_place_on_the_member_is_too_coarse()
    {
        var model = Bars.Model(Release.Ifc2X3);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        var line = analysis.CurveMember("L", Vector3.Zero, new Vector3(3, 0, 0), Vector3.UnitZ);
        analysis.PointReaction(line, analysis.ResultGroup("R", analysis.LoadCombination("CO1", null)), new(1, 2, 3, 4, 5, 6));

        Assert.Equal(ReasonCode.StationsTooCoarse, Reading.Of(model).OnlyForces.Unusable!.Code);
    }

    private static int[] Loads(ModelWriter model, params int[] axial) =>
        [.. axial.Select(n => Lines.SingleForce(model, FormattableString.Invariant($"{n}."), "0.", "0.", "0.", "0.", "0."))];

    private static MemberForces Read(
        Func<ModelWriter, (int Load, string Kind)> write, ForceRules? rules = null, Release release = Release.Ifc4, string flag = ".LOCAL_COORDS.", Vector3? axis = null, FileUnits? units = null) =>
        Of(write, new ReadingRules { Forces = rules ?? new ForceRules() }, release, flag, axis, units).OnlyForces;

    private static Reading Of(
        Func<ModelWriter, (int Load, string Kind)> write, ReadingRules? rules = null, Release release = Release.Ifc4, string flag = ".LOCAL_COORDS.",
        Vector3? axis = null, FileUnits? units = null, params string[] leftOut)
    {
        var model = Bars.Model(release, units, leftOut);
        var line = Lines.CurveMember(model, "L", Lines.Edge(model, Vector3.Zero, new Vector3(3, 0, 0)), axis ?? Vector3.UnitZ);
        var analysis = model.StartAnalysis("A", Transform3.Identity);
        var (load, kind) = write(model);
        Lines.CurveReaction(model, line, load, analysis.ResultGroup("R", analysis.LoadCombination("CO1", null)), kind, flag);
        return Reading.Of(model, rules);
    }
}
