using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Frames;
using MemberScan.Statics.Results;
using MemberScan.Statics.Solving;

namespace MemberScan.Statics;

/// <summary>Linear elastic analysis of first order of a space frame.</summary>
/// <remarks>
/// Displacements are small, equilibrium is taken on the undeformed frame, warping of sections is not restrained. The stiffness matrix is
/// positive definite wherever the frame is no mechanism, since fixed directions are taken out and springs are above zero; so a Cholesky
/// factor is all that is needed.
/// </remarks>
public static class FrameSolver
{
    /// <summary>Solves a frame for all its situations on one thread.</summary>
    /// <param name="frame">The frame.</param>
    /// <param name="diagnostics">
    /// Takes what is wrong (STA-0001 to STA-0009), each naming the node, member or situation: a bad frame, a mechanism with node and
    /// direction, too many digits lost; a note on turns that nothing resists and nothing loads (STA-0010), a warning where few digits are
    /// sure (STA-0011).
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
        if (FrameSolution.Run(frame, diagnostics, threads) is not { } solution) return null;

        var (factor, matrix) = (solution.Factor, solution.Matrix.Matrix);
        var norm = matrix.Norm(factor.Matrix.Scale);
        var situations = Enumerable.Range(0, solution.Cases.Length).Select(s => (SituationResult)new SolvedSituation(solution, s, norm));
        return new FrameResult(frame, [.. situations], new SolveQuality(
            factor.Symbolic.Unknowns, factor.Symbolic.Entries, factor.Symbolic.Supernodes.Sum(s => s.Operations),
            Math.Min(1, factor.Smallest.Pivot), solution.Condition, Reciprocity.Of(solution)));
    }
}
