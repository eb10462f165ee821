namespace MemberScan.Statics.Assembly;

/// <summary>A symmetric sparse matrix of 6 × 6 blocks, one row of blocks a node; the lower triangle is kept, diagonal blocks whole.</summary>
internal sealed class BlockMatrix
{
    private const int B = 6;
    private const int BlockSize = B * B;

    private readonly int[] _rowStart;
    private readonly int[] _columns;
    private readonly double[] _values;

    /// <summary>An empty matrix of a pattern.</summary>
    /// <param name="nodes">Number of nodes.</param>
    /// <param name="pairs">Pairs of nodes that are joined; doubled ones and loops do no harm.</param>
    public BlockMatrix(int nodes, IReadOnlyList<(int A, int B)> pairs)
    {
        var keys = new long[pairs.Count + nodes];
        for (var k = 0; k < pairs.Count; k++) keys[k] = (long)Math.Max(pairs[k].A, pairs[k].B) * nodes + Math.Min(pairs[k].A, pairs[k].B);
        for (var i = 0; i < nodes; i++) keys[pairs.Count + i] = (long)i * nodes + i;
        Array.Sort(keys);
        _rowStart = new int[nodes + 1];
        var columns = new List<int>(keys.Length);
        for (var k = 0; k < keys.Length; k++)
        {
            if (k > 0 && keys[k] == keys[k - 1]) continue;
            columns.Add((int)(keys[k] % nodes));
            _rowStart[keys[k] / nodes + 1]++;
        }

        for (var i = 0; i < nodes; i++) _rowStart[i + 1] += _rowStart[i];
        _columns = [.. columns];
        _values = new double[(long)_columns.Length * BlockSize];
        Nodes = nodes;
    }

    /// <summary>Number of nodes.</summary>
    public int Nodes { get; }

    /// <summary>Columns of the blocks of a row, rising; the last is the diagonal.</summary>
    public ReadOnlySpan<int> ColumnsOf(int row) => _columns.AsSpan(_rowStart[row].._rowStart[row + 1]);

    /// <summary>Columns of the blocks of a row, rising; the last is the diagonal.</summary>
    public ReadOnlyMemory<int> ColumnsAsMemory(int row) => _columns.AsMemory(_rowStart[row].._rowStart[row + 1]);

    /// <summary>The blocks of a row, 36 numbers each, row-major.</summary>
    public ReadOnlySpan<double> RowBlocks(int row) => _values.AsSpan(_rowStart[row] * BlockSize, (_rowStart[row + 1] - _rowStart[row]) * BlockSize);

    /// <summary>A block of the pattern, row-major; row ≥ column.</summary>
    public Span<double> Block(int row, int column)
    {
        var at = Array.BinarySearch(_columns, _rowStart[row], _rowStart[row + 1] - _rowStart[row], column);
        if (at < 0) throw new ArgumentException("the block lies outside the pattern");

        return _values.AsSpan(at * BlockSize, BlockSize);
    }

    /// <summary>The diagonal block of a node.</summary>
    public Span<double> Diagonal(int node) => _values.AsSpan((_rowStart[node + 1] - 1) * BlockSize, BlockSize);

    /// <summary>Largest sum of magnitudes of a row: the largest-norm of the matrix.</summary>
    public double Norm(ReadOnlySpan<double> scale)
    {
        var sums = new double[B * Nodes];
        for (var row = 0; row < Nodes; row++)
        {
            var columns = ColumnsOf(row);
            var blocks = RowBlocks(row);
            for (var k = 0; k < columns.Length; k++)
            {
                for (var i = 0; i < B; i++)
                {
                    for (var j = 0; j < B; j++)
                    {
                        var (r, c) = (B * row + i, B * columns[k] + j);
                        var value = Math.Abs(blocks[k * BlockSize + i * B + j]) * scale[r] * scale[c];
                        sums[r] += value;
                        if (columns[k] != row) sums[c] += value;
                    }
                }
            }
        }

        return sums.Max();
    }

    /// <summary>Residual <c>r = f − K·(u + v)</c> with products and sums of twice the working precision.</summary>
    /// <param name="u">Displacements, first part.</param>
    /// <param name="v">Displacements, second part, small against the first.</param>
    /// <param name="f">Loads.</param>
    /// <param name="residual">Receives the residual, rounded once.</param>
    /// <param name="low">Room of the same length.</param>
    public void Residual(ReadOnlySpan<double> u, ReadOnlySpan<double> v, ReadOnlySpan<double> f, Span<double> residual, Span<double> low)
    {
        f.CopyTo(residual);
        low.Clear();
        for (var row = 0; row < Nodes; row++)
        {
            var columns = ColumnsOf(row);
            var blocks = RowBlocks(row);
            for (var k = 0; k < columns.Length; k++)
            {
                var block = blocks.Slice(k * BlockSize, BlockSize);
                Subtract(block, B * row, B * columns[k], isTransposed: false, u, v, residual, low);
                if (columns[k] != row) Subtract(block, B * columns[k], B * row, isTransposed: true, u, v, residual, low);
            }
        }

        for (var i = 0; i < residual.Length; i++) residual[i] += low[i];
    }

    private static void Subtract(
        ReadOnlySpan<double> block, int row, int column, bool isTransposed, ReadOnlySpan<double> u, ReadOnlySpan<double> v, Span<double> high, Span<double> low)
    {
        for (var i = 0; i < B; i++)
        {
            var (sum, rest) = (high[row + i], low[row + i]);
            for (var j = 0; j < B; j++)
            {
                var a = -(isTransposed ? block[j * B + i] : block[i * B + j]);
                var product = a * u[column + j];
                var error = Math.FusedMultiplyAdd(a, u[column + j], -product);   // exact: a·u = product + error
                var total = sum + product;
                var part = total - sum;
                rest += (sum - (total - part)) + (product - part) + error + a * v[column + j];
                sum = total;
            }

            (high[row + i], low[row + i]) = (sum, rest);
        }
    }
}
