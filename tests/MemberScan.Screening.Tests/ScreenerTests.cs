using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;
using MemberScan.Part21.Containers;
using MemberScan.SampleModels.HandCalculation;
using MemberScan.SampleModels.Scenario;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Tests;

public sealed class ScreenerTests
{
    private static readonly Lazy<SampleModel[]> s_samples = new(() => [.. SampleModel.All()]);

    public static TheoryData<string> Names => [GangwayRails.Name, DeckHangers.Name, DeckTrapezes.Name, MastStays.Name];

    /// <summary>The calculation by hand shares no formula with the program: textbook formulas written apart (its own remarks name them).</summary>
    [Theory]
    [MemberData(nameof(Names))]
    public void A_sample_gives_the_verdict_reason_and_utilization_of_the_calculation_by_hand(string name)
    {
        var sample = s_samples.Value.Single(s => s.Name == name);

        var record = Screen(sample, withTable: true);

        Assert.Equal(sample.Members.Select(m => m.Key).Order(StringComparer.Ordinal), record.Members.Select(m => m.Key).Order(StringComparer.Ordinal));
        Assert.All(sample.Members, member =>
        {
            var (hand, result) = (HandVerdict.Of(member), record.Members.Single(m => m.Key == member.Key));
            Assert.Equal((hand.Verdict, hand.ReasonCode), (VerdictText.Of(result.Verdict), result.Reason?.Code.Text()));
            if (hand.Utilization is not { } utilization) return;

            Assert.Equal(member.Material.Strength!.Value, result.Strength!.Value, 1e-6 * result.Strength.Value);
            Assert.Equal(1, result.Checks.Single(c => c.Key == Governing.StressKey).Utilization!.Value / utilization, 1e-3);
        });
    }

    [Theory]
    [InlineData(GangwayRails.Name, true, 25, 6, 3)]
    [InlineData(GangwayRails.Name, false, 22, 3, 9)]
    [InlineData(DeckHangers.Name, true, 11, 2, 3)]
    [InlineData(DeckHangers.Name, false, 0, 0, 16)]
    [InlineData(DeckTrapezes.Name, false, 9, 3, 0)]
    [InlineData(MastStays.Name, false, 10, 1, 1)]
    public void The_three_counts_of_a_sample_add_up_to_its_candidates(string name, bool withTable, int within, int over, int open)
    {
        var sample = s_samples.Value.Single(s => s.Name == name);

        var record = Screen(sample, withTable);

        Assert.Equal(new VerdictCounts(within, over, open), record.Counts);
        Assert.Equal(record.Members.Length, record.Counts.Candidates);
        Assert.Equal(within, record.Members.Count(m => m.Verdict == Verdict.WithinLimit));
        Assert.All(record.Members, m => Assert.Equal(m.Verdict == Verdict.NotChecked, m.Reason is not null));
    }

    [Fact]
    public void Ten_posts_of_which_six_are_fine_one_is_over_and_three_cannot_be_checked_are_counted_so()
    {
        var (model, table) = TenPosts();

        var record = Landing.Screen(model, table);

        Assert.Equal(new VerdictCounts(6, 1, 3), record.Counts);
        Assert.Equal("P-7", Assert.Single(record.Members, m => m.Verdict == Verdict.Overstressed).Tag);
        Assert.Equal(["no-strength", "no-forces", "mesh-not-allowed"], record.Members.Where(m => m.Reason is not null).Select(m => m.Reason!.Code.Text()));
    }

    [Fact]
    public void A_model_without_candidates_counts_none_and_a_text_that_is_no_model_is_not_read_to_its_end()
    {
        var empty = Landing.Screen(Landing.Writer().Build());
        var other = Landing.Screen("no model at all"u8.ToArray());

        Assert.Equal((0, true), (empty.Counts.Candidates, empty.Model.ReadToEnd));
        Assert.Equal((0, false), (other.Counts.Candidates, other.Model.ReadToEnd));
    }

    [Fact]
    public void A_model_that_changed_since_its_block_was_written_says_so_and_one_that_did_not_says_nothing()
    {
        var written = new System.Buffers.ArrayBufferWriter<byte>();
        Landing.Run(Landing.OnePost(), new DiagnosticList())!.WriteModel(written);
        var changed = System.Text.Encoding.ASCII.GetString(written.WrittenSpan).Replace("Gangway post", "Gangway Post", StringComparison.Ordinal);

        var untouched = Landing.Screen(written.WrittenSpan.ToArray());
        var touched = Landing.Screen(System.Text.Encoding.ASCII.GetBytes(changed));

        Assert.DoesNotContain(untouched.Findings, f => f.Code == "SCR-0006");
        Assert.Equal(Severity.Warning, Assert.Single(touched.Findings, f => f.Code == "SCR-0006").Severity);
    }

    [Fact]
    public void A_model_whose_numbers_leave_no_room_for_ours_is_checked_but_not_written()
    {
        var text = System.Text.Encoding.ASCII.GetString(Landing.OnePost()).Replace("DATA;\n", "DATA;\n#18446744073709551000=IFCDIRECTION((0.,0.,1.));\n", StringComparison.Ordinal);

        var outcome = Landing.Run(System.Text.Encoding.ASCII.GetBytes(text), new DiagnosticList(), tables: [Landing.Constant(new SectionForces(1000, 0, 0, 0, 0, 0))])!;

        Assert.False(outcome.CanWriteModel);
        Assert.Equal(Verdict.WithinLimit, Assert.Single(outcome.Record.Members).Verdict);
        Assert.Contains(outcome.Record.Findings, f => f.Code == "SCR-0008");
    }

    [Fact]
    public void A_cancelled_run_stops()
    {
        var sample = s_samples.Value[0];
        using var source = new CancellationTokenSource();
        source.Cancel();

        void Run() => Screener.Run(Request(sample, withTable: true), new DiagnosticList(), null, source.Token);

        Assert.ThrowsAny<OperationCanceledException>(Run);
    }

    [Theory]
    [InlineData("1e300,1e300,1e300,1e300,1e300,1e300", ReasonCode.CheckNotEvaluated)]
    [InlineData("0,0,0,0,1e303,0", ReasonCode.CheckNotEvaluated)]
    [InlineData("1e308,0,0,0,0,0", ReasonCode.CheckNotEvaluated)]
    [InlineData("0,0,0,1e250,0,0", ReasonCode.CheckNotEvaluated)]
    [InlineData("1e20,0,0,0,0,0", null)]
    public void Forces_beyond_the_range_of_numbers_are_never_within_the_limit(string forces, ReasonCode? code)
    {
        var table = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\n" + $"P-1,S,service,0,{forces}\nP-1,S,service,1,{forces}\n";

        var member = Landing.ScreenOne(Landing.OnePost(new Round(0.01)), table);

        Assert.Equal(code is null ? Verdict.Overstressed : Verdict.NotChecked, member.Verdict);
        Assert.Equal(code, member.Reason?.Code);
    }

    [Theory]
    [InlineData(1e-320)]
    [InlineData(1e-170)]
    [InlineData(1e-90)]
    [InlineData(0)]
    public void Forces_that_are_next_to_nothing_use_next_to_nothing(double force)
    {
        var member = Landing.ScreenOne(Landing.OnePost(), Landing.Constant(new SectionForces(force, 0, 0, force, force, force)));

        Assert.Equal(Verdict.WithinLimit, member.Verdict);
        Assert.Equal(0, member.Governing!.Utilization, 1e-80);
    }

    [Fact]
    public void A_length_beyond_the_range_of_numbers_is_a_reason()
    {
        var text = System.Text.Encoding.ASCII.GetString(Landing.OnePost())
            .Replace(".LENGTHUNIT.,.MILLI.", ".LENGTHUNIT.,.KILO.", StringComparison.Ordinal).Replace(",1000.);", ",1.E308);", StringComparison.Ordinal)
            .Replace(",24.15,3.2)", ",2.4E-5,3.E-6)", StringComparison.Ordinal);

        var member = Landing.ScreenOne(System.Text.Encoding.ASCII.GetBytes(text), Landing.Constant(new SectionForces(1, 0, 0, 0, 0, 0)));

        Assert.Equal((Verdict.NotChecked, ReasonCode.LengthAmbiguous), (member.Verdict, member.Reason!.Code));
    }

    [Theory]
    [InlineData(1e-12)]
    [InlineData(1e-110)]
    [InlineData(1e60)]
    [InlineData(1e150)]
    public void A_section_beyond_the_range_of_numbers_is_a_reason(double radiusMm)
    {
        var spelled = radiusMm.ToString("0.0###E0", System.Globalization.CultureInfo.InvariantCulture);
        var text = System.Text.Encoding.ASCII.GetString(Landing.OnePost(new Round(0.0123))).Replace("$,12.3)", $"$,{spelled})", StringComparison.Ordinal);
        Assert.Contains($"$,{spelled})", text, StringComparison.Ordinal);

        var member = Landing.ScreenOne(System.Text.Encoding.ASCII.GetBytes(text), Landing.Constant(new SectionForces(-10, 0, 10, 1, 1, 1)));

        Assert.Equal((Verdict.NotChecked, ReasonCode.SectionInvalid), (member.Verdict, member.Reason!.Code));
        Assert.Null(member.Governing);
    }

    internal static (byte[] Model, string Table) TenPosts()
    {
        var writer = Landing.Writer();
        var rows = new List<(string, string, double, SectionForces)>();
        var table = "";
        for (var i = 1; i <= 10; i++)
        {
            var tag = $"P-{i}";
            var shape = i == 10 ? writer.Bodies.Shape("Brep", writer.Bodies.FacetedBlock(0.05, 0.05, 1)) : Landing.Shape(writer, Landing.PostTube, 1);
            Landing.Add(writer, shape, tag, i == 8 ? "Steel" : "S235JR");
            if (i == 9) continue;

            // W = 4797 mm³ (EN 10219-2, CHS 48.3×3.2): 0.5 kNm gives 104 MPa, 0.7 kNm 146 MPa against 235/1.67 = 140.7 MPa.
            var moment = i == 7 ? 700.0 : 500.0;
            rows.Clear();
            rows.Add(("D + L", "service", 0, new SectionForces(0, 0, moment, 0, -moment, 0)));
            rows.Add(("D + L", "service", 1, new SectionForces(0, 0, moment, 0, 0, 0)));
            var part = Landing.Table("", tag, [.. rows]);
            table += table.Length == 0 ? part : part[(part.IndexOf('\n', StringComparison.Ordinal) + 1)..];
        }

        return (writer.Build(), table);
    }

    /// <summary>The record of a sample under its forces table and the default settings.</summary>
    internal static ScreeningRecord Screen(string name) => Screen(s_samples.Value.Single(s => s.Name == name), withTable: true);

    private static ScreeningRecord Screen(SampleModel sample, bool withTable) =>
        Screener.Run(Request(sample, withTable), new DiagnosticList(), null, TestContext.Current.CancellationToken)!.Record;

    private static ScreeningRequest Request(SampleModel sample, bool withTable) => new()
    {
        Model = ModelText.Of(sample.Model.AsMemory(), sample.Name + ".ifc"),
        Settings = Settings.Default,
        Tables = withTable && !sample.ForcesTable.IsEmpty ? [ForcesTable.Read(sample.ForcesTable.AsMemory(), sample.Name + ".forces.csv", new DiagnosticList())!] : [],
        Timestamp = "2026-03-04T05:06:07Z",
        Version = "1.2.3",
    };
}
