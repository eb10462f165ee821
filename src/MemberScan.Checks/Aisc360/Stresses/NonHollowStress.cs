using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Aisc360.Stresses;

/// <summary>AISC 360-22, H3.3: members other than hollow sections under torsion and combined stress.</summary>
/// <remarks>
/// From memory. (a) normal stress against F_y and (b) shear stress against 0.6 F_y, each apart; the governing points of the two may
/// differ, so the check is made at both. (c) buckling is not evaluated; solid bars have no wall that could buckle so.
/// </remarks>
public static class NonHollowStress
{
    /// <summary>(a) yielding under normal stress.</summary>
    public static Clause NormalClause { get; } = StrengthFactor.Clause("H3.3(a)", "(H3-7)");

    /// <summary>(b) yielding under shear stress.</summary>
    public static Clause ShearClause { get; } = StrengthFactor.Clause("H3.3(b)", "(H3-8)");

    /// <summary>(c) buckling.</summary>
    public static Clause BucklingClause { get; } = StrengthFactor.Clause("H3.3(c)", "(H3-9)");

    /// <summary>The two stresses of one point held against their limits, and what is said of buckling.</summary>
    /// <param name="section">The section; not hollow.</param>
    /// <param name="state">Stresses at the point; finite.</param>
    /// <param name="F_y">Yield strength [Pa], &gt; 0.</param>
    /// <param name="method">ASD or LRFD.</param>
    /// <param name="situation">Kind of the situation.</param>
    /// <returns>(a) and (b); for open sections (c), not evaluated. One refusal for hollow sections and for the wrong kind.</returns>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength is not above zero.</exception>
    public static CheckSet Check(CrossSection section, in StressState state, double F_y, DesignMethod method, SituationKind situation)
    {
        ArgumentNullException.ThrowIfNull(section);
        StateLines.ThrowUnlessUsable(state, F_y, factor: 1);
        const string Key = "aisc-h3.3a", Name = "normal stress";
        if (KindRule.Refusal(NormalClause, StrengthFactor.KindOf(method), situation) is { } refusal) return CheckSet.Refused(Key, Name, refusal);
        if (section is Tube or Box)
            return CheckSet.Refused(Key, Name, new(NormalClause, new Reason(ReasonCode.CheckNotEvaluated, "H3.3 is for sections other than hollow ones; hollow sections are held against H3.1 and H3.2.")));

        var normal = new NamedCheck(Key, Name, CheckStanding.Decides, Normal(state, F_y, method));
        var shear = new NamedCheck("aisc-h3.3b", "shear stress", CheckStanding.Decides, Shear(state, F_y, method));
        if (section is Round or Rectangle or RoundedRectangle) return new CheckSet([normal, shear], []);

        var buckling = new CheckResult.NotEvaluated(BucklingClause, new Reason(ReasonCode.CheckNotEvaluated, $"Buckling of a section of the kind {section.Kind} under combined stress is not evaluated."));
        return new CheckSet([normal, shear, new NamedCheck("aisc-h3.3c", "buckling under combined stress", CheckStanding.Decides, buckling)], []);
    }

    /// <summary>(a): |σ| against the available F_y.</summary>
    public static CheckResult.Evaluated Normal(in StressState state, double F_y, DesignMethod method)
    {
        var limit = StrengthFactor.Member.Available(F_y, method);                  // (H3-7)
        return Held(NormalClause, state, "|σ|", Math.Abs(state.Sigma), "F_y", F_y, limit, F_y, method);
    }

    /// <summary>(b): τ against the available 0.6 F_y.</summary>
    public static CheckResult.Evaluated Shear(in StressState state, double F_y, DesignMethod method)
    {
        var limit = StrengthFactor.Member.Available(0.6 * F_y, method);            // (H3-8)
        return Held(ShearClause, state, "τ", state.Tau, "0.6F_y", 0.6 * F_y, limit, F_y, method);
    }

    private static CheckResult.Evaluated Held(
        Clause clause, in StressState state, string stressSymbol, double stress, string nominalSymbol, double nominal, double limit, double F_y, DesignMethod method) =>
        new Calculation(clause)
            .With(StateLines.Of(state))
            .Given("F_y", F_y, "Pa", "material of the member")
            .Found("F_n", nominalSymbol, nominal, "Pa")
            .Found("limit", $"F_n{StrengthFactor.Member.Words(method)}", limit, "Pa", $"{clause}, {StrengthFactor.Name(method)}")
            .Utilization($"{stressSymbol}/limit = {Shown.MPa(stress)}/{Shown.MPa(limit)}", stress / limit);
}
