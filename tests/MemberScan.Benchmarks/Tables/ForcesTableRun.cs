using System.Diagnostics;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;

namespace MemberScan.Benchmarks.Tables;

/// <summary>Reads a forces table row by row and prints rows, members, a sum to compare, seconds of the processor, rows per second and peak memory.</summary>
internal static class ForcesTableRun
{
    /// <summary>Reads the table a few times; the first warms up.</summary>
    public static int Read(string path, int rounds)
    {
        for (var round = 0; round < rounds; round++)
        {
            var (rows, members, sum, last) = (0, 0, 0.0, "");
            var allocated = GC.GetAllocatedBytesForCurrentThread();
            var (watch, cpu) = (Stopwatch.StartNew(), Process.GetCurrentProcess().TotalProcessorTime);
            var diagnostics = new DiagnosticList();
            using var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, 1);
            var table = ForcesTable.Stream(stream, Path.GetFileName(path), diagnostics, (in ForcesRow row) =>
            {
                rows++;
                sum += row.Forces.N + row.Forces.Mz;
                if (ReferenceEquals(row.Member, last)) return;
                (last, members) = (row.Member, members + 1);
            });
            var seconds = (Process.GetCurrentProcess().TotalProcessorTime - cpu).TotalSeconds;
            if (table is null) throw new InvalidOperationException(diagnostics.Items[0].Message);

            Console.WriteLine(string.Create(CultureInfo.InvariantCulture,
                $"rows {rows}, members {members}, sum {sum:R}, wall {watch.Elapsed.TotalSeconds:0.00} s, processor {seconds:0.00} s, {rows / seconds / 1e6:0.00} M rows/s, "
                + $"allocated {(GC.GetAllocatedBytesForCurrentThread() - allocated) / 1048576.0:0.0} MiB, peak {Process.GetCurrentProcess().PeakWorkingSet64 / 1048576.0:0.0} MiB"));
        }

        return 0;
    }
}
