using MemberScan.Mechanics.Stress;

namespace MemberScan.Checks;

/// <summary>The opening lines of every stress check: the stresses at the point.</summary>
internal static class StateLines
{
    private const string FromField = "stress at the governing point";

    /// <summary>σ, τxy, τxz and their resultant τ.</summary>
    public static TraceLine[] Of(in StressState state) =>
    [
        new("σ", "", state.Sigma, "Pa", FromField),
        new("τxy", "", state.TauXY, "Pa", FromField),
        new("τxz", "", state.TauXZ, "Pa", FromField),
        new("τ", $"√(τxy² + τxz²) = √({Shown.MPa(state.TauXY)}² + {Shown.MPa(state.TauXZ)}²) MPa = {Shown.MPa(state.Tau)} MPa",
            state.Tau, "Pa", "resultant of the two"),
    ];

    /// <summary>Refuses stresses that are not finite, a strength that is not above zero, a factor below 1.</summary>
    public static void ThrowUnlessUsable(in StressState state, double strength, double factor)
    {
        if (!double.IsFinite(state.Sigma) || !double.IsFinite(state.TauXY) || !double.IsFinite(state.TauXZ))
            throw new ArgumentException("the stresses must be finite numbers", nameof(state));
        if (!double.IsFinite(strength) || strength <= 0)
            throw new ArgumentOutOfRangeException(nameof(strength), strength, "the strength must be a finite number above zero");
        if (!double.IsFinite(factor) || factor < 1)
            throw new ArgumentOutOfRangeException(nameof(factor), factor, "the factor must be a finite number of at least 1");
    }
}
