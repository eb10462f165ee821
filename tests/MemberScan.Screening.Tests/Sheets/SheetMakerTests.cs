using MemberScan.Foundation.Diagnostics;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Screening.Tests.Sheets;

public sealed class SheetMakerTests
{
    private static (MemberResult Member, SheetData? Data) Sheet(CrossSection section, string table, double length = 1)
    {
        var diagnostics = new DiagnosticList();
        var outcome = Landing.Run(Landing.OnePost(section, length), diagnostics, tables: [table]);
        Assert.True(outcome is not null, string.Join('\n', diagnostics.Items.Select(d => d.Message)));
        var member = Assert.Single(outcome.Record.Members);
        return (member, outcome.Sheets.Of(member));
    }

    // Simple span under uniform load, worked by hand: V = ±qL/2, M = qL²/8 in the middle. Own arithmetic: q 2 kN/m, L 2 m → V ±2 kN, M 1 kN·m.
    [Fact]
    public void Finds_the_largest_moment_between_stations_and_the_utilization_of_the_record_there()
    {
        var (member, data) = Sheet(new Tube(24.15e-3, 3.2e-3), Landing.Table(
            ("S1", "service", 0, new SectionForces(0, 0, 2e3, 0, 0, 0)), ("S1", "service", 2, new SectionForces(0, 0, -2e3, 0, 0, 0))), 2);

        var line = Assert.Single(data!.Lines);
        var (least, largest) = line.Extremes(ForceComponent.My);
        Assert.Equal(1e3, largest.Forces.My, 1e-6);
        Assert.Equal(1, largest.X, 1e-9);
        Assert.False(largest.IsStation);
        Assert.Equal(0, least.Forces.My);
        Assert.Equal(member.Governing!.Utilization, line.Lines[0].Max(p => p.Utilization!.Value), 1e-3);
    }

    [Fact]
    public void Keeps_both_sides_of_a_jump()
    {
        var (_, data) = Sheet(new Tube(24.15e-3, 3.2e-3), Landing.Table(
            ("S1", "service", 0, new SectionForces(0, 0, 1e3, 0, 0, 0)), ("S1", "service", 0.5, new SectionForces(0, 0, 1e3, 0, 500, 0)),
            ("S1", "service", 0.5, new SectionForces(0, 0, -1e3, 0, 500, 0)), ("S1", "service", 1, new SectionForces(0, 0, -1e3, 0, 0, 0))));

        var there = data!.Lines[0].Lines[0].Where(p => p.X == 0.5).Select(p => p.Forces.Vz);
        Assert.Equal([1e3, -1e3], there);
    }

    [Fact]
    public void Puts_the_governing_situation_first()
    {
        var strong = new SectionForces(0, 0, 0, 0, 900, 0);
        var (member, data) = Sheet(new Tube(24.15e-3, 3.2e-3), Landing.Table(
            ("A", "service", 0, 0.1 * strong), ("A", "service", 1, 0.1 * strong), ("B", "service", 0, strong), ("B", "service", 1, strong)));

        Assert.Equal("B", member.Governing!.Situation);
        Assert.Equal(["B", "A"], data!.Lines.Select(l => l.Situation));
        Assert.Equal(member.Governing.Forces, data.Whole.Forces);
        Assert.Equal(member.Governing.Point.State, data.Whole.AtPoint);
    }

    [Fact]
    public void Has_nothing_to_draw_where_no_stress_was_found()
    {
        var outcome = Landing.Run(Landing.OnePost(), new DiagnosticList())!;

        Assert.Null(outcome.Sheets.Of(outcome.Record.Members[0]));
        Assert.Null(outcome.Sheets.SamplesOf(outcome.Record.Members[0]));
    }
}
