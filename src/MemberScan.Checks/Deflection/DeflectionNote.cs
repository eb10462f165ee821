using MemberScan.Model.Forces;

namespace MemberScan.Checks.Deflection;

/// <summary>A deflection beside its named limit: a note, never a verdict and never part of the utilization.</summary>
public static class DeflectionNote
{
    /// <summary>Key of the note in a set.</summary>
    public const string Key = "deflection";

    /// <summary>The note for a member.</summary>
    /// <param name="role">Role of the member.</param>
    /// <param name="limits">The limits that the reviewer names; the first of the role counts.</param>
    /// <param name="situation">Kind of the situation; only service situations are looked at.</param>
    /// <param name="deflection">Largest deflection, magnitude [m], ≥ 0.</param>
    /// <param name="deflectionSource">Where it comes from, in words.</param>
    /// <param name="span">Span, of a cantilever its length [m], &gt; 0.</param>
    /// <returns>The note; null when no limit is named for the role. Not evaluated for design and unknown situations.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The deflection or the span is out of its range.</exception>
    public static NamedCheck? For(
        string role, IEnumerable<DeflectionLimit> limits, SituationKind situation, double deflection, string deflectionSource, double span)
    {
        ArgumentNullException.ThrowIfNull(limits);
        if (!double.IsFinite(deflection) || deflection < 0) throw new ArgumentOutOfRangeException(nameof(deflection), deflection, "the deflection must be a finite number of at least 0");
        if (limits.FirstOrDefault(l => string.Equals(l.Role, role, StringComparison.OrdinalIgnoreCase)) is not { } limit) return null;

        var clause = new Clause("", $"deflection, {limit.Name}", "", FromMemory: false);
        var name = $"deflection against {limit.Name}";
        if (situation != SituationKind.Service)
        {
            return new NamedCheck(Key, name, CheckStanding.Informs, new CheckResult.NotEvaluated(clause, new Model.Verdicts.Reason(
                Model.Verdicts.ReasonCode.KindWithoutLimit, "A deflection limit is held against service situations alone.")));
        }

        var largest = limit.For(span);
        return new NamedCheck(Key, name, CheckStanding.Informs, new Calculation(clause)
            .Given("w", deflection, "m", deflectionSource)
            .Given("L", span, "m", "span, of a cantilever its length")
            .Given("w_lim", largest, "m", $"settings, {limit.Name}")
            .Utilization($"w/w_lim = {Shown.Mm(deflection)}/{Shown.Mm(largest)}", deflection / largest));
    }
}
