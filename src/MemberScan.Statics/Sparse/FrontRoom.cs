namespace MemberScan.Statics.Sparse;

/// <summary>What one thread works in: places of unknowns in the present front, room for packing, square arrays to be used again.</summary>
internal sealed class FrontRoom(Symbolic symbolic)
{
    private const int Kept = 16;

    private readonly List<double[]> _free = [];

    /// <summary>Place in the front of each unknown that it holds.</summary>
    public int[] Local { get; } = new int[symbolic.Unknowns];

    /// <summary>Room for packing.</summary>
    public double[] Pack { get; } = new double[DenseKernel.PackLength(symbolic.Supernodes.Max(s => (int?)s.Height) ?? 0)];

    /// <summary>Runs of rows: first, length, place in the front.</summary>
    public List<(int Begin, int Length, int To)> Runs { get; } = [];

    /// <summary>A square array of zeros, or a larger one of which the beginning is zero.</summary>
    public double[] Rent(int rows)
    {
        var length = rows * rows;
        var best = -1;
        for (var k = 0; k < _free.Count; k++)
            if (_free[k].Length >= length && (best < 0 || _free[k].Length < _free[best].Length)) best = k;
        if (best < 0 || _free[best].Length > 4L * length + 4096) return new double[length];

        var found = _free[best];
        _free.RemoveAt(best);
        found.AsSpan(0, length).Clear();
        return found;
    }

    /// <summary>Gives an array back.</summary>
    public void Return(double[] array)
    {
        if (_free.Count < Kept) _free.Add(array);
    }
}
