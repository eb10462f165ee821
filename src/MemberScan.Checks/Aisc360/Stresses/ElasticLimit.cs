using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.Aisc360.Stresses;

/// <summary>First yield by von Mises with the factors of AISC 360-22: <c>F_y/Ω</c> for ASD, <c>φF_y</c> for LRFD.</summary>
/// <remarks>
/// Our own stress criterion with the specification's factors (1.67 and 0.90, from memory), not a clause of it: it covers all six
/// section forces in hollow sections, whose clauses work with section strengths. Of hollow sections the stresses are those of
/// the design wall (B4.2).
/// </remarks>
public static class ElasticLimit
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = StrengthFactor.Clause("first yield with the factors of F1 and H3", "");

    /// <summary>Holds the equivalent stress at a point against the available yield stress.</summary>
    /// <param name="state">Stresses at the point; finite.</param>
    /// <param name="F_y">Yield strength [Pa], &gt; 0.</param>
    /// <param name="method">ASD or LRFD.</param>
    /// <param name="situation">Kind of the situation.</param>
    /// <param name="wallBasis">Wall that the stresses are of, in words, such as <see cref="DesignWall.Words"/>.</param>
    /// <returns>The utilization [-] with its calculation; not evaluated for the wrong kind.</returns>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength is not above zero.</exception>
    public static CheckResult Check(in StressState state, double F_y, DesignMethod method, SituationKind situation, string wallBasis)
    {
        StateLines.ThrowUnlessUsable(state, F_y, factor: 1);
        if (KindRule.Refusal(Clause, StrengthFactor.KindOf(method), situation) is { } refusal) return refusal;

        var limit = StrengthFactor.Member.Available(F_y, method);
        var equivalent = state.VonMises;
        return new Calculation(Clause)
            .With(StateLines.Of(state).Select(line => line with { Source = $"{line.Source}; {wallBasis}" }))
            .Found("σvM", $"√(σ² + 3τ²) = √({Shown.MPa(state.Sigma)}² + 3·{Shown.MPa(state.Tau)}²) MPa", equivalent, "Pa", "equivalent stress of von Mises")
            .Given("F_y", F_y, "Pa", "material of the member")
            .Found("limit", $"F_y{StrengthFactor.Member.Words(method)}", limit, "Pa", $"{Clause}, {StrengthFactor.Name(method)}")
            .Utilization($"σvM/limit = {Shown.MPa(equivalent)}/{Shown.MPa(limit)}", equivalent / limit);
    }
}
