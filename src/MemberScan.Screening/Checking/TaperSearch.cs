using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking.Rules;

namespace MemberScan.Screening.Checking;

/// <summary>Seeks the largest stress along a tapering member: the section is taken at each place.</summary>
internal sealed class TaperSearch(Taper taper, ShearModel model, Subject subject, double from, StressRule rule, int index)
{
    /// <summary>Parts into which a stretch between stations is cut before its largest value is closed in upon.</summary>
    private const int Parts = 16;

    /// <summary>Steps of the golden section; they leave a ten-thousandth of a part.</summary>
    private const int Steps = 20;

    private Found? _best;

    /// <summary>The place of largest stress over limit; null where there is no field.</summary>
    public Found? Of(SituationFindings findings, ForceLine line)
    {
        foreach (var station in line.Stations) Try(station.X, station.Forces);
        foreach (var interval in line.Intervals)
        {
            if (interval.Kind == IntervalKind.Unknown)
            {
                findings.Bar(ReasonCode.StationsTooCoarse, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"between the stations at {from + interval.Start.X:0.###} m and {from + interval.End.X:0.###} m a larger value is possible"));
                continue;
            }

            if (interval.Kind == IntervalKind.UniformLoadInferred) findings.Note("uniform load inferred between stations");
            if (interval.End.X > interval.Start.X) SearchInside(interval);
        }

        if (_best is null) findings.Bar(ReasonCode.CheckNotEvaluated, "no stress field for the tapering section");
        return _best;
    }

    private double Try(double x, in SectionForces forces)
    {
        var shape = taper.At(Math.Clamp((from + x) / subject.Length, 0, 1));
        if (!StressField.TryCreate(shape, model, subject.Poisson, out var field, out _)) return 0;

        var cleaned = SituationChecker.Cleaned(forces, shape);
        if (!NumberRange.Holds(shape, field.Properties, cleaned)) return 0;

        var (utilization, point) = rule.Govern(field, cleaned);
        if (_best is null || utilization > _best.Utilization) _best = new Found(utilization, from + x, cleaned, point, field, index, rule);
        return utilization;
    }

    private void SearchInside(ForceInterval interval)
    {
        double At(double share) => Try(interval.Start.X + share * (interval.End.X - interval.Start.X), interval.At(share));

        var (best, largest) = (0.0, double.NegativeInfinity);
        for (var i = 0; i <= Parts; i++)
        {
            var value = At((double)i / Parts);
            if (value > largest) (best, largest) = ((double)i / Parts, value);
        }

        GoldenSection.CloseIn(At, Math.Max(0, best - 1.0 / Parts), Math.Min(1, best + 1.0 / Parts), Steps);
    }
}
