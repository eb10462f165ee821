using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;

namespace MemberScan.Screening.Presets;

/// <summary>Section forces of a member on supports along it, under one assumed load: simple spans, overhangs at its ends.</summary>
/// <remarks>
/// Each span is hinged at its supports; only beside an overhang the moment of the overhang acts on it. So everything follows from equilibrium:
/// with the load q along z, My″ = −q and Vz = My′; with q along y the same for −Mz. Of a load along the member the outer support behind it takes all,
/// so that the member is pulled: an assumption in equilibrium, without compression between supports.
/// </remarks>
internal static class SpanForces
{
    /// <summary>Parts into which each stretch is cut where the load is spread.</summary>
    private const int Parts = 8;

    /// <summary>Stations from start to end; two at each place where forces jump.</summary>
    /// <param name="length">Length of the member [m].</param>
    /// <param name="supports">At least two places in rising order [m].</param>
    /// <param name="load">The load.</param>
    public static ImmutableArray<ForceStation> Of(double length, IReadOnlyList<double> supports, AssumedLoad load)
    {
        var places = new SortedSet<double>(supports) { 0, length, load.From, load.To };
        if (!load.IsPoint)
            for (var i = 1; i < Parts; i++) places.Add(load.From + (load.To - load.From) * i / Parts);

        var stations = ImmutableArray.CreateBuilder<ForceStation>();
        foreach (var x in places)
        {
            if (x > 0) stations.Add(new ForceStation(x, At(x, false, length, supports, load)));
            if (x < length) stations.Add(new ForceStation(x, At(x, true, length, supports, load)));
        }

        return stations.ToImmutable();
    }

    /// <summary>Largest bending moment of a unit force across the member at a place [N·m per N].</summary>
    public static double Lever(double length, IReadOnlyList<double> supports, double place)
    {
        var load = new AssumedLoad(new(0, 0, 1), place, place);
        return supports.Append(place).Max(x => Math.Max(Math.Abs(At(x, false, length, supports, load).My), Math.Abs(At(x, true, length, supports, load).My)));
    }

    /// <summary>Reaction of a support to a unit force across the member at a place, or to one per length over a stretch [N per N, or m].</summary>
    public static double Reaction(int support, double length, IReadOnlyList<double> supports, AssumedLoad load)
    {
        var x = supports[support];
        var jump = At(x, true, length, supports, load).Vz - At(x, false, length, supports, load).Vz;

        // A load right at the support jumps as well; it is what the support takes.
        return jump + (load.IsPoint && load.From.Equals(x) ? load.Force.Z : 0);
    }

    private static SectionForces At(double x, bool after, double length, IReadOnlyList<double> supports, AssumedLoad load)
    {
        var (vz, my) = Bending(x, after, length, supports, load with { Force = new(0, 0, load.Force.Z) });
        var (vy, minusMz) = Bending(x, after, length, supports, load with { Force = new(0, 0, load.Force.Y) });
        return new SectionForces(Axial(x, after, load.Force.X < 0 ? supports[^1] : supports[0], load), vy, vz, 0, my, -minusMz);
    }

    private static double Axial(double x, bool after, double anchor, AssumedLoad load)
    {
        var beyond = load.IsPoint ? (Beyond(load.From, x, after) ? load.Force.X : 0) : load.Force.X * Math.Max(0, load.To - Math.Max(x, load.From));
        var all = load.IsPoint ? load.Force.X : load.Force.X * (load.To - load.From);
        return x > anchor || (x.Equals(anchor) && after) ? beyond : beyond - all;
    }

    private static bool Beyond(double place, double x, bool after) => place > x || (place.Equals(x) && !after);

    /// <summary>Shear and moment of a load along z.</summary>
    private static (double V, double M) Bending(double x, bool after, double length, IReadOnlyList<double> supports, AssumedLoad load)
    {
        if (load.Force.Z == 0) return default;

        var (first, last) = (supports[0], supports[^1]);
        if (x < first || (x.Equals(first) && !after)) return Left(x, after, load);
        if (x > last || (x.Equals(last) && after)) return Right(x, after, load);

        var span = 0;
        while (span < supports.Count - 2 && (x > supports[span + 1] || (x.Equals(supports[span + 1]) && after))) span++;
        var (a, b) = (supports[span], supports[span + 1]);
        var atA = span == 0 ? Left(a, false, load).M : 0;
        var atB = span == supports.Count - 2 ? Right(b, true, load).M : 0;
        var (v, m) = Simple(x - a, after, b - a, load with { From = load.From - a, To = load.To - a });
        return (v + (atB - atA) / (b - a), m + atA + (atB - atA) * (x - a) / (b - a));
    }

    /// <summary>Left of the first support: what acts between the free end and the place.</summary>
    private static (double V, double M) Left(double x, bool after, AssumedLoad load)
    {
        var q = load.Force.Z;
        if (load.IsPoint) return Beyond(load.From, x, after) ? default : (-q, -q * (x - load.From));

        var to = Math.Min(x, load.To);
        return to <= load.From ? default : (-q * (to - load.From), -q * (to - load.From) * (x - 0.5 * (load.From + to)));
    }

    /// <summary>Right of the last support: what acts between the place and the free end.</summary>
    private static (double V, double M) Right(double x, bool after, AssumedLoad load)
    {
        var q = load.Force.Z;
        if (load.IsPoint) return Beyond(load.From, x, after) ? (q, -q * (load.From - x)) : default;

        var from = Math.Max(x, load.From);
        return load.To <= from ? default : (q * (load.To - from), -q * (load.To - from) * (0.5 * (load.To + from) - x));
    }

    /// <summary>A simple beam: only what lies on it counts.</summary>
    private static (double V, double M) Simple(double x, bool after, double span, AssumedLoad load)
    {
        var q = load.Force.Z;
        if (load.IsPoint)
        {
            if (load.From <= 0 || load.From >= span) return default;

            return Beyond(load.From, x, after)
                ? (q * (span - load.From) / span, q * (span - load.From) * x / span)
                : (-q * load.From / span, q * load.From * (span - x) / span);
        }

        var (from, to) = (Math.Max(0, load.From), Math.Min(span, load.To));
        if (to <= from) return default;

        var all = q * (to - from);
        var left = all * (span - 0.5 * (from + to)) / span;
        var covered = Math.Clamp(x, from, to) - from;
        var passed = q * covered;
        return (left - passed, left * x - passed * (x - from - 0.5 * covered));
    }
}
