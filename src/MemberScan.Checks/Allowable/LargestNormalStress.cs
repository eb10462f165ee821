using MemberScan.Mechanics.Stress;
using MemberScan.Model.Forces;

namespace MemberScan.Checks.Allowable;

/// <summary>Largest normal stress, for brittle materials: the principal stresses against limits in tension and compression.</summary>
/// <remarks>Plain mechanics (Rankine); the limits are the reviewer's and belong to no clause here.</remarks>
public static class LargestNormalStress
{
    /// <summary>Where the check comes from.</summary>
    public static Clause Clause { get; } = new("", "largest normal stress, σ1 ≤ tension limit and −σ3 ≤ compression limit", "", FromMemory: false);

    /// <summary>Holds the principal stresses at a point against their limits.</summary>
    /// <param name="state">Stresses at the point; finite.</param>
    /// <param name="tensionLimit">Allowable tensile stress [Pa], &gt; 0.</param>
    /// <param name="compressionLimit">Allowable compressive stress [Pa], &gt; 0.</param>
    /// <param name="limitKind">Kind of situation that the limits are given for.</param>
    /// <param name="situation">Kind of the situation.</param>
    /// <param name="limitSource">Where the limits come from, in words.</param>
    /// <returns>The larger of the two utilizations [-] with its calculation; not evaluated for the wrong kind.</returns>
    /// <exception cref="ArgumentException">A stress is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A limit is not above zero.</exception>
    public static CheckResult Check(
        in StressState state, double tensionLimit, double compressionLimit, SituationKind limitKind, SituationKind situation, string limitSource)
    {
        StateLines.ThrowUnlessUsable(state, tensionLimit, factor: 1);
        StateLines.ThrowUnlessUsable(state, compressionLimit, factor: 1);
        if (KindRule.Refusal(Clause, limitKind, situation) is { } refusal) return refusal;

        var (inTension, inCompression) = (state.Sigma1 / tensionLimit, -state.Sigma3 / compressionLimit);
        return new Calculation(Clause)
            .With(StateLines.Of(state))
            .Found("σ1", $"σ/2 + √((σ/2)² + τ²) = {Shown.MPa(state.Sigma / 2)} + √({Shown.MPa(state.Sigma / 2)}² + {Shown.MPa(state.Tau)}²) MPa", state.Sigma1, "Pa", "largest principal stress")
            .Found("σ3", $"σ/2 − √((σ/2)² + τ²) = {Shown.MPa(state.Sigma / 2)} − √({Shown.MPa(state.Sigma / 2)}² + {Shown.MPa(state.Tau)}²) MPa", state.Sigma3, "Pa", "smallest principal stress")
            .Given("tension limit", tensionLimit, "Pa", limitSource)
            .Given("compression limit", compressionLimit, "Pa", limitSource)
            .Utilization(
                $"max(σ1/tension limit, −σ3/compression limit) = max({Shown.Number(inTension)}, {Shown.Number(inCompression)})",
                Math.Max(inTension, inCompression));
    }
}
