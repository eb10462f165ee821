namespace MemberScan.Mechanics.Warping;

/// <summary>A symmetric positive definite matrix kept from the first entry of each row to the diagonal, and its factor L·Lᵀ in its place.</summary>
internal sealed class SkylineCholesky
{
    private readonly int[] _first;
    private readonly int[] _start;
    private readonly double[] _entries;

    /// <summary>An empty matrix; <paramref name="first"/> is the first column of each row.</summary>
    public SkylineCholesky(int[] first)
    {
        _first = first;
        _start = new int[first.Length + 1];
        for (var i = 0; i < first.Length; i++) _start[i + 1] = _start[i] + i - first[i] + 1;
        _entries = new double[_start[^1]];
    }

    /// <summary>Adds to an entry of the lower half, row ≥ column.</summary>
    public void Add(int row, int column, double value) => _entries[_start[row] + column - _first[row]] += value;

    /// <summary>Factors; false where the matrix is not positive definite.</summary>
    public bool TryFactor()
    {
        for (var i = 0; i < _first.Length; i++)
        {
            var row = _entries.AsSpan(_start[i], i - _first[i] + 1);
            for (var j = _first[i]; j < i; j++)
            {
                var from = Math.Max(_first[i], _first[j]);
                var other = _entries.AsSpan(_start[j], j - _first[j] + 1);
                row[j - _first[i]] = (row[j - _first[i]] - Kernel.Dot(row[(from - _first[i])..(j - _first[i])], other[(from - _first[j])..])) / other[^1];
            }

            var pivot = row[^1] - Kernel.Dot(row[..^1], row[..^1]);
            if (!(pivot > 0)) return false;

            row[^1] = Math.Sqrt(pivot);
        }

        return true;
    }

    /// <summary>Solves in place after factoring.</summary>
    public void Solve(Span<double> x)
    {
        for (var i = 0; i < x.Length; i++)
        {
            var row = _entries.AsSpan(_start[i], i - _first[i] + 1);
            x[i] = (x[i] - Kernel.Dot(row[..^1], x[_first[i]..i])) / row[^1];      // L·y = b
        }

        for (var i = x.Length - 1; i >= 0; i--)
        {
            var row = _entries.AsSpan(_start[i], i - _first[i] + 1);
            x[i] /= row[^1];                                                       // Lᵀ·x = y
            Kernel.Add(-x[i], row[..^1], x[_first[i]..i]);
        }
    }
}
