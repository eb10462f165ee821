namespace MemberScan.Statics.Sparse;

/// <summary>Neighbouring columns of the factor that share their rows, eliminated together.</summary>
/// <param name="Nodes">The nodes, in the sequence of their elimination.</param>
/// <param name="First">Place of the first unknown in the sequence of elimination.</param>
/// <param name="Pivots">Number of unknowns eliminated here.</param>
/// <param name="Rows">Places of the unknowns below, rising.</param>
/// <param name="Children">Numbers of the supernodes that hand their rest to this one.</param>
internal sealed record Supernode(int[] Nodes, int First, int Pivots, int[] Rows, int[] Children)
{
    /// <summary>Rows of the panel: pivots and what is below.</summary>
    public int Height => Pivots + Rows.Length;

    /// <summary>Floating-point operations of its elimination.</summary>
    public double Operations
    {
        get
        {
            var (k, r) = ((double)Pivots, (double)Rows.Length);
            return k * k * k / 3 + k * k * r + k * r * r;
        }
    }
}
