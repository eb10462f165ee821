using MemberScan.Foundation.Diagnostics;
using MemberScan.Model.Frames;
using MemberScan.Statics.Assembly;
using MemberScan.Statics.Checking;
using MemberScan.Statics.Mechanisms;
using MemberScan.Statics.Sparse;

namespace MemberScan.Statics.Solving;

/// <summary>The steps from a frame to its displacements.</summary>
internal sealed class FrameSolution
{
    /// <summary>Most numbers of a factor.</summary>
    private const long LargestFactor = 1_000_000_000;

    /// <summary>Condition from which on a reader is told how many digits are left.</summary>
    private const double FewDigits = 1e10;

    /// <summary>Condition from which on no digit is sure enough.</summary>
    private const double NoDigits = 1e14;

    private readonly DiagnosticList _diagnostics;
    private readonly int _threads;
    private readonly List<HeldTurn> _held = [];

    private FrameSolution(DiagnosticList diagnostics, int threads) => (_diagnostics, _threads) = (diagnostics, threads);

    /// <summary>The stiffness of the frame.</summary>
    public FrameMatrix Matrix { get; private set; } = null!;

    /// <summary>Loads of each situation.</summary>
    public SituationLoads[] Loads { get; private set; } = [];

    /// <summary>Displacements of each situation.</summary>
    public LoadCase[] Cases { get; private set; } = [];

    /// <summary>The factor.</summary>
    public SupernodalCholesky Factor { get; private set; } = null!;

    /// <summary>What loads leave over, and how members move.</summary>
    public ElementResidual Residual { get; private set; } = null!;

    /// <summary>Estimated condition number.</summary>
    public double Condition { get; private set; } = 1;

    /// <summary>Runs all steps; null with errors.</summary>
    public static FrameSolution? Run(Frame frame, DiagnosticList diagnostics, int threads)
    {
        if (FrameCheck.Run(frame, diagnostics) is not { } good) return null;

        var made = new FrameSolution(diagnostics, threads) { Matrix = FrameMatrix.Of(good) };
        var indices = frame.Situations.Select(s => new LoadIndex(s)).ToArray();
        made.Loads = [.. Enumerable.Range(0, indices.Length).Select(s => new SituationLoads(good, indices, s))];
        if (!FreeDirections.TryHold(made.Matrix, made._held, diagnostics)) return null;
        if (made.Slides() || !made.TryFactor() || !made.TryLoad()) return null;

        made.Residual = new ElementResidual(made.Matrix);
        RefinedSolve.Run(made.Factor, made.Residual, made.Cases, threads);
        return made.IsTrusted() ? made : null;
    }

    private bool TryFactor()
    {
        var scaled = new ScaledMatrix(Matrix.Matrix, Matrix.IsFixed);
        var positions = Matrix.Frame.Frame.Nodes.Select(n => n.Position).ToArray();
        var graph = NodeGraph.Of(Matrix.Matrix.ColumnsAsMemory, positions, scaled.Weight);
        var symbolic = Symbolic.Of(graph, NestedDissection.Order(graph));
        if (symbolic.Entries > LargestFactor)
        {
            _diagnostics.Add(StaticsCodes.Size, Severity.Error, FormattableString.Invariant($"the frame is joined so closely that its factor has {symbolic.Entries} numbers, the limit is {LargestFactor}; take a part of it"));
            return false;
        }

        Factor = SupernodalCholesky.Factor(scaled, symbolic, _threads);
        if (Factor.IsWhole && Factor.Smallest.Pivot > MechanismSearch.Suspicious) return true;
        if (MechanismSearch.Tell(Matrix, scaled, symbolic, _threads, _diagnostics)) return false;
        if (Factor.IsWhole) return true;

        _diagnostics.Add(StaticsCodes.DigitsLost, Severity.Error, "the stiffnesses of the frame are so far apart that no digit of a result would be sure; check units, springs and slender chains");
        return false;
    }

    // Released along itself or across at both ends: nothing keeps the member in its place.
    private bool Slides()
    {
        foreach (var stiffness in Matrix.Frame.Members)
        {
            foreach (var joint in stiffness.FreeJoints.Where(joint => joint % 6 < 3))
            {
                _diagnostics.Add(StaticsCodes.Mechanism, Severity.Error,
                    $"the frame is a mechanism: member {stiffness.Body.Member.Name} moves along {FrameCheck.Word((Direction)(joint % 6))}, in which both its ends are released; close a release");
                return true;
            }
        }

        return false;
    }

    private bool TryLoad()
    {
        Cases = new LoadCase[Loads.Length];
        var n = Matrix.IsFixed.Length;
        Span<double> forces = stackalloc double[12], unresisted = stackalloc double[12];
        for (var s = 0; s < Cases.Length; s++)
        {
            var at = Cases[s] = new LoadCase(new double[n], new double[n], new double[n]);
            Loads[s].AddNodeLoads(at.Loads);
            Loads[s].SetMovements(at.High);
            for (var m = 0; m < Matrix.Frame.Members.Length; m++)
            {
                var loading = Loads[s].LoadingOf(m);
                if (loading.IsEmpty) continue;

                Matrix.Frame.Members[m].HeldForces(loading, forces, unresisted);
                if (Slips(s, m, forces, unresisted)) return false;
                Matrix.SubtractHeld(m, forces, at.Loads);
            }

            if (LoadsFreeTurn(s)) return false;
        }

        TellFreeJoints();
        return true;
    }

    // A load on a joint that nothing resists sets the member in motion.
    private bool Slips(int situation, int member, ReadOnlySpan<double> forces, ReadOnlySpan<double> unresisted)
    {
        const double Rounding = 1e-9;
        var largest = 0.0;
        foreach (var f in forces) largest = Math.Max(largest, Math.Abs(f));
        foreach (var f in unresisted) largest = Math.Max(largest, Math.Abs(f));
        for (var i = 0; i < 12; i++)
        {
            if (Math.Abs(unresisted[i]) <= Rounding * largest) continue;

            _diagnostics.Add(StaticsCodes.Mechanism, Severity.Error,
                $"the frame is a mechanism: situation {Name(situation)} loads member {Matrix.Frame.Frame.Members[member].Name} in {FrameCheck.Word((Direction)(i % 6))}, which is released so that nothing resists it; close a release");
            return true;
        }

        return false;
    }

    private bool LoadsFreeTurn(int situation)
    {
        const double Rounding = 1e-12;
        var loads = Cases[situation].Loads;
        var largest = 0.0;
        foreach (var load in loads) largest = Math.Max(largest, Math.Abs(load));
        foreach (var held in _held)
        {
            var at = loads.AsSpan(6 * held.Node + 3, 3);
            var moment = at[0] * held.Axis.X + at[1] * held.Axis.Y + at[2] * held.Axis.Z;
            if (Math.Abs(moment) <= Rounding * largest) continue;

            _diagnostics.Add(StaticsCodes.Mechanism, Severity.Error,
                $"the frame is a mechanism: situation {Name(situation)} turns node {Matrix.Frame.Frame.Nodes[held.Node].Name} about {FreeDirections.Name(held.Axis, isTurn: true, Matrix, held.Node)}, where every member is released; close a release");
            return true;
        }

        return false;
    }

    private void TellFreeJoints()
    {
        const int MostNames = 12;
        var names = new List<string>();
        foreach (var stiffness in Matrix.Frame.Members)
            foreach (var joint in stiffness.FreeJoints)
                if (!stiffness.Body.Member.TrussOnly) names.Add($"{stiffness.Body.Member.Name} {FrameCheck.Word((Direction)(joint % 6))}");
        if (names.Count == 0) return;

        _diagnostics.Add(StaticsCodes.FreeTurn, Severity.Note,
            $"these members are released at both ends in the same direction and nothing loads them there; they stay where they are: {string.Join(", ", names.Take(MostNames))}{(names.Count > MostNames ? FormattableString.Invariant($" and {names.Count - MostNames} more") : "")}");
    }

    // A rest that no refinement takes away stands where the frame itself has no answer to the load.
    private bool HasUnansweredLoad()
    {
        const double Unanswered = 1e-9;
        for (var s = 0; s < Cases.Length; s++)
        {
            var at = Cases[s];
            if (!(at.LargestRest > Unanswered * at.LargestLoad)) continue;

            var largest = 0;
            for (var i = 0; i < at.Rest.Length; i++)
                if (!Matrix.IsFixed[i] && (Matrix.IsFixed[largest] || Math.Abs(at.Rest[i]) > Math.Abs(at.Rest[largest]))) largest = i;
            var (node, direction) = (Matrix.Frame.Frame.Nodes[largest / 6].Name, FrameCheck.Word((Direction)(largest % 6)));
            _diagnostics.Add(StaticsCodes.Mechanism, Severity.Error,
                $"the frame is a mechanism, or its stiffnesses are too far apart: in situation {Name(s)} the load at node {node} in {direction} finds no answer; close a release there, or check units and springs");
            return true;
        }

        return false;
    }

    private bool IsTrusted()
    {
        if (HasUnansweredLoad()) return false;

        Condition = Factor.Symbolic.Unknowns == 0 ? 1 : ConditionEstimate.Of(Factor, _threads);
        if (!(Condition < NoDigits))
        {
            _diagnostics.Add(StaticsCodes.DigitsLost, Severity.Error, FormattableString.Invariant(
                $"the stiffness matrix has a condition number of {Condition:0.#E+0}, so that no digit of a result would be sure; check units, springs and slender chains"));
            return false;
        }

        if (Condition > FewDigits)
        {
            _diagnostics.Add(StaticsCodes.DigitsFew, Severity.Warning, FormattableString.Invariant(
                $"the stiffness matrix has a condition number of {Condition:0.#E+0}; about {Math.Max(1, (int)Math.Floor(15.6 - Math.Log10(Condition)))} digits of displacements and forces are sure"));
        }

        return true;
    }

    private string Name(int situation) => Matrix.Frame.Frame.Situations[situation].Name;
}
