using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking;

namespace MemberScan.Screening.Tests.Checking;

/// <summary>Envelopes of tables: post 48.3 × 3.2 mm, A = 4.5339 cm², Wel = 4.7974 cm³ (EN 10219-2 formulas), S235, limit 235/1.67 MPa.</summary>
public sealed class EnvelopeTests
{
    private const string Envelopes = "# situations: envelopes\n";
    private const double Limit = 235e6 / 1.67, Area = 4.5339e-4, Modulus = 4.7974e-6;

    [Fact]
    public void Every_corner_of_least_and_largest_values_is_tried_and_the_result_is_called_an_upper_bound()
    {
        // Rows of one station: N from −5 to 20 kN, My from −300 to 100 N·m, never both extremes in one row. Corner by hand: 20 kN and 300 N·m.
        var table = Landing.Table(Envelopes, Landing.Post,
            ("E", "service", 0, new(20e3, 0, 0, 0, 100, 0)), ("E", "service", 0, new(-5e3, 0, 0, 0, -300, 0)),
            ("E", "service", 1, new(20e3, 0, 0, 0, 100, 0)), ("E", "service", 1, new(-5e3, 0, 0, 0, -300, 0)));

        var member = Landing.ScreenOne(Landing.OnePost(), table, """{"stability": {"lengthFactor": 0.5}}""");

        Assert.Equal((20e3 / Area + 300 / Modulus) / Limit, member.Governing!.Utilization, 1e-3);
        Assert.Contains(EnvelopeSearch.Note, member.Notes);
        Assert.StartsWith("envelope:", member.Situations[0].Conversion, StringComparison.Ordinal);
    }

    [Fact]
    public void A_single_row_is_a_magnitude_and_counts_both_ways()
    {
        var one = Landing.Table(Envelopes, Landing.Post, ("E", "service", 0, new(5e3, 0, 0, 0, 200, 0)), ("E", "service", 1, new(5e3, 0, 0, 0, 200, 0)));

        var stations = Landing.ScreenOne(Landing.OnePost(), one).Situations[0].Stations;

        Assert.Equal([(0, -5e3), (0, 5e3), (1, -5e3), (1, 5e3)], stations.Select(s => (s.X, s.Forces.N)));
    }

    [Fact]
    public void Between_stations_the_moment_is_bounded_by_the_shear()
    {
        // V between −1 and 1 kN over 1 m and M within ±100 N·m at both ends: M ≤ 100 + 1000·½ in the middle.
        var (start, end) = (new EnvelopeStation(0, new(0, 0, -1000, 0, -100, 0), new(0, 0, 1000, 0, 100, 0)), new EnvelopeStation(1, new(0, 0, -1000, 0, -100, 0), new(0, 0, 1000, 0, 100, 0)));

        var between = EnvelopeSearch.Between(start, end);

        Assert.Equal((-600, 600), (between.Least.My, between.Largest.My));
        Assert.Equal(0.5, between.X);
    }

    [Theory]
    [InlineData(1000, Verdict.WithinLimit)]
    [InlineData(3000, Verdict.NotChecked)]
    public void A_bound_over_the_limit_between_stations_makes_them_too_coarse(double shear, Verdict verdict)
    {
        // Bound of M in the middle: V/2 N·m; the limit is 235/1.67·4.7974 = 675 N·m.
        var table = Landing.Table(Envelopes, Landing.Post, ("E", "service", 0, new(0, 0, shear, 0, 0, 0)), ("E", "service", 1, new(0, 0, shear, 0, 0, 0)));

        var member = Landing.ScreenOne(Landing.OnePost(), table);

        Assert.Equal(verdict, member.Verdict);
        if (verdict == Verdict.NotChecked) Assert.Equal(ReasonCode.StationsTooCoarse, member.Reason!.Code);
    }

    [Fact]
    public void An_envelope_over_the_limit_at_a_station_is_overstressed()
    {
        var table = Landing.Table(Envelopes, Landing.Post, ("E", "service", 0, new(0, 0, 0, 0, 700, 0)), ("E", "service", 1, new(0, 0, 0, 0, 700, 0)));

        Assert.Equal(Verdict.Overstressed, Landing.ScreenOne(Landing.OnePost(), table).Verdict);
    }

    [Fact]
    public void Envelopes_are_not_superposed()
    {
        var table = Landing.Table(Envelopes + "# results: linear\n", Landing.Post, ("E", "service", 0, new(1, 0, 0, 0, 0, 0)), ("E", "service", 1, new(1, 0, 0, 0, 0, 0)));

        Assert.Null(Landing.Run(Landing.OnePost(), new Foundation.Diagnostics.DiagnosticList(), """{"forces": {"combinations": [{"name": "C", "kind": "design", "factors": {"E": 1}}]}}""", tables: [table]));
    }
}
