using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames;
using MemberScan.Model.Frames.Loads;
using MemberScan.Statics.Solving;

namespace MemberScan.Statics.Results;

/// <summary>One situation of a solved frame.</summary>
internal sealed class SolvedSituation : SituationResult
{
    private readonly FrameSolution _solution;
    private readonly int _number;

    public SolvedSituation(FrameSolution solution, int number, double matrixNorm)
    {
        (_solution, _number) = (solution, number);
        var at = solution.Cases[number];
        Residual = at.LargestLoad > 0 ? at.LargestRest / at.LargestLoad : 0;
        BackwardError = BackwardErrorOf(at, matrixNorm);
        EquilibriumError = Equilibrium.ErrorOf(this, solution, number);
    }

    /// <inheritdoc/>
    public override FrameSituation Situation => _solution.Matrix.Frame.Frame.Situations[_number];

    /// <inheritdoc/>
    public override double Residual { get; }

    /// <inheritdoc/>
    public override double BackwardError { get; }

    /// <inheritdoc/>
    public override double EquilibriumError { get; }

    /// <inheritdoc/>
    public override NodeDisplacement Displacement(int node)
    {
        var u = _solution.Cases[_number].High.AsSpan(6 * node, 6);
        var (shift, turn) = (Global(node, u[..3]), Global(node, u[3..]));
        return new NodeDisplacement(shift, turn);
    }

    /// <inheritdoc/>
    public override SupportReaction Reaction(int node)
    {
        var (frame, at) = (_solution.Matrix.Frame, _solution.Cases[_number]);
        if (frame.SupportOf[node] < 0) return default;

        Span<double> r = stackalloc double[6];
        var restraints = frame.Frame.Supports[frame.SupportOf[node]].Restraints;
        for (var d = 0; d < 6; d++)
        {
            var (restraint, i) = (restraints[(Direction)d], 6 * node + d);
            r[d] = restraint.Kind switch
            {
                RestraintKind.Fixed => -at.Rest[i],
                RestraintKind.Spring => -restraint.Stiffness * at.High[i] - restraint.Stiffness * at.Low[i],
                _ => 0,
            };
        }

        return new SupportReaction(Global(node, r[..3]), Global(node, r[3..]));
    }

    /// <inheritdoc/>
    public override MemberResult Member(int member) => new SolvedMember(_solution, _number, member);

    private Vector3 Global(int node, ReadOnlySpan<double> v) => _solution.Matrix.Frame.NodeAxes[node] is { } axes
        ? v[0] * axes.X + v[1] * axes.Y + v[2] * axes.Z
        : new Vector3(v[0], v[1], v[2]);

    // Scaled as the matrix is, so that it does not hang on units.
    private double BackwardErrorOf(LoadCase at, double matrixNorm)
    {
        var (scale, isFixed) = (_solution.Factor.Matrix.Scale, _solution.Matrix.IsFixed);
        var (rest, load, size) = (0.0, 0.0, 0.0);
        for (var i = 0; i < scale.Length; i++)
        {
            if (isFixed[i]) continue;
            rest = Math.Max(rest, scale[i] * Math.Abs(at.Rest[i]));
            load = Math.Max(load, scale[i] * Math.Abs(at.Loads[i]));
            size = Math.Max(size, Math.Abs(at.High[i]) / scale[i]);
        }

        return rest == 0 ? 0 : rest / (matrixNorm * size + load);
    }
}
