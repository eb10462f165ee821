using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Resultants;
using MemberScan.Mechanics.Shear;

namespace MemberScan.Mechanics.Stress;

/// <summary>The largest target of every measure among the nodes of a section, for many states at a time.</summary>
/// <remarks>
/// A dense table, nodes × (y, z, τxy and τxz of unit Vy, Vz, T), of all nodes of the edges and the inside. Eight states share a pass
/// over it, one a lane of a vector of fixed width, so that a state's result hangs neither on its neighbours nor on the machine.
/// <see cref="Plain"/> is kept as its oracle.
/// </remarks>
internal sealed class BlockScan
{
    /// <summary>Number of measures, in the order of <see cref="StressMeasure"/>.</summary>
    public const int Measures = 6;

    private const int Lanes = 8;
    private const int Columns = 8;
    private readonly SectionProperties _properties;
    private readonly double[] _table;
    private readonly bool _turns;

    /// <summary>The table of an outline: of every node, or with the inside thinned to about a quarter of its nodes.</summary>
    public BlockScan(SectionProperties properties, ShearSolution shear, Outline outline, bool isThin)
    {
        _properties = properties;
        // The one solution that is not linear turns with the shear resultant: its table holds for V along +z.
        _turns = !shear.IsLinear;
        var rows = new List<double>();
        AddRows(outline.Edges);
        if (!shear.EdgesGovern && outline.Inside is { } inside) AddRows(inside);
        _table = [.. rows];

        void AddRows(Chart chart)
        {
            foreach (var i in isThin && !chart.Nodes.AreCurves ? Thinned(chart.Nodes) : Enumerable.Range(0, chart.Nodes.Count))
            {
                var (y, z) = chart.Map(chart.Nodes.P[i], chart.Nodes.Q[i]);
                var (vy, vz, t) = shear.UnitsAt(y, z);
                rows.AddRange([y, z, vy.XY, vz.XY, t.XY, vy.XZ, vz.XZ, t.XZ]);
            }
        }
    }

    /// <summary>Number of nodes.</summary>
    public int Nodes => _table.Length / Columns;

    /// <summary>The largest targets: states × <see cref="Measures"/>, row-major.</summary>
    public void Scan(ReadOnlySpan<SectionForces> states, Span<double> largest)
    {
        Span<double> lanes = stackalloc double[Measures * Lanes];
        for (var from = 0; from < states.Length; from += Lanes)
        {
            var count = Math.Min(Lanes, states.Length - from);
            lanes.Clear();
            for (var lane = 0; lane < count; lane++)
            {
                var forces = InTableFrame(states[from + lane]);
                var (n, perY, perZ) = BendingStress.Plane(_properties, forces);
                (lanes[lane], lanes[Lanes + lane], lanes[2 * Lanes + lane]) = (n, perY, perZ);
                (lanes[3 * Lanes + lane], lanes[4 * Lanes + lane], lanes[5 * Lanes + lane]) = (forces.Vy, forces.Vz, forces.T);
            }

            ScanLanes(lanes);
            for (var lane = 0; lane < count; lane++)
            {
                for (var measure = 0; measure < Measures; measure++) largest[(from + lane) * Measures + measure] = lanes[measure * Lanes + lane];
            }
        }
    }

    /// <summary>The same, one state and one node at a time.</summary>
    public void Plain(ReadOnlySpan<SectionForces> states, Span<double> largest)
    {
        for (var s = 0; s < states.Length; s++)
        {
            var forces = InTableFrame(states[s]);
            var (n, perY, perZ) = BendingStress.Plane(_properties, forces);
            var row = largest.Slice(s * Measures, Measures);
            row.Fill(double.NegativeInfinity);
            for (var at = 0; at < _table.Length; at += Columns)
            {
                var node = _table.AsSpan(at, Columns);
                var sigma = n + perY * node[0] + perZ * node[1];
                var xy = forces.Vy * node[2] + forces.Vz * node[3] + forces.T * node[4];
                var xz = forces.Vy * node[5] + forces.Vz * node[6] + forces.T * node[7];
                for (var measure = 0; measure < Measures; measure++)
                    row[measure] = Math.Max(row[measure], Target.Of((StressMeasure)measure, sigma, xy * xy + xz * xz));
            }
        }
    }

    // Nodes no two of which are neighbours; every other node has one of them for a neighbour.
    private static List<int> Thinned(Lattice lattice)
    {
        var (kept, beside) = (new List<int>(), new bool[lattice.Count]);
        for (var i = 0; i < lattice.Count; i++)
        {
            if (beside[i]) continue;
            kept.Add(i);
            foreach (var neighbour in lattice.Neighbours.AsSpan(i * Lattice.NeighbourCount, Lattice.NeighbourCount))
                if (neighbour >= 0) beside[neighbour] = true;
        }

        return kept;
    }

    // In: N/A, σ's gain along y and z, Vy, Vz, T; out: the targets. Eight states each.
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private void ScanLanes(Span<double> lanes)
    {
        var io = MemoryMarshal.Cast<double, Vector512<double>>(lanes);
        var (n, perY, perZ) = (io[0], io[1], io[2]);
        var (vy, vz, t) = (io[3], io[4], io[5]);
        var three = Vector512.Create(3.0);
        var four = Vector512.Create(4.0);
        var (mises, tresca, square, shear) = (Vector512<double>.Zero, Vector512<double>.Zero, Vector512<double>.Zero, Vector512<double>.Zero);
        var (sigma1, sigma3) = (Vector512<double>.Zero, Vector512<double>.Zero);
        ref var node = ref MemoryMarshal.GetArrayDataReference(_table);
        for (var left = _table.Length; left > 0; left -= Columns)
        {
            var sigma = Vector512.FusedMultiplyAdd(perZ, Vector512.Create(Unsafe.Add(ref node, 1)), Vector512.FusedMultiplyAdd(perY, Vector512.Create(node), n));
            var xy = Vector512.FusedMultiplyAdd(vy, Vector512.Create(Unsafe.Add(ref node, 2)), Vector512.FusedMultiplyAdd(vz, Vector512.Create(Unsafe.Add(ref node, 3)), t * Vector512.Create(Unsafe.Add(ref node, 4))));
            var xz = Vector512.FusedMultiplyAdd(vy, Vector512.Create(Unsafe.Add(ref node, 5)), Vector512.FusedMultiplyAdd(vz, Vector512.Create(Unsafe.Add(ref node, 6)), t * Vector512.Create(Unsafe.Add(ref node, 7))));
            var tau2 = Vector512.FusedMultiplyAdd(xy, xy, xz * xz);
            var sigma2 = sigma * sigma;
            var radius2 = Vector512.FusedMultiplyAdd(four, tau2, sigma2);
            var radius = Vector512.Sqrt(radius2);
            mises = Vector512.Max(mises, Vector512.FusedMultiplyAdd(three, tau2, sigma2));
            tresca = Vector512.Max(tresca, radius2);
            square = Vector512.Max(square, sigma2);
            shear = Vector512.Max(shear, tau2);
            sigma1 = Vector512.Max(sigma1, radius + sigma);
            sigma3 = Vector512.Max(sigma3, radius - sigma);
            node = ref Unsafe.Add(ref node, Columns);
        }

        var half = Vector512.Create(0.5);
        (io[0], io[1], io[2], io[3], io[4], io[5]) = (mises, tresca, square, shear, sigma1 * half, sigma3 * half);
    }

    private SectionForces InTableFrame(in SectionForces forces)
    {
        if (!_turns) return forces;

        var length = double.Hypot(forces.Vy, forces.Vz);
        if (length == 0) return forces;

        // New z along V: y' = (y·Vz − z·Vy)/V, z' = (y·Vy + z·Vz)/V; moments turn like forces.
        var (cos, sin) = (forces.Vz / length, forces.Vy / length);
        return new SectionForces(forces.N, 0, length, forces.T, cos * forces.My - sin * forces.Mz, sin * forces.My + cos * forces.Mz);
    }
}
