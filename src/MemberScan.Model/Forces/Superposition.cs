using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Model.Forces;

/// <summary>Sums of linear load cases with factors, station by station.</summary>
public static class Superposition
{
    /// <summary>Share of the length within which two stations are at one place.</summary>
    private const double SamePlace = 1e-9;

    /// <summary>Sources that the result of a combination names; of further ones only the number.</summary>
    private const int SourcesNamed = 6;

    /// <summary>The forces of a combination on one member.</summary>
    /// <param name="situation">The combination.</param>
    /// <param name="parts">Its cases on this member, each with its factor; at least one, all of one member.</param>
    /// <param name="length">Length of the member [m], &gt; 0, for cases that do not say where their stations must end.</param>
    /// <param name="rule">Where the factors come from, in words.</param>
    /// <returns>
    /// The sum at every place at which any of the cases has a station; a case without a station there is taken between its neighbours where
    /// they allow it. Unusable, with the reason, where a case is not linear, is an envelope, is unusable itself or is not known at a place.
    /// </returns>
    public static MemberForces Of(Situation situation, IReadOnlyList<FactoredForces> parts, double length, string rule)
    {
        ArgumentNullException.ThrowIfNull(situation);
        ArgumentNullException.ThrowIfNull(parts);
        ArgumentOutOfRangeException.ThrowIfZero(parts.Count);

        var first = parts[0].Forces;
        var sum = new MemberForces
        {
            MemberKey = first.MemberKey,
            Situation = situation,
            Stations = [],
            Source = Sources(parts),
            Conversion = $"{string.Join(" + ", parts.Select(p => p.Words))} ({rule})" + Conversions(parts),
            From = parts.Min(p => p.Forces.From),
            To = parts.Any(p => p.Forces.To is null) ? null : parts.Max(p => p.Forces.To),
            Notes = [.. parts.SelectMany(p => p.Forces.Notes).Distinct(StringComparer.Ordinal)],
        };
        foreach (var part in parts)
            if (Fault(part.Forces) is { } fault)
                return sum with { Unusable = fault };

        var end = sum.To ?? length;
        return Sum(parts, sum.From, end, out var stations) is { } why ? sum with { Unusable = why } : sum with { Stations = stations };
    }

    private static Reason? Fault(MemberForces part) =>
        part.Unusable
        ?? (part.Situation.IsLinear ? null : new Reason(ReasonCode.NoCombination, $"nothing says that the results of '{part.Situation.Name}' are linear, so they are not superposed"))
        ?? (part.Envelope.IsEmpty ? null : new Reason(ReasonCode.NoCombination, $"'{part.Situation.Name}' is an envelope; what acts together is lost, so it is not superposed"))
        ?? (part.Stations.IsEmpty ? new Reason(ReasonCode.NoForces, $"'{part.Situation.Name}' has no stations") : null);

    private static Reason? Sum(IReadOnlyList<FactoredForces> parts, double from, double end, out ImmutableArray<ForceStation> stations)
    {
        var length = end - from;
        var lines = parts.Select(p => ForceLine.Build(p.Forces.Stations.Select(s => s with { X = s.X - from }), length)).ToArray();
        var sums = ImmutableArray.CreateBuilder<ForceStation>();
        stations = [];
        foreach (var x in Places(lines, SamePlace * length))
        {
            var (left, right) = (default(SectionForces), default(SectionForces));
            for (var i = 0; i < lines.Length; i++)
            {
                if (!TryAt(lines[i], x, SamePlace * length, out var l, out var r))
                    return new Reason(ReasonCode.StationsTooCoarse, string.Create(System.Globalization.CultureInfo.InvariantCulture,
                        $"the forces of '{parts[i].Forces.Situation.Name}' are not known at {from + x:0.###} m, where another case of the combination has a station"));

                (left, right) = (left + parts[i].Factor * l, right + parts[i].Factor * r);
            }

            sums.Add(new ForceStation(from + x, left));
            if (left != right) sums.Add(new ForceStation(from + x, right));
        }

        stations = sums.ToImmutable();
        return null;
    }

    private static List<double> Places(ForceLine[] lines, double samePlace)
    {
        var places = new List<double>();
        foreach (var x in lines.SelectMany(l => l.Stations).Select(s => s.X).Order())
            if (places.Count == 0 || x - places[^1] > samePlace) places.Add(x);
        return places;
    }

    // Left and right values of a case at a place: its stations there, else between its neighbours.
    private static bool TryAt(ForceLine line, double x, double samePlace, out SectionForces left, out SectionForces right)
    {
        (left, right) = (default, default);
        var here = line.Stations.Where(s => Math.Abs(s.X - x) <= samePlace).ToArray();
        if (here.Length > 0)
        {
            (left, right) = (here[0].Forces, here[^1].Forces);
            return true;
        }

        foreach (var interval in line.Intervals)
        {
            if (x <= interval.Start.X || x >= interval.End.X) continue;
            if (interval.Kind == IntervalKind.Unknown) return false;

            left = right = interval.At((x - interval.Start.X) / (interval.End.X - interval.Start.X));
            return true;
        }

        return false;
    }

    private static string Sources(IReadOnlyList<FactoredForces> parts)
    {
        var sources = parts.Select(p => p.Forces.Source).Distinct(StringComparer.Ordinal).ToArray();
        var named = string.Join(" + ", sources.Take(SourcesNamed));
        return sources.Length > SourcesNamed ? string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{named} + {sources.Length - SourcesNamed} more") : named;
    }

    private static string Conversions(IReadOnlyList<FactoredForces> parts) => string.Concat(
        parts.Select(p => p.Forces.Conversion).Where(c => c.Length > 0).Distinct(StringComparer.Ordinal).Select(c => "; " + c));
}
