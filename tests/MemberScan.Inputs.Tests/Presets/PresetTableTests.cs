using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.Presets;
using MemberScan.Model.Forces;
using MemberScan.Model.Presets;

namespace MemberScan.Inputs.Tests.Presets;

public sealed class PresetTableTests
{
    private const double Pound = 4.4482216152605, Foot = 0.3048;

    [Fact]
    public void Every_shipped_preset_names_its_code_clause_and_occupancy_and_is_marked_as_from_memory()
    {
        Assert.NotEmpty(PresetTable.Shipped);
        Assert.All(PresetTable.Shipped, preset =>
        {
            Assert.True(preset.FromMemory);
            Assert.Contains(preset.Standard, preset.Source, StringComparison.Ordinal);
            Assert.Contains(preset.Clause, preset.Source, StringComparison.Ordinal);
            Assert.EndsWith("(from memory)", preset.Source, StringComparison.Ordinal);
            Assert.NotEqual(SituationKind.Unknown, preset.SituationKind);
        });
    }

    [Fact]
    public void The_guard_loads_are_200_pounds_50_pounds_per_foot_and_50_pounds_on_a_square_foot()
    {
        // ASCE 7-22, 4.5.1: 200 lb (0.89 kN), 50 lb/ft (0.73 kN/m), 50 lb (0.22 kN) on 12 in by 12 in; from memory.
        var guard = PresetTable.Shipped.Single(p => p.Name == "guard-asce-7-22");

        Assert.Equal(200 * Pound, guard.Concentrated!.Value, 6);
        Assert.Equal(50 * Pound / Foot, guard.Line!.Value, 6);
        Assert.Equal(50 * Pound, guard.Infill!.Value, 6);
        Assert.Equal(Foot, guard.InfillSide!.Value, 9);
        Assert.Equal(0.89, guard.Concentrated.Value / 1e3, 2);
        Assert.Equal(0.73, guard.Line.Value / 1e3, 2);
    }

    [Fact]
    public void The_sprinkler_basis_is_its_own_preset_and_of_the_design_kind()
    {
        var sprinkler = PresetTable.Shipped.Single(p => p.Kind == PresetKind.SprinklerHanger);

        Assert.Equal((5, SituationKind.Design), (sprinkler.WeightFactor, sprinkler.SituationKind));
        Assert.Equal(250 * Pound, sprinkler.Added, 6);
    }

    [Theory]
    [InlineData("4", "40", 16.3)]
    [InlineData("2", "40", 5.11)]
    [InlineData("6", "10", 23.0)]
    public void A_water_filled_pipe_weighs_what_the_tables_say(string size, string schedule, double poundsPerFoot)
    {
        // Weight of water-filled steel pipe, lb/ft: 4 in sch. 40 16.3, 2 in sch. 40 5.1, 6 in sch. 10 23.0 (makers' tables, from memory); within 1 %.
        var pipe = PipeTable.Shipped.Find(size, schedule)!;

        var weight = pipe.WeightPerLength(1000, 9.80665) / (Pound / Foot);

        Assert.Equal(poundsPerFoot, weight, 0.01 * poundsPerFoot);
    }

    [Theory]
    [InlineData("""{"presets": [{"name": "a"}]}""", "INP-0109")]
    [InlineData("""{"presets": [{"name": "a", "kind": "roof", "standard": "s", "clause": "c", "occupancy": "o", "situation": "service", "fromMemory": true}]}""", "INP-0105")]
    [InlineData("""{"presets": [{"name": "a", "kind": "guard", "standard": "s", "clause": "c", "occupancy": "o", "situation": "service", "fromMemory": true, "concentrated": "200"}]}""", "INP-0108")]
    public void A_wrong_preset_is_refused_with_its_place(string text, string code)
    {
        var diagnostics = new DiagnosticList();

        _ = PresetTable.Read(Encoding.UTF8.GetBytes(text), "loads.json", diagnostics);

        Assert.Contains(diagnostics.Items, d => d.Code == code && d.Span is not null);
    }
}
