using System.Collections.Immutable;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks;

/// <summary>Outcome of one check: a utilization with its calculation, or the reason why there is none.</summary>
public abstract record CheckResult
{
    private CheckResult(Clause clause) => Clause = clause;

    /// <summary>Where the check comes from.</summary>
    public Clause Clause { get; }

    /// <summary>The check was made.</summary>
    /// <param name="Clause">Where it comes from.</param>
    /// <param name="Utilization">Root form, linear in the load [-]; over the limit when &gt; 1 + 1e-9.</param>
    /// <param name="Trace">The calculation.</param>
    public sealed record Evaluated(Clause Clause, double Utilization, ImmutableArray<TraceLine> Trace) : CheckResult(Clause);

    /// <summary>The check was not made: silence is never a pass.</summary>
    /// <param name="Clause">Where it comes from.</param>
    /// <param name="Why">The reason.</param>
    public sealed record NotEvaluated(Clause Clause, Reason Why) : CheckResult(Clause);
}
