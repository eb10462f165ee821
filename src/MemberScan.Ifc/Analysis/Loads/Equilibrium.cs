using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Loads;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>Section forces along an analytical member by equilibrium with the loads on it, all in its own axes.</summary>
internal static class Equilibrium
{
    /// <summary>Parts into which a stretch under a load that is not uniform is cut; under a uniform one a station in the middle is enough.</summary>
    private const int Parts = 16;

    /// <summary>Share of the length within which two places are one.</summary>
    private const double SamePlace = 1e-9;

    /// <summary>Share of all forces of the line below which a value is rounding noise.</summary>
    private const double Noise = 1e-9;

    /// <summary>The forces at a place, from those at another before it and the loads between them.</summary>
    /// <remarks>dN/dx = −qx, dVy/dx = −qy, dVz/dx = −qz, dT/dx = −mx, dMy/dx = Vz − my, dMz/dx = −Vy − mz.</remarks>
    public static SectionForces Carry(in SectionForces forces, double a, double x, IReadOnlyList<LineLoad> loads)
    {
        var (sum, moment) = (default(LoadVector), default(LoadVector));
        foreach (var load in loads)
        {
            var (s, m) = load.Between(a, x);
            (sum, moment) = (sum + s, moment + m);
        }

        return new SectionForces(
            forces.N - sum.Force.X, forces.Vy - sum.Force.Y, forces.Vz - sum.Force.Z,
            forces.T - sum.Couple.X,
            forces.My + forces.Vz * (x - a) - moment.Force.Z - sum.Couple.Y,
            forces.Mz - forces.Vy * (x - a) + moment.Force.Y - sum.Couple.Z);
    }

    /// <summary>The stations with further ones between them, wherever the loads explain the change from one station to the next.</summary>
    /// <param name="stations">Stations in rising order; two at one place are a jump.</param>
    /// <param name="loads">Everything that acts on the member in the situation.</param>
    /// <param name="length">Length of the member [m].</param>
    /// <param name="stretches">How many stretches the loads explain, and how many there are.</param>
    public static ImmutableArray<ForceStation> Fill(
        IReadOnlyList<ForceStation> stations, IReadOnlyList<LineLoad> loads, double length, out (int Explained, int All) stretches)
    {
        var filled = ImmutableArray.CreateBuilder<ForceStation>();
        stretches = (0, 0);
        var scale = Scale(stations, loads, length);
        for (var i = 0; i < stations.Count; i++)
        {
            filled.Add(stations[i]);
            if (i + 1 == stations.Count || stations[i + 1].X - stations[i].X <= SamePlace * length) continue;

            stretches.All++;
            if (Explain(stations[i], stations[i + 1], loads, scale, SamePlace * length) is not { } between) continue;

            stretches.Explained++;
            filled.AddRange(between);
        }

        return filled.ToImmutable();
    }

    /// <summary>Largest share by which the end of a stretch misses what its start and the loads say, of the largest force and moment.</summary>
    public static double Miss(in ForceStation start, in ForceStation end, IReadOnlyList<LineLoad> loads)
    {
        var (a, b) = (start.Forces, Carry(start.Forces, start.X, end.X, loads));
        var miss = end.Forces - b;
        var force = Math.Max(LargestForce(a), Math.Max(LargestForce(end.Forces), LargestForce(b)));
        var moment = Math.Max(LargestMoment(a), Math.Max(LargestMoment(end.Forces), LargestMoment(b)));
        moment = Math.Max(moment, Noise * force * (end.X - start.X));
        return Math.Max(force > 0 ? LargestForce(miss) / force : 0, moment > 0 ? LargestMoment(miss) / moment : 0);
    }

    // Where a station stands right at a point load it may be the value on either side of it: the first reading that fits counts.
    private static List<ForceStation>? Explain(in ForceStation start, in ForceStation end, IReadOnlyList<LineLoad> loads, in SectionForces scale, double samePlace)
    {
        var (a, b) = (start, end);
        bool IsAt(LineLoad load, double x) => load.Shape == LoadShape.Point && Math.Abs(load.From - x) <= samePlace;
        foreach (var (withStart, withEnd) in new[] { (false, false), (true, false), (false, true), (true, true) })
        {
            if (withStart && !loads.Any(l => IsAt(l, a.X)) || withEnd && !loads.Any(l => IsAt(l, b.X))) continue;

            var inside = loads.Where(l => (withStart || !IsAt(l, a.X)) && (withEnd || !IsAt(l, b.X))).ToList();
            var miss = b.Forces - Carry(a.Forces, a.X, b.X, inside);
            if (!Fits(miss, scale)) continue;

            return [.. Places(a.X, b.X, inside, samePlace, withStart, withEnd).Select(place => At(place.X, place.IsLeft))];

            ForceStation At(double x, bool isLeft)
            {
                var upTo = isLeft ? inside.Where(l => !IsAt(l, x)).ToList() : inside;
                return new ForceStation(x, Carry(a.Forces, a.X, x, upTo) + (x - a.X) / (b.X - a.X) * miss);
            }
        }

        return null;
    }

    private static IEnumerable<(double X, bool IsLeft)> Places(double a, double b, List<LineLoad> loads, double samePlace, bool withStart, bool withEnd)
    {
        if (withStart) yield return (a, false);

        var inner = new List<(double X, bool IsPoint)>();
        foreach (var load in loads)
        {
            if (load.Shape == LoadShape.Point) inner.Add((load.From, true));
            else if (load.Shape != LoadShape.Temperature) inner.AddRange(Cuts(load, a, b).Select(x => (x, false)));
        }

        foreach (var group in Clusters(inner.Where(p => p.X > a + samePlace && p.X < b - samePlace).OrderBy(p => p.X), samePlace))
        {
            if (group.IsPoint) yield return (group.X, true);
            yield return (group.X, false);
        }

        if (withEnd) yield return (b, true);
    }

    private static IEnumerable<(double X, bool IsPoint)> Clusters(IEnumerable<(double X, bool IsPoint)> places, double samePlace)
    {
        (double X, bool IsPoint)? current = null;
        foreach (var place in places)
        {
            if (current is { } open && place.X - open.X <= samePlace)
            {
                current = (open.X, open.IsPoint || place.IsPoint);
                continue;
            }

            if (current is { } done) yield return done;
            current = place;
        }

        if (current is { } last) yield return last;
    }

    private static IEnumerable<double> Cuts(LineLoad load, double a, double b)
    {
        var (from, to) = (Math.Max(a, load.From), Math.Min(b, load.To));
        if (to <= from) return [];

        var parts = load.IsUniform ? 2 : Parts;
        return Enumerable.Range(0, parts + 1).Select(i => from + (to - from) * i / parts);
    }

    // What counts as large: the stations, and the middles between them as the loads have it.
    private static SectionForces Scale(IReadOnlyList<ForceStation> stations, IReadOnlyList<LineLoad> loads, double length)
    {
        if (stations.Count == 0) return default;

        var middles = stations.Zip(stations.Skip(1), (a, b) => Carry(a.Forces, a.X, (a.X + b.X) / 2, loads));
        var all = stations.Select(s => s.Forces).Concat(middles).ToArray();
        double Largest(Func<SectionForces, double> of) => all.Max(f => Math.Abs(of(f)));

        var (n, t) = (Largest(f => f.N), Largest(f => f.T));
        var shear = Math.Max(Largest(f => f.Vy), Largest(f => f.Vz));
        var moment = Math.Max(Largest(f => f.My), Largest(f => f.Mz));
        var noise = Noise * Math.Max(Math.Max(n, shear), Math.Max(t, moment) / length);
        var (v, m) = (Math.Max(ForceLine.Tolerance * shear, noise), Math.Max(ForceLine.Tolerance * moment, noise * length));
        return new SectionForces(Math.Max(ForceLine.Tolerance * n, noise), v, v, Math.Max(ForceLine.Tolerance * t, noise * length), m, m);
    }

    private static bool Fits(in SectionForces miss, in SectionForces scale) =>
        Math.Abs(miss.N) <= scale.N && Math.Abs(miss.Vy) <= scale.Vy && Math.Abs(miss.Vz) <= scale.Vz
        && Math.Abs(miss.T) <= scale.T && Math.Abs(miss.My) <= scale.My && Math.Abs(miss.Mz) <= scale.Mz;

    private static double LargestForce(in SectionForces f) => Math.Max(Math.Abs(f.N), Math.Max(Math.Abs(f.Vy), Math.Abs(f.Vz)));

    private static double LargestMoment(in SectionForces f) => Math.Max(Math.Abs(f.T), Math.Max(Math.Abs(f.My), Math.Abs(f.Mz)));
}
