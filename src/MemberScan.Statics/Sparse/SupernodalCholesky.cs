using System.Collections.Concurrent;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using MemberScan.Statics.Assembly;

namespace MemberScan.Statics.Sparse;

/// <summary>Multifrontal Cholesky factor <c>P·S·K·S·Pᵀ = L·Lᵀ</c> of a stiffness matrix.</summary>
/// <remarks>
/// Each supernode gathers its columns of the matrix and the rests of its children in a dense front, factors its pivots and hands the rest on.
/// Subtrees go to several threads; every front is worked out in one fixed sequence, so the bits do not depend on them.
/// </remarks>
internal sealed class SupernodalCholesky
{
    /// <summary>Pivots of the scaled matrix up to this are nothing but rounding.</summary>
    public const double LeastPivot = 4e-16;

    private readonly ScaledMatrix _matrix;
    private readonly Symbolic _symbolic;
    private readonly double[][] _panels;
    private readonly double[]?[] _rests;
    private readonly (double Pivot, int Place)[] _smallest;
    private readonly int[] _nodeOrder;
    private readonly ILookup<int, int> _rowsOfColumn;
    private int _failedPlace = -1;

    private SupernodalCholesky(ScaledMatrix matrix, Symbolic symbolic)
    {
        (_matrix, _symbolic) = (matrix, symbolic);
        _panels = new double[symbolic.Supernodes.Length][];
        _rests = new double[]?[symbolic.Supernodes.Length];
        _smallest = new (double, int)[symbolic.Supernodes.Length];
        Array.Fill(_smallest, (double.PositiveInfinity, 0));
        _nodeOrder = symbolic.DofPlace;
        _rowsOfColumn = Below(matrix.Matrix);
    }

    /// <summary>Shape of the factor.</summary>
    public Symbolic Symbolic => _symbolic;

    /// <summary>The matrix.</summary>
    public ScaledMatrix Matrix => _matrix;

    /// <summary>The panel of a supernode: its height × its pivots, column-major.</summary>
    public double[] Panel(int supernode) => _panels[supernode];

    /// <summary>Smallest pivot, before its root is taken, against a diagonal of one; and the place of its unknown.</summary>
    public (double Pivot, int Place) Smallest { get; private set; }

    /// <summary>Whether every pivot was above nothing.</summary>
    public bool IsWhole => _failedPlace < 0;

    /// <summary>Factors a matrix; stops at the first pivot that is nothing.</summary>
    public static SupernodalCholesky Factor(ScaledMatrix matrix, Symbolic symbolic, int threads)
    {
        var made = new SupernodalCholesky(matrix, symbolic);
        if (threads > 1) made.RunParallel(threads);
        else made.RunSequence();
        made.Smallest = made._smallest.Append((1, 0)).MinBy(s => (s.Item1, s.Item2));
        return made;
    }

    private static ILookup<int, int> Below(BlockMatrix matrix)
    {
        var pairs = new List<(int Column, int Row)>();
        for (var row = 0; row < matrix.Nodes; row++)
            foreach (var column in matrix.ColumnsOf(row))
                if (column != row) pairs.Add((column, row));
        return pairs.ToLookup(p => p.Column, p => p.Row);
    }

    private void RunSequence()
    {
        var room = new FrontRoom(_symbolic);
        for (var s = 0; s < _panels.Length && _failedPlace < 0; s++) Eliminate(s, room);
    }

    private void RunParallel(int threads)
    {
        var left = _symbolic.Supernodes.Select(s => s.Children.Length).ToArray();
        var parent = new int[left.Length];
        Array.Fill(parent, -1);
        for (var s = 0; s < left.Length; s++)
            foreach (var child in _symbolic.Supernodes[s].Children) parent[child] = s;

        using var ready = new BlockingCollection<int>(new ConcurrentStack<int>());
        var open = left.Length;
        for (var s = left.Length - 1; s >= 0; s--)
            if (left[s] == 0) ready.Add(s);
        if (open == 0) return;

        var workers = Enumerable.Range(0, threads).Select(_ => Task.Factory.StartNew(Work, CancellationToken.None, TaskCreationOptions.LongRunning, TaskScheduler.Default)).ToArray();
        Task.WaitAll(workers);

        void Work()
        {
            var room = new FrontRoom(_symbolic);
            foreach (var s in ready.GetConsumingEnumerable())
            {
                if (Volatile.Read(ref _failedPlace) < 0) Eliminate(s, room);
                if (parent[s] >= 0 && Interlocked.Decrement(ref left[parent[s]]) == 0) ready.Add(parent[s]);
                if (Interlocked.Decrement(ref open) == 0) ready.CompleteAdding();
            }
        }
    }

    private void Eliminate(int number, FrontRoom room)
    {
        var s = _symbolic.Supernodes[number];
        var (panel, rest) = (new double[s.Height * s.Pivots], room.Rent(s.Rows.Length));
        for (var i = 0; i < s.Rows.Length; i++) room.Local[s.Rows[i]] = s.Pivots + i;
        for (var i = 0; i < s.Pivots; i++) room.Local[s.First + i] = i;

        foreach (var node in s.Nodes) Gather(node, s, panel, room.Local);
        foreach (var child in s.Children)
        {
            if (_rests[child] is not { } handed) continue;                       // a failed factorisation
            Extend(_symbolic.Supernodes[child].Rows, handed, s, panel, rest, room);
            room.Return(handed);
            _rests[child] = null;
        }

        var smallest = (Pivot: double.PositiveInfinity, Column: 0);
        var failed = DenseKernel.Factor(panel, s.Height, s.Pivots, room.Pack, LeastPivot, ref smallest);
        (_panels[number], _smallest[number]) = (panel, (smallest.Pivot, s.First + smallest.Column));
        if (failed >= 0) Interlocked.CompareExchange(ref _failedPlace, s.First + failed, -1);
        else if (s.Rows.Length > 0) DenseKernel.Update(panel, s.Height, s.Pivots, rest, room.Pack);
        _rests[number] = s.Rows.Length > 0 ? rest : null;
    }

    // The columns of a node, of the rows that come with or after it.
    private void Gather(int node, Supernode s, double[] panel, int[] local)
    {
        var columns = _matrix.Matrix.ColumnsOf(node);
        var blocks = _matrix.Matrix.RowBlocks(node);
        for (var k = 0; k < columns.Length; k++)
            if (_nodeOrder[columns[k]] >= _nodeOrder[node] && _matrix.Weight[columns[k]] > 0)
                Place(blocks.Slice(36 * k, 36), columns[k], node, isTransposed: columns[k] != node, s, panel, local);
        foreach (var row in _rowsOfColumn[node])
            if (_nodeOrder[row] > _nodeOrder[node] && _matrix.Weight[row] > 0) Place(_matrix.Matrix.Block(row, node), row, node, isTransposed: false, s, panel, local);
    }

    private void Place(ReadOnlySpan<double> block, int row, int column, bool isTransposed, Supernode s, double[] panel, int[] local)
    {
        var c = 0;
        for (var j = 0; j < 6; j++)
        {
            if (_matrix.IsFixed[6 * column + j]) continue;

            var at = (_nodeOrder[column] + c++ - s.First) * s.Height;
            var r = 0;
            for (var i = 0; i < 6; i++)
            {
                if (_matrix.IsFixed[6 * row + i]) continue;

                var value = (isTransposed ? block[6 * j + i] : block[6 * i + j]) * _matrix.Scale[6 * row + i] * _matrix.Scale[6 * column + j];
                if (row == column && i == j) value += _matrix.Shift;
                panel[at + local[_nodeOrder[row] + r++]] += value;
            }
        }
    }

    // Rows that follow each other here and there are added as one run.
    private static void Extend(int[] rows, double[] handed, Supernode s, double[] panel, double[] rest, FrontRoom room)
    {
        var (n, k) = (rows.Length, s.Pivots);
        var runs = room.Runs;
        runs.Clear();
        for (var i = 0; i < n;)
        {
            var begin = i++;
            while (i < n && room.Local[rows[i]] == room.Local[rows[i - 1]] + 1 && (room.Local[rows[i]] < k) == (room.Local[rows[begin]] < k)) i++;
            runs.Add((begin, i - begin, room.Local[rows[begin]]));
        }

        for (var j = 0; j < n; j++)
        {
            var column = room.Local[rows[j]];
            var shift = column < k ? 0 : k;
            var target = column < k ? panel.AsSpan(column * s.Height, s.Height) : rest.AsSpan((column - k) * s.Rows.Length, s.Rows.Length);
            foreach (var (begin, length, to) in runs)
            {
                var (from, skip) = (Math.Max(begin, j), Math.Max(0, j - begin));
                if (skip >= length) continue;
                Add(target.Slice(to + skip - shift, length - skip), handed.AsSpan(j * n + from, length - skip));
            }
        }
    }

    private static void Add(Span<double> target, ReadOnlySpan<double> source)
    {
        ref var a = ref MemoryMarshal.GetReference(target);
        ref var b = ref MemoryMarshal.GetReference(source);
        var i = 0;
        for (; i + DenseKernel.Lane <= source.Length; i += DenseKernel.Lane)
            (Vector512.LoadUnsafe(ref a, (nuint)i) + Vector512.LoadUnsafe(ref b, (nuint)i)).StoreUnsafe(ref a, (nuint)i);
        for (; i < source.Length; i++) target[i] += source[i];
    }
}
