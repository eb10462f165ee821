using MemberScan.Foundation.Geometry;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests.Frames;

/// <summary>Models that have loads and supports and no results: our own frame analysis gives the forces.</summary>
public sealed class OwnAnalysisTests
{
    private static readonly Vector3 s_end = new(2, 0, 0);

    public static TheoryData<SchemaVersion> All => [SchemaVersion.Ifc2X3, SchemaVersion.Ifc4, SchemaVersion.Ifc4X3];

    [Theory]
    [MemberData(nameof(All))]
    public void A_cantilever_carries_its_load_times_its_length_to_the_support(SchemaVersion schema)
    {
        var member = Assert.Single(Screen(schema, (writer, bar, node, loads) => writer.PointAction(node, loads, new(0, 0, -300))).Members);

        // P·L = 300 N × 2 m; 600 N·m over 4.80 cm³ are 125 MPa, against 235/1.67 (AISC Manual, Table 3-23 case 22; from memory).
        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(600, Math.Abs(member.Governing!.Forces.My), 1e-6);
        Assert.Equal(300, Math.Abs(member.Governing.Forces.Vz), 1e-6);
        Assert.Equal(0, member.Governing.Station, 9);
        Assert.Contains("own frame analysis of analysis model 'Landing'", member.Governing.ForcesSource, StringComparison.Ordinal);
        Assert.Contains("first order", member.Governing.ForcesSource, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(All))]
    public void Forces_of_a_line_that_runs_against_its_body_are_turned_into_the_bodys_axes(SchemaVersion schema)
    {
        var writer = Landing.Writer(schema);
        var tube = Landing.PostTube;
        var placement = writer.LocalPlacement(new Transform3(Vector3.Zero, Vector3.UnitY, Vector3.UnitZ, Vector3.UnitX));
        var element = Landing.Add(writer, Landing.Shape(writer, tube, 2), placement: placement);
        var frame = new FrameWriter(writer, "Landing");
        var held = frame.Node("A", s_end, frame.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed"));
        var free = frame.Node("B", Vector3.Zero);
        var line = frame.Member("Line", s_end, Vector3.Zero, Vector3.UnitZ);
        frame.Join(line, held);
        frame.Join(line, free);
        Load(frame, loads => frame.PointAction(free, loads, new(200, 0, -500)));
        frame.Finish();
        if (schema == SchemaVersion.Ifc2X3) writer.Rooted("IFCRELCONNECTSSTRUCTURALELEMENT", "link", null, Spelling.Reference(element), Spelling.Reference(line));
        else writer.Rooted("IFCRELASSIGNSTOPRODUCT", "link", null, Spelling.References([line]), "$", Spelling.Reference(element));

        var member = Assert.Single(Landing.Screen(writer.Build()).Members);

        // Body: x from the free end to the support, z up. At the support Vz = +500 on the +x face (load behind it downwards), My = dM/dx·L = +1000; N = −200.
        Assert.True(member.Governing is not null, member.Reason?.ToString());
        Assert.Equal((2.0, -200.0, 500.0, 1000.0), (Math.Round(member.Governing.Station, 6), Math.Round(member.Governing.Forces.N, 6), Math.Round(member.Governing.Forces.Vz, 6), Math.Round(member.Governing.Forces.My, 6)));
    }

    [Theory]
    [MemberData(nameof(All))]
    public void A_mechanism_is_told_with_the_name_of_a_node_and_nothing_passes(SchemaVersion schema)
    {
        var writer = Landing.Writer(schema);
        var frame = new FrameWriter(writer, "Landing");
        var held = frame.Node("Anchor", Vector3.Zero, frame.Condition("fixed", "fixed", "fixed", "free", "free", "free"));
        var free = frame.Node("Tip", s_end);
        var bar = Bar(writer, frame);
        frame.Join(bar, held);
        frame.Join(bar, free);
        Load(frame, loads => frame.PointAction(free, loads, new(0, 0, -500)));
        frame.Finish();

        var record = Landing.Screen(writer.Build());

        var member = Assert.Single(record.Members);
        Assert.Equal((Verdict.NotChecked, ReasonCode.NoForces), (member.Verdict, member.Reason!.Code));
        Assert.Contains("own frame analysis", member.Reason.Message, StringComparison.Ordinal);
        Assert.True(member.Reason.Message.Contains("Tip", StringComparison.Ordinal) || member.Reason.Message.Contains("Anchor", StringComparison.Ordinal), member.Reason.Message);
        Assert.Contains(record.Findings, f => f.Code == "SCR-0031");
    }

    [Fact]
    public void A_member_without_a_modulus_bars_the_whole_model_by_name()
    {
        var writer = Landing.Writer();
        var frame = new FrameWriter(writer, "Landing");
        var node = frame.Node("A", Vector3.Zero, frame.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed"));
        frame.Join(Bar(writer, frame), node);
        frame.Section(writer.Materials.Material("Landing mix"), writer.Profiles.Of(Landing.PostTube), frame.Member("Soft", s_end, new(4, 0, 0), Vector3.UnitZ));
        Load(frame, loads => frame.PointAction(node, loads, new(0, 0, -1)));
        frame.Finish();

        var record = Landing.Screen(writer.Build());

        Assert.All(record.Members, m => Assert.Equal(Verdict.NotChecked, m.Verdict));
        Assert.Contains("'Soft'", record.Members.Single(m => m.Name == "Strut").Reason!.Message, StringComparison.Ordinal);
    }

    /// <summary>
    /// The post's tube by hand: π(24.15² − 20.95²) = 453.39 mm², × 7850 kg/m³ × 9.80665 m/s² = 34.903 N/m; on a cantilever of 2 m w·L = 69.807 N and
    /// w·L²/2 = 69.807 N·m.
    /// </summary>
    [Theory]
    [InlineData(SchemaVersion.Ifc4)]
    [InlineData(SchemaVersion.Ifc4X3)]
    public void Self_weight_of_a_cantilever(SchemaVersion schema)
    {
        var record = Landing.Screen(Built(schema, null, isHeldAtBothEnds: false, (frame, _) => frame.Combination("Service", "SLS", (frame.Case("Dead", new(0, 0, -1), onTop: false), 1))));

        var root = Assert.Single(record.Members).Situations.Single(s => s.Situation == "Service").Stations[0].Forces;
        Assert.Equal(-69.807, root.Vz, 1e-3);
        Assert.Equal(69.807, root.My, 1e-3);
        Assert.Contains("7850 kg/m³", string.Join(' ', record.Members[0].Notes), StringComparison.Ordinal);
    }

    /// <summary>
    /// Held at both ends, by hand: N = −E·A·α·ΔT = −210e9 × 453.39e-6 × 1.2e-5 × 30 = −34,277 N; M = E·I·α·ΔT/h = 210e9 × 11.586e-8 × 1.2e-5 × 20/0.0483 = 120.89 N·m.
    /// Signs as the documentation of IfcStructuralLoadTemperature has them: a restrained ΔT in z makes a negative My, one in y a positive Mz.
    /// </summary>
    [Theory]
    [InlineData(30, 0, 0, -34_277, 0, 0)]
    [InlineData(0, 20, 0, 0, 0, 120.89)]
    [InlineData(0, 0, 20, 0, -120.89, 0)]
    public void A_restrained_change_of_temperature(double uniform, double acrossY, double acrossZ, double axial, double my, double mz)
    {
        var record = Landing.Screen(Built(SchemaVersion.Ifc4, 1.2e-5, isHeldAtBothEnds: true, (frame, bar) =>
        {
            var summer = frame.Case("Summer", onTop: false);
            frame.Temperature(bar, summer, uniform, acrossY, acrossZ);
            frame.Combination("Service", "SLS", (summer, 1));
        }));

        Assert.All(Assert.Single(record.Members).Situations.Single(s => s.Situation == "Service").Stations, station =>
        {
            Assert.Equal(axial, station.Forces.N, 1e-4 * 34_277);
            Assert.Equal(my, station.Forces.My, 1e-4 * 120.89);
            Assert.Equal(mz, station.Forces.Mz, 1e-4 * 120.89);
        });
    }

    /// <summary>The tube of 2 m, fixed at its start or at both ends; its thermal expansion [1/K] where one is given.</summary>
    private static byte[] Built(SchemaVersion schema, double? expansion, bool isHeldAtBothEnds, Action<FrameWriter, int> load)
    {
        var writer = Landing.Writer(schema);
        var frame = new FrameWriter(writer, "Landing");
        var condition = frame.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed");
        var (a, b) = (frame.Node("A", Vector3.Zero, condition), frame.Node("B", s_end, isHeldAtBothEnds ? condition : null));
        var bar = frame.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ);
        var steel = writer.Materials.Material("S235JR", 235e6, null, 210e9, 0.3);
        if (expansion is { } alpha)
        {
            var property = writer.Add("IFCPROPERTYSINGLEVALUE", "'ThermalExpansionCoefficient'", "$", Spelling.Typed("IFCTHERMALEXPANSIONCOEFFICIENTMEASURE", Spelling.Real(alpha)), "$");
            writer.Add("IFCMATERIALPROPERTIES", "'Pset_MaterialThermal'", "$", Spelling.References([property]), Spelling.Reference(steel));
        }

        frame.Section(steel, writer.Profiles.Of(Landing.PostTube), bar);
        frame.Join(bar, a);
        frame.Join(bar, b);
        load(frame, bar);
        frame.Finish();
        return writer.Build();
    }

    [Fact]
    public void A_load_that_is_not_covered_leaves_its_situation_unchecked()
    {
        var member = Assert.Single(Screen(SchemaVersion.Ifc4, (writer, bar, node, loads) => writer.PlanarAction(bar, loads, new(0, 0, -1))).Members);

        Assert.Equal((Verdict.NotChecked, ReasonCode.ForcesIncomplete), (member.Verdict, member.Reason!.Code));
    }

    [Fact]
    public void Compression_beyond_a_tenth_of_the_euler_load_is_told()
    {
        // π²·E·I/L² = π² × 210e9 × 11.586e-8 / 4 = 60.0 kN; 10 kN are 16.7 % of it.
        var record = Screen(SchemaVersion.Ifc4, (writer, bar, node, loads) => writer.PointAction(node, loads, new(-10_000, 0, 0)));

        // One for the case, one for the combination.
        var warnings = record.Findings.Where(f => f.Code == "SCR-0032").ToList();
        Assert.Equal(2, warnings.Count);
        Assert.All(warnings, w => Assert.Contains("16.7 % of its Euler load", w.Message, StringComparison.Ordinal));
        Assert.Contains(Assert.Single(record.Members).Notes, n => n.Contains("second-order effects", StringComparison.Ordinal));
    }

    [Fact]
    public void A_cable_that_would_be_compressed_leaves_the_model_unchecked()
    {
        var writer = Landing.Writer();
        var frame = new FrameWriter(writer, "Landing");
        var pinned = frame.Condition("fixed", "fixed", "fixed", "free", "free", "free");
        var (a, b, c) = (frame.Node("A", Vector3.Zero, pinned), frame.Node("B", s_end), frame.Node("C", new(2, 0, 2), pinned));
        var guide = frame.Condition("free", "fixed", "free", "free", "free", "free");
        var strut = Bar(writer, frame, "PIN_JOINED_MEMBER");
        var stay = frame.Member("Stay", s_end, new(2, 0, 2), Vector3.UnitX, "CABLE");
        frame.Section(writer.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), writer.Profiles.Of(Landing.PostTube), stay);
        frame.Node("B guided", s_end, guide);
        frame.Join(strut, a);
        frame.Join(strut, b);
        frame.Join(stay, b);
        frame.Join(stay, c);
        Load(frame, loads => frame.PointAction(b, loads, new(0, 0, 500)));
        frame.Finish();

        var record = Landing.Screen(writer.Build());

        Assert.All(record.Members, m => Assert.Equal(Verdict.NotChecked, m.Verdict));
        Assert.Contains("'Stay'", record.Members[0].Reason!.Message, StringComparison.Ordinal);
        Assert.Contains("tension only", record.Members[0].Reason!.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_forces_table_comes_before_our_own_analysis()
    {
        var (bytes, key) = Cantilever(SchemaVersion.Ifc4, (writer, bar, node, loads) => writer.PointAction(node, loads, new(0, 0, -500)));

        var member = Assert.Single(Landing.Screen(bytes, Landing.Table("", key, ("S1", "service", 0, new(1000, 0, 0, 0, 0, 0)), ("S1", "service", 2, new(1000, 0, 0, 0, 0, 0)))).Members);

        Assert.Equal("S1", member.Governing!.Situation);
    }

    [Fact]
    public void A_table_that_the_settings_leave_out_is_told_and_not_used()
    {
        var record = Landing.Screen(Landing.OnePost(), Landing.Constant(new(1000, 0, 0, 0, 0, 0)), """{"forces": {"from": ["results", "statics"]}}""");

        Assert.Contains(record.Findings, f => f.Code == "SCR-0033");
        Assert.Equal(ReasonCode.NoForces, Assert.Single(record.Members).Reason!.Code);
    }

    private static ScreeningRecord Screen(SchemaVersion schema, Action<FrameWriter, int, int, int> load) => Landing.Screen(Cantilever(schema, load).Bytes);

    /// <summary>A tube of 2 m, fixed at its start; loads in one case of a service combination.</summary>
    private static (byte[] Bytes, string Key) Cantilever(SchemaVersion schema, Action<FrameWriter, int, int, int> load)
    {
        var writer = Landing.Writer(schema);
        var frame = new FrameWriter(writer, "Landing");
        var held = frame.Node("A", Vector3.Zero, frame.Condition("fixed", "fixed", "fixed", "fixed", "fixed", "fixed"));
        var free = frame.Node("B", s_end);
        var bar = Bar(writer, frame);
        frame.Join(bar, held);
        frame.Join(bar, free);
        Load(frame, loads => load(frame, bar, free, loads));
        frame.Finish();
        var bytes = writer.Build();
        return (bytes, Landing.Screen(bytes).Members.Single().Key);
    }

    private static int Bar(ModelWriter writer, FrameWriter frame, string type = "RIGID_JOINED_MEMBER")
    {
        var bar = frame.Member("Strut", Vector3.Zero, s_end, Vector3.UnitZ, type);
        frame.Section(writer.Materials.Material("S235JR", 235e6, null, 210e9, 0.3), writer.Profiles.Of(Landing.PostTube), bar);
        return bar;
    }

    private static void Load(FrameWriter frame, Action<int> load)
    {
        var live = frame.Case("Live", onTop: false);
        load(live);
        frame.Combination("Service", "SLS", (live, 1));
    }
}
