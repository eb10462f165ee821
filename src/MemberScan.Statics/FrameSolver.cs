using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Frames;

namespace MemberScan.Statics;

/// <summary>Linear elastic analysis of first order of a space frame.</summary>
public static class FrameSolver
{
    /// <summary>Solves a frame for all its situations.</summary>
    /// <param name="frame">The frame.</param>
    /// <param name="diagnostics">
    /// Takes what is wrong (STA-0001 and on), each naming the node, member or situation: a bad frame, a mechanism with node and direction,
    /// too many digits lost; notes on turns that nothing resists and nothing loads.
    /// </param>
    /// <returns>The result; null when anything is an error.</returns>
    public static FrameResult? Solve(Frame frame, DiagnosticList diagnostics) => Solve(frame, diagnostics, 1);

    /// <summary>Solves a frame for all its situations, on several threads.</summary>
    /// <param name="frame">The frame.</param>
    /// <param name="diagnostics">Takes what is wrong.</param>
    /// <param name="threads">Threads to use, at least 1; every number gives the same bits.</param>
    /// <returns>The result; null when anything is an error.</returns>
    public static FrameResult? Solve(Frame frame, DiagnosticList diagnostics, int threads)
    {
        ArgumentNullException.ThrowIfNull(frame);
        ArgumentNullException.ThrowIfNull(diagnostics);
        ArgumentOutOfRangeException.ThrowIfLessThan(threads, 1);
        throw new NotSupportedException("the solver is being built");
    }
}
