using System.Collections.Immutable;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Drawing;

/// <summary>How the utilizations of all candidates spread: bars of a tenth up to 1.5 and one for all above.</summary>
/// <param name="Bars">The bars, rising.</param>
/// <param name="WithoutUtilization">Candidates of which no utilization is known.</param>
public sealed record UtilizationSpread(ImmutableArray<SpreadBar> Bars, int WithoutUtilization)
{
    /// <summary>Bars up to a utilization of 1.</summary>
    public const int BarsToLimit = 10;

    /// <summary>Bars between 1 and 1.5.</summary>
    public const int BarsOverLimit = 5;

    // Over the limit means more than this; a value on the edge of a bar belongs to the bar below it.
    private const double Slack = 1e-9;

    /// <summary>The spread of a list of candidates.</summary>
    public static UtilizationSpread Of(ImmutableArray<MemberResult> members)
    {
        var counts = new int[BarsToLimit + BarsOverLimit + 1, 3];
        var without = 0;
        foreach (var member in members)
        {
            if (member.Governing is { } governing) counts[BarOf(governing.Utilization), (int)member.Verdict]++;
            else without++;
        }

        var bars = Enumerable.Range(0, BarsToLimit + BarsOverLimit + 1).Select(bar => new SpreadBar(
            bar / 10.0, bar == BarsToLimit + BarsOverLimit ? double.PositiveInfinity : (bar + 1) / 10.0,
            counts[bar, (int)Verdict.WithinLimit], counts[bar, (int)Verdict.Overstressed], counts[bar, (int)Verdict.NotChecked]));
        return new UtilizationSpread([.. bars], without);
    }

    private static int BarOf(double utilization) =>
        Math.Clamp((int)Math.Ceiling(Math.Min(utilization, 2) * 10 - 10 * Slack) - 1, 0, BarsToLimit + BarsOverLimit);
}
