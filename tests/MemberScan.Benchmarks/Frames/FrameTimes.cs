using System.Diagnostics;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Statics.Assembly;
using MemberScan.Statics.Checking;
using MemberScan.Statics.Sparse;

namespace MemberScan.Benchmarks.Frames;

/// <summary>Times of the parts of a frame's solution, and its matrix for other programs.</summary>
internal static class FrameTimes
{
    /// <summary>Prints one line for a tower: times in seconds and what was reached.</summary>
    public static int Print(int nx, int ny, int storeys, int situations, int threads, int rounds)
    {
        for (var round = 0; round < rounds; round++) Round(nx, ny, storeys, situations, threads);
        return 0;
    }

    /// <summary>Writes the scaled matrix of the free unknowns: count, entries, then row, column, value of the lower triangle.</summary>
    public static int Export(int nx, int ny, int storeys, string path)
    {
        var frame = FrameMatrix.Of(FrameCheck.Run(TowerFrame.Of(nx, ny, storeys, 1), new DiagnosticList())!);
        var scaled = new ScaledMatrix(frame.Matrix, frame.IsFixed);
        var place = new int[frame.IsFixed.Length];
        var count = 0;
        for (var i = 0; i < place.Length; i++) place[i] = frame.IsFixed[i] ? -1 : count++;
        using var file = new BinaryWriter(new BufferedStream(File.Create(path), 1 << 20));
        var entries = Entries(frame, scaled, place).ToList();
        file.Write(count);
        file.Write(entries.Count);
        foreach (var (row, column, value) in entries)
        {
            file.Write(row);
            file.Write(column);
            file.Write(value);
        }

        return 0;
    }

    private static IEnumerable<(int Row, int Column, double Value)> Entries(FrameMatrix frame, ScaledMatrix scaled, int[] place)
    {
        for (var row = 0; row < frame.Matrix.Nodes; row++)
        {
            for (var k = 0; k < frame.Matrix.ColumnsOf(row).Length; k++)
            {
                var column = frame.Matrix.ColumnsOf(row)[k];
                for (var i = 0; i < 6; i++)
                {
                    for (var j = 0; j < (row == column ? i + 1 : 6); j++)
                    {
                        var (r, c) = (6 * row + i, 6 * column + j);
                        var value = frame.Matrix.RowBlocks(row)[36 * k + 6 * i + j] * scaled.Scale[r] * scaled.Scale[c];
                        if (place[r] >= 0 && place[c] >= 0 && value != 0) yield return (place[r], place[c], value);
                    }
                }
            }
        }
    }

    private static void Round(int nx, int ny, int storeys, int situations, int threads)
    {
        var frame = TowerFrame.Of(nx, ny, storeys, situations);
        var watch = Stopwatch.StartNew();
        var matrix = FrameMatrix.Of(FrameCheck.Run(frame, new DiagnosticList())!);
        var assembled = Lap();
        var scaled = new ScaledMatrix(matrix.Matrix, matrix.IsFixed);
        var graph = NodeGraph.Of(matrix.Matrix.ColumnsAsMemory, [.. frame.Nodes.Select(n => n.Position)], scaled.Weight);
        var order = NestedDissection.Order(graph);
        var ordered = Lap();
        var symbolic = Symbolic.Of(graph, order);
        var shaped = Lap();
        var factor = SupernodalCholesky.Factor(scaled, symbolic, threads);
        var factored = Lap();
        var right = Enumerable.Range(0, situations).Select(s => Enumerable.Range(0, matrix.IsFixed.Length).Select(i => Math.Sin(i + s)).ToArray()).ToArray();
        Lap();
        TriangularSolve.Solve(factor, right, threads);
        var solved = Lap();
        var diagnostics = new DiagnosticList();
        var whole = Stopwatch.StartNew();
        var result = Statics.FrameSolver.Solve(frame, diagnostics, threads)!;
        var all = whole.Elapsed.TotalSeconds;
        var operations = symbolic.Supernodes.Sum(s => s.Operations);
        Console.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"{nx}x{ny}x{storeys} unknowns {symbolic.Unknowns} threads {threads}: assemble {assembled:0.000} order {ordered:0.000} shape {shaped:0.000} factor {factored:0.000} ({operations / 1e9:0.0} GFlop, {operations / factored / 1e9:0.0} GFlop/s, {symbolic.Entries / 1e6:0.0} M) solve of {situations} {solved:0.000} ({solved / situations / factored:0.000} of the factor each); whole {all:0.00}; residual {result.Situations.Max(s => s.Residual):0.0E+0} backward {result.Situations.Max(s => s.BackwardError):0.0E+0} balance {result.Situations.Max(s => s.EquilibriumError):0.0E+0} condition {result.Quality.Condition:0.0E+0} pivot {result.Quality.SmallestPivot:0.0E+0}{string.Concat(diagnostics.Items.Select(d => " " + d.Code))}; memory {Process.GetCurrentProcess().PeakWorkingSet64 / 1048576} MiB"));

        double Lap()
        {
            var time = watch.Elapsed.TotalSeconds;
            watch.Restart();
            return time;
        }
    }
}
