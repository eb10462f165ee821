using System.Buffers;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Resultants;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Stress;

/// <summary>Finds the place of a section where a measure is largest.</summary>
/// <remarks>
/// All nodes of the edges and, where it can matter, of the inside are evaluated; each peak among them that may hide the maximum is
/// climbed on the true field; the places that statics points at (in line with and square to the bending and shear resultants) are
/// tried besides. Among equal places the outer edge comes first (on a rectangle the middle of a side), then the larger z, then the
/// larger y, so that the answer never hangs on rounding.
/// </remarks>
internal sealed class GoverningSearch(StressField field, ShearSolution shear, Outline outline)
{
    // Two places count as equal within this share of the target.
    private const double Tie = 1e-9;

    // A peak of the lattice below this share of the highest cannot hide the maximum: between nodes a target that is a polynomial of
    // degree 4 along each edge or circle rises by less than 10 %.
    private const double Worthwhile = 0.85;
    private const int MaxPeaks = 16;

    private readonly InfluenceTable _edges = new(field.Properties, shear, outline.Edges);
    private readonly InfluenceTable? _inside = shear.EdgesGovern || outline.Inside is null ? null
        : new InfluenceTable(field.Properties, shear, outline.Inside);

    /// <summary>The governing place; for no forces at all the centroid, or the topmost fibre where the centroid is hollow.</summary>
    public GoverningPoint Find(in SectionForces forces, StressMeasure measure)
    {
        if (forces == default(SectionForces))
        {
            var (y, z) = outline.Contains(0, 0, 0) ? (0, 0) : outline.Farthest(0, 1);
            return new GoverningPoint(measure, 0, y, z, default, PlaceName.Unstressed);
        }

        var best = new Choice(outline);
        var (edgeCount, insideCount) = (_edges.Points.Length, _inside?.Points.Length ?? 0);
        var buffer = ArrayPool<double>.Shared.Rent(edgeCount + insideCount);
        try
        {
            var values = buffer.AsSpan(0, edgeCount + insideCount);
            _edges.Evaluate(forces, measure, values[..edgeCount]);
            _inside?.Evaluate(forces, measure, values[edgeCount..]);
            var highest = 0.0;
            foreach (var value in values) highest = Math.Max(highest, value);

            Scan(_edges, forces, measure, values[..edgeCount], highest, ref best);
            if (_inside is not null) Scan(_inside, forces, measure, values[edgeCount..], highest, ref best);
        }
        finally
        {
            ArrayPool<double>.Shared.Return(buffer);
        }

        if (outline.IsWhole) TryNotable(forces, measure, ref best);
        var state = field.At(forces, best.Y, best.Z);
        return new GoverningPoint(measure, Target.Value(measure, state), best.Y, best.Z, state, Name(best.Y, best.Z, forces));
    }

    private void Scan(
        InfluenceTable table, in SectionForces forces, StressMeasure measure, ReadOnlySpan<double> values, double highest, ref Choice best)
    {
        var lattice = table.Chart.Nodes;
        Span<int> peaks = stackalloc int[MaxPeaks];
        var found = 0;
        for (var i = 0; i < values.Length; i++)
        {
            if (values[i] < Worthwhile * highest) continue;
            if (values[i] >= highest * (1 - Tie)) best.Offer(values[i], table.Points[i].Y, table.Points[i].Z);
            if (measure != StressMeasure.AbsoluteSigma && IsPeak(lattice, values, i)) found = Keep(peaks, found, values, i);
        }

        foreach (var node in peaks[..found])
            Climb(table.Chart, forces, measure, (table.Chart.Nodes.P[node], table.Chart.Nodes.Q[node]), values[node], ref best);
        Polish(forces, measure, ref best);
    }

    // A climb narrows its stencil at every step and may end short of a summit on a long ridge: begun anew from where it ended until nothing is gained.
    private void Polish(in SectionForces forces, StressMeasure measure, ref Choice best)
    {
        const int MostRounds = 6;
        const double Gain = 1e-7;

        for (var round = 0; round < MostRounds && best.Climbed is { } chart && !chart.Nodes.AreCurves; round++)
        {
            var before = best.Highest;
            Climb(chart, forces, measure, best.From, best.Highest, ref best);
            if (best.Highest <= before * (1 + Gain)) return;
        }
    }

    // Of a stretch of equal nodes those in its middle are no peaks; on a flat ridge of the inside only the first is one.
    private static bool IsPeak(Lattice lattice, ReadOnlySpan<double> values, int node)
    {
        const double Equal = 1e-12;

        var value = values[node];
        var (equals, before) = (0, 0);
        foreach (var neighbour in lattice.Neighbours.AsSpan(node * Lattice.NeighbourCount, Lattice.NeighbourCount))
        {
            if (neighbour < 0) continue;
            var difference = values[neighbour] - value;
            if (difference > Equal * value) return false;
            if (difference < -Equal * value) continue;
            equals++;
            if (neighbour < node) before++;
        }

        return lattice.AreCurves ? equals < 2 || before == 0 : before == 0;
    }

    // The highest peaks, highest first.
    private static int Keep(Span<int> peaks, int found, ReadOnlySpan<double> values, int node)
    {
        var at = found;
        while (at > 0 && values[peaks[at - 1]] < values[node]) at--;
        if (at == MaxPeaks) return found;

        found = Math.Min(found + 1, MaxPeaks);
        for (var i = found - 1; i > at; i--) peaks[i] = peaks[i - 1];
        peaks[at] = node;
        return found;
    }

    // Newton's steps on the parabola through a stencil of nine places (three on a curve), each finer than the last.
    private void Climb(Chart chart, in SectionForces forces, StressMeasure measure, (double P, double Q) from, double value, ref Choice best)
    {
        const int MaxSteps = 12;
        const double Coarsest = 0.6, Finest = 0.01, Refinement = 1.0 / 6, SameSpot = 1e-5;

        var lattice = chart.Nodes;
        var (p, q) = from;
        var isCurve = lattice.AreCurves;
        var scale = Coarsest;
        Span<double> stencil = stackalloc double[9];
        for (var pass = 0; pass < MaxSteps && scale >= Finest; pass++)
        {
            var (hp, hq) = (scale * lattice.PitchP, scale * lattice.PitchQ);
            var top = 4;
            stencil[4] = value;
            for (var k = 0; k < 9; k++)
            {
                if (k == 4 || (isCurve && k / 3 != 1)) continue;
                stencil[k] = At(chart, forces, measure, p + (k % 3 - 1) * hp, q + (k / 3 - 1) * hq);
                if (stencil[k] > stencil[top]) top = k;
            }

            var (dp, dq) = isCurve ? (Vertex(stencil[3], stencil[4], stencil[5]), 0) : Vertex(stencil);
            var ahead = At(chart, forces, measure, p + dp * hp, q + dq * hq);
            if (ahead >= stencil[top])
            {
                (p, q, value) = (p + dp * hp, q + dq * hq, ahead);
                // Not on the first stencil: at a fold it sees its own mirror image, however near a summit beside it.
                if (scale < Coarsest && Math.Abs(dp) < SameSpot && Math.Abs(dq) < SameSpot) break;
                if (Math.Abs(dp) < 1 && Math.Abs(dq) < 1) scale *= Refinement;
            }
            else if (top == 4)
            {
                scale *= Refinement;
            }
            else
            {
                (p, q, value) = (p + (top % 3 - 1) * hp, q + (top / 3 - 1) * hq, stencil[top]);
            }
        }

        var (y, z) = chart.Map(p, q);
        if (value > best.Highest) best.Remember(chart, p, q);
        best.Offer(value, y, z);
    }

    private static double Vertex(double before, double at, double after)
    {
        var bend = before - 2 * at + after;
        return bend < 0 ? Math.Clamp(0.5 * (before - after) / bend, -1, 1) : 0;
    }

    // Step to the summit of the quadratic through the stencil, in units of its pitch, each part at most 1. Along an axis of the quadratic
    // in which it does not bend down it goes as far as it may: so a ridge is walked along whichever way it runs.
    private static (double P, double Q) Vertex(ReadOnlySpan<double> f)
    {
        const double Flat = 1e-9;

        var (slopeP, slopeQ) = (0.5 * (f[5] - f[3]), 0.5 * (f[7] - f[1]));
        var (pp, qq) = (f[3] - 2 * f[4] + f[5], f[1] - 2 * f[4] + f[7]);
        var pq = 0.25 * (f[0] + f[8] - f[2] - f[6]);
        var (mean, half) = (0.5 * (pp + qq), double.Hypot(0.5 * (pp - qq), pq));
        // The axis of the larger bend value; the other is square to it.
        var (sin, cos) = half > 0 ? Math.SinCos(0.5 * Math.Atan2(pq, 0.5 * (pp - qq))) : (0.0, 1.0);
        var scale = Math.Abs(mean) + half;
        var one = Step(slopeP * cos + slopeQ * sin, mean + half, Flat * scale);
        var two = Step(slopeQ * cos - slopeP * sin, mean - half, Flat * scale);
        var (p, q) = (one * cos - two * sin, one * sin + two * cos);
        var longest = Math.Max(1, Math.Max(Math.Abs(p), Math.Abs(q)));
        return (p / longest, q / longest);
    }

    private static double Step(double slope, double bend, double flat) =>
        bend < -flat ? Math.Clamp(-slope / bend, -1, 1) : Math.Abs(slope) > flat ? Math.Sign(slope) : 0;

    private void TryNotable(in SectionForces forces, StressMeasure measure, ref Choice best)
    {
        var (_, perY, perZ) = BendingStress.Plane(field.Properties, forces);
        TryAround(forces, measure, perY, perZ, ref best);
        if (measure != StressMeasure.AbsoluteSigma) TryAround(forces, measure, forces.Vy, forces.Vz, ref best);
    }

    private void TryAround(in SectionForces forces, StressMeasure measure, double directionY, double directionZ, ref Choice best)
    {
        if (directionY == 0 && directionZ == 0) return;

        for (var turn = 0; turn < 4; turn++)
        {
            Try(forces, measure, outline.Farthest(directionY, directionZ), ref best);
            if (outline.TryFarthestInside(directionY, directionZ, out var inside)) Try(forces, measure, inside, ref best);
            (directionY, directionZ) = (-directionZ, directionY);
        }
    }

    private void Try(in SectionForces forces, StressMeasure measure, (double Y, double Z) point, ref Choice best) =>
        best.Offer(Target.Of(measure, field.At(forces, point.Y, point.Z)), point.Y, point.Z);

    private double At(Chart chart, in SectionForces forces, StressMeasure measure, double p, double q)
    {
        var (y, z) = chart.Map(p, q);
        return Target.Of(measure, field.At(forces, y, z));
    }

    private string Name(double y, double z, in SectionForces forces) =>
        forces.Vy == 0 && forces.Vz == 0 && forces.T == 0 && forces.My == 0 && forces.Mz == 0
            ? PlaceName.Uniform
            : outline.NameOf(y, z, forces);

    /// <summary>The best place so far.</summary>
    private struct Choice(Outline outline)
    {
        private double _highest = double.NegativeInfinity;
        private double _value = double.NegativeInfinity;
        private int _rank;

        public double Y { get; private set; }

        public double Z { get; private set; }

        public readonly double Highest => _highest;

        /// <summary>The chart on which the highest place was found by climbing, and where on it.</summary>
        public Chart? Climbed { get; private set; }

        public (double P, double Q) From { get; private set; }

        public void Remember(Chart chart, double p, double q) => (Climbed, From) = (chart, (p, q));

        public void Offer(double value, double y, double z)
        {
            _highest = Math.Max(_highest, value);
            var floor = _highest - Tie * Math.Abs(_highest);                       // against the highest: ties do not add up
            if (value < floor) return;

            var rank = outline.Rank(y, z);
            if (_value < floor || IsPreferred(rank, y, z)) (_value, _rank, Y, Z) = (value, rank, y, z);
        }

        private readonly bool IsPreferred(int rank, double y, double z)
        {
            if (rank != _rank) return rank < _rank;

            var tolerance = Outline.OnEdge * outline.Extent;
            return Math.Abs(z - Z) > tolerance ? z > Z : y > Y;
        }
    }
}
