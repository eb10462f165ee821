using System.Globalization;
using System.Text.RegularExpressions;
using MemberScan.Reporting.Drawing;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Tests.Drawing;

public sealed class ContourLinesTests
{
    // 6 × 6 nodes one apart; the outer ones carry no sample. The value of a node is its column.
    private static readonly SampleGrid s_grid = new(6, 6, 0, 0, 1, [.. Enumerable.Range(0, 36).Select(n => IsInner(n) ? (n / 6 - 1) * 4 + n % 6 - 1 : -1)]);
    private static readonly double[] s_values = [.. Enumerable.Range(0, 36).Where(IsInner).Select(n => (double)(n % 6))];

    [Fact]
    public void Enclose_the_part_at_or_above_a_level_to_a_fraction_of_a_square()
    {
        var points = Points(ContourLines.Path(s_grid, s_values, 2.25, 100, 200, 10));

        // Linear between nodes: the level is met at column 2.25; beyond the last samples the line runs just short of the next nodes.
        Assert.Equal(122.5, points.Min(p => p.X), 0.05);
        Assert.Equal(149.8, points.Max(p => p.X), 0.05);
        Assert.Equal(150.2, points.Min(p => p.Y), 0.05);
        Assert.Equal(199.8, points.Max(p => p.Y), 0.05);
    }

    [Fact]
    public void Are_nothing_above_the_largest_value_and_all_below_the_least()
    {
        Assert.Empty(ContourLines.Path(s_grid, s_values, 4.5, 0, 0, 10));
        Assert.Equal(0.2, Points(ContourLines.Path(s_grid, s_values, -1, 0, 0, 10)).Min(p => p.X), 0.05);
    }

    private static bool IsInner(int node) => node / 6 is > 0 and < 5 && node % 6 is > 0 and < 5;

    private static List<(double X, double Y)> Points(string path) =>
        [.. Regex.Matches(path, "(-?[0-9.]+) (-?[0-9.]+)").Select(m => (double.Parse(m.Groups[1].Value, CultureInfo.InvariantCulture), double.Parse(m.Groups[2].Value, CultureInfo.InvariantCulture)))];
}
