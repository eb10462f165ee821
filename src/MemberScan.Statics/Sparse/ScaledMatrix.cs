using MemberScan.Statics.Assembly;

namespace MemberScan.Statics.Sparse;

/// <summary>The matrix to be factored: free unknowns alone, scaled to a diagonal of about one by powers of two, which rounds nothing.</summary>
internal sealed class ScaledMatrix
{
    /// <summary>Prepares a matrix.</summary>
    /// <param name="matrix">The matrix.</param>
    /// <param name="isFixed">Unknowns left out.</param>
    public ScaledMatrix(BlockMatrix matrix, bool[] isFixed)
    {
        (Matrix, IsFixed) = (matrix, isFixed);
        Scale = new double[isFixed.Length];
        Weight = new int[matrix.Nodes];
        for (var node = 0; node < matrix.Nodes; node++)
        {
            var diagonal = matrix.Diagonal(node);
            for (var d = 0; d < 6; d++)
            {
                var i = 6 * node + d;
                if (isFixed[i]) continue;
                Weight[node]++;
                Scale[i] = diagonal[7 * d] > 0 ? Math.ScaleB(1, -(int)Math.Round(0.5 * Math.Log2(diagonal[7 * d]))) : 1;
            }
        }
    }

    /// <summary>The matrix.</summary>
    public BlockMatrix Matrix { get; }

    /// <summary>Unknowns left out.</summary>
    public bool[] IsFixed { get; }

    /// <summary>What rows and columns are multiplied by; 0 for unknowns left out.</summary>
    public double[] Scale { get; }

    /// <summary>Number of free unknowns of each node.</summary>
    public int[] Weight { get; }

    /// <summary>Added to the scaled diagonal, to look for what a frame does not resist; 0 for the matrix itself.</summary>
    public double Shift { get; init; }
}
