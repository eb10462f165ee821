using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.SampleModels.Writing;

namespace MemberScan.Screening.Tests;

public sealed class StressCheckSetsTests
{
    [Fact]
    public void A_checked_post_carries_its_values_in_SI()
    {
        var record = Landing.Screen(Landing.OnePost(), Landing.Constant(new(45e3, 0, 0, 0, 0, 0)));

        var set = Assert.Single(StressCheckSets.From(record));

        var governing = record.Members[0].Governing!;
        Assert.Equal(("WITHIN LIMIT", (string?)null, "S1", 0.0), (set.Status, set.Reason, set.Situation, set.Station));
        Assert.Equal((governing.Utilization, governing.Limit, governing.Stress), (set.Utilization!.Value, set.StressLimit!.Value, set.EquivalentStress!.Value));
        Assert.Equal((governing.Point.Y, governing.Point.Z, governing.Point.Place), (set.PointY!.Value, set.PointZ!.Value, set.PointName));
        Assert.Equal(45e3 / 4.5339e-4, set.NormalStress!.Value, 1e4);
        Assert.Equal("99.3 MPa", set.EquivalentStressText);
        Assert.Equal(("MemberScan 1.2.3", record.RunId), (set.Program, set.RunId));
        Assert.Equal((null, null), (set.Item, set.ItemCount));
    }

    [Fact]
    public void An_unchecked_post_carries_status_reason_program_and_run()
    {
        var record = Landing.Screen(Landing.OnePost(material: "Steel"), Landing.Constant(new(45e3, 0, 0, 0, 0, 0)));

        var set = Assert.Single(StressCheckSets.From(record));

        Assert.Equal(("NOT CHECKED", "MemberScan 1.2.3", record.RunId), (set.Status, set.Program, set.RunId));
        Assert.StartsWith("no-strength: material 'Steel'", set.Reason, StringComparison.Ordinal);
        Assert.Equal((null, null, null), (set.Utilization, set.Station, set.EquivalentStressText));
        Assert.NotNull(set.SectionSource);
    }

    [Theory]
    [InlineData(100, 200, 150, 2, Verdict.WithinLimit)]         // the largest of three that are within
    [InlineData(100, 100, 100, 1, Verdict.WithinLimit)]         // of equal ones the first
    [InlineData(100, 700, 900, 3, Verdict.Overstressed)]
    [InlineData(500, 0, 100, 2, Verdict.NotChecked)]            // no forces before any figure within the limit
    [InlineData(0, 700, 100, 2, Verdict.Overstressed)]          // over the limit before unchecked
    public void Of_several_items_the_worst_one_is_shown(double first, double second, double third, int worst, Verdict verdict)
    {
        var writer = Landing.Writer();
        int[] disks = [.. Enumerable.Range(0, 3).Select(i => writer.Bodies.SweptDisk([new(i, 0, 0), new(i, 0, 1)], 24.15e-3, 20.95e-3))];
        var railing = writer.Element("IFCRAILING", "Railing", writer.LocalPlacement(Transform3.Identity), writer.Bodies.Shape("AdvancedSweptSolid", disks), new ElementOptions { Key = "R", PredefinedType = "GUARDRAIL" });
        writer.Associate(writer.Materials.Material("S235JR"), railing);
        var key = writer.GlobalIdOf("IFCRAILING", "R");
        var table = "member,situation,kind,station[m],N[N],Vy[N],Vz[N],T[Nm],My[Nm],Mz[Nm]\n";
        foreach (var (moment, i) in new[] { first, second, third }.Select((m, i) => (m, i)).Where(m => m.m > 0))
        {
            var rows = Landing.Table("", $"{key}/{i + 1}", ("S", "service", 0, new SectionForces(0, 0, moment, 0, -moment, 0)), ("S", "service", 1, new(0, 0, moment, 0, 0, 0)));
            table += rows[(rows.IndexOf('\n', StringComparison.Ordinal) + 1)..];
        }

        var record = Landing.Screen(writer.Build(), table);
        var set = Assert.Single(StressCheckSets.From(record));

        Assert.Equal((VerdictText.Of(verdict), $"{key}/{worst}", 3, key), (set.Status, set.Item, set.ItemCount, set.ElementKey));
        Assert.Equal(record.Members[worst - 1].Governing?.Utilization, set.Utilization);
    }
}
