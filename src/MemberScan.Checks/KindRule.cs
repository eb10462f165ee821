using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks;

/// <summary>Keeps service and design apart: a limit is never held against a situation of the other kind.</summary>
/// <remarks>
/// A situation of unknown kind may be held against a service limit, the more cautious of the two; never against a design limit,
/// since its forces may lack their factors.
/// </remarks>
public static class KindRule
{
    /// <summary>Why a limit may not be held against a situation; null when it may.</summary>
    /// <param name="clause">Where the limit comes from.</param>
    /// <param name="limit">Kind that the limit is made for: service or design.</param>
    /// <param name="situation">Kind of the situation.</param>
    /// <exception cref="ArgumentOutOfRangeException">The limit's kind is unknown.</exception>
    public static CheckResult.NotEvaluated? Refusal(Clause clause, SituationKind limit, SituationKind situation)
    {
        if (limit is not (SituationKind.Service or SituationKind.Design))
            throw new ArgumentOutOfRangeException(nameof(limit), limit, "a limit is for service or for design situations");
        if (situation == limit || (situation == SituationKind.Unknown && limit == SituationKind.Service)) return null;

        return situation == SituationKind.Unknown
            ? new CheckResult.NotEvaluated(clause, new Reason(ReasonCode.KindUnknown, "The situation says neither service nor design; a design limit is not held against it."))
            : new CheckResult.NotEvaluated(clause, new Reason(ReasonCode.KindWithoutLimit, $"The limit is for {Word(limit)} situations; the forces are of a {Word(situation)} situation and are not held against it."));
    }

    private static string Word(SituationKind kind) => kind == SituationKind.Service ? "service" : "design";
}
