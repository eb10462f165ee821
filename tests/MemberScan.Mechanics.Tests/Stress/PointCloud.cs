using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Mechanics.Tests.Stress;

/// <summary>Many points of a section, on its edges and inside, with the stresses of a unit of each force at each.</summary>
/// <remarks>
/// The brute-force oracle: knows no lattice, no outline chart and no search. Edges: equal shares of their length. Inside: Halton's sequence.
/// σ is found from field.At with unit forces too.
/// </remarks>
internal sealed class PointCloud
{
    private const int Lanes = 8;
    private const int Columns = 9;
    private const int Measures = 6;
    private readonly bool _turns;
    private readonly double[] _table;
    private readonly List<(double Y, double Z)> _points;

    /// <summary>The points of a field that decide; about a third of them on the edges.</summary>
    public PointCloud(StressField field, int count)
    {
        // The parabola along the resultant is the one field that does not superpose; the bar is round, so forces are turned instead.
        _turns = field.Section is Round && field.Model == ShearModel.Elementary;
        var points = OnEdges(field, count / 3);
        Inside(field, count - points.Count, points);
        _points = points;
        _table = new double[points.Count * Columns];
        Parallel.For(0, points.Count, i =>
        {
            var (y, z) = points[i];
            StressState At(SectionForces unit) => field.At(unit, y, z);
            var (n, my, mz) = (At(new SectionForces(1, 0, 0, 0, 0, 0)), At(new SectionForces(0, 0, 0, 0, 1, 0)), At(new SectionForces(0, 0, 0, 0, 0, 1)));
            var (vy, vz, t) = (At(new SectionForces(0, 1, 0, 0, 0, 0)), At(new SectionForces(0, 0, 1, 0, 0, 0)), field.CarriesTorsion ? At(new SectionForces(0, 0, 0, 1, 0, 0)) : default);
            double[] row = [n.Sigma, my.Sigma, mz.Sigma, vy.TauXY, vz.TauXY, t.TauXY, vy.TauXZ, vz.TauXZ, t.TauXZ];
            row.CopyTo(_table, i * Columns);
        });
    }

    /// <summary>Number of points.</summary>
    public int Count => _points.Count;

    /// <summary>The point with the most of something.</summary>
    public (double Y, double Z) Where(Func<double, double, double> amount) => _points.MaxBy(p => amount(p.Y, p.Z));

    /// <summary>The largest magnitude of each measure for each state: states × measures in the order of the enumeration.</summary>
    public double[] Largest(SectionForces[] states)
    {
        var largest = new double[states.Length * Measures];
        Parallel.For(0, (states.Length + Lanes - 1) / Lanes, block =>
        {
            Span<double> lanes = stackalloc double[Measures * Lanes];
            lanes.Clear();
            var count = Math.Min(Lanes, states.Length - block * Lanes);
            for (var lane = 0; lane < count; lane++)
            {
                var f = _turns ? states[block * Lanes + lane].Turned(Math.Atan2(-states[block * Lanes + lane].Vy, states[block * Lanes + lane].Vz)) : states[block * Lanes + lane];
                (lanes[lane], lanes[Lanes + lane], lanes[2 * Lanes + lane]) = (f.N, f.My, f.Mz);
                (lanes[3 * Lanes + lane], lanes[4 * Lanes + lane], lanes[5 * Lanes + lane]) = (f.Vy, f.Vz, f.T);
            }

            Eight(MemoryMarshal.Cast<double, Vector512<double>>(lanes));
            for (var lane = 0; lane < count; lane++)
                for (var measure = 0; measure < Measures; measure++)
                    largest[(block * Lanes + lane) * Measures + measure] = lanes[measure * Lanes + lane];
        });
        return largest;
    }

    // In: N, My, Mz, Vy, Vz, T of eight states; out: the six measures.
    private void Eight(Span<Vector512<double>> io)
    {
        var (n, my, mz, vy, vz, t) = (io[0], io[1], io[2], io[3], io[4], io[5]);
        var zero = Vector512<double>.Zero;
        var (mises, twice, sigma2, tau2, first, third) = (zero, zero, zero, zero, zero, zero);
        for (var at = 0; at < _table.Length; at += Columns)
        {
            ReadOnlySpan<double> row = _table.AsSpan(at, Columns);
            var sigma = n * row[0] + my * row[1] + mz * row[2];
            var xy = vy * row[3] + vz * row[4] + t * row[5];
            var xz = vy * row[6] + vz * row[7] + t * row[8];
            var square = xy * xy + xz * xz;
            var radius = Vector512.Sqrt(sigma * sigma + 4 * square);
            mises = Vector512.Max(mises, sigma * sigma + 3 * square);
            twice = Vector512.Max(twice, radius);
            sigma2 = Vector512.Max(sigma2, Vector512.Abs(sigma));
            tau2 = Vector512.Max(tau2, square);
            first = Vector512.Max(first, radius + sigma);
            third = Vector512.Max(third, radius - sigma);
        }

        (io[0], io[1], io[2], io[3], io[4], io[5]) = (Vector512.Sqrt(mises), twice, sigma2, Vector512.Sqrt(tau2), 0.5 * first, 0.5 * third);
    }

    private static List<(double Y, double Z)> OnEdges(StressField field, int count)
    {
        var edges = OutlineRings.EdgesOf(field.Section);
        var length = edges.Sum(edge => edge.Length);
        var points = new List<(double Y, double Z)>(count);
        foreach (var edge in edges)
        {
            // Both ends: corners count.
            var own = Math.Max(2, (int)(count * edge.Length / length));
            for (var k = 0; k <= own; k++)
            {
                var at = edge.At((double)k / own);
                if (field.Contains(at.Y, at.Z) && field.Decides(at.Y, at.Z)) points.Add(at);
            }
        }

        return points;
    }

    private static void Inside(StressField field, int count, List<(double Y, double Z)> points)
    {
        var rings = OutlineRings.Of(field.Section);
        var (leastY, largestY, leastZ, largestZ) = (rings[0].Min(p => p.Y), rings[0].Max(p => p.Y), rings[0].Min(p => p.Z), rings[0].Max(p => p.Z));
        for (var k = 1; count > 0; k++)
        {
            var (y, z) = (leastY + Halton(k, 2) * (largestY - leastY), leastZ + Halton(k, 3) * (largestZ - leastZ));
            if (!field.Contains(y, z) || !field.Decides(y, z)) continue;
            points.Add((y, z));
            count--;
        }
    }

    private static double Halton(int k, int radix)
    {
        var (value, share) = (0.0, 1.0 / radix);
        for (; k > 0; k /= radix, share /= radix) value += k % radix * share;
        return value;
    }
}
