using MathNet.Numerics.LinearAlgebra;
using MemberScan.Foundation.Geometry;
using MemberScan.Statics.Assembly;
using MemberScan.Statics.Sparse;

namespace MemberScan.Statics.Tests.Sparse;

/// <summary>The factorisation against a plain dense one of another library (MathNet.Numerics), and orders of elimination.</summary>
public sealed class CholeskyTests
{
    [Theory]
    [InlineData(1, 1, 3)]
    [InlineData(4, 3, 2)]
    [InlineData(6, 5, 7)]
    [InlineData(2, 2, 60)]
    public void Solutions_equal_those_of_a_dense_factorisation(int nx, int ny, int nz)
    {
        var (matrix, isFixed, positions) = Grid(nx, ny, nz, seed: nx + ny + nz);
        var factor = Factor(matrix, isFixed, positions, 1);
        var (n, random) = (isFixed.Length, new Random(5));
        var right = Enumerable.Range(0, 11).Select(_ => Enumerable.Range(0, n).Select(_ => random.NextDouble() - 0.5).ToArray()).ToArray();
        var solved = right.Select(r => (double[])r.Clone()).ToArray();

        TriangularSolve.Solve(factor, solved, 1);

        var free = Enumerable.Range(0, n).Where(i => !isFixed[i]).ToArray();
        var dense = Matrix<double>.Build.Dense(free.Length, free.Length, (i, j) => Entry(matrix, free[i], free[j]));
        var expected = dense.Cholesky().Solve(Matrix<double>.Build.Dense(free.Length, right.Length, (i, k) => right[k][free[i]]));
        for (var k = 0; k < right.Length; k++)
        {
            var size = expected.Column(k).AbsoluteMaximum();
            for (var i = 0; i < free.Length; i++) Near.Nothing(solved[k][free[i]] - expected[i, k], size, 1e-9);
            for (var i = 0; i < n; i++) Assert.True(!isFixed[i] || solved[k][i] == 0);
        }
    }

    [Fact]
    public void Threads_and_neighbours_in_a_group_change_no_bit()
    {
        var (matrix, isFixed, positions) = Grid(6, 5, 20, seed: 3);
        var (one, four) = (Factor(matrix, isFixed, positions, 1), Factor(matrix, isFixed, positions, 4));
        var right = Enumerable.Range(0, 3).Select(k => Enumerable.Range(0, isFixed.Length).Select(i => Math.Sin(i + k)).ToArray()).ToArray();
        var (alone, together) = ((double[])right[1].Clone(), right.Select(r => (double[])r.Clone()).ToArray());

        TriangularSolve.Solve(one, [alone], 1);
        TriangularSolve.Solve(four, together, 4);

        Assert.Equal(alone, together[1]);
    }

    [Fact]
    public void A_matrix_that_is_not_positive_is_told()
    {
        var (matrix, isFixed, positions) = Grid(3, 3, 3, seed: 1);
        matrix.Diagonal(13)[7] = -1;

        Assert.False(Factor(matrix, isFixed, positions, 1).IsWhole);
    }

    [Theory]
    [InlineData(8, 8, 40, 1.0)]
    [InlineData(1, 1, 2000, 2.0)]                                                // from end to end is the best there is for a chain
    [InlineData(60, 60, 1, 0.7)]
    public void An_order_holds_every_node_once_and_keeps_the_factor_small(int nx, int ny, int nz, double share)
    {
        var (matrix, isFixed, positions) = Grid(nx, ny, nz, seed: 2);
        var scaled = new ScaledMatrix(matrix, isFixed);
        var graph = NodeGraph.Of(matrix.ColumnsAsMemory, positions, scaled.Weight);

        var order = NestedDissection.Order(graph);

        Assert.Equal(Enumerable.Range(0, graph.Count), order.Order());
        var natural = Symbolic.Of(graph, [.. Enumerable.Range(0, graph.Count)]);
        Assert.True(Symbolic.Of(graph, order).Entries <= share * natural.Entries);
    }

    [Fact]
    public void The_smallest_pivot_belongs_to_the_softest_place()
    {
        var (matrix, isFixed, positions) = Grid(2, 2, 2, seed: 9);
        var factor = Factor(matrix, isFixed, positions, 1);

        Assert.InRange(factor.Smallest.Pivot, 1e-6, 1);
    }

    private static SupernodalCholesky Factor(BlockMatrix matrix, bool[] isFixed, Vector3[] positions, int threads)
    {
        var scaled = new ScaledMatrix(matrix, isFixed);
        var graph = NodeGraph.Of(matrix.ColumnsAsMemory, positions, scaled.Weight);
        return SupernodalCholesky.Factor(scaled, Symbolic.Of(graph, NestedDissection.Order(graph)), threads);
    }

    // A grid of nodes joined to their neighbours by random positive definite pairs; the first node is partly fixed.
    private static (BlockMatrix Matrix, bool[] IsFixed, Vector3[] Positions) Grid(int nx, int ny, int nz, int seed)
    {
        var (random, n) = (new Random(seed), nx * ny * nz);
        var pairs = new List<(int, int)>();
        var positions = new Vector3[n];
        for (var i = 0; i < n; i++)
        {
            var (x, y, z) = (i % nx, i / nx % ny, i / (nx * ny));
            positions[i] = new Vector3(x, y, z);
            if (x > 0) pairs.Add((i, i - 1));
            if (y > 0) pairs.Add((i, i - nx));
            if (z > 0) pairs.Add((i, i - nx * ny));
        }

        var matrix = new BlockMatrix(n, pairs);
        for (var i = 0; i < n; i++)
            for (var d = 0; d < 6; d++) matrix.Diagonal(i)[7 * d] += 0.01;
        foreach (var (a, b) in pairs) AddPair(matrix, a, b, random);
        var isFixed = new bool[6 * n];
        (isFixed[0], isFixed[2], isFixed[5]) = (true, true, true);
        return (matrix, isFixed, positions);
    }

    // A Gram matrix of 12 random vectors on both nodes.
    private static void AddPair(BlockMatrix matrix, int a, int b, Random random)
    {
        var g = Matrix<double>.Build.Dense(12, 12, (_, _) => random.NextDouble() - 0.5);
        var k = g.TransposeThisAndMultiply(g);
        for (var i = 0; i < 6; i++)
        {
            for (var j = 0; j < 6; j++)
            {
                matrix.Diagonal(a)[6 * i + j] += k[i, j];
                matrix.Diagonal(b)[6 * i + j] += k[6 + i, 6 + j];
                if (a > b) matrix.Block(a, b)[6 * i + j] += k[i, 6 + j];
                else matrix.Block(b, a)[6 * i + j] += k[6 + i, j];
            }
        }
    }

    private static double Entry(BlockMatrix matrix, int r, int c)
    {
        var (row, column) = (Math.Max(r / 6, c / 6), Math.Min(r / 6, c / 6));
        if (!matrix.ColumnsOf(row).Contains(column)) return 0;
        return r / 6 >= c / 6 ? matrix.Block(row, column)[6 * (r % 6) + c % 6] : matrix.Block(row, column)[6 * (c % 6) + r % 6];
    }
}
