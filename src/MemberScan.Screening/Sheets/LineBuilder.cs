using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Screening.Checking;
using MemberScan.Screening.Record;

namespace MemberScan.Screening.Sheets;

/// <summary>Forces and utilization of a situation along a member, at its stations and between them.</summary>
internal sealed class LineBuilder(Basis basis)
{
    // Parts of a stretch between stations; with more stations than the second number none are put between.
    private const int Parts = 8, MostStations = 60;

    /// <summary>The line of a situation; null where the length is not known.</summary>
    /// <param name="forces">Its forces.</param>
    /// <param name="situation">What the record says of it.</param>
    /// <param name="result">The candidate.</param>
    /// <param name="governing">Its governing check.</param>
    /// <param name="field">The field that decides; null where the section changes along the member, which leaves utilization out.</param>
    /// <param name="withUtilization">Whether the utilization along the member is found.</param>
    public SituationLine? Of(MemberForces forces, SituationResult situation, MemberResult result, Governing governing, StressField? field, bool withUtilization)
    {
        if (result.Length is not { } length) return null;
        if (!forces.Envelope.IsEmpty)
        {
            ImmutableArray<LinePoint> Side(Func<EnvelopeStation, SectionForces> of) => [.. forces.Envelope.Select(e => new LinePoint(e.X, of(e), true, null))];
            return new SituationLine(situation.Situation, situation.Kind, [Side(e => e.Least), Side(e => e.Largest)]);
        }

        var findings = new SituationFindings(forces);
        var isKnown = true;
        var stations = field is null ? forces.Stations : TorsionMove.Of(forces, field.Properties, findings, out isKnown);
        var line = ForceLine.Build(stations.Select(s => s with { X = s.X - forces.From }), (forces.To ?? length) - forces.From);
        var station = governing.StressStation ?? governing.Station;
        var isGoverning = situation.Situation == governing.Situation && situation.Kind == governing.Kind;
        var points = Points(line, forces.From, isGoverning ? station : null);
        var allowed = isGoverning ? governing.Limit : Allowed(situation.Kind, result);
        return new SituationLine(situation.Situation, situation.Kind, [isKnown && withUtilization ? WithUtilization(points, field, governing, allowed, isGoverning) : points])
        {
            IsTorsionMoved = !stations.SequenceEqual(forces.Stations),
        };
    }

    private double? Allowed(string kind, MemberResult result) =>
        (kind == "design" ? basis.Design : basis.Service) is { Criterion: Criterion.AllowableVonMises or Criterion.AllowableTresca or Criterion.En1993Elastic } limit && result.Strength is { } strength
            ? strength / limit.Factor
            : null;

    private static ImmutableArray<LinePoint> Points(ForceLine line, double from, double? governing)
    {
        var points = line.Stations.Select(s => new LinePoint(from + s.X, s.Forces, true, null)).ToList();
        foreach (var interval in line.Intervals)
        {
            if (interval.Kind == IntervalKind.Unknown) continue;

            var shares = line.Stations.Length > MostStations ? [] : Enumerable.Range(1, Parts - 1).Select(i => (double)i / Parts).Concat(Vertices(interval)).ToList();
            if (governing is { } x && (x - from - interval.Start.X) / (interval.End.X - interval.Start.X) is > 0 and < 1 and var share) shares.Add(share);
            points.AddRange(shares.Select(s => new LinePoint(from + interval.Start.X + s * (interval.End.X - interval.Start.X), interval.At(s), false, null)));
        }

        // A stable sort: two stations at one place stay in their order.
        return [.. points.OrderBy(p => p.X)];
    }

    /// <summary>Where a moment of a uniform load is largest: its shear force is zero there.</summary>
    private static IEnumerable<double> Vertices(ForceInterval interval)
    {
        if (interval.Kind != IntervalKind.UniformLoadInferred) yield break;

        foreach (var (a, b) in new[] { (interval.Start.Forces.Vz, interval.End.Forces.Vz), (interval.Start.Forces.Vy, interval.End.Forces.Vy) })
            if (a * b < 0) yield return a / (a - b);
    }

    private static double StressOf(Governing governing) => governing.Check == Governing.StressKey ? governing.Utilization : governing.StressUtilization;

    private static ImmutableArray<LinePoint> WithUtilization(ImmutableArray<LinePoint> points, StressField? field, Governing governing, double? allowed, bool isGoverning)
    {
        if (field is null || allowed is not { } limit) return points;

        var forces = points.Select(p => SituationChecker.Cleaned(p.Forces, field.Section)).ToArray();
        if (forces.Any(f => !NumberRange.Holds(field.Section, field.Properties, f) || (f.T != 0 && !field.CarriesTorsion))) return points;

        var values = new double[forces.Length];
        field.GovernEach(forces, governing.Point.Measure, values);
        return [.. points.Select((p, i) => p with { Utilization = isGoverning && p.X == (governing.StressStation ?? governing.Station) ? Math.Max(StressOf(governing), Math.Abs(values[i]) / limit) : Math.Abs(values[i]) / limit })];
    }
}
