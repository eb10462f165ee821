using System.Globalization;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Checking.Rules;

namespace MemberScan.Screening.Checking;

/// <summary>The largest stress of an envelope: every corner of the box of least and largest values at each station, and a bound between stations.</summary>
/// <remarks>
/// Between two stations the shear forces are taken to stay within their values at the two. The moments are then bounded from both sides by
/// <c>M(x) ≤ M1 + V·(x − x1)</c> and <c>M(x) ≤ M2 − V·(x2 − x)</c> with the extreme V of each (dMy/dx = Vz, dMz/dx = −Vy). The bound is no state of
/// the member: over the limit it says that the stations are too coarse, never that the member is overstressed.
/// </remarks>
internal static class EnvelopeSearch
{
    /// <summary>What every result of an envelope says.</summary>
    public const string Note = "envelope: an upper bound, at all corners of least and largest values; shear between stations taken within its values at the two";

    /// <summary>Looks for the largest utilization.</summary>
    /// <param name="findings">Takes what bars a verdict.</param>
    /// <param name="envelope">The stations, in rising order; at least one.</param>
    /// <param name="field">Field of the section.</param>
    /// <param name="rule">The criterion.</param>
    /// <param name="index">Number of the situation.</param>
    public static Found? Largest(SituationFindings findings, IReadOnlyList<EnvelopeStation> envelope, StressField field, StressRule rule, int index)
    {
        Found? best = null;
        foreach (var station in envelope)
            foreach (var corner in station.Corners())
                if (At(findings, station.X, corner) is { } found)
                    best = Found.Larger(best, found);

        for (var i = 1; i < envelope.Count; i++)
        {
            var between = Between(envelope[i - 1], envelope[i]);
            var largest = between.Corners().Max(corner => At(findings, between.X, corner)?.Utilization ?? double.PositiveInfinity);
            if (largest > MemberChecker.OverLimit)
                findings.Bar(ReasonCode.StationsTooCoarse, string.Create(CultureInfo.InvariantCulture,
                    $"between the stations of the envelope at {envelope[i - 1].X:0.###} m and {envelope[i].X:0.###} m its bound is {largest:0.##} times the limit"));
        }

        return best;

        Found? At(SituationFindings told, double x, in SectionForces forces)
        {
            if (!NumberRange.Holds(field.Section, field.Properties, SituationChecker.Cleaned(forces, field.Section)))
            {
                told.Bar(ReasonCode.CheckNotEvaluated, "the forces are so large that stresses are beyond the range of numbers");
                return null;
            }

            var usable = SituationChecker.Usable(told, field, field.Section, forces);
            var (utilization, point) = rule.Govern(field, usable);
            return new Found(utilization, x, usable, point, field, index, rule);
        }
    }

    /// <summary>The box that holds all states between two stations.</summary>
    internal static EnvelopeStation Between(in EnvelopeStation start, in EnvelopeStation end)
    {
        var (a, b) = (start, end);
        var length = b.X - a.X;
        var (vyLeast, vyLargest) = (Math.Min(a.Least.Vy, b.Least.Vy), Math.Max(a.Largest.Vy, b.Largest.Vy));
        var (vzLeast, vzLargest) = (Math.Min(a.Least.Vz, b.Least.Vz), Math.Max(a.Largest.Vz, b.Largest.Vz));
        var (myLeast, myLargest) = (-Upper(-a.Least.My, -b.Least.My, -vzLargest, -vzLeast, length), Upper(a.Largest.My, b.Largest.My, vzLeast, vzLargest, length));
        var (mzLeast, mzLargest) = (-Upper(-a.Least.Mz, -b.Least.Mz, vyLeast, vyLargest, length), Upper(a.Largest.Mz, b.Largest.Mz, -vyLargest, -vyLeast, length));
        return new EnvelopeStation(
            (a.X + b.X) / 2,
            new SectionForces(Math.Min(a.Least.N, b.Least.N), vyLeast, vzLeast, Math.Min(a.Least.T, b.Least.T), myLeast, mzLeast),
            new SectionForces(Math.Max(a.Largest.N, b.Largest.N), vyLargest, vzLargest, Math.Max(a.Largest.T, b.Largest.T), myLargest, mzLargest));
    }

    // Largest value that a curve with slopes between two bounds can reach between its largest values at the two ends.
    private static double Upper(double first, double second, double leastSlope, double largestSlope, double length)
    {
        var ends = Math.Max(first, second);
        if (largestSlope <= leastSlope) return ends;

        var s = (second - first - leastSlope * length) / (largestSlope - leastSlope);
        return s > 0 && s < length ? Math.Max(ends, first + largestSlope * s) : ends;
    }
}
