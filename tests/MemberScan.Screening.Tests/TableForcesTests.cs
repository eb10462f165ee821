using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Screening.Tests;

public sealed class TableForcesTests
{
    private static readonly SectionForces s_tension = new(45e3, 0, 0, 0, 0, 0);

    [Theory]
    [InlineData("key")]
    [InlineData("tag")]
    public void A_row_names_its_member_by_key_or_tag(string by)
    {
        var model = Landing.OnePost();
        var key = Landing.ScreenOne(model).Key;

        var member = Landing.ScreenOne(model, Landing.Constant(s_tension).Replace(Landing.Post, by == "key" ? key : Landing.Post, StringComparison.Ordinal));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal("forces-1.csv, lines 2-3", member.Governing!.ForcesSource);
    }

    [Fact]
    public void A_row_names_one_of_several_items_by_its_number()
    {
        var (model, key) = Railing();

        var members = Landing.Screen(model, Landing.Constant(s_tension).Replace(Landing.Post, key + "/2", StringComparison.Ordinal)).Members;

        Assert.Equal([$"{key}/1", $"{key}/2"], members.Select(m => m.Key));
        Assert.Equal([Verdict.NotChecked, Verdict.WithinLimit], members.Select(m => m.Verdict));
    }

    [Fact]
    public void A_bare_GlobalId_of_several_items_is_refused_with_line_and_remedy()
    {
        var (model, key) = Railing();

        var fault = Refused(model, Landing.Constant(s_tension).Replace(Landing.Post, key, StringComparison.Ordinal));

        Assert.Equal(("SCR-0002", 2), (fault.Code, fault.Span!.Value.Line));
        Assert.Equal($"'{key}' has 2 items; name one of them, such as '{key}/1'.", fault.Message);
    }

    [Fact]
    public void A_tag_of_two_members_is_refused_with_line_and_remedy()
    {
        var writer = Landing.Writer();
        Landing.Add(writer, Landing.Shape(writer, Landing.PostTube, 1));
        var other = writer.Element("IFCMEMBER", "Other", writer.LocalPlacement(Transform3.Identity), Landing.Shape(writer, Landing.PostTube, 1), new ElementOptions { Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("S235JR"), other);

        var fault = Refused(writer.Build(), Landing.Constant(s_tension));

        Assert.Equal(("SCR-0002", 2), (fault.Code, fault.Span!.Value.Line));
        Assert.StartsWith("The tag 'P-1' names 2 candidates; use the key, such as '", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unknown_member_is_refused_once_with_the_line_of_its_first_row()
    {
        var fault = Refused(Landing.OnePost(), Landing.Constant(s_tension).Replace(Landing.Post, "P-2", StringComparison.Ordinal));

        Assert.Equal(("SCR-0001", 2), (fault.Code, fault.Span!.Value.Line));
        Assert.Equal("'P-2' is the key or tag of no candidate; correct it, or set forces.unknownMembers to \"list\".", fault.Message);
    }

    [Fact]
    public void An_unknown_member_is_listed_and_counted_where_the_settings_say_so()
    {
        var table = Landing.Constant(s_tension) + "P-2,S1,service,0,1,0,0,0,0,0\nP-2,S1,service,1,1,0,0,0,0,0\nP-3,S1,service,0,1,0,0,0,0,0\n";

        var record = Landing.Screen(Landing.OnePost(), table, """{"forces": {"unknownMembers": "list"}}""");

        Assert.Equal(Verdict.WithinLimit, Assert.Single(record.Members).Verdict);
        Assert.Equal((5, 3), (record.ForcesFiles[0].Rows, record.ForcesFiles[0].RowsOfUnknownMembers));
        Assert.Equal(2, record.Findings.Where(f => f.Code == "SCR-0005").Sum(f => f.Count));
    }

    [Fact]
    public void A_station_beyond_the_end_is_refused_with_line_and_length()
    {
        var fault = Refused(Landing.OnePost(), Landing.Constant(s_tension, 1.001));

        Assert.Equal(("SCR-0003", 3), (fault.Code, fault.Span!.Value.Line));
        Assert.Equal("The station at 1.001 m is beyond the end of 'P-1', which is 1 m long.", fault.Message);
    }

    [Fact]
    public void A_situation_given_in_two_tables_is_refused()
    {
        var diagnostics = new DiagnosticList();

        var outcome = Landing.Run(Landing.OnePost(), diagnostics, tables: [Landing.Constant(s_tension), Landing.Constant(s_tension)]);

        Assert.Null(outcome);
        var fault = Assert.Single(diagnostics.Items, d => d.Severity == Severity.Error);
        Assert.Equal("SCR-0007", fault.Code);
        Assert.Contains("forces-1.csv, lines 2-3", fault.Message, StringComparison.Ordinal);
        Assert.Contains("forces-2.csv, lines 2-3", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_tables_with_different_situations_are_both_used()
    {
        var diagnostics = new DiagnosticList();

        var record = Landing.Run(Landing.OnePost(), diagnostics, tables: [Landing.Constant(s_tension), Landing.Constant(s_tension, situation: "S2")])!.Record;

        Assert.Equal(["S1", "S2"], record.Members[0].Situations.Select(s => s.Situation).Order(StringComparer.Ordinal));
        Assert.Equal(["forces-1.csv", "forces-2.csv"], record.ForcesFiles.Select(f => f.FileName));
    }

    /// <summary>Forces on the two ends of a bar in tension point away from it: −N at the start, +N at the end.</summary>
    [Fact]
    public void End_forces_change_sign_at_the_start()
    {
        var table = Landing.Table("# convention: end-forces\n", Landing.Post, ("S1", "service", 0, -1 * new SectionForces(20e3, 100, 300, 20, -300, 100)), ("S1", "service", 1, new(20e3, 100, 300, 20, 0, 0)));

        var member = Landing.ScreenOne(Landing.OnePost(), table);

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(new SectionForces(20e3, 100, 300, 20, -300, 100), member.Situations[0].Stations[0].Forces);
        Assert.Equal("end forces: values at the start reversed", member.Situations[0].Conversion);
    }

    [Fact]
    public void End_forces_between_the_ends_are_refused_with_the_line()
    {
        var fault = Refused(Landing.OnePost(), Landing.Table(
            "# convention: end-forces\n", Landing.Post, ("S1", "service", 0, s_tension), ("S1", "service", 0.5, s_tension), ("S1", "service", 1, s_tension)));

        Assert.Equal(("SCR-0004", 4), (fault.Code, fault.Span!.Value.Line));
    }

    [Fact]
    public void Stations_as_shares_are_taken_of_the_length_of_the_member()
    {
        var table = Landing.Table(("S1", "service", 0, s_tension), ("S1", "service", 25, s_tension), ("S1", "service", 100, s_tension)).Replace("station[m]", "station[%]", StringComparison.Ordinal);

        var member = Landing.ScreenOne(Landing.OnePost(length: 3), table);

        Assert.Equal([0, 0.75, 3], member.Situations[0].Stations.Select(s => s.X));
        Assert.Equal(Verdict.WithinLimit, member.Verdict);
    }

    [Fact]
    public void A_table_comes_before_results_of_the_model_and_says_so()
    {
        var writer = Landing.Writer();
        var post = Landing.Add(writer, Landing.Shape(writer, Landing.PostTube, 1));
        var analysis = writer.StartAnalysis("Landing analysis", Transform3.Identity);
        var line = analysis.CurveMember("A P-1", Vector3.Zero, Vector3.UnitZ, Vector3.UnitY);
        analysis.Link(post, line);
        var loads = analysis.LoadCombination("C1", "SLS", (analysis.LoadCase("G"), 1));
        analysis.CurveReaction(line, analysis.ResultGroup("R", loads), [new(0, new(1e6, 0, 0, 0, 0, 0)), new(1, new(1e6, 0, 0, 0, 0, 0))]);
        var model = writer.Build();

        var (own, replaced) = (Landing.ScreenOne(model), Landing.ScreenOne(model, Landing.Constant(s_tension)));

        Assert.Equal((Verdict.Overstressed, Verdict.WithinLimit), (own.Verdict, replaced.Verdict));
        Assert.StartsWith("IFCSTRUCTURALCURVEREACTION #", own.Governing!.ForcesSource, StringComparison.Ordinal);
        Assert.Equal("S1", Assert.Single(replaced.Situations).Situation);
        Assert.Contains("results in the model are not used for this member: the forces table comes first", replaced.Notes);
    }

    [Fact]
    public void The_convention_of_each_table_stands_in_the_record()
    {
        string Convention(string directive) => Landing.Screen(Landing.OnePost(), directive + Landing.Constant(s_tension)).ForcesFiles[0].Convention;

        Assert.Equal(
            ["positive-face, the default", "positive-face, stated in the table", "end-forces, stated in the table"],
            new[] { "", "# convention: positive-face\n", "# convention: end-forces\n" }.Select(Convention));
    }

    [Fact]
    public void A_proxy_without_a_bar_like_body_is_a_candidate_only_when_a_table_names_it()
    {
        var writer = Landing.Writer();
        var block = writer.Bodies.Shape("SweptSolid", writer.Bodies.Extrusion(writer.Profiles.Of(new Mechanics.Sections.Rectangle(50e-3, 50e-3)), 0.06));
        var proxy = writer.Element("IFCBUILDINGELEMENTPROXY", "Shackle", writer.LocalPlacement(Transform3.Identity), block, new ElementOptions { Tag = Landing.Post });
        writer.Associate(writer.Materials.Material("S235JR"), proxy);
        var model = writer.Build();

        var (unnamed, named) = (Landing.Screen(model), Landing.Screen(model, Landing.Constant(s_tension, 0.06)));

        Assert.Empty(unnamed.Members);
        Assert.Equal(("IfcBuildingElementProxy", 1), (unnamed.PassedOver[0].Class, unnamed.PassedOver[0].Count));
        Assert.Equal(Verdict.WithinLimit, Assert.Single(named.Members).Verdict);
    }

    private static (byte[] Model, string Key) Railing()
    {
        var writer = Landing.Writer();
        int[] disks = [.. Enumerable.Range(0, 2).Select(i => writer.Bodies.SweptDisk([new(i, 0, 0), new(i, 0, 1)], 24.15e-3, 20.95e-3))];
        var railing = writer.Element("IFCRAILING", "Railing", writer.LocalPlacement(Transform3.Identity), writer.Bodies.Shape("AdvancedSweptSolid", disks), new ElementOptions { Key = "R", Tag = "R", PredefinedType = "GUARDRAIL" });
        writer.Associate(writer.Materials.Material("S235JR"), railing);
        return (writer.Build(), writer.GlobalIdOf("IFCRAILING", "R"));
    }

    private static Diagnostic Refused(byte[] model, string table)
    {
        var diagnostics = new DiagnosticList();
        Assert.Null(Landing.Run(model, diagnostics, tables: [table]));
        var fault = Assert.Single(diagnostics.Items, d => d.Severity == Severity.Error);
        Assert.Equal(1, diagnostics.CountOf(fault));
        return fault;
    }
}
