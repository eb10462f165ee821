using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace MemberScan.Statics.Sparse;

/// <summary>Dense Cholesky of a panel and the product that updates what is below it, on vectors of eight numbers whatever the processor has.</summary>
/// <remarks>
/// Matrices are column-major, of which the lower part counts; what stands above the diagonal is overwritten with anything. Every sum is
/// taken in one fixed sequence, so results do not hang on the number of threads.
/// </remarks>
internal static class DenseKernel
{
    /// <summary>Rows of a packed panel; numbers of a vector.</summary>
    public const int Lane = 8;

    /// <summary>Columns packed at a time: a panel of 8 rows fits the first cache.</summary>
    public const int Depth = 256;

    // Panels of rows gone through together: they stay in the second cache.
    private const int PanelsTogether = 24;

    // A block of C that reaches beyond its matrix is worked on in the last numbers of the room for packing.
    private const int EdgeLength = 3 * Lane * Lane;

    /// <summary>Room for packing so many rows.</summary>
    public static int PackLength(int rows) => (rows + Lane - 1) / Lane * Lane * Depth + EdgeLength;

    /// <summary>Factors the first columns of a matrix: they become those of L, lower triangle and below.</summary>
    /// <param name="a">The panel, columns of the given height.</param>
    /// <param name="height">Rows, and distance of columns.</param>
    /// <param name="columns">Columns to factor.</param>
    /// <param name="pack">Room of <see cref="PackLength"/> of the height.</param>
    /// <param name="least">Smallest pivot accepted.</param>
    /// <param name="smallest">Smallest pivot met so far, before its root is taken, and its column.</param>
    /// <returns>The column whose pivot is too small; −1 where all went well.</returns>
    public static int Factor(double[] a, int height, int columns, double[] pack, double least, ref (double Pivot, int Column) smallest) =>
        Factor(a, height, 0, columns, pack, least, ref smallest);

    /// <summary>Takes the product of the lower rows of a panel with themselves from a square matrix: <c>C −= L·Lᵀ</c>, lower triangle.</summary>
    /// <param name="panel">The panel.</param>
    /// <param name="height">Its rows, and distance of columns.</param>
    /// <param name="columns">Its columns.</param>
    /// <param name="c">The square matrix of the rows below the first <paramref name="columns"/>, column-major.</param>
    /// <param name="pack">Room of <see cref="PackLength"/> of the height.</param>
    public static void Update(double[] panel, int height, int columns, double[] c, double[] pack)
    {
        var rows = height - columns;
        for (var from = 0; from < columns; from += Depth)
        {
            var depth = Math.Min(Depth, columns - from);
            Pack(panel, height, columns, rows, from, depth, pack);
            Subtract(c, 0, rows, rows, rows, pack, depth);
        }
    }

    // Left half, its effect on the right half, right half: the widest products first.
    private static int Factor(double[] a, int height, int from, int to, double[] pack, double least, ref (double Pivot, int Column) smallest)
    {
        if (to - from <= Lane) return Leaf(a, height, from, to, least, ref smallest);

        var middle = from + Math.Max(Lane, (to - from) / 2 / Lane * Lane);
        var failed = Factor(a, height, from, middle, pack, least, ref smallest);
        if (failed >= 0) return failed;

        for (var at = from; at < middle; at += Depth)
        {
            var depth = Math.Min(Depth, middle - at);
            Pack(a, height, middle, height - middle, at, depth, pack);
            Subtract(a, middle * height + middle, height, height - middle, to - middle, pack, depth);
        }

        return Factor(a, height, middle, to, pack, least, ref smallest);
    }

    private static int Leaf(double[] a, int height, int from, int to, double least, ref (double Pivot, int Column) smallest)
    {
        for (var j = from; j < to; j++)
        {
            var column = a.AsSpan(j * height + j, height - j);
            var pivot = column[0];
            if (pivot < smallest.Pivot) smallest = (pivot, j);
            if (!(pivot > least)) return j;

            var root = Math.Sqrt(pivot);
            column[0] = root;
            Scale(column[1..], 1 / root);
            for (var k = j + 1; k < to; k++) SubtractScaled(a.AsSpan(k * height + k, height - k), column[(k - j)..], column[k - j]);
        }

        return -1;
    }

    private static void Scale(Span<double> x, double factor)
    {
        ref var start = ref MemoryMarshal.GetReference(x);
        var (i, f) = (0, Vector512.Create(factor));
        for (; i + Lane <= x.Length; i += Lane) (Vector512.LoadUnsafe(ref start, (nuint)i) * f).StoreUnsafe(ref start, (nuint)i);
        for (; i < x.Length; i++) x[i] *= factor;
    }

    /// <summary><c>x −= factor·y</c>.</summary>
    public static void SubtractScaled(Span<double> x, ReadOnlySpan<double> y, double factor)
    {
        ref var a = ref MemoryMarshal.GetReference(x);
        ref var b = ref MemoryMarshal.GetReference(y);
        var (i, f) = (0, Vector512.Create(-factor));
        for (; i + Lane <= x.Length; i += Lane)
            Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref b, (nuint)i), f, Vector512.LoadUnsafe(ref a, (nuint)i)).StoreUnsafe(ref a, (nuint)i);
        for (; i < x.Length; i++) x[i] = Math.FusedMultiplyAdd(y[i], -factor, x[i]);
    }

    /// <summary>Scalar product, in eight sums that are joined at the end.</summary>
    public static double Dot(ReadOnlySpan<double> x, ReadOnlySpan<double> y)
    {
        ref var a = ref MemoryMarshal.GetReference(x);
        ref var b = ref MemoryMarshal.GetReference(y);
        var (s0, s1, i) = (Vector512<double>.Zero, Vector512<double>.Zero, 0);
        for (; i + 2 * Lane <= x.Length; i += 2 * Lane)
        {
            s0 = Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref a, (nuint)i), Vector512.LoadUnsafe(ref b, (nuint)i), s0);
            s1 = Vector512.FusedMultiplyAdd(Vector512.LoadUnsafe(ref a, (nuint)(i + Lane)), Vector512.LoadUnsafe(ref b, (nuint)(i + Lane)), s1);
        }

        var sum = Vector512.Sum(s0 + s1);
        for (; i < x.Length; i++) sum = Math.FusedMultiplyAdd(x[i], y[i], sum);
        return sum;
    }

    // Rows [row, row + rows) of some columns, in panels of eight rows, column after column; the last panel is filled up with zeros.
    private static void Pack(double[] a, int height, int row, int rows, int column, int depth, double[] pack)
    {
        ref var target = ref MemoryMarshal.GetArrayDataReference(pack);
        ref var source = ref MemoryMarshal.GetArrayDataReference(a);
        var full = rows / Lane;
        for (var panel = 0; panel < full; panel++)
        {
            for (var p = 0; p < depth; p++)
                Vector512.LoadUnsafe(ref source, (nuint)((column + p) * height + row + panel * Lane)).StoreUnsafe(ref target, (nuint)((panel * depth + p) * Lane));
        }

        var rest = rows - full * Lane;
        if (rest == 0) return;

        var last = pack.AsSpan(full * depth * Lane, depth * Lane);
        last.Clear();
        for (var p = 0; p < depth; p++)
            for (var i = 0; i < rest; i++) last[p * Lane + i] = a[(column + p) * height + row + full * Lane + i];
    }

    // C −= P·Pᵀ for the first columns of the lower triangle; C begins at an offset of its array.
    private static void Subtract(double[] c, int offset, int distance, int rows, int columns, double[] pack, int depth)
    {
        ref var target = ref Unsafe.Add(ref MemoryMarshal.GetArrayDataReference(c), offset);
        ref var p = ref MemoryMarshal.GetArrayDataReference(pack);
        var (rowPanels, columnPanels, size) = ((rows + Lane - 1) / Lane, (columns + Lane - 1) / Lane, depth * Lane);
        var edge = pack.AsSpan(pack.Length - EdgeLength);
        for (var together = 0; together < rowPanels; together += PanelsTogether)
        {
            var end = Math.Min(together + PanelsTogether, rowPanels);
            for (var j = 0; j < Math.Min(columnPanels, end); j++)
            {
                var isWhole = (j + 1) * Lane <= columns;
                for (var i = Math.Max(together, j); i < end;)
                {
                    var three = i + 3 <= end;
                    var (width, high) = (three ? 3 : 1, (three ? 3 : 1) * Lane);
                    ref var at = ref Unsafe.Add(ref target, j * Lane * distance + i * Lane);
                    var isInside = isWhole && i * Lane + high <= rows;
                    if (!isInside)
                    {
                        Copy(c, offset, distance, i * Lane, rows, j * Lane, columns, edge, high);
                        at = ref Unsafe.Add(ref p, pack.Length - EdgeLength);
                    }

                    if (three) Tile24(ref at, isInside ? distance : high, ref Unsafe.Add(ref p, i * size), size, ref Unsafe.Add(ref p, j * size), depth);
                    else Tile8(ref at, isInside ? distance : high, ref Unsafe.Add(ref p, i * size), ref Unsafe.Add(ref p, j * size), depth);
                    if (!isInside) CopyBack(edge, high, c, offset, distance, i * Lane, rows, j * Lane, columns);
                    i += width;
                }
            }
        }
    }

    private static void Copy(double[] c, int offset, int distance, int row, int rows, int column, int columns, Span<double> edge, int high)
    {
        edge.Clear();
        for (var j = 0; j < Math.Min(Lane, columns - column); j++)
            c.AsSpan(offset + (column + j) * distance + row, Math.Min(high, rows - row)).CopyTo(edge[(j * high)..]);
    }

    private static void CopyBack(ReadOnlySpan<double> edge, int high, double[] c, int offset, int distance, int row, int rows, int column, int columns)
    {
        for (var j = 0; j < Math.Min(Lane, columns - column); j++)
            edge.Slice(j * high, Math.Min(high, rows - row)).CopyTo(c.AsSpan(offset + (column + j) * distance + row));
    }

    // 24 × 8 numbers of C stay in registers while the columns of both panels pass: one piece, or they would not.
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Tile24(ref double c, int distance, ref double a, int panel, ref double b, int depth)
    {
        var (c00, c01, c02) = (Vector512<double>.Zero, Vector512<double>.Zero, Vector512<double>.Zero);
        var (c10, c11, c12) = (c00, c00, c00);
        var (c20, c21, c22) = (c00, c00, c00);
        var (c30, c31, c32) = (c00, c00, c00);
        var (c40, c41, c42) = (c00, c00, c00);
        var (c50, c51, c52) = (c00, c00, c00);
        var (c60, c61, c62) = (c00, c00, c00);
        var (c70, c71, c72) = (c00, c00, c00);
        ref var a1 = ref Unsafe.Add(ref a, panel);
        ref var a2 = ref Unsafe.Add(ref a, 2 * panel);
        for (nuint p = 0; p < (nuint)(depth * Lane); p += Lane)
        {
            var (x0, x1, x2) = (Vector512.LoadUnsafe(ref a, p), Vector512.LoadUnsafe(ref a1, p), Vector512.LoadUnsafe(ref a2, p));
            var y = Vector512.Create(Unsafe.Add(ref b, p));
            (c00, c01, c02) = (Vector512.FusedMultiplyAdd(x0, y, c00), Vector512.FusedMultiplyAdd(x1, y, c01), Vector512.FusedMultiplyAdd(x2, y, c02));
            y = Vector512.Create(Unsafe.Add(ref b, p + 1));
            (c10, c11, c12) = (Vector512.FusedMultiplyAdd(x0, y, c10), Vector512.FusedMultiplyAdd(x1, y, c11), Vector512.FusedMultiplyAdd(x2, y, c12));
            y = Vector512.Create(Unsafe.Add(ref b, p + 2));
            (c20, c21, c22) = (Vector512.FusedMultiplyAdd(x0, y, c20), Vector512.FusedMultiplyAdd(x1, y, c21), Vector512.FusedMultiplyAdd(x2, y, c22));
            y = Vector512.Create(Unsafe.Add(ref b, p + 3));
            (c30, c31, c32) = (Vector512.FusedMultiplyAdd(x0, y, c30), Vector512.FusedMultiplyAdd(x1, y, c31), Vector512.FusedMultiplyAdd(x2, y, c32));
            y = Vector512.Create(Unsafe.Add(ref b, p + 4));
            (c40, c41, c42) = (Vector512.FusedMultiplyAdd(x0, y, c40), Vector512.FusedMultiplyAdd(x1, y, c41), Vector512.FusedMultiplyAdd(x2, y, c42));
            y = Vector512.Create(Unsafe.Add(ref b, p + 5));
            (c50, c51, c52) = (Vector512.FusedMultiplyAdd(x0, y, c50), Vector512.FusedMultiplyAdd(x1, y, c51), Vector512.FusedMultiplyAdd(x2, y, c52));
            y = Vector512.Create(Unsafe.Add(ref b, p + 6));
            (c60, c61, c62) = (Vector512.FusedMultiplyAdd(x0, y, c60), Vector512.FusedMultiplyAdd(x1, y, c61), Vector512.FusedMultiplyAdd(x2, y, c62));
            y = Vector512.Create(Unsafe.Add(ref b, p + 7));
            (c70, c71, c72) = (Vector512.FusedMultiplyAdd(x0, y, c70), Vector512.FusedMultiplyAdd(x1, y, c71), Vector512.FusedMultiplyAdd(x2, y, c72));
        }

        Take(ref c, c00, c01, c02);
        Take(ref Unsafe.Add(ref c, distance), c10, c11, c12);
        Take(ref Unsafe.Add(ref c, 2 * distance), c20, c21, c22);
        Take(ref Unsafe.Add(ref c, 3 * distance), c30, c31, c32);
        Take(ref Unsafe.Add(ref c, 4 * distance), c40, c41, c42);
        Take(ref Unsafe.Add(ref c, 5 * distance), c50, c51, c52);
        Take(ref Unsafe.Add(ref c, 6 * distance), c60, c61, c62);
        Take(ref Unsafe.Add(ref c, 7 * distance), c70, c71, c72);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Take(ref double c, Vector512<double> v0, Vector512<double> v1, Vector512<double> v2)
    {
        (Vector512.LoadUnsafe(ref c) - v0).StoreUnsafe(ref c);
        (Vector512.LoadUnsafe(ref c, Lane) - v1).StoreUnsafe(ref c, Lane);
        (Vector512.LoadUnsafe(ref c, 2 * Lane) - v2).StoreUnsafe(ref c, 2 * Lane);
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Tile8(ref double c, int distance, ref double a, ref double b, int depth)
    {
        var (c0, c1, c2, c3) = (Vector512<double>.Zero, Vector512<double>.Zero, Vector512<double>.Zero, Vector512<double>.Zero);
        var (c4, c5, c6, c7) = (c0, c0, c0, c0);
        for (nuint p = 0; p < (nuint)(depth * Lane); p += Lane)
        {
            var x = Vector512.LoadUnsafe(ref a, p);
            c0 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p)), c0);
            c1 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 1)), c1);
            c2 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 2)), c2);
            c3 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 3)), c3);
            c4 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 4)), c4);
            c5 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 5)), c5);
            c6 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 6)), c6);
            c7 = Vector512.FusedMultiplyAdd(x, Vector512.Create(Unsafe.Add(ref b, p + 7)), c7);
        }

        Take(ref c, c0);
        Take(ref Unsafe.Add(ref c, distance), c1);
        Take(ref Unsafe.Add(ref c, 2 * distance), c2);
        Take(ref Unsafe.Add(ref c, 3 * distance), c3);
        Take(ref Unsafe.Add(ref c, 4 * distance), c4);
        Take(ref Unsafe.Add(ref c, 5 * distance), c5);
        Take(ref Unsafe.Add(ref c, 6 * distance), c6);
        Take(ref Unsafe.Add(ref c, 7 * distance), c7);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Take(ref double c, Vector512<double> v) => (Vector512.LoadUnsafe(ref c) - v).StoreUnsafe(ref c);
}
